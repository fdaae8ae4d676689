import type { OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { formatMoney, moneyUnit } from "@/components/ui/format-number";
import { isEvaluated } from "./comparison-cells";

export interface RankWords {
  /** The rank as a figure; null where the option is not ranked. */
  readonly figure: string | null;
  /** "cheapest", "+84 EUR", or "not ranked: fails". */
  readonly words: string;
  readonly isBest: boolean;
}

/** The cost of the cheapest option that is ranked. */
function cheapestCost(result: ResultDocument): number | null {
  const costs = result.options.flatMap((option) =>
    isEvaluated(option) && option.rank === 1 ? [option.estimate.cost] : [],
  );
  return costs[0] ?? null;
}

/** What the head of a column says of its option's rank. Money is the difference from the cheapest, per node. */
export function rankWords(option: OptionDocument, result: ResultDocument): RankWords {
  if (!isEvaluated(option) || option.rank === null) {
    return { figure: null, words: `not ranked: ${option.notRanked ?? "no reason given"}`, isBest: false };
  }
  if (option.rank === 1) return { figure: "1", words: "cheapest", isBest: true };
  const more = option.estimate.cost - (cheapestCost(result) ?? option.estimate.cost);
  return {
    figure: String(option.rank),
    words: `+${formatMoney(more)} ${moneyUnit(option.estimate.currency)}`,
    isBest: false,
  };
}

/** The letter in the bubble: A to Z, then AA. It follows the place of the column, not the key. */
export function columnLetter(index: number): string {
  const letter = String.fromCharCode(65 + (index % 26));
  return index < 26 ? letter : columnLetter(Math.floor(index / 26) - 1) + letter;
}
