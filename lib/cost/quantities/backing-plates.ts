import type { MeasureCase } from "@/lib/calc";
import { boltedSides, rowsAtLevels } from "./bolt-rows";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";

type Measure = Extract<MeasureCase, { kind: "backing-plates" }>;

/** Loose plates behind the flange of each bolted side, one each side of the web, held by the bolts. */
export function takeBackingPlates(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  for (const side of boltedSides(context.joints)) {
    const parts = 2 * measure.levels.length;
    const { size, perRow } = side.connection.bolts;
    takePlates(take, context.pieceMassKg, {
      partType: "backing-plate",
      parts,
      grade: measure.steel.grade,
      thicknessMm: measure.thicknessMm,
      lengthMm: measure.lengthMm,
      widthMm: measure.widthMm,
      corners: 0,
      clipMm: 0,
      overlapMm2: measure.widthMm * measure.lengthMm,
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
