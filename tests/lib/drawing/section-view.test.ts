import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { drawNode } from "@/lib/drawing/draw-node";
import { BACKING, BARS, buildDrawingCase, STIFFENERS, WEB_PLATE } from "./drawing-case";

const rects = (measures: readonly MeasureCase[], sectionLevel: "top" | "bottom" = "top") =>
  drawNode(buildDrawingCase(), measures, { sectionLevel }).section.shapes.flatMap((shape) =>
    shape.shape === "rect" ? [shape] : [],
  );

describe("the section through the column", () => {
  it("cuts both flanges at their width and the web at its thickness", () => {
    const cut = rects([]).filter((shape) => shape.part === "column");
    expect(cut.map(({ x, y, width, height }) => [x, y, width, height])).toEqual([
      [-131, -4.25, 262, 8.5],
      [-145, -150, 14, 300],
      [131, -150, 14, 300],
    ]);
  });
  it("puts bolts and bars at half the gauge on either side of the web", () => {
    const middles = (part: string, measures: readonly MeasureCase[]) => [
      ...new Set(
        rects(measures)
          .filter((shape) => shape.part === part && shape.kind !== "bar-nut")
          .map(({ y, height }) => y + height / 2),
      ),
    ];
    expect(middles("bolt", [])).toEqual([-60, 60]);
    expect(middles("bar", [BARS])).toEqual([-60, 60]);
    expect(middles("bolt", [BARS])).toEqual([]);
  });
  it("clips the inner corners of a stiffener and keeps its width from the web", () => {
    const { shapes } = drawNode(buildDrawingCase(), [STIFFENERS]).section;
    const plates = shapes.flatMap((shape) =>
      shape.part === "stiffener" && shape.shape === "polygon" ? [shape.points] : [],
    );
    expect(plates).toHaveLength(2);
    const upper = plates[1] ?? [];
    expect(Math.max(...upper.map(({ y }) => y))).toBeCloseTo(4.25 + 120, 9);
    expect(upper[0]).toEqual({ x: -131 + 20, y: 4.25 });
  });
  it("shows only what stands at the level of the cut", () => {
    const bottomOnly = { ...STIFFENERS, levels: ["bottom"] } as MeasureCase;
    const parts = (level: "top" | "bottom") =>
      drawNode(buildDrawingCase(), [bottomOnly], { sectionLevel: level }).section.shapes.map(
        (shape) => shape.part,
      );
    expect(parts("top")).not.toContain("stiffener");
    expect(parts("bottom")).toContain("stiffener");
  });
  it("lays the web plate against the web, on one side or both, and backing plates at the flange tips", () => {
    const plates = (measure: MeasureCase) => rects([measure]).filter((shape) => shape.kind === "added-plate");
    expect(plates(WEB_PLATE)).toHaveLength(1);
    expect(plates({ ...WEB_PLATE, sides: 2 } as MeasureCase).map(({ y, height }) => [y, height])).toEqual([
      [-16.25, 12],
      [4.25, 12],
    ]);
    expect(plates(BACKING)).toHaveLength(4);
    expect(Math.max(...plates(BACKING).map(({ y, height }) => y + height))).toBe(150);
  });
  it("dimensions gauge and plate width with the fields they belong to", () => {
    const { dimensions } = drawNode(buildDrawingCase(), []).section;
    expect(dimensions.map(({ edits, valueMm }) => [edits, valueMm])).toEqual([
      ["left.connection.bolts.gauge", 120],
      ["left.connection.plate.width", 200],
      ["right.connection.bolts.gauge", 120],
      ["right.connection.plate.width", 200],
      [null, 14],
    ]);
  });
});
