import { randomBytes } from "node:crypto";
import { hash, verify } from "@node-rs/argon2";

/** Shortest password that a person may choose, characters. */
export const PASSWORD_MIN_LENGTH = 12;

/** Argon2id hash in its printed form, parameters and salt included. */
export async function hashPassword(password: string): Promise<string> {
  return hash(password);
}

/** A hash of nothing anybody knows: checked when the e-mail is unknown, so that both answers take equally long. */
let decoy: Promise<string> | undefined;

/** True when the password fits. A null hash (nobody of that e-mail) takes as long and is never true. */
export async function passwordFits(passwordHash: string | null, password: string): Promise<boolean> {
  decoy ??= hash(randomBytes(24).toString("base64url"));
  const fits = await verify(passwordHash ?? (await decoy), password);
  return passwordHash !== null && fits;
}

/** A password for a first sign-in: 20 characters, 120 bits, nothing that is easily misread when pasted. */
export function randomPassword(): string {
  return randomBytes(15).toString("base64url");
}
