/**
 * AISC, frequently asked questions 8.1.2 (edition not known): a fillet of 1/2 in. leg (12.7 mm) takes
 * four times the weld metal of one of 1/4 in. leg (6.35 mm).
 */
import { describe, expect, it } from "vitest";
import { quantitiesOf } from "@/lib/cost";
import { buildFabrication, buildNode, fillet, webPlates } from "@/tests/factories/build-cost-case";

const weldMetalKg = (legMm: number): number =>
  quantitiesOf(buildNode(), [webPlates({ weld: fillet(legMm / Math.SQRT2) })], buildFabrication()).masses[
    "weld-metal"
  ];

describe("weld metal of a fillet", () => {
  it("is four times as much for twice the leg", () => {
    expect(weldMetalKg(12.7) / weldMetalKg(6.35)).toBeCloseTo(4, 12);
  });
});
