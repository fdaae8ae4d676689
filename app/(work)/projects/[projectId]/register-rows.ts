import type { NodeRow, NodeState } from "@/lib/schemas/node";

export const STATE_WORDS: Readonly<Record<NodeState, string>> = {
  "bare-passes": "no stiffening needed",
  solved: "solved",
  "nothing-passes": "nothing passes",
  "outside-scope": "outside scope",
  "not-compared": "not compared yet",
};

export const SORT_KEYS = [
  "mark",
  "column",
  "bare",
  "leading",
  "hours",
  "cost",
  "quantity",
  "updated",
] as const;
export type SortKey = (typeof SORT_KEYS)[number];
export interface Sorting {
  readonly key: SortKey;
  readonly direction: "ascending" | "descending";
}

export interface RegisterFilter {
  /** Words that must all occur in mark, column, beams or leading option. */
  readonly words: string;
  readonly state: NodeState | "all";
}

/** The bare column's utilisation, or null where there is none. */
export const bareUtilisation = (row: NodeRow): number | null =>
  row.bare && "utilisation" in row.bare ? row.bare.utilisation : null;

/** Beams in words: one where both are alike. */
export function beamWords({ beams }: NodeRow): string {
  if (beams.left && beams.right)
    return beams.left === beams.right ? `${beams.left} both sides` : `${beams.left} / ${beams.right}`;
  return beams.left ? `${beams.left} left` : `${beams.right ?? ""} right`;
}

const VALUES: Readonly<Record<SortKey, (row: NodeRow) => string | number | null>> = {
  mark: (row) => row.reference,
  column: (row) => row.column,
  bare: bareUtilisation,
  leading: (row) => row.leading?.name ?? null,
  hours: (row) => row.leading?.shopMinutes ?? null,
  cost: (row) => row.leading?.cost ?? null,
  quantity: (row) => row.quantity,
  updated: (row) => row.updatedAt,
};

const inOrder = new Intl.Collator("en", { numeric: true });

function compareValues(a: string | number, b: string | number): number {
  return typeof a === "number" && typeof b === "number" ? a - b : inOrder.compare(String(a), String(b));
}

/** Rows that match the filter, sorted; what has no value stands last either way, ties by mark. */
export function registerRows(
  rows: readonly NodeRow[],
  filter: RegisterFilter,
  sorting: Sorting,
): readonly NodeRow[] {
  const words = filter.words.toLowerCase().split(/\s+/).filter(Boolean);
  const value = VALUES[sorting.key];
  const turn = sorting.direction === "ascending" ? 1 : -1;
  return rows
    .filter((row) => filter.state === "all" || row.state === filter.state)
    .filter((row) => {
      const text = [row.reference, row.column, beamWords(row), row.leading?.name ?? ""]
        .join(" ")
        .toLowerCase();
      return words.every((word) => text.includes(word));
    })
    .sort((a, b) => {
      const [left, right] = [value(a), value(b)];
      if (left === null || right === null)
        return Number(left === null) - Number(right === null) || inOrder.compare(a.reference, b.reference);
      return turn * compareValues(left, right) || inOrder.compare(a.reference, b.reference);
    });
}
