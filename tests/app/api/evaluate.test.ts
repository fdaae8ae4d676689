/** Guards the open contract of POST /api/evaluate: the node document in, the result document or the errors out. */
import { beforeAll, describe, expect, it } from "vitest";
import { POST } from "@/app/api/evaluate/route";
import { DocumentErrors, ResultDocument } from "@/lib/schemas/result-document";
import { AuditEntry } from "@/models/audit-entry";
import { Comparison } from "@/models/comparison";
import { buildNodeDocument } from "@/tests/factories/build-node-document";
import { buildOrganisation, type BuiltOrganisation } from "@/tests/factories/build-organisation";
import { type Answer, type Call, callApi } from "@/tests/support/api-call";

let house: BuiltOrganisation;
beforeAll(async () => {
  house = await buildOrganisation();
});

const evaluate = (call: Call): Promise<Answer> =>
  callApi(POST, { method: "POST", cookie: house.people.checker.cookie, ...call });
const hasSteps = (answer: Answer): boolean => JSON.stringify(answer.body).includes('"steps":[{');

describe("evaluating a document", () => {
  it("answers the result document, with the working of what governs, and keeps nothing", async () => {
    const counts = async (): Promise<number[]> => [await Comparison.count(), await AuditEntry.count()];
    const before = await counts();
    const document = buildNodeDocument();
    const answer = await evaluate({ body: document });
    expect(answer.status).toBe(200);
    const result = ResultDocument.parse(answer.body);
    expect(result.node).toEqual(document);
    expect(result.options.length).toBeGreaterThan(3);
    expect(hasSteps(answer)).toBe(true);
    expect(await counts()).toEqual(before);
  });

  it("brings as much of the working as is asked for", async () => {
    const body = buildNodeDocument();
    const [none, governing, all] = [
      await evaluate({ body, query: "?steps=none" }),
      await evaluate({ body, query: "?steps=governing" }),
      await evaluate({ body, query: "?steps=all" }),
    ];
    expect(hasSteps(none)).toBe(false);
    const size = (answer: Answer): number => JSON.stringify(answer.body).length;
    expect(size(governing)).toBeGreaterThan(size(none));
    expect(size(all)).toBeGreaterThan(size(governing));
    expect((await evaluate({ body, query: "?steps=some" })).status).toBe(422);
  });

  it("answers a bad document with a path for every fault, in the shape of the contract", async () => {
    const { loadCases, ...incomplete } = buildNodeDocument();
    const answer = await evaluate({ body: { ...incomplete, colour: "red", quantity: -1 } });
    expect(loadCases).toHaveLength(1);
    expect(answer.status).toBe(422);
    expect(Object.keys(answer.body as object)).toEqual(["errors"]);
    const { errors } = DocumentErrors.parse(answer.body);
    expect(errors.map((error) => error.path).sort()).toEqual(["colour", "loadCases", "quantity"]);
  });

  it.each(["", "{", "null", "[]", '"text"', "7"])(
    "answers a body that is no document in the same shape: %j",
    async (rawBody) => {
      const answer = await evaluate({ rawBody });
      expect(answer.status).toBe(422);
      expect(DocumentErrors.parse(answer.body).errors.length).toBeGreaterThan(0);
    },
  );

  it("takes 200 load cases and no more, 1 MB and no more", async () => {
    const [loadCase] = buildNodeDocument().loadCases;
    const many = (count: number) =>
      buildNodeDocument({
        loadCases: Array.from({ length: count }, (_, index) => ({ ...loadCase!, name: `ULS ${index}` })),
        options: [{ key: "bare", name: "Bare column", measures: [] }],
      });
    expect((await evaluate({ body: many(200) })).status).toBe(200);
    const tooMany = await evaluate({ body: many(201) });
    expect(tooMany.status).toBe(422);
    expect(DocumentErrors.parse(tooMany.body).errors[0]?.path).toBe("loadCases");
    expect((await evaluate({ rawBody: " ".repeat(1_048_577) })).status).toBe(413);
  });

  it("needs a session and a page of this site", async () => {
    const body = buildNodeDocument();
    expect((await evaluate({ body, cookie: null })).status).toBe(401);
    expect((await evaluate({ body, origin: "https://elsewhere.example" })).status).toBe(403);
    expect((await evaluate({ body, origin: null })).status).toBe(403);
  });
});
