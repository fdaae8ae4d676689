/** Guards access tokens: shown once, kept as a digest, good for evaluating and for nothing else, ended at once. */
import { beforeEach, describe, expect, it } from "vitest";
import { GET as GET_ME } from "@/app/api/me/route";
import { POST as EVALUATE } from "@/app/api/evaluate/route";
import { DELETE } from "@/app/api/tokens/[tokenId]/route";
import { GET, POST } from "@/app/api/tokens/route";
import { AccessTokensReply, CreatedAccessTokenReply } from "@/lib/schemas/access-token";
import { AccessToken } from "@/models/access-token";
import { AuditEntry } from "@/models/audit-entry";
import { Person } from "@/models/person";
import { buildNodeDocument } from "@/tests/factories/build-node-document";
import { buildOrganisation, type BuiltOrganisation } from "@/tests/factories/build-organisation";
import { type Answer, callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
beforeEach(async () => {
  house = await buildOrganisation();
});

async function issue(name = "Nightly run"): Promise<{ key: string; id: string }> {
  const answer = await callApi(POST, {
    method: "POST",
    cookie: house.people.estimator.cookie,
    body: { name, days: 30 },
  });
  expect(answer.status).toBe(201);
  const { key, tokens } = CreatedAccessTokenReply.parse(answer.body);
  return { key, id: tokens[0]?.id ?? "" };
}

const evaluateWith = (authorization: string): Promise<Answer> =>
  callApi(EVALUATE, {
    method: "POST",
    origin: null,
    headers: { authorization },
    body: buildNodeDocument(),
    query: "?steps=none",
  });

const revoke = (id: string, cookie: string): Promise<Answer> =>
  callApi(DELETE, { method: "DELETE", cookie, params: { tokenId: id } });

describe("an access token", () => {
  it("evaluates a document without a session and without an Origin, and notes that it was used", async () => {
    const { key, id } = await issue();
    expect((await evaluateWith(`Bearer ${key}`)).status).toBe(200);
    expect((await evaluateWith(`bearer ${key}`)).status).toBe(200);
    expect((await AccessToken.findByPk(id))?.lastUsedAt).toBeInstanceOf(Date);
  });

  it("is kept as a digest only and never listed with its key", async () => {
    const { key } = await issue();
    const stored = await AccessToken.findAll({ raw: true });
    expect(JSON.stringify(stored)).not.toContain(key);
    const listed = await callApi(GET, { cookie: house.people.estimator.cookie });
    expect(JSON.stringify(listed.body)).not.toContain(key);
    expect(AccessTokensReply.parse(listed.body).tokens.map(({ name, hint }) => [name, hint])).toEqual([
      ["Nightly run", key.slice(0, 8)],
    ]);
  });

  it("opens no other route", async () => {
    const { key } = await issue();
    const answer = await callApi(GET_ME, { headers: { authorization: `Bearer ${key}` } });
    expect(answer.status).toBe(401);
  });

  it.each([
    ["revoked", async (id: string) => void (await revoke(id, house.people.estimator.cookie))],
    [
      "expired",
      async (id: string) =>
        void (await AccessToken.update(
          { createdAt: new Date("2026-01-01"), expiresAt: new Date("2026-01-02") },
          { where: { id } },
        )),
    ],
    [
      "of somebody who left",
      async () =>
        void (await Person.update(
          { deactivatedAt: new Date() },
          { where: { id: house.people.estimator.personId } },
        )),
    ],
  ])("opens nothing once it is %s", async (_, end) => {
    const { key, id } = await issue();
    await end(id);
    const answer = await evaluateWith(`Bearer ${key}`);
    expect(answer.status).toBe(401);
    expect(JSON.stringify(answer.body)).toMatch(/Make a new one under Access tokens/);
  });

  it.each(["Bearer", "Bearer pw_short", "Basic cHc6", "Bearer one two", ""])(
    "is not made up: %j",
    async (authorization) => {
      expect((await evaluateWith(authorization)).status).toBe(401);
    },
  );

  it("is a matter between a person and the program: nobody else sees or ends it", async () => {
    const { key, id } = await issue();
    const others = await callApi(GET, { cookie: house.people.admin.cookie });
    expect(AccessTokensReply.parse(others.body).tokens).toEqual([]);
    expect((await revoke(id, house.people.admin.cookie)).status).toBe(404);
    expect((await evaluateWith(`Bearer ${key}`)).status).toBe(200);
  });

  it("leaves a line in the audit trail when it is issued and when it is revoked", async () => {
    const { id } = await issue();
    await revoke(id, house.people.estimator.cookie);
    const lines = await AuditEntry.findAll({ where: { subjectId: id }, order: [["id", "ASC"]] });
    expect(lines.map(({ action }) => action)).toEqual(["access-token.issued", "access-token.revoked"]);
  });

  it("needs a name and a term, and there are twenty at most", async () => {
    const bad = await callApi(POST, {
      method: "POST",
      cookie: house.people.estimator.cookie,
      body: { name: " ", days: 7 },
    });
    expect(bad.status).toBe(422);
    expect(JSON.stringify(bad.body)).toMatch(/Say what the token is for/);
    for (let count = 0; count < 20; count += 1) await issue(`Program ${count}`);
    const more = await callApi(POST, {
      method: "POST",
      cookie: house.people.estimator.cookie,
      body: { name: "One more", days: 30 },
    });
    expect(more.status).toBe(422);
    expect(JSON.stringify(more.body)).toMatch(/20 tokens already/);
  });
});
