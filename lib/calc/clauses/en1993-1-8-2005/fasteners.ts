import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Tension resistance of one bolt (k2 = 0.9), N. `reduction` is 0.85 for cut threads not to EN 1090, 3.6.1(3), else 1. */
export const boltTensionN = defineFormula({
  id: id("table-3.4/F_t,Rd"),
  source: from("Table 3.4; 3.6.1(3) for the reduction"),
  symbols: {
    ultimateMpa: ["f_ub", "N/mm2"],
    stressAreaMm2: ["A_s", "mm2"],
    reduction: ["k_thread", "1"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["F_t,Rd", "N"],
  expression: "reduction * 0.9 * ultimateMpa * stressAreaMm2 / gammaM2",
  evaluate: (g) => (g.reduction * 0.9 * g.ultimateMpa * g.stressAreaMm2) / g.gammaM2,
  // P398 (2013) gives 203 kN for M24 8.8.
  example: {
    given: { ultimateMpa: 800, stressAreaMm2: 353, reduction: 1, gammaM2: 1.25 },
    gives: 203_000,
    relTol: 2.5e-3,
  },
});

/** Punching shear resistance of the plate under one head or nut, N. */
export const punchingN = defineFormula({
  id: id("table-3.4/B_p,Rd"),
  source: from("Table 3.4"),
  symbols: {
    meanDiameterMm: ["d_m", "mm"],
    thicknessMm: ["t_p", "mm"],
    ultimateMpa: ["f_u", "N/mm2"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["B_p,Rd", "N"],
  expression: "0.6 * pi * meanDiameterMm * thicknessMm * ultimateMpa / gammaM2",
  evaluate: (g) => (0.6 * Math.PI * g.meanDiameterMm * g.thicknessMm * g.ultimateMpa) / g.gammaM2,
  example: {
    given: { meanDiameterMm: 40, thicknessMm: 10, ultimateMpa: 500, gammaM2: 1.25 },
    gives: 96_000 * Math.PI,
    relTol: 1e-12,
  },
});

/** Shear resistance of one bolt in one plane through the thread, N. */
export const boltShearN = defineFormula({
  id: id("table-3.4/F_v,Rd"),
  source: from("Table 3.4; 3.6.1(3) for the reduction"),
  symbols: {
    alphaV: ["α_v", "1"],
    ultimateMpa: ["f_ub", "N/mm2"],
    stressAreaMm2: ["A_s", "mm2"],
    reduction: ["k_thread", "1"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["F_v,Rd", "N"],
  expression: "reduction * alphaV * ultimateMpa * stressAreaMm2 / gammaM2",
  evaluate: (g) => (g.reduction * g.alphaV * g.ultimateMpa * g.stressAreaMm2) / g.gammaM2,
  // P398 (2013) gives 136 kN for M24 8.8 in single shear.
  example: {
    given: { alphaV: 0.6, ultimateMpa: 800, stressAreaMm2: 353, reduction: 1, gammaM2: 1.25 },
    gives: 136_000,
    relTol: 4e-3,
  },
});

/** Bearing resistance of one bolt, N. */
export const bearingN = defineFormula({
  id: id("table-3.4/F_b,Rd"),
  source: from("Table 3.4"),
  symbols: {
    edgeFactor: ["k_1", "1"],
    bearingFactor: ["α_b", "1"],
    ultimateMpa: ["f_u", "N/mm2"],
    diameterMm: ["d", "mm"],
    thicknessMm: ["t", "mm"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["F_b,Rd", "N"],
  expression: "edgeFactor * bearingFactor * ultimateMpa * diameterMm * thicknessMm / gammaM2",
  evaluate: (g) =>
    (g.edgeFactor * g.bearingFactor * g.ultimateMpa * g.diameterMm * g.thicknessMm) / g.gammaM2,
  example: {
    given: {
      edgeFactor: 2.5,
      bearingFactor: 0.5,
      ultimateMpa: 400,
      diameterMm: 20,
      thicknessMm: 10,
      gammaM2: 1.25,
    },
    gives: 80_000,
    relTol: 1e-12,
  },
});

/** Factor k1 of bearing, across the load. `edgeMm` = e2, `acrossMm` = p2. */
export const bearingEdgeFactor = defineFormula({
  id: id("table-3.4/k_1"),
  source: from("Table 3.4"),
  symbols: { edgeMm: ["e_2", "mm"], acrossMm: ["p_2", "mm"], holeMm: ["d_0", "mm"] },
  result: ["k_1", "1"],
  expression: "min(2.8 * edgeMm / holeMm - 1.7, 1.4 * acrossMm / holeMm - 1.7, 2.5)",
  evaluate: (g) => Math.min((2.8 * g.edgeMm) / g.holeMm - 1.7, (1.4 * g.acrossMm) / g.holeMm - 1.7, 2.5),
  example: { given: { edgeMm: 24, acrossMm: 100, holeMm: 20 }, gives: 2.8 * 1.2 - 1.7, relTol: 1e-12 },
});

/** Factor alpha_b of bearing, along the load. `endMm` = e1 or a large number where there is no end; `pitchMm` = p1. */
export const bearingAlongFactor = defineFormula({
  id: id("table-3.4/alpha_b"),
  source: from("Table 3.4"),
  symbols: {
    endMm: ["e_1", "mm"],
    pitchMm: ["p_1", "mm"],
    holeMm: ["d_0", "mm"],
    boltUltimateMpa: ["f_ub", "N/mm2"],
    ultimateMpa: ["f_u", "N/mm2"],
  },
  result: ["α_b", "1"],
  expression: "min(endMm / (3 * holeMm), pitchMm / (3 * holeMm) - 0.25, boltUltimateMpa / ultimateMpa, 1)",
  evaluate: (g) =>
    Math.min(
      g.endMm / (3 * g.holeMm),
      g.pitchMm / (3 * g.holeMm) - 0.25,
      g.boltUltimateMpa / g.ultimateMpa,
      1,
    ),
  example: {
    given: { endMm: 30, pitchMm: 100, holeMm: 20, boltUltimateMpa: 800, ultimateMpa: 400 },
    gives: 0.5,
    relTol: 1e-12,
  },
});
