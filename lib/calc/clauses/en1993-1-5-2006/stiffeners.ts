import { defineFormula } from "../../trace/define-formula";
import type { FormulaSource } from "../../trace/trace";

const from = (ref: string): FormulaSource => ({ document: "EN 1993-1-5", edition: "2006", ref });
const id = (tail: string): string => `en1993-1-5:2006/${tail}`;

const pair = {
  widthMm: ["b_sg", "mm"],
  thicknessMm: ["t_s", "mm"],
  webThicknessMm: ["t_w", "mm"],
  webLengthMm: ["2 · 15 ε t_w", "mm"],
} as const;
const examplePair = { widthMm: 80, thicknessMm: 10, webThicknessMm: 10, webLengthMm: 300 };

/** Area of a pair of stiffeners with 15 eps t_w of web on either side, mm2. EN 1993-1-5:2006, 9.1(2). */
export const cruciformAreaMm2 = defineFormula({
  id: id("9.1/area"),
  source: from("9.1(2), Figure 9.1"),
  symbols: pair,
  result: ["A_s,eff", "mm2"],
  expression: "2 * widthMm * thicknessMm + (webLengthMm + thicknessMm) * webThicknessMm",
  evaluate: (g) => 2 * g.widthMm * g.thicknessMm + (g.webLengthMm + g.thicknessMm) * g.webThicknessMm,
  example: { given: examplePair, gives: 1600 + 310 * 10, relTol: 1e-12 },
});

/** Second moment of that cruciform about the plane of the web, mm4. EN 1993-1-5:2006, 9.1(2). */
export const cruciformInertiaMm4 = defineFormula({
  id: id("9.1/inertia"),
  source: from("9.1(2), Figure 9.1"),
  symbols: pair,
  result: ["I_s", "mm4"],
  expression: "thicknessMm * (2 * widthMm + webThicknessMm)^3 / 12 + webLengthMm * webThicknessMm^3 / 12",
  evaluate: (g) =>
    (g.thicknessMm * (2 * g.widthMm + g.webThicknessMm) ** 3) / 12 +
    (g.webLengthMm * g.webThicknessMm ** 3) / 12,
  example: { given: examplePair, gives: (10 * 170 ** 3) / 12 + (300 * 1000) / 12, relTol: 1e-12 },
});

/** Buckling resistance of the cruciform, N. EN 1993-1-5:2006, 9.4(2) with EN 1993-1-1, 6.3.1. */
export const cruciformBucklingN = defineFormula({
  id: id("9.4/N_b,Rd"),
  source: from("9.4(2)"),
  symbols: {
    reduction: ["χ", "1"],
    areaMm2: ["A_s,eff", "mm2"],
    yieldMpa: ["f_y", "N/mm2"],
    gammaM1: ["γ_M1", "1"],
  },
  result: ["N_b,Rd", "N"],
  expression: "reduction * areaMm2 * yieldMpa / gammaM1",
  evaluate: (g) => (g.reduction * g.areaMm2 * g.yieldMpa) / g.gammaM1,
  example: {
    given: { reduction: 0.5, areaMm2: 4000, yieldMpa: 275, gammaM1: 1.1 },
    gives: 500_000,
    relTol: 1e-12,
  },
});

/** Largest outstand that cannot buckle by twisting, mm. EN 1993-1-5:2006, 9.2.1(8). */
export const outstandLimitMm = defineFormula({
  id: id("9.2.1/outstand"),
  source: from("9.2.1(8)"),
  symbols: { thicknessMm: ["t_s", "mm"], epsilon: ["ε", "1"] },
  result: ["b_sg,max", "mm"],
  expression: "14 * epsilon * thicknessMm",
  evaluate: (g) => 14 * g.epsilon * g.thicknessMm,
  example: { given: { thicknessMm: 10, epsilon: 1 }, gives: 140, relTol: 1e-12 },
});

/** Length of web that works with a stiffener, both sides together, mm. EN 1993-1-5:2006, 9.1(2). */
export const cruciformWebMm = defineFormula({
  id: id("9.1/web length"),
  source: from("9.1(2), Figure 9.1"),
  symbols: { epsilon: ["ε", "1"], webThicknessMm: ["t_w", "mm"] },
  result: ["2 · 15 ε t_w", "mm"],
  expression: "30 * epsilon * webThicknessMm",
  evaluate: (g) => 30 * g.epsilon * g.webThicknessMm,
  example: { given: { epsilon: 1, webThicknessMm: 10 }, gives: 300, relTol: 1e-12 },
});

