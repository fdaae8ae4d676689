import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Beam flange and web in compression, N. 6.2.6.7(1), Eq. (6.21). */
export const beamFlangeCompressionN = defineFormula({
  id: id("6.2.6.7/F_c,fb,Rd"),
  source: from("6.2.6.7(1), Eq. (6.21)"),
  symbols: { momentNmm: ["M_c,Rd", "Nmm"], depthMm: ["h", "mm"], flangeThicknessMm: ["t_fb", "mm"] },
  result: ["F_c,fb,Rd", "N"],
  expression: "momentNmm / (depthMm - flangeThicknessMm)",
  evaluate: (g) => g.momentNmm / (g.depthMm - g.flangeThicknessMm),
  example: {
    given: { momentNmm: 5e8, depthMm: 515, flangeThicknessMm: 15 },
    gives: 1_000_000,
    relTol: 1e-12,
  },
});

/** The same for a beam deeper than 600 mm: the web may give 20 % at most, N. 6.2.6.7(1). */
export const deepBeamCompressionN = defineFormula({
  id: id("6.2.6.7/F_c,fb,Rd deep"),
  source: from("6.2.6.7(1), beams deeper than 600 mm"),
  symbols: {
    momentNmm: ["M_c,Rd", "Nmm"],
    depthMm: ["h", "mm"],
    flangeThicknessMm: ["t_fb", "mm"],
    widthMm: ["b_fb", "mm"],
    yieldMpa: ["f_y,fb", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_c,fb,Rd", "N"],
  expression:
    "min(momentNmm / (depthMm - flangeThicknessMm), widthMm * flangeThicknessMm * yieldMpa / (0.8 * gammaM0))",
  evaluate: (g) =>
    Math.min(
      g.momentNmm / (g.depthMm - g.flangeThicknessMm),
      (g.widthMm * g.flangeThicknessMm * g.yieldMpa) / (0.8 * g.gammaM0),
    ),
  example: {
    given: { momentNmm: 1e9, depthMm: 620, flangeThicknessMm: 20, widthMm: 200, yieldMpa: 240, gammaM0: 1 },
    gives: 1_200_000,
    relTol: 1e-12,
  },
});

/** Beam web in tension, N. 6.2.6.8(1), Eq. (6.22). */
export const beamWebTensionN = defineFormula({
  id: id("6.2.6.8/F_t,wb,Rd"),
  source: from("6.2.6.8(1), Eq. (6.22)"),
  symbols: {
    breadthMm: ["b_eff,t,wb", "mm"],
    thicknessMm: ["t_wb", "mm"],
    yieldMpa: ["f_y,wb", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_t,wb,Rd", "N"],
  expression: "breadthMm * thicknessMm * yieldMpa / gammaM0",
  evaluate: (g) => (g.breadthMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
  example: {
    given: { breadthMm: 200, thicknessMm: 10, yieldMpa: 275, gammaM0: 1 },
    gives: 550_000,
    relTol: 1e-12,
  },
});

/** Column flange under a welded beam flange without a stiffener, N. 6.2.6.4.3(1), Eq. (6.20). */
export const weldedFlangeBendingN = defineFormula({
  id: id("6.2.6.4.3/F_fc,Rd"),
  source: from("6.2.6.4.3(1), Eq. (6.20)"),
  symbols: {
    breadthMm: ["b_eff,b,fc", "mm"],
    beamFlangeMm: ["t_fb", "mm"],
    yieldMpa: ["f_y,fb", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_fc,Rd", "N"],
  expression: "breadthMm * beamFlangeMm * yieldMpa / gammaM0",
  evaluate: (g) => (g.breadthMm * g.beamFlangeMm * g.yieldMpa) / g.gammaM0,
  // P398 (2013), example F.1, gives 412 kN.
  example: {
    given: { breadthMm: 127.4, beamFlangeMm: 11.8, yieldMpa: 275, gammaM0: 1 },
    gives: 412_000,
    relTol: 4e-3,
  },
});
