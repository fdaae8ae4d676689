import { describe, expect, it } from "vitest";
import { differencesOf, onTop } from "@/components/node/draft-differences";
import { draftOf, valueAt, withValue, type DraftObject } from "@/components/node/node-draft";
import { buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";

const opened = draftOf(buildNodeDocument());
const change = (draft: DraftObject, path: string, value: string) => withValue(draft, path, value);

describe("two versions of a node", () => {
  it("lists each field that either side changed, with all three values", () => {
    const mine = change(opened, "left.connection.plate.thickness", "25");
    const theirs = change(change(opened, "quantity", "14"), "left.connection.bolts.rows.1", "70");
    expect(differencesOf(opened, mine, theirs)).toEqual(
      expect.arrayContaining([
        { path: "left.connection.plate.thickness", opened: 20, mine: "25", theirs: 20 },
        { path: "quantity", opened: 12, mine: 12, theirs: "14" },
        {
          path: "left.connection.bolts.rows",
          opened: [-45, 65, 385],
          mine: [-45, 65, 385],
          theirs: [-45, "70", 385],
        },
      ]),
    );
    expect(differencesOf(opened, mine, theirs)).toHaveLength(3);
  });
  it("finds no difference in spelling", () => {
    expect(differencesOf(opened, change(opened, "quantity", "12.0"), opened)).toEqual([]);
  });
  it("lays my changes on theirs: my field where I changed it, theirs everywhere else", () => {
    const mine = change(opened, "left.connection.plate.thickness", "25");
    const theirs = change(change(opened, "quantity", "14"), "left.connection.plate.width", "210");
    const merged = onTop(opened, mine, theirs);
    expect(valueAt(merged, "left.connection.plate")).toMatchObject({ thickness: "25", width: "210" });
    expect(valueAt(merged, "quantity")).toBe("14");
  });
  it("keeps mine where both changed the same field", () => {
    expect(
      valueAt(onTop(opened, change(opened, "quantity", "20"), change(opened, "quantity", "14")), "quantity"),
    ).toBe("20");
  });
  it("keeps a side that I added and one that they removed stays away unless I changed it", () => {
    const withRight = {
      ...opened,
      right: draftOf(buildNodeDocument({ right: buildSide() })).right,
    } as DraftObject;
    expect(valueAt(onTop(opened, withRight, change(opened, "quantity", "14")), "right.beam.span")).toBe(7500);
    const removed = withValue(opened, "column.endDistanceAbove", undefined);
    expect(valueAt(onTop(opened, change(opened, "quantity", "2"), removed), "column")).not.toHaveProperty(
      "endDistanceAbove",
    );
  });
  it("merges load cases cell by cell while their number is the same, and keeps my list when it is not", () => {
    const mine = change(opened, "loadCases.0.left.moment", "250");
    const theirs = change(opened, "loadCases.0.column.axialForce", "900");
    expect(valueAt(onTop(opened, mine, theirs), "loadCases.0")).toMatchObject({
      left: { moment: "250" },
      column: { axialForce: "900" },
    });
    const longer = {
      ...opened,
      loadCases: [...buildNodeDocument().loadCases, { ...buildNodeDocument().loadCases[0], name: "ULS 2" }],
    } as DraftObject;
    expect(valueAt(onTop(opened, longer, theirs), "loadCases")).toHaveLength(2);
  });
});
