import { NotANumber } from "../outcome";
import { defineFormula, type Formula, type FormulaSpec } from "./define-formula";
import type { Trace } from "./trace";

/**
 * A value found by iteration. What is printed is the condition it satisfies: the `residual`
 * formula is evaluated at the solution, so a reader can check the solution without repeating the search.
 */
export interface Solve<K extends string> {
  (trace: Trace | null, given: { readonly [key in K]: number }, mark?: number): number;
  readonly residual: Formula<K | "solution">;
}

export function defineSolve<K extends string>(spec: {
  readonly residual: FormulaSpec<K | "solution">;
  readonly search: (given: { readonly [key in K]: number }) => number;
}): Solve<K> {
  const residual = defineFormula(spec.residual);
  const run = (trace: Trace | null, given: { readonly [key in K]: number }, mark?: number): number => {
    const solution = spec.search(given);
    if (!Number.isFinite(solution)) throw new NotANumber(spec.residual.id, Object.keys(given));
    if (trace !== null) residual(trace, { ...given, solution }, mark);
    return solution;
  };
  return Object.assign(run, { residual });
}
