import { describe, expect, it } from "vitest";
import {
  bendingClass,
  curveCReduction,
  rolledShearAreaMm2,
  strutSlenderness,
} from "@/lib/calc/clauses/en1993-1-1-2005/members";

describe("class in bending, Table 5.2", () => {
  const classOf = (outstandMm: number, webDepthMm: number): 2 | 3 | 4 =>
    bendingClass({ outstandMm, flangeThicknessMm: 10, webDepthMm, webThicknessMm: 10, epsilon: 1 });

  it.each([
    [100, 830, 2],
    [100.1, 830, 3],
    [100, 830.1, 3],
    [140, 1240, 3],
    [140.1, 1240, 4],
    [140, 1240.1, 4],
  ])("of an outstand %f and a web of %f at t = 10", (outstand, web, byHand) =>
    expect(classOf(outstand, web)).toBe(byHand),
  );

  it("counts the steel", () => {
    const inS355 = bendingClass({
      outstandMm: 90,
      flangeThicknessMm: 10,
      webDepthMm: 300,
      webThicknessMm: 10,
      epsilon: Math.sqrt(235 / 355),
    });
    // 9 / 0.814 = 11.06 is beyond 10 and within 14.
    expect(inS355).toBe(3);
  });
});

describe("buckling curve c, 6.3.1.2", () => {
  // EN 1993-1-1, Eq. (6.49) with alpha = 0.49; no reduction up to 0.2.
  it.each([0.1, 0.2])("leaves a stocky strut whole at %f", (slenderness) =>
    expect(curveCReduction(null, { slenderness })).toBe(1),
  );

  it.each([0.5, 1, 1.8])("at %f", (slenderness) => {
    const phi = 0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness ** 2);
    const byHand = 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
    expect(curveCReduction(null, { slenderness })).toBeCloseTo(byHand, 12);
  });

  it("measures slenderness by 93.9 epsilon", () => {
    expect(strutSlenderness(null, { bucklingLengthMm: 939, gyrationMm: 20, epsilon: 0.5 })).toBeCloseTo(
      1,
      12,
    );
  });
});

describe("shear area of a rolled section, 6.2.6(3)", () => {
  const given = {
    areaMm2: 11_250,
    widthMm: 300,
    flangeThicknessMm: 14,
    webThicknessMm: 8.5,
    rootMm: 27,
    depthMm: 290,
  };

  it("is A - 2 b t_f + (t_w + 2 r) t_f", () => {
    expect(rolledShearAreaMm2(null, given)).toBeCloseTo(11_250 - 2 * 300 * 14 + (8.5 + 54) * 14, 9);
  });

  it("is not below h_w t_w", () => {
    expect(rolledShearAreaMm2(null, { ...given, areaMm2: 9_000 })).toBeCloseTo((290 - 28) * 8.5, 9);
  });
});
