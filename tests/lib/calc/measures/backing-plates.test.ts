import { describe, expect, it } from "vitest";
import { evaluateOption, type EvaluatedOption, type MeasureCase, type NodeCase } from "@/lib/calc";
import {
  buildBackingPlates,
  buildBars,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
  withColumn,
} from "@/tests/factories/build-node-case";

/**
 * Flange backing plates, EN 1993-1-8:2005 6.2.4.3 and Table 6.2: expected values by hand, as expressions. The column flange is
 * 10 mm of S275, so that mode 1 governs, gauge 140: m = (140 - 8.5) / 2 - 0.8 · 27, e = 80; a plate 300 wide gives n = min(80, 1.25 m).
 */
const wide = { plate: { widthMm: 300 } };
const node = (overrides: Partial<NodeCase> = {}): NodeCase =>
  withColumn(
    { flangeThicknessMm: 10 },
    buildNodeCase({ joints: buildJoints(buildEndPlate(wide)), ...overrides }),
  );

function evaluated(of: NodeCase, measures: readonly MeasureCase[]): EvaluatedOption {
  const outcome = evaluateOption(of, measures);
  if (outcome.kind !== "evaluated") throw new Error(outcome.reason);
  return outcome;
}

const flange = (option: EvaluatedOption, row = 1, side = "left"): number =>
  option.checks.find(
    (check) => check.component === "column-flange-bending" && check.row === row && check.side === side,
  )?.resistance ?? NaN;

const detail = (option: EvaluatedOption, what: string) =>
  option.checks.filter((check) => check.component === "detailing" && check.what?.includes(what));

const m = (140 - 8.5) / 2 - 0.8 * 27;
const n = Math.min(80, 1.25 * m);
const leff = Math.min(2 * Math.PI * m, 4 * m + 1.25 * 80);
const momentOf = (length: number, thickness: number): number => 0.25 * length * thickness ** 2 * 275;

describe("backing plates in mode 1", () => {
  it("add 2 M_bp to 4 M_pl,1 by method 1", () => {
    const option = evaluated(node({ tStubModeOne: "method-1" }), [buildBackingPlates({ thicknessMm: 4 })]);
    const byHand = (4 * momentOf(leff, 10) + 2 * momentOf(leff, 4)) / m;
    expect(flange(option)).toBeCloseTo(byHand, 3);
  });

  it("add 4 n M_bp by method 2", () => {
    const option = evaluated(node(), [buildBackingPlates({ thicknessMm: 5 })]);
    const head = 32.95 / 4;
    const byHand =
      ((8 * n - 2 * head) * momentOf(leff, 10) + 4 * n * momentOf(leff, 5)) / (2 * m * n - head * (m + n));
    expect(flange(option)).toBeCloseTo(byHand, 3);
  });

  it("leave modes 2 and 3 as they are: a thick plate ends at mode 2", () => {
    const option = evaluated(node({ tStubModeOne: "method-1" }), [buildBackingPlates({ thicknessMm: 40 })]);
    const bolt = (0.9 * 1000 * 245) / 1.25;
    const patternTwo = 4 * m + 1.25 * 80;
    expect(flange(option)).toBeCloseTo((2 * momentOf(patternTwo, 10) + n * 2 * bolt) / (m + n), 3);
  });

  it("that end short of the pattern count over their own length, for flange and plate alike", () => {
    // One row at 60 in the middle of a plate of 250 mm: 125 mm above and below, less than leff / 2.
    const option = evaluated(node({ tStubModeOne: "method-1" }), [
      buildBackingPlates({ thicknessMm: 6, lengthMm: 250 }),
    ]);
    expect(leff / 2).toBeGreaterThan(125);
    expect(flange(option)).toBeCloseTo((4 * momentOf(250, 10) + 2 * momentOf(250, 6)) / m, 3);
  });

  it("never take anything away, however short", () => {
    const of = node({ tStubModeOne: "method-1" });
    const short = evaluated(of, [buildBackingPlates({ thicknessMm: 1, lengthMm: 90 })]);
    expect(flange(short)).toBe(flange(evaluated(of, [])));
  });

  it("back the rows of their own level and side only", () => {
    const of = node({ tStubModeOne: "method-1", loadCases: [buildLoadCase(50, -50)] });
    const bare = evaluated(of, []);
    const left = evaluated(of, [buildBackingPlates({ at: "left" })]);
    expect(flange(left)).toBeGreaterThan(flange(bare));
    // The right beam pulls at the bottom, its row 2.
    expect(flange(left, 2, "right")).toBe(flange(bare, 2, "right"));
    const bottom = evaluated(of, [buildBackingPlates({ levels: ["bottom"], at: "right" })]);
    expect(flange(bottom)).toBe(flange(bare));
    expect(flange(bottom, 2, "right")).toBeGreaterThan(flange(bare, 2, "right"));
  });

  it("do not change the stiffness", () => {
    const stiffness = (option: EvaluatedOption) =>
      option.joints.map((joint) => joint.initialStiffnessNmmPerRad);
    expect(stiffness(evaluated(node(), [buildBackingPlates()]))).toEqual(stiffness(evaluated(node(), [])));
  });

  it("begin at a stiffener of their level: piece and pattern from there to the plate's end", () => {
    const of = node({ tStubModeOne: "method-1" });
    const option = evaluated(of, [buildStiffeners(), buildBackingPlates({ thicknessMm: 10, lengthMm: 320 })]);
    const plain = flange(evaluated(of, [buildStiffeners()]));
    // Plate from 60 - 160 to 60 + 160; the stiffener's lower weld ends 6 + 5 √2 below the flange's middle at 6.75.
    const piece = 60 + 160 - (6.75 + 6 + 5 * Math.SQRT2);
    expect(piece).toBeLessThan(leff);
    const backed = (4 * momentOf(piece, 10) + 2 * momentOf(piece, 10)) / m;
    expect(backed).toBeGreaterThan(plain);
    expect(flange(option)).toBeCloseTo(backed, 3);
  });
});

