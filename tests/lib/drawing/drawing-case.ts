import type {
  EndPlateConnection,
  FastenerSize,
  FlangeCleatConnection,
  ISection,
  JointCase,
  MeasureCase,
  NodeCase,
  Side,
  Steel,
} from "@/lib/calc/node";

/**
 * A node to draw: HE 300 A with IPE 450 both sides, end plate 20, M24 in three rows. Dimensions of the
 * sections as in EN 10365, of the fasteners as in ISO 4014, 4032 and 7089 (from memory); the drawing
 * uses them as given, so no test here depends on their being right.
 */
export const STEEL: Steel = { grade: "S355", yieldMpa: 355, ultimateMpa: 490, betaW: 0.9 };

export const HE_300_A: ISection = {
  designation: "HE 300 A",
  make: "rolled",
  depthMm: 290,
  widthMm: 300,
  webThicknessMm: 8.5,
  flangeThicknessMm: 14,
  rootMm: 27,
};
export const HE_300_B: ISection = {
  ...HE_300_A,
  designation: "HE 300 B",
  depthMm: 300,
  webThicknessMm: 11,
  flangeThicknessMm: 19,
};
export const IPE_450: ISection = {
  designation: "IPE 450",
  make: "rolled",
  depthMm: 450,
  widthMm: 190,
  webThicknessMm: 9.4,
  flangeThicknessMm: 14.6,
  rootMm: 21,
};
export const M24: FastenerSize = {
  name: "M24",
  diameterMm: 24,
  stressAreaMm2: 353,
  holeMm: 26,
  acrossFlatsMm: 36,
  acrossPointsMm: 39.55,
  headHeightMm: 15,
  nutHeightMm: 21.5,
  washerDiameterMm: 44,
  washerThicknessMm: 4,
};
const GRADE = { name: "10.9", yieldMpa: 900, ultimateMpa: 1000, alphaV: 0.5 };
const fillet = (throatMm: number) => ({ kind: "fillet", throatMm }) as const;

export const END_PLATE: EndPlateConnection = {
  kind: "end-plate",
  plate: {
    thicknessMm: 20,
    widthMm: 200,
    extensionTopMm: 90,
    extensionBottomMm: 30,
    steel: STEEL,
    hasStiffenedExtension: false,
  },
  bolts: { size: M24, grade: GRADE, gaugeMm: 120, rowsMm: [-45, 65, 385], perRow: 2, preloaded: false },
  welds: { topFlange: fillet(8), bottomFlange: fillet(6), web: fillet(5) },
};

/** Angles of 150 by 90 by 12, the long leg on the beam; M24 in both legs. */
export const CLEATS: FlangeCleatConnection = {
  kind: "flange-cleats",
  cleat: { columnLegMm: 90, beamLegMm: 150, thicknessMm: 12, rootMm: 12, lengthMm: 180, steel: STEEL },
  isStiffened: false,
  bolts: { size: M24, grade: GRADE, gaugeMm: 100, distanceMm: 55 },
  beamBolts: { size: M24, grade: GRADE, gaugeMm: 90, rowsMm: [60, 120] },
  gapMm: 10,
  webCleats: { legMm: 90, thicknessMm: 8, lengthMm: 230 },
};

export const buildJoint = (side: Side, more: Partial<JointCase> = {}): JointCase => ({
  side,
  beam: { section: IPE_450, steel: STEEL, spanMm: 7500 },
  levelOffsetMm: 0,
  connection: END_PLATE,
  ...more,
});

/** A node with no load cases: the drawing asks for none. */
export const buildDrawingCase = (more: Partial<NodeCase> = {}): NodeCase => ({
  partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  column: {
    section: HE_300_A,
    steel: STEEL,
    endDistanceAboveMm: null,
    endDistanceBelowMm: null,
    storeyHeightMm: 3600,
  },
  joints: [buildJoint("left"), buildJoint("right")],
  loadCases: [],
  bracing: "unbraced",
  target: { utilisation: 1, stiffness: "any" },
  tStubModeOne: "method-1",
  triangularLimit: "always",
  flangeWelds: "directional",
  ...more,
});

export const STIFFENERS: MeasureCase = {
  kind: "transverse-stiffeners",
  levels: ["top", "bottom"],
  thicknessMm: 12,
  widthMm: 120,
  length: "full",
  clipMm: 20,
  steel: STEEL,
  flangeWeld: fillet(5),
  webWeld: fillet(4),
};
export const BARS: MeasureCase = {
  kind: "through-bars",
  levels: ["top"],
  size: M24,
  grade: GRADE,
  innerNuts: true,
};
export const WEB_PLATE: MeasureCase = {
  kind: "web-plates",
  sides: 1,
  thicknessMm: 12,
  widthMm: 208,
  heightMm: 590,
  steel: STEEL,
  weld: fillet(5),
};
export const BACKING: MeasureCase = {
  kind: "backing-plates",
  levels: ["top"],
  thicknessMm: 15,
  widthMm: 110,
  lengthMm: 200,
  steel: STEEL,
};
export const DIAGONAL: MeasureCase = {
  kind: "diagonal-stiffeners",
  arrangement: "single",
  towards: "left",
  thicknessMm: 12,
  widthMm: 120,
  steel: STEEL,
  weld: fillet(5),
};
export const HEAVIER: MeasureCase = { kind: "heavier-column", section: HE_300_B, steel: STEEL };
