import type { MeasureCase } from "@/lib/calc/node";
import {
  buildLightest,
  buildStrongest,
  joinShapes,
  shapesOf,
  type DesignSpace,
  type Shape,
} from "./design-space";
import type { Goal, Judge } from "./judge";
import { LadderSearch } from "./ladder-search";

/** Within half of the second printed digit two utilisations are the same, and the cheaper one wins. */
const SAME_UTILISATION = 0.005;

type Product = Extract<DesignSpace, { kind: "product" }>;

export interface Found {
  readonly measures: readonly MeasureCase[];
  /** False: nothing meets the target, this is the best that can be done. */
  readonly meetsTarget: boolean;
}

/** Looks for the cheapest candidate of one space after another on the same node. */
export class Search {
  private readonly ladders: LadderSearch;
  constructor(private readonly judge: Judge) {
    this.ladders = new LadderSearch(judge);
  }

  /**
   * The cheapest candidate of a space that meets the target in every load case; where none does, the one
   * of lowest utilisation, and the cheapest of those. Exact as long as a higher step of a ladder is never
   * weaker and never cheaper; shapes may be in any order of strength and price.
   *
   * @returns null where the space is empty.
   */
  cheapestIn(space: DesignSpace): Found | null {
    const [first] = space.kind === "list" ? space.shapes : shapesOf(space);
    if (first === undefined) return null;
    const meeting = this.cheapestMeeting(space);
    if (meeting !== null) return { measures: meeting, meetsTarget: true };
    const best = this.confirmed(space, () => this.nearestGoal(space));
    return { measures: best ?? buildLightest(first), meetsTarget: false };
  }

  /** The cheapest candidate that meets the target in every load case; null where none does. */
  cheapestMeeting(space: DesignSpace): readonly MeasureCase[] | null {
    return this.confirmed(space, () => ({ kind: "target" }));
  }

  /** The same for a combination, which is not searched where the extremes of its parts are all too weak. */
  cheapestCombination(space: DesignSpace): readonly MeasureCase[] | null {
    const extremes =
      space.kind === "list"
        ? extremesOf(space.shapes)
        : extremesOf(space.first).flatMap((a) => extremesOf(space.second).map((b) => joinShapes(a, b)));
    return extremes.some((shape) => this.judge.mayDo(buildStrongest(shape)))
      ? this.cheapestMeeting(space)
      : null;
  }

  /** Searches in the watched load cases until what it finds holds in every case. */
  private confirmed(space: DesignSpace, goalNow: () => Goal | null): readonly MeasureCase[] | null {
    for (;;) {
      const goal = goalNow();
      const found = goal === null ? null : this.inSpace(space, goal);
      if (goal === null || found === null || this.judge.confirms(found, goal)) return found;
    }
  }

  /** The lowest utilisation that any shape reaches at its largest sizes; null where all are outside scope. */
  private nearestGoal(space: DesignSpace): Goal | null {
    const shapes = space.kind === "list" ? space.shapes : this.nearestOfProduct(space);
    const reached = shapes.flatMap((shape) => this.judge.watchedUtilisation(buildStrongest(shape)) ?? []);
    if (reached.length === 0) return null;
    return {
      kind: "utilisation",
      atMost: Math.max(this.judge.targetUtilisation, Math.min(...reached) + SAME_UTILISATION),
    };
  }

  /** Each of the first with the extremes of the second, then each of the second with the best of these. */
  private nearestOfProduct({ first, second }: Product): readonly Shape[] {
    const utilisation = (shape: Shape): number =>
      this.judge.watchedUtilisation(buildStrongest(shape)) ?? Infinity;
    const tried = first.flatMap((a) =>
      extremesOf(second).map((b) => ({ a, shape: joinShapes(a, b), reached: utilisation(joinShapes(a, b)) })),
    );
    const best = tried.reduce((one, other) => (other.reached < one.reached ? other : one));
    return [best.shape, ...second.map((b) => joinShapes(best.a, b))];
  }

  private inSpace(space: DesignSpace, goal: Goal): readonly MeasureCase[] | null {
    return space.kind === "list" ? this.inList(space.shapes, goal) : this.inProduct(space, goal);
  }

  /** Shapes are taken by the price of their least sizes, below which none of them can go. */
  private inList(shapes: readonly Shape[], goal: Goal): readonly MeasureCase[] | null {
    const byFloor = shapes
      .map((shape, index) => ({ shape, index, floor: this.judge.priceOf(buildLightest(shape)) }))
      .sort((a, b) => a.floor - b.floor || a.index - b.index);
    let best: { readonly measures: readonly MeasureCase[]; readonly price: number } | null = null;
    for (const { shape, floor } of byFloor) {
      if (best !== null && floor >= best.price) break;
      const measures = this.ladders.cheapest(shape, goal, best?.price ?? Infinity);
      if (measures !== null) best = { measures, price: this.judge.priceOf(measures) };
    }
    return best?.measures ?? null;
  }

  /**
   * The two parts of a product hardly depend on one another, so each is settled by itself: the cheapest of the
   * first that does with an extreme of the second, then the second beside it. What comes out is the
   * cheapest if the strongest of the first would not do with a cheaper second; else everything is tried.
   */
  private inProduct({ first, second }: Product, goal: Goal): readonly MeasureCase[] | null {
    const able = first.filter((a) =>
      extremesOf(second).some((b) => this.judge.meets(buildStrongest(joinShapes(a, b)), goal)),
    );
    const strongest = able.at(-1);
    if (strongest === undefined) return null;
    const priceOf = (a: Shape): number =>
      Math.min(...extremesOf(second).map((b) => this.judge.priceOf(buildLightest(joinShapes(a, b)))));
    const cheapest = able.reduce((a, b) => (priceOf(b) < priceOf(a) ? b : a));
    const beside = (a: Shape): readonly MeasureCase[] | null =>
      this.inList(
        second.map((b) => joinShapes(a, b)),
        goal,
      );
    const found = beside(cheapest);
    const bound = strongest === cheapest ? found : beside(strongest);
    if (found !== null && bound !== null) {
      const ownCount = buildLightest(cheapest).length;
      const least = [...found.slice(0, ownCount), ...bound.slice(ownCount)];
      if (this.judge.priceOf(found) <= this.judge.priceOf(least)) return found;
    }
    return this.inList(shapesOf({ kind: "product", first: able, second }), goal);
  }
}

/** Weakest and strongest of a list: where either does, the part beside it is not at fault. */
function extremesOf(shapes: readonly Shape[]): readonly Shape[] {
  const last = shapes.at(-1);
  const [first] = shapes;
  return last === undefined || first === undefined ? [] : first === last ? [last] : [last, first];
}
