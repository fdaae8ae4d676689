import type { MeasureCase } from "@/lib/calc/node";
import { buildStrongest, highestSteps, type Shape } from "./design-space";
import type { Goal, Judge } from "./judge";

/**
 * The cheapest sizes of one shape. Holds what earlier shapes came to, since the next one mostly comes to
 * the same: then a few evaluations prove it.
 */
export class LadderSearch {
  private readonly hints = new Map<string, readonly number[]>();
  constructor(private readonly judge: Judge) {}

  /**
   * The cheapest steps that meet the goal in the watched load cases, below a price; null where there are none.
   * Each ladder's least step is found with the others at their highest; no candidate below one of these can
   * do, so the search starts at that corner and goes up in the order of price.
   */
  cheapest(shape: Shape, goal: Goal, below: number): readonly MeasureCase[] | null {
    const kind = shape.ladders.join();
    const hint = this.hints.get(kind);
    const corner =
      (hint && this.isLeast(shape, goal, hint) ? hint : null) ?? this.cornerOf(shape, goal, hint);
    if (corner === null) return null;
    const steps = this.firstByPrice(shape, goal, corner, below);
    if (steps === null) return null;
    this.hints.set(kind, steps);
    return shape.build(steps);
  }

  /** Does one step less on any ladder fail, the others at their highest? Then nothing below these steps does. */
  private isLeast(shape: Shape, goal: Goal, steps: readonly number[]): boolean {
    const top = highestSteps(shape);
    return steps.every(
      (step, ladder) => step === 0 || !this.judge.meets(shape.build(top.with(ladder, step - 1)), goal),
    );
  }

  private cornerOf(shape: Shape, goal: Goal, hint: readonly number[] | undefined): readonly number[] | null {
    if (!this.judge.meets(buildStrongest(shape), goal)) return null;
    const top = highestSteps(shape);
    const does = (steps: readonly number[]): boolean => this.judge.meets(shape.build(steps), goal);
    return top.map((_, ladder) => leastStep(top, ladder, does, hint?.[ladder] ?? 0));
  }

  /** From a corner upwards, cheapest first. */
  private firstByPrice(
    shape: Shape,
    goal: Goal,
    corner: readonly number[],
    below: number,
  ): readonly number[] | null {
    const priced = (steps: readonly number[]) => ({ steps, price: this.judge.priceOf(shape.build(steps)) });
    const open = [priced(corner)];
    const seen = new Set([corner.join()]);
    let isReachable: boolean | null = null;
    for (let next = open.shift(); next !== undefined; next = open.shift()) {
      if (next.price >= below) return null;
      if (this.judge.meets(shape.build(next.steps), goal)) return next.steps;
      // Climbing is in vain where the largest sizes fail too.
      isReachable ??= this.judge.meets(buildStrongest(shape), goal);
      if (!isReachable) return null;
      for (const [ladder, length] of shape.ladders.entries()) {
        const steps = next.steps.with(ladder, (next.steps[ladder] ?? 0) + 1);
        if ((steps[ladder] ?? 0) >= length || seen.has(steps.join())) continue;
        seen.add(steps.join());
        open.push(priced(steps));
      }
      open.sort((a, b) => a.price - b.price);
    }
    return null;
  }
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
