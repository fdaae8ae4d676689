/** What ranking needs to know of one option. */
export interface RankedInput {
  readonly key: string;
  readonly passes: boolean;
  readonly outsideScope: boolean;
  /** Set aside by a person; stays visible. */
  readonly excluded?: boolean;
  /** Why the shop cannot make it, in words; left out or null = it can. */
  readonly shopCannot?: string | null;
  /** Per node, integer minor units, the difference from the bare node. */
  readonly costMinor: number;
  /** Elapsed shop time per node, which decides between options of equal cost. */
  readonly shopMinutes: number;
}

export interface Rank {
  readonly key: string;
  /** 1 = cheapest; null = not ranked, and `notRanked` says why. */
  readonly rank: number | null;
  readonly notRanked: string | null;
}

/** Outside scope comes first: nothing is known of such an option, so nothing else may be said of it. */
function reasonNotRanked(option: RankedInput): string | null {
  if (option.outsideScope) return "outside scope";
  if (option.excluded === true) return "excluded";
  if (!option.passes) return "fails";
  if (option.shopCannot !== undefined && option.shopCannot !== null)
    return `shop cannot: ${option.shopCannot}`;
  return null;
}

const compareByCost = (a: RankedInput, b: RankedInput): number =>
  a.costMinor - b.costMinor || a.shopMinutes - b.shopMinutes;

/**
 * Ranks the options that may be chosen by cost, dearest last; equal cost by the shorter shop time.
 * Options equal in both share a rank, and the next rank is counted past them (1, 1, 3).
 *
 * @returns one entry an option, in the order given.
 */
export function rankOptions(options: readonly RankedInput[]): readonly Rank[] {
  const standing = options.filter((option) => reasonNotRanked(option) === null);
  return options.map((option) => {
    const notRanked = reasonNotRanked(option);
    if (notRanked !== null) return { key: option.key, rank: null, notRanked };
    const before = standing.filter((other) => compareByCost(other, option) < 0).length;
    return { key: option.key, rank: before + 1, notRanked: null };
  });
}
