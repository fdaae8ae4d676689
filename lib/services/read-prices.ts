import type { ShopPrices } from "@/lib/cost/prices";
import { loadCurrentPrices } from "@/lib/db/repositories/rate-books";
import { AppError } from "@/lib/http/app-error";
import { canViewRates } from "@/lib/policies/rates";
import type { Actor } from "@/lib/policies/roles";

/** The rate book, time table and carbon table that price an organisation's nodes now. @throws AppError forbidden. */
export async function readPrices(actor: Actor, organisationId: string): Promise<ShopPrices> {
  if (!canViewRates(actor, { organisationId }))
    throw new AppError("forbidden", "These rates belong to another organisation.");
  return await loadCurrentPrices(organisationId);
}
