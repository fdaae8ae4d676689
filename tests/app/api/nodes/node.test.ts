/** Guards the node's document: who may change it, what is refused with a path, and that no save is lost unseen. */
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { DELETE, GET, PUT } from "@/app/api/nodes/[nodeId]/route";
import { GET as revision } from "@/app/api/nodes/[nodeId]/revisions/[version]/route";
import { GET as revisions } from "@/app/api/nodes/[nodeId]/revisions/route";
import { GET as register, POST } from "@/app/api/projects/[projectId]/nodes/route";
import {
  NodeListReply,
  NodeReply,
  NodeRevisionListReply,
  NodeRevisionReply,
  SavedDocument,
} from "@/lib/schemas/node";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { AuditEntry } from "@/models/audit-entry";
import { Comparison } from "@/models/comparison";
import { Node } from "@/models/node";
import { NodeRevision } from "@/models/node-revision";
import { Project } from "@/models/project";
import { ProjectMember } from "@/models/project-member";
import {
  buildNode,
  buildOrganisation,
  type BuiltOrganisation,
  type BuiltPerson,
  buildPerson,
  buildProject,
} from "@/tests/factories/build-organisation";
import { buildNodeDocument } from "@/tests/factories/build-node-document";
import { type Answer, callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
let outsiders: BuiltOrganisation;
let projectId: string;
let designer: BuiltPerson;
let colleague: BuiltPerson;

beforeAll(async () => {
  house = await buildOrganisation();
  outsiders = await buildOrganisation();
  designer = house.people.designer;
  colleague = await buildPerson(house.id, "designer");
  projectId = await buildProject(house, [...Object.values(house.people), colleague]);
});

const documentOf = (changes: Partial<NodeDocument> = {}): NodeDocument =>
  buildNodeDocument({ reference: `N ${randomUUID()}`, ...changes });
const create = (cookie: string | null, document: unknown): Promise<Answer> =>
  callApi(POST, { method: "POST", cookie, params: { projectId }, body: { document } });
const save = (
  cookie: string | null,
  nodeId: string,
  document: unknown,
  expectedVersion: unknown,
): Promise<Answer> =>
  callApi(PUT, { method: "PUT", cookie, params: { nodeId }, body: { document, expectedVersion } });
const remove = (cookie: string | null, nodeId: string, query: string): Promise<Answer> =>
  callApi(DELETE, { method: "DELETE", cookie, params: { nodeId }, query });
const pathsOf = (answer: Answer): string[] =>
  (answer.body as { error: { fields: { path: string }[] } }).error.fields.map((field) => field.path);

describe("entering a node", () => {
  it("keeps the document, its first revision, its comparison and one audit line", async () => {
    const document = documentOf();
    const answer = await create(designer.cookie, document);
    expect(answer.status).toBe(201);
    const { node } = NodeReply.parse(answer.body);
    expect(node).toMatchObject({ document, version: 1, projectId, savedBy: { id: designer.personId } });
    const where = { nodeId: node.id };
    expect(await NodeRevision.count({ where })).toBe(1);
    expect(await Comparison.count({ where })).toBe(1);
    expect(await AuditEntry.count({ where: { subjectId: node.id, action: "node.created" } })).toBe(1);
    const read = await callApi(GET, { cookie: house.people.checker.cookie, params: { nodeId: node.id } });
    expect(NodeReply.parse(read.body).node).toMatchObject({ document, abilities: { editNodes: false } });
  });

  it("is refused to everybody but designers of the project", async () => {
    const document = documentOf();
    expect((await create(null, document)).status).toBe(401);
    expect((await create(outsiders.people.designer.cookie, document)).status).toBe(404);
    for (const role of ["estimator", "fabricator", "checker", "admin"] as const) {
      expect((await create(house.people[role].cookie, document)).status).toBe(403);
    }
    expect(await Node.count({ where: { reference: document.reference } })).toBe(0);
  });

  it("is refused with the path of every fault, unknown names among them", async () => {
    const good = documentOf();
    const bad = { ...good, quantity: 0, colour: "red", column: { ...good.column, storeyHeight: "tall" } };
    const answer = await create(designer.cookie, bad);
    expect(answer.status).toBe(422);
    expect(pathsOf(answer).sort()).toEqual([
      "document.colour",
      "document.column.storeyHeight",
      "document.quantity",
    ]);
    const unknown = { ...good, column: { ...good.column, section: "HE 301 Z" } };
    expect(pathsOf(await create(designer.cookie, unknown))).toContain("document.column.section");
    for (const nothing of [null, "text", [], undefined]) {
      expect((await create(designer.cookie, nothing)).status).toBe(422);
    }
  });

  it("is refused under a mark that stands on the register, beside the field", async () => {
    const document = documentOf();
    expect((await create(designer.cookie, document)).status).toBe(201);
    const again = await create(designer.cookie, document);
    expect(again.status).toBe(422);
    expect(pathsOf(again)).toEqual(["document.reference"]);
  });
});

describe("saving a node", () => {
  it("writes the next version and keeps the one before", async () => {
    const { id, document } = await buildNode(projectId, designer);
    const changed = { ...document, quantity: 5 };
    const answer = await save(designer.cookie, id, changed, 1);
    expect(answer.status).toBe(200);
    expect(NodeReply.parse(answer.body).node).toMatchObject({ version: 2, document: changed });
    const list = await callApi(revisions, { cookie: house.people.checker.cookie, params: { nodeId: id } });
    expect(NodeRevisionListReply.parse(list.body).revisions.map(({ version }) => version)).toEqual([2, 1]);
    const params = { nodeId: id, version: "1" };
    const first = await callApi(revision, { cookie: house.people.checker.cookie, params });
    expect(NodeRevisionReply.parse(first.body).revision).toMatchObject({ version: 1, document });
    for (const version of ["3", "0", "one"]) {
      const none = await callApi(revision, { cookie: designer.cookie, params: { nodeId: id, version } });
      expect(none.status).toBe(404);
    }
  });

  it("is refused: 401 signed out, 404 for outsiders, 403 for readers, 422 for a bad body, 403 from elsewhere", async () => {
    const { id, document } = await buildNode(projectId, designer);
    expect((await save(null, id, document, 1)).status).toBe(401);
    for (const role of ["designer", "admin"] as const) {
      expect((await save(outsiders.people[role].cookie, id, document, 1)).status).toBe(404);
    }
    for (const role of ["estimator", "fabricator", "checker", "admin"] as const) {
      expect((await save(house.people[role].cookie, id, document, 1)).status).toBe(403);
    }
    expect(pathsOf(await save(designer.cookie, id, document, undefined))).toEqual(["expectedVersion"]);
    expect(pathsOf(await save(designer.cookie, id, { ...document, loadCases: [] }, 1))).toEqual([
      "document.loadCases",
    ]);
    const call = {
      method: "PUT",
      cookie: designer.cookie,
      params: { nodeId: id },
      body: { document, expectedVersion: 1 },
    };
    expect((await callApi(PUT, { ...call, origin: "https://elsewhere.example" })).status).toBe(403);
    expect((await callApi(PUT, { ...call, origin: null })).status).toBe(403);
    expect((await Node.findByPk(id, { rejectOnEmpty: true })).version).toBe(1);
  });

  it("from a second tab answers 409 with the other document, its version, who saved it and when", async () => {
    const { id, document } = await buildNode(projectId, designer);
    const theirs = { ...document, quantity: 7 };
    expect((await save(colleague.cookie, id, theirs, 1)).status).toBe(200);
    const answer = await save(designer.cookie, id, { ...document, quantity: 9 }, 1);
    expect(answer.status).toBe(409);
    const { current, message } = (answer.body as { error: { current: unknown; message: string } }).error;
    const shown = SavedDocument.parse(current);
    expect(shown).toMatchObject({
      version: 2,
      document: theirs,
      savedBy: { id: colleague.personId, name: colleague.name },
    });
    expect(Math.abs(Date.now() - Date.parse(shown.savedAt))).toBeLessThan(60_000);
    expect(message).toContain(colleague.name);
    expect((await Node.findByPk(id, { rejectOnEmpty: true })).document.quantity).toBe(7);
  });

  it("twice at the same moment goes through exactly once, however often it is tried", async () => {
    const { id, document } = await buildNode(projectId, designer);
    for (let version = 1; version <= 5; version += 1) {
      const tries = [designer, colleague, designer].map((person, index) =>
        save(person.cookie, id, { ...document, quantity: 100 * version + index }, version),
      );
      const answers = await Promise.all(tries);
      expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409]);
      const winner = answers.findIndex((answer) => answer.status === 200);
      const node = await Node.findByPk(id, { rejectOnEmpty: true });
      expect(node).toMatchObject({ version: version + 1 });
      expect(node.document.quantity).toBe(100 * version + winner);
    }
    expect(await NodeRevision.count({ where: { nodeId: id } })).toBe(6);
  });

  it("is a designer's from another organisation too, once invited; and nobody's when the project is locked", async () => {
    const shared = await buildProject(house, [designer, outsiders.people.designer]);
    const { id, document } = await buildNode(shared, designer);
    expect((await save(outsiders.people.designer.cookie, id, document, 1)).status).toBe(200);
    await Project.update({ lockedAt: new Date() }, { where: { id: shared } });
    expect((await save(designer.cookie, id, document, 2)).status).toBe(403);
    await ProjectMember.destroy({
      where: { projectId: shared, personId: outsiders.people.designer.personId },
    });
    expect((await save(outsiders.people.designer.cookie, id, document, 2)).status).toBe(404);
  });
});

