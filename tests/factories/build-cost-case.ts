/** A node, measures and shop figures for the tests of the cost core; every number plain and whole. */
import type {
  EndPlateConnection,
  FastenerGrade,
  FastenerSize,
  ISection,
  JointCase,
  MeasureCase,
  NodeCase,
  Side,
  Steel,
  Weld,
} from "@/lib/calc/node";
import type { FabricationCase, RateBook, ShopPrices } from "@/lib/cost";
import { loadSeedPrices } from "@/seeders/data/load-prices";

export const S355: Steel = { grade: "S355", yieldMpa: 355, ultimateMpa: 490, betaW: 0.9 };

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
  designation: "HE 300 B",
  make: "rolled",
  depthMm: 300,
  widthMm: 300,
  webThicknessMm: 11,
  flangeThicknessMm: 19,
  rootMm: 27,
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
export const GRADE_10_9: FastenerGrade = { name: "10.9", yieldMpa: 900, ultimateMpa: 1000, alphaV: 0.5 };

export const fillet = (throatMm: number): Weld => ({ kind: "fillet", throatMm });

function endPlate(): EndPlateConnection {
  return {
    kind: "end-plate",
    plate: {
      thicknessMm: 20,
      widthMm: 200,
      extensionTopMm: 90,
      extensionBottomMm: 30,
      steel: S355,
      hasStiffenedExtension: false,
    },
    // Two rows at the top flange, one at the bottom.
    bolts: {
      size: M24,
      grade: GRADE_10_9,
      gaugeMm: 120,
      rowsMm: [-45, 65, 385],
      perRow: 2,
      preloaded: false,
    },
    welds: { topFlange: fillet(8), bottomFlange: fillet(6), web: fillet(5) },
  };
}

export const buildJoint = (side: Side, connection: JointCase["connection"] = endPlate()): JointCase => ({
  side,
  beam: { section: IPE_450, steel: S355, spanMm: 7500 },
  levelOffsetMm: 0,
  connection,
});

/** An HE 300 A column with IPE 450 beams. Loads are none of the cost core's business. */
export function buildNode(sides: readonly Side[] = ["left", "right"]): NodeCase {
  return {
    partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
    column: {
      section: HE_300_A,
      steel: S355,
      endDistanceAboveMm: null,
      endDistanceBelowMm: null,
      storeyHeightMm: 3600,
    },
    joints: sides.map((side) => buildJoint(side)),
    loadCases: [],
    bracing: "unbraced",
    target: { utilisation: 1, stiffness: "any" },
    tStubModeOne: "method-1",
    triangularLimit: "always",
    flangeWelds: "directional",
  };
}

export const buildFabrication = (changes: Partial<FabricationCase> = {}): FabricationCase => ({
  quantity: 12,
  liftLengthMm: 10_800,
  nodesPerLift: 3,
  executionClass: 2,
  coating: "none",
  ...changes,
});

type MeasureOf<K extends MeasureCase["kind"]> = Extract<MeasureCase, { kind: K }>;

export const stiffeners = (
  changes: Partial<MeasureOf<"transverse-stiffeners">> = {},
): MeasureOf<"transverse-stiffeners"> => ({
  kind: "transverse-stiffeners",
  levels: ["top", "bottom"],
  thicknessMm: 12,
  widthMm: 120,
  length: "full",
  clipMm: 30,
  steel: S355,
  flangeWeld: fillet(6),
  webWeld: fillet(4),
  ...changes,
});
export const diagonals = (
  changes: Partial<MeasureOf<"diagonal-stiffeners">> = {},
): MeasureOf<"diagonal-stiffeners"> => ({
  kind: "diagonal-stiffeners",
  arrangement: "single",
  towards: "left",
  thicknessMm: 12,
  widthMm: 120,
  steel: S355,
  weld: fillet(5),
  ...changes,
});
export const webPlates = (changes: Partial<MeasureOf<"web-plates">> = {}): MeasureOf<"web-plates"> => ({
  kind: "web-plates",
  sides: 1,
  thicknessMm: 10,
  widthMm: 200,
  heightMm: 700,
  steel: S355,
  weld: fillet(7),
  ...changes,
});
export const backingPlates = (
  changes: Partial<MeasureOf<"backing-plates">> = {},
): MeasureOf<"backing-plates"> => ({
  kind: "backing-plates",
  levels: ["top"],
  thicknessMm: 12,
  widthMm: 100,
  lengthMm: 250,
  steel: S355,
  ...changes,
});
export const throughBars = (changes: Partial<MeasureOf<"through-bars">> = {}): MeasureOf<"through-bars"> => ({
  kind: "through-bars",
  levels: ["top"],
  size: M24,
  grade: GRADE_10_9,
  innerNuts: true,
  ...changes,
});
export const heavierColumn = (section: ISection = HE_300_B): MeasureOf<"heavier-column"> => ({
  kind: "heavier-column",
  section,
  steel: S355,
});

/** One measure of every kind. */
export const EVERY_MEASURE: readonly MeasureCase[] = [
  stiffeners(),
  diagonals(),
  webPlates(),
  backingPlates(),
  throughBars(),
  heavierColumn(),
];

/** The default figures with every rate given by `rateOf`, the same low, likely and high. */
export function pricesWithRates(rateOf: (item: string, likely: number) => number): ShopPrices {
  const seed = loadSeedPrices();
  const lines: RateBook["lines"] = Object.fromEntries(
    Object.entries(seed.rateBook.lines).map(([item, line]) => {
      const rate = rateOf(item, line.likely);
      return [item, { ...line, low: rate, likely: rate, high: rate }];
    }),
  );
  return { ...seed, rateBook: { ...seed.rateBook, lines } };
}

/** The default figures with one rule's run minutes worked out by another of its formulas. */
export function pricesWithFormula(ruleKey: string, formulaKey: string): ShopPrices {
  const seed = loadSeedPrices();
  const rules = seed.timeTable.rules.map((rule) =>
    rule.key === ruleKey && rule.runMinutes !== null
      ? { ...rule, runMinutes: { ...rule.runMinutes, chosen: formulaKey } }
      : rule,
  );
  return { ...seed, timeTable: { ...seed.timeTable, rules } };
}
