import { describe, it } from "vitest";
import * as rules from "@/lib/calc/clauses/en1993-1-8-2005/fasteners";
import { expectHand } from "@/tests/support/evaluated-case";

/** EN 1993-1-8:2005, Table 3.4. */
describe("bolts in tension and shear", () => {
  it("have 0.9 f_ub A_s and alpha_v f_ub A_s over gamma_M2, 0.85 of it with cut threads (3.6.1(3))", () => {
    const M24 = { ultimateMpa: 1000, stressAreaMm2: 353, gammaM2: 1.25 };
    expectHand(rules.boltTensionN(null, { ...M24, reduction: 1 }), (0.9 * 1000 * 353) / 1.25);
    expectHand(rules.boltTensionN(null, { ...M24, reduction: 0.85 }), (0.85 * 0.9 * 1000 * 353) / 1.25);
    expectHand(rules.boltShearN(null, { ...M24, alphaV: 0.5, reduction: 1 }), (0.5 * 1000 * 353) / 1.25);
    expectHand(
      rules.boltShearN(null, { ...M24, alphaV: 0.6, reduction: 0.85 }),
      (0.85 * 0.6 * 1000 * 353) / 1.25,
    );
  });
});

describe("bearing", () => {
  // d_0 = 22.
  it.each([
    ["2.8 e_2/d_0 - 1.7", 30, 200, (2.8 * 30) / 22 - 1.7],
    ["1.4 p_2/d_0 - 1.7", 60, 55, (1.4 * 55) / 22 - 1.7],
    ["2.5", 60, 140, 2.5],
  ])("k_1 is the least: %s", (_, edgeMm, acrossMm, byHand) =>
    expectHand(rules.bearingEdgeFactor(null, { edgeMm, acrossMm, holeMm: 22 }), byHand),
  );

  it.each([
    ["e_1 / 3 d_0", 40, 200, 1000, 40 / (3 * 22)],
    ["p_1 / 3 d_0 - 1/4", 100, 60, 1000, 60 / (3 * 22) - 0.25],
    ["f_ub / f_u", 100, 200, 400, 400 / 470],
    ["1", 100, 200, 1000, 1],
  ])("alpha_b is the least: %s", (_, endMm, pitchMm, boltUltimateMpa, byHand) =>
    expectHand(
      rules.bearingAlongFactor(null, { endMm, pitchMm, holeMm: 22, boltUltimateMpa, ultimateMpa: 470 }),
      byHand,
    ),
  );

  it("is k_1 alpha_b f_u d t / gamma_M2", () =>
    expectHand(
      rules.bearingN(null, {
        edgeFactor: 2.1,
        bearingFactor: 0.7,
        ultimateMpa: 470,
        diameterMm: 20,
        thicknessMm: 14,
        gammaM2: 1.25,
      }),
      (2.1 * 0.7 * 470 * 20 * 14) / 1.25,
    ));
});

describe("punching", () => {
  it("is 0.6 pi d_m t_p f_u / gamma_M2", () =>
    expectHand(
      rules.punchingN(null, { meanDiameterMm: 31.475, thicknessMm: 12, ultimateMpa: 410, gammaM2: 1.25 }),
      (0.6 * Math.PI * 31.475 * 12 * 410) / 1.25,
    ));
});
