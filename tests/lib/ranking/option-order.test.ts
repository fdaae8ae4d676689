/** Guards the order the columns stand in: whoever opens a comparison of many options must see the winner first. */
import { describe, expect, it } from "vitest";
import { inReadingOrder } from "@/lib/ranking/option-order";
import type { OptionDocument } from "@/lib/schemas/result-document";
import {
  bars,
  buildCheck,
  buildOption,
  buildOutsideScopeOption,
  buildResultDocument,
} from "@/tests/factories/build-result-document";

const option = (key: string, utilisation: number, cost: number, rank: number | null = null): OptionDocument =>
  buildOption({
    key,
    name: key,
    measures: [bars],
    checks: [buildCheck("column-web-shear", utilisation)],
    cost,
    rank,
  });
const bare = buildOption({ key: "bare", name: "bare", checks: [buildCheck("column-web-shear", 1.3)] });
const keysOf = (options: readonly OptionDocument[]) => inReadingOrder(options).map(({ key }) => key);

describe("the reading order of options", () => {
  it("puts the bare column first, then ranks, then what fails, then what is outside scope", () => {
    expect(
      keysOf([
        buildOutsideScopeOption({ key: "outside" }),
        option("far", 1.9, 10),
        option("third", 0.6, 600, 3),
        option("near", 1.1, 900),
        option("first", 0.9, 300, 1),
        bare,
        option("second", 0.8, 400, 2),
      ]),
    ).toEqual(["bare", "first", "second", "third", "near", "far", "outside"]);
  });

  it("puts the bare column first also where it wins", () => {
    expect(keysOf([option("bars", 0.7, 200, 2), { ...bare, passes: true, rank: 1 }])).toEqual([
      "bare",
      "bars",
    ]);
  });

  it("leaves an option set aside where its cost puts it", () => {
    const before = [bare, option("a", 0.9, 300, 1), option("b", 0.9, 400, 2), option("c", 0.9, 500, 3)];
    const after = [bare, option("a", 0.9, 300, 1), option("b", 0.9, 400), option("c", 0.9, 500, 2)];
    expect(keysOf(after)).toEqual(keysOf(before));
  });

  it("follows the rank where costs are shown too coarsely to tell options apart", () => {
    expect(
      keysOf([option("second", 0.9, 100, 2), option("aside", 0.9, 100), option("first", 0.9, 100, 1)]),
    ).toEqual(["first", "second", "aside"]);
  });

  it("keeps the order given among equals, and loses nothing", () => {
    const outside = ["x", "y", "z"].map((key) => buildOutsideScopeOption({ key }));
    expect(keysOf(outside)).toEqual(["x", "y", "z"]);
    const { options } = buildResultDocument();
    expect([...keysOf(options)].sort()).toEqual(options.map(({ key }) => key).sort());
  });
});
