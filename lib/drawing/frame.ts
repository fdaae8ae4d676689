import type { ISection, JointCase, Level, MeasureCase, NodeCase, Side } from "@/lib/calc/node";

/** One joint placed on the sheet, mm. `sign` is -1 on the left and +1 on the right. */
export interface PlacedJoint {
  readonly joint: JointCase;
  readonly side: Side;
  readonly sign: -1 | 1;
  /** Outer faces of the beam's top and bottom flange. */
  readonly topMm: number;
  readonly bottomMm: number;
  /** Outer face of the column flange, and where the beam begins: on the end plate, past the gap before cleats, else on the column. */
  readonly columnFaceMm: number;
  readonly beamStartMm: number;
  /** Top and bottom of the end plate; null without one. */
  readonly plate: { readonly topMm: number; readonly bottomMm: number } | null;
  /** Heights of the bolt rows, from the top down. */
  readonly rowsMm: readonly number[];
}

/** Where everything stands: the levels, the faces and the window that the drawing shows, mm. */
export interface Frame {
  readonly column: ISection;
  readonly halfDepthMm: number;
  readonly innerFaceMm: number;
  readonly joints: readonly PlacedJoint[];
  /** Ends of the piece of column that is shown. */
  readonly topMm: number;
  readonly bottomMm: number;
  /** True where the column really ends there. */
  readonly endsAtTop: boolean;
  readonly endsAtBottom: boolean;
  /** Ends of the pieces of beam that are shown. */
  readonly leftMm: number;
  readonly rightMm: number;
}

/** Length of beam shown beyond the column's face, and least length of column beyond the beams, mm. */
const BEAM_SHOWN_MM = 235;
const COLUMN_SHOWN_MM = 190;

/** The column after the measures: a heavier one takes the place of the node's own. */
export const columnInForce = (node: NodeCase, measures: readonly MeasureCase[]): ISection =>
  measures.reduce(
    (section, measure) => (measure.kind === "heavier-column" ? measure.section : section),
    node.column.section,
  );

function placeJoint(joint: JointCase, halfDepthMm: number): PlacedJoint {
  const sign = joint.side === "left" ? -1 : 1;
  const topMm = joint.levelOffsetMm;
  const bottomMm = topMm + joint.beam.section.depthMm;
  const columnFaceMm = sign * halfDepthMm;
  const connection = joint.connection;
  const common = { joint, side: joint.side, sign, topMm, bottomMm, columnFaceMm } as const;
  if (connection.kind !== "end-plate") {
    const gapMm = connection.kind === "flange-cleats" ? connection.gapMm : 0;
    return { ...common, beamStartMm: columnFaceMm + sign * gapMm, plate: null, rowsMm: [] };
  }
  const { plate, bolts } = connection;
  return {
    ...common,
    beamStartMm: columnFaceMm + sign * plate.thicknessMm,
    plate: { topMm: topMm - plate.extensionTopMm, bottomMm: bottomMm + plate.extensionBottomMm },
    rowsMm: bolts.rowsMm.map((row) => topMm + row),
  };
}

/** How far the column must be shown beyond the beams so that every plate, angle and web plate is seen whole. */
function columnShownMm(joints: readonly PlacedJoint[], measures: readonly MeasureCase[]): number {
  const beamsMm =
    Math.max(...joints.map((joint) => joint.bottomMm)) - Math.min(...joints.map((joint) => joint.topMm));
  const extensions = joints.flatMap(({ plate, topMm, bottomMm, joint: { connection } }) => {
    if (connection.kind === "flange-cleats") return [connection.cleat.columnLegMm + 90];
    return plate ? [topMm - plate.topMm + 90, plate.bottomMm - bottomMm + 90] : [];
  });
  const webPlates = measures.flatMap((measure) =>
    measure.kind === "web-plates" ? [(measure.heightMm - beamsMm) / 2 + 60] : [],
  );
  return Math.max(COLUMN_SHOWN_MM, ...extensions, ...webPlates);
}

/** Places the node on the sheet. The window follows the node's own column, so that options share one scale. */
export function frameOf(node: NodeCase, measures: readonly MeasureCase[]): Frame {
  const column = columnInForce(node, measures);
  const halfDepthMm = column.depthMm / 2;
  const joints = node.joints.map((joint) => placeJoint(joint, halfDepthMm));
  const highestMm = Math.min(...joints.map((joint) => joint.topMm));
  const lowestMm = Math.max(...joints.map((joint) => joint.bottomMm));
  const shownMm = columnShownMm(joints, measures);
  const above = node.column.endDistanceAboveMm;
  const below = node.column.endDistanceBelowMm;
  const endsAtTop = above !== null && above <= shownMm + 60;
  const endsAtBottom = below !== null && below <= shownMm + 60;
  const reachMm = node.column.section.depthMm / 2 + BEAM_SHOWN_MM;
  return {
    column,
    halfDepthMm,
    innerFaceMm: halfDepthMm - column.flangeThicknessMm,
    joints,
    topMm: highestMm - (endsAtTop ? above : shownMm),
    bottomMm: lowestMm + (endsAtBottom ? below : shownMm),
    endsAtTop,
    endsAtBottom,
    leftMm: -reachMm,
    rightMm: reachMm,
  };
}

/** Middle of the beam flange at a level, for each joint; equal heights once. */
export function flangeHeightsMm(frame: Frame, level: Level): number[] {
  const heights = frame.joints.map(({ joint, topMm, bottomMm }) =>
    level === "top"
      ? topMm + joint.beam.section.flangeThicknessMm / 2
      : bottomMm - joint.beam.section.flangeThicknessMm / 2,
  );
  return heights.filter(
    (height, index) => heights.findIndex((other) => Math.abs(other - height) < 1) === index,
  );
}

/** The level a bolt row belongs to: that of the nearer beam flange. */
export const levelOfRow = ({ topMm, bottomMm }: PlacedJoint, rowMm: number): Level =>
  rowMm < (topMm + bottomMm) / 2 ? "top" : "bottom";

/** Outer face that a nut bears on at a height: the end plate's where one covers it, else the column's own. */
export function outerFaceMm(frame: Frame, sign: -1 | 1, heightMm: number): number {
  const placed = frame.joints.find((joint) => joint.sign === sign);
  const covered = placed?.plate && heightMm >= placed.plate.topMm && heightMm <= placed.plate.bottomMm;
  return placed && covered ? placed.beamStartMm : sign * frame.halfDepthMm;
}
