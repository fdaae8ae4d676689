import { defineFormula } from "../trace/define-formula";
import type { FormulaSource, Trace } from "../trace/trace";

const from = (ref: string): FormulaSource => ({
  document: "Mechanics of the column panel",
  edition: "this project",
  ref,
});

const horizontalPartN = defineFormula({
  id: "sloped-plates/horizontal part",
  source: from("horizontal part of what a sloped plate carries along itself, by equilibrium"),
  symbols: { alongN: ["F along the plate", "N"], slopeCosine: ["cos θ", "1"] },
  result: ["F_Rd", "N"],
  expression: "alongN * slopeCosine",
  evaluate: (g) => g.alongN * g.slopeCosine,
  example: { given: { alongN: 500, slopeCosine: 0.96 }, gives: 480, relTol: 1e-12 },
});

/** What a pair carries of a horizontal flange force, N: all it can where it is level. */
export const alongSlopeN = (trace: Trace | null, resistanceN: number, slopeCosine: number): number =>
  slopeCosine < 1 ? horizontalPartN(trace, { alongN: resistanceN, slopeCosine }, 0) : resistanceN;

/** Force along a sloped plate from a horizontal one, N. */
export const forceAlongN = (horizontalN: number, slopeCosine: number): number => horizontalN / slopeCosine;
