import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CRITERIA, paretoFront, scoreOptions, type Criterion, type Judged } from "@/lib/ranking/criteria";

const judged = (key: string, values: Partial<Record<Criterion, number>>): Judged => ({
  key,
  values: {
    cost: 0,
    "shop-time": 0,
    "site-time": 0,
    reserve: 0,
    stiffness: 0,
    mass: 0,
    carbon: 0,
    ...values,
  },
});

describe("paretoFront", () => {
  it("keeps the cheap and the stiff one and drops the one that is worse than another in both", () => {
    const options = [
      judged("cheap", { cost: 100, stiffness: 50 }),
      judged("stiff", { cost: 300, stiffness: 90 }),
      judged("beaten", { cost: 310, stiffness: 80 }),
    ];
    expect(paretoFront(options, ["cost", "stiffness"])).toEqual(["cheap", "stiff"]);
  });

  it("keeps options that are equal in everything", () => {
    expect(paretoFront([judged("a", {}), judged("b", {})], CRITERIA)).toEqual(["a", "b"]);
  });

  it("is never empty and always holds the best of a single criterion", () => {
    const values = fc.record(
      Object.fromEntries(CRITERIA.map((c) => [c, fc.integer({ min: 0, max: 9 })])) as Record<
        Criterion,
        fc.Arbitrary<number>
      >,
    );
    fc.assert(
      fc.property(fc.array(values, { minLength: 1, maxLength: 10 }), (drawn) => {
        const options = drawn.map((one, index) => judged(String(index), one));
        const front = paretoFront(options, CRITERIA);
        const cheapest = Math.min(...options.map((one) => one.values.cost));
        expect(options.some((one) => one.values.cost === cheapest && front.includes(one.key))).toBe(true);
      }),
    );
  });
});

describe("scoreOptions", () => {
  const options = [
    judged("a", { cost: 100, reserve: 0.1 }),
    judged("b", { cost: 300, reserve: 0.5 }),
    judged("c", { cost: 200, reserve: 0.2 }),
  ];

  it("stretches each criterion over its range and weighs it, less cost and more reserve being better", () => {
    const scores = scoreOptions(options, { cost: 3, reserve: 1 });
    // a: 3/4 x 1 + 1/4 x 0; b: 3/4 x 0 + 1/4 x 1; c: 3/4 x 1/2 + 1/4 x (0.2 - 0.1) / (0.5 - 0.1)
    expect(scores.map(({ score }) => score)).toEqual([
      expect.closeTo(3 / 4, 12),
      expect.closeTo(1 / 4, 12),
      expect.closeTo((3 / 4) * (1 / 2) + (1 / 4) * (1 / 4), 12),
    ]);
  });

  it("counts a criterion in which all are equal as 1 for each", () => {
    expect(scoreOptions(options, { mass: 2 }).map(({ score }) => score)).toEqual([1, 1, 1]);
  });

  it("refuses a negative weight and no weight at all", () => {
    expect(() => scoreOptions(options, { cost: -1 })).toThrow(RangeError);
    expect(() => scoreOptions(options, {})).toThrow(RangeError);
  });
});
