/** What a person does in their organisation. One role a person. */
export const ROLES = ["designer", "estimator", "fabricator", "checker", "admin"] as const;
export type Role = (typeof ROLES)[number];

/** What a role may do where the other conditions (membership, own organisation, lock) hold too. */
export const RIGHTS = [
  "project.create",
  "project.edit",
  "node.edit",
  "comparison.recalculate",
  "rates.edit",
  "stock.edit",
  "people.manage",
] as const;
export type Right = (typeof RIGHTS)[number];

/**
 * The one table of roles. Everybody reads what they are a member of; a checker only reads, so that the
 * one who signs has not had a hand in it; an admin looks after people and leaves engineering alone.
 */
export const ROLE_RIGHTS: Readonly<Record<Role, ReadonlySet<Right>>> = {
  designer: new Set<Right>(["project.create", "project.edit", "node.edit", "comparison.recalculate"]),
  estimator: new Set<Right>(["comparison.recalculate", "rates.edit", "stock.edit"]),
  fabricator: new Set<Right>(["stock.edit"]),
  checker: new Set<Right>(),
  admin: new Set<Right>(["people.manage"]),
};

/** Whoever asks: taken from the session and the person's row at every request, never from a token. */
export interface Actor {
  readonly personId: string;
  readonly organisationId: string;
  readonly role: Role;
}

export const hasRight = (actor: Actor, right: Right): boolean => ROLE_RIGHTS[actor.role].has(right);
