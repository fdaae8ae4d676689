/**
 * What a shop's estimate is made from, as plain data: the time table (minutes, no money), the rate
 * book (money, no minutes) and the carbon table. Everything here is editable by the shop; nothing
 * of it is a constant in code. Read and checked by `lib/schemas/shop-prices.ts`.
 */
import type { CostCategory } from "./estimate";
import type { DriverName } from "./drivers";
import type { ProductName } from "./products";

/** Units a rate may be quoted in. "h" is an hour of one person or of one machine. */
export const RATE_UNITS = ["h", "kg", "m", "m2", "m3", "piece", "kWh"] as const;
export type RateUnit = (typeof RATE_UNITS)[number];

/** One way to work a number out, in mathjs syntax over the names of the rule's driver. */
export interface RuleFormula {
  readonly key: string;
  readonly label: string;
  readonly expression: string;
  readonly source: string;
}

/** A choice among formulas: the chosen one is used, the others stand beside it to be selected. */
export interface RuleFormulas {
  readonly chosen: string;
  readonly formulas: readonly RuleFormula[];
}

/** Material, consumables or energy that an operation uses, priced by the rate book's line of that name. */
export interface RuleUse {
  /** Item of the rate book; `{name}` is filled with the text quantity of that name. */
  readonly item: string;
  readonly label: string;
  readonly category: CostCategory;
  readonly unit: RateUnit;
  readonly quantity: RuleFormula;
}

export interface TimeRule {
  readonly key: string;
  /** Operation as it reads on the bill of operations. */
  readonly operation: string;
  /** Which quantities the rule is applied to, record by record. */
  readonly driver: DriverName;
  /** Category of the labour line. */
  readonly category: CostCategory;
  readonly trade: string | null;
  readonly workCentre: string | null;
  readonly where: "shop" | "site" | "office";
  /** People at work together. */
  readonly crew: number;
  /** Shown on the line beside the minutes. */
  readonly quantity: { readonly expression: string; readonly unit: string };
  /** Elapsed minutes per record; null where the operation takes no time of anybody. */
  readonly runMinutes: RuleFormulas | null;
  /** Elapsed minutes once per batch and group (thickness, diameter). */
  readonly setUpMinutes: RuleFormula | null;
  /** Machine minutes per record, charged at the rate `machine:<work centre>`. */
  readonly machineMinutes: RuleFormula | null;
  /** Name under which later rules of the same driver may use this rule's run minutes. */
  readonly gives: string | null;
  readonly uses: readonly RuleUse[];
}

/** A number or a word that rules refer to by name: the welding process in use, the overweld. */
export interface TimeConstant {
  readonly value: number | string;
  readonly label: string;
  readonly unit: string;
  readonly source: string;
}

/** A table that rules call like a function of one argument. */
export type LookUpTable =
  | {
      /** By a word; an unknown word is an error. */
      readonly kind: "named";
      readonly label: string;
      readonly unit: string;
      readonly entries: readonly { readonly name: string; readonly value: number; readonly source: string }[];
    }
  | {
      /** By a number: `steps` takes the first entry whose `upTo` is not below it, `linear` interpolates between entries. Beyond the last entry is an error. */
      readonly kind: "steps" | "linear";
      readonly label: string;
      readonly unit: string;
      readonly entries: readonly { readonly upTo: number; readonly value: number; readonly source: string }[];
    };

export interface TimeTable {
  readonly id: string;
  readonly label: string;
  readonly rules: readonly TimeRule[];
  readonly lookUps: Readonly<Record<string, LookUpTable>>;
  readonly constants: Readonly<Record<string, TimeConstant>>;
}

/** Currency per unit, at most six decimals. */
export interface RateLine {
  readonly low: number;
  readonly likely: number;
  readonly high: number;
  readonly unit: RateUnit;
  readonly source: string;
}

export interface RateBook {
  readonly id: string;
  readonly label: string;
  /** ISO 4217. */
  readonly currency: string;
  /** Decimals of the minor unit: 2 for EUR. */
  readonly minorDigits: number;
  /** ISO date. */
  readonly validFrom: string;
  readonly lines: Readonly<Record<string, RateLine>>;
}

export interface CarbonFactor {
  readonly kgCo2ePerKg: number;
  readonly source: string;
}

export interface CarbonTable {
  readonly id: string;
  readonly label: string;
  readonly factors: Readonly<Partial<Record<ProductName, CarbonFactor>>>;
}

export interface ShopPrices {
  readonly timeTable: TimeTable;
  readonly rateBook: RateBook;
  readonly carbon: CarbonTable;
}
