import type { Metadata } from "next";
import { ComparisonScreen } from "@/components/compare/comparison-screen";
import { requireActor } from "@/lib/auth/require-actor";

export const metadata: Metadata = { title: "Comparison" };

/** The options for one node side by side. The API answers only to members of its project. */
export default async function ComparisonPage({
  params,
}: {
  readonly params: Promise<{ projectId: string; nodeId: string }>;
}) {
  await requireActor();
  const { projectId, nodeId } = await params;
  return <ComparisonScreen projectId={projectId} nodeId={nodeId} />;
}
