import type { JointCase, Level, MeasureCase, NodeCase } from "@/lib/calc/node";
import type { Shape } from "./design-space";
import { forceLevels } from "./force-levels";
import type { Stock } from "./stock";

/** Plates are cut to whole steps of 20 mm in length (common practice, no source). */
const LENGTH_STEP_MM = 20;
/** EN 1993-1-8:2005, 6.2.4.3(3), as section 0 of the method has it: so many bolt diameters beyond the outer rows. */
const BEYOND_ROWS = 2;

interface BackedRows {
  readonly spanMm: number;
  readonly diameterMm: number;
  /** The longest pattern of a row by itself, Table 6.4. */
  readonly patternMm: number;
}

function rowsBacked(node: NodeCase, joint: JointCase, level: Level): BackedRows | null {
  const { connection, beam } = joint;
  if (connection.kind !== "end-plate") return null;
  const { rowsMm, gaugeMm, size } = connection.bolts;
  const middle = beam.section.depthMm / 2;
  const rows = rowsMm.filter((row) => (row < middle ? "top" : "bottom") === level);
  if (rows.length === 0) return null;
  const { section } = node.column;
  const m = (gaugeMm - section.webThicknessMm) / 2 - 0.8 * section.rootMm;
  const e = (section.widthMm - gaugeMm) / 2;
  return {
    spanMm: Math.max(...rows) - Math.min(...rows),
    diameterMm: size.diameterMm,
    patternMm: Math.max(2 * Math.PI * m, 4 * m + 1.25 * e),
  };
}

/** Lengths worth trying, mm: from what detailing asks for to what backs every pattern whole. */
function lengthsMm(backed: readonly BackedRows[]): readonly number[] {
  const steps = (mm: number): number => Math.ceil(mm / LENGTH_STEP_MM - 1e-9);
  const least = steps(Math.max(...backed.map((rows) => rows.spanMm + 2 * BEYOND_ROWS * rows.diameterMm)));
  const most = steps(Math.max(...backed.map((rows) => rows.spanMm + rows.patternMm)));
  return Array.from({ length: Math.max(1, most - least + 1) }, (_, step) => (least + step) * LENGTH_STEP_MM);
}

/** Every stock shape of backing plates behind the rows that pull, up to twice as thick as the column's flange. */
export function backingPlateSpace(node: NodeCase, stock: Stock): readonly Shape[] {
  const { section } = node.column;
  const widthMm = Math.floor((section.widthMm - section.webThicknessMm) / 2 - section.rootMm);
  const levels = forceLevels(node).tension.filter((level) =>
    node.joints.every((joint) => rowsBacked(node, joint, level) !== null),
  );
  if (levels.length === 0 || widthMm <= 0) return [];
  const backed = node.joints.flatMap((joint) =>
    levels.flatMap((level) => rowsBacked(node, joint, level) ?? []),
  );
  const lengths = lengthsMm(backed);
  return stock.plates
    .filter(({ thicknessMm }) => thicknessMm <= 2 * section.flangeThicknessMm)
    .map(({ thicknessMm, steel }) => ({
      ladders: [lengths.length],
      build: ([step]: readonly number[]): readonly MeasureCase[] => [
        { kind: "backing-plates", levels, thicknessMm, widthMm, lengthMm: lengths[step ?? 0] ?? 0, steel },
      ],
    }));
}
