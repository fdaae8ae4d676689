import type { OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { joinClasses } from "@/components/ui/join-classes";
import { optionSummary } from "./measure-words";
import { rankWords } from "./rank-words";
import { stopProps } from "./use-grid-keys";

export interface OptionHeadProps {
  readonly option: OptionDocument;
  readonly result: ResultDocument;
  readonly letter: string;
  readonly column: number;
  readonly isExcluded: boolean;
  /** Null where this person may not set options aside. */
  readonly onToggleExcluded: (() => void) | null;
  readonly onFold: () => void;
  readonly onOpen: () => void;
}

/** The key letter in its bubble, as grid lines are marked on a drawing. */
export function Bubble({ letter, isBest = false }: { readonly letter: string; readonly isBest?: boolean }) {
  return (
    <span
      className={joinClasses(
        "inline-grid size-[27px] flex-none place-items-center rounded-full border-[1.4px] font-[650]",
        isBest ? "border-petrol bg-petrol text-onpetrol" : "border-ink bg-sheet",
      )}
    >
      {letter}
    </span>
  );
}

const SMALL = "text-note text-soft underline-offset-2 hover:text-ink hover:underline";

/** The head of an option's column: letter, name, sizes, rank, and what may be done with the column. */
export function OptionHead({
  option,
  result,
  letter,
  column,
  isExcluded,
  onToggleExcluded,
  onFold,
  onOpen,
}: OptionHeadProps) {
  const rank = rankWords(option, result);
  return (
    <div className="flex h-full flex-col">
      <button
        type="button"
        {...stopProps(column)}
        onClick={onOpen}
        className="flex min-h-9 items-center gap-2.5 text-left hover:underline"
      >
        <Bubble letter={letter} isBest={rank.isBest} />{" "}
        <span className="text-[0.90625rem] leading-[1.15] font-[650]">{option.name}</span>{" "}
        <span className="sr-only">. Open its parts</span>
      </button>{" "}
      <span className="mt-1 block min-h-[1.05rem] text-note font-[450] text-soft">
        {optionSummary(option.measures)}
      </span>{" "}
      <span className="mt-auto flex min-h-[1.9rem] items-baseline pt-1 text-label font-[550] text-soft">
        {rank.figure ? (
          <>
            <b className="mr-1.5 text-rank font-[680] text-ink">
              <span className="sr-only">Rank</span> {rank.figure}
            </b>{" "}
            {rank.words}
          </>
        ) : (
          rank.words
        )}
      </span>
      <span className="no-print mt-1.5 flex gap-3 font-normal">
        <button type="button" {...stopProps(column)} data-fold onClick={onFold} className={SMALL}>
          Fold <span className="sr-only">{`option ${letter}`}</span>
        </button>
        {onToggleExcluded ? (
          <button type="button" {...stopProps(column)} onClick={onToggleExcluded} className={SMALL}>
            {isExcluded ? "Rank again" : "Set aside"} <span className="sr-only">{`option ${letter}`}</span>
          </button>
        ) : null}
      </span>
    </div>
  );
}
