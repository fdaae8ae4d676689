import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc";
import {
  S355,
  buildBars,
  buildJoint,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
  buildWebPlates,
} from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/** Guards how measures act together, and what a frame of two pairs adds to the panel. */
const top = buildStiffeners({ levels: ["top"] });
const bottom = buildStiffeners({ levels: ["bottom"] });
const both = buildStiffeners({ levels: ["top", "bottom"] });
const oneSided = buildNodeCase({ joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] });
const panelOf = (...measures: MeasureCase[]): number =>
  checkLike(evaluatedCase(oneSided, measures), "column-web-shear").resistance;

describe("V_wp,add of Eq. (6.8)", () => {
  // HE 300 A: A_vc = A - 2 b t_f + (t_w + 2 r) t_f with A from flanges, web and four root fillets.
  const area = 2 * 300 * 14 + 262 * 8.5 + (4 - Math.PI) * 27 ** 2;
  const plain = (0.9 * 275 * (area - 2 * 300 * 14 + (8.5 + 2 * 27) * 14)) / Math.sqrt(3);
  const flange = 0.25 * 300 * 14 ** 2 * 275;
  const pairOf = (thicknessMm: number, yieldMpa: number): number =>
    0.25 * (2 * 100) * thicknessMm ** 2 * yieldMpa;
  const d_s = 400 - 13.5;

  it("is nothing on the bare column: Eq. (6.7) alone", () => expectHand(panelOf(), plain));

  it("is (2 M_pl,fc + 2 M_pl,st) / d_s where the pairs yield first", () => {
    expect(pairOf(12, 275)).toBeLessThan(flange);
    expectHand(panelOf(both), plain + (2 * flange + 2 * pairOf(12, 275)) / d_s);
  });

  it("is 4 M_pl,fc / d_s where the flanges yield first", () => {
    expect(pairOf(20, 275)).toBeGreaterThan(flange);
    expectHand(panelOf({ ...both, thicknessMm: 20 }), plain + (4 * flange) / d_s);
  });

  it("follows the weaker pair of two unlike ones, by plate and by steel", () => {
    expectHand(
      panelOf(top, { ...bottom, thicknessMm: 10 }),
      plain + (2 * flange + 2 * pairOf(10, 275)) / d_s,
    );
    for (const [first, second] of [
      [top, { ...bottom, steel: S355 }],
      [{ ...top, steel: S355 }, bottom],
    ] as const)
      expectHand(panelOf(first, second), plain + (2 * flange + 2 * pairOf(12, 275)) / d_s);
  });

  it("is nothing with a pair at one level, or of partial depth at either", () => {
    expectHand(panelOf(top), plain);
    expectHand(panelOf(bottom), plain);
    expectHand(panelOf(top, { ...bottom, length: 200 }), plain);
    expectHand(panelOf({ ...both, length: 200 }), plain);
  });

  it("is divided by gamma_M0 as the panel is", () => {
    const partialFactors = { gammaM0: 1.1, gammaM1: 1, gammaM2: 1.25 };
    const found = checkLike(evaluatedCase({ ...oneSided, partialFactors }, [both]), "column-web-shear");
    expectHand(found.resistance, (plain + (2 * flange + 2 * pairOf(12, 275)) / d_s) / 1.1);
  });
});

describe("bars at one level and stiffeners at the other", () => {
  const together = evaluatedCase(buildNodeCase(), [buildBars(), bottom]);

  it("have the tension side of the bars alone", () => {
    const alone = evaluatedCase(buildNodeCase(), [buildBars()]);
    for (const component of ["column-flange-bending", "column-web-tension"] as const)
      expect(checkLike(together, component, { row: 1 }).resistance).toBe(
        checkLike(alone, component, { row: 1 }).resistance,
      );
  });

  it("have the compression side of the stiffeners alone", () => {
    const alone = evaluatedCase(buildNodeCase(), [bottom]);
    expect(checkLike(together, "column-web-compression").resistance).toBe(
      checkLike(alone, "column-web-compression").resistance,
    );
  });

  it("have neither's help where the moments turn round: bars beside compression, stiffeners beside tension", () => {
    const reversed = buildNodeCase({ loadCases: [buildLoadCase(-50, -50)] });
    const option = evaluatedCase(reversed, [buildBars(), bottom]);
    expect(checkLike(option, "bar-compression").level).toBe("top");
    expect(checkLike(option, "transverse-stiffener").level).toBe("bottom");
    expect(checkLike(option, "column-web-compression").resistance).toBe(
      checkLike(evaluatedCase(reversed, [buildBars()]), "column-web-compression").resistance,
    );
  });

  it("are the same whichever is named first", () => {
    const turned = evaluatedCase(buildNodeCase(), [bottom, buildBars()]);
    expect(turned.checks).toEqual(together.checks);
    expect(turned.joints).toEqual(together.joints);
  });
});

describe("a list of measures", () => {
  it("may name one measure once for each level, in one piece or two", () =>
    expect(evaluatedCase(oneSided, [top, bottom]).checks).toEqual(evaluatedCase(oneSided, [both]).checks));

  it.each<[string, MeasureCase[]]>([
    ["a level", [top, both]],
    ["the panel", [buildWebPlates(), buildWebPlates({ sides: 2 })]],
  ])("is refused where it names one measure twice for %s", (_, measures) =>
    expect(refusalOf(oneSided, measures)).toMatch(/same measure is given twice at one level/),
  );
});
