import { describe, expect, it } from "vitest";
import {
  bareSentence,
  bareSummary,
  componentLines,
  jointLines,
  namedCheck,
} from "@/components/node/bare-result-words";
import { EVERY_CASE } from "@/components/compare/component-labels";
import { EVERY_CASE as CALCULATED_EVERY_CASE } from "@/lib/calc/components/check";
import { evaluateOption } from "@/lib/calc/index";
import type { EvaluatedOption } from "@/lib/calc/result";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const check = (
  component: EvaluatedOption["checks"][number]["component"],
  utilisation: number,
  more: Partial<EvaluatedOption["checks"][number]> = {},
) => ({
  component,
  side: "right" as const,
  loadCase: "ULS 3",
  clause: "",
  unit: "N" as const,
  level: undefined,
  row: undefined,
  rows: undefined,
  what: undefined,
  stiffnessCoefficientMm: undefined,
  steps: undefined,
  demand: utilisation,
  resistance: 1,
  utilisation,
  ...more,
});
const outcome = (checks: EvaluatedOption["checks"], more: Partial<EvaluatedOption> = {}): EvaluatedOption => {
  const worst = [...checks].sort((a, b) => b.utilisation - a.utilisation)[0] ?? check("joint-moment", 0);
  return {
    kind: "evaluated",
    measures: [],
    passes: worst.utilisation <= 1,
    utilisation: worst.utilisation,
    stiffnessReached: true,
    governing: worst,
    connectionFailure: null,
    cautions: [],
    joints: [],
    checks,
    ...more,
  };
};
const said = (parts: readonly { readonly text: string }[]) => parts.map((part) => part.text).join("");

describe("the bare column in words", () => {
  it("names component, side and load case of what fails", () => {
    const parts = bareSentence(outcome([check("column-web-compression", 1.31)]), 1);
    expect(said(parts)).toBe("The bare column fails: web compression on the right reaches 1.31 in ULS 3.");
    expect(parts.find((part) => part.tone)?.tone).toBe("fail");
  });
  it("says what is highest when it is good enough", () => {
    expect(said(bareSentence(outcome([check("column-web-shear", 0.87)]), 1))).toBe(
      "The bare column is good enough: panel shear on the right is highest at 0.87 in ULS 3.",
    );
  });
  it("never lets a figure over the limit read as the limit", () => {
    expect(said(bareSummary(outcome([check("column-web-shear", 1.0004)]), 1))).toContain(">1.00");
  });
  it("names the target where it is another than 1, and a stiffness that is not reached", () => {
    const over = outcome([check("column-web-shear", 0.93)], { passes: false, stiffnessReached: false });
    expect(said(bareSentence(over, 0.9))).toContain(
      "reaches 0.93 in ULS 3, above the target of 0.90. The stiffness asked for is not reached.",
    );
  });
  it("names strength rather than a rule of detailing that is met, but names one that is broken", () => {
    const rule = (utilisation: number) => check("detailing", utilisation, { loadCase: EVERY_CASE });
    expect(
      namedCheck(outcome([rule(0.9), check("column-web-shear", 0.4), check("bolt-tension", 0.6)]), 1)
        .component,
    ).toBe("bolt-tension");
    expect(said(bareSentence(outcome([rule(1.2), check("column-web-shear", 0.4)]), 1))).toContain(
      "detailing on the right reaches 1.20 in every load case",
    );
    const tied = outcome([rule(0.9), check("joint-moment", 0.6), check("column-web-compression", 0.6)]);
    expect(namedCheck(tied, 1).component).toBe("column-web-compression");
    expect(EVERY_CASE).toBe(CALCULATED_EVERY_CASE);
  });
  it("says that stiffness is what lacks where strength is enough", () => {
    const joint = {
      side: "left" as const,
      loadCase: "ULS 1",
      momentResistanceNmm: 1e8,
      secantStiffnessNmmPerRad: null,
      leverArmMm: 300,
      stiffnessClass: "semi-rigid" as const,
      strengthClass: "partial-strength" as const,
      rows: [],
      rigidFromNmmPerRad: 60_000e6,
      rotationCapacity: "not-shown" as const,
      stiffnessExponent: 2.7,
    };
    const soft = outcome(
      [check("detailing", 0.9, { loadCase: EVERY_CASE }), check("column-web-shear", 0.4)],
      {
        passes: false,
        stiffnessReached: false,
        joints: [{ ...joint, initialStiffnessNmmPerRad: 28_100e6 }],
      },
    );
    expect(said(bareSentence(soft, 1))).toBe(
      "The bare column fails: it is not as stiff as asked for, the left joint is semi-rigid at 28\u202f100 kNm/rad. Strength is enough: panel shear on the right is highest at 0.40 in ULS 3.",
    );
    expect(said(bareSummary(soft, 1))).toContain("fails in stiffness, strength 0.40");
  });
  it("gives the reason where the method does not reach", () => {
    expect(
      said(bareSentence({ kind: "outside-scope", measures: [], reason: "The beams differ in depth." }, 1)),
    ).toBe("The bare column is outside the method: The beams differ in depth.");
  });
});

describe("the bare column in figures", () => {
  it("takes the worst check of each component and marks the governing one", () => {
    const lines = componentLines(
      outcome([check("column-web-shear", 0.4), check("column-web-shear", 0.7), check("bolt-tension", 0.9)]),
      ["column-web-shear", "column-web-tension", "bolt-tension"],
      1,
    );
    expect(lines.map((line) => [line.component, line.check.utilisation, line.isGoverning])).toEqual([
      ["column-web-shear", 0.7, false],
      ["bolt-tension", 0.9, true],
    ]);
  });
  it("gives the least of each joint in kNm and kNm/rad, from the calculation itself", () => {
    const resolved = resolveNodeCase(buildNodeDocument(), buildCatalog());
    if (!resolved.ok) throw new Error("the node is in order");
    const real = evaluateOption(resolved.node, [], { steps: false });
    if (real.kind !== "evaluated") throw new Error(real.reason);
    const [line] = jointLines(real);
    expect(line?.side).toBe("left");
    expect(line?.resistanceKnm).toBe(
      Math.min(...real.joints.map((joint) => joint.momentResistanceNmm)) / 1e6,
    );
    expect(line?.stiffnessKnmPerRad).toBe(
      Math.min(...real.joints.map((joint) => joint.initialStiffnessNmmPerRad)) / 1e6,
    );
  });
});
