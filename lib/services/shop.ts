import { createHash } from "node:crypto";
import type { Catalog } from "@/lib/catalog/catalog";
import type { ShopPrices } from "@/lib/cost/prices";
import { loadCatalog } from "@/lib/db/repositories/catalog";
import { loadCurrentPrices } from "@/lib/db/repositories/rate-books";
import { pricesKeyOf } from "@/lib/presenters/priced-by";

/** Everything a calculation reads besides the node, with names to tell later whether it has moved on. */
export interface Shop {
  readonly catalog: Catalog;
  readonly prices: ShopPrices;
  readonly catalogKey: string;
  readonly pricesKey: string;
}

/** A fingerprint of the catalogue: equal rows give equal keys. */
export const catalogKeyOf = (catalog: Catalog): string =>
  createHash("sha256").update(JSON.stringify(catalog)).digest("hex").slice(0, 32);

/** The catalogue and the figures of one organisation as they stand now. */
export async function loadShop(organisationId: string): Promise<Shop> {
  const [catalog, prices] = await Promise.all([
    loadCatalog(organisationId),
    loadCurrentPrices(organisationId),
  ]);
  return { catalog, prices, catalogKey: catalogKeyOf(catalog), pricesKey: pricesKeyOf(prices) };
}
