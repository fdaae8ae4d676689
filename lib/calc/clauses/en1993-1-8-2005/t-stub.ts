import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Plastic moment of a T-stub flange over an effective length, Nmm. Table 6.2. */
export const tStubMomentNmm = defineFormula({
  id: id("table-6.2/M_pl,Rd"),
  source: from("Table 6.2"),
  symbols: {
    lengthMm: ["l_eff", "mm"],
    thicknessMm: ["t_f", "mm"],
    yieldMpa: ["f_y", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["M_pl,Rd", "Nmm"],
  expression: "0.25 * lengthMm * thicknessMm^2 * yieldMpa / gammaM0",
  evaluate: (g) => (0.25 * g.lengthMm * g.thicknessMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
  example: {
    given: { lengthMm: 200, thicknessMm: 20, yieldMpa: 265, gammaM0: 1 },
    gives: 5_300_000,
    relTol: 1e-12,
  },
});

const modeOneSymbols = {
  momentNmm: ["M_pl,1,Rd", "Nmm"],
  mMm: ["m", "mm"],
} as const;

/** Mode 1, complete yielding of the flange, method 1, N. Table 6.2. */
export const modeOneSimpleN = defineFormula({
  id: id("table-6.2/F_T,1,Rd method 1"),
  source: from("Table 6.2, method 1"),
  symbols: modeOneSymbols,
  result: ["F_T,1,Rd", "N"],
  expression: "4 * momentNmm / mMm",
  evaluate: (g) => (4 * g.momentNmm) / g.mMm,
  example: { given: { momentNmm: 1_000_000, mMm: 40 }, gives: 100_000, relTol: 1e-12 },
});

/** Mode 1 by method 2: the bolt force spread under its head, N. Table 6.2. */
export const modeOneN = defineFormula({
  id: id("table-6.2/F_T,1,Rd method 2"),
  source: from("Table 6.2, method 2"),
  symbols: { ...modeOneSymbols, nMm: ["n", "mm"], headMm: ["e_w", "mm"] },
  result: ["F_T,1,Rd", "N"],
  expression: "(8 * nMm - 2 * headMm) * momentNmm / (2 * mMm * nMm - headMm * (mMm + nMm))",
  evaluate: (g) =>
    ((8 * g.nMm - 2 * g.headMm) * g.momentNmm) / (2 * g.mMm * g.nMm - g.headMm * (g.mMm + g.nMm)),
  limitBroken: (g) =>
    2 * g.mMm * g.nMm - g.headMm * (g.mMm + g.nMm) <= 0
      ? "2 m n does not exceed e_w (m + n): mode 1 cannot occur"
      : null,
  example: {
    given: { momentNmm: 1_000_000, mMm: 40, nMm: 50, headMm: 10 },
    gives: (380 * 1_000_000) / (4000 - 900),
    relTol: 1e-12,
  },
});

/** Plastic moment of a backing plate over the length that it backs, Nmm. Table 6.2. */
export const backingMomentNmm = defineFormula({
  id: id("table-6.2/M_bp,Rd"),
  source: from("Table 6.2"),
  symbols: {
    lengthMm: ["l_eff,1", "mm"],
    thicknessMm: ["t_bp", "mm"],
    yieldMpa: ["f_y,bp", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["M_bp,Rd", "Nmm"],
  expression: "0.25 * lengthMm * thicknessMm^2 * yieldMpa / gammaM0",
  evaluate: (g) => (0.25 * g.lengthMm * g.thicknessMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
  example: {
    given: { lengthMm: 200, thicknessMm: 10, yieldMpa: 275, gammaM0: 1 },
    gives: 1_375_000,
    relTol: 1e-12,
  },
});

const backedSymbols = { ...modeOneSymbols, backingNmm: ["M_bp,Rd", "Nmm"] } as const;

/** Mode 1 with backing plates, method 1, N. Table 6.2. */
export const modeOneBackedSimpleN = defineFormula({
  id: id("table-6.2/F_T,1,Rd method 1 with backing plates"),
  source: from("Table 6.2, method 1 with backing plates"),
  symbols: backedSymbols,
  result: ["F_T,1,Rd", "N"],
  expression: "(4 * momentNmm + 2 * backingNmm) / mMm",
  evaluate: (g) => (4 * g.momentNmm + 2 * g.backingNmm) / g.mMm,
  example: {
    given: { momentNmm: 1_000_000, mMm: 40, backingNmm: 500_000 },
    gives: 125_000,
    relTol: 1e-12,
  },
});

/** Mode 1 with backing plates by method 2, N. Table 6.2. */
export const modeOneBackedN = defineFormula({
  id: id("table-6.2/F_T,1,Rd method 2 with backing plates"),
  source: from("Table 6.2, method 2 with backing plates"),
  symbols: { ...backedSymbols, nMm: ["n", "mm"], headMm: ["e_w", "mm"] },
  result: ["F_T,1,Rd", "N"],
  expression:
    "((8 * nMm - 2 * headMm) * momentNmm + 4 * nMm * backingNmm) / (2 * mMm * nMm - headMm * (mMm + nMm))",
  evaluate: (g) =>
    ((8 * g.nMm - 2 * g.headMm) * g.momentNmm + 4 * g.nMm * g.backingNmm) /
    (2 * g.mMm * g.nMm - g.headMm * (g.mMm + g.nMm)),
  limitBroken: (g) =>
    2 * g.mMm * g.nMm - g.headMm * (g.mMm + g.nMm) <= 0
      ? "2 m n does not exceed e_w (m + n): mode 1 cannot occur"
      : null,
  example: {
    given: { momentNmm: 1_000_000, mMm: 40, backingNmm: 500_000, nMm: 50, headMm: 10 },
    gives: (380 * 1_000_000 + 200 * 500_000) / (4000 - 900),
    relTol: 1e-12,
  },
});

/** Mode 2, bolt failure with yielding of the flange, N. Table 6.2. */
export const modeTwoN = defineFormula({
  id: id("table-6.2/F_T,2,Rd"),
  source: from("Table 6.2"),
  symbols: {
    momentNmm: ["M_pl,2,Rd", "Nmm"],
    mMm: ["m", "mm"],
    nMm: ["n", "mm"],
    boltsN: ["ΣF_t,Rd", "N"],
  },
  result: ["F_T,2,Rd", "N"],
  expression: "(2 * momentNmm + nMm * boltsN) / (mMm + nMm)",
  evaluate: (g) => (2 * g.momentNmm + g.nMm * g.boltsN) / (g.mMm + g.nMm),
  example: {
    given: { momentNmm: 1_000_000, mMm: 40, nMm: 60, boltsN: 400_000 },
    gives: 260_000,
    relTol: 1e-12,
  },
});

/** Mode 3, bolt failure, N: the smaller of bolt tension and punching, times the number of bolts. Table 6.2 and 3.11(2). */
export const modeThreeN = defineFormula({
  id: id("table-6.2/F_T,3,Rd"),
  source: from("Table 6.2; Table 3.4 for punching"),
  symbols: { count: ["n_bolts", "1"], tensionN: ["F_t,Rd", "N"], punchingN: ["B_p,Rd", "N"] },
  result: ["F_T,3,Rd", "N"],
  expression: "count * min(tensionN, punchingN)",
  evaluate: (g) => g.count * Math.min(g.tensionN, g.punchingN),
  example: { given: { count: 2, tensionN: 203_000, punchingN: 400_000 }, gives: 406_000, relTol: 1e-12 },
});

/** The least of the three modes, N. 6.2.4.1(6). */
export const tStubN = defineFormula({
  id: id("6.2.4/F_T,Rd"),
  source: from("6.2.4.1(6)"),
  symbols: { oneN: ["F_T,1,Rd", "N"], twoN: ["F_T,2,Rd", "N"], threeN: ["F_T,3,Rd", "N"] },
  result: ["F_T,Rd", "N"],
  expression: "min(oneN, twoN, threeN)",
  evaluate: (g) => Math.min(g.oneN, g.twoN, g.threeN),
  example: { given: { oneN: 3, twoN: 2, threeN: 4 }, gives: 2, relTol: 1e-12 },
});

/** The lesser of modes 2 and 3 where mode 1 cannot occur, N. */
export const tStubWithoutModeOneN = defineFormula({
  id: id("6.2.4/F_T,Rd without mode 1"),
  source: from("6.2.4.1(6)"),
  symbols: { twoN: ["F_T,2,Rd", "N"], threeN: ["F_T,3,Rd", "N"] },
  result: ["F_T,Rd", "N"],
  expression: "min(twoN, threeN)",
  evaluate: (g) => Math.min(g.twoN, g.threeN),
  example: { given: { twoN: 2, threeN: 4 }, gives: 2, relTol: 1e-12 },
});

/** Bolt length up to which prying forces develop, mm. Table 6.2, from memory. */
export const pryingLengthMm = defineFormula({
  id: id("table-6.2/L_b*"),
  source: from("Table 6.2, L_b* (from memory)"),
  symbols: {
    mMm: ["m", "mm"],
    stressAreaMm2: ["A_s", "mm2"],
    rows: ["n_b", "1"],
    lengthMm: ["Σl_eff,1", "mm"],
    thicknessMm: ["t_f", "mm"],
  },
  result: ["L_b*", "mm"],
  expression: "8.8 * mMm^3 * stressAreaMm2 * rows / (lengthMm * thicknessMm^3)",
  evaluate: (g) => (8.8 * g.mMm ** 3 * g.stressAreaMm2 * g.rows) / (g.lengthMm * g.thicknessMm ** 3),
  example: {
    given: { mMm: 40, stressAreaMm2: 200, rows: 1, lengthMm: 160, thicknessMm: 10 },
    gives: 704,
    relTol: 1e-12,
  },
});
