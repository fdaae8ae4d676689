/** Guards that passwords are kept as argon2id hashes with a salt of their own, and cannot be guessed by e-mail. */
import { describe, expect, it } from "vitest";
import { hashPassword, passwordFits, randomPassword } from "@/lib/auth/passwords";

describe("passwords", () => {
  it("are hashed with argon2id and a new salt each time", async () => {
    const [first, second] = [await hashPassword("one and the same"), await hashPassword("one and the same")];
    expect(first).toMatch(/^\$argon2id\$/);
    expect(first).not.toBe(second);
    expect(await passwordFits(first, "one and the same")).toBe(true);
    expect(await passwordFits(first, "one and the other")).toBe(false);
  });

  it("never fit nobody, and take the work of a real check to say so", async () => {
    const real = await hashPassword("a real one");
    await passwordFits(null, "warms up the stand-in");
    const timed = async (hash: string | null): Promise<number> => {
      const began = performance.now();
      for (let round = 0; round < 5; round += 1) expect(await passwordFits(hash, "a wrong one")).toBe(false);
      return performance.now() - began;
    };
    const [known, unknown] = [await timed(real), await timed(null)];
    // Without the stand-in the second would take microseconds.
    expect(unknown).toBeGreaterThan(known / 5);
  });

  it("made for a first sign-in are long and never the same", () => {
    const made = new Set(Array.from({ length: 200 }, () => randomPassword()));
    expect(made.size).toBe(200);
    for (const password of made) expect(password).toMatch(/^[A-Za-z0-9_-]{20}$/);
  });
});
