import type { Catalog, SteelRow } from "./catalog";

export type StrengthTable = SteelRow["table"];

export type SteelAnswer =
  | { readonly kind: "found"; readonly row: SteelRow; readonly betaW: number }
  | { readonly kind: "unknown-grade" }
  /** The grade is known, but its table ends before this thickness. */
  | { readonly kind: "too-thick"; readonly grade: string; readonly upToMm: number };

/**
 * The grade names under which a written grade is filed, in the order to try them. Subgrades of toughness (JR, J0, J2, K2,
 * NL, ML) and conditions of delivery (+N, +AR, +M) share their grade's strengths; a grade without letters that EN 10025-2
 * does not list is taken as the normalised one of EN 10025-3.
 */
export function gradeKeys(written: string): readonly string[] {
  const text = written.toUpperCase().replace(/[\s-]+/g, "");
  const parts = /^S(\d{3})(JR|JO|J0|J2|K2|NL|N|ML|M)?(\+(?:N|AR|M))?(?:Z(?:15|25|35))?$/.exec(text);
  if (!parts) return [];
  const base = `S${parts[1] ?? ""}`;
  const letters = parts[2] ?? "";
  if (letters.startsWith("N")) return [`${base}N`];
  if (letters.startsWith("M")) return [`${base}M`];
  return letters === "" ? [base, `${base}N`] : [base];
}

/**
 * Correlation factor of fillet welds by strength of the parent metal.
 *
 * EN 1993-1-8:2005, Table 4.1: 0.8 for S235, 0.85 for S275, 0.9 for S355, 1.0 for S420 and S460. Steels given by their
 * strength alone are put in the band of the next grade not below them.
 *
 * @param nominalYieldMpa - yield strength that names the grade, N/mm2.
 */
export function betaWOf(nominalYieldMpa: number): number {
  if (nominalYieldMpa <= 235) return 0.8;
  if (nominalYieldMpa <= 275) return 0.85;
  return nominalYieldMpa <= 355 ? 0.9 : 1.0;
}

/**
 * Strength of a grade at a thickness.
 *
 * @param thicknessMm - nominal thickness of the piece, mm.
 * @param table - whose strengths: the product standards' or Table 3.1 of EN 1993-1-1.
 */
export function findSteel(
  catalog: Catalog,
  written: string,
  thicknessMm: number,
  table: StrengthTable,
): SteelAnswer {
  for (const grade of gradeKeys(written)) {
    const rows = catalog.steels.filter((row) => row.table === table && row.grade === grade);
    if (rows.length === 0) continue;
    const row = rows.find((line) => thicknessMm > line.overMm && thicknessMm <= line.upToMm);
    if (row) return { kind: "found", row, betaW: betaWOf(Number(grade.slice(1, 4))) };
    return { kind: "too-thick", grade, upToMm: Math.max(...rows.map((line) => line.upToMm)) };
  }
  return { kind: "unknown-grade" };
}

/** Grade names of one table, each once, in the catalogue's order. */
export function gradeNames(catalog: Catalog, table: StrengthTable): readonly string[] {
  return [...new Set(catalog.steels.filter((row) => row.table === table).map((row) => row.grade))];
}
