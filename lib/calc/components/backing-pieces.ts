import { backingReach } from "../measures/backing-plates";
import { weldLegMm } from "../measures/panel-design";
import type { Level } from "../node";
import type { JointView } from "./connection-view";

/** A piece of backing plate as the rows before it see it: distances from the tension flange's outer face. */
export interface BackingPiece {
  readonly fromMm: number;
  readonly toMm: number;
  readonly thicknessMm: number;
  readonly yieldMpa: number;
  /** The bolt row beside the stiffener that the piece is cut at and the pattern ends at; null elsewhere. */
  readonly heldRow: number | null;
}

/** The rows next to a stiffener that holds the flange, on either side of it. */
export interface HeldRows {
  readonly outward: number | null;
  readonly inward: number | null;
}

/** The plate at one level; a stiffener there parts it into a piece on either side, short of its welds. */
function piecesAt(view: JointView, level: Level, held: HeldRows): BackingPiece[] {
  const plate = view.backing[level];
  if (!plate) return [];
  const { depthMm, flangeThicknessMm } = view.joint.beam.section;
  const isTension = level === view.tensionLevel;
  const reach = backingReach(view.joint, plate, level);
  const [fromMm, toMm] =
    view.tensionLevel === "top" ? [reach.fromMm, reach.toMm] : [depthMm - reach.toMm, depthMm - reach.fromMm];
  const common = { thicknessMm: plate.thicknessMm, yieldMpa: plate.steel.yieldMpa };
  const stiffener = isTension ? view.tensionStiffener : view.compressionStiffener;
  if (!stiffener) return [{ fromMm, toMm, ...common, heldRow: null }];
  const middle = isTension ? flangeThicknessMm / 2 : depthMm - flangeThicknessMm / 2;
  const slopeCosine = isTension ? view.tensionSlopeCosine : view.compressionSlopeCosine;
  const half = stiffener.thicknessMm / 2 / slopeCosine + weldLegMm(stiffener.flangeWeld);
  return [
    { fromMm, toMm: Math.min(toMm, middle - half), ...common, heldRow: isTension ? held.outward : null },
    { fromMm: Math.max(fromMm, middle + half), toMm, ...common, heldRow: isTension ? held.inward : null },
  ].filter((piece) => piece.toMm > piece.fromMm);
}

/** Every piece of plate behind one joint's column flange. */
export const backingPiecesOf = (view: JointView, held: HeldRows): readonly BackingPiece[] => [
  ...piecesAt(view, view.tensionLevel, held),
  ...piecesAt(view, view.compressionLevel, held),
];
