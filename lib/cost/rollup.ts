/** From quantities to lines of money and minutes, and from lines to an estimate. */
import type { DriverName, QuantityRecord } from "./drivers";
import {
  COST_CATEGORIES,
  type CostCategory,
  type Estimate,
  type EstimateLine,
  type FabricationCase,
} from "./estimate";
import { costMinor } from "./money";
import type { CarbonTable, RateBook, RuleUse } from "./prices";
import { PRODUCTS, type ProductMasses } from "./products";
import { type PreparedRates, rateIn } from "./rate-book";
import { type NumberOf, RuleFailed } from "./rules";
import { type CompiledRule, type CompiledTimeTable, type CompiledUse, slotsOf } from "./time-table";

/** A line with the minutes that an estimate keeps apart and a line does not show. */
export interface PricedLine {
  readonly line: EstimateLine;
  /** Clock time at the work centre, set-up shared over the batch. */
  readonly elapsedMinutes: number;
  /** Hands on the work, without set-up. */
  readonly touchMinutes: number;
}

interface ScopedRecord {
  readonly group: string;
  readonly scope: (number | string)[];
}

/** Takes the lines as they are priced; null where only the sum is wanted. */
type LineSink = PricedLine[] | null;

/** What one rule is priced with. */
interface Pricing {
  readonly compiled: CompiledRule;
  readonly records: readonly ScopedRecord[];
  readonly rates: PreparedRates;
  readonly batch: number;
  readonly sink: LineSink;
}

function finite(value: number, compiled: CompiledRule): number {
  if (!Number.isFinite(value))
    throw new RuleFailed(compiled.rule.key, "the quantities divide by nothing or go beyond all bounds");
  return value;
}

interface RuleMinutes {
  readonly run: number;
  /** Of the whole batch. */
  readonly setUp: number;
  readonly machine: number;
}

/** Applies a rule's times to every record of its driver. */
function minutesOf({ compiled, records }: Pricing): RuleMinutes {
  let run = 0;
  let setUp = 0;
  let machine = 0;
  let groups: Set<string> | null = null;
  for (const { group, scope } of records) {
    const minutes = compiled.run === null ? 0 : compiled.run(scope);
    if (compiled.givesSlot !== null) scope[compiled.givesSlot] = minutes;
    run += minutes;
    if (compiled.machine !== null) machine += compiled.machine(scope);
    if (compiled.setUp === null || minutes === 0) continue;
    groups ??= new Set();
    if (groups.has(group)) continue;
    groups.add(group);
    setUp += compiled.setUp(scope);
  }
  finite(run + setUp + machine, compiled);
  return { run, setUp, machine };
}

/** Sum of an expression over a rule's records. */
function sumOf({ compiled, records }: Pricing, of: NumberOf): number {
  let sum = 0;
  for (const { scope } of records) sum += of(scope);
  return finite(sum, compiled);
}

type LineMoney = Pick<EstimateLine, "source" | "ruleKey" | "rateItem" | "rateAmount" | "rateUnit" | "rate">;

/** What a line's money is made of, for whoever opens it. */
function moneyOf(
  { rule }: CompiledRule,
  { book }: PreparedRates,
  source: string,
  rateItem: string,
  rateAmount: number,
): LineMoney {
  const { likely: rate, unit: rateUnit, source: rateSource } = rateIn(book, rateItem);
  return {
    source: `${source}; rate: ${rateSource}`,
    ruleKey: rule.key,
    rateItem,
    rateAmount,
    rateUnit,
    rate,
  };
}

function priceLabour(pricing: Pricing, { run, setUp }: RuleMinutes): number {
  const { compiled, rates, batch, sink } = pricing;
  const { rule, labourItem } = compiled;
  const elapsedMinutes = setUp / batch + run;
  if (rule.trade === null || elapsedMinutes === 0) return 0;
  const minutes = elapsedMinutes * rule.crew;
  const cost = costMinor(minutes, rates.likelyOf(labourItem), 60, rates.minorUnits);
  if (sink === null) return cost;
  const line: EstimateLine = {
    operation: rule.operation,
    category: rule.category,
    trade: rule.trade,
    workCentre: rule.workCentre,
    where: rule.where,
    quantity: sumOf(pricing, compiled.quantity),
    quantityUnit: rule.quantity.unit,
    minutes,
    costMinor: cost,
    ...moneyOf(compiled, rates, compiled.source, labourItem, minutes / 60),
  };
  sink.push({ line, elapsedMinutes, touchMinutes: run * rule.crew });
  return cost;
}

function priceMachine({ compiled, rates, sink }: Pricing, { machine }: RuleMinutes): number {
  const { rule, machineItem } = compiled;
  if (rule.machineMinutes === null || machine === 0) return 0;
  const cost = costMinor(machine, rates.likelyOf(machineItem), 60, rates.minorUnits);
  if (sink === null) return cost;
  const line: EstimateLine = {
    operation: `${rule.operation}: machine`,
    category: "machine",
    trade: null,
    workCentre: rule.workCentre,
    where: rule.where,
    quantity: machine,
    quantityUnit: "machine min",
    minutes: 0,
    costMinor: cost,
    ...moneyOf(compiled, rates, rule.machineMinutes.source, machineItem, machine / 60),
  };
  sink.push({ line, elapsedMinutes: 0, touchMinutes: 0 });
  return cost;
}

