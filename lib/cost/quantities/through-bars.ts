import type { MeasureCase } from "@/lib/calc";
import { type BoltedSide, barRowsOf, boltedSides } from "./bolt-rows";
import { barMassKg, boltMassKg, nutMassKg, threadBeyondNutMm, washerMassKg } from "./fastener-mass";
import type { MeasureContext } from "./measure-context";
import type { QuantityTake } from "./quantities";

type Measure = Extract<MeasureCase, { kind: "through-bars" }>;

/**
 * One bar for each bolt position of the rows at the given levels, through both column flanges. It takes the place of
 * the bolts of every joint it serves; where no beam faces it, it needs holes in the far flange.
 */
export function takeThroughBars(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  const sides = boltedSides(context.joints);
  const rows = barRowsOf(sides, measure);
  for (const group of [sides, ...(sides.length > 1 ? sides.map((side) => [side]) : [])]) {
    const lead = group[0];
    const here = rows.filter((row) => isSameGroup(row.sides, group));
    if (lead === undefined || here.length === 0) continue;
    const bars = here.length * lead.connection.bolts.perRow;
    const platesMm = group.reduce((sum, side) => sum + side.connection.plate.thicknessMm, 0);
    takeBars(take, context, measure, lead, bars, platesMm);
    if (group.length === 1) takeFarHoles(take, context, measure, bars);
  }
  for (const side of sides) {
    const replaced = rows.filter((row) => row.sides.includes(side)).length;
    takeSavedBolts(take, context, side, replaced * side.connection.bolts.perRow);
  }
}

const isSameGroup = (a: readonly BoltedSide[], b: readonly BoltedSide[]): boolean =>
  a.length === b.length && a.every((side) => b.includes(side));

/** Holes in the flange that no beam is bolted to. */
function takeFarHoles(take: QuantityTake, context: MeasureContext, measure: Measure, holes: number): void {
  take.records.push({
    driver: "hole",
    group: `section ${measure.size.holeMm}`,
    values: {
      through: "section",
      holes,
      diameterMm: measure.size.holeMm,
      thicknessMm: context.column.flangeThicknessMm,
    },
  });
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
  bolts: number,
): void {
  const { size, grade, preloaded } = side.connection.bolts;
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
