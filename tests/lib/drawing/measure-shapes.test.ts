import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { drawNode } from "@/lib/drawing/draw-node";
import { frameOf } from "@/lib/drawing/frame";
import { measureShapes } from "@/lib/drawing/measure-shapes";
import { PAINTS } from "@/lib/drawing/paint";
import {
  BACKING,
  BARS,
  buildDrawingCase,
  buildJoint,
  DIAGONAL,
  HEAVIER,
  STIFFENERS,
  WEB_PLATE,
} from "./drawing-case";

const shapesOf = (measure: MeasureCase, node = buildDrawingCase()) =>
  measureShapes(frameOf(node, [measure]), [measure]);

describe("what an option adds", () => {
  it("draws each measure as a part of its own, told apart by hatch", () => {
    const seen = ([STIFFENERS, DIAGONAL, WEB_PLATE, BACKING, BARS] as const).map((measure) => {
      const { shapes } = drawNode(buildDrawingCase(), [measure]).elevation;
      const bare = new Set(drawNode(buildDrawingCase(), []).elevation.shapes.map((shape) => shape.part));
      const added = shapes.filter((shape) => !bare.has(shape.part) && shape.part !== "nut");
      return [...new Set(added.map((shape) => `${shape.part}: ${PAINTS[shape.kind].hatch ?? "solid"}`))];
    });
    expect(seen).toEqual([
      ["stiffener: diagonal"],
      ["diagonal: diagonal"],
      ["web-plate: dashes"],
      ["backing-plate: dashes"],
      ["bar: solid"],
    ]);
  });
  it("puts full-depth stiffeners between the flanges, on the middle of the beam flanges", () => {
    const plates = shapesOf(STIFFENERS).flatMap((shape) => (shape.shape === "rect" ? [shape] : []));
    expect(plates.map(({ x, width, y, height }) => [x, width, y + height / 2, height])).toEqual([
      [-131, 262, 7.3, 12],
      [-131, 262, expect.closeTo(442.7, 9), 12],
    ]);
  });
  it("starts a partial stiffener at each loaded flange only", () => {
    const partial = { ...STIFFENERS, levels: ["top"], length: 120 } as MeasureCase;
    const spans = (node = buildDrawingCase()) =>
      shapesOf(partial, node).flatMap((shape) =>
        shape.shape === "rect" ? [[shape.x, shape.x + shape.width]] : [],
      );
    expect(spans()).toEqual([
      [-131, -11],
      [11, 131],
    ]);
    expect(spans(buildDrawingCase({ joints: [buildJoint("right")] }))).toEqual([[11, 131]]);
  });
  it("centres the web plate on the panel at its own size", () => {
    const plate = shapesOf(WEB_PLATE).find((shape) => shape.part === "web-plate");
    expect(plate).toMatchObject({ x: -104, y: 225 - 295, width: 208, height: 590 });
  });
  it("leans the diagonal from corner to corner of the panel, and crosses or splits it", () => {
    const points = (arrangement: "single" | "cross" | "k") =>
      shapesOf({ ...DIAGONAL, arrangement } as MeasureCase).flatMap((shape) =>
        shape.shape === "polygon" ? [shape.points] : [],
      );
    const [single] = points("single");
    const ends = single?.map(({ x, y }) => [x, y]) ?? [];
    expect(ends.map(([x]) => x)).toEqual([-131, 131, 131, -131]);
    expect(((ends[0]?.[1] ?? 0) + (ends[3]?.[1] ?? 0)) / 2).toBeCloseTo(7.3, 9);
    expect(((ends[1]?.[1] ?? 0) + (ends[2]?.[1] ?? 0)) / 2).toBeCloseTo(442.7, 9);
    expect(points("cross")).toHaveLength(2);
    expect(points("k")).toHaveLength(2);
  });
  it("lays backing plates inside the flange about the rows of the level named, on the side named", () => {
    const plates = shapesOf(BACKING).flatMap((shape) => (shape.shape === "rect" ? [shape] : []));
    expect(plates.map(({ side, x, width, y, height }) => [side, x, width, y + height / 2])).toEqual([
      // Evenly about the rows at -45 and 65.
      ["left", -131, 15, expect.closeTo((-45 + 65) / 2, 9)],
      ["right", 116, 15, expect.closeTo((-45 + 65) / 2, 9)],
    ]);
    const right = shapesOf({ ...BACKING, at: "right" } as MeasureCase);
    expect(right.map((shape) => shape.side)).toEqual(["right"]);
  });
  it("adds no piece for a heavier column: the column itself is drawn heavier", () => {
    expect(shapesOf(HEAVIER)).toEqual([]);
    const flange = drawNode(buildDrawingCase(), [HEAVIER]).elevation.shapes.find(
      (shape) => shape.kind === "cut",
    );
    expect(flange).toMatchObject({ x: -150, width: 19 });
  });
});
