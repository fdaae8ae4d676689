import { describe, expect, it } from "vitest";
import type { MeasureCase, NodeCase } from "@/lib/calc";
import { alphaOf } from "@/lib/calc/clauses/en1993-1-8-2005/alpha";
import {
  buildEndPlate,
  buildJoints,
  buildNodeCase,
  buildStiffeners,
} from "@/tests/factories/build-node-case";
import { checksOf, evaluatedCase, expectHand, refusalOf, stepIn } from "@/tests/support/evaluated-case";

/**
 * Patterns of the column flange of HE 300 A (300 x 14, t_w 8.5, r 27) in EN 1993-1-8:2005, 6.2.6.4: m and e at gauge 140,
 * rows 60 and 160 mm below the top of IPE 400 (t_f 13.5), the third near the other flange.
 */
const m = (140 - 8.5) / 2 - 0.8 * 27;
const e = (300 - 140) / 2;
const p = 100;

const withRows = (rowsMm: readonly number[], endDistanceAboveMm: number | null = null): NodeCase =>
  buildNodeCase({
    joints: buildJoints(buildEndPlate({ bolts: { rowsMm } })),
    column: { ...buildNodeCase().column, endDistanceAboveMm },
  });
const flangeOf = (node: NodeCase, rows: readonly number[], measures: readonly MeasureCase[] = []) => {
  const check = checksOf(evaluatedCase(node, measures), "column-flange-bending", { side: "left" }).find(
    (one) => JSON.stringify(one.rows ?? [one.row]) === JSON.stringify(rows),
  );
  if (!check) throw new Error(`no rows ${rows.join()}`);
  return check;
};
/** M_pl of mode 2, which shows l_eff,2: 0.25 l t^2 f_y. */
const momentOf = (length: number): number => 0.25 * length * 14 ** 2 * 275;
/** (2 M_pl,2 + n sum F_t) / (m + n) with n = 40 of the plate and bolts of 0.9 x 1000 x 245 / 1.25. */
const modeTwo = (length: number, bolts: number): number =>
  (2 * momentOf(length) + (40 * bolts * 0.9 * 1000 * 245) / 1.25) / (m + 40);
const modeTwoOf = (node: NodeCase, rows: readonly number[], measures: readonly MeasureCase[] = []): number =>
  stepIn(flangeOf(node, rows, measures), "F_T,2,Rd").value;

describe("rows on a continuous column, Table 6.4", () => {
  const node = withRows([60, 160, 240]);

  it("alone: 4m + 1.25e", () => expectHand(modeTwoOf(node, [2]), modeTwo(4 * m + 1.25 * e, 2)));

  it("two of them: twice 2m + 0.625e + 0.5p", () =>
    expectHand(modeTwoOf(node, [1, 2]), modeTwo(2 * (2 * m + 0.625 * e + 0.5 * p), 4)));

  it("three of them: the inner one counts half of each pitch", () =>
    expectHand(
      modeTwoOf(node, [1, 2, 3]),
      modeTwo(2 * m + 0.625 * e + 0.5 * 100 + (100 + 80) / 2 + (2 * m + 0.625 * e + 0.5 * 80), 6),
    ));
});

describe("rows near the column's end", () => {
  // The column ends 10 mm above the beam: e_1 = 10 + 60 for the first row, 10 + 160 for the second.
  const node = withRows([60, 160], 10);

  it("alone: 2m + 0.625e + e_1 where that is shorter", () => {
    expectHand(modeTwoOf(node, [1]), modeTwo(2 * m + 0.625 * e + 70, 2));
    expect(2 * m + 0.625 * e).toBeLessThan(170);
    expectHand(modeTwoOf(node, [2]), modeTwo(4 * m + 1.25 * e, 2));
  });

  it("in a group: e_1 + 0.5p for the row at the end alone", () =>
    expectHand(modeTwoOf(node, [1, 2]), modeTwo(70 + 0.5 * p + (2 * m + 0.625 * e + 0.5 * p), 4)));
});

describe("rows beside a stiffener, Table 6.5", () => {
  const pair = buildStiffeners({ levels: ["top"] });
  // m_2: 60 to the middle of the flange less half of 12 and 0.8 of a leg of sqrt2 x 5.
  const m2 = 60 - 13.5 / 2 - 12 / 2 - 0.8 * Math.SQRT2 * 5;
  const alpha = alphaOf(null, { lambda1: m / (m + e), lambda2: m2 / (m + e) });

  it("read alpha at m_2 to the stiffener's face less 0.8 of its weld's leg", () => {
    expect(alpha * m).toBeGreaterThan(4 * m + 1.25 * e);
    expectHand(modeTwoOf(withRows([60, 160]), [1], [pair]), modeTwo(alpha * m, 2));
    expectHand(modeTwoOf(withRows([60, 160]), [2], [pair]), modeTwo(4 * m + 1.25 * e, 2));
  });

  it("in a group: 0.5p + alpha m - (2m + 0.625e) for the row beside it", () =>
    expectHand(
      modeTwoOf(withRows([60, 160]), [1, 2], [pair]),
      modeTwo(0.5 * p + alpha * m - (2 * m + 0.625 * e) + (2 * m + 0.625 * e + 0.5 * p), 4),
    ));

  it("never act together across it", () => {
    const groups = (measures: readonly MeasureCase[]) =>
      checksOf(evaluatedCase(withRows([-45, 60, 160]), measures), "column-flange-bending", { side: "left" })
        .flatMap(({ rows }) => (rows ? [rows.join("+")] : []))
        .sort();
    expect(groups([])).toEqual(["1+2", "1+2+3", "2+3"]);
    expect(groups([pair])).toEqual(["2+3"]);
  });

  it("count it from 2 b_sg + t_wc = 1.33 gauge on (P398)", () => {
    // (1.33 x 140 - 8.5) / 2 = 88.85.
    const withWidth = (widthMm: number): number =>
      modeTwoOf(withRows([60, 160]), [1], [buildStiffeners({ levels: ["top"], widthMm })]);
    expectHand(withWidth(88.9), modeTwo(alpha * m, 2));
    expectHand(withWidth(88.8), modeTwo(4 * m + 1.25 * e, 2));
  });
});

describe("bolts", () => {
  const at = (gaugeMm: number): NodeCase =>
    buildNodeCase({ joints: buildJoints(buildEndPlate({ plate: { widthMm: 400 }, bolts: { gaugeMm } })) });

  it("on the root radius or off the flange are outside scope", () => {
    // (gauge - 8.5) / 2 = 0.8 x 27 at 51.7; the flange is 300 wide.
    expect(refusalOf(at(51.7))).toMatch(/root radius or weld/);
    expect(refusalOf(at(300))).toMatch(/outside the column flange/);
  });
});
