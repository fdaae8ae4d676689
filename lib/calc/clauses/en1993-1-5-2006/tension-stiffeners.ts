import { defineFormula } from "../../trace/define-formula";

const source = {
  document: "SCI/BCSA P398",
  edition: "2013",
  ref: "tension stiffeners: the larger of the two rules; EN 1993-1-8 gives none",
} as const;

/** Force left to a tension stiffener once the web between the bolts' spread has taken its part, N. */
export const tensionStiffenerPlainN = defineFormula({
  id: "p398:2013/tension stiffener/web spread",
  source,
  symbols: {
    firstN: ["F_i", "N"],
    secondN: ["F_j", "N"],
    webLengthMm: ["L_wt", "mm"],
    webThicknessMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
  },
  result: ["F_s", "N"],
  expression: "max(0, firstN + secondN - webLengthMm * webThicknessMm * yieldMpa)",
  evaluate: (g) => Math.max(0, g.firstN + g.secondN - g.webLengthMm * g.webThicknessMm * g.yieldMpa),
  example: {
    given: { firstN: 400_000, secondN: 300_000, webLengthMm: 100, webThicknessMm: 10, yieldMpa: 275 },
    gives: 425_000,
    relTol: 1e-12,
  },
});

/** Force in a tension stiffener: that, or the rows' forces shared by their distances to web and stiffener, N. */
export const tensionStiffenerSharedN = defineFormula({
  id: "p398:2013/tension stiffener/shared",
  source,
  symbols: {
    plainN: ["F_s", "N"],
    mMm: ["m_1", "mm"],
    firstN: ["F_i", "N"],
    firstMm: ["m_2,i", "mm"],
    secondN: ["F_j", "N"],
    secondMm: ["m_2,j", "mm"],
  },
  result: ["F_s,Ed", "N"],
  expression: "max(plainN, mMm / (mMm + firstMm) * firstN + mMm / (mMm + secondMm) * secondN)",
  evaluate: (g) =>
    Math.max(g.plainN, (g.mMm / (g.mMm + g.firstMm)) * g.firstN + (g.mMm / (g.mMm + g.secondMm)) * g.secondN),
  example: {
    given: { plainN: 0, mMm: 30, firstN: 300_000, firstMm: 30, secondN: 200_000, secondMm: 10 },
    gives: 300_000,
    relTol: 1e-12,
  },
});
