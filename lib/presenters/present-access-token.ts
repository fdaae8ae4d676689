import type { AccessTokenRow } from "@/lib/db/repositories/access-tokens";
import type { AccessToken } from "@/lib/schemas/access-token";

/** Left out: the digest, which is for comparing. */
export const presentAccessToken = (token: AccessTokenRow): AccessToken => ({
  id: token.id,
  name: token.name,
  hint: token.hint,
  createdAt: token.createdAt.toISOString(),
  lastUsedAt: token.lastUsedAt?.toISOString() ?? null,
  expiresAt: token.expiresAt.toISOString(),
});
