import type { Traced } from "../trace/traced";
import type { BoltRow } from "./connection-view";
import { tStubPartOf, type PatternLengths, type TStubPart, type TStubSetting } from "./t-stub-part";

/** One flange or plate as its rows see it: each row alone and every group of neighbours. */
export interface RowFamily {
  /** By position among the tension rows. */
  readonly alone: readonly TStubPart[];
  /** For each position, the groups that end there, as [first position, part]. */
  readonly groupsEndingAt: readonly (readonly { readonly first: number; readonly part: TStubPart }[])[];
}

/** A limit on each row alone and on each group, N; null where the part does not limit. */
export interface RowFamilyLimits {
  readonly alone: readonly (Traced | null)[];
  readonly groupsEndingAt: readonly (readonly {
    readonly first: number;
    readonly part: TStubPart;
    readonly limit: Traced;
  }[])[];
}

export interface GroupPosition {
  readonly index: number;
  readonly isFirst: boolean;
  readonly isLast: boolean;
  /** To the neighbours inside the group; 0 where there is none. */
  readonly beforeMm: number;
  readonly afterMm: number;
}

/**
 * Builds the rows and groups of one flange or plate.
 *
 * @param segments - runs of neighbouring positions that may act together (a stiffener or beam flange parts them).
 */
export function rowFamilyOf(
  rows: readonly BoltRow[],
  segments: readonly (readonly number[])[],
  settingOf: (index: number) => TStubSetting,
  aloneLengths: (index: number) => PatternLengths,
  groupLengths: (position: GroupPosition) => PatternLengths,
): RowFamily {
  const at = (index: number): BoltRow => {
    const row = rows[index];
    if (!row) throw new RangeError(`No tension row at position ${index}`);
    return row;
  };
  const alone = rows.map((row, index) => tStubPartOf([row], [aloneLengths(index)], settingOf(index)));
  const groupsEndingAt: { first: number; part: TStubPart }[][] = rows.map(() => []);
  for (const segment of segments) {
    for (let last = 1; last < segment.length; last += 1) {
      for (let first = 0; first < last; first += 1) {
        const members = segment.slice(first, last + 1);
        const lengths = members.map((index, place) => {
          const before = members[place - 1];
          const after = members[place + 1];
          return groupLengths({
            index,
            isFirst: before === undefined,
            isLast: after === undefined,
            beforeMm: before === undefined ? 0 : Math.abs(at(index).leverMm - at(before).leverMm),
            afterMm: after === undefined ? 0 : Math.abs(at(index).leverMm - at(after).leverMm),
          });
        });
        const end = members[members.length - 1];
        const start = members[0];
        if (end === undefined || start === undefined) continue;
        groupsEndingAt[end]?.push({
          first: start,
          part: tStubPartOf(members.map(at), lengths, settingOf(start)),
        });
      }
    }
  }
  return { alone, groupsEndingAt };
}

/** The shortest length of a row alone or as part of any group, mm. EN 1993-1-8:2005, Table 6.11. */
export function shortestLengthMm(family: RowFamily, index: number): number {
  let shortest = family.alone[index]?.shortestByRowMm[0] ?? Infinity;
  for (const groups of family.groupsEndingAt) {
    for (const { first, part } of groups) {
      const own = part.shortestByRowMm[index - first];
      if (index >= first && own !== undefined && own < shortest) shortest = own;
    }
  }
  return shortest;
}
