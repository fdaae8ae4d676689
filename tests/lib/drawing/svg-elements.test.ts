import { describe, expect, it } from "vitest";
import { drawNode } from "@/lib/drawing/draw-node";
import { LAYERS, PAINTS } from "@/lib/drawing/paint";
import {
  coordinate,
  dimensionTextElement,
  hatchElements,
  layered,
  shapeElement,
  viewBoxOf,
} from "@/lib/drawing/svg-elements";
import { BARS, buildDrawingCase, STIFFENERS, WEB_PLATE } from "./drawing-case";

const options = { idPrefix: "p", mmPerPixel: 2 };

describe("elements of the drawing", () => {
  it("writes coordinates in millimetres to a hundredth, without a negative zero", () => {
    expect([1.23456, -0.0001, 12].map(coordinate)).toEqual([1.23, 0, 12]);
    expect(Object.is(coordinate(-0.001), -0)).toBe(false);
    expect(viewBoxOf({ minX: -10, minY: -5, maxX: 30, maxY: 45 })).toBe("-10 -5 40 50");
  });
  it("fills hatched kinds from patterns with the drawing's own ids", () => {
    const { shapes } = drawNode(buildDrawingCase(), [STIFFENERS, WEB_PLATE]).elevation;
    const fills = new Set(shapes.map((shape) => shapeElement(shape, options).attributes.fill));
    const ids = hatchElements(options).children.map((child) =>
      typeof child === "string" ? "" : String(child.attributes.id),
    );
    expect(ids).toEqual(["p-diagonal", "p-dashes"]);
    for (const id of ids) expect(fills).toContain(`url(#${id})`);
  });
  it("uses colours of the sheet only, as variables, and no style attribute", () => {
    const { shapes } = drawNode(buildDrawingCase(), [BARS]).elevation;
    for (const shape of shapes) {
      const { attributes } = shapeElement(shape, options);
      expect(attributes).not.toHaveProperty("style");
      expect(String(attributes.fill)).toMatch(/^(none|var\(--[a-z0-9]+\)|url\(#p-\w+\))$/);
    }
  });
  it("has a paint and a layer for every kind, and lays nuts over bars", () => {
    expect([...LAYERS].sort()).toEqual(Object.keys(PAINTS).sort());
    const kinds = layered(drawNode(buildDrawingCase(), [BARS]).elevation.shapes).map((shape) => shape.kind);
    expect(kinds.indexOf("bar-nut")).toBeGreaterThan(kinds.lastIndexOf("bar"));
  });
  it("turns the text of a vertical dimension about its own place", () => {
    const { elevation } = drawNode(buildDrawingCase(), []);
    const index = elevation.dimensions.findIndex((dimension) => dimension.rotation === -90);
    const text = dimensionTextElement(elevation, index, options);
    expect(text?.attributes.transform).toBe(`rotate(-90 ${text?.attributes.x} ${text?.attributes.y})`);
    expect(dimensionTextElement(elevation, 999, options)).toBeNull();
  });
});
