/** Guards the plain reads: who am I, is it well, what does the catalogue hold, what are the figures. */
import { beforeAll, describe, expect, it } from "vitest";
import { GET as catalog } from "@/app/api/catalog/route";
import { PUT as setPlates } from "@/app/api/catalog/stock-plates/route";
import { GET as health } from "@/app/api/health/route";
import { GET as me } from "@/app/api/me/route";
import { GET as prices } from "@/app/api/prices/route";
import { revokeSession } from "@/lib/db/repositories/sessions";
import { CatalogReply, StockPlatesReply } from "@/lib/schemas/catalog";
import { Health } from "@/lib/schemas/health";
import { Me } from "@/lib/schemas/me";
import { PricesReply } from "@/lib/schemas/prices";
import { ROLES } from "@/lib/policies/roles";
import { AuditEntry } from "@/models/audit-entry";
import { buildOrganisation, type BuiltOrganisation, buildPerson } from "@/tests/factories/build-organisation";
import { callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
beforeAll(async () => {
  house = await buildOrganisation();
});

describe("who am I", () => {
  it.each(ROLES)("tells a %s name, organisation and abilities, and no id of the session", async (role) => {
    const person = house.people[role];
    const answer = await callApi(me, { cookie: person.cookie });
    expect(answer.status).toBe(200);
    expect(Me.parse(answer.body)).toMatchObject({
      person: { id: person.personId, role, email: person.email },
      organisation: { id: house.id },
      abilities: { createProject: role === "designer", managePeople: role === "admin" },
    });
    expect(JSON.stringify(answer.body)).not.toContain(person.sessionId);
  });

  it("is 401 signed out and as soon as the session was ended", async () => {
    expect((await callApi(me)).status).toBe(401);
    const person = await buildPerson(house.id, "checker");
    expect((await callApi(me, { cookie: person.cookie })).status).toBe(200);
    await revokeSession(person.sessionId, new Date());
    expect(await callApi(me, { cookie: person.cookie })).toMatchObject({
      status: 401,
      body: { error: { code: "sign_in_needed" } },
    });
  });
});

it("tells a monitor that all is well, without a session and without a secret", async () => {
  const answer = await callApi(() => health());
  expect(answer.status).toBe(200);
  expect(Health.parse(answer.body)).toEqual({ ...(answer.body as object), ok: true, database: "reachable" });
  expect(Object.keys(answer.body as object).sort()).toEqual(["database", "engine", "ok", "version"]);
});

describe("the catalogue", () => {
  it("comes whole, and is sent again only when it has changed", async () => {
    const { cookie } = house.people.checker;
    const first = await callApi(catalog, { cookie });
    const { sections, stockPlates } = CatalogReply.parse(first.body);
    expect(sections.length).toBeGreaterThan(200);
    expect(stockPlates.length).toBeGreaterThan(5);
    const etag = first.headers.get("etag") ?? "";
    const again = await callApi(catalog, { cookie, headers: { "if-none-match": etag } });
    expect(again).toMatchObject({ status: 304, body: null });
    await callApi(setPlates, {
      method: "PUT",
      cookie: house.people.estimator.cookie,
      body: { thicknesses: [9, 11, 13] },
    });
    const changed = await callApi(catalog, { cookie, headers: { "if-none-match": etag } });
    expect(changed.status).toBe(200);
    expect(CatalogReply.parse(changed.body).stockPlates.map((plate) => plate.thicknessMm)).toEqual([
      9, 11, 13,
    ]);
  });

  it("is for whoever is signed in", async () => {
    expect((await callApi(catalog)).status).toBe(401);
  });
});

describe("the stock plates", () => {
  const put = (cookie: string | null, thicknesses: unknown) =>
    callApi(setPlates, { method: "PUT", cookie, body: { thicknesses } });

  it("are set by estimator and fabricator, for their own organisation, with an audit line", async () => {
    const other = await buildOrganisation();
    const otherBefore = await callApi(catalog, { cookie: other.people.checker.cookie });
    for (const role of ["estimator", "fabricator"] as const) {
      const { cookie, personId: actorId } = house.people[role];
      const answer = await put(cookie, [20, 8.5]);
      expect(answer.status).toBe(200);
      expect(StockPlatesReply.parse(answer.body).stockPlates.map((plate) => plate.thicknessMm)).toEqual([
        8.5, 20,
      ]);
      expect(await AuditEntry.count({ where: { actorId, action: "stock-plates.set" } })).toBeGreaterThan(0);
    }
    const otherAfter = await callApi(catalog, { cookie: other.people.checker.cookie });
    expect(otherAfter.headers.get("etag")).toBe(otherBefore.headers.get("etag"));
  });

  it("are refused to others, and a list that is none to everybody", async () => {
    expect((await put(null, [10])).status).toBe(401);
    for (const role of ["designer", "checker", "admin"] as const) {
      expect((await put(house.people[role].cookie, [10])).status).toBe(403);
    }
    const { cookie } = house.people.estimator;
    for (const bad of [[], [10, 10], [0], [-5], [1000], ["10"], "10", [null]]) {
      expect((await put(cookie, bad)).status).toBe(422);
    }
  });
});

describe("the figures", () => {
  it("are those in force for one's own organisation", async () => {
    const answer = await callApi(prices, { cookie: house.people.fabricator.cookie });
    expect(answer.status).toBe(200);
    const { rateBook, timeTable } = PricesReply.parse(answer.body).prices;
    expect(rateBook.currency).toMatch(/^[A-Z]{3}$/);
    expect(timeTable.rules.length).toBeGreaterThan(5);
    expect((await callApi(prices)).status).toBe(401);
  });
});
