/** Front door of the cost core. */
export { COST_CATEGORIES } from "./estimate";
export type { CostCategory, Estimate, EstimateLine, FabricationCase } from "./estimate";
export { estimateOption, priceOfOption, type EstimateRequest } from "./estimate-option";
export { DRIVERS, DRIVER_NAMES, SHARED_NAMES, type DriverName, type QuantityRecord } from "./drivers";
export { PRODUCTS, type ProductMasses, type ProductName } from "./products";
export { RATE_UNITS } from "./prices";
export type {
  CarbonFactor,
  CarbonTable,
  LookUpTable,
  RateBook,
  RateLine,
  RateUnit,
  RuleFormula,
  RuleFormulas,
  RuleUse,
  ShopPrices,
  TimeConstant,
  TimeRule,
  TimeTable,
} from "./prices";
export { quantitiesOf } from "./quantities/quantities-of";
export type { Quantities, WeldRun } from "./quantities/quantities";
export { rateIn, RateMissing } from "./rate-book";
export { CarbonFactorMissing } from "./rollup";
export { RuleFailed, RuleRefused } from "./rules";
export { compileTimeTable } from "./time-table";
