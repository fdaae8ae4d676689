import { expect, it } from "vitest";
import type { NodeCase } from "@/lib/calc/node";
import { forceLevels } from "@/lib/propose/force-levels";

const withMoments = (...cases: readonly (readonly [number, number])[]): NodeCase =>
  ({
    joints: [{ side: "left" }, { side: "right" }],
    loadCases: cases.map(([left, right]) => ({ left: { momentNmm: left }, right: { momentNmm: right } })),
  }) as unknown as NodeCase;

it("pulls at the top and pushes at the bottom under gravity", () => {
  expect(forceLevels(withMoments([100, 80]))).toEqual({ tension: ["top"], compression: ["bottom"] });
});

it("swaps the levels where the moment is reversed", () => {
  expect(forceLevels(withMoments([-100, -80]))).toEqual({ tension: ["bottom"], compression: ["top"] });
});

it("does both at both levels where wind turns one moment round, in one case or on one side", () => {
  const both = { tension: ["top", "bottom"], compression: ["top", "bottom"] };
  expect(forceLevels(withMoments([100, 80], [-20, -30]))).toEqual(both);
  expect(forceLevels(withMoments([100, -80]))).toEqual(both);
});

it("says nothing of a beam without moment", () => {
  expect(forceLevels(withMoments([100, 0]))).toEqual({ tension: ["top"], compression: ["bottom"] });
  expect(forceLevels(withMoments([0, 0]))).toEqual({ tension: [], compression: [] });
});
