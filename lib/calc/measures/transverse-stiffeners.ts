import { epsilonOf } from "../clauses/en1993-1-1-2005/members";
import {
  outstandLimitMm,
  stiffenerNetAreaMm2,
  twoShearPlanesN,
  yieldForceN,
} from "../clauses/en1993-1-5-2006/stiffeners";
import { filletShearStrengthMpa, weldForceN } from "../clauses/en1993-1-8-2005/welds";
import { checkOf, detailAtLeast, detailAtMost } from "../components/check";
import { SPREAD_SHARE, rowToStiffenerMm } from "../components/column-flange";
import type { ColumnPanel } from "../components/column-panel";
import { isBolted, type JointModel } from "../joint-model";
import {
  tensionStiffenerPlainN,
  tensionStiffenerSharedN,
} from "../clauses/en1993-1-5-2006/tension-stiffeners";
import { flangeLevelMm } from "../mechanics/panel-levels";
import { forceAlongN } from "../mechanics/sloped-plates";
import type { JointCase, NodeCase, Side } from "../node";
import type { ComponentCheck } from "../result";
import { isBoltedCase, type BoltedSideCase, type SideCase } from "../side-case";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import { placedAt, type ApplyMeasure, type TransverseStiffeners } from "./panel-design";
import type { StiffenerPair } from "./stiffener-pairs";

export const applyTransverseStiffeners: ApplyMeasure<TransverseStiffeners> = (design, measure) => ({
  ...design,
  stiffeners: placedAt(design.stiffeners, measure.at ?? "both", measure.levels, measure),
});

const netAreaMm2 = (trace: Trace | null, stiffener: TransverseStiffeners): number =>
  stiffenerNetAreaMm2(trace, {
    widthMm: stiffener.widthMm,
    clipMm: stiffener.clipMm,
    thicknessMm: stiffener.thicknessMm,
  });

/** Length of each plate along the web, mm. */
const depthOf = (panel: ColumnPanel, stiffener: TransverseStiffeners): number =>
  stiffener.length === "full"
    ? panel.section.depthMm - 2 * panel.section.flangeThicknessMm
    : stiffener.length;

/** Height of the pair behind one joint's flange, mm below the top of the left beam. */
function pairLevelMm(pair: StiffenerPair, joint: JointCase, models: readonly JointModel[]): number {
  const served = pair.sides.includes(joint.side)
    ? joint
    : models.find((model) => pair.sides.includes(model.joint.view.joint.side))?.joint.view.joint;
  return flangeLevelMm(served ?? joint, pair.level);
}

/** Detailing of one pair. Every rule names where it comes from. */
export function stiffenerDetailing(
  panel: ColumnPanel,
  pair: StiffenerPair,
  models: readonly JointModel[],
): ComponentCheck[] {
  const { stiffener, level } = pair;
  const side = pair.sides[0] ?? "left";
  const head = { side, level };
  const { section } = panel;
  const epsilon = epsilonOf(null, { yieldMpa: stiffener.steel.yieldMpa });
  const throats = [stiffener.flangeWeld, stiffener.webWeld].flatMap((weld) =>
    weld.kind === "fillet" ? [weld.throatMm] : [],
  );
  // A full-depth pair passes the nuts of the other beam too, whether or not it serves that beam.
  const nutRoom = models.flatMap((model) => {
    const { joint } = model.joint.view;
    if (!isBolted(model) || (stiffener.length !== "full" && !pair.sides.includes(joint.side))) return [];
    const plateMm = pairLevelMm(pair, joint, models);
    return model.joint.view.rows.map((row) => ({
      face: Math.abs(joint.levelOffsetMm + row.belowTopMm - plateMm) - stiffener.thicknessMm / 2,
      nut: row.fastener.size.acrossPointsMm / 2,
    }));
  });
  const tightest = nutRoom.sort((a, b) => a.face - a.nut - (b.face - b.nut))[0];
  return [
    detailAtMost(
      { ...head, clause: "EN 1993-1-5, 9.2.1(8)", what: "stiffener outstand, at most 14 ε t_s" },
      stiffener.widthMm,
      outstandLimitMm(null, { thicknessMm: stiffener.thicknessMm, epsilon }),
    ),
    detailAtLeast(
      { ...head, clause: "geometry", what: "corner clip clears the root radius" },
      section.rootMm,
      stiffener.clipMm,
    ),
    detailAtMost(
      { ...head, clause: "geometry", what: "stiffener within the column flange" },
      stiffener.widthMm + panel.webPlateMm,
      (section.widthMm - section.webThicknessMm) / 2,
    ),
    detailAtMost(
      { ...head, clause: "geometry", what: "stiffener fits between the column flanges" },
      depthOf(panel, stiffener),
      section.depthMm - 2 * section.flangeThicknessMm,
    ),
    ...(throats.length > 0
      ? [
          detailAtLeast(
            { ...head, clause: "EN 1993-1-8, 4.5.2(2)", what: "throat of the stiffener's welds, 3 mm" },
            3,
            Math.min(...throats),
          ),
        ]
      : []),
    ...(tightest
      ? [
          detailAtLeast(
            { ...head, clause: "geometry", what: "nut beside the stiffener" },
            tightest.nut,
            Math.max(tightest.face, 0),
          ),
        ]
      : []),
  ];
}

