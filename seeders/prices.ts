import type { Transaction } from "sequelize";
import type { TimeTable as TimeTableData } from "@/lib/cost/prices";
import { PRODUCTS } from "@/lib/cost/products";
import { CarbonFactor } from "@/models/carbon-factor";
import { CarbonTable } from "@/models/carbon-table";
import { LookUpTable } from "@/models/look-up-table";
import { RateBook } from "@/models/rate-book";
import { RateLine } from "@/models/rate-line";
import { TimeConstant } from "@/models/time-constant";
import { TimeRule } from "@/models/time-rule";
import { TimeTable } from "@/models/time-table";
import { loadSeedPrices } from "./data/load-prices";
import type { Seeder } from "./seeder";

/** First version of what everybody starts with. Found by label and version: once there, it is never touched again. */
const firstVersion = (label: string, validFrom: string) => ({
  organisationId: null,
  label,
  version: 1,
  validFrom,
});

async function addRateBook(transaction: Transaction): Promise<string[]> {
  const { label, currency, minorDigits, validFrom, lines } = loadSeedPrices().rateBook;
  if ((await RateBook.findOne({ where: { organisationId: null, label, version: 1 }, transaction })) !== null)
    return [];
  const book = await RateBook.create(
    { ...firstVersion(label, validFrom), currency, minorDigits },
    { transaction },
  );
  const rows = Object.entries(lines).map(([item, { unit, low, likely, high, source }]) => ({
    rateBookId: book.id,
    item,
    unit,
    low: low.toFixed(6),
    likely: likely.toFixed(6),
    high: high.toFixed(6),
    source,
  }));
  await RateLine.bulkCreate(rows, { transaction });
  await book.update({ state: "issued", issuedAt: new Date() }, { transaction });
  return [`rate book "${label}" with ${rows.length} rates`];
}

async function addTimeParts(
  timeTableId: string,
  { rules, constants, lookUps }: TimeTableData,
  transaction: Transaction,
): Promise<void> {
  const ruleRows = rules.map(({ where: place, ...rule }, position) => ({
    ...rule,
    place,
    position,
    timeTableId,
  }));
  const constantRows = Object.entries(constants).map(([name, { value, ...rest }]) => ({
    timeTableId,
    name,
    ...rest,
    numberValue: typeof value === "number" ? value : null,
    textValue: typeof value === "string" ? value : null,
  }));
  const lookUpRows = Object.entries(lookUps).map(([name, table]) => ({ timeTableId, name, ...table }));
  await TimeRule.bulkCreate(ruleRows, { transaction });
  await TimeConstant.bulkCreate(constantRows, { transaction });
  await LookUpTable.bulkCreate(lookUpRows, { transaction });
}

async function addTimeTable(transaction: Transaction): Promise<string[]> {
  const { timeTable, rateBook } = loadSeedPrices();
  const { label } = timeTable;
  if ((await TimeTable.findOne({ where: { organisationId: null, label, version: 1 }, transaction })) !== null)
    return [];
  const table = await TimeTable.create(firstVersion(label, rateBook.validFrom), { transaction });
  await addTimeParts(table.id, timeTable, transaction);
  await table.update({ state: "issued", issuedAt: new Date() }, { transaction });
  return [`time table "${label}" with ${timeTable.rules.length} operations`];
}

async function addCarbonTable(transaction: Transaction): Promise<string[]> {
  const { carbon, rateBook } = loadSeedPrices();
  const { label, factors } = carbon;
  if (
    (await CarbonTable.findOne({ where: { organisationId: null, label, version: 1 }, transaction })) !== null
  )
    return [];
  const table = await CarbonTable.create(firstVersion(label, rateBook.validFrom), { transaction });
  const rows = PRODUCTS.flatMap((product) => {
    const factor = factors[product];
    if (factor === undefined) return [];
    return [
      { carbonTableId: table.id, product, kgCo2ePerKg: factor.kgCo2ePerKg.toFixed(4), source: factor.source },
    ];
  });
  await CarbonFactor.bulkCreate(rows, { transaction });
  await table.update({ state: "issued", issuedAt: new Date() }, { transaction });
  return [`carbon table "${label}" with ${rows.length} factors`];
}

/** The rate book, time table and carbon table that everybody starts with, from the same files the command line reads. */
export const figures: Seeder = {
  name: "figures",
  demo: false,
  run: async ({ transaction }) => [
    ...(await addRateBook(transaction)),
    ...(await addTimeTable(transaction)),
    ...(await addCarbonTable(transaction)),
  ],
};
