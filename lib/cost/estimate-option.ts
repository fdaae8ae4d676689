import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { Estimate, FabricationCase } from "./estimate";
import type { ShopPrices } from "./prices";
import { handlingPlans } from "./quantities/handling";
import { quantitiesOf } from "./quantities/quantities-of";
import type { Quantities } from "./quantities/quantities";
import { costOfLines, type PricedLine, priceRecords, rollUp } from "./rollup";
import { compiledTimeTable } from "./time-table";

export interface EstimateRequest {
  readonly node: NodeCase;
  readonly measures: readonly MeasureCase[];
  readonly fabrication: FabricationCase;
  readonly prices: ShopPrices;
}

function priced({ node, measures, fabrication, prices }: EstimateRequest): { quantities: Quantities; lines: readonly PricedLine[] } {
  const quantities = quantitiesOf(node, measures, fabrication);
  const table = compiledTimeTable(prices.timeTable);
  const lines = priceRecords(table, prices.rateBook, quantities.records, fabrication);
  let cheapest: { readonly cost: number; readonly lines: readonly PricedLine[] } | null = null;
  for (const plan of handlingPlans(quantities, fabrication.nodesPerLift)) {
    const welding = priceRecords(table, prices.rateBook, plan.records, fabrication);
    const cost = costOfLines(welding);
    if (cheapest === null || cost < cheapest.cost) cheapest = { cost, lines: welding };
  }
  return { quantities, lines: cheapest === null ? lines : [...lines, ...cheapest.lines] };
}

/**
 * Minutes, money, mass and carbon of one option: the difference from the bare node, per node of a
 * batch. Of welding upright and turning the column the cheaper is taken.
 *
 * @throws RateMissing, CarbonFactorMissing where the shop's tables lack a figure; RuleFailed where a rule gives no number.
 */
export function estimateOption(request: EstimateRequest): Estimate {
  const { quantities, lines } = priced(request);
  const { prices, fabrication } = request;
  return rollUp(lines, quantities.masses, prices.rateBook, prices.carbon, fabrication.quantity);
}

/** Cost of one option per node in minor units: what `estimateOption` answers as `costMinor`, for sizing loops. */
export function priceOfOption(request: EstimateRequest): number {
  return costOfLines(priced(request).lines);
}
