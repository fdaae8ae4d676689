"use client";

import { useCallback, useId } from "react";
import { useDraftForm } from "./draft-form";
import { LoadCaseRow } from "./load-case-row";
import { isDraftList, isDraftObject, withValue } from "./node-draft";
import { loadCaseColumns, withLoadCase, withPastedRows } from "./side-edits";

const HEADS: Readonly<Record<string, readonly [symbol: string, words: string]>> = {
  moment: ["M", "kNm"],
  axialForce: ["N", "kN"],
  shear: ["V", "kN"],
  momentAbove: ["M above", "kNm"],
  momentBelow: ["M below", "kNm"],
  shearAbove: ["V above", "kN"],
  shearBelow: ["V below", "kN"],
};

interface GridProps {
  readonly errors: ReadonlyMap<string, string>;
}

/** Messages of one row as one text, `column<tab>message` a line. */
function rowErrors(errors: ReadonlyMap<string, string>, index: number): string {
  const prefix = `loadCases.${index}`;
  return [...errors]
    .filter(([path]) => path === prefix || path.startsWith(`${prefix}.`))
    .map(([path, message]) => `${path.slice(prefix.length + 1)}\t${message}`)
    .join("\n");
}

function GridHead({
  columns,
  readOnly,
}: {
  readonly columns: readonly string[];
  readonly readOnly: boolean;
}) {
  const groups = (["left", "right", "column"] as const).map(
    (where) => [where, columns.filter((column) => column.startsWith(`${where}.`)).length] as const,
  );
  return (
    <thead>
      <tr className="text-note text-soft">
        <th rowSpan={2} scope="col" className="min-w-24 px-1.5 text-left align-bottom font-[650] text-ink">
          Load case
        </th>
        {groups.map(([where, span]) =>
          span === 0 ? null : (
            <th
              key={where}
              scope="colgroup"
              colSpan={span}
              className="border-l border-rule2 px-1.5 text-left font-[650] text-ink"
            >
              {where === "column" ? "Column" : `${where === "left" ? "Left" : "Right"} beam`}
            </th>
          ),
        )}
        {readOnly ? null : (
          <th
            rowSpan={2}
            scope="col"
            className="border-l border-rule2 px-1.5 text-left align-bottom font-normal"
          >
            <span className="sr-only">What may be done with the load case</span>
          </th>
        )}
      </tr>
      <tr className="text-note">
        {columns.slice(1).map((column) => {
          const [symbol, unit] = HEADS[column.split(".")[1] ?? ""] ?? ["", ""];
          const opens = /^(left|right)\.moment$|^column\.axialForce$/.test(column);
          return (
            <th
              key={column}
              scope="col"
              className={`px-1.5 pb-1 text-right font-normal whitespace-nowrap ${opens ? "border-l border-l-rule2" : ""}`}
            >
              {symbol} <span className="text-soft">{unit}</span>
            </th>
          );
        })}
      </tr>
    </thead>
  );
}

/** Every load case of the node, one a row; rows copied from a spreadsheet may be pasted into any cell. */
export function LoadCaseGrid({ errors }: GridProps) {
  const { draft, readOnly, set, edit, onFocus } = useDraftForm();
  const id = useId();
  const cases = isDraftList(draft.loadCases) ? draft.loadCases : [];
  const columns = loadCaseColumns(draft);
  const onType = useCallback(
    (index: number, column: string, text: string) => set(`loadCases.${index}.${column}`, text),
    [set],
  );
  const onCopy = useCallback((index: number) => edit((now) => withLoadCase(now, index)), [edit]);
  const onRemove = useCallback(
    (index: number) => edit((now) => withValue(now, `loadCases.${index}`, undefined)),
    [edit],
  );
  const onPasteRows = useCallback(
    (index: number, column: string, text: string) => {
      if (!/[\t\n]/.test(text.trim())) return false;
      edit((now) => withPastedRows(now, text, index, column));
      return true;
    },
    [edit],
  );
  return (
    <section aria-labelledby={id} className="border-t border-ink pt-2 pb-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id={id} className="text-body! font-[650]">
          Load cases
        </h2>
        {readOnly ? null : (
          <button
            type="button"
            onClick={() => edit((now) => withLoadCase(now))}
            className="text-note text-petrol hover:underline"
          >
            + load case
          </button>
        )}
      </div>
      <p className="mt-1 mb-2 max-w-[120ch] text-note text-soft">
        Beam moment at the column face, positive with the beam’s top flange in tension. Axial force positive
        in compression. Beam shear positive downwards on the column. Column shear above and below the panel
        positive to the right; column moment positive with compression on its right flange.
        {readOnly ? "" : " Rows copied from a spreadsheet can be pasted into any cell."}
      </p>
      {errors.get("loadCases") ? (
        <p role="alert" className="font-semibold text-fail">
          <span aria-hidden="true">▲ </span>
          {errors.get("loadCases")}
        </p>
      ) : null}
      <div
        role="region"
        aria-label="Load cases"
        tabIndex={0}
        className="relative max-h-[70vh] overflow-auto contain-inline-size"
      >
        <table className="w-full border-collapse">
          <caption className="sr-only">Actions in each load case</caption>
          <GridHead columns={columns} readOnly={readOnly} />
          <tbody>
            {cases.map((loadCase, index) => (
              <LoadCaseRow
                key={index}
                index={index}
                loadCase={isDraftObject(loadCase) ? loadCase : {}}
                columns={columns.join(" ")}
                errors={rowErrors(errors, index)}
                readOnly={readOnly}
                isOnly={cases.length === 1}
                onType={onType}
                onPasteRows={onPasteRows}
                onCopy={onCopy}
                onRemove={onRemove}
                onFocus={onFocus}
              />
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
