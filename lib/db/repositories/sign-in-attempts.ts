import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import { SignInAttempt } from "@/models/sign-in-attempt";

export interface RecentFailures {
  /** Failures for this e-mail since its last success, this try included. */
  readonly ofEmail: number;
  /** Failures from this address, this try included. */
  readonly ofAddress: number;
}

export interface Attempt {
  readonly email: string;
  readonly address: string;
  readonly attemptedAt: Date;
}

/** Writes the try down as failed, before the password is looked at: tries at the same moment all count. */
export async function recordAttempt(attempt: Attempt): Promise<string> {
  database();
  return (await SignInAttempt.create({ ...attempt, succeeded: false })).id;
}

export async function markSucceeded(attemptId: string, tx: Transaction): Promise<void> {
  await SignInAttempt.update({ succeeded: true }, { where: { id: attemptId }, transaction: tx });
}

/** Takes a refused try out again: knocking at a shut door must not keep it shut. */
export async function forgetAttempt(attemptId: string): Promise<void> {
  await SignInAttempt.destroy({ where: { id: attemptId } });
}

export async function countRecentFailures(
  email: string,
  address: string,
  since: Date,
): Promise<RecentFailures> {
  const [row] = await database().query<{ of_email: number; of_address: number }>(
    `SELECT
       (SELECT count(*)::int FROM sign_in_attempts WHERE email = :email AND NOT succeeded AND attempted_at >= :since
          AND attempted_at > coalesce((SELECT max(attempted_at) FROM sign_in_attempts WHERE email = :email AND succeeded), '-infinity')) AS of_email,
       (SELECT count(*)::int FROM sign_in_attempts WHERE address = :address AND NOT succeeded AND attempted_at >= :since) AS of_address`,
    { replacements: { email, address, since }, type: QueryTypes.SELECT },
  );
  return { ofEmail: row?.of_email ?? 0, ofAddress: row?.of_address ?? 0 };
}

/** Tries older than the window count for nothing and need not be kept. */
export async function removeAttemptsBefore(time: Date): Promise<void> {
  await database().query("DELETE FROM sign_in_attempts WHERE attempted_at < :time", {
    replacements: { time },
  });
}
