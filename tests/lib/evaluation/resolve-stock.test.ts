import { describe, expect, it } from "vitest";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { stockOf, type NodeStock } from "@/lib/evaluation/resolve-stock";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "../../factories/build-node-document";

function stock(
  column: Partial<NodeDocument["column"]> = {},
  choices: NodeDocument["choices"] = {},
): NodeStock {
  const document = buildNodeDocument({ column: { ...buildNodeDocument().column, ...column }, choices });
  const resolved = resolveNodeCase(document, buildCatalog());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return stockOf(document, resolved.node, buildCatalog());
}

const names = (columns: NodeStock["columns"]): readonly string[] =>
  columns.map((column) => column.section.designation);

describe("stockOf", () => {
  it("gives each stock plate the column's grade at its own thickness", () => {
    const { plates } = stock();
    expect(plates.length).toBe(buildCatalog().stockPlates.length);
    expect(plates.find((plate) => plate.thicknessMm === 12)?.steel).toMatchObject({
      grade: "S355",
      yieldMpa: 355,
    });
    expect(plates.find((plate) => plate.thicknessMm === 20)?.steel.yieldMpa).toBe(345);
    const ascending = plates.map((plate) => plate.thicknessMm).toSorted((a, b) => a - b);
    expect(plates.map((plate) => plate.thicknessMm)).toEqual(ascending);
  });

  it("leaves plates out that the grade has no strength for", () => {
    const catalog = buildCatalog();
    const document = buildNodeDocument({ choices: { strengths: "en1993-1-1-table-3.1" } });
    const resolved = resolveNodeCase(document, catalog);
    if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
    const thick = {
      ...catalog,
      stockPlates: [...catalog.stockPlates, { thicknessMm: 100, source: "made up" }],
    };
    expect(stockOf(document, resolved.node, thick).plates.some((plate) => plate.thicknessMm === 100)).toBe(
      false,
    );
  });

  it("offers bars of 8.8 and 10.9 from M12 to M36", () => {
    const { bars } = stock();
    expect(new Set(bars.map((bar) => bar.grade.name))).toEqual(new Set(["8.8", "10.9"]));
    expect([bars.at(0)?.size.name, bars.at(-1)?.size.name]).toEqual(["M12", "M36"]);
    expect(bars.length).toBe(2 * buildCatalog().fasteners.length);
  });

  it("offers heavier columns of the same family by mass, each with its own strength", () => {
    const { columns, relatedColumns } = stock();
    expect(names(columns).slice(0, 3)).toEqual(["HE 320 A", "HE 340 A", "HE 360 A"]);
    expect(columns.map((column) => column.massKgPerM)).toEqual(
      columns.map((column) => column.massKgPerM).toSorted((a, b) => a - b),
    );
    expect(columns.find((column) => column.section.designation === "HE 340 A")?.steel.yieldMpa).toBe(345);
    expect(names(relatedColumns)).toEqual(["HE 300 B", "HE 300 M"]);
  });

  it("leaves columns out that the bolts cannot pass", () => {
    // M24 at a gauge of 120 needs a core below 94 mm; UC 356x406x1299 has 100 + 1.6 x 15.4.
    const { columns } = stock({ section: "UC 254x254x107" });
    expect(names(columns)).toContain("UC 305x305x118");
    expect(names(columns)).not.toContain("UC 356x406x1299");
  });

  it("offers no other column for a section given by its dimensions", () => {
    expect(names(stock({ section: { h: 300, b: 300, tw: 10, tf: 16, r: 20 } }).columns)).toEqual([]);
  });
});
