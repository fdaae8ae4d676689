/** Guards the one shape of refusals, and that nothing of a signed-in person stays in a shared cache. */
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { AppError, STATUS_OF } from "@/lib/http/app-error";
import { fieldErrors, jsonReply, problemReply } from "@/lib/http/reply";
import { Problem, PROBLEM_CODES } from "@/lib/schemas/problem";

describe("a refusal", () => {
  it.each(PROBLEM_CODES)(
    "%s has the shape that the screens read, its status and its request id",
    async (code) => {
      const fields = [{ path: "a.0", message: "No." }];
      const reply = problemReply(
        new AppError(code, "In words.", { fields, current: { version: 3 } }),
        "request 7",
      );
      expect(reply.status).toBe(STATUS_OF[code]);
      expect(reply.headers.get("x-request-id")).toBe("request 7");
      expect(Problem.parse(await reply.json())).toEqual({
        error: { code, message: "In words.", fields, requestId: "request 7", current: { version: 3 } },
      });
    },
  );

  it("names every bad field at once, unknown ones by their own path", () => {
    const shape = z.strictObject({
      a: z.number(),
      b: z.array(z.strictObject({ c: z.string().min(1, "Write c.") })),
    });
    const { error } = shape.safeParse({ a: "1", b: [{ c: "" }, { c: "x", d: 1 }], e: 2 });
    const paths = fieldErrors(error!).map((field) => field.path);
    expect(paths.sort()).toEqual(["a", "b.0.c", "b.1.d", "e"]);
  });
});

it("keeps replies out of shared caches unless the route says otherwise", () => {
  expect(jsonReply({}).headers.get("cache-control")).toBe("private, no-store");
  expect(jsonReply({}, 200, { "cache-control": "private, no-cache" }).headers.get("cache-control")).toBe(
    "private, no-cache",
  );
});
