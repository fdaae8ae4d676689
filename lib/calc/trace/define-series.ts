import { NotANumber } from "../outcome";
import { defineFormula, type Formula, type FormulaSpec } from "./define-formula";
import type { Trace } from "./trace";

/**
 * A formula over any number of like terms (rows of a group, springs in series). `build(n)` states it
 * for n terms; it is defined once for each n that occurs. The test of all formulas meets it at `exampleCount` terms.
 */
export interface Series<K extends string> {
  (trace: Trace | null, terms: { readonly [key in K]: readonly number[] }, mark?: number): number;
  readonly spec: FormulaSpec;
}

export function defineSeries<K extends string>(spec: {
  readonly terms: readonly K[];
  readonly exampleCount: number;
  readonly evaluate: (terms: { readonly [key in K]: readonly number[] }) => number;
  readonly build: (count: number) => Omit<FormulaSpec, "evaluate" | "example">;
  readonly example: {
    readonly given: { readonly [key in K]: readonly number[] };
    readonly gives: number;
    readonly relTol: number;
  };
}): Series<K> {
  const flat = (terms: { readonly [key in K]: readonly number[] }): Record<string, number> =>
    Object.fromEntries(
      spec.terms.flatMap((key) => terms[key].map((value, index) => [`${key}${index + 1}`, value])),
    );
  const unflat = (
    given: Readonly<Record<string, number>>,
    count: number,
  ): { readonly [key in K]: readonly number[] } =>
    Object.fromEntries(
      spec.terms.map((key) => [
        key,
        Array.from({ length: count }, (_, index) => given[`${key}${index + 1}`] ?? NaN),
      ]),
    ) as unknown as { readonly [key in K]: readonly number[] };
  const named = (count: number): Formula =>
    defineFormula({
      ...spec.build(count),
      evaluate: (given) => spec.evaluate(unflat(given, count)),
      example: { given: flat(spec.example.given), gives: spec.example.gives, relTol: spec.example.relTol },
    });
  const example = named(spec.exampleCount);
  const unregistered = new Map<number, FormulaSpec>([[spec.exampleCount, example.spec]]);
  const run = (
    trace: Trace | null,
    terms: { readonly [key in K]: readonly number[] },
    mark?: number,
  ): number => {
    const value = spec.evaluate(terms);
    if (!Number.isFinite(value)) throw new NotANumber(example.spec.id, spec.terms);
    if (trace !== null) {
      const count = terms[spec.terms[0] as K].length;
      let shown = unregistered.get(count);
      if (!shown) {
        shown = { ...spec.build(count), evaluate: () => NaN, example: example.spec.example };
        unregistered.set(count, shown);
      }
      trace.record(
        {
          id: shown.id,
          symbol: shown.result[0],
          expression: shown.expression,
          inputs: flat(terms),
          symbols: shown.symbols,
          value,
          unit: shown.result[1],
          source: shown.source,
        },
        mark,
      );
    }
    return value;
  };
  return Object.assign(run, { spec: example.spec });
}

/** The sum of products of terms, as mathjs text: "h1 * F1 + h2 * F2". */
export const sumText = (count: number, term: (n: number) => string): string =>
  count === 0 ? "0" : Array.from({ length: count }, (_, index) => term(index + 1)).join(" + ");
