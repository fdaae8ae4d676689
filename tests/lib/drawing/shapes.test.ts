import { describe, expect, it } from "vitest";
import {
  breakLine,
  commonExtent,
  cornersOf,
  extentOf,
  line,
  polygon,
  rectBetween,
} from "@/lib/drawing/shapes";

describe("shapes", () => {
  it("makes the same rectangle whichever corner comes first", () => {
    const there = rectBetween("column", "web", { x: -3, y: 8 }, { x: 4, y: 2 });
    expect(there).toMatchObject({ x: -3, y: 2, width: 7, height: 6 });
    expect(rectBetween("column", "web", { x: 4, y: 2 }, { x: -3, y: 8 })).toEqual(there);
  });
  it("bounds what it is given, and nothing by the origin", () => {
    expect(
      extentOf([
        { x: 1, y: 9 },
        { x: -2, y: 4 },
      ]),
    ).toEqual({ minX: -2, minY: 4, maxX: 1, maxY: 9 });
    expect(extentOf([])).toEqual({ minX: 0, minY: 0, maxX: 0, maxY: 0 });
  });
  it("holds every drawing in the common extent", () => {
    const common = commonExtent([
      { minX: 0, minY: 1, maxX: 5, maxY: 6 },
      { minX: -4, minY: 2, maxX: 3, maxY: 9 },
    ]);
    expect(common).toEqual({ minX: -4, minY: 1, maxX: 5, maxY: 9 });
  });
  it("keeps the ends of a break line and swings evenly to both sides of it", () => {
    const points = cornersOf(breakLine({ x: 0, y: 5 }, { x: 100, y: 5 }, 4));
    expect(points[0]).toEqual({ x: 0, y: 5 });
    expect(points[points.length - 1]).toEqual({ x: 100, y: 5 });
    expect(Math.max(...points.map(({ y }) => y)) - 5).toBeCloseTo(4, 9);
    expect(5 - Math.min(...points.map(({ y }) => y))).toBeCloseTo(4, 9);
  });
  it("gives lines and polygons their own points", () => {
    const points = [
      { x: 0, y: 0 },
      { x: 1, y: 2 },
    ];
    expect(cornersOf(line("bolt", "centre", points))).toEqual(points);
    expect(cornersOf(polygon("weld", "weld", points))).toEqual(points);
  });
});
