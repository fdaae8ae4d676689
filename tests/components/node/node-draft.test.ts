import { describe, expect, it } from "vitest";
import {
  documentTyped,
  draftOf,
  numberTyped,
  sameDraft,
  textAt,
  valueAt,
  withValue,
} from "@/components/node/node-draft";
import { buildNodeDocument } from "@/tests/factories/build-node-document";

const draft = draftOf(buildNodeDocument());

describe("numbers as typed", () => {
  it("understands decimal commas, true minus signs and blanks between thousands", () => {
    expect(
      ["12", "12,5", "-3.", "\u22124.25", "1 200", "12\u202f500,5", ".5", "1e3"].map(numberTyped),
    ).toEqual([12, 12.5, -3, -4.25, 1200, 12500.5, 0.5, 1000]);
  });
  it("takes nothing else for a number", () => {
    expect(
      ["", "abc", "1.2.3", "1,2,3", "12 mm", "--4", "1 20", "Infinity", "0x10"].map(numberTyped),
    ).toEqual(Array(9).fill(null));
  });
});

describe("the draft of a node", () => {
  it("changes one place and leaves all others as they were", () => {
    const changed = withValue(draft, "left.connection.bolts.rows.1", "70");
    expect(valueAt(changed, "left.connection.bolts.rows")).toEqual([-45, "70", 385]);
    expect(valueAt(draft, "left.connection.bolts.rows")).toEqual([-45, 65, 385]);
    expect(changed.loadCases).toBe(draft.loadCases);
  });
  it("takes fields and items away", () => {
    expect(withValue(draft, "column.endDistanceAbove", undefined).column).not.toHaveProperty(
      "endDistanceAbove",
    );
    expect(
      valueAt(withValue(draft, "left.connection.bolts.rows.0", undefined), "left.connection.bolts.rows"),
    ).toEqual([65, 385]);
  });
  it("makes the groups on the way to a new field", () => {
    expect(valueAt(withValue(draft, "fabrication.liftLength", "7200"), "fabrication")).toEqual({
      liftLength: "7200",
    });
  });
  it("writes numbers as numbers, keeps words and what is no number, leaves empty fields out", () => {
    let typed = withValue(draft, "quantity", "12");
    typed = withValue(typed, "left.connection.plate.thickness", "twenty");
    typed = withValue(typed, "left.connection.bolts.grade", "8.8");
    typed = withValue(typed, "left.connection.welds.web", "butt");
    typed = withValue(typed, "left.connection.welds.topFlange", "7,5");
    typed = withValue(typed, "column.endDistanceAbove", " ");
    typed = withValue(typed, "reference", "12");
    typed = withValue(typed, "left.connection.bolts.assembly", "");
    const written = documentTyped(typed) as Record<string, never>;
    expect(valueAt(written, "quantity")).toBe(12);
    expect(valueAt(written, "left.connection.plate.thickness")).toBe("twenty");
    expect(valueAt(written, "left.connection.bolts.grade")).toBe("8.8");
    expect(valueAt(written, "left.connection.welds")).toEqual({
      topFlange: 7.5,
      bottomFlange: 6,
      web: "butt",
    });
    expect(written.column).not.toHaveProperty("endDistanceAbove");
    expect(valueAt(written, "reference")).toBe("12");
    expect(valueAt(written, "left.connection.bolts")).not.toHaveProperty("assembly");
  });
  it("drops an optional group that was emptied, but not an empty row", () => {
    const emptied = withValue(
      withValue(draft, "fabrication", { liftLength: "" }),
      "left.connection.bolts.rows.2",
      "",
    );
    const written = documentTyped(emptied) as Record<string, never>;
    expect(written).not.toHaveProperty("fabrication");
    expect(valueAt(written, "left.connection.bolts.rows")).toEqual([-45, 65, ""]);
  });
  it("compares by what is said, not by how it is spelled", () => {
    expect(sameDraft(withValue(draft, "quantity", "12.0"), draft)).toBe(true);
    expect(sameDraft(withValue(draft, "quantity", "13"), draft)).toBe(false);
    expect(sameDraft({ ...draft, reference: undefined }, draft)).toBe(false);
  });
  it("reads past the end of what is there as nothing", () => {
    expect(valueAt(draft, "right.beam.span")).toBeUndefined();
    expect(valueAt(draft, "quantity.more")).toBeUndefined();
    expect(textAt(draft, "left.connection.bolts")).toBe("");
    expect(textAt(draft, "quantity")).toBe("12");
  });
});
