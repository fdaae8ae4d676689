import { evaluateOption } from "@/lib/calc";
import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { OptionOutcome } from "@/lib/calc/result";
import { asksForDiagonals, planCombinations, spaceOf } from "./combination-plan";
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

/** Most options that a comparison shows. */
const MOST_SHOWN = 14;

interface Sized extends ProposedOption {
  readonly parts: readonly string[];
}

const isPassing = ({ outcome }: ProposedOption): boolean => outcome.kind === "evaluated" && outcome.passes;

/** The single kinds, each at its cheapest or at the best that stock can do. */
function sizedSingles(node: NodeCase, stock: Stock, judge: Judge, search: Search): Sized[] {
  return planOptions(node, stock).flatMap(({ key, name, parts, space }) => {
    const found = search.cheapestIn(space);
    if (found === null) return [];
    const outcome = judge.outcomeOf(found.measures);
    return [{ key, name, parts, measures: found.measures, outcome, sizing: sizingWords(node, outcome) }];
  });
}

/**
 * Combinations that pass where no part of them does by itself. Where the connection itself fails none is looked for:
 * no stiffening of the column cures that.
 */
function sizedCombinations(
  node: NodeCase,
  stock: Stock,
  judge: Judge,
  search: Search,
  singles: readonly Sized[],
): Sized[] {
  const bare = judge.outcomeOf([]);
  if (bare.kind === "evaluated" && (bare.passes || bare.connectionFailure !== null)) return [];
  const passing = singles.filter(isPassing);
  const found: Sized[] = [];
  for (const plan of planCombinations(node, stock, asksForDiagonals(bare, node.target.utilisation))) {
    const isPartEnough = [...passing, ...found].some(({ parts }) =>
      parts.every((part) => plan.parts.includes(part)),
    );
    const space = isPartEnough ? null : spaceOf(plan);
    const measures = space && search.cheapestCombination(space);
    if (!measures) continue;
    const { key, name, parts } = plan;
    found.push({ key, name, parts, measures, outcome: judge.outcomeOf(measures), sizing: null });
  }
  return found;
}

/** The bare column, what passes from the cheapest up, what nearly does, what is outside scope: the first that fit. */
function shown(options: readonly Sized[], priceOf: PriceOf): readonly Sized[] {
  if (options.length <= MOST_SHOWN) return options;
  const rankOf = ({ measures, outcome }: Sized): readonly [number, number] => {
    if (measures.length === 0) return [0, 0];
    if (outcome.kind === "outside-scope") return [3, 0];
    return outcome.passes ? [1, priceOf(measures)] : [2, outcome.utilisation];
  };
  const kept = options
    .map((option, index) => ({ index, rank: rankOf(option) }))
    .sort((a, b) => a.rank[0] - b.rank[0] || a.rank[1] - b.rank[1] || a.index - b.index)
    .slice(0, MOST_SHOWN)
    .map(({ index }) => index);
  return options.filter((_, index) => kept.includes(index));
}

/**
 * Proposes every sensible way to stiffen the node, each sized from stock to the least cost that meets
 * the target in all load cases; where none does, the best it can do, with the reason. Combinations stand among them
 * where they pass and no part of them does by itself.
 *
 * @param priceOf - integer minor units a node, the difference from the bare node. A thicker weld or a longer
 *   plate is taken to cost no less; plates, bars and columns may be priced in any order.
 * @returns at most 14 options, the bare column first; the same input gives the same answer.
 */
export function proposeOptions(node: NodeCase, stock: Stock, priceOf: PriceOf): readonly ProposedOption[] {
  const judge = new Judge(node, priceOf, evaluateOption);
  const search = new Search(judge);
  const singles = sizedSingles(node, stock, judge, search);
  const all = [...singles, ...sizedCombinations(node, stock, judge, search, singles)];
  return shown(all, (measures) => judge.priceOf(measures)).map(
    ({ key, name, measures, outcome, sizing }) => ({ key, name, measures, outcome, sizing }),
  );
}
