import type { NodeCase } from "@/lib/calc/node";
import type { Catalog, SectionFamily, SectionRow } from "@/lib/catalog/catalog";
import { findFastenerGrade } from "@/lib/catalog/find-fastener";
import { findSection } from "@/lib/catalog/find-section";
import type { Stock } from "@/lib/propose/stock";
import type { NodeDocument, SteelInput } from "@/lib/schemas/node-document";
import { columnHoleFault } from "./check-geometry";
import { Problems } from "./resolve-errors";
import { fastenerToCase, resolveSteel, sectionToCase, strengthTableOf } from "./resolve-parts";

/** Fillet throats that a proposal may use, mm. Common practice, no source. */
const THROATS_MM = [3, 4, 5, 6, 7, 8, 10, 12] as const;

/** Property classes of threaded bars that a proposal may use. Common practice, no source. */
const BAR_GRADES = ["8.8", "10.9"] as const;

/** Families whose sections of the same nominal size are heavier. */
const HEAVIER_FAMILIES: Partial<Record<SectionFamily, readonly SectionFamily[]>> = {
  "HE A": ["HE B", "HE M"],
  "HE B": ["HE M"],
  "IPE A": ["IPE", "IPE O"],
  IPE: ["IPE O"],
};

/** The stock of a node, and the columns of the next heavier families at the column's own nominal size. */
export interface NodeStock extends Stock {
  readonly relatedColumns: Stock["columns"];
}

type Column = Stock["columns"][number];

/** "300" of "HE 300 A". */
const nominalSize = (row: SectionRow): string | undefined => /\d+/.exec(row.designation)?.[0];

function columnsOf(
  rows: readonly SectionRow[],
  document: NodeDocument,
  node: NodeCase,
  catalog: Catalog,
): readonly Column[] {
  const context = { catalog, table: strengthTableOf(document), problems: new Problems() };
  const columns: Column[] = [];
  for (const row of rows.toSorted((a, b) => a.massKgPerM - b.massKgPerM)) {
    const section = sectionToCase(row);
    // The same bolts go through the heavier column's flange.
    const isBarred = node.joints.some(
      (joint) => joint.connection.kind === "end-plate" && columnHoleFault(section, joint.connection) !== null,
    );
    const steel = resolveSteel(context, document.column.steel, section.flangeThicknessMm, "column.steel");
    if (steel && !isBarred) columns.push({ section, steel, massKgPerM: row.massKgPerM });
  }
  return columns;
}

function platesOf(steel: SteelInput, document: NodeDocument, catalog: Catalog): Stock["plates"] {
  const context = { catalog, table: strengthTableOf(document), problems: new Problems() };
  const thicknesses = catalog.stockPlates.map((row) => row.thicknessMm).toSorted((a, b) => a - b);
  return thicknesses.flatMap((thicknessMm) => {
    const strength = resolveSteel(context, steel, thicknessMm, "column.steel");
    return strength ? [{ thicknessMm, steel: strength }] : [];
  });
}

function barsOf(catalog: Catalog): Stock["bars"] {
  const grades = BAR_GRADES.map((name) => findFastenerGrade(catalog, name)).filter((row) => row !== null);
  return catalog.fasteners
    .toSorted((a, b) => a.diameterMm - b.diameterMm)
    .flatMap((row) =>
      grades.map(({ name, yieldMpa, ultimateMpa, alphaV }) => ({
        size: fastenerToCase(row, "plain"),
        grade: { name, yieldMpa, ultimateMpa, alphaV },
      })),
    );
}

/**
 * What a proposal for this node may be made of: stock plates of the column's grade at their own strengths, throats, bars
 * of 8.8 and 10.9, and heavier columns of the column's family (none for a section given by its dimensions) that the bolts
 * can pass. Pieces that the grade has no strength for are left out.
 */
export function stockOf(document: NodeDocument, node: NodeCase, catalog: Catalog): NodeStock {
  const { section } = document.column;
  const own = typeof section === "string" ? findSection(catalog, section) : null;
  const heavier = catalog.sections.filter(
    (row) => own !== null && row.family === own.family && row.massKgPerM > own.massKgPerM,
  );
  const families = (own && HEAVIER_FAMILIES[own.family]) ?? [];
  const related = catalog.sections.filter(
    (row) => own !== null && families.includes(row.family) && nominalSize(row) === nominalSize(own),
  );
  return {
    plates: platesOf(document.column.steel, document, catalog),
    throatsMm: THROATS_MM,
    bars: barsOf(catalog),
    columns: columnsOf(heavier, document, node, catalog),
    relatedColumns: columnsOf(related, document, node, catalog),
  };
}
