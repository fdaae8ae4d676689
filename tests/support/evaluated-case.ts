import { expect } from "vitest";
import {
  evaluateOption,
  type ComponentCheck,
  type ComponentId,
  type EvaluatedOption,
  type MeasureCase,
  type NodeCase,
  type Step,
} from "@/lib/calc";

/** The option with its working; the test fails where it is outside scope. */
export function evaluatedCase(node: NodeCase, measures: readonly MeasureCase[] = []): EvaluatedOption {
  const outcome = evaluateOption(node, measures, { steps: true });
  if (outcome.kind !== "evaluated") throw new Error(`outside scope: ${outcome.reason}`);
  return outcome;
}

/** Why the option is outside scope; the test fails where it gives numbers. */
export function refusalOf(node: NodeCase, measures: readonly MeasureCase[] = []): string {
  const outcome = evaluateOption(node, measures);
  if (outcome.kind !== "outside-scope") throw new Error("the option is in scope");
  return outcome.reason;
}

export const checksOf = (
  option: EvaluatedOption,
  component: ComponentId,
  like: Partial<ComponentCheck> = {},
): ComponentCheck[] =>
  option.checks.filter(
    (check) =>
      check.component === component &&
      Object.entries(like).every(([key, value]) => check[key as keyof ComponentCheck] === value),
  );

/** The one check of a component that is `like` this; on the left side unless it says otherwise. */
export function checkLike(
  option: EvaluatedOption,
  component: ComponentId,
  like: Partial<ComponentCheck> = {},
): ComponentCheck {
  const [found, ...more] = checksOf(option, component, { side: "left", ...like });
  if (!found || more.length > 0) throw new Error(`${component}: ${found ? more.length + 1 : 0} checks`);
  return found;
}

function* stepsUnder(steps: readonly Step[] | undefined): Generator<Step> {
  for (const step of steps ?? []) {
    yield step;
    yield* stepsUnder(step.children);
  }
}

/** The first step of a check's working whose id ends so. */
export function stepIn(check: ComponentCheck | undefined, idTail: string): Step {
  for (const step of stepsUnder(check?.steps)) if (step.id.endsWith(idTail)) return step;
  throw new Error(`${check?.component ?? "no check"} has no step ${idTail}`);
}

/** Equal to a value worked out by hand: nothing but the last digits of the machine may differ. */
export const expectHand = (actual: number | undefined, byHand: number): void => {
  expect(Math.abs((actual ?? NaN) - byHand)).toBeLessThanOrEqual(1e-9 * Math.abs(byHand));
};
