import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { Actor } from "@/lib/policies/roles";
import type { ProjectFacts } from "@/lib/policies/project";
import { Project } from "@/models/project";
import { ProjectMember } from "@/models/project-member";

/** A project with what the rules of access need to know of it. */
export interface ProjectRow extends ProjectFacts {
  readonly name: string;
  readonly description: string;
  readonly organisationName: string;
  readonly version: number;
  readonly nodeCount: number;
  readonly updatedAt: Date;
}

interface RawProject {
  readonly id: string;
  readonly organisation_id: string;
  readonly organisation_name: string;
  readonly name: string;
  readonly description: string;
  readonly version: number;
  readonly locked_at: Date | null;
  readonly node_count: number;
  readonly member_ids: string[];
  readonly updated_at: Date;
}

const SELECT = `
  SELECT p.id, p.organisation_id, o.name AS organisation_name, p.name, p.description, p.version, p.locked_at, p.updated_at,
         (SELECT count(*)::int FROM nodes n WHERE n.project_id = p.id AND n.deleted_at IS NULL) AS node_count,
         ARRAY(SELECT m.person_id::text FROM project_members m WHERE m.project_id = p.id) AS member_ids
    FROM projects p JOIN organisations o ON o.id = p.organisation_id`;

function asRow(raw: RawProject): ProjectRow {
  return {
    id: raw.id,
    organisationId: raw.organisation_id,
    organisationName: raw.organisation_name,
    name: raw.name,
    description: raw.description,
    version: raw.version,
    isLocked: raw.locked_at !== null,
    nodeCount: raw.node_count,
    memberIds: new Set(raw.member_ids),
    updatedAt: raw.updated_at,
  };
}

/** Projects of the actor's organisation and those the actor was made a member of; the policy decides among them. */
export async function listProjectsAround(actor: Actor): Promise<ProjectRow[]> {
  const rows = await database().query<RawProject>(
    `${SELECT}
      WHERE p.organisation_id = :organisationId
         OR EXISTS (SELECT 1 FROM project_members m WHERE m.project_id = p.id AND m.person_id = :personId)
      ORDER BY p.name, p.id`,
    {
      replacements: { organisationId: actor.organisationId, personId: actor.personId },
      type: QueryTypes.SELECT,
    },
  );
  return rows.map(asRow);
}

/** One project with the facts that decide who may see it; the caller asks the policy before showing any of it. */
export async function findProject(
  projectId: string,
  tx: Transaction | null = null,
): Promise<ProjectRow | null> {
  const rows = await database().query<RawProject>(`${SELECT} WHERE p.id = :projectId`, {
    replacements: { projectId },
    type: QueryTypes.SELECT,
    transaction: tx,
  });
  return rows[0] === undefined ? null : asRow(rows[0]);
}

/** The same, held against every other change until the transaction ends. */
export async function lockProject(tx: Transaction, projectId: string): Promise<ProjectRow | null> {
  await Project.findByPk(projectId, { transaction: tx, lock: tx.LOCK.UPDATE, attributes: ["id"] });
  return findProject(projectId, tx);
}

export async function insertProject(
  tx: Transaction,
  project: {
    readonly organisationId: string;
    readonly name: string;
    readonly description: string;
    readonly createdBy: string;
  },
): Promise<string> {
  const { id } = await Project.create({ ...project }, { transaction: tx });
  await ProjectMember.create(
    { projectId: id, personId: project.createdBy, addedBy: project.createdBy },
    { transaction: tx },
  );
  return id;
}

export async function updateProject(
  tx: Transaction,
  projectId: string,
  change: { readonly name: string; readonly description: string; readonly version: number },
): Promise<void> {
  await Project.update({ ...change }, { where: { id: projectId }, transaction: tx });
}
