import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Effective length of the leg on the column flange, mm: half of the angle's length, whatever the pattern. 6.2.6.6. */
export const cleatLengthMm = defineFormula({
  id: id("6.2.6.6/l_eff"),
  source: from("6.2.6.6(2)"),
  symbols: { lengthMm: ["b_a", "mm"] },
  result: ["l_eff", "mm"],
  expression: "0.5 * lengthMm",
  evaluate: (g) => 0.5 * g.lengthMm,
  example: { given: { lengthMm: 160 }, gives: 80, relTol: 1e-12 },
});

/** Gap up to which the beam's end holds the leg straight, as a share of the leg's thickness. 6.2.6.6(4). */
const SMALL_GAP = 0.4;

/** From the bolts to the yield line of the leg beside the other leg, mm: later where the beam stands off. 6.2.6.6(4), Figure 6.13. */
export const cleatLeverMm = defineFormula({
  id: id("6.2.6.6/m"),
  source: from("6.2.6.6(4), Figure 6.13"),
  symbols: {
    distanceMm: ["bolt to heel", "mm"],
    thicknessMm: ["t_a", "mm"],
    rootMm: ["r_a", "mm"],
    gapMm: ["g", "mm"],
  },
  result: ["m", "mm"],
  expression:
    "gapMm <= 0.4 * thicknessMm ? distanceMm - thicknessMm - 0.8 * rootMm : distanceMm - 0.5 * thicknessMm",
  evaluate: (g) =>
    g.gapMm <= SMALL_GAP * g.thicknessMm
      ? g.distanceMm - g.thicknessMm - 0.8 * g.rootMm
      : g.distanceMm - 0.5 * g.thicknessMm,
  example: {
    given: { distanceMm: 60, thicknessMm: 12, rootMm: 10, gapMm: 4 },
    gives: 60 - 12 - 8,
    relTol: 1e-12,
  },
});

/** Length of column web in compression behind the angle of the compression flange, mm. Eq. (6.12). */
export const cleatBreadthMm = defineFormula({
  id: id("6.2.6.2/b_eff cleat"),
  source: from("6.2.6.2(1), Eq. (6.12)"),
  symbols: {
    legMm: ["t_a", "mm"],
    angleRootMm: ["r_a", "mm"],
    columnFlangeMm: ["t_fc", "mm"],
    rootMm: ["s", "mm"],
  },
  result: ["b_eff,c,wc", "mm"],
  expression: "2 * legMm + 0.6 * angleRootMm + 5 * (columnFlangeMm + rootMm)",
  evaluate: (g) => 2 * g.legMm + 0.6 * g.angleRootMm + 5 * (g.columnFlangeMm + g.rootMm),
  example: {
    given: { legMm: 12, angleRootMm: 10, columnFlangeMm: 14, rootMm: 27 },
    gives: 24 + 6 + 205,
    relTol: 1e-12,
  },
});

/** Angle in bending, mm (times E = N/mm). Table 6.11, k_6. */
export const cleatSpringMm = defineFormula({
  id: id("table-6.11/k_6"),
  source: from("Table 6.11, k_6"),
  symbols: { lengthMm: ["l_eff", "mm"], thicknessMm: ["t_a", "mm"], mMm: ["m", "mm"] },
  result: ["k_6", "mm"],
  expression: "0.9 * lengthMm * thicknessMm^3 / mMm^3",
  evaluate: (g) => (0.9 * g.lengthMm * g.thicknessMm ** 3) / g.mMm ** 3,
  example: {
    given: { lengthMm: 80, thicknessMm: 10, mMm: 40 },
    gives: (0.9 * 80 * 1000) / 64_000,
    relTol: 1e-12,
  },
});

/** Nominal diameter of an M16 bolt, to which slip of bolts in shear is referred. Table 6.11. */
const D_M16_MM = 16;

/** Bolts in shear that are not preloaded, mm (times E = N/mm). Table 6.11, k_11. */
export const boltShearSpringMm = defineFormula({
  id: id("table-6.11/k_11"),
  source: from("Table 6.11, k_11, bolts not preloaded"),
  symbols: {
    rows: ["n_b", "1"],
    diameterMm: ["d", "mm"],
    ultimateMpa: ["f_ub", "N/mm2"],
    elasticMpa: ["E", "N/mm2"],
  },
  result: ["k_11", "mm"],
  expression: "16 * rows * diameterMm^2 * ultimateMpa / (elasticMpa * 16)",
  evaluate: (g) => (16 * g.rows * g.diameterMm ** 2 * g.ultimateMpa) / (g.elasticMpa * D_M16_MM),
  example: {
    given: { rows: 2, diameterMm: 20, ultimateMpa: 1000, elasticMpa: 200_000 },
    gives: 4,
    relTol: 1e-12,
  },
});

