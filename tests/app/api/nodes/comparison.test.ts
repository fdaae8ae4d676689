/** Guards stored comparisons: never recalculated silently, said to be outdated, and money only for the house. */
import { beforeAll, describe, expect, it } from "vitest";
import { PUT as setPlates } from "@/app/api/catalog/stock-plates/route";
import { GET, POST } from "@/app/api/nodes/[nodeId]/comparison/route";
import { PUT as exclude } from "@/app/api/nodes/[nodeId]/exclusions/route";
import { PUT as saveNode } from "@/app/api/nodes/[nodeId]/route";
import { GET as working } from "@/app/api/nodes/[nodeId]/working/route";
import { GET as register } from "@/app/api/projects/[projectId]/nodes/route";
import { database } from "@/lib/db/transaction";
import { SET_ASIDE } from "@/lib/presenters/present-comparison";
import { type Comparison, ComparisonReply, RecalculationReply, WorkingReply } from "@/lib/schemas/comparison";
import { NodeListReply } from "@/lib/schemas/node";
import { AuditEntry } from "@/models/audit-entry";
import { Comparison as ComparisonRow } from "@/models/comparison";
import {
  buildNode,
  buildOrganisation,
  type BuiltOrganisation,
  buildProject,
} from "@/tests/factories/build-organisation";
import { type Answer, callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
let outsiders: BuiltOrganisation;
let projectId: string;

beforeAll(async () => {
  house = await buildOrganisation();
  outsiders = await buildOrganisation();
  projectId = await buildProject(house, [...Object.values(house.people), outsiders.people.fabricator]);
});

const newNode = async (): Promise<{ id: string; document: Record<string, unknown> }> =>
  buildNode(projectId, house.people.designer);
const ask = (nodeId: string, cookie: string | null): Promise<Answer> =>
  callApi(GET, { cookie, params: { nodeId } });
const read = async (nodeId: string, cookie = house.people.checker.cookie): Promise<Comparison> => {
  const answer = await ask(nodeId, cookie);
  expect(answer.status).toBe(200);
  return ComparisonReply.parse(answer.body).comparison;
};
const recalculate = (nodeId: string, cookie: string | null): Promise<Answer> =>
  callApi(POST, { method: "POST", cookie, params: { nodeId } });
const setExcluded = (nodeId: string, cookie: string | null, optionKeys: unknown): Promise<Answer> =>
  callApi(exclude, { method: "PUT", cookie, params: { nodeId }, body: { optionKeys } });
const rankedKeys = ({ result }: Comparison): string[] =>
  result.options
    .filter((option) => option.rank !== null)
    .sort((a, b) => Number(a.rank) - Number(b.rank))
    .map((option) => option.key);

describe("the comparison of a node", () => {
  it("is calculated at the first reading, kept without steps, and the same at every later one", async () => {
    const { id, document } = await newNode();
    const first = await read(id);
    expect(first).toMatchObject({
      nodeId: id,
      nodeVersion: 1,
      outdated: [],
      excluded: [],
      money: "currency",
    });
    expect(first.result.node).toMatchObject(document);
    expect(first.result.options.length).toBeGreaterThan(3);
    expect(JSON.stringify(first.result)).not.toContain('"steps"');
    expect(await read(id, house.people.designer.cookie)).toEqual(first);
    expect(await ComparisonRow.count({ where: { nodeId: id } })).toBe(1);
  });

  it("is nobody's but the members': 401, 404", async () => {
    const { id } = await newNode();
    expect((await ask(id, null)).status).toBe(401);
    expect((await ask(id, outsiders.people.designer.cookie)).status).toBe(404);
  });

  it("belongs to one version: a save brings another", async () => {
    const { id, document } = await newNode();
    const before = await read(id);
    const body = { document: { ...document, quantity: 3 }, expectedVersion: 1 };
    const call = { method: "PUT", cookie: house.people.designer.cookie, params: { nodeId: id }, body };
    expect((await callApi(saveNode, call)).status).toBe(200);
    const after = await read(id);
    expect(after.id).not.toBe(before.id);
    expect(after).toMatchObject({ nodeVersion: 2, result: { node: { quantity: 3 } } });
  });

  it("shows a member from outside an index and no money", async () => {
    const { id } = await newNode();
    const [inside, outside] = [await read(id), await read(id, outsiders.people.fabricator.cookie)];
    expect(outside.money).toBe("index");
    for (const option of outside.result.options) {
      if (!("estimate" in option)) continue;
      expect(option.estimate).toMatchObject({ currency: "XXX", costByCategory: {}, lines: [] });
    }
    expect(rankedKeys(outside)).toEqual(rankedKeys(inside));
    const params = { projectId };
    const rows = await callApi(register, { cookie: outsiders.people.fabricator.cookie, params });
    expect(NodeListReply.parse(rows.body).money).toBe("index");
  });
});

describe("a comparison that other inputs would change", () => {
  it("stands as it was made and says why it is outdated, until it is recalculated", async () => {
    const { id } = await newNode();
    const before = await read(id);
    const plates = { thicknesses: [7, 14, 21, 28, 35] };
    await callApi(setPlates, { method: "PUT", cookie: house.people.estimator.cookie, body: plates });
    const stale = await read(id);
    expect(stale.id).toBe(before.id);
    expect(stale.result).toEqual(before.result);
    expect(stale.outdated).toEqual([expect.stringMatching(/stock plates/)]);
    const rows = await callApi(register, { cookie: house.people.designer.cookie, params: { projectId } });
    const row = NodeListReply.parse(rows.body).nodes.find((node) => node.id === id);
    expect(row?.outdated).toEqual(stale.outdated);
    const answer = await recalculate(id, house.people.estimator.cookie);
    expect(answer.status).toBe(201);
    const { comparison, differences } = RecalculationReply.parse(answer.body);
    expect(comparison.outdated).toEqual([]);
    expect(comparison.id).not.toBe(before.id);
    expect(await read(id)).toEqual(comparison);
    // The plates of before are gone, so an option that used one has changed.
    expect(differences.length).toBeGreaterThan(0);
    expect(await AuditEntry.count({ where: { subjectId: comparison.id } })).toBe(1);
  });

  it("says so too when engine or rates are newer", async () => {
    const { id } = await newNode();
    const { id: comparisonId } = await read(id);
    // Made by an older engine at older rates: a row of that kind is added, since none is ever changed.
    await database().query(
      `INSERT INTO comparisons (node_id, node_version, engine, prices_key, catalog_key, summary, result, created_by, created_at)
       SELECT node_id, node_version, 'older', 'Older rates #0', catalog_key, summary, result, created_by, now() + interval '1 s'
         FROM comparisons WHERE id = :comparisonId`,
      { replacements: { comparisonId } },
    );
    const stale = await read(id);
    expect(stale).toMatchObject({ engine: "older", pricedBy: "Older rates" });
    expect(stale.outdated).toEqual([expect.stringMatching(/older/), expect.stringMatching(/rates/)]);
    const option = stale.result.options[0]?.key ?? "";
    const answer = await callApi(working, {
      cookie: house.people.checker.cookie,
      params: { nodeId: id },
      query: `?option=${option}`,
    });
    expect(WorkingReply.parse(answer.body).caution).toMatch(/older/);
  });

  it("is recalculated by designer and estimator alone", async () => {
    const { id } = await newNode();
    expect((await recalculate(id, null)).status).toBe(401);
    expect((await recalculate(id, outsiders.people.designer.cookie)).status).toBe(404);
    for (const role of ["fabricator", "checker", "admin"] as const) {
      expect((await recalculate(id, house.people[role].cookie)).status).toBe(403);
    }
    expect(await ComparisonRow.count({ where: { nodeId: id } })).toBe(0);
    expect((await recalculate(id, house.people.designer.cookie)).status).toBe(201);
  });
});

describe("setting options aside", () => {
  it("takes them out of the ranking, for everybody, until they are let in again", async () => {
    const { id } = await newNode();
    const before = rankedKeys(await read(id));
    expect(before.length).toBeGreaterThan(1);
    const [first, ...rest] = before;
    const answer = await setExcluded(id, house.people.designer.cookie, [first]);
    expect(answer).toMatchObject({ status: 200, body: { excluded: [first] } });
    const without = await read(id);
    expect(rankedKeys(without)).toEqual(rest);
    expect(without.result.options.find((option) => option.key === first)).toMatchObject({
      notRanked: SET_ASIDE,
    });
    const rows = await callApi(register, { cookie: house.people.checker.cookie, params: { projectId } });
    const row = NodeListReply.parse(rows.body).nodes.find((node) => node.id === id);
    expect(row?.leading?.key).toBe(rest[0]);
    await setExcluded(id, house.people.designer.cookie, []);
    expect(rankedKeys(await read(id))).toEqual(before);
    expect(await AuditEntry.count({ where: { subjectId: id, action: "node.exclusions-set" } })).toBe(2);
  });

  it("is the designer's: 401, 404, 403, 422", async () => {
    const { id } = await newNode();
    expect((await setExcluded(id, null, [])).status).toBe(401);
    expect((await setExcluded(id, outsiders.people.designer.cookie, [])).status).toBe(404);
    for (const role of ["estimator", "fabricator", "checker", "admin"] as const) {
      expect((await setExcluded(id, house.people[role].cookie, [])).status).toBe(403);
    }
    for (const bad of [undefined, "bare", ["a", "a"], [""], [1]]) {
      expect((await setExcluded(id, house.people.designer.cookie, bad)).status).toBe(422);
    }
  });
});

describe("the working of an option", () => {
  const ofOption = (nodeId: string, cookie: string | null, query: string): Promise<Answer> =>
    callApi(working, { cookie, params: { nodeId }, query });

  it("has every step, and the very numbers of the stored comparison", async () => {
    const { id } = await newNode();
    const comparison = await read(id);
    for (const stored of comparison.result.options) {
      const answer = await ofOption(
        id,
        house.people.checker.cookie,
        `?option=${encodeURIComponent(stored.key)}`,
      );
      expect(answer.status).toBe(200);
      const { option, caution, comparisonId } = WorkingReply.parse(answer.body);
      expect(caution).toBeNull();
      expect(comparisonId).toBe(comparison.id);
      if (!("components" in option)) {
        expect(option).toEqual(stored);
        continue;
      }
      expect(option.components.some((component) => (component.steps?.length ?? 0) > 0)).toBe(true);
      const plain = (text: string): unknown =>
        JSON.parse(text, (key, value: unknown) => (key === "steps" ? undefined : value)) as unknown;
      expect(plain(JSON.stringify(option))).toEqual(stored);
    }
  });

  it("is found only for an option that there is, and by members", async () => {
    const { id } = await newNode();
    const { cookie } = house.people.checker;
    expect((await ofOption(id, cookie, "?option=no-such-option")).status).toBe(404);
    expect((await ofOption(id, cookie, "")).status).toBe(422);
    expect((await ofOption(id, null, "?option=bare")).status).toBe(401);
    expect((await ofOption(id, outsiders.people.designer.cookie, "?option=bare")).status).toBe(404);
  });
});
