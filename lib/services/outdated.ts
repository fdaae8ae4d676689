import type { CalculationKeys } from "@/lib/db/repositories/comparisons";

/** Why a comparison would be made from other things today, in words; empty = up to date. */
export function outdatedReasons(stored: CalculationKeys, now: CalculationKeys): string[] {
  const reasons: string[] = [];
  if (stored.engine !== now.engine)
    reasons.push(`The calculation itself is newer (${now.engine}; this was ${stored.engine}).`);
  if (stored.pricesKey !== now.pricesKey) reasons.push("The rates or the time table have changed.");
  if (stored.catalogKey !== now.catalogKey) reasons.push("The catalogue or the stock plates have changed.");
  return reasons;
}
