import { describe, expect, it } from "vitest";
import type { MeasureCase, NodeCase } from "@/lib/calc";
import {
  M20,
  buildBars,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildNodeCase,
  buildStiffeners,
  withColumn,
  type EndPlateOverrides,
} from "@/tests/factories/build-node-case";
import { evaluatedCase, refusalOf } from "@/tests/support/evaluated-case";
import { m } from "./through-bar-hand-values";

/** Guards the bounds of the study behind the bars: just inside gives numbers, just outside names the bound. */
const withPlate = (overrides: EndPlateOverrides, node: NodeCase = buildNodeCase()): NodeCase => ({
  ...node,
  joints: buildJoints(buildEndPlate(overrides)),
});
const withEnds = (above: number | null, below: number | null): NodeCase => {
  const node = buildNodeCase();
  return { ...node, column: { ...node.column, endDistanceAboveMm: above, endDistanceBelowMm: below } };
};
const barsOf = (diameterMm: number): MeasureCase =>
  buildBars({ size: { ...M20, name: `M${diameterMm}`, diameterMm } });

/** Gauges at a flange thickness that keeps m / t_f within its own bounds: (w - 8.5)/2 - 0.8 · 27 over t_f. */
const atGauge = (gaugeMm: number, flangeThicknessMm: number): NodeCase =>
  withPlate({ plate: { widthMm: 260 }, bolts: { gaugeMm } }, withColumn({ flangeThicknessMm }));
/** t_f that makes m / t_f a given ratio at gauge 140. */
const atRatio = (ratio: number): NodeCase => withColumn({ flangeThicknessMm: m / ratio });
/** An end row 60 mm below the beam's top; 1.6 h = 1.6 · 290 = 464 mm. */
const needed = 1.6 * 290;

type Pair = readonly [name: string, inside: NodeCase, outside: NodeCase, reason: RegExp];

describe("the bounds of the through-bar model", () => {
  it.each<Pair>([
    ["a rolled column", buildNodeCase(), withColumn({ make: "welded" }), /hot-rolled columns only/],
    ["h 200", withColumn({ depthMm: 200 }), withColumn({ depthMm: 199 }), /depth 200 to 400 mm \(199 mm\)/],
    ["h 400", withColumn({ depthMm: 400 }), withColumn({ depthMm: 401 }), /depth 200 to 400 mm \(401 mm\)/],
    ["m / t_f 2", atRatio(2.001), atRatio(1.99), /m \/ t_f 2 to 4\.6 \(1\.99\)/],
    ["m / t_f 4.6", atRatio(4.599), atRatio(4.61), /m \/ t_f 2 to 4\.6 \(4\.61\)/],
    ["gauge 100", atGauge(100, 10), atGauge(99, 10), /gauge 100 to 180 mm \(99 mm\)/],
    ["gauge 180", atGauge(180, 15), atGauge(181, 15), /gauge 100 to 180 mm \(181 mm\)/],
    [
      "plate 12",
      withPlate({ plate: { thicknessMm: 12 } }),
      withPlate({ plate: { thicknessMm: 11.9 } }),
      /end plate 12 to 30 mm \(11\.9 mm\)/,
    ],
    [
      "plate 30",
      withPlate({ plate: { thicknessMm: 30 } }),
      withPlate({ plate: { thicknessMm: 30.1 } }),
      /end plate 12 to 30 mm \(30\.1 mm\)/,
    ],
    [
      "1.6 h from the column's top",
      withEnds(needed - 60 + 0.1, null),
      withEnds(needed - 60 - 0.1, null),
      /1\.6 column depths from the column's end/,
    ],
    [
      "1.6 h from the column's foot",
      withEnds(null, needed - 340 + 0.1),
      withEnds(null, needed - 340 - 0.1),
      /1\.6 column depths from the column's end/,
    ],
    ["two bars a row", buildNodeCase(), withPlate({ bolts: { perRow: 4 } }), /two bars a row \(4\)/],
  ])("hold %s", (_, inside, outside, reason) => {
    expect(evaluatedCase(inside, [buildBars()]).joints).toHaveLength(2);
    expect(refusalOf(outside, [buildBars()])).toMatch(reason);
    expect(refusalOf(outside, [buildBars()])).toMatch(/^outside the bounds of the through-bar model: /);
  });

  it.each([
    [16, 14],
    [30, 33],
  ])("hold M%i and refuse M%i", (inside, outside) => {
    expect(evaluatedCase(buildNodeCase(), [barsOf(inside)]).joints).toHaveLength(2);
    expect(refusalOf(buildNodeCase(), [barsOf(outside)])).toMatch(
      new RegExp(`bars M16 to M30 \\(M${outside}\\)`),
    );
  });

  it("hold a nut beside the root radius and refuse one that rides on it", () => {
    // Clear of the root: (140 - 8.5)/2 - 27 = 38.75 mm, so 77.5 mm across points.
    const bars = (acrossPointsMm: number) => buildBars({ size: { ...M20, acrossPointsMm } });
    expect(evaluatedCase(buildNodeCase(), [bars(77.5)]).joints).toHaveLength(2);
    expect(refusalOf(buildNodeCase(), [bars(77.6)])).toMatch(/nut rides on the root radius/);
  });

  it("judge the column that the option puts in, not the node's own", () => {
    const { section, steel } = buildNodeCase().column;
    const heavier: MeasureCase = { kind: "heavier-column", section: { ...section, depthMm: 401 }, steel };
    expect(refusalOf(buildNodeCase(), [heavier, buildBars()])).toMatch(/depth 200 to 400 mm \(401 mm\)/);
  });

  it("judge the rows of a level of bars only", () => {
    // Bars below: the row at 340 is 340 + 130 = 470 mm from the top, the bolts at 60 are not judged.
    const bottom = buildBars({ levels: ["bottom"] });
    expect(evaluatedCase(withEnds(130, null), [bottom]).joints).toHaveLength(2);
    expect(refusalOf(withEnds(130, null), [buildBars()])).toMatch(/1\.6 column depths/);
  });
});

