import type { Level, Side } from "../node";
import type { ComponentCheck, ComponentId } from "../result";
import type { Step } from "../trace/trace";
import type { Traced } from "../trace/traced";

/** What a check is of, before its numbers. */
export interface CheckHead {
  readonly component: ComponentId;
  readonly side: Side;
  readonly loadCase: string;
  readonly clause: string;
  readonly level?: Level;
  readonly row?: number;
  readonly rows?: readonly number[];
  readonly what?: string | undefined;
  readonly unit?: ComponentCheck["unit"];
}

/** A check of a demand against a resistance; a demand of nothing or less uses nothing. */
export function checkOf(
  head: CheckHead,
  demand: number,
  resistance: Traced,
  more: { readonly stiffnessCoefficientMm?: number | undefined; readonly demandStep?: Step | undefined } = {},
): ComponentCheck {
  const { stiffnessCoefficientMm } = more;
  return {
    component: head.component,
    side: head.side,
    level: head.level,
    row: head.row,
    rows: head.rows,
    loadCase: head.loadCase,
    clause: head.clause,
    what: head.what,
    unit: head.unit ?? "N",
    demand,
    resistance: resistance.value,
    utilisation: demand <= 0 ? 0 : demand / resistance.value,
    stiffnessCoefficientMm:
      stiffnessCoefficientMm !== undefined && Number.isFinite(stiffnessCoefficientMm)
        ? stiffnessCoefficientMm
        : undefined,
    steps: stepsOf(resistance.step, more.demandStep),
  };
}

const stepsOf = (first: Step | undefined, second: Step | undefined): readonly Step[] | undefined =>
  first === undefined && second === undefined
    ? undefined
    : [first, second].filter((step): step is Step => step !== undefined);

/** Load case named by checks that no load case changes. */
export const EVERY_CASE = "all";

/** A rule of detailing: `actual` has to be at least `needed` (both in the head's unit). */
export function detailAtLeast(
  head: Omit<CheckHead, "component" | "loadCase">,
  needed: number,
  actual: number,
): ComponentCheck {
  return detail(head, needed, actual, actual > 0 ? needed / actual : needed > 0 ? NOTHING_THERE : 0);
}

/** A rule of detailing: `actual` may be at most `allowed`. */
export function detailAtMost(
  head: Omit<CheckHead, "component" | "loadCase">,
  actual: number,
  allowed: number,
): ComponentCheck {
  return detail(head, actual, allowed, allowed > 0 ? actual / allowed : NOTHING_THERE);
}

/** Utilisation shown where something needed is not there at all. */
const NOTHING_THERE = 99;

const detail = (
  head: Omit<CheckHead, "component" | "loadCase">,
  demand: number,
  resistance: number,
  utilisation: number,
): ComponentCheck => ({
  component: "detailing",
  side: head.side,
  level: head.level,
  row: head.row,
  rows: head.rows,
  loadCase: EVERY_CASE,
  clause: head.clause,
  what: head.what,
  unit: head.unit ?? "mm",
  demand,
  resistance,
  // Rounding of dimensions given in mm must not fail a rule met exactly.
  utilisation: utilisation > 1 && utilisation < 1 + 1e-9 ? 1 : utilisation,
  stiffnessCoefficientMm: undefined,
  steps: undefined,
});
