import { defineFormula } from "../trace/define-formula";
import type { FormulaSource } from "../trace/trace";

/**
 * Threaded bars through both column flanges with nuts on the inside of each: two springs a row and
 * superposition. No design code covers them; coefficients and bounds come from this project's own
 * linear-elastic finite-element study (C3D8I bricks, five rolled columns, M16 to M30).
 */
const from = (ref: string): FormulaSource => ({
  document: "Mechanics of through-bars",
  edition: "this project's finite-element study",
  ref,
});
const id = (tail: string): string => `through-bars/${tail}`;

/** Column flange pushed by a nut, as an elastic plate near its clamped edge, mm (times E = N/mm). */
export const barFlangeSpringMm = defineFormula({
  id: id("k_f"),
  source: from("flange spring"),
  symbols: { flangeMm: ["t_f", "mm"], mMm: ["m", "mm"] },
  result: ["k_f", "mm"],
  expression: "1.37 * flangeMm^3 / (mMm^2 + 1.4 * flangeMm^2)",
  evaluate: (g) => (1.37 * g.flangeMm ** 3) / (g.mMm ** 2 + 1.4 * g.flangeMm ** 2),
  example: {
    given: { flangeMm: 14, mMm: 44.15 },
    gives: (1.37 * 2744) / (44.15 ** 2 + 1.4 * 196),
    relTol: 1e-12,
  },
});

/** Half the column web behind one flange, mm. */
export const barWebSpringMm = defineFormula({
  id: id("k_w"),
  source: from("web spring"),
  symbols: {
    webMm: ["t_w", "mm"],
    flangeMm: ["t_f", "mm"],
    rootMm: ["r", "mm"],
    depthMm: ["h", "mm"],
    webDepthMm: ["d_c", "mm"],
  },
  result: ["k_w", "mm"],
  expression: "webMm * (2.2 * (flangeMm + rootMm) + 0.43 * (depthMm / 2 - flangeMm)) / (webDepthMm / 2)",
  evaluate: (g) =>
    (g.webMm * (2.2 * (g.flangeMm + g.rootMm) + 0.43 * (g.depthMm / 2 - g.flangeMm))) / (g.webDepthMm / 2),
  example: {
    given: { webMm: 8.5, flangeMm: 14, rootMm: 27, depthMm: 290, webDepthMm: 208 },
    gives: (8.5 * (2.2 * 41 + 0.43 * 131)) / 104,
    relTol: 1e-12,
  },
});

/** Stiffness of the column at one flange, N/mm. `share` = 1 for one row, else the row's length in the group over its length alone. */
export const barColumnStiffnessNPerMm = defineFormula({
  id: id("K_c"),
  source: from("column stiffness"),
  symbols: {
    share: ["q", "1"],
    elasticMpa: ["E", "N/mm2"],
    flangeSpringMm: ["k_f", "mm"],
    webSpringMm: ["k_w", "mm"],
  },
  result: ["K_c", "N/mm"],
  expression: "share * elasticMpa / (1 / flangeSpringMm + 1 / webSpringMm)",
  evaluate: (g) => (g.share * g.elasticMpa) / (1 / g.flangeSpringMm + 1 / g.webSpringMm),
  // HE 300 A, gauge 140: 311 kN/mm by this form, 325 by finite elements.
  example: {
    given: { share: 1, elasticMpa: 210_000, flangeSpringMm: 1.691, webSpringMm: 11.98 },
    gives: 311_000,
    relTol: 2e-3,
  },
});

/** Stiffness of one row's bars between the middles of their inner nuts, N/mm. */
export const barStiffnessNPerMm = defineFormula({
  id: id("K_b"),
  source: from("bar stiffness"),
  symbols: {
    count: ["n_b", "1"],
    elasticMpa: ["E", "N/mm2"],
    stressAreaMm2: ["A_s", "mm2"],
    lengthMm: ["L_in", "mm"],
  },
  result: ["K_b", "N/mm"],
  expression: "count * elasticMpa * stressAreaMm2 / lengthMm",
  evaluate: (g) => (g.count * g.elasticMpa * g.stressAreaMm2) / g.lengthMm,
  // HE 300 A, M20: 422 kN/mm.
  example: {
    given: { count: 2, elasticMpa: 210_000, stressAreaMm2: 245, lengthMm: 244 },
    gives: 422_000,
    relTol: 1e-3,
  },
});

