import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { drawNode } from "@/lib/drawing/draw-node";
import type { Point, Shape } from "@/lib/drawing/drawing";
import { cornersOf } from "@/lib/drawing/shapes";
import { BACKING, BARS, buildDrawingCase, buildJoint, STIFFENERS, WEB_PLATE } from "./drawing-case";

const key = (shape: Shape, mirror: 1 | -1): string => {
  const round = ({ x, y }: Point) => `${Math.round(mirror * x * 1000) + 0},${Math.round(y * 1000)}`;
  const points =
    shape.shape === "rect"
      ? [
          { x: mirror < 0 ? shape.x + shape.width : shape.x, y: shape.y },
          { x: mirror < 0 ? shape.x : shape.x + shape.width, y: shape.y + shape.height },
        ]
      : shape.points;
  return `${shape.kind} ${points.map(round).sort().join(" ")}`;
};
const steel = (shapes: readonly Shape[]) =>
  shapes.filter((shape) => shape.kind !== "break" && shape.kind !== "centre");

describe("the drawing of a node", () => {
  it("is the mirror image of the mirrored node", () => {
    const measures: MeasureCase[] = [
      BARS,
      { ...STIFFENERS, levels: ["bottom"], length: 100 } as MeasureCase,
      BACKING,
    ];
    const left = drawNode(buildDrawingCase({ joints: [buildJoint("left")] }), measures);
    const right = drawNode(buildDrawingCase({ joints: [buildJoint("right")] }), measures);
    for (const view of ["elevation", "section"] as const) {
      const mirrored = steel(left[view].shapes)
        .map((shape) => key(shape, -1))
        .sort();
      expect(
        steel(right[view].shapes)
          .map((shape) => key(shape, 1))
          .sort(),
      ).toEqual(mirrored);
    }
  });
  it("has the same steel at every scale: only annotation follows the paper", () => {
    const fine = drawNode(buildDrawingCase(), [STIFFENERS], { mmPerPixel: 1 });
    const coarse = drawNode(buildDrawingCase(), [STIFFENERS], { mmPerPixel: 5 });
    const keys = (drawing: typeof fine) => steel(drawing.elevation.shapes).map((shape) => key(shape, 1));
    expect(keys(coarse)).toEqual(keys(fine));
    expect(coarse.elevation.textHeightMm).toBeCloseTo(5 * fine.elevation.textHeightMm, 9);
  });
  it("gives options of one node one window when they have no dimensions", () => {
    const extents = [[], [STIFFENERS], [{ ...WEB_PLATE, heightMm: 500 } as MeasureCase]].map(
      (measures) =>
        drawNode(buildDrawingCase(), measures, { dimensions: "none", mmPerPixel: 4 }).elevation.extent,
    );
    expect(extents[1]).toEqual(extents[0]);
    expect(extents[2]).toEqual(extents[0]);
  });
  it("holds everything drawn inside its extent", () => {
    const { shapes, dimensions, extent } = drawNode(buildDrawingCase(), [BARS, WEB_PLATE]).elevation;
    for (const { x, y } of [
      ...shapes.flatMap(cornersOf),
      ...dimensions.flatMap(({ lines }) => lines.flat()),
    ]) {
      expect(x >= extent.minX && x <= extent.maxX && y >= extent.minY && y <= extent.maxY).toBe(true);
    }
  });
  it("is named for its node", () => {
    expect(drawNode(buildDrawingCase(), [], { reference: "C4 / level 2" }).title).toBe(
      "Node C4 / level 2, to scale",
    );
    expect(drawNode(buildDrawingCase(), []).title).toBe("The node, to scale");
  });
});
