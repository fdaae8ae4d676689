"use client";
import Link from "next/link";
import type { NodeRow } from "@/lib/schemas/node";
import { componentLabel } from "@/components/compare/component-labels";
import { UtilisationFigure } from "@/components/compare/utilisation-bar";
import { formatMinutes, formatMoney } from "@/components/ui/format-number";
import { joinClasses } from "@/components/ui/join-classes";
import { shortDate } from "@/components/ui/short-date";
import { SortableTh, Table, Td, Th } from "@/components/ui/table";
import { beamWords, STATE_WORDS, type Sorting, type SortKey } from "./register-rows";

export interface RegisterTableProps {
  readonly projectId: string;
  readonly rows: readonly NodeRow[];
  readonly sorting: Sorting;
  readonly onSort: (key: SortKey) => void;
  /** "EUR", or words where money is an index. */
  readonly moneyUnit: string;
  /** Null where this person may not delete nodes. */
  readonly onDelete: ((row: NodeRow) => void) | null;
}

/** On a tablet the beams stand under the column and the last change is left out, so that what can be done stays in the window. */
const ROOMY_ONLY = "hidden min-[1100px]:table-cell";

const none = (words: string) => (
  <>
    <span aria-hidden="true" className="text-soft">
      –
    </span>
    <span className="sr-only">{words}</span>
  </>
);

/** The bare column: figure with mark, word, and what governs. */
function BareCell({ row }: { readonly row: NodeRow }) {
  if (row.bare === null) return <Td>{none("no result yet")}</Td>;
  if ("outsideScope" in row.bare) {
    return (
      <Td>
        <span className="text-soft">outside scope</span>{" "}
        <span className="block max-w-[34ch] text-note text-soft">{row.bare.outsideScope}</span>
      </Td>
    );
  }
  const { passes, utilisation, component, side } = row.bare;
  return (
    <Td>
      <span className={passes ? "font-[650] text-pass" : "font-[650] text-fail"}>
        {passes ? "passes" : "fails"}
      </span>{" "}
      <UtilisationFigure value={utilisation} limit={passes ? Math.max(1, utilisation) : 1} />{" "}
      <span className="block text-note text-soft">
        {/* Strong enough by itself, so it is the utilisation or the stiffness asked of this node that it misses. */}
        {!passes && utilisation <= 1
          ? "misses the node’s own target"
          : `${componentLabel(component)}, ${side}`}
      </span>
    </Td>
  );
}

function NodeLine({
  row,
  projectId,
  onDelete,
}: Pick<RegisterTableProps, "projectId" | "onDelete"> & { readonly row: NodeRow }) {
  const href = `/projects/${projectId}/nodes/${row.id}`;
  return (
    <tr className="hover:bg-petrolwash">
      <th scope="row" className="border-t border-rule px-3 py-1.5 text-left align-top font-normal">
        <Link
          href={href}
          className="font-[650] whitespace-nowrap text-ink underline decoration-rule2 underline-offset-4 hover:decoration-petrol"
        >
          {row.reference}
        </Link>{" "}
        <span className="block text-note text-soft">{`revision ${row.version}`}</span>
      </th>
      <Td className="min-[1100px]:whitespace-nowrap">
        <span className="whitespace-nowrap">{row.column}</span>{" "}
        <span className="block text-note text-soft min-[1100px]:hidden">{beamWords(row)}</span>
      </Td>
      <Td className={joinClasses(ROOMY_ONLY, "min-w-[11ch]")}>{beamWords(row)}</Td>
      <BareCell row={row} />
      <Td>
        {row.leading ? (
          <span className="font-[550]">{row.leading.name}</span>
        ) : (
          <span className={row.state === "nothing-passes" ? "font-[650] text-fail" : "text-soft"}>
            {STATE_WORDS[row.state]}
          </span>
        )}
        {row.outdated.length > 0 ? (
          <span className="block text-note text-tight">
            <span aria-hidden="true">◆ </span>out of date
          </span>
        ) : null}
      </Td>
      <Td className="text-right whitespace-nowrap">
        {row.leading ? formatMinutes(row.leading.shopMinutes) : none("none")}
      </Td>
      <Td className="text-right whitespace-nowrap">
        {row.leading ? formatMoney(row.leading.cost) : none("none")}
      </Td>
      <Td className="text-right">{row.quantity}</Td>
      <Td className={joinClasses(ROOMY_ONLY, "text-note whitespace-nowrap text-soft")}>
        {shortDate(row.updatedAt)}
        <span className="block">{row.updatedBy.name}</span>
      </Td>
      <Td className="no-print text-right whitespace-nowrap">
        <span className="inline-flex flex-col items-end gap-x-3 gap-y-1.5 min-[1100px]:flex-row min-[1100px]:items-baseline">
          <Link href={`${href}/comparison`}>
            <span className="prose-link">Compare</span>{" "}
            <span className="sr-only">{`the options for ${row.reference}`}</span>
          </Link>
          {onDelete ? (
            <button
              type="button"
              onClick={() => onDelete(row)}
              className="text-soft underline-offset-2 hover:text-fail hover:underline"
            >
              Delete <span className="sr-only">{row.reference}</span>
            </button>
          ) : null}
        </span>
      </Td>
    </tr>
  );
}

/** The nodes of a project, one line each. Money and hours are those of the leading option, a node. */
export function RegisterTable(props: RegisterTableProps) {
  const { rows, sorting, onSort, moneyUnit } = props;
  const head = (key: SortKey, label: string, className?: string) => (
    <SortableTh
      direction={sorting.key === key ? sorting.direction : null}
      onSort={() => onSort(key)}
      {...(className ? { className } : {})}
    >
      {label}
    </SortableTh>
  );
  return (
    <Table label="Register of nodes">
      <thead>
        <tr>
          {head("mark", "Mark")}
          {head("column", "Column")}
          <Th className={ROOMY_ONLY}>Beams</Th>
          {head("bare", "Bare column")}
          {head("leading", "Leading option")}
          {head("hours", "Shop hours", "text-right")}
          {head("cost", `Cost, ${moneyUnit}`, "text-right")}
          {head("quantity", "Alike", "text-right")}
          {head("updated", "Updated", ROOMY_ONLY)}
          <Th className="no-print">
            <span className="sr-only">Actions</span>
          </Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <NodeLine key={row.id} row={row} projectId={props.projectId} onDelete={props.onDelete} />
        ))}
      </tbody>
    </Table>
  );
}
