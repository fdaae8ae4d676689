import type { Metadata } from "next";
import { definedFormulas } from "@/lib/calc";
import { ExpressionMath } from "@/components/trace/expression-math";
import { SymbolText, unitText } from "@/components/trace/symbol-text";
import { ScrollBox } from "@/components/ui/scroll-box";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { formulaGroups, type ListedFormula } from "./formula-groups";

export const metadata: Metadata = { title: "Method" };

/** One formula as it stands in the program: symbol, expression, what goes in, where it comes from. */
function FormulaEntry({ formula }: { readonly formula: ListedFormula }) {
  const [symbol, unit] = formula.result;
  return (
    <li className="grid gap-x-8 gap-y-1 border-t border-rule py-3 desk:grid-cols-[15rem_minmax(0,1fr)]">
      <div>
        <p className="font-[650]">
          <SymbolText symbol={symbol} />
          {unit === "1" ? null : <span className="font-normal text-soft">{` in ${unitText(unit)}`}</span>}
        </p>
        <p className="text-note">{formula.source.ref}</p>
        <p className="text-note break-words text-soft">{formula.id}</p>
      </div>
      <div className="min-w-0">
        <ScrollBox label="Formula">
          <ExpressionMath expression={formula.expression} symbols={formula.symbols} symbol={symbol} />
        </ScrollBox>
        <ul aria-label="What goes in" className="mt-1 flex flex-wrap gap-x-4 text-note text-soft">
          {Object.entries(formula.symbols).map(([name, [inputSymbol, inputUnit]]) => (
            <li key={name}>
              <SymbolText symbol={inputSymbol} />
              {inputUnit === "1" ? "" : ` in ${unitText(inputUnit)}`}
            </li>
          ))}
        </ul>
      </div>
    </li>
  );
}

/** Every formula of the program, listed from the formulas themselves, so that the list cannot fall behind them. */
export default function MethodPage() {
  const groups = formulaGroups(definedFormulas());
  const count = groups.reduce((sum, group) => sum + group.formulas.length, 0);
  return (
    <PageBody>
      <PageHead title="Method">
        <p>
          {`The ${count} formulas the program computes with. This list is made from the formulas themselves: what is printed here is what is evaluated, and a test compares the two for each of them. `}
          Inside, lengths are mm, forces N, moments Nmm, stresses N/mm².
        </p>
      </PageHead>
      <section aria-labelledby="limits" className="max-w-[80ch] border-l-4 border-tight bg-sheet px-4 py-3">
        <h2 id="limits">Limits</h2>
        <p className="mt-1">
          The program supports a competent engineer’s judgement and does not replace it: national annexes, the
          project specification and the licensed engineer’s decision come first. Threaded bars with inner nuts
          are outside the clauses of EN 1993-1-8; their model is mechanics, its bounds are printed, and
          results outside the bounds are refused, not extrapolated. Fatigue, seismic detailing and fire are
          not covered.
        </p>
        <p className="mt-1">
          It is common practice, without a source, to count on inner nuts to cut the relative flange
          displacement of an HE 300 A with M20 bars under equal forces by about 40 %; linear finite elements
          without play gave 57 to 65 % in the study that the model was fitted to, and give 73 % at the nuts
          without an end plate in the one that is in the program’s source. The cautious design value 0.55 η
          gives 40 % there: that it agrees with the practice proves neither of them.
        </p>
      </section>
      <nav aria-label="Documents" className="mt-6 flex flex-wrap gap-x-6 gap-y-1">
        {groups.map((group) => (
          <a key={group.anchor} href={`#${group.anchor}`} className="prose-link">
            {`${group.title} (${group.formulas.length})`}
          </a>
        ))}
      </nav>
      {groups.map((group) => (
        <section key={group.anchor} aria-labelledby={group.anchor} className="mt-8">
          <h2 id={group.anchor} className="mb-2">
            {group.title}
          </h2>
          <ol className="border-t border-ink">
            {group.formulas.map((formula) => (
              <FormulaEntry key={formula.id} formula={formula} />
            ))}
          </ol>
        </section>
      ))}
    </PageBody>
  );
}
