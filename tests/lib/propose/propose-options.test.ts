import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { evaluateOption } from "@/lib/calc";
import type { ISection, JointCase, LoadCase, MeasureCase, NodeCase, Side, Weld } from "@/lib/calc/node";
import { shapesOf, type Shape } from "@/lib/propose/design-space";
import { planCombinations } from "@/lib/propose/combination-plan";
import { planOptions } from "@/lib/propose/option-plan";
import { proposeOptions, type ProposedOption } from "@/lib/propose/propose-options";
import type { Stock } from "@/lib/propose/stock";
import { boltedJoint, HE_300_A, M24, S355, sampleNode, weldedJoint } from "./sample-node";

/** Laws that every proposal obeys, on drawn nodes and a stock small enough to try every candidate. */

const M20 = {
  ...M24,
  name: "M20",
  diameterMm: 20,
  stressAreaMm2: 245,
  holeMm: 22,
  acrossFlatsMm: 30,
  acrossPointsMm: 32.95,
  headHeightMm: 12.5,
  nutHeightMm: 18,
  washerDiameterMm: 37,
  washerThicknessMm: 3,
};
const BAR_GRADES = [
  { name: "8.8", yieldMpa: 640, ultimateMpa: 800, alphaV: 0.6 },
  { name: "10.9", yieldMpa: 900, ultimateMpa: 1000, alphaV: 0.5 },
];

const HEAVIER: readonly ISection[] = [
  { ...HE_300_A, designation: "HE 320 A", depthMm: 310, webThicknessMm: 9, flangeThicknessMm: 15.5 },
  { ...HE_300_A, designation: "HE 360 A", depthMm: 350, webThicknessMm: 10, flangeThicknessMm: 17.5 },
  { ...HE_300_A, designation: "HE 400 A", depthMm: 390, webThicknessMm: 11, flangeThicknessMm: 19 },
];

const SMALL_STOCK: Stock = {
  plates: [10, 12, 20].map((thicknessMm) => ({ thicknessMm, steel: S355 })),
  throatsMm: [3, 5, 8],
  bars: [M20, M24].flatMap((size) => BAR_GRADES.map((grade) => ({ size, grade }))),
  columns: HEAVIER.map((section) => ({ section, steel: S355, massKgPerM: section.depthMm / 3 })),
};

const throatMm = (weld: Weld, thicknessMm: number): number =>
  weld.kind === "fillet" ? weld.throatMm : 1.5 * thicknessMm;

/** A made-up price that climbs with every size: steel by volume, welds by throat squared, bars by area and class. */
function priceOf(measures: readonly MeasureCase[]): number {
  const prices = measures.map((measure) => {
    switch (measure.kind) {
      case "transverse-stiffeners": {
        const length = measure.length === "full" ? 262 : measure.length;
        const { thicknessMm: t, widthMm: b } = measure;
        const welds =
          throatMm(measure.flangeWeld, t) ** 2 * 4 * b + throatMm(measure.webWeld, t) ** 2 * 4 * length;
        return measure.levels.length * ((2 * t * b * length) / 500 + welds / 10);
      }
      case "web-plates":
        return (
          measure.sides *
          ((measure.thicknessMm * measure.widthMm * measure.heightMm) / 500 +
            throatMm(measure.weld, measure.thicknessMm) ** 2 * measure.heightMm)
        );
      case "through-bars":
        return measure.levels.length * measure.size.stressAreaMm2 * (measure.grade.name === "8.8" ? 3 : 4);
      case "heavier-column":
        return measure.section.depthMm * 30;
      case "backing-plates":
        return (measure.levels.length * measure.thicknessMm * measure.widthMm * measure.lengthMm) / 250;
      case "diagonal-stiffeners": {
        const { thicknessMm: t, widthMm: b } = measure;
        const lengths = measure.arrangement === "k" ? 2 * 340 : 510;
        return (2 * t * b * lengths) / 500 + (throatMm(measure.weld, t) ** 2 * (4 * b + 4 * lengths)) / 10;
      }
    }
  });
  return Math.round(prices.reduce((sum, price) => sum + price, 0));
}

const anyNode: fc.Arbitrary<NodeCase> = fc
  .record({
    welded: fc.boolean(),
    sides: fc.constantFrom<readonly Side[]>(["left"], ["right"], ["left", "right"]),
    moments: fc.array(fc.tuple(fc.integer({ min: -120, max: 320 }), fc.integer({ min: -120, max: 320 })), {
      minLength: 1,
      maxLength: 4,
    }),
    utilisation: fc.constantFrom(0.8, 1),
  })
  .map(({ welded, sides, moments, utilisation }) => {
    const node = sampleNode(sides.map(welded ? weldedJoint : boltedJoint), moments);
    return { ...node, target: { utilisation, stiffness: "any" } };
  });

const describeOption = ({ key, measures, sizing }: ProposedOption) => ({ key, measures, sizing });

const MIRRORED = { left: "right", right: "left" } as const;

function mirrored(node: NodeCase): NodeCase {
  const joints = node.joints.map((joint): JointCase => ({ ...joint, side: MIRRORED[joint.side] }));
  const loadCases = node.loadCases.map((one): LoadCase => ({
    name: one.name,
    left: one.right,
    right: one.left,
    column: {
      axialForceN: one.column.axialForceN,
      momentAboveNmm: -one.column.momentAboveNmm,
      momentBelowNmm: -one.column.momentBelowNmm,
      shearAboveN: -one.column.shearAboveN,
      shearBelowN: -one.column.shearBelowN,
    },
  }));
  return { ...node, joints: joints.toReversed(), loadCases };
}

/** Which way a diagonal leans is turned round by a mirror. */
const unturned = (measure: MeasureCase): MeasureCase =>
  measure.kind === "diagonal-stiffeners" ? { ...measure, towards: "left" } : measure;

