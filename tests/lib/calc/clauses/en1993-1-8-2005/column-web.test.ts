import { describe, expect, it } from "vitest";
import {
  kWcOf,
  omegaOf,
  panelShearN,
  plateSpreadMm,
  rhoOf,
  truncatedBreadthMm,
  webStressMpa,
} from "@/lib/calc/clauses/en1993-1-8-2005/column-web";
import { betaOf } from "@/lib/calc/clauses/en1993-1-8-2005/panel";
import { OutsideScope } from "@/lib/calc/outcome";

describe("omega, Table 6.3", () => {
  // x = b_eff t_wc / A_vc = 1000 / 2000.
  const omega = (beta: number): number => omegaOf(null, { beta, stripMm2: 1000, shearAreaMm2: 2000 });
  const one = 1 / Math.sqrt(1 + 1.3 * 0.25);
  const two = 1 / Math.sqrt(1 + 5.2 * 0.25);

  it.each([
    [0, 1],
    [0.5, 1],
    [0.75, one + 2 * 0.25 * (1 - one)],
    [1, one],
    [1.4, one + 0.4 * (two - one)],
    [2, two],
  ])("at beta = %f", (beta, byHand) => expect(omega(beta)).toBeCloseTo(byHand, 12));
});

describe("rho, 6.2.6.2(1)", () => {
  it.each([
    [0.5, 1],
    [0.72, 1],
    [0.8, (0.8 - 0.2) / 0.64],
    [1.5, 1.3 / 2.25],
  ])("at a slenderness of %f", (slenderness, byHand) =>
    expect(rhoOf(null, { slenderness })).toBeCloseTo(byHand, 12),
  );
});

describe("k_wc, 6.2.6.2(2)", () => {
  const kWc = (stressMpa: number): number => kWcOf(null, { stressMpa, yieldMpa: 300 });

  it("is 1 up to 0.7 f_y, then 1.7 - sigma / f_y", () => {
    expect(kWc(-50)).toBe(1);
    expect(kWc(210)).toBe(1);
    expect(kWc(240)).toBeCloseTo(1.7 - 0.8, 12);
    expect(kWc(300)).toBeCloseTo(0.7, 12);
  });

  it("has no value where the web yields", () => expect(() => kWc(300.1)).toThrow(OutsideScope));

  it("takes the stress at the root from force and moment", () => {
    const stress = webStressMpa(null, {
      axialForceN: 600_000,
      areaMm2: 12_000,
      momentNmm: 50e6,
      inertiaMm4: 1.5e8,
      webDepthMm: 210,
    });
    expect(stress).toBeCloseTo(600_000 / 12_000 + (50e6 * 105) / 1.5e8, 9);
  });
});

describe("geometry of the strip", () => {
  it("spreads through the plate on both sides only as far as the plate goes", () => {
    const spread = (extensionMm: number): number =>
      plateSpreadMm(null, { thicknessMm: 20, extensionMm, weldLegMm: 8 });
    expect(spread(0)).toBe(20);
    expect(spread(18)).toBe(20 + 10);
    expect(spread(60)).toBe(20 + 20);
  });

  it("is cut at the column's end", () => {
    const breadth = (aboveMm: number): number =>
      truncatedBreadthMm(null, { fullMm: 200, aboveMm, belowMm: 500 });
    expect(breadth(30)).toBe(130);
    expect(breadth(100)).toBe(200);
    expect(breadth(400)).toBe(200);
  });
});

describe("panel, 6.2.6.1", () => {
  it("is not covered where the web is more slender than 69 epsilon", () => {
    const shear = (webThicknessMm: number): number =>
      panelShearN(null, {
        shearAreaMm2: 4000,
        yieldMpa: 235,
        webDepthMm: 690,
        webThicknessMm,
        epsilon: 1,
        gammaM0: 1,
      });
    expect(shear(10)).toBeCloseTo((0.9 * 235 * 4000) / Math.sqrt(3), 6);
    expect(() => shear(9.99)).toThrow(/69 ε/);
  });
});

describe("beta, 5.3(9)", () => {
  it.each([
    [200, 200, 0],
    [200, 100, 0.5],
    [100, 200, 1],
    [200, 0, 1],
    [200, -100, 1.5],
    [200, -200, 2],
    [100, -200, 2],
    [100, 400, 2],
  ])("of %f kNm facing %f kNm", (ownNmm, otherNmm, byHand) =>
    expect(betaOf(null, { ownNmm, otherNmm })).toBeCloseTo(byHand, 12),
  );
});
