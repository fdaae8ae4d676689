/** Guards the last line of `npm test`: it must not call a run good in which something failed, was skipped or never ran. */
import path from "node:path";
import { expect, it } from "vitest";
import { addUp, type Report } from "@/scripts/test-totals";

const file = (
  name: string,
  statuses: readonly string[],
  status = "passed",
): Report["testResults"][number] => ({
  name: path.resolve("tests", name),
  status,
  assertionResults: statuses.map((each, index) => ({ status: each, fullName: `${name} ${index}` })),
});

const sum = (files: Report["testResults"], kinds: readonly string[]) =>
  addUp([{ testResults: files }], kinds, path.resolve("tests"));

it("adds up over files and runs", () => {
  const one: Report = { testResults: [file("lib/a.test.ts", ["passed", "passed"])] };
  const two: Report = { testResults: [file("e2e/b.test.ts", ["passed", "failed"], "failed")] };
  expect(addUp([one, two], ["lib", "e2e"], path.resolve("tests"))).toEqual({
    passed: 3,
    failed: 1,
    faults: [],
  });
});

it("counts a file that could not be loaded as a failure", () => {
  expect(sum([file("lib/a.test.ts", [], "failed")], []).failed).toBe(1);
});

it("finds fault with a skipped test and with one still to be written", () => {
  expect(sum([file("lib/a.test.ts", ["passed", "skipped", "todo", "pending"])], []).faults).toHaveLength(3);
});

it("finds fault with a kind of test that did not run", () => {
  expect(sum([file("lib/a.test.ts", ["passed"])], ["lib", "e2e"]).faults).toEqual([
    "no test ran in tests/e2e",
  ]);
});
