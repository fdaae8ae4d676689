/** Guards the courtesy before the pages: to sign in and back, and a policy with a nonce of its own each time. */
import { NextRequest } from "next/server";
import { beforeAll, describe, expect, it } from "vitest";
import { proxy } from "@/proxy";
import { buildOrganisation, type BuiltPerson } from "@/tests/factories/build-organisation";
import { OWN_ORIGIN } from "@/tests/support/api-call";

let person: BuiltPerson;
beforeAll(async () => {
  person = (await buildOrganisation()).people.checker;
});

const visit = (path: string, cookie?: string): ReturnType<typeof proxy> =>
  proxy(new NextRequest(`${OWN_ORIGIN}${path}`, cookie === undefined ? {} : { headers: { cookie } }));

describe("a page", () => {
  it("sends whoever is not signed in to sign in, and back to the page with its query", async () => {
    for (const cookie of [undefined, "panelwright-session=forged"]) {
      const reply = await visit("/projects/7?sort=cost", cookie);
      expect(reply.status).toBe(307);
      const location = new URL(reply.headers.get("location") ?? "", OWN_ORIGIN);
      // Next writes a loopback address its own way here, and makes it relative when it serves.
      expect(["127.0.0.1:3000", "localhost:3000"]).toContain(location.host);
      expect(location.pathname).toBe("/sign-in");
      expect(location.searchParams.get("callbackUrl")).toBe("/projects/7?sort=cost");
    }
  });

  it("lets the open pages through, and nothing that only begins like one", async () => {
    for (const path of ["/sign-in", "/method", "/accessibility"])
      expect((await visit(path)).status).toBe(200);
    expect((await visit("/methods-of-others")).status).toBe(307);
  });

  it("gets a policy with a new nonce at each visit, the same on request and reply", async () => {
    const nonces = new Set<string>();
    for (let visits = 0; visits < 5; visits += 1) {
      const reply = await visit("/projects", person.cookie);
      expect(reply.status).toBe(200);
      const policy = reply.headers.get("content-security-policy") ?? "";
      const nonce = /'nonce-([^']+)'/.exec(policy)?.[1] ?? "";
      expect(nonce.length).toBeGreaterThan(20);
      expect(reply.headers.get("x-middleware-request-x-nonce")).toBe(nonce);
      expect(reply.headers.get("x-middleware-request-content-security-policy")).toBe(policy);
      nonces.add(nonce);
    }
    expect(nonces.size).toBe(5);
  });
});