describe("detailing of backing plates", () => {
  it("asks for 3 mm to the root toe, and no plate on the root", () => {
    const gap = (widthMm: number) => detail(evaluated(node(), [buildBackingPlates({ widthMm })]), "gap")[0];
    const toToe = 300 / 2 - 8.5 / 2 - 27;
    expect(gap(118)?.utilisation).toBeCloseTo((toToe - 118) / 3, 9);
    expect(gap(115)?.utilisation).toBeGreaterThan(1);
    expect(evaluated(node(), [buildBackingPlates({ widthMm: 115 })]).passes).toBe(false);
    expect(
      detail(evaluated(node(), [buildBackingPlates({ widthMm: 120 })]), "root")[1]?.utilisation,
    ).toBeGreaterThan(1);
  });

  it("asks for 2 d beyond the outer rows", () => {
    const beyond = (lengthMm: number) =>
      detail(evaluated(node(), [buildBackingPlates({ lengthMm })]), "beyond")[0]?.utilisation;
    expect(beyond(80)).toBeCloseTo((2 * 20) / 40, 9);
    expect(beyond(78)).toBeGreaterThan(1);
  });

  it("keeps them on the column", () => {
    const column = { ...buildNodeCase().column, endDistanceAboveMm: 80 };
    const within = (lengthMm: number) =>
      detail(evaluated(node({ column }), [buildBackingPlates({ lengthMm })]), "column's end")[0];
    // The row at 60, the plate's end at 60 - 140 = 80 above the beam.
    expect(within(280)?.utilisation).toBeCloseTo(1, 9);
    expect(within(300)?.utilisation).toBeGreaterThan(1);
  });
});

describe("backing plates outside scope", () => {
  const reason = (of: NodeCase, measures: readonly MeasureCase[]): string => {
    const outcome = evaluateOption(of, measures);
    return outcome.kind === "outside-scope" ? outcome.reason : "in scope";
  };

  it("say why: bars, no row, no beam, welded beams, twice", () => {
    expect(reason(node(), [buildBackingPlates(), buildBars()])).toMatch(/bar model/);
    expect(reason(node(), [buildBackingPlates({ levels: ["bottom"] }), buildBars()])).toBe("in scope");
    const rows = buildJoints(buildEndPlate({ bolts: { rowsMm: [60, 120] } }));
    expect(reason(node({ joints: rows }), [buildBackingPlates({ levels: ["bottom"] })])).toMatch(
      /no bolt row/,
    );
    const leftOnly = { joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] };
    expect(reason(node(leftOnly), [buildBackingPlates({ at: "right" })])).toMatch(/no beam on the right/);
    expect(reason(node(leftOnly), [buildBackingPlates()])).toBe("in scope");
    const { welds } = buildEndPlate();
    const welded = node({ joints: buildJoints({ kind: "welded", welds }) });
    expect(reason(welded, [buildBackingPlates()])).toMatch(/bolted end plates only/);
    expect(reason(node(), [buildBackingPlates({ at: "left" }), buildBackingPlates()])).toMatch(/twice/);
    expect(reason(node(), [buildBackingPlates({ at: "left" }), buildBackingPlates({ at: "right" })])).toBe(
      "in scope",
    );
  });
});
