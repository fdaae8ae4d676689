import type { MeasureCase } from "@/lib/calc/node";
import type { DesignSpace, Shape } from "./design-space";
import type { Goal, Judge } from "./judge";

/** Within half of the second printed digit two utilisations are the same, and the cheaper one wins. */
const SAME_UTILISATION = 0.005;

export interface Found {
  readonly measures: readonly MeasureCase[];
  /** False: nothing meets the target, this is the best that can be done. */
  readonly meetsTarget: boolean;
}

/**
 * The cheapest candidate of a space that meets the target in every load case; where none does, the one
 * of lowest utilisation, and the cheapest of those. Exact as long as a higher step of a ladder is never
 * weaker and never cheaper; shapes may be in any order of strength and price.
 *
 * @returns null where the space is empty.
 */
export function cheapestIn(space: DesignSpace, judge: Judge): Found | null {
  const first = space[0];
  if (first === undefined) return null;
  const meeting = confirmedCheapest(space, judge, () => ({ kind: "target" }));
  if (meeting !== null) return { measures: meeting, meetsTarget: true };
  const best = confirmedCheapest(space, judge, () => nearestGoal(space, judge));
  return { measures: best ?? first.build(lowest(first)), meetsTarget: false };
}

/** Searches in the watched load cases until what it finds holds in every case. */
function confirmedCheapest(
  space: DesignSpace,
  judge: Judge,
  goalNow: () => Goal | null,
): readonly MeasureCase[] | null {
  for (;;) {
    const goal = goalNow();
    const found = goal === null ? null : cheapestMeeting(space, judge, goal);
    if (goal === null || found === null || judge.confirms(found, goal)) return found;
  }
}

/** The lowest utilisation that the strongest welds of any shape reach; null where all are outside scope. */
function nearestGoal(space: DesignSpace, judge: Judge): Goal | null {
  const reached = space.flatMap((shape) => judge.watchedUtilisation(shape.build(highest(shape))) ?? []);
  if (reached.length === 0) return null;
  return {
    kind: "utilisation",
    atMost: Math.max(judge.targetUtilisation, Math.min(...reached) + SAME_UTILISATION),
  };
}

const lowest = (shape: Shape): readonly number[] => shape.ladders.map(() => 0);
const highest = (shape: Shape): readonly number[] => shape.ladders.map((length) => length - 1);

/** Shapes are taken by the price of their lightest welds, below which none of them can go. */
function cheapestMeeting(space: DesignSpace, judge: Judge, goal: Goal): readonly MeasureCase[] | null {
  const byFloor = space
    .map((shape, index) => ({ shape, index, floor: judge.priceOf(shape.build(lowest(shape))) }))
    .sort((a, b) => a.floor - b.floor || a.index - b.index);
  let best: { readonly measures: readonly MeasureCase[]; readonly price: number } | null = null;
  let hint: readonly number[] | null = null;
  for (const { shape, floor } of byFloor) {
    if (best !== null && floor >= best.price) break;
    const steps = cheapestSteps(shape, judge, goal, hint, best?.price ?? Infinity);
    if (steps === null) continue;
    hint = steps;
    const measures = shape.build(steps);
    const price = judge.priceOf(measures);
    if (best === null || price < best.price) best = { measures, price };
  }
  return best?.measures ?? null;
}

/**
 * The cheapest steps of one shape's ladders that meet the goal below a price. Each ladder's least step is
 * found with the others at their highest; no candidate below one of these can do, so the search starts
 * at that corner and goes up in the order of price.
 */
function cheapestSteps(
  shape: Shape,
  judge: Judge,
  goal: Goal,
  hint: readonly number[] | null,
  below: number,
): readonly number[] | null {
  const top = highest(shape);
  if (hint !== null && hint.length === top.length && isCheapestCorner(shape, judge, goal, hint)) return hint;
  if (!judge.meets(shape.build(top), goal)) return null;
  const corner = top.map((_, ladder) =>
    leastStep(top, ladder, (steps) => judge.meets(shape.build(steps), goal), hint?.[ladder] ?? 0),
  );
  return firstByPrice(shape, judge, goal, corner, below);
}

/** Do these steps meet the goal while one step less on any ladder does not, the others at their highest? */
function isCheapestCorner(shape: Shape, judge: Judge, goal: Goal, steps: readonly number[]): boolean {
  const top = highest(shape);
  const isLeast = steps.every(
    (step, ladder) => step === 0 || !judge.meets(shape.build(top.with(ladder, step - 1)), goal),
  );
  return isLeast && judge.meets(shape.build(steps), goal);
}

/** Least step of one ladder that does, from a first guess outwards, then by halving. */
function leastStep(
  top: readonly number[],
  ladder: number,
  does: (steps: readonly number[]) => boolean,
  guess: number,
): number {
  let doing = top[ladder] ?? 0;
  let failing = -1;
  let next = Math.min(guess, doing);
  while (doing - failing > 1) {
    if (next <= failing || next >= doing) next = Math.floor((doing + failing) / 2);
    if (does(top.with(ladder, next))) doing = next;
    else failing = next;
    next = doing === next ? next - 1 : Math.floor((doing + failing) / 2);
  }
  return doing;
}

/** From a corner upwards, cheapest first. */
function firstByPrice(
  shape: Shape,
  judge: Judge,
  goal: Goal,
  corner: readonly number[],
  below: number,
): readonly number[] | null {
  const open = [{ steps: corner, price: judge.priceOf(shape.build(corner)) }];
  const seen = new Set([corner.join()]);
  for (let next = open.shift(); next !== undefined; next = open.shift()) {
    if (next.price >= below) return null;
    if (judge.meets(shape.build(next.steps), goal)) return next.steps;
    for (const [ladder, length] of shape.ladders.entries()) {
      const step = (next.steps[ladder] ?? 0) + 1;
      const steps = next.steps.with(ladder, step);
      if (step >= length || seen.has(steps.join())) continue;
      seen.add(steps.join());
      open.push({ steps, price: judge.priceOf(shape.build(steps)) });
    }
    open.sort((a, b) => a.price - b.price);
  }
  return null;
}
