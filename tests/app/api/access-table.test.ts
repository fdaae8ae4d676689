/**
 * Guards every route at once: the folder of the API is walked, and a route that is not in this table, or
 * that lets somebody else in than the table says, fails. Each call is made as every role of the own
 * organisation, as a designer of another one, and signed out.
 */
import { randomUUID } from "node:crypto";
import { readdirSync } from "node:fs";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { beforeAll, describe, expect, it } from "vitest";
import { type Role, ROLES } from "@/lib/policies/roles";
import {
  buildNode,
  buildOrganisation,
  type BuiltOrganisation,
  buildProject,
} from "@/tests/factories/build-organisation";
import { buildNodeDocument } from "@/tests/factories/build-node-document";
import { type Call, callApi, type Handler } from "@/tests/support/api-call";

const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;
type Method = (typeof METHODS)[number];

interface Target {
  readonly projectId: string;
  readonly nodeId: string;
}

interface Line {
  readonly allowed: readonly Role[];
  /** Whether somebody of another organisation, no member, is told that it does not exist. */
  readonly hidesFromOthers: boolean;
  /** Statuses of whoever is past the door, where the call is one that changes nothing; left out = 200 or 201. */
  readonly past?: readonly number[];
  readonly call?: (target: Target) => Call;
}

const all = [...ROLES];
const save = { document: buildNodeDocument(), expectedVersion: 99 };

/** Everything that needs a session: method and path, the roles that may, and a call that is in order. */
const TABLE: Readonly<Record<string, Line>> = {
  "GET me": { allowed: all, hidesFromOthers: false },
  "GET tokens": { allowed: all, hidesFromOthers: false },
  "POST tokens": {
    allowed: all,
    hidesFromOthers: false,
    call: () => ({ body: { name: "Table", days: 30 } }),
  },
  // A token that nobody has: past the door it is 404, for everybody alike.
  "DELETE tokens/[tokenId]": { allowed: all, hidesFromOthers: true, past: [404] },
  "GET prices": { allowed: all, hidesFromOthers: false },
  "GET catalog": { allowed: all, hidesFromOthers: false },
  "PUT catalog/stock-plates": {
    allowed: ["estimator", "fabricator"],
    hidesFromOthers: false,
    call: () => ({ body: { thicknesses: [10, 20] } }),
  },
  "POST evaluate": { allowed: all, hidesFromOthers: false, call: () => ({ body: buildNodeDocument() }) },
  "GET projects": { allowed: all, hidesFromOthers: false },
  "POST projects": {
    allowed: ["designer"],
    hidesFromOthers: false,
    call: () => ({ body: { name: `Table ${randomUUID()}` } }),
  },
  "GET projects/[projectId]": { allowed: all, hidesFromOthers: true },
  "PATCH projects/[projectId]": {
    allowed: ["designer"],
    hidesFromOthers: true,
    past: [409],
    call: () => ({ body: { description: "x", expectedVersion: 99 } }),
  },
  "GET projects/[projectId]/members": { allowed: all, hidesFromOthers: true },
  // An e-mail that nobody has: past the door it is 422, and nobody new is let in.
  "POST projects/[projectId]/members": {
    allowed: ["designer", "admin"],
    hidesFromOthers: true,
    past: [422],
    call: () => ({ body: { email: "nobody@nobody.example" } }),
  },
  // A person who is no member: past the door it is 404.
  "DELETE projects/[projectId]/members/[personId]": {
    allowed: ["designer", "admin"],
    hidesFromOthers: true,
    past: [404],
  },
  "GET projects/[projectId]/nodes": { allowed: all, hidesFromOthers: true },
  "POST projects/[projectId]/nodes": {
    allowed: ["designer"],
    hidesFromOthers: true,
    call: () => ({ body: { document: buildNodeDocument({ reference: `T ${randomUUID()}` }) } }),
  },
  "GET nodes/[nodeId]": { allowed: all, hidesFromOthers: true },
  // A version that nobody has: past the door it is a conflict, and the node stays as it is.
  "PUT nodes/[nodeId]": {
    allowed: ["designer"],
    hidesFromOthers: true,
    past: [409],
    call: () => ({ body: save }),
  },
  "DELETE nodes/[nodeId]": {
    allowed: ["designer"],
    hidesFromOthers: true,
    past: [409],
    call: () => ({ query: "?expectedVersion=99" }),
  },
  "GET nodes/[nodeId]/comparison": { allowed: all, hidesFromOthers: true },
  "POST nodes/[nodeId]/comparison": { allowed: ["designer", "estimator"], hidesFromOthers: true },
  "GET nodes/[nodeId]/working": {
    allowed: all,
    hidesFromOthers: true,
    call: () => ({ query: "?option=bare" }),
  },
  "PUT nodes/[nodeId]/exclusions": {
    allowed: ["designer"],
    hidesFromOthers: true,
    call: () => ({ body: { optionKeys: [] } }),
  },
  "GET nodes/[nodeId]/revisions": { allowed: all, hidesFromOthers: true },
  "GET nodes/[nodeId]/revisions/[version]": { allowed: all, hidesFromOthers: true },
};

