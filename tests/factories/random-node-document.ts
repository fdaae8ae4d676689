import * as fc from "fast-check";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";

/** Random node documents of ordinary practice with given options of every kind, for the laws that hold on all of them. */
const columns = [
  "HE 200 B",
  "HE 240 B",
  "HE 300 A",
  "HE 300 B",
  "HE 360 B",
  "UC 254x254x107",
  "HE 320 A",
  "IPE 400",
];
const beams = ["IPE 300", "IPE 360", "IPE 400", "IPE 450", "UB 406x178x60"];
const depths: Record<string, number> = {
  "IPE 300": 300,
  "IPE 360": 360,
  "IPE 400": 400,
  "IPE 450": 450,
  "UB 406x178x60": 406.4,
};
const steels = ["S235", "S275", "S355"];
const level = fc.constantFrom("top" as const, "bottom" as const);
const levels = fc
  .constantFrom("top", "bottom", "both")
  .map((which): ("top" | "bottom")[] =>
    which === "both" ? ["top", "bottom"] : which === "top" ? ["top"] : ["bottom"],
  );

/** Which beam's flanges, where they differ in level. */
const at = fc.constantFrom({}, { at: "left" as const }, { at: "right" as const });

const backingPlates = (steel: string): fc.Arbitrary<MeasureInput> =>
  fc
    .record({
      kind: fc.constant("backing-plates" as const),
      levels,
      thickness: fc.constantFrom(6, 10, 15),
      width: fc.constantFrom(60, 75),
      length: fc.constantFrom(160, 250, 400),
      steel: fc.constant(steel),
    })
    .chain((measure) => at.map((where): MeasureInput => ({ ...measure, ...where })));

const diagonals = (steel: string): fc.Arbitrary<MeasureInput> =>
  fc.record({
    kind: fc.constant("diagonal-stiffeners" as const),
    arrangement: fc.constantFrom("single" as const, "cross" as const, "k" as const),
    towards: fc.constantFrom("left" as const, "right" as const),
    thickness: fc.constantFrom(10, 12, 20),
    width: fc.constantFrom(40, 60, 80),
    steel: fc.constant(steel),
    weld: fc.constantFrom(5, 8, "butt" as const),
  });

const webPlate = (steel: string): MeasureInput => ({
  kind: "web-plates",
  sides: 1,
  thickness: 15,
  width: 120,
  height: 1000,
  steel,
  weld: 12,
});

const stiffenerPair = (steel: string, levels: ("top" | "bottom")[]): MeasureInput => ({
  kind: "transverse-stiffeners",
  levels,
  thickness: 12,
  width: 80,
  length: "full",
  clip: 27,
  steel,
  flangeWeld: 6,
  webWeld: 5,
});

const barsAt = (at: "top" | "bottom"): MeasureInput => ({
  kind: "through-bars",
  levels: [at],
  size: "M20",
  grade: "8.8",
  innerNuts: true,
});

/** Two or three measures together. */
const combinationOf = (steel: string): fc.Arbitrary<MeasureInput[]> =>
  fc.oneof(
    levels.map((where) => [webPlate(steel), stiffenerPair(steel, where)]),
    level.map((where) => [webPlate(steel), barsAt(where)]),
    fc.tuple(levels, backingPlates(steel)).map(([where, backing]) => [stiffenerPair(steel, where), backing]),
    backingPlates(steel).map((backing) => [webPlate(steel), backing]),
    fc.tuple(levels, diagonals(steel)).map(([where, brace]) => [stiffenerPair(steel, where), brace]),
    level.map((where) => [
      webPlate(steel),
      stiffenerPair(steel, [where === "top" ? "bottom" : "top"]),
      barsAt(where),
    ]),
  );

const measureOf = (steel: string): fc.Arbitrary<MeasureInput[]> =>
  fc.oneof(
    fc.constant<MeasureInput[]>([]),
    backingPlates(steel).map((measure): MeasureInput[] => [measure]),
    diagonals(steel).map((measure): MeasureInput[] => [measure]),
    combinationOf(steel),
    fc
      .record({
        kind: fc.constant("transverse-stiffeners" as const),
        levels,
        thickness: fc.constantFrom(10, 12, 15, 20),
        width: fc.constantFrom(70, 80, 90),
        length: fc.constantFrom("full" as const, 120),
        clip: fc.constantFrom(25, 30),
        steel: fc.constant(steel),
        flangeWeld: fc.constantFrom(5, 8, "butt" as const),
        webWeld: fc.constantFrom(4, 6),
      })
      .chain((measure) => at.map((where): MeasureInput[] => [{ ...measure, ...where }])),
    fc
      .record({
        kind: fc.constant("web-plates" as const),
        sides: fc.constantFrom(1 as const, 2 as const),
        thickness: fc.constantFrom(12, 15, 20),
        width: fc.constantFrom(120, 130),
        height: fc.constant(1000),
        steel: fc.constant(steel),
        weld: fc.constantFrom(6, 12, "butt" as const),
      })
      .map((measure): MeasureInput[] => [measure]),
    fc
      .record({
        kind: fc.constant("through-bars" as const),
        levels,
        size: fc.constantFrom("M16", "M20", "M24"),
        grade: fc.constantFrom("8.8", "10.9"),
        innerNuts: fc.constant(true),
      })
      .chain((measure) => at.map((where): MeasureInput[] => [{ ...measure, ...where }])),
    fc
      .constantFrom("HE 360 M", "HE 400 B")
      .map((section): MeasureInput[] => [{ kind: "heavier-column", section }]),
    level.map((at): MeasureInput[] => [barsAt(at), stiffenerPair(steel, [at === "top" ? "bottom" : "top"])]),
  );

