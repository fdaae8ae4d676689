import { describe, expect, it } from "vitest";
import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { EvaluatedOption, OptionOutcome } from "@/lib/calc/result";
import { Judge } from "@/lib/propose/judge";
import { boltedJoint, HE_300_A, S355, sampleNode } from "./sample-node";

const node = sampleNode(
  [boltedJoint("left")],
  [
    [100, 0],
    [120, 0],
    [140, 0],
  ],
);
const TARGET = { kind: "target" } as const;

/** A column of depth h reaches 2.9 / h of what each case's moment asks for. */
const columnOf = (depthMm: number): readonly MeasureCase[] => [
  { kind: "heavier-column", section: { ...HE_300_A, depthMm }, steel: S355 },
];

function spyEvaluate(seen: string[][]) {
  return (asked: NodeCase, measures: readonly MeasureCase[]): OptionOutcome => {
    seen.push(asked.loadCases.map(({ name }) => name));
    const [measure] = measures;
    const depth = measure?.kind === "heavier-column" ? measure.section.depthMm : 290;
    const worst = asked.loadCases
      .map((loadCase) => ({
        loadCase: loadCase.name,
        utilisation: (2.9 * (loadCase.left?.momentNmm ?? 0)) / 1e6 / depth,
      }))
      .reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
    const { utilisation } = worst;
    const governing = { component: "column-web-shear", side: "left", ...worst };
    return {
      kind: "evaluated",
      passes: utilisation <= 1,
      utilisation,
      stiffnessReached: true,
      governing,
    } as unknown as EvaluatedOption;
  };
}

describe("Judge", () => {
  it("looks at the heaviest load case first, and adds the one that refuses from then on", () => {
    const seen: string[][] = [];
    const evaluate = spyEvaluate(seen);
    // The last case has the largest moment, but a made-up weakness makes the second one decide.
    const judge = new Judge(
      node,
      () => 0,
      (asked, measures) => {
        const outcome = evaluate(asked, measures);
        const isWeak = asked.loadCases.some(({ name }) => name === "ULS 2");
        return isWeak
          ? ({ ...outcome, passes: false, utilisation: 2, governing: { loadCase: "ULS 2" } } as OptionOutcome)
          : outcome;
      },
    );
    expect(judge.meets(columnOf(500), TARGET)).toBe(true);
    expect(judge.confirms(columnOf(500), TARGET)).toBe(false);
    expect(judge.meets(columnOf(500), TARGET)).toBe(false);
    expect(seen).toEqual([["ULS 3"], ["ULS 1", "ULS 2", "ULS 3"], ["ULS 3", "ULS 2"]]);
  });

  it("says that less may do only where detailing alone is in the way", () => {
    const asked = (outcome: Partial<EvaluatedOption>) =>
      new Judge(
        node,
        () => 0,
        () => ({ kind: "evaluated", passes: false, stiffnessReached: true, checks: [], ...outcome }) as never,
      ).mayDo([]);
    const check = (component: "detailing" | "web-plate", utilisation: number) =>
      ({ component, utilisation }) as EvaluatedOption["checks"][number];
    expect(asked({ checks: [check("detailing", 3), check("web-plate", 1)] })).toBe(true);
    expect(asked({ checks: [check("detailing", 3), check("web-plate", 1.01)] })).toBe(false);
    expect(asked({ stiffnessReached: false })).toBe(false);
    expect(asked({ passes: true, checks: [check("web-plate", 1.01)] })).toBe(true);
    expect(
      new Judge(
        node,
        () => 0,
        () => ({ kind: "outside-scope" }) as never,
      ).mayDo([]),
    ).toBe(true);
  });

  it("evaluates and prices each candidate once", () => {
    const seen: string[][] = [];
    let prices = 0;
    const judge = new Judge(node, () => (prices += 1), spyEvaluate(seen));
    expect(judge.outcomeOf(columnOf(500))).toBe(judge.outcomeOf(columnOf(500)));
    expect(judge.priceOf(columnOf(500))).toBe(judge.priceOf(columnOf(500)));
    expect([seen.length, prices]).toEqual([1, 1]);
  });

  it("takes the best that can be done as a goal", () => {
    const judge = new Judge(node, () => 0, spyEvaluate([]));
    const utilisation = (2.9 * 140) / 300;
    expect(judge.confirms(columnOf(300), { kind: "utilisation", atMost: utilisation * 1.001 })).toBe(true);
    expect(judge.confirms(columnOf(300), { kind: "utilisation", atMost: utilisation * 0.999 })).toBe(false);
  });

  it("has no utilisation for what is outside scope", () => {
    const judge = new Judge(
      node,
      () => 0,
      (_, measures) => ({ kind: "outside-scope", measures, reason: "h" }),
    );
    expect(judge.watchedUtilisation(columnOf(300))).toBeNull();
    expect(judge.meets(columnOf(300), TARGET)).toBe(false);
  });
});
