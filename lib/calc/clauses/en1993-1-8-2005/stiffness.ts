import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Column web panel in shear, mm. Table 6.11. */
export const panelSpringMm = defineFormula({
  id: id("table-6.11/k_1"),
  source: from("Table 6.11"),
  symbols: { shearAreaMm2: ["A_vc", "mm2"], beta: ["β", "1"], leverMm: ["z", "mm"] },
  result: ["k_1", "mm"],
  expression: "0.38 * shearAreaMm2 / (beta * leverMm)",
  evaluate: (g) => (0.38 * g.shearAreaMm2) / (g.beta * g.leverMm),
  example: { given: { shearAreaMm2: 4000, beta: 1, leverMm: 400 }, gives: 3.8, relTol: 1e-12 },
});

const webSymbols = {
  breadthMm: ["b_eff", "mm"],
  thicknessMm: ["t_wc", "mm"],
  webDepthMm: ["d_c", "mm"],
} as const;
const webExample = { given: { breadthMm: 200, thicknessMm: 10, webDepthMm: 200 }, gives: 7, relTol: 1e-12 };

/** Column web in compression, mm. Table 6.11. */
export const webCompressionSpringMm = defineFormula({
  id: id("table-6.11/k_2"),
  source: from("Table 6.11"),
  symbols: webSymbols,
  result: ["k_2", "mm"],
  expression: "0.7 * breadthMm * thicknessMm / webDepthMm",
  evaluate: (g) => (0.7 * g.breadthMm * g.thicknessMm) / g.webDepthMm,
  example: webExample,
});

/** Column web in tension, mm. Table 6.11. */
export const webTensionSpringMm = defineFormula({
  id: id("table-6.11/k_3"),
  source: from("Table 6.11"),
  symbols: webSymbols,
  result: ["k_3", "mm"],
  expression: "0.7 * breadthMm * thicknessMm / webDepthMm",
  evaluate: (g) => (0.7 * g.breadthMm * g.thicknessMm) / g.webDepthMm,
  example: webExample,
});

const plateSymbols = { lengthMm: ["l_eff", "mm"], thicknessMm: ["t", "mm"], mMm: ["m", "mm"] } as const;
const plateExample = { given: { lengthMm: 200, thicknessMm: 20, mMm: 40 }, gives: 22.5, relTol: 1e-12 };

/** Column flange in bending, mm. Table 6.11. */
export const flangeSpringMm = defineFormula({
  id: id("table-6.11/k_4"),
  source: from("Table 6.11"),
  symbols: plateSymbols,
  result: ["k_4", "mm"],
  expression: "0.9 * lengthMm * thicknessMm^3 / mMm^3",
  evaluate: (g) => (0.9 * g.lengthMm * g.thicknessMm ** 3) / g.mMm ** 3,
  example: plateExample,
});

/** End plate in bending, mm. Table 6.11. */
export const endPlateSpringMm = defineFormula({
  id: id("table-6.11/k_5"),
  source: from("Table 6.11"),
  symbols: plateSymbols,
  result: ["k_5", "mm"],
  expression: "0.9 * lengthMm * thicknessMm^3 / mMm^3",
  evaluate: (g) => (0.9 * g.lengthMm * g.thicknessMm ** 3) / g.mMm ** 3,
  example: plateExample,
});

/** Length of a bolt that stretches, mm: plates, two washers, half the head and half the nut. 6.2.4.1, Table 6.2. */
export const boltLengthMm = defineFormula({
  id: id("table-6.2/L_b"),
  source: from("Table 6.2, note; Table 6.11"),
  symbols: {
    plateMm: ["t_p", "mm"],
    flangeMm: ["t_fc", "mm"],
    washerMm: ["t_washer", "mm"],
    headMm: ["k_head", "mm"],
    nutMm: ["m_nut", "mm"],
  },
  result: ["L_b", "mm"],
  expression: "plateMm + flangeMm + 2 * washerMm + (headMm + nutMm) / 2",
  evaluate: (g) => g.plateMm + g.flangeMm + 2 * g.washerMm + (g.headMm + g.nutMm) / 2,
  example: {
    given: { plateMm: 20, flangeMm: 14, washerMm: 4, headMm: 15, nutMm: 21.5 },
    gives: 60.25,
    relTol: 1e-12,
  },
});

