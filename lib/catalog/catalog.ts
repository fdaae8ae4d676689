/** The catalogue as plain rows: what the seeders load, the database keeps and the resolver looks names up in. */

export const SECTION_FAMILIES = [
  "IPE",
  "IPE A",
  "IPE O",
  "HE A",
  "HE B",
  "HE M",
  "UB",
  "UC",
  "custom",
] as const;
export type SectionFamily = (typeof SECTION_FAMILIES)[number];

export interface SectionRow {
  readonly designation: string;
  readonly family: SectionFamily;
  readonly depthMm: number;
  readonly widthMm: number;
  readonly webThicknessMm: number;
  readonly flangeThicknessMm: number;
  readonly rootRadiusMm: number;
  /** Nominal, for ordering within a family. */
  readonly massKgPerM: number;
  readonly source: string;
}

export interface AngleRow {
  readonly designation: string;
  readonly legAMm: number;
  readonly legBMm: number;
  readonly thicknessMm: number;
  readonly rootRadiusMm: number;
  readonly toeRadiusMm: number;
  readonly source: string;
}

export interface SteelRow {
  readonly standard: string;
  readonly grade: string;
  /** Which table of strengths this line belongs to. */
  readonly table: "product-standard" | "en1993-1-1-table-3.1";
  readonly overMm: number;
  readonly upToMm: number;
  readonly yieldMpa: number;
  readonly ultimateMpa: number;
  readonly source: string;
}

export interface FastenerRow {
  readonly size: string;
  readonly diameterMm: number;
  readonly pitchMm: number;
  readonly stressAreaMm2: number;
  readonly holeMm: number;
  readonly acrossFlatsMm: number;
  readonly acrossPointsMm: number;
  readonly headHeightMm: number;
  readonly nutHeightMm: number;
  readonly washerDiameterMm: number;
  readonly washerThicknessMm: number;
  /** EN 14399-3/-4 preloaded assemblies; null where the standard lists none. */
  readonly preloaded: {
    readonly acrossFlatsMm: number;
    readonly acrossPointsMm: number;
    /** EN 14399-3 (HR). */
    readonly nutHeightMm: number;
    /** EN 14399-4 (HV); null where that part lists no such size. */
    readonly nutHeightHvMm: number | null;
    readonly washerDiameterMm: number;
    readonly washerThicknessMm: number;
  } | null;
  readonly source: string;
}

export interface FastenerGradeRow {
  readonly name: string;
  readonly yieldMpa: number;
  readonly ultimateMpa: number;
  readonly alphaV: number;
  readonly source: string;
}

export interface StockPlateRow {
  readonly thicknessMm: number;
  readonly source: string;
}

export interface Catalog {
  readonly sections: readonly SectionRow[];
  readonly angles: readonly AngleRow[];
  readonly steels: readonly SteelRow[];
  readonly fasteners: readonly FastenerRow[];
  readonly fastenerGrades: readonly FastenerGradeRow[];
  readonly stockPlates: readonly StockPlateRow[];
}
