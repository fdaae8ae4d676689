/** Guards the lint walls themselves: a rule can be switched off without anyone noticing. */
import { ESLint } from "eslint";
import { describe, expect, it } from "vitest";

const eslint = new ESLint();

/** Ids of the rules that a text breaks, were it the content of an existing file of that folder. */
async function rulesBroken(text: string, filePath: string): Promise<string[]> {
  const [result] = await eslint.lintText(text, { filePath });
  if (result === undefined) throw new Error(`${filePath} was not linted`);
  const fatal = result.messages.find((message) => message.fatal);
  if (fatal) throw new Error(fatal.message);
  return result.messages.map((message) => message.ruleId ?? "");
}

const CORE = "lib/calc/outcome.ts";

describe("the lint walls bite", { timeout: 120_000 }, () => {
  it.each([
    ["a model", `import { Section } from "@/models/section";\nexport const x = Section;`],
    ["the cost core", `import { x } from "@/lib/cost";\nexport const y = x;`],
    ["React", `import { useState } from "react";\nexport const x = useState;`],
    ["a built-in of Node", `import { readFileSync } from "node:fs";\nexport const x = readFileSync;`],
  ])("lib/calc may not import %s", async (_what, text) => {
    expect(await rulesBroken(text, CORE)).toContain("no-restricted-imports");
  });

  it.each([
    ["the clock", "export const x = Date.now();", "no-restricted-properties"],
    ["the clock by construction", "export const x = new Date();", "no-restricted-syntax"],
    ["chance", "export const x = Math.random();", "no-restricted-properties"],
    ["the environment", "export const x = process.env.HOME;", "no-restricted-globals"],
    ["the network", 'export const x = fetch("http://127.0.0.1");', "no-restricted-globals"],
  ])("lib/calc may not read %s", async (_what, text, rule) => {
    expect(await rulesBroken(text, CORE)).toContain(rule);
  });

  it("lets the core import from itself", async () => {
    expect(await rulesBroken('export { OutsideScope } from "@/lib/calc/outcome";', CORE)).toEqual([]);
  });

  it("keeps the browser away from the database", async () => {
    const text = 'import { openDatabase } from "@/lib/db/sequelize";\nexport const x = openDatabase;';
    expect(await rulesBroken(text, "lib/client/keys.ts")).toContain("no-restricted-imports");
  });

  it("keeps process.env to one file", async () => {
    const text = "export const x = process.env.HOME;";
    expect(await rulesBroken(text, "lib/log/logger.ts")).toContain("no-restricted-properties");
    expect(await rulesBroken(text, "lib/config/env.ts")).toEqual([]);
  });

  it("allows no any", async () => {
    expect(await rulesBroken("export const x = (y: any) => y as string;", CORE)).toContain(
      "@typescript-eslint/no-explicit-any",
    );
  });
});
