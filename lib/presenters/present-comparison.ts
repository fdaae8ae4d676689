import type { ComparisonRecord } from "@/lib/db/repositories/comparisons";
import type { Comparison, ComparisonDifference, OptionFigures } from "@/lib/schemas/comparison";
import type { EstimateDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { costIndexer, NO_CURRENCY } from "./cost-index";
import { pricedBy } from "./priced-by";

/** Said of an option that a designer has set aside. */
export const SET_ASIDE = "Set aside by the designer.";

/** The options set aside lose their rank and the others close up; the figures stay. */
export function rankWithout(
  options: readonly OptionDocument[],
  excluded: readonly string[],
): OptionDocument[] {
  const ranks = options
    .filter((option) => option.rank !== null && !excluded.includes(option.key))
    .map((option) => Number(option.rank))
    .sort((a, b) => a - b);
  return options.map((option) => {
    if (option.rank === null) return option;
    if (excluded.includes(option.key)) return { ...option, rank: null, notRanked: SET_ASIDE };
    return { ...option, rank: ranks.indexOf(option.rank) + 1 };
  });
}

function withoutMoney(estimate: EstimateDocument, toIndex: (cost: number) => number): EstimateDocument {
  const cost = toIndex(estimate.cost);
  return { ...estimate, cost, costForQuantity: cost, currency: NO_CURRENCY, costByCategory: {}, lines: [] };
}

const costOf = (option: OptionDocument): number[] => ("estimate" in option ? [option.estimate.cost] : []);

/** Every cost as an index, and nothing that money could be worked out from. */
export function hideMoney(options: readonly OptionDocument[]): OptionDocument[] {
  const toIndex = costIndexer(options.flatMap(costOf));
  return options.map((option) =>
    "estimate" in option ? { ...option, estimate: withoutMoney(option.estimate, toIndex) } : option,
  );
}

export interface ComparisonView {
  readonly excluded: readonly string[];
  readonly seesMoney: boolean;
  readonly outdated: readonly string[];
}

function viewOf(result: ResultDocument, view: ComparisonView): ResultDocument {
  const ranked = rankWithout(result.options, view.excluded);
  return { ...result, options: view.seesMoney ? ranked : hideMoney(ranked) };
}

export const presentComparison = (comparison: ComparisonRecord, view: ComparisonView): Comparison => ({
  id: comparison.id,
  nodeId: comparison.nodeId,
  nodeVersion: comparison.nodeVersion,
  engine: comparison.engine,
  pricedBy: pricedBy(comparison.pricesKey),
  createdAt: comparison.createdAt.toISOString(),
  createdBy: comparison.createdBy,
  outdated: [...view.outdated],
  money: view.seesMoney ? "currency" : "index",
  excluded: [...view.excluded],
  result: viewOf(comparison.result, view),
});

function figuresOf(option: OptionDocument | undefined): OptionFigures | null {
  if (option === undefined) return null;
  if ("outsideScope" in option) return { passes: false, utilisation: null, cost: null, rank: null };
  return {
    passes: option.passes,
    utilisation: option.governing.utilisation,
    cost: option.estimate.cost,
    rank: option.rank,
  };
}

const isSame = (a: OptionFigures | null, b: OptionFigures | null): boolean =>
  JSON.stringify(a) === JSON.stringify(b);

/** What came, went or moved between two results, in the order of the later one. */
export function differencesBetween(
  before: ResultDocument | null,
  after: ResultDocument,
  view: ComparisonView,
): ComparisonDifference[] {
  if (before === null) return [];
  const was = viewOf(before, view).options;
  const is = viewOf(after, view).options;
  const keys = [...new Set([...is, ...was].map((option) => option.key))];
  return keys.flatMap((key) => {
    const [old, now] = [was, is].map((options) => options.find((option) => option.key === key));
    const difference = {
      key,
      name: (now ?? old)?.name ?? key,
      before: figuresOf(old),
      after: figuresOf(now),
    };
    return isSame(difference.before, difference.after) ? [] : [difference];
  });
}