/** Bolts of one row in tension, mm. Table 6.11. */
export const boltSpringMm = defineFormula({
  id: id("table-6.11/k_10"),
  source: from("Table 6.11"),
  symbols: { stressAreaMm2: ["A_s", "mm2"], lengthMm: ["L_b", "mm"] },
  result: ["k_10", "mm"],
  expression: "1.6 * stressAreaMm2 / lengthMm",
  evaluate: (g) => (1.6 * g.stressAreaMm2) / g.lengthMm,
  example: { given: { stressAreaMm2: 353, lengthMm: 80 }, gives: 7.06, relTol: 1e-12 },
});

/** Initial rotational stiffness, Nmm/rad. 6.3.1(4), Eq. (6.27) with mu = 1. */
export const initialStiffnessNmmPerRad = defineFormula({
  id: id("6.3.1/S_j,ini"),
  source: from("6.3.1(4), Eq. (6.27), μ = 1"),
  symbols: { elasticMpa: ["E", "N/mm2"], leverMm: ["z", "mm"], flexibilityPerMm: ["Σ 1/k", "1/mm"] },
  result: ["S_j,ini", "Nmm/rad"],
  expression: "elasticMpa * leverMm^2 / flexibilityPerMm",
  evaluate: (g) => (g.elasticMpa * g.leverMm * g.leverMm) / g.flexibilityPerMm,
  example: {
    given: { elasticMpa: 210_000, leverMm: 400, flexibilityPerMm: 0.5 },
    gives: 67.2e9,
    relTol: 1e-12,
  },
});

/** How much softer a joint is at a moment above two thirds of its resistance. 6.3.1(6), Eq. (6.28), Table 6.8. */
export const stiffnessRatioMu = defineFormula({
  id: id("6.3.1/mu"),
  source: from("6.3.1(6), Eq. (6.28a) and (6.28b); ψ of Table 6.8"),
  symbols: { momentNmm: ["|M_j,Ed|", "Nmm"], resistanceNmm: ["M_j,Rd", "Nmm"], psi: ["ψ", "1"] },
  result: ["μ", "1"],
  expression: "momentNmm <= 2 / 3 * resistanceNmm ? 1 : (1.5 * momentNmm / resistanceNmm)^psi",
  limitBroken: (g) => (g.momentNmm > g.resistanceNmm ? "the moment exceeds the joint's resistance" : null),
  evaluate: (g) =>
    g.momentNmm <= (2 / 3) * g.resistanceNmm ? 1 : ((1.5 * g.momentNmm) / g.resistanceNmm) ** g.psi,
  // At M_j,Rd the ratio is about 3 for end plates (6.3.1, Figure 5.1): 1.5^2.7 = 2.99.
  example: { given: { momentNmm: 100, resistanceNmm: 100, psi: 2.7 }, gives: 2.99, relTol: 2e-3 },
});

/** Secant stiffness at the load case's moment, Nmm/rad. 6.3.1(4). */
export const secantStiffnessNmmPerRad = defineFormula({
  id: id("6.3.1/S_j"),
  source: from("6.3.1(4), Eq. (6.27)"),
  symbols: { initialNmmPerRad: ["S_j,ini", "Nmm/rad"], mu: ["μ", "1"] },
  result: ["S_j", "Nmm/rad"],
  expression: "initialNmmPerRad / mu",
  evaluate: (g) => g.initialNmmPerRad / g.mu,
  example: { given: { initialNmmPerRad: 6e10, mu: 3 }, gives: 2e10, relTol: 1e-12 },
});

/** Stiffness from which a joint is rigid, Nmm/rad. 5.2.2.5(1). */
export const rigidStiffnessNmmPerRad = defineFormula({
  id: id("5.2.2.5/rigid"),
  source: from("5.2.2.5(1), Figure 5.4"),
  symbols: {
    factor: ["k_b", "1"],
    elasticMpa: ["E", "N/mm2"],
    inertiaMm4: ["I_b", "mm4"],
    spanMm: ["L_b", "mm"],
  },
  result: ["S_j,rigid", "Nmm/rad"],
  expression: "factor * elasticMpa * inertiaMm4 / spanMm",
  evaluate: (g) => (g.factor * g.elasticMpa * g.inertiaMm4) / g.spanMm,
  example: {
    given: { factor: 25, elasticMpa: 210_000, inertiaMm4: 2e8, spanMm: 7000 },
    gives: 1.5e11,
    relTol: 1e-12,
  },
});
