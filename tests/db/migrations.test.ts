/** Guards that a release can be taken back and forward again, and that seeding twice adds nothing. */
import { afterAll, describe, expect, it } from "vitest";
import { migrateDown, migrateUp, pendingMigrations, seedAll } from "@/lib/db/migrate";
import { closeDatabase, connectBare } from "@/lib/db/sequelize";
import { environment } from "@/lib/config/env";

const url = environment().databaseUrl;

async function tables(): Promise<string[]> {
  const sequelize = connectBare(url);
  const [rows] = (await sequelize.query(
    `SELECT table_name || '.' || column_name || ' ' || data_type || ' ' || is_nullable AS line
       FROM information_schema.columns WHERE table_schema = 'public' AND table_name <> 'schema_migrations'
      ORDER BY 1`,
  )) as [{ line: string }[], unknown];
  await sequelize.close();
  return rows.map((row) => row.line);
}

describe("the migrations", () => {
  // The tests that follow find the database as they expect it, whatever happens here.
  afterAll(async () => {
    await migrateUp(url);
    await seedAll(url, { demo: false });
    await closeDatabase();
  });

  it("go down one by one to nothing, and up again to the same tables", async () => {
    const before = await tables();
    expect(before.length).toBeGreaterThan(50);
    expect(await pendingMigrations(url)).toEqual([]);
    const undone = await migrateDown(url, 1);
    expect(undone).toHaveLength(1);
    expect(await pendingMigrations(url)).toEqual(undone);
    expect((await migrateDown(url, "all")).length).toBeGreaterThan(0);
    expect(await tables()).toEqual([]);
    await migrateUp(url);
    expect(await tables()).toEqual(before);
  });

  it("leave nothing half done when one fails", async () => {
    const sequelize = connectBare(url);
    await sequelize.query("CREATE TABLE held_by_another (id uuid REFERENCES organisations(id))");
    await expect(migrateDown(url, "all")).rejects.toThrow(/held_by_another|depend/);
    await sequelize.query("DROP TABLE held_by_another");
    await sequelize.close();
    await migrateUp(url);
    expect(await pendingMigrations(url)).toEqual([]);
  });
});
