/** Exact money: amounts and rates as whole millionths, products rounded half-even to minor units. */

const MILLION = 1e6;

/** Thrown where an amount or a rate is too large or not a number, so that no wrong sum is ever shown. */
export class AmountNotExact extends Error {
  override readonly name = "AmountNotExact";
}

/** The value as a whole number of millionths. */
function millionths(value: number): bigint {
  const scaled = Math.round(value * MILLION);
  if (!Number.isSafeInteger(scaled)) throw new AmountNotExact(`${value} cannot be held to six decimals`);
  return BigInt(scaled);
}

/** Quotient rounded to the nearest integer, a tie to the even one; `denominator` positive. */
export function divideHalfEven(numerator: bigint, denominator: bigint): bigint {
  const negative = numerator < 0n;
  const size = negative ? -numerator : numerator;
  const quotient = size / denominator;
  const twiceRest = 2n * (size % denominator);
  const up = twiceRest > denominator || (twiceRest === denominator && quotient % 2n === 1n);
  const rounded = up ? quotient + 1n : quotient;
  return negative ? -rounded : rounded;
}

/**
 * Cost of an amount at a rate in minor units of the currency, rounded half-even.
 *
 * @param amount - in the rate's unit times `per` (minutes with `per` 60 for a rate per hour); taken to six decimals.
 * @param rate - currency per unit, six decimals.
 * @throws AmountNotExact where either is too large for six exact decimals.
 */
export function costMinor(amount: number, rate: number, per: 1 | 60, minorDigits: number): number {
  const numerator = millionths(amount) * millionths(rate) * 10n ** BigInt(minorDigits);
  return Number(divideHalfEven(numerator, BigInt(per) * 1_000_000_000_000n));
}
