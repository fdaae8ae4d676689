import { describe, expect, it } from "vitest";
import { hasBars, nowhere, placedAt, weldLegMm, type PanelDesign } from "@/lib/calc/measures/panel-design";
import { buildBars, buildNodeCase } from "@/tests/factories/build-node-case";

describe("the design of the panel", () => {
  const none = { top: null, bottom: null };

  it("places a thing at the named levels of the named sides and leaves the rest", () => {
    const first = placedAt(nowhere<string>(), "both", ["top"], "a");
    expect(first).toEqual({ left: { top: "a", bottom: null }, right: { top: "a", bottom: null } });
    expect(placedAt(first, "left", ["top", "bottom"], "b")).toEqual({
      left: { top: "b", bottom: "b" },
      right: { top: "a", bottom: null },
    });
    expect(placedAt(nowhere<string>(), "right", ["bottom"], "c")).toEqual({
      left: none,
      right: { top: null, bottom: "c" },
    });
  });

  it.each(["left", "right"] as const)("finds bars at either level on the %s", (side) => {
    const design: PanelDesign = {
      column: buildNodeCase().column,
      stiffeners: nowhere(),
      pairs: [],
      diagonals: null,
      webPlates: null,
      backing: nowhere(),
      bars: nowhere(),
    };
    expect(hasBars(design)).toBe(false);
    for (const level of ["top", "bottom"] as const)
      expect(hasBars({ ...design, bars: placedAt(design.bars, side, [level], buildBars()) })).toBe(true);
  });

  it("gives a fillet the leg of an isosceles triangle over its throat, and a butt weld none", () => {
    expect(weldLegMm({ kind: "fillet", throatMm: 5 })).toBeCloseTo(Math.hypot(5, 5), 12);
    expect(weldLegMm({ kind: "butt" })).toBe(0);
  });
});
