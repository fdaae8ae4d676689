/** From quantities to lines of money and minutes, and from lines to an estimate. */
import type { QuantityRecord } from "./drivers";
import { COST_CATEGORIES, type CostCategory, type Estimate, type EstimateLine, type FabricationCase } from "./estimate";
import { costMinor } from "./money";
import type { CarbonTable, RateBook, RuleUse } from "./prices";
import { PRODUCTS, type ProductMasses } from "./products";
import { rateIn } from "./rate-book";
import { RuleFailed } from "./rules";
import type { CompiledRule, CompiledTimeTable, CompiledUse } from "./time-table";

/** A line with the minutes that an estimate keeps apart and a line does not show. */
export interface PricedLine {
  readonly line: EstimateLine;
  /** Clock time at the work centre, set-up shared over the batch. */
  readonly elapsedMinutes: number;
  /** Hands on the work, without set-up. */
  readonly touchMinutes: number;
}

type MutableScope = Record<string, number | string>;
interface ScopedRecord {
  readonly group: string;
  readonly scope: MutableScope;
}

const NO_MINUTES = { minutes: 0, elapsedMinutes: 0, touchMinutes: 0 };

function finite(value: number, rule: CompiledRule): number {
  if (!Number.isFinite(value)) throw new RuleFailed(rule.rule.key, "the quantities divide by nothing or go beyond all bounds");
  return value;
}

interface Ruled {
  readonly quantity: number;
  readonly run: number;
  readonly setUp: number;
  readonly machine: number;
}

/** Applies one rule to every record of its driver. */
function apply(compiled: CompiledRule, records: readonly ScopedRecord[]): Ruled {
  const { rule } = compiled;
  let [quantity, run, setUp, machine] = [0, 0, 0, 0];
  const groups = new Set<string>();
  for (const { group, scope } of records) {
    const minutes = compiled.run === null ? 0 : finite(compiled.run(scope), compiled);
    if (rule.gives !== null) scope[rule.gives] = minutes;
    run += minutes;
    quantity += compiled.quantity(scope);
    if (compiled.machine !== null) machine += finite(compiled.machine(scope), compiled);
    if (compiled.setUp !== null && minutes !== 0 && !groups.has(group)) {
      groups.add(group);
      setUp += finite(compiled.setUp(scope), compiled);
    }
  }
  return { quantity: finite(quantity, compiled), run, setUp, machine };
}

function labourLine(compiled: CompiledRule, ruled: Ruled, book: RateBook, batch: number): PricedLine[] {
  const { rule } = compiled;
  const elapsedMinutes = ruled.setUp / batch + ruled.run;
  if (rule.trade === null || elapsedMinutes === 0) return [];
  const minutes = elapsedMinutes * rule.crew;
  const rate = rateIn(book, `labour:${rule.trade}`);
  const line: EstimateLine = {
    operation: rule.operation,
    category: rule.category,
    trade: rule.trade,
    workCentre: rule.workCentre,
    where: rule.where,
    quantity: ruled.quantity,
    quantityUnit: rule.quantity.unit,
    minutes,
    costMinor: costMinor(minutes, rate.likely, 60, book.minorDigits),
    source: `${compiled.source}; rate: ${rate.source}`,
  };
  return [{ line, elapsedMinutes, touchMinutes: ruled.run * rule.crew }];
}

function machineLine(compiled: CompiledRule, ruled: Ruled, book: RateBook): PricedLine[] {
  const { rule } = compiled;
  if (rule.workCentre === null || rule.machineMinutes === null || ruled.machine === 0) return [];
  const rate = rateIn(book, `machine:${rule.workCentre}`);
  const line: EstimateLine = {
    operation: `${rule.operation}: machine`,
    category: "machine",
    trade: null,
    workCentre: rule.workCentre,
    where: rule.where,
    quantity: ruled.machine,
    quantityUnit: "machine min",
    minutes: 0,
    costMinor: costMinor(ruled.machine, rate.likely, 60, book.minorDigits),
    source: `${rule.machineMinutes.source}; rate: ${rate.source}`,
  };
  return [{ ...NO_MINUTES, line }];
}

/** One line per item of the rate book that the use names. */
function useLines(compiled: CompiledRule, use: RuleUse, compiledUse: CompiledUse, records: readonly ScopedRecord[], book: RateBook): PricedLine[] {
  const amounts = new Map<string, number>();
  for (const { scope } of records) {
    const amount = finite(compiledUse.quantity(scope), compiled);
    if (amount === 0) continue;
    const item = compiledUse.itemOf(scope);
    amounts.set(item, (amounts.get(item) ?? 0) + amount);
  }
  return [...amounts].map(([item, amount]) => {
    const rate = rateIn(book, item);
    const line: EstimateLine = {
      operation: use.label,
      category: use.category,
      trade: null,
      workCentre: null,
      where: compiled.rule.where,
      quantity: amount,
      quantityUnit: use.unit,
      minutes: 0,
      costMinor: costMinor(amount, rate.likely, 1, book.minorDigits),
      source: `${use.quantity.source}; rate: ${rate.source}`,
    };
    return { ...NO_MINUTES, line };
  });
}

/**
 * Prices records of quantities: (set-up / batch + run minutes) x crew x labour rate, machine minutes
 * x machine rate, and what is used x its rate. Each line is rounded half-even to minor units.
 *
 * @throws RateMissing where the rate book lacks an item, RuleFailed where a rule gives no number.
 */
export function priceRecords(table: CompiledTimeTable, book: RateBook, records: readonly QuantityRecord[], fabrication: FabricationCase): PricedLine[] {
  const byDriver = new Map<string, ScopedRecord[]>();
  for (const { driver, group, values } of records) {
    const scope: MutableScope = {
      ...values,
      batch: fabrication.quantity,
      nodesPerLift: fabrication.nodesPerLift,
      executionClass: fabrication.executionClass,
      coating: fabrication.coating,
    };
    const others = byDriver.get(driver);
    if (others === undefined) byDriver.set(driver, [{ group, scope }]);
    else others.push({ group, scope });
  }
  const lines: PricedLine[] = [];
  for (const compiled of table.rules) {
    const scoped = byDriver.get(compiled.rule.driver);
    if (scoped === undefined) continue;
    const ruled = apply(compiled, scoped);
    lines.push(...labourLine(compiled, ruled, book, fabrication.quantity), ...machineLine(compiled, ruled, book));
    compiled.rule.uses.forEach((use, index) => {
      const compiledUse = compiled.uses[index];
      if (compiledUse !== undefined) lines.push(...useLines(compiled, use, compiledUse, scoped, book));
    });
  }
  return lines;
}

/** Sum of the lines' money, minor units. */
export const costOfLines = (lines: readonly PricedLine[]): number => lines.reduce((sum, { line }) => sum + line.costMinor, 0);

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
export function rollUp(priced: readonly PricedLine[], masses: ProductMasses, book: RateBook, carbon: CarbonTable, quantity: number): Estimate {
  const costByCategoryMinor = Object.fromEntries(COST_CATEGORIES.map((category) => [category, 0])) as Record<CostCategory, number>;
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
  const total = costOfLines(priced);
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
