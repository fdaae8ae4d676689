import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LoadCase, MeasureCase, NodeCase } from "@/lib/calc/node";
import type { EvaluatedOption, OptionOutcome } from "@/lib/calc/result";
import { buildStrongest, fixedShape, listSpace, type Shape } from "@/lib/propose/design-space";
import { Judge } from "@/lib/propose/judge";
import { Search } from "@/lib/propose/search";

/**
 * The search is tried on made-up spaces: a shape and its weld steps are carried in a backing plate's
 * dimensions, and utilisation and price are drawn tables that obey the two laws the search relies on.
 */
interface World {
  readonly shapes: readonly {
    readonly ladders: readonly number[];
    readonly base: number;
    readonly price: number;
  }[];
  /** What a step less on any ladder adds to utilisation, by load case. */
  readonly need: readonly (readonly number[])[];
  readonly stepPrice: readonly number[];
  /** Do welds make up for one another (sum), or does the worst decide, as real welds do? */
  readonly together: "sum" | "worst";
}

const marker = (shape: number, steps: readonly number[]): readonly MeasureCase[] => [
  {
    kind: "backing-plates",
    levels: ["top"],
    thicknessMm: shape,
    widthMm: steps[0] ?? 0,
    lengthMm: steps[1] ?? 0,
    steel: { grade: "S355", yieldMpa: 355, ultimateMpa: 470, betaW: 0.9 },
  },
];

function read(measures: readonly MeasureCase[]): {
  readonly shape: number;
  readonly steps: readonly number[];
} {
  const [measure] = measures;
  if (measure?.kind !== "backing-plates") throw new Error("not a marker");
  return { shape: measure.thicknessMm, steps: [measure.widthMm, measure.lengthMm] };
}

const shapesIn = (world: World): readonly Shape[] =>
  world.shapes.map(({ ladders }, index): Shape => ({ ladders, build: (steps) => marker(index, steps) }));

function utilisationIn(world: World, measures: readonly MeasureCase[], loadCase: number): number {
  const { shape, steps } = read(measures);
  const { base, ladders } = world.shapes[shape]!;
  const needs = world.need[loadCase]!;
  const missing = steps.map(
    (step, ladder) => Math.max(0, (ladders[ladder] ?? 1) - 1 - step) * (needs[ladder] ?? 0),
  );
  const added = world.together === "sum" ? missing.reduce((sum, one) => sum + one, 0) : Math.max(...missing);
  return base + added + (needs[2] ?? 0);
}

const priceIn = (world: World, measures: readonly MeasureCase[]): number => {
  const { shape, steps } = read(measures);
  return (
    world.shapes[shape]!.price +
    steps.reduce((sum, step, ladder) => sum + step * (world.stepPrice[ladder] ?? 0), 0)
  );
};

function nodeOf(world: World): NodeCase {
  const loadCases = world.need.map((_, index) => ({ name: String(index) }) as LoadCase);
  return { loadCases, target: { utilisation: 1, stiffness: "any" } } as unknown as NodeCase;
}

function evaluateIn(world: World, counter: { calls: number }) {
  return (node: NodeCase, measures: readonly MeasureCase[]): OptionOutcome => {
    counter.calls += 1;
    const worst = node.loadCases
      .map(({ name }) => ({ loadCase: name, utilisation: utilisationIn(world, measures, Number(name)) }))
      .reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
    return {
      kind: "evaluated",
      measures,
      passes: worst.utilisation <= 1,
      utilisation: worst.utilisation,
      stiffnessReached: true,
      governing: { component: "detailing", side: "left", ...worst },
    } as unknown as EvaluatedOption;
  };
}

function everyCandidate(world: World): readonly (readonly MeasureCase[])[] {
  return shapesIn(world).flatMap((shape) => {
    const [first = 1, second = 1] = shape.ladders;
    return Array.from({ length: first }, (_, i) =>
      Array.from({ length: second }, (__, j) => shape.build([i, j])),
    ).flat();
  });
}

const anyWorld: fc.Arbitrary<World> = fc.record({
  shapes: fc.array(
    fc.record({
      ladders: fc.tuple(fc.integer({ min: 1, max: 6 }), fc.integer({ min: 1, max: 5 })),
      base: fc.integer({ min: 50, max: 130 }).map((n) => n / 100),
      price: fc.integer({ min: 0, max: 200 }),
    }),
    { minLength: 1, maxLength: 6 },
  ),
  need: fc.array(
    fc.array(
      fc.integer({ min: 0, max: 20 }).map((n) => n / 100),
      { minLength: 3, maxLength: 3 },
    ),
    { minLength: 1, maxLength: 4 },
  ),
  stepPrice: fc.tuple(fc.integer({ min: 0, max: 30 }), fc.integer({ min: 0, max: 30 })),
  together: fc.constantFrom("sum", "worst"),
});

