import { vi } from "vitest";

export interface Sent {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
}

type Answer = { readonly status?: number; readonly body: unknown };

/**
 * Answers the requests of a screen by "METHOD /path"; a request that no answer was given for fails
 * with its name, so that a screen cannot ask for something unnoticed.
 *
 * @returns what was sent, in order.
 */
export function answerRequests(answers: Readonly<Record<string, Answer | (() => Answer)>>): readonly Sent[] {
  const sent: Sent[] = [];
  vi.stubGlobal("fetch", (input: string, init: RequestInit = {}) => {
    const method = init.method ?? "GET";
    sent.push({
      method,
      path: input,
      body: typeof init.body === "string" ? (JSON.parse(init.body) as unknown) : undefined,
    });
    const given = answers[`${method} ${input}`];
    if (!given) return Promise.reject(new Error(`No answer for ${method} ${input}`));
    const { status = 200, body } = typeof given === "function" ? given() : given;
    return Promise.resolve(Response.json(body, { status }));
  });
  return sent;
}

/** A refusal as the API words it. */
export const problem = (code: string, message: string, status: number): Answer => ({
  status,
  body: { error: { code, message, fields: [], requestId: "5a3c7f62-2f0f-4d6f-9a0e-000000000001" } },
});
