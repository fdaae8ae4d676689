import type { OptionDocument } from "@/lib/schemas/result-document";
import { isEvaluated } from "./comparison-cells";

/** More columns than a laptop shows at once; from here on those that hold no number start folded. */
const MANY = 6;

/** Options whose columns start folded: outside scope, where there are many. */
export const startsFolded = (options: readonly OptionDocument[]): readonly string[] =>
  options.length > MANY ? options.filter((option) => !isEvaluated(option)).map(({ key }) => key) : [];

const mayFold = (option: OptionDocument): boolean => option.rank === null && option.measures.length > 0;

/** How many options there are of each standing, in the order of the columns. */
function countWords(options: readonly OptionDocument[]): string {
  const evaluated = options.filter(isEvaluated);
  const ranked = evaluated.filter(({ rank }) => rank !== null).length;
  const fails = evaluated.filter(({ passes }) => !passes).length;
  return [
    [ranked, "ranked"],
    [evaluated.length - ranked - fails, "set aside"],
    [fails, fails === 1 ? "fails" : "fail"],
    [options.length - evaluated.length, "outside scope"],
  ]
    .filter(([count]) => count !== 0)
    .map(([count, words]) => `${count} ${words}`)
    .join(", ");
}

export interface ColumnsLineProps {
  readonly options: readonly OptionDocument[];
  readonly folded: ReadonlySet<string>;
  readonly onFold: (folded: ReadonlySet<string>) => void;
}

const BUTTON = "prose-link";

/** What the columns hold, and how to fold away those that are not ranked. It stands where there are more than a laptop shows. */
export function ColumnsLine({ options, folded, onFold }: ColumnsLineProps) {
  if (options.length <= MANY && folded.size === 0) return null;
  const notRanked = options.filter(mayFold).map(({ key }) => key);
  const isAllFolded = notRanked.every((key) => folded.has(key));
  return (
    <div className="stays-in-view no-print flex flex-wrap items-baseline gap-x-5 gap-y-1 pb-2 text-label">
      <p role="status" className="text-soft">
        {`${options.length} options: ${countWords(options)}`}
        {folded.size > 0 ? `. ${folded.size} folded` : ""}
      </p>
      {isAllFolded ? null : (
        <button type="button" className={BUTTON} onClick={() => onFold(new Set([...folded, ...notRanked]))}>
          Fold what is not ranked
        </button>
      )}
      {folded.size > 0 ? (
        <button type="button" className={BUTTON} onClick={() => onFold(new Set())}>
          Unfold all
        </button>
      ) : null}
    </div>
  );
}
