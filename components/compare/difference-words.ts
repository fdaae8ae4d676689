import type { ComparisonDifference, OptionFigures } from "@/lib/schemas/comparison";
import { formatMoney } from "@/components/ui/format-number";

function figureChanges(before: OptionFigures, after: OptionFigures): readonly string[] {
  const changes: string[] = [];
  if (before.passes !== after.passes) changes.push(after.passes ? "passes now" : "fails now");
  if (before.utilisation !== after.utilisation) {
    changes.push(
      `utilisation ${before.utilisation?.toFixed(2) ?? "outside scope"} to ${after.utilisation?.toFixed(2) ?? "outside scope"}`,
    );
  }
  if (before.cost !== after.cost)
    changes.push(
      `cost ${before.cost === null ? "none" : formatMoney(before.cost)} to ${after.cost === null ? "none" : formatMoney(after.cost)}`,
    );
  if (before.rank !== after.rank) changes.push(`rank ${before.rank ?? "none"} to ${after.rank ?? "none"}`);
  return changes;
}

/** What a recalculation did to one option, in a line. */
export function differenceWords({ name, before, after }: ComparisonDifference): string {
  if (before === null) return `${name}: new`;
  if (after === null) return `${name}: no longer proposed`;
  return `${name}: ${figureChanges(before, after).join("; ") || "unchanged"}`;
}
