import { type Actor, hasRight } from "./roles";

/** What the rules need to know of a person. */
export interface PersonFacts {
  readonly organisationId: string;
}

export const canManagePeople = (actor: Actor): boolean => hasRight(actor, "people.manage");

/** An admin looks after the people of the own organisation. */
export const canManagePerson = (actor: Actor, person: PersonFacts): boolean =>
  canManagePeople(actor) && person.organisationId === actor.organisationId;
