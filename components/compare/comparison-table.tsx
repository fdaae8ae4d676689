"use client";
import { useEffect, useMemo, useRef, useState, type ReactNode, type RefObject } from "react";
import type { OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { joinClasses } from "@/components/ui/join-classes";
import { CellContent } from "./comparison-cell";
import { isEvaluated, type LoadCaseChoice, type Opening, type Row, type RowGroup } from "./comparison-cells";
import { comparisonGroups } from "./comparison-rows";
import { OptionHead } from "./option-head";
import { ColumnsLine, startsFolded } from "./columns-line";
import { FoldedHead, FoldedName } from "./folded-column";
import { columnLetter } from "./rank-words";
import { stopProps, useGridKeys } from "./use-grid-keys";

export interface ComparisonTableProps {
  readonly result: ResultDocument;
  readonly choice: LoadCaseChoice;
  readonly excluded: readonly string[];
  /** Null where this person may not set options aside. */
  readonly onSetExcluded: ((keys: readonly string[]) => void) | null;
  readonly onOpen: (optionKey: string, opening: Opening) => void;
  /** The drawing of an option; all of them to one scale. */
  readonly drawing: (option: OptionDocument) => ReactNode;
}

/** What every part of the table needs to know of a column. */
interface Column {
  readonly option: OptionDocument;
  readonly letter: string;
  readonly index: number;
  readonly isFolded: boolean;
  readonly isBest: boolean;
  readonly isOff: boolean;
}

const HEAD_COLUMN =
  "sticky left-0 z-10 w-[132px] min-w-[132px] desk:w-[168px] desk:min-w-[168px] head-rule bg-paper px-3 desk:px-3.5 text-left font-[450]";
const OPEN_WIDTH = "w-[196px] min-w-[168px] px-3 desk:px-3.5";
const FOLDED_WIDTH = "w-[46px] min-w-[46px] px-1.5";

/** Tints of a column: the cheapest on a wash, what cannot be chosen under a hatch. */
const columnClass = (column: Column, ...more: readonly string[]) =>
  joinClasses(
    "border-l border-rule text-left align-top scroll-mt-48 scroll-ml-48",
    column.isFolded ? FOLDED_WIDTH : OPEN_WIDTH,
    column.isBest ? "cell-best" : "cell-plain",
    column.isOff && "off-hatch text-soft",
    ...more,
  );

function HeadRows({
  columns,
  props,
  onFold,
}: {
  readonly columns: readonly Column[];
  readonly props: ComparisonTableProps;
  readonly onFold: (key: string) => void;
}) {
  const { result, excluded, onSetExcluded, onOpen, drawing } = props;
  const toggle = (key: string) =>
    onSetExcluded?.(excluded.includes(key) ? excluded.filter((other) => other !== key) : [...excluded, key]);
  return (
    <thead>
      <tr className="comparison-head">
        <th
          scope="col"
          className={joinClasses(
            HEAD_COLUMN,
            "top-0 z-30 border-b border-b-rule pb-9 align-bottom text-note text-soft",
          )}
        >
          Rank by cost, cheapest first
        </th>
        {columns.map((column) => (
          <th
            key={column.option.key}
            scope="col"
            data-option={column.option.key}
            className={columnClass(
              column,
              "sticky top-0 z-20 h-px border-b border-b-rule pt-3.5 pb-2",
              column.isBest ? "best-edge" : "",
            )}
          >
            {column.isFolded ? (
              <FoldedHead
                option={column.option}
                result={result}
                letter={column.letter}
                column={column.index + 1}
                onUnfold={() => onFold(column.option.key)}
              />
            ) : (
              <OptionHead
                option={column.option}
                result={result}
                letter={column.letter}
                column={column.index + 1}
                isExcluded={excluded.includes(column.option.key)}
                onToggleExcluded={onSetExcluded ? () => toggle(column.option.key) : null}
                onFold={() => onFold(column.option.key)}
                onOpen={() => onOpen(column.option.key, { about: "option" })}
              />
            )}
          </th>
        ))}
      </tr>
      <tr>
        <th
          scope="row"
          className={joinClasses(HEAD_COLUMN, "border-b border-ink pb-2.5 align-bottom text-note text-soft")}
        >
          All to one scale, mm.
          <br />
          Solid: bar. Hatched: stiffener. Dashed: plate.
          <br />◆ tight, ▲ over
        </th>
        {columns.map((column) => (
          <td
            role="gridcell"
            key={column.option.key}
            className={columnClass(column, "relative border-b border-b-ink pb-2.5")}
          >
            {column.isFolded ? (
              <FoldedName option={column.option} />
            ) : (
              <div {...stopProps(column.index + 1)}>{drawing(column.option)}</div>
            )}
          </td>
        ))}
      </tr>
    </thead>
  );
}

interface RowProps {
  readonly row: Row;
  readonly columns: readonly Column[];
  readonly limit: number;
  readonly onOpen: ComparisonTableProps["onOpen"];
}

function BodyRow({ row, columns, limit, onOpen }: RowProps) {
  return (
    <tr>
      <th
        scope="row"
        className={joinClasses(
          HEAD_COLUMN,
          "border-t border-t-rule py-[5px] align-top text-soft",
          row.isPart ? "pl-6 text-note desk:pl-7" : "",
        )}
      >
        {row.label}
      </th>
      {columns.map((column) => {
        const cell = row.cells[column.index];
        return (
          <td
            role="gridcell"
            key={column.option.key}
            className={columnClass(column, "border-t border-t-rule py-[5px]")}
          >
            {column.isFolded || !cell ? null : (
              <CellContent
                cell={cell}
                rowLabel={row.label}
                optionName={column.option.name}
                limit={limit}
                column={column.index + 1}
                onOpen={(opening) => onOpen(column.option.key, opening)}
              />
            )}
          </td>
        );
      })}
    </tr>
  );
}

interface GroupProps extends Omit<RowProps, "row"> {
  readonly group: RowGroup;
  readonly isFolded: boolean;
  readonly onToggle: () => void;
}

function BodyGroup({ group, columns, limit, onOpen, isFolded, onToggle }: GroupProps) {
  const { title, folded } = group;
  return (
    <tbody>
      {title === null ? null : (
        <tr>
          <th scope="row" className={joinClasses(HEAD_COLUMN, "border-t border-t-ink pt-2 pb-1 align-top")}>
            <button
              type="button"
              {...stopProps(0)}
              aria-expanded={!isFolded}
              onClick={onToggle}
              className="flex items-baseline gap-1.5 text-left text-note font-[650] hover:underline"
            >
              <span aria-hidden="true" className="w-2 text-petrol">
                {isFolded ? "+" : "−"}
              </span>
              {title}
            </button>
          </th>
          {columns.map((column) => {
            const cell = folded?.[column.index];
            return (
              <td
                role="gridcell"
                key={column.option.key}
                className={columnClass(column, "border-t border-t-ink pt-2 pb-1")}
              >
                {isFolded && cell && !column.isFolded ? (
                  <CellContent
                    cell={cell}
                    rowLabel={title}
                    optionName={column.option.name}
                    limit={limit}
                    column={column.index + 1}
                    onOpen={(opening) => onOpen(column.option.key, opening)}
                  />
                ) : null}
              </td>
            );
          })}
        </tr>
      )}
      {title !== null && isFolded
        ? null
        : group.rows.map((row) => (
            <BodyRow key={row.key} row={row} columns={columns} limit={limit} onOpen={onOpen} />
          ))}
    </tbody>
  );
}

const toggled = (set: ReadonlySet<string>, key: string): ReadonlySet<string> => {
  const next = new Set(set);
  if (!next.delete(key)) next.add(key);
  return next;
};

/** Columns that are folded. Where one is folded or unfolded in its head, the focus stays in that head. */
function useFoldedColumns(table: RefObject<HTMLTableElement | null>, options: readonly OptionDocument[]) {
  const [folded, setFolded] = useState<ReadonlySet<string>>(() => new Set(startsFolded(options)));
  const pressed = useRef<string | null>(null);
  useEffect(() => {
    const key = pressed.current;
    if (key === null) return;
    pressed.current = null;
    const heads = [...(table.current?.querySelectorAll<HTMLElement>("th[data-option]") ?? [])];
    heads
      .find((head) => head.dataset.option === key)
      ?.querySelector<HTMLElement>("[data-fold]")
      ?.focus();
  }, [folded, table]);
  const toggle = (key: string) => {
    pressed.current = key;
    setFolded((set) => toggled(set, key));
  };
  return { folded, toggle, setFolded };
}

/** The options side by side: one column an option, one row a figure, groups of rows that fold, columns that fold. */
export function ComparisonTable(props: ComparisonTableProps) {
  const { result, choice, excluded, onOpen } = props;
  const table = useRef<HTMLTableElement>(null);
  const keys = useGridKeys(table);
  const groups = useMemo(() => comparisonGroups(result, choice), [result, choice]);
  const { folded: foldedColumns, toggle: foldColumn, setFolded } = useFoldedColumns(table, result.options);
  const [foldedGroups, setFoldedGroups] = useState<ReadonlySet<string>>(
    () => new Set(groups.filter((group) => group.startsFolded).map((group) => group.key)),
  );
  const columns = result.options.map((option, index): Column => ({
    option,
    letter: columnLetter(index),
    index,
    isFolded: foldedColumns.has(option.key),
    isBest: option.rank === 1,
    isOff: !isEvaluated(option) || excluded.includes(option.key),
  }));
  return (
    <>
      <ColumnsLine options={result.options} folded={foldedColumns} onFold={setFolded} />
      <table
        ref={table}
        {...keys}
        role="grid"
        aria-label={`Options for ${result.node.reference}`}
        className="comparison-table border border-ink bg-sheet"
      >
        <HeadRows columns={columns} props={props} onFold={foldColumn} />
        {groups.map((group) => (
          <BodyGroup
            key={group.key}
            group={group}
            columns={columns}
            limit={result.node.target.utilisation}
            onOpen={onOpen}
            isFolded={foldedGroups.has(group.key)}
            onToggle={() => setFoldedGroups((set) => toggled(set, group.key))}
          />
        ))}
      </table>
    </>
  );
}
