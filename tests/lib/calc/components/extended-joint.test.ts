import { describe, expect, it } from "vitest";
import { sectionProperties, type NodeCase } from "@/lib/calc";
import {
  buildEndPlate,
  buildJoint,
  buildLoadCase,
  buildNodeCase,
  HE_300_A,
  IPE_400,
} from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand } from "@/tests/support/evaluated-case";

/**
 * One joint worked out from end to end, one beam on the left, everything in S275: HE 300 A (290 x 300 x 8.5/14, r 27),
 * IPE 400 (400 x 180 x 8.6/13.5), plate 220 x 20 with 90 mm beyond either flange, M20 10.9 at gauge 140 in rows -45, 170
 * and 340, fillets of throat 6 at the flanges and 4 at the web. The row at 170 is so far from the beam's flange that
 * alpha m is 4m + 1.25e, which leaves nothing to read off Figure 6.11.
 */
const fy = 275;
const E = 210_000;
const leg = Math.SQRT2 * 6;

// Levers to the middle of the compression flange; the third, 53.25, is under a quarter of 400 and carries shear.
const h1 = 400 - 13.5 / 2 + 45;
const h2 = 400 - 13.5 / 2 - 170;
const pitch = 170 + 45;
const F_t = (0.9 * 1000 * 245) / 1.25;
const e_w = 32.95 / 4;

/** Modes 1 (method 2), 2 and 3 of Table 6.2, and the effective length of the mode that gives the least. */
function tStub(l1: number, l2: number, t: number, m: number, n: number, bolts: number) {
  const moment = (length: number): number => 0.25 * length * t ** 2 * fy;
  const one = ((8 * n - 2 * e_w) * moment(l1)) / (2 * m * n - e_w * (m + n));
  const two = (2 * moment(l2) + n * bolts * F_t) / (m + n);
  const resistance = Math.min(one, two, bolts * F_t);
  return { resistance, length: resistance === one ? l1 : l2 };
}

// Column flange, Table 6.4: m, e, n.
const m = (140 - 8.5) / 2 - 0.8 * 27;
const e = (300 - 140) / 2;
const n = Math.min(e, (220 - 140) / 2, 1.25 * m);
const alone = tStub(Math.min(2 * Math.PI * m, 4 * m + 1.25 * e), 4 * m + 1.25 * e, 14, m, n, 2);
const groupCircular = 2 * (Math.PI * m + pitch);
const groupOther = 2 * (2 * m + 0.625 * e + 0.5 * pitch);
const group = tStub(Math.min(groupCircular, groupOther), groupOther, 14, m, n, 4);

// End plate, Table 6.6: the extension row with m_x and e_x, the first row below the flange with m, e and m_2.
const mx = 45 - 0.8 * leg;
const ex = 90 - 45;
const ep = (220 - 140) / 2;
const outsideCircular = Math.min(2 * Math.PI * mx, Math.PI * mx + 140, Math.PI * mx + 2 * ep);
const outsideOther = Math.min(
  4 * mx + 1.25 * ex,
  ep + 2 * mx + 0.625 * ex,
  0.5 * 220,
  0.5 * 140 + 2 * mx + 0.625 * ex,
);
const outside = tStub(
  Math.min(outsideCircular, outsideOther),
  outsideOther,
  20,
  mx,
  Math.min(ex, 1.25 * mx),
  2,
);
const mp = (140 - 8.6) / 2 - 0.8 * Math.SQRT2 * 4;
const insideOther = 4 * mp + 1.25 * ep;
const inside = tStub(
  Math.min(2 * Math.PI * mp, insideOther),
  insideOther,
  20,
  mp,
  Math.min(ep, e, 1.25 * mp),
  2,
);

// Webs of column (omega of beta = 1) and beam.
const A_vc = (290 - 28) * 8.5 + (4 - Math.PI) * 27 ** 2 + (8.5 + 54) * 14;
const omega = (b: number): number => 1 / Math.sqrt(1 + 1.3 * ((b * 8.5) / A_vc) ** 2);
const web = (b: number): number => omega(b) * b * 8.5 * fy;
const beamWeb = inside.length * 8.6 * fy;