/** Share of the force that the bars carry past the column under equal forces on both sides. */
export const barShareTension = defineFormula({
  id: id("eta"),
  source: from("share in tension"),
  symbols: { barNPerMm: ["K_b", "N/mm"], columnNPerMm: ["K_c", "N/mm"] },
  result: ["η", "1"],
  expression: "2 * barNPerMm / (columnNPerMm + 2 * barNPerMm)",
  evaluate: (g) => (2 * g.barNPerMm) / (g.columnNPerMm + 2 * g.barNPerMm),
  // HE 300 A, M20: 0.73 by this form, 0.72 by finite elements.
  example: { given: { barNPerMm: 422, columnNPerMm: 311 }, gives: 0.73, relTol: 2e-3 },
});

/** How much of the forces left and right is symmetric, which is all that loads the bar. Outward positive. */
export const symmetricPart = defineFormula({
  id: id("r"),
  source: from("mode factor"),
  symbols: { largerN: ["F_max", "N"], otherN: ["F_other", "N"] },
  result: ["r", "1"],
  expression: "max(0, (largerN + otherN) / (2 * largerN))",
  evaluate: (g) => Math.max(0, (g.largerN + g.otherN) / (2 * g.largerN)),
  example: { given: { largerN: 100, otherN: 0 }, gives: 0.5, relTol: 1e-12 },
});

/** Cautious relief of the column in tension. */
export const reliefTension = defineFormula({
  id: id("R"),
  source: from("cautious relief: 0.55 of the share, times the mode factor"),
  symbols: { share: ["η", "1"], symmetric: ["r", "1"] },
  result: ["R", "1"],
  expression: "0.55 * share * symmetric",
  evaluate: (g) => 0.55 * g.share * g.symmetric,
  example: { given: { share: 0.73, symmetric: 1 }, gives: 0.4015, relTol: 1e-12 },
});

/** Resistance raised by relief, N: mode 1 of the flange, the web in tension or in compression. */
export const relievedN = defineFormula({
  id: id("F over 1 - R"),
  source: from("row resistance with bars, by equilibrium"),
  symbols: { resistanceN: ["F_Rd", "N"], relief: ["R", "1"] },
  result: ["F_Rd", "N"],
  expression: "resistanceN / (1 - relief)",
  evaluate: (g) => g.resistanceN / (1 - g.relief),
  example: { given: { resistanceN: 300, relief: 0.4 }, gives: 500, relTol: 1e-12 },
});

/** Mode 2 of the column flange with bars, N. */
export const relievedModeTwoN = defineFormula({
  id: id("mode 2"),
  source: from("row resistance with bars, by equilibrium with the bolt force F + Q"),
  symbols: {
    momentNmm: ["M_pl,2,Rd", "Nmm"],
    mMm: ["m", "mm"],
    nMm: ["n", "mm"],
    boltsN: ["ΣF_t,Rd", "N"],
    relief: ["R", "1"],
  },
  result: ["F_T,2,Rd", "N"],
  expression: "(2 * momentNmm + nMm * boltsN) / (nMm + (1 - relief) * mMm)",
  evaluate: (g) => (2 * g.momentNmm + g.nMm * g.boltsN) / (g.nMm + (1 - g.relief) * g.mMm),
  example: {
    given: { momentNmm: 1_000_000, mMm: 40, nMm: 60, boltsN: 400_000, relief: 0.5 },
    gives: 26_000_000 / 80,
    relTol: 1e-12,
  },
});

/** Prying force of one row at the design force, N, with the web hinge formed; nothing before that. */
export const pryingN = defineFormula({
  id: id("Q"),
  source: from("prying by equilibrium at the web hinge, at most what the bolts leave"),
  symbols: {
    forceN: ["F_Ed", "N"],
    relief: ["R", "1"],
    mMm: ["m", "mm"],
    nMm: ["n", "mm"],
    momentNmm: ["M_pl,2,Rd", "Nmm"],
  },
  result: ["Q", "N"],
  expression: "max(0, ((1 - relief) * forceN * mMm - 2 * momentNmm) / nMm)",
  evaluate: (g) => Math.max(0, ((1 - g.relief) * g.forceN * g.mMm - 2 * g.momentNmm) / g.nMm),
  example: {
    given: { forceN: 300_000, relief: 0, mMm: 40, nMm: 50, momentNmm: 4_000_000 },
    gives: 80_000,
    relTol: 1e-12,
  },
});

