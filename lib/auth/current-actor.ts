import { environment } from "@/lib/config/env";
import { findLiveSession, type LiveSession, touchSession } from "@/lib/db/repositories/sessions";
import type { Actor } from "@/lib/policies/roles";
import { cookieValue, readSessionToken, SESSION_IDLE_SECONDS, sessionCookieName } from "./session-cookie";

/** Who asks, with what the pages show of them. */
export interface SignedIn extends Actor {
  readonly name: string;
  readonly email: string;
  readonly organisationName: string;
}

/** Writing "last seen" at every request would make a write of every read. */
const TOUCH_EVERY_MS = 60_000;

function asActor(session: LiveSession): SignedIn {
  const { personId, organisationId, role, name, email, organisationName } = session;
  return { personId, organisationId, role, name, email, organisationName };
}

/**
 * The one whose session a cookie value names, read from the database now: a session that was ended, or a
 * person who was deactivated, is nobody. Null = nobody is signed in.
 */
export async function actorOfCookie(value: string | undefined, now = new Date()): Promise<SignedIn | null> {
  const sessionId = await readSessionToken(value, environment().authSecret);
  if (sessionId === null) return null;
  const idleSince = new Date(now.getTime() - SESSION_IDLE_SECONDS * 1000);
  const session = await findLiveSession(sessionId, now, idleSince);
  if (session === null) return null;
  if (now.getTime() - session.lastSeenAt.getTime() > TOUCH_EVERY_MS) await touchSession(sessionId, now);
  return asActor(session);
}

/** Who sent this request, or null. */
export async function currentActor(request: Request): Promise<SignedIn | null> {
  const name = sessionCookieName(environment().baseUrl);
  return actorOfCookie(cookieValue(request.headers.get("cookie"), name));
}
