import { randomUUID } from "node:crypto";
import { hashPassword } from "@/lib/auth/passwords";
import { database } from "@/lib/db/transaction";
import { type Actor, type Role, ROLES } from "@/lib/policies/roles";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { Node } from "@/models/node";
import { NodeRevision } from "@/models/node-revision";
import { Organisation } from "@/models/organisation";
import { Person } from "@/models/person";
import { Project } from "@/models/project";
import { ProjectMember } from "@/models/project-member";
import { openSession } from "@/tests/support/api-call";
import { buildNodeDocument } from "./build-node-document";

/** Shared by everybody the tests make up, hashed once: hashing is slow on purpose. */
export const TEST_PASSWORD = "correct horse of the tests";
let hashed: Promise<string> | undefined;

export interface BuiltPerson extends Actor {
  readonly name: string;
  readonly email: string;
  readonly cookie: string;
  readonly sessionId: string;
}

/** Somebody with an open session. Every call makes a new one, so that tests do not meet. */
export async function buildPerson(organisationId: string, role: Role): Promise<BuiltPerson> {
  database();
  const email = `${role}.${randomUUID()}@test.example`;
  const name = `Test ${role}`;
  const passwordHash = await (hashed ??= hashPassword(TEST_PASSWORD));
  const person = await Person.create({ organisationId, email, name, role, passwordHash });
  return { personId: person.id, organisationId, role, name, email, ...(await openSession(person.id)) };
}

export interface BuiltOrganisation {
  readonly id: string;
  readonly people: Readonly<Record<Role, BuiltPerson>>;
}

/** An organisation of its own with one person of each role, each signed in. */
export async function buildOrganisation(): Promise<BuiltOrganisation> {
  database();
  const { id } = await Organisation.create({ name: `Test ${randomUUID()}` });
  const entries: [Role, BuiltPerson][] = [];
  for (const role of ROLES) entries.push([role, await buildPerson(id, role)]);
  return { id, people: Object.fromEntries(entries) as Record<Role, BuiltPerson> };
}

/** A project of that organisation; its designer made it, and these people are members. */
export async function buildProject(
  organisation: BuiltOrganisation,
  members: readonly BuiltPerson[] = Object.values(organisation.people),
): Promise<string> {
  const { personId: createdBy } = organisation.people.designer;
  const project = await Project.create({
    organisationId: organisation.id,
    name: `Project ${randomUUID()}`,
    createdBy,
  });
  await ProjectMember.bulkCreate(
    members.map(({ personId }) => ({ projectId: project.id, personId, addedBy: createdBy })),
  );
  return project.id;
}

/** A node of that project at version 1. */
export async function buildNode(
  projectId: string,
  savedBy: BuiltPerson,
  overrides: Partial<NodeDocument> = {},
): Promise<{ readonly id: string; readonly document: NodeDocument }> {
  const document = buildNodeDocument({ reference: `N ${randomUUID()}`, ...overrides });
  const save = { document, version: 1, savedBy: savedBy.personId, savedAt: new Date() };
  const node = await Node.create({ projectId, reference: document.reference, ...save });
  await NodeRevision.create({ nodeId: node.id, ...save });
  return { id: node.id, document };
}
