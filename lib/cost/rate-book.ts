import { type ExactRate, exactRate } from "./money";
import type { RateBook, RateLine } from "./prices";

/** The rate book has no line for an item that an estimate needs. */
export class RateMissing extends Error {
  override readonly name = "RateMissing";
  constructor(
    readonly rateBookId: string,
    readonly item: string,
  ) {
    super(`The rate book ${rateBookId} has no rate for "${item}".`);
  }
}

/**
 * The line of one item in one frozen version of the rate book.
 *
 * @throws RateMissing where the book has no such line: a missing rate is never taken as nothing.
 */
export function rateIn(book: RateBook, item: string): RateLine {
  const line = Object.hasOwn(book.lines, item) ? book.lines[item] : undefined;
  if (line === undefined) throw new RateMissing(book.id, item);
  return line;
}

/** A version of the rate book made ready for exact sums. */
export class PreparedRates {
  /** Minor units in one unit of the currency. */
  readonly minorUnits: number;
  private readonly likely = new Map<string, ExactRate>();

  constructor(readonly book: RateBook) {
    this.minorUnits = 10 ** book.minorDigits;
  }

  /** @throws RateMissing where the book has no such line. */
  likelyOf(item: string): ExactRate {
    const known = this.likely.get(item);
    if (known !== undefined) return known;
    const rate = exactRate(rateIn(this.book, item).likely);
    this.likely.set(item, rate);
    return rate;
  }
}

const preparedBooks = new WeakMap<RateBook, PreparedRates>();

/** The prepared form of a rate book, made at first use. Books are never changed in place. */
export function preparedRates(book: RateBook): PreparedRates {
  const known = preparedBooks.get(book);
  if (known !== undefined) return known;
  const prepared = new PreparedRates(book);
  preparedBooks.set(book, prepared);
  return prepared;
}
