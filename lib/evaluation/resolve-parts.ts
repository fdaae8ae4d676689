import type { FastenerGrade, FastenerSize, ISection, Steel, Weld } from "@/lib/calc/node";
import type { AngleRow, Catalog, FastenerRow, SectionRow } from "@/lib/catalog/catalog";
import { findFastener, findFastenerGrade } from "@/lib/catalog/find-fastener";
import { findAngle, findSection } from "@/lib/catalog/find-section";
import { betaWOf, findSteel, type StrengthTable } from "@/lib/catalog/find-steel";
import type { NodeDocument, SectionInput, SteelInput, WeldInput } from "@/lib/schemas/node-document";
import { checkSection } from "./check-section";
import { shownMm, type Problems } from "./resolve-errors";

/** What every look-up needs: where to look, which strengths, and where faults go. */
export interface Resolving {
  readonly catalog: Catalog;
  readonly table: StrengthTable;
  readonly problems: Problems;
}

/** The strengths a document asks for; the product standards' unless it says otherwise. */
export const strengthTableOf = (document: NodeDocument): StrengthTable =>
  document.choices?.strengths ?? "product-standard";

/** A catalogue row as the calculation takes it. */
export const sectionToCase = (row: SectionRow): ISection => ({
  designation: row.designation,
  make: "rolled",
  depthMm: row.depthMm,
  widthMm: row.widthMm,
  webThicknessMm: row.webThicknessMm,
  flangeThicknessMm: row.flangeThicknessMm,
  rootMm: row.rootRadiusMm,
});

/**
 * A section by name or by its dimensions, mm. A welded section's web-to-flange weld is given by its throat and kept
 * as its leg, throat x sqrt 2. Null, and the faults told, for an unknown name or parts that do not fit together.
 */
export function resolveSection(
  { catalog, problems }: Resolving,
  input: SectionInput,
  path: string,
): ISection | null {
  if (typeof input === "string") {
    const row = findSection(catalog, input);
    if (row) return sectionToCase(row);
    return problems.refuse(
      path,
      `The catalogue has no section "${input}". Write a designation such as HE 300 A, IPE 450 or UC 254x254x107, or give the dimensions.`,
    );
  }
  const make = "weld" in input ? "welded" : "rolled";
  const section: ISection = {
    designation: `${make} ${input.h}x${input.b}x${input.tw}x${input.tf}`,
    make,
    depthMm: input.h,
    widthMm: input.b,
    webThicknessMm: input.tw,
    flangeThicknessMm: input.tf,
    rootMm: "weld" in input ? input.weld * Math.SQRT2 : input.r,
  };
  return checkSection(section, path, problems) ? section : null;
}

/** Whether a section was given by its dimensions and so has no name in the catalogue. */
export const isCustomSection = (section: ISection): boolean => /^(rolled|welded) /.test(section.designation);

/** A section as a document states it: its designation, or its dimensions where it has none. */
export function describeSection(section: ISection): SectionInput {
  if (!isCustomSection(section)) return section.designation;
  const { depthMm: h, widthMm: b, webThicknessMm: tw, flangeThicknessMm: tf } = section;
  if (section.make === "rolled") return { h, b, tw, tf, r: section.rootMm };
  // A leg of throat x sqrt 2 divided by sqrt 2 misses the throat by a last digit.
  return { h, b, tw, tf, weld: Number((section.rootMm / Math.SQRT2).toPrecision(12)) };
}

/** Grade name of a steel that a document gives by its strengths. */
export const STEEL_BY_STRENGTH = "by strength";

