import { spawn, spawnSync, type ChildProcess } from "node:child_process";
import { mkdirSync, mkdtempSync, openSync, readFileSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import path from "node:path";
import type { TestProject } from "vitest/node";

/**
 * Before the browser tests: the production server, on a free port, on a test database that was emptied,
 * migrated and seeded. Everything it starts it also stops.
 */

export interface DemoPerson {
  readonly role: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

declare module "vitest" {
  export interface ProvidedContext {
    /** Address of the running server, without a slash at the end. */
    serverUrl: string;
    demoPeople: DemoPerson[];
  }
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen(0, "127.0.0.1", () => {
      const address = server.address();
      server.close(() =>
        address !== null && typeof address === "object"
          ? resolve(address.port)
          : reject(new Error("no port")),
      );
    });
  });
}

function prepareDatabase(env: NodeJS.ProcessEnv): void {
  const run = spawnSync(process.execPath, ["--import", "tsx", "scripts/db.ts", "reset", "seed"], {
    env,
    encoding: "utf8",
  });
  if (run.status !== 0)
    throw new Error(`The test database could not be prepared:\n${run.stdout}${run.stderr}`);
}

function waitUntilWell(url: string, server: ChildProcess): void {
  const run = spawnSync(
    process.execPath,
    ["scripts/wait-for-health.mjs", `${url}/api/health`, String(server.pid)],
    {
      encoding: "utf8",
    },
  );
  if (run.status !== 0)
    throw new Error(`The server did not come up: ${run.stderr} See tests/e2e/output/server.log.`);
}

async function stop(server: ChildProcess): Promise<void> {
  if (server.exitCode !== null || server.signalCode !== null) return;
  const gone = new Promise((resolve) => server.once("exit", resolve));
  server.kill("SIGTERM");
  const killer = setTimeout(() => server.kill("SIGKILL"), 10_000);
  await gone;
  clearTimeout(killer);
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const databaseUrl = process.env.TEST_DATABASE_URL;
  if (!databaseUrl) throw new Error("The browser tests need TEST_DATABASE_URL; `npm test` sets it.");
  const dataFolder = mkdtempSync(path.join(tmpdir(), "panelwright-e2e-"));
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const env: NodeJS.ProcessEnv = {
    ...process.env,
    NODE_ENV: "production",
    DATABASE_URL: databaseUrl,
    PANELWRIGHT_DATA_DIR: dataFolder,
    PANELWRIGHT_DEMO: "yes",
    NEXTAUTH_URL: url,
    NEXTAUTH_SECRET: "only-for-the-browser-tests-0123456789abcdef",
    NEXT_TELEMETRY_DISABLED: "1",
    LOG_LEVEL: "info",
  };
  prepareDatabase(env);

  const output = path.join("tests", "e2e", "output");
  mkdirSync(output, { recursive: true });
  const log = openSync(path.join(output, "server.log"), "w");
  const next = path.join("node_modules", "next", "dist", "bin", "next");
  const server = spawn(process.execPath, [next, "start", "--hostname", "127.0.0.1", "--port", String(port)], {
    env,
    stdio: ["ignore", log, log],
  });
  const tearDown = async (): Promise<void> => {
    await stop(server);
    rmSync(dataFolder, { recursive: true, force: true });
  };
  try {
    waitUntilWell(url, server);
    project.provide("serverUrl", url);
    const people = readFileSync(path.join(dataFolder, "demo-people.json"), "utf8");
    project.provide("demoPeople", JSON.parse(people) as DemoPerson[]);
  } catch (error) {
    await tearDown();
    throw error;
  }
  return tearDown;
}
