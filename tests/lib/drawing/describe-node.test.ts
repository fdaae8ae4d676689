import { describe, expect, it } from "vitest";
import { describeNode, measureWords } from "@/lib/drawing/describe-node";
import {
  BACKING,
  BARS,
  buildDrawingCase,
  buildJoint,
  DIAGONAL,
  HEAVIER,
  STIFFENERS,
  WEB_PLATE,
  CLEATS,
} from "./drawing-case";

describe("the drawing in words", () => {
  it("names column, beams, connections and rows", () => {
    const words = describeNode(buildDrawingCase(), []);
    for (const part of [
      "HE 300 A",
      "on the left IPE 450",
      "on the right IPE 450",
      "end plate 20 by 200",
      "-45, 65, 385 mm",
      "Nothing is added",
    ]) {
      expect(words).toContain(part);
    }
  });
  it("says what each measure adds", () => {
    expect(measureWords(STIFFENERS)).toBe("a pair of full-depth stiffeners 120 by 12 at top and bottom");
    expect(measureWords({ ...STIFFENERS, length: 100, levels: ["top"] } as typeof STIFFENERS)).toContain(
      "100 mm long stiffeners",
    );
    expect(measureWords(BARS)).toContain(
      "M24 10.9 threaded bars through both flanges at top, with inner nuts",
    );
    expect(measureWords({ ...BARS, innerNuts: false } as typeof BARS)).toContain("without inner nuts");
    expect(measureWords(WEB_PLATE)).toContain("208 by 590 by 12 on one side");
    expect(measureWords({ ...WEB_PLATE, sides: 2 } as typeof WEB_PLATE)).toContain("on both sides");
    expect(measureWords(BACKING)).toContain("backing plates 200 by 110 by 15");
    expect(measureWords(DIAGONAL)).toContain("120 by 12, single");
    expect(measureWords(HEAVIER)).toContain("HE 300 B");
  });
  it("names welded and cleated connections", () => {
    const welds = {
      topFlange: { kind: "butt" },
      bottomFlange: { kind: "butt" },
      web: { kind: "butt" },
    } as const;
    const joints = [
      buildJoint("left", { connection: { kind: "welded", welds } }),
      buildJoint("right", { connection: CLEATS }),
    ];
    const words = describeNode(buildDrawingCase({ joints }), []);
    expect(words).toContain("IPE 450, welded");
    expect(words).toContain(
      "flange cleats 150 by 90 by 12, 180 long, M24 at 60, 120 mm from the heel, with web cleats",
    );
  });
});
