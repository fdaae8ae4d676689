import { describe, expect, it } from "vitest";
import type { NodeCase, Steel } from "@/lib/calc";
import {
  S355,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  buildWebPlates,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/** Guards supplementary web plates 188 x 10 on an HE 300 A, S275: EN 1993-1-8, 6.2.6.1(6) to (14), 6.2.6.2(6), 6.2.6.3(7). */
const m = (140 - 8.5) / 2 - 0.8 * 27;
const length = 4 * m + 1.25 * 80;
const d_c = 290 - 2 * 14 - 2 * 27;
const b_c = 13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27) + 2 * 20;
const shearArea = 262 * 8.5 + (4 - Math.PI) * 27 ** 2 + (8.5 + 2 * 27) * 14;
const S420: Steel = { grade: "S420", yieldMpa: 420, ultimateMpa: 520, betaW: 1 };
const S460: Steel = { grade: "S460", yieldMpa: 460, ultimateMpa: 540, betaW: 1 };

const fillet = (throatMm: number) => ({ kind: "fillet", throatMm }) as const;
const butt = { kind: "butt" } as const;
const ofSteel = (steel: Steel): NodeCase => {
  const node = buildNodeCase();
  return { ...node, column: { ...node.column, steel } };
};
const oneSided = buildNodeCase({ joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] });

describe("the web that counts in compression", () => {
  // Balanced moments: omega = 1. The slenderness keeps t_wc, as the method chooses.
  const slenderness = 0.932 * Math.sqrt((b_c * d_c * 275) / (210_000 * 8.5 ** 2));
  const rho = (slenderness - 0.2) / slenderness ** 2;

  it.each([
    [1, 1.5],
    [2, 2],
  ] as const)("is, with %i plates, %f times the web, in resistance and spring", (sides, factor) => {
    const web = checkLike(
      evaluatedCase(buildNodeCase(), [buildWebPlates({ sides })]),
      "column-web-compression",
    );
    expectHand(web.resistance, rho * b_c * factor * 8.5 * 275);
    expectHand(web.stiffnessCoefficientMm, (0.7 * b_c * factor * 8.5) / d_c);
  });

  it("has omega with A_vc enlarged and the web's own strip", () => {
    const web = checkLike(evaluatedCase(oneSided, [buildWebPlates()]), "column-web-compression");
    const omega = 1 / Math.sqrt(1 + 1.3 * ((b_c * 8.5) / (shearArea + 188 * 8.5)) ** 2);
    expectHand(web.resistance, omega * rho * b_c * 1.5 * 8.5 * 275);
  });
});

describe("the web that counts in tension", () => {
  const inTension = (node: NodeCase, overrides: Parameters<typeof buildWebPlates>[0]) =>
    checkLike(evaluatedCase(node, [buildWebPlates(overrides)]), "column-web-tension", { row: 1 });
  const throat = 10 / Math.SQRT2;

  it.each<[string, number, Steel, 1 | 2, typeof butt | ReturnType<typeof fillet>]>([
    ["fillet, S275, one plate", 1.4, buildNodeCase().column.steel, 1, fillet(throat)],
    ["fillet, S275, two plates", 1.4, buildNodeCase().column.steel, 2, fillet(throat)],
    ["fillet, S355", 1.4, S355, 1, fillet(throat)],
    ["fillet, S420", 1.3, S420, 1, fillet(throat)],
    ["fillet, S460, two plates", 1.3, S460, 2, fillet(throat)],
    ["butt, one plate", 1.5, buildNodeCase().column.steel, 1, butt],
    ["butt, two plates", 2, buildNodeCase().column.steel, 2, butt],
    ["butt, S460, two plates", 2, S460, 2, butt],
  ])("is, %s, %f times the web", (_, factor, steel, sides, weld) => {
    const web = inTension(ofSteel(steel), { sides, weld, steel });
    expectHand(web.resistance, length * factor * 8.5 * steel.yieldMpa);
    expectHand(web.stiffnessCoefficientMm, (0.7 * length * factor * 8.5) / d_c);
  });

  it("is the web alone where the fillets' throat is less than t_s / sqrt 2", () => {
    expectHand(inTension(buildNodeCase(), { weld: fillet(throat - 0.01) }).resistance, length * 8.5 * 275);
    const thicker = inTension(buildNodeCase(), { thicknessMm: 12, weld: fillet(throat) });
    expectHand(thicker.resistance, length * 8.5 * 275);
  });
});

