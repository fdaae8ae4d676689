import { describe, expect, it } from "vitest";
import type { EvaluatedOption } from "@/lib/calc/result";
import { sizingWords } from "@/lib/propose/sizing-words";
import { boltedJoint, sampleNode } from "./sample-node";

const node = sampleNode([boltedJoint("left")], [[200, 0]]);
const failing = {
  kind: "evaluated",
  passes: false,
  utilisation: 1.124,
  stiffnessReached: true,
  governing: { component: "column-web-shear", side: "left", loadCase: "ULS 2", utilisation: 1.124 },
  connectionFailure: null,
  joints: [],
} as unknown as EvaluatedOption;

describe("sizingWords", () => {
  it("says nothing of what passes or is outside scope", () => {
    expect(sizingWords(node, { ...failing, passes: true })).toBeNull();
    expect(sizingWords(node, { kind: "outside-scope", measures: [], reason: "h above 400 mm" })).toBeNull();
  });

  it("names the component that stays over", () => {
    expect(sizingWords(node, failing)).toBe(
      "No stock size does: panel shear on the left stays at 1.12 in ULS 2.",
    );
  });

  it("does not print 1.00 for what is over", () => {
    expect(sizingWords(node, { ...failing, utilisation: 1.0007 })).toContain("stays at 1.001 in");
  });

  it("says that the connection fails where it does", () => {
    expect(sizingWords(node, { ...failing, connectionFailure: "bolt tension" })).toBe(
      "No stock size does: panel shear on the left stays at 1.12 in ULS 2, and the connection itself fails, which no stiffening of the column cures.",
    );
  });

  it("names the softest joint where only stiffness is missing", () => {
    const joints = [
      { side: "left", loadCase: "ULS 1", initialStiffnessNmmPerRad: 90e9 },
      { side: "left", loadCase: "ULS 2", initialStiffnessNmmPerRad: 71.4e9 },
    ] as unknown as EvaluatedOption["joints"];
    expect(sizingWords(node, { ...failing, utilisation: 0.8, stiffnessReached: false, joints })).toBe(
      "No stock size is stiff enough: the left joint stays at 71400 kNm/rad in ULS 2.",
    );
  });
});
