/** What an option may be judged by beside its cost, and which way is better. */
export const CRITERIA = ["cost", "shop-time", "site-time", "reserve", "stiffness", "mass", "carbon"] as const;
export type Criterion = (typeof CRITERIA)[number];

const BETTER: Readonly<Record<Criterion, "less" | "more">> = {
  cost: "less",
  "shop-time": "less",
  "site-time": "less",
  reserve: "more",
  stiffness: "more",
  mass: "less",
  carbon: "less",
};

/** One option's value of each criterion. Any one unit a criterion, the same for all options. */
export interface Judged {
  readonly key: string;
  readonly values: Readonly<Record<Criterion, number>>;
}

/** Positive where `a` is better than `b`. */
const advantage = (criterion: Criterion, a: Judged, b: Judged): number =>
  BETTER[criterion] === "less"
    ? b.values[criterion] - a.values[criterion]
    : a.values[criterion] - b.values[criterion];

/** At least as good in every criterion and better in one. */
function dominates(a: Judged, b: Judged, criteria: readonly Criterion[]): boolean {
  const advantages = criteria.map((criterion) => advantage(criterion, a, b));
  return advantages.every((value) => value >= 0) && advantages.some((value) => value > 0);
}

/**
 * The Pareto front: keys of the options that no other option beats in one of the criteria without
 * losing in another. Options equal in all criteria stay in together.
 */
export function paretoFront(options: readonly Judged[], criteria: readonly Criterion[]): readonly string[] {
  return options
    .filter((option) => !options.some((other) => dominates(other, option, criteria)))
    .map((option) => option.key);
}

export type Weights = Readonly<Partial<Record<Criterion, number>>>;

/**
 * Scores options by weighted criteria: 1 = best of the set in everything weighed, 0 = worst in everything.
 * Each criterion is stretched over the range the options span; a criterion in which all are equal
 * tells nothing and counts 1 for each.
 *
 * @param weights - not negative; left out = 0; at least one must be above 0.
 * @throws RangeError on a negative or unusable weight, or where no weight is above 0.
 */
export function scoreOptions(
  options: readonly Judged[],
  weights: Weights,
): readonly { readonly key: string; readonly score: number }[] {
  const weighed = CRITERIA.map((criterion) => ({ criterion, weight: weights[criterion] ?? 0 }));
  if (weighed.some(({ weight }) => !(weight >= 0 && Number.isFinite(weight)))) {
    throw new RangeError("A weight must be zero or more.");
  }
  const total = weighed.reduce((sum, { weight }) => sum + weight, 0);
  if (total === 0) throw new RangeError("Give at least one criterion a weight above zero.");
  const shares = weighed
    .filter(({ weight }) => weight > 0)
    .map(({ criterion, weight }) => ({ weight, share: shareOfRange(options, criterion) }));
  return options.map((option) => ({
    key: option.key,
    score: shares.reduce((sum, { weight, share }) => sum + (weight / total) * share(option), 0),
  }));
}

function shareOfRange(options: readonly Judged[], criterion: Criterion): (option: Judged) => number {
  const values = options.map((option) => option.values[criterion]);
  const low = Math.min(...values);
  const range = Math.max(...values) - low;
  if (range === 0) return () => 1;
  return (option) => {
    const share = (option.values[criterion] - low) / range;
    return BETTER[criterion] === "less" ? 1 - share : share;
  };
}
