import { cautionsOf } from "./cautions";
import { checkOf } from "./components/check";
import { seatCheck } from "./components/cleat-seat";
import { isCleatView } from "./components/cleat-view";
import { columnPanelOf, type ColumnPanel } from "./components/column-panel";
import { connectionDetailing } from "./components/connection-detailing";
import { sideChecks } from "./components/joint-checks";
import { axialCheck, isLargeAxialForce } from "./components/axial-force";
import { panelChecks, panelGeometryOf, type PanelGeometry } from "./components/panel-shear";
import { rotationCapacityOf } from "./components/rotation-capacity";
import type { JointModel } from "./joint-model";
import { designOf } from "./measures/apply-measures";
import { backingDetailing, refuseUnheldBacking } from "./measures/backing-plates";
import { barChecks, barPressN } from "./measures/bar-checks";
import { diagonalChecks, diagonalDetailing, refuseBesideDiagonals } from "./measures/diagonal-stiffeners";
import { hasBars, type PanelDesign } from "./measures/panel-design";
import { refuseOutsideBarBounds } from "./measures/through-bars";
import { pairIntoWebN, stiffenerChecks, stiffenerDetailing } from "./measures/transverse-stiffeners";
import { refuseShortPlate, webPlateChecks, webPlateDetailing } from "./measures/web-plates";
import { ModelStore, sideCasesOf } from "./loaded-sides";
import type { LoadCase, MeasureCase, NodeCase } from "./node";
import { OutsideScope } from "./outcome";
import type { ComponentCheck, JointResult, OptionOutcome } from "./result";
import { isBoltedCase, jointResultOf, type SideCase } from "./side-case";
import { connectionFailureOf, governingOf, reachesStiffness } from "./verdict";

export interface EvaluateSettings {
  /** Record the working of every number. */
  readonly steps: boolean;
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
  store: ModelStore,
  loadCase: LoadCase,
  sides: readonly SideCase[],
  steps: boolean,
): void {
  for (const side of sides) {
    sideChecks(checks, side);
    if (isBoltedCase(side) && isCleatView(side.model.joint.view))
      checks.push(seatCheck(node, side, side.model.joint.view, steps));
    if (isLargeAxialForce(node, side.model.joint.view.joint, side.actions.axialForceN))
      checks.push(axialCheck(side, store.turned(node, panel, side, steps), steps));
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
    return connectionDetailing(side, panel);
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
    const sides = sideCasesOf(node, panel, store, geometry, loadCase, steps);
    everySide.push(...sides);
    for (const side of sides) joints.push(jointResultOf(side, rotationCapacityOf(node, panel, side)));
    caseChecks(checks, node, design, panel, geometry, store, loadCase, sides, steps);
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
