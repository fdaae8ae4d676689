import type { NextAuthOptions } from "next-auth";
import Credentials from "next-auth/providers/credentials";
import { environment } from "@/lib/config/env";
import { writeAudit } from "@/lib/db/repositories/audit";
import { findLiveSession, revokeSession } from "@/lib/db/repositories/sessions";
import { inTransaction } from "@/lib/db/transaction";
import { logger } from "@/lib/log/logger";
import { signIn } from "./sign-in";
import { safeCallbackPath } from "./callback-path";
import { networkAddress } from "./network-address";
import { isSecure, SESSION_SECONDS, sessionCookieName } from "./session-cookie";

/** What the sign-in page gets as `error`, to say in its own words. */
export const TOO_MANY_TRIES = "too-many-tries";

async function endSession(sessionId: unknown): Promise<void> {
  if (typeof sessionId !== "string") return;
  const now = new Date();
  const session = await findLiveSession(sessionId, now, new Date(0));
  await revokeSession(sessionId, now);
  if (session === null) return;
  const { personId, organisationId } = session;
  await inTransaction((tx) =>
    writeAudit(tx, { actorId: personId, organisationId, action: "person.signed-out", subjectId: personId }),
  );
}

const credentials = Credentials({
  name: "Password",
  credentials: { email: { type: "email" }, password: { type: "password" } },
  authorize: async (given, request) => {
    const headers = request.headers as Record<string, string | undefined> | undefined;
    const answer = await signIn({
      email: given?.email ?? "",
      password: given?.password ?? "",
      address: networkAddress(headers?.["x-forwarded-for"]),
    });
    if (answer.kind === "too-many-tries") throw new Error(TOO_MANY_TRIES);
    return answer.kind === "signed-in"
      ? { id: answer.personId, name: answer.name, sessionId: answer.sessionId }
      : null;
  },
});

/**
 * Sign-in by e-mail and password. The cookie holds an encrypted token with the session id and nothing to
 * decide by: rights are read from the database at every request (current-actor.ts).
 */
export function authOptions(): NextAuthOptions {
  const { authSecret, baseUrl } = environment();
  const secure = isSecure(baseUrl);
  return {
    secret: authSecret,
    useSecureCookies: secure,
    session: { strategy: "jwt", maxAge: SESSION_SECONDS },
    cookies: {
      sessionToken: {
        name: sessionCookieName(baseUrl),
        options: { httpOnly: true, sameSite: "lax", path: "/", secure },
      },
    },
    pages: { signIn: "/sign-in", error: "/sign-in" },
    providers: [credentials],
    callbacks: {
      jwt: ({ token, user }) => {
        const sessionId = (user as { sessionId?: string } | undefined)?.sessionId ?? token["sessionId"];
        return { sessionId };
      },
      session: ({ session }) => ({ expires: session.expires }),
      redirect: ({ url, baseUrl: own }) => `${own}${safeCallbackPath(url, own)}`,
    },
    events: { signOut: ({ token }) => endSession(token["sessionId"]) },
    logger: {
      error: (code) => logger.error({ code }, "sign-in failed to work"),
      warn: (code) => logger.warn({ code }, "sign-in warns"),
      debug: () => undefined,
    },
  };
}
