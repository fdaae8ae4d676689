import { describe, expect, it } from "vitest";
import { fastenerShapes } from "@/lib/drawing/fastener-shapes";
import { frameOf } from "@/lib/drawing/frame";
import type { MeasureCase } from "@/lib/calc/node";
import { BACKING, BARS, buildDrawingCase, buildJoint, M24 } from "./drawing-case";

const shapesOf = (measures: readonly MeasureCase[], node = buildDrawingCase()) =>
  fastenerShapes(frameOf(node, measures), measures).flatMap((shape) =>
    shape.shape === "rect" ? [shape] : [],
  );
const middle = ({ y, height }: { y: number; height: number }) => y + height / 2;

describe("bolts and bars in elevation", () => {
  it("puts a bolt at the height of every row on both sides, through plate and flange", () => {
    const shanks = shapesOf([]).filter((shape) => shape.kind === "shank");
    expect(shanks.map(middle)).toEqual([-45, 65, 385, -45, 65, 385]);
    for (const { side, x, width } of shanks) {
      const [plateOuter, flangeInner] = side === "left" ? [-165, -131] : [165, 131];
      expect(x).toBeLessThanOrEqual(Math.min(plateOuter, flangeInner));
      expect(x + width).toBeGreaterThanOrEqual(Math.max(plateOuter, flangeInner));
    }
  });
  it("runs bars through both flanges and both plates, in place of the bolts of those rows", () => {
    const shapes = shapesOf([BARS]);
    const bars = shapes.filter((shape) => shape.part === "bar");
    expect(bars.map(middle)).toEqual([-45, 65]);
    for (const bar of bars) {
      expect(bar.height).toBe(M24.diameterMm);
      expect(bar.x).toBeLessThan(-165 - M24.nutHeightMm);
      expect(bar.x + bar.width).toBeGreaterThan(165 + M24.nutHeightMm);
    }
    expect(shapes.filter((shape) => shape.kind === "shank").map(middle)).toEqual([385, 385]);
  });
  it("fits inner nuts against the inside of both flanges, and none when there are none", () => {
    const nutsInside = (measures: readonly MeasureCase[]) =>
      shapesOf(measures).filter((shape) => shape.part === "nut" && Math.abs(shape.x + shape.width / 2) < 131);
    const inside = nutsInside([BARS]);
    expect(inside).toHaveLength(4);
    expect(new Set(inside.map(({ x, width }) => (x < 0 ? x : x + width)))).toEqual(new Set([-131, 131]));
    expect(nutsInside([{ ...BARS, innerNuts: false } as MeasureCase])).toHaveLength(0);
  });
  it("lets the outer nut of a one-sided node bear on the far column flange", () => {
    const shapes = shapesOf([BARS], buildDrawingCase({ joints: [buildJoint("left")] }));
    const right = shapes.filter((shape) => shape.part === "nut" && shape.x >= 145);
    expect(right).toHaveLength(4);
    expect(Math.min(...right.map(({ x }) => x))).toBe(145);
  });
  it("lays the nut on a backing plate where there is one", () => {
    const left = shapesOf([BACKING]).filter(
      (shape) => shape.side === "left" && shape.row === 1 && shape.kind === "fastener",
    );
    const insideFaces = left.filter(({ x }) => x > -131).map(({ x }) => x);
    expect(Math.min(...insideFaces)).toBe(-131 + 15);
  });
});
