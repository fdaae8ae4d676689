import { NodePath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { SetExclusions } from "@/lib/schemas/comparison";
import { setExclusions } from "@/lib/services/nodes";

export const PUT = route({
  access: "node",
  params: NodePath,
  body: SetExclusions,
  run: async ({ actor, project, params, body }) => ({
    excluded: await setExclusions(actor, project, params.nodeId, body.optionKeys),
  }),
});
