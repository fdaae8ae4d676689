import type { Loading } from "./coupling";
import type { Fineness } from "./section-mesh";
import type { StudyCase } from "./cases";

/** One case under one loading; every share is of the force F of the more loaded side. */
export interface CouplingRow {
  readonly loading: Loading;
  readonly share: number;
  readonly closedFormShare: number;
  /** Null where the closed form is zero. */
  readonly ratio: number | null;
  readonly withoutBarsMm: readonly [number, number];
  readonly withBarsMm: readonly [number, number];
}

export interface CaseResult extends StudyCase {
  readonly barsNPerMm: number;
  readonly columnNPerMm: { readonly finiteElements: number; readonly closedForm: number };
  readonly rows: readonly CouplingRow[];
}

/** A run with the bar in it as a spring, beside the same case by coupling. */
export interface DirectRun {
  readonly section: string;
  readonly gaugeMm: number;
  readonly bar: string;
  readonly loading: Loading;
  readonly depth: "half" | "full";
  /** From the bar's stretch. */
  readonly share: number;
  /** From the force in the web across mid-depth, which knows nothing of the bar; null in a full depth. */
  readonly shareByWebForce: number | null;
  readonly shareByCoupling: number;
  /** Fall of the highest stress in the web at the toe of the fillet of the more loaded side; null where it is not symmetric. */
  readonly webRelief: number | null;
}

export interface MeshCheck {
  readonly fineness: Fineness;
  readonly isHoleCut: boolean;
  readonly bricks: number;
  readonly columnNPerMm: number;
  readonly share: number;
  readonly seconds: number;
}

/** The same case on the finest mesh without and with its bolt hole, equal forces on both sides. */
export interface HoleCheck {
  readonly section: string;
  readonly gaugeMm: number;
  readonly bar: string;
  readonly share: number;
  readonly shareWithHole: number;
  readonly closedFormShare: number;
}

export interface StudyResults {
  readonly about: string;
  readonly solver: string;
  readonly date: string;
  readonly forceN: number;
  readonly fineness: Fineness;
  readonly meshCheck: {
    readonly section: string;
    readonly gaugeMm: number;
    readonly bar: string;
    readonly meshes: readonly MeshCheck[];
  };
  readonly holeChecks: readonly HoleCheck[];
  readonly cases: readonly CaseResult[];
  readonly direct: readonly DirectRun[];
}
