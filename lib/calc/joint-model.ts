import { boltShearResistance, legBearing, plateBearing } from "./components/bolt-shear";
import { boltedJointOf, endPlateLimits, type BoltedJoint, type BoltedParts } from "./components/bolted-joint";
import { cleatViewOf } from "./components/cleat-view";
import { columnFlangeOf } from "./components/column-flange";
import type { ColumnPanel } from "./components/column-panel";
import { compressionZoneOf } from "./components/compression-zone";
import { connectionWeldLimits, noWelds, type ConnectionWeldLimits } from "./components/connection-welds";
import { endPlateViewOf, jointViewOf, type BoltedView } from "./components/connection-view";
import { endPlateOf } from "./components/end-plate";
import { cleatLegOf, cleatLimits, legBoltResistance, legSprings } from "./components/flange-cleat";
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
import type {
  EndPlateConnection,
  FlangeCleatConnection,
  JointCase,
  Level,
  NodeCase,
  WeldedConnection,
} from "./node";
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
  /** Of the bolts that take a beam's shear, by the level it bears on: the same at both behind an end plate. */
  readonly shear: Readonly<Record<Level, Traced>>;
  /** Springs of bolts that slip along the beam; none behind an end plate. */
  readonly slip: readonly Traced[];
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

/** What every kind of joint is made from. */
interface ModelSetting {
  readonly node: NodeCase;
  readonly design: PanelDesign;
  readonly panel: ColumnPanel;
  readonly joint: JointCase;
  readonly tensionLevel: Level;
  readonly steps: boolean;
}

const straightWebMm = ({ beam: { section } }: JointCase): number =>
  section.depthMm - 2 * section.flangeThicknessMm - 2 * section.rootMm;

function weldedModelOf(setting: ModelSetting, connection: WeldedConnection): WeldedModel {
  const { node, design, panel, joint, tensionLevel, steps } = setting;
  const view = jointViewOf(node, design, joint, tensionLevel);
  const compression = compressionZoneOf(node, panel, view, steps);
  const welded = weldedJointOf(node, panel, view, connection, compression, steps);
  return {
    joint: welded,
    bounds: classBoundsOf(node, panel, joint, steps),
    welds: connectionWeldLimits(
      node,
      joint,
      connection.welds,
      view.tensionWeld,
      panel.steel,
      straightWebMm(joint),
      steps,
    ),
    leverMm: welded.leverMm,
  };
}

/** A bolted joint of any kind from its parts. */
function boltedModelOf(
  setting: ModelSetting,
  view: BoltedView,
  parts: BoltedParts,
  own: Pick<BoltedModel, "welds" | "shear" | "slip">,
): BoltedModel {
  const { node, panel, joint, steps } = setting;
  const bolted = boltedJointOf(node, panel, view, parts, steps);
  const springs = rowSpringsOf(panel, bolted, steps);
  const barShares = barTensionShares(panel, bolted, panel.stiffestWebMm, steps);
  const plainMm = panel.section.webThicknessMm;
  const { section } = joint.beam;
  return {
    joint: bolted,
    bounds: classBoundsOf(node, panel, joint, steps),
    welds: own.welds,
    leverMm: section.depthMm - section.flangeThicknessMm,
    springs,
    tension: tensionSpringOf(bolted, springs, [], steps),
    shear: own.shear,
    slip: own.slip,
    barShares,
    barForceShares:
      panel.stiffestWebMm === plainMm ? barShares : barTensionShares(panel, bolted, plainMm, steps),
    barCompression: barCompressionOf(node, panel, bolted, steps),
  };
}

function endPlateModelOf(setting: ModelSetting, connection: EndPlateConnection): BoltedModel {
  const { node, design, panel, joint, tensionLevel, steps } = setting;
  const view = endPlateViewOf(node, design, joint, connection, tensionLevel, steps);
  const plate = endPlateOf(node, panel, view, steps);
  const parts = {
    flange: columnFlangeOf(node, panel, view, steps),
    plate,
    own: endPlateLimits(node, joint, plate, steps),
    compression: compressionZoneOf(node, panel, view, steps),
    seat: null,
  };
  const shear = boltShearResistance(node, panel, view, view.rows, (row) => plateBearing(view, row), steps);
  return boltedModelOf(setting, view, parts, {
    // The web weld's tension zone is its upper half or less; the rest is there for shear.
    welds: connectionWeldLimits(
      node,
      joint,
      connection.welds,
      view.tensionWeld,
      connection.plate.steel,
      straightWebMm(joint) / 2,
      steps,
    ),
    shear: { top: shear, bottom: shear },
    slip: [],
  });
}

function cleatModelOf(setting: ModelSetting, connection: FlangeCleatConnection): BoltedModel {
  const { node, design, panel, joint, tensionLevel, steps } = setting;
  const view = cleatViewOf(node, design, joint, connection, tensionLevel, steps);
  const plate = cleatLegOf(node, view, steps);
  const legBolts = legBoltResistance(node, view, steps);
  const parts = {
    flange: columnFlangeOf(node, panel, view, steps),
    plate,
    own: cleatLimits(node, view, plate, legBolts, steps),
    compression: compressionZoneOf(node, panel, view, steps),
    seat: legBolts,
  };
  // A beam bears on one angle: the other, above its reaction, has nothing to bring it a share. 6.2.2.
  const shearAt = (level: Level): Traced => {
    const rows = view.rows.filter((row) => row.level === level);
    return boltShearResistance(node, panel, view, rows, () => legBearing(view), steps);
  };
  return boltedModelOf(setting, view, parts, {
    welds: noWelds(node, joint),
    shear: { top: shearAt("top"), bottom: shearAt("bottom") },
    slip: legSprings(view, steps),
  });
}

/** @throws OutsideScope with the reason where the joint is not covered. */
export function jointModelOf(
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  joint: JointCase,
  tensionLevel: Level,
  steps: boolean,
): JointModel {
  const setting = { node, design, panel, joint, tensionLevel, steps };
  const { connection } = joint;
  switch (connection.kind) {
    case "welded":
      return weldedModelOf(setting, connection);
    case "end-plate":
      return endPlateModelOf(setting, connection);
    case "flange-cleats":
      return cleatModelOf(setting, connection);
  }
}
