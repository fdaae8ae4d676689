import { chmod, mkdir, readFile, writeFile } from "node:fs/promises";
import path from "node:path";
import type { Transaction } from "sequelize";
import { hashPassword, randomPassword } from "@/lib/auth/passwords";
import { environment } from "@/lib/config/env";
import type { Role } from "@/lib/policies/roles";
import { NodeDocument } from "@/lib/schemas/node-document";
import { AuditEntry } from "@/models/audit-entry";
import { Node } from "@/models/node";
import { NodeRevision } from "@/models/node-revision";
import { Organisation } from "@/models/organisation";
import { Person } from "@/models/person";
import { Project } from "@/models/project";
import { ProjectMember } from "@/models/project-member";
import type { Seeder } from "./seeder";

/** Invented, like everybody in it; `.example` addresses belong to nobody (RFC 2606). */
export const DEMO_ORGANISATION = "Tarnbeck Steelwork";

const DEMO_PEOPLE: readonly { readonly role: Role; readonly name: string; readonly email: string }[] = [
  { role: "designer", name: "Maren Oake", email: "designer@tarnbeck.example" },
  { role: "estimator", name: "Tobias Fenn", email: "estimator@tarnbeck.example" },
  { role: "fabricator", name: "Ines Calloway", email: "fabricator@tarnbeck.example" },
  { role: "checker", name: "Piotr Hallam", email: "checker@tarnbeck.example" },
  { role: "admin", name: "Ruth Askew", email: "admin@tarnbeck.example" },
];

/** Where the passwords of the demo people are kept, inside the data folder. */
export const DEMO_PEOPLE_FILE = "demo-people.json";

interface NewPerson {
  readonly role: Role;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

async function findOrCreateOrganisation(transaction: Transaction): Promise<Organisation> {
  const [organisation] = await Organisation.findOrCreate({ where: { name: DEMO_ORGANISATION }, transaction });
  return organisation;
}

/** Adds whoever is missing. Somebody already there keeps name, role and password, whatever they are by now. */
async function addPeople(organisationId: string, transaction: Transaction): Promise<NewPerson[]> {
  const added: NewPerson[] = [];
  for (const person of DEMO_PEOPLE) {
    if ((await Person.findOne({ where: { email: person.email }, transaction })) !== null) continue;
    const password = randomPassword();
    await Person.create(
      { ...person, organisationId, passwordHash: await hashPassword(password) },
      { transaction },
    );
    added.push({ ...person, password });
  }
  return added;
}

/** Keeps the new passwords where only the owner of the data folder reads them. */
async function keepPasswords(folder: string, added: readonly NewPerson[]): Promise<string> {
  const file = path.join(folder, DEMO_PEOPLE_FILE);
  await mkdir(folder, { recursive: true });
  const kept = await readFile(file, "utf8").then(
    (text) => JSON.parse(text) as NewPerson[],
    () => [],
  );
  const isReplaced = (person: NewPerson): boolean => added.some((other) => other.email === person.email);
  const people = [...kept.filter((person) => !isReplaced(person)), ...added];
  await writeFile(file, `${JSON.stringify(people, null, 2)}\n`, { mode: 0o600 });
  // The mode above counts for a new file only.
  await chmod(file, 0o600);
  return file;
}

interface DemoNodes {
  readonly project: { readonly name: string; readonly description?: string };
  readonly nodes: readonly { readonly purpose: string; readonly document: unknown }[];
}

async function readDemoNodes(): Promise<DemoNodes | null> {
  const file = path.join(process.cwd(), "seeders", "data", "demo-nodes.json");
  const text = await readFile(file, "utf8").catch((error: NodeJS.ErrnoException) => {
    if (error.code === "ENOENT") return null;
    throw error;
  });
  return text === null ? null : (JSON.parse(text) as DemoNodes);
}

async function addNode(
  projectId: string,
  designer: Person,
  input: unknown,
  transaction: Transaction,
): Promise<boolean> {
  const document = NodeDocument.parse(input);
  // Also one that was taken off the register: it must not come back at the next start.
  if ((await Node.findOne({ where: { projectId, reference: document.reference }, transaction })) !== null)
    return false;
  const saved = { document, version: 1, savedBy: designer.id, savedAt: new Date() };
  const node = await Node.create({ projectId, reference: document.reference, ...saved }, { transaction });
  await NodeRevision.create({ nodeId: node.id, ...saved }, { transaction });
  return true;
}

async function addProject(organisationId: string, transaction: Transaction): Promise<string[]> {
  const demo = await readDemoNodes();
  const people = await Person.findAll({
    where: { organisationId, email: DEMO_PEOPLE.map((person) => person.email) },
    transaction,
  });
  const designer = people.find((person) => person.email === DEMO_PEOPLE[0]?.email);
  if (demo === null || designer === undefined) return [];
  const [project, isNew] = await Project.findOrCreate({
    where: { organisationId, name: demo.project.name },
    defaults: {
      organisationId,
      name: demo.project.name,
      description: demo.project.description ?? "",
      createdBy: designer.id,
    },
    transaction,
  });
  if (isNew) {
    const members = people.map((person) => ({
      projectId: project.id,
      personId: person.id,
      addedBy: designer.id,
    }));
    await ProjectMember.bulkCreate(members, { transaction });
    const line = { organisationId, projectId: project.id, action: "project.seeded", subjectId: project.id };
    await AuditEntry.create(line, { transaction });
  }
  let count = 0;
  for (const node of demo.nodes)
    if (await addNode(project.id, designer, node.document, transaction)) count += 1;
  return count === 0 ? [] : [`${count} nodes in the project "${demo.project.name}"`];
}

/** The demo organisation: one person of each role and a project with nodes of different kinds. */
export const demoOrganisation: Seeder = {
  name: "demo organisation",
  demo: true,
  run: async ({ transaction }) => {
    const organisation = await findOrCreateOrganisation(transaction);
    const added = await addPeople(organisation.id, transaction);
    const lines = added.map(
      (person) => `${person.role.padEnd(10)} ${person.email}  password ${person.password}`,
    );
    if (added.length > 0) lines.push(`kept in ${await keepPasswords(environment().dataFolder, added)}`);
    return [...lines, ...(await addProject(organisation.id, transaction))];
  },
};
