import { Sequelize } from "sequelize";
import { registerModels } from "@/models";

interface OpenDatabase {
  readonly url: string;
  readonly sequelize: Sequelize;
}

/** Kept on globalThis: in development the modules are loaded again and again, the pool must not be. */
const holder = globalThis as typeof globalThis & { panelwrightDatabase?: OpenDatabase };

/** The pool that the model classes of this copy of the module are bound to. */
let boundTo: Sequelize | undefined;

function bindModels(sequelize: Sequelize): Sequelize {
  if (boundTo !== sequelize) {
    registerModels(sequelize);
    boundTo = sequelize;
  }
  return sequelize;
}

/** A connection pool without models: what migrations and one-off checks need. The caller closes it. */
export function connectBare(url: string, poolSize = 2): Sequelize {
  return new Sequelize(url, {
    dialect: "postgres",
    logging: false,
    timezone: "+00:00",
    pool: { max: poolSize, min: 0, idle: 10_000 },
    define: { underscored: true, freezeTableName: true },
  });
}

/**
 * Opens the pool that the models speak through; the same address again gives the same pool.
 *
 * @throws Error when a pool to another database is open: models belong to one database at a time.
 */
export function openDatabase(url: string): Sequelize {
  const open = holder.panelwrightDatabase;
  if (open !== undefined && open.url !== url) {
    throw new Error("A pool to another database is open; close it first.");
  }
  const sequelize = open?.sequelize ?? connectBare(url, 10);
  holder.panelwrightDatabase = { url, sequelize };
  return bindModels(sequelize);
}

/** True when the models speak to this database at the moment. */
export function isOpenTo(url: string): boolean {
  return holder.panelwrightDatabase?.url === url;
}

/** The open pool, or undefined before the first use. */
export function openedDatabase(): Sequelize | undefined {
  const open = holder.panelwrightDatabase;
  return open === undefined ? undefined : bindModels(open.sequelize);
}

/** Closes the pool; the next use opens a new one. */
export async function closeDatabase(): Promise<void> {
  const open = holder.panelwrightDatabase;
  delete holder.panelwrightDatabase;
  await open?.sequelize.close();
}
