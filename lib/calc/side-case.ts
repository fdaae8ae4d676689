import { boltedMomentNmm, weldedMomentNmm } from "./clauses/en1993-1-8-2005/assembly";
import { kWcOf, webStressMpa } from "./clauses/en1993-1-8-2005/column-web";
import { panelLimitOnRowsN } from "./clauses/en1993-1-8-2005/panel";
import { panelSpringMm } from "./clauses/en1993-1-8-2005/stiffness";
import { columnTension, type ColumnTension } from "./components/bolted-joint";
import type { ColumnPanel } from "./components/column-panel";
import { compressionResistance } from "./components/compression-zone";
import {
  initialStiffness,
  psiOf,
  secantStiffness,
  stiffnessClassOf,
  strengthClassOf,
  tensionSpringOf,
  type TensionSpring,
} from "./components/joint-stiffness";
import { assembleRows } from "./components/row-assembly";
import { weldedTension } from "./components/welded-joint";
import { isBolted, type BoltedModel, type JointModel, type WeldedModel } from "./joint-model";
import { reliefBuckling, reliefCrushing, reliefTension } from "./mechanics/through-bar-formulas";
import type { BeamActions, Level, LoadCase, NodeCase, Side } from "./node";
import type { JointResult, RotationCapacity } from "./result";
import type { Step } from "./trace/trace";
import { traced, type Traced } from "./trace/traced";

/** One side of the node in one load case, before its checks are listed. */
interface SideCaseBase {
  readonly loadCase: LoadCase;
  readonly actions: BeamActions;
  /** Size of the moment. */
  readonly momentNmm: number;
  readonly beta: number;
  /** Symmetric part of the forces left and right at the tension and the compression level, 0 to 1. */
  readonly symmetric: { readonly tension: number; readonly compression: number };
  readonly resistance: Traced;
  /** M_Ed / M_j,Rd. */
  readonly ratio: number;
  readonly lever: Traced;
  readonly panelSpring: Traced | null;
  readonly initial: Traced;
  readonly secant: Traced | null;
  readonly compression: Traced;
  /** Force that the beam's compression flange brings, N. */
  readonly compressionDemandN: number;
  /** Force that the beam's tension side brings, N. */
  readonly tensionDemandN: number;
}

export interface BoltedSideCase extends SideCaseBase {
  readonly model: BoltedModel;
  readonly column: ColumnTension;
  /** At the joint's resistance, by position among the tension rows. */
  readonly rowForces: readonly Traced[];
  readonly rowDemandsN: readonly number[];
}

export interface WeldedSideCase extends SideCaseBase {
  readonly model: WeldedModel;
  readonly webTension: Traced;
}

export type SideCase = BoltedSideCase | WeldedSideCase;

export const isBoltedCase = (side: SideCase): side is BoltedSideCase => isBolted(side.model);

/** What one joint is loaded with in one case. */
export interface SideLoad {
  readonly loadCase: LoadCase;
  readonly actions: BeamActions;
  readonly beta: number;
  readonly symmetric: { readonly tension: number; readonly compression: number };
}

/** k_wc at the level of the compression flange. 6.2.6.2(2). @throws OutsideScope where the web yields. */
function webStressFactor(panel: ColumnPanel, loadCase: LoadCase, level: Level, steps: boolean): Traced {
  const { axialForceN, momentAboveNmm, momentBelowNmm } = loadCase.column;
  return traced(steps, (trace) => {
    const stressMpa = webStressMpa(trace, {
      axialForceN,
      areaMm2: panel.properties.areaMm2,
      momentNmm: Math.abs(level === "top" ? momentAboveNmm : momentBelowNmm),
      inertiaMm4: panel.properties.inertiaMm4,
      webDepthMm: panel.properties.webDepthMm,
    });
    return kWcOf(trace, { stressMpa, yieldMpa: panel.steel.yieldMpa }, 0);
  });
}

