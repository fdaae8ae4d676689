import { describe, expect, it } from "vitest";
import {
  cruciformAreaMm2,
  cruciformInertiaMm4,
  cruciformWebMm,
  outstandLimitMm,
  stiffenerCrushingN,
  stiffenerNetAreaMm2,
  twoShearPlanesN,
} from "@/lib/calc/clauses/en1993-1-5-2006/stiffeners";
import { expectHand } from "@/tests/support/evaluated-case";

/** Guards the clauses of transverse stiffeners on a pair 100 x 12 on a web of 8.5 mm in S275. */
const epsilon = Math.sqrt(235 / 275);
const pair = { widthMm: 100, thicknessMm: 12, webThicknessMm: 8.5, webLengthMm: 30 * epsilon * 8.5 };

describe("the cruciform of EN 1993-1-5, 9.1", () => {
  it("has 15 eps t_w of web on either side", () =>
    expectHand(cruciformWebMm(null, { epsilon, webThicknessMm: 8.5 }), 2 * (15 * epsilon * 8.5)));

  it("has the area of both plates, of that web and of the web between them", () =>
    expectHand(cruciformAreaMm2(null, pair), 2 * 100 * 12 + (2 * 15 * epsilon * 8.5 + 12) * 8.5));

  it("bends about the plane of the web: outstands, web under them and web beside them, by parts", () => {
    // Each plate about its own middle and moved by (100 + 8.5)/2; the web's strips about their own middle.
    const plates = 2 * ((12 * 100 ** 3) / 12 + 12 * 100 * ((100 + 8.5) / 2) ** 2);
    const web = ((30 * epsilon * 8.5 + 12) * 8.5 ** 3) / 12;
    expectHand(cruciformInertiaMm4(null, pair), plates + web);
  });

  it("may stand out 14 eps t_s", () =>
    expectHand(outstandLimitMm(null, { thicknessMm: 12, epsilon }), 14 * epsilon * 12));
});

describe("the stiffener at the flange", () => {
  it("has the net area of SCI/BCSA P398 (2013), example C.2: 2 x 95 x 15 = 2850 mm2 behind clips of 15 mm", () =>
    expect(stiffenerNetAreaMm2(null, { widthMm: 110, clipMm: 15, thicknessMm: 15 })).toBe(2850));

  it("is refused where the clip leaves nothing", () => {
    const at = (clipMm: number) => () => stiffenerNetAreaMm2(null, { widthMm: 30, clipMm, thicknessMm: 10 });
    expect(at(29)()).toBe(20);
    expect(at(30)).toThrow(/corner clip leaves nothing/);
  });

  it("crushes at 1595 kN as printed in P398 (2013), example C.2", () => {
    const crushing = stiffenerCrushingN(null, {
      netAreaMm2: 2 * 95 * 15,
      stiffenerYieldMpa: 265,
      breadthMm: 248,
      webThicknessMm: 12.8,
      webYieldMpa: 265,
      gammaM0: 1,
    });
    // Printed to whole kN from b_eff rounded to whole mm: half a mm is 1.7 kN, half a unit 0.5 kN.
    expect(Math.abs(crushing / 1000 - 1595)).toBeLessThanOrEqual(0.0005 * 12.8 * 265 + 0.5);
  });

  it("has either part divided by gamma_M0", () =>
    expectHand(
      stiffenerCrushingN(null, {
        netAreaMm2: 1752,
        stiffenerYieldMpa: 275,
        breadthMm: 275,
        webThicknessMm: 8.5,
        webYieldMpa: 235,
        gammaM0: 1.1,
      }),
      (1752 * 275 + 275 * 8.5 * 235) / 1.1,
    ));

  it("shears the web along both sides of its weld where it ends short", () =>
    expectHand(
      twoShearPlanesN(null, { lengthMm: 96, thicknessMm: 8.5, yieldMpa: 275, gammaM0: 1.1 }),
      (2 * 96 * 8.5 * 275) / (Math.sqrt(3) * 1.1),
    ));
});