/** Bearing of bolts that are not preloaded on one part, mm (times E = N/mm). Table 6.11, k_12. `pitchMm` = a very large number for one row. */
export const boltBearingSpringMm = defineFormula({
  id: id("table-6.11/k_12"),
  source: from("Table 6.11, k_12, bolts not preloaded"),
  symbols: {
    rows: ["n_b", "1"],
    edgeMm: ["e_b", "mm"],
    pitchMm: ["p_b", "mm"],
    thicknessMm: ["t_j", "mm"],
    diameterMm: ["d", "mm"],
    ultimateMpa: ["f_u", "N/mm2"],
    elasticMpa: ["E", "N/mm2"],
  },
  result: ["k_12", "mm"],
  expression:
    "24 * rows * min(0.25 * edgeMm / diameterMm + 0.5, 0.25 * pitchMm / diameterMm + 0.375, 1.25) * min(1.5 * thicknessMm / 16, 2.5) * diameterMm * ultimateMpa / elasticMpa",
  evaluate: (g) => {
    const along = Math.min(
      (0.25 * g.edgeMm) / g.diameterMm + 0.5,
      (0.25 * g.pitchMm) / g.diameterMm + 0.375,
      1.25,
    );
    const through = Math.min((1.5 * g.thicknessMm) / D_M16_MM, 2.5);
    return (24 * g.rows * along * through * g.diameterMm * g.ultimateMpa) / g.elasticMpa;
  },
  example: {
    given: {
      rows: 2,
      edgeMm: 40,
      pitchMm: 70,
      thicknessMm: 16,
      diameterMm: 20,
      ultimateMpa: 400,
      elasticMpa: 200_000,
    },
    gives: (24 * 2 * 1 * 1.5 * 20 * 400) / 200_000,
    relTol: 1e-12,
  },
});

/** A part pulled across its bolt holes, N: yielding of the whole, or breaking at the holes. EN 1993-1-1:2005, 6.2.3(2). */
export const partInTensionN = defineFormula({
  id: id("6.2.3/N_t,Rd of a leg"),
  source: { document: "EN 1993-1-1", edition: "2005", ref: "6.2.3(2), Eq. (6.6) and (6.7)" },
  symbols: {
    widthMm: ["b_a", "mm"],
    thicknessMm: ["t_a", "mm"],
    holesMm: ["Σd_0", "mm"],
    yieldMpa: ["f_y", "N/mm2"],
    ultimateMpa: ["f_u", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["N_t,Rd", "N"],
  expression:
    "min(widthMm * thicknessMm * yieldMpa / gammaM0, 0.9 * (widthMm - holesMm) * thicknessMm * ultimateMpa / gammaM2)",
  evaluate: (g) =>
    Math.min(
      (g.widthMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
      (0.9 * (g.widthMm - g.holesMm) * g.thicknessMm * g.ultimateMpa) / g.gammaM2,
    ),
  example: {
    given: {
      widthMm: 150,
      thicknessMm: 10,
      holesMm: 50,
      yieldMpa: 355,
      ultimateMpa: 500,
      gammaM0: 1,
      gammaM2: 1.25,
    },
    gives: 360_000,
    relTol: 1e-12,
  },
});

/** Block torn out of a leg by a symmetric bolt group, N. 3.10.2(2), Eq. (3.9). */
export const blockTearingN = defineFormula({
  id: id("3.10.2/V_eff,1,Rd"),
  source: from("3.10.2(2), Eq. (3.9)"),
  symbols: {
    tensionAreaMm2: ["A_nt", "mm2"],
    shearAreaMm2: ["A_nv", "mm2"],
    yieldMpa: ["f_y", "N/mm2"],
    ultimateMpa: ["f_u", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
    gammaM2: ["γ_M2", "1"],
  },
  result: ["V_eff,1,Rd", "N"],
  expression: "ultimateMpa * tensionAreaMm2 / gammaM2 + yieldMpa * shearAreaMm2 / (sqrt(3) * gammaM0)",
  evaluate: (g) =>
    (g.ultimateMpa * g.tensionAreaMm2) / g.gammaM2 +
    (g.yieldMpa * g.shearAreaMm2) / (Math.sqrt(3) * g.gammaM0),
  example: {
    given: {
      tensionAreaMm2: 500,
      shearAreaMm2: 1000,
      yieldMpa: 300,
      ultimateMpa: 500,
      gammaM0: 1,
      gammaM2: 1.25,
    },
    gives: 200_000 + 300_000 / Math.sqrt(3),
    relTol: 1e-12,
  },
});
