import type { Step } from "@/lib/calc/trace/trace";
import { formatFigures, formatNumber } from "@/components/ui/format-number";
import { ScrollBox } from "@/components/ui/scroll-box";
import { ExpressionMath } from "./expression-math";
import { sourceText, SymbolText, unitText } from "./symbol-text";

/** Inner units as a reader of calculations expects them: the exact value first, then kN or kNm. */
function inLargerUnit(value: number, unit: string): string | null {
  if (unit === "N" && Math.abs(value) >= 1000) return `${formatNumber(value / 1e3, 1)} kN`;
  if (unit === "Nmm" && Math.abs(value) >= 1e5) return `${formatNumber(value / 1e6, 1)} kNm`;
  if (unit === "Nmm/rad") return `${formatNumber(value / 1e6)} kNm/rad`;
  return null;
}

function Value({ value, unit }: { readonly value: number; readonly unit: string }) {
  const larger = inLargerUnit(value, unit);
  const [mantissa = "", exponent] = formatFigures(value, 5).split(" × 10^");
  return (
    <span className="whitespace-nowrap">
      {mantissa}
      {exponent === undefined ? null : (
        <>
          {" × 10"}
          <sup>{exponent}</sup>
        </>
      )}
      {unit === "1" ? "" : ` ${unitText(unit)}`}
      {larger ? <b className="font-semibold">{` = ${larger}`}</b> : null}
    </span>
  );
}

function Inputs({ step }: { readonly step: Step }) {
  const names = Object.keys(step.inputs);
  if (names.length === 0) return null;
  return (
    <ul className="mt-1 flex flex-wrap gap-x-4 gap-y-0.5 text-note text-soft" aria-label="Numbers put in">
      {names.map((name) => {
        const [symbol, unit] = step.symbols[name] ?? [name, "1"];
        return (
          <li key={name}>
            <SymbolText symbol={symbol} /> = <Value value={step.inputs[name] ?? NaN} unit={unit} />
          </li>
        );
      })}
    </ul>
  );
}

function StepBody({ step }: { readonly step: Step }) {
  return (
    <>
      <ScrollBox label="Formula">
        <ExpressionMath expression={step.expression} symbols={step.symbols} symbol={step.symbol} />
        <ExpressionMath
          expression={step.expression}
          symbols={step.symbols}
          inputs={step.inputs}
          result={{ value: step.value, unit: step.unit }}
        />
      </ScrollBox>
      <Inputs step={step} />
    </>
  );
}

export interface StepTreeProps {
  readonly steps: readonly Step[];
  /** Levels that stand open at first. */
  readonly openDepth?: number;
}

/** The working of a number: each step with its formula, the numbers put in, its result and where it comes from. Steps fold. */
export function StepTree({ steps, openDepth = 1 }: StepTreeProps) {
  return (
    <ol className="grid grid-cols-[minmax(0,1fr)] gap-2">
      {steps.map((step, index) => (
        <li key={`${step.id}-${index}`} className="border-l-2 border-rule2 pl-3">
          <details open={openDepth > 0}>
            <summary className="flex flex-wrap items-baseline justify-between gap-x-4 marker:content-none">
              <span className="font-semibold">
                <span aria-hidden="true" className="fold-mark mr-1.5 inline-block w-2.5 text-petrol" />
                <SymbolText symbol={step.symbol} /> = <Value value={step.value} unit={step.unit} />
              </span>
              <cite className="text-note text-soft not-italic">{`${sourceText(step.source)}, ${step.source.ref}`}</cite>
            </summary>
            <StepBody step={step} />
            {step.children && step.children.length > 0 ? (
              <div className="mt-2">
                <p className="mb-1 text-note font-semibold text-soft">
                  {step.children.length === 1
                    ? "From one step before"
                    : `From ${step.children.length} steps before`}
                </p>
                <StepTree steps={step.children} openDepth={openDepth - 1} />
              </div>
            ) : null}
          </details>
        </li>
      ))}
    </ol>
  );
}
