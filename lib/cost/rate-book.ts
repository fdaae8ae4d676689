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
