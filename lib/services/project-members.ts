import { writeAudit } from "@/lib/db/repositories/audit";
import { findPersonByEmail } from "@/lib/db/repositories/people";
import {
  addMember,
  listMembers,
  type MemberRecord,
  removeMember,
} from "@/lib/db/repositories/project-members";
import { lockProject, type ProjectRow } from "@/lib/db/repositories/projects";
import { inTransaction, type Transaction } from "@/lib/db/transaction";
import { AppError, notFound } from "@/lib/http/app-error";
import { canManageMembers } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";

/** Who is in the project; the caller has seen to it that the actor may see it. */
export async function readMembers(project: ProjectRow): Promise<MemberRecord[]> {
  return await listMembers(project.id);
}

async function lockForMembers(tx: Transaction, actor: Actor, projectId: string): Promise<ProjectRow> {
  const project = await lockProject(tx, projectId);
  if (project === null) throw notFound("project");
  if (!canManageMembers(actor, project)) {
    throw new AppError("forbidden", "The project's designers and the admin say who is in it.");
  }
  return project;
}

/** Lets somebody in, of whichever organisation. @throws AppError forbidden, invalid (nobody signs in with that e-mail). */
export async function inviteMember(actor: Actor, projectId: string, email: string): Promise<MemberRecord[]> {
  return inTransaction(async (tx) => {
    const { organisationId } = await lockForMembers(tx, actor, projectId);
    const person = await findPersonByEmail(email, tx);
    if (person === null || person.isDeactivated) {
      const message = "Nobody signs in with that e-mail.";
      throw new AppError("invalid", message, { fields: [{ path: "email", message }] });
    }
    const { personId: actorId } = actor;
    await addMember(tx, { projectId, personId: person.id, addedBy: actorId });
    const line = { action: "project.member-added", subjectId: person.id } as const;
    await writeAudit(tx, { actorId, organisationId, projectId, ...line });
    return listMembers(projectId, tx);
  });
}

/** A project that no designer of its house is in could be edited by nobody. */
function mustKeepDesigner(members: readonly MemberRecord[], organisationId: string): void {
  const isKept = members.some(
    (member) => member.role === "designer" && member.organisationId === organisationId,
  );
  if (isKept) return;
  const message = "This is the last designer in the project. Let another one in first.";
  throw new AppError("invalid", message, { fields: [{ path: "personId", message }] });
}

/** Takes somebody out of the project. @throws AppError forbidden, not_found, invalid (the last designer). */
export async function dismissMember(
  actor: Actor,
  projectId: string,
  personId: string,
): Promise<MemberRecord[]> {
  return inTransaction(async (tx) => {
    const { organisationId } = await lockForMembers(tx, actor, projectId);
    if (!(await removeMember(tx, projectId, personId))) throw notFound("member");
    const members = await listMembers(projectId, tx);
    mustKeepDesigner(members, organisationId);
    const line = { action: "project.member-removed", subjectId: personId } as const;
    await writeAudit(tx, { actorId: actor.personId, organisationId, projectId, ...line });
    return members;
  });
}
