import type { z } from "zod";
import type { FieldError, Problem } from "@/lib/schemas/problem";
import { type AppError, STATUS_OF } from "./app-error";

/** Whatever is signed in for must not stay in a shared cache; a route that may be cached says so itself. */
const PRIVATE = { "cache-control": "private, no-store" };

export function jsonReply(body: unknown, status = 200, headers: Record<string, string> = {}): Response {
  return Response.json(body, { status, headers: { ...PRIVATE, ...headers } });
}

/** A refusal in the one shape of the API. */
export function problemReply(error: AppError, requestId: string): Response {
  const body: Problem = {
    error: {
      code: error.code,
      message: error.message,
      fields: [...error.fields],
      requestId,
      ...(error.current === undefined ? {} : { current: error.current }),
    },
  };
  return jsonReply(body, STATUS_OF[error.code], { "x-request-id": requestId });
}

/** Every fault that the schema found, each with its path in dots. */
export function fieldErrors(error: z.ZodError, prefix: readonly string[] = []): FieldError[] {
  return error.issues.flatMap((issue) => {
    const path = [...prefix, ...issue.path.map(String)];
    // One entry for each unknown name, so that it can be pointed at.
    if (issue.code === "unrecognized_keys") {
      return issue.keys.map((key) => ({
        path: [...path, key].join("."),
        message: "There is no such field.",
      }));
    }
    return [{ path: path.join("."), message: issue.message }];
  });
}
