import { pairsOfMeasure, type Level, type MeasureCase, type Side } from "@/lib/calc";
import { boltedSides, rowsAtLevels } from "./bolt-rows";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";

type Measure = Extract<MeasureCase, { kind: "backing-plates" }>;

/** Plates on one side of the web: one a level, parted in two by a stiffener there. */
function piecesOn({ column, joints, measures }: MeasureContext, measure: Measure, side: Side): number {
  const pairs = measures.flatMap((other) =>
    other.kind === "transverse-stiffeners" ? pairsOfMeasure(column, joints, other) : [],
  );
  const isParted = (level: Level): boolean =>
    pairs.some((pair) => pair.level === level && pair.sides.includes(side));
  return measure.levels.reduce((sum, level) => sum + (isParted(level) ? 2 : 1), 0);
}

/**
 * Loose plates behind the flange of each bolted side, one each side of the web, held by the bolts. A stiffener
 * at their level parts each into two.
 */
export function takeBackingPlates(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  const sides = boltedSides(context.joints).filter(
    ({ joint }) => (measure.at ?? "both") === "both" || measure.at === joint.side,
  );
  for (const side of sides) {
    const pieces = piecesOn(context, measure, side.joint.side);
    const parts = 2 * pieces;
    const { size, perRow } = side.connection.bolts;
    takePlates(take, context.pieceMassKg, {
      partType: "backing-plate",
      parts,
      grade: measure.steel.grade,
      thicknessMm: measure.thicknessMm,
      lengthMm: (measure.lengthMm * measure.levels.length) / pieces,
      widthMm: measure.widthMm,
      corners: 0,
      clipMm: 0,
      overlapMm2: (measure.widthMm * measure.lengthMm * measure.levels.length) / pieces,
    });
    take.records.push({
      driver: "hole",
      group: `plate ${size.holeMm}`,
      values: {
        through: "plate",
        holes: rowsAtLevels(side, measure.levels) * perRow,
        diameterMm: size.holeMm,
        thicknessMm: measure.thicknessMm,
      },
    });
  }
}
