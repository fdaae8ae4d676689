import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { EvaluatedOption, OptionOutcome } from "@/lib/calc/result";

export type PriceOf = (measures: readonly MeasureCase[]) => number;
export type Evaluate = (node: NodeCase, measures: readonly MeasureCase[]) => OptionOutcome;

/** What counts as good enough: the target itself, or the best that can be reached where nothing meets it. */
export type Goal = { readonly kind: "target" } | { readonly kind: "utilisation"; readonly atMost: number };

/**
 * Evaluates and prices candidates of one node, each at most once. A candidate is first held against the
 * load case that last refused one, alone: a case that fails alone fails among the others, and most
 * candidates that fail do so in the same case, at a fraction of the work.
 */
export class Judge {
  private readonly outcomes = new Map<string, OptionOutcome>();
  private readonly prices = new Map<string, number>();
  private readonly alone = new Map<string, NodeCase>();
  private readonly refused = new Set<string>();
  private severest: string | null = null;

  constructor(
    private readonly node: NodeCase,
    private readonly price: PriceOf,
    private readonly evaluate: Evaluate,
  ) {
    for (const loadCase of node.loadCases) this.alone.set(loadCase.name, { ...node, loadCases: [loadCase] });
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

  /** The full outcome in every load case. */
  outcomeOf(measures: readonly MeasureCase[]): OptionOutcome {
    const key = JSON.stringify(measures);
    const known = this.outcomes.get(key);
    if (known !== undefined) return known;
    const outcome = this.evaluate(this.node, measures);
    this.outcomes.set(key, outcome);
    if (outcome.kind === "evaluated") this.severest = severestCase(outcome, this.node.target.utilisation);
    return outcome;
  }

  /** Is the candidate good enough in every load case? */
  meets(measures: readonly MeasureCase[], goal: Goal): boolean {
    const key = `${goal.kind === "target" ? "" : goal.atMost}|${JSON.stringify(measures)}`;
    if (this.refused.has(key)) return false;
    const one = this.severest === null ? undefined : this.alone.get(this.severest);
    if (one !== undefined && this.node.loadCases.length > 1 && !reaches(this.evaluate(one, measures), goal)) {
      this.refused.add(key);
      return false;
    }
    return reaches(this.outcomeOf(measures), goal);
  }
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
