import { randomUUID } from "node:crypto";
import { z } from "zod";
import { actorOfToken, bearerKey } from "@/lib/auth/access-token";
import { currentActor, type SignedIn } from "@/lib/auth/current-actor";
import { environment } from "@/lib/config/env";
import { findProjectIdOfNode } from "@/lib/db/repositories/nodes";
import { findProject, type ProjectRow } from "@/lib/db/repositories/projects";
import { logger } from "@/lib/log/logger";
import { canViewProject } from "@/lib/policies/project";
import type { FieldError } from "@/lib/schemas/problem";
import { AppError, notFound } from "./app-error";
import { readJson } from "./read-json";
import { fieldErrors, jsonReply, problemReply } from "./reply";
import { checkOrigin } from "./same-origin";

/**
 * Who gets past the door: `signed-in` anybody with a session; `project` and `node` whoever may see the
 * project that the path names, or the project of the node that it names. Others get 404, not 403.
 */
export type Access = "signed-in" | "project" | "node";

interface PathContext {
  readonly params: Promise<Record<string, string | string[] | undefined> | undefined>;
}

interface Asked<Params, Query, Body> {
  readonly actor: SignedIn;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly request: Request;
}

interface Shapes<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  /** Of the path; a path that does not fit is not found. */
  readonly params?: P;
  readonly query?: Q;
  /** Left out = the body is not read. */
  readonly body?: B;
  /** Status of a good reply: 201 where something was made. */
  readonly status?: number;
  /** Whether a program may ask with an access token instead of a session. */
  readonly acceptsToken?: boolean;
  /** Where the contract of a route gives bad input a shape of its own. */
  readonly invalidReply?: (fields: readonly FieldError[]) => Response;
}

type Settings<A extends Access, P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> = Shapes<
  P,
  Q,
  B
> & {
  readonly access: A;
  readonly run: (
    asked: Asked<z.output<P>, z.output<Q>, z.output<B>> &
      (A extends "signed-in" ? object : { readonly project: ProjectRow }),
  ) => Promise<unknown>;
};

export type RouteHandler = ((request: Request, context: PathContext) => Promise<Response>) & {
  readonly access: Access;
};

async function projectOf(
  access: Access,
  actor: SignedIn,
  params: Record<string, unknown>,
): Promise<ProjectRow | null> {
  if (access === "signed-in") return null;
  const thing = access === "project" ? "project" : "node";
  const projectId =
    access === "project" ? String(params["projectId"]) : await findProjectIdOfNode(String(params["nodeId"]));
  const project = projectId === null ? null : await findProject(projectId);
  if (project === null || !canViewProject(actor, project)) throw notFound(thing);
  return project;
}

/**
 * Who asks. A browser sends its session's cookie whoever made it write, so a write must come from this site; a token is
 * sent only by whoever holds it, from wherever.
 *
 * @throws AppError other_origin, sign_in_needed
 */
async function askerOf(request: Request, acceptsToken: boolean): Promise<SignedIn> {
  const authorization = request.headers.get("authorization");
  if (authorization !== null && acceptsToken) {
    const key = bearerKey(authorization);
    const actor = key === null ? null : await actorOfToken(key);
    if (actor !== null) return actor;
    throw new AppError(
      "sign_in_needed",
      "That access token opens nothing: it was revoked, has expired or is not whole. Make a new one under Access tokens.",
    );
  }
  checkOrigin(request, environment().baseUrl);
  const actor = await currentActor(request);
  if (actor !== null) return actor;
  throw new AppError("sign_in_needed", "Sign in first.");
}

async function pathParams<P extends z.ZodType>(
  shape: P | undefined,
  context: PathContext,
): Promise<z.output<P>> {
  // Next hands a route without a changing part no params at all.
  const parsed = (shape ?? z.object({})).safeParse((await context.params) ?? {});
  if (!parsed.success) throw notFound("page");
  return parsed.data as z.output<P>;
}

/** Query and body against their shapes; all bad fields of both at once. */
async function shapes<Q extends z.ZodType, B extends z.ZodType>(
  request: Request,
  { query, body }: { query?: Q | undefined; body?: B | undefined },
): Promise<{ query: z.output<Q>; body: z.output<B> }> {
  const search = Object.fromEntries(new URL(request.url).searchParams);
  const queried = query?.safeParse(search);
  const sent = body?.safeParse(await readJson(request));
  const fields = [queried, sent].flatMap((part) => (part?.success === false ? fieldErrors(part.error) : []));
  if (fields.length > 0)
    throw new AppError("invalid", "Some of this cannot be taken as it stands.", { fields });
  return { query: queried?.data as z.output<Q>, body: sent?.data as z.output<B> };
}

function refusal(
  error: unknown,
  request: Request,
  requestId: string,
  settings: Pick<Shapes<never, never, never>, "invalidReply">,
): Response {
  if (error instanceof AppError) {
    if (error.code === "invalid" && settings.invalidReply) return settings.invalidReply(error.fields);
    return problemReply(error, requestId);
  }
  logger.error(
    { err: error, requestId, method: request.method, path: new URL(request.url).pathname },
    "request failed",
  );
  const message = "Something went wrong here, and it has been written down. Nothing was saved.";
  return problemReply(new AppError("unexpected", message), requestId);
}

/**
 * A route of the API. Always in this order: same origin on writes, signed in or, where taken, a token (401), member (404), shape
 * (422), then `run`, which asks the policy (403). A fault is logged under the request id and never shown.
 * `run` answers the body of the reply, or a Response where it needs headers of its own.
 */
export function route<
  A extends Access,
  P extends z.ZodType = z.ZodType,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
>(settings: Settings<A, P, Q, B>): RouteHandler {
  const handle = async (request: Request, context: PathContext): Promise<Response> => {
    const requestId = randomUUID();
    try {
      const actor = await askerOf(request, settings.acceptsToken ?? false);
      const params = await pathParams(settings.params, context);
      const project = await projectOf(settings.access, actor, params as Record<string, unknown>);
      const { query, body } = await shapes(request, settings);
      const asked = { actor, params, query, body, request, project };
      const answer = await settings.run(asked as unknown as Parameters<typeof settings.run>[0]);
      return answer instanceof Response
        ? answer
        : jsonReply(answer, settings.status ?? 200, { "x-request-id": requestId });
    } catch (error) {
      return refusal(error, request, requestId, settings);
    }
  };
  return Object.assign(handle, { access: settings.access });
}
