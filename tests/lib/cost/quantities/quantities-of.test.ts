/** Guards the geometry behind the estimate by hand-written sums: plates, runs, holes, bars and the column's share of a lift. */
import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { quantitiesOf } from "@/lib/cost";
import type { DriverName, QuantityRecord } from "@/lib/cost/drivers";
import { boltMassKg, nutMassKg, washerMassKg } from "@/lib/cost/quantities/fastener-mass";
import { sectionMassKgPerM, sectionPerimeterMm } from "@/lib/cost/quantities/column-piece";
import { handlingPlans } from "@/lib/cost/quantities/handling";
import { sectionProperties } from "@/lib/calc/mechanics/section-properties";
import {
  backingPlates,
  buildFabrication,
  buildNode,
  diagonals,
  fillet,
  heavierColumn,
  HE_300_A,
  HE_300_B,
  IPE_450,
  M24,
  stiffeners,
  throughBars,
  webPlates,
} from "@/tests/factories/build-cost-case";

const RHO = 7850e-9;
const take = (measures: readonly MeasureCase[], sides: readonly ("left" | "right")[] = ["left", "right"]) =>
  quantitiesOf(buildNode(sides), measures, buildFabrication());

function records<D extends DriverName>(
  measures: readonly MeasureCase[],
  driver: D,
  sides?: readonly ("left" | "right")[],
) {
  return take(measures, sides).records.filter(
    (record): record is Extract<QuantityRecord, { driver: D }> => record.driver === driver,
  );
}
function only<D extends DriverName>(
  measures: readonly MeasureCase[],
  driver: D,
  sides?: readonly ("left" | "right")[],
) {
  const [first, ...others] = records(measures, driver, sides);
  if (first === undefined || others.length > 0)
    throw new Error(`One ${driver} record was expected, there are ${others.length + (first ? 1 : 0)}.`);
  return first.values as Extract<QuantityRecord, { driver: D }>["values"];
}
const runsOn = (measures: readonly MeasureCase[], on: "web" | "flange") =>
  take(measures).weldRuns.filter((run) => run.on === on);
const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const CLEAR = 290 - 2 * 14;

describe("transverse stiffeners", () => {
  it("of full depth: four plates at two levels, flange to flange, two clips each", () => {
    const plate = only([stiffeners()], "plate");
    expect(plate.parts).toBe(4);
    expect(plate.corners).toBe(8);
    expect(plate.cutM).toBeCloseTo((4 * 2 * (CLEAR + 120)) / 1000, 9);
    expect(plate.massKg).toBeCloseTo(4 * (CLEAR * 120 - (2 * (30 * 30)) / 2) * 12 * RHO, 9);
    expect(plate.areaM2).toBeCloseTo((4 * 2 * (CLEAR * 120 - 30 * 30)) / 1e6, 9);
  });

  it("are welded on both faces along web and flanges, short of the clips", () => {
    const [web] = runsOn([stiffeners()], "web");
    const [flange] = runsOn([stiffeners()], "flange");
    expect([web?.runs, flange?.runs]).toEqual([8, 16]);
    expect(web?.lengthM).toBeCloseTo((8 * (CLEAR - 2 * 30)) / 1000, 9);
    expect(flange?.lengthM).toBeCloseTo((16 * (120 - 30)) / 1000, 9);
    expect([web?.thickestMm, flange?.thickestMm]).toEqual([12, 14]);
  });

  it("of partial depth stand at each joint's own flange with one clip and one flange end", () => {
    const partial = stiffeners({ length: 120, levels: ["top"] });
    expect(only([partial], "plate").parts).toBe(4);
    expect(only([partial], "plate", ["left"]).parts).toBe(2);
    expect(only([partial], "plate", ["left"]).corners).toBe(2);
    const [flange] = take([partial], ["left"]).weldRuns.filter((run) => run.on === "flange");
    expect(flange?.runs).toBe(4);
  });

  it("with butt welds have their edges bevelled, one run an edge", () => {
    const butt = stiffeners({ flangeWeld: { kind: "butt" } });
    const bevel = only([butt], "bevel-edge");
    expect(bevel.edges).toBe(8);
    expect(bevel.lengthM).toBeCloseTo((8 * (120 - 30)) / 1000, 9);
    const [flange] = runsOn([butt], "flange");
    expect([flange?.type, flange?.sizeMm, flange?.runs]).toEqual(["butt", 12, 8]);
  });
});

