import type { PanelDesign } from "../measures/panel-design";
import type { FlangeCleatConnection, JointCase, Level, NodeCase } from "../node";
import { fastenerOf, jointViewOf, type BoltRow, type BoltedView } from "./connection-view";

/** A joint of top and seat angles with its tension flange at one level. */
export interface CleatView extends BoltedView {
  readonly connection: FlangeCleatConnection;
}

export const isCleatView = (view: BoltedView): view is CleatView =>
  view.joint.connection.kind === "flange-cleats";

/** The level whose angle a beam bears on: the lower one, or the upper one under uplift. */
export const bearingLevelOf = (shearN: number): Level => (shearN >= 0 ? "bottom" : "top");

/**
 * One row of bolts in the leg of each angle. The tension angle's row pulls; the other, beside the centre of
 * compression in the middle of the leg on the compression flange, carries shear. EN 1993-1-8:2005, 6.2.7.1, Figure 6.15.
 */
export function cleatViewOf(
  node: NodeCase,
  design: PanelDesign,
  joint: JointCase,
  connection: FlangeCleatConnection,
  tensionLevel: Level,
  steps: boolean,
): CleatView {
  const view = jointViewOf(node, design, joint, tensionLevel);
  const { depthMm } = joint.beam.section;
  const { bolts, cleat } = connection;
  const fastener = fastenerOf(node, bolts, null, steps);
  const rowAt = (level: Level, row: number): BoltRow => {
    const isTension = level === tensionLevel;
    return {
      row,
      belowTopMm: level === "top" ? -bolts.distanceMm : depthMm + bolts.distanceMm,
      fromFaceMm: isTension ? -bolts.distanceMm : depthMm + bolts.distanceMm,
      leverMm: isTension
        ? depthMm + cleat.thicknessMm / 2 + bolts.distanceMm
        : cleat.thicknessMm / 2 - bolts.distanceMm,
      level,
      fastener,
      isTension,
    };
  };
  const top = rowAt("top", 1);
  const bottom = rowAt("bottom", 2);
  const pulled = tensionLevel === "top" ? top : bottom;
  return {
    ...view,
    connection,
    gaugeMm: bolts.gaugeMm,
    attachment: {
      thicknessMm: cleat.thicknessMm,
      widthMm: cleat.lengthMm,
      yieldMpa: cleat.steel.yieldMpa,
      isPreloaded: false,
    },
    rows: [pulled, pulled === top ? bottom : top],
    tensionRows: [pulled],
  };
}
