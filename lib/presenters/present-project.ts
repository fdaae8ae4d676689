import type { ProjectRow } from "@/lib/db/repositories/projects";
import { canEditNode, canRecalculate } from "@/lib/policies/node";
import { canEditProject, canSeeMoney } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import type { Project, ProjectAbilities } from "@/lib/schemas/project";

export const projectAbilities = (actor: Actor, project: ProjectRow): ProjectAbilities => ({
  edit: canEditProject(actor, project),
  editNodes: canEditNode(actor, project),
  recalculate: canRecalculate(actor, project),
  seeMoney: canSeeMoney(actor, project),
});

/** Left out: who the members are, which is for those who look after them. */
export const presentProject = (actor: Actor, project: ProjectRow): Project => ({
  id: project.id,
  name: project.name,
  description: project.description,
  organisation: { id: project.organisationId, name: project.organisationName },
  version: project.version,
  isLocked: project.isLocked,
  nodeCount: project.nodeCount,
  updatedAt: project.updatedAt.toISOString(),
  abilities: projectAbilities(actor, project),
});