/** Yielding of a stiffener pair at the flange with the web that the force spreads into, N. */
export const stiffenerCrushingN = defineFormula({
  id: id("crushing with web"),
  source: {
    document: "SCI/BCSA P398",
    edition: "2013",
    ref: "compression stiffener, cross-section at the flange (example C.2)",
  },
  symbols: {
    netAreaMm2: ["A_s,net", "mm2"],
    stiffenerYieldMpa: ["f_y,s", "N/mm2"],
    breadthMm: ["b_eff", "mm"],
    webThicknessMm: ["t_wc", "mm"],
    webYieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["N_c,Rd", "N"],
  expression: "(netAreaMm2 * stiffenerYieldMpa + breadthMm * webThicknessMm * webYieldMpa) / gammaM0",
  evaluate: (g) =>
    (g.netAreaMm2 * g.stiffenerYieldMpa + g.breadthMm * g.webThicknessMm * g.webYieldMpa) / g.gammaM0,
  // P398 (2013), example C.2, gives 1595 kN.
  example: {
    given: {
      netAreaMm2: 2 * 95 * 15,
      stiffenerYieldMpa: 265,
      breadthMm: 248,
      webThicknessMm: 12.8,
      webYieldMpa: 265,
      gammaM0: 1,
    },
    gives: 1_595_000,
    relTol: 1e-3,
  },
});

/** Area of a stiffener pair that reaches the flange past its corner clips, mm2. */
export const stiffenerNetAreaMm2 = defineFormula({
  id: id("net area"),
  source: {
    document: "SCI/BCSA P398",
    edition: "2013",
    ref: "net area of stiffeners at the flange (examples C.2 and F.1)",
  },
  symbols: { widthMm: ["b_sg", "mm"], clipMm: ["corner clip", "mm"], thicknessMm: ["t_s", "mm"] },
  result: ["A_s,net", "mm2"],
  expression: "2 * (widthMm - clipMm) * thicknessMm",
  evaluate: (g) => 2 * (g.widthMm - g.clipMm) * g.thicknessMm,
  limitBroken: (g) =>
    g.clipMm >= g.widthMm ? "the corner clip leaves nothing of the stiffener at the flange" : null,
  example: { given: { widthMm: 110, clipMm: 15, thicknessMm: 15 }, gives: 2850, relTol: 1e-12 },
});

/** Yield force of a plate's area, N. EN 1993-1-1:2005, 6.2.3(2) a). */
export const yieldForceN = defineFormula({
  id: "en1993-1-1:2005/6.2.3/N_pl,Rd",
  source: { document: "EN 1993-1-1", edition: "2005", ref: "6.2.3(2) a)" },
  symbols: { areaMm2: ["A", "mm2"], yieldMpa: ["f_y", "N/mm2"], gammaM0: ["γ_M0", "1"] },
  result: ["N_pl,Rd", "N"],
  expression: "areaMm2 * yieldMpa / gammaM0",
  evaluate: (g) => (g.areaMm2 * g.yieldMpa) / g.gammaM0,
  example: { given: { areaMm2: 2000, yieldMpa: 275, gammaM0: 1 }, gives: 550_000, relTol: 1e-12 },
});

/** Shear of the column web along both sides of a partial-depth stiffener's web weld, N. EN 1993-1-1:2005, 6.2.6(2). */
export const twoShearPlanesN = defineFormula({
  id: "en1993-1-1:2005/6.2.6/two shear planes",
  source: {
    document: "EN 1993-1-1",
    edition: "2005",
    ref: "6.2.6(2), Eq. (6.18), two planes along the weld",
  },
  symbols: {
    lengthMm: ["l_w", "mm"],
    thicknessMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["V_pl,Rd", "N"],
  expression: "2 * lengthMm * thicknessMm * yieldMpa / (sqrt(3) * gammaM0)",
  evaluate: (g) => (2 * g.lengthMm * g.thicknessMm * g.yieldMpa) / (Math.sqrt(3) * g.gammaM0),
  example: {
    given: { lengthMm: 100, thicknessMm: 10, yieldMpa: 275, gammaM0: 1 },
    gives: 550_000 / Math.sqrt(3),
    relTol: 1e-12,
  },
});
