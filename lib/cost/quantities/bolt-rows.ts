import type { EndPlateConnection, JointCase, Level } from "@/lib/calc";

export interface BoltedSide {
  readonly joint: JointCase;
  readonly connection: EndPlateConnection;
}

/** The joints that have bolts through the column flange. */
export function boltedSides(joints: readonly JointCase[]): readonly BoltedSide[] {
  return joints.flatMap((joint) =>
    joint.connection.kind === "end-plate" ? [{ joint, connection: joint.connection }] : [],
  );
}

/** Bolt rows of one side that belong to the given beam flange levels: each row to the nearer flange. */
export function rowsAtLevels({ joint, connection }: BoltedSide, levels: readonly Level[]): number {
  const middle = joint.beam.section.depthMm / 2;
  return connection.bolts.rowsMm.filter((row) => levels.includes(row <= middle ? "top" : "bottom")).length;
}
