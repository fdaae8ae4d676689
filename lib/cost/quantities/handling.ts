import type { QuantityRecord } from "../drivers";
import { type Quantities, type WeldRun, weldAreaMm2 } from "./quantities";

/** One way to bring the welds into reach: its turns and the position each run is then welded in. */
export interface HandlingPlan {
  readonly key: "vertical-up" | "turned";
  readonly records: readonly QuantityRecord[];
}

// Written out field by field, twice: this runs for every run of every candidate, and spreading an object costs more than all the rest.
function weldRecord(run: WeldRun, flangeRunsUpright: boolean): QuantityRecord {
  const { lengthM, runs, thickestMm, clearGapMm, gunAngle } = run;
  const areaMm2 = weldAreaMm2(run);
  const position = run.on === "flange" && flangeRunsUpright ? "PF" : "PB";
  if (run.type === "fillet") {
    const values = {
      throatMm: run.sizeMm,
      lengthM,
      runs,
      areaMm2,
      thickestMm,
      position,
      clearGapMm,
      gunAngle,
    };
    return { driver: "fillet-weld", group: "", values };
  }
  const values = { depthMm: run.sizeMm, lengthM, runs, areaMm2, thickestMm, position, clearGapMm, gunAngle };
  return { driver: "butt-weld", group: "", values };
}

function plan(
  key: HandlingPlan["key"],
  turns: number,
  upright: boolean,
  { weldRuns, pieceMassKg }: Quantities,
  nodesPerLift: number,
): HandlingPlan {
  const records = weldRuns.map((run) => weldRecord(run, upright));
  // The whole lift is turned once for all nodes on it.
  if (turns > 0)
    records.push({ driver: "turn", group: "", values: { turns: turns / nodesPerLift, pieceMassKg } });
  return { key, records };
}

/**
 * The ways to weld the option: with the column's web level on trestles, runs on the web are PB and
 * runs against a flange PF, and the second web face needs one turn; turned onto each flange as well,
 * three turns, every run is PB. Which is cheaper depends on the rates, so both are priced.
 */
export function handlingPlans(quantities: Quantities, nodesPerLift: number): readonly HandlingPlan[] {
  if (quantities.weldRuns.length === 0) return [];
  const upright = plan("vertical-up", quantities.facesWelded - 1, true, quantities, nodesPerLift);
  if (!quantities.weldRuns.some((run) => run.on === "flange")) return [upright];
  return [upright, plan("turned", 3, false, quantities, nodesPerLift)];
}
