/** The printed tables of a CalculiX .dat file. */

export interface PrintedTable {
  /** "displacements", "total force", "stresses". */
  readonly quantity: string;
  readonly set: string;
  readonly rows: readonly (readonly number[])[];
}

const HEADING = /^\s*(displacements|total force|stresses)\s*\(.*\) for set (\S+) and time/;

/** Reads all tables; what it does not know is left out. */
export function readTables(text: string): PrintedTable[] {
  const tables: { quantity: string; set: string; rows: number[][] }[] = [];
  for (const line of text.split("\n")) {
    const heading = HEADING.exec(line);
    if (heading) {
      tables.push({ quantity: heading[1]!, set: heading[2]!, rows: [] });
    } else if (line.trim() !== "") {
      const row = line.trim().split(/\s+/).map(Number);
      if (row.every(Number.isFinite)) tables.at(-1)?.rows.push(row);
    }
  }
  return tables;
}

/** Rows of the one table asked for. @throws where the run did not print it. */
export function rowsOf(
  tables: readonly PrintedTable[],
  quantity: string,
  set: string,
): readonly (readonly number[])[] {
  const found = tables.find((table) => table.quantity === quantity && table.set === set);
  if (!found || found.rows.length === 0) {
    throw new Error(`CalculiX printed no ${quantity} for ${set}: read its output in the folder of the run.`);
  }
  return found.rows;
}
