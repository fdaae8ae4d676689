import { describe, expect, it } from "vitest";
import { sectionProperties, type LoadCase, type NodeCase } from "@/lib/calc";
import {
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  HE_300_A,
  S275,
} from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/**
 * Column web in compression, EN 1993-1-8:2005, 6.2.6.2: HE 300 A (290 x 300 x 8.5/14, r 27) in S275, IPE 400 (t_f 13.5)
 * with flange fillets of throat 6 on a plate of 20 mm. d_wc = 290 - 2 x (14 + 27) = 208.
 */
const leg = Math.SQRT2 * 6;
const breadthBeyond = (extension: number): number =>
  13.5 + 2 * leg + 5 * (14 + 27) + 20 + Math.min(20, Math.max(extension - leg, 0));
const A_vc = (290 - 28) * 8.5 + (4 - Math.PI) * 27 ** 2 + (8.5 + 54) * 14;
const rhoOf = (breadth: number): number => {
  const slenderness = 0.932 * Math.sqrt((breadth * 208 * 275) / (210_000 * 8.5 ** 2));
  return slenderness <= 0.72 ? 1 : (slenderness - 0.2) / slenderness ** 2;
};
const omegaOne = (breadth: number): number => 1 / Math.sqrt(1 + 1.3 * ((breadth * 8.5) / A_vc) ** 2);

const compressionOf = (node: NodeCase) => checkLike(evaluatedCase(node), "column-web-compression");
const withForces = (moment: number, column: Partial<LoadCase["column"]>): NodeCase => {
  const loadCase = buildLoadCase(moment, moment);
  return buildNodeCase({ loadCases: [{ ...loadCase, column: { ...loadCase.column, ...column } }] });
};

describe("F_c,wc,Rd, Eq. (6.9)", () => {
  const b = breadthBeyond(90);

  it("buckles by rho where the moments balance: omega = 1", () => {
    expect(rhoOf(b)).toBeLessThan(1);
    const check = compressionOf(buildNodeCase());
    expectHand(check.resistance, rhoOf(b) * b * 8.5 * 275);
    expectHand(check.stiffnessCoefficientMm, (0.7 * b * 8.5) / 208);
  });

  it("takes omega of beta = 1 behind one beam", () => {
    const one = buildNodeCase({ joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] });
    expectHand(compressionOf(one).resistance, omegaOne(b) * rhoOf(b) * b * 8.5 * 275);
  });

  it("takes the lesser of yielding over gamma_M0 and buckling over gamma_M1", () => {
    const by = (gammaM0: number, gammaM1: number): number =>
      compressionOf(buildNodeCase({ partialFactors: { gammaM0, gammaM1, gammaM2: 1.25 } })).resistance;
    expectHand(by(1, 1.1), (rhoOf(b) * b * 8.5 * 275) / 1.1);
    expectHand(by(1.5, 1), Math.min((b * 8.5 * 275) / 1.5, rhoOf(b) * b * 8.5 * 275));
  });
});

describe("b_eff,c,wc behind an end plate, Eq. (6.11)", () => {
  it.each([0, 8, 15, 28, 28.5, 90])("with %f mm of plate beyond the flange", (extensionBottomMm) => {
    const node = buildNodeCase({ joints: buildJoints(buildEndPlate({ plate: { extensionBottomMm } })) });
    const b = breadthBeyond(extensionBottomMm);
    expectHand(compressionOf(node).resistance, rhoOf(b) * b * 8.5 * 275);
  });

  it("takes the extension of the flange that is pressed", () => {
    const joints = buildJoints(buildEndPlate({ plate: { extensionTopMm: 0 } }));
    const reversed = buildNodeCase({ joints, loadCases: [buildLoadCase(-50, -50)] });
    const b = breadthBeyond(0);
    const check = compressionOf(reversed);
    expect(check.level).toBe("top");
    expectHand(check.resistance, rhoOf(b) * b * 8.5 * 275);
  });

  // The whole spread is 275.5 mm, half of it on either side of the flange's middle.
  it.each([50, 125, 135])("is cut where the column ends %f mm beyond the flange", (endDistanceBelowMm) => {
    const node = buildNodeCase({ column: { ...buildNodeCase().column, endDistanceBelowMm } });
    const b = breadthBeyond(90) / 2 + Math.min(endDistanceBelowMm + 13.5 / 2, breadthBeyond(90) / 2);
    expectHand(compressionOf(node).resistance, rhoOf(b) * b * 8.5 * 275);
  });
});

