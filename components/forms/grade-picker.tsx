"use client";

import { gradeNames } from "@/lib/catalog/find-steel";
import type { Catalog } from "@/lib/catalog/catalog";
import { ChoiceField } from "./choice-field";
import { QuantityField } from "./quantity-field";

/** A grade name, or strengths as typed. */
export type TypedSteel = string | Readonly<Record<string, string>>;

export interface GradePickerProps {
  readonly label: string;
  readonly path: string;
  readonly value: TypedSteel;
  readonly catalog: Catalog;
  readonly onChange: (value: TypedSteel) => void;
  readonly errorAt: (path: string) => string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  readonly onFocus?: (() => void) | undefined;
}

const BY_STRENGTH = "by strength";
const STRENGTHS = [
  ["fy", "N/mm²", "yield strength"],
  ["fu", "N/mm²", "ultimate strength"],
  ["betaW", "", "weld correlation factor"],
] as const;

/** A steel grade of the catalogue, whose strength follows the thickness, or strengths of one's own. */
export function GradePicker({
  label,
  path,
  value,
  catalog,
  onChange,
  errorAt,
  hintId,
  readOnly = false,
  onFocus,
}: GradePickerProps) {
  const grades = gradeNames(catalog, "product-standard").map((grade) => ({ value: grade, label: grade }));
  const own = typeof value === "string" ? null : value;
  return (
    <div className="grid gap-1">
      <ChoiceField
        label={label}
        path={path}
        value={typeof value === "string" ? value : BY_STRENGTH}
        choices={[...grades, { value: BY_STRENGTH, label: BY_STRENGTH }]}
        onChange={(chosen) => onChange(chosen === BY_STRENGTH ? { fy: "355", fu: "490" } : chosen)}
        error={errorAt(path)}
        hintId={hintId}
        readOnly={readOnly}
        onFocus={onFocus}
      />
      {own
        ? STRENGTHS.map(([key, unit, words]) => (
            <div key={key} className="flex items-start gap-2">
              <span aria-hidden="true" className="w-16 flex-none py-1 text-note text-soft">
                {key === "betaW" ? "β_w" : `${key} ${unit}`}
              </span>
              <QuantityField
                label={`${label}, ${words}`}
                unit={unit}
                path={`${path}.${key}`}
                value={own[key] ?? ""}
                placeholder={key === "betaW" ? "by strength" : ""}
                onChange={(text) => onChange({ ...own, [key]: text })}
                error={errorAt(`${path}.${key}`)}
                readOnly={readOnly}
                className="flex-1"
              />
            </div>
          ))
        : null}
    </div>
  );
}
