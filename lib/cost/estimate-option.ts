import type { MeasureCase, NodeCase } from "@/lib/calc";
import type { QuantityRecord } from "./drivers";
import type { Estimate, FabricationCase } from "./estimate";
import type { ShopPrices } from "./prices";
import { handlingPlans } from "./quantities/handling";
import { quantitiesOf } from "./quantities/quantities-of";
import type { Quantities } from "./quantities/quantities";
import { type PreparedRates, preparedRates } from "./rate-book";
import { type PricedLine, priceRecords, rollUp } from "./rollup";
import { compiledTimeTable, type CompiledTimeTable } from "./time-table";

export interface EstimateRequest {
  readonly node: NodeCase;
  readonly measures: readonly MeasureCase[];
  readonly fabrication: FabricationCase;
  readonly prices: ShopPrices;
}

interface Take {
  readonly quantities: Quantities;
  /** Records common to every way of handling the column, and those of the cheapest way. */
  readonly recordSets: readonly (readonly QuantityRecord[])[];
  readonly costMinor: number;
  readonly table: CompiledTimeTable;
  readonly rates: PreparedRates;
}

/** Takes the quantities and finds the cheapest way to handle the column. */
function take({ node, measures, fabrication, prices }: EstimateRequest): Take {
  const quantities = quantitiesOf(node, measures, fabrication);
  const table = compiledTimeTable(prices.timeTable);
  const rates = preparedRates(prices.rateBook);
  const common = priceRecords(table, rates, quantities.records, fabrication, null);
  let cheapest: { readonly cost: number; readonly records: readonly QuantityRecord[] } = {
    cost: 0,
    records: [],
  };
  for (const [index, plan] of handlingPlans(quantities, fabrication.nodesPerLift).entries()) {
    const cost = priceRecords(table, rates, plan.records, fabrication, null);
    if (index === 0 || cost < cheapest.cost) cheapest = { cost, records: plan.records };
  }
  return {
    quantities,
    recordSets: [quantities.records, cheapest.records],
    costMinor: common + cheapest.cost,
    table,
    rates,
  };
}

/**
 * Minutes, money, mass and carbon of one option: the difference from the bare node, per node of a
 * batch. Of welding upright and turning the column the cheaper is taken.
 *
 * @throws RateMissing, CarbonFactorMissing where the shop's tables lack a figure; RuleFailed where a rule gives no number.
 */
export function estimateOption(request: EstimateRequest): Estimate {
  const { quantities, recordSets, table, rates } = take(request);
  const { prices, fabrication } = request;
  const lines: PricedLine[] = [];
  for (const records of recordSets) priceRecords(table, rates, records, fabrication, lines);
  return rollUp(lines, quantities.masses, prices.rateBook, prices.carbon, fabrication.quantity);
}

/** Cost of one option per node in minor units: what `estimateOption` answers as `costMinor`, for sizing loops. */
export function priceOfOption(request: EstimateRequest): number {
  return take(request).costMinor;
}
