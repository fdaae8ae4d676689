import { defineFormula } from "../../trace/define-formula";
import { defineSeries, sumText } from "../../trace/define-series";
import { from, id } from "./source";

const numbered = (
  count: number,
  names: Readonly<Record<string, readonly [string, string]>>,
): Record<string, readonly [string, string]> =>
  Object.fromEntries(
    Object.entries(names).flatMap(([key, [symbol, unit]]) =>
      Array.from({ length: count }, (_, index) => [
        `${key}${index + 1}`,
        [`${symbol}${symbol.includes("_") ? "," : "_"}${index + 1}`, unit] as const,
      ]),
    ),
  );

const sumOfProducts = (a: readonly number[], b: readonly number[]): number =>
  a.reduce((sum, value, index) => sum + value * (b[index] ?? NaN), 0);

/** Design moment resistance of a bolted joint, Nmm. 6.2.7.2(1), Eq. (6.25). */
export const boltedMomentNmm = defineSeries({
  terms: ["leverMm", "forceN"],
  exampleCount: 2,
  evaluate: ({ leverMm, forceN }) => sumOfProducts(leverMm, forceN),
  build: (count) => ({
    id: id("6.2.7.2/M_j,Rd"),
    source: from("6.2.7.2(1), Eq. (6.25)"),
    symbols: numbered(count, { leverMm: ["h", "mm"], forceN: ["F_tr,Rd", "N"] }),
    result: ["M_j,Rd", "Nmm"],
    expression: sumText(count, (n) => `leverMm${n} * forceN${n}`),
  }),
  example: { given: { leverMm: [500, 400], forceN: [300_000, 200_000] }, gives: 230e6, relTol: 1e-12 },
});

/** Design moment resistance of a welded joint, Nmm. 6.2.7.1. */
export const weldedMomentNmm = defineFormula({
  id: id("6.2.7.1/M_j,Rd"),
  source: from("6.2.7.1"),
  symbols: { leverMm: ["z", "mm"], forceN: ["F_Rd", "N"] },
  result: ["M_j,Rd", "Nmm"],
  expression: "leverMm * forceN",
  evaluate: (g) => g.leverMm * g.forceN,
  example: { given: { leverMm: 300, forceN: 400_000 }, gives: 120e6, relTol: 1e-12 },
});

/** Effective length of a group as the sum of its rows' parts, mm. 6.2.4.1(10), Tables 6.4 to 6.6. */
export const groupLengthMm = defineSeries({
  terms: ["partMm"],
  exampleCount: 2,
  evaluate: ({ partMm }) => partMm.reduce((sum, part) => sum + part, 0),
  build: (count) => ({
    id: id("6.2.4.1/group length"),
    source: from("Tables 6.4, 6.5 and 6.6, bolt-rows considered as part of a group"),
    symbols: numbered(count, { partMm: ["l_eff", "mm"] }),
    result: ["Σ l_eff", "mm"],
    expression: sumText(count, (n) => `partMm${n}`),
  }),
  example: { given: { partMm: [155, 115] }, gives: 270, relTol: 1e-12 },
});

/** One row's resistance, N: the least of the parts around it alone and of what each group leaves it. 6.2.7.2(6) and (8). */
export const rowForceN = defineSeries({
  terms: ["partN"],
  exampleCount: 3,
  evaluate: ({ partN }) => Math.max(0, Math.min(...partN)),
  build: (count) => ({
    id: id("6.2.7.2/F_tr,Rd"),
    source: from("6.2.7.2(6) to (8)"),
    symbols: numbered(count, { partN: ["F_tr,Rd", "N"] }),
    result: ["F_tr,Rd", "N"],
    expression: `max(0, min(${Array.from({ length: count }, (_, index) => `partN${index + 1}`).join(", ")}))`,
  }),
  example: { given: { partN: [320_000, 410_000, 377_000] }, gives: 320_000, relTol: 1e-12 },
});

/** Stiffness of a tension row: its springs in series, mm. 6.3.3.1(2), Eq. (6.30). */
export const rowSpringMm = defineSeries({
  terms: ["springMm"],
  exampleCount: 2,
  evaluate: ({ springMm }) => 1 / springMm.reduce((sum, spring) => sum + 1 / spring, 0),
  build: (count) => ({
    id: id("6.3.3.1/k_eff,r"),
    source: from("6.3.3.1(2), Eq. (6.30)"),
    symbols: numbered(count, { springMm: ["k", "mm"] }),
    result: ["k_eff,r", "mm"],
    expression: `1 / (${sumText(count, (n) => `1 / springMm${n}`)})`,
  }),
  example: { given: { springMm: [4, 4] }, gives: 2, relTol: 1e-12 },
});

/** Equivalent lever arm of several rows, mm. 6.3.3.1(3), Eq. (6.31). */
export const equivalentLeverMm = defineSeries({
  terms: ["springMm", "leverMm"],
  exampleCount: 2,
  evaluate: ({ springMm, leverMm }) =>
    sumOfProducts(
      springMm,
      leverMm.map((lever) => lever * lever),
    ) / sumOfProducts(springMm, leverMm),
  build: (count) => ({
    id: id("6.3.3.1/z_eq"),
    source: from("6.3.3.1(3), Eq. (6.31)"),
    symbols: numbered(count, { springMm: ["k_eff", "mm"], leverMm: ["h", "mm"] }),
    result: ["z_eq", "mm"],
    expression: `(${sumText(count, (n) => `springMm${n} * leverMm${n}^2`)}) / (${sumText(count, (n) => `springMm${n} * leverMm${n}`)})`,
  }),
  example: { given: { springMm: [2, 2], leverMm: [500, 400] }, gives: 410_000 / 900, relTol: 1e-12 },
});

/** Equivalent stiffness of several rows, mm. 6.3.3.1(1), Eq. (6.29). */
export const equivalentSpringMm = defineSeries({
  terms: ["springMm", "leverMm"],
  exampleCount: 2,
  evaluate: ({ springMm, leverMm }) =>
    sumOfProducts(springMm, leverMm) ** 2 /
    sumOfProducts(
      springMm,
      leverMm.map((lever) => lever * lever),
    ),
  build: (count) => ({
    id: id("6.3.3.1/k_eq"),
    source: from("6.3.3.1(1), Eq. (6.29) with z_eq of Eq. (6.31)"),
    symbols: numbered(count, { springMm: ["k_eff", "mm"], leverMm: ["h", "mm"] }),
    result: ["k_eq", "mm"],
    expression: `(${sumText(count, (n) => `springMm${n} * leverMm${n}`)})^2 / (${sumText(count, (n) => `springMm${n} * leverMm${n}^2`)})`,
  }),
  example: {
    given: { springMm: [2, 2], leverMm: [500, 400] },
    gives: (1800 * 1800) / 820_000,
    relTol: 1e-12,
  },
});

/** Flexibility of the joint's springs together, 1/mm. 6.3.1(4), Eq. (6.27). */
export const springFlexibilityPerMm = defineSeries({
  terms: ["springMm"],
  exampleCount: 2,
  evaluate: ({ springMm }) => springMm.reduce((sum, spring) => sum + 1 / spring, 0),
  build: (count) => ({
    id: id("6.3.1/sum of springs"),
    source: from("6.3.1(4), Eq. (6.27)"),
    symbols: numbered(count, { springMm: ["k", "mm"] }),
    result: ["Σ 1/k", "1/mm"],
    expression: sumText(count, (n) => `1 / springMm${n}`),
  }),
  example: { given: { springMm: [4, 4] }, gives: 0.5, relTol: 1e-12 },
});
