import { evaluate } from "mathjs";
import { describe, expect, it } from "vitest";
import { definedFormulas } from "@/lib/calc";

/** Guards that what is printed is what was computed, for every formula of the core. */
const formulas = definedFormulas();

const isClose = (a: number, b: number, relTol: number): boolean =>
  Math.abs(a - b) <= relTol * Math.max(Math.abs(a), Math.abs(b));

describe("the formulas of the core", () => {
  it("are all there", () => expect(formulas.length).toBeGreaterThan(100));

  it.each(formulas.map((formula) => [formula.id, formula] as const))("%s gives its example", (_, formula) => {
    const { given, gives, relTol } = formula.example;
    expect(isClose(formula.evaluate(given), gives, relTol)).toBe(true);
  });

  it.each(formulas.map((formula) => [formula.id, formula] as const))(
    "%s prints what it computes",
    (_, formula) => {
      const { given } = formula.example;
      expect(Object.keys(given).sort()).toEqual(Object.keys(formula.symbols).sort());
      const printed = Number(evaluate(formula.expression, { ...given }));
      expect(isClose(printed, formula.evaluate(given), 1e-9)).toBe(true);
    },
  );

  it.each(formulas.map((formula) => [formula.id, formula] as const))("%s names its source", (_, formula) => {
    expect(formula.source.document.length).toBeGreaterThan(3);
    expect(formula.source.ref.length).toBeGreaterThan(3);
  });
});