/** Top and seat angles, alike; the beams' flanges are 150 mm wide or more. */
const cleats = (steel: string, size: string, gauge: number) => ({
  kind: "flange-cleats" as const,
  cleat: { section: "L 150x90x12", steel, length: 170 },
  bolts: { size, grade: "10.9", gauge, distance: 55 },
  beamBolts: { size: "M20", grade: "8.8", rows: [60, 115], gauge: 80 },
  gap: 10,
});

const sideOf = (
  beam: string,
  steel: string,
  kind: "end-plate" | "welded" | "flange-cleats",
  thickness: number,
  size: string,
  gauge: number,
) => {
  const depth = depths[beam] ?? 400;
  const welds = { topFlange: 6, bottomFlange: 6, web: 4 };
  return {
    beam: { section: beam, steel, span: 7000 },
    connection:
      kind === "flange-cleats"
        ? cleats(steel, size, gauge)
        : kind === "welded"
          ? { kind: "welded" as const, welds }
          : {
              kind: "end-plate" as const,
              plate: { steel, thickness, width: 190, extensionTop: 90, extensionBottom: 90 },
              bolts: { size, grade: "10.9", gauge, rows: [-45, 65, depth - 65, depth + 45] },
              welds,
            },
  };
};

/** The right beam like the left one, or of another depth or level: tops or bottoms in line, a step, far apart. */
const rightBeam = (beam: string) =>
  fc.oneof(
    { weight: 3, arbitrary: fc.constant({ beam, levelOffset: 0 }) },
    {
      weight: 2,
      arbitrary: fc
        .constantFrom(...beams)
        .chain((other) =>
          fc
            .constantFrom(0, 30, 60, 150, -150, 700, (depths[beam] ?? 0) - (depths[other] ?? 0))
            .map((levelOffset) => ({ beam: other, levelOffset })),
        ),
    },
  );

const moment = fc.integer({ min: -250, max: 250 });

/** A valid document with one to three given options; about a fifth are welded, half are one-sided. */
export const randomNodeDocument: fc.Arbitrary<NodeDocument> = fc
  .record({
    column: fc.constantFrom(...columns),
    beam: fc.constantFrom(...beams),
    steel: fc.constantFrom(...steels),
    isTwoSided: fc.boolean(),
    kind: fc.constantFrom(
      "welded" as const,
      "flange-cleats" as const,
      "end-plate" as const,
      "end-plate" as const,
      "end-plate" as const,
    ),

    thickness: fc.constantFrom(12, 15, 20, 25),
    size: fc.constantFrom("M16", "M20", "M24"),
    gauge: fc.constantFrom(100, 110),
    isTop: fc.integer({ min: 0, max: 9 }).map((n) => n === 0),
    cases: fc.array(fc.record({ left: moment, right: moment, axial: fc.integer({ min: 0, max: 900 }) }), {
      minLength: 1,
      maxLength: 3,
    }),
  })
  .chain((pick) =>
    fc
      .tuple(rightBeam(pick.beam), fc.array(measureOf(pick.steel), { minLength: 1, maxLength: 3 }))
      .map(([other, measures]): NodeDocument => {
        const right = sideOf(other.beam, pick.steel, pick.kind, pick.thickness, pick.size, pick.gauge);
        const side = sideOf(pick.beam, pick.steel, pick.kind, pick.thickness, pick.size, pick.gauge);
        const actions = (value: number) => ({ moment: value, axialForce: 0, shear: 80 });
        return {
          reference: "random",
          basis: "EN 1993-1-8:2005",
          partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
          column: {
            section: pick.column,
            steel: pick.steel,
            storeyHeight: 3600,
            ...(pick.isTop ? { endDistanceAbove: 120 } : {}),
          },
          left: side,
          ...(pick.isTwoSided ? { right: { ...right, levelOffset: other.levelOffset } } : {}),
          loadCases: pick.cases.map(({ left, right, axial }, index) => ({
            name: `Case ${index + 1}`,
            left: actions(left),
            ...(pick.isTwoSided ? { right: actions(right) } : {}),
            column: { axialForce: axial, momentAbove: 20, momentBelow: -20, shearAbove: 5, shearBelow: -5 },
          })),
          frame: { bracing: "unbraced" },
          target: { utilisation: 1, stiffness: "any" },
          quantity: 4,
          options: measures.map((given, index) => ({
            key: `o${index}`,
            name: `Option ${index}`,
            measures: given,
          })),
        };
      }),
  );
