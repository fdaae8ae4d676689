/**
 * Farkas and Jarmai, design and economy of metal structures (read in a secondary copy; edition and page
 * not known): cutting 1 / (41.038 / t - 0.180) min/m; gas-shielded and covered-electrode welding
 * 1.3 x 0.3394 a^2 and 1.3 x 0.7889 a^2 min/m; assembly from the square root of parts and mass.
 */
import { describe, expect, it } from "vitest";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { pricesWithFormula } from "@/tests/factories/build-cost-case";
import { cutMetre, filletMetre, runMinutesOf } from "@/tests/factories/build-rule-record";

const seed = loadSeedPrices();

describe("the second cutting law", () => {
  it.each([8, 10, 12, 15, 20, 25])("agrees with the plasma law within 12 %% at %d mm", (thicknessMm) => {
    const check = runMinutesOf(pricesWithFormula("cut-plate", "inverse"), cutMetre(thicknessMm), "Cut plate");
    expect(check).toBeCloseTo(1 / (41.038 / thicknessMm - 0.18), 9);
    expect(Math.abs(check / runMinutesOf(seed, cutMetre(thicknessMm), "Cut plate") - 1)).toBeLessThanOrEqual(
      0.12,
    );
  });
});

describe("the welding laws", () => {
  const kgPerHour = (minutesPerM: number, throatMm: number): number =>
    (60 * 7850e-6 * throatMm ** 2) / minutesPerM;

  it("mean 1.07 kg/h of weld metal for gas-shielded welding", () => {
    const minutes = runMinutesOf(
      pricesWithFormula("weld-fillet", "farkas-gmaw"),
      filletMetre(5),
      "Weld fillets",
    );
    expect(Math.abs(kgPerHour(minutes, 5) - 1.07)).toBeLessThanOrEqual(0.005);
  });

  it("mean 0.46 kg/h for covered electrodes", () => {
    const minutes = runMinutesOf(
      pricesWithFormula("weld-fillet", "farkas-smaw"),
      filletMetre(5),
      "Weld fillets",
    );
    expect(Math.abs(kgPerHour(minutes, 5) - 0.46)).toBeLessThanOrEqual(0.005);
  });
});

describe("the assembly law", () => {
  it("is the difference of two square roots for each part added", () => {
    const difficulty = seed.timeTable.constants.difficulty?.value as number;
    const minutes = runMinutesOf(
      pricesWithFormula("place-parts", "assembly"),
      cutMetre(10),
      "Mark, place and tack",
    );
    expect(minutes).toBeCloseTo(difficulty * (Math.sqrt(2 * 1001) - Math.sqrt(1000)), 9);
  });
});
