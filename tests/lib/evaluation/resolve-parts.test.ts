import { describe, expect, it } from "vitest";
import { findFastener } from "@/lib/catalog/find-fastener";
import {
  describeSection,
  describeSteel,
  describeWeld,
  fastenerToCase,
  isCustomSection,
  resolveSection,
  resolveSteel,
  resolveWeld,
  weldLegMm,
} from "@/lib/evaluation/resolve-parts";
import { Problems } from "@/lib/evaluation/resolve-errors";
import type { SectionInput, SteelInput } from "@/lib/schemas/node-document";
import { buildCatalog } from "../../factories/build-node-document";

const context = () => ({
  catalog: buildCatalog(),
  table: "product-standard" as const,
  problems: new Problems(),
});

describe("sections", () => {
  it.each<[SectionInput]>([
    ["HE 300 A"],
    [{ h: 300, b: 200, tw: 8, tf: 12, r: 18 }],
    [{ h: 300, b: 200, tw: 8, tf: 12, weld: 5 }],
  ])("reads and states %j", (input) => {
    const section = resolveSection(context(), input, "column.section");
    expect(section && describeSection(section)).toEqual(input);
    expect(section && isCustomSection(section)).toBe(typeof input !== "string");
  });
});

describe("steels", () => {
  it.each<[SteelInput]>([["S355"], ["S460M"], [{ fy: 300, fu: 420, betaW: 0.9 }]])(
    "reads and states %j",
    (input) => {
      const steel = resolveSteel(context(), input, 12, "column.steel");
      expect(steel && describeSteel(steel)).toEqual(input);
    },
  );
});

describe("welds", () => {
  it("reads and states throats and butt welds", () => {
    expect(describeWeld(resolveWeld(6))).toBe(6);
    expect(describeWeld(resolveWeld("butt"))).toBe("butt");
  });

  it("has a leg of throat x sqrt 2, and none for a butt weld", () => {
    expect(weldLegMm(resolveWeld(6))).toBeCloseTo(6 * Math.SQRT2, 12);
    expect(weldLegMm(resolveWeld("butt"))).toBe(0);
  });
});

describe("fasteners", () => {
  it("falls back on ISO 4014 and 4032 where EN 14399 lists no such size", () => {
    const row = findFastener(buildCatalog(), "M33");
    if (!row) throw new Error("The seeded catalogue has lost a size.");
    expect(fastenerToCase(row, "HR")).toEqual(fastenerToCase(row, "plain"));
  });
});
