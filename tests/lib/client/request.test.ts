/** Guards how the screens hear of refusals: as a typed problem with every field, never as a broken page. */
import { QueryClient } from "@tanstack/react-query";
import { afterEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { ApiProblem } from "@/lib/client/api-problem";
import { comparisonKeys, nodeKeys, projectKeys } from "@/lib/client/keys";
import { saveNode, saveNodeMutation } from "@/lib/client/mutations";
import { request } from "@/lib/client/request";
import { buildNodeDocument } from "@/tests/factories/build-node-document";

const answer = (status: number, body: unknown): void => {
  const text = typeof body === "string" ? body : JSON.stringify(body);
  vi.stubGlobal(
    "fetch",
    vi.fn(() => Promise.resolve(new Response(text, { status }))),
  );
};
const sent = (): { path: string; init: RequestInit } => {
  const [path, init] = vi.mocked(fetch).mock.calls[0] as [string, RequestInit];
  return { path, init };
};
const Reply = z.object({ value: z.number() });
const NODE_ID = "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6e";
const PERSON = { id: "9a1c5a52-93a9-4a36-8f2b-0d6a6a2b7b11", name: "Maren Oake" };
const saved = {
  document: buildNodeDocument(),
  version: 4,
  savedBy: PERSON,
  savedAt: "2026-11-30T12:00:00.000Z",
};

afterEach(() => vi.unstubAllGlobals());

describe("a request", () => {
  it("sends JSON and reads the reply with its schema", async () => {
    answer(200, { value: 7, more: "is left out" });
    expect(await request(Reply, "/api/x", { method: "PUT", body: { a: 1 } })).toEqual({ value: 7 });
    expect(sent().path).toBe("/api/x");
    expect(sent().init).toMatchObject({ method: "PUT", body: '{"a":1}', credentials: "same-origin" });
  });

  it("turns a refusal into a problem with its fields", async () => {
    const fields = [
      { path: "document.column.section", message: "There is no such section." },
      { path: "expectedVersion", message: "Say which." },
    ];
    answer(422, { error: { code: "invalid", message: "No.", fields, requestId: "r" } });
    const problem = await request(Reply, "/api/x").catch((error: unknown) => error);
    expect(problem).toBeInstanceOf(ApiProblem);
    expect(problem).toMatchObject({ status: 422, code: "invalid", message: "No.", fields, requestId: "r" });
    expect((problem as ApiProblem).messageFor("expectedVersion")).toBe("Say which.");
    expect((problem as ApiProblem).documentFields()).toEqual([
      { path: "column.section", message: "There is no such section." },
    ]);
  });

  it.each([
    [500, "<html>proxy error</html>"],
    [502, ""],
    [200, { value: "seven" }],
    [200, "not json"],
  ])("says in words that an answer cannot be read: %s %j", async (status, body) => {
    answer(status, body);
    await expect(request(Reply, "/api/x")).rejects.toMatchObject({
      name: "ApiProblem",
      code: "unexpected",
      status,
    });
  });

  it("says that the server did not answer, and lets a cancelled request be cancelled", async () => {
    vi.stubGlobal("fetch", () => Promise.reject(new TypeError("fetch failed")));
    await expect(request(Reply, "/api/x")).rejects.toMatchObject({ name: "ApiProblem", code: "unreachable" });
    vi.stubGlobal("fetch", () => Promise.reject(new DOMException("stopped", "AbortError")));
    await expect(request(Reply, "/api/x")).rejects.toMatchObject({ name: "AbortError" });
  });
});

describe("saving a node", () => {
  const input = { document: buildNodeDocument(), expectedVersion: 3 };
  const conflict = { code: "conflict", message: "Somebody saved first.", fields: [], requestId: "r" };

  it("gives the other version where somebody saved first", async () => {
    answer(409, { error: { ...conflict, current: saved } });
    const result = await saveNode(NODE_ID, input);
    expect(result).toEqual({ kind: "conflict", message: "Somebody saved first.", current: saved });
  });

  it("leaves the cache alone after a conflict and throws every other refusal", async () => {
    const client = new QueryClient();
    client.setQueryData(nodeKeys.one(NODE_ID), "mine");
    answer(409, { error: { ...conflict, current: saved } });
    await client.getMutationCache().build(client, saveNodeMutation(client, NODE_ID)).execute(input);
    expect(client.getQueryData(nodeKeys.one(NODE_ID))).toBe("mine");
    answer(403, { error: { code: "forbidden", message: "No.", fields: [], requestId: "r" } });
    await expect(saveNode(NODE_ID, input)).rejects.toMatchObject({ code: "forbidden" });
  });

  it("puts the saved node into the cache and has comparison and register read again", async () => {
    const client = new QueryClient();
    const projectId = "0b0f6f0e-54a1-4a52-8d2f-6f4a30a0e1a1";
    const abilities = { edit: true, editNodes: true, recalculate: true, seeMoney: true };
    const node = { ...saved, id: NODE_ID, projectId, projectName: "Hall", excluded: [], abilities };
    client.setQueryData(comparisonKeys.ofNode(NODE_ID), "old");
    client.setQueryData(projectKeys.nodes(projectId), "old");
    answer(200, { node });
    await client.getMutationCache().build(client, saveNodeMutation(client, NODE_ID)).execute(input);
    expect(client.getQueryData(nodeKeys.one(NODE_ID))).toEqual(node);
    expect(client.getQueryState(comparisonKeys.ofNode(NODE_ID))?.isInvalidated).toBe(true);
    expect(client.getQueryState(projectKeys.nodes(projectId))?.isInvalidated).toBe(true);
  });
});
