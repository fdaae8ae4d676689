/** Guards what next-auth is told: the cookie, the token that holds a session id alone, and the end of a session. */
import { beforeAll, describe, expect, it } from "vitest";
import { authOptions, TOO_MANY_TRIES } from "@/lib/auth/auth-options";
import { SIGN_IN_LIMIT } from "@/lib/auth/sign-in-limit";
import { AuditEntry } from "@/models/audit-entry";
import { Session } from "@/models/session";
import {
  buildOrganisation,
  type BuiltOrganisation,
  buildPerson,
  TEST_PASSWORD,
} from "@/tests/factories/build-organisation";

type Authorize = (
  given: Record<string, string> | undefined,
  request: { headers?: Record<string, string> },
) => Promise<unknown>;

let house: BuiltOrganisation;
beforeAll(async () => {
  house = await buildOrganisation();
});

const authorize: Authorize = (given, request) => {
  const provider = authOptions().providers[0] as unknown as { options: { authorize: Authorize } };
  return provider.options.authorize(given, request);
};

describe("signing in through next-auth", () => {
  it("gives the session that was opened, nothing for a wrong password, and the reason when there were too many", async () => {
    const { email, personId } = await buildPerson(house.id, "designer");
    const from = { headers: { "x-forwarded-for": `sign-in ${email}` } };
    const user = (await authorize({ email, password: TEST_PASSWORD }, from)) as {
      id: string;
      sessionId: string;
    };
    expect(user.id).toBe(personId);
    expect((await Session.findByPk(user.sessionId, { rejectOnEmpty: true })).personId).toBe(personId);
    for (let tries = 0; tries < SIGN_IN_LIMIT.perEmail; tries += 1) {
      expect(await authorize({ email, password: "wrong" }, from)).toBeNull();
    }
    await expect(authorize({ email, password: TEST_PASSWORD }, from)).rejects.toThrow(TOO_MANY_TRIES);
    expect(await authorize(undefined, {})).toBeNull();
  });

  it("puts the session id and nothing else into the token, and nothing of it into the reply", async () => {
    const { callbacks } = authOptions();
    type JwtInput = Parameters<NonNullable<NonNullable<typeof callbacks>["jwt"]>>[0];
    const first = {
      token: { name: "x", email: "y" },
      user: { id: "1", sessionId: "the session" },
    } as unknown as JwtInput;
    expect(await callbacks?.jwt?.(first)).toEqual({ sessionId: "the session" });
    const later = { token: { sessionId: "the session", role: "admin" } } as unknown as JwtInput;
    expect(await callbacks?.jwt?.(later)).toEqual({ sessionId: "the session" });
  });

  it("sets a cookie that scripts cannot read and other sites do not send", () => {
    expect(authOptions().cookies?.sessionToken?.options).toMatchObject({
      httpOnly: true,
      sameSite: "lax",
      path: "/",
    });
  });

  it("leads nowhere but to this site afterwards", async () => {
    const baseUrl = "http://127.0.0.1:3000";
    const redirect = authOptions().callbacks?.redirect;
    expect(await redirect?.({ url: `${baseUrl}/catalog`, baseUrl })).toBe(`${baseUrl}/catalog`);
    expect(await redirect?.({ url: "https://elsewhere.example/", baseUrl })).toBe(`${baseUrl}/projects`);
  });
});

describe("signing out", () => {
  const signOut = async (token: Record<string, unknown>): Promise<void> => {
    const { events } = authOptions();
    await events?.signOut?.({ token } as never);
  };

  it("ends the session in the database and writes it into the audit trail, once", async () => {
    const person = await buildPerson(house.id, "checker");
    await signOut({ sessionId: person.sessionId });
    await signOut({ sessionId: person.sessionId });
    expect((await Session.findByPk(person.sessionId, { rejectOnEmpty: true })).revokedAt).not.toBeNull();
    expect(await AuditEntry.count({ where: { actorId: person.personId, action: "person.signed-out" } })).toBe(
      1,
    );
  });

  it("with a token that names no session changes nothing", async () => {
    const before = await AuditEntry.count({ where: { action: "person.signed-out" } });
    await signOut({});
    expect(await AuditEntry.count({ where: { action: "person.signed-out" } })).toBe(before);
  });
});
