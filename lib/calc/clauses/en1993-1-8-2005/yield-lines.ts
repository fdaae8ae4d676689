import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

const m = ["m", "mm"] as const;
const e = ["e", "mm"] as const;
const pitch = ["p", "mm"] as const;
const end = ["e_1", "mm"] as const;
const stiffened = ["α m", "mm"] as const;

/** Circular pattern of a row alone, mm. Tables 6.4 to 6.6, inner row. */
export const circularMm = defineFormula({
  id: id("tables-6.4-6.6/row alone circular"),
  source: from("Tables 6.4, 6.5 and 6.6, inner bolt-row"),
  symbols: { mMm: m },
  result: ["l_eff,cp", "mm"],
  expression: "2 * pi * mMm",
  evaluate: (g) => 2 * Math.PI * g.mMm,
  example: { given: { mMm: 10 }, gives: 62.832, relTol: 1e-5 },
});

/** Other patterns of a row alone, mm. */
export const patternMm = defineFormula({
  id: id("tables-6.4-6.6/row alone non-circular"),
  source: from("Tables 6.4, 6.5 and 6.6, inner bolt-row"),
  symbols: { mMm: m, eMm: e },
  result: ["l_eff,nc", "mm"],
  expression: "4 * mMm + 1.25 * eMm",
  evaluate: (g) => 4 * g.mMm + 1.25 * g.eMm,
  example: { given: { mMm: 30, eMm: 40 }, gives: 170, relTol: 1e-12 },
});

/** Circular pattern of a row near the column's end, mm. Tables 6.4 and 6.5, end row. */
export const circularNearEndMm = defineFormula({
  id: id("table-6.4/end row circular"),
  source: from("Table 6.4, end bolt-row"),
  symbols: { mMm: m, endMm: end },
  result: ["l_eff,cp", "mm"],
  expression: "min(2 * pi * mMm, pi * mMm + 2 * endMm)",
  evaluate: (g) => Math.min(2 * Math.PI * g.mMm, Math.PI * g.mMm + 2 * g.endMm),
  example: { given: { mMm: 30, endMm: 40 }, gives: 30 * Math.PI + 80, relTol: 1e-12 },
});

/** Other patterns of a row near the column's end, mm. Table 6.4, end row. */
export const patternNearEndMm = defineFormula({
  id: id("table-6.4/end row non-circular"),
  source: from("Table 6.4, end bolt-row"),
  symbols: { mMm: m, eMm: e, endMm: end },
  result: ["l_eff,nc", "mm"],
  expression: "min(4 * mMm + 1.25 * eMm, 2 * mMm + 0.625 * eMm + endMm)",
  evaluate: (g) => Math.min(4 * g.mMm + 1.25 * g.eMm, 2 * g.mMm + 0.625 * g.eMm + g.endMm),
  example: { given: { mMm: 30, eMm: 40, endMm: 50 }, gives: 135, relTol: 1e-12 },
});

/**
 * alpha m, never taken below the same row's length without a stiffener, mm.
 * The figure stops at alpha = 8; below its left edge alpha m would fall under 4m + 1.25e, as if the stiffener weakened the flange.
 */
export const besideStiffenerMm = defineFormula({
  id: id("table-6.5/alpha m"),
  source: from(
    "Tables 6.5 and 6.6, row beside a stiffener or beam flange; lower bound 4m + 1.25e is this project's",
  ),
  symbols: { alpha: ["α", "1"], mMm: m, eMm: e },
  result: ["α m", "mm"],
  expression: "max(alpha * mMm, 4 * mMm + 1.25 * eMm)",
  evaluate: (g) => Math.max(g.alpha * g.mMm, 4 * g.mMm + 1.25 * g.eMm),
  example: { given: { alpha: 7, mMm: 30, eMm: 40 }, gives: 210, relTol: 1e-12 },
});

/** Non-circular length of an end row beside a stiffener, mm. Table 6.5, end row adjacent to a stiffener. */
export const besideStiffenerNearEndMm = defineFormula({
  id: id("table-6.5/end row beside stiffener"),
  source: from("Table 6.5, end bolt-row adjacent to a stiffener"),
  symbols: { stiffenedMm: stiffened, mMm: m, eMm: e, endMm: end },
  result: ["l_eff,nc", "mm"],
  expression: "min(stiffenedMm, endMm + stiffenedMm - (2 * mMm + 0.625 * eMm))",
  evaluate: (g) => Math.min(g.stiffenedMm, g.endMm + g.stiffenedMm - (2 * g.mMm + 0.625 * g.eMm)),
  example: { given: { stiffenedMm: 210, mMm: 30, eMm: 40, endMm: 50 }, gives: 175, relTol: 1e-12 },
});

