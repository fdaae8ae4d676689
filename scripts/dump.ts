import { spawn } from "node:child_process";
import { mkdir, rename, rm } from "node:fs/promises";
import path from "node:path";

/** The libpq variables for an address: the password stays out of the list of processes. */
export function postgresVariables(url: string): Record<string, string> {
  const address = new URL(url);
  const variables: Record<string, string> = {
    PGHOST: decodeURIComponent(address.hostname),
    PGPORT: address.port || "5432",
    PGUSER: decodeURIComponent(address.username),
    PGPASSWORD: decodeURIComponent(address.password),
    PGDATABASE: decodeURIComponent(address.pathname.slice(1)),
  };
  const sslMode = address.searchParams.get("sslmode");
  return sslMode === null ? variables : { ...variables, PGSSLMODE: sslMode };
}

function run(program: string, args: readonly string[], variables: Record<string, string>): Promise<void> {
  return new Promise((resolve, reject) => {
    const previousMask = process.umask(0o077);
    const child = spawn(program, args, {
      env: { ...process.env, ...variables },
      stdio: ["ignore", "inherit", "inherit"],
    });
    process.umask(previousMask);
    child.once("error", (error) => reject(new Error(`${program} could not be run: ${error.message}`)));
    child.once("exit", (code) => {
      if (code === 0) resolve();
      else reject(new Error(`${program} failed; nothing was changed.`));
    });
  });
}

/**
 * Takes a dump of a database (PostgreSQL's custom format, readable by this user alone).
 *
 * @param folder - made where it is missing.
 * @param label - goes into the name of the file, with the time.
 * @returns the path of the file, complete or not there at all.
 * @throws Error where pg_dump is missing or fails.
 */
export async function dumpDatabase(url: string, folder: string, label: string): Promise<string> {
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const time = new Date().toISOString().replace(/[-:]/g, "").slice(0, 15);
  const file = path.join(folder, `${label}-${time}.dump`);
  try {
    await run(
      "pg_dump",
      ["--format=custom", "--no-owner", "--no-privileges", `--file=${file}.part`],
      postgresVariables(url),
    );
    await rename(`${file}.part`, file);
  } catch (error) {
    await rm(`${file}.part`, { force: true });
    throw error;
  }
  return file;
}
