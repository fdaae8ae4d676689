import type { FastenerSize, FlangeCleatConnection } from "@/lib/calc/node";
import type { Shape } from "./drawing";
import { boltShapes } from "./fastener-shapes";
import type { Frame, PlacedJoint } from "./frame";
import { polygon, rectBetween } from "./shapes";

/** The cleats of a joint, or nothing where it has another connection. */
export const cleatsOf = ({ joint }: PlacedJoint): FlangeCleatConnection | null =>
  joint.connection.kind === "flange-cleats" ? joint.connection : null;

/** Where an angle has its heel, and which way its column leg goes: up (-1) from the top flange, down (1) from the bottom one. */
interface Heel {
  readonly yMm: number;
  readonly away: -1 | 1;
  readonly row: number;
}

const heelsOf = ({ topMm, bottomMm }: PlacedJoint): readonly Heel[] => [
  { yMm: topMm, away: -1, row: 1 },
  { yMm: bottomMm, away: 1, row: 2 },
];

/** An angle seen along its length: one leg on the beam's flange, one on the column's. */
function angle(
  { columnFaceMm: x, sign, side }: PlacedJoint,
  cleats: FlangeCleatConnection,
  heel: Heel,
): Shape {
  const { columnLegMm, beamLegMm, thicknessMm } = cleats.cleat;
  const { yMm: y, away } = heel;
  return polygon(
    "cleat",
    "plate",
    [
      { x, y },
      { x: x + sign * beamLegMm, y },
      { x: x + sign * beamLegMm, y: y + away * thicknessMm },
      { x: x + sign * thicknessMm, y: y + away * thicknessMm },
      { x: x + sign * thicknessMm, y: y + away * columnLegMm },
      { x, y: y + away * columnLegMm },
    ],
    { side, level: away < 0 ? "top" : "bottom" },
  );
}

/** A bolt through the beam's flange: head on the angle, nut inside the beam. */
function beamBolt(size: FastenerSize, xMm: number, outerMm: number, innerMm: number, away: -1 | 1): Shape[] {
  const across = (fromMm: number, thickMm: number, widthMm: number, kind: "fastener" | "shank"): Shape =>
    rectBetween(
      "bolt",
      kind,
      { x: xMm - widthMm / 2, y: fromMm },
      { x: xMm + widthMm / 2, y: fromMm + thickMm },
    );
  const nutFaceMm = innerMm - away * size.washerThicknessMm;
  return [
    across(outerMm, nutFaceMm - away * size.nutHeightMm - outerMm, size.diameterMm, "shank"),
    across(outerMm, away * size.headHeightMm, size.acrossFlatsMm, "fastener"),
    across(innerMm, -away * size.washerThicknessMm, size.washerDiameterMm, "fastener"),
    across(nutFaceMm, -away * size.nutHeightMm, size.acrossFlatsMm, "fastener"),
  ];
}

function boltsAt(frame: Frame, placed: PlacedJoint, cleats: FlangeCleatConnection, heel: Heel): Shape[] {
  const { columnFaceMm, sign, joint } = placed;
  const { yMm, away, row } = heel;
  const { thicknessMm } = cleats.cleat;
  return [
    ...boltShapes(cleats.bolts.size, {
      sign,
      outerMm: columnFaceMm + sign * thicknessMm,
      innerMm: sign * frame.innerFaceMm,
      yMm: yMm + away * cleats.bolts.distanceMm,
      row,
    }),
    ...cleats.beamBolts.rowsMm.flatMap((fromHeelMm) =>
      beamBolt(
        cleats.beamBolts.size,
        columnFaceMm + sign * fromHeelMm,
        yMm + away * thicknessMm,
        yMm - away * joint.beam.section.flangeThicknessMm,
        away,
      ),
    ),
  ];
}

/** The leg of the web cleat that lies on the beam's web, in the middle of its depth. */
function webCleat(placed: PlacedJoint, cleats: FlangeCleatConnection): Shape[] {
  if (cleats.webCleats === null) return [];
  const { columnFaceMm, sign, topMm, bottomMm, side } = placed;
  const middleMm = (topMm + bottomMm) / 2;
  const { legMm, thicknessMm, lengthMm } = cleats.webCleats;
  const leg = (widthMm: number): Shape =>
    rectBetween(
      "cleat",
      "plate",
      { x: columnFaceMm, y: middleMm - lengthMm / 2 },
      { x: columnFaceMm + sign * widthMm, y: middleMm + lengthMm / 2 },
      { side },
    );
  return [leg(legMm), leg(thicknessMm)];
}

/** Angles and bolts of the joints that have cleats, in elevation. */
export function cleatShapes(frame: Frame): Shape[] {
  return frame.joints.flatMap((placed) => {
    const cleats = cleatsOf(placed);
    if (!cleats) return [];
    return [
      ...webCleat(placed, cleats),
      ...heelsOf(placed).flatMap((heel) => [
        angle(placed, cleats, heel),
        ...boltsAt(frame, placed, cleats, heel),
      ]),
    ];
  });
}

/** The angle on the beam's flange seen from above, with the bolts of both its legs. */
export function cleatPlan(frame: Frame): Shape[] {
  return frame.joints.flatMap((placed) => {
    const cleats = cleatsOf(placed);
    if (!cleats) return [];
    const { columnFaceMm, sign, side } = placed;
    const { lengthMm, beamLegMm, thicknessMm } = cleats.cleat;
    const leg = (widthMm: number): Shape =>
      rectBetween(
        "cleat",
        "plate",
        { x: columnFaceMm, y: -lengthMm / 2 },
        { x: columnFaceMm + sign * widthMm, y: lengthMm / 2 },
        { side },
      );
    const { size, gaugeMm, rowsMm } = cleats.beamBolts;
    const half = size.acrossFlatsMm / 2;
    const heads = rowsMm.flatMap((fromHeelMm) =>
      [-1, 1].map((signY) => {
        const [x, y] = [columnFaceMm + sign * fromHeelMm, (signY * gaugeMm) / 2];
        return rectBetween("bolt", "fastener", { x: x - half, y: y - half }, { x: x + half, y: y + half });
      }),
    );
    const columnBolts = [-1, 1].flatMap((signY) =>
      boltShapes(cleats.bolts.size, {
        sign,
        outerMm: columnFaceMm + sign * thicknessMm,
        innerMm: sign * frame.innerFaceMm,
        yMm: (signY * cleats.bolts.gaugeMm) / 2,
        row: 1,
      }),
    );
    return [leg(beamLegMm), leg(thicknessMm), ...heads, ...columnBolts];
  });
}
