import { describe, expect, it } from "vitest";
import { CatalogFault, rowsOfTable } from "@/lib/catalog/compact-table";

const table = {
  about: "Two plates.",
  sources: { shop: "As the shop says" },
  columns: ["thicknessMm", "note", "source"],
  rows: [
    [10, null, "shop"],
    [12, "rare", "shop"],
  ],
};

describe("rowsOfTable", () => {
  it("spells rows out and gives each the full text of its source", () => {
    expect(rowsOfTable("plates", table)).toEqual([
      { thicknessMm: 10, note: null, source: "As the shop says" },
      { thicknessMm: 12, note: "rare", source: "As the shop says" },
    ]);
  });

  it.each([
    ["a short row", { ...table, rows: [[10, "shop"]] }, /2 cells instead of 3/],
    ["a source nobody states", { ...table, rows: [[10, null, "hearsay"]] }, /no known source/],
    ["a table without sources", { ...table, columns: ["source", "thicknessMm", "note"] }, /no column source/],
    ["something else", [1, 2], /plates/],
  ])("refuses %s", (_, input, message) => {
    expect(() => rowsOfTable("plates", input)).toThrow(CatalogFault);
    expect(() => rowsOfTable("plates", input)).toThrow(message);
  });
});
