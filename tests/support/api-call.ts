import { sessionCookieName, writeSessionToken } from "@/lib/auth/session-cookie";
import { environment } from "@/lib/config/env";
import { createSession } from "@/lib/db/repositories/sessions";
import { inTransaction } from "@/lib/db/transaction";

/** The site that the tests pretend to be on. */
export const OWN_ORIGIN = "http://127.0.0.1:3000";

export type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string | string[] | undefined>> },
) => Promise<Response>;

export interface Call {
  readonly method?: string;
  readonly params?: Record<string, string>;
  readonly query?: string;
  readonly body?: unknown;
  /** Sent instead of `body`, as it stands. */
  readonly rawBody?: string;
  readonly cookie?: string | null;
  /** Null = no Origin header. */
  readonly origin?: string | null;
  readonly headers?: Record<string, string>;
}

export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  readonly body: unknown;
}

/** Calls a route handler as the server does. */
export async function callApi(handler: Handler, call: Call = {}): Promise<Answer> {
  const headers = new Headers(call.headers);
  const origin = call.origin === undefined ? OWN_ORIGIN : call.origin;
  if (origin !== null) headers.set("origin", origin);
  if (call.cookie !== undefined && call.cookie !== null) headers.set("cookie", call.cookie);
  const body = call.rawBody ?? (call.body === undefined ? undefined : JSON.stringify(call.body));
  const init: RequestInit = { method: call.method ?? "GET", headers };
  if (body !== undefined) init.body = body;
  const request = new Request(`${OWN_ORIGIN}/api/under-test${call.query ?? ""}`, init);
  const response = await handler(request, { params: Promise.resolve(call.params ?? {}) });
  const text = await response.text();
  return {
    status: response.status,
    headers: response.headers,
    body: text === "" ? null : (JSON.parse(text) as unknown),
  };
}

/** A session of that person and the cookie that names it. */
export async function openSession(
  personId: string,
  { now = new Date(), seconds = 3600 } = {},
): Promise<{ readonly sessionId: string; readonly cookie: string }> {
  const expiresAt = new Date(now.getTime() + seconds * 1000);
  const sessionId = await inTransaction((tx) => createSession(personId, now, expiresAt, tx));
  const { authSecret, baseUrl } = environment();
  const token = await writeSessionToken(sessionId, authSecret);
  return { sessionId, cookie: `${sessionCookieName(baseUrl)}=${token}` };
}
