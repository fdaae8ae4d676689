import { describe, expect, it } from "vitest";
import { frameOf } from "@/lib/drawing/frame";
import { beamShapes, columnShapes, legMm } from "@/lib/drawing/member-shapes";
import { buildDrawingCase, buildJoint, END_PLATE } from "./drawing-case";

const rects = (shapes: ReturnType<typeof columnShapes>) =>
  shapes.flatMap((shape) => (shape.shape === "rect" ? [shape] : []));

describe("members in elevation", () => {
  it("draws both column flanges at their thickness, outside the web", () => {
    const flanges = rects(columnShapes(frameOf(buildDrawingCase(), []), 4)).filter(
      (shape) => shape.kind === "cut",
    );
    expect(flanges.map(({ x, width }) => [x, width])).toEqual([
      [-145, 14],
      [131, 14],
    ]);
  });
  it("breaks a continuous column off and closes a real end", () => {
    const column = { ...buildDrawingCase().column, endDistanceAboveMm: 100 };
    const shapes = columnShapes(frameOf(buildDrawingCase({ column }), []), 4);
    expect(shapes.filter((shape) => shape.kind === "end")).toHaveLength(1);
    expect(shapes.filter((shape) => shape.kind === "break")).toHaveLength(1);
  });
  it("draws the end plate from the column face, past the beam by both extensions", () => {
    const frame = frameOf(buildDrawingCase(), []);
    const plates = frame.joints.flatMap((joint) =>
      rects(beamShapes(frame, joint, 4)).filter((shape) => shape.kind === "plate"),
    );
    expect(plates.map(({ part, x, y, width, height }) => [part, x, y, width, height])).toEqual([
      ["plate-left", -165, -90, 20, 570],
      ["plate-right", 145, -90, 20, 570],
    ]);
  });
  it("draws beam flanges at their thickness and fillets with a leg of the throat times root two", () => {
    const frame = frameOf(buildDrawingCase(), []);
    const [left] = frame.joints;
    const shapes = left ? beamShapes(frame, left, 4) : [];
    const flanges = rects(shapes).filter((shape) => shape.kind === "beam-flange");
    expect(flanges.map(({ y, height }) => [y, height])).toEqual([
      [0, 14.6],
      [450 - 14.6, expect.closeTo(14.6, 9)],
    ]);
    const top = shapes.find((shape) => shape.shape === "polygon" && shape.part === "weld");
    const legs = top?.shape === "polygon" ? top.points.map(({ x }) => x) : [];
    expect(Math.max(...legs) - Math.min(...legs)).toBeCloseTo(8 * Math.SQRT2, 9);
    expect(legMm(5)).toBeCloseTo(5 * Math.SQRT2, 12);
  });
  it("draws a butt weld inside the flange, and a welded beam up to the column without a plate", () => {
    const welds = {
      topFlange: { kind: "butt" },
      bottomFlange: { kind: "butt" },
      web: END_PLATE.welds.web,
    } as const;
    const frame = frameOf(
      buildDrawingCase({ joints: [buildJoint("right", { connection: { kind: "welded", welds } })] }),
      [],
    );
    const [right] = frame.joints;
    const shapes = right ? beamShapes(frame, right, 4) : [];
    expect(shapes.filter((shape) => shape.kind === "plate")).toHaveLength(0);
    const bevels = shapes.flatMap((shape) =>
      shape.shape === "polygon" ? [shape.points.map(({ y }) => y)] : [],
    );
    expect(bevels).toHaveLength(2);
    for (const ys of bevels) expect(Math.max(...ys) - Math.min(...ys)).toBeCloseTo(14.6, 9);
    expect(right?.beamStartMm).toBe(145);
  });
});
