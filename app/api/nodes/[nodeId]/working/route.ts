import { NodePath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { WorkingQuery } from "@/lib/schemas/comparison";
import { workingOf } from "@/lib/services/option-working";

export const GET = route({
  access: "node",
  params: NodePath,
  query: WorkingQuery,
  run: ({ actor, project, params, query }) => workingOf(actor, project, params.nodeId, query.option),
});
