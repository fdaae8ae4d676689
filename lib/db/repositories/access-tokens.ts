import { Op, QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { Role } from "@/lib/policies/roles";
import { AccessToken } from "@/models/access-token";

/** A token without its key. */
export interface AccessTokenRow {
  readonly id: string;
  readonly personId: string;
  readonly name: string;
  readonly hint: string;
  readonly createdAt: Date;
  readonly lastUsedAt: Date | null;
  readonly expiresAt: Date;
}

/** A token with the one it belongs to, as they stand in the database now. */
export interface LiveAccessToken {
  readonly tokenId: string;
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly organisationId: string;
  readonly organisationName: string;
}

const rowOf = (token: AccessToken): AccessTokenRow => {
  const { id, personId, name, hint, createdAt, lastUsedAt, expiresAt } = token;
  return { id, personId, name, hint, createdAt, lastUsedAt, expiresAt };
};

/** Null when it was revoked, has expired, never was, or its person may no longer sign in. */
export async function findLiveAccessToken(digest: string, now: Date): Promise<LiveAccessToken | null> {
  const rows = await database().query<LiveAccessToken>(
    `SELECT t.id AS "tokenId", p.id AS "personId", p.name, p.email, p.role, o.id AS "organisationId",
            o.name AS "organisationName"
       FROM access_tokens t JOIN people p ON p.id = t.person_id JOIN organisations o ON o.id = p.organisation_id
      WHERE t.digest = :digest AND t.revoked_at IS NULL AND t.expires_at > :now AND p.deactivated_at IS NULL`,
    { replacements: { digest, now }, type: QueryTypes.SELECT },
  );
  return rows[0] ?? null;
}

export async function touchAccessToken(id: string, now: Date): Promise<void> {
  await AccessToken.update({ lastUsedAt: now }, { where: { id } });
}

/** The person's tokens that still open anything, newest first. */
export async function listAccessTokens(
  personId: string,
  now: Date,
  tx: Transaction | null = null,
): Promise<AccessTokenRow[]> {
  database();
  const tokens = await AccessToken.findAll({
    where: { personId, revokedAt: null, expiresAt: { [Op.gt]: now } },
    order: [["createdAt", "DESC"]],
    transaction: tx,
  });
  return tokens.map(rowOf);
}

export async function createAccessToken(
  tx: Transaction,
  token: Pick<AccessToken, "personId" | "name" | "hint" | "digest" | "createdAt" | "expiresAt">,
): Promise<AccessTokenRow> {
  return rowOf(await AccessToken.create(token, { transaction: tx }));
}

/** Ends one token of that person. @returns false where the person has no such token in force. */
export async function revokeAccessToken(
  tx: Transaction,
  personId: string,
  id: string,
  now: Date,
): Promise<boolean> {
  const [count] = await AccessToken.update(
    { revokedAt: now },
    { where: { id, personId, revokedAt: null }, transaction: tx },
  );
  return count > 0;
}
