import { joinClasses } from "@/components/ui/join-classes";
import { formatUtilisation } from "@/components/ui/format-number";
import type { Cell, Opening } from "./comparison-cells";
import { stopProps } from "./use-grid-keys";
import { UtilisationBar, UtilisationFigure } from "./utilisation-bar";

export interface CellContentProps {
  readonly cell: Cell;
  readonly rowLabel: string;
  readonly optionName: string;
  readonly limit: number;
  /** Column for the arrow keys. */
  readonly column: number;
  readonly isQuiet?: boolean;
  readonly onOpen: (opening: Opening) => void;
}

const OPENER =
  "block w-full text-left hover:[&_.opens]:underline decoration-petrol decoration-2 underline-offset-3";
const VERDICT_TONES = { pass: "text-pass", fail: "text-fail", plain: "text-soft" } as const;

/** A cell that holds no button is a stop for the arrow keys by itself. */
const restProps = (column: number) => ({ ...stopProps(column), className: "block" });

function UtilisationCell({
  cell,
  rowLabel,
  optionName,
  limit,
  column,
  onOpen,
}: CellContentProps & { readonly cell: Extract<Cell, { kind: "utilisation" }> }) {
  return (
    <button type="button" {...stopProps(column)} className={OPENER} onClick={() => onOpen(cell.opens)}>
      <span className="sr-only">{`${rowLabel}, ${optionName}:`}</span>{" "}
      <span className="flex items-center gap-2.5">
        <UtilisationBar value={cell.value} limit={limit} />
        <span className="opens w-[3.4rem] shrink-0 text-right">
          <UtilisationFigure
            value={cell.value}
            limit={limit}
            {...(cell.isGoverning ? { className: "font-bold" } : {})}
          />
        </span>
      </span>
      <span className="sr-only">{`, ${cell.where}${cell.isGoverning ? ", governs" : ""}. Open the working`}</span>
    </button>
  );
}

function VerdictCell({
  cell,
  optionName,
  limit,
  column,
  onOpen,
}: CellContentProps & { readonly cell: Extract<Cell, { kind: "verdict" }> }) {
  const figure = cell.value === null ? "" : formatUtilisation(cell.value, limit);
  return (
    <button type="button" {...stopProps(column)} className={OPENER} onClick={() => onOpen(cell.opens)}>
      <span className="sr-only">{`${optionName}:`}</span>{" "}
      <span className={joinClasses("font-[650]", VERDICT_TONES[cell.tone])}>{cell.word}</span>{" "}
      {figure ? <span className="opens">{figure}</span> : null}{" "}
      <span className="block text-note text-soft">{cell.note}</span>{" "}
      <span className="sr-only">{cell.value === null ? "Open the option" : "Open the working"}</span>
    </button>
  );
}

function QuantityCell({
  cell,
  rowLabel,
  optionName,
  column,
  onOpen,
}: CellContentProps & { readonly cell: Extract<Cell, { kind: "quantity" }> }) {
  const content = (
    <>
      <span className={joinClasses("opens", cell.isBig && "figure")}>{cell.text}</span>{" "}
      {cell.unit ? <span className="text-note text-soft">{cell.unit}</span> : null}{" "}
      {cell.note ? <span className="block text-note text-soft">{cell.note}</span> : null}
    </>
  );
  const { opens } = cell;
  if (!opens) return <span {...restProps(column)}>{content}</span>;
  return (
    <button type="button" {...stopProps(column)} className={OPENER} onClick={() => onOpen(opens)}>
      <span className="sr-only">{`${rowLabel}, ${optionName}:`}</span> {content}{" "}
      <span className="sr-only">Open the working</span>
    </button>
  );
}

/** What stands in one cell of the comparison: a number that opens its working, or words. */
export function CellContent(props: CellContentProps) {
  const { cell, column } = props;
  switch (cell.kind) {
    case "utilisation":
      return <UtilisationCell {...props} cell={cell} />;
    case "verdict":
      return <VerdictCell {...props} cell={cell} />;
    case "quantity":
      return <QuantityCell {...props} cell={cell} />;
    case "none":
      return (
        <span {...restProps(column)}>
          <span aria-hidden="true" className="text-soft">
            –
          </span>
          <span className="sr-only">{cell.words}</span>
        </span>
      );
    case "list":
      return (
        <ul {...stopProps(column)} className="grid gap-1.5 text-note">
          {cell.items.map((item) => (
            <li key={item}>{item}</li>
          ))}
        </ul>
      );
  }
}
