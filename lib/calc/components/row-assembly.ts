import { rowForceN } from "../clauses/en1993-1-8-2005/assembly";
import { defineFormula } from "../trace/define-formula";
import { defineSeries, sumText } from "../trace/define-series";
import { traced, type Traced } from "../trace/traced";
import type { BoltRow } from "./connection-view";
import type { RowFamilyLimits } from "./row-groups";

const document = { document: "EN 1993-1-8", edition: "2005" } as const;

const leftByGroupN = defineSeries({
  terms: ["takenN"],
  exampleCount: 2,
  // The first term is the group's resistance, the others what its earlier rows have taken.
  evaluate: ({ takenN }) => takenN.slice(1).reduce((left, taken) => left - taken, takenN[0] ?? NaN),
  build: (count) => ({
    id: "en1993-1-8:2005/6.2.7.2/left by group",
    source: { ...document, ref: "6.2.7.2(8)" },
    symbols: Object.fromEntries(
      Array.from({ length: count }, (_, index) => [
        `takenN${index + 1}`,
        [index === 0 ? "F_group,Rd" : `F_t${index},Rd`, "N"] as const,
      ]),
    ),
    result: ["F_tr,Rd", "N"],
    expression: count === 1 ? "takenN1" : `takenN1 - (${sumText(count - 1, (n) => `takenN${n + 1}`)})`,
  }),
  example: { given: { takenN: [700_000, 377_000] }, gives: 323_000, relTol: 1e-12 },
});

const triangularN = defineFormula({
  id: "en1993-1-8:2005/6.2.7.2/triangular limit",
  source: { ...document, ref: "6.2.7.2(9), Eq. (6.26)" },
  symbols: { earlierN: ["F_tx,Rd", "N"], leverMm: ["h_r", "mm"], earlierLeverMm: ["h_x", "mm"] },
  result: ["F_tr,Rd", "N"],
  expression: "earlierN * leverMm / earlierLeverMm",
  evaluate: (g) => (g.earlierN * g.leverMm) / g.earlierLeverMm,
  example: { given: { earlierN: 400_000, leverMm: 400, earlierLeverMm: 500 }, gives: 320_000, relTol: 1e-12 },
});

const leftByEquilibriumN = defineFormula({
  id: "en1993-1-8:2005/6.2.7.2/equilibrium",
  source: { ...document, ref: "6.2.7.2(7)" },
  symbols: {
    forceN: ["F_tr,Rd", "N"],
    limitN: ["limit of ΣF_t,Rd", "N"],
    aboveN: ["ΣF_t,Rd of the rows before", "N"],
  },
  result: ["F_tr,Rd", "N"],
  expression: "max(0, min(forceN, limitN - aboveN))",
  evaluate: (g) => Math.max(0, Math.min(g.forceN, g.limitN - g.aboveN)),
  example: { given: { forceN: 300, limitN: 841, aboveN: 697 }, gives: 144, relTol: 1e-12 },
});

/** Share of a row's two bolts above which rows further in follow a straight line. 6.2.7.2(9). */
const NEAR_BOLT_FAILURE = 1.9;

export interface AssembledRows {
  readonly forces: readonly Traced[];
  readonly totalN: number;
}

/**
 * Forces of the tension rows at the joint's resistance, from the furthest row down.
 * EN 1993-1-8:2005, 6.2.7.2(6) to (9).
 *
 * @param limitN - what the rows may add up to: compression zones and panel, N.
 * @param hasTriangularLimit - whether a row close to the failure of its bolts bounds the rows below it, (9).
 */
export function assembleRows(
  rows: readonly BoltRow[],
  families: readonly RowFamilyLimits[],
  limitN: number,
  hasTriangularLimit: boolean,
  steps: boolean,
): AssembledRows {
  const free: Traced[] = [];
  rows.forEach((row, index) => {
    free.push(
      traced(steps, (trace) => {
        const partN: number[] = [];
        for (const family of families) {
          const alone = family.alone[index];
          if (alone) {
            trace?.include(alone.step);
            partN.push(alone.value);
          }
          for (const group of family.groupsEndingAt[index] ?? []) {
            const mark = trace?.mark();
            trace?.include(group.limit.step);
            const takenN = [group.limit.value];
            for (let place = group.first; place < index; place += 1) takenN.push(free[place]?.value ?? NaN);
            partN.push(leftByGroupN(trace, { takenN }, mark));
          }
        }
        free.forEach((earlier, place) => {
          const before = rows[place];
          if (
            hasTriangularLimit &&
            before &&
            earlier.value > NEAR_BOLT_FAILURE * before.fastener.tension.value
          ) {
            partN.push(
              triangularN(trace, {
                earlierN: earlier.value,
                leverMm: row.leverMm,
                earlierLeverMm: before.leverMm,
              }),
            );
          }
        });
        return rowForceN(trace, { partN }, 0);
      }),
    );
  });
  let aboveN = 0;
  const forces = free.map((force) => {
    const before = aboveN;
    const kept =
      before + force.value <= limitN
        ? force
        : traced(steps, (trace) => {
            trace?.include(force.step);
            return leftByEquilibriumN(trace, { forceN: force.value, limitN, aboveN: before }, 0);
          });
    aboveN += kept.value;
    return kept;
  });
  return { forces, totalN: aboveN };
}
