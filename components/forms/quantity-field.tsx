"use client";

import { joinClasses } from "@/components/ui/join-classes";
import { CellField, ReadValue } from "./cell-field";

export interface QuantityFieldProps {
  /** What is given, without its unit. */
  readonly label: string;
  readonly unit: string;
  readonly path: string;
  /** As typed: kept even where it is no number. */
  readonly value: string;
  readonly onChange: (text: string) => void;
  readonly error?: string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  /** Shown where nothing is typed, for a field that may be left out. */
  readonly placeholder?: string;
  readonly onFocus?: (() => void) | undefined;
  readonly onPaste?: ((text: string) => boolean) | undefined;
  readonly className?: string;
}

/** A number with its unit. A text input, so that a half-typed number is not thrown away by the browser. */
export function QuantityField(props: QuantityFieldProps) {
  const { label, unit, path, value, onChange, readOnly = false, placeholder, onFocus, onPaste } = props;
  const whole = unit === "" ? label : `${label} (${unit})`;
  if (readOnly) {
    return (
      <ReadValue label={whole} path={path}>
        {value === "" ? (placeholder ?? "–") : value}
        {value === "" || unit === "" ? null : <span className="text-note text-soft">{` ${unit}`}</span>}
      </ReadValue>
    );
  }
  return (
    <CellField
      label={whole}
      path={path}
      error={props.error}
      hintId={props.hintId}
      {...(props.className ? { className: props.className } : {})}
    >
      {(binding) => (
        <input
          {...binding}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          value={value}
          placeholder={placeholder}
          onChange={(event) => onChange(event.target.value)}
          onFocus={onFocus}
          onPaste={(event) => {
            if (onPaste?.(event.clipboardData.getData("text"))) event.preventDefault();
          }}
          className={joinClasses(
            "control min-h-8 w-full min-w-0 py-0.5 text-right placeholder:text-left placeholder:text-soft",
          )}
        />
      )}
    </CellField>
  );
}
