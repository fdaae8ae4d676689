import type { ComponentId } from "@/lib/calc/result";
import type { Step } from "@/lib/calc/trace/trace";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import type {
  ComponentDocument,
  EstimateDocument,
  EvaluatedOptionDocument,
  JointDocument,
  OutsideScopeOptionDocument,
  ResultDocument,
} from "@/lib/schemas/result-document";

/** A comparison for tests of screens. Every figure in it is invented and adds up to nothing. */

const connection = {
  kind: "end-plate" as const,
  plate: { steel: "S355", thickness: 20, width: 200, extensionTop: 90, extensionBottom: 30 },
  bolts: { size: "M24", grade: "10.9", gauge: 120, rows: [-45, 65, 385] },
  welds: { topFlange: 8, bottomFlange: 6, web: 5 },
};
const side = { beam: { section: "IPE 450", steel: "S355", span: 7500 }, connection };
const actions = { moment: 210, axialForce: 0, shear: 140 };
const column = { axialForce: 1100, momentAbove: 40, momentBelow: -38, shearAbove: 12, shearBelow: -12 };

export const buildComparedNode = (changes: Partial<NodeDocument> = {}): NodeDocument => ({
  reference: "C4 / level 2",
  basis: "EN 1993-1-8:2005",
  partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  column: { section: "HE 300 A", steel: "S355", storeyHeight: 4200 },
  left: side,
  right: side,
  loadCases: [
    { name: "ULS 1", left: actions, right: actions, column },
    { name: "ULS 2", left: { ...actions, moment: -120 }, right: actions, column },
    { name: "ULS 3", left: actions, right: { ...actions, moment: -160 }, column },
  ],
  frame: { bracing: "unbraced" },
  target: { utilisation: 1, stiffness: "any" },
  quantity: 12,
  ...changes,
});

export const buildStep = (changes: Partial<Step> = {}): Step => ({
  id: "test/V",
  symbol: "V_wp,Rd",
  expression: "0.9 * yieldMpa * shearAreaMm2 / (sqrt(3) * gammaM0)",
  inputs: { yieldMpa: 355, shearAreaMm2: 3728, gammaM0: 1 },
  symbols: { yieldMpa: ["f_y,wc", "N/mm2"], shearAreaMm2: ["A_vc", "mm2"], gammaM0: ["γ_M0", "1"] },
  value: 687_700,
  unit: "N",
  source: { document: "EN 1993-1-8", edition: "2005", ref: "6.2.6.1(2), Eq. (6.7)" },
  ...changes,
});

/** A check of one component: utilisation as given, resistance 500 kN. */
export const buildCheck = (
  component: ComponentId,
  utilisation: number,
  changes: Partial<ComponentDocument> = {},
): ComponentDocument => ({
  component,
  side: "right",
  loadCase: "ULS 3",
  clause: "EN 1993-1-8:2005, 6.2.6",
  unit: "kN",
  demand: 500 * utilisation,
  resistance: 500,
  utilisation,
  ...changes,
});

export const buildJoint = (changes: Partial<JointDocument> = {}): JointDocument => ({
  side: "left",
  loadCase: "ULS 1",
  momentResistance: 302.4,
  initialStiffness: 84_912,
  secantStiffness: 52_000,
  leverArm: 412.3,
  stiffnessClass: "semi-rigid",
  strengthClass: "partial-strength",
  rows: [
    { row: 1, force: 310.2 },
    { row: 2, force: 288.4 },
  ],
  rigidFrom: 120_000,
  rotationCapacity: "enough",
  stiffnessExponent: 2.7,
  ...changes,
});

export const buildEstimate = (cost: number, changes: Partial<EstimateDocument> = {}): EstimateDocument => ({
  cost,
  currency: "EUR",
  minutesByTrade: cost === 0 ? {} : { welder: cost / 6, fitter: cost / 9 },
  shopMinutes: cost / 3,
  siteMinutes: cost / 50,
  mass: cost / 24,
  carbon: cost / 7,
  costForQuantity: cost * 12,
  costByCategory: {
    labour: cost * 0.6,
    machine: cost * 0.1,
    material: cost * 0.25,
    consumables: cost * 0.05,
    column: 0,
    inspection: 0,
    site: 0,
    drawing: 0,
  },
  lines:
    cost === 0
      ? []
      : [
          {
            operation: "weld stiffeners",
            category: "labour",
            trade: "welder",
            quantity: 1.84,
            quantityUnit: "m",
            minutes: cost / 6,
            cost: cost * 0.6,
            source: "time table 2026-11, shop to confirm",
          },
          {
            operation: "stiffener plates",
            category: "material",
            trade: null,
            quantity: 11.2,
            quantityUnit: "kg",
            minutes: 0,
            cost: cost * 0.4,
            source: "rate book 2026-11",
          },
        ],
  ...changes,
});

interface OptionFigures {
  readonly key: string;
  readonly name: string;
  readonly measures?: readonly MeasureInput[];
  readonly checks: readonly ComponentDocument[];
  readonly cost?: number;
  readonly rank?: number | null;
  readonly notRanked?: string | null;
}

