import { z } from "zod";
import type { ShopPrices } from "@/lib/cost/prices";

/**
 * The current rate book, time table and carbon table of one's own organisation. The server read them
 * with `lib/schemas/shop-prices.ts` when they went in, so the reply is checked only for its parts.
 */
export const PricesReply = z.object({
  prices: z.custom<ShopPrices>(
    (value) =>
      typeof value === "object" &&
      value !== null &&
      "timeTable" in value &&
      "rateBook" in value &&
      "carbon" in value,
    "The prices have a rate book, a time table and a carbon table.",
  ),
});
