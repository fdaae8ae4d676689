import { cautionsOf } from "./cautions";
import { checkOf } from "./components/check";
import { seatCheck } from "./components/cleat-seat";
import { isCleatView } from "./components/cleat-view";
import { columnPanelOf, type ColumnPanel } from "./components/column-panel";
import { connectionDetailing, sideChecks } from "./components/joint-checks";
import {
  betaOfSide,
  panelChecks,
  panelGeometryOf,
  type JointShear,
  type PanelGeometry,
} from "./components/panel-shear";
import { isBolted, jointModelOf, type JointModel } from "./joint-model";
import { areFacing } from "./mechanics/panel-levels";
import { symmetricPart } from "./mechanics/through-bar-formulas";
import { designOf } from "./measures/apply-measures";
import { backingDetailing, refuseUnheldBacking } from "./measures/backing-plates";
import { barChecks, barPressN } from "./measures/bar-checks";
import { diagonalChecks, diagonalDetailing, refuseBesideDiagonals } from "./measures/diagonal-stiffeners";
import { hasBars, type PanelDesign } from "./measures/panel-design";
import { refuseOutsideBarBounds } from "./measures/through-bars";
import { pairIntoWebN, stiffenerChecks, stiffenerDetailing } from "./measures/transverse-stiffeners";
import { refuseShortPlate, webPlateChecks, webPlateDetailing } from "./measures/web-plates";
import type { BeamActions, JointCase, Level, LoadCase, MeasureCase, NodeCase, Side } from "./node";
import { OutsideScope } from "./outcome";
import type { ComponentCheck, JointResult, OptionOutcome } from "./result";
import { boltedSideCase, isBoltedCase, jointResultOf, weldedSideCase, type SideCase } from "./side-case";
import { connectionFailureOf, governingOf, reachesStiffness } from "./verdict";

export interface EvaluateSettings {
  /** Record the working of every number. */
  readonly steps: boolean;
}

/** Axial force of a beam up to which the joint's moment resistance is not affected. EN 1993-1-8:2005, 6.2.7.1(2). */
const SMALL_AXIAL_SHARE = 0.05;

const tensionLevelOf = (actions: BeamActions): Level => (actions.momentNmm >= 0 ? "top" : "bottom");
const actionsOf = (loadCase: LoadCase, side: Side): BeamActions => {
  const actions = loadCase[side];
  if (!actions) throw new RangeError(`Load case ${loadCase.name} has no forces for the ${side} beam`);
  return actions;
};

function refuseLargeAxialForce(joint: JointCase, loadCase: LoadCase): void {
  const { axialForceN } = actionsOf(loadCase, joint.side);
  const { section, steel } = joint.beam;
  const area =
    2 * section.widthMm * section.flangeThicknessMm +
    (section.depthMm - 2 * section.flangeThicknessMm) * section.webThicknessMm;
  if (Math.abs(axialForceN) > SMALL_AXIAL_SHARE * area * steel.yieldMpa) {
    throw new OutsideScope(
      `the ${joint.side} beam's axial force in ${loadCase.name} exceeds 5 % of its plastic resistance (6.2.7.1(2))`,
    );
  }
}

/** Models of each joint with its tension flange at a level, made when a load case first asks. */
class ModelStore {
  private readonly models = new Map<string, JointModel>();
  constructor(
    private readonly node: NodeCase,
    private readonly design: PanelDesign,
    private readonly panel: ColumnPanel,
    private readonly steps: boolean,
  ) {}

  of(joint: JointCase, tensionLevel: Level): JointModel {
    const key = `${joint.side} ${tensionLevel}`;
    let model = this.models.get(key);
    if (!model) {
      model = jointModelOf(this.node, this.design, this.panel, joint, tensionLevel, this.steps);
      this.models.set(key, model);
    }
    return model;
  }

  all(): readonly JointModel[] {
    return [...this.models.values()];
  }
}

/** Symmetric part of two forces of one sense; `own` and `other` positive in that sense. */
const symmetricOf = (own: number, other: number): number => {
  const largerN = Math.max(own, other);
  return largerN > 0 ? symmetricPart(null, { largerN, otherN: Math.min(own, other) }) : 0;
};

/** One side in one load case, before its resistance is known. */
interface LoadedSide {
  readonly joint: JointCase;
  readonly actions: BeamActions;
  readonly model: JointModel;
}

/** Outward force at the top flange, N. */
const topForceN = (side: LoadedSide): number => side.actions.momentNmm / side.model.leverMm;
/** By geometry alone, so that no plate that stiffens a row shifts the shear from one beam to the other. */
const shearOf = ({ actions, model }: LoadedSide): JointShear => ({
  momentNmm: actions.momentNmm,
  leverMm: model.leverMm,
});

/** How far the forces left and right are symmetric at one level; a flange that faces none stands alone. */
function symmetricAt(own: LoadedSide, other: LoadedSide | undefined, level: Level): number {
  // At the tension level outward is positive, at the compression level inward; both are the moment's own sense.
  const sense = tensionLevelOf(own.actions) === "top" ? 1 : -1;
  const isFaced = other !== undefined && areFacing(own.joint, other.joint, level);
  return symmetricOf(sense * topForceN(own), isFaced ? sense * topForceN(other) : 0);
}