/** A steel at the thickness of one piece, mm; strengths in N/mm2. */
export function resolveSteel(
  { catalog, table, problems }: Resolving,
  input: SteelInput,
  thicknessMm: number,
  path: string,
): Steel | null {
  if (typeof input !== "string") {
    if (input.fu < input.fy)
      problems.add(`${path}.fu`, "The ultimate strength cannot be below the yield strength.");
    return {
      grade: STEEL_BY_STRENGTH,
      yieldMpa: input.fy,
      ultimateMpa: input.fu,
      betaW: input.betaW ?? betaWOf(input.fy),
    };
  }
  const answer = findSteel(catalog, input, thicknessMm, table);
  if (answer.kind === "found") {
    const { grade, yieldMpa, ultimateMpa } = answer.row;
    return { grade, yieldMpa, ultimateMpa, betaW: answer.betaW };
  }
  if (answer.kind === "unknown-grade") {
    return problems.refuse(
      path,
      `The catalogue has no steel "${input}". Write a grade of EN 10025-2, -3 or -4 such as S355, S355N or S460M, or give fy and fu.`,
    );
  }
  const where = table === "product-standard" ? "its product standard" : "Table 3.1 of EN 1993-1-1";
  return problems.refuse(
    path,
    `${answer.grade} has no strength at ${shownMm(thicknessMm)} mm: ${where} ends at ${answer.upToMm} mm. Give fy and fu instead.`,
  );
}

/** A steel as a document states it. */
export const describeSteel = (steel: Steel): SteelInput =>
  steel.grade === STEEL_BY_STRENGTH
    ? { fy: steel.yieldMpa, fu: steel.ultimateMpa, betaW: steel.betaW }
    : steel.grade;

export const resolveWeld = (input: WeldInput): Weld =>
  input === "butt" ? { kind: "butt" } : { kind: "fillet", throatMm: input };

export const describeWeld = (weld: Weld): WeldInput => (weld.kind === "butt" ? "butt" : weld.throatMm);

/** Leg of a weld, mm: throat x sqrt 2; a butt weld has none. */
export const weldLegMm = (weld: Weld): number => (weld.kind === "butt" ? 0 : weld.throatMm * Math.SQRT2);

/** Which standard's head, nut and washer a bolt has. */
export type Assembly = "plain" | "HR" | "HV";

/** A fastener row as the calculation takes it: EN 14399 dimensions for HR and HV where the catalogue has them. */
export function fastenerToCase(row: FastenerRow, assembly: Assembly): FastenerSize {
  const plain = {
    name: row.size,
    diameterMm: row.diameterMm,
    stressAreaMm2: row.stressAreaMm2,
    holeMm: row.holeMm,
    acrossFlatsMm: row.acrossFlatsMm,
    acrossPointsMm: row.acrossPointsMm,
    headHeightMm: row.headHeightMm,
    nutHeightMm: row.nutHeightMm,
    washerDiameterMm: row.washerDiameterMm,
    washerThicknessMm: row.washerThicknessMm,
  };
  const nutHeightMm = assembly === "HV" ? row.preloaded?.nutHeightHvMm : row.preloaded?.nutHeightMm;
  if (assembly === "plain" || row.preloaded === null || nutHeightMm === null || nutHeightMm === undefined)
    return plain;
  const { acrossFlatsMm, acrossPointsMm, washerDiameterMm, washerThicknessMm } = row.preloaded;
  return { ...plain, acrossFlatsMm, acrossPointsMm, nutHeightMm, washerDiameterMm, washerThicknessMm };
}

export function resolveFastenerSize(
  { catalog, problems }: Resolving,
  name: string,
  path: string,
  assembly: Assembly = "plain",
): FastenerSize | null {
  const row = findFastener(catalog, name);
  if (row) return fastenerToCase(row, assembly);
  const sizes = catalog.fasteners.map((known) => known.size).join(", ");
  return problems.refuse(path, `The catalogue has no size ${name}. It has ${sizes}.`);
}

export function resolveFastenerGrade(
  { catalog, problems }: Resolving,
  name: string,
  path: string,
): FastenerGrade | null {
  const row = findFastenerGrade(catalog, name);
  if (row)
    return { name: row.name, yieldMpa: row.yieldMpa, ultimateMpa: row.ultimateMpa, alphaV: row.alphaV };
  const names = catalog.fastenerGrades.map((known) => known.name).join(", ");
  return problems.refuse(path, `The catalogue has no property class ${name}. It has ${names}.`);
}

export function resolveAngle({ catalog, problems }: Resolving, name: string, path: string): AngleRow | null {
  return (
    findAngle(catalog, name) ??
    problems.refuse(path, `The catalogue has no angle "${name}". Write one such as L 100x100x10.`)
  );
}
