import { epsilonOf } from "../clauses/en1993-1-1-2005/members";
import { panelShearN } from "../clauses/en1993-1-8-2005/column-web";
import { filletShearStrengthMpa, weldForceN } from "../clauses/en1993-1-8-2005/welds";
import { checkOf, detailAtLeast, detailAtMost } from "../components/check";
import type { ColumnPanel } from "../components/column-panel";
import { isBolted, type JointModel } from "../joint-model";
import type { NodeCase, Side } from "../node";
import { OutsideScope } from "../outcome";
import type { ComponentCheck } from "../result";
import { traced } from "../trace/traced";
import { weldLegMm, type ApplyMeasure, type WebPlates } from "./panel-design";

export const applyWebPlates: ApplyMeasure<WebPlates> = (design, measure) => ({
  ...design,
  webPlates: measure,
});

/** Slenderness limit of a plate held at its edges only. EN 1993-1-8:2005, 6.2.6.1(14). */
const SLENDER_PLATE = 40;

/** Height of plate that covers the effective widths in tension and compression of a joint, mm, plate on the beams' mid-height. */
export function neededPlateHeightMm(model: JointModel): number {
  const { view, compression } = model.joint;
  const { depthMm, flangeThicknessMm } = view.joint.beam.section;
  const armMm = (depthMm - flangeThicknessMm) / 2;
  const compressionReach = armMm + Math.min(compression.breadth.value / 2, view.columnBeyondCompressionMm);
  if (!isBolted(model)) {
    const { tensionBreadth } = model.joint;
    return (
      2 * Math.max(compressionReach, armMm + Math.min(tensionBreadth.value / 2, view.columnBeyondTensionMm))
    );
  }
  const end = armMm + view.columnBeyondTensionMm;
  const rowReach = model.joint.view.tensionRows.map((row, index) => {
    const half = (model.joint.flange.family.alone[index]?.modeLengthMm ?? 0) / 2;
    return Math.min(depthMm / 2 - row.fromFaceMm + half, end);
  });
  return 2 * Math.max(compressionReach, ...rowReach);
}

/** @throws OutsideScope where the plate does not cover what it is to strengthen. */
export function refuseShortPlate(plates: WebPlates, models: readonly JointModel[]): void {
  const reach = models.map((model) => {
    const { levelOffsetMm, beam } = model.joint.view.joint;
    const half = neededPlateHeightMm(model) / 2;
    const middle = levelOffsetMm + beam.section.depthMm / 2;
    return { top: middle - half, bottom: middle + half };
  });
  // One plate for all the beams, wherever on the web that puts it.
  const needed = Math.max(...reach.map(({ bottom }) => bottom)) - Math.min(...reach.map(({ top }) => top));
  if (plates.heightMm < needed - 0.5) {
    throw new OutsideScope(
      `the web plate is ${plates.heightMm} mm high and has to cover ${Math.ceil(needed)} mm: the effective widths in tension and compression (6.2.6.1(9))`,
    );
  }
}

