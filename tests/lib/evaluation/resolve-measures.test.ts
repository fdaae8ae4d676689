import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { describeMeasures, resolveMeasures } from "@/lib/evaluation/resolve-measures";
import type { MeasureInput } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "../../factories/build-node-document";

const STIFFENERS: MeasureInput = {
  kind: "transverse-stiffeners",
  levels: ["top", "bottom"],
  thickness: 12,
  width: 140,
  length: "full",
  clip: 30,
  steel: "S355",
  flangeWeld: 6,
  webWeld: 5,
};

const EVERY_KIND: readonly MeasureInput[] = [
  STIFFENERS,
  {
    ...STIFFENERS,
    levels: ["bottom"],
    length: 150,
    steel: { fy: 300, fu: 420, betaW: 0.9 },
    flangeWeld: "butt",
  },
  {
    kind: "diagonal-stiffeners",
    arrangement: "single",
    towards: "left",
    thickness: 12,
    width: 140,
    steel: "S355",
    weld: 6,
  },
  { kind: "web-plates", sides: 2, thickness: 10, width: 208, height: 600, steel: "S355", weld: "butt" },
  { kind: "backing-plates", levels: ["top"], thickness: 15, width: 120, length: 200, steel: "S275" },
  {
    kind: "backing-plates",
    levels: ["bottom"],
    at: "left",
    thickness: 15,
    width: 120,
    length: 200,
    steel: "S275",
  },
  { kind: "through-bars", levels: ["top"], size: "M24", grade: "8.8", innerNuts: true },
  { kind: "heavier-column", section: "HE 300 B" },
  { kind: "heavier-column", section: { h: 320, b: 300, tw: 14, tf: 24, weld: 6 } },
];

const resolve = (measures: readonly MeasureInput[], document = buildNodeDocument()) =>
  resolveMeasures(measures, document, buildCatalog(), "options.2.measures");

function casesOf(measures: readonly MeasureInput[]): readonly MeasureCase[] {
  const resolved = resolve(measures);
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.measures;
}

const errorsOf = (...measures: MeasureInput[]) => {
  const resolved = resolve(measures);
  return resolved.ok ? [] : resolved.errors;
};

describe("resolveMeasures", () => {
  it("gives every plate the strength of its own thickness", () => {
    const [thin, thick] = casesOf([STIFFENERS, { ...STIFFENERS, thickness: 20 }]);
    expect(thin?.kind === "transverse-stiffeners" && thin.steel.yieldMpa).toBe(355);
    expect(thick?.kind === "transverse-stiffeners" && thick.steel.yieldMpa).toBe(345);
  });

  it("gives a heavier column the column's grade at the new flange thickness", () => {
    const [measure] = casesOf([{ kind: "heavier-column", section: "HE 300 M" }]);
    expect(measure).toMatchObject({
      section: { designation: "HE 300 M" },
      steel: { grade: "S355", yieldMpa: 345 },
    });
  });

  it("looks bars up", () => {
    const [measure] = casesOf([
      { kind: "through-bars", levels: ["top"], size: "M24", grade: "8.8", innerNuts: true },
    ]);
    expect(measure).toMatchObject({
      size: { name: "M24", stressAreaMm2: 353 },
      grade: { name: "8.8", ultimateMpa: 800 },
    });
  });

  it("tells every unknown name at its path", () => {
    const errors = errorsOf(
      { ...STIFFENERS, steel: "S999" },
      { kind: "through-bars", levels: ["top"], size: "M11", grade: "9.9", innerNuts: true },
      { kind: "heavier-column", section: "HE 305 A" },
    );
    expect(errors.map((error) => error.path)).toEqual([
      "options.2.measures.0.steel",
      "options.2.measures.1.size",
      "options.2.measures.1.grade",
      "options.2.measures.2.section",
    ]);
  });

  it.each<[MeasureInput, string, RegExp]>([
    [{ ...STIFFENERS, clip: 140 }, "clip", /takes the whole width/],
    [{ ...STIFFENERS, length: 263 }, "length", /longer than the 262 mm between the column flanges/],
    [{ ...STIFFENERS, length: 30 }, "length", /takes the whole length/],
    [
      { kind: "web-plates", sides: 1, thickness: 10, width: 263, height: 600, steel: "S355", weld: 6 },
      "width",
      /wider than the 262 mm/,
    ],
    [
      { kind: "backing-plates", levels: ["top"], thickness: 15, width: 146, length: 200, steel: "S355" },
      "width",
      /wider than the 145.8 mm/,
    ],
    [
      { kind: "heavier-column", section: { h: 40, b: 300, tw: 14, tf: 24, r: 5 } },
      "section.tf",
      /leave no web/,
    ],
  ])("refuses %j, which cannot be built", (measure, field, message) => {
    const errors = errorsOf(measure).filter((error) => error.path === `options.2.measures.0.${field}`);
    expect(errors).toHaveLength(1);
    expect(errors[0]?.message).toMatch(message);
  });

  it("measures the room in the heavier column where the option has one", () => {
    const plate: MeasureInput = { ...STIFFENERS, length: 300 };
    expect(errorsOf(plate)).toHaveLength(1);
    expect(errorsOf(plate, { kind: "heavier-column", section: "HE 400 A" })).toEqual([]);
  });

  it("says nothing of a column that resolveNodeCase refuses", () => {
    const document = buildNodeDocument({ column: { ...buildNodeDocument().column, section: "HE 1 A" } });
    expect(resolve([STIFFENERS], document).ok).toBe(true);
  });
});

describe("describeMeasures", () => {
  it("states every kind as a document does, and reads back to the same", () => {
    const cases = casesOf(EVERY_KIND);
    expect(describeMeasures(cases)).toEqual(EVERY_KIND);
    expect(casesOf(describeMeasures(cases))).toEqual(cases);
  });
});
