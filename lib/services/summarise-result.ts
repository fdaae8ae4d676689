import type { BareSummary, ComparisonSummary, RankedSummary } from "@/lib/schemas/comparison";
import type { EvaluatedOptionDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";

const isRanked = (option: OptionDocument): option is EvaluatedOptionDocument & { rank: number } =>
  option.rank !== null && !("outsideScope" in option);

function summariseBare(options: readonly OptionDocument[]): BareSummary | null {
  const bare = options.find((option) => option.measures.length === 0);
  if (bare === undefined) return null;
  if ("outsideScope" in bare) return { outsideScope: bare.outsideScope.reason };
  const { utilisation, component, side, loadCase } = bare.governing;
  return { passes: bare.passes, utilisation, component, side, loadCase };
}

function summariseRanked(option: EvaluatedOptionDocument & { rank: number }): RankedSummary {
  const { key, name, rank, governing, estimate } = option;
  const { cost, currency, shopMinutes } = estimate;
  return { key, name, rank, utilisation: governing.utilisation, cost, currency, shopMinutes };
}

/** The line of the register: the bare column and every ranked option, best first. */
export function summarise(result: ResultDocument): ComparisonSummary {
  const ranked = result.options.filter(isRanked).sort((a, b) => a.rank - b.rank);
  return { bare: summariseBare(result.options), ranked: ranked.map(summariseRanked) };
}
