import { describe, expect, it } from "vitest";
import { evaluateOption } from "@/lib/calc";
import type { MeasureCase } from "@/lib/calc/node";
import { asksForDiagonals, planCombinations, spaceOf, thinned } from "@/lib/propose/combination-plan";
import { buildLightest, buildStrongest, fixedShape, shapesOf } from "@/lib/propose/design-space";
import { boltedJoint, sampleNode, STOCK, weldedJoint } from "./sample-node";

const twoSided = sampleNode([boltedJoint("left"), boltedJoint("right")], [[200, 150]]);
const kindsOf = (measures: readonly MeasureCase[]): readonly string[] => measures.map(({ kind }) => kind);

describe("planCombinations", () => {
  it("puts every kind beside every other that may stand with it, diagonals only where they are asked for", () => {
    const keys = planCombinations(twoSided, STOCK, false).map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    for (const key of [
      "bars-top-stiffeners-bottom",
      "bars-bottom-stiffeners-top",
      "stiffeners-bottom-backing",
      "stiffeners-both-backing",
      "web-plate-stiffeners-bottom",
      "web-plate-stiffeners-both",
      "web-plate-backing",
      "web-plate-bars-top",
      "web-plates-stiffeners-both",
      "heavier-column-stiffeners-bottom",
      "web-plate-stiffeners-bottom-backing",
      "web-plate-stiffeners-bottom-bars-top",
    ])
      expect(keys).toContain(key);
    expect(keys.some((key) => key.includes("diagonals"))).toBe(false);
    const braced = planCombinations(twoSided, STOCK, true).map(({ key }) => key);
    expect(braced).toContain("diagonals");
    expect(braced).toContain("stiffeners-both-diagonals");
  });

  it("makes each of its own kinds, at its least and at its most, and names its parts", () => {
    for (const plan of planCombinations(twoSided, STOCK, true)) {
      const space = spaceOf(plan);
      if (!space) throw new Error(`${plan.key} is empty`);
      const [first] = shapesOf(space);
      if (!first) throw new Error(`${plan.key} has no shape`);
      const kinds = kindsOf(buildStrongest(first));
      expect(kindsOf(buildLightest(first))).toEqual(kinds);
      expect(new Set(kinds).size).toBe(kinds.length);
      expect(plan.parts.length).toBeGreaterThanOrEqual(kinds.length);
      expect(plan.name.length).toBeGreaterThan(0);
    }
  });

  it("never puts bars at the level of stiffeners", () => {
    for (const { key, space } of planCombinations(twoSided, STOCK, true)) {
      if (!/bars.*stiffeners|stiffeners.*bars/.test(key)) continue;
      const [shape] = shapesOf(space());
      const measures = shape ? buildLightest(shape) : [];
      const levels = measures.flatMap((one) =>
        one.kind === "through-bars" || one.kind === "transverse-stiffeners" ? one.levels : [],
      );
      expect(new Set(levels).size).toBe(levels.length);
    }
  });

  it("has nothing of bolts where a beam is welded on", () => {
    const welded = sampleNode([weldedJoint("left")], [[200, 0]]);
    for (const plan of planCombinations(welded, STOCK, true)) {
      expect(spaceOf(plan) === null).toBe(/bars|backing/.test(plan.key));
    }
  });

  it("stands fewer parts before more: a part that passes is known before the whole", () => {
    const counts = planCombinations(twoSided, STOCK, true).map(({ space }) => {
      const [shape] = shapesOf(space());
      return shape ? buildLightest(shape).length : 0;
    });
    const firstOfThree = counts.indexOf(3);
    expect(counts.slice(firstOfThree).every((count) => count === 3)).toBe(true);
  });
});

describe("asksForDiagonals", () => {
  it("hears a panel short of shear, or a stiffness not reached, on the bare column", () => {
    const bare = (left: number, right: number, stiffness: "any" | { nmmPerRad: number } = "any") => {
      const node = sampleNode([boltedJoint("left"), boltedJoint("right")], [[left, right]]);
      return evaluateOption({ ...node, target: { utilisation: 1, stiffness } }, []);
    };
    expect(asksForDiagonals(bare(50, 50), 1)).toBe(false);
    // Moments turning the same way: 2 · 250 / 0.43 kN pass what the web of an HE 300 A takes (about 690 kN).
    expect(asksForDiagonals(bare(250, -250), 1)).toBe(true);
    expect(asksForDiagonals(bare(50, 50, { nmmPerRad: 1e15 }), 1)).toBe(true);
  });
});

describe("thinned", () => {
  it("keeps four, the extremes among them, and all where there are no more", () => {
    const shapes = [0, 1, 2, 3, 4, 5, 6].map(() => fixedShape([]));
    expect(thinned(shapes)).toEqual([shapes[0], shapes[2], shapes[4], shapes[6]]);
    expect(thinned(shapes)[3]).toBe(shapes[6]);
    expect(thinned(shapes.slice(0, 3))).toHaveLength(3);
  });
});
