import { NodePath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentNode } from "@/lib/presenters/present-node";
import { DeleteNodeQuery, SaveNodeEnvelope } from "@/lib/schemas/node";
import { deleteNode, saveNode } from "@/lib/services/nodes";
import { readNode } from "@/lib/services/read-node";

export const GET = route({
  access: "node",
  params: NodePath,
  run: async ({ actor, project, params }) => ({
    node: presentNode(actor, project, await readNode(project, params.nodeId)),
  }),
});

export const PUT = route({
  access: "node",
  params: NodePath,
  body: SaveNodeEnvelope,
  run: async ({ actor, project, params, body }) => ({
    node: presentNode(actor, project, await saveNode(actor, project, params.nodeId, body)),
  }),
});

export const DELETE = route({
  access: "node",
  params: NodePath,
  query: DeleteNodeQuery,
  run: async ({ actor, project, params, query }) => {
    await deleteNode(actor, project, params.nodeId, query.expectedVersion);
    return { deleted: true };
  },
});
