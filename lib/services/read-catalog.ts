import type { Catalog } from "@/lib/catalog/catalog";
import { loadCatalog } from "@/lib/db/repositories/catalog";
import { catalogKeyOf } from "./shop";

/** The whole catalogue with its fingerprint. */
export async function readCatalog(): Promise<{ readonly catalog: Catalog; readonly key: string }> {
  const catalog = await loadCatalog(null);
  return { catalog, key: catalogKeyOf(catalog) };
}
