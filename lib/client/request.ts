import type { z } from "zod";
import { ApiProblem, problemFrom } from "./api-problem";

export interface RequestSettings {
  readonly method?: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  readonly body?: unknown;
  readonly signal?: AbortSignal;
}

async function send(path: string, { method = "GET", body, signal }: RequestSettings): Promise<Response> {
  const init: RequestInit = { method, headers: { accept: "application/json" }, credentials: "same-origin" };
  if (signal !== undefined) init.signal = signal;
  if (body !== undefined) {
    init.headers = { accept: "application/json", "content-type": "application/json" };
    init.body = JSON.stringify(body);
  }
  try {
    return await fetch(path, init);
  } catch (error) {
    if (error instanceof DOMException && error.name === "AbortError") throw error;
    throw new ApiProblem(0, "unreachable", "The server did not answer. Nothing was saved; try again.");
  }
}

/**
 * Sends a request to the API of this site and reads the reply with the shared schema.
 *
 * @throws ApiProblem for every refusal, an unreadable reply and a server that does not answer.
 */
export async function request<T extends z.ZodType>(
  reply: T,
  path: string,
  settings: RequestSettings = {},
): Promise<z.output<T>> {
  const response = await send(path, settings);
  const body: unknown = await response.json().catch(() => null);
  if (!response.ok) throw problemFrom(response.status, body);
  const parsed = reply.safeParse(body);
  if (!parsed.success) {
    throw new ApiProblem(
      response.status,
      "unexpected",
      "The server gave an answer that this page cannot read. Load it again.",
    );
  }
  return parsed.data;
}
