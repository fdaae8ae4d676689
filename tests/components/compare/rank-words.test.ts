import { describe, expect, it } from "vitest";
import { columnLetter, rankWords } from "@/components/compare/rank-words";
import { buildResultDocument } from "@/tests/factories/build-result-document";

describe("what a head says of the rank", () => {
  const result = buildResultDocument();
  const words = result.options.map((option) => rankWords(option, result));

  it("names the cheapest, what the others cost more, and why one is not ranked", () => {
    expect(words.map(({ figure, words: said }) => [figure, said])).toEqual([
      [null, "not ranked: fails"],
      [null, "not ranked: fails"],
      ["1", "cheapest"],
      ["2", "+84 EUR"],
      [null, "not ranked: outside scope"],
      ["3", "+300 EUR"],
    ]);
    expect(words.filter(({ isBest }) => isBest)).toHaveLength(1);
  });

  it("gives the reason of the one that was set aside", () => {
    const [bare] = result.options;
    if (!bare) throw new Error("no option");
    expect(rankWords({ ...bare, rank: null, notRanked: "excluded" }, result).words).toBe(
      "not ranked: excluded",
    );
  });

  it("speaks of an index where money is not shown", () => {
    const hidden = structuredClone(result);
    for (const option of hidden.options) if ("estimate" in option) option.estimate.currency = "XXX";
    const second = hidden.options[3];
    if (!second) throw new Error("no option");
    expect(rankWords(second, hidden).words).toBe("+84 index");
  });
});

it("letters columns past Z", () => {
  expect([0, 25, 26, 39].map(columnLetter)).toEqual(["A", "Z", "AA", "AN"]);
});