describe("taking a node off the register", () => {
  it("is the designer's, over the version that was open, and keeps what was saved", async () => {
    const { id } = await buildNode(projectId, designer);
    const query = "?expectedVersion=1";
    expect((await remove(null, id, query)).status).toBe(401);
    expect((await remove(outsiders.people.designer.cookie, id, query)).status).toBe(404);
    expect((await remove(house.people.checker.cookie, id, query)).status).toBe(403);
    expect((await remove(designer.cookie, id, "")).status).toBe(422);
    expect((await remove(designer.cookie, id, "?expectedVersion=2")).status).toBe(409);
    expect(await remove(designer.cookie, id, query)).toMatchObject({ status: 200, body: { deleted: true } });
    expect((await callApi(GET, { cookie: designer.cookie, params: { nodeId: id } })).status).toBe(404);
    expect(await NodeRevision.count({ where: { nodeId: id } })).toBe(1);
    expect(await AuditEntry.count({ where: { subjectId: id, action: "node.deleted" } })).toBe(1);
  });
});

describe("the register", () => {
  it("has a row for each node, calculating those that nobody has saved here", async () => {
    const own = await buildProject(house);
    const first = await buildNode(own, designer, { reference: "A1" });
    await buildNode(own, designer, { reference: "A2" });
    const answer = await callApi(register, {
      cookie: house.people.checker.cookie,
      params: { projectId: own },
    });
    const { nodes, money } = NodeListReply.parse(answer.body);
    expect(money).toBe("currency");
    expect(nodes.map((node) => node.reference)).toEqual(["A1", "A2"]);
    expect(nodes[0]).toMatchObject({
      id: first.id,
      column: "HE 300 A",
      quantity: 12,
      version: 1,
      outdated: [],
    });
    for (const node of nodes) {
      expect(node.bare).not.toBeNull();
      expect(node.state).not.toBe("not-compared");
    }
    expect(await Comparison.count({ where: { nodeId: nodes.map((node) => node.id) } })).toBe(2);
    await callApi(register, { cookie: designer.cookie, params: { projectId: own } });
    expect(await Comparison.count({ where: { nodeId: nodes.map((node) => node.id) } })).toBe(2);
  });

  it("is nobody's but the members'", async () => {
    expect((await callApi(register, { params: { projectId } })).status).toBe(401);
    const { cookie } = outsiders.people.designer;
    expect((await callApi(register, { cookie, params: { projectId } })).status).toBe(404);
  });
});
