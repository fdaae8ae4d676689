import { migrateUp, seedAll } from "@/lib/db/migrate";
import { emptyTestDatabase } from "@/scripts/database-state";

/**
 * Before the database tests: an empty test database, migrated, with catalogue and figures. The workers
 * inherit the settings made here: DATABASE_URL is the test database and nothing else.
 */
export default async function setup(): Promise<void> {
  const url = process.env["TEST_DATABASE_URL"];
  if (url === undefined || url === "") {
    throw new Error("Set TEST_DATABASE_URL to a database whose name ends in _test, or run `npm test`.");
  }
  await emptyTestDatabase(url);
  process.env["DATABASE_URL"] = url;
  process.env["NEXTAUTH_SECRET"] = "a secret of the tests alone, 32 or more";
  process.env["NEXTAUTH_URL"] = "http://127.0.0.1:3000";
  process.env["LOG_LEVEL"] = "silent";
  await migrateUp(url);
  await seedAll(url, { demo: false });
}
