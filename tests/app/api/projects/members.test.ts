/** Guards who lets whom into a project, people of other organisations included. */
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { DELETE } from "@/app/api/projects/[projectId]/members/[personId]/route";
import { GET, POST } from "@/app/api/projects/[projectId]/members/route";
import { GET as readProject } from "@/app/api/projects/[projectId]/route";
import { MembersReply } from "@/lib/schemas/members";
import { AuditEntry } from "@/models/audit-entry";
import { Person } from "@/models/person";
import {
  buildOrganisation,
  type BuiltOrganisation,
  buildPerson,
  buildProject,
} from "@/tests/factories/build-organisation";
import { type Answer, callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
let outsiders: BuiltOrganisation;
let projectId: string;

beforeAll(async () => {
  house = await buildOrganisation();
  outsiders = await buildOrganisation();
  projectId = await buildProject(house, [house.people.designer, house.people.checker]);
});

const add = (cookie: string | null, email: unknown): Promise<Answer> =>
  callApi(POST, { method: "POST", cookie, params: { projectId }, body: { email } });
const remove = (cookie: string | null, personId: string): Promise<Answer> =>
  callApi(DELETE, { method: "DELETE", cookie, params: { projectId, personId } });
const sees = async (cookie: string): Promise<boolean> =>
  (await callApi(readProject, { cookie, params: { projectId } })).status === 200;

describe("letting somebody in", () => {
  it("opens the project to a person of another organisation, and taking them out shuts it", async () => {
    const { cookie } = house.people.designer;
    const guest = outsiders.people.fabricator;
    expect(await sees(guest.cookie)).toBe(false);
    const answer = await add(cookie, ` ${guest.email.toUpperCase()} `);
    expect(answer.status).toBe(200);
    const { members, canManage } = MembersReply.parse(answer.body);
    expect(canManage).toBe(true);
    expect(members.map((member) => member.personId)).toContain(guest.personId);
    expect(JSON.stringify(answer.body)).not.toContain("@");
    expect(await sees(guest.cookie)).toBe(true);
    expect((await remove(cookie, guest.personId)).status).toBe(200);
    expect(await sees(guest.cookie)).toBe(false);
    for (const action of ["project.member-added", "project.member-removed"]) {
      expect(await AuditEntry.count({ where: { projectId, action, subjectId: guest.personId } })).toBe(1);
    }
  });

  it("is for the project's designers and the admin: 401, 404, 403", async () => {
    const { email } = house.people.estimator;
    expect((await add(null, email)).status).toBe(401);
    expect((await add(outsiders.people.admin.cookie, email)).status).toBe(404);
    expect((await add(house.people.checker.cookie, email)).status).toBe(403);
    expect((await remove(house.people.checker.cookie, house.people.designer.personId)).status).toBe(403);
    expect((await add(house.people.admin.cookie, email)).status).toBe(200);
    const guest = outsiders.people.designer;
    await add(house.people.designer.cookie, guest.email);
    expect((await add(guest.cookie, outsiders.people.admin.email)).status).toBe(403);
  });

  it("is refused for an e-mail that is none, that nobody has, or of somebody who has left", async () => {
    const { cookie } = house.people.designer;
    const gone = await buildPerson(house.id, "checker");
    await Person.update({ deactivatedAt: new Date() }, { where: { id: gone.personId } });
    for (const email of ["nobody", "", 7, `${randomUUID()}@nobody.example`, gone.email]) {
      const answer = await add(cookie, email);
      expect(answer).toMatchObject({ status: 422, body: { error: { fields: [{ path: "email" }] } } });
    }
  });
});

describe("taking somebody out", () => {
  it("keeps the last designer of the house in", async () => {
    const { cookie, personId } = house.people.designer;
    expect((await remove(cookie, personId)).status).toBe(422);
    expect(await sees(cookie)).toBe(true);
    const second = await buildPerson(house.id, "designer");
    await add(cookie, second.email);
    expect((await remove(second.cookie, personId)).status).toBe(200);
    expect(await sees(cookie)).toBe(false);
    expect((await remove(second.cookie, personId)).status).toBe(404);
    const members = await callApi(GET, { cookie: house.people.checker.cookie, params: { projectId } });
    expect(MembersReply.parse(members.body)).toMatchObject({ canManage: false });
  });
});