describe("the panel's shear", () => {
  const resistance = (overrides: Parameters<typeof buildWebPlates>[0]) =>
    checkLike(evaluatedCase(oneSided, [buildWebPlates(overrides)]), "column-web-shear").resistance;

  it("has A_vc enlarged by b_s t_wc, once, however thick and however many the plates", () => {
    const byHand = (0.9 * 275 * (shearArea + 188 * 8.5)) / Math.sqrt(3);
    expectHand(resistance({}), byHand);
    expectHand(resistance({ sides: 2 }), byHand);
    expectHand(resistance({ thicknessMm: 20 }), byHand);
  });

  it("has k_1 = 0.38 A_vc / (beta z) with the same area", () => {
    const panel = checkLike(evaluatedCase(oneSided, [buildWebPlates()]), "column-web-shear");
    expectHand(panel.stiffnessCoefficientMm, (0.38 * (shearArea + 188 * 8.5)) / (400 - 13.5 / 2 - 60));
  });

  it.each([1, 2] as const)("is shared with %i plates by area, each held by its edge welds", (sides) => {
    const option = evaluatedCase(oneSided, [buildWebPlates({ sides })]);
    const panelN = 50e6 / (400 - 13.5 / 2 - 60);
    const inPlate = (panelN * 188 * 8.5) / (shearArea + 188 * 8.5) / sides;
    const plate = checkLike(option, "web-plate");
    expectHand(plate.demand, inPlate);
    expectHand(plate.resistance, (0.9 * 275 * 188 * 10) / Math.sqrt(3));
    const weld = checkLike(option, "web-plate-weld");
    expectHand(weld.demand, inPlate);
    expectHand(weld.resistance, (410 / (Math.sqrt(3) * 0.85 * 1.25)) * (10 / Math.SQRT2) * 188);
  });

  it("leaves butt welds unchecked", () =>
    expect(checksOf(evaluatedCase(oneSided, [buildWebPlates({ weld: butt })]), "web-plate-weld")).toEqual(
      [],
    ));
});

describe("the detailing of web plates", () => {
  const rule = (what: RegExp, overrides: Parameters<typeof buildWebPlates>[0]) =>
    checksOf(evaluatedCase(buildNodeCase(), [buildWebPlates(overrides)]), "detailing").find((check) =>
      what.test(check.what ?? ""),
    )?.utilisation;

  it("is met by the plate of these tests", () => {
    const light = buildNodeCase({ loadCases: [buildLoadCase(1, 1)] });
    expect(evaluatedCase(light, [buildWebPlates()]).passes).toBe(true);
  });

  it("holds t_s to t_wc", () => {
    expect(rule(/thickness, at least/, { thicknessMm: 8.5 })).toBe(1);
    expectHand(rule(/thickness, at least/, { thicknessMm: 8 }), 8.5 / 8);
  });

  it("holds b_s to 40 eps t_s of the plate's own steel", () => {
    const steel = { ...S355, yieldMpa: 940 };
    // eps = 0.5: 40 · 0.5 · 8.5 = 170 mm.
    expect(rule(/at most 40/, { thicknessMm: 8.5, widthMm: 170, steel })).toBe(1);
    expectHand(rule(/at most 40/, { thicknessMm: 8.5, widthMm: 171, steel }), 171 / 170);
  });

  it("holds the plate to the column's grade", () => {
    expect(rule(/own grade/, {})).toBe(1);
    expect(rule(/own grade/, { steel: S355 })).toBeGreaterThan(1);
  });

  it("holds the width between the root toes, 290 - 28 - 54 = 208 mm", () => {
    expect(rule(/between the root toes/, { widthMm: 208 })).toBe(1);
    expectHand(rule(/between the root toes/, { widthMm: 209 }), 209 / 208);
  });

  it("holds the edge welds to reach the root toes", () => {
    expect(rule(/reach the root toes/, { widthMm: 188 })).toBe(1);
    expectHand(rule(/reach the root toes/, { widthMm: 187 }), 208 / 207);
  });

  it("holds the fillets to a throat of 3 mm (4.5.2(2))", () => {
    expect(rule(/throat/, { weld: fillet(3) })).toBe(1);
    expectHand(rule(/throat/, { weld: fillet(2.5) }), 3 / 2.5);
    expect(rule(/throat/, { weld: butt })).toBeUndefined();
  });
});

