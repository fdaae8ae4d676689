import { cleatsOf } from "./cleat-shapes";
import { acrossDimension, upDimension } from "./dimension-lines";
import type { Dimension } from "./drawing";
import type { Frame, PlacedJoint } from "./frame";

/** Elevation: the bolt's distance from the heel of the top angle, and the gap before the beam. */
export function cleatDimensions(placed: PlacedJoint, pixel: number): Dimension[] {
  const cleats = cleatsOf(placed);
  if (!cleats) return [];
  const { side, sign, topMm, columnFaceMm } = placed;
  const { beamLegMm, columnLegMm, thicknessMm } = cleats.cleat;
  const [fromX, toX] = sign < 0 ? [placed.beamStartMm, columnFaceMm] : [columnFaceMm, placed.beamStartMm];
  return [
    upDimension(
      {
        id: `${side}.cleat.distance`,
        edits: `${side}.connection.bolts.distance`,
        name: `${side} cleat bolt, from the heel of the angle`,
        valueMm: cleats.bolts.distanceMm,
      },
      {
        fromY: topMm - cleats.bolts.distanceMm,
        toY: topMm,
        atX: columnFaceMm + sign * (beamLegMm + 22 * pixel),
        extendFromX: columnFaceMm + sign * (thicknessMm + cleats.bolts.size.headHeightMm + 2 * pixel),
        text: "outside",
      },
      pixel,
    ),
    acrossDimension(
      {
        id: `${side}.cleat.gap`,
        edits: `${side}.connection.gap`,
        name: `${side} gap between column and beam`,
        valueMm: cleats.gapMm,
      },
      {
        fromX,
        toX,
        atY: topMm - columnLegMm - 20 * pixel,
        extendFromY: topMm - columnLegMm - 2 * pixel,
        text: sign < 0 ? "beyond-left" : "beyond-right",
      },
      pixel,
    ),
  ];
}

/** Section: the gauge of the bolts in the column and the length of the angle. */
export function cleatPlanDimensions(frame: Frame, placed: PlacedJoint, pixel: number): Dimension[] {
  const cleats = cleatsOf(placed);
  if (!cleats) return [];
  const { side, sign, columnFaceMm } = placed;
  const edge = sign < 0 ? frame.leftMm : frame.rightMm;
  const half = (distance: number) => ({ fromY: -distance / 2, toY: distance / 2 });
  return [
    upDimension(
      {
        id: `${side}.cleat.gauge`,
        edits: `${side}.connection.bolts.gauge`,
        name: `${side} cleat bolt gauge`,
        valueMm: cleats.bolts.gaugeMm,
      },
      {
        ...half(cleats.bolts.gaugeMm),
        atX: edge + sign * 16 * pixel,
        extendFromX: columnFaceMm + sign * (cleats.bolts.size.headHeightMm * 1.8 + 2 * pixel),
        text: "along",
      },
      pixel,
    ),
    upDimension(
      {
        id: `${side}.cleat.length`,
        edits: `${side}.connection.cleat.length`,
        name: `${side} cleat length`,
        valueMm: cleats.cleat.lengthMm,
      },
      {
        ...half(cleats.cleat.lengthMm),
        atX: edge + sign * 38 * pixel,
        extendFromX: columnFaceMm + sign * (cleats.cleat.beamLegMm + 2 * pixel),
        text: "along",
      },
      pixel,
    ),
  ];
}
