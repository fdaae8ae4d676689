import { type Actor, hasRight } from "./roles";

/** What the rules need to know of a project. */
export interface ProjectFacts {
  readonly id: string;
  readonly organisationId: string;
  readonly memberIds: ReadonlySet<string>;
  /** Issued work. */
  readonly isLocked: boolean;
}

/** Members may come from another organisation: membership decides, not the organisation alone. */
const isMember = (actor: Actor, project: ProjectFacts): boolean => project.memberIds.has(actor.personId);

const isOwn = (actor: Actor, project: ProjectFacts): boolean =>
  project.organisationId === actor.organisationId;

/** An admin sees every project of the own organisation, to look after who is in it. */
export const canViewProject = (actor: Actor, project: ProjectFacts): boolean =>
  isMember(actor, project) || (isOwn(actor, project) && actor.role === "admin");

export const canCreateProject = (actor: Actor): boolean => hasRight(actor, "project.create");

/** The project itself belongs to its organisation; a locked one is edited by nobody. */
export const canEditProject = (actor: Actor, project: ProjectFacts): boolean =>
  isMember(actor, project) && isOwn(actor, project) && !project.isLocked && hasRight(actor, "project.edit");

/** Who is in a project is said by its designers and by the organisation's admin, who need not be in it. */
export const canManageMembers = (actor: Actor, project: ProjectFacts): boolean =>
  isOwn(actor, project) &&
  ((isMember(actor, project) && hasRight(actor, "project.edit")) || hasRight(actor, "people.manage"));

/**
 * Rates are the business of the organisation that owns them: a member from outside sees an index.
 */
export const canSeeMoney = (actor: Actor, project: ProjectFacts): boolean =>
  canViewProject(actor, project) && isOwn(actor, project);
