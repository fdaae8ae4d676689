import type { Level, MeasureCase, Side } from "./node";
import type { Step } from "./trace/trace";

export const COMPONENT_IDS = [
  "joint-moment",
  "column-web-shear",
  "column-web-compression",
  "column-web-tension",
  "column-flange-bending",
  "end-plate-bending",
  "flange-cleat-bending",
  "beam-flange-compression",
  "beam-web-tension",
  "bolt-tension",
  "bolt-shear",
  "connection-weld",
  "transverse-stiffener",
  "diagonal-stiffener",
  "stiffener-weld",
  "web-plate",
  "web-plate-weld",
  "backing-plate",
  "bar-tension",
  "bar-compression",
  "far-flange",
  "detailing",
] as const;

export type ComponentId = (typeof COMPONENT_IDS)[number];

/**
 * One check of one component in one load case. Demand and resistance share `unit`. Every field is always there,
 * undefined where it says nothing: hundreds are made for each candidate of a proposal, and one shape keeps that quick.
 */
export interface ComponentCheck {
  readonly component: ComponentId;
  readonly side: Side;
  readonly level: Level | undefined;
  /** 1 = first in `bolts.rows`. */
  readonly row: number | undefined;
  readonly rows: readonly number[] | undefined;
  readonly loadCase: string;
  readonly clause: string;
  /** Words that tell which of several rules of a component this is (detailing, welds). */
  readonly what: string | undefined;
  readonly unit: "N" | "Nmm" | "mm" | "ratio";
  readonly demand: number;
  readonly resistance: number;
  readonly utilisation: number;
  readonly stiffnessCoefficientMm: number | undefined;
  /** How the resistance (first) and, where it is worth showing, the demand came about. */
  readonly steps: readonly Step[] | undefined;
}

export type StiffnessClass = "pinned" | "semi-rigid" | "rigid";
export type StrengthClass = "pinned" | "partial-strength" | "full-strength";

/** What the standard says of a joint's rotation: enough for plastic analysis, not shown, or a least rotation. */
export type RotationCapacity = "enough" | "not-shown" | { readonly atLeastRad: number };

/** One joint in one load case. */
export interface JointResult {
  readonly side: Side;
  readonly loadCase: string;
  readonly momentResistanceNmm: number;
  readonly initialStiffnessNmmPerRad: number;
  /** At the load case's own moment; null where the moment exceeds the resistance. */
  readonly secantStiffnessNmmPerRad: number | null;
  readonly leverArmMm: number;
  readonly stiffnessClass: StiffnessClass;
  readonly strengthClass: StrengthClass;
  /** S_j,ini from which the joint counts as rigid; null where no joint can. */
  readonly rigidFromNmmPerRad: number | null;
  readonly rotationCapacity: RotationCapacity;
  /** ψ of Table 6.8: how fast the joint softens beyond two thirds of its resistance. */
  readonly stiffnessExponent: number;
  readonly rows: readonly { readonly row: number; readonly forceN: number }[];
  /** Steps of M_j,Rd, S_j,ini and the classification. */
  readonly steps?: readonly Step[];
}

export interface Governing {
  readonly component: ComponentId;
  readonly side: Side;
  readonly loadCase: string;
  readonly utilisation: number;
}

export interface EvaluatedOption {
  readonly kind: "evaluated";
  readonly measures: readonly MeasureCase[];
  readonly passes: boolean;
  /** Largest utilisation of all checks. */
  readonly utilisation: number;
  /** Every joint in every load case reaches the target stiffness. */
  readonly stiffnessReached: boolean;
  readonly governing: Governing;
  /** Words on what fails on the connection's own side, that no column stiffening can cure; null if nothing does. */
  readonly connectionFailure: string | null;
  readonly cautions: readonly string[];
  readonly joints: readonly JointResult[];
  readonly checks: readonly ComponentCheck[];
}

export interface OutsideScopeOption {
  readonly kind: "outside-scope";
  readonly measures: readonly MeasureCase[];
  readonly reason: string;
}

export type OptionOutcome = EvaluatedOption | OutsideScopeOption;
