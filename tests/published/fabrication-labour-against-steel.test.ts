/**
 * Ricker, Value engineering and steel economy, 1992; Steenhuis, Stark and Gresnigt, cost-effective
 * connections; common practice: with labour dear and steel cheap a slightly heavier column beats
 * stiffeners and web plates; with labour cheap and steel dear it is the other way round.
 */
import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { priceOfOption } from "@/lib/cost";
import {
  buildFabrication,
  buildNode,
  heavierColumn,
  pricesWithRates,
  stiffeners,
  webPlates,
} from "@/tests/factories/build-cost-case";

/** Every hour of a person at `labour` times its rate, every kilogram of plate and section at `steel` times its price. */
const cost = (measures: readonly MeasureCase[], labour: number, steel: number): number =>
  priceOfOption({
    node: buildNode(),
    measures,
    fabrication: buildFabrication(),
    prices: pricesWithRates((item, likely) => {
      if (item.startsWith("labour:")) return likely * labour;
      return item === "plate" || item === "section" ? likely * steel : likely;
    }),
  });

const WELDED: readonly (readonly [string, readonly MeasureCase[]])[] = [
  ["stiffeners at both levels", [stiffeners()]],
  ["web plates on both sides", [webPlates({ sides: 2 })]],
  ["stiffeners and a web plate", [stiffeners(), webPlates()]],
];

describe("a slightly heavier column", () => {
  it.each(WELDED)("beats %s where labour is dear and steel cheap", (_, measures) => {
    expect(cost([heavierColumn()], 2.5, 0.6)).toBeLessThan(cost(measures, 2.5, 0.6));
  });

  it.each(WELDED)("loses to %s where labour is cheap and steel dear", (_, measures) => {
    expect(cost([heavierColumn()], 0.15, 3)).toBeGreaterThan(cost(measures, 0.15, 3));
  });

  it.each(WELDED)("gains on %s with every rise of the labour rate", (_, measures) => {
    const lead = [0.5, 1, 1.5, 2, 3].map(
      (labour) => cost(measures, labour, 1) - cost([heavierColumn()], labour, 1),
    );
    lead.forEach((each, index) => expect(each).toBeGreaterThan(lead[index - 1] ?? Number.NEGATIVE_INFINITY));
  });
});
