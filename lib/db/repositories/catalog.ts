import type { Transaction } from "sequelize";
import type { Catalog, FastenerRow, StockPlateRow } from "@/lib/catalog/catalog";
import { checkCatalog } from "@/lib/catalog/check-catalog";
import { database } from "@/lib/db/transaction";
import { Angle } from "@/models/angle";
import { Fastener } from "@/models/fastener";
import { FastenerGrade } from "@/models/fastener-grade";
import { Section } from "@/models/section";
import { Steel } from "@/models/steel";
import { StockPlate } from "@/models/stock-plate";

/** Where a thickness comes from that an organisation put on its own list. */
const OWN_LIST = "The shop's own list";

function fastenerRow(fastener: Fastener): FastenerRow {
  const {
    id: _,
    preloadedAcrossFlatsMm: acrossFlatsMm,
    preloadedAcrossPointsMm: acrossPointsMm,
    preloadedNutHeightMm: nutHeightMm,
    preloadedNutHeightHvMm: nutHeightHvMm,
    preloadedWasherDiameterMm: washerDiameterMm,
    preloadedWasherThicknessMm: washerThicknessMm,
    ...plain
  } = fastener.get({ plain: true });
  const isPreloaded =
    acrossFlatsMm !== null &&
    acrossPointsMm !== null &&
    nutHeightMm !== null &&
    washerDiameterMm !== null &&
    washerThicknessMm !== null;
  return {
    ...plain,
    preloaded: isPreloaded
      ? { acrossFlatsMm, acrossPointsMm, nutHeightMm, nutHeightHvMm, washerDiameterMm, washerThicknessMm }
      : null,
  };
}

/** The plate thicknesses of an organisation, ascending: its own list where it has set one, else the common list. */
export async function listStockPlates(
  organisationId: string,
  tx: Transaction | null = null,
): Promise<StockPlateRow[]> {
  database();
  const attributes = ["thicknessMm", "source"];
  const listOf = (owner: string | null): Promise<StockPlate[]> =>
    StockPlate.findAll({
      where: { organisationId: owner },
      attributes,
      order: [["thicknessMm", "ASC"]],
      transaction: tx,
    });
  const own = await listOf(organisationId);
  const plates = own.length > 0 ? own : await listOf(null);
  return plates.map(({ thicknessMm, source }) => ({ thicknessMm, source }));
}

/** Gives an organisation a list of its own, in place of whatever it had. */
export async function replaceStockPlates(
  tx: Transaction,
  organisationId: string,
  thicknessesMm: readonly number[],
): Promise<StockPlateRow[]> {
  await StockPlate.destroy({ where: { organisationId }, transaction: tx });
  const plates = thicknessesMm.map((thicknessMm) => ({ organisationId, thicknessMm, source: OWN_LIST }));
  await StockPlate.bulkCreate(plates, { transaction: tx });
  return listStockPlates(organisationId, tx);
}

/**
 * The catalogue with the stock plates of one organisation, in the order of the printed tables.
 *
 * @throws CatalogFault where a row was put into the database that no catalogue may hold.
 */
export async function loadCatalog(organisationId: string, tx: Transaction | null = null): Promise<Catalog> {
  database();
  const options = { order: [["id", "ASC"]] as [string, string][], transaction: tx };
  const plain = { ...options, attributes: { exclude: ["id"] }, raw: true };
  const [sections, angles, steels, fasteners, fastenerGrades, stockPlates] = await Promise.all([
    Section.findAll(plain),
    Angle.findAll(plain),
    Steel.findAll(plain),
    Fastener.findAll(options),
    FastenerGrade.findAll(plain),
    listStockPlates(organisationId, tx),
  ]);
  return checkCatalog({
    sections,
    angles,
    steels: steels.map(({ strengthTable: table, ...row }) => ({ ...row, table })),
    fasteners: fasteners.map(fastenerRow),
    fastenerGrades,
    stockPlates,
  });
}
