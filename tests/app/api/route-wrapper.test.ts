/** Guards the order of the door, and that a fault inside is never shown outside. */
import { beforeAll, describe, expect, it } from "vitest";
import { z } from "zod";
import { ProjectPath } from "@/lib/http/paths";
import { route } from "@/lib/http/route";
import {
  buildOrganisation,
  type BuiltOrganisation,
  buildProject,
} from "@/tests/factories/build-organisation";
import { callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
let projectId: string;
let isRun = false;

const guarded = route({
  access: "project",
  params: ProjectPath,
  query: z.object({ page: z.coerce.number().int().positive() }),
  body: z.strictObject({ name: z.string() }),
  run: () => {
    isRun = true;
    return Promise.resolve({ done: true });
  },
});

beforeAll(async () => {
  house = await buildOrganisation();
  projectId = await buildProject(house);
});

describe("the order of the door", () => {
  const everythingWrong = {
    method: "POST",
    origin: "https://elsewhere.example",
    rawBody: "{",
    query: "?page=x",
  };

  it("asks for the origin, then the session, then the membership, then the shape, then lets the work run", async () => {
    const { cookie } = house.people.designer;
    const outsider = (await buildOrganisation()).people.designer.cookie;
    const params = { projectId };
    const own = { ...everythingWrong, origin: "http://127.0.0.1:3000" };
    expect((await callApi(guarded, { ...everythingWrong, params })).status).toBe(403);
    expect((await callApi(guarded, { ...own, params })).status).toBe(401);
    expect((await callApi(guarded, { ...own, params, cookie: outsider })).status).toBe(404);
    expect((await callApi(guarded, { ...own, params, cookie })).status).toBe(422);
    expect(isRun).toBe(false);
    const good = { ...own, params, cookie, rawBody: '{"name":"x"}', query: "?page=2" };
    expect(await callApi(guarded, good)).toMatchObject({ status: 200, body: { done: true } });
    expect(isRun).toBe(true);
  });

  it("names the bad fields of query and body together", async () => {
    const call = { method: "POST", cookie: house.people.designer.cookie, params: { projectId } };
    const answer = await callApi(guarded, { ...call, query: "?page=0", body: { name: 1, extra: 2 } });
    const { fields } = (answer.body as { error: { fields: { path: string }[] } }).error;
    expect(fields.map((field) => field.path).sort()).toEqual(["extra", "name", "page"]);
  });

  it("refuses a body of more than 1 MB with 413", async () => {
    const call = {
      method: "POST",
      cookie: house.people.designer.cookie,
      params: { projectId },
      query: "?page=1",
    };
    const answer = await callApi(guarded, { ...call, body: { name: "x".repeat(1_048_577) } });
    expect(answer).toMatchObject({ status: 413, body: { error: { code: "too_large" } } });
  });
});

it("answers a fault with a request id and nothing of its text", async () => {
  const broken = route({
    access: "signed-in",
    run: () => Promise.reject(new Error("password of the database is hunter2")),
  });
  const answer = await callApi(broken, { cookie: house.people.designer.cookie });
  expect(answer.status).toBe(500);
  expect(JSON.stringify(answer.body)).not.toMatch(/hunter2|password/);
  expect(answer.body).toMatchObject({ error: { code: "unexpected", fields: [] } });
  const { requestId } = (answer.body as { error: { requestId: string } }).error;
  expect(requestId).toMatch(/^[0-9a-f-]{36}$/);
  expect(answer.headers.get("x-request-id")).toBe(requestId);
});
