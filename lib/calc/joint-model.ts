import { boltShearResistance } from "./components/bolt-shear";
import { boltedJointOf, type BoltedJoint } from "./components/bolted-joint";
import { columnFlangeOf } from "./components/column-flange";
import type { ColumnPanel } from "./components/column-panel";
import { compressionZoneOf } from "./components/compression-zone";
import { connectionWeldLimits, type ConnectionWeldLimits } from "./components/connection-welds";
import { endPlateViewOf, jointViewOf } from "./components/connection-view";
import { endPlateOf } from "./components/end-plate";
import {
  classBoundsOf,
  rowSpringsOf,
  tensionSpringOf,
  type ClassBounds,
  type RowSprings,
  type TensionSpring,
} from "./components/joint-stiffness";
import { weldedJointOf, type WeldedJoint } from "./components/welded-joint";
import type { PanelDesign } from "./measures/panel-design";
import { barCompressionOf, barTensionShares, type BarCompression } from "./measures/through-bars";
import type { JointCase, Level, NodeCase } from "./node";
import { OutsideScope } from "./outcome";
import type { Traced } from "./trace/traced";

interface ModelBase {
  readonly bounds: ClassBounds;
  readonly welds: ConnectionWeldLimits;
  /** Between the beam's flanges, by geometry alone: tells how the forces left and right compare. */
  readonly leverMm: number;
}

/** A joint with its tension flange at one level, ready for any number of load cases. */
export interface BoltedModel extends ModelBase {
  readonly joint: BoltedJoint;
  readonly springs: readonly RowSprings[];
  readonly tension: TensionSpring;
  readonly shear: Traced;
  /** Share of each tension row that bars surely take off the column; null for bolts. */
  readonly barShares: readonly (Traced | null)[];
  /** The most of it that they may have to carry. The same without a web plate. */
  readonly barForceShares: readonly (Traced | null)[];
  readonly barCompression: BarCompression | null;
}

export interface WeldedModel extends ModelBase {
  readonly joint: WeldedJoint;
}

export type JointModel = BoltedModel | WeldedModel;

export const isBolted = (model: JointModel): model is BoltedModel => model.joint.kind === "bolted";

/** @throws OutsideScope with the reason where the joint is not covered. */
export function jointModelOf(
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  joint: JointCase,
  tensionLevel: Level,
  steps: boolean,
): JointModel {
  const { connection } = joint;
  const { section } = joint.beam;
  const bounds = classBoundsOf(node, panel, joint, steps);
  const straightWeb = section.depthMm - 2 * section.flangeThicknessMm - 2 * section.rootMm;
  if (connection.kind === "flange-cleats")
    throw new OutsideScope("flange-cleat joints are not evaluated yet");
  if (connection.kind === "welded") {
    const view = jointViewOf(node, design, joint, tensionLevel);
    const compression = compressionZoneOf(node, panel, view, steps);
    const welded = weldedJointOf(node, panel, view, connection, compression, steps);
    const welds = connectionWeldLimits(
      node,
      joint,
      connection.welds,
      view.tensionWeld,
      panel.steel,
      straightWeb,
      steps,
    );
    return { joint: welded, bounds, welds, leverMm: welded.leverMm };
  }
  if (connection.bolts.perRow === 4) throw new OutsideScope("four bolts a row are not evaluated yet");
  if (connection.plate.hasStiffenedExtension) {
    throw new OutsideScope("end plates with a stiffened extension are not evaluated yet");
  }
  const view = endPlateViewOf(node, design, joint, connection, tensionLevel, steps);
  const bolted = boltedJointOf(
    node,
    view,
    {
      flange: columnFlangeOf(node, panel, view, steps),
      plate: endPlateOf(node, panel, view, steps),
      compression: compressionZoneOf(node, panel, view, steps),
    },
    steps,
  );
  const springs = rowSpringsOf(panel, bolted, steps);
  const barShares = barTensionShares(panel, bolted, panel.stiffestWebMm, steps);
  const plainMm = panel.section.webThicknessMm;
  const tension = tensionSpringOf(bolted, springs, [], steps);
  return {
    joint: bolted,
    bounds,
    // The web weld's tension zone is its upper half or less; the rest is there for shear.
    welds: connectionWeldLimits(
      node,
      joint,
      connection.welds,
      view.tensionWeld,
      connection.plate.steel,
      straightWeb / 2,
      steps,
    ),
    leverMm: section.depthMm - section.flangeThicknessMm,
    springs,
    tension,
    shear: boltShearResistance(node, panel, view, steps),
    barShares,
    barForceShares:
      panel.stiffestWebMm === plainMm ? barShares : barTensionShares(panel, bolted, plainMm, steps),
    barCompression: barCompressionOf(node, panel, bolted, steps),
  };
}