/** Open to everybody, each for its reason. */
const OPEN: Readonly<Record<string, string>> = {
  "GET health": "a monitor has no session",
  "GET auth/[...nextauth]": "getting in",
  "POST auth/[...nextauth]": "getting in",
};

const API = path.join(process.cwd(), "app", "api");
const files = readdirSync(API, { recursive: true, encoding: "utf8" })
  .filter((file) => file.endsWith("route.ts"))
  .sort();

const handlers = new Map<string, Handler>();
let house: BuiltOrganisation;
let stranger: string;
let target: Target;

beforeAll(async () => {
  for (const file of files) {
    const routes = (await import(/* @vite-ignore */ pathToFileURL(path.join(API, file)).href)) as Partial<
      Record<Method, Handler>
    >;
    for (const method of METHODS) {
      const handler = routes[method];
      if (handler) handlers.set(`${method} ${path.dirname(file)}`, handler);
    }
  }
  house = await buildOrganisation();
  stranger = (await buildOrganisation()).people.designer.cookie;
  const projectId = await buildProject(house);
  target = { projectId, nodeId: (await buildNode(projectId, house.people.designer)).id };
});

async function statusOf(name: string, cookie: string | null, change: Partial<Call> = {}): Promise<number> {
  const handler = handlers.get(name);
  if (!handler) throw new Error(`There is no route ${name}.`);
  const params = { ...target, version: "1", personId: randomUUID(), tokenId: randomUUID() };
  const call = TABLE[name]?.call?.(target) ?? {};
  const answer = await callApi(handler, { method: name.split(" ")[0]!, cookie, params, ...call, ...change });
  return answer.status;
}

it("lists every route that there is, and none that there is not", () => {
  expect(files.length).toBeGreaterThan(10);
  expect([...handlers.keys()].sort()).toEqual([...Object.keys(TABLE), ...Object.keys(OPEN)].sort());
});

describe.each(Object.entries(TABLE))("%s", (name, line) => {
  it("is 401 signed out", async () => {
    expect(await statusOf(name, null)).toBe(401);
  });

  it.each(ROLES)("is open or shut to a %s as the table says", async (role) => {
    const status = await statusOf(name, house.people[role].cookie);
    if (line.allowed.includes(role)) expect(line.past ?? [200, 201]).toContain(status);
    else expect(status).toBe(403);
  });

  it("does not exist for another organisation where it belongs to a project", async () => {
    const status = await statusOf(name, stranger);
    if (line.hidesFromOthers) expect(status).toBe(404);
    else expect(status).not.toBe(404);
  });

  it("takes a write only from this site", async () => {
    const status = await statusOf(name, house.people.designer.cookie, {
      origin: "https://elsewhere.example",
    });
    if (name.startsWith("GET ")) expect(status).not.toBe(401);
    else expect(status).toBe(403);
  });
});