describe("Search", () => {
  it("finds what trying every candidate finds: the cheapest that passes, else the best and cheapest of those", () => {
    fc.assert(
      fc.property(anyWorld, (world) => {
        const node = nodeOf(world);
        const judge = new Judge(
          node,
          (measures) => priceIn(world, measures),
          evaluateIn(world, { calls: 0 }),
        );
        const found = new Search(judge).cheapestIn(listSpace(shapesIn(world)))!;
        const all = everyCandidate(world).map((measures) => ({
          price: priceIn(world, measures),
          utilisation: Math.max(...world.need.map((_, index) => utilisationIn(world, measures, index))),
        }));
        const passing = all.filter(({ utilisation }) => utilisation <= 1);
        expect(found.meetsTarget).toBe(passing.length > 0);
        const lowest = Math.min(...all.map(({ utilisation }) => utilisation));
        const rivals =
          passing.length > 0
            ? passing
            : all.filter(({ utilisation }) => utilisation <= Math.max(1, lowest + 0.005));
        expect(priceIn(world, found.measures)).toBe(Math.min(...rivals.map(({ price }) => price)));
      }),
      { numRuns: 500 },
    );
  });

  it("settles two parts of an option that bear on different things as trying every pair would", () => {
    fc.assert(
      fc.property(anyWorld, anyWorld, (one, other) => {
        // Both worlds see the same load cases, each through its own part.
        const need = one.need.slice(0, Math.min(one.need.length, other.need.length));
        const worlds = [
          { ...one, need },
          { ...other, need: other.need.slice(0, need.length) },
        ] as const;
        const [a, b] = worlds;
        const worstOf = (measures: readonly MeasureCase[], loadCases: readonly number[]): number =>
          Math.max(
            ...measures.flatMap((measure, part) =>
              loadCases.map((loadCase) => utilisationIn(worlds[part]!, [measure], loadCase)),
            ),
          );
        const price = (measures: readonly MeasureCase[]): number =>
          priceIn(a, measures.slice(0, 1)) + priceIn(b, measures.slice(1));
        const evaluate = (node: NodeCase, measures: readonly MeasureCase[]): OptionOutcome => {
          const utilisation = worstOf(
            measures,
            node.loadCases.map(({ name }) => Number(name)),
          );
          const loadCase = node.loadCases.find(
            ({ name }) => worstOf(measures, [Number(name)]) === utilisation,
          )?.name;
          const governing = { component: "detailing", side: "left", loadCase, utilisation };
          return {
            kind: "evaluated",
            passes: utilisation <= 1,
            utilisation,
            stiffnessReached: true,
            governing,
          } as unknown as EvaluatedOption;
        };
        const ofOne = (shape: Shape): Shape => fixedShape(buildStrongest(shape));
        const cases = need.map((_, index) => index);
        // As bars by size and plates by thickness, each part lists its strongest last.
        const byStrength = (
          shapes: readonly Shape[],
          asPart: (measures: readonly MeasureCase[]) => readonly MeasureCase[],
        ) =>
          shapes.toSorted(
            (x, y) => worstOf(asPart(buildStrongest(y)), cases) - worstOf(asPart(buildStrongest(x)), cases),
          );
        const first = byStrength(shapesIn(a).map(ofOne), (measures) => measures);
        const second = byStrength(shapesIn(b), (measures) => [...first.at(-1)!.build([]), ...measures]);
        const pairs = first.flatMap((shape) =>
          everyCandidate(b).map((measures) => [...shape.build([]), ...measures]),
        );
        const passing = pairs.filter((measures) => worstOf(measures, cases) <= 1);
        const found = new Search(new Judge(nodeOf(a), price, evaluate)).cheapestIn({
          kind: "product",
          first,
          second,
        })!;
        expect(found.meetsTarget).toBe(passing.length > 0);
        if (passing.length > 0) expect(price(found.measures)).toBe(Math.min(...passing.map(price)));
      }),
      { numRuns: 300 },
    );
  });

  it("tries a small part of a large space", () => {
    const shapes = Array.from({ length: 10 }, (_, index) => ({
      ladders: [8, 8],
      base: 0.9 - index / 100,
      price: 100 + index,
    }));
    const world: World = {
      shapes,
      need: [
        [0.02, 0.01, 0],
        [0.03, 0.02, 0],
      ],
      stepPrice: [5, 3],
      together: "worst",
    };
    const counter = { calls: 0 };
    const judge = new Judge(
      nodeOf(world),
      (measures) => priceIn(world, measures),
      evaluateIn(world, counter),
    );
    new Search(judge).cheapestIn(listSpace(shapesIn(world)));
    expect(counter.calls).toBeLessThan(everyCandidate(world).length / 4);
  });

  it("has no answer for an empty space", () => {
    const world: World = { shapes: [], need: [[0, 0, 0]], stepPrice: [0, 0], together: "sum" };
    expect(
      new Search(new Judge(nodeOf(world), () => 0, evaluateIn(world, { calls: 0 }))).cheapestIn(
        listSpace([]),
      ),
    ).toBeNull();
  });
});
