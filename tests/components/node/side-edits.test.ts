import { describe, expect, it } from "vitest";
import { draftOf, valueAt, type DraftObject } from "@/components/node/node-draft";
import { readDraft } from "@/components/node/read-draft";
import {
  loadCaseColumns,
  withConnectionKind,
  withLoadCase,
  withoutSide,
  withPastedRows,
  withSideCopied,
} from "@/components/node/side-edits";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const oneSided = draftOf(buildNodeDocument());
const isInOrder = (draft: DraftObject) => [...readDraft(draft, buildCatalog()).errors];

describe("changes to a whole side", () => {
  it("copies beam, connection and actions to a side without a beam", () => {
    const both = withSideCopied(oneSided, "right");
    expect(both.right).toEqual(oneSided.left);
    expect(valueAt(both, "loadCases.0.right.moment")).toBe(210);
    expect(isInOrder(both)).toEqual([]);
  });
  it("keeps the actions and the step of a side that is there already", () => {
    const stepped = {
      ...withSideCopied(oneSided, "right"),
      right: { ...(oneSided.left as DraftObject), levelOffset: 0 },
    } as DraftObject;
    const turned = {
      ...stepped,
      loadCases: [{ ...buildNodeDocument().loadCases[0], right: { moment: -50, axialForce: 0, shear: 20 } }],
    } as DraftObject;
    const copied = withSideCopied(turned, "right");
    expect(valueAt(copied, "right.levelOffset")).toBe(0);
    expect(valueAt(copied, "loadCases.0.right.moment")).toBe(-50);
    expect(valueAt(withSideCopied(copied, "left"), "left")).not.toHaveProperty("levelOffset");
  });
  it("takes a side away with its actions", () => {
    const left = withoutSide(withSideCopied(oneSided, "right"), "right");
    expect(left).toEqual(oneSided);
  });
  it("changes the connection and back, in order both times, with the welds kept", () => {
    const welded = withConnectionKind(oneSided, "left", "welded", 450, 190);
    expect(valueAt(welded, "left.connection")).toEqual({
      kind: "welded",
      welds: { topFlange: 8, bottomFlange: 6, web: 5 },
    });
    expect(isInOrder(welded)).toEqual([]);
    const bolted = withConnectionKind(welded, "left", "end-plate", 450, 190);
    expect(valueAt(bolted, "left.connection.welds.topFlange")).toBe(8);
    expect(isInOrder(bolted)).toEqual([]);
  });
});

describe("changes to the load cases", () => {
  it("adds a copy under a name of its own, next to the one copied", () => {
    const two = withLoadCase(oneSided);
    expect(valueAt(two, "loadCases.1.name")).toBe("ULS 2");
    expect(valueAt(two, "loadCases.1.left.moment")).toBe(210);
    const three = withLoadCase(two, 0);
    expect([0, 1, 2].map((index) => valueAt(three, `loadCases.${index}.name`))).toEqual([
      "ULS 1",
      "ULS 3",
      "ULS 2",
    ]);
    expect(isInOrder(three)).toEqual([]);
  });
  it("makes a first load case with the actions of the sides that are there", () => {
    expect(valueAt(withLoadCase({ ...oneSided, loadCases: [] }), "loadCases.0.left.moment")).toBe(0);
  });
  it("lays pasted rows into the grid from the cell on and adds rows as needed", () => {
    const pasted = withPastedRows(
      oneSided,
      "ULS A\t180\t0\t90\t1000\r\nULS B\t-60\t10\t40\t950\r\n",
      0,
      "name",
    );
    expect(valueAt(pasted, "loadCases")).toHaveLength(2);
    expect(valueAt(pasted, "loadCases.0")).toMatchObject({
      name: "ULS A",
      left: { moment: "180", shear: "90" },
      column: { axialForce: "1000", momentAbove: 40 },
    });
    expect(valueAt(pasted, "loadCases.1")).toMatchObject({ name: "ULS B", left: { moment: "-60" } });
    expect(isInOrder(pasted)).toEqual([]);
  });
  it("starts in the middle of a row, and drops what lies beyond the grid", () => {
    const pasted = withPastedRows(oneSided, "5\t6\t7\t8\t9", 0, "column.shearAbove");
    expect(valueAt(pasted, "loadCases.0.column")).toMatchObject({ shearAbove: "5", shearBelow: "6" });
    expect(loadCaseColumns(oneSided)).toHaveLength(9);
    expect(loadCaseColumns(withSideCopied(oneSided, "right"))).toHaveLength(12);
  });
});
