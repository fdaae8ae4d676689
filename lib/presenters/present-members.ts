import type { MemberRecord } from "@/lib/db/repositories/project-members";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { canManageMembers } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import type { Members } from "@/lib/schemas/members";

/** Left out: e-mails, which are for signing in. */
export const presentMembers = (
  actor: Actor,
  project: ProjectRow,
  members: readonly MemberRecord[],
): Members => ({
  members: members.map(({ personId, name, role, organisationName }) => ({
    personId,
    name,
    role,
    organisationName,
  })),
  canManage: canManageMembers(actor, project),
});
