/**
 * ESAB, welding lesson 9, and NAVEDTRA 14251A (pages not known): labour with overhead is about 80 to
 * 92 % of the cost of a weld, electric power under 1.5 %. Labour rates here carry the overhead.
 */
import { describe, expect, it } from "vitest";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { bevelMetre, filletMetre, linesOf } from "@/tests/factories/build-rule-record";

/** Shares of the lines that one weld gives by itself: the rules that begin with its own welding. */
function shares(record: Parameters<typeof linesOf>[1], operation: string): { labour: number; power: number } {
  const own = [operation, `${operation}: machine`, "Filler metal", "Shielding gas", "Power for welding"];
  const lines = linesOf(loadSeedPrices(), record).filter(({ line }) => own.includes(line.operation));
  expect(lines.map(({ line }) => line.operation)).toEqual(own);
  const total = lines.reduce((sum, { line }) => sum + line.costMinor, 0);
  const costOf = (name: string): number =>
    lines.find(({ line }) => line.operation === name)?.line.costMinor ?? 0;
  return { labour: costOf(operation) / total, power: costOf("Power for welding") / total };
}

describe("what a weld costs at the demonstration rates", () => {
  it.each([4, 6, 8, 10])(
    "is labour for 80 to 92 %% and power for less than 1.5 %% in a fillet of %d mm",
    (throatMm) => {
      const { labour, power } = shares(filletMetre(throatMm), "Weld fillets");
      expect(labour).toBeGreaterThan(0.8);
      expect(labour).toBeLessThan(0.92);
      expect(power).toBeLessThan(0.015);
    },
  );

  it.each([10, 15, 20])("is the same in a bevel weld of %d mm", (depthMm) => {
    const { labour, power } = shares(bevelMetre(depthMm), "Weld butt welds");
    expect(labour).toBeGreaterThan(0.8);
    expect(labour).toBeLessThan(0.92);
    expect(power).toBeLessThan(0.015);
  });
});
