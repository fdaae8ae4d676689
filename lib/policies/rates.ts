import { type Actor, hasRight } from "./roles";

/** What the rules need to know of a rate book, a time table or a carbon table. */
export interface RatesFacts {
  readonly organisationId: string;
}

/** Everybody in the house sees what work costs it; nobody outside does. */
export const canViewRates = (actor: Actor, rates: RatesFacts): boolean =>
  rates.organisationId === actor.organisationId;

export const canEditRates = (actor: Actor, rates: RatesFacts): boolean =>
  canViewRates(actor, rates) && hasRight(actor, "rates.edit");