function compressionOf(
  node: NodeCase,
  panel: ColumnPanel,
  model: JointModel,
  load: SideLoad,
  steps: boolean,
): Traced {
  const bars = isBolted(model) ? model.barCompression : null;
  const given = bars
    ? { distanceRatio: bars.distanceRatio, share: bars.share.value, symmetric: load.symmetric.compression }
    : null;
  return compressionResistance(
    node,
    panel,
    model.joint.compression,
    {
      beta: load.beta,
      kWc: webStressFactor(panel, load.loadCase, model.joint.view.compressionLevel, steps),
      reliefCrushing: given ? reliefCrushing(null, given) : 0,
      reliefBuckling: given ? reliefBuckling(null, given) : 0,
    },
    steps,
  );
}

/** How bars relieve the rows of this side: a single row under a clamped plate gets no relief of flange bending. */
function reliefOf(model: BoltedModel, symmetric: number): { flange: number[]; web: number[] } {
  const { view } = model.joint;
  const barRows = model.barShares.filter((share) => share !== null).length;
  const isClampedSingle = view.attachment.isPreloaded && barRows === 1;
  const web = model.barShares.map((share) =>
    share ? reliefTension(null, { share: share.value, symmetric }) : 0,
  );
  return { web, flange: isClampedSingle ? web.map(() => 0) : web };
}

function tensionSide(model: BoltedModel, symmetric: number, steps: boolean): TensionSpring {
  if (model.barShares.every((share) => share === null)) return model.tension;
  return tensionSpringOf(
    model.joint,
    model.springs,
    model.barShares.map((share) => (share ? { share: share.value, symmetric } : null)),
    steps,
  );
}

const panelSpringOf = (panel: ColumnPanel, beta: number, lever: Traced, steps: boolean): Traced | null =>
  // Diagonals make k_1 infinite, Table 6.11.
  beta > 0 && panel.diagonals === null
    ? traced(steps, (trace) => {
        trace?.include(panel.shearArea.step);
        return panelSpringMm(trace, { shearAreaMm2: panel.shearArea.value, beta, leverMm: lever.value }, 0);
      })
    : null;

const panelLimit = (panel: ColumnPanel, side: Side, beta: number): number =>
  beta > 0 ? panelLimitOnRowsN(null, { panelN: panel.shear[side].value, beta }) : Infinity;

/** One bolted side in one load case: 6.2.7.2, 6.3. */
export function boltedSideCase(
  node: NodeCase,
  panel: ColumnPanel,
  model: BoltedModel,
  load: SideLoad,
  steps: boolean,
): BoltedSideCase {
  const { joint } = model;
  const compression = compressionOf(node, panel, model, load, steps);
  const column = columnTension(node, panel, joint, load.beta, reliefOf(model, load.symmetric.tension), steps);
  const limitN = Math.min(
    compression.value,
    joint.beamFlange.value,
    joint.seat?.value ?? Infinity,
    panelLimit(panel, joint.view.joint.side, load.beta),
  );
  const rows = assembleRows(
    joint.view.tensionRows,
    [column.flange, column.web, ...joint.ownLimits],
    limitN,
    joint.hasTriangularLimit,
    steps,
  );
  const resistance = traced(steps, (trace) => {
    rows.forces.forEach((force) => trace?.include(force.step));
    return boltedMomentNmm(
      trace,
      {
        leverMm: joint.view.tensionRows.map((row) => row.leverMm),
        forceN: rows.forces.map((force) => force.value),
      },
      0,
    );
  });
  const momentNmm = Math.abs(load.actions.momentNmm);
  const ratio = momentNmm / resistance.value;
  const rowDemandsN = rows.forces.map((force) => force.value * ratio);
  const sumN = rowDemandsN.reduce((sum, demand) => sum + demand, 0);
  const tension = tensionSide(model, load.symmetric.tension, steps);
  const panelSpring = panelSpringOf(panel, load.beta, tension.leverMm, steps);
  const initial = initialStiffness(
    tension.leverMm,
    [panelSpring, joint.compression.spring, tension.spring, ...model.slip],
    steps,
  );
  return {
    loadCase: load.loadCase,
    actions: load.actions,
    beta: load.beta,
    symmetric: load.symmetric,
    model,
    momentNmm,
    resistance,
    ratio,
    lever: tension.leverMm,
    panelSpring,
    initial,
    secant: secantStiffness(momentNmm, resistance.value, initial, joint.view.joint.connection.kind, steps),
    compression,
    compressionDemandN: sumN + load.actions.axialForceN / 2,
    tensionDemandN: sumN - load.actions.axialForceN / 2,
    column,
    rowForces: rows.forces,
    rowDemandsN,
  };
}

