"use client";

import { QuantityField } from "./quantity-field";

export interface RowsFieldProps {
  readonly label: string;
  readonly path: string;
  readonly rows: readonly string[];
  readonly onChange: (rows: readonly string[]) => void;
  readonly errorAt: (path: string) => string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  readonly onFocus?: ((path: string) => void) | undefined;
}

/** How far below the last row a new one starts, mm: the designer moves it. */
const NEXT_ROW_MM = 70;

/** The bolt rows from the top down, one input each; rows are added below and taken away one by one. */
export function RowsField({
  label,
  path,
  rows,
  onChange,
  errorAt,
  hintId,
  readOnly = false,
  onFocus,
}: RowsFieldProps) {
  const listError = errorAt(path);
  const add = () => {
    const last = Number(rows[rows.length - 1]);
    onChange([...rows, Number.isFinite(last) && rows.length > 0 ? String(last + NEXT_ROW_MM) : ""]);
  };
  return (
    <div className="grid gap-1">
      {rows.map((row, index) => (
        <div key={index} className="flex items-start gap-1">
          <span aria-hidden="true" className="w-5 flex-none py-1 text-note text-soft">
            {index + 1}
          </span>
          <QuantityField
            label={`${label}, row ${index + 1}`}
            unit="mm"
            path={`${path}.${index}`}
            value={row}
            onChange={(text) => onChange(rows.map((other, at) => (at === index ? text : other)))}
            error={errorAt(`${path}.${index}`)}
            hintId={hintId}
            readOnly={readOnly}
            onFocus={() => onFocus?.(`${path}.${index}`)}
            className="flex-1"
          />
          {readOnly ? null : (
            <button
              type="button"
              aria-label={`Remove row ${index + 1}, ${label}`}
              disabled={rows.length === 1}
              onClick={() => onChange(rows.filter((_, at) => at !== index))}
              className="min-h-8 w-7 flex-none border border-transparent text-soft hover:border-rule2 hover:text-ink disabled:text-faint"
            >
              <span aria-hidden="true">×</span>
            </button>
          )}
        </div>
      ))}
      {listError === undefined ? null : (
        <p role="alert" className="text-note font-semibold text-fail">
          <span aria-hidden="true">▲ </span>
          {listError}
        </p>
      )}
      {readOnly ? null : (
        <button
          type="button"
          aria-label={`Add a row, ${label}`}
          onClick={add}
          className="justify-self-start py-1 text-note text-petrol hover:underline"
        >
          + row
        </button>
      )}
    </div>
  );
}
