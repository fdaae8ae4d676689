import type { LoadCase, MeasureCase, NodeCase } from "@/lib/calc/node";
import type { EvaluatedOption, OptionOutcome } from "@/lib/calc/result";

export type PriceOf = (measures: readonly MeasureCase[]) => number;
export type Evaluate = (node: NodeCase, measures: readonly MeasureCase[]) => OptionOutcome;

/** What counts as good enough: the target itself, or the best that can be reached where nothing meets it. */
export type Goal = { readonly kind: "target" } | { readonly kind: "utilisation"; readonly atMost: number };

/**
 * Evaluates and prices candidates of one node, each at most once.
 *
 * Searching looks only at the load cases that have decided so far (the watched ones), at a fraction of
 * the work; what the search ends on is confirmed in every case, and a case that refuses it is watched from
 * then on. The cheapest candidate of fewer demands that meets all demands is the cheapest of all, so
 * nothing is lost by it.
 */
export class Judge {
  private readonly outcomes = new Map<string, OptionOutcome>();
  private readonly prices = new Map<string, number>();
  private watched: NodeCase;

  constructor(
    private readonly node: NodeCase,
    private readonly price: PriceOf,
    private readonly evaluate: Evaluate,
  ) {
    this.watched = { ...node, loadCases: heaviestCase(node.loadCases) };
  }

  /** Utilisation that no component may exceed. */
  get targetUtilisation(): number {
    return this.node.target.utilisation;
  }

  /** Integer minor units a node. */
  priceOf(measures: readonly MeasureCase[]): number {
    const key = JSON.stringify(measures);
    const known = this.prices.get(key);
    if (known !== undefined) return known;
    const price = this.price(measures);
    this.prices.set(key, price);
    return price;
  }

  /** The full outcome, in every load case. */
  outcomeOf(measures: readonly MeasureCase[]): OptionOutcome {
    return this.remember(this.node, measures);
  }

  /** Largest utilisation in the watched load cases; null where the candidate is outside scope. */
  watchedUtilisation(measures: readonly MeasureCase[]): number | null {
    const outcome = this.remember(this.watched, measures);
    return outcome.kind === "evaluated" ? outcome.utilisation : null;
  }

  /**
   * May a smaller or middling size of the candidate do in the watched load cases? Not where the strongest is too weak: only
   * detailing can be better with less.
   */
  mayDo(measures: readonly MeasureCase[]): boolean {
    const outcome = this.remember(this.watched, measures);
    if (outcome.kind !== "evaluated" || outcome.passes) return true;
    return (
      outcome.stiffnessReached &&
      outcome.checks.every(
        ({ component, utilisation }) => component === "detailing" || utilisation <= this.targetUtilisation,
      )
    );
  }

  /** Is the candidate good enough in the watched load cases? */
  meets(measures: readonly MeasureCase[], goal: Goal): boolean {
    return reaches(this.remember(this.watched, measures), goal);
  }

  /** Is it good enough in every load case? Where it is not, the case that refuses it is watched from now on. */
  confirms(measures: readonly MeasureCase[], goal: Goal): boolean {
    const outcome = this.outcomeOf(measures);
    if (reaches(outcome, goal)) return true;
    const refusing =
      outcome.kind === "evaluated"
        ? this.node.loadCases.filter(({ name }) => name === severestCase(outcome, this.targetUtilisation))
        : this.node.loadCases.filter((one) => this.isOutsideScopeIn(one, measures)).slice(0, 1);
    this.watch(refusing);
    return false;
  }

  private isOutsideScopeIn(loadCase: LoadCase, measures: readonly MeasureCase[]): boolean {
    return this.remember({ ...this.node, loadCases: [loadCase] }, measures).kind === "outside-scope";
  }

  /** Adds load cases to the watched ones; where that adds none, all are watched, so that a search ends. */
  private watch(loadCases: readonly LoadCase[]): void {
    const before = this.watched.loadCases;
    const added = loadCases.filter((loadCase) => !before.includes(loadCase));
    const now = added.length > 0 ? [...before, ...added] : this.node.loadCases;
    this.watched = now.length >= this.node.loadCases.length ? this.node : { ...this.node, loadCases: now };
  }

  private remember(node: NodeCase, measures: readonly MeasureCase[]): OptionOutcome {
    const key = `${node.loadCases.map(({ name }) => name).join("|")}#${JSON.stringify(measures)}`;
    const known = this.outcomes.get(key);
    if (known !== undefined) return known;
    const outcome = this.evaluate(node, measures);
    this.outcomes.set(key, outcome);
    return outcome;
  }
}

/** The load case with the largest moment on either side: the likeliest to decide. */
function heaviestCase(loadCases: readonly LoadCase[]): readonly LoadCase[] {
  const moment = ({ left, right }: LoadCase): number =>
    Math.max(Math.abs(left?.momentNmm ?? 0), Math.abs(right?.momentNmm ?? 0));
  const [first, ...others] = loadCases;
  return first === undefined ? [] : [others.reduce((a, b) => (moment(b) > moment(a) ? b : a), first)];
}

function reaches(outcome: OptionOutcome, goal: Goal): boolean {
  if (outcome.kind !== "evaluated") return false;
  return goal.kind === "target" ? outcome.passes : outcome.utilisation <= goal.atMost;
}

/** The load case in which the option is worst: over-utilised, else softest where it is not stiff enough. */
function severestCase(outcome: EvaluatedOption, target: number): string {
  if (outcome.utilisation > target || outcome.stiffnessReached) return outcome.governing.loadCase;
  const softest = outcome.joints.reduce((a, b) =>
    b.initialStiffnessNmmPerRad < a.initialStiffnessNmmPerRad ? b : a,
  );
  return softest.loadCase;
}
