import { canManagePeople } from "@/lib/policies/people";
import { canCreateProject } from "@/lib/policies/project";
import { canEditRates } from "@/lib/policies/rates";
import { canEditStockPlates } from "@/lib/policies/stock-plates";
import type { Actor } from "@/lib/policies/roles";
import type { Me } from "@/lib/schemas/me";

/** Whoever is signed in, with what the pages show of them. */
export interface ActorFacts extends Actor {
  readonly name: string;
  readonly email: string;
  readonly organisationName: string;
}

/** Left out: the session's id. */
export const presentMe = (actor: ActorFacts): Me => ({
  person: { id: actor.personId, name: actor.name, email: actor.email, role: actor.role },
  organisation: { id: actor.organisationId, name: actor.organisationName },
  abilities: {
    createProject: canCreateProject(actor),
    editStockPlates: canEditStockPlates(actor),
    editRates: canEditRates(actor, { organisationId: actor.organisationId }),
    managePeople: canManagePeople(actor),
  },
});
