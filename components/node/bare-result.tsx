"use client";

import type { EvaluatedOption } from "@/lib/calc/result";
import {
  caseWords,
  COMPONENT_ROWS,
  componentLabel,
  sentenceCase,
} from "@/components/compare/component-labels";
import { UtilisationBar, UtilisationFigure } from "@/components/compare/utilisation-bar";
import { formatNumber } from "@/components/ui/format-number";
import { bareSentence, componentLines, jointLines, type SentencePart } from "./bare-result-words";
import type { BareOutcome } from "./use-bare-outcome";

const TONES = { pass: "font-[650] text-pass", fail: "font-[650] text-fail", strong: "font-[650]" } as const;

/** A sentence with its weighty words marked. */
export const Sentence = ({ parts }: { readonly parts: readonly SentencePart[] }) =>
  parts.map((part, index) =>
    part.tone ? (
      <b key={index} className={TONES[part.tone]}>
        {part.text}
      </b>
    ) : (
      <span key={index}>{part.text}</span>
    ),
  );

const STIFFNESS_STEP = 100;
const stiffnessText = (value: number): string =>
  formatNumber(value >= 10 * STIFFNESS_STEP ? Math.round(value / STIFFNESS_STEP) * STIFFNESS_STEP : value);

function Utilisations({ outcome, limit }: { readonly outcome: EvaluatedOption; readonly limit: number }) {
  const lines = componentLines(
    outcome,
    [...COMPONENT_ROWS.panel, ...COMPONENT_ROWS.connection, "detailing"],
    limit,
  );
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Utilisation of each component, the worst of all load cases</caption>
      <thead className="sr-only">
        <tr>
          <th scope="col">Component</th>
          <th scope="col">Bar</th>
          <th scope="col">Utilisation</th>
          <th scope="col">Where</th>
        </tr>
      </thead>
      <tbody>
        {lines.map(({ component, check, isGoverning }) => (
          <tr key={component} className="border-t border-rule">
            <th scope="row" className={`py-1 pr-3 text-left ${isGoverning ? "font-[650]" : "font-normal"}`}>
              {sentenceCase(componentLabel(component))}
              {isGoverning ? <span className="text-note font-normal text-soft"> governs</span> : null}
            </th>
            <td className="w-[32%] py-1">
              <UtilisationBar value={check.utilisation} limit={limit} />
            </td>
            <td className="py-1 pl-2 text-right">
              <UtilisationFigure value={check.utilisation} limit={limit} />
            </td>
            <td className="py-1 pl-3 text-note whitespace-nowrap text-soft">{`${check.side}, ${caseWords(check.loadCase)}`}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Joints({ outcome }: { readonly outcome: EvaluatedOption }) {
  return (
    <table className="mt-3 w-full border-collapse">
      <caption className="sr-only">What each joint can do, the least of all load cases</caption>
      <thead>
        <tr className="border-t border-ink text-left text-note text-soft">
          <th scope="col" className="py-1 font-[650] text-ink">
            Joint
          </th>
          <th scope="col" className="font-normal">
            moment resistance
          </th>
          <th scope="col" className="font-normal">
            initial stiffness
          </th>
        </tr>
      </thead>
      <tbody>
        {jointLines(outcome).map((joint) => (
          <tr key={joint.side} className="border-t border-rule align-top">
            <th scope="row" className="py-1 text-left font-normal">
              {joint.side}
            </th>
            <td className="py-1">
              {formatNumber(joint.resistanceKnm, joint.resistanceKnm < 100 ? 1 : 0)}{" "}
              <span className="text-note text-soft">kNm</span>
              <span className="block text-note text-soft">{joint.strengthClass.replace("-", " ")}</span>
            </td>
            <td className="py-1">
              {stiffnessText(joint.stiffnessKnmPerRad)} <span className="text-note text-soft">kNm/rad</span>
              <span className="block text-note text-soft">{joint.stiffnessClass}</span>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** Stands where the calculation gave no cautions of its own. */
const Caution = () => (
  <p className="mt-3 border-t border-rule pt-2 text-note text-soft">
    To EN 1993-1-8:2005. National annexes, the project specification and the licensed engineer’s decision come
    first. Fatigue, seismic detailing and fire are not covered.
  </p>
);

export interface BareResultProps {
  readonly bare: BareOutcome | null;
  /** The target utilisation. */
  readonly limit: number;
  /** True while fields are not in order, so that the result is of the node before. */
  readonly isStale: boolean;
}

/** Is the bare column good enough? The answer in a sentence, then by component, then by joint. */
export function BareResult({ bare, limit, isStale }: BareResultProps) {
  return (
    <section aria-label="Bare column" className="border-t border-ink pt-2">
      <div aria-live="polite" data-testid="bare-result" className="text-lead">
        {bare === null ? (
          <p className="text-soft">The result appears when every field is in order.</p>
        ) : bare.outcome.kind === "fault" ? (
          <p className="text-fail">{`The bare column could not be calculated: ${bare.outcome.message}`}</p>
        ) : (
          <p>
            <Sentence parts={bareSentence(bare.outcome, limit)} />
          </p>
        )}
        {bare !== null && isStale ? (
          <p className="text-note text-tight">
            ◆ Of the last node that was in order; see the fields marked ▲.
          </p>
        ) : null}
      </div>
      {bare?.outcome.kind === "evaluated" ? (
        <>
          {bare.outcome.connectionFailure ? (
            <p className="mt-1 font-semibold text-fail">{bare.outcome.connectionFailure}</p>
          ) : null}
          <div className="mt-2">
            <Utilisations outcome={bare.outcome} limit={limit} />
          </div>
          <Joints outcome={bare.outcome} />
          {bare.outcome.cautions.length > 0 ? (
            <ul
              className="mt-3 list-disc border-t border-rule pt-2 pl-4 text-note text-soft"
              aria-label="Cautions"
            >
              {bare.outcome.cautions.map((caution) => (
                <li key={caution}>{caution}</li>
              ))}
            </ul>
          ) : null}
        </>
      ) : null}
      {bare?.outcome.kind === "evaluated" ? null : <Caution />}
    </section>
  );
}