/** Force in the bars of one row while the column flange is elastic, N: at most F + Q. */
export const barForceElasticN = defineFormula({
  id: id("N elastic"),
  source: from("bar force, end plates: 1.05 of the share"),
  symbols: {
    share: ["η", "1"],
    meanN: ["(F_L + F_R) / 2", "N"],
    forceN: ["F_Ed", "N"],
    pryingN: ["Q", "N"],
  },
  result: ["N_bar,Ed", "N"],
  expression: "min(1.05 * share * meanN, forceN + pryingN)",
  evaluate: (g) => Math.min(1.05 * g.share * g.meanN, g.forceN + g.pryingN),
  example: { given: { share: 0.8, meanN: 200, forceN: 200, pryingN: 0 }, gives: 168, relTol: 1e-12 },
});

/** Force in the bars of one row once the column flange yields, N. */
export const barForceYieldedN = defineFormula({
  id: id("N yielded"),
  source: from("bar force once the column flange yields"),
  symbols: { forceN: ["F_Ed", "N"], pryingN: ["Q", "N"] },
  result: ["N_bar,Ed", "N"],
  expression: "forceN + pryingN",
  evaluate: (g) => g.forceN + g.pryingN,
  example: { given: { forceN: 200, pryingN: 40 }, gives: 240, relTol: 1e-12 },
});

/** Springs k3 and k4 of a row in series, softened less by what the bars carry, mm. */
export const barColumnSpringMm = defineFormula({
  id: id("k_34"),
  source: from("stiffness of the column side: k3 and k4 in series over (1 - 0.75 η r)"),
  symbols: {
    webSpringMm: ["k_3", "mm"],
    flangeSpringMm: ["k_4", "mm"],
    share: ["η", "1"],
    symmetric: ["r", "1"],
  },
  result: ["k_34", "mm"],
  expression: "1 / (1 / webSpringMm + 1 / flangeSpringMm) / (1 - 0.75 * share * symmetric)",
  evaluate: (g) => 1 / (1 / g.webSpringMm + 1 / g.flangeSpringMm) / (1 - 0.75 * g.share * g.symmetric),
  example: {
    given: { webSpringMm: 4, flangeSpringMm: 4, share: 0.8, symmetric: 1 },
    gives: 2 / 0.4,
    relTol: 1e-12,
  },
});

/** Column stiffness against a compressed beam flange, N/mm; the code's springs fit here, because the beam flange holds the column flange straight. */
export const barColumnCompressionNPerMm = defineFormula({
  id: id("K_c,EN"),
  source: from("column stiffness in compression"),
  symbols: { elasticMpa: ["E", "N/mm2"], flangeSpringMm: ["k_4", "mm"], webSpringMm: ["k_3", "mm"] },
  result: ["K_c,EN", "N/mm"],
  expression: "elasticMpa / (1 / flangeSpringMm + 1 / (2 * webSpringMm))",
  evaluate: (g) => g.elasticMpa / (1 / g.flangeSpringMm + 1 / (2 * g.webSpringMm)),
  example: {
    given: { elasticMpa: 210_000, flangeSpringMm: 10, webSpringMm: 5 },
    gives: 1_050_000,
    relTol: 1e-12,
  },
});

/** Share of a compressed flange's force that one row of bars takes; the distance fades it out. */
export const barShareCompression = defineFormula({
  id: id("eta_c"),
  source: from("share in compression, one row"),
  symbols: {
    distanceRatio: ["x", "1"],
    barNPerMm: ["K_b", "N/mm"],
    elasticMpa: ["E", "N/mm2"],
    compressionSpringMm: ["k_2", "mm"],
    columnNPerMm: ["K_c,EN", "N/mm"],
  },
  result: ["η_c", "1"],
  expression:
    "max(0, 1 - 0.8 * distanceRatio) * (2 * barNPerMm / (2 * elasticMpa * compressionSpringMm)) / (1 + 2 * barNPerMm / columnNPerMm)",
  evaluate: (g) =>
    (Math.max(0, 1 - 0.8 * g.distanceRatio) *
      ((2 * g.barNPerMm) / (2 * g.elasticMpa * g.compressionSpringMm))) /
    (1 + (2 * g.barNPerMm) / g.columnNPerMm),
  example: {
    given: {
      distanceRatio: 0.5,
      barNPerMm: 400,
      elasticMpa: 200,
      compressionSpringMm: 10,
      columnNPerMm: 800,
    },
    gives: (0.6 * 0.2) / 2,
    relTol: 1e-12,
  },
});

