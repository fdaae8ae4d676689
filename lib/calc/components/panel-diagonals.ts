import { curveCReduction, epsilonOf, strutSlenderness } from "../clauses/en1993-1-1-2005/members";
import { stiffenerNetAreaMm2, yieldForceN } from "../clauses/en1993-1-5-2006/stiffeners";
import * as rules from "../mechanics/diagonal-formulas";
import { flangeLevelMm, isOnePanel } from "../mechanics/panel-levels";
import type { DiagonalStiffeners } from "../measures/panel-design";
import type { ISection, NodeCase } from "../node";
import { OutsideScope } from "../outcome";
import { traced, type Traced } from "../trace/traced";

/** The diagonals of a panel and what one of them carries; the same in every load case. */
export interface PanelDiagonals {
  readonly measure: DiagonalStiffeners;
  /** Diagonals that a level cut through the panel meets: both of a cross, one of a K's two. */
  readonly count: 1 | 2;
  readonly lengthMm: number;
  readonly cosine: Traced;
  readonly yielding: Traced;
  /** In tension or compression, whichever is less. */
  readonly resistance: Traced;
}

/**
 * Diagonals between the beam flange levels. In a K both begin at the levels on one flange and meet at mid-height of the
 * other, where their level parts cancel and their upright parts go into the flange.
 *
 * @throws OutsideScope where the beams differ in depth or level: the panel has no two levels to go between.
 */
export function panelDiagonalsOf(
  node: NodeCase,
  section: ISection,
  measure: DiagonalStiffeners,
  steps: boolean,
): PanelDiagonals {
  const [joint] = node.joints;
  if (!joint) throw new RangeError("A node without joints");
  if (!isOnePanel(node.joints)) {
    throw new OutsideScope("diagonal stiffeners want beams of one depth at one level");
  }
  const { thicknessMm, widthMm, steel, arrangement } = measure;
  const { gammaM0, gammaM1 } = node.partialFactors;
  const runMm = section.depthMm - 2 * section.flangeThicknessMm;
  const spacingMm = flangeLevelMm(joint, "bottom") - flangeLevelMm(joint, "top");
  const riseMm = arrangement === "k" ? spacingMm / 2 : spacingMm;
  const lengthMm = rules.diagonalLengthMm(null, { runMm, riseMm });
  const yielding = traced(steps, (trace) => {
    const areaMm2 = stiffenerNetAreaMm2(trace, { widthMm, clipMm: section.rootMm, thicknessMm });
    return yieldForceN(trace, { areaMm2, yieldMpa: steel.yieldMpa, gammaM0 }, 0);
  });
  const buckling = traced(steps, (trace) => {
    const slenderness = strutSlenderness(trace, {
      // Where diagonals cross, each holds the other at the middle.
      bucklingLengthMm: arrangement === "cross" ? lengthMm / 2 : lengthMm,
      gyrationMm: (2 * widthMm + section.webThicknessMm) / Math.sqrt(12),
      epsilon: epsilonOf(trace, { yieldMpa: steel.yieldMpa }),
    });
    const reduction = curveCReduction(trace, { slenderness });
    return rules.pairBucklingN(
      trace,
      { reduction, widthMm, thicknessMm, yieldMpa: steel.yieldMpa, gammaM1 },
      0,
    );
  });
  return {
    measure,
    count: arrangement === "cross" ? 2 : 1,
    lengthMm,
    cosine: traced(steps, (trace) => {
      rules.diagonalLengthMm(trace, { runMm, riseMm });
      return rules.diagonalCosine(trace, { runMm, lengthMm }, 0);
    }),
    yielding,
    resistance: traced(steps, (trace) => {
      trace?.include(yielding.step);
      trace?.include(buckling.step);
      return rules.diagonalN(trace, { yieldN: yielding.value, bucklingN: buckling.value }, 0);
    }),
  };
}
