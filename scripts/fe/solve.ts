import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { inputFile, type LoadedStub } from "./input-file";
import { readTables, rowsOf } from "./result-file";

/** What one run answers. Displacements outward at each nut, mm. */
export interface StubAnswer {
  readonly nutsMm: readonly number[];
  /** Force of the whole row that the web carries across mid-depth, N; null without that plane. */
  readonly midDepthN: number | null;
  /** Highest stress along the depth in the web at the toe of the fillet, N/mm2. */
  readonly webPeakMpa: number;
  readonly seconds: number;
}

const TIME_LIMIT_MS = 120_000;

/** "2.20" of the CalculiX that is installed. */
export function solverVersion(): string {
  // It ends with a status of its own when asked for its version, so that says nothing.
  const { stdout, error } = spawnSync("ccx", ["-v"], { encoding: "utf8" });
  if (error) throw new Error("CalculiX is not installed. As root, once: apt-get install calculix-ccx");
  return /Version (\S+)/.exec(stdout)?.[1] ?? "unknown";
}

/** Runs CalculiX on one stub, on one core and with the lowest priority. */
export function solve(stub: LoadedStub): StubAnswer {
  const folder = mkdtempSync(path.join(tmpdir(), "column-stub-"));
  const started = performance.now();
  writeFileSync(path.join(folder, "stub.inp"), inputFile(stub));
  execFileSync("nice", ["-n", "19", "ccx", "-i", "stub"], {
    cwd: folder,
    env: { ...process.env, OMP_NUM_THREADS: "1" },
    stdio: "pipe",
    timeout: TIME_LIMIT_MS,
  });
  const tables = readTables(readFileSync(path.join(folder, "stub.dat"), "utf8"));
  const nutsMm = rowsOf(tables, "displacements", "NUTS").map((row, nut) => (nut === 0 ? 1 : -1) * row[2]!);
  const midDepthN =
    stub.midDepth === "symmetric" ? -4 * rowsOf(tables, "total force", "MIDDEPTH")[0]![1]! : null;
  const webPeakMpa = Math.max(...rowsOf(tables, "stresses", "WEBROOT").map((row) => row[3]!));
  rmSync(folder, { recursive: true });
  return { nutsMm, midDepthN, webPeakMpa, seconds: (performance.now() - started) / 1000 };
}
