import { readFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import type { Catalog, SectionFamily } from "@/lib/catalog/catalog";
import { checkCatalog } from "@/lib/catalog/check-catalog";
import { rowsOfTable, type Cell } from "@/lib/catalog/compact-table";

const SECTION_FILES: readonly (readonly [file: string, family: SectionFamily])[] = [
  ["sections-ipe.json", "IPE"],
  ["sections-ipe-a.json", "IPE A"],
  ["sections-ipe-o.json", "IPE O"],
  ["sections-he-a.json", "HE A"],
  ["sections-he-b.json", "HE B"],
  ["sections-he-m.json", "HE M"],
  ["sections-ub.json", "UB"],
  ["sections-uc.json", "UC"],
];

const STEEL_FILES = [
  "steels-en10025-2.json",
  "steels-en10025-3.json",
  "steels-en10025-4.json",
  "steels-en1993-1-1-table-3-1.json",
] as const;

const FOLDER = path.join(path.dirname(fileURLToPath(import.meta.url)), "catalog");

const readTable = (file: string): readonly Readonly<Record<string, Cell>>[] =>
  rowsOfTable(file, JSON.parse(readFileSync(path.join(FOLDER, file), "utf8")) as unknown);

/** The preloaded assembly's figures stand in columns of their own; a size without one leaves them empty. */
function fastenerOf(row: Readonly<Record<string, Cell>>): unknown {
  const {
    preloadedAcrossFlatsMm: acrossFlatsMm,
    preloadedAcrossPointsMm: acrossPointsMm,
    preloadedNutHeightMm: nutHeightMm,
    preloadedHvNutHeightMm: nutHeightHvMm,
    preloadedWasherDiameterMm: washerDiameterMm,
    preloadedWasherThicknessMm: washerThicknessMm,
    ...rest
  } = row;
  const preloaded = {
    acrossFlatsMm,
    acrossPointsMm,
    nutHeightMm,
    nutHeightHvMm,
    washerDiameterMm,
    washerThicknessMm,
  };
  return { ...rest, preloaded: acrossFlatsMm === null ? null : preloaded };
}

/**
 * The catalogue as the data files beside this one state it: what the seeder loads and the command line reads.
 *
 * @throws CatalogFault where a file is malformed or a row has no source.
 */
export function loadSeedCatalog(): Catalog {
  return checkCatalog({
    sections: SECTION_FILES.flatMap(([file, family]) => readTable(file).map((row) => ({ ...row, family }))),
    angles: readTable("angles.json"),
    steels: STEEL_FILES.flatMap((file) => readTable(file)),
    fasteners: readTable("fasteners.json").map(fastenerOf),
    fastenerGrades: readTable("fastener-grades.json"),
    stockPlates: readTable("stock-plates.json"),
  });
}