/** Force in the pair at its tension level from the rows beside it, N, and the working. SCI/BCSA P398. */
function tensionForce(side: BoltedSideCase, panel: ColumnPanel, steps: boolean): Traced {
  const { view, flange } = side.model.joint;
  const middle = view.joint.beam.section.flangeThicknessMm / 2;
  const rows = view.tensionRows;
  const above = rows.findLastIndex((row) => row.fromFaceMm < middle);
  const below = rows.findIndex((row) => row.fromFaceMm >= middle);
  const reach = SPREAD_SHARE * view.gaugeMm;
  const spreadBetween = (a: number, b: number): number => Math.min(Math.abs(a - b) / 2, reach);
  const ends = (index: number): number => {
    const row = rows[index];
    if (!row) return 0;
    const before = rows[index - 1];
    const after = rows[index + 1];
    const out = before
      ? spreadBetween(row.fromFaceMm, before.fromFaceMm)
      : Math.min(reach, view.columnBeyondTensionMm + row.fromFaceMm);
    return Math.max(out, 0) + (after ? spreadBetween(row.fromFaceMm, after.fromFaceMm) : reach);
  };
  const m2 = (index: number): number => {
    const row = rows[index];
    return row ? rowToStiffenerMm(view, row) : 1;
  };
  const force = (index: number): number => (index < 0 ? 0 : (side.rowDemandsN[index] ?? 0));
  return traced(steps, (trace) => {
    const plain = tensionStiffenerPlainN(trace, {
      firstN: force(above),
      secondN: force(below),
      webLengthMm: ends(above) + ends(below),
      webThicknessMm: panel.tensionWebMm,
      yieldMpa: panel.steel.yieldMpa,
    });
    return tensionStiffenerSharedN(
      trace,
      {
        plainN: plain,
        mMm: flange.mMm,
        firstN: force(above),
        firstMm: above < 0 ? 1 : m2(above),
        secondN: force(below),
        secondMm: below < 0 ? 1 : m2(below),
      },
      0,
    );
  });
}

/** Force that one side brings into the pair's plates, outward positive, N. */
interface PlateForce {
  readonly side: Side;
  readonly isTension: boolean;
  readonly force: Traced;
}

function plateForce(sideCase: SideCase, pair: StiffenerPair, panel: ColumnPanel, steps: boolean): PlateForce {
  const { view, compression } = sideCase.model.joint;
  const { side } = view.joint;
  const along = ({ value, step }: Traced): Traced => ({ value: forceAlongN(value, pair.slopeCosine), step });
  if (view.tensionLevel === pair.level) {
    const force = isBoltedCase(sideCase)
      ? tensionForce(sideCase, panel, steps)
      : { value: Math.max(sideCase.tensionDemandN, 0) * sideCase.model.joint.plateShare, step: undefined };
    return { side, isTension: true, force: along(force) };
  }
  const share = compression.stiffener?.plateShare ?? 1;
  const force = { value: Math.max(sideCase.compressionDemandN, 0) * share, step: undefined };
  return { side, isTension: false, force: along(force) };
}

function weldLimit(
  node: NodeCase,
  stiffener: TransverseStiffeners,
  throatMm: number,
  lengthMm: number,
  steps: boolean,
): Traced {
  const { ultimateMpa, betaW } = stiffener.steel;
  return traced(steps, (trace) =>
    weldForceN(
      trace,
      {
        strengthMpa: filletShearStrengthMpa(trace, {
          ultimateMpa,
          betaW,
          gammaM2: node.partialFactors.gammaM2,
        }),
        throatMm,
        lengthMm,
      },
      0,
    ),
  );
}

