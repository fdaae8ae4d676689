import type { EvaluatedOptionDocument } from "@/lib/schemas/result-document";

/** One option's bar: its letter, its name and one value for each part. */
export interface StackedBar {
  readonly letter: string;
  readonly name: string;
  readonly parts: Readonly<Record<string, number>>;
  readonly total: number;
}

export interface StackedShares {
  /** Parts in the order they are stacked; those that are zero throughout are left out. */
  readonly parts: readonly string[];
  readonly bars: readonly StackedBar[];
}

export interface LetteredOption {
  readonly letter: string;
  readonly option: EvaluatedOptionDocument;
}

/**
 * Sorts the figures of the options into bars.
 *
 * @param partsOf - the parts of one option, all in one unit.
 */
export function stackedShares(
  options: readonly LetteredOption[],
  partsOf: (option: EvaluatedOptionDocument) => Readonly<Record<string, number>>,
): StackedShares {
  const bars = options.map(({ letter, option }) => {
    const parts = partsOf(option);
    return {
      letter,
      name: option.name,
      parts,
      total: Object.values(parts).reduce((sum, value) => sum + value, 0),
    };
  });
  const size = new Map<string, number>();
  for (const bar of bars) {
    for (const [part, value] of Object.entries(bar.parts))
      size.set(part, (size.get(part) ?? 0) + Math.abs(value));
  }
  const parts = [...size]
    .filter(([, total]) => total > 0)
    .sort((a, b) => b[1] - a[1])
    .map(([part]) => part);
  return { parts, bars };
}
