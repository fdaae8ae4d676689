import { describe, expect, it } from "vitest";
import type { Catalog } from "@/lib/catalog/catalog";
import { checkCatalog } from "@/lib/catalog/check-catalog";
import { CatalogFault } from "@/lib/catalog/compact-table";
import { buildCatalog } from "../../factories/build-node-document";

const withSection = (change: object): unknown => {
  const catalog = buildCatalog();
  return { ...catalog, sections: [{ ...catalog.sections[0], ...change }, ...catalog.sections.slice(1)] };
};

describe("checkCatalog", () => {
  it("accepts the seeded catalogue, complete families and a source in every row", () => {
    const catalog = checkCatalog(buildCatalog());
    const count = (family: string): number => catalog.sections.filter((row) => row.family === family).length;
    expect({ IPE: count("IPE"), A: count("HE A"), B: count("HE B"), M: count("HE M") }).toEqual({
      IPE: 18,
      A: 24,
      B: 24,
      M: 24,
    });
    expect(count("IPE A")).toBe(18);
    expect(count("IPE O")).toBe(13);
    expect(count("UC")).toBeGreaterThanOrEqual(31);
    expect(count("UB")).toBeGreaterThanOrEqual(96);
    const rows = Object.values(catalog).flat() as { source: string }[];
    expect(rows.every((row) => row.source.length > 8)).toBe(true);
  });

  it("has the bolts M12 to M36 and the seven property classes of EN 1993-1-8 Table 3.1", () => {
    const { fasteners, fastenerGrades } = buildCatalog();
    expect(fasteners.map((row) => row.size)).toEqual([
      "M12",
      "M14",
      "M16",
      "M18",
      "M20",
      "M22",
      "M24",
      "M27",
      "M30",
      "M33",
      "M36",
    ]);
    expect(fastenerGrades.map((row) => row.name)).toEqual(["4.6", "4.8", "5.6", "5.8", "6.8", "8.8", "10.9"]);
  });

  /** ISO 898-1: stress area from the mean of pitch and minor diameter, A_s = pi/4 (d - 0.9382 P)^2. */
  it("states stress areas that follow from diameter and pitch", () => {
    for (const row of buildCatalog().fasteners) {
      const expected = (Math.PI / 4) * (row.diameterMm - 0.9382 * row.pitchMm) ** 2;
      expect(Math.abs(row.stressAreaMm2 / expected - 1)).toBeLessThan(0.005);
    }
  });

  /** EN 1090-2 Table 11: clearance 1 mm to M14, 2 mm to M24, 3 mm above. */
  it("states normal round holes", () => {
    for (const { diameterMm, holeMm } of buildCatalog().fasteners) {
      expect(holeMm - diameterMm).toBe(diameterMm <= 14 ? 1 : diameterMm <= 24 ? 2 : 3);
    }
  });

  it("leaves no gap between the thicknesses of a grade, and never lets a thicker piece be stronger", () => {
    const { steels } = buildCatalog();
    const grades = new Set(steels.map((row) => `${row.table}|${row.grade}`));
    expect(grades.size).toBeGreaterThan(20);
    for (const name of grades) {
      const rows = steels.filter((row) => `${row.table}|${row.grade}` === name);
      expect(rows[0]?.overMm).toBe(0);
      rows.slice(1).forEach((row, index) => {
        expect(row.overMm).toBe(rows[index]?.upToMm);
        expect(row.yieldMpa).toBeLessThanOrEqual(rows[index]?.yieldMpa ?? 0);
        expect(row.ultimateMpa).toBeLessThanOrEqual(rows[index]?.ultimateMpa ?? 0);
      });
    }
  });

  it.each([
    ["a row without a source", withSection({ source: "" })],
    ["an unknown field", withSection({ colour: "red" })],
    ["a length of nought", withSection({ webThicknessMm: 0 })],
    ["a family of its own", withSection({ family: "HE Z" })],
    ["flanges that meet", withSection({ flangeThicknessMm: 60 })],
    ["a name twice", withSection({ designation: "IPE 100" })],
  ])("refuses %s", (_, input) => expect(() => checkCatalog(input)).toThrow(CatalogFault));

  it("refuses a steel with an empty range and a missing list", () => {
    const catalog: Catalog = buildCatalog();
    const [first, ...rest] = catalog.steels;
    expect(() => checkCatalog({ ...catalog, steels: [{ ...first, overMm: 20 }, ...rest] })).toThrow(
      /empty range/,
    );
    expect(() => checkCatalog({ ...catalog, angles: undefined })).toThrow(CatalogFault);
  });

  it("accepts a shop that keeps no plates", () => {
    expect(checkCatalog({ ...buildCatalog(), stockPlates: [] }).stockPlates).toEqual([]);
  });
});
