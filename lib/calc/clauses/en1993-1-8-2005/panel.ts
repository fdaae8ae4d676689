import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

/** Transformation parameter of a joint from its own moment and the other side's. 5.3(9), Eq. (5.4). */
export const betaOf = defineFormula({
  id: id("5.3/beta"),
  source: from("5.3(9), Eq. (5.4a) and (5.4b)"),
  symbols: { ownNmm: ["M_j,Ed", "Nmm"], otherNmm: ["M_j,Ed other side", "Nmm"] },
  result: ["β", "1"],
  expression: "min(abs(1 - otherNmm / ownNmm), 2)",
  evaluate: (g) => Math.min(Math.abs(1 - g.otherNmm / g.ownNmm), 2),
  example: { given: { ownNmm: 200, otherNmm: -100 }, gives: 1.5, relTol: 1e-12 },
});

/** Design shear force in the panel, N. 5.3(3), Eq. (5.3). Levers of each side's own. */
export const panelShearForceN = defineFormula({
  id: id("5.3/V_wp,Ed"),
  source: from("5.3(3), Eq. (5.3)"),
  symbols: {
    leftNmm: ["M_left,Ed", "Nmm"],
    leftLeverMm: ["z_left", "mm"],
    rightNmm: ["M_right,Ed", "Nmm"],
    rightLeverMm: ["z_right", "mm"],
    aboveN: ["V_above,Ed", "N"],
    belowN: ["V_below,Ed", "N"],
  },
  result: ["V_wp,Ed", "N"],
  expression: "leftNmm / leftLeverMm - rightNmm / rightLeverMm - (aboveN - belowN) / 2",
  evaluate: (g) => g.leftNmm / g.leftLeverMm - g.rightNmm / g.rightLeverMm - (g.aboveN - g.belowN) / 2,
  example: {
    given: {
      leftNmm: 2e8,
      leftLeverMm: 400,
      rightNmm: 1e8,
      rightLeverMm: 400,
      aboveN: 20_000,
      belowN: -20_000,
    },
    gives: 230_000,
    relTol: 1e-12,
  },
});

/** Most that the rows may add up to before the panel yields, N. 6.2.7.2(7). */
export const panelLimitOnRowsN = defineFormula({
  id: id("6.2.7.2/V_wp,Rd over beta"),
  source: from("6.2.7.2(7)"),
  symbols: { panelN: ["V_wp,Rd", "N"], beta: ["β", "1"] },
  result: ["ΣF_t,Rd,max", "N"],
  expression: "panelN / beta",
  evaluate: (g) => g.panelN / g.beta,
  example: { given: { panelN: 500_000, beta: 2 }, gives: 250_000, relTol: 1e-12 },
});
