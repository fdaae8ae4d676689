/** Guards the last line of defence: what the database itself refuses, whatever the program does. */
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { writeAudit } from "@/lib/db/repositories/audit";
import { database, inTransaction } from "@/lib/db/transaction";
import { AuditEntry } from "@/models/audit-entry";
import { Node } from "@/models/node";
import { NodeRevision } from "@/models/node-revision";
import { Person } from "@/models/person";
import { Project } from "@/models/project";
import { ProjectMember } from "@/models/project-member";
import { Session } from "@/models/session";
import {
  buildNode,
  buildOrganisation,
  type BuiltOrganisation,
  buildProject,
} from "@/tests/factories/build-organisation";
import { buildNodeDocument } from "@/tests/factories/build-node-document";

let organisation: BuiltOrganisation;
let projectId: string;

beforeAll(async () => {
  organisation = await buildOrganisation();
  projectId = await buildProject(organisation);
});

describe("unique keys", () => {
  it("take an e-mail once, in every organisation", async () => {
    const other = await buildOrganisation();
    const { email } = organisation.people.designer;
    const twin = {
      organisationId: other.id,
      email,
      name: "Twin",
      role: "designer",
      passwordHash: "$argon2id$",
    } as const;
    await expect(Person.create(twin)).rejects.toMatchObject({ name: "SequelizeUniqueConstraintError" });
  });

  it("take a project's name once in an organisation and again in another", async () => {
    const project = await Project.findByPk(projectId, { rejectOnEmpty: true });
    const createdBy = organisation.people.designer.personId;
    const { name } = project;
    await expect(Project.create({ organisationId: organisation.id, name, createdBy })).rejects.toMatchObject({
      name: "SequelizeUniqueConstraintError",
    });
    const other = await buildOrganisation();
    const again = await Project.create({
      organisationId: other.id,
      name,
      createdBy: other.people.designer.personId,
    });
    expect(again.name).toBe(name);
  });

  it("take a mark once on a register; a node taken off it gives the mark free", async () => {
    const { id, document } = await buildNode(projectId, organisation.people.designer);
    const reference = document.reference;
    await expect(buildNode(projectId, organisation.people.designer, { reference })).rejects.toMatchObject({
      name: "SequelizeUniqueConstraintError",
    });
    await Node.update({ deletedAt: new Date() }, { where: { id } });
    const again = await buildNode(projectId, organisation.people.designer, { reference });
    expect(again.id).not.toBe(id);
  });

  it("take a member once in a project", async () => {
    const { personId } = organisation.people.checker;
    await expect(ProjectMember.create({ projectId, personId, addedBy: personId })).rejects.toMatchObject({
      name: "SequelizeUniqueConstraintError",
    });
  });
});

describe("foreign keys", () => {
  const missing = randomUUID();

  it("refuse a person without an organisation, a node without a project, a session without a person", async () => {
    const breach = { name: "SequelizeForeignKeyConstraintError" };
    const person = {
      email: `${missing}@test.example`,
      name: "Nobody",
      role: "checker",
      passwordHash: "$argon2id$",
    } as const;
    await expect(Person.create({ ...person, organisationId: missing })).rejects.toMatchObject(breach);
    await expect(buildNode(missing, organisation.people.designer)).rejects.toMatchObject(breach);
    const times = { lastSeenAt: new Date(), expiresAt: new Date(Date.now() + 1000) };
    await expect(Session.create({ personId: missing, ...times })).rejects.toMatchObject(breach);
  });

  it("keep a project that holds nodes, and a person whom records name", async () => {
    await buildNode(projectId, organisation.people.designer);
    const breach = { name: "SequelizeForeignKeyConstraintError" };
    await expect(Project.destroy({ where: { id: projectId } })).rejects.toMatchObject(breach);
    await expect(
      Person.destroy({ where: { id: organisation.people.designer.personId } }),
    ).rejects.toMatchObject(breach);
  });
});

describe("checks", () => {
  it("refuse a role, an e-mail and a password that are none", async () => {
    const { organisationId } = organisation.people.admin;
    const good = { organisationId, name: "Check", role: "checker", passwordHash: "$argon2id$" } as const;
    const email = (): string => `${randomUUID()}@test.example`;
    const role = "owner" as unknown as "admin";
    await expect(Person.create({ ...good, email: email(), role })).rejects.toThrow(/people_role_check/);
    await expect(Person.create({ ...good, email: email().toUpperCase() })).rejects.toThrow(
      /people_email_check/,
    );
    await expect(Person.create({ ...good, email: email(), passwordHash: "plain" })).rejects.toThrow(
      /password_hash_check/,
    );
  });

  it("refuse a node whose mark is not the mark in its document", async () => {
    const document = buildNodeDocument({ reference: "A1" });
    const savedBy = organisation.people.designer.personId;
    const node = { projectId, reference: "B1", document, version: 1, savedBy, savedAt: new Date() };
    await expect(Node.create(node)).rejects.toThrow(/nodes_check/);
  });
});

describe("records of what happened", () => {
  it("are added and never changed or removed: audit lines", async () => {
    const { personId: actorId, organisationId } = organisation.people.admin;
    const subjectId = randomUUID();
    await inTransaction((tx) =>
      writeAudit(tx, { actorId, organisationId, action: "project.edited", subjectId }),
    );
    const where = { subjectId };
    expect(await AuditEntry.count({ where })).toBe(1);
    await expect(AuditEntry.update({ subjectId: "other" }, { where })).rejects.toThrow(/never changed/);
    await expect(AuditEntry.destroy({ where })).rejects.toThrow(/never changed/);
    expect(await AuditEntry.count({ where })).toBe(1);
  });

  it("are added and never changed or removed: revisions", async () => {
    const { id } = await buildNode(projectId, organisation.people.designer);
    const where = { nodeId: id };
    await expect(NodeRevision.update({ savedAt: new Date(0) }, { where })).rejects.toThrow(/never changed/);
    await expect(NodeRevision.destroy({ where })).rejects.toThrow(/never changed/);
  });

  it("go away with the change they tell of when that fails", async () => {
    const { personId: actorId, organisationId } = organisation.people.admin;
    const subjectId = randomUUID();
    const failing = inTransaction(async (tx) => {
      await writeAudit(tx, { actorId, organisationId, action: "project.edited", subjectId });
      throw new Error("the change failed");
    });
    await expect(failing).rejects.toThrow("the change failed");
    expect(await AuditEntry.count({ where: { subjectId } })).toBe(0);
  });

  it("are kept in universal time", async () => {
    const [[zone]] = (await database().query("SELECT extract(timezone FROM now())::int AS seconds")) as [
      { seconds: number }[],
      unknown,
    ];
    expect(zone?.seconds).toBe(0);
  });
});
