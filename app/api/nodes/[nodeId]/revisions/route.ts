import { NodePath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { readRevisions } from "@/lib/services/read-node";

export const GET = route({
  access: "node",
  params: NodePath,
  run: async ({ project, params }) => ({
    revisions: (await readRevisions(project, params.nodeId)).map(({ version, savedBy, savedAt }) => ({
      version,
      savedBy,
      savedAt: savedAt.toISOString(),
    })),
  }),
});
