/** What the cost core answers of one option: always the difference from the bare node. */

export const COST_CATEGORIES = [
  "labour",
  "machine",
  "material",
  "consumables",
  "column",
  "inspection",
  "site",
  "drawing",
] as const;
export type CostCategory = (typeof COST_CATEGORIES)[number];

export interface EstimateLine {
  readonly operation: string;
  readonly category: CostCategory;
  readonly trade: string | null;
  readonly workCentre: string | null;
  readonly where: "shop" | "site" | "office";
  /** Per node. */
  readonly quantity: number;
  readonly quantityUnit: string;
  /** Crew minutes per node, set-up shared over the batch. */
  readonly minutes: number;
  /** Per node, integer minor units of the currency, rounded half-even. */
  readonly costMinor: number;
  /** Where the minutes and the rate come from. */
  readonly source: string;
  /** Rule of the time table that the line comes from. */
  readonly ruleKey: string;
  /** The money is `rateAmount` of this item of the rate book, at its likely rate. */
  readonly rateItem: string;
  readonly rateAmount: number;
  readonly rateUnit: string;
  readonly rate: number;
}

export interface Estimate {
  readonly currency: string;
  /** Sum of the lines, per node. */
  readonly costMinor: number;
  readonly costForQuantityMinor: number;
  readonly costByCategoryMinor: Readonly<Record<CostCategory, number>>;
  readonly minutesByTrade: Readonly<Record<string, number>>;
  readonly touchMinutes: number;
  readonly crewMinutes: number;
  /** Elapsed shop time per node. */
  readonly shopMinutes: number;
  readonly siteMinutes: number;
  readonly massKg: number;
  readonly carbonKg: number;
  readonly lines: readonly EstimateLine[];
}

/** Facts of the node's making that no strength check needs. */
export interface FabricationCase {
  readonly quantity: number;
  readonly liftLengthMm: number;
  readonly nodesPerLift: number;
  readonly executionClass: 1 | 2 | 3 | 4;
  readonly coating: "none" | "paint" | "galvanised";
}
