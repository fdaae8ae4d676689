import { describe, expect, it } from "vitest";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { NodeDocument, OptionInput } from "@/lib/schemas/node-document";
import type { EvaluatedOptionDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const shop = { catalog: buildCatalog(), prices: loadSeedPrices() };

function resultOf(document: NodeDocument, steps: "none" | "governing" | "all" = "none"): ResultDocument {
  const evaluated = evaluateDocument(document, shop, { steps });
  if (!evaluated.ok) throw new Error(JSON.stringify(evaluated.errors));
  return evaluated.result;
}

const errorsOf = (document: unknown): readonly string[] => {
  const evaluated = evaluateDocument(document, shop, { steps: "none" });
  return evaluated.ok ? [] : evaluated.errors.map(({ path }) => path);
};

const isEvaluated = (option: OptionDocument | undefined): option is EvaluatedOptionDocument =>
  option !== undefined && !("outsideScope" in option);
const evaluatedOption = (result: ResultDocument, key: string): EvaluatedOptionDocument => {
  const option = result.options.find((one) => one.key === key);
  if (!isEvaluated(option)) throw new Error(`${key} is not evaluated`);
  return option;
};

const stiffeners: OptionInput = {
  key: "pairs",
  name: "Pairs top and bottom",
  measures: [
    {
      kind: "transverse-stiffeners",
      levels: ["top", "bottom"],
      thickness: 15,
      width: 130,
      length: "full",
      clip: 30,
      steel: "S355",
      flangeWeld: 8,
      webWeld: 6,
    },
  ],
};
const given: NodeDocument = buildNodeDocument({
  options: [
    { key: "bare", name: "Bare", measures: [] },
    stiffeners,
    {
      key: "loose-bars",
      name: "Bars without inner nuts",
      measures: [{ kind: "through-bars", levels: ["top"], size: "M24", grade: "10.9", innerNuts: false }],
    },
  ],
});

describe("given options", () => {
  it("are evaluated as they stand, in their order, with what was given", () => {
    const { node, basis, options } = resultOf(given);
    expect(node).toEqual(given);
    expect(basis).toBe("EN 1993-1-8:2005");
    expect(options.map(({ key, name, measures }) => ({ key, name, measures }))).toEqual(given.options);
  });

  it("outside the method carry the reason and no numbers", () => {
    const outside = resultOf(given).options[2];
    expect(outside && Object.keys(outside).sort()).toEqual([
      "key",
      "measures",
      "name",
      "notRanked",
      "outsideScope",
      "rank",
    ]);
    expect(outside).toMatchObject({
      rank: null,
      notRanked: "outside scope",
      outsideScope: { reason: expect.stringMatching(/without inner nuts/) as unknown },
    });
  });

  it("are ranked among those that pass; the others are told why not", () => {
    const { options } = resultOf(given);
    const bare = evaluatedOption(resultOf(given), "bare");
    expect(
      options.filter(({ rank }) => rank !== null).every((option) => isEvaluated(option) && option.passes),
    ).toBe(true);
    expect(bare.passes ? bare.rank : bare.notRanked).not.toBeNull();
    const hard = resultOf({ ...given, target: { utilisation: 0.05, stiffness: "any" } });
    expect(hard.options.every(({ rank, notRanked }) => rank === null && notRanked !== null)).toBe(true);
  });

  it("come in the document's units", () => {
    const bare = evaluatedOption(resultOf(given), "bare");
    const joint = bare.joints[0];
    // kNm and kNm/rad of an IPE 450 on an HE 300 A: hundreds and tens of thousands.
    expect(joint?.momentResistance).toBeGreaterThan(50);
    expect(joint?.momentResistance).toBeLessThan(1000);
    const moment = bare.components.find(({ component }) => component === "joint-moment");
    expect(moment?.demand).toBeCloseTo(210, 9);
    expect(moment?.resistance).toBeCloseTo(joint?.momentResistance ?? NaN, 9);
    const shear = bare.components.find(({ component }) => component === "bolt-shear");
    expect(shear?.demand).toBeCloseTo(140, 9);
  });
});

describe("the working", () => {
  const countOf = (steps: "none" | "governing" | "all"): number =>
    evaluatedOption(resultOf(given, steps), "bare").components.filter(
      (check) => (check.steps ?? []).length > 0,
    ).length;

  it("is left out, shown of what governs, or of everything", () => {
    const governing = countOf("governing");
    expect(countOf("none")).toBe(0);
    expect(governing).toBeGreaterThan(0);
    expect(countOf("all")).toBeGreaterThan(governing);
    const option = evaluatedOption(resultOf(given, "governing"), "bare");
    for (const check of option.components.filter((each) => (each.steps ?? []).length > 0)) {
      expect([check.component, check.side, check.loadCase]).toEqual([
        option.governing.component,
        option.governing.side,
        option.governing.loadCase,
      ]);
    }
  });

  it("changes no number", () => {
    const bare = (steps: "none" | "all"): unknown =>
      JSON.parse(
        JSON.stringify(evaluatedOption(resultOf(given, steps), "bare"), (key, value: unknown) =>
          key === "steps" ? undefined : value,
        ),
      );
    expect(bare("all")).toEqual(bare("none"));
  });
});

describe("a document without options", () => {
  const { options } = resultOf(buildNodeDocument());

  it("is answered with proposals, the bare column first, each key once, at most 14", () => {
    expect(options[0]?.key).toBe("bare");
    expect(options.length).toBeGreaterThan(5);
    expect(options.length).toBeLessThanOrEqual(14);
    expect(new Set(options.map(({ key }) => key)).size).toBe(options.length);
  });

  it("has each proposal come out the same when it is given back", () => {
    const again = resultOf(
      buildNodeDocument({
        options: options.map(({ key, name, measures }) => ({ key, name, measures: [...measures] })),
      }),
    );
    again.options.forEach((option, index) => {
      const first = options[index];
      if (!isEvaluated(option) || !isEvaluated(first)) {
        expect("outsideScope" in option).toBe(first !== undefined && "outsideScope" in first);
        return;
      }
      expect(option.governing).toEqual(first.governing);
      expect(option.estimate).toEqual(first.estimate);
      expect(option.rank).toBe(first.rank);
    });
  });

  it("gives the same answer to the same input", () => {
    expect(resultOf(buildNodeDocument()).options).toEqual(options);
  });
});

describe("a document that cannot be used", () => {
  const valid = buildNodeDocument();

  it.each<[string, unknown, string]>([
    ["an unknown field", { ...valid, colour: "red" }, "colour"],
    ["no side", { ...valid, left: undefined }, "left"],
    [
      "a section nobody rolls",
      { ...valid, column: { ...valid.column, section: "HE 301 A" } },
      "column.section",
    ],
    ["a steel nobody makes", { ...valid, column: { ...valid.column, steel: "S999" } }, "column.steel"],
    ["no load case", { ...valid, loadCases: [] }, "loadCases"],
    [
      "a beam without its forces",
      { ...valid, loadCases: [{ ...valid.loadCases[0], left: undefined }] },
      "loadCases.0.left",
    ],
    [
      "a factor of nothing",
      { ...valid, partialFactors: { ...valid.partialFactors, gammaM0: 0 } },
      "partialFactors.gammaM0",
    ],
    ["text where a number stands", { ...valid, quantity: "twelve" }, "quantity"],
    [
      "a stiffener of no thickness",
      {
        ...valid,
        options: [{ ...stiffeners, measures: [{ ...stiffeners.measures[0], thickness: 0 }] }],
      },
      "options.0.measures.0.thickness",
    ],
  ])("for %s is refused with the path", (_, document, path) => {
    expect(errorsOf(JSON.parse(JSON.stringify(document)))).toContain(path);
  });

  it("tells every fault at once", () => {
    expect(
      errorsOf({
        ...valid,
        column: { ...valid.column, section: "HE 301 A" },
        left: { ...valid.left, beam: { section: "IPE 451", steel: "S355", span: 7500 } },
      }),
    ).toEqual(expect.arrayContaining(["column.section", "left.beam.section"]));
  });

  it.each([null, 7, "text", [], {}])("is refused when it is %j", (document) => {
    expect(errorsOf(document).length).toBeGreaterThan(0);
  });
});
