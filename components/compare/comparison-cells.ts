import type { ComponentId } from "@/lib/calc/result";
import type { EvaluatedOptionDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";

/** What opens when a cell is pressed. */
export type Opening =
  | { readonly about: "component"; readonly component: ComponentId }
  | { readonly about: "joint" }
  | { readonly about: "hours"; readonly trade?: string }
  | { readonly about: "cost"; readonly category?: string }
  | { readonly about: "option" };

export type Cell =
  /** No number here, and why in words: "not added", "outside scope". */
  | { readonly kind: "none"; readonly words: string }
  | {
      readonly kind: "utilisation";
      readonly value: number;
      readonly component: ComponentId;
      /** Where the worst is: "right, ULS 3". */
      readonly where: string;
      readonly isGoverning: boolean;
      readonly opens: Opening;
    }
  | {
      readonly kind: "quantity";
      readonly text: string;
      readonly unit: string;
      readonly note?: string;
      readonly isBig?: boolean;
      readonly opens: Opening | null;
    }
  | {
      readonly kind: "verdict";
      readonly word: string;
      readonly tone: "pass" | "fail" | "plain";
      readonly value: number | null;
      readonly note: string;
      readonly opens: Opening;
    }
  | { readonly kind: "list"; readonly items: readonly string[] };

export interface Row {
  readonly key: string;
  readonly label: string;
  /** A part of the figure above it: "of which welder". */
  readonly isPart?: boolean;
  /** In the order of the options. */
  readonly cells: readonly Cell[];
}

export interface RowGroup {
  readonly key: string;
  /** Null: the rows stand by themselves and do not fold. */
  readonly title: string | null;
  readonly startsFolded: boolean;
  readonly rows: readonly Row[];
  /** One cell an option, shown in the group's own line while it is folded. */
  readonly folded?: readonly Cell[];
}

/** All load cases together, or one of them by name. */
export type LoadCaseChoice = { readonly kind: "envelope" } | { readonly kind: "one"; readonly name: string };

/** Inside the method: it has numbers. */
export const isEvaluated = (option: OptionDocument): option is EvaluatedOptionDocument =>
  !("outsideScope" in option);
const OUTSIDE: Cell = { kind: "none", words: "outside scope" };
/** One cell an option; an option outside the method never shows a number. */
export const across = (
  result: ResultDocument,
  cell: (option: EvaluatedOptionDocument) => Cell,
): readonly Cell[] => result.options.map((option) => (isEvaluated(option) ? cell(option) : OUTSIDE));
