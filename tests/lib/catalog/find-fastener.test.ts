import { describe, expect, it } from "vitest";
import { findFastener, findFastenerGrade } from "@/lib/catalog/find-fastener";
import { buildCatalog } from "../../factories/build-node-document";

describe("findFastener", () => {
  /** ISO 898-1 stress area; ISO 4032 across points 39.55. */
  it("finds M24", () => {
    expect(findFastener(buildCatalog(), " m24 ")).toMatchObject({
      size: "M24",
      stressAreaMm2: 353,
      acrossPointsMm: 39.55,
      holeMm: 26,
    });
  });

  it("has no M10", () => expect(findFastener(buildCatalog(), "M10")).toBeNull());
});

describe("findFastenerGrade", () => {
  /** EN 1993-1-8:2005 Table 3.1 and Table 3.4. */
  it.each([
    ["4.6", 240, 400, 0.6],
    ["5.8", 400, 500, 0.5],
    ["8.8", 640, 800, 0.6],
    ["10.9", 900, 1000, 0.5],
  ])("finds %s", (name, yieldMpa, ultimateMpa, alphaV) => {
    expect(findFastenerGrade(buildCatalog(), name)).toMatchObject({ yieldMpa, ultimateMpa, alphaV });
  });

  it("has no 12.9", () => expect(findFastenerGrade(buildCatalog(), "12.9")).toBeNull());
});
