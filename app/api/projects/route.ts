import { route } from "@/lib/http/route";
import { presentProject } from "@/lib/presenters/present-project";
import { CreateProject } from "@/lib/schemas/project";
import { createProject, listProjects } from "@/lib/services/projects";

export const GET = route({
  access: "signed-in",
  run: async ({ actor }) => ({
    projects: (await listProjects(actor)).map((project) => presentProject(actor, project)),
  }),
});

export const POST = route({
  access: "signed-in",
  body: CreateProject,
  status: 201,
  run: async ({ actor, body }) => ({ project: presentProject(actor, await createProject(actor, body)) }),
});
