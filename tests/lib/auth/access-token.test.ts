import { describe, expect, it } from "vitest";
import { bearerKey, mintToken } from "@/lib/auth/access-token";

describe("mintToken", () => {
  it("makes keys that are never alike, told by their beginning, kept as a digest of another kind", () => {
    const tokens = Array.from({ length: 50 }, mintToken);
    expect(new Set(tokens.map(({ key }) => key)).size).toBe(50);
    for (const { key, hint, digest } of tokens) {
      // 32 random bytes in base64url: 43 characters.
      expect(key).toMatch(/^pw_[A-Za-z0-9_-]{43}$/);
      expect(key.startsWith(hint)).toBe(true);
      expect(digest).toMatch(/^[0-9a-f]{64}$/);
    }
  });
});

describe("bearerKey", () => {
  const { key } = mintToken();

  it("takes the key out of the header, whatever the case and the spaces", () => {
    expect(bearerKey(`Bearer ${key}`)).toBe(key);
    expect(bearerKey(`  bearer   ${key} `)).toBe(key);
  });

  it.each([
    null,
    "",
    "Bearer",
    key,
    `Basic ${key}`,
    `Bearer ${key} more`,
    `Bearer ${key.slice(0, -1)}`,
    "Bearer pw_",
  ])("takes nothing out of %j", (header) => expect(bearerKey(header)).toBeNull());
});
