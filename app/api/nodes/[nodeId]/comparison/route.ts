import { NodePath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { comparisonOf, recalculate } from "@/lib/services/compare-node";

export const GET = route({
  access: "node",
  params: NodePath,
  run: async ({ actor, project, params }) => ({
    comparison: await comparisonOf(actor, project, params.nodeId),
  }),
});

export const POST = route({
  access: "node",
  params: NodePath,
  status: 201,
  run: ({ actor, project, params }) => recalculate(actor, project, params.nodeId),
});
