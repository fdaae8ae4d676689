import type { QuantityRecord } from "../drivers";
import type { ProductMasses, ProductName } from "../products";
import { steelMassKg } from "../products";

/** Where a run lies while the column is on trestles with its web level: on the web, or against a flange. */
export type RunOn = "web" | "flange";

/** A weld run as geometry knows it; its position follows from how the column is handled. */
export interface WeldRun {
  readonly type: "fillet" | "butt";
  /** Throat of a fillet, depth of a bevel. */
  readonly sizeMm: number;
  readonly lengthM: number;
  readonly runs: number;
  readonly on: RunOn;
  readonly thickestMm: number;
  readonly clearGapMm: number;
  readonly gunAngle: "free" | "restricted";
}

/** Geometry of everything the measures add, per node: no minutes, no money. */
export interface Quantities {
  readonly records: readonly QuantityRecord[];
  readonly weldRuns: readonly WeldRun[];
  /** Sides of the web that carry welds: 0, 1 or 2. */
  readonly facesWelded: number;
  readonly masses: ProductMasses;
  /** Mass of the column piece as it is handled, kg. */
  readonly pieceMassKg: number;
}

/** Collects what the measures of one option add. */
export class QuantityTake {
  readonly records: QuantityRecord[] = [];
  readonly weldRuns: WeldRun[] = [];
  facesWelded = 0;
  partsPlaced = 0;
  readonly masses: Record<ProductName, number> = {
    plate: 0,
    section: 0,
    "threaded-bar": 0,
    bolt: 0,
    nut: 0,
    washer: 0,
    "weld-metal": 0,
  };

  addMass(product: ProductName, kg: number): void {
    this.masses[product] += kg;
  }

  weld(run: WeldRun): void {
    if (run.lengthM <= 0 || run.runs === 0) return;
    this.weldRuns.push(run);
    this.addMass("weld-metal", steelMassKg(weldAreaMm2(run) * run.lengthM * 1000));
  }
}

/** Weld metal in cross-section, mm2: a^2 for an equal-leg fillet of throat a, b^2/2 for a 45 degree single bevel of depth b. */
export const weldAreaMm2 = ({ type, sizeMm }: Pick<WeldRun, "type" | "sizeMm">): number =>
  type === "fillet" ? sizeMm * sizeMm : (sizeMm * sizeMm) / 2;
