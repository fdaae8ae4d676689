import type { StockPlateRow } from "@/lib/catalog/catalog";
import { writeAudit } from "@/lib/db/repositories/audit";
import { replaceStockPlates } from "@/lib/db/repositories/catalog";
import { inTransaction } from "@/lib/db/transaction";
import { AppError } from "@/lib/http/app-error";
import { canEditStockPlates } from "@/lib/policies/stock-plates";
import type { Actor } from "@/lib/policies/roles";

/** Replaces the list of plates that the own organisation stocks, mm. @throws AppError forbidden. */
export async function setStockPlates(
  actor: Actor,
  thicknessesMm: readonly number[],
): Promise<StockPlateRow[]> {
  if (!canEditStockPlates(actor)) {
    throw new AppError("forbidden", "The stock is kept by estimators and fabricators; your role reads it.");
  }
  const { organisationId, personId: actorId } = actor;
  return inTransaction(async (tx) => {
    const plates = await replaceStockPlates(tx, organisationId, thicknessesMm);
    const line = {
      action: "stock-plates.set",
      subjectId: organisationId,
      detail: { thicknessesMm },
    } as const;
    await writeAudit(tx, { actorId, organisationId, ...line });
    return plates;
  });
}
