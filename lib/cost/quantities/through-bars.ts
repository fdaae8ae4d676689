import type { MeasureCase } from "@/lib/calc";
import { type BoltedSide, boltedSides, rowsAtLevels } from "./bolt-rows";
import { barMassKg, boltMassKg, nutMassKg, threadBeyondNutMm, washerMassKg } from "./fastener-mass";
import type { MeasureContext } from "./measure-context";
import type { QuantityTake } from "./quantities";

type Measure = Extract<MeasureCase, { kind: "through-bars" }>;

/**
 * One bar for each bolt position of the rows at the given levels, through both column flanges. It
 * takes the place of the bolts of every joint it serves; a one-sided node needs holes in the far flange.
 */
export function takeThroughBars(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  const sides = boltedSides(context.joints);
  const lead = sides[0];
  if (lead === undefined) return;
  const bars = Math.max(
    ...sides.map((side) => rowsAtLevels(side, measure.levels) * side.connection.bolts.perRow),
  );
  if (bars === 0) return;
  takeBars(
    take,
    context,
    measure,
    lead,
    bars,
    sides.reduce((sum, side) => sum + side.connection.plate.thicknessMm, 0),
  );
  for (const side of sides) takeSavedBolts(take, context, side, measure);
  if (sides.length === 1) {
    take.records.push({
      driver: "hole",
      group: `section ${measure.size.holeMm}`,
      values: {
        through: "section",
        holes: bars,
        diameterMm: measure.size.holeMm,
        thicknessMm: context.column.flangeThicknessMm,
      },
    });
  }
}

function takeBars(
  take: QuantityTake,
  { column }: MeasureContext,
  measure: Measure,
  lead: BoltedSide,
  bars: number,
  platesMm: number,
): void {
  const { size, grade } = measure;
  const { gaugeMm, preloaded } = lead.connection.bolts;
  const ends = size.washerThicknessMm + size.nutHeightMm + threadBeyondNutMm(size);
  const lengthMm = column.depthMm + platesMm + 2 * ends;
  const outerNuts = 2 * bars;
  const innerNuts = measure.innerNuts ? 2 * bars : 0;
  const washers = outerNuts + innerNuts;
  const masses = {
    massKg: bars * barMassKg(size, lengthMm),
    nutMassKg: (outerNuts + innerNuts) * nutMassKg(size),
    washerMassKg: washers * washerMassKg(size),
  };
  take.records.push({
    driver: "bar",
    group: `${size.name} ${grade.name}`,
    values: {
      bars,
      grade: grade.name,
      diameterMm: size.diameterMm,
      lengthM: (bars * lengthMm) / 1000,
      ends: 2 * bars,
      innerNuts,
      outerNuts,
      washers,
      ...masses,
      spannerRoomMm: (gaugeMm - column.webThicknessMm) / 2,
      preloaded: preloaded ? 1 : 0,
    },
  });
  take.addMass("threaded-bar", masses.massKg);
  take.addMass("nut", masses.nutMassKg);
  take.addMass("washer", masses.washerMassKg);
}

/** Bolts that are not bought and not tightened, with their nuts and two washers: negative. */
function takeSavedBolts(
  take: QuantityTake,
  { column }: MeasureContext,
  side: BoltedSide,
  measure: Measure,
): void {
  const { size, grade, perRow, preloaded } = side.connection.bolts;
  const bolts = rowsAtLevels(side, measure.levels) * perRow;
  if (bolts === 0) return;
  const bolt = bolts * boltMassKg(size, side.connection.plate.thicknessMm + column.flangeThicknessMm);
  const nuts = bolts * nutMassKg(size);
  const washers = 2 * bolts * washerMassKg(size);
  take.records.push({
    driver: "bolt-saved",
    group: `${size.name} ${grade.name}`,
    values: {
      bolts: -bolts,
      grade: grade.name,
      diameterMm: size.diameterMm,
      massKg: -(bolt + nuts + washers),
      preloaded: preloaded ? 1 : 0,
    },
  });
  take.addMass("bolt", -bolt);
  take.addMass("nut", -nuts);
  take.addMass("washer", -washers);
}
