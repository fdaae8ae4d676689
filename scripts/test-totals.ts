/**
 * test-totals.ts REPORT.json...: adds up the JSON reports of the vitest runs, prints the sum as the line
 * "N passed, N failed" and ends with 1 when a test failed or was skipped, or when a kind of test is absent.
 * KINDS=lib,components names the folders of tests/ of which each must have run at least one test.
 */
import { readFileSync } from "node:fs";
import path from "node:path";

export interface Report {
  readonly testResults: readonly {
    readonly name: string;
    readonly status: string;
    readonly assertionResults: readonly { readonly status: string; readonly fullName: string }[];
  }[];
}

export interface Totals {
  readonly passed: number;
  readonly failed: number;
  /** Words on what counts as a failure although no test failed. */
  readonly faults: readonly string[];
}

/** Adds up reports. A file that could not be loaded counts as one failed test. */
export function addUp(reports: readonly Report[], kinds: readonly string[], testsFolder: string): Totals {
  let passed = 0;
  let failed = 0;
  const faults: string[] = [];
  const seen = new Set<string>();
  for (const file of reports.flatMap((report) => report.testResults)) {
    const [kind = ""] = path.relative(testsFolder, file.name).split(path.sep);
    if (file.assertionResults.length > 0) seen.add(kind);
    if (file.assertionResults.length === 0 && file.status === "failed") failed += 1;
    for (const test of file.assertionResults) {
      if (test.status === "passed") passed += 1;
      else if (test.status === "failed") failed += 1;
      else faults.push(`skipped: ${test.fullName}`);
    }
  }
  for (const kind of kinds) if (!seen.has(kind)) faults.push(`no test ran in tests/${kind}`);
  return { passed, failed, faults };
}

function main(): void {
  const reports = process.argv.slice(2).map((file) => JSON.parse(readFileSync(file, "utf8")) as Report);
  const kinds = (process.env.KINDS ?? "").split(",").filter((kind) => kind !== "");
  const { passed, failed, faults } = addUp(reports, kinds, path.resolve("tests"));
  for (const fault of faults) console.log(fault);
  console.log(`${passed} passed, ${failed} failed`);
  if (failed > 0 || faults.length > 0 || passed === 0) process.exitCode = 1;
}

if (process.argv[1] !== undefined && path.basename(process.argv[1]) === "test-totals.ts") main();
