import { ProjectPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentMembers } from "@/lib/presenters/present-members";
import { AddMember } from "@/lib/schemas/members";
import { inviteMember, readMembers } from "@/lib/services/project-members";

export const GET = route({
  access: "project",
  params: ProjectPath,
  run: async ({ actor, project }) => presentMembers(actor, project, await readMembers(project)),
});

export const POST = route({
  access: "project",
  params: ProjectPath,
  body: AddMember,
  run: async ({ actor, project, body }) =>
    presentMembers(actor, project, await inviteMember(actor, project.id, body.email)),
});
