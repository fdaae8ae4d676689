import { createHash, randomBytes } from "node:crypto";
import { findLiveAccessToken, touchAccessToken } from "@/lib/db/repositories/access-tokens";
import type { SignedIn } from "./current-actor";

/** So that a key that strays into a log or a file is known for what it is. */
const PREFIX = "pw_";
const HINT_LENGTH = 8;
const KEY = /^pw_[A-Za-z0-9_-]{43}$/;

export interface MintedToken {
  /** Shown once, kept nowhere. */
  readonly key: string;
  readonly hint: string;
  readonly digest: string;
}

const digestOf = (key: string): string => createHash("sha256").update(key).digest("hex");

/** A new key of 256 random bits: too many to guess, so a plain digest of it is as good as a slow one. */
export function mintToken(): MintedToken {
  const key = PREFIX + randomBytes(32).toString("base64url");
  return { key, hint: key.slice(0, HINT_LENGTH), digest: digestOf(key) };
}

/** The key of an Authorization header; null where it has none of ours. */
export function bearerKey(header: string | null): string | null {
  const [scheme, key, ...rest] = (header ?? "").trim().split(/\s+/);
  const isOurs =
    scheme?.toLowerCase() === "bearer" && key !== undefined && rest.length === 0 && KEY.test(key);
  return isOurs ? key : null;
}

/** Whoever gave that key away; null for one that was revoked, has expired or never was, or whose person has left. */
export async function actorOfToken(key: string, now = new Date()): Promise<SignedIn | null> {
  const token = await findLiveAccessToken(digestOf(key), now);
  if (token === null) return null;
  await touchAccessToken(token.tokenId, now);
  const { personId, organisationId, role, name, email, organisationName } = token;
  return { personId, organisationId, role, name, email, organisationName };
}