function priceItem({ compiled, rates, sink }: Pricing, use: RuleUse, item: string, amount: number): number {
  if (amount === 0) return 0;
  const cost = costMinor(finite(amount, compiled), rates.likelyOf(item), 1, rates.minorUnits);
  if (sink === null) return cost;
  const line: EstimateLine = {
    operation: use.label,
    category: use.category,
    trade: null,
    workCentre: null,
    where: compiled.rule.where,
    quantity: amount,
    quantityUnit: use.unit,
    minutes: 0,
    costMinor: cost,
    ...moneyOf(compiled, rates, use.quantity.source, item, amount),
  };
  sink.push({ line, elapsedMinutes: 0, touchMinutes: 0 });
  return cost;
}

/** One line per item of the rate book that the use names. */
function priceUse(pricing: Pricing, use: RuleUse, { itemOf, fixedItem, quantity }: CompiledUse): number {
  if (fixedItem !== null) return priceItem(pricing, use, fixedItem, sumOf(pricing, quantity));
  const amounts = new Map<string, number>();
  for (const { scope } of pricing.records) {
    const item = itemOf(scope);
    amounts.set(item, (amounts.get(item) ?? 0) + quantity(scope));
  }
  let sum = 0;
  for (const [item, amount] of amounts) sum += priceItem(pricing, use, item, amount);
  return sum;
}

/** Records by driver, each value in the slot its rules read it from. */
function scopedByDriver(
  records: readonly QuantityRecord[],
  fabrication: FabricationCase,
): ReadonlyMap<DriverName, ScopedRecord[]> {
  const byDriver = new Map<DriverName, ScopedRecord[]>();
  for (const record of records) {
    const scoped = { group: record.group, scope: slotsOf(record, fabrication) };
    const others = byDriver.get(record.driver);
    if (others === undefined) byDriver.set(record.driver, [scoped]);
    else others.push(scoped);
  }
  return byDriver;
}

/**
 * Prices records of quantities: (set-up / batch + run minutes) x crew x labour rate, machine minutes
 * x machine rate, and what is used x its rate. Each line is rounded half-even to minor units.
 *
 * @param sink - takes the lines; null where only their sum is wanted.
 * @returns the sum of the lines, minor units.
 * @throws RateMissing where the rate book lacks an item, RuleFailed where a rule gives no number.
 */
export function priceRecords(
  table: CompiledTimeTable,
  rates: PreparedRates,
  records: readonly QuantityRecord[],
  fabrication: FabricationCase,
  sink: LineSink,
): number {
  let sum = 0;
  for (const [driver, scoped] of scopedByDriver(records, fabrication)) {
    for (const compiled of table.rulesByDriver.get(driver) ?? []) {
      const pricing: Pricing = { compiled, records: scoped, rates, batch: fabrication.quantity, sink };
      const minutes = minutesOf(pricing);
      sum += priceLabour(pricing, minutes) + priceMachine(pricing, minutes);
      const { uses } = compiled.rule;
      for (let index = 0; index < uses.length; index += 1) {
        const use = uses[index];
        const compiledUse = compiled.uses[index];
        if (use !== undefined && compiledUse !== undefined) sum += priceUse(pricing, use, compiledUse);
      }
    }
  }
  return sum;
}

/** The carbon table has no factor for a product that an estimate needs. */
export class CarbonFactorMissing extends Error {
  override readonly name = "CarbonFactorMissing";
  constructor(
    readonly carbonTableId: string,
    readonly product: string,
  ) {
    super(`The carbon table ${carbonTableId} has no factor for "${product}".`);
  }
}

function carbonOf(masses: ProductMasses, carbon: CarbonTable): number {
  return PRODUCTS.reduce((sum, product) => {
    const massKg = masses[product];
    if (massKg === 0) return sum;
    const factor = carbon.factors[product];
    if (factor === undefined) throw new CarbonFactorMissing(carbon.id, product);
    return sum + massKg * factor.kgCo2ePerKg;
  }, 0);
}

/** Adds lines up into the estimate of one node. */
export function rollUp(
  priced: readonly PricedLine[],
  masses: ProductMasses,
  book: RateBook,
  carbon: CarbonTable,
  quantity: number,
): Estimate {
  const costByCategoryMinor = Object.fromEntries(COST_CATEGORIES.map((category) => [category, 0])) as Record<
    CostCategory,
    number
  >;
  const minutesByTrade: Record<string, number> = {};
  let [touchMinutes, crewMinutes, shopMinutes, siteMinutes] = [0, 0, 0, 0];
  for (const { line, elapsedMinutes, touchMinutes: touch } of priced) {
    costByCategoryMinor[line.category] += line.costMinor;
    if (line.trade !== null) minutesByTrade[line.trade] = (minutesByTrade[line.trade] ?? 0) + line.minutes;
    touchMinutes += touch;
    crewMinutes += line.minutes;
    if (line.where === "shop") shopMinutes += elapsedMinutes;
    if (line.where === "site") siteMinutes += line.minutes;
  }
  const total = priced.reduce((sum, { line }) => sum + line.costMinor, 0);
  return {
    currency: book.currency,
    costMinor: total,
    costForQuantityMinor: total * quantity,
    costByCategoryMinor,
    minutesByTrade,
    touchMinutes,
    crewMinutes,
    shopMinutes,
    siteMinutes,
    massKg: PRODUCTS.reduce((sum, product) => sum + masses[product], 0),
    carbonKg: carbonOf(masses, carbon),
    lines: priced.map(({ line }) => line),
  };
}
