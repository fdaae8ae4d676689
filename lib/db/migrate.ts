import { readdir } from "node:fs/promises";
import path from "node:path";
import { pathToFileURL } from "node:url";
import type { QueryInterface, Transaction } from "sequelize";
import { SequelizeStorage, Umzug } from "umzug";
import { seeders } from "@/seeders";
import { closeDatabase, connectBare, isOpenTo, openDatabase } from "./sequelize";

/** What a migration is handed: everything it does goes through this one transaction. */
export interface MigrationContext {
  readonly queryInterface: QueryInterface;
  readonly transaction: Transaction;
}

/** What each file of migrations/ exports. */
export interface Migration {
  up(context: MigrationContext): Promise<void>;
  down(context: MigrationContext): Promise<void>;
}

interface NamedMigration {
  readonly name: string;
  readonly file: string;
}

async function listMigrations(folder: string): Promise<NamedMigration[]> {
  const files = (await readdir(folder)).filter((file) => /^\d{14}-[a-z0-9-]+\.ts$/.test(file));
  return files.sort().map((file) => ({ name: file.replace(/\.ts$/, ""), file: path.join(folder, file) }));
}

async function withUmzug<T>(url: string, work: (umzug: Umzug<QueryInterface>) => Promise<T>): Promise<T> {
  const sequelize = connectBare(url);
  const found = await listMigrations(path.join(process.cwd(), "migrations"));
  const run = async (file: string, step: "up" | "down"): Promise<void> => {
    const migration = (await import(/* @vite-ignore */ pathToFileURL(file).href)) as Migration;
    await sequelize.transaction((transaction) =>
      migration[step]({ queryInterface: sequelize.getQueryInterface(), transaction }),
    );
  };
  const umzug = new Umzug<QueryInterface>({
    migrations: found.map(({ name, file }) => ({
      name,
      up: () => run(file, "up"),
      down: () => run(file, "down"),
    })),
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage({ sequelize, tableName: "schema_migrations" }),
    logger: undefined,
  });
  try {
    return await work(umzug);
  } finally {
    await sequelize.close();
  }
}

/** Runs every migration that has not run. Returns their names, in order. */
export async function migrateUp(url: string): Promise<string[]> {
  return withUmzug(url, async (umzug) => (await umzug.up()).map((migration) => migration.name));
}

/** Undoes the last `steps` migrations, newest first; "all" empties the schema. Returns their names. */
export async function migrateDown(url: string, steps: number | "all" = 1): Promise<string[]> {
  return withUmzug(url, async (umzug) => {
    const undone = await umzug.down(steps === "all" ? { to: 0 as const } : { step: steps });
    return undone.map((migration) => migration.name);
  });
}

/** Names of the migrations that have not run yet. */
export async function pendingMigrations(url: string): Promise<string[]> {
  return withUmzug(url, async (umzug) => (await umzug.pending()).map((migration) => migration.name));
}

export interface SeedSettings {
  /** Also the demo organisation and its project. */
  readonly demo: boolean;
}

/**
 * Runs the seeders in their order, each in one transaction. Safe to repeat: a seeder adds what is
 * missing and leaves every row alone that somebody has edited. Returns what was added, in words.
 */
export async function seedAll(url: string, settings: SeedSettings): Promise<string[]> {
  const wasOpen = isOpenTo(url);
  const sequelize = openDatabase(url);
  const report: string[] = [];
  try {
    for (const seeder of seeders) {
      if (seeder.demo && !settings.demo) continue;
      const lines = await sequelize.transaction((transaction) => seeder.run({ sequelize, transaction }));
      report.push(...lines.map((line) => `${seeder.name}: ${line}`));
    }
  } finally {
    if (!wasOpen) await closeDatabase();
  }
  return report;
}