/** The cheapest passing option all of whose kinds of measure are among these. */
function cheapestPart(
  measures: readonly MeasureCase[],
  options: readonly ProposedOption[],
): ProposedOption | undefined {
  const kinds = measures.map(({ kind }) => kind);
  return options
    .filter(({ outcome }) => outcome.kind === "evaluated" && outcome.passes)
    .filter((option) => option.measures.every(({ kind }) => kinds.includes(kind)))
    .toSorted((a, b) => priceOf(a.measures) - priceOf(b.measures))[0];
}

describe("proposeOptions", () => {
  it("sizes each option to the least price: no cheaper candidate of the same kind passes", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const spaces = new Map([
          ...planOptions(node, SMALL_STOCK).map(({ key, space }) => [key, shapesOf(space)] as const),
          ...planCombinations(node, SMALL_STOCK, true).map(
            ({ key, space }) => [key, shapesOf(space())] as const,
          ),
        ]);
        for (const option of proposeOptions(node, SMALL_STOCK, priceOf)) {
          const price = priceOf(option.measures);
          const isUnsolved = option.outcome.kind === "evaluated" && !option.outcome.passes;
          const rivals = everyCandidate(spaces.get(option.key) ?? []).filter(
            (measures) => isUnsolved || priceOf(measures) < price,
          );
          for (const measures of spread(rivals)) {
            const outcome = evaluateOption(node, measures);
            expect(outcome.kind === "evaluated" && outcome.passes).toBe(false);
          }
        }
      }),
      { numRuns: 6 },
    );
  });

  it("gives the same answer twice", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const once = proposeOptions(node, SMALL_STOCK, priceOf).map(describeOption);
        expect(proposeOptions(node, SMALL_STOCK, priceOf).map(describeOption)).toEqual(once);
      }),
      { numRuns: 6 },
    );
  });

  it("proposes the same for the mirror image", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const here = proposeOptions(node, SMALL_STOCK, priceOf).map(describeOption);
        const there = proposeOptions(mirrored(node), SMALL_STOCK, priceOf).map(describeOption);
        expect(there.map(({ key, measures }) => ({ key, measures: measures.map(unturned) }))).toEqual(
          here.map(({ key, measures }) => ({ key, measures: measures.map(unturned) })),
        );
      }),
      { numRuns: 10 },
    );
  });

  it("never costs more for a laxer target, and what passed still passes", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const at = (utilisation: number) =>
          proposeOptions({ ...node, target: { utilisation, stiffness: "any" } }, SMALL_STOCK, priceOf);
        const lax = new Map(at(1).map((option) => [option.key, option]));
        for (const strict of at(0.75)) {
          if (strict.outcome.kind !== "evaluated" || !strict.outcome.passes) continue;
          // A combination of which a part is enough now is no longer offered: the part is.
          const other = lax.get(strict.key) ?? cheapestPart(strict.measures, [...lax.values()]);
          expect(other?.outcome.kind === "evaluated" && other.outcome.passes).toBe(true);
          if (lax.has(strict.key)) {
            expect(priceOf(other?.measures ?? [])).toBeLessThanOrEqual(priceOf(strict.measures));
          }
        }
      }),
      { numRuns: 10 },
    );
  });

  it("offers a combination only where it passes and no part of it does", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const combinations = new Map(
          planCombinations(node, SMALL_STOCK, true).map((plan) => [plan.key, plan]),
        );
        const options = proposeOptions(node, SMALL_STOCK, priceOf);
        const partsOf = new Map([
          ...planOptions(node, SMALL_STOCK).map(({ key, parts }) => [key, parts] as const),
          ...[...combinations].map(([key, { parts }]) => [key, parts] as const),
        ]);
        const passing = options.filter(({ outcome }) => outcome.kind === "evaluated" && outcome.passes);
        for (const { key, outcome, measures } of options) {
          const plan = combinations.get(key);
          if (!plan) continue;
          expect(outcome.kind === "evaluated" && outcome.passes).toBe(true);
          for (const other of passing) {
            if (other.key === key || other.measures.length >= measures.length) continue;
            const parts = partsOf.get(other.key) ?? [];
            expect(parts.every((part) => plan.parts.includes(part))).toBe(false);
          }
        }
      }),
      { numRuns: 10 },
    );
  });

  it("starts with the bare column, stays within 14, and says why where an option is not enough", () => {
    fc.assert(
      fc.property(anyNode, (node) => {
        const options = proposeOptions(node, SMALL_STOCK, priceOf);
        expect(options[0]).toMatchObject({ key: "bare", measures: [] });
        expect(options.length).toBeLessThanOrEqual(14);
        for (const { outcome, sizing } of options) {
          const isShort = outcome.kind === "evaluated" && !outcome.passes;
          expect(sizing !== null).toBe(isShort);
        }
      }),
      { numRuns: 10 },
    );
  });
});

function everyCandidate(shapes: readonly Shape[]): readonly (readonly MeasureCase[])[] {
  return shapes.flatMap(({ ladders, build }) =>
    ladders
      .reduce<readonly (readonly number[])[]>(
        (all, length) => all.flatMap((before) => Array.from({ length }, (_, step) => [...before, step])),
        [[]],
      )
      .map(build),
  );
}

/** All of a short list; of a long one (a web plate's heights) about eighty, dearest last and always among them. */
function spread(candidates: readonly (readonly MeasureCase[])[]): readonly (readonly MeasureCase[])[] {
  const byPrice = candidates.toSorted((a, b) => priceOf(b) - priceOf(a));
  const stride = Math.ceil(byPrice.length / 80);
  return byPrice.filter((_, index) => index % stride === 0);
}
