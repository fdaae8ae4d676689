"use client";

import { memo } from "react";
import { textAt, type DraftValue } from "./node-draft";

export interface LoadCaseRowProps {
  readonly index: number;
  readonly loadCase: DraftValue;
  /** Columns of the grid as paths inside the load case. */
  readonly columns: string;
  /** Messages of this row only, `path: message`, joined: a plain text so that an untouched row is not drawn again. */
  readonly errors: string;
  readonly readOnly: boolean;
  readonly isOnly: boolean;
  readonly onType: (index: number, column: string, text: string) => void;
  readonly onPasteRows: (index: number, column: string, text: string) => boolean;
  readonly onCopy: (index: number) => void;
  readonly onRemove: (index: number) => void;
  readonly onFocus: (path: string) => void;
}

const UNITS: Readonly<Record<string, string>> = { moment: "kNm", momentAbove: "kNm", momentBelow: "kNm" };
const NAMES: Readonly<Record<string, string>> = {
  moment: "moment",
  axialForce: "axial force",
  shear: "shear",
  momentAbove: "moment above",
  momentBelow: "moment below",
  shearAbove: "shear above",
  shearBelow: "shear below",
};

/** What a cell is, in words with its unit. */
export function cellName(column: string): string {
  if (column === "name") return "name";
  const [where = "", what = ""] = column.split(".");
  return `${where} ${NAMES[what] ?? what} (${UNITS[what] ?? "kN"})`;
}

/** One load case: a row of inputs. Memoised: two hundred of them stand still while one is typed in. */
export const LoadCaseRow = memo(function LoadCaseRow(props: LoadCaseRowProps) {
  const { index, loadCase, readOnly, isOnly } = props;
  const name = textAt(loadCase, "name");
  const errors = new Map(
    props.errors === ""
      ? []
      : props.errors
          .split("\n")
          .map((line) => [line.slice(0, line.indexOf("\t")), line.slice(line.indexOf("\t") + 1)]),
  );
  const rowId = `load-case-${index}`;
  const cell = (column: string) => {
    const text = textAt(loadCase, column);
    const path = `loadCases.${index}.${column}`;
    const error = errors.get(column);
    if (readOnly) return text;
    return (
      <input
        type="text"
        {...(column === "name" ? {} : { inputMode: "decimal" as const })}
        autoComplete="off"
        aria-label={`Load case ${name || index + 1}, ${cellName(column)}`}
        aria-invalid={error === undefined ? undefined : true}
        aria-describedby={error === undefined ? undefined : `${rowId}-errors`}
        data-path={path}
        value={text}
        onFocus={() => props.onFocus(path)}
        onChange={(event) => props.onType(index, column, event.target.value)}
        onPaste={(event) => {
          if (props.onPasteRows(index, column, event.clipboardData.getData("text"))) event.preventDefault();
        }}
        className={`control min-h-8! w-full min-w-14 border-transparent! px-1.5! hover:border-rule2! focus:border-petrol! ${error === undefined ? "" : "border-fail!"} ${column === "name" ? "min-w-44" : "text-right"}`}
      />
    );
  };
  return (
    <>
      <tr>
        {props.columns.split(" ").map((column) =>
          column === "name" ? (
            <th key={column} scope="row" className="border-t border-rule text-left font-normal">
              {cell(column)}
            </th>
          ) : (
            <td
              key={column}
              className={`border-t border-rule text-right ${/\.(moment|axialForce)$/.test(column) && /^(left|right)\.moment|^column\.axial/.test(column) ? "border-l border-l-rule2" : ""}`}
            >
              {cell(column)}
            </td>
          ),
        )}
        {readOnly ? null : (
          <td className="border-t border-l border-rule border-l-rule2 whitespace-nowrap">
            <button
              type="button"
              onClick={() => props.onCopy(index)}
              aria-label={`Copy load case ${name || index + 1}`}
              className="min-h-8 px-2 text-note text-petrol hover:underline"
            >
              Copy
            </button>
            <button
              type="button"
              onClick={() => props.onRemove(index)}
              disabled={isOnly}
              aria-label={`Remove load case ${name || index + 1}`}
              className="min-h-8 px-2 text-note text-petrol hover:underline disabled:text-faint disabled:no-underline"
            >
              Remove
            </button>
          </td>
        )}
      </tr>
      {errors.size > 0 ? (
        <tr>
          <td colSpan={13} id={`${rowId}-errors`} className="px-1.5 pb-1 text-note font-semibold text-fail">
            {[...errors].map(([column, message]) => (
              <p key={column} role="alert">
                <span aria-hidden="true">▲ </span>
                {column === "" ? message : `${cellName(column)}: ${message}`}
              </p>
            ))}
          </td>
        </tr>
      ) : null}
    </>
  );
});