// What all rows together may bring.
const b_c = 13.5 + 2 * leg + 5 * (14 + 27) + 40;
const slenderness = 0.932 * Math.sqrt((b_c * 208 * fy) / (E * 8.5 ** 2));
const compression = ((slenderness - 0.2) / slenderness ** 2) * web(b_c);
const panel = (0.9 * fy * A_vc) / Math.sqrt(3);
const beamFlange = (sectionProperties(IPE_400).plasticModulusMm3 * fy) / (400 - 13.5);

// Rows from the furthest down, 6.2.7.2.
const free1 = Math.min(alone.resistance, web(alone.length), outside.resistance);
const left2 = Math.min(group.resistance, web(group.length)) - free1;
const free2 = Math.min(alone.resistance, web(alone.length), inside.resistance, beamWeb, left2);
const limit = Math.min(compression, panel, beamFlange);
const row1 = Math.min(free1, limit);
const row2 = Math.max(0, Math.min(free2, limit - row1));
const M_Rd = row1 * h1 + row2 * h2;

const node: NodeCase = buildNodeCase({
  joints: [buildJoint("left", buildEndPlate({ bolts: { rowsMm: [-45, 170, 340] } }))],
  loadCases: [buildLoadCase(60, null)],
});
const option = evaluatedCase(node);
const joint = option.joints[0];
const resistance = (component: Parameters<typeof checkLike>[1], place: Parameters<typeof checkLike>[2]) =>
  checkLike(option, component, place).resistance;

describe("parts of an extended end plate's joint", () => {
  it("stands where alpha m is 4m + 1.25e", () => {
    // lambda_2 beyond alpha lambda_1 / 2, alpha = 4 + 1.25e/m: m_2 >= 2m + 0.625e.
    expect(170 - 13.5 - 0.8 * leg).toBeGreaterThan(2 * mp + 0.625 * ep);
  });

  it("column flange: each row alone and both as a group", () => {
    expectHand(resistance("column-flange-bending", { row: 1 }), alone.resistance);
    expectHand(resistance("column-flange-bending", { row: 2 }), alone.resistance);
    expectHand(
      option.checks.find(({ component, rows }) => component === "column-flange-bending" && rows)?.resistance,
      group.resistance,
    );
  });

  it("column web in tension: over the length of the mode that governs the flange", () => {
    expectHand(resistance("column-web-tension", { row: 1 }), web(alone.length));
    expectHand(
      option.checks.find(({ component, rows }) => component === "column-web-tension" && rows)?.resistance,
      web(group.length),
    );
  });

  it("end plate: the row outside the flange and the row inside, never as a group", () => {
    expectHand(resistance("end-plate-bending", { row: 1 }), outside.resistance);
    expectHand(resistance("end-plate-bending", { row: 2 }), inside.resistance);
    expect(option.checks.some(({ component, rows }) => component === "end-plate-bending" && rows)).toBe(
      false,
    );
    expectHand(resistance("beam-web-tension", { row: 2 }), beamWeb);
  });

  it("what all rows together may bring", () => {
    expectHand(resistance("column-web-compression", {}), compression);
    expectHand(resistance("column-web-shear", {}), panel);
    expectHand(resistance("beam-flange-compression", {}), beamFlange);
  });
});

