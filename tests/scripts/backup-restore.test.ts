/**
 * Guards the promise that nothing is lost: what was backed up comes back, whole, on the same machine or
 * another; and nothing that is there is overwritten unasked. Runs the real scripts on real clusters.
 */
import {
  chmodSync,
  existsSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  statSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { runScript, sql } from "./run-script";

const folder = mkdtempSync(path.join(tmpdir(), "panelwright-backup-"));
const home = path.join(folder, "first");
const elsewhere = path.join(folder, "second");
const archive = path.join(folder, "kept.tar");

const secretOf = (dataFolder: string): string =>
  readFileSync(path.join(dataFolder, "secrets", "session-secret"), "utf8");
const modeOf = (file: string): string => (statSync(file).mode & 0o777).toString(8);

beforeAll(async () => {
  // The database's own user has to pass through, as it has to pass through a checkout.
  chmodSync(folder, 0o711);
  expect(await runScript("database.sh", ["throw-away"], home)).toMatchObject({ status: 0 });
  await sql(home, "create table sheet (id int primary key, mark text not null)");
  await sql(home, "insert into sheet values (1, 'C4 / level 2')");
  writeFileSync(path.join(home, "files", "certificate.txt"), "weld 42");
  writeFileSync(path.join(home, "secrets", "session-secret"), "first secret\n", { mode: 0o600 });
  writeFileSync(path.join(home, "demo-people.json"), "[]\n", { mode: 0o600 });
});

afterAll(async () => {
  for (const dataFolder of [home, elsewhere]) {
    if (existsSync(dataFolder)) await runScript("database.sh", ["remove"], dataFolder);
  }
  rmSync(folder, { recursive: true, force: true });
});

describe("backup and restore", () => {
  it("writes one archive that only its owner can read", async () => {
    expect(await runScript("backup.sh", [archive], home)).toMatchObject({ status: 0 });
    expect(modeOf(archive)).toBe("600");
  });

  it("never writes over an earlier backup", async () => {
    const before = readFileSync(archive);
    const run = await runScript("backup.sh", [archive], home);
    expect(run.status).toBe(1);
    expect(run.output).toContain("already there");
    expect(readFileSync(archive).equals(before)).toBe(true);
  });

  it("leaves a database that holds something alone", async () => {
    await sql(home, "update sheet set mark = 'changed later'");
    const run = await runScript("restore.sh", [archive], home);
    expect(run.status).toBe(1);
    expect(run.output).toContain("--replace");
    expect(await sql(home, "select mark from sheet")).toEqual([{ mark: "changed later" }]);
  });

  it("refuses a damaged archive before it touches anything", async () => {
    const damaged = path.join(folder, "damaged.tar");
    const bytes = readFileSync(archive);
    const at = bytes.indexOf("weld 42");
    expect(at).toBeGreaterThan(0);
    bytes.write("weld 43", at);
    writeFileSync(damaged, bytes);
    const run = await runScript("restore.sh", [damaged, "--replace"], home);
    expect(run.status).toBe(1);
    expect(run.output).toContain("damaged");
    expect(await sql(home, "select mark from sheet")).toEqual([{ mark: "changed later" }]);
  });

  it("puts everything back with --replace, and keeps what was there in a backup of its own", async () => {
    await sql(home, "create table later_table (id int)");
    writeFileSync(path.join(home, "files", "certificate.txt"), "overwritten");
    writeFileSync(path.join(home, "secrets", "session-secret"), "second secret\n");
    expect(await runScript("restore.sh", [archive, "--replace"], home)).toMatchObject({ status: 0 });
    expect(await sql(home, "select mark from sheet")).toEqual([{ mark: "C4 / level 2" }]);
    expect(await sql(home, "select to_regclass('later_table') is null as gone")).toEqual([{ gone: true }]);
    expect(readFileSync(path.join(home, "files", "certificate.txt"), "utf8")).toBe("weld 42");
    expect(secretOf(home)).toBe("first secret\n");
    expect(modeOf(path.join(home, "secrets", "session-secret"))).toBe("600");

    const safety = readdirSync(path.join(home, "backups")).filter((name) =>
      name.startsWith("before-restore-"),
    );
    expect(safety).toHaveLength(1);
    const back = await runScript("restore.sh", [path.join(home, "backups", safety[0]!), "--replace"], home);
    expect(back.status).toBe(0);
    expect(await sql(home, "select mark from sheet")).toEqual([{ mark: "changed later" }]);
    expect(secretOf(home)).toBe("second secret\n");
  });

  it("fills an empty data folder elsewhere, without asking", async () => {
    expect(await runScript("database.sh", ["throw-away"], elsewhere)).toMatchObject({ status: 0 });
    expect(await runScript("restore.sh", [archive], elsewhere)).toMatchObject({ status: 0 });
    expect(await sql(elsewhere, "select id, mark from sheet")).toEqual([{ id: 1, mark: "C4 / level 2" }]);
    expect(readFileSync(path.join(elsewhere, "files", "certificate.txt"), "utf8")).toBe("weld 42");
    expect(secretOf(elsewhere)).toBe("first secret\n");
  });
});
