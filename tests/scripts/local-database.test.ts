/**
 * Guards the database that `npm start` makes for itself: out of reach from outside, not run by root, kept
 * over restarts, and at home even where its user cannot reach the data folder. A real cluster each time.
 */
import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  statSync,
} from "node:fs";
import { createServer, type Server } from "node:net";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { addressOf, runDb, runScript, sql } from "./run-script";

const folder = mkdtempSync(path.join(tmpdir(), "panelwright-local-"));
const open = path.join(folder, "open");
const closed = path.join(folder, "closed-to-others", "data");
const isRoot = process.getuid?.() === 0;

const modeOf = (file: string): string => (statSync(file).mode & 0o777).toString(8);
const clusterOf = (dataFolder: string): string =>
  readFileSync(path.join(dataFolder, "database-folder"), "utf8").split("\n")[1]!;

function occupy(port: number): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen(port, "127.0.0.1", () => resolve(server));
  });
}

beforeAll(async () => {
  chmodSync(folder, 0o711);
  expect(await runScript("database.sh", ["throw-away"], open)).toMatchObject({ status: 0 });
});

afterAll(async () => {
  for (const dataFolder of [open, closed]) {
    if (existsSync(dataFolder)) await runScript("database.sh", ["remove"], dataFolder);
  }
  rmSync(folder, { recursive: true, force: true });
});

describe("the local database", () => {
  it("keeps its secrets from everybody else", () => {
    const secrets = path.join(open, "secrets");
    expect(modeOf(secrets)).toBe("700");
    const names = readdirSync(secrets);
    expect(names).toEqual(
      expect.arrayContaining(["database-password", "database-superuser-password", "database-url"]),
    );
    for (const name of names) expect([name, modeOf(path.join(secrets, name))]).toEqual([name, "600"]);
  });

  it("listens on loopback only, and asks for a password", async () => {
    const settings = await sql(
      open,
      `select current_setting('listen_addresses') as addresses, current_setting('password_encryption') as passwords`,
    );
    expect(settings).toEqual([{ addresses: "127.0.0.1", passwords: "scram-sha-256" }]);
    const config = readFileSync(path.join(clusterOf(open), "postgresql.conf"), "utf8");
    expect(config).toMatch(/^unix_socket_directories = ''$/m);
    const rules = readFileSync(path.join(clusterOf(open), "pg_hba.conf"), "utf8");
    expect(rules).not.toMatch(/^[^#]*\btrust\s*$/m);
  });

  it("is run neither by root nor with a superuser", async () => {
    const [pid] = readFileSync(path.join(clusterOf(open), "postmaster.pid"), "utf8").split("\n");
    expect(statSync(`/proc/${pid}`).uid).not.toBe(0);
    expect(await sql(open, "select rolsuper from pg_roles where rolname = current_user")).toEqual([
      { rolsuper: false },
    ]);
  });

  it("moves to another port where its own is taken, and keeps its data", async () => {
    await sql(open, "create table kept as select 42 as answer");
    const before = new URL(addressOf(open)).port;
    expect(await runScript("database.sh", ["stop"], open)).toMatchObject({ status: 0 });
    const intruder = await occupy(Number(before));
    try {
      expect(await runScript("database.sh", ["start"], open)).toMatchObject({ status: 0 });
    } finally {
      intruder.close();
    }
    expect(new URL(addressOf(open)).port).not.toBe(before);
    expect(await sql(open, "select answer from kept")).toEqual([{ answer: 42 }]);
  });

  it("lives elsewhere where its user cannot pass through to the data folder", async () => {
    mkdirSync(path.dirname(closed), { mode: 0o700 });
    expect(await runScript("database.sh", ["throw-away"], closed)).toMatchObject({ status: 0 });
    const cluster = clusterOf(closed);
    if (isRoot) expect(cluster).toMatch(/^\/var\/lib\/panelwright\/[0-9a-f]{16}\/postgres$/);
    else expect(cluster).toBe(path.join(closed, "postgres"));
    expect(await sql(closed, "select 1 as one")).toEqual([{ one: 1 }]);
    expect(await runScript("database.sh", ["remove"], closed)).toMatchObject({ status: 0 });
    expect(existsSync(cluster)).toBe(false);
  });
});

describe("the database commands", () => {
  it("take a dump before they migrate a database that holds data, and none of an empty one", async () => {
    const variables = { DATABASE_URL: addressOf(open), PANELWRIGHT_DATA_DIR: open };
    await sql(open, "drop table if exists kept");
    expect(await runDb(["migrate"], variables)).toMatchObject({ status: 0 });
    const dumps = (): string[] =>
      readdirSync(path.join(open, "dumps")).filter((name) => name.startsWith("before-migration"));
    expect(dumps()).toEqual([]);

    await sql(open, "create table kept as select 42 as answer");
    await sql(open, "delete from schema_migrations where name = (select max(name) from schema_migrations)");
    // The last migration is pending again; whether it can run twice or not, the dump comes before it.
    const again = await runDb(["migrate"], variables);
    const [dump] = dumps();
    expect(dump).toBeDefined();
    expect(again.output).toContain(dump);
    expect(modeOf(path.join(open, "dumps", dump!))).toBe("600");
  });

  it("empty no database but one whose name ends in _test", async () => {
    const run = await runDb(["reset"], { TEST_DATABASE_URL: addressOf(open), PANELWRIGHT_DATA_DIR: open });
    expect(run.status).toBe(1);
    expect(run.output).toContain("_test");
    expect(await sql(open, "select answer from kept")).toEqual([{ answer: 42 }]);
    const unset = await runDb(["reset"], { DATABASE_URL: addressOf(open), PANELWRIGHT_DATA_DIR: open });
    expect(unset.status).toBe(1);
    expect(unset.output).toContain("TEST_DATABASE_URL");
  });

  it("say in words that a database does not answer", async () => {
    const run = await runDb(["status"], { DATABASE_URL: "postgres://somebody@127.0.0.1:1/panelwright" });
    expect(run.status).toBe(1);
    expect(run.output).toContain("does not answer");
    expect(run.output).not.toContain("    at ");
  });
});
