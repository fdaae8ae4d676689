import { describe, expect, it } from "vitest";
import { COMPONENT_IDS } from "@/lib/calc/result";
import { COMPONENT_ROWS } from "@/components/compare/component-labels";
import type { Cell } from "@/components/compare/comparison-cells";
import { checksOf, commonCautions, comparisonGroups } from "@/components/compare/comparison-rows";
import {
  buildCheck,
  buildJoint,
  buildOption,
  buildOutsideScopeOption,
  buildResultDocument,
  stiffeners,
} from "@/tests/factories/build-result-document";

const envelope = { kind: "envelope" } as const;

function cellOf(result: Parameters<typeof comparisonGroups>[0], row: string, option = 0): Cell | undefined {
  return comparisonGroups(result, envelope)
    .flatMap((group) => group.rows)
    .find(({ key }) => key === row)?.cells[option];
}

describe("the rows of a comparison", () => {
  it("have a place for every component there is, once", () => {
    expect(Object.values(COMPONENT_ROWS).flat().sort()).toEqual([...COMPONENT_IDS].sort());
  });

  it("take the worst check of a component over rows, sides and load cases, and say which it was", () => {
    const option = buildOption({
      key: "one",
      name: "One",
      checks: [
        buildCheck("column-flange-bending", 0.5, { side: "left", loadCase: "ULS 1", row: 1 }),
        buildCheck("column-flange-bending", 0.8, { side: "left", loadCase: "ULS 2", rows: [1, 2] }),
        buildCheck("column-web-shear", 0.9),
      ],
    });
    const result = buildResultDocument({ options: [option] });
    expect(cellOf(result, "column-flange-bending")).toMatchObject({
      value: 0.8,
      where: "left, rows 1 + 2, ULS 2",
      isGoverning: false,
    });
    expect(cellOf(result, "column-web-shear")).toMatchObject({ value: 0.9, isGoverning: true });
  });

  it('keep a rule that no load case changes in view whichever case is chosen, and never call it "all"', () => {
    const option = buildOption({
      key: "one",
      name: "One",
      checks: [
        buildCheck("detailing", 0.7, { side: "left", loadCase: "all" }),
        buildCheck("column-web-shear", 0.4, { loadCase: "ULS 1" }),
      ],
    });
    const [detailing] = checksOf(option, { kind: "one", name: "ULS 1" }, "detailing");
    expect(detailing).toMatchObject({ utilisation: 0.7 });
    expect(cellOf(buildResultDocument({ options: [option] }), "detailing")).toMatchObject({
      where: "left, every case",
    });
  });

  it("show the smaller stiffness and its class, and say when the target is not reached", () => {
    const option = buildOption(
      { key: "one", name: "One", checks: [buildCheck("column-web-shear", 0.6)] },
      {
        passes: false,
        stiffnessReached: false,
        joints: [
          buildJoint({ initialStiffness: 9000, stiffnessClass: "rigid" }),
          buildJoint({ side: "right", initialStiffness: 8440 }),
        ],
      },
    );
    const result = buildResultDocument({ options: [option] });
    expect(cellOf(result, "stiffness")).toMatchObject({
      text: "8400",
      unit: "kNm/rad",
      note: "semi-rigid, right; target not reached",
    });
    expect(cellOf(result, "verdict")).toMatchObject({ word: "fails", note: "not stiff enough" });
  });

  it("leave out categories that cost nothing in any option, and keep one that any option has", () => {
    const keys = comparisonGroups(buildResultDocument(), envelope)
      .find(({ key }) => key === "cost")
      ?.rows.map(({ key }) => key);
    expect(keys).toContain("category-labour");
    expect(keys).not.toContain("category-inspection");
  });

  it("list what fails on the connection, why nothing better was found, and the cautions, in that order", () => {
    const option = buildOption(
      { key: "one", name: "One", measures: [stiffeners], checks: [buildCheck("bolt-tension", 1.2)] },
      {
        connectionFailure: "The bolts fail.",
        sizing: "The thickest stock plate was not enough.",
        cautions: ["Check the erection."],
      },
    );
    expect(cellOf(buildResultDocument({ options: [option] }), "cautions")).toEqual({
      kind: "list",
      items: ["The bolts fail.", "The thickest stock plate was not enough.", "Check the erection."],
    });
  });

  it("leave what all options inside the method must mind to the foot, once", () => {
    const check = buildCheck("column-web-shear", 0.6);
    const result = buildResultDocument({
      options: [
        buildOption(
          { key: "one", name: "One", checks: [check] },
          { cautions: ["Fire is not covered.", "Own."] },
        ),
        buildOption({ key: "two", name: "Two", checks: [check] }, { cautions: ["Fire is not covered."] }),
        buildOutsideScopeOption(),
      ],
    });
    expect(commonCautions(result)).toEqual(["Fire is not covered."]);
    expect(cellOf(result, "cautions", 0)).toEqual({ kind: "list", items: ["Own."] });
    expect(cellOf(result, "cautions", 1)).toEqual({ kind: "none", words: "none" });
  });

  it("give an option outside scope words in every cell but the verdict, which carries the reason", () => {
    const result = buildResultDocument();
    const at = result.options.findIndex((option) => "outsideScope" in option);
    const cells = comparisonGroups(result, envelope).flatMap((group) => [
      ...group.rows.map((row) => row.cells[at]),
      group.folded?.[at],
    ]);
    const kinds = new Set(cells.flatMap((cell) => (cell ? [cell.kind] : [])));
    expect(kinds).toEqual(new Set(["verdict", "none"]));
  });
});