describe("what bars need around them", () => {
  const refused = (node: NodeCase, ...measures: MeasureCase[]): string => refusalOf(node, measures);

  it("inner nuts", () =>
    expect(refused(buildNodeCase(), buildBars({ innerNuts: false }))).toMatch(/bars without inner nuts/));

  it("bolted end plates on every side", () => {
    const welded = { kind: "welded", welds: buildEndPlate().welds } as const;
    const joints = [buildJoint("left"), buildJoint("right", welded)];
    expect(refused(buildNodeCase({ joints }), buildBars())).toMatch(/bolted end plates only/);
  });

  it("a row at their level", () =>
    expect(refused(withPlate({ bolts: { rowsMm: [60, 120] } }), buildBars({ levels: ["bottom"] }))).toMatch(
      /no bolt row at the bottom level/,
    ));

  it.each([
    ["gauge", { gaugeMm: 130 }],
    ["rows", { rowsMm: [70, 340] }],
  ])("the same %s left and right", (_, bolts) => {
    const joints = [buildJoint("left"), buildJoint("right", buildEndPlate({ bolts }))];
    expect(refused(buildNodeCase({ joints }), buildBars())).toMatch(/same rows and gauge left and right/);
  });

  it("a free far flange where the beams' levels differ: half a washer clear of the other plate", () => {
    // The left row stands at 340; M20 washers are 37 mm across.
    const farAt = (levelOffsetMm: number) =>
      buildNodeCase({
        joints: [buildJoint("left"), { ...buildJoint("right"), levelOffsetMm }],
      });
    const bars = buildBars({ levels: ["bottom"], at: "left" });
    // The right plate's top is levelOffset - 90, its bottom levelOffset + 400 + 90.
    const above = 340 + 37 / 2 + 90;
    expect(evaluatedCase(farAt(above), [bars]).joints).toHaveLength(2);
    expect(refused(farAt(above - 0.1), bars)).toMatch(/same rows and gauge/);
    const below = 340 - 37 / 2 - 490;
    expect(evaluatedCase(farAt(below), [bars]).joints).toHaveLength(2);
    expect(refused(farAt(below + 0.1), bars)).toMatch(/same rows and gauge/);
  });

  it("no stiffener at their level", () => {
    expect(refused(buildNodeCase(), buildBars(), buildStiffeners())).toMatch(
      /no bars at the level of a stiffener/,
    );
  });
});
