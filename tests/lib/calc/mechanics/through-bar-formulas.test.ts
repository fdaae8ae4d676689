import { describe, expect, it } from "vitest";
import * as bar from "@/lib/calc/mechanics/through-bar-formulas";
import { expectHand } from "@/tests/support/evaluated-case";

/** Guards the ends of the bar formulas, where one branch meets the next; their middles are held by the nodes of tests/lib/calc/measures. */
describe("the two springs", () => {
  it("share equally where the column is twice as stiff as the bars of one side", () =>
    expectHand(bar.barShareTension(null, { barNPerMm: 200_000, columnNPerMm: 400_000 }), 0.5));

  it("leave the bars everything where the column gives way freely", () =>
    expectHand(bar.barShareTension(null, { barNPerMm: 200_000, columnNPerMm: 1e-9 }), 1));

  it("make the flange's spring that of a clamped edge under the bolt: 1.37 t^3 / (1.4 t^2) at m = 0", () =>
    expectHand(bar.barFlangeSpringMm(null, { flangeMm: 14, mMm: 0 }), (1.37 / 1.4) * 14));

  it("count a row's own part of the column", () => {
    const given = { elasticMpa: 210_000, flangeSpringMm: 2, webSpringMm: 12 };
    expectHand(
      bar.barColumnStiffnessNPerMm(null, { ...given, share: 0.6 }),
      (0.6 * 210_000) / (1 / 2 + 1 / 12),
    );
  });
});

describe("the mode factor", () => {
  it.each([
    [100, 100, 1],
    [100, 40, 0.7],
    [100, 0, 0.5],
    [100, -40, 0.3],
    [100, -100, 0],
    [100, -150, 0],
  ])("of %f and %f is %f", (largerN, otherN, factor) =>
    expect(bar.symmetricPart(null, { largerN, otherN })).toBeCloseTo(factor, 12),
  );
});

describe("the forces in the bars", () => {
  it("stop at F + Q while the flange is elastic", () => {
    const given = { share: 0.9, forceN: 100, pryingN: 20 };
    expectHand(bar.barForceElasticN(null, { ...given, meanN: 120 }), 1.05 * 0.9 * 120);
    expectHand(bar.barForceElasticN(null, { ...given, meanN: 130 }), 120);
  });

  it("have no prying before the hinge at the web: (1 - R) F m = 2 M_pl", () => {
    const given = { relief: 0.4, mMm: 44, nMm: 40, momentNmm: 3_300_000 };
    const hinge = (2 * 3_300_000) / (0.6 * 44);
    expect(bar.pryingN(null, { ...given, forceN: hinge - 1 })).toBe(0);
    expectHand(bar.pryingN(null, { ...given, forceN: hinge + 1000 }), (0.6 * 1000 * 44) / 40);
  });

  it("make F + Q the bolts' whole strength at the mode 2 resistance", () => {
    const given = { relief: 0.4, mMm: 44, nMm: 40, momentNmm: 3_300_000 };
    const boltsN = 300_000;
    const forceN = bar.relievedModeTwoN(null, { ...given, boltsN });
    const pryingN = bar.pryingN(null, { ...given, forceN });
    expect(pryingN).toBeGreaterThan(0);
    expectHand(bar.barForceYieldedN(null, { forceN, pryingN }), boltsN);
  });
});

describe("compression", () => {
  const given = { barNPerMm: 422_000, elasticMpa: 210_000, compressionSpringMm: 8, columnNPerMm: 3e6 };

  it("fades with psi = 1 - 0.8 x and ends at x = 1.25", () => {
    const at = (distanceRatio: number) => bar.barShareCompression(null, { ...given, distanceRatio });
    expectHand(at(0), (2 * 422_000) / (2 * 210_000 * 8) / (1 + (2 * 422_000) / 3e6));
    expectHand(at(0.5), 0.6 * at(0));
    expect(at(1.25)).toBe(0);
    expect(at(2)).toBe(0);
  });

  it.each([
    ["buckling", bar.reliefBuckling, 0.6],
    ["crushing", bar.reliefCrushing, 0.1],
  ])("relieves %s up to x = 1 and not beyond", (_, relief, atOne) => {
    const of = (distanceRatio: number, symmetric = 1) =>
      relief(null, { distanceRatio, share: 0.1, symmetric });
    expectHand(of(0), 0.1);
    expectHand(of(1), atOne * 0.1);
    expectHand(of(1, 0.5), atOne * 0.1 * 0.5);
    expect(of(1 + 1e-9)).toBe(0);
  });
});
