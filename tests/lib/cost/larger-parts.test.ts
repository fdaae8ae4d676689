/** Guards what a search for the cheapest option leans on: a larger part is never cheaper. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { priceOfOption } from "@/lib/cost";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import {
  backingPlates,
  buildFabrication,
  buildNode,
  diagonals,
  fillet,
  stiffeners,
  webPlates,
} from "@/tests/factories/build-cost-case";

const node = buildNode();
const prices = loadSeedPrices();

describe("a larger part", () => {
  it("is never cheaper: thicker plates, larger throats, deeper bevels", () => {
    const coating = fc.constantFrom("none" as const, "paint" as const, "galvanised" as const);
    fc.assert(
      fc.property(
        coating,
        fc.integer({ min: 6, max: 60 }),
        fc.integer({ min: 3, max: 15 }),
        (coat, thickness, throat) => {
          const priceAt = (thicknessMm: number, throatMm: number, isButt: boolean): number[] => {
            const weld = isButt ? ({ kind: "butt" } as const) : fillet(throatMm);
            const sizes = { thicknessMm, weld };
            const all = [
              stiffeners({ thicknessMm, flangeWeld: weld, webWeld: weld }),
              diagonals(sizes),
              webPlates(sizes),
            ];
            return [...all, backingPlates({ thicknessMm })].map((one) =>
              priceOfOption({
                node,
                measures: [one],
                fabrication: buildFabrication({ coating: coat }),
                prices,
              }),
            );
          };
          for (const isButt of [false, true]) {
            const smaller = priceAt(thickness, throat, isButt);
            priceAt(thickness + 1, throat, isButt).forEach((cost, index) =>
              expect(cost).toBeGreaterThanOrEqual(smaller[index] ?? Number.NaN),
            );
            priceAt(thickness, throat + 1, isButt).forEach((cost, index) =>
              expect(cost).toBeGreaterThanOrEqual(smaller[index] ?? Number.NaN),
            );
          }
        },
      ),
      { numRuns: 150 },
    );
  });
});
