import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { TokenList } from "./token-list";

export const metadata: Metadata = { title: "Access tokens" };

/** One's own keys for programs. */
export default async function TokensPage() {
  await requireActor();
  return <TokenList />;
}
