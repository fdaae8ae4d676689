import { NotANumber, OutsideScope } from "../outcome";
import type { FormulaSource, Trace } from "./trace";

type Given<K extends string> = { readonly [key in K]: number };

export interface FormulaSpec<K extends string = string> {
  readonly id: string;
  readonly source: FormulaSource;
  readonly symbols: { readonly [key in K]: readonly [symbol: string, unit: string] };
  readonly result: readonly [symbol: string, unit: string];
  /** mathjs syntax; a test evaluates it with the example and compares it with `evaluate`. */
  readonly expression: string;
  /** A condition of use in words when it is broken, else null. */
  readonly limitBroken?: (given: Given<K>) => string | null;
  readonly evaluate: (given: Given<K>) => number;
  readonly example: { readonly given: Given<K>; readonly gives: number; readonly relTol: number };
}

export interface Formula<K extends string = string> {
  (trace: Trace | null, given: Given<K>, mark?: number): number;
  readonly spec: FormulaSpec<K>;
}

const registry = new Map<string, FormulaSpec>();

/** Every formula defined so far, for the test that evaluates them all and the page that lists them. */
export const definedFormulas = (): readonly FormulaSpec[] => [...registry.values()];

/**
 * Makes a formula that computes, checks its condition of use and records its own working.
 *
 * @throws OutsideScope where `limitBroken` says so.
 * @throws NotANumber where the result is not finite.
 */
export function defineFormula<K extends string>(spec: FormulaSpec<K>): Formula<K> {
  if (registry.has(spec.id)) throw new Error(`Two formulas share the id ${spec.id}`);
  registry.set(spec.id, spec);
  const keys = Object.keys(spec.symbols) as K[];
  const run = (trace: Trace | null, given: Given<K>, mark?: number): number => {
    const limit = spec.limitBroken?.(given) ?? null;
    if (limit !== null) throw new OutsideScope(limit, spec.id);
    const value = spec.evaluate(given);
    if (!Number.isFinite(value)) {
      throw new NotANumber(
        spec.id,
        keys.filter((key) => !Number.isFinite(given[key])),
      );
    }
    if (trace !== null) {
      trace.record(
        {
          id: spec.id,
          symbol: spec.result[0],
          expression: spec.expression,
          inputs: { ...given },
          symbols: spec.symbols,
          value,
          unit: spec.result[1],
          source: spec.source,
        },
        mark,
      );
    }
    return value;
  };
  return Object.assign(run, { spec });
}
