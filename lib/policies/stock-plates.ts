import { type Actor, hasRight } from "./roles";

/** The shop and whoever prices for it say what is in stock. */
export const canEditStockPlates = (actor: Actor): boolean => hasRight(actor, "stock.edit");
