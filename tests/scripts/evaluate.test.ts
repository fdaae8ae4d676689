import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { ResultDocument } from "@/lib/schemas/result-document";
import { buildNodeDocument } from "@/tests/factories/build-node-document";

/** The command line as the contract states it: a file or standard input, exit 0 with a result, 2 with errors. */
let folder = "";
let file = "";
const document = JSON.stringify(buildNodeDocument());

beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "panelwright-evaluate-"));
  file = path.join(folder, "node.json");
  writeFileSync(file, document);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function run(words: readonly string[], input = "") {
  const ran = spawnSync("npm", ["run", "--silent", "evaluate", "--", ...words], {
    input,
    encoding: "utf8",
    maxBuffer: 512 * 2 ** 20,
  });
  return { status: ran.status, answer: JSON.parse(ran.stdout) as unknown };
}

const errorsOf = (answer: unknown) => (answer as { errors: { path: string; message: string }[] }).errors;
const countSteps = (answer: unknown): number =>
  ResultDocument.parse(answer)
    .options.flatMap((option) => ("components" in option ? option.components : []))
    .filter((check) => check.steps !== undefined).length;

describe("npm run evaluate", () => {
  it("prints the result document of a file, with the governing working unless told otherwise", () => {
    const governing = run([file]);
    expect(governing.status).toBe(0);
    const none = countSteps(run([file, "--steps", "none"]).answer);
    const some = countSteps(governing.answer);
    const all = countSteps(run([file, "--steps", "all"]).answer);
    expect(none).toBe(0);
    expect(some).toBeGreaterThan(0);
    expect(all).toBeGreaterThan(some);
  }, 120_000);

  it("reads standard input for -", () => {
    const { status, answer } = run(["-"], document);
    expect(status).toBe(0);
    expect(ResultDocument.parse(answer).options.length).toBeGreaterThan(3);
  }, 60_000);

  it("answers a bad document with its faults and exit 2", () => {
    const { status, answer } = run(["-"], JSON.stringify({ ...JSON.parse(document), quantity: 0 }));
    expect(status).toBe(2);
    expect(errorsOf(answer)[0]?.path).toBe("quantity");
  }, 60_000);

  it("answers what is no JSON, a missing file and an unknown setting with exit 2", () => {
    for (const [words, input] of [
      [["-"], "{"],
      [[path.join(folder, "none.json")], ""],
      [[file, "--steps", "some"], ""],
      [[file, "--loud"], ""],
    ] as const) {
      const { status, answer } = run(words, input);
      expect(status).toBe(2);
      expect(errorsOf(answer).length).toBe(1);
    }
  }, 120_000);
});
