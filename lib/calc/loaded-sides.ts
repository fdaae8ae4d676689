import type { ColumnPanel } from "./components/column-panel";
import { betaOfSide, type JointShear, type PanelGeometry } from "./components/panel-shear";
import { isBolted, jointModelOf, type JointModel } from "./joint-model";
import { areFacing } from "./mechanics/panel-levels";
import { symmetricPart } from "./mechanics/through-bar-formulas";
import type { PanelDesign } from "./measures/panel-design";
import type { BeamActions, JointCase, Level, LoadCase, NodeCase, Side } from "./node";
import { boltedSideCase, weldedSideCase, type SideCase, type SideLoad } from "./side-case";

const tensionLevelOf = (actions: BeamActions): Level => (actions.momentNmm >= 0 ? "top" : "bottom");
const actionsOf = (loadCase: LoadCase, side: Side): BeamActions => {
  const actions = loadCase[side];
  if (!actions) throw new RangeError(`Load case ${loadCase.name} has no forces for the ${side} beam`);
  return actions;
};

const sideCaseOf = (
  node: NodeCase,
  panel: ColumnPanel,
  model: JointModel,
  load: SideLoad,
  steps: boolean,
): SideCase =>
  isBolted(model)
    ? boltedSideCase(node, panel, model, load, steps)
    : weldedSideCase(node, panel, model, load, steps);

/** Models of each joint with its tension flange at a level, made when a load case first asks. */
export class ModelStore {
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

  /** The same side and load with its tension flange at the other level: what the other flange of the beam resists. */
  turned(node: NodeCase, panel: ColumnPanel, side: SideCase, steps: boolean): SideCase {
    const { joint, compressionLevel } = side.model.joint.view;
    return sideCaseOf(node, panel, this.of(joint, compressionLevel), side, steps);
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

/** Every joint in one load case. */
export function sideCasesOf(
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
    return sideCaseOf(node, panel, own.model, load, steps);
  });
}
