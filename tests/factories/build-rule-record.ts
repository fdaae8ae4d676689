/** One time rule applied to one record of quantities, the rest of the estimate left out. */
import type { ShopPrices } from "@/lib/cost";
import type { DriverValues, QuantityRecord } from "@/lib/cost/drivers";
import { preparedRates } from "@/lib/cost/rate-book";
import { priceRecords, type PricedLine } from "@/lib/cost/rollup";
import { compiledTimeTable } from "@/lib/cost/time-table";
import { buildFabrication } from "./build-cost-case";

/** Lines that a record gives, for a batch so large that no set-up is left. */
export function linesOf(prices: ShopPrices, record: QuantityRecord): readonly PricedLine[] {
  const lines: PricedLine[] = [];
  const fabrication = buildFabrication({ quantity: 1_000_000_000 });
  priceRecords(
    compiledTimeTable(prices.timeTable),
    preparedRates(prices.rateBook),
    [record],
    fabrication,
    lines,
  );
  return lines;
}

/** Minutes of one operation for a record, without set-up. @throws Error where the record gives no such line. */
export function runMinutesOf(prices: ShopPrices, record: QuantityRecord, operation: string): number {
  const found = linesOf(prices, record).find(({ line }) => line.operation === operation);
  if (found === undefined) throw new Error(`No line ${operation}`);
  return found.touchMinutes;
}

const FREE_RUN = { lengthM: 1, runs: 0, thickestMm: 20, position: "PB", clearGapMm: 300, gunAngle: "free" };

/** One metre of fillet in the best position, its start left out. */
export const filletMetre = (
  throatMm: number,
  changes: Partial<DriverValues<"fillet-weld">> = {},
): QuantityRecord => ({
  driver: "fillet-weld",
  group: "",
  values: { ...FREE_RUN, throatMm, areaMm2: throatMm ** 2, ...changes },
});

/** One metre of 45 degree single-bevel butt weld in the best position, its start left out. */
export const bevelMetre = (depthMm: number): QuantityRecord => ({
  driver: "butt-weld",
  group: "",
  values: { ...FREE_RUN, depthMm, areaMm2: depthMm ** 2 / 2 },
});

/** One metre of cut in one plate. */
export const cutMetre = (thicknessMm: number): QuantityRecord => ({
  driver: "plate",
  group: "",
  values: {
    partType: "web-plate",
    parts: 1,
    thicknessMm,
    cutM: 1,
    corners: 0,
    massKg: 1,
    areaM2: 0,
    overlapCm2: 0,
    partsBefore: 0,
    pieceMassKg: 1000,
  },
});