describe("the height of web plates", () => {
  it("covers the effective width in compression, in steps of half a millimetre", () => {
    // From the beam's middle to the flange's, and half of b_eff beyond it, on both sides.
    const needed = 2 * ((400 - 13.5) / 2 + b_c / 2);
    const at = (heightMm: number) => [buildWebPlates({ heightMm })];
    expect(evaluatedCase(buildNodeCase(), at(needed - 0.4)).joints).toHaveLength(2);
    expect(refusalOf(buildNodeCase(), at(needed - 0.6))).toMatch(
      new RegExp(`has to cover ${Math.ceil(needed)} mm: the effective widths in tension and compression`),
    );
  });

  it("covers the effective length of the outermost row where that reaches further", () => {
    // A row 75 mm outside the beam: 200 + 75 from its middle, and half of 4m + 1.25e beyond.
    const node = buildNodeCase({
      joints: buildJoints(
        buildEndPlate({ plate: { extensionTopMm: 120 }, bolts: { rowsMm: [-75, 60, 340] } }),
      ),
    });
    const needed = 2 * (400 / 2 + 75 + length / 2);
    expect(needed).toBeGreaterThan(2 * ((400 - 13.5) / 2 + b_c / 2));
    const at = (heightMm: number) => [buildWebPlates({ heightMm })];
    expect(evaluatedCase(node, at(needed - 0.4)).joints).toHaveLength(2);
    expect(refusalOf(node, at(needed - 0.6))).toMatch(/has to cover/);
  });

  it("covers what the welded flanges of a beam spread into: t_fb + 2 sqrt 2 a + 5 (t_fc + r)", () => {
    const welded = { kind: "welded", welds: buildEndPlate().welds } as const;
    const node = buildNodeCase({ joints: buildJoints(welded) });
    const needed = 400 - 13.5 + (13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27));
    const at = (heightMm: number) => [buildWebPlates({ heightMm })];
    expect(evaluatedCase(node, at(needed - 0.4)).joints).toHaveLength(2);
    expect(refusalOf(node, at(needed - 0.6))).toMatch(new RegExp(`cover ${Math.ceil(needed)} mm`));
  });

  it("ends where the column ends", () => {
    // 40 mm of column above the beam leave the tension flange less reach than the compression flange has.
    const thick = { ...buildEndPlate().welds, topFlange: fillet(14) };
    const node = buildNodeCase({ joints: buildJoints({ kind: "welded", welds: thick }) });
    const top = { ...node, column: { ...node.column, endDistanceAboveMm: 40 } };
    const inCompression = 13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27);
    const inTension = 13.5 + 2 * 14 * Math.SQRT2 + 5 * (14 + 27);
    const at = (heightMm: number) => [buildWebPlates({ heightMm })];
    expect(refusalOf(node, at(400 - 13.5 + inTension - 0.6))).toMatch(/has to cover/);
    expect(evaluatedCase(top, at(400 - 13.5 + inCompression - 0.4)).joints).toHaveLength(2);
  });

  it("is that of the beam which needs more", () => {
    const outer = buildEndPlate({ plate: { extensionTopMm: 120 }, bolts: { rowsMm: [-75, 60, 340] } });
    const needed = 2 * (400 / 2 + 75 + length / 2);
    const at = (heightMm: number) => [buildWebPlates({ heightMm })];
    for (const joints of [
      [buildJoint("left", outer), buildJoint("right")],
      [buildJoint("left"), buildJoint("right", outer)],
    ]) {
      expect(evaluatedCase(buildNodeCase({ joints }), at(needed - 0.4)).joints).toHaveLength(2);
      expect(refusalOf(buildNodeCase({ joints }), at(needed - 0.6))).toMatch(/has to cover/);
    }
  });
});
