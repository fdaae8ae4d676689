import { describe, expect, it } from "vitest";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { Connection } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "../../factories/build-node-document";

type Cleats = Extract<Connection, { kind: "flange-cleats" }>;

const CLEATS: Cleats = {
  kind: "flange-cleats",
  cleat: { section: "L 150x90x12", steel: "S275", length: 180 },
  bolts: { size: "M20", grade: "8.8", gauge: 100, distance: 60 },
  beamBolts: { size: "M20", grade: "8.8", rows: [60, 120], gauge: 90 },
  gap: 10,
  webCleats: {
    section: "L 90x90x8",
    steel: "S275",
    length: 230,
    bolts: { size: "M20", grade: "8.8", rows: [50] },
    beamBolts: { size: "M20", grade: "8.8", rows: [50] },
  },
};

function errorsOf(change: Partial<Cleats>): readonly { path: string; message: string }[] {
  const document = buildNodeDocument({ left: buildSide({ connection: { ...CLEATS, ...change } }) });
  const resolved = resolveNodeCase(document, buildCatalog());
  return resolved.ok ? [] : resolved.errors;
}

describe("flange cleats", () => {
  it("are resolved to dimensions, strengths and bolts", () => {
    const resolved = resolveNodeCase(
      buildNodeDocument({ left: buildSide({ connection: CLEATS }) }),
      buildCatalog(),
    );
    const connection = resolved.ok ? resolved.node.joints[0]?.connection : undefined;
    if (connection?.kind !== "flange-cleats") throw new Error("The sample has cleats.");
    // The hole at 120 mm does not fit on a leg of 90 mm, so the leg of 150 mm lies along the beam.
    expect(connection.cleat).toMatchObject({
      columnLegMm: 90,
      beamLegMm: 150,
      thicknessMm: 12,
      lengthMm: 180,
    });
    expect(connection.bolts).toMatchObject({ distanceMm: 60, gaugeMm: 100, size: { name: "M20" } });
    expect(connection.beamBolts).toMatchObject({ rowsMm: [60, 120], gaugeMm: 90 });
    expect(connection.webCleats).toEqual({ legMm: 90, thicknessMm: 8, lengthMm: 230 });
    expect(connection.gapMm).toBe(10);
  });

  it("lie with the longer leg on the column where that has the farther hole", () => {
    const document = buildNodeDocument({
      left: buildSide({
        connection: {
          ...CLEATS,
          bolts: { ...CLEATS.bolts, distance: 110 },
          beamBolts: { ...CLEATS.beamBolts, rows: [55] },
        },
      }),
    });
    const resolved = resolveNodeCase(document, buildCatalog());
    expect(resolved.ok && resolved.node.joints[0]?.connection).toMatchObject({
      cleat: { columnLegMm: 150, beamLegMm: 90 },
    });
  });

  it("have every unknown name told at its path", () => {
    const web = CLEATS.webCleats;
    if (!web) throw new Error("The sample has web cleats.");
    const errors = errorsOf({
      cleat: { ...CLEATS.cleat, section: "L 1x1x1" },
      bolts: { ...CLEATS.bolts, grade: "9.9" },
      beamBolts: { ...CLEATS.beamBolts, size: "M11" },
      webCleats: { ...web, steel: "S999", bolts: { ...web.bolts, size: "M13" } },
    });
    expect(errors.map((error) => error.path).sort()).toEqual([
      "left.connection.beamBolts.size",
      "left.connection.bolts.grade",
      "left.connection.cleat.section",
      "left.connection.webCleats.bolts.size",
      "left.connection.webCleats.steel",
    ]);
  });

  it.each<[string, Partial<Cleats>, string, RegExp]>([
    [
      "a hole past the leg",
      { bolts: { ...CLEATS.bolts, distance: 139 } },
      "bolts.distance",
      /passes the end of the 150 mm leg/,
    ],
    [
      "a hole in the other leg",
      { bolts: { ...CLEATS.bolts, distance: 23 } },
      "bolts.distance",
      /meets the other leg/,
    ],
    [
      "a beam bolt past the leg",
      { beamBolts: { ...CLEATS.beamBolts, rows: [60, 140] } },
      "beamBolts.rows.1",
      /passes the end/,
    ],
    [
      "a gauge past the cleat",
      { bolts: { ...CLEATS.bolts, gauge: 158 } },
      "bolts.gauge",
      /180 mm long cleat/,
    ],
  ])("refuse %s", (_, change, path, message) => {
    const errors = errorsOf(change);
    expect(errors.map((error) => error.path)).toEqual([`left.connection.${path}`]);
    expect(errors[0]?.message).toMatch(message);
  });
});
