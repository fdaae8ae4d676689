import { z } from "zod";

/**
 * A data file of the catalogue: column names once, one short array a row. The last column of every row,
 * `source`, holds a key of `sources`, so each row says where its figures are from.
 */
export const CompactTable = z.strictObject({
  about: z.string().min(1),
  sources: z.record(z.string(), z.string().min(1)),
  columns: z.array(z.string()).min(2),
  rows: z.array(z.array(z.union([z.string(), z.number(), z.null()]))).min(1),
});

export type Cell = string | number | null;

/**
 * Spells a compact table out into one object a row, with the full text of its source.
 *
 * @param file - name for the messages.
 * @throws CatalogFault where a row has too few or too many cells or names no known source.
 */
export function rowsOfTable(file: string, input: unknown): readonly Readonly<Record<string, Cell>>[] {
  const parsed = CompactTable.safeParse(input);
  if (!parsed.success) throw new CatalogFault(file, parsed.error.issues[0]?.message ?? "is not a table");
  const table = parsed.data;
  if (table.columns.at(-1) !== "source") throw new CatalogFault(file, "has no column source at the end");
  return table.rows.map((cells, index) => {
    if (cells.length !== table.columns.length) {
      throw new CatalogFault(
        file,
        `row ${index + 1} has ${cells.length} cells instead of ${table.columns.length}`,
      );
    }
    const source = table.sources[String(cells.at(-1))];
    if (source === undefined) throw new CatalogFault(file, `row ${index + 1} names no known source`);
    const row: Record<string, Cell> = {};
    table.columns.forEach((column, at) => (row[column] = cells[at] ?? null));
    return { ...row, source };
  });
}

/** A catalogue file or row that cannot be used: a fault of the data, found when it is loaded. */
export class CatalogFault extends Error {
  override readonly name = "CatalogFault";
  constructor(
    readonly where: string,
    readonly fault: string,
  ) {
    super(`Catalogue, ${where}: ${fault}`);
  }
}
