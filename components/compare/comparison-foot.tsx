import Link from "next/link";
import type { Comparison } from "@/lib/schemas/comparison";
import { commonCautions } from "./comparison-rows";

/** Said where the options themselves do not say it. */
const STANDING_CAUTIONS = [
  "Threaded bars with inner nuts are outside the clauses of the standard: a mechanics model stands in, its bounds are in the working, and results outside them are refused.",
  "Fatigue, seismic detailing and fire are not covered.",
  "The national annex, the project specification and the licensed engineer’s decision come first.",
];

/** What the figures are, what they rest on, who may rely on them, and how far. */
export function ComparisonFoot({ comparison }: { readonly comparison: Comparison }) {
  const { result, money, pricedBy, engine, createdAt, createdBy } = comparison;
  const common = commonCautions(result);
  const cautions = common.length > 0 ? common : STANDING_CAUTIONS;
  return (
    <div className="flex flex-wrap justify-between gap-x-10 gap-y-3 pt-3.5 text-note text-soft">
      <div className="max-w-[92ch]">
        <p>
          {`${result.basis}. `}
          <Link href="/method" className="prose-link">
            Every formula used
          </Link>
          . For every option:
        </p>
        <ul className="list-disc pl-4">
          {cautions.map((words) => (
            <li key={words}>{words}</li>
          ))}
        </ul>
      </div>
      <p>
        {money === "index"
          ? "Money as an index: the cheapest option that costs anything is 100. "
          : `${pricedBy}. `}
        {`${engine}, ${new Date(createdAt).toLocaleString("en-GB", { dateStyle: "medium", timeStyle: "short" })}, ${createdBy.name}`}
      </p>
    </div>
  );
}
