import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Design shear strength of a fillet weld by the simplified method, N/mm2. EN 1993-1-8:2005, 4.5.3.3(3), Eq. (4.4). */
export const filletShearStrengthMpa = defineFormula({
  id: id("4.5.3.3/f_vw,d"),
  source: from("4.5.3.3(3), Eq. (4.4)"),
  symbols: { ultimateMpa: ["f_u", "N/mm2"], betaW: ["β_w", "1"], gammaM2: ["γ_M2", "1"] },
  result: ["f_vw,d", "N/mm2"],
  expression: "ultimateMpa / (sqrt(3) * betaW * gammaM2)",
  evaluate: (g) => g.ultimateMpa / (Math.sqrt(3) * g.betaW * g.gammaM2),
  // P398 (2013) gives 223 N/mm2 for S275.
  example: { given: { ultimateMpa: 410, betaW: 0.85, gammaM2: 1.25 }, gives: 223, relTol: 2.5e-3 },
});

/**
 * Design strength of a pair of fillet welds pulled square to their length, N/mm2 of throat, by the directional method.
 * EN 1993-1-8:2005, 4.5.3.2(6), Eq. (4.1) with sigma_perp = tau_perp.
 */
export const filletTransverseStrengthMpa = defineFormula({
  id: id("4.5.3.2/transverse"),
  source: from("4.5.3.2(6), Eq. (4.1), load square to the weld"),
  symbols: { ultimateMpa: ["f_u", "N/mm2"], betaW: ["β_w", "1"], gammaM2: ["γ_M2", "1"] },
  result: ["f_w,⊥,d", "N/mm2"],
  expression: "ultimateMpa / (sqrt(2) * betaW * gammaM2)",
  evaluate: (g) => g.ultimateMpa / (Math.SQRT2 * g.betaW * g.gammaM2),
  example: { given: { ultimateMpa: 500, betaW: 0.8, gammaM2: 1.25 }, gives: 500 / Math.SQRT2, relTol: 1e-12 },
});

/** Force that a run of fillet weld can take, N. EN 1993-1-8:2005, 4.5.3.3(2). */
export const weldForceN = defineFormula({
  id: id("4.5.3.3/F_w,Rd"),
  source: from("4.5.3.3(2)"),
  symbols: { strengthMpa: ["f_w,d", "N/mm2"], throatMm: ["a", "mm"], lengthMm: ["l_w", "mm"] },
  result: ["F_w,Rd", "N"],
  expression: "strengthMpa * throatMm * lengthMm",
  evaluate: (g) => g.strengthMpa * g.throatMm * g.lengthMm,
  limitBroken: (g) => (g.lengthMm <= 0 ? "no length is left for the weld" : null),
  example: { given: { strengthMpa: 200, throatMm: 5, lengthMm: 100 }, gives: 100_000, relTol: 1e-12 },
});

/** Effective breadth of a column flange under a beam flange welded to it, mm. EN 1993-1-8:2005, 4.10(2), Eq. (4.6). */
export const weldedFlangeBreadthMm = defineFormula({
  id: id("4.10/b_eff"),
  source: from("4.10(2), Eq. (4.6a) and (4.6b)"),
  symbols: {
    webThicknessMm: ["t_w", "mm"],
    rootMm: ["s", "mm"],
    flangeThicknessMm: ["t_f", "mm"],
    plateThicknessMm: ["t_p", "mm"],
    flangeYieldMpa: ["f_y,f", "N/mm2"],
    plateYieldMpa: ["f_y,p", "N/mm2"],
  },
  result: ["b_eff", "mm"],
  expression:
    "webThicknessMm + 2 * rootMm + 7 * min(flangeThicknessMm / plateThicknessMm * flangeYieldMpa / plateYieldMpa, 1) * flangeThicknessMm",
  evaluate: (g) =>
    g.webThicknessMm +
    2 * g.rootMm +
    7 *
      Math.min(((g.flangeThicknessMm / g.plateThicknessMm) * g.flangeYieldMpa) / g.plateYieldMpa, 1) *
      g.flangeThicknessMm,
  example: {
    given: {
      webThicknessMm: 10,
      rootMm: 12,
      flangeThicknessMm: 14,
      plateThicknessMm: 20,
      flangeYieldMpa: 275,
      plateYieldMpa: 275,
    },
    gives: 10 + 24 + 7 * 0.7 * 14,
    relTol: 1e-12,
  },
});

/** Least effective breadth without a stiffener, mm. EN 1993-1-8:2005, 4.10(3), Eq. (4.7). */
export const leastFlangeBreadthMm = defineFormula({
  id: id("4.10/least b_eff"),
  source: from("4.10(3), Eq. (4.7)"),
  symbols: {
    plateYieldMpa: ["f_y,p", "N/mm2"],
    plateUltimateMpa: ["f_u,p", "N/mm2"],
    plateWidthMm: ["b_p", "mm"],
  },
  result: ["b_eff,min", "mm"],
  expression: "plateYieldMpa / plateUltimateMpa * plateWidthMm",
  evaluate: (g) => (g.plateYieldMpa / g.plateUltimateMpa) * g.plateWidthMm,
  example: {
    given: { plateYieldMpa: 300, plateUltimateMpa: 400, plateWidthMm: 200 },
    gives: 150,
    relTol: 1e-12,
  },
});
