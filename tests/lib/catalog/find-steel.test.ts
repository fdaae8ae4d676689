import { describe, expect, it } from "vitest";
import { betaWOf, findSteel, gradeKeys, gradeNames, type StrengthTable } from "@/lib/catalog/find-steel";
import { buildCatalog } from "../../factories/build-node-document";

const strength = (grade: string, thicknessMm: number, table: StrengthTable = "product-standard") => {
  const answer = findSteel(buildCatalog(), grade, thicknessMm, table);
  return answer.kind === "found" ? [answer.row.yieldMpa, answer.row.ultimateMpa, answer.betaW] : answer;
};

describe("findSteel", () => {
  /** EN 10025-2:2004 Table 7: the steps at 16, 40 and 63 mm; least ultimate strengths 360, 410, 470. */
  it.each([
    ["S235", 16, [235, 360, 0.8]],
    ["S275", 16, [275, 410, 0.85]],
    ["S275", 16.1, [265, 410, 0.85]],
    ["S275", 40, [265, 410, 0.85]],
    ["S355", 10, [355, 470, 0.9]],
    ["S355", 40, [345, 470, 0.9]],
    ["S355", 40.5, [335, 470, 0.9]],
    ["S355J2+N", 20, [345, 470, 0.9]],
    ["s355 jr", 20, [345, 470, 0.9]],
    ["S355NL", 20, [345, 470, 0.9]],
    ["S460M", 12, [460, 540, 1]],
    ["S460ML", 20, [440, 540, 1]],
    ["S420N", 12, [420, 520, 1]],
    ["S460", 12, [460, 550, 1]],
  ])("%s at %d mm", (grade, thicknessMm, expected) => expect(strength(grade, thicknessMm)).toEqual(expected));

  /** EN 1993-1-1:2005 with AC:2009, Table 3.1: one value to 40 mm. */
  it.each([
    ["S235", 30, [235, 360, 0.8]],
    ["S275", 30, [275, 430, 0.85]],
    ["S355", 40, [355, 490, 0.9]],
    ["S355", 60, [335, 470, 0.9]],
    ["S460", 30, [460, 540, 1]],
  ])("Table 3.1: %s at %d mm", (grade, thicknessMm, expected) =>
    expect(strength(grade, thicknessMm, "en1993-1-1-table-3.1")).toEqual(expected),
  );

  it("tells a thickness beyond the table from a grade nobody knows", () => {
    expect(strength("S355", 90, "en1993-1-1-table-3.1")).toEqual({
      kind: "too-thick",
      grade: "S355",
      upToMm: 80,
    });
    expect(strength("S355", 251)).toEqual({ kind: "too-thick", grade: "S355", upToMm: 250 });
    expect(strength("S999", 10)).toEqual({ kind: "unknown-grade" });
    expect(strength("steel", 10)).toEqual({ kind: "unknown-grade" });
  });

  it("lists each grade once", () => {
    const names = gradeNames(buildCatalog(), "product-standard");
    expect(new Set(names).size).toBe(names.length);
    expect(names).toEqual(expect.arrayContaining(["S235", "S275", "S355", "S355N", "S460M"]));
  });
});

describe("gradeKeys", () => {
  it("keeps the kinds of delivery apart that have strengths of their own", () => {
    expect(gradeKeys("S355K2")).toEqual(["S355"]);
    expect(gradeKeys("S355ML")).toEqual(["S355M"]);
    expect(gradeKeys("S355")).toEqual(["S355", "S355N"]);
    expect(gradeKeys("355")).toEqual([]);
  });
});

describe("betaWOf", () => {
  /** EN 1993-1-8:2005 Table 4.1. */
  it.each([
    [235, 0.8],
    [236, 0.85],
    [275, 0.85],
    [355, 0.9],
    [356, 1],
    [460, 1],
  ])("%d N/mm2 has %d", (yieldMpa, betaW) => expect(betaWOf(yieldMpa)).toBe(betaW));
});
