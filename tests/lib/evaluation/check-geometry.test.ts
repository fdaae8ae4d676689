import { describe, expect, it } from "vitest";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "../../factories/build-node-document";

type Side = ReturnType<typeof buildSide>;
type EndPlate = Extract<Side["connection"], { kind: "end-plate" }>;
type Column = NodeDocument["column"];

interface Change {
  readonly bolts?: Partial<EndPlate["bolts"]>;
  readonly plate?: Partial<EndPlate["plate"]>;
  readonly welds?: Partial<EndPlate["welds"]>;
  readonly beam?: Partial<Side["beam"]>;
  readonly column?: Partial<Column>;
}

/** The sample: IPE 450 (450 x 190 x 9.4 x 14.6), plate 200 wide with 90 above and 30 below, M24 (hole 26), HE 300 A. */
function errorsOf(change: Change): readonly { path: string; message: string }[] {
  const side = buildSide();
  if (side.connection.kind !== "end-plate") throw new Error("The sample has an end plate.");
  const connection: EndPlate = {
    ...side.connection,
    bolts: { ...side.connection.bolts, ...change.bolts },
    plate: { ...side.connection.plate, ...change.plate },
    welds: { ...side.connection.welds, ...change.welds },
  };
  const document = buildNodeDocument({
    column: { ...buildNodeDocument().column, ...change.column },
    left: { beam: { ...side.beam, ...change.beam }, connection },
  });
  const resolved = resolveNodeCase(document, buildCatalog());
  return resolved.ok ? [] : resolved.errors;
}

const custom = { h: 300, b: 300, tw: 10, tf: 15, r: 20 };

