import type { Catalog } from "@/lib/catalog/catalog";
import { loadCatalog } from "@/lib/db/repositories/catalog";
import { catalogKeyOf } from "./shop";

/** The whole catalogue with the plates that this organisation stocks, and its fingerprint. */
export async function readCatalog(
  organisationId: string,
): Promise<{ readonly catalog: Catalog; readonly key: string }> {
  const catalog = await loadCatalog(organisationId);
  return { catalog, key: catalogKeyOf(catalog) };
}
