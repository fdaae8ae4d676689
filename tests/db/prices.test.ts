/** Guards what prices a node in the database: the figures of the data files arrive whole, stay frozen once issued, and an organisation's own come first. */
import { randomUUID } from "node:crypto";
import { QueryTypes } from "sequelize";
import { beforeEach, describe, expect, it } from "vitest";
import { environment } from "@/lib/config/env";
import { loadCurrentPrices } from "@/lib/db/repositories/rate-books";
import { seedAll } from "@/lib/db/migrate";
import { database } from "@/lib/db/transaction";
import { Organisation } from "@/models/organisation";
import { RateBook } from "@/models/rate-book";
import { RateLine } from "@/models/rate-line";
import { TimeRule } from "@/models/time-rule";
import { loadSeedPrices } from "@/seeders/data/load-prices";

let firm: Organisation;

/** A firm of its own for each test: what is issued stays, so nothing is cleared away. */
beforeEach(async () => {
  database();
  firm = await Organisation.create({ name: `Prices ${randomUUID()}` });
});

/** A book of the firm's own, valid from the given date, with the common lines and one rate changed. */
async function issueOwnBook(validFrom: string, welderRate: string): Promise<RateBook> {
  const common = await RateBook.findOne({ where: { organisationId: null } });
  if (common === null) throw new Error("The common book is missing.");
  const label = `Own ${validFrom}`;
  const book = await RateBook.create({
    organisationId: firm.id,
    label,
    validFrom,
    currency: "EUR",
    minorDigits: 2,
  });
  const lines = await RateLine.findAll({ where: { rateBookId: common.id }, raw: true });
  await RateLine.bulkCreate(
    lines.map(({ id: _, ...line }) => {
      const isWelder = line.item === "labour:welder";
      return {
        ...line,
        rateBookId: book.id,
        ...(isWelder ? { low: welderRate, likely: welderRate, high: welderRate } : {}),
      };
    }),
  );
  return book.update({ state: "issued", issuedAt: new Date() });
}

describe("the figures in the database", () => {
  it("are those of the data files, digit for digit", async () => {
    const { rateBook, timeTable, carbon } = await loadCurrentPrices(firm.id);
    const seed = loadSeedPrices();
    expect(rateBook.lines).toEqual(seed.rateBook.lines);
    expect(timeTable.rules).toEqual(seed.timeTable.rules);
    expect(timeTable.constants).toEqual(seed.timeTable.constants);
    expect(timeTable.lookUps).toEqual(seed.timeTable.lookUps);
    expect(carbon.factors).toEqual(seed.carbon.factors);
  });

  it("are not added twice", async () => {
    expect(await seedAll(environment().databaseUrl, { demo: false })).toEqual([]);
  });

  it("are read once and kept while the same versions are in force", async () => {
    expect(await loadCurrentPrices(firm.id)).toBe(await loadCurrentPrices(firm.id));
  });

  it("keep six decimals of a rate", async () => {
    await issueOwnBook("2026-02-01", "58.123456");
    expect((await loadCurrentPrices(firm.id)).rateBook.lines["labour:welder"]?.likely).toBe(58.123456);
  });

  it("are the organisation's own where it has issued some, the newest that is in force", async () => {
    await issueOwnBook("2026-02-01", "60.000000");
    const newer = await issueOwnBook("2026-03-01", "61.000000");
    await issueOwnBook("2999-01-01", "99.000000");
    const { rateBook } = await loadCurrentPrices(firm.id);
    expect([rateBook.id, rateBook.lines["labour:welder"]?.likely]).toEqual([newer.id, 61]);
  });

  it("leave a draft out", async () => {
    const draft = await RateBook.create({
      organisationId: firm.id,
      label: "Draft",
      validFrom: "2026-05-01",
      currency: "EUR",
      minorDigits: 2,
    });
    expect((await loadCurrentPrices(firm.id)).rateBook.id).not.toBe(draft.id);
    await draft.destroy();
  });
});

describe("an issued version", () => {
  it("refuses every change of itself and its rows", async () => {
    const book = await RateBook.findOne({ where: { organisationId: null } });
    const rule = await TimeRule.findOne();
    const line = await RateLine.findOne({ where: { rateBookId: book?.id ?? "" } });
    if (book === null || rule === null || line === null) throw new Error("The common figures are missing.");
    const { id: _, ...copy } = line.get({ plain: true });
    await expect(book.update({ label: "Other" })).rejects.toThrow(/cannot be changed/);
    await expect(book.destroy()).rejects.toThrow(/cannot be changed/);
    await expect(line.update({ likely: "1.000000", low: "1.000000" })).rejects.toThrow(/cannot be changed/);
    await expect(line.destroy()).rejects.toThrow(/cannot be changed/);
    await expect(RateLine.create({ ...copy, item: "something-new" })).rejects.toThrow(/cannot be changed/);
    await expect(rule.update({ crew: 7 })).rejects.toThrow(/cannot be changed/);
  });

  it("takes no rows from a draft either", async () => {
    const sequelize = database();
    const draft = await RateBook.create({
      organisationId: firm.id,
      label: "Moving",
      validFrom: "2026-05-01",
      currency: "EUR",
      minorDigits: 2,
    });
    const rate = { low: "1", likely: "1", high: "1", unit: "kg" as const, source: "Test" };
    const line = await RateLine.create({ rateBookId: draft.id, item: "plate", ...rate });
    const [issued] = await sequelize.query<{ id: string }>(
      "SELECT id FROM rate_books WHERE state = 'issued' LIMIT 1",
      { type: QueryTypes.SELECT },
    );
    await expect(line.update({ rateBookId: issued?.id ?? "", item: "moved" })).rejects.toThrow(
      /cannot be changed/,
    );
    await draft.destroy();
  });

  it("needs low, likely and high in order, and a source", async () => {
    const draft = await RateBook.create({
      organisationId: firm.id,
      label: "Checks",
      validFrom: "2026-05-01",
      currency: "EUR",
      minorDigits: 2,
    });
    const line = { rateBookId: draft.id, item: "plate", unit: "kg" as const, source: "Test" };
    await expect(RateLine.create({ ...line, low: "2", likely: "1", high: "3" })).rejects.toThrow(/check/);
    await expect(RateLine.create({ ...line, low: "1", likely: "1", high: "1", source: " " })).rejects.toThrow(
      /check/,
    );
    await expect(
      RateLine.create({ ...line, low: "1", likely: "1", high: "1", unit: "stone" as never }),
    ).rejects.toThrow(/check/);
    await draft.destroy();
  });
});
