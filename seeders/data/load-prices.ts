import type { ShopPrices } from "@/lib/cost";
import { parseShopPrices } from "@/lib/schemas/shop-prices";
import carbon from "./prices/carbon.json";
import rateBook from "./prices/rate-book.json";
import timeTable from "./prices/time-table.json";

let seedPrices: ShopPrices | null = null;

/** The default tables that a new organisation starts from, also used by the command line without a database. */
export function loadSeedPrices(): ShopPrices {
  seedPrices ??= parseShopPrices({ timeTable, rateBook, carbon });
  return seedPrices;
}
