/** Guards who sees and changes which project. */
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { GET as readOne, PATCH } from "@/app/api/projects/[projectId]/route";
import { GET as list, POST } from "@/app/api/projects/route";
import { ProjectListReply, ProjectReply } from "@/lib/schemas/project";
import { AuditEntry } from "@/models/audit-entry";
import { Project } from "@/models/project";
import {
  buildOrganisation,
  type BuiltOrganisation,
  buildProject,
} from "@/tests/factories/build-organisation";
import { callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
let outsiders: BuiltOrganisation;
let projectId: string;

beforeAll(async () => {
  house = await buildOrganisation();
  outsiders = await buildOrganisation();
  const invited = outsiders.people.fabricator;
  const { designer, estimator } = house.people;
  projectId = await buildProject(house, [designer, estimator, invited]);
});

const idsFor = async (cookie: string): Promise<string[]> =>
  ProjectListReply.parse((await callApi(list, { cookie })).body).projects.map((project) => project.id);

describe("the list of projects", () => {
  it("is those one is a member of, from whichever organisation; an admin sees all of the own", async () => {
    const { designer, estimator, checker, admin } = house.people;
    for (const { cookie } of [designer, estimator, admin, outsiders.people.fabricator]) {
      expect(await idsFor(cookie)).toContain(projectId);
    }
    for (const { cookie } of [checker, outsiders.people.admin, outsiders.people.designer]) {
      expect(await idsFor(cookie)).toEqual([]);
    }
  });
});

describe("one project", () => {
  it("comes with what the one who asks may do", async () => {
    const abilitiesOf = async (cookie: string) =>
      ProjectReply.parse((await callApi(readOne, { cookie, params: { projectId } })).body).project.abilities;
    expect(await abilitiesOf(house.people.designer.cookie)).toEqual({
      edit: true,
      editNodes: true,
      recalculate: true,
      seeMoney: true,
    });
    expect(await abilitiesOf(house.people.estimator.cookie)).toMatchObject({
      editNodes: false,
      recalculate: true,
    });
    expect(await abilitiesOf(outsiders.people.fabricator.cookie)).toEqual({
      edit: false,
      editNodes: false,
      recalculate: false,
      seeMoney: false,
    });
  });

  it("does not exist for anybody else, nor under an address that is none", async () => {
    for (const { cookie } of [house.people.checker, outsiders.people.designer, outsiders.people.admin]) {
      expect((await callApi(readOne, { cookie, params: { projectId } })).status).toBe(404);
    }
    const { cookie } = house.people.designer;
    for (const odd of [randomUUID(), "1", "../x", ""]) {
      expect((await callApi(readOne, { cookie, params: { projectId: odd } })).status).toBe(404);
    }
  });
});

describe("opening a project", () => {
  const name = (): string => `Opened ${randomUUID()}`;

  it("makes its designer a member and writes one audit line", async () => {
    const { designer } = house.people;
    const answer = await callApi(POST, {
      method: "POST",
      cookie: designer.cookie,
      body: { name: name(), description: "Hall" },
    });
    expect(answer.status).toBe(201);
    const { project } = ProjectReply.parse(answer.body);
    expect(project).toMatchObject({
      description: "Hall",
      version: 1,
      nodeCount: 0,
      abilities: { edit: true },
    });
    expect(await idsFor(designer.cookie)).toContain(project.id);
    expect(await AuditEntry.count({ where: { projectId: project.id, action: "project.created" } })).toBe(1);
  });

  it("is refused: 401 signed out, 403 other roles, 403 from another site, 422 with every bad field", async () => {
    const call = { method: "POST", body: { name: name() } };
    expect((await callApi(POST, call)).status).toBe(401);
    for (const role of ["estimator", "fabricator", "checker", "admin"] as const) {
      expect((await callApi(POST, { ...call, cookie: house.people[role].cookie })).status).toBe(403);
    }
    const { cookie } = house.people.designer;
    const elsewhere = await callApi(POST, { ...call, cookie, origin: "https://elsewhere.example" });
    expect(elsewhere).toMatchObject({ status: 403, body: { error: { code: "other_origin" } } });
    const bad = await callApi(POST, { ...call, cookie, body: { name: " ", description: 7, owner: "me" } });
    expect(bad.status).toBe(422);
    const { fields } = (bad.body as { error: { fields: { path: string }[] } }).error;
    expect(fields.map((field) => field.path).sort()).toEqual(["description", "name", "owner"]);
    expect(await Project.count({ where: { name: call.body.name } })).toBe(0);
  });

  it("is refused under a name that is taken, beside the field", async () => {
    const { cookie } = house.people.designer;
    const body = { name: name() };
    expect((await callApi(POST, { method: "POST", cookie, body })).status).toBe(201);
    const again = await callApi(POST, { method: "POST", cookie, body });
    expect(again).toMatchObject({ status: 422, body: { error: { fields: [{ path: "name" }] } } });
  });
});

describe("changing a project", () => {
  const change = (cookie: string | null, body: unknown, id = projectId) =>
    callApi(PATCH, { method: "PATCH", cookie, body, params: { projectId: id } });
  const versionNow = async (): Promise<number> =>
    (await Project.findByPk(projectId, { rejectOnEmpty: true })).version;

  it("is the designer's: 401, 404 for outsiders, 403 for the other members", async () => {
    const body = { description: "Changed", expectedVersion: await versionNow() };
    expect((await change(null, body)).status).toBe(401);
    expect((await change(outsiders.people.designer.cookie, body)).status).toBe(404);
    expect((await change(house.people.estimator.cookie, body)).status).toBe(403);
    expect((await change(outsiders.people.fabricator.cookie, body)).status).toBe(403);
    const changed = await change(house.people.designer.cookie, body);
    expect(changed.status).toBe(200);
    expect(ProjectReply.parse(changed.body).project).toMatchObject({
      description: "Changed",
      version: body.expectedVersion + 1,
    });
  });

  it("is refused over a version that somebody else has replaced, with what stands now", async () => {
    const { cookie } = house.people.designer;
    const expectedVersion = await versionNow();
    expect((await change(cookie, { description: "First", expectedVersion })).status).toBe(200);
    const late = await change(cookie, { description: "Second", expectedVersion });
    expect(late).toMatchObject({
      status: 409,
      body: { error: { code: "conflict", current: { description: "First", version: expectedVersion + 1 } } },
    });
  });

  it("is nobody's once the project is locked", async () => {
    const locked = await buildProject(house);
    await Project.update({ lockedAt: new Date() }, { where: { id: locked } });
    expect(
      (await change(house.people.designer.cookie, { name: "New", expectedVersion: 1 }, locked)).status,
    ).toBe(403);
  });
});