describe("diagonal stiffeners", () => {
  const whole = Math.hypot(CLEAR, 450 - 14.6);
  it("run from level to level, one each side of the web", () => {
    const plate = only([diagonals()], "plate");
    expect(plate.parts).toBe(2);
    expect(plate.cutM).toBeCloseTo((2 * 2 * (whole + 120)) / 1000, 9);
  });

  it("in a cross: one through, one in two pieces, each side", () => {
    const parts = records([diagonals({ arrangement: "cross" })], "plate").map(
      (record) => record.values.parts,
    );
    expect(parts).toEqual([2, 4]);
  });

  it("in a K: two each side to half the height", () => {
    const plate = only([diagonals({ arrangement: "k" })], "plate");
    expect(plate.parts).toBe(4);
    expect(plate.cutM).toBeCloseTo((4 * 2 * (Math.hypot(CLEAR, (450 - 14.6) / 2) + 120)) / 1000, 9);
  });

  it("leave a restricted gun angle at the flanges", () => {
    expect(runsOn([diagonals()], "flange").map((run) => run.gunAngle)).toEqual(["restricted"]);
    expect(runsOn([diagonals()], "web").map((run) => run.gunAngle)).toEqual(["free"]);
  });
});

describe("web plates", () => {
  it("are welded all round, on one face or two", () => {
    const lengths = (sides: 1 | 2) => sum(take([webPlates({ sides })]).weldRuns.map((run) => run.lengthM));
    expect(lengths(1)).toBeCloseTo((2 * (200 + 700)) / 1000, 9);
    expect(lengths(2)).toBeCloseTo(2 * lengths(1), 9);
    expect([
      take([webPlates({ sides: 1 })]).facesWelded,
      take([webPlates({ sides: 2 })]).facesWelded,
    ]).toEqual([1, 2]);
  });

  it("with butt welds bevel the long edges and fillet the ends with a leg of the thickness", () => {
    const { weldRuns } = take([webPlates({ weld: { kind: "butt" } })]);
    expect(weldRuns.map((run) => [run.type, run.lengthM])).toEqual([
      ["butt", 1.4],
      ["fillet", 0.4],
    ]);
    expect(weldRuns[1]?.sizeMm).toBeCloseTo(10 / Math.SQRT2, 12);
    expect(only([webPlates({ weld: { kind: "butt" } })], "bevel-edge").edges).toBe(2);
  });

  it("hide one face", () => {
    expect(only([webPlates()], "plate").areaM2).toBeCloseTo((200 * 700) / 1e6, 9);
    expect(only([webPlates()], "plate").overlapCm2).toBe((200 * 700) / 100);
  });
});

describe("stiffeners on web plates", () => {
  it("are narrower by the plate on each side that has one, and weld less to the flange", () => {
    const massOf = (measures: readonly MeasureCase[]) =>
      records(measures, "plate")
        .filter((record) => record.values.partType === "transverse-stiffener")
        .reduce((sum, record) => sum + record.values.massKg, 0);
    const alone = stiffeners();
    const clear = 290 - 2 * 14;
    const less = (pieces: number, plateMm: number) => pieces * RHO * alone.thicknessMm * plateMm * clear;
    const one = webPlates({ sides: 1 });
    const levels = alone.levels.length;
    expect(massOf([alone]) - massOf([one, alone])).toBeCloseTo(less(levels, one.thicknessMm), 9);
    const two = webPlates({ sides: 2 });
    expect(massOf([alone]) - massOf([two, alone])).toBeCloseTo(less(2 * levels, two.thicknessMm), 9);
  });
});

describe("backing plates", () => {
  it("lie each side of the web behind each bolted flange, drilled for the rows of their level", () => {
    expect(records([backingPlates()], "plate").map((record) => record.values.parts)).toEqual([2, 2]);
    // Two rows of two at the top, one at the bottom.
    expect(records([backingPlates()], "hole").map((record) => record.values.holes)).toEqual([4, 4]);
    expect(
      records([backingPlates({ levels: ["bottom"] })], "hole").map((record) => record.values.holes),
    ).toEqual([2, 2]);
    expect(take([backingPlates()]).weldRuns).toEqual([]);
  });

  it("are parted in two by a stiffener at their level, and left out where no side is named", () => {
    const parted = records([stiffeners({ levels: ["top"] }), backingPlates()], "plate").slice(1);
    expect(parted.map((record) => record.values.parts)).toEqual([4, 4]);
    const whole = records([backingPlates()], "plate");
    expect(parted[0]?.values.massKg).toBeCloseTo(whole[0]?.values.massKg ?? NaN, 9);
    expect(records([backingPlates({ at: "left" })], "plate")).toHaveLength(1);
  });
});

