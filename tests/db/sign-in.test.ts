/** Guards getting in and out: one answer for every wrong try, a limit that lasts, sessions that can be ended. */
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { currentActor } from "@/lib/auth/current-actor";
import {
  readSessionToken,
  SESSION_IDLE_SECONDS,
  SESSION_SECONDS,
  sessionCookieName,
} from "@/lib/auth/session-cookie";
import { signIn } from "@/lib/auth/sign-in";
import { SIGN_IN_LIMIT } from "@/lib/auth/sign-in-limit";
import { environment } from "@/lib/config/env";
import { revokeSession, revokeSessionsOf } from "@/lib/db/repositories/sessions";
import { closeDatabase } from "@/lib/db/sequelize";
import { database, inTransaction } from "@/lib/db/transaction";
import { AuditEntry } from "@/models/audit-entry";
import { Person } from "@/models/person";
import { Session } from "@/models/session";
import { SignInAttempt } from "@/models/sign-in-attempt";
import {
  buildOrganisation,
  type BuiltOrganisation,
  type BuiltPerson,
  buildPerson,
  TEST_PASSWORD,
} from "@/tests/factories/build-organisation";
import { OWN_ORIGIN, openSession } from "@/tests/support/api-call";

let organisation: BuiltOrganisation;
let person: BuiltPerson;
/** An address that no other test comes from. */
const newAddress = (): string => `test ${randomUUID()}`;
const minutesLater = (minutes: number): Date => new Date(Date.now() + minutes * 60_000);
const asking = (cookie: string): Request => new Request(`${OWN_ORIGIN}/api/me`, { headers: { cookie } });

beforeAll(async () => {
  organisation = await buildOrganisation();
  person = organisation.people.checker;
});

describe("signing in", () => {
  it("opens a session of its own and writes it into the audit trail", async () => {
    const answer = await signIn({
      email: ` ${person.email.toUpperCase()} `,
      password: TEST_PASSWORD,
      address: newAddress(),
    });
    if (answer.kind !== "signed-in") throw new Error(answer.kind);
    expect(answer).toMatchObject({ personId: person.personId, name: person.name });
    const session = await Session.findByPk(answer.sessionId, { rejectOnEmpty: true });
    expect(session.expiresAt.getTime() - session.createdAt.getTime()).toBe(SESSION_SECONDS * 1000);
    const where = { action: "person.signed-in", actorId: person.personId };
    expect(await AuditEntry.count({ where })).toBe(1);
  });

  it("answers a wrong password, an unknown e-mail and somebody deactivated alike", async () => {
    const gone = await buildPerson(organisation.id, "designer");
    await Person.update({ deactivatedAt: new Date() }, { where: { id: gone.personId } });
    const tries = [
      { email: person.email, password: "wrong" },
      { email: `${randomUUID()}@nobody.example`, password: TEST_PASSWORD },
      { email: gone.email, password: TEST_PASSWORD },
      { email: "", password: "" },
    ];
    for (const wrong of tries)
      expect(await signIn({ ...wrong, address: newAddress() })).toEqual({ kind: "refused" });
  });
});