function sideCasesOf(
  node: NodeCase,
  panel: ColumnPanel,
  store: ModelStore,
  geometry: PanelGeometry,
  loadCase: LoadCase,
  steps: boolean,
): SideCase[] {
  const sides = node.joints.map((joint): LoadedSide => {
    const actions = actionsOf(loadCase, joint.side);
    return { joint, actions, model: store.of(joint, tensionLevelOf(actions)) };
  });
  return sides.map((own, index) => {
    const other = sides[1 - index];
    const { tensionLevel, compressionLevel } = own.model.joint.view;
    const load = {
      loadCase,
      actions: own.actions,
      beta: betaOfSide(geometry, own.joint.side, shearOf(own), other ? shearOf(other) : null),
      symmetric: {
        tension: symmetricAt(own, other, tensionLevel),
        compression: symmetricAt(own, other, compressionLevel),
      },
    };
    return isBolted(own.model)
      ? boltedSideCase(node, panel, own.model, load, steps)
      : weldedSideCase(node, panel, own.model, load, steps);
  });
}

/** Bars under moments turning the same way add to the compression they face: the check is repeated with it. */
function pressedCompression(sides: readonly SideCase[]): ComponentCheck[] {
  return sides.flatMap((side, index) => {
    const other = sides[1 - index];
    const pressN = other ? barPressN(other, side) : 0;
    if (pressN <= 0) return [];
    const { view } = side.model.joint;
    return [
      checkOf(
        {
          component: "column-web-compression",
          side: view.joint.side,
          level: view.compressionLevel,
          loadCase: side.loadCase.name,
          clause: "EN 1993-1-8, 6.2.6.2",
          what: "with the bars' push from the other side",
        },
        side.compressionDemandN + pressN,
        side.compression,
      ),
    ];
  });
}

function caseChecks(
  checks: ComponentCheck[],
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  geometry: PanelGeometry,
  loadCase: LoadCase,
  sides: readonly SideCase[],
  steps: boolean,
): void {
  for (const side of sides) {
    sideChecks(checks, side);
    if (isBoltedCase(side) && isCleatView(side.model.joint.view))
      checks.push(seatCheck(node, side, side.model.joint.view, steps));
  }
  const shearN = panelChecks(checks, panel, geometry, loadCase, sides, steps);
  for (const pair of design.pairs) checks.push(...stiffenerChecks(node, panel, pair, sides, steps));
  const side = node.joints[0]?.side ?? "left";
  if (design.webPlates) {
    let stiffenersN = 0;
    for (const pair of design.pairs) stiffenersN = Math.max(stiffenersN, pairIntoWebN(panel, pair, sides));
    const demand = { panelShearN: Math.abs(shearN), stiffenersN };
    checks.push(
      ...webPlateChecks(node, panel, design.webPlates, demand, { side, loadCase: loadCase.name }, steps),
    );
  }
  if (panel.diagonals) {
    checks.push(...diagonalChecks(node, design, panel, shearN, { side, loadCase: loadCase.name }, steps));
  }
  if (hasBars(design)) {
    sides.forEach((own, index) => checks.push(...barChecks(node, panel, own, sides[1 - index], steps)));
    checks.push(...pressedCompression(sides));
  }
}

function detailingChecks(
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  models: readonly JointModel[],
  sides: readonly SideCase[],
): ComponentCheck[] {
  const seen = new Set<JointModel>();
  const checks = sides.flatMap((side) => {
    if (seen.has(side.model)) return [];
    seen.add(side.model);
    return connectionDetailing(side, panel.section.widthMm);
  });
  for (const pair of design.pairs) checks.push(...stiffenerDetailing(panel, pair, models));
  checks.push(...diagonalDetailing(panel, models), ...backingDetailing(node, design, panel, models));
  const side = models[0]?.joint.view.joint.side ?? "left";
  if (design.webPlates) checks.push(...webPlateDetailing(panel, design.webPlates, side, models));
  return checks;
}

function evaluate(node: NodeCase, measures: readonly MeasureCase[], steps: boolean): OptionOutcome {
  const design = designOf(node, measures);
  const panel = columnPanelOf(node, design, steps);
  refuseOutsideBarBounds(node, design, panel);
  refuseUnheldBacking(node, design);
  refuseBesideDiagonals(design);
  const geometry = panelGeometryOf(node);
  const store = new ModelStore(node, design, panel, steps);
  const checks: ComponentCheck[] = [];
  const joints: JointResult[] = [];
  const everySide: SideCase[] = [];
  for (const loadCase of node.loadCases) {
    for (const joint of node.joints) refuseLargeAxialForce(joint, loadCase);
    const sides = sideCasesOf(node, panel, store, geometry, loadCase, steps);
    everySide.push(...sides);
    joints.push(...sides.map(jointResultOf));
    caseChecks(checks, node, design, panel, geometry, loadCase, sides, steps);
  }
  const models = store.all();
  if (design.webPlates) refuseShortPlate(design.webPlates, models);
  checks.push(...detailingChecks(node, design, panel, models, everySide));
  const target = node.target.utilisation;
  const governing = governingOf(checks, node);
  const isDetailed = checks.every((check) => check.component !== "detailing" || check.utilisation <= 1);
  const strong = checks.every((check) => check.component === "detailing" || check.utilisation <= target);
  const stiffnessReached = reachesStiffness(node, joints);
  return {
    kind: "evaluated",
    measures,
    passes: strong && isDetailed && stiffnessReached,
    utilisation: governing.utilisation,
    stiffnessReached,
    governing,
    connectionFailure: connectionFailureOf(everySide, checks, target),
    cautions: cautionsOf(node, design, models),
    joints,
    checks,
  };
}

/**
 * One option on one node in every load case: resistance, stiffness and detailing, or "outside scope" with the reason.
 *
 * Says nothing about money. Empty `measures` = the bare column.
 */
export function evaluateOption(
  node: NodeCase,
  measures: readonly MeasureCase[],
  settings: EvaluateSettings = { steps: false },
): OptionOutcome {
  try {
    return evaluate(node, measures, settings.steps);
  } catch (error) {
    if (error instanceof OutsideScope) return { kind: "outside-scope", measures, reason: error.reason };
    throw error;
  }
}
