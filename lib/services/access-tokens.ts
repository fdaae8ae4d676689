import { mintToken } from "@/lib/auth/access-token";
import {
  createAccessToken,
  listAccessTokens,
  revokeAccessToken,
  type AccessTokenRow,
} from "@/lib/db/repositories/access-tokens";
import { writeAudit } from "@/lib/db/repositories/audit";
import { inTransaction } from "@/lib/db/transaction";
import { AppError, notFound } from "@/lib/http/app-error";
import type { Actor } from "@/lib/policies/roles";
import type { CreateAccessToken } from "@/lib/schemas/access-token";

/** More than anybody has programs; a runaway script stops here. */
const MOST_TOKENS = 20;
const DAY_MS = 24 * 3600 * 1000;

/** One's own tokens in force; nobody sees another's. */
export const readAccessTokens = (actor: Actor): Promise<AccessTokenRow[]> =>
  listAccessTokens(actor.personId, new Date());

/** A new token of one's own. @returns the key, this once, and the tokens now in force. @throws AppError invalid (too many). */
export async function issueAccessToken(
  actor: Actor,
  { name, days }: CreateAccessToken,
): Promise<{ readonly key: string; readonly tokens: readonly AccessTokenRow[] }> {
  return inTransaction(async (tx) => {
    const now = new Date();
    const { personId, organisationId } = actor;
    if ((await listAccessTokens(personId, now, tx)).length >= MOST_TOKENS) {
      const message = `You have ${MOST_TOKENS} tokens already. Revoke one that is no longer used.`;
      throw new AppError("invalid", message, { fields: [{ path: "name", message }] });
    }
    const { key, hint, digest } = mintToken();
    const expiresAt = new Date(now.getTime() + days * DAY_MS);
    const { id } = await createAccessToken(tx, { personId, name, hint, digest, createdAt: now, expiresAt });
    await writeAudit(tx, { actorId: personId, organisationId, action: "access-token.issued", subjectId: id });
    return { key, tokens: await listAccessTokens(personId, now, tx) };
  });
}

/** Ends a token of one's own at once. @throws AppError not_found. */
export async function endAccessToken(actor: Actor, tokenId: string): Promise<readonly AccessTokenRow[]> {
  return inTransaction(async (tx) => {
    const now = new Date();
    const { personId, organisationId } = actor;
    if (!(await revokeAccessToken(tx, personId, tokenId, now))) throw notFound("token");
    const line = { action: "access-token.revoked", subjectId: tokenId } as const;
    await writeAudit(tx, { actorId: personId, organisationId, ...line });
    return listAccessTokens(personId, now, tx);
  });
}
