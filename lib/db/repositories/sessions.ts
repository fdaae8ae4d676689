import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { Role } from "@/lib/policies/roles";
import { Session } from "@/models/session";

/** A session with the one it belongs to, as they stand in the database now. */
export interface LiveSession {
  readonly sessionId: string;
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly organisationId: string;
  readonly organisationName: string;
  readonly lastSeenAt: Date;
}

export async function createSession(
  personId: string,
  now: Date,
  expiresAt: Date,
  tx: Transaction,
): Promise<string> {
  const session = await Session.create(
    { personId, createdAt: now, lastSeenAt: now, expiresAt },
    { transaction: tx },
  );
  return session.id;
}

/** Null when it was ended, has expired, was idle since before `idleSince`, or its person may no longer sign in. */
export async function findLiveSession(
  sessionId: string,
  now: Date,
  idleSince: Date,
): Promise<LiveSession | null> {
  const rows = await database().query<LiveSession>(
    `SELECT s.id AS "sessionId", p.id AS "personId", p.name, p.email, p.role, o.id AS "organisationId",
            o.name AS "organisationName", s.last_seen_at AS "lastSeenAt"
       FROM sessions s JOIN people p ON p.id = s.person_id JOIN organisations o ON o.id = p.organisation_id
      WHERE s.id = :sessionId AND s.revoked_at IS NULL AND s.expires_at > :now AND s.last_seen_at > :idleSince
        AND p.deactivated_at IS NULL`,
    { replacements: { sessionId, now, idleSince }, type: QueryTypes.SELECT },
  );
  return rows[0] ?? null;
}

export async function touchSession(sessionId: string, now: Date): Promise<void> {
  await Session.update({ lastSeenAt: now }, { where: { id: sessionId } });
}

/** Ends one session; already ended, nothing changes. */
export async function revokeSession(sessionId: string, now: Date): Promise<void> {
  database();
  await Session.update({ revokedAt: now }, { where: { id: sessionId, revokedAt: null } });
}

/** Ends every session of a person: after a change of password or role, or when somebody leaves. */
export async function revokeSessionsOf(personId: string, now: Date, tx: Transaction): Promise<number> {
  const [count] = await Session.update(
    { revokedAt: now },
    { where: { personId, revokedAt: null }, transaction: tx },
  );
  return count;
}
