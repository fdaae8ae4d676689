import { evaluateOption } from "@/lib/calc";
import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { OptionOutcome } from "@/lib/calc/result";
import { Judge, type PriceOf } from "./judge";
import { planOptions } from "./option-plan";
import { Search } from "./search";
import { sizingWords } from "./sizing-words";
import type { Stock } from "./stock";

export interface ProposedOption {
  readonly key: string;
  readonly name: string;
  readonly measures: readonly MeasureCase[];
  readonly outcome: OptionOutcome;
  /** Why this is the best that stock can do, where it fails; null where it passes or is outside scope. */
  readonly sizing: string | null;
}

/**
 * Proposes every sensible way to stiffen the node, each sized from stock to the least cost that meets
 * the target in all load cases; where none does, the best it can do, with the reason.
 *
 * @param priceOf - integer minor units a node, the difference from the bare node. A thicker weld is taken
 *   to cost no less; plates, bars and columns may be priced in any order.
 * @returns at most 14 options, the bare column first; the same input gives the same answer.
 */
export function proposeOptions(node: NodeCase, stock: Stock, priceOf: PriceOf): readonly ProposedOption[] {
  const judge = new Judge(node, priceOf, evaluateOption);
  const search = new Search(judge);
  return planOptions(node, stock).flatMap(({ key, name, space }) => {
    const found = search.cheapestIn(space);
    if (found === null) return [];
    const outcome = judge.outcomeOf(found.measures);
    return [{ key, name, measures: found.measures, outcome, sizing: sizingWords(node, outcome) }];
  });
}
