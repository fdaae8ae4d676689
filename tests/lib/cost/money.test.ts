/** Guards that money is exact: whole minor units, ties to even, the fast path and the exact path the same. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { AmountNotExact, costMinor, divideHalfEven, exactRate } from "@/lib/cost/money";

/** The rounding written as fractions, without any of the code under test. */
function byFractions(amount: number, rate: number, per: bigint, minorUnits: bigint): number {
  const numerator = BigInt(Math.round(amount * 1e6)) * BigInt(Math.round(rate * 1e6)) * minorUnits;
  const denominator = per * 10n ** 12n;
  const floor = numerator >= 0n ? numerator / denominator : -((-numerator + denominator - 1n) / denominator);
  const rest = numerator - floor * denominator;
  const isEven = floor % 2n === 0n;
  if (rest * 2n === denominator) return Number(isEven ? floor : floor + 1n);
  return Number(rest * 2n < denominator ? floor : floor + 1n);
}

describe("the cost of an amount", () => {
  it("rounds a tie to the even cent, on both sides of nothing", () => {
    const at = (amount: number): number => costMinor(amount, exactRate(1), 1, 100);
    expect([0.005, 0.015, 0.025, 0.035, -0.005, -0.015].map(at)).toEqual([0, 2, 2, 4, 0, -2]);
    expect(Object.is(at(-0.001), -0)).toBe(false);
  });

  it("prices minutes at a rate per hour: 25 min at 58 EUR/h are 24.17 EUR", () => {
    expect(costMinor(25, exactRate(58), 60, 100)).toBe(Math.round((25 / 60) * 58 * 100));
  });

  it("keeps the sixth decimal of a rate", () => {
    expect(costMinor(1_000_000, exactRate(0.000001), 1, 100)).toBe(100);
  });

  it("knows currencies without and with three decimals", () => {
    expect(costMinor(2.5, exactRate(1), 1, 1)).toBe(2);
    expect(costMinor(2.5, exactRate(1.001), 1, 1000)).toBe(2502);
  });

  it("equals the same sum done in fractions, small or huge", () => {
    const amount = fc.oneof(
      fc.integer({ min: -2_000_000, max: 2_000_000 }),
      fc.integer({ min: -2_000_000_000_000, max: 2_000_000_000_000 }),
    );
    const rate = fc.oneof(
      fc.integer({ min: 0, max: 200_000_000 }),
      fc.integer({ min: 0, max: 99_999_999_999_999 }),
    );
    fc.assert(
      fc.property(
        amount,
        rate,
        fc.constantFrom(1 as const, 60 as const),
        fc.constantFrom(1, 100, 1000),
        (a, r, per, minorUnits) => {
          const [amountValue, rateValue] = [a / 1e6, r / 1e6];
          const expected = byFractions(amountValue, rateValue, BigInt(per), BigInt(minorUnits));
          // Compared as numbers: minus nothing is nothing.
          expect(costMinor(amountValue, exactRate(rateValue), per, minorUnits) === expected).toBe(true);
        },
      ),
      { numRuns: 3000 },
    );
  });

  it("refuses what six decimals cannot hold", () => {
    expect(() => costMinor(1e11, exactRate(1), 1, 100)).toThrow(AmountNotExact);
    expect(() => costMinor(Number.NaN, exactRate(1), 1, 100)).toThrow(AmountNotExact);
    expect(() => exactRate(Number.POSITIVE_INFINITY)).toThrow(AmountNotExact);
  });
});

describe("division to the even", () => {
  it.each([
    [5n, 2n, 2n],
    [7n, 2n, 4n],
    [-5n, 2n, -2n],
    [-7n, 2n, -4n],
    [10n, 3n, 3n],
    [11n, 3n, 4n],
  ])("%s / %s is %s", (numerator, denominator, quotient) => {
    expect(divideHalfEven(numerator, denominator)).toBe(quotient);
  });
});
