/** Guards what the first start gives: people with passwords of their own, kept once and never changed again. */
import { readFileSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, it, vi } from "vitest";

const folder = vi.hoisted(() => {
  const given = `${process.env["TMPDIR"] ?? "/tmp"}/panelwright-demo-${process.pid}`;
  process.env["PANELWRIGHT_DATA_DIR"] = given;
  return given;
});

import { passwordFits } from "@/lib/auth/passwords";
import { environment } from "@/lib/config/env";
import { migrateUp, seedAll } from "@/lib/db/migrate";
import { database } from "@/lib/db/transaction";
import { ROLES } from "@/lib/policies/roles";
import { Node } from "@/models/node";
import { Organisation } from "@/models/organisation";
import { Person } from "@/models/person";
import { Project } from "@/models/project";
import { DEMO_ORGANISATION, DEMO_PEOPLE_FILE } from "@/seeders/demo-organisation";

const url = environment().databaseUrl;
const file = path.join(folder, DEMO_PEOPLE_FILE);
const kept = (): { email: string; password: string; role: string }[] =>
  JSON.parse(readFileSync(file, "utf8")) as { email: string; password: string; role: string }[];

afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe("the demo organisation", () => {
  it("has one person of each role, whose password is in the data folder for the owner alone", async () => {
    expect(path.dirname(folder)).toBe(path.resolve(process.env["TMPDIR"] ?? tmpdir()));
    const lines = await seedAll(url, { demo: true });
    const people = kept();
    expect(people.map((person) => person.role).sort()).toEqual([...ROLES].sort());
    expect(statSync(file).mode & 0o777).toBe(0o600);
    expect(new Set(people.map((person) => person.password)).size).toBe(ROLES.length);
    database();
    for (const { email, password } of people) {
      const person = await Person.findOne({ where: { email }, rejectOnEmpty: true });
      expect(await passwordFits(person.passwordHash, password)).toBe(true);
      // Printed at this start, so that whoever started it can sign in.
      expect(lines.some((line) => line.includes(email) && line.includes(password))).toBe(true);
    }
  });

  it("keeps every password and every edited row at the next start, and prints no password again", async () => {
    database();
    const before = kept();
    const organisation = await Organisation.findOne({
      where: { name: DEMO_ORGANISATION },
      rejectOnEmpty: true,
    });
    const where = { organisationId: organisation.id, role: "designer" as const };
    const designer = await Person.findOne({ where, rejectOnEmpty: true });
    await designer.update({ name: "Renamed by an admin", role: "checker" });
    const lines = await seedAll(url, { demo: true });
    expect(lines.join("\n")).not.toMatch(/password/);
    expect(kept()).toEqual(before);
    await designer.reload();
    expect(designer.name).toBe("Renamed by an admin");
    expect(designer.role).toBe("checker");
    await designer.update({ role: "designer" });
  });

  it("brings no demo node back that was changed or taken off the register", async () => {
    database();
    const organisation = await Organisation.findOne({
      where: { name: DEMO_ORGANISATION },
      rejectOnEmpty: true,
    });
    const project = await Project.findOne({
      where: { organisationId: organisation.id },
      rejectOnEmpty: true,
    });
    const nodes = await Node.findAll({ where: { projectId: project.id }, order: ["reference"] });
    expect(nodes.length).toBeGreaterThanOrEqual(8);
    const [changed, removed] = nodes;
    await changed!.update({ document: { ...changed!.document, quantity: 77 }, version: 2 });
    await removed!.update({ deletedAt: new Date() });
    await seedAll(url, { demo: true });
    await changed!.reload();
    await removed!.reload();
    expect(changed!.document.quantity).toBe(77);
    expect(removed!.deletedAt).not.toBeNull();
    expect(await Node.count({ where: { projectId: project.id } })).toBe(nodes.length);
  });

  it("is left out where nobody wants it", async () => {
    expect(await migrateUp(url)).toEqual([]);
    database();
    const before = await Person.count();
    await Organisation.update({ name: "Set aside for a moment" }, { where: { name: DEMO_ORGANISATION } });
    await seedAll(url, { demo: false });
    expect(await Person.count()).toBe(before);
    expect(await Organisation.count({ where: { name: DEMO_ORGANISATION } })).toBe(0);
    await Organisation.update({ name: DEMO_ORGANISATION }, { where: { name: "Set aside for a moment" } });
  });
});
