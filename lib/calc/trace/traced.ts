import { Trace, type Step } from "./trace";

/** A number with the working that made it, where working is wanted. */
export interface Traced {
  readonly value: number;
  readonly step: Step | undefined;
}

/** Computes with a fresh trace where steps are wanted, with none where not. */
export function traced(steps: boolean, compute: (trace: Trace | null) => number): Traced {
  if (!steps) return { value: compute(null), step: undefined };
  const trace = new Trace();
  const value = compute(trace);
  return { value, step: trace.last() };
}
