import { alphaOf } from "../clauses/en1993-1-8-2005/alpha";
import * as lines from "../clauses/en1993-1-8-2005/yield-lines";
import { weldLegMm } from "../measures/panel-design";
import type { NodeCase } from "../node";
import { OutsideScope } from "../outcome";
import { traced, type Traced } from "../trace/traced";
import { backingPiecesOf } from "./backing-pieces";
import type { ColumnPanel } from "./column-panel";
import type { BoltRow, BoltedView } from "./connection-view";
import { rowFamilyOf, type GroupPosition, type RowFamily } from "./row-groups";
import type { PatternLengths } from "./t-stub-part";

/** The column flange in bending, and how its tension stiffener parts the rows. */
export interface ColumnFlange {
  readonly family: RowFamily;
  readonly mMm: number;
  readonly nMm: number;
  /** The stiffener is wide enough to carry the flange (SCI/BCSA P398: 2 b_sg + t_wc >= 1.33 gauge). */
  readonly isStiffened: boolean;
  /** By position: the web beside the row is held by the stiffener (SCI/BCSA P398: within 0.87 gauge). */
  readonly isWebHeld: readonly boolean[];
}

/** Where the 60 degree spread from a bolt meets the middle of the web, as a share of the gauge. */
export const SPREAD_SHARE = 0.87;
const WIDE_ENOUGH_SHARE = 1.33;

interface RowEnds {
  /** To the column's end beyond the tension flange and beyond the compression flange; Infinity where continuous. */
  readonly outwardMm: number;
  readonly inwardMm: number;
}

/** From a row to the column's ends, mm. */
export function rowEnds(view: BoltedView, row: BoltRow): RowEnds {
  const { depthMm, flangeThicknessMm } = view.joint.beam.section;
  return {
    outwardMm: view.columnBeyondTensionMm - flangeThicknessMm / 2 + row.fromFaceMm,
    inwardMm: view.columnBeyondCompressionMm - flangeThicknessMm / 2 + depthMm - row.fromFaceMm,
  };
}

/** Distance from a row to the face of the tension stiffener less 0.8 of its weld, mm. */
export function rowToStiffenerMm(view: BoltedView, row: BoltRow): number {
  const stiffener = view.tensionStiffener;
  if (!stiffener) return Infinity;
  const toMiddle = Math.abs(row.fromFaceMm - view.joint.beam.section.flangeThicknessMm / 2);
  return lines.leverMm(null, {
    clearMm: toMiddle - stiffener.thicknessMm / 2,
    filletMm: weldLegMm(stiffener.flangeWeld),
  });
}

