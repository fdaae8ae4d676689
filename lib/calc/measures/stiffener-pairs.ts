import { areFacing, flangeLevelMm } from "../mechanics/panel-levels";
import type { ISection, JointCase, Level, Side } from "../node";
import { nowhere, placedAt, type BySideAndLevel, type TransverseStiffeners } from "./panel-design";

/** One pair of plates in the column, in line with the flanges of the joints it serves. */
export interface StiffenerPair {
  readonly stiffener: TransverseStiffeners;
  readonly level: Level;
  /** One side, or both where the pair reaches from one beam's flange to the other's. */
  readonly sides: readonly Side[];
  /** Cosine of its slope: below 1 where it joins flanges a little apart in level. */
  readonly slopeCosine: number;
}

/** Two pairs nearer than this leave no room to weld between them: one sloped pair serves both beams. Common practice, no source. */
const LEAST_APART_MM = 80;
const LEVELS: readonly Level[] = ["top", "bottom"];

function slopeCosine(column: ISection, a: JointCase, b: JointCase, level: Level): number {
  if (areFacing(a, b, level)) return 1;
  const rise = flangeLevelMm(a, level) - flangeLevelMm(b, level);
  const run = column.depthMm - 2 * column.flangeThicknessMm;
  return run / Math.hypot(run, rise);
}

/** Whether one full-depth pair at this level serves both beams. */
export function isShared(a: JointCase, b: JointCase, level: Level): boolean {
  return (
    areFacing(a, b, level) || Math.abs(flangeLevelMm(a, level) - flangeLevelMm(b, level)) < LEAST_APART_MM
  );
}

/** The pairs there are, from the top down, left before right. */
export function stiffenerPairsOf(
  column: ISection,
  joints: readonly JointCase[],
  stiffeners: BySideAndLevel<TransverseStiffeners>,
): readonly StiffenerPair[] {
  const pairs: StiffenerPair[] = [];
  const [first, second] = joints;
  for (const level of LEVELS) {
    const own = first && stiffeners[first.side][level];
    const other = second && stiffeners[second.side][level];
    if (first && second && own && own === other && own.length === "full" && isShared(first, second, level)) {
      pairs.push({
        stiffener: own,
        level,
        sides: [first.side, second.side],
        slopeCosine: slopeCosine(column, first, second, level),
      });
      continue;
    }
    if (first && own) pairs.push({ stiffener: own, level, sides: [first.side], slopeCosine: 1 });
    if (second && other) pairs.push({ stiffener: other, level, sides: [second.side], slopeCosine: 1 });
  }
  return pairs;
}

/** The pairs that one measure puts into a column, for its quantities and its drawing. */
export const pairsOfMeasure = (
  column: ISection,
  joints: readonly JointCase[],
  measure: TransverseStiffeners,
): readonly StiffenerPair[] =>
  stiffenerPairsOf(
    column,
    joints,
    sharedWhereFacing(joints, placedAt(nowhere(), measure.at ?? "both", measure.levels, measure)),
  );

/** Where two flanges face each other, what stands at one of them stands at both. */
export function sharedWhereFacing<T>(
  joints: readonly JointCase[],
  placed: BySideAndLevel<T>,
): BySideAndLevel<T> {
  const [first, second] = joints;
  if (!first || !second) return placed;
  const { left, right } = placed;
  const isTop = areFacing(first, second, "top");
  const isBottom = areFacing(first, second, "bottom");
  const top = left.top ?? right.top;
  const bottom = left.bottom ?? right.bottom;
  return {
    left: { top: isTop ? top : left.top, bottom: isBottom ? bottom : left.bottom },
    right: { top: isTop ? top : right.top, bottom: isBottom ? bottom : right.bottom },
  };
}
