import { evaluateOption, type EvaluatedOption, type MeasureCase, type NodeCase } from "@/lib/calc";
import type { Catalog } from "@/lib/catalog/catalog";
import {
  estimateOption,
  priceOfOption,
  type Estimate,
  type FabricationCase,
  type ShopPrices,
} from "@/lib/cost";
import { proposeOptions } from "@/lib/propose/propose-options";
import { rankOptions, type RankedInput } from "@/lib/ranking/rank-options";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import type { EstimateDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { ENGINE } from "./engine";
import { presentCheck, presentJoint, type StepsWanted } from "./present-outcome";
import type { DocumentError } from "./resolve-errors";
import { describeMeasures, resolveMeasures } from "./resolve-measures";
import { resolveNodeCase } from "./resolve-node-case";
import { parseNodeDocument } from "./resolve-node-document";
import { stockOf } from "./resolve-stock";

/** What a shop brings: the parts there are and what they cost. */
export interface ShopTables {
  readonly catalog: Catalog;
  readonly prices: ShopPrices;
}

export type Evaluated =
  | { readonly ok: true; readonly result: ResultDocument }
  | { readonly ok: false; readonly errors: readonly DocumentError[] };

/** An option before its working is put down: given in the document, or proposed. */
interface Candidate {
  readonly key: string;
  readonly name: string;
  readonly measures: readonly MeasureCase[];
  readonly shown: readonly MeasureInput[];
  readonly sizing: string | null;
}

/** Without fabrication data a heavier column runs over one storey and serves this node alone. */
function fabricationOf(document: NodeDocument): FabricationCase {
  const { fabrication, quantity, column } = document;
  return {
    quantity,
    liftLengthMm: fabrication?.liftLength ?? column.storeyHeight,
    nodesPerLift: fabrication?.nodesPerLift ?? 1,
    executionClass: fabrication?.executionClass ?? 2,
    coating: fabrication?.coating ?? "none",
  };
}

/** Measures are put down again as they were given, so that nothing of the document is lost. */
function givenCandidates(document: NodeDocument, catalog: Catalog): Candidate[] | null {
  return (
    document.options?.map(({ key, name, measures }, index) => {
      const resolved = resolveMeasures(measures, document, catalog, `options.${index}.measures`);
      if (!resolved.ok) throw new Error(`Option ${key} was accepted with the node and is refused now.`);
      return { key, name, measures: resolved.measures, shown: measures, sizing: null };
    }) ?? null
  );
}

function proposedCandidates(
  document: NodeDocument,
  node: NodeCase,
  shop: ShopTables,
  fabrication: FabricationCase,
): Candidate[] {
  const priceOf = (measures: readonly MeasureCase[]): number =>
    priceOfOption({ node, measures, fabrication, prices: shop.prices });
  return proposeOptions(node, stockOf(document, node, shop.catalog), priceOf).map(
    ({ key, name, measures, sizing }) => ({ key, name, measures, shown: describeMeasures(measures), sizing }),
  );
}

function presentEstimate(estimate: Estimate, minorDigits: number): EstimateDocument {
  const money = (minor: number): number => minor / 10 ** minorDigits;
  return {
    cost: money(estimate.costMinor),
    currency: estimate.currency,
    minutesByTrade: { ...estimate.minutesByTrade },
    shopMinutes: estimate.shopMinutes,
    siteMinutes: estimate.siteMinutes,
    mass: estimate.massKg,
    carbon: estimate.carbonKg,
    costForQuantity: money(estimate.costForQuantityMinor),
    costByCategory: Object.fromEntries(
      Object.entries(estimate.costByCategoryMinor).map(([category, minor]) => [category, money(minor)]),
    ),
    lines: estimate.lines.map((line) => ({
      operation: line.operation,
      category: line.category,
      trade: line.trade,
      quantity: line.quantity,
      quantityUnit: line.quantityUnit,
      minutes: line.minutes,
      cost: money(line.costMinor),
      source: line.source,
    })),
  };
}

/** Whether a check is one that the governing utilisation names. */
const governs = ({ governing }: EvaluatedOption, check: EvaluatedOption["checks"][number]): boolean =>
  check.component === governing.component &&
  check.side === governing.side &&
  check.loadCase === governing.loadCase;

interface Presented {
  readonly ranked: RankedInput;
  readonly document: OptionDocument;
}

function presentOption(
  candidate: Candidate,
  node: NodeCase,
  shop: ShopTables,
  fabrication: FabricationCase,
  steps: StepsWanted,
): Presented {
  const { key, name, measures, shown } = candidate;
  const outcome = evaluateOption(node, measures, { steps: steps !== "none" });
  const head = { key, name, measures: [...shown] };
  if (outcome.kind === "outside-scope") {
    return {
      ranked: { key, passes: false, outsideScope: true, costMinor: 0, shopMinutes: 0 },
      document: { ...head, outsideScope: { reason: outcome.reason }, rank: null, notRanked: "outside scope" },
    };
  }
  const estimate = estimateOption({ node, measures, fabrication, prices: shop.prices });
  const { governing } = outcome;
  return {
    ranked: {
      key,
      passes: outcome.passes,
      outsideScope: false,
      costMinor: estimate.costMinor,
      shopMinutes: estimate.shopMinutes,
    },
    document: {
      ...head,
      passes: outcome.passes,
      governing,
      stiffnessReached: outcome.stiffnessReached,
      connectionFailure: outcome.connectionFailure,
      sizing: candidate.sizing,
      cautions: [...outcome.cautions],
      joints: outcome.joints.map((joint) =>
        presentJoint(
          joint,
          steps === "all" ||
            (steps === "governing" && joint.side === governing.side && joint.loadCase === governing.loadCase),
        ),
      ),
      components: outcome.checks.map((check) =>
        presentCheck(check, steps === "all" || (steps === "governing" && governs(outcome, check))),
      ),
      estimate: presentEstimate(estimate, shop.prices.rateBook.minorDigits),
      rank: null,
      notRanked: null,
    },
  };
}

/**
 * The whole job on one node document: checks it, takes its options or proposes and sizes them, evaluates,
 * prices and ranks each. The API, the command line and the tests all call this.
 *
 * @param input - a node document of any origin.
 * @returns the result document, or every fault of the document with its path.
 */
export function evaluateDocument(
  input: unknown,
  shop: ShopTables,
  settings: { readonly steps: StepsWanted },
): Evaluated {
  const parsed = parseNodeDocument(input);
  if (!parsed.ok) return parsed;
  const { document } = parsed;
  const resolved = resolveNodeCase(document, shop.catalog);
  if (!resolved.ok) return resolved;
  const { node } = resolved;
  const fabrication = fabricationOf(document);
  const candidates =
    givenCandidates(document, shop.catalog) ?? proposedCandidates(document, node, shop, fabrication);
  const presented = candidates.map((candidate) =>
    presentOption(candidate, node, shop, fabrication, settings.steps),
  );
  const ranks = new Map(rankOptions(presented.map(({ ranked }) => ranked)).map((rank) => [rank.key, rank]));
  const options = presented.map(({ document: option }): OptionDocument => {
    const rank = ranks.get(option.key);
    return "outsideScope" in option || !rank
      ? option
      : { ...option, rank: rank.rank, notRanked: rank.notRanked };
  });
  return { ok: true, result: { node: document, basis: document.basis, engine: ENGINE, options } };
}
