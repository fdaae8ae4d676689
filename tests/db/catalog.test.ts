/** Guards the catalogue in the database: it arrives as the data files state it, edits survive a start, and each organisation keeps its own plates. */
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { environment } from "@/lib/config/env";
import { listStockPlates, loadCatalog, replaceStockPlates } from "@/lib/db/repositories/catalog";
import { migrateUp, seedAll } from "@/lib/db/migrate";
import { closeDatabase, openDatabase } from "@/lib/db/sequelize";
import { inTransaction } from "@/lib/db/transaction";
import { Fastener } from "@/models/fastener";
import { Organisation } from "@/models/organisation";
import { Section } from "@/models/section";
import { Steel } from "@/models/steel";
import { StockPlate } from "@/models/stock-plate";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";

let firm: Organisation;
let other: Organisation;

beforeAll(async () => {
  const { databaseUrl } = environment();
  await migrateUp(databaseUrl);
  await seedAll(databaseUrl, { demo: false });
  openDatabase(databaseUrl);
  firm = await Organisation.create({ name: "Plates of our own" });
  other = await Organisation.create({ name: "Plates as they come" });
});

afterAll(async () => {
  await firm.destroy();
  await other.destroy();
  await closeDatabase();
});

const thicknesses = (plates: readonly { thicknessMm: number }[]): number[] =>
  plates.map((plate) => plate.thicknessMm);

describe("the catalogue in the database", () => {
  it("is that of the data files, row for row and in their order", async () => {
    expect(await loadCatalog(other.id)).toEqual(loadSeedCatalog());
  });

  it("keeps an edited row and adds only what is missing", async () => {
    const edited = { source: "Measured by the shop", rootRadiusMm: 28 };
    const before = await Section.findOne({ where: { designation: "HE 300 A" } });
    await Section.update(edited, { where: { designation: "HE 300 A" } });
    await Section.destroy({ where: { designation: "UB 127x76x13" } });
    const added = await seedAll(environment().databaseUrl, { demo: false });
    expect(added).toEqual(["catalogue: 1 sections"]);
    expect(await Section.findOne({ where: { designation: "HE 300 A" } })).toMatchObject(edited);
    expect(await Section.count({ where: { designation: "UB 127x76x13" } })).toBe(1);
    await Section.update(
      { source: before?.source ?? "", rootRadiusMm: 27 },
      { where: { designation: "HE 300 A" } },
    );
  });

  it("holds no row without a source, no section without a hollow and no name twice", async () => {
    const section = (await Section.findOne({ where: { designation: "HE 300 B" } }))?.get({ plain: true });
    if (!section) throw new Error("The catalogue is not seeded.");
    const { id: _, ...row } = section;
    await expect(Section.create(row)).rejects.toThrow();
    await expect(Section.create({ ...row, designation: "HE 1 A", source: "" })).rejects.toThrow();
    await expect(Section.create({ ...row, designation: "HE 1 A", flangeThicknessMm: 140 })).rejects.toThrow();
    await expect(Section.create({ ...row, designation: "HE 1 A", family: "HE Z" })).rejects.toThrow();
    await expect(Steel.update({ upToMm: 0 }, { where: { grade: "S235" } })).rejects.toThrow();
    await expect(
      Fastener.update({ preloadedNutHeightMm: null }, { where: { size: "M24" } }),
    ).rejects.toThrow();
    expect(await Section.count({ where: { designation: "HE 1 A" } })).toBe(0);
  });
});

describe("stock plates", () => {
  it("are the common list until an organisation sets its own", async () => {
    const common = thicknesses(loadSeedCatalog().stockPlates);
    expect(thicknesses(await listStockPlates(firm.id))).toEqual(common);
    const set = await inTransaction((tx) => replaceStockPlates(tx, firm.id, [20, 12, 14]));
    expect(thicknesses(set)).toEqual([12, 14, 20]);
    expect(set.every((plate) => plate.source.length > 0)).toBe(true);
    expect(thicknesses((await loadCatalog(firm.id)).stockPlates)).toEqual([12, 14, 20]);
    expect(thicknesses(await listStockPlates(other.id))).toEqual(common);
  });

  it("are replaced as a whole, and no start brings a thickness back", async () => {
    await inTransaction((tx) => replaceStockPlates(tx, firm.id, [8]));
    await seedAll(environment().databaseUrl, { demo: false });
    expect(thicknesses(await listStockPlates(firm.id))).toEqual([8]);
  });

  it("are named once and have a thickness", async () => {
    const plate = { organisationId: firm.id, source: "Test" };
    await expect(StockPlate.create({ ...plate, thicknessMm: 8 })).rejects.toThrow();
    await expect(StockPlate.create({ ...plate, thicknessMm: 0 })).rejects.toThrow();
    await expect(
      StockPlate.create({ organisationId: null, source: "Test", thicknessMm: 10 }),
    ).rejects.toThrow();
  });
});
