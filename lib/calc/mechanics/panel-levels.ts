import { defineFormula } from "../trace/define-formula";
import type { JointCase, Level, NodeCase, Side } from "../node";

/** Middle of a beam flange, mm below the top of the left beam. */
export const flangeLevelMm = (joint: JointCase, level: Level): number => {
  const { depthMm, flangeThicknessMm } = joint.beam.section;
  return joint.levelOffsetMm + (level === "top" ? flangeThicknessMm / 2 : depthMm - flangeThicknessMm / 2);
};

/** Whether two beams bring their flange forces in at one level: the flanges overlap. */
export const areFacing = (a: JointCase, b: JointCase, level: Level): boolean =>
  Math.abs(flangeLevelMm(a, level) - flangeLevelMm(b, level)) <
  Math.max(a.beam.section.flangeThicknessMm, b.beam.section.flangeThicknessMm);

/** Whether every level has its flanges face to face: the panel is one. */
export function isOnePanel(joints: readonly JointCase[]): boolean {
  const [first, second] = joints;
  return !first || !second || (areFacing(first, second, "top") && areFacing(first, second, "bottom"));
}

/** How far the column goes on beyond a beam's outer flange faces, mm; Infinity where it is continuous. */
export function columnBeyondMm(node: NodeCase, joint: JointCase): Readonly<Record<Level, number>> {
  const { endDistanceAboveMm, endDistanceBelowMm } = node.column;
  const bottomOf = (one: JointCase): number => one.levelOffsetMm + one.beam.section.depthMm;
  let highest = joint.levelOffsetMm;
  let lowest = bottomOf(joint);
  for (const one of node.joints) {
    highest = Math.min(highest, one.levelOffsetMm);
    lowest = Math.max(lowest, bottomOf(one));
  }
  return {
    top: endDistanceAboveMm === null ? Infinity : endDistanceAboveMm + joint.levelOffsetMm - highest,
    bottom: endDistanceBelowMm === null ? Infinity : endDistanceBelowMm + lowest - bottomOf(joint),
  };
}

/** A part of the panel between two neighbouring flange levels, and the joints whose forces shear it. */
export interface PanelZone {
  readonly sides: readonly Side[];
}

/**
 * The panel cut at the flange levels, from the top down. Flanges that overlap count as one level; parts that no beam
 * spans belong to the column and are left out. Equal beams give one zone.
 */
export function panelZonesOf(joints: readonly JointCase[]): readonly PanelZone[] {
  const [first, second] = joints;
  if (!first) return [];
  if (!second || isOnePanel(joints)) return [{ sides: joints.map(({ side }) => side) }];
  const level = (joint: JointCase, at: Level): number => {
    // The second beam's flange is taken at the first one's level where the two overlap.
    const own = joint === second && areFacing(first, second, at) ? first : joint;
    return flangeLevelMm(own, at);
  };
  const cuts = [...new Set(joints.flatMap((joint) => [level(joint, "top"), level(joint, "bottom")]))].sort(
    (a, b) => a - b,
  );
  return cuts
    .slice(1)
    .map((below, index) => {
      const above = cuts[index] ?? below;
      return {
        sides: joints
          .filter((joint) => level(joint, "top") <= above && level(joint, "bottom") >= below)
          .map(({ side }) => side),
      };
    })
    .filter(({ sides }) => sides.length > 0);
}

/** Transformation parameter of a joint in a zone that both beams shear: the zone's shear over the joint's own M / z. */
export const zoneBeta = defineFormula({
  id: "panel-zones/beta",
  source: {
    document: "Mechanics of the column panel",
    edition: "this project",
    ref: "shear of the zone between flange levels by equilibrium, V_zone z / M_j, at most 2 as in EN 1993-1-8, 5.3(9)",
  },
  symbols: {
    ownNmm: ["M_j,Ed", "Nmm"],
    ownLeverMm: ["z", "mm"],
    otherNmm: ["M_j,Ed other side", "Nmm"],
    otherLeverMm: ["z other side", "mm"],
  },
  result: ["β", "1"],
  expression: "min(abs(1 - otherNmm * ownLeverMm / (ownNmm * otherLeverMm)), 2)",
  evaluate: (g) => Math.min(Math.abs(1 - (g.otherNmm * g.ownLeverMm) / (g.ownNmm * g.otherLeverMm)), 2),
  example: {
    given: { ownNmm: 200, ownLeverMm: 400, otherNmm: 100, otherLeverMm: 200 },
    gives: 0,
    relTol: 1e-12,
  },
});
