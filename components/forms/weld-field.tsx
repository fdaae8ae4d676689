"use client";

import { ChoiceField } from "./choice-field";
import { QuantityField } from "./quantity-field";

export interface WeldFieldProps {
  readonly label: string;
  readonly path: string;
  /** "butt", or the throat as typed. */
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly error?: string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  readonly onFocus?: (() => void) | undefined;
}

/** Throat a fillet starts with when a butt weld is changed to one, mm. */
const FIRST_THROAT = "5";
const KINDS = [
  { value: "fillet", label: "fillet" },
  { value: "butt", label: "butt" },
];

/** A fillet by its throat in mm, or a full-penetration butt weld. */
export function WeldField({
  label,
  path,
  value,
  onChange,
  error,
  hintId,
  readOnly = false,
  onFocus,
}: WeldFieldProps) {
  const isButt = value === "butt";
  const shared = { path, readOnly, hintId, onFocus };
  if (readOnly && isButt)
    return <ChoiceField {...shared} label={label} value="butt" choices={KINDS} onChange={onChange} />;
  return (
    <div className="flex items-start gap-1">
      {readOnly ? null : (
        <ChoiceField
          {...shared}
          path={`${path}#kind`}
          label={`${label}, kind of weld`}
          value={isButt ? "butt" : "fillet"}
          choices={KINDS}
          onChange={(kind) => onChange(kind === "butt" ? "butt" : FIRST_THROAT)}
          className="flex-1"
          {...(isButt ? { error } : {})}
        />
      )}
      {isButt ? null : (
        <QuantityField
          {...shared}
          label={`${label}, throat`}
          unit="mm"
          value={value}
          onChange={onChange}
          error={error}
          className="w-[4.5rem] flex-none"
        />
      )}
    </div>
  );
}