/** The column flange seen from one joint. @throws OutsideScope where a bolt stands on the root radius. */
export function columnFlangeOf(
  node: NodeCase,
  panel: ColumnPanel,
  view: BoltedView,
  steps: boolean,
): ColumnFlange {
  const { section, steel } = panel;
  const rows = view.tensionRows;
  const eMm = (section.widthMm - view.gaugeMm) / 2;
  if (eMm <= 0) throw new OutsideScope("the bolts stand outside the column flange");
  const lever = traced(steps, (trace) =>
    lines.leverMm(trace, { clearMm: (view.gaugeMm - section.webThicknessMm) / 2, filletMm: section.rootMm }),
  );
  const mMm = lever.value;
  const nMm = Math.min(eMm, (view.attachment.widthMm - view.gaugeMm) / 2, 1.25 * mMm);
  const half = view.joint.beam.section.flangeThicknessMm / 2;
  const stiffener = view.tensionStiffener;
  const isStiffened =
    stiffener !== null &&
    2 * (stiffener.widthMm + panel.webPlateMm) + section.webThicknessMm >= WIDE_ENOUGH_SHARE * view.gaugeMm;
  const positions = rows.map((_, index) => index);
  const outside = positions.filter((index) => (rows[index]?.fromFaceMm ?? 0) < half);
  const inside = positions.filter((index) => (rows[index]?.fromFaceMm ?? 0) >= half);
  const segments = isStiffened ? [outside, inside].filter((segment) => segment.length > 0) : [positions];
  const besideStiffener = new Set(isStiffened ? [outside[outside.length - 1], inside[0]] : []);

  const stiffenedLength = (row: BoltRow): Traced =>
    traced(steps, (trace) => {
      const m2 = rowToStiffenerMm(view, row);
      const alpha = alphaOf(trace, { lambda1: mMm / (mMm + eMm), lambda2: m2 / (mMm + eMm) });
      return lines.besideStiffenerMm(trace, { alpha, mMm, eMm }, 0);
    });
  const stiffenedByRow = rows.map((row, index) => (besideStiffener.has(index) ? stiffenedLength(row) : null));

  const alone = (index: number): PatternLengths => {
    const row = rows[index];
    const ends = row ? rowEnds(view, row) : { outwardMm: Infinity, inwardMm: Infinity };
    const endMm = Math.min(ends.outwardMm, ends.inwardMm);
    const stiffened = stiffenedByRow[index];
    return {
      circular: traced(steps, (trace) => {
        trace?.include(lever.step);
        return Number.isFinite(endMm)
          ? lines.circularNearEndMm(trace, { mMm, endMm }, 0)
          : lines.circularMm(trace, { mMm }, 0);
      }),
      other: traced(steps, (trace) => {
        trace?.include(stiffened?.step ?? lever.step);
        if (stiffened) {
          return Number.isFinite(endMm)
            ? lines.besideStiffenerNearEndMm(trace, { stiffenedMm: stiffened.value, mMm, eMm, endMm }, 0)
            : stiffened.value;
        }
        return Number.isFinite(endMm)
          ? lines.patternNearEndMm(trace, { mMm, eMm, endMm }, 0)
          : lines.patternMm(trace, { mMm, eMm }, 0);
      }),
    };
  };

  const grouped = (position: GroupPosition): PatternLengths => {
    const { beforeMm, afterMm, isFirst, isLast, index } = position;
    if (!isFirst && !isLast) {
      return {
        circular: traced(steps, (trace) => lines.groupInnerCircularMm(trace, { beforeMm, afterMm })),
        other: traced(steps, (trace) => lines.groupInnerPatternMm(trace, { beforeMm, afterMm })),
      };
    }
    const pitchMm = isFirst ? afterMm : beforeMm;
    const row = rows[index];
    const ends = row ? rowEnds(view, row) : { outwardMm: Infinity, inwardMm: Infinity };
    const endMm = isFirst ? ends.outwardMm : ends.inwardMm;
    const stiffened = stiffenedByRow[index];
    if (stiffened) {
      return {
        circular: traced(steps, (trace) => lines.groupEndCircularMm(trace, { mMm, pitchMm })),
        other: traced(steps, (trace) => {
          trace?.include(stiffened.step);
          return lines.groupBesideStiffenerMm(trace, { stiffenedMm: stiffened.value, mMm, eMm, pitchMm }, 0);
        }),
      };
    }
    return Number.isFinite(endMm)
      ? {
          circular: traced(steps, (trace) => lines.groupNearEndCircularMm(trace, { mMm, pitchMm, endMm })),
          other: traced(steps, (trace) => lines.groupNearEndPatternMm(trace, { mMm, eMm, pitchMm, endMm })),
        }
      : {
          circular: traced(steps, (trace) => lines.groupEndCircularMm(trace, { mMm, pitchMm })),
          other: traced(steps, (trace) => lines.groupEndPatternMm(trace, { mMm, eMm, pitchMm })),
        };
  };

  const heldRows = {
    outward: isStiffened ? (rows[outside[outside.length - 1] ?? -1]?.row ?? null) : null,
    inward: isStiffened ? (rows[inside[0] ?? -1]?.row ?? null) : null,
  };
  const backing = backingPiecesOf(view, heldRows);
  const setting = { node, thicknessMm: section.flangeThicknessMm, steel, mMm, nMm, backing, steps };
  return {
    family: rowFamilyOf(rows, segments, () => setting, alone, grouped),
    mMm,
    nMm,
    isStiffened,
    isWebHeld: rows.map(
      (row) => isStiffened && Math.abs(row.fromFaceMm - half) <= SPREAD_SHARE * view.gaugeMm,
    ),
  };
}
