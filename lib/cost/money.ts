/** Exact money: amounts and rates as whole millionths, products rounded half-even to minor units. */

const MILLION = 1e6;

/** Thrown where an amount or a rate is too large or not a number, so that no wrong sum is ever shown. */
export class AmountNotExact extends Error {
  override readonly name = "AmountNotExact";
}

/** A rate as the fraction `numerator / denominator`, both whole and as small as powers of ten allow. */
export interface ExactRate {
  readonly numerator: number;
  readonly denominator: number;
}

function wholeMillionths(value: number): number {
  const scaled = Math.round(value * MILLION);
  if (!Number.isSafeInteger(scaled)) throw new AmountNotExact(`${value} cannot be held to six decimals`);
  return scaled;
}

/**
 * A rate to six decimals without loss.
 *
 * @throws AmountNotExact where it is too large for six exact decimals.
 */
export function exactRate(rate: number): ExactRate {
  let numerator = wholeMillionths(rate);
  let denominator = MILLION;
  while (denominator > 1 && numerator % 10 === 0) {
    numerator /= 10;
    denominator /= 10;
  }
  return { numerator, denominator };
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

/** The same for whole numbers that a double holds exactly; several times faster. */
function divideHalfEvenSafe(numerator: number, denominator: number): number {
  const size = Math.abs(numerator);
  const rest = size % denominator;
  const quotient = (size - rest) / denominator;
  const over = rest - (denominator - rest);
  const rounded = over > 0 || (over === 0 && quotient % 2 === 1) ? quotient + 1 : quotient;
  return numerator < 0 && rounded > 0 ? -rounded : rounded;
}

/**
 * Cost of an amount at a rate in minor units of the currency, rounded half-even.
 *
 * @param amount - in the rate's unit times `per` (minutes with `per` 60 for a rate per hour); taken to six decimals.
 * @param minorUnits - minor units in one unit of the currency, 100 for EUR.
 * @throws AmountNotExact where the amount is too large for six exact decimals.
 */
export function costMinor(amount: number, rate: ExactRate, per: 1 | 60, minorUnits: number): number {
  const millionths = wholeMillionths(amount);
  const factor = rate.numerator * minorUnits;
  const denominator = per * MILLION * rate.denominator;
  const numerator = millionths * factor;
  // A product within 2^53 of whole factors is itself exact.
  if (Number.isSafeInteger(factor) && Number.isSafeInteger(numerator))
    return divideHalfEvenSafe(numerator, denominator);
  const exact = BigInt(millionths) * BigInt(rate.numerator) * BigInt(minorUnits);
  return Number(divideHalfEven(exact, BigInt(denominator)));
}