describe("k_wc at the level of the flange that presses, 6.2.6.2(2)", () => {
  const b = breadthBeyond(90);
  const whole = rhoOf(b) * b * 8.5 * 275;
  const { areaMm2, inertiaMm4 } = sectionProperties(HE_300_A);
  // sigma = N/A + M (d_c/2)/I; 0.7 f_y = 192.5.
  const sigma = (N: number, M: number): number => N / areaMm2 + (M * 208) / (2 * inertiaMm4);
  const N = 1.9e6;
  const M = 60e6;

  it("reduces under force and moment beyond 0.7 f_y, whichever way the moment bends the column", () => {
    expect(sigma(N, M)).toBeGreaterThan(0.7 * 275);
    const kWc = 1.7 - sigma(N, M) / 275;
    for (const momentBelowNmm of [M, -M]) {
      const node = withForces(50, { axialForceN: N, momentBelowNmm });
      expectHand(compressionOf(node).resistance, kWc * whole);
    }
  });

  it("looks below for a beam pressing at the bottom, above for one pressing at the top", () => {
    const above = { axialForceN: N, momentAboveNmm: M };
    expect(sigma(N, 0)).toBeLessThan(0.7 * 275);
    expectHand(compressionOf(withForces(50, above)).resistance, whole);
    expectHand(compressionOf(withForces(-50, above)).resistance, (1.7 - sigma(N, M) / 275) * whole);
  });

  it("is 1 in a column that is pulled", () =>
    expectHand(compressionOf(withForces(50, { axialForceN: -N, momentBelowNmm: M })).resistance, whole));

  it("has no value beyond f_y: outside scope", () => {
    const force = areaMm2 * 275;
    expect(refusalOf(withForces(50, { axialForceN: 1.001 * force }))).toMatch(
      /yields under the column's own/,
    );
    const near = compressionOf(withForces(50, { axialForceN: 0.999 * force }));
    expectHand(near.resistance, (1.7 - 0.999) * whole);
  });
});

describe("beam flange in compression, 6.2.6.7", () => {
  const flangeOf = (depth: number, web: number, flange: number) => {
    const joint = buildJoint("left", { kind: "welded", welds: buildEndPlate().welds });
    const section = {
      designation: "plates",
      make: "welded" as const,
      depthMm: depth,
      widthMm: 200,
      webThicknessMm: web,
      flangeThicknessMm: flange,
      rootMm: 6,
    };
    return checkLike(
      evaluatedCase(
        buildNodeCase({
          joints: [{ ...joint, beam: { ...joint.beam, section, steel: S275 } }],
          loadCases: [buildLoadCase(50, null)],
        }),
      ),
      "beam-flange-compression",
    ).resistance;
  };
  const plasticForce = (depth: number, web: number, flange: number): number =>
    ((200 * flange * (depth - flange) + (web * (depth - 2 * flange) ** 2) / 4) * 275) / (depth - flange);

  it("is M_c,Rd / (h - t_f) up to 600 mm", () =>
    expectHand(flangeOf(600, 12, 15), plasticForce(600, 12, 15)));

  it("is b t_f f_y / 0.8 at most beyond 600 mm", () => {
    expect(plasticForce(601, 12, 15)).toBeGreaterThan((200 * 15 * 275) / 0.8);
    expectHand(flangeOf(601, 12, 15), (200 * 15 * 275) / 0.8);
    // A thin web gives less than its fifth: 8 x 570^2 / 4 / 595 = 1092 against 0.25 x 200 x 25 = 1250.
    expectHand(flangeOf(620, 8, 25), plasticForce(620, 8, 25));
  });
});