describe("through bars", () => {
  it("replace the bolts of the rows at their level, on every bolted side", () => {
    const bar = only([throughBars()], "bar");
    expect([bar.bars, bar.outerNuts, bar.innerNuts, bar.washers, bar.ends]).toEqual([4, 8, 8, 16, 8]);
    expect(records([throughBars()], "bolt-saved").map((record) => record.values.bolts)).toEqual([-4, -4]);
    expect(only([throughBars({ levels: ["top", "bottom"] })], "bar").bars).toBe(6);
    expect(only([throughBars({ innerNuts: false })], "bar").innerNuts).toBe(0);
  });

  it("reach through both flanges and plates, with washer, nut and thread at each end", () => {
    const end = 4 + 21.5 + 0.17 * 24;
    expect(only([throughBars()], "bar").lengthM).toBeCloseTo((4 * (290 + 2 * 20 + 2 * end)) / 1000, 9);
    expect(only([throughBars()], "bar", ["left"]).lengthM).toBeCloseTo((4 * (290 + 20 + 2 * end)) / 1000, 9);
  });

  it("of a one-sided node are drilled through the far flange", () => {
    const hole = only([throughBars()], "hole", ["left"]);
    expect([hole.through, hole.holes, hole.thicknessMm, hole.diameterMm]).toEqual(["section", 4, 14, 26]);
    expect(records([throughBars()], "hole")).toEqual([]);
  });

  it("take as much mass off in bolts as those weigh", () => {
    const { masses } = take([throughBars()]);
    expect(masses.bolt).toBeCloseTo(-8 * boltMassKg(M24, 20 + 14), 9);
    expect(masses.nut).toBeCloseTo((16 - 8) * nutMassKg(M24), 9);
    expect(masses.washer).toBeCloseTo((16 - 2 * 8) * washerMassKg(M24), 9);
  });

  it("weigh fasteners close to the trade's lists: M24 nut 0.11 kg, washer 0.032 kg (from memory)", () => {
    expect(nutMassKg(M24)).toBeGreaterThan(0.09);
    expect(nutMassKg(M24)).toBeLessThan(0.13);
    expect(washerMassKg(M24)).toBeGreaterThan(0.028);
    expect(washerMassKg(M24)).toBeLessThan(0.036);
  });
});

describe("a heavier column", () => {
  it("weighs its area times density: HE 300 A 88.3 kg/m, HE 300 B 117 kg/m (EN 10365)", () => {
    expect(sectionMassKgPerM(HE_300_A)).toBeCloseTo(88.3, 0);
    expect(sectionMassKgPerM(HE_300_B)).toBeCloseTo(117, 0);
  });

  it("has the painted surface of its outline: HE 300 A 1.717 m2/m, IPE 450 1.605 m2/m (handbook tables, from memory)", () => {
    expect(sectionPerimeterMm(HE_300_A) / 1000).toBeCloseTo(1.717, 2);
    expect(sectionPerimeterMm(IPE_450) / 1000).toBeCloseTo(1.605, 2);
  });

  it("counts the whole lift, shared by its nodes", () => {
    const share = 10.8 / 3;
    const difference = sectionProperties(HE_300_B).areaMm2 - sectionProperties(HE_300_A).areaMm2;
    expect(only([heavierColumn()], "column").massKg).toBeCloseTo(difference * 1000 * RHO * share, 9);
    expect(only([heavierColumn()], "column").lengthM).toBeCloseTo(share, 9);
  });

  it("needs no detail of its own", () => {
    expect(records([heavierColumn()], "detail")).toEqual([]);
    expect(only([heavierColumn(), stiffeners(), throughBars()], "detail").details).toBe(2);
  });
});

describe("weld metal", () => {
  it("is a squared for a fillet and half the depth squared for a bevel, over all runs", () => {
    const fillets =
      sum(take([webPlates({ weld: fillet(6) })]).weldRuns.map((run) => run.lengthM * 1000)) * 36 * RHO;
    expect(take([webPlates({ weld: fillet(6) })]).masses["weld-metal"]).toBeCloseTo(fillets, 12);
    const butt = (1400 * 10 ** 2) / 2 + (400 * 10 ** 2) / 2;
    expect(take([webPlates({ weld: { kind: "butt" } })]).masses["weld-metal"]).toBeCloseTo(butt * RHO, 12);
  });
});

describe("the ways to handle the column", () => {
  const positions = (key: "vertical-up" | "turned") =>
    handlingPlans(take([stiffeners()]), 1)
      .find((plan) => plan.key === key)
      ?.records.map((record) =>
        record.driver === "turn"
          ? record.values.turns
          : record.driver === "fillet-weld"
            ? record.values.position
            : record.driver,
      );

  it("are upright runs at the flanges with one turn, or everything horizontal with three", () => {
    expect(positions("vertical-up")).toEqual(["PB", "PF", 1]);
    expect(positions("turned")).toEqual(["PB", "PB", 3]);
  });

  it("are one where nothing is welded to a flange, and none where nothing is welded", () => {
    expect(handlingPlans(take([webPlates()]), 1).map((plan) => plan.key)).toEqual(["vertical-up"]);
    expect(handlingPlans(take([throughBars()]), 1)).toEqual([]);
  });
});
