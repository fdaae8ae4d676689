import { alphaOf } from "../clauses/en1993-1-8-2005/alpha";
import * as lines from "../clauses/en1993-1-8-2005/yield-lines";
import { weldLegMm } from "../measures/panel-design";
import type { NodeCase } from "../node";
import { OutsideScope } from "../outcome";
import { traced, type Traced } from "../trace/traced";
import type { ColumnPanel } from "./column-panel";
import type { EndPlateView } from "./connection-view";
import { rowFamilyOf, type GroupPosition, type RowFamily } from "./row-groups";
import type { PatternLengths, TStubSetting } from "./t-stub-part";

/** The end plate in bending. EN 1993-1-8:2005, 6.2.6.5, Table 6.6. */
export interface EndPlate {
  readonly family: RowFamily;
  /** By position: the row stands inside the beam's flanges, so its web takes tension too. */
  readonly isInside: readonly boolean[];
  /** By position: lever of the row in the plate (m, or m_x of the extension). */
  readonly leverByRowMm: readonly number[];
}

interface ExtensionRow {
  readonly mx: Traced;
  readonly exMm: number;
}

function extensionRowOf(view: EndPlateView, steps: boolean): ExtensionRow | null {
  const row = view.tensionRows.find((candidate) => candidate.fromFaceMm < 0);
  if (!row) return null;
  const exMm = view.extensionTensionMm + row.fromFaceMm;
  if (exMm <= 0) throw new OutsideScope("a bolt row stands outside the end plate");
  return {
    mx: traced(steps, (trace) =>
      lines.leverMm(trace, { clearMm: -row.fromFaceMm, filletMm: weldLegMm(view.tensionWeld) }),
    ),
    exMm,
  };
}

/** The end plate seen from its tension flange. @throws OutsideScope where a row stands on a weld. */
export function endPlateOf(node: NodeCase, panel: ColumnPanel, view: EndPlateView, steps: boolean): EndPlate {
  const { plate, welds } = view.connection;
  const rows = view.tensionRows;
  const { webThicknessMm, flangeThicknessMm } = view.joint.beam.section;
  const eMm = (plate.widthMm - view.gaugeMm) / 2;
  if (eMm <= 0) throw new OutsideScope("the bolts stand outside the end plate");
  const lever = traced(steps, (trace) =>
    lines.leverMm(trace, { clearMm: (view.gaugeMm - webThicknessMm) / 2, filletMm: weldLegMm(welds.web) }),
  );
  const mMm = lever.value;
  const extension = extensionRowOf(view, steps);
  const isInside = rows.map((row) => row.fromFaceMm >= 0);
  const inside = rows.map((_, index) => index).filter((index) => isInside[index]);
  const firstInside = inside[0];
  const flangeSide = firstInside === undefined ? undefined : rows[firstInside];
  const besideFlange = flangeSide
    ? traced(steps, (trace) => {
        const m2 = lines.leverMm(trace, {
          clearMm: flangeSide.fromFaceMm - flangeThicknessMm,
          filletMm: weldLegMm(view.tensionWeld),
        });
        const alpha = alphaOf(trace, { lambda1: mMm / (mMm + eMm), lambda2: m2 / (mMm + eMm) });
        return lines.besideStiffenerMm(trace, { alpha, mMm, eMm }, 0);
      })
    : null;

  const alone = (index: number): PatternLengths => {
    if (!isInside[index] && extension) {
      const { mx, exMm } = extension;
      return {
        circular: traced(steps, (trace) => {
          trace?.include(mx.step);
          return lines.extensionCircularMm(trace, { mxMm: mx.value, gaugeMm: view.gaugeMm, eMm }, 0);
        }),
        other: traced(steps, (trace) => {
          trace?.include(mx.step);
          return lines.extensionPatternMm(
            trace,
            { mxMm: mx.value, exMm, eMm, widthMm: plate.widthMm, gaugeMm: view.gaugeMm },
            0,
          );
        }),
      };
    }
    return {
      circular: traced(steps, (trace) => {
        trace?.include(lever.step);
        return lines.circularMm(trace, { mMm }, 0);
      }),
      other:
        index === firstInside && besideFlange
          ? besideFlange
          : traced(steps, (trace) => {
              trace?.include(lever.step);
              return lines.patternMm(trace, { mMm, eMm }, 0);
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
    return {
      circular: traced(steps, (trace) => lines.groupEndCircularMm(trace, { mMm, pitchMm })),
      other: traced(steps, (trace) => {
        if (index === firstInside && besideFlange) {
          trace?.include(besideFlange.step);
          return lines.groupBesideStiffenerMm(
            trace,
            { stiffenedMm: besideFlange.value, mMm, eMm, pitchMm },
            0,
          );
        }
        return lines.groupEndPatternMm(trace, { mMm, eMm, pitchMm });
      }),
    };
  };

  const settingOf = (leverMm: number, nMm: number): TStubSetting => ({
    node,
    thicknessMm: plate.thicknessMm,
    steel: plate.steel,
    steps,
    backing: [],
    mMm: leverMm,
    nMm,
  });
  const eMinMm = Math.min(eMm, (panel.section.widthMm - view.gaugeMm) / 2);
  const insideSetting: TStubSetting = settingOf(mMm, Math.min(eMinMm, 1.25 * mMm));
  const outsideSetting: TStubSetting = extension
    ? settingOf(extension.mx.value, Math.min(extension.exMm, 1.25 * extension.mx.value))
    : insideSetting;
  return {
    family: rowFamilyOf(
      rows,
      inside.length > 0 ? [inside] : [],
      (index) => (isInside[index] ? insideSetting : outsideSetting),
      alone,
      grouped,
    ),
    isInside,
    leverByRowMm: rows.map((_, index) => (isInside[index] ? mMm : (extension?.mx.value ?? mMm))),
  };
}