/** Circular part of an inner row of a group, mm; unequal pitches count half each. */
export const groupInnerCircularMm = defineFormula({
  id: id("tables-6.4-6.6/group inner circular"),
  source: from("Tables 6.4, 6.5 and 6.6, inner bolt-row in a group (2p; half of each pitch)"),
  symbols: { beforeMm: ["p_above", "mm"], afterMm: ["p_below", "mm"] },
  result: ["l_eff,cp", "mm"],
  expression: "beforeMm + afterMm",
  evaluate: (g) => g.beforeMm + g.afterMm,
  example: { given: { beforeMm: 60, afterMm: 80 }, gives: 140, relTol: 1e-12 },
});

/** Other patterns of an inner row of a group, mm. */
export const groupInnerPatternMm = defineFormula({
  id: id("tables-6.4-6.6/group inner non-circular"),
  source: from("Tables 6.4, 6.5 and 6.6, inner bolt-row in a group (p; half of each pitch)"),
  symbols: { beforeMm: ["p_above", "mm"], afterMm: ["p_below", "mm"] },
  result: ["l_eff,nc", "mm"],
  expression: "(beforeMm + afterMm) / 2",
  evaluate: (g) => (g.beforeMm + g.afterMm) / 2,
  example: { given: { beforeMm: 60, afterMm: 80 }, gives: 70, relTol: 1e-12 },
});

/** Circular part of a group's first or last row, mm. */
export const groupEndCircularMm = defineFormula({
  id: id("tables-6.4-6.6/group end circular"),
  source: from("Tables 6.4, 6.5 and 6.6, end bolt-row and row beside a stiffener or beam flange, in a group"),
  symbols: { mMm: m, pitchMm: pitch },
  result: ["l_eff,cp", "mm"],
  expression: "pi * mMm + pitchMm",
  evaluate: (g) => Math.PI * g.mMm + g.pitchMm,
  example: { given: { mMm: 10, pitchMm: 60 }, gives: 91.416, relTol: 1e-5 },
});

/** Other patterns of a group's first or last row, mm. */
export const groupEndPatternMm = defineFormula({
  id: id("tables-6.4-6.6/group end non-circular"),
  source: from("Tables 6.4 and 6.6, other end bolt-row in a group"),
  symbols: { mMm: m, eMm: e, pitchMm: pitch },
  result: ["l_eff,nc", "mm"],
  expression: "2 * mMm + 0.625 * eMm + 0.5 * pitchMm",
  evaluate: (g) => 2 * g.mMm + 0.625 * g.eMm + 0.5 * g.pitchMm,
  example: { given: { mMm: 30, eMm: 40, pitchMm: 60 }, gives: 115, relTol: 1e-12 },
});

/** Circular part of a group's first or last row near the column's end, mm. Table 6.4. */
export const groupNearEndCircularMm = defineFormula({
  id: id("table-6.4/group end circular near column end"),
  source: from("Table 6.4, end bolt-row in a group"),
  symbols: { mMm: m, pitchMm: pitch, endMm: end },
  result: ["l_eff,cp", "mm"],
  expression: "min(pi * mMm + pitchMm, 2 * endMm + pitchMm)",
  evaluate: (g) => Math.min(Math.PI * g.mMm + g.pitchMm, 2 * g.endMm + g.pitchMm),
  example: { given: { mMm: 30, pitchMm: 60, endMm: 40 }, gives: 140, relTol: 1e-12 },
});

/** Other patterns of a group's first or last row near the column's end, mm. Table 6.4. */
export const groupNearEndPatternMm = defineFormula({
  id: id("table-6.4/group end non-circular near column end"),
  source: from("Table 6.4, end bolt-row in a group"),
  symbols: { mMm: m, eMm: e, pitchMm: pitch, endMm: end },
  result: ["l_eff,nc", "mm"],
  expression: "min(2 * mMm + 0.625 * eMm + 0.5 * pitchMm, endMm + 0.5 * pitchMm)",
  evaluate: (g) => Math.min(2 * g.mMm + 0.625 * g.eMm + 0.5 * g.pitchMm, g.endMm + 0.5 * g.pitchMm),
  example: { given: { mMm: 30, eMm: 40, pitchMm: 60, endMm: 40 }, gives: 70, relTol: 1e-12 },
});