/** One welded side in one load case: 6.2.7.1, 6.3. */
export function weldedSideCase(
  node: NodeCase,
  panel: ColumnPanel,
  model: WeldedModel,
  load: SideLoad,
  steps: boolean,
): WeldedSideCase {
  const { joint } = model;
  const compression = compressionOf(node, panel, model, load, steps);
  const webTension = weldedTension(node, panel, joint, load.beta, steps);
  const forceN = Math.min(
    compression.value,
    joint.beamFlange.value,
    webTension.value,
    joint.flangeBending?.value ?? Infinity,
    panelLimit(panel, joint.view.joint.side, load.beta),
  );
  const resistance = traced(steps, (trace) => {
    for (const part of [webTension, joint.flangeBending, compression, joint.beamFlange])
      trace?.include(part?.step);
    return weldedMomentNmm(trace, { leverMm: joint.leverMm, forceN }, 0);
  });
  const momentNmm = Math.abs(load.actions.momentNmm);
  const lever: Traced = { value: joint.leverMm, step: undefined };
  const panelSpring = panelSpringOf(panel, load.beta, lever, steps);
  const initial = initialStiffness(lever, [panelSpring, joint.compression.spring, joint.spring], steps);
  return {
    loadCase: load.loadCase,
    actions: load.actions,
    beta: load.beta,
    symmetric: load.symmetric,
    model,
    momentNmm,
    resistance,
    ratio: momentNmm / resistance.value,
    lever,
    panelSpring,
    initial,
    secant: secantStiffness(momentNmm, resistance.value, initial, joint.view.joint.connection.kind, steps),
    compression,
    compressionDemandN: momentNmm / joint.leverMm + load.actions.axialForceN / 2,
    tensionDemandN: momentNmm / joint.leverMm - load.actions.axialForceN / 2,
    webTension,
  };
}

/** What the result says of one joint in one load case. */
export function jointResultOf(side: SideCase, rotationCapacity: RotationCapacity): JointResult {
  const { bounds } = side.model;
  const steps = [side.resistance.step, side.initial.step, side.secant?.step, bounds.rigid?.step].filter(
    (step): step is Step => step !== undefined,
  );
  return {
    side: side.model.joint.view.joint.side,
    loadCase: side.loadCase.name,
    momentResistanceNmm: side.resistance.value,
    initialStiffnessNmmPerRad: side.initial.value,
    secantStiffnessNmmPerRad: side.secant?.value ?? null,
    leverArmMm: side.lever.value,
    stiffnessClass: stiffnessClassOf(side.initial.value, bounds),
    strengthClass: strengthClassOf(side.resistance.value, bounds),
    rigidFromNmmPerRad: bounds.rigid?.value ?? null,
    rotationCapacity,
    stiffnessExponent: psiOf(side.model.joint.view.joint.connection.kind),
    rows: isBoltedCase(side)
      ? side.model.joint.view.tensionRows.map((row, index) => ({
          row: row.row,
          forceN: side.rowForces[index]?.value ?? 0,
        }))
      : [],
    ...(steps.length > 0 ? { steps } : {}),
  };
}
