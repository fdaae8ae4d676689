import type { Metadata } from "next";
import { requireActor } from "@/lib/auth/require-actor";
import { NodeSheet } from "./node-sheet";

export const metadata: Metadata = { title: "Node sheet" };

/** The sheet of one node. The API answers only to members of its project, and says who may change it. */
export default async function NodePage({
  params,
}: {
  readonly params: Promise<{ projectId: string; nodeId: string }>;
}) {
  await requireActor();
  const { projectId, nodeId } = await params;
  return <NodeSheet key={nodeId} projectId={projectId} nodeId={nodeId} />;
}
