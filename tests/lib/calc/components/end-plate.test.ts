import { describe, expect, it } from "vitest";
import { alphaOf } from "@/lib/calc/clauses/en1993-1-8-2005/alpha";
import { buildEndPlate, buildJoints, buildNodeCase } from "@/tests/factories/build-node-case";
import { checkLike, evaluatedCase, expectHand, refusalOf, stepIn } from "@/tests/support/evaluated-case";

/** A plate 220 x 20 in S275 on IPE 400 (t_w 8.6, t_f 13.5), gauge 140, fillets of throat 6 and 4. EN 1993-1-8:2005, Table 6.6. */
const m = (140 - 8.6) / 2 - 0.8 * Math.SQRT2 * 4;
const e = (220 - 140) / 2;
const withRows = (rowsMm: readonly number[]) =>
  buildNodeCase({ joints: buildJoints(buildEndPlate({ bolts: { rowsMm } })) });

describe("first row below the tension flange", () => {
  // So near the flange that alpha m is longer than the circle 2 pi m: modes 1 and 2 differ in length.
  const m2 = 35 - 13.5 - 0.8 * Math.SQRT2 * 6;
  const alpha = alphaOf(null, { lambda1: m / (m + e), lambda2: m2 / (m + e) });
  const option = evaluatedCase(withRows([35, 340]));
  const plate = checkLike(option, "end-plate-bending");

  it("reads alpha at m_2 to the flange's face less 0.8 of its weld's leg", () => {
    expect(alpha * m).toBeGreaterThan(2 * Math.PI * m);
    const moment = 0.25 * alpha * m * 20 ** 2 * 275;
    expectHand(stepIn(plate, "F_T,2,Rd").value, (2 * moment + (e * 2 * 0.9 * 1000 * 245) / 1.25) / (m + e));
  });

  it("fails in its bolts, so the beam's web works over the length of mode 2, 6.2.6.8", () => {
    expectHand(plate.resistance, (2 * 0.9 * 1000 * 245) / 1.25);
    expectHand(checkLike(option, "beam-web-tension").resistance, alpha * m * 8.6 * 275);
  });
});

describe("a row that cannot stand where it is", () => {
  it.each([
    ["on the flange's weld outside", [-6, 70, 340], /root radius or weld/],
    ["on the flange's weld inside", [20, 340], /root radius or weld/],
    ["outside the plate", [-95, 70, 340], /outside the end plate/],
  ])("%s is outside scope", (_, rowsMm, reason) => expect(refusalOf(withRows(rowsMm))).toMatch(reason));
});
