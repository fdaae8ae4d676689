import { isBarRow, type EndPlateConnection, type JointCase, type Level, type MeasureCase } from "@/lib/calc";

export interface BoltedSide {
  readonly joint: JointCase;
  readonly connection: EndPlateConnection;
}

/** The joints that have bolts through the column flange. */
export function boltedSides(joints: readonly JointCase[]): readonly BoltedSide[] {
  return joints.flatMap((joint) =>
    joint.connection.kind === "end-plate" ? [{ joint, connection: joint.connection }] : [],
  );
}

/** Heights of one side's bolt rows that belong to the given beam flange levels, mm below the top of the left beam. */
function rowHeightsMm({ joint, connection }: BoltedSide, levels: readonly Level[]): readonly number[] {
  const middle = joint.beam.section.depthMm / 2;
  return connection.bolts.rowsMm
    .filter((row) => levels.includes(row <= middle ? "top" : "bottom"))
    .map((row) => joint.levelOffsetMm + row);
}

/** How many bolt rows of one side belong to the given beam flange levels. */
export const rowsAtLevels = (side: BoltedSide, levels: readonly Level[]): number =>
  rowHeightsMm(side, levels).length;

type ThroughBars = Extract<MeasureCase, { kind: "through-bars" }>;

/** One height at which bars pass the column, and the joints whose bolts they replace there. */
export interface BarRow {
  readonly heightMm: number;
  readonly sides: readonly BoltedSide[];
}

/** Rows of bars, each once, whichever sides it serves. */
export function barRowsOf(sides: readonly BoltedSide[], measure: ThroughBars): readonly BarRow[] {
  const { levels, at } = measure;
  const rows: { heightMm: number; sides: BoltedSide[] }[] = [];
  const named = sides.filter(({ joint }) => at === undefined || at === "both" || at === joint.side);
  for (const side of [...named, ...sides.filter((side) => !named.includes(side))]) {
    for (const heightMm of rowHeightsMm(side, levels).filter((height) => isBarRow(measure, height))) {
      const same = rows.find((row) => Math.abs(row.heightMm - heightMm) < 0.5);
      if (same) same.sides.push(side);
      else if (named.includes(side)) rows.push({ heightMm, sides: [side] });
    }
  }
  return rows;
}