/** The same with rows on both sides of the flange. */
export const barShareBothSides = defineFormula({
  id: id("eta_c both sides"),
  source: from("share in compression, rows on both sides of the flange"),
  symbols: { share: ["η_c", "1"] },
  result: ["η_c", "1"],
  expression: "1.86 * share",
  evaluate: (g) => 1.86 * g.share,
  example: { given: { share: 0.05 }, gives: 0.093, relTol: 1e-12 },
});

/** Relief of web buckling in compression. */
export const reliefBuckling = defineFormula({
  id: id("R buckling"),
  source: from("relief of web buckling, none beyond x = 1"),
  symbols: { distanceRatio: ["x", "1"], share: ["η_c", "1"], symmetric: ["r", "1"] },
  result: ["R_b", "1"],
  expression: "distanceRatio > 1 ? 0 : (1 - 0.4 * distanceRatio) * share * symmetric",
  evaluate: (g) => (g.distanceRatio > 1 ? 0 : (1 - 0.4 * g.distanceRatio) * g.share * g.symmetric),
  example: { given: { distanceRatio: 0.5, share: 0.1, symmetric: 1 }, gives: 0.08, relTol: 1e-12 },
});

/** Relief of web crushing in compression. */
export const reliefCrushing = defineFormula({
  id: id("R crushing"),
  source: from("relief of web crushing, none beyond x = 1"),
  symbols: { distanceRatio: ["x", "1"], share: ["η_c", "1"], symmetric: ["r", "1"] },
  result: ["R_c", "1"],
  expression: "distanceRatio > 1 ? 0 : (1 - 0.9 * distanceRatio) * share * symmetric",
  evaluate: (g) => (g.distanceRatio > 1 ? 0 : (1 - 0.9 * g.distanceRatio) * g.share * g.symmetric),
  example: { given: { distanceRatio: 0.5, share: 0.1, symmetric: 1 }, gives: 0.055, relTol: 1e-12 },
});

/** Compression in the bars of one row, N: twice the share, to be safe for the bar. */
export const barCompressionForceN = defineFormula({
  id: id("N compression"),
  source: from("bar force in compression, twice the share"),
  symbols: { share: ["η_c", "1"], forceN: ["F_c,Ed", "N"] },
  result: ["N_bar,c,Ed", "N"],
  expression: "2 * share * forceN",
  evaluate: (g) => 2 * g.share * g.forceN,
  example: { given: { share: 0.1, forceN: 500 }, gives: 100, relTol: 1e-12 },
});

/** Buckling resistance of the bars of one row between inner nuts, N. Curve c of EN 1993-1-1 on the stress area. */
export const barBucklingN = defineFormula({
  id: id("N_b,Rd"),
  source: from("bar buckling, curve c, 0.7 of the length between nuts tight on both flanges"),
  symbols: {
    count: ["n_b", "1"],
    reduction: ["χ", "1"],
    stressAreaMm2: ["A_s", "mm2"],
    yieldMpa: ["f_yb", "N/mm2"],
    gammaM1: ["γ_M1", "1"],
  },
  result: ["N_b,Rd", "N"],
  expression: "count * reduction * stressAreaMm2 * yieldMpa / gammaM1",
  evaluate: (g) => (g.count * g.reduction * g.stressAreaMm2 * g.yieldMpa) / g.gammaM1,
  example: {
    given: { count: 2, reduction: 0.5, stressAreaMm2: 245, yieldMpa: 640, gammaM1: 1 },
    gives: 156_800,
    relTol: 1e-12,
  },
});

/** Flange pulled or pushed at the bolt line without prying, N. */
export const farFlangeN = defineFormula({
  id: id("far flange"),
  source: from("far flange in bending without prying, 2 M_pl,1 / m"),
  symbols: { momentNmm: ["M_pl,1,Rd", "Nmm"], mMm: ["m", "mm"] },
  result: ["F_Rd", "N"],
  expression: "2 * momentNmm / mMm",
  evaluate: (g) => (2 * g.momentNmm) / g.mMm,
  example: { given: { momentNmm: 4_000_000, mMm: 40 }, gives: 200_000, relTol: 1e-12 },
});
