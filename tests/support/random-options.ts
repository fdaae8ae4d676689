import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { NodeDocument } from "@/lib/schemas/node-document";
import type { EvaluatedOptionDocument, OptionDocument } from "@/lib/schemas/result-document";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";

/** What the laws on random nodes share: one shop, one seed, and the options of a document. */
export const shop = { catalog: loadSeedCatalog(), prices: loadSeedPrices() };
export const SEED = 20261201;

export function optionsOf(document: NodeDocument): readonly OptionDocument[] {
  const evaluated = evaluateDocument(document, shop, { steps: "none" });
  if (!evaluated.ok) throw new Error(JSON.stringify(evaluated.errors));
  return evaluated.result.options;
}

export const isInScope = (option: OptionDocument): option is EvaluatedOptionDocument =>
  !("outsideScope" in option);

/** Resistances of one component, in the order of the checks. */
export const resistancesOf = (option: OptionDocument | undefined, component: string): number[] =>
  option && isInScope(option)
    ? option.components.filter((check) => check.component === component).map((check) => check.resistance)
    : [];
