import { ProjectPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentProject } from "@/lib/presenters/present-project";
import { UpdateProject } from "@/lib/schemas/project";
import { editProject } from "@/lib/services/projects";

export const GET = route({
  access: "project",
  params: ProjectPath,
  run: ({ actor, project }) => Promise.resolve({ project: presentProject(actor, project) }),
});

export const PATCH = route({
  access: "project",
  params: ProjectPath,
  body: UpdateProject,
  run: async ({ actor, params, body }) => ({
    project: presentProject(actor, await editProject(actor, params.projectId, body)),
  }),
});
