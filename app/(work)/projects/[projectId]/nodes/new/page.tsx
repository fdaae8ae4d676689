import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { NewNodeSheet } from "./new-node-sheet";

export const metadata: Metadata = { title: "New node" };

/** The sheet of a node that is not saved yet. The API says whether this person may add one. */
export default async function NewNodePage({ params }: { readonly params: Promise<{ projectId: string }> }) {
  await requireActor();
  return <NewNodeSheet projectId={(await params).projectId} />;
}
