import type { ShopPrices } from "@/lib/cost/prices";

const ID_MARK = " #";

/**
 * Names the three tables that price a node: their labels for a reader, then their ids. Issued versions
 * never change, so equal keys mean equal figures.
 */
export const pricesKeyOf = ({ rateBook, timeTable, carbon }: ShopPrices): string =>
  [rateBook, timeTable, carbon].map(({ label, id }) => `${label}${ID_MARK}${id}`).join("; ");

/** The labels of such a key, for a reader. */
export const pricedBy = (pricesKey: string): string =>
  pricesKey
    .split("; ")
    .map((part) => (part.includes(ID_MARK) ? part.slice(0, part.lastIndexOf(ID_MARK)) : part))
    .join("; ");
