/**
 * Haapio, feature-based costing of steel structures, 2012 (read in a secondary copy; page not known).
 * Welding laws in minutes per metre of throat a or bevel depth b in mm; plasma cutting in minutes per
 * metre of thickness t in mm. The printed figures decide the tolerance: half a unit of the last digit.
 */
import { describe, expect, it } from "vitest";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { pricesWithFormula } from "@/tests/factories/build-cost-case";
import { bevelMetre, cutMetre, filletMetre, runMinutesOf } from "@/tests/factories/build-rule-record";

const seed = loadSeedPrices();

const FILLETS = [
  [3, 4.49],
  [4, 7.98],
  [5, 12.47],
  [6, 17.96],
  [8, 31.92],
  [10, 49.88],
  [12, 71.82],
] as const;
const BEVELS = [
  [6, 8.97],
  [8, 15.96],
  [10, 24.95],
  [12, 35.92],
  [15, 56.12],
  [20, 99.74],
] as const;
const CUTS = [
  [8, 0.207],
  [10, 0.239],
  [12, 0.278],
  [15, 0.35],
  [20, 0.503],
  [25, 0.641],
] as const;

describe("the law of 1 m of fillet", () => {
  const prices = pricesWithFormula("weld-fillet", "haapio");
  it.each(FILLETS)("a = %d mm takes %d min", (throatMm, minutes) => {
    expect(
      Math.abs(runMinutesOf(prices, filletMetre(throatMm), "Weld fillets") - minutes),
    ).toBeLessThanOrEqual(0.005);
  });

  it.each(FILLETS)("our own rate stays within 5 %% of it at a = %d mm", (throatMm, minutes) => {
    expect(
      Math.abs(runMinutesOf(seed, filletMetre(throatMm), "Weld fillets") / minutes - 1),
    ).toBeLessThanOrEqual(0.05);
  });
});

describe("the law of 1 m of bevel weld", () => {
  const prices = pricesWithFormula("weld-butt", "haapio");
  it.each(BEVELS)("b = %d mm takes %d min", (depthMm, minutes) => {
    expect(
      Math.abs(runMinutesOf(prices, bevelMetre(depthMm), "Weld butt welds") - minutes),
    ).toBeLessThanOrEqual(0.005);
  });
});

describe("plasma cutting", () => {
  it.each(CUTS)("1 m of %d mm takes %d min", (thicknessMm, minutes) => {
    expect(Math.abs(runMinutesOf(seed, cutMetre(thicknessMm), "Cut plate") - minutes)).toBeLessThanOrEqual(
      0.0005,
    );
  });

  it("holds the thickness at 27 mm between 27 and 30 mm", () => {
    expect(runMinutesOf(seed, cutMetre(29), "Cut plate")).toBe(runMinutesOf(seed, cutMetre(27), "Cut plate"));
  });

  it("gives way to flame cutting above 30 mm: 658.67 - 4.1939 t mm/min", () => {
    expect(runMinutesOf(seed, cutMetre(40), "Cut plate")).toBeCloseTo(1000 / (658.67 - 4.1939 * 40), 9);
  });
});

describe("sawing", () => {
  it("cuts 1800 mm2 of solid a minute and takes 0.5 min an end", () => {
    const values = {
      ...{
        bars: 1,
        grade: "8.8",
        diameterMm: 24,
        lengthM: 0.4,
        massKg: 1.4,
        ends: 2,
        innerNuts: 0,
        outerNuts: 2,
      },
      ...{ nutMassKg: 0.2, washers: 2, washerMassKg: 0.1, spannerRoomMm: 100, preloaded: 0 },
    };
    const minutes = runMinutesOf(seed, { driver: "bar", group: "", values }, "Saw bars and deburr ends");
    expect(minutes).toBeCloseTo((Math.PI * 12 ** 2) / 1800 + 2 * 0.5, 6);
  });
});
