import type { Model, ModelStatic, Transaction } from "sequelize";
import type { FastenerRow } from "@/lib/catalog/catalog";
import { Angle } from "@/models/angle";
import { Fastener } from "@/models/fastener";
import { FastenerGrade } from "@/models/fastener-grade";
import { Section } from "@/models/section";
import { Steel } from "@/models/steel";
import { StockPlate } from "@/models/stock-plate";
import { loadSeedCatalog } from "./data/load-catalog";
import type { Seeder } from "./seeder";

type Row = Readonly<Record<string, unknown>>;

interface TableToSeed {
  readonly name: string;
  readonly model: ModelStatic<Model>;
  /** Columns that name a row. */
  readonly key: readonly string[];
  readonly rows: readonly Row[];
}

function fastenerColumns({ preloaded, ...plain }: FastenerRow): Row {
  return {
    ...plain,
    preloadedAcrossFlatsMm: preloaded?.acrossFlatsMm ?? null,
    preloadedAcrossPointsMm: preloaded?.acrossPointsMm ?? null,
    preloadedNutHeightMm: preloaded?.nutHeightMm ?? null,
    preloadedNutHeightHvMm: preloaded?.nutHeightHvMm ?? null,
    preloadedWasherDiameterMm: preloaded?.washerDiameterMm ?? null,
    preloadedWasherThicknessMm: preloaded?.washerThicknessMm ?? null,
  };
}

function tables(): readonly TableToSeed[] {
  const catalog = loadSeedCatalog();
  const steels = catalog.steels.map(({ table, ...row }) => ({ ...row, strengthTable: table }));
  const plates = catalog.stockPlates.map((row) => ({ ...row, organisationId: null }));
  return [
    {
      name: "sections",
      model: Section,
      key: ["designation"],
      rows: catalog.sections.map((row) => ({ ...row })),
    },
    { name: "angles", model: Angle, key: ["designation"], rows: catalog.angles.map((row) => ({ ...row })) },
    { name: "strengths of steels", model: Steel, key: ["strengthTable", "grade", "overMm"], rows: steels },
    { name: "fastener sizes", model: Fastener, key: ["size"], rows: catalog.fasteners.map(fastenerColumns) },
    {
      name: "fastener grades",
      model: FastenerGrade,
      key: ["name"],
      rows: catalog.fastenerGrades.map((row) => ({ ...row })),
    },
    { name: "stock plates", model: StockPlate, key: ["organisationId", "thicknessMm"], rows: plates },
  ];
}

const nameOf = (row: Row, key: readonly string[]): string =>
  key.map((column) => String(row[column])).join(" | ");

/** Adds the rows whose names are missing; a row that is there stays as it is, edited or not. */
async function addMissing(
  { name, model, key, rows }: TableToSeed,
  transaction: Transaction,
): Promise<string[]> {
  const known = (await model.findAll({ attributes: [...key], raw: true, transaction })) as unknown as Row[];
  const names = new Set(known.map((row) => nameOf(row, key)));
  const missing = rows.filter((row) => !names.has(nameOf(row, key)));
  if (missing.length === 0) return [];
  await model.bulkCreate(
    missing.map((row) => ({ ...row })),
    { transaction },
  );
  return [`${missing.length} ${name}`];
}

/** Sections, angles, steels, fasteners and the plates that everybody starts with, each row with its source. */
export const catalogue: Seeder = {
  name: "catalogue",
  demo: false,
  run: async ({ transaction }) => {
    const lines: string[] = [];
    for (const table of tables()) lines.push(...(await addMissing(table, transaction)));
    return lines;
  },
};
