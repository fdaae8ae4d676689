import { decode, encode } from "next-auth/jwt";

/** A session ends this long after signing in, seconds. */
export const SESSION_SECONDS = 7 * 24 * 3600;

/** A session that nobody used for this long is over, seconds. */
export const SESSION_IDLE_SECONDS = 24 * 3600;

/** Over https browsers keep the `__Secure-` prefix to what https has set. */
export function sessionCookieName(baseUrl: string | undefined): string {
  return isSecure(baseUrl) ? "__Secure-panelwright-session" : "panelwright-session";
}

export const isSecure = (baseUrl: string | undefined): boolean => baseUrl?.startsWith("https://") === true;

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** The session id that a cookie value holds; null when it is forged, expired or not ours. Asks no database. */
export async function readSessionToken(value: string | undefined, secret: string): Promise<string | null> {
  if (value === undefined || value === "") return null;
  // decode throws on whatever it cannot decrypt, which is the ordinary case of a stale cookie.
  const token = await decode({ token: value, secret }).catch(() => null);
  const sessionId = token?.["sessionId"];
  return typeof sessionId === "string" && UUID.test(sessionId) ? sessionId : null;
}

/** The cookie value of a session, as next-auth writes it. */
export async function writeSessionToken(sessionId: string, secret: string): Promise<string> {
  return encode({ token: { sessionId }, secret, maxAge: SESSION_SECONDS });
}

/** One cookie out of the Cookie header. */
export function cookieValue(header: string | null, name: string): string | undefined {
  for (const part of (header ?? "").split(";")) {
    const at = part.indexOf("=");
    if (at > 0 && part.slice(0, at).trim() === name) return part.slice(at + 1).trim();
  }
  return undefined;
}
