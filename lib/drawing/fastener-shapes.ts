import { isBarRow } from "@/lib/calc";
import type { FastenerSize, Level, MeasureCase } from "@/lib/calc/node";
import type { Shape } from "./drawing";
import { levelOfRow, outerFaceMm, type Frame, type PlacedJoint } from "./frame";
import { line, rectBetween } from "./shapes";

type ThroughBars = Extract<MeasureCase, { kind: "through-bars" }>;
type BackingPlates = Extract<MeasureCase, { kind: "backing-plates" }>;

/** How far a bar is drawn past its outer nut, as a share of its diameter: common practice, no source. */
const BAR_END = 0.4;

const barsAt = (measures: readonly MeasureCase[], level: Level): ThroughBars | undefined =>
  measures.find(
    (measure): measure is ThroughBars => measure.kind === "through-bars" && measure.levels.includes(level),
  );

/** Thickness of a backing plate behind the flange at a level, mm; 0 without one. */
export const backingMm = (measures: readonly MeasureCase[], level: Level): number =>
  measures.find(
    (measure): measure is BackingPlates =>
      measure.kind === "backing-plates" && measure.levels.includes(level),
  )?.thicknessMm ?? 0;

/** One nut or head lying against a face: a rectangle `heightMm` thick along x and the hexagon's width across. */
const hexagon = (
  size: FastenerSize,
  faceMm: number,
  away: number,
  thickMm: number,
  yMm: number,
  isBar: boolean,
  row: number,
): Shape =>
  rectBetween(
    isBar ? "nut" : "bolt",
    isBar ? "bar-nut" : "fastener",
    { x: faceMm, y: yMm - size.acrossFlatsMm / 2 },
    { x: faceMm + away * thickMm, y: yMm + size.acrossFlatsMm / 2 },
    { side: faceMm < 0 ? "left" : "right", row },
  );

const washer = (
  size: FastenerSize,
  faceMm: number,
  away: number,
  yMm: number,
  isBar: boolean,
  row: number,
): Shape =>
  rectBetween(
    isBar ? "nut" : "bolt",
    isBar ? "bar-nut" : "fastener",
    { x: faceMm, y: yMm - size.washerDiameterMm / 2 },
    { x: faceMm + away * size.washerThicknessMm, y: yMm + size.washerDiameterMm / 2 },
    { side: faceMm < 0 ? "left" : "right", row },
  );

export interface BoltPlace {
  readonly sign: -1 | 1;
  readonly outerMm: number;
  /** Face inside the column that the nut bears on. */
  readonly innerMm: number;
  readonly yMm: number;
  readonly row: number;
}

/** A bolt seen from the side: head outside, nut with its washer inside the column, shank between. */
export function boltShapes(size: FastenerSize, { sign, outerMm, innerMm, yMm, row }: BoltPlace): Shape[] {
  const d = size.diameterMm;
  const nutFaceMm = innerMm - sign * size.washerThicknessMm;
  const endMm = nutFaceMm - sign * (size.nutHeightMm + BAR_END * d);
  const side = sign < 0 ? "left" : "right";
  return [
    rectBetween("bolt", "shank", { x: outerMm, y: yMm - d / 2 }, { x: endMm, y: yMm + d / 2 }, { side, row }),
    hexagon(size, outerMm, sign, size.headHeightMm, yMm, false, row),
    washer(size, innerMm, -sign, yMm, false, row),
    hexagon(size, nutFaceMm, -sign, size.nutHeightMm, yMm, false, row),
    line(
      "bolt",
      "centre",
      [
        { x: outerMm + sign * size.headHeightMm * 1.8, y: yMm },
        { x: endMm - sign * size.headHeightMm * 0.8, y: yMm },
      ],
      { side, row },
    ),
  ];
}

/** A threaded bar through both flanges with its outer nuts and, where fitted, its inner ones. */
export function barShapes(
  bars: ThroughBars,
  faces: { readonly leftOuterMm: number; readonly rightOuterMm: number; readonly innerMm: number },
  yMm: number,
  row: number,
): Shape[] {
  const { size } = bars;
  const pastMm = size.washerThicknessMm + size.nutHeightMm + BAR_END * size.diameterMm;
  const bar = rectBetween(
    "bar",
    "bar",
    { x: faces.leftOuterMm - pastMm, y: yMm - size.diameterMm / 2 },
    { x: faces.rightOuterMm + pastMm, y: yMm + size.diameterMm / 2 },
    { row },
  );
  const nuts = ([-1, 1] as const).flatMap((sign) => {
    const outer = sign < 0 ? faces.leftOuterMm : faces.rightOuterMm;
    const inner = sign * faces.innerMm;
    return [
      washer(size, outer, sign, yMm, true, row),
      hexagon(size, outer + sign * size.washerThicknessMm, sign, size.nutHeightMm, yMm, true, row),
      ...(bars.innerNuts ? [hexagon(size, inner, -sign, size.nutHeightMm, yMm, true, row)] : []),
    ];
  });
  return [bar, ...nuts];
}

/** Rows of the whole node by height: a bar goes through both sides, so equal heights are one row. */
function barRows(frame: Frame, bars: ThroughBars, level: Level): { yMm: number; row: number }[] {
  const { at } = bars;
  const named = frame.joints.filter(({ side }) => at === undefined || at === "both" || at === side);
  const rows = named.flatMap((placed) =>
    placed.rowsMm.flatMap((yMm, index) =>
      levelOfRow(placed, yMm) === level && isBarRow(bars, yMm) ? [{ yMm, row: index + 1 }] : [],
    ),
  );
  return rows.filter(({ yMm }, index) => rows.findIndex((other) => Math.abs(other.yMm - yMm) < 1) === index);
}

/** Whether a bar passes at this height, so that no bolt stands there. */
const isBarAt = (frame: Frame, measures: readonly MeasureCase[], yMm: number): boolean =>
  (["top", "bottom"] as const).some((level) => {
    const bars = barsAt(measures, level);
    return bars !== undefined && barRows(frame, bars, level).some((row) => Math.abs(row.yMm - yMm) < 1);
  });

const boltsOfJoint = (frame: Frame, placed: PlacedJoint, measures: readonly MeasureCase[]): Shape[] => {
  const { connection } = placed.joint;
  if (connection.kind !== "end-plate") return [];
  return placed.rowsMm.flatMap((yMm, index) => {
    const level = levelOfRow(placed, yMm);
    if (isBarAt(frame, measures, yMm)) return [];
    const innerMm = placed.sign * (frame.innerFaceMm - backingMm(measures, level));
    return boltShapes(connection.bolts.size, {
      sign: placed.sign,
      outerMm: placed.beamStartMm,
      innerMm,
      yMm,
      row: index + 1,
    });
  });
};

/** Every bolt and bar of the elevation. A bar takes the place of the bolts of its row on both sides. */
export function fastenerShapes(frame: Frame, measures: readonly MeasureCase[]): Shape[] {
  const bars = (["top", "bottom"] as const).flatMap((level) => {
    const measure = barsAt(measures, level);
    if (!measure) return [];
    const innerMm = frame.innerFaceMm - backingMm(measures, level);
    return barRows(frame, measure, level).flatMap(({ yMm, row }) =>
      barShapes(
        measure,
        { leftOuterMm: outerFaceMm(frame, -1, yMm), rightOuterMm: outerFaceMm(frame, 1, yMm), innerMm },
        yMm,
        row,
      ),
    );
  });
  return [...frame.joints.flatMap((placed) => boltsOfJoint(frame, placed, measures)), ...bars];
}
