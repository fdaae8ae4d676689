import { describe, expect, it } from "vitest";
import { acrossDimension, dimensionText, spreadLabels, upDimension } from "@/lib/drawing/dimension-lines";

const measured = { id: "a", edits: "left.connection.plate.thickness", name: "thickness", valueMm: 20 };

describe("dimension lines", () => {
  it("writes whole millimetres, one decimal at most, and a true minus sign", () => {
    expect([20, 14.6, -45, 12.345, -0.04].map(dimensionText)).toEqual([
      "20",
      "14.6",
      "\u221245",
      "12.3",
      "0",
    ]);
  });
  it("measures across between its two extension lines", () => {
    const { lines } = acrossDimension(
      measured,
      { fromX: 10, toX: 30, atY: 50, extendFromY: 40, text: "middle" },
      1,
    );
    expect(lines[1]?.every(({ x }) => x === 10)).toBe(true);
    expect(lines[2]?.every(({ x }) => x === 30)).toBe(true);
    expect(lines[0]?.every(({ y }) => y === 50)).toBe(true);
  });
  it("stands the text of a short distance beyond the end that was asked for", () => {
    const at = (text: "beyond-left" | "beyond-right") =>
      acrossDimension(measured, { fromX: 10, toX: 30, atY: 50, extendFromY: 40, text }, 1);
    expect(at("beyond-left").textAt.x).toBeLessThan(10);
    expect(at("beyond-right").textAt.x).toBeGreaterThan(30);
  });
  it("turns the text along a vertical line, or stands it above, below or outside", () => {
    const at = (text: "along" | "above" | "below" | "outside") =>
      upDimension(measured, { fromY: 0, toY: 80, atX: -100, extendFromX: -60, text }, 1);
    expect(at("along").rotation).toBe(-90);
    expect(at("above").textAt.y).toBeLessThan(0);
    expect(at("below").textAt.y).toBeGreaterThan(80);
    expect(at("outside")).toMatchObject({ anchor: "end", rotation: 0 });
  });
  it("moves labels apart that would touch, keeps their order, and leaves others alone", () => {
    const spread = spreadLabels([0, 4, 100], 10);
    for (const [index, value] of spread.entries()) {
      if (index > 0) expect(value - (spread[index - 1] ?? 0)).toBeGreaterThanOrEqual(10 - 1e-6);
    }
    expect(spread[2]).toBe(100);
    expect(spreadLabels([0, 50], 10)).toEqual([0, 50]);
  });
});
