import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rankOptions, type RankedInput } from "@/lib/ranking/rank-options";

const option = (key: string, costMinor: number, more: Partial<RankedInput> = {}): RankedInput => ({
  key,
  passes: true,
  outsideScope: false,
  costMinor,
  shopMinutes: 60,
  ...more,
});

describe("rankOptions", () => {
  it("ranks by cost and answers in the order given", () => {
    const ranks = rankOptions([option("b", 300), option("a", 100), option("c", 200)]);
    expect(ranks.map(({ key, rank }) => [key, rank])).toEqual([
      ["b", 3],
      ["a", 1],
      ["c", 2],
    ]);
  });

  it("takes the shorter shop time at equal cost and shares the rank when that is equal too", () => {
    const ranks = rankOptions([
      option("slow", 100, { shopMinutes: 90 }),
      option("one", 100, { shopMinutes: 30 }),
      option("other", 100, { shopMinutes: 30 }),
    ]);
    expect(ranks.map(({ rank }) => rank)).toEqual([3, 1, 1]);
  });

  it("leaves out what fails, what is outside scope, what is set aside and what the shop cannot make, and says so", () => {
    const ranks = rankOptions([
      option("fails", 0, { passes: false }),
      option("outside", 0, { passes: false, outsideScope: true, excluded: true }),
      option("aside", 0, { excluded: true }),
      option("cannot", 0, { shopCannot: "gap under 100 mm" }),
      option("good", 500),
    ]);
    expect(ranks.map(({ rank, notRanked }) => rank ?? notRanked)).toEqual([
      "fails",
      "outside scope",
      "excluded",
      "shop cannot: gap under 100 mm",
      1,
    ]);
  });

  it("never ranks a dearer option before a cheaper one", () => {
    const anyOption = fc.record({
      passes: fc.boolean(),
      outsideScope: fc.boolean(),
      excluded: fc.boolean(),
      costMinor: fc.integer({ min: -500, max: 500 }),
      shopMinutes: fc.integer({ min: 0, max: 5 }),
    });
    fc.assert(
      fc.property(fc.array(anyOption, { maxLength: 12 }), (drawn) => {
        const options = drawn.map((one, index) => ({ key: String(index), ...one }));
        const ranked = rankOptions(options).map(({ rank }, index) => ({ rank, option: options[index]! }));
        for (const a of ranked) {
          const mayStand = a.option.passes && !a.option.outsideScope && !a.option.excluded;
          expect(a.rank !== null).toBe(mayStand);
          for (const b of ranked) {
            if (a.rank !== null && b.rank !== null && a.rank < b.rank) {
              expect(a.option.costMinor).toBeLessThanOrEqual(b.option.costMinor);
            }
          }
        }
      }),
    );
  });
});