/** Detailing of supplementary web plates. EN 1993-1-8:2005, 6.2.6.1(8) to (14). */
export function webPlateDetailing(
  panel: ColumnPanel,
  plates: WebPlates,
  side: Side,
  models: readonly JointModel[],
): ComponentCheck[] {
  const head = { side };
  const clear = panel.properties.webDepthMm;
  const epsilon = epsilonOf(null, { yieldMpa: plates.steel.yieldMpa });
  const reach = plates.weld.kind === "fillet" ? weldLegMm(plates.weld) : plates.thicknessMm;
  const nuts = models.flatMap((model) =>
    isBolted(model)
      ? model.joint.view.rows.map((row) => ({
          gaugeMm: model.joint.view.gaugeMm,
          halfNutMm: row.fastener.size.acrossPointsMm / 2,
        }))
      : [],
  );
  const roomOf = ({ gaugeMm }: { readonly gaugeMm: number }): number =>
    (gaugeMm - panel.section.webThicknessMm) / 2 - plates.thicknessMm;
  const tightest = nuts.sort((a, b) => roomOf(a) - a.halfNutMm - (roomOf(b) - b.halfNutMm))[0];
  const sameGrade = plates.steel.grade === panel.steel.grade;
  return [
    detailAtMost(
      { ...head, clause: "EN 1993-1-8, 6.2.6.1(10)", what: "web plate width between the root toes" },
      plates.widthMm,
      clear,
    ),
    detailAtLeast(
      { ...head, clause: "EN 1993-1-8, 6.2.6.1(10)", what: "web plate and its welds reach the root toes" },
      clear,
      plates.widthMm + 2 * reach,
    ),
    detailAtLeast(
      { ...head, clause: "EN 1993-1-8, 6.2.6.1(11)", what: "web plate thickness, at least the column web's" },
      panel.section.webThicknessMm,
      plates.thicknessMm,
    ),
    detailAtMost(
      { ...head, clause: "EN 1993-1-8, 6.2.6.1(14)", what: "web plate width, at most 40 ε t_s" },
      plates.widthMm,
      SLENDER_PLATE * epsilon * plates.thicknessMm,
    ),
    detailAtLeast(
      {
        ...head,
        clause: "EN 1993-1-8, 6.2.6.1(8)",
        what: "web plate of the column's own grade",
        unit: "ratio",
      },
      1,
      sameGrade ? 1 : 0,
    ),
    ...(tightest
      ? [
          detailAtLeast(
            { ...head, clause: "geometry", what: "nut beside the web plate" },
            tightest.halfNutMm,
            Math.max(roomOf(tightest), 0),
          ),
        ]
      : []),
    ...(plates.weld.kind === "fillet"
      ? [
          detailAtLeast(
            { ...head, clause: "EN 1993-1-8, 4.5.2(2)", what: "throat of the web plate's weld, 3 mm" },
            3,
            plates.weld.throatMm,
          ),
        ]
      : []),
  ];
}

/**
 * Shear in the plates and in their edge welds: their share of the panel's shear, or what a pair of stiffeners that sits on
 * them brings in on its side of the web, if that is more.
 */
export function webPlateChecks(
  node: NodeCase,
  panel: ColumnPanel,
  plates: WebPlates,
  demand: { readonly panelShearN: number; readonly stiffenersN: number },
  head: { readonly side: Side; readonly loadCase: string },
  steps: boolean,
): ComponentCheck[] {
  const added = plates.widthMm * panel.section.webThicknessMm;
  const orStiffeners = demand.stiffenersN > 0 ? ", or from the stiffeners on it" : "";
  const perPlateN = Math.max(
    (demand.panelShearN * added) / panel.shearArea.value / plates.sides,
    demand.stiffenersN / 2,
  );
  const plate = traced(steps, (trace) =>
    panelShearN(trace, {
      shearAreaMm2: plates.widthMm * plates.thicknessMm,
      yieldMpa: plates.steel.yieldMpa,
      webDepthMm: panel.properties.webDepthMm,
      webThicknessMm: panel.section.webThicknessMm,
      epsilon: panel.epsilon,
      gammaM0: node.partialFactors.gammaM0,
    }),
  );
  const checks = [
    checkOf(
      {
        ...head,
        component: "web-plate",
        clause: "EN 1993-1-8, 6.2.6.1(6)",
        what: `shear in one web plate${orStiffeners}`,
      },
      perPlateN,
      plate,
    ),
  ];
  const { weld } = plates;
  if (weld.kind === "fillet") {
    const strength = {
      ultimateMpa: plates.steel.ultimateMpa,
      betaW: plates.steel.betaW,
      gammaM2: node.partialFactors.gammaM2,
    };
    checks.push(
      checkOf(
        {
          ...head,
          component: "web-plate-weld",
          clause: "EN 1993-1-8, 4.5.3.3",
          what: `shear flow along one plate edge${orStiffeners}`,
        },
        perPlateN,
        traced(steps, (trace) =>
          weldForceN(
            trace,
            {
              strengthMpa: filletShearStrengthMpa(trace, strength),
              throatMm: weld.throatMm,
              lengthMm: plates.widthMm,
            },
            0,
          ),
        ),
      ),
    );
  }
  return checks;
}
