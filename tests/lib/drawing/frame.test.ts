import { describe, expect, it } from "vitest";
import { columnInForce, flangeHeightsMm, frameOf, levelOfRow, outerFaceMm } from "@/lib/drawing/frame";
import { buildDrawingCase, buildJoint, HE_300_B, HEAVIER, IPE_450, WEB_PLATE } from "./drawing-case";

describe("the frame places the node in millimetres", () => {
  it("puts the bolt rows at their distances below the top of the beam", () => {
    expect(frameOf(buildDrawingCase(), []).joints.map((joint) => joint.rowsMm)).toEqual([
      [-45, 65, 385],
      [-45, 65, 385],
    ]);
  });
  it("puts the faces of the column and of the end plates where their thickness says", () => {
    const frame = frameOf(buildDrawingCase(), []);
    expect(frame.joints.map((joint) => joint.columnFaceMm)).toEqual([-145, 145]);
    expect(frame.joints.map((joint) => joint.beamStartMm)).toEqual([-165, 165]);
    expect(frame.innerFaceMm).toBe(145 - 14);
  });
  it("lowers the right beam by its offset", () => {
    const frame = frameOf(
      buildDrawingCase({ joints: [buildJoint("left"), buildJoint("right", { levelOffsetMm: 120 })] }),
      [],
    );
    expect(frame.joints[1]).toMatchObject({ topMm: 120, bottomMm: 570, rowsMm: [75, 185, 505] });
    expect(flangeHeightsMm(frame, "top")).toEqual([7.3, 127.3]);
  });
  it("shows a near column end where it is, and breaks the column off before a far one", () => {
    const column = { ...buildDrawingCase().column, endDistanceAboveMm: 150, endDistanceBelowMm: 3000 };
    const frame = frameOf(buildDrawingCase({ column }), []);
    expect(frame).toMatchObject({ endsAtTop: true, topMm: -150, endsAtBottom: false });
    expect(frame.bottomMm).toBeGreaterThan(450);
    expect(frame.bottomMm).toBeLessThan(3450);
  });
  it("draws the heavier column in the window of the node's own, so that options share a scale", () => {
    const [own, heavier] = [frameOf(buildDrawingCase(), []), frameOf(buildDrawingCase(), [HEAVIER])];
    expect(columnInForce(buildDrawingCase(), [HEAVIER])).toEqual(HE_300_B);
    expect(heavier.halfDepthMm).toBe(150);
    expect([heavier.leftMm, heavier.rightMm]).toEqual([own.leftMm, own.rightMm]);
  });
  it("shows the column far enough for a tall web plate", () => {
    const tall = { ...WEB_PLATE, heightMm: 1200 } as typeof WEB_PLATE;
    expect(frameOf(buildDrawingCase(), [tall]).topMm).toBeLessThan(225 - 600);
  });
  it("gives one flange height where both beams are level", () => {
    const frame = frameOf(buildDrawingCase(), []);
    expect(flangeHeightsMm(frame, "top")).toEqual([IPE_450.flangeThicknessMm / 2]);
    expect(flangeHeightsMm(frame, "bottom")).toEqual([450 - IPE_450.flangeThicknessMm / 2]);
  });
  it("counts a row to the nearer flange, and lets a nut bear on the column where no plate covers it", () => {
    const frame = frameOf(buildDrawingCase({ joints: [buildJoint("left")] }), []);
    const [left] = frame.joints;
    expect(left && [-45, 65, 385].map((row) => levelOfRow(left, row))).toEqual(["top", "top", "bottom"]);
    expect(outerFaceMm(frame, -1, 65)).toBe(-165);
    expect(outerFaceMm(frame, -1, -200)).toBe(-145);
    expect(outerFaceMm(frame, 1, 65)).toBe(145);
  });
});
