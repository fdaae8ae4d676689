/** Guards the angles of a cleat connection on the drawing: their legs, their holes and the gap stand where they were typed. */
import { describe, expect, it } from "vitest";
import { drawNode } from "@/lib/drawing/draw-node";
import type { Shape } from "@/lib/drawing/drawing";
import { cornersOf, extentOf } from "@/lib/drawing/shapes";
import { buildDrawingCase, buildJoint, CLEATS, IPE_450 } from "./drawing-case";

const both = buildDrawingCase({
  joints: [buildJoint("left", { connection: CLEATS }), buildJoint("right", { connection: CLEATS })],
});
const drawing = drawNode(both, []);
/** Half the depth of HE 300 A. */
const FACE_MM = 290 / 2;
const boxOf = (shape: Shape | undefined) => {
  if (!shape) throw new Error("the shape is drawn");
  return extentOf(cornersOf(shape));
};
const anglesOn = (side: "left" | "right") =>
  drawing.elevation.shapes.filter(
    (shape) => shape.part === "cleat" && shape.shape === "polygon" && shape.side === side,
  );

describe("flange cleats in elevation", () => {
  it("stand on the top flange and under the bottom one, their heels in the corners", () => {
    const [top, bottom] = anglesOn("right").map(boxOf);
    expect(top).toEqual({ minX: FACE_MM, maxX: FACE_MM + 150, minY: -90, maxY: 0 });
    expect(bottom).toEqual({
      minX: FACE_MM,
      maxX: FACE_MM + 150,
      minY: IPE_450.depthMm,
      maxY: IPE_450.depthMm + 90,
    });
  });

  it("are mirrored on the left", () => {
    expect(boxOf(anglesOn("left")[0])).toEqual({ minX: -FACE_MM - 150, maxX: -FACE_MM, minY: -90, maxY: 0 });
  });

  it("leave the gap between column and beam", () => {
    const beam = drawing.elevation.shapes.find(({ part, kind }) => part === "beam-right" && kind === "beam");
    expect(boxOf(beam).minX).toBe(FACE_MM + 10);
  });

  it("have a bolt in the column at its distance above the heel, and those of the beam at theirs beside it", () => {
    const shanks = drawing.elevation.shapes.filter(({ kind }) => kind === "shank").map(boxOf);
    const middles = shanks.map(({ minX, maxX, minY, maxY }) => [(minX + maxX) / 2, (minY + maxY) / 2]);
    expect(shanks.filter(({ minY, maxY }) => (minY + maxY) / 2 === -55)).toHaveLength(2);
    for (const fromHeel of [60, 120])
      expect(middles.filter(([x]) => x === FACE_MM + fromHeel)).toHaveLength(2);
  });

  it("carry their web cleat in the middle of the beam", () => {
    const [leg] = drawing.elevation.shapes.filter(
      (shape) => shape.part === "cleat" && shape.shape === "rect" && shape.side === "right",
    );
    expect(boxOf(leg)).toEqual({
      minX: FACE_MM,
      maxX: FACE_MM + 90,
      minY: (IPE_450.depthMm - 230) / 2,
      maxY: (IPE_450.depthMm + 230) / 2,
    });
  });
});

describe("dimensions of flange cleats", () => {
  it.each([
    ["left.connection.bolts.distance", 55],
    ["left.connection.gap", 10],
  ])("change %s on the elevation", (path, valueMm) => {
    expect(drawing.elevation.dimensions.find(({ edits }) => edits === path)?.valueMm).toBe(valueMm);
  });

  it.each([
    ["right.connection.bolts.gauge", 100],
    ["right.connection.cleat.length", 180],
  ])("change %s on the section", (path, valueMm) => {
    expect(drawing.section.dimensions.find(({ edits }) => edits === path)?.valueMm).toBe(valueMm);
  });
});
