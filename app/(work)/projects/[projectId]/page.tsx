import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { NodeRegister } from "./node-register";

export const metadata: Metadata = { title: "Register of nodes" };

/** The register of a project's nodes. The API answers only to its members. */
export default async function ProjectPage({ params }: { readonly params: Promise<{ projectId: string }> }) {
  await requireActor();
  return <NodeRegister projectId={(await params).projectId} />;
}
