/** Guards what a comparison shows: ranks without the options set aside, and no money to whom it is not shown. */
import { describe, expect, it } from "vitest";
import {
  differencesBetween,
  hideMoney,
  presentComparison,
  rankWithout,
  SET_ASIDE,
} from "@/lib/presenters/present-comparison";
import { ComparisonReply } from "@/lib/schemas/comparison";
import type { OptionDocument } from "@/lib/schemas/result-document";
import { buildResultDocument } from "@/tests/factories/build-result-document";

const result = buildResultDocument();
const ranks = (options: readonly OptionDocument[]): Record<string, number | null> =>
  Object.fromEntries(options.map((option) => [option.key, option.rank]));
const view = { excluded: [], seesMoney: true, outdated: [] };

const record = {
  id: "0b0f6f0e-54a1-4a52-8d2f-6f4a30a0e1a1",
  nodeId: "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6d",
  nodeVersion: 3,
  engine: result.engine,
  pricesKey: "Rates of November, version 2 #id-1; Shop times, version 1 #id-2",
  catalogKey: "c",
  result,
  createdBy: { id: "9a1c5a52-93a9-4a36-8f2b-0d6a6a2b7b11", name: "Maren Oake" },
  createdAt: new Date("2026-11-30T12:00:00Z"),
};

describe("options set aside", () => {
  it("lose their rank and the others close up, without a gap and in the same order", () => {
    expect(ranks(rankWithout(result.options, []))).toEqual(ranks(result.options));
    const without = rankWithout(result.options, ["bars-stiffeners"]);
    expect(ranks(without)).toMatchObject({ "bars-stiffeners": null, stiffeners: 1, heavier: 2, bare: null });
    expect(without.find((option) => option.key === "bars-stiffeners")?.notRanked).toBe(SET_ASIDE);
  });

  it("keep their figures, and an option that did not rank keeps its own reason", () => {
    const without = rankWithout(result.options, ["bare", "stiffeners"]);
    const bare = result.options.find((option) => option.key === "bare");
    expect(without.find((option) => option.key === "bare")).toEqual(bare);
    const before = result.options.find((option) => option.key === "stiffeners");
    const after = without.find((option) => option.key === "stiffeners");
    expect({ ...after, rank: 0, notRanked: "" }).toEqual({ ...before, rank: 0, notRanked: "" });
  });
});

describe("a comparison for whom money is not shown", () => {
  const hidden = hideMoney(result.options);

  it("has an index in place of every cost, the cheapest that costs anything being 100", () => {
    const costs = Object.fromEntries(
      hidden.flatMap((option) => ("estimate" in option ? [[option.key, option.estimate.cost] as const] : [])),
    );
    expect(costs["bars-top"]).toBe(100);
    expect(costs["bare"]).toBe(0);
    expect(costs["heavier"]).toBe(Math.round((618 / 196) * 100));
  });

  it("holds no currency, no line and no category, anywhere", () => {
    const text = JSON.stringify(hidden);
    for (const word of ["EUR", "rate book", "labour"]) expect(text).not.toContain(word);
    for (const money of [196, 318, 402, 618]) expect(text).not.toContain(`:${money},`);
  });

  it("keeps hours and mass, which are not money", () => {
    const [before, after] = [result.options, hidden].map((options) =>
      options.find((option) => option.key === "stiffeners"),
    );
    if (!before || !after || !("estimate" in before) || !("estimate" in after))
      throw new Error("There is no estimate.");
    expect(after.estimate.shopMinutes).toBe(before.estimate.shopMinutes);
    expect(after.estimate.mass).toBe(before.estimate.mass);
    expect(after.rank).toBe(before.rank);
  });
});

describe("the reply", () => {
  it("has the shape that the screens read, with the labels of the figures and not their ids", () => {
    const comparison = presentComparison(record, { ...view, excluded: ["bare"], outdated: ["Newer rates."] });
    expect(ComparisonReply.parse({ comparison }).comparison).toEqual(comparison);
    expect(comparison.pricedBy).toBe("Rates of November, version 2; Shop times, version 1");
    expect(comparison).toMatchObject({ money: "currency", excluded: ["bare"], outdated: ["Newer rates."] });
    expect(presentComparison(record, { ...view, seesMoney: false }).money).toBe("index");
  });
});

describe("the difference of two results", () => {
  it("is empty where nothing moved, and where there was nothing before", () => {
    expect(differencesBetween(result, buildResultDocument(), view)).toEqual([]);
    expect(differencesBetween(null, result, view)).toEqual([]);
  });

  it("names what moved, what came and what went", () => {
    const [bare, ...others] = result.options;
    const moved = others.map((option) =>
      option.key === "heavier" && "estimate" in option
        ? { ...option, estimate: { ...option.estimate, cost: 300 } }
        : option,
    );
    const later = buildResultDocument({
      options: [...moved, { ...bare!, key: "bare-again", name: "Bare again" }],
    });
    const differences = differencesBetween(result, later, view);
    expect(differences.map(({ key }) => key)).toEqual(["heavier", "bare-again", "bare"]);
    expect(differences[0]).toMatchObject({ before: { cost: 618, rank: 3 }, after: { cost: 300, rank: 3 } });
    expect(differences[1]?.before).toBeNull();
    expect(differences[2]?.after).toBeNull();
  });
});