describe("too many failed tries", () => {
  const fail = (email: string, address: string) => signIn({ email, password: "wrong", address });

  it("shut an e-mail for a while, the right password included, and from every address", async () => {
    const { email } = await buildPerson(organisation.id, "designer");
    for (let tries = 0; tries < SIGN_IN_LIMIT.perEmail; tries += 1) {
      expect(await fail(email, newAddress())).toEqual({ kind: "refused" });
    }
    const right = { email, password: TEST_PASSWORD, address: newAddress() };
    expect(await signIn(right)).toEqual({ kind: "too-many-tries" });
    // As after a restart: nothing of the limit was kept in memory.
    await closeDatabase();
    database();
    expect(await signIn(right)).toEqual({ kind: "too-many-tries" });
    expect(await signIn(right, minutesLater(SIGN_IN_LIMIT.windowMinutes + 1))).toMatchObject({
      kind: "signed-in",
    });
  });

  it("do not stay shut because somebody keeps knocking", async () => {
    const { email } = await buildPerson(organisation.id, "designer");
    for (let tries = 0; tries < SIGN_IN_LIMIT.perEmail + 10; tries += 1) await fail(email, newAddress());
    expect(await SignInAttempt.count({ where: { email } })).toBe(SIGN_IN_LIMIT.perEmail);
  });

  it("are counted anew after a success", async () => {
    const { email } = await buildPerson(organisation.id, "designer");
    for (let round = 0; round < 3; round += 1) {
      for (let tries = 1; tries < SIGN_IN_LIMIT.perEmail; tries += 1) await fail(email, newAddress());
      expect(await signIn({ email, password: TEST_PASSWORD, address: newAddress() })).toMatchObject({
        kind: "signed-in",
      });
    }
  });

  it("shut an address that tries one e-mail after the other", async () => {
    const address = newAddress();
    for (let tries = 0; tries < SIGN_IN_LIMIT.perAddress; tries += 1)
      await fail(`${randomUUID()}@x.example`, address);
    const right = { email: person.email, password: TEST_PASSWORD };
    expect(await signIn({ ...right, address })).toEqual({ kind: "too-many-tries" });
    expect(await signIn({ ...right, address: newAddress() })).toMatchObject({ kind: "signed-in" });
  });

  it("are counted when they come all at once", async () => {
    const { email } = await buildPerson(organisation.id, "designer");
    const answers = await Promise.all(Array.from({ length: 20 }, () => fail(email, newAddress())));
    const answered = answers.filter((answer) => answer.kind === "refused").length;
    expect(answered).toBeLessThanOrEqual(SIGN_IN_LIMIT.perEmail);
  });
});

describe("a session", () => {
  it("is who asks, with role and organisation as they stand in the database now", async () => {
    const someone = await buildPerson(organisation.id, "designer");
    expect(await currentActor(asking(someone.cookie))).toMatchObject({
      personId: someone.personId,
      role: "designer",
    });
    await Person.update({ role: "checker" }, { where: { id: someone.personId } });
    expect(await currentActor(asking(someone.cookie))).toMatchObject({
      role: "checker",
      organisationId: organisation.id,
    });
  });

  it("is nobody's once it was ended, while another of the same person goes on", async () => {
    const someone = await buildPerson(organisation.id, "designer");
    const other = await openSession(someone.personId);
    await revokeSession(someone.sessionId, new Date());
    expect(await currentActor(asking(someone.cookie))).toBeNull();
    expect(await currentActor(asking(other.cookie))).not.toBeNull();
    expect(await inTransaction((tx) => revokeSessionsOf(someone.personId, new Date(), tx))).toBe(1);
    expect(await currentActor(asking(other.cookie))).toBeNull();
  });

  it("is nobody's when its person is deactivated, when it has run out, and after a long idle time", async () => {
    const someone = await buildPerson(organisation.id, "designer");
    await Person.update({ deactivatedAt: new Date() }, { where: { id: someone.personId } });
    expect(await currentActor(asking(someone.cookie))).toBeNull();
    const past = new Date(Date.now() - 7_200_000);
    const runOut = await openSession(person.personId, { now: past, seconds: 3600 });
    expect(await currentActor(asking(runOut.cookie))).toBeNull();
    const idle = new Date(Date.now() - (SESSION_IDLE_SECONDS + 60) * 1000);
    const forgotten = await openSession(person.personId, { now: idle, seconds: SESSION_SECONDS });
    expect(await currentActor(asking(forgotten.cookie))).toBeNull();
  });

  it("notes when it was last used, at most once a minute", async () => {
    const earlier = new Date(Date.now() - 600_000);
    const { sessionId, cookie } = await openSession(person.personId, {
      now: earlier,
      seconds: SESSION_SECONDS,
    });
    await currentActor(asking(cookie));
    const first = (await Session.findByPk(sessionId, { rejectOnEmpty: true })).lastSeenAt;
    expect(first.getTime()).toBeGreaterThan(Date.now() - 60_000);
    await currentActor(asking(cookie));
    expect((await Session.findByPk(sessionId, { rejectOnEmpty: true })).lastSeenAt).toEqual(first);
  });

  it("is nobody's without a cookie, or with one of another installation", async () => {
    expect(await currentActor(new Request(`${OWN_ORIGIN}/api/me`))).toBeNull();
    expect(await currentActor(asking(`${sessionCookieName(undefined)}=forged`))).toBeNull();
    const value = person.cookie.slice(person.cookie.indexOf("=") + 1);
    expect(await readSessionToken(value, environment().authSecret)).toBe(person.sessionId);
  });
});
