/** ISO 4217: no currency. */
export const NO_CURRENCY = "XXX";

/**
 * Turns money into an index: the cheapest option that costs anything = 100. Nothing but the proportions
 * of the options to each other can be read from it.
 */
export function costIndexer(costs: readonly number[]): (cost: number) => number {
  const positive = costs.filter((cost) => cost > 0);
  if (positive.length === 0) return () => 0;
  const cheapest = Math.min(...positive);
  return (cost) => Math.round((cost / cheapest) * 100);
}
