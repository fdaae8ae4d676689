import { describe, expect, it } from "vitest";
import { drawNode } from "@/lib/drawing/draw-node";
import type { DrawingOptions } from "@/lib/drawing/drawing";
import { buildDrawingCase, buildJoint } from "./drawing-case";

const dimensionsOf = (node = buildDrawingCase(), options: DrawingOptions = {}) =>
  drawNode(node, [], options).elevation.dimensions;

describe("dimensions of the elevation", () => {
  it("names the field of the node document behind each value", () => {
    const left = dimensionsOf(buildDrawingCase({ joints: [buildJoint("left")] }));
    expect(left.map(({ edits, valueMm }) => [edits, valueMm])).toEqual([
      ["left.connection.bolts.rows.0", -45],
      ["left.connection.bolts.rows.1", 65],
      ["left.connection.bolts.rows.2", 385],
      ["left.connection.plate.thickness", 20],
      ["left.connection.plate.extensionTop", 90],
      ["left.connection.plate.extensionBottom", 30],
      [null, 450],
      [null, 290],
    ]);
  });
  it("edits depths only of sections given by their dimensions", () => {
    const edits = dimensionsOf(buildDrawingCase(), { customSections: { column: true, right: true } }).map(
      (dimension) => dimension.edits,
    );
    expect(edits).toContain("column.section.h");
    expect(edits).toContain("right.beam.section.h");
    expect(edits).not.toContain("left.beam.section.h");
  });
  it("dimensions the column's ends and the step between the beams only where they exist", () => {
    const column = { ...buildDrawingCase().column, endDistanceAboveMm: 3000, endDistanceBelowMm: 150 };
    const joints = [buildJoint("left"), buildJoint("right", { levelOffsetMm: 100 })];
    const edits = (node = buildDrawingCase()) => dimensionsOf(node).map((dimension) => dimension.edits);
    expect(edits(buildDrawingCase({ column, joints }))).toEqual(
      expect.arrayContaining(["column.endDistanceAbove", "column.endDistanceBelow", "right.levelOffset"]),
    );
    for (const path of ["column.endDistanceAbove", "column.endDistanceBelow", "right.levelOffset"])
      expect(edits()).not.toContain(path);
  });
  it("gives every dimension an id of its own, and the overall drawing two only", () => {
    const ids = dimensionsOf().map((dimension) => dimension.id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(
      dimensionsOf(buildDrawingCase(), { dimensions: "overall" }).map((dimension) => dimension.valueMm),
    ).toEqual([290, 450]);
    expect(dimensionsOf(buildDrawingCase(), { dimensions: "none" })).toEqual([]);
  });
  it("keeps the level texts of close rows apart", () => {
    const joint = buildJoint("left");
    if (joint.connection.kind !== "end-plate") throw new Error("the case has an end plate");
    const connection = { ...joint.connection, bolts: { ...joint.connection.bolts, rowsMm: [60, 64, 68] } };
    const drawing = drawNode(buildDrawingCase({ joints: [{ ...joint, connection }] }), []);
    const rows = drawing.elevation.dimensions.filter((dimension) => dimension.id.startsWith("left.row"));
    const gaps = rows.slice(1).map(({ textAt }, index) => textAt.y - (rows[index]?.textAt.y ?? 0));
    for (const gap of gaps) expect(gap).toBeGreaterThanOrEqual(drawing.elevation.textHeightMm);
  });
});
