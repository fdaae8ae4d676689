import { describe, expect, it } from "vitest";
import type { JointCase } from "@/lib/calc";
import { isShared, pairsOfMeasure } from "@/lib/calc/measures/stiffener-pairs";
import { HE_300_A, buildJoint, buildStiffeners } from "@/tests/factories/build-node-case";
import { expectHand } from "@/tests/support/evaluated-case";

/** Guards how many pairs of plates a measure makes, whom they serve and how they slope. Flanges of 13.5 mm. */
const left = buildJoint("left");
const rightBelow = (levelOffsetMm: number): JointCase => ({ ...buildJoint("right"), levelOffsetMm });
const pairs = (joints: readonly JointCase[], overrides: Parameters<typeof buildStiffeners>[0] = {}) =>
  pairsOfMeasure(HE_300_A, joints, buildStiffeners(overrides));

describe("the pairs of a measure", () => {
  it("are one a level where there is one beam, or two with their flanges in line", () => {
    const levels = ["top", "bottom"] as const;
    for (const joints of [[left], [left, rightBelow(0)], [left, rightBelow(13)]])
      expect(pairs(joints, { levels }).map(({ level, slopeCosine }) => [level, slopeCosine])).toEqual([
        ["top", 1],
        ["bottom", 1],
      ]);
    expect(pairs([left, rightBelow(0)])[0]?.sides).toEqual(["left", "right"]);
  });

  it("serve both beams in line even if they are named for one", () =>
    expect(pairs([left, rightBelow(0)], { at: "right" })[0]?.sides).toEqual(["left", "right"]));

  it("slope from one flange to the other where these are less than 80 mm apart", () => {
    const [pair, ...more] = pairs([left, rightBelow(50)]);
    expect(more).toEqual([]);
    // 50 mm up over the clear 290 - 2 · 14 = 262 mm.
    expectHand(pair?.slopeCosine, 262 / Math.sqrt(262 ** 2 + 50 ** 2));
    expect(isShared(left, rightBelow(79.9), "top")).toBe(true);
    expect(isShared(left, rightBelow(80), "top")).toBe(false);
  });

  it("are two level ones from 80 mm on, one only where one beam is named", () => {
    expect(pairs([left, rightBelow(80)]).map(({ sides, slopeCosine }) => [...sides, slopeCosine])).toEqual([
      ["left", 1],
      ["right", 1],
    ]);
    expect(pairs([left, rightBelow(80)], { at: "left" }).map(({ sides }) => sides)).toEqual([["left"]]);
  });

  it("are one at each flange where they are of partial depth", () =>
    expect(pairs([left, rightBelow(0)], { length: 120 }).map(({ sides }) => sides)).toEqual([
      ["left"],
      ["right"],
    ]));
});
