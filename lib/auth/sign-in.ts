import { passwordFits } from "./passwords";
import { SESSION_SECONDS } from "./session-cookie";
import { mayTry, SIGN_IN_LIMIT } from "./sign-in-limit";
import { writeAudit } from "@/lib/db/repositories/audit";
import { findPersonByEmail } from "@/lib/db/repositories/people";
import { createSession } from "@/lib/db/repositories/sessions";
import {
  countRecentFailures,
  forgetAttempt,
  markSucceeded,
  recordAttempt,
  removeAttemptsBefore,
} from "@/lib/db/repositories/sign-in-attempts";
import { inTransaction } from "@/lib/db/transaction";

export type SignInAnswer =
  | {
      readonly kind: "signed-in";
      readonly personId: string;
      readonly name: string;
      readonly sessionId: string;
    }
  /** Wrong password, nobody of that e-mail, or deactivated: the answer does not say which. */
  | { readonly kind: "refused" }
  | { readonly kind: "too-many-tries" };

export interface SignInTry {
  readonly email: string;
  readonly password: string;
  readonly address: string;
}

/** Checks a password and opens a session. The limit stands in the database, so a restart does not lift it. */
export async function signIn(
  { email: typed, password, address }: SignInTry,
  now = new Date(),
): Promise<SignInAnswer> {
  const email = typed.trim().toLowerCase().slice(0, 254);
  const since = new Date(now.getTime() - SIGN_IN_LIMIT.windowMinutes * 60_000);
  const attemptId = await recordAttempt({ email, address, attemptedAt: now });
  if (!mayTry(await countRecentFailures(email, address, since))) {
    await forgetAttempt(attemptId);
    return { kind: "too-many-tries" };
  }
  const person = await findPersonByEmail(email);
  const fits = await passwordFits(person?.passwordHash ?? null, password);
  if (person === null || !fits || person.isDeactivated) return { kind: "refused" };
  const expiresAt = new Date(now.getTime() + SESSION_SECONDS * 1000);
  const sessionId = await inTransaction(async (tx) => {
    const id = await createSession(person.id, now, expiresAt, tx);
    await markSucceeded(attemptId, tx);
    await writeAudit(tx, {
      actorId: person.id,
      organisationId: person.organisationId,
      action: "person.signed-in",
      subjectId: person.id,
    });
    return id;
  });
  await removeAttemptsBefore(since);
  return { kind: "signed-in", personId: person.id, name: person.name, sessionId };
}
