import { execFile } from "node:child_process";
import { readFileSync } from "node:fs";
import path from "node:path";
import { Client } from "pg";

export interface Run {
  readonly status: number;
  readonly output: string;
}

function run(program: string, args: readonly string[], variables: Record<string, string>): Promise<Run> {
  const env: NodeJS.ProcessEnv = { ...process.env };
  for (const name of ["DATABASE_URL", "TEST_DATABASE_URL", "PANELWRIGHT_DATABASE_NAME"]) delete env[name];
  Object.assign(env, variables);
  return new Promise((resolve) => {
    execFile(program, args, { env, maxBuffer: 16 * 1024 * 1024 }, (error, stdout, stderr) => {
      resolve({ status: error ? Number(error.code) : 0, output: stdout + stderr });
    });
  });
}

/** Runs one of scripts/*.sh on a data folder of the test's own; settings of the surrounding run do not leak in. */
export function runScript(name: string, args: readonly string[], dataFolder: string): Promise<Run> {
  return run("bash", [path.join("scripts", name), ...args], { PANELWRIGHT_DATA_DIR: dataFolder });
}

/** Runs scripts/db.ts. */
export function runDb(args: readonly string[], variables: Record<string, string>): Promise<Run> {
  return run(process.execPath, ["--import", "tsx", path.join("scripts", "db.ts"), ...args], variables);
}

export function addressOf(dataFolder: string): string {
  return readFileSync(path.join(dataFolder, "secrets", "database-url"), "utf8").trim();
}

/** One statement in the local database of a data folder. */
export async function sql(dataFolder: string, text: string): Promise<Record<string, unknown>[]> {
  const client = new Client({ connectionString: addressOf(dataFolder) });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(text)).rows;
  } finally {
    await client.end();
  }
}