/** What the forces of both sides leave to the web, N. */
function netOf(forces: readonly PlateForce[]): number {
  let total = 0;
  // Towards the right is positive: tension on the left pulls left, compression on the left pushes right.
  for (const { side, isTension, force } of forces) {
    total += (side === "left" ? -1 : 1) * (isTension ? 1 : -1) * force.value;
  }
  return Math.abs(total);
}

/** Force that one pair brings into the web, or the web plates that it sits on, in one load case, N. */
export function pairIntoWebN(panel: ColumnPanel, pair: StiffenerPair, sides: readonly SideCase[]): number {
  const served = sides.filter((side) => pair.sides.includes(side.model.joint.view.joint.side));
  return netOf(served.map((side) => plateForce(side, pair, panel, false)));
}

/** Plates and welds of one pair in one load case, the forces of the sides it serves with their signs. */
export function stiffenerChecks(
  node: NodeCase,
  panel: ColumnPanel,
  pair: StiffenerPair,
  everySide: readonly SideCase[],
  steps: boolean,
): ComponentCheck[] {
  const { stiffener, level } = pair;
  const sides = everySide.filter((side) => pair.sides.includes(side.model.joint.view.joint.side));
  const first = sides[0];
  if (!first) return [];
  const forces = sides.map((side) => plateForce(side, pair, panel, steps));
  const head = { level, loadCase: first.loadCase.name };
  const checks: ComponentCheck[] = [];
  const straight = stiffener.widthMm - stiffener.clipMm;
  forces.forEach(({ side, isTension, force }, index) => {
    const sideCase = sides[index];
    if (!sideCase) return;
    checks.push(
      isTension
        ? checkOf(
            { ...head, side, component: "transverse-stiffener", clause: "SCI/BCSA P398, tension stiffeners" },
            force.value,
            traced(steps, (trace) =>
              yieldForceN(
                trace,
                {
                  areaMm2: netAreaMm2(trace, stiffener),
                  yieldMpa: stiffener.steel.yieldMpa,
                  gammaM0: node.partialFactors.gammaM0,
                },
                0,
              ),
            ),
            { demandStep: force.step },
          )
        : checkOf(
            {
              ...head,
              side,
              component: "transverse-stiffener",
              clause: "EN 1993-1-5, 9.4 and SCI/BCSA P398",
            },
            sideCase.compressionDemandN,
            sideCase.compression,
          ),
    );
    if (stiffener.flangeWeld.kind === "fillet") {
      checks.push(
        checkOf(
          {
            ...head,
            side,
            component: "stiffener-weld",
            clause: "EN 1993-1-8, 4.5.3.3",
            what: "stiffener to flange",
          },
          force.value,
          weldLimit(node, stiffener, stiffener.flangeWeld.throatMm, 4 * straight, steps),
          { demandStep: force.step },
        ),
      );
    }
  });
  const net = netOf(forces);
  const side = forces.reduce((larger, other) =>
    other.force.value > larger.force.value ? other : larger,
  ).side;
  const along = depthOf(panel, stiffener) - 2 * stiffener.clipMm;
  if (stiffener.webWeld.kind === "fillet") {
    checks.push(
      checkOf(
        {
          ...head,
          side,
          component: "stiffener-weld",
          clause: "EN 1993-1-8, 4.5.3.3",
          what: "stiffener to web",
        },
        net,
        weldLimit(node, stiffener, stiffener.webWeld.throatMm, 4 * along, steps),
      ),
    );
  }
  if (stiffener.length !== "full") {
    checks.push(
      checkOf(
        {
          ...head,
          side,
          component: "transverse-stiffener",
          clause: "EN 1993-1-1, 6.2.6",
          what: "column web in shear along a partial-depth stiffener",
        },
        Math.max(net, ...forces.map(({ force }) => force.value)),
        traced(steps, (trace) =>
          twoShearPlanesN(trace, {
            lengthMm: along,
            thicknessMm: panel.section.webThicknessMm,
            yieldMpa: panel.steel.yieldMpa,
            gammaM0: node.partialFactors.gammaM0,
          }),
        ),
      ),
    );
  }
  return checks;
}
