import { RevisionPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentSaved } from "@/lib/presenters/present-saved";
import { readRevision } from "@/lib/services/read-node";

export const GET = route({
  access: "node",
  params: RevisionPath,
  run: async ({ project, params }) => ({
    revision: presentSaved(await readRevision(project, params.nodeId, params.version)),
  }),
});
