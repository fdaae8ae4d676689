import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { Role } from "@/lib/policies/roles";
import { ProjectMember } from "@/models/project-member";

export interface MemberRecord {
  readonly personId: string;
  readonly name: string;
  readonly role: Role;
  readonly organisationId: string;
  readonly organisationName: string;
}

/** Who is in a project, by organisation and name; those who may no longer sign in are left out. */
export async function listMembers(projectId: string, tx: Transaction | null = null): Promise<MemberRecord[]> {
  return database().query<MemberRecord>(
    `SELECT p.id AS "personId", p.name, p.role, o.id AS "organisationId", o.name AS "organisationName"
       FROM project_members m JOIN people p ON p.id = m.person_id JOIN organisations o ON o.id = p.organisation_id
      WHERE m.project_id = :projectId AND p.deactivated_at IS NULL
      ORDER BY o.name, p.name, p.id`,
    { replacements: { projectId }, type: QueryTypes.SELECT, transaction: tx },
  );
}

/** Adding somebody who is in already changes nothing. */
export async function addMember(
  tx: Transaction,
  member: { readonly projectId: string; readonly personId: string; readonly addedBy: string },
): Promise<void> {
  await ProjectMember.bulkCreate([{ ...member }], { transaction: tx, ignoreDuplicates: true });
}

export async function removeMember(tx: Transaction, projectId: string, personId: string): Promise<boolean> {
  return (await ProjectMember.destroy({ where: { projectId, personId }, transaction: tx })) > 0;
}
