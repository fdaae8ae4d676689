import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { CatalogScreen } from "./catalog-screen";

export const metadata: Metadata = { title: "Catalogue" };

/** What nodes are made of: everybody signed in reads it, the shop sets its own plates. */
export default async function CatalogPage() {
  await requireActor();
  return <CatalogScreen />;
}
