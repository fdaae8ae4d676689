import type { FastenerSize, ISection, JointCase, NodeCase, Side, Steel } from "@/lib/calc/node";
import type { Stock } from "@/lib/propose/stock";

/** A node and a stock in plain numbers for the tests of the proposal; no catalogue is read. */

export const S355: Steel = { grade: "S355", yieldMpa: 355, ultimateMpa: 470, betaW: 0.9 };

export const HE_300_A: ISection = {
  designation: "HE 300 A",
  make: "rolled",
  depthMm: 290,
  widthMm: 300,
  webThicknessMm: 8.5,
  flangeThicknessMm: 14,
  rootMm: 27,
};

const IPE_450: ISection = {
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

const WELDS = {
  topFlange: { kind: "fillet", throatMm: 8 },
  bottomFlange: { kind: "fillet", throatMm: 6 },
  web: { kind: "fillet", throatMm: 5 },
} as const;

export const boltedJoint = (side: Side): JointCase => ({
  side,
  beam: { section: IPE_450, steel: S355, spanMm: 7500 },
  levelOffsetMm: 0,
  connection: {
    kind: "end-plate",
    plate: {
      thicknessMm: 20,
      widthMm: 200,
      extensionTopMm: 90,
      extensionBottomMm: 30,
      steel: S355,
      hasStiffenedExtension: false,
    },
    bolts: { size: M24, grade: GRADE, gaugeMm: 120, rowsMm: [-45, 65, 385], perRow: 2, preloaded: false },
    welds: WELDS,
  },
});

export const weldedJoint = (side: Side): JointCase => ({
  ...boltedJoint(side),
  connection: { kind: "welded", welds: WELDS },
});

/** Moments in kNm, one pair a load case; a side without a joint is left out of the case. */
export function sampleNode(
  joints: readonly JointCase[],
  momentsKnm: readonly (readonly [left: number, right: number])[],
): NodeCase {
  const actionsOf = (side: Side, momentKnm: number) =>
    joints.some((joint) => joint.side === side)
      ? { momentNmm: momentKnm * 1e6, axialForceN: 0, shearN: 100e3 }
      : null;
  return {
    partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
    column: {
      section: HE_300_A,
      steel: S355,
      endDistanceAboveMm: null,
      endDistanceBelowMm: null,
      storeyHeightMm: 3600,
    },
    joints,
    loadCases: momentsKnm.map(([left, right], index) => ({
      name: `ULS ${index + 1}`,
      left: actionsOf("left", left),
      right: actionsOf("right", right),
      column: { axialForceN: 900e3, momentAboveNmm: 0, momentBelowNmm: 0, shearAboveN: 0, shearBelowN: 0 },
    })),
    bracing: "unbraced",
    target: { utilisation: 1, stiffness: "any" },
    tStubModeOne: "method-2",
    triangularLimit: "always",
    flangeWelds: "directional",
  };
}

export const STOCK: Stock = {
  plates: [6, 8, 10, 12, 15, 20, 25, 30].map((thicknessMm) => ({ thicknessMm, steel: S355 })),
  throatsMm: [3, 4, 5, 6, 8, 10],
  bars: [{ size: M24, grade: GRADE }],
  columns: [
    { section: { ...HE_300_A, designation: "HE 320 A", depthMm: 310 }, steel: S355, massKgPerM: 97.6 },
  ],
};
