"use client";

import { SECTION_FAMILIES, type Catalog, type SectionRow } from "@/lib/catalog/catalog";
import { findSection } from "@/lib/catalog/find-section";
import { ChoiceField, type Choice } from "./choice-field";
import { QuantityField } from "./quantity-field";

/** A designation, or dimensions in mm as typed. */
export type TypedSection = string | Readonly<Record<string, string>>;

export interface SectionPickerProps {
  readonly label: string;
  readonly path: string;
  readonly value: TypedSection;
  readonly catalog: Catalog;
  readonly onChange: (value: TypedSection) => void;
  readonly errorAt: (path: string) => string | undefined;
  readonly hintId?: string | undefined;
  readonly readOnly?: boolean;
  readonly onFocus?: ((path: string) => void) | undefined;
}

const ROLLED = "rolled, by dimensions";
const WELDED = "welded, by dimensions";
const DIMENSIONS = [
  ["h", "depth"],
  ["b", "width"],
  ["tw", "web thickness"],
  ["tf", "flange thickness"],
] as const;

const text = (value: number): string => String(Math.round(value * 100) / 100);

/** The member of a family whose depth comes nearest: changing the family keeps the size of the node. */
function nearestOf(rows: readonly SectionRow[], depthMm: number): SectionRow | undefined {
  return rows.reduce<SectionRow | undefined>(
    (best, row) =>
      best === undefined || Math.abs(row.depthMm - depthMm) < Math.abs(best.depthMm - depthMm) ? row : best,
    undefined,
  );
}

/** Dimensions to start from when a section is to be given by its own: those of the section it had. */
function ownDimensions(row: SectionRow | null, before: TypedSection, isRolled: boolean): TypedSection {
  const kept = typeof before === "string" ? {} : before;
  const base = row
    ? {
        h: text(row.depthMm),
        b: text(row.widthMm),
        tw: text(row.webThicknessMm),
        tf: text(row.flangeThicknessMm),
      }
    : { h: kept.h ?? "", b: kept.b ?? "", tw: kept.tw ?? "", tf: kept.tf ?? "" };
  return isRolled
    ? { ...base, r: kept.r ?? (row ? text(row.rootRadiusMm) : "") }
    : { ...base, weld: kept.weld ?? "5" };
}

/** A section from the catalogue by family, or one by its dimensions. */
export function SectionPicker({
  label,
  path,
  value,
  catalog,
  onChange,
  errorAt,
  hintId,
  readOnly = false,
  onFocus,
}: SectionPickerProps) {
  const row = typeof value === "string" ? findSection(catalog, value) : null;
  const own = typeof value === "string" ? null : value;
  const family = own ? ("weld" in own ? WELDED : ROLLED) : (row?.family ?? "");
  const families: Choice[] = [
    ...SECTION_FAMILIES.filter((name) => catalog.sections.some((section) => section.family === name)),
    ROLLED,
    WELDED,
  ].map((name) => ({ value: name, label: name }));
  const members = catalog.sections.filter((section) => section.family === family);
  const depthMm = row?.depthMm ?? (Number(own?.h) || 300);
  const chooseFamily = (chosen: string) => {
    if (chosen === ROLLED || chosen === WELDED) return onChange(ownDimensions(row, value, chosen === ROLLED));
    const nearest = nearestOf(
      catalog.sections.filter((section) => section.family === chosen),
      depthMm,
    );
    if (nearest) onChange(nearest.designation);
  };
  const shared = { hintId, readOnly };
  return (
    <div className="grid gap-1">
      <div className="flex flex-wrap items-start gap-1">
        {readOnly && !own ? null : (
          <ChoiceField
            {...shared}
            label={`${label}, family`}
            path={`${path}#family`}
            value={family}
            choices={families}
            onChange={chooseFamily}
            className="min-w-20 flex-1"
          />
        )}
        {own ? null : (
          <ChoiceField
            {...shared}
            label={label}
            path={path}
            value={row?.designation ?? (typeof value === "string" ? value : "")}
            choices={members.map(({ designation }) => ({ value: designation, label: designation }))}
            onChange={onChange}
            error={errorAt(path)}
            onFocus={() => onFocus?.(path)}
            className="min-w-28 flex-[1.4]"
          />
        )}
      </div>
      {own
        ? [
            ...DIMENSIONS,
            "weld" in own
              ? (["weld", "web-to-flange weld throat"] as const)
              : (["r", "root radius"] as const),
          ].map(([key, words]) => (
            <div key={key} className="flex items-start gap-2">
              <span
                aria-hidden="true"
                className="w-16 flex-none py-1 text-note text-soft"
              >{`${key === "weld" ? "throat" : key} mm`}</span>
              <QuantityField
                {...shared}
                label={`${label}, ${words}`}
                unit="mm"
                path={`${path}.${key}`}
                value={own[key] ?? ""}
                onChange={(typed) => onChange({ ...own, [key]: typed })}
                error={errorAt(`${path}.${key}`)}
                onFocus={() => onFocus?.(`${path}.${key}`)}
                className="flex-1"
              />
            </div>
          ))
        : null}
    </div>
  );
}
