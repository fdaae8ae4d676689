import { describe, expect, it } from "vitest";
import type { ComponentCheck, JointResult, Step } from "@/lib/calc";
import { presentCheck, presentJoint } from "@/lib/evaluation/present-outcome";

const step: Step = {
  id: "a",
  symbol: "F",
  expression: "1",
  inputs: {},
  symbols: {},
  value: 1,
  unit: "N",
  source: { document: "EN 1993-1-8", edition: "2005", ref: "6.2" },
  children: [],
};

const check: ComponentCheck = {
  component: "bolt-shear",
  side: "left",
  level: undefined,
  row: undefined,
  rows: undefined,
  loadCase: "one",
  clause: "Table 3.4",
  what: undefined,
  unit: "N",
  demand: 140_000,
  resistance: 280_000,
  utilisation: 0.5,
  stiffnessCoefficientMm: undefined,
  steps: [step],
};

describe("a check in the result document", () => {
  it.each<[ComponentCheck["unit"], string, number]>([
    ["N", "kN", 140],
    ["Nmm", "kNm", 0.14],
    ["mm", "mm", 140_000],
    ["ratio", "ratio", 140_000],
  ])("in %s is put down in %s", (unit, shown, demand) => {
    const document = presentCheck({ ...check, unit }, false);
    expect(document.unit).toBe(shown);
    expect(document.demand).toBeCloseTo(demand, 12);
    expect(document.resistance).toBeCloseTo(2 * demand, 12);
    expect(document.utilisation).toBe(0.5);
  });

  it("leaves out the places and words that it does not have", () =>
    expect(Object.keys(presentCheck(check, false)).sort()).toEqual([
      "clause",
      "component",
      "demand",
      "loadCase",
      "resistance",
      "side",
      "unit",
      "utilisation",
    ]));

  it("keeps those it has", () =>
    expect(
      presentCheck(
        { ...check, level: "top", row: 1, rows: [1, 2], what: "weld", stiffnessCoefficientMm: 4.2 },
        false,
      ),
    ).toMatchObject({ level: "top", row: 1, rows: [1, 2], what: "weld", stiffnessCoefficient: 4.2 }));

  it("carries its working where wanted", () => {
    expect(presentCheck(check, true).steps).toEqual([step]);
    expect(presentCheck({ ...check, steps: undefined }, true)).not.toHaveProperty("steps");
  });
});

describe("a joint in the result document", () => {
  const joint: JointResult = {
    side: "right",
    loadCase: "one",
    momentResistanceNmm: 210e6,
    initialStiffnessNmmPerRad: 5e10,
    secantStiffnessNmmPerRad: 2e10,
    leverArmMm: 400,
    stiffnessClass: "semi-rigid",
    strengthClass: "partial-strength",
    rigidFromNmmPerRad: 8e10,
    rotationCapacity: { atLeastRad: 0.015 },
    stiffnessExponent: 2.7,
    rows: [{ row: 2, forceN: 300_000 }],
    steps: [step],
  };

  it("is in kNm, kNm/rad, mm and kN", () =>
    expect(presentJoint(joint, false)).toEqual({
      side: "right",
      loadCase: "one",
      momentResistance: 210,
      initialStiffness: 50_000,
      secantStiffness: 20_000,
      leverArm: 400,
      stiffnessClass: "semi-rigid",
      strengthClass: "partial-strength",
      rigidFrom: 80_000,
      rotationCapacity: { atLeast: 0.015 },
      stiffnessExponent: 2.7,
      rows: [{ row: 2, force: 300 }],
    }));

  it("has no bound where no joint can be rigid, and the words of the rotation as they are", () => {
    const plain = presentJoint({ ...joint, rigidFromNmmPerRad: null, rotationCapacity: "enough" }, false);
    expect(plain).toMatchObject({ rigidFrom: null, rotationCapacity: "enough" });
  });

  it("has no secant stiffness above its resistance, and its working where wanted", () => {
    expect(presentJoint({ ...joint, secantStiffnessNmmPerRad: null }, false).secantStiffness).toBeNull();
    expect(presentJoint(joint, true).steps).toEqual([step]);
  });
});
