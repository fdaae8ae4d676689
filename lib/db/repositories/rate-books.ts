import { type Model, type ModelStatic, Op, type Transaction, literal } from "sequelize";
import type { ShopPrices } from "@/lib/cost/prices";
import { database } from "@/lib/db/transaction";
import { parseShopPrices } from "@/lib/schemas/shop-prices";
import { CarbonFactor } from "@/models/carbon-factor";
import { CarbonTable } from "@/models/carbon-table";
import { LookUpTable } from "@/models/look-up-table";
import { RateBook } from "@/models/rate-book";
import { RateLine } from "@/models/rate-line";
import { TimeConstant } from "@/models/time-constant";
import { TimeRule } from "@/models/time-rule";
import { TimeTable } from "@/models/time-table";

/** No issued version is in force: the database has not been seeded, or every version begins later. */
export class NoPricesInForce extends Error {
  override readonly name = "NoPricesInForce";
  constructor(readonly what: string) {
    super(`No issued ${what} is in force.`);
  }
}

/** The issued version in force today: the organisation's own, else the one that everybody starts with. */
async function inForce<M extends Model>(
  model: ModelStatic<M>,
  what: string,
  organisationId: string,
  tx: Transaction | null,
): Promise<M> {
  const newestOf = (owner: string | null): Promise<M | null> =>
    model.findOne({
      where: {
        organisationId: owner,
        state: "issued",
        validFrom: { [Op.lte]: literal("CURRENT_DATE") },
      } as never,
      order: [
        ["validFrom", "DESC"],
        ["version", "DESC"],
        ["issuedAt", "DESC"],
      ],
      transaction: tx,
    });
  const found = (await newestOf(organisationId)) ?? (await newestOf(null));
  if (found === null) throw new NoPricesInForce(what);
  return found;
}

const labelOf = ({ label, version }: { label: string; version: number }): string =>
  `${label}, version ${version}`;

async function readRateBook(book: RateBook, tx: Transaction | null): Promise<unknown> {
  const lines = await RateLine.findAll({
    where: { rateBookId: book.id },
    order: [["item", "ASC"]],
    transaction: tx,
  });
  return {
    id: book.id,
    label: labelOf(book),
    currency: book.currency,
    minorDigits: book.minorDigits,
    validFrom: book.validFrom,
    lines: Object.fromEntries(
      lines.map(({ item, unit, low, likely, high, source }) => [
        item,
        { unit, low: Number(low), likely: Number(likely), high: Number(high), source },
      ]),
    ),
  };
}

async function readTimeTable(table: TimeTable, tx: Transaction | null): Promise<unknown> {
  const where = { timeTableId: table.id };
  const [rules, constants, lookUps] = await Promise.all([
    TimeRule.findAll({
      where,
      order: [["position", "ASC"]],
      attributes: { exclude: ["id", "timeTableId", "position"] },
      raw: true,
      transaction: tx,
    }),
    TimeConstant.findAll({ where, raw: true, transaction: tx }),
    LookUpTable.findAll({ where, raw: true, transaction: tx }),
  ]);
  return {
    id: table.id,
    label: labelOf(table),
    rules: rules.map(({ place, ...rule }) => ({ ...rule, where: place })),
    constants: Object.fromEntries(
      constants.map(({ name, numberValue, textValue, label, unit, source }) => [
        name,
        { value: numberValue ?? textValue, label, unit, source },
      ]),
    ),
    lookUps: Object.fromEntries(
      lookUps.map(({ name, kind, label, unit, entries }) => [name, { kind, label, unit, entries }]),
    ),
  };
}

async function readCarbonTable(table: CarbonTable, tx: Transaction | null): Promise<unknown> {
  const factors = await CarbonFactor.findAll({ where: { carbonTableId: table.id }, transaction: tx });
  return {
    id: table.id,
    label: labelOf(table),
    factors: Object.fromEntries(
      factors.map(({ product, kgCo2ePerKg, source }) => [
        product,
        { kgCo2ePerKg: Number(kgCo2ePerKg), source },
      ]),
    ),
  };
}

/** Issued versions never change, so what was read once is kept, and with it the compiled rules. */
const kept = new Map<string, ShopPrices>();
const MOST_KEPT = 50;

/**
 * The rate book, time table and carbon table in force today for an organisation; their ids and
 * labels, with the version, are in them.
 *
 * @throws NoPricesInForce where one of the three has no issued version.
 * @throws ZodError where a row was put into the database that no figure may be.
 */
export async function loadCurrentPrices(
  organisationId: string,
  tx: Transaction | null = null,
): Promise<ShopPrices> {
  database();
  const [book, table, carbon] = await Promise.all([
    inForce(RateBook, "rate book", organisationId, tx),
    inForce(TimeTable, "time table", organisationId, tx),
    inForce(CarbonTable, "carbon table", organisationId, tx),
  ]);
  const key = [book.id, table.id, carbon.id].join(" ");
  const known = kept.get(key);
  if (known !== undefined) return known;
  const [rateBook, timeTable, carbonTable] = await Promise.all([
    readRateBook(book, tx),
    readTimeTable(table, tx),
    readCarbonTable(carbon, tx),
  ]);
  const prices = parseShopPrices({ rateBook, timeTable, carbon: carbonTable });
  const oldest = kept.size >= MOST_KEPT ? kept.keys().next().value : undefined;
  if (oldest !== undefined) kept.delete(oldest);
  kept.set(key, prices);
  return prices;
}
