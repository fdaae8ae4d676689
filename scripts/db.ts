/**
 * The database by hand: db.ts COMMAND..., each one of
 *   status   lists the migrations that have not run
 *   migrate  runs them; takes a dump first where the database already holds data
 *   undo     undoes the last one
 *   seed     adds what is missing: catalogue, figures, demo organisation
 *   reset    empties the TEST database and migrates it again
 */
import { readFileSync } from "node:fs";
import path from "node:path";
import { environment } from "@/lib/config/env";
import { migrateDown, migrateUp, pendingMigrations, seedAll } from "@/lib/db/migrate";
import { emptyTestDatabase, holdsData } from "./database-state";
import { dumpDatabase } from "./dump";

/** DATABASE_URL, or else the local database that a running `npm start` has written down. */
function databaseUrl(): string {
  if (process.env.DATABASE_URL) return environment().databaseUrl;
  const kept = path.join(environment().dataFolder, "secrets", "database-url");
  try {
    return readFileSync(kept, "utf8").trim();
  } catch {
    throw new Error("There is no database yet. Start one with `npm start`, or set DATABASE_URL.");
  }
}

function testDatabaseUrl(): string {
  const url = process.env.TEST_DATABASE_URL;
  if (!url)
    throw new Error("reset empties the test database: set TEST_DATABASE_URL, whose name ends in _test.");
  return url;
}

async function status(): Promise<void> {
  const pending = await pendingMigrations(databaseUrl());
  console.log(pending.length === 0 ? "No migration is waiting." : `Waiting: ${pending.join(", ")}`);
}

async function migrate(): Promise<void> {
  const url = databaseUrl();
  const pending = await pendingMigrations(url);
  if (pending.length === 0) return;
  if (await holdsData(url)) {
    const file = await dumpDatabase(url, path.join(environment().dataFolder, "dumps"), "before-migration");
    console.log(`The database before this migration is kept in ${file}.`);
  }
  const done = await migrateUp(url);
  console.log(`Migrated: ${done.join(", ")}`);
}

async function undo(): Promise<void> {
  const url = databaseUrl();
  const file = await dumpDatabase(url, path.join(environment().dataFolder, "dumps"), "before-undo");
  console.log(`The database before this step back is kept in ${file}.`);
  const undone = await migrateDown(url);
  console.log(undone.length === 0 ? "There is nothing to undo." : `Undone: ${undone.join(", ")}`);
}

async function seed(): Promise<void> {
  const added = await seedAll(databaseUrl(), { demo: environment().isDemoWanted });
  for (const line of added) console.log(line);
}

async function reset(): Promise<void> {
  const url = testDatabaseUrl();
  await emptyTestDatabase(url);
  await migrateUp(url);
}

const commands: Readonly<Record<string, () => Promise<void>>> = { status, migrate, undo, seed, reset };

/** What a person can do about an error of the database driver. */
function inWords(error: unknown): string {
  // Sequelize wraps the driver's error, sometimes with an empty message of its own.
  const cause = error instanceof Error && error.message === "" ? error.cause : error;
  const text = cause instanceof Error ? cause.message || cause.name : "unknown error";
  if (/ECONNREFUSED|ENOTFOUND|EAI_AGAIN/.test(text)) {
    return `The database does not answer (${text}). Is it running, and is its address right?`;
  }
  if (/password authentication failed/.test(text))
    return `The database refuses this user or password (${text}).`;
  if (/database ".*" does not exist/.test(text)) return `${text}. Make it first: createdb NAME.`;
  return text;
}

const wanted = process.argv.slice(2);
try {
  if (wanted.length === 0) throw new Error(`Say what to do: ${Object.keys(commands).join(", ")}.`);
  for (const name of wanted) {
    const command = commands[name];
    if (command === undefined) throw new Error(`"${name}" is none of ${Object.keys(commands).join(", ")}.`);
    await command();
  }
} catch (error) {
  console.error(inWords(error));
  if (process.env.LOG_LEVEL === "debug") console.error(error);
  process.exitCode = 1;
}
