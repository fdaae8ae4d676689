import type { EvaluatedOptionDocument, OptionDocument } from "@/lib/schemas/result-document";

const isEvaluated = (option: OptionDocument): option is EvaluatedOptionDocument =>
  !("outsideScope" in option);

/** Where an option stands before its figures are looked at. */
function bandOf(option: OptionDocument): number {
  if (option.measures.length === 0) return 0;
  if (!isEvaluated(option)) return 3;
  return option.passes ? 1 : 2;
}

/** Place among those that pass: the rank, or for one that is not ranked, behind every ranked one as cheap. */
function placeByCost(option: EvaluatedOptionDocument, ranked: readonly EvaluatedOptionDocument[]): number {
  if (option.rank !== null) return option.rank;
  return 0.5 + ranked.filter(({ estimate }) => estimate.cost <= option.estimate.cost).length;
}

/**
 * The options in the order they are read in: the bare column that the others are measured against, then
 * those that pass as they rank, then those that fail, the nearest to passing first, then those outside
 * scope. One that passes but is set aside keeps the place that its cost gives it, so that no column
 * moves away from under the hand that set it aside.
 */
export function inReadingOrder(options: readonly OptionDocument[]): OptionDocument[] {
  const ranked = options.filter(isEvaluated).filter(({ rank }) => rank !== null);
  const within = (option: OptionDocument): number => {
    if (!isEvaluated(option)) return 0;
    return option.passes ? placeByCost(option, ranked) : option.governing.utilisation;
  };
  return [...options].sort((a, b) => bandOf(a) - bandOf(b) || within(a) - within(b));
}
