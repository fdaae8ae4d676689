import type { MeasureCase } from "@/lib/calc/node";

/**
 * One shape of an option whose welds are still open. `ladders` holds how many sizes each weld may
 * take; on a ladder a higher step is a stronger and a dearer weld. A shape without ladders is complete.
 */
export interface Shape {
  readonly ladders: readonly number[];
  readonly build: (steps: readonly number[]) => readonly MeasureCase[];
}

/** Everything an option may be made of; shapes stand in no order of strength. */
export type DesignSpace = readonly Shape[];

/** A complete list of measures as a shape. */
export const fixedShape = (measures: readonly MeasureCase[]): Shape => ({
  ladders: [],
  build: () => measures,
});

/** Each shape of one space together with each of another: an option made of both. */
export function combineSpaces(first: DesignSpace, second: DesignSpace): DesignSpace {
  return first.flatMap((a) =>
    second.map((b) => ({
      ladders: [...a.ladders, ...b.ladders],
      build: (steps: readonly number[]) => [
        ...a.build(steps.slice(0, a.ladders.length)),
        ...b.build(steps.slice(a.ladders.length)),
      ],
    })),
  );
}
