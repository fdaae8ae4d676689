/** Guards that a page runs only its own scripts. */
import { describe, expect, it } from "vitest";
import { contentSecurityPolicy } from "@/lib/http/content-security-policy";

describe("the content security policy", () => {
  const policy = contentSecurityPolicy("abc", { isDevelopment: false });
  const rules = new Map(
    policy.split("; ").map((rule) => [rule.slice(0, rule.indexOf(" ")), rule.slice(rule.indexOf(" ") + 1)]),
  );

  it("asks a nonce of every script and style sheet and lets no text be run as code", () => {
    expect(rules.get("script-src")).toBe("'self' 'nonce-abc' 'strict-dynamic'");
    expect(rules.get("style-src")).toBe("'self' 'nonce-abc'");
    expect(policy).not.toMatch(/unsafe/);
  });

  it("lets nobody frame the pages, and nothing be sent or loaded elsewhere", () => {
    expect(rules.get("frame-ancestors")).toBe("'none'");
    expect(rules.get("object-src")).toBe("'none'");
    for (const name of ["default-src", "connect-src", "form-action", "base-uri", "font-src"]) {
      expect(rules.get(name)).toBe("'self'");
    }
  });

  it("gives way only in development, for the reloading of modules", () => {
    expect(contentSecurityPolicy("abc", { isDevelopment: true })).toMatch(/'unsafe-eval'/);
  });
});
