import { writeAudit } from "@/lib/db/repositories/audit";
import {
  findProject,
  insertProject,
  listProjectsAround,
  lockProject,
  type ProjectRow,
  updateProject,
} from "@/lib/db/repositories/projects";
import { inTransaction, type Transaction } from "@/lib/db/transaction";
import { AppError, notFound } from "@/lib/http/app-error";
import { isUniqueBreach } from "@/lib/db/unique-breach";
import { canCreateProject, canEditProject, canViewProject } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import type { CreateProject, UpdateProject } from "@/lib/schemas/project";

/** The projects that this person may see. */
export async function listProjects(actor: Actor): Promise<ProjectRow[]> {
  return (await listProjectsAround(actor)).filter((project) => canViewProject(actor, project));
}

const nameTaken = (): AppError =>
  new AppError("invalid", "There is a project of that name.", {
    fields: [{ path: "name", message: "Your organisation has a project of that name already." }],
  });

async function mustFind(tx: Transaction, projectId: string): Promise<ProjectRow> {
  const project = await findProject(projectId, tx);
  if (project === null) throw notFound("project");
  return project;
}

/** @throws AppError forbidden, invalid (a name that is taken). */
export async function createProject(actor: Actor, input: CreateProject): Promise<ProjectRow> {
  if (!canCreateProject(actor))
    throw new AppError("forbidden", "Designers open projects; your role does not.");
  const { personId, organisationId } = actor;
  const project = {
    organisationId,
    name: input.name,
    description: input.description ?? "",
    createdBy: personId,
  };
  return inTransaction(async (tx) => {
    const projectId = await insertProject(tx, project).catch((error: unknown) => {
      throw isUniqueBreach(error) ? nameTaken() : error;
    });
    const detail = { name: input.name };
    await writeAudit(tx, {
      actorId: personId,
      organisationId,
      projectId,
      action: "project.created",
      subjectId: projectId,
      detail,
    });
    return mustFind(tx, projectId);
  });
}

/** @throws AppError forbidden, conflict (somebody else's change came first), invalid (a name that is taken). */
export async function editProject(
  actor: Actor,
  projectId: string,
  input: UpdateProject,
): Promise<ProjectRow> {
  return inTransaction(async (tx) => {
    const project = await lockProject(tx, projectId);
    if (project === null) throw notFound("project");
    if (!canEditProject(actor, project))
      throw new AppError("forbidden", "You may look at this project but not change it.");
    if (project.version !== input.expectedVersion) {
      const { name, description, version } = project;
      throw new AppError("conflict", "Somebody changed this project after you opened it.", {
        current: { name, description, version },
      });
    }
    const change = {
      name: input.name ?? project.name,
      description: input.description ?? project.description,
      version: project.version + 1,
    };
    await updateProject(tx, projectId, change).catch((error: unknown) => {
      throw isUniqueBreach(error) ? nameTaken() : error;
    });
    const { personId: actorId } = actor;
    const { organisationId } = project;
    await writeAudit(tx, {
      actorId,
      organisationId,
      projectId,
      action: "project.edited",
      subjectId: projectId,
      detail: change,
    });
    return mustFind(tx, projectId);
  });
}
