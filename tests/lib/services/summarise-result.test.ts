/** Guards the line that the register reads in place of the whole result. */
import { describe, expect, it } from "vitest";
import { outdatedReasons } from "@/lib/services/outdated";
import { summarise } from "@/lib/services/summarise-result";
import { ComparisonSummary } from "@/lib/schemas/comparison";
import {
  buildOption,
  buildCheck,
  buildOutsideScopeOption,
  buildResultDocument,
} from "@/tests/factories/build-result-document";

describe("the summary of a result", () => {
  it("has the bare column with its governing component, and the ranked options, best first", () => {
    const summary = summarise(buildResultDocument({ options: [...buildResultDocument().options].reverse() }));
    expect(ComparisonSummary.parse(summary)).toEqual(summary);
    expect(summary.bare).toEqual({
      passes: false,
      utilisation: 1.31,
      component: "column-web-compression",
      side: "right",
      loadCase: "ULS 3",
    });
    expect(summary.ranked.map(({ key, rank }) => [key, rank])).toEqual([
      ["bars-stiffeners", 1],
      ["stiffeners", 2],
      ["heavier", 3],
    ]);
    expect(summary.ranked[0]).toMatchObject({ cost: 318, currency: "EUR", shopMinutes: 106 });
  });

  it("says why the bare column has no number, and has none where it was not among the options", () => {
    const outside = buildOutsideScopeOption({
      key: "bare",
      measures: [],
      outsideScope: { reason: "Too slender." },
    });
    expect(summarise(buildResultDocument({ options: [outside] }))).toEqual({
      bare: { outsideScope: "Too slender." },
      ranked: [],
    });
    const heavier = buildOption({
      key: "heavier",
      name: "Heavier",
      measures: [{ kind: "heavier-column", section: "HE 300 B" }],
      checks: [buildCheck("column-web-shear", 0.5)],
    });
    expect(summarise(buildResultDocument({ options: [heavier] }))).toEqual({ bare: null, ranked: [] });
  });
});

describe("why a comparison is outdated", () => {
  const keys = { engine: "1", pricesKey: "p", catalogKey: "c" };

  it("is nothing while engine, figures and catalogue are those it was made from", () => {
    expect(outdatedReasons(keys, { ...keys })).toEqual([]);
  });

  it("names each that has moved on", () => {
    expect(outdatedReasons(keys, { ...keys, engine: "2" })).toEqual([expect.stringMatching(/calculation/)]);
    expect(outdatedReasons(keys, { ...keys, pricesKey: "q" })).toEqual([expect.stringMatching(/rates/)]);
    expect(outdatedReasons(keys, { ...keys, catalogKey: "d" })).toEqual([expect.stringMatching(/catalogue/)]);
    expect(outdatedReasons(keys, { engine: "2", pricesKey: "q", catalogKey: "d" })).toHaveLength(3);
  });
});
