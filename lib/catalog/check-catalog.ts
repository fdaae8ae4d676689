import { z } from "zod";
import { SECTION_FAMILIES, type Catalog } from "./catalog";
import { CatalogFault } from "./compact-table";

const length = z.number().finite().positive();
const text = z.string().min(1);

const SectionRowShape = z.strictObject({
  designation: text,
  family: z.enum(SECTION_FAMILIES),
  depthMm: length,
  widthMm: length,
  webThicknessMm: length,
  flangeThicknessMm: length,
  rootRadiusMm: length,
  massKgPerM: length,
  source: text,
});

const AngleRowShape = z.strictObject({
  designation: text,
  legAMm: length,
  legBMm: length,
  thicknessMm: length,
  rootRadiusMm: length,
  toeRadiusMm: length,
  source: text,
});

const SteelRowShape = z.strictObject({
  standard: text,
  grade: text,
  table: z.enum(["product-standard", "en1993-1-1-table-3.1"]),
  overMm: z.number().finite().nonnegative(),
  upToMm: length,
  yieldMpa: length,
  ultimateMpa: length,
  source: text,
});

const FastenerRowShape = z.strictObject({
  size: z.string().regex(/^M\d{1,2}$/),
  diameterMm: length,
  pitchMm: length,
  stressAreaMm2: length,
  holeMm: length,
  acrossFlatsMm: length,
  acrossPointsMm: length,
  headHeightMm: length,
  nutHeightMm: length,
  washerDiameterMm: length,
  washerThicknessMm: length,
  preloaded: z
    .strictObject({
      acrossFlatsMm: length,
      acrossPointsMm: length,
      nutHeightMm: length,
      nutHeightHvMm: length.nullable(),
      washerDiameterMm: length,
      washerThicknessMm: length,
    })
    .nullable(),
  source: text,
});

const FastenerGradeRowShape = z.strictObject({
  name: z.string().regex(/^\d{1,2}\.\d$/),
  yieldMpa: length,
  ultimateMpa: length,
  alphaV: length,
  source: text,
});

const StockPlateRowShape = z.strictObject({ thicknessMm: length, source: text });

const CatalogShape = z.strictObject({
  sections: z.array(SectionRowShape).min(1),
  angles: z.array(AngleRowShape).min(1),
  steels: z.array(SteelRowShape).min(1),
  fasteners: z.array(FastenerRowShape).min(1),
  fastenerGrades: z.array(FastenerGradeRowShape).min(1),
  stockPlates: z.array(StockPlateRowShape),
});

/** Rows whose names must differ, and how a row is named. */
const NAMES: { readonly [K in keyof Catalog]: (row: Catalog[K][number]) => string } = {
  sections: (row) => row.designation,
  angles: (row) => row.designation,
  steels: (row) => `${row.table} ${row.grade} over ${row.overMm} mm`,
  fasteners: (row) => row.size,
  fastenerGrades: (row) => row.name,
  stockPlates: (row) => `${row.thicknessMm} mm`,
};

function refuseTwins<K extends keyof Catalog>(kind: K, rows: Catalog[K]): void {
  const seen = new Set<string>();
  for (const row of rows as readonly Catalog[K][number][]) {
    const name = NAMES[kind](row);
    if (seen.has(name)) throw new CatalogFault(kind, `${name} is there twice`);
    seen.add(name);
  }
}

/**
 * Checks rows read from files or the database: known fields only, lengths positive, every row with a source,
 * no name twice, a section's flanges and web leave a hollow, a steel's range is not empty.
 *
 * @throws CatalogFault naming the first fault.
 */
export function checkCatalog(input: unknown): Catalog {
  const parsed = CatalogShape.safeParse(input);
  if (!parsed.success) {
    const issue = parsed.error.issues[0];
    throw new CatalogFault(issue?.path.join(".") ?? "", issue?.message ?? "cannot be read");
  }
  const catalog: Catalog = parsed.data;
  for (const kind of Object.keys(NAMES) as (keyof Catalog)[]) refuseTwins(kind, catalog[kind]);
  for (const row of catalog.sections) {
    const isHollowClosed =
      2 * (row.flangeThicknessMm + row.rootRadiusMm) >= row.depthMm ||
      row.webThicknessMm + 2 * row.rootRadiusMm >= row.widthMm;
    if (isHollowClosed)
      throw new CatalogFault("sections", `${row.designation} has no room between its flanges and roots`);
  }
  for (const row of catalog.steels) {
    if (row.upToMm <= row.overMm)
      throw new CatalogFault("steels", `${row.grade} over ${row.overMm} mm has an empty range`);
  }
  return catalog;
}
