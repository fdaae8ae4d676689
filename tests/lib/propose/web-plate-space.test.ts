import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { webPlateHeightsMm, webPlateSpace } from "@/lib/propose/web-plate-space";
import { boltedJoint, S355, sampleNode, STOCK } from "./sample-node";

const node = sampleNode([boltedJoint("left"), boltedJoint("right")], [[200, 200]]);
type WebPlates = Extract<MeasureCase, { kind: "web-plates" }>;

describe("webPlateSpace", () => {
  const shapes = webPlateSpace(node, STOCK, 1);
  const lightest = shapes.map((shape) => shape.build([0, 0])[0] as WebPlates);

  it("fits the plate between the root toes and takes plates not thinner than the web", () => {
    // 290 - 2 x 14 - 2 x 27 = 208; the web is 8.5 mm thick
    expect(lightest.map(({ widthMm, thicknessMm }) => [widthMm, thicknessMm])).toEqual([
      [208, 10],
      [208, 12],
      [208, 15],
      [208, 20],
      [208, 25],
      [208, 30],
    ]);
  });

  it("leaves out plates too slender for their width", () => {
    const deep = { ...node.column.section, depthMm: 500, webThicknessMm: 5 };
    // 500 - 82 = 418 < 40 sqrt(235 / 355) t needs t above 12.8
    const plates = webPlateSpace({ ...node, column: { ...node.column, section: deep } }, STOCK, 2);
    expect(plates.map((shape) => (shape.build([0, 0])[0] as WebPlates).thicknessMm)).toEqual([
      15, 20, 25, 30,
    ]);
  });

  it("starts with the least fillet that counts in tension and ends with a butt weld", () => {
    const [first] = shapes;
    const highest = (first?.ladders[0] ?? 0) - 1;
    expect(lightest[0]?.weld).toEqual({ kind: "fillet", throatMm: 8 }); // 10 / sqrt 2 = 7.07
    expect((first?.build([highest, 0])[0] as WebPlates).weld).toEqual({ kind: "butt" });
    // 15 / sqrt 2 = 10.6: no fillet in stock is large enough
    expect(lightest[2]?.weld).toEqual({ kind: "butt" });
  });

  it("is of the plate's own steel and tries heights from the beam's depth to beyond what the bolts pull", () => {
    expect(lightest[0]?.steel).toEqual(S355);
    expect(lightest[0]?.heightMm).toBe(450);
    // m = (120 - 8.5) / 2 - 0.8 x 27 = 34.15; half of 4 m + 1.25 x 90 beyond the row at -45: at least 450 + 2 x 169.5
    expect(webPlateHeightsMm(node).at(-1)).toBeGreaterThanOrEqual(
      450 + 2 * (45 + (4 * 34.15 + 1.25 * 90) / 2),
    );
  });
});
