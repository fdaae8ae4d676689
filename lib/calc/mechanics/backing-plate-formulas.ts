import { defineFormula } from "../trace/define-formula";

const choice = "this project's choice where EN 1993-1-8 6.2.4.3 and Table 6.2 leave room";

/** Part of a yield pattern that a plate stands behind, mm: it ends no later than plate or pattern, above and below. */
export const backedLengthMm = defineFormula({
  id: "backing-plates/backed length",
  source: {
    document: "SCI/BCSA P398",
    edition: "2013",
    ref: `a plate shorter than the pattern: its length for flange and plate; ${choice}: on each side by itself`,
  },
  symbols: {
    lengthMm: ["l_eff,1", "mm"],
    spanMm: ["between the outer rows", "mm"],
    beforeMm: ["plate before the first row", "mm"],
    afterMm: ["plate beyond the last row", "mm"],
  },
  result: ["l_bp", "mm"],
  expression: "spanMm + min((lengthMm - spanMm) / 2, beforeMm) + min((lengthMm - spanMm) / 2, afterMm)",
  evaluate: (g) =>
    g.spanMm +
    Math.min((g.lengthMm - g.spanMm) / 2, g.beforeMm) +
    Math.min((g.lengthMm - g.spanMm) / 2, g.afterMm),
  example: {
    given: { lengthMm: 300, spanMm: 100, beforeMm: 60, afterMm: 150 },
    gives: 100 + 60 + 100,
    relTol: 1e-12,
  },
});

/** The same beside a stiffener, where pattern and plate both end, mm. */
export const backedFromStiffenerMm = defineFormula({
  id: "backing-plates/backed length beside a stiffener",
  source: {
    document: "SCI/BCSA P398",
    edition: "2013",
    ref: `a plate shorter than the pattern: its length for flange and plate; ${choice}: both begin at the stiffener`,
  },
  symbols: { lengthMm: ["l_eff,1", "mm"], pieceMm: ["piece of plate", "mm"] },
  result: ["l_bp", "mm"],
  expression: "min(lengthMm, pieceMm)",
  evaluate: (g) => Math.min(g.lengthMm, g.pieceMm),
  example: { given: { lengthMm: 300, pieceMm: 180 }, gives: 180, relTol: 1e-12 },
});

/** Mode 1 of a backed flange, N: a plate that backs too little of the pattern takes nothing away. */
export const modeOneWithPlateN = defineFormula({
  id: "backing-plates/F_T,1,Rd",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: `Table 6.2 without and with backing plates; ${choice}: the larger`,
  },
  symbols: { plainN: ["F_T,1,Rd without", "N"], backedN: ["F_T,1,Rd with", "N"] },
  result: ["F_T,1,Rd", "N"],
  expression: "max(plainN, backedN)",
  evaluate: (g) => Math.max(g.plainN, g.backedN),
  example: { given: { plainN: 300_000, backedN: 350_000 }, gives: 350_000, relTol: 1e-12 },
});
