"use client";

import { CellField, ReadValue } from "./cell-field";

export interface Choice {
  readonly value: string;
  readonly label: string;
}

export interface ChoiceFieldProps {
  readonly label: string;
  readonly path: string;
  readonly value: string;
  readonly choices: readonly Choice[];
  readonly onChange: (value: string) => void;
  readonly error?: string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  readonly onFocus?: (() => void) | undefined;
  readonly className?: string;
}

/** A native select. A value that is none of the choices is kept and shown as what it is. */
export function ChoiceField(props: ChoiceFieldProps) {
  const { label, path, value, choices, onChange, readOnly = false, onFocus } = props;
  const known = choices.find((choice) => choice.value === value);
  if (readOnly) {
    return (
      <ReadValue label={label} path={path}>
        {known?.label ?? value}
      </ReadValue>
    );
  }
  return (
    <CellField
      label={label}
      path={path}
      error={props.error}
      hintId={props.hintId}
      {...(props.className ? { className: props.className } : {})}
    >
      {(binding) => (
        <select
          {...binding}
          value={value}
          onFocus={onFocus}
          onChange={(event) => onChange(event.target.value)}
          className="control min-h-8 w-full min-w-0 py-0.5"
        >
          {known ? null : (
            <option value={value}>{value === "" ? "choose" : `${value} (not in the list)`}</option>
          )}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      )}
    </CellField>
  );
}
