import type { Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { Role } from "@/lib/policies/roles";
import { Person } from "@/models/person";

export interface SignInPerson {
  readonly id: string;
  readonly organisationId: string;
  readonly name: string;
  readonly role: Role;
  readonly passwordHash: string;
  readonly isDeactivated: boolean;
}

/** The person of an e-mail (lower case), in whatever organisation: who signs in has not said which. */
export async function findPersonByEmail(
  email: string,
  tx: Transaction | null = null,
): Promise<SignInPerson | null> {
  database();
  const person = await Person.findOne({ where: { email }, transaction: tx });
  if (person === null) return null;
  const { id, organisationId, name, role, passwordHash, deactivatedAt } = person;
  return { id, organisationId, name, role, passwordHash, isDeactivated: deactivatedAt !== null };
}
