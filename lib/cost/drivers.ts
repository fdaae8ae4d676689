/**
 * The contract between geometry and time rules: which named quantities each driver carries. A rule
 * may use the names of its own driver and the names every driver shares, and no others.
 */

export type NameKind = "number" | "text";

/** Names that every rule may use; facts of the order, not of the part. */
export const SHARED_NAMES = {
  /** Identical nodes made together. */
  batch: "number",
  nodesPerLift: "number",
  executionClass: "number",
  /** none, paint or galvanised. */
  coating: "text",
} as const satisfies Record<string, NameKind>;

const WELD_NAMES = {
  lengthM: "number",
  /** Straight runs, each begun once. */
  runs: "number",
  /** Cross-section of weld metal, mm2. */
  areaMm2: "number",
  /** Thickest joined part. */
  thickestMm: "number",
  /** PA, PB, PC, PF, PD or PE. */
  position: "text",
  /** Clear distance between the column's flanges. */
  clearGapMm: "number",
  /** free or restricted. */
  gunAngle: "text",
} as const;

export const DRIVERS = {
  /** Plates of one kind and size, per node. */
  plate: {
    /** transverse-stiffener, diagonal-stiffener, web-plate or backing-plate. */
    partType: "text",
    parts: "number",
    thicknessMm: "number",
    /** All edges of all parts. */
    cutM: "number",
    /** Corners clipped for the root. */
    corners: "number",
    /** All parts together. */
    massKg: "number",
    /** Faces of all parts that can be seen and painted. */
    areaM2: "number",
    /** Face of one part that lies closed against the column; 0 where it stands free. */
    overlapCm2: "number",
    /** Parts of the node placed before these, and the mass of the piece they are placed on. */
    partsBefore: "number",
    pieceMassKg: "number",
  },
  "bevel-edge": { edges: "number", lengthM: "number", depthMm: "number", thicknessMm: "number" },
  "fillet-weld": { throatMm: "number", ...WELD_NAMES },
  "butt-weld": { depthMm: "number", ...WELD_NAMES },
  /** Turns of the whole lift, shared over its nodes. */
  turn: { turns: "number", pieceMassKg: "number" },
  hole: {
    /** plate or section. */
    through: "text",
    holes: "number",
    diameterMm: "number",
    thicknessMm: "number",
  },
  bar: {
    bars: "number",
    /** Property class, such as 8.8. */
    grade: "text",
    diameterMm: "number",
    lengthM: "number",
    massKg: "number",
    /** Two ends a bar. */
    ends: "number",
    innerNuts: "number",
    outerNuts: "number",
    nutMassKg: "number",
    washers: "number",
    washerMassKg: "number",
    /** Bar axis to the column web, less half the web. */
    spannerRoomMm: "number",
    /** 1 where the connection is preloaded, else 0. */
    preloaded: "number",
  },
  /** Bolts that bars replace: all quantities negative. */
  "bolt-saved": {
    bolts: "number",
    grade: "text",
    diameterMm: "number",
    massKg: "number",
    preloaded: "number",
  },
  /** Difference of the whole lift, divided by the nodes it serves. */
  column: { massKg: "number", lengthM: "number", areaM2: "number" },
  /** Details to be drawn and checked. */
  detail: { details: "number" },
} as const satisfies Record<string, Record<string, NameKind>>;

export type DriverName = keyof typeof DRIVERS;
export const DRIVER_NAMES = Object.keys(DRIVERS) as DriverName[];

type ValuesOf<T extends Record<string, NameKind>> = {
  readonly [K in keyof T]: T[K] extends "number" ? number : string;
};
export type DriverValues<D extends DriverName> = ValuesOf<(typeof DRIVERS)[D]>;

/** One record of quantities. Records with the same `group` share a set-up within the batch. */
export type QuantityRecord = {
  readonly [D in DriverName]: {
    readonly driver: D;
    readonly group: string;
    readonly values: DriverValues<D>;
  };
}[DriverName];
