import { ProjectPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentNode } from "@/lib/presenters/present-node";
import { CreateNodeEnvelope } from "@/lib/schemas/node";
import { registerOf } from "@/lib/services/node-register";
import { createNode } from "@/lib/services/nodes";

export const GET = route({
  access: "project",
  params: ProjectPath,
  run: ({ actor, project }) => registerOf(actor, project),
});

export const POST = route({
  access: "project",
  params: ProjectPath,
  body: CreateNodeEnvelope,
  status: 201,
  run: async ({ actor, project, body }) => ({
    node: presentNode(actor, project, await createNode(actor, project, body.document)),
  }),
});
