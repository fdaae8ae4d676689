import { isBolted, type JointModel } from "./joint-model";
import type { PanelDesign } from "./measures/panel-design";
import type { LoadCase, NodeCase } from "./node";

const GENERAL = [
  "This supports a competent engineer's judgement and does not replace it: national annexes, the project specification and the licensed engineer's decision come first.",
  "Moments act at the column face and enter beta unchanged. Sway of the column flange under the compression force has to be prevented by restraint (EN 1993-1-8, 6.2.6.2(3)).",
  "Fatigue, seismic detailing, fire and the column's own member checks are not covered.",
] as const;

const BARS = [
  "Threaded bars with inner nuts are outside the clauses of EN 1993-1-8: the model is mechanics with bounds from linear-elastic finite elements; nothing outside those bounds is answered.",
  "The bars work only with every inner nut tight on its flange: state the tightening order and its inspection, and nuts and bars to EN 1090-2. Outer nuts with washers on both flanges. Bar resistances are taken at 0.85 for cut threads.",
] as const;

const TOLERANCE = 0.1;

/** Load cases whose forces on the node do not balance by more than a tenth of the largest term. */
export function unbalancedCases(node: NodeCase): readonly string[] {
  const depth = node.column.section.depthMm;
  return node.loadCases
    .filter((loadCase) => !isBalanced(loadCase, depth, leverOf(node)))
    .map((loadCase) => loadCase.name);
}

const leverOf = (node: NodeCase): number => {
  const section = node.joints[0]?.beam.section;
  return section ? section.depthMm - section.flangeThicknessMm : 0;
};

function isBalanced(loadCase: LoadCase, depthMm: number, leverMm: number): boolean {
  const { left, right, column } = loadCase;
  const moments = [
    left?.momentNmm ?? 0,
    -(right?.momentNmm ?? 0),
    (((left?.shearN ?? 0) - (right?.shearN ?? 0)) * depthMm) / 2,
    -column.momentAboveNmm,
    column.momentBelowNmm,
    (-(column.shearAboveN - column.shearBelowN) * leverMm) / 2,
  ];
  const forces = [left?.axialForceN ?? 0, -(right?.axialForceN ?? 0), column.shearAboveN, column.shearBelowN];
  return [moments, forces].every((terms) => {
    const largest = Math.max(...terms.map(Math.abs));
    return Math.abs(terms.reduce((sum, term) => sum + term, 0)) <= TOLERANCE * largest + 1e-6;
  });
}

/** A two-sided node whose cases never leave one beam unloaded: bars then look better than they may be. */
function lacksOneSidedCase(node: NodeCase): boolean {
  return (
    node.joints.length === 2 &&
    !node.loadCases.some(({ left, right }) => {
      const a = Math.abs(left?.momentNmm ?? 0);
      const b = Math.abs(right?.momentNmm ?? 0);
      return Math.min(a, b) <= 0.05 * Math.max(a, b) && Math.max(a, b) > 0;
    })
  );
}

/** What a reader has to know beside the numbers of one option. */
export function cautionsOf(
  node: NodeCase,
  design: PanelDesign,
  models: readonly JointModel[],
): readonly string[] {
  const cautions: string[] = [...GENERAL];
  const unbalanced = unbalancedCases(node);
  if (unbalanced.length > 0) {
    cautions.push(
      `Joint moments and column forces do not balance in ${unbalanced.length === node.loadCases.length ? "any load case" : unbalanced.join(", ")}: check the column's moments and shears.`,
    );
  }
  if (design.bars.top || design.bars.bottom) {
    cautions.push(...BARS);
    if (lacksOneSidedCase(node)) {
      cautions.push("No load case leaves one beam unloaded; the relief by bars halves there, so add one.");
    }
  }
  for (const level of ["top", "bottom"] as const) {
    const stiffener = design.stiffeners[level];
    const flange = models[0]?.joint.view.joint.beam.section;
    if (!stiffener || !flange) continue;
    if (stiffener.thicknessMm < flange.flangeThicknessMm) {
      cautions.push(
        `Stiffeners at the ${level} are thinner than the beam flange (${stiffener.thicknessMm} against ${flange.flangeThicknessMm} mm); as guidance, match it.`,
      );
    }
    if (2 * stiffener.widthMm + design.column.section.webThicknessMm < flange.widthMm) {
      cautions.push(
        `Stiffeners at the ${level} do not reach as far as the beam flange; as guidance, match it.`,
      );
    }
    const narrow = models.some(
      (model) =>
        isBolted(model) &&
        model.joint.view.tensionLevel === level &&
        2 * stiffener.widthMm + design.column.section.webThicknessMm < 1.33 * model.joint.view.gaugeMm,
    );
    if (narrow) {
      cautions.push(
        `Stiffeners at the ${level} are too narrow to hold the column flange (2 b_sg + t_wc under 1.33 gauge) and do not count for it.`,
      );
    }
  }
  return cautions;
}
