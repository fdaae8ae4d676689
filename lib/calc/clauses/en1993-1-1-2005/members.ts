import { defineFormula } from "../../trace/define-formula";
import type { FormulaSource } from "../../trace/trace";

const from = (ref: string): FormulaSource => ({ document: "EN 1993-1-1", edition: "2005", ref });
const id = (tail: string): string => `en1993-1-1:2005/${tail}`;

/** Modulus of elasticity of structural steel, N/mm2. EN 1993-1-1:2005, 3.2.6(1). */
export const ELASTIC_MODULUS_MPA = 210_000;

/** Strain parameter. EN 1993-1-1:2005, Table 5.2. */
export const epsilonOf = defineFormula({
  id: id("table-5.2/epsilon"),
  source: from("Table 5.2"),
  symbols: { yieldMpa: ["f_y", "N/mm2"] },
  result: ["ε", "1"],
  expression: "sqrt(235 / yieldMpa)",
  evaluate: ({ yieldMpa }) => Math.sqrt(235 / yieldMpa),
  example: { given: { yieldMpa: 940 }, gives: 0.5, relTol: 1e-12 },
});

/**
 * Shear area of a rolled I or H section loaded parallel to its web, mm2, not below eta h_w t_w with eta = 1.0.
 * EN 1993-1-1:2005, 6.2.6(3) a).
 */
export const rolledShearAreaMm2 = defineFormula({
  id: id("6.2.6/A_v rolled"),
  source: from("6.2.6(3) a)"),
  symbols: {
    areaMm2: ["A", "mm2"],
    widthMm: ["b", "mm"],
    flangeThicknessMm: ["t_f", "mm"],
    webThicknessMm: ["t_w", "mm"],
    rootMm: ["r", "mm"],
    depthMm: ["h", "mm"],
  },
  result: ["A_vc", "mm2"],
  expression:
    "max(areaMm2 - 2 * widthMm * flangeThicknessMm + (webThicknessMm + 2 * rootMm) * flangeThicknessMm, (depthMm - 2 * flangeThicknessMm) * webThicknessMm)",
  evaluate: (g) =>
    Math.max(
      g.areaMm2 -
        2 * g.widthMm * g.flangeThicknessMm +
        (g.webThicknessMm + 2 * g.rootMm) * g.flangeThicknessMm,
      (g.depthMm - 2 * g.flangeThicknessMm) * g.webThicknessMm,
    ),
  example: {
    given: {
      areaMm2: 5000,
      widthMm: 100,
      flangeThicknessMm: 10,
      webThicknessMm: 10,
      rootMm: 10,
      depthMm: 220,
    },
    gives: 5000 - 2000 + 300,
    relTol: 1e-12,
  },
});

/** Shear area of a welded I section, mm2, with eta = 1.0. EN 1993-1-1:2005, 6.2.6(3) d). */
export const weldedShearAreaMm2 = defineFormula({
  id: id("6.2.6/A_v welded"),
  source: from("6.2.6(3) d)"),
  symbols: {
    depthMm: ["h", "mm"],
    flangeThicknessMm: ["t_f", "mm"],
    webThicknessMm: ["t_w", "mm"],
  },
  result: ["A_vc", "mm2"],
  expression: "(depthMm - 2 * flangeThicknessMm) * webThicknessMm",
  evaluate: (g) => (g.depthMm - 2 * g.flangeThicknessMm) * g.webThicknessMm,
  example: { given: { depthMm: 320, flangeThicknessMm: 10, webThicknessMm: 8 }, gives: 2400, relTol: 1e-12 },
});

/** Non-dimensional slenderness of a strut. EN 1993-1-1:2005, 6.3.1.3(1), class 1 to 3. */
export const strutSlenderness = defineFormula({
  id: id("6.3.1.3/slenderness"),
  source: from("6.3.1.3(1), Eq. (6.50)"),
  symbols: {
    bucklingLengthMm: ["L_cr", "mm"],
    gyrationMm: ["i", "mm"],
    epsilon: ["ε", "1"],
  },
  result: ["λ̄", "1"],
  expression: "bucklingLengthMm / (gyrationMm * 93.9 * epsilon)",
  evaluate: (g) => g.bucklingLengthMm / (g.gyrationMm * 93.9 * g.epsilon),
  example: { given: { bucklingLengthMm: 939, gyrationMm: 10, epsilon: 1 }, gives: 1, relTol: 1e-12 },
});

/**
 * Flexural buckling reduction by curve c (alpha = 0.49); 1 up to a slenderness of 0.2.
 * EN 1993-1-1:2005, 6.3.1.2, Eq. (6.49), Table 6.1.
 */
export const curveCReduction = defineFormula({
  id: id("6.3.1.2/chi curve c"),
  source: from("6.3.1.2, Eq. (6.49), curve c"),
  symbols: { slenderness: ["λ̄", "1"] },
  result: ["χ", "1"],
  expression:
    "slenderness <= 0.2 ? 1 : 1 / (0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness^2) + sqrt((0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness^2))^2 - slenderness^2))",
  evaluate: ({ slenderness }) => {
    if (slenderness <= 0.2) return 1;
    const phi = 0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness ** 2);
    return 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
  },
  // Handbook value of curve c at 1.0: 0.540.
  example: { given: { slenderness: 1 }, gives: 0.54, relTol: 1e-3 },
});

/** Resistance to bending of a class 1 or 2 section. EN 1993-1-1:2005, 6.2.5(2), Eq. (6.13). */
export const bendingResistanceNmm = defineFormula({
  id: id("6.2.5/M_c,Rd"),
  source: from("6.2.5(2), Eq. (6.13) and (6.14)"),
  symbols: { modulusMm3: ["W", "mm3"], yieldMpa: ["f_y", "N/mm2"], gammaM0: ["γ_M0", "1"] },
  result: ["M_c,Rd", "Nmm"],
  expression: "modulusMm3 * yieldMpa / gammaM0",
  evaluate: (g) => (g.modulusMm3 * g.yieldMpa) / g.gammaM0,
  example: { given: { modulusMm3: 1_000_000, yieldMpa: 235, gammaM0: 1 }, gives: 235e6, relTol: 1e-12 },
});

/**
 * Class of an I section in bending about the major axis (1 and 2 are told apart nowhere here).
 * EN 1993-1-1:2005, Table 5.2, sheets 1 and 2.
 *
 * @returns 2 (plastic modulus may be used), 3 (elastic) or 4 (local buckling).
 */
export function bendingClass(given: {
  readonly outstandMm: number;
  readonly flangeThicknessMm: number;
  readonly webDepthMm: number;
  readonly webThicknessMm: number;
  readonly epsilon: number;
}): 2 | 3 | 4 {
  const flange = given.outstandMm / given.flangeThicknessMm / given.epsilon;
  const web = given.webDepthMm / given.webThicknessMm / given.epsilon;
  if (flange <= 10 && web <= 83) return 2;
  return flange <= 14 && web <= 124 ? 3 : 4;
}
