import { MemberPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import { presentMembers } from "@/lib/presenters/present-members";
import { dismissMember } from "@/lib/services/project-members";

export const DELETE = route({
  access: "project",
  params: MemberPath,
  run: async ({ actor, project, params }) =>
    presentMembers(actor, project, await dismissMember(actor, project.id, params.personId)),
});
