import { connectBare } from "@/lib/db/sequelize";

/** True where any table of the database has a row, the list of migrations aside. */
export async function holdsData(url: string): Promise<boolean> {
  const sequelize = connectBare(url);
  try {
    const [tables] = (await sequelize.query(
      `select format('%I.%I', schemaname, tablename) as name from pg_tables
       where schemaname not in ('pg_catalog', 'information_schema') and tablename <> 'schema_migrations'`,
    )) as [{ name: string }[], unknown];
    for (const { name } of tables) {
      const [rows] = await sequelize.query(`select 1 from ${name} limit 1`);
      if (rows.length > 0) return true;
    }
    return false;
  } finally {
    await sequelize.close();
  }
}

/** The name of the database that an address points to. */
export function databaseNameOf(url: string): string {
  return decodeURIComponent(new URL(url).pathname.slice(1));
}

/**
 * Drops everything in a test database.
 *
 * @throws Error where the name does not end in _test, before anything is touched.
 */
export async function emptyTestDatabase(url: string): Promise<void> {
  const name = databaseNameOf(url);
  if (!name.endsWith("_test")) {
    throw new Error(`The database "${name}" is not emptied: only one whose name ends in _test may be.`);
  }
  const sequelize = connectBare(url);
  try {
    await sequelize.query("drop schema public cascade");
    await sequelize.query("create schema public");
  } finally {
    await sequelize.close();
  }
}
