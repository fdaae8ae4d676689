/** Guards the cookie: it names a session and can be neither forged nor read with another secret. */
import { encode } from "next-auth/jwt";
import { describe, expect, it } from "vitest";
import {
  cookieValue,
  readSessionToken,
  sessionCookieName,
  writeSessionToken,
} from "@/lib/auth/session-cookie";

const SECRET = "the secret of this installation only";
const SESSION = "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6d";

describe("the session token", () => {
  it("gives back the session it was made for, and nothing with another secret", async () => {
    const token = await writeSessionToken(SESSION, SECRET);
    expect(token).not.toContain(SESSION);
    expect(await readSessionToken(token, SECRET)).toBe(SESSION);
    expect(await readSessionToken(token, "the secret of another installation")).toBeNull();
  });

  it.each([undefined, "", "rubbish", "a.b.c.d.e"])("reads nothing from %j", async (value) => {
    expect(await readSessionToken(value, SECRET)).toBeNull();
  });

  it("reads nothing from a token that has run out, or that names no session", async () => {
    const stale = await encode({ token: { sessionId: SESSION }, secret: SECRET, maxAge: -60 });
    expect(await readSessionToken(stale, SECRET)).toBeNull();
    const nameless = await encode({ token: { sub: "somebody", role: "admin" }, secret: SECRET });
    expect(await readSessionToken(nameless, SECRET)).toBeNull();
  });
});

describe("the session cookie", () => {
  it("is one that only https may set where the site has https", () => {
    expect(sessionCookieName("https://steel.example")).toMatch(/^__Secure-/);
    expect(sessionCookieName("http://127.0.0.1:3000")).not.toMatch(/^__Secure-/);
    expect(sessionCookieName(undefined)).not.toMatch(/^__Secure-/);
  });

  it("is found among others by its whole name", () => {
    const header = "other=1; panelwright-session=abc=d; x-panelwright-session=no";
    expect(cookieValue(header, "panelwright-session")).toBe("abc=d");
    expect(cookieValue(header, "session")).toBeUndefined();
    expect(cookieValue(null, "panelwright-session")).toBeUndefined();
  });
});
