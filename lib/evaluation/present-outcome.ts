import type { ComponentCheck, JointResult, Step } from "@/lib/calc";
import type { ComponentDocument, JointDocument } from "@/lib/schemas/result-document";

/** How much of the working a result carries. */
export type StepsWanted = "none" | "governing" | "all";

const UNITS = {
  N: { unit: "kN", factor: 1e-3 },
  Nmm: { unit: "kNm", factor: 1e-6 },
  mm: { unit: "mm", factor: 1 },
  ratio: { unit: "ratio", factor: 1 },
} as const;

const NMM_PER_KNM = 1e6;

/** One check in the units of the result document. */
export function presentCheck(check: ComponentCheck, withSteps: boolean): ComponentDocument {
  const { unit, factor } = UNITS[check.unit];
  return {
    component: check.component,
    side: check.side,
    ...(check.level !== undefined ? { level: check.level } : {}),
    ...(check.row !== undefined ? { row: check.row } : {}),
    ...(check.rows ? { rows: [...check.rows] } : {}),
    loadCase: check.loadCase,
    clause: check.clause,
    ...(check.what !== undefined ? { what: check.what } : {}),
    unit,
    demand: check.demand * factor,
    resistance: check.resistance * factor,
    utilisation: check.utilisation,
    ...(check.stiffnessCoefficientMm !== undefined
      ? { stiffnessCoefficient: check.stiffnessCoefficientMm }
      : {}),
    ...(withSteps && check.steps ? { steps: check.steps as Step[] } : {}),
  };
}

/** One joint in one load case in the units of the result document. */
export function presentJoint(joint: JointResult, withSteps: boolean): JointDocument {
  return {
    side: joint.side,
    loadCase: joint.loadCase,
    momentResistance: joint.momentResistanceNmm / NMM_PER_KNM,
    initialStiffness: joint.initialStiffnessNmmPerRad / NMM_PER_KNM,
    secantStiffness:
      joint.secantStiffnessNmmPerRad === null ? null : joint.secantStiffnessNmmPerRad / NMM_PER_KNM,
    leverArm: joint.leverArmMm,
    stiffnessClass: joint.stiffnessClass,
    strengthClass: joint.strengthClass,
    rigidFrom: joint.rigidFromNmmPerRad === null ? null : joint.rigidFromNmmPerRad / NMM_PER_KNM,
    rotationCapacity:
      typeof joint.rotationCapacity === "string"
        ? joint.rotationCapacity
        : { atLeast: joint.rotationCapacity.atLeastRad },
    stiffnessExponent: joint.stiffnessExponent,
    rows: joint.rows.map(({ row, forceN }) => ({ row, force: forceN / 1000 })),
    ...(withSteps && joint.steps ? { steps: joint.steps as Step[] } : {}),
  };
}