/** Other patterns of a group's row beside a stiffener or beam flange, mm. Tables 6.5 and 6.6. */
export const groupBesideStiffenerMm = defineFormula({
  id: id("table-6.5/group beside stiffener"),
  source: from("Tables 6.5 and 6.6, row beside a stiffener or beam flange, in a group"),
  symbols: { stiffenedMm: stiffened, mMm: m, eMm: e, pitchMm: pitch },
  result: ["l_eff,nc", "mm"],
  expression: "0.5 * pitchMm + stiffenedMm - (2 * mMm + 0.625 * eMm)",
  evaluate: (g) => 0.5 * g.pitchMm + g.stiffenedMm - (2 * g.mMm + 0.625 * g.eMm),
  example: { given: { stiffenedMm: 210, mMm: 30, eMm: 40, pitchMm: 60 }, gives: 155, relTol: 1e-12 },
});

/** Circular patterns of the end plate's row outside the tension flange, mm. Table 6.6. */
export const extensionCircularMm = defineFormula({
  id: id("table-6.6/extension circular"),
  source: from("Table 6.6, bolt-row outside tension flange of beam"),
  symbols: { mxMm: ["m_x", "mm"], gaugeMm: ["w", "mm"], eMm: e },
  result: ["l_eff,cp", "mm"],
  expression: "min(2 * pi * mxMm, pi * mxMm + gaugeMm, pi * mxMm + 2 * eMm)",
  evaluate: (g) => Math.min(2 * Math.PI * g.mxMm, Math.PI * g.mxMm + g.gaugeMm, Math.PI * g.mxMm + 2 * g.eMm),
  example: { given: { mxMm: 30, gaugeMm: 100, eMm: 40 }, gives: 30 * Math.PI + 80, relTol: 1e-12 },
});

/** Other patterns of the end plate's row outside the tension flange, mm. Table 6.6. */
export const extensionPatternMm = defineFormula({
  id: id("table-6.6/extension non-circular"),
  source: from("Table 6.6, bolt-row outside tension flange of beam"),
  symbols: {
    mxMm: ["m_x", "mm"],
    exMm: ["e_x", "mm"],
    eMm: e,
    widthMm: ["b_p", "mm"],
    gaugeMm: ["w", "mm"],
  },
  result: ["l_eff,nc", "mm"],
  expression:
    "min(4 * mxMm + 1.25 * exMm, eMm + 2 * mxMm + 0.625 * exMm, 0.5 * widthMm, 0.5 * gaugeMm + 2 * mxMm + 0.625 * exMm)",
  evaluate: (g) =>
    Math.min(
      4 * g.mxMm + 1.25 * g.exMm,
      g.eMm + 2 * g.mxMm + 0.625 * g.exMm,
      0.5 * g.widthMm,
      0.5 * g.gaugeMm + 2 * g.mxMm + 0.625 * g.exMm,
    ),
  example: {
    given: { mxMm: 30, exMm: 40, eMm: 75, widthMm: 250, gaugeMm: 100 },
    gives: 125,
    relTol: 1e-12,
  },
});

/** Lever of a bolt about the web or flange it stands beside, mm. 6.2.4.1, Figure 6.2. */
export const leverMm = defineFormula({
  id: id("figure-6.2/m"),
  source: from("Figures 6.2, 6.8 and 6.10"),
  symbols: { clearMm: ["distance to face", "mm"], filletMm: ["r or √2 a", "mm"] },
  result: ["m", "mm"],
  expression: "clearMm - 0.8 * filletMm",
  evaluate: (g) => g.clearMm - 0.8 * g.filletMm,
  limitBroken: (g) => (g.clearMm - 0.8 * g.filletMm <= 0 ? "a bolt stands on a root radius or weld" : null),
  example: { given: { clearMm: 43.6, filletMm: 12.7 }, gives: 33.44, relTol: 1e-9 },
});
