"use client";
import type { ResultDocument } from "@/lib/schemas/result-document";
import { formatMinutes, formatWholeMoney, moneyUnit } from "@/components/ui/format-number";
import { StackedFigure } from "@/components/cost/stacked-figure";
import { stackedShares, type LetteredOption } from "@/components/cost/stacked-shares";
import { isEvaluated } from "./comparison-cells";
import { sentenceCase } from "./component-labels";
import { columnLetter } from "./rank-words";

const categoryLabel = (category: string): string =>
  category === "column" ? "Heavier column" : sentenceCase(category);
const tradeLabel = (trade: string): string => sentenceCase(trade.replaceAll("-", " "));

/** Cost by category and hours by trade of every option that adds something and is inside the method. */
export function ComparisonCharts({ result }: { readonly result: ResultDocument }) {
  const options = result.options.flatMap((option, index): LetteredOption[] =>
    isEvaluated(option) && option.measures.length > 0 ? [{ letter: columnLetter(index), option }] : [],
  );
  const currency = options[0]?.option.estimate.currency ?? "";
  return (
    <div className="mt-10 grid gap-x-10 gap-y-8 min-[1200px]:grid-cols-2">
      <StackedFigure
        title="Cost by category"
        note={`${moneyUnit(currency)} a node, added to the bare node.`}
        shares={stackedShares(options, ({ estimate }) => estimate.costByCategory)}
        format={formatWholeMoney}
        label={categoryLabel}
      />
      <StackedFigure
        title="Hours by trade"
        note="Hours and minutes of people a node, added to the bare node."
        shares={stackedShares(options, ({ estimate }) => estimate.minutesByTrade)}
        format={formatMinutes}
        label={tradeLabel}
      />
    </div>
  );
}