describe("the joint", () => {
  it("has the rows' forces and M_j,Rd, the third row in shear alone", () => {
    expect(joint?.rows.map(({ row }) => row)).toEqual([1, 2]);
    expectHand(joint?.rows[0]?.forceN, row1);
    expectHand(joint?.rows[1]?.forceN, row2);
    expect(row2).toBeGreaterThan(0);
    expectHand(joint?.momentResistanceNmm, M_Rd);
  });

  // Springs, Table 6.11: the shortest length of a row alone or in the group.
  const shortest = Math.min(
    2 * Math.PI * m,
    4 * m + 1.25 * e,
    Math.PI * m + pitch,
    2 * m + 0.625 * e + 0.5 * pitch,
  );
  const k3 = (0.7 * shortest * 8.5) / 208;
  const k4 = (0.9 * shortest * 14 ** 3) / m ** 3;
  const k5 = [
    (0.9 * Math.min(outsideCircular, outsideOther) * 20 ** 3) / mx ** 3,
    (0.9 * Math.min(2 * Math.PI * mp, insideOther) * 20 ** 3) / mp ** 3,
  ] as const;
  // Plate, flange, two washers, half head and half nut.
  const k10 = (1.6 * 245) / (20 + 14 + 2 * 3 + 12.5 / 2 + 18 / 2);
  const rowSpring = (k: number): number => 1 / (1 / k3 + 1 / k4 + 1 / k + 1 / k10);
  const [ka, kb] = [rowSpring(k5[0]), rowSpring(k5[1])];
  const z_eq = (ka * h1 ** 2 + kb * h2 ** 2) / (ka * h1 + kb * h2);
  const k_eq = (ka * h1 + kb * h2) / z_eq;
  const k1 = (0.38 * A_vc) / (1 * z_eq);
  const k2 = (0.7 * b_c * 8.5) / 208;
  const S_ini = (E * z_eq ** 2) / (1 / k1 + 1 / k2 + 1 / k_eq);

  it("has z_eq and S_j,ini of k_1, k_2 and its rows' springs, 6.3.3.1", () => {
    expectHand(joint?.leverArmMm, z_eq);
    expectHand(joint?.initialStiffnessNmmPerRad, S_ini);
    expectHand(checkLike(option, "column-web-tension", { row: 1 }).stiffnessCoefficientMm, k3);
    expectHand(checkLike(option, "column-flange-bending", { row: 2 }).stiffnessCoefficientMm, k4);
    expectHand(checkLike(option, "end-plate-bending", { row: 1 }).stiffnessCoefficientMm, k5[0]);
    expectHand(checkLike(option, "end-plate-bending", { row: 2 }).stiffnessCoefficientMm, k5[1]);
    expectHand(checkLike(option, "bolt-tension", { row: 1 }).stiffnessCoefficientMm, k10);
    expectHand(checkLike(option, "column-web-shear").stiffnessCoefficientMm, k1);
    expectHand(checkLike(option, "column-web-compression").stiffnessCoefficientMm, k2);
  });

  it("softens beyond two thirds of M_j,Rd by (1.5 M / M_j,Rd)^2.7", () => {
    const secantAt = (share: number): number | null | undefined =>
      evaluatedCase({ ...node, loadCases: [buildLoadCase((share * M_Rd) / 1e6, null)] }).joints[0]
        ?.secantStiffnessNmmPerRad;
    expectHand(secantAt(0.6) ?? NaN, S_ini);
    expectHand(secantAt(0.9) ?? NaN, S_ini / (1.5 * 0.9) ** 2.7);
    expect(secantAt(1.01)).toBeNull();
  });

  it("is classed by 8 or 25 E I / L and by the weaker of beam and column", () => {
    const { inertiaMm4, plasticModulusMm3 } = sectionProperties(IPE_400);
    const rate = (E * inertiaMm4) / 7000;
    const classed = (bracing: NodeCase["bracing"]) =>
      evaluatedCase({ ...node, bracing }).joints[0]?.stiffnessClass;
    expect(classed("unbraced")).toBe(S_ini >= 25 * rate ? "rigid" : "semi-rigid");
    expect(classed("braced")).toBe(S_ini >= 8 * rate ? "rigid" : "semi-rigid");
    const full = fy * Math.min(plasticModulusMm3, 2 * sectionProperties(HE_300_A).plasticModulusMm3);
    expect(M_Rd).toBeGreaterThan(0.25 * full);
    expect(M_Rd).toBeLessThan(full);
    expect(joint?.strengthClass).toBe("partial-strength");
  });

  it("shares a moment among its rows as at its resistance", () => {
    const share = 60e6 / M_Rd;
    expectHand(checkLike(option, "bolt-tension", { row: 1 }).demand, row1 * share);
    expectHand(checkLike(option, "bolt-tension", { row: 2 }).demand, row2 * share);
    expectHand(checkLike(option, "column-web-compression").demand, (row1 + row2) * share);
    expectHand(checkLike(option, "joint-moment").utilisation, share);
  });
});
