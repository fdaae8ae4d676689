import type {
  ConnectionWelds,
  EndPlateConnection,
  FastenerGrade,
  FastenerSize,
  ISection,
  JointCase,
  LoadCase,
  MeasureCase,
  NodeCase,
  Side,
  Steel,
} from "@/lib/calc";

/**
 * Nodes in the calculation's own numbers, with nothing looked up, for values worked out by hand.
 * The plain node: HE 300 A column, IPE 400 beam left and right, flush rows of M20 60 mm from each beam flange.
 */
export const HE_300_A: ISection = {
  designation: "HE 300 A",
  make: "rolled",
  depthMm: 290,
  widthMm: 300,
  webThicknessMm: 8.5,
  flangeThicknessMm: 14,
  rootMm: 27,
};

export const IPE_400: ISection = {
  designation: "IPE 400",
  make: "rolled",
  depthMm: 400,
  widthMm: 180,
  webThicknessMm: 8.6,
  flangeThicknessMm: 13.5,
  rootMm: 21,
};

export const S275: Steel = { grade: "S275", yieldMpa: 275, ultimateMpa: 410, betaW: 0.85 };
export const S355: Steel = { grade: "S355", yieldMpa: 355, ultimateMpa: 470, betaW: 0.9 };

export const M20: FastenerSize = {
  name: "M20",
  diameterMm: 20,
  stressAreaMm2: 245,
  holeMm: 22,
  acrossFlatsMm: 30,
  acrossPointsMm: 32.95,
  headHeightMm: 12.5,
  nutHeightMm: 18,
  washerDiameterMm: 37,
  washerThicknessMm: 3,
};

export const GRADE_10_9: FastenerGrade = { name: "10.9", yieldMpa: 900, ultimateMpa: 1000, alphaV: 0.5 };

const fillet = (throatMm: number) => ({ kind: "fillet", throatMm }) as const;
const welds: ConnectionWelds = { topFlange: fillet(6), bottomFlange: fillet(6), web: fillet(4) };

export interface EndPlateOverrides {
  readonly plate?: Partial<EndPlateConnection["plate"]>;
  readonly bolts?: Partial<EndPlateConnection["bolts"]>;
}

/** A 20 mm plate, 220 wide and 90 beyond either flange; rows of M20 10.9 at gauge 140. */
export const buildEndPlate = (overrides: EndPlateOverrides = {}): EndPlateConnection => ({
  kind: "end-plate",
  plate: {
    thicknessMm: 20,
    widthMm: 220,
    extensionTopMm: 90,
    extensionBottomMm: 90,
    steel: S275,
    hasStiffenedExtension: false,
    ...overrides.plate,
  },
  bolts: {
    size: M20,
    grade: GRADE_10_9,
    gaugeMm: 140,
    rowsMm: [60, 340],
    perRow: 2,
    preloaded: false,
    ...overrides.bolts,
  },
  welds,
});

export const buildJoint = (side: Side, connection: JointCase["connection"] = buildEndPlate()): JointCase => ({
  side,
  beam: { section: IPE_400, steel: S275, spanMm: 7000 },
  levelOffsetMm: 0,
  connection,
});

/** The same connection on both sides. */
export const buildJoints = (connection: JointCase["connection"]): JointCase[] => [
  buildJoint("left", connection),
  buildJoint("right", connection),
];

/** Moments of the two beams in kNm, with nothing in the column. */
export const buildLoadCase = (leftKnm: number, rightKnm: number | null): LoadCase => {
  const actions = (moment: number) => ({ momentNmm: moment * 1e6, axialForceN: 0, shearN: 0 });
  return {
    name: "one",
    left: actions(leftKnm),
    right: rightKnm === null ? null : actions(rightKnm),
    column: { axialForceN: 0, momentAboveNmm: 0, momentBelowNmm: 0, shearAboveN: 0, shearBelowN: 0 },
  };
};

export const buildNodeCase = (overrides: Partial<NodeCase> = {}): NodeCase => ({
  partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  column: {
    section: HE_300_A,
    steel: S275,
    endDistanceAboveMm: null,
    endDistanceBelowMm: null,
    storeyHeightMm: 3600,
  },
  joints: buildJoints(buildEndPlate()),
  loadCases: [buildLoadCase(50, 50)],
  bracing: "unbraced",
  target: { utilisation: 1, stiffness: "any" },
  tStubModeOne: "method-2",
  triangularLimit: "always",
  flangeWelds: "directional",
  ...overrides,
});

/** The plain node with another column section. */
export const withColumn = (section: Partial<ISection>, node: NodeCase = buildNodeCase()): NodeCase => ({
  ...node,
  column: { ...node.column, section: { ...node.column.section, ...section } },
});

type Measure<K extends MeasureCase["kind"]> = Extract<MeasureCase, { kind: K }>;

export const buildBars = (overrides: Partial<Measure<"through-bars">> = {}): Measure<"through-bars"> => ({
  kind: "through-bars",
  levels: ["top"],
  size: M20,
  grade: GRADE_10_9,
  innerNuts: true,
  ...overrides,
});

/** Full-depth plates 100 x 12 with clips of the column's root radius. */
export const buildStiffeners = (
  overrides: Partial<Measure<"transverse-stiffeners">> = {},
): Measure<"transverse-stiffeners"> => ({
  kind: "transverse-stiffeners",
  levels: ["top"],
  thicknessMm: 12,
  widthMm: 100,
  length: "full",
  clipMm: 27,
  steel: S275,
  flangeWeld: fillet(5),
  webWeld: fillet(4),
  ...overrides,
});

/** One plate 188 x 10 x 700; its welds of leg 10 reach the root toes: 188 + 2 · 10 = 208 mm. */
export const buildWebPlates = (overrides: Partial<Measure<"web-plates">> = {}): Measure<"web-plates"> => ({
  kind: "web-plates",
  sides: 1,
  thicknessMm: 10,
  widthMm: 188,
  heightMm: 700,
  steel: S275,
  weld: fillet(10 / Math.SQRT2),
  ...overrides,
});

/** Plates 118 x 12 x 300 behind the flange at the top: 300 / 2 - 8.5 / 2 - 27 = 118.75 mm to the root toe. */
export const buildBackingPlates = (
  overrides: Partial<Measure<"backing-plates">> = {},
): Measure<"backing-plates"> => ({
  kind: "backing-plates",
  levels: ["top"],
  thicknessMm: 12,
  widthMm: 118,
  lengthMm: 300,
  steel: S275,
  ...overrides,
});

/** A pair of 100 x 12 from corner to corner, its top end to the right. */
export const buildDiagonals = (
  overrides: Partial<Measure<"diagonal-stiffeners">> = {},
): Measure<"diagonal-stiffeners"> => ({
  kind: "diagonal-stiffeners",
  arrangement: "single",
  towards: "right",
  thicknessMm: 12,
  widthMm: 100,
  steel: S275,
  weld: fillet(8),
  ...overrides,
});
