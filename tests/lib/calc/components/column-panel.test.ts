import { describe, expect, it } from "vitest";
import type { LoadCase, NodeCase } from "@/lib/calc";
import {
  buildEndPlate,
  buildJoint,
  buildLoadCase,
  buildNodeCase,
  withColumn,
} from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/**
 * HE 300 A (290 x 300 x 8.5/14, r 27) in S275 with IPE 400 (400 x 13.5) flush: the row that works is 60 mm from the
 * tension flange's face, so that z = 400 - 13.5/2 - 60 whichever way the moment turns. EN 1993-1-8:2005, 5.3 and 6.2.6.1.
 */
const z = 400 - 13.5 / 2 - 60;
const A = 2 * 300 * 14 + (290 - 28) * 8.5 + (4 - Math.PI) * 27 ** 2;
const A_vc = A - 2 * 300 * 14 + (8.5 + 2 * 27) * 14;

interface ColumnForces {
  readonly shearAboveN?: number;
  readonly shearBelowN?: number;
}

const loaded = (left: number, right: number | null, column: ColumnForces = {}): NodeCase => {
  const loadCase = buildLoadCase(left, right);
  const loadCases: LoadCase[] = [{ ...loadCase, column: { ...loadCase.column, ...column } }];
  return right === null
    ? buildNodeCase({ joints: [buildJoint("left")], loadCases })
    : buildNodeCase({ joints: [buildJoint("left"), buildJoint("right")], loadCases });
};
const panelOf = (node: NodeCase, side: "left" | "right" = "left") =>
  checkLike(evaluatedCase(node), "column-web-shear", { side });

describe("V_wp,Rd, Eq. (6.7)", () => {
  it("is 0.9 f_y A_vc / sqrt3 of a rolled column", () =>
    expectHand(panelOf(loaded(50, 50)).resistance, (0.9 * 275 * A_vc) / Math.sqrt(3)));

  it("counts h_w t_w of a welded one", () => {
    const welded = withColumn({ make: "welded", rootMm: 8 });
    expectHand(panelOf(welded).resistance, (0.9 * 275 * (290 - 28) * 8.5) / Math.sqrt(3));
  });

  it("is divided by gamma_M0", () => {
    const node = buildNodeCase({ partialFactors: { gammaM0: 1.1, gammaM1: 1, gammaM2: 1.25 } });
    expectHand(panelOf(node).resistance, (0.9 * 275 * A_vc) / (Math.sqrt(3) * 1.1));
  });

  it("is outside scope where d_c / t_w exceeds 69 epsilon", () => {
    // d_c = 290 - 2 x (14 + 27) = 208.
    const limit = 208 / (69 * Math.sqrt(235 / 275));
    expect(refusalOf(withColumn({ webThicknessMm: limit * 0.999 }))).toMatch(/more slender than .* 69 ε/);
    expect(evaluatedCase(withColumn({ webThicknessMm: limit * 1.001 })).kind).toBe("evaluated");
  });
});

describe("V_wp,Ed, Eq. (5.3)", () => {
  it.each<[string, number, number | null, ColumnForces, number]>([
    ["one beam", 50, null, {}, 50e6 / z],
    ["the column's shears against it", 50, null, { shearAboveN: 20e3, shearBelowN: -30e3 }, 50e6 / z - 25e3],
    ["the column's shears with it", 50, null, { shearAboveN: -20e3, shearBelowN: 30e3 }, 50e6 / z + 25e3],
    ["a shear that passes through the column", 50, null, { shearAboveN: 20e3, shearBelowN: 20e3 }, 50e6 / z],
    ["a reversed moment", -50, null, { shearAboveN: 20e3, shearBelowN: -30e3 }, 50e6 / z + 25e3],
    ["moments that balance in part", 50, 20, {}, (50e6 - 20e6) / z],
    ["moments that turn the same way", 50, -20, {}, (50e6 + 20e6) / z],
    ["moments that balance, with column shears", 50, 50, { shearAboveN: 20e3, shearBelowN: -30e3 }, 25e3],
  ])("%s", (_, left, right, column, byHand) =>
    expectHand(panelOf(loaded(left, right, column)).demand, byHand),
  );
});

describe("beta, Eq. (5.4), as the panel's stiffness k_1 = 0.38 A_vc / (beta z) shows it", () => {
  it.each<[number, number | null, number, number | null]>([
    [50, null, 1, null],
    [50, 25, 1 - 25 / 50, 50 / 25 - 1],
    [50, -25, 1 + 25 / 50, 2],
    [-50, 50, 2, 2],
    [-50, -20, 1 - 20 / 50, 50 / 20 - 1],
  ])("of %f and %s kNm", (left, right, onLeft, onRight) => {
    const node = loaded(left, right);
    expectHand(panelOf(node).stiffnessCoefficientMm, (0.38 * A_vc) / (onLeft * z));
    if (onRight === null) return;
    expectHand(panelOf(node, "right").stiffnessCoefficientMm, (0.38 * A_vc) / (onRight * z));
  });

  it("of 0 leaves no k_1", () => {
    const check = panelOf(loaded(50, 50));
    expect(check.demand).toBe(0);
    expect(check.stiffnessCoefficientMm).toBeUndefined();
  });
});

describe("rows against the panel, 6.2.7.2(7)", () => {
  /** Flanges of 22 mm and a plate of 40 mm: everything but the panel is strong. */
  const tf = 22;
  const strong = (left: number, right: number): NodeCase => {
    const plate = buildEndPlate({ plate: { thicknessMm: 40 } });
    const node = buildNodeCase({
      joints: [buildJoint("left", plate), buildJoint("right", plate)],
      loadCases: [buildLoadCase(left, right)],
    });
    return withColumn({ flangeThicknessMm: tf }, node);
  };
  const V = (0.9 * 275 * ((290 - 2 * tf) * 8.5 + (4 - Math.PI) * 27 ** 2 + (8.5 + 54) * tf)) / Math.sqrt(3);

  it("add up to V_wp,Rd / beta at most", () => {
    const option = evaluatedCase(strong(50, -50));
    expectHand(checkLike(option, "column-web-shear").resistance, V);
    expect(checkLike(option, "column-web-compression").resistance).toBeGreaterThan(V / 2);
    expectHand(option.joints[0]?.momentResistanceNmm, z * (V / 2));
  });

  it("are not held back by it where the moments balance", () => {
    // Both bolts of the row, 2 x 0.9 x 1000 x 245 / 1.25, are the weakest part then.
    expectHand(
      evaluatedCase(strong(50, 50)).joints[0]?.momentResistanceNmm,
      (z * 2 * 0.9 * 1000 * 245) / 1.25,
    );
  });
});
