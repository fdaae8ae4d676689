import type { EstimateDocument } from "@/lib/schemas/result-document";
import { formatFigures, formatNumber, moneyUnit } from "@/components/ui/format-number";
import { unitText } from "@/components/trace/symbol-text";
import { Table, Td, Th } from "@/components/ui/table";

export interface BillOfOperationsProps {
  readonly estimate: EstimateDocument;
  /** Only the lines of one category or of one trade; left out = all. */
  readonly only?: { readonly category?: string; readonly trade?: string };
}

type Line = EstimateDocument["lines"][number];

const sum = (lines: readonly Line[], value: (line: Line) => number): number =>
  lines.reduce((total, line) => total + value(line), 0);

function BillRow({ line }: { readonly line: Line }) {
  return (
    <tr>
      <th scope="row" className="border-t border-rule px-3 py-1.5 text-left align-top font-[550]">
        {line.operation}
        <span className="block text-note font-normal text-soft">
          {[line.category, line.trade?.replaceAll("-", " ")].filter(Boolean).join(", ")}
        </span>
      </th>
      <Td className="text-right whitespace-nowrap">{`${formatFigures(line.quantity, 3)} ${unitText(line.quantityUnit)}`}</Td>
      <Td className="text-right">
        {line.minutes === 0 ? <span className="text-soft">–</span> : formatNumber(line.minutes, 1)}
      </Td>
      <Td className="text-right">{formatNumber(line.cost, 2)}</Td>
      <Td className="text-note text-soft">{line.source}</Td>
    </tr>
  );
}

/** The bill of operations of one option, per node: what is done, how much of it, how long, what it costs, and where each figure comes from. */
export function BillOfOperations({ estimate, only }: BillOfOperationsProps) {
  const lines = estimate.lines.filter(
    (line) =>
      (only?.category === undefined || line.category === only.category) &&
      (only?.trade === undefined || line.trade === only.trade),
  );
  if (lines.length === 0) {
    return (
      <p className="text-soft">
        {estimate.lines.length === 0
          ? "The rates behind this comparison are not shown to you."
          : "No operation of this kind."}
      </p>
    );
  }
  return (
    <>
      <p className="mb-2 text-note text-soft">{`Per node, ${moneyUnit(estimate.currency)}. A minus sign is what the option saves against the bare node.`}</p>
      <Table label="Bill of operations">
        <thead>
          <tr>
            <Th>Operation</Th>
            <Th className="text-right">Quantity</Th>
            <Th className="text-right">Minutes</Th>
            <Th className="text-right">Cost</Th>
            <Th>Source</Th>
          </tr>
        </thead>
        <tbody>
          {lines.map((line, index) => (
            <BillRow key={`${line.operation}-${index}`} line={line} />
          ))}
        </tbody>
        <tfoot>
          <tr className="font-semibold">
            <th scope="row" className="border-t border-ink px-3 py-1.5 text-left">
              Sum
            </th>
            <Td className="border-t-ink" />
            <Td className="border-t-ink text-right">
              {formatNumber(
                sum(lines, (line) => line.minutes),
                1,
              )}
            </Td>
            <Td className="border-t-ink text-right">
              {formatNumber(
                sum(lines, (line) => line.cost),
                2,
              )}
            </Td>
            <Td className="border-t-ink" />
          </tr>
        </tfoot>
      </Table>
    </>
  );
}