describe("checkGeometry", () => {
  it("accepts the sample", () => expect(errorsOf({})).toEqual([]));

  it.each<[string, Change, string, RegExp]>([
    [
      "flanges that meet",
      { column: { section: { ...custom, tf: 150 } } },
      "column.section.tf",
      /leave no web in a depth of 300 mm/,
    ],
    [
      "roots that meet",
      { column: { section: { ...custom, r: 135 } } },
      "column.section.r",
      /root radius leaves no straight web/,
    ],
    [
      "welds that meet",
      { column: { section: { h: 60, b: 300, tw: 10, tf: 15, weld: 11 } } },
      "column.section.weld",
      /weld leaves no straight web/,
    ],
    [
      "a web as wide as the flange",
      { beam: { section: { ...custom, tw: 300 } } },
      "left.beam.section.tw",
      /web \(300 mm\) is as wide as the flange \(300 mm\)/,
    ],
    [
      "a root past the flange",
      { beam: { section: { h: 500, b: 40, tw: 10, tf: 15, r: 15 } } },
      "left.beam.section.r",
      /root radius reaches past the edge/,
    ],
    [
      "a weld past the flange",
      { beam: { section: { h: 500, b: 20, tw: 10, tf: 15, weld: 4 } } },
      "left.beam.section.weld",
      /weld reaches past the edge/,
    ],
    [
      "holes past the plate's edge",
      { bolts: { gauge: 174 } },
      "left.connection.bolts.gauge",
      /pass the edge of the plate \(200 mm wide\)/,
    ],
    [
      "holes past the column flange",
      { bolts: { gauge: 274 }, plate: { width: 320 } },
      "left.connection.bolts.gauge",
      /pass the edge of the column flange \(300 mm wide\)/,
    ],
    [
      "holes in the column's root",
      { bolts: { gauge: 77 } },
      "left.connection.bolts.gauge",
      /column web or its root: more than 77.7 mm/,
    ],
    [
      "holes in the beam's web welds",
      { bolts: { gauge: 49 }, column: { section: { ...custom, tw: 6, r: 5 } } },
      "left.connection.bolts.gauge",
      /beam web or its welds: more than 49.5 mm/,
    ],
    [
      "a row above the plate",
      { bolts: { rows: [-77, 65, 385] } },
      "left.connection.bolts.rows.0",
      /Row 1 at -77 mm: its hole passes the top/,
    ],
    [
      "a row below the plate",
      { bolts: { rows: [-45, 65, 467] } },
      "left.connection.bolts.rows.2",
      /Row 3 at 467 mm: its hole passes the bottom/,
    ],
    [
      "a row in the top flange's weld",
      { bolts: { rows: [-24, 65, 385] } },
      "left.connection.bolts.rows.0",
      /runs into the beam's top flange or its weld/,
    ],
    [
      "a row in the bottom flange's weld",
      { bolts: { rows: [-45, 65, 415] } },
      "left.connection.bolts.rows.2",
      /runs into the beam's bottom flange or its weld/,
    ],
    [
      "rows that overlap",
      { bolts: { rows: [65, 91, 385] } },
      "left.connection.bolts.rows.1",
      /Row 2 is 26 mm below row 1: holes of 26 mm run into each other/,
    ],
    [
      "rows of four without their outer gauge",
      { bolts: { perRow: 4 } },
      "left.connection.bolts.outerGauge",
      /need the distance between the two outer ones/,
    ],
    [
      "outer holes in the inner ones",
      { bolts: { perRow: 4, outerGauge: 170 }, plate: { width: 290 } },
      "left.connection.bolts.outerGauge",
      /run into the inner ones/,
    ],
    [
      "outer holes off the plate",
      { bolts: { perRow: 4, outerGauge: 175 } },
      "left.connection.bolts.outerGauge",
      /pass the edge of the plate or of the column flange/,
    ],
    [
      "a stiffener without an extension at the top",
      {
        plate: { extensionTop: 0, stiffener: { top: { thickness: 10, length: 100 } } },
        bolts: { rows: [65, 385] },
      },
      "left.connection.plate.stiffener.top",
      /no extension at the top/,
    ],
    [
      "a stiffener without an extension at the bottom",
      { plate: { extensionBottom: 0, stiffener: { bottom: { thickness: 10, length: 100 } } } },
      "left.connection.plate.stiffener.bottom",
      /no extension at the bottom/,
    ],
    [
      "a span inside the column",
      { beam: { span: 290 } },
      "left.beam.span",
      /ends inside the column \(290 mm deep\)/,
    ],
    [
      "a storey lower than its beam",
      { column: { storeyHeight: 450 } },
      "column.storeyHeight",
      /no room for beams that take 450 mm/,
    ],
    [
      "a column that ends below a row",
      { column: { endDistanceAbove: 58 } },
      "left.connection.bolts.rows.0",
      /Row 1 lies above the column's upper end/,
    ],
    [
      "a column that ends above a row",
      { column: { endDistanceBelow: 5 }, plate: { extensionBottom: 90 }, bolts: { rows: [-45, 65, 495] } },
      "left.connection.bolts.rows.2",
      /Row 3 lies below the column's lower end/,
    ],
  ])("refuses %s", (_, change, path, message) => {
    const errors = errorsOf(change);
    expect(errors.map((error) => error.path)).toEqual([path]);
    expect(errors[0]?.message).toMatch(message);
  });

  /** Each change above, one step less. */
  it.each<[string, Change]>([
    ["a hole just on the plate", { bolts: { gauge: 173 } }],
    ["a hole just clear of the root", { bolts: { gauge: 78 } }],
    ["a row just on the plate", { bolts: { rows: [-76, 65, 385] } }],
    ["a row just clear of the weld", { bolts: { rows: [-25, 65, 385] } }],
    ["rows just apart", { bolts: { rows: [65, 92, 385] } }],
    ["four bolts in a row", { bolts: { perRow: 4, outerGauge: 173, gauge: 100 } }],
    ["butt welds, which leave no leg", { welds: { topFlange: "butt" }, bolts: { rows: [-14, 65, 385] } }],
    [
      "a row outside the beam, which has no web beside it",
      { bolts: { rows: [-45], gauge: 49 }, column: { section: { ...custom, tw: 6, r: 5 } } },
    ],
  ])("accepts %s", (_, change) => expect(errorsOf(change)).toEqual([]));

  it("tells every fault at once", () => {
    const errors = errorsOf({
      bolts: { rows: [-80, 10, 385], gauge: 180 },
      column: { storeyHeight: 400 },
      beam: { span: 200 },
    });
    expect(errors.map((error) => error.path).sort()).toEqual([
      "column.storeyHeight",
      "left.beam.span",
      "left.connection.bolts.gauge",
      "left.connection.bolts.rows.0",
      "left.connection.bolts.rows.1",
    ]);
  });

  it("measures a column's end from the nearest beam", () => {
    const [loadCase] = buildNodeDocument().loadCases;
    if (!loadCase) throw new Error("The sample has a load case.");
    const actions = { moment: 10, axialForce: 0, shear: 0 };
    const document = (levelOffset: number): NodeDocument =>
      buildNodeDocument({
        column: { ...buildNodeDocument().column, endDistanceAbove: 60 },
        right: { ...buildSide(), levelOffset },
        loadCases: [{ ...loadCase, right: actions }],
      });
    expect(resolveNodeCase(document(-50), buildCatalog()).ok).toBe(true);
    expect(resolveNodeCase(document(50), buildCatalog()).ok).toBe(true);
    const low = { ...document(-50), column: { ...document(-50).column, endDistanceAbove: 50 } };
    const resolved = resolveNodeCase(low, buildCatalog());
    expect(resolved.ok ? [] : resolved.errors.map((error) => error.path)).toEqual([
      "right.connection.bolts.rows.0",
    ]);
  });
});
