import type { OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { Bubble } from "./option-head";
import { rankWords } from "./rank-words";
import { stopProps } from "./use-grid-keys";

export interface FoldedHeadProps {
  readonly option: OptionDocument;
  readonly result: ResultDocument;
  readonly letter: string;
  /** Column for the arrow keys. */
  readonly column: number;
  readonly onUnfold: () => void;
}

/** The head of a folded column: its letter and its rank; pressed, the column unfolds. */
export function FoldedHead({ option, result, letter, column, onUnfold }: FoldedHeadProps) {
  const { figure, words, isBest } = rankWords(option, result);
  return (
    <button
      type="button"
      {...stopProps(column)}
      data-fold
      title={`Unfold ${option.name}`}
      onClick={onUnfold}
      className="mt-1 flex h-full w-full flex-col items-center gap-1.5"
    >
      <Bubble letter={letter} isBest={isBest} />{" "}
      <span aria-hidden="true" className="text-body text-petrol">
        +
      </span>
      <span className="sr-only">
        {`${option.name}, folded, ${figure === null ? words : `rank ${figure}`}. Unfold it`}
      </span>
    </button>
  );
}

/**
 * The name of a folded option, turned as on the spine of a folder: laid over its cell, so that a long
 * name does not make the row of drawings taller. The head above it says the same to a screen reader. */
export const FoldedName = ({ option }: { readonly option: OptionDocument }) => (
  <span
    aria-hidden="true"
    className="absolute inset-x-1 top-0 bottom-2.5 overflow-hidden text-note leading-tight text-soft [writing-mode:vertical-rl]"
  >
    {option.name}
    {option.rank === null && option.notRanked !== null ? ` · ${option.notRanked}` : ""}
  </span>
);
