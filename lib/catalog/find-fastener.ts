import type { Catalog, FastenerGradeRow, FastenerRow } from "./catalog";

/** The row of a size such as "M24"; null if the catalogue has none. */
export function findFastener(catalog: Catalog, size: string): FastenerRow | null {
  const name = size.trim().toUpperCase();
  return catalog.fasteners.find((row) => row.size === name) ?? null;
}

/** The row of a property class such as "8.8"; null if the catalogue has none. */
export function findFastenerGrade(catalog: Catalog, name: string): FastenerGradeRow | null {
  return catalog.fastenerGrades.find((row) => row.name === name.trim()) ?? null;
}