/** An option that passes exactly when its worst check does. */
export function buildOption(
  figures: OptionFigures,
  changes: Partial<EvaluatedOptionDocument> = {},
): EvaluatedOptionDocument {
  const worst = [...figures.checks].sort((a, b) => b.utilisation - a.utilisation)[0];
  if (!worst) throw new Error("Give the option at least one check.");
  return {
    key: figures.key,
    name: figures.name,
    measures: [...(figures.measures ?? [])],
    passes: worst.utilisation <= 1,
    governing: {
      component: worst.component,
      side: worst.side,
      loadCase: worst.loadCase,
      utilisation: worst.utilisation,
    },
    stiffnessReached: true,
    connectionFailure: null,
    sizing: null,
    cautions: [],
    joints: [buildJoint(), buildJoint({ side: "right", loadCase: "ULS 3", initialStiffness: 71_433 })],
    components: [...figures.checks],
    estimate: buildEstimate(figures.cost ?? 0),
    rank: figures.rank ?? null,
    notRanked: figures.notRanked ?? ((figures.rank ?? null) === null ? "fails" : null),
    ...changes,
  };
}

export const buildOutsideScopeOption = (
  changes: Partial<OutsideScopeOptionDocument> = {},
): OutsideScopeOptionDocument => ({
  key: "web-plate",
  name: "Web plate, one side",
  measures: [
    { kind: "web-plates", sides: 1, thickness: 12, width: 208, height: 590, steel: "S355", weld: 6 },
  ],
  outsideScope: { reason: "d_c / t_wc is above 69 ε, so the panel would buckle in shear before it yields." },
  rank: null,
  notRanked: "outside scope",
  ...changes,
});

export const stiffeners: Extract<MeasureInput, { kind: "transverse-stiffeners" }> = {
  kind: "transverse-stiffeners",
  levels: ["top", "bottom"],
  thickness: 12,
  width: 120,
  length: "full",
  clip: 30,
  steel: "S355",
  flangeWeld: 6,
  webWeld: 5,
};
export const bars: MeasureInput = {
  kind: "through-bars",
  levels: ["top"],
  size: "M24",
  grade: "10.9",
  innerNuts: true,
};

const panel = (shear: number, compression: number, tension: number, bending: number): ComponentDocument[] => [
  buildCheck("column-web-shear", shear, { loadCase: "ULS 2" }),
  buildCheck("column-web-compression", compression),
  buildCheck("column-web-compression", compression * 0.8, { side: "left", loadCase: "ULS 1" }),
  buildCheck("column-web-tension", tension, { side: "left", loadCase: "ULS 1" }),
  buildCheck("column-flange-bending", bending, { side: "left", loadCase: "ULS 1", row: 1 }),
  buildCheck("end-plate-bending", 0.61, { side: "left", loadCase: "ULS 1", row: 1 }),
  buildCheck("bolt-tension", 0.55, { side: "left", loadCase: "ULS 1", row: 1 }),
];

/** Six options: one fails bare, one fails with bars, three rank, one is outside scope. */
export function buildResultDocument(changes: Partial<ResultDocument> = {}): ResultDocument {
  return {
    node: buildComparedNode(),
    basis: "EN 1993-1-8:2005",
    engine: "0.1.0",
    options: [
      buildOption({ key: "bare", name: "Bare column", checks: panel(0.91, 1.31, 1.07, 1.12) }),
      buildOption({
        key: "bars-top",
        name: "Bars at top",
        measures: [bars],
        checks: [...panel(0.91, 1.24, 0.68, 0.71), buildCheck("bar-tension", 0.62)],
        cost: 196,
      }),
      buildOption(
        {
          key: "bars-stiffeners",
          name: "Bars at top, stiffeners at bottom",
          measures: [bars, { ...stiffeners, levels: ["bottom"] }],
          checks: [
            ...panel(0.91, 0.62, 0.68, 0.71),
            buildCheck("bar-tension", 0.62),
            buildCheck("transverse-stiffener", 0.44),
          ],
          cost: 318,
          rank: 1,
        },
        {
          cautions: [
            "Threaded bars with inner nuts are outside the clauses of EN 1993-1-8: a mechanics model stands in.",
          ],
        },
      ),
      buildOption({
        key: "stiffeners",
        name: "Stiffeners top and bottom",
        measures: [stiffeners],
        checks: [...panel(0.87, 0.98, 0.57, 0.74), buildCheck("transverse-stiffener", 0.71)],
        cost: 402,
        rank: 2,
      }),
      buildOutsideScopeOption(),
      buildOption({
        key: "heavier",
        name: "Heavier column",
        measures: [{ kind: "heavier-column", section: "HE 300 B" }],
        checks: panel(0.6, 0.86, 0.64, 0.61),
        cost: 618,
        rank: 3,
      }),
    ],
    ...changes,
  };
}
