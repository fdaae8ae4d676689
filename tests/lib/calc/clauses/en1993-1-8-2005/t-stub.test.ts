import { describe, expect, it } from "vitest";
import * as rules from "@/lib/calc/clauses/en1993-1-8-2005/t-stub";
import { OutsideScope } from "@/lib/calc/outcome";
import { buildEndPlate, buildJoints, buildNodeCase } from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand, stepIn } from "@/tests/support/evaluated-case";

/** HE 300 A (300 x 14, t_w 8.5, r 27, S275), M20 10.9 (A_s 245, 30/32.95 across) at gauge 140. EN 1993-1-8:2005, Table 6.2. */
const m = (140 - 8.5) / 2 - 0.8 * 27;
const F_t = (0.9 * 1000 * 245) / 1.25;
const length = 4 * m + 1.25 * 80; // below 2 pi m = 277.4
const M_pl = (0.25 * length * 14 ** 2 * 275) / 1;

const flangeOf = (plateMm: number, method: "method-1" | "method-2", thicknessMm = 20) =>
  checkLike(
    evaluatedCase(
      buildNodeCase({
        tStubModeOne: method,
        joints: buildJoints(buildEndPlate({ plate: { widthMm: plateMm, thicknessMm } })),
      }),
    ),
    "column-flange-bending",
  );

describe("modes of one row", () => {
  const n = Math.min(80, (220 - 140) / 2, 1.25 * m);
  const e_w = 32.95 / 4;

  it("1 by method 1 is 4 M_pl / m", () =>
    expectHand(stepIn(flangeOf(220, "method-1"), "F_T,1,Rd method 1").value, (4 * M_pl) / m));

  it("1 by method 2 spreads the bolt's force over a quarter of the head across points", () =>
    expectHand(
      stepIn(flangeOf(220, "method-2"), "F_T,1,Rd method 2").value,
      ((8 * n - 2 * e_w) * M_pl) / (2 * m * n - e_w * (m + n)),
    ));

  it("2 is (2 M_pl + n sum F_t) / (m + n), n at most the smaller edge and 1.25 m", () => {
    expectHand(stepIn(flangeOf(220, "method-2"), "F_T,2,Rd").value, (2 * M_pl + n * 2 * F_t) / (m + n));
    const wide = Math.min(80, (290 - 140) / 2, 1.25 * m);
    expect(wide).toBe(1.25 * m);
    expectHand(stepIn(flangeOf(290, "method-2"), "F_T,2,Rd").value, (2 * M_pl + wide * 2 * F_t) / (m + wide));
  });

  it("3 is both bolts, or the plate punched through around their heads", () => {
    expectHand(stepIn(flangeOf(220, "method-2"), "F_T,3,Rd").value, 2 * F_t);
    const thin = checkLike(
      evaluatedCase(buildNodeCase({ joints: buildJoints(buildEndPlate({ plate: { thicknessMm: 8 } })) })),
      "end-plate-bending",
    );
    // d_m = (30 + 32.95)/2 over 8 mm of f_u 410.
    const punching = (0.6 * Math.PI * ((30 + 32.95) / 2) * 8 * 410) / 1.25;
    expect(punching).toBeLessThan(F_t);
    expectHand(stepIn(thin, "F_T,3,Rd").value, 2 * punching);
  });

  it("are followed by the least of them", () => {
    const one = ((8 * n - 2 * e_w) * M_pl) / (2 * m * n - e_w * (m + n));
    const two = (2 * M_pl + n * 2 * F_t) / (m + n);
    expectHand(flangeOf(220, "method-2").resistance, Math.min(one, two, 2 * F_t));
  });
});

describe("mode 1 by method 2 where 2mn does not exceed e_w (m + n)", () => {
  it("cannot occur: the row has modes 2 and 3 only", () => {
    // A plate 148 wide leaves n = 4: 2 m n = 353 against e_w (m + n) = 397.
    const n = 4;
    expect(2 * m * n - (32.95 / 4) * (m + n)).toBeLessThan(0);
    const check = flangeOf(148, "method-2");
    expectHand(check.resistance, Math.min((2 * M_pl + n * 2 * F_t) / (m + n), 2 * F_t));
    expect(() => stepIn(check, "F_T,1,Rd method 2")).toThrow(/has no step/);
  });

  it("has no value, at the limit itself as well", () => {
    const at = (headMm: number): number => rules.modeOneN(null, { momentNmm: 1e6, mMm: 40, nMm: 40, headMm });
    // 2 x 40 x 40 = 3200 = 40 x 80.
    expect(() => at(40)).toThrow(OutsideScope);
    expectHand(at(30), ((8 * 40 - 2 * 30) * 1e6) / (3200 - 30 * 80));
  });
});

describe("backing plates, 6.2.4.3", () => {
  const given = { momentNmm: 2e6, mMm: 40, backingNmm: 5e5 };

  it("add 2 M_bp / m by method 1 and 4 n M_bp over the same divisor by method 2", () => {
    expectHand(rules.modeOneBackedSimpleN(null, given), (4 * 2e6 + 2 * 5e5) / 40);
    expectHand(
      rules.modeOneBackedN(null, { ...given, nMm: 50, headMm: 8 }),
      ((8 * 50 - 2 * 8) * 2e6 + 4 * 50 * 5e5) / (2 * 40 * 50 - 8 * (40 + 50)),
    );
  });
});
