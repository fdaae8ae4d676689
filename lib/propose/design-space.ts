import type { MeasureCase } from "@/lib/calc/node";

/**
 * One shape of an option with sizes still open: its welds, a plate's height. `ladders` holds how many sizes each
 * may take; on a ladder a higher step is never weaker and never cheaper. A shape without ladders is complete.
 */
export interface Shape {
  readonly ladders: readonly number[];
  readonly build: (steps: readonly number[]) => readonly MeasureCase[];
}

/**
 * Everything an option may be made of. Shapes stand in no order of strength, but the first and the last of a
 * list are its extremes. A product is each shape of one list together with each of another.
 */
export type DesignSpace =
  | { readonly kind: "list"; readonly shapes: readonly Shape[] }
  | { readonly kind: "product"; readonly first: readonly Shape[]; readonly second: readonly Shape[] };

export const listSpace = (shapes: readonly Shape[]): DesignSpace => ({ kind: "list", shapes });

/** A complete list of measures as a shape. */
export const fixedShape = (measures: readonly MeasureCase[]): Shape => ({
  ladders: [],
  build: () => measures,
});

/** Two shapes made into one option; each keeps its own ladders. */
export const joinShapes = (a: Shape, b: Shape): Shape => ({
  ladders: [...a.ladders, ...b.ladders],
  build: (steps) => [...a.build(steps.slice(0, a.ladders.length)), ...b.build(steps.slice(a.ladders.length))],
});

/** Every shape of a space, products written out. */
export const shapesOf = (space: DesignSpace): readonly Shape[] =>
  space.kind === "list"
    ? space.shapes
    : space.first.flatMap((a) => space.second.map((b) => joinShapes(a, b)));

export const lowestSteps = (shape: Shape): readonly number[] => shape.ladders.map(() => 0);
export const highestSteps = (shape: Shape): readonly number[] => shape.ladders.map((length) => length - 1);

/** With every open size at its largest. */
export const buildStrongest = (shape: Shape): readonly MeasureCase[] => shape.build(highestSteps(shape));
/** With every open size at its least, below whose price the shape cannot go. */
export const buildLightest = (shape: Shape): readonly MeasureCase[] => shape.build(lowestSteps(shape));
