import { canViewProject, type ProjectFacts } from "./project";
import { type Actor, hasRight } from "./roles";

/** A node is read by whoever reads its project. */
export const canViewNode = canViewProject;

/** Also adding, deleting and setting options aside. A designer invited from outside works like one of the house. */
export const canEditNode = (actor: Actor, project: ProjectFacts): boolean =>
  project.memberIds.has(actor.personId) && !project.isLocked && hasRight(actor, "node.edit");

/** A new calculation replaces the figures that everybody reads, so it is not for every reader. */
export const canRecalculate = (actor: Actor, project: ProjectFacts): boolean =>
  project.memberIds.has(actor.personId) && !project.isLocked && hasRight(actor, "comparison.recalculate");
