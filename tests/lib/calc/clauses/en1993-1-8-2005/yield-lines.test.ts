import { describe, expect, it } from "vitest";
import * as lines from "@/lib/calc/clauses/en1993-1-8-2005/yield-lines";
import { OutsideScope } from "@/lib/calc/outcome";
import { expectHand } from "@/tests/support/evaluated-case";

/** Tables 6.4 to 6.6 of EN 1993-1-8:2005 at m = 40, e = 60, p = 100: every entry, and every arm of the entries that are a minimum. */
const [mMm, eMm, pitchMm] = [40, 60, 100];

describe("Table 6.4, unstiffened column flange", () => {
  it("inner row alone: 2 pi m; 4m + 1.25e", () => {
    expectHand(lines.circularMm(null, { mMm }), 2 * Math.PI * 40);
    expectHand(lines.patternMm(null, { mMm, eMm }), 4 * 40 + 1.25 * 60);
  });

  it("inner row of a group: 2p; p, half of each pitch where they differ", () => {
    const given = { beforeMm: 80, afterMm: 120 };
    expectHand(lines.groupInnerCircularMm(null, given), 80 + 120);
    expectHand(lines.groupInnerPatternMm(null, given), 80 / 2 + 120 / 2);
  });

  // pi m = 125.66 is the least of 2 pi m and pi m + 2 e_1 from e_1 = 62.8 on; 2m + 0.625e = 117.5 likewise.
  it.each([
    [30, Math.PI * 40 + 2 * 30, 2 * 40 + 0.625 * 60 + 30],
    [200, 2 * Math.PI * 40, 4 * 40 + 1.25 * 60],
  ])("end row alone, e_1 = %f", (endMm, circular, other) => {
    expectHand(lines.circularNearEndMm(null, { mMm, endMm }), circular);
    expectHand(lines.patternNearEndMm(null, { mMm, eMm, endMm }), other);
  });

  it.each([
    [30, 2 * 30 + 100, 30 + 0.5 * 100],
    [200, Math.PI * 40 + 100, 2 * 40 + 0.625 * 60 + 0.5 * 100],
  ])("end row of a group, e_1 = %f", (endMm, circular, other) => {
    expectHand(lines.groupNearEndCircularMm(null, { mMm, pitchMm, endMm }), circular);
    expectHand(lines.groupNearEndPatternMm(null, { mMm, eMm, pitchMm, endMm }), other);
  });

  it("end row of a group on a continuous column", () => {
    expectHand(lines.groupEndCircularMm(null, { mMm, pitchMm }), Math.PI * 40 + 100);
    expectHand(lines.groupEndPatternMm(null, { mMm, eMm, pitchMm }), 2 * 40 + 0.625 * 60 + 0.5 * 100);
  });
});

describe("Table 6.5, row beside a stiffener", () => {
  it("alone is alpha m, never below 4m + 1.25e", () => {
    expectHand(lines.besideStiffenerMm(null, { alpha: 6.5, mMm, eMm }), 6.5 * 40);
    expectHand(lines.besideStiffenerMm(null, { alpha: 5, mMm, eMm }), 4 * 40 + 1.25 * 60);
  });

  it("in a group is 0.5p + alpha m - (2m + 0.625e)", () =>
    expectHand(
      lines.groupBesideStiffenerMm(null, { stiffenedMm: 6.5 * 40, mMm, eMm, pitchMm }),
      0.5 * 100 + 6.5 * 40 - (2 * 40 + 0.625 * 60),
    ));

  it("at the column's end is e_1 + alpha m - (2m + 0.625e), and no longer than far from it", () => {
    const length = (endMm: number): number =>
      lines.besideStiffenerNearEndMm(null, { stiffenedMm: 6.5 * 40, mMm, eMm, endMm });
    expectHand(length(30), 30 + 6.5 * 40 - (2 * 40 + 0.625 * 60));
    expectHand(length(500), 6.5 * 40);
  });

  it("on the unstiffened length leaves the unstiffened share of a group", () => {
    // alpha m = 4m + 1.25e: 0.5p + (4m + 1.25e) - (2m + 0.625e) = 2m + 0.625e + 0.5p.
    expectHand(
      lines.groupBesideStiffenerMm(null, { stiffenedMm: 4 * 40 + 1.25 * 60, mMm, eMm, pitchMm }),
      2 * 40 + 0.625 * 60 + 0.5 * 100,
    );
  });
});

describe("Table 6.6, row outside the beam's tension flange", () => {
  it.each([
    ["2 pi m_x", 40, 500, 300, 2 * Math.PI * 40],
    ["pi m_x + w", 40, 90, 300, Math.PI * 40 + 90],
    ["pi m_x + 2e", 40, 500, 30, Math.PI * 40 + 2 * 30],
  ])("circular: %s", (_, mxMm, gaugeMm, e, byHand) =>
    expectHand(lines.extensionCircularMm(null, { mxMm, gaugeMm, eMm: e }), byHand),
  );

  it.each([
    ["4 m_x + 1.25 e_x", { mxMm: 30, exMm: 40, eMm: 200, widthMm: 600, gaugeMm: 300 }, 4 * 30 + 1.25 * 40],
    [
      "e + 2 m_x + 0.625 e_x",
      { mxMm: 30, exMm: 40, eMm: 50, widthMm: 600, gaugeMm: 300 },
      50 + 2 * 30 + 0.625 * 40,
    ],
    ["0.5 b_p", { mxMm: 30, exMm: 40, eMm: 50, widthMm: 200, gaugeMm: 300 }, 0.5 * 200],
    [
      "0.5 w + 2 m_x + 0.625 e_x",
      { mxMm: 30, exMm: 40, eMm: 200, widthMm: 600, gaugeMm: 90 },
      0.5 * 90 + 2 * 30 + 0.625 * 40,
    ],
  ])("other: %s", (_, given, byHand) => expectHand(lines.extensionPatternMm(null, given), byHand));
});

describe("lever m", () => {
  it("ends 0.8 of the root radius or weld leg before the face", () =>
    expectHand(lines.leverMm(null, { clearMm: 65.75, filletMm: 27 }), 65.75 - 0.8 * 27));

  it("has no value for a bolt that stands on the radius", () => {
    expect(() => lines.leverMm(null, { clearMm: 21.6, filletMm: 27 })).toThrow(OutsideScope);
    expect(() => lines.leverMm(null, { clearMm: 21.5, filletMm: 27 })).toThrow(/root radius or weld/);
  });
});
