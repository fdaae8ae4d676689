"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { recalculateMutation, setExclusionsMutation } from "@/lib/client/mutations";
import { catalogOptions, comparisonOptions, nodeOptions, workingOptions } from "@/lib/client/queries";
import { inReadingOrder } from "@/lib/ranking/option-order";
import { verdictSentence } from "@/lib/ranking/verdict";
import type { Comparison, ComparisonDifference } from "@/lib/schemas/comparison";
import type { NodeDocument } from "@/lib/schemas/node-document";
import type { OptionDocument } from "@/lib/schemas/result-document";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { NodeDrawing } from "@/components/node/node-drawing";
import { Button, ButtonLink, ToolStrip } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Failed, Loading } from "@/components/ui/states";
import { useViewportWidth } from "@/components/ui/use-viewport-width";
import { ComparisonCharts } from "./comparison-charts";
import type { LoadCaseChoice, Opening } from "./comparison-cells";
import { ComparisonTable } from "./comparison-table";
import { differenceWords } from "./difference-words";
import { sectionWords } from "./measure-words";
import { drawOptions } from "./option-drawings";
import { ComparisonFoot } from "./comparison-foot";
import { columnLetter } from "./rank-words";
import { VerdictLine } from "./verdict-line";
import { WorkingPanel, type Working } from "./working-panel";

/** What is compared, in one line of facts. */
function nodeFacts(document: NodeDocument, version: number): string {
  const steel = typeof document.column.steel === "string" ? ` ${document.column.steel}` : "";
  const left = document.left ? sectionWords(document.left.beam.section) : null;
  const right = document.right ? sectionWords(document.right.beam.section) : null;
  const beams =
    left && right
      ? left === right
        ? `${left} both sides`
        : `${left} left, ${right} right`
      : `${left ?? right ?? ""} ${left ? "left" : "right"}`;
  return [
    document.reference,
    `revision ${version}`,
    `${document.quantity} alike`,
    `${sectionWords(document.column.section)}${steel}`,
    beams,
  ].join(" · ");
}

interface LoadCaseSelectProps {
  readonly document: NodeDocument;
  readonly choice: LoadCaseChoice;
  readonly onChoose: (choice: LoadCaseChoice) => void;
}

function LoadCaseSelect({ document, choice, onChoose }: LoadCaseSelectProps) {
  const count = document.loadCases.length;
  return (
    <select
      aria-label="Load case"
      className="control border-rule2"
      value={choice.kind === "one" ? choice.name : ""}
      onChange={(event) =>
        onChoose(event.target.value === "" ? { kind: "envelope" } : { kind: "one", name: event.target.value })
      }
    >
      <option value="">{count === 1 ? "The one load case" : `Envelope of ${count} load cases`}</option>
      {count === 1 ? null : document.loadCases.map(({ name }) => <option key={name}>{name}</option>)}
    </select>
  );
}

interface OutdatedProps {
  readonly comparison: Comparison;
  readonly canRecalculate: boolean;
  readonly differences: readonly ComparisonDifference[] | null;
  readonly isBusy: boolean;
  readonly error: unknown;
  readonly onRecalculate: () => void;
}

/** Says when the stored figures no longer match what they were made from, and what a recalculation changed. */
function OutdatedNotice({
  comparison,
  canRecalculate,
  differences,
  isBusy,
  error,
  onRecalculate,
}: OutdatedProps) {
  if (comparison.outdated.length > 0) {
    return (
      <Notice
        tone="tight"
        title="These figures are out of date"
        className="mb-4"
        actions={
          canRecalculate ? (
            <Button kind="primary" isBusy={isBusy} busyLabel="Recalculating" onClick={onRecalculate}>
              Recalculate
            </Button>
          ) : null
        }
      >
        <ul className="list-disc pl-4">
          {comparison.outdated.map((reason) => (
            <li key={reason}>{reason}</li>
          ))}
        </ul>
        {error ? (
          <p role="alert" className="mt-1 font-semibold text-fail">
            {error instanceof Error ? error.message : "The recalculation failed."}
          </p>
        ) : null}
      </Notice>
    );
  }
  if (differences === null) return null;
  return (
    <Notice
      tone="pass"
      role="status"
      title={differences.length === 0 ? "Recalculated: nothing changed" : "Recalculated"}
      className="mb-4"
    >
      <ul className="list-disc pl-4">
        {differences.map((difference) => (
          <li key={difference.key}>{differenceWords(difference)}</li>
        ))}
      </ul>
    </Notice>
  );
}

/** The option that is open, with its working read when the number needs one. */
function OpenPanel({
  comparison,
  open,
  choice,
  onClose,
}: {
  readonly comparison: Comparison;
  readonly open: OpenNumber;
  readonly choice: LoadCaseChoice;
  readonly onClose: () => void;
}) {
  const needsSteps = open.opening.about === "component" || open.opening.about === "joint";
  const query = useQuery({
    ...workingOptions(comparison.nodeId, comparison.id, open.optionKey),
    enabled: needsSteps,
  });
  const index = comparison.result.options.findIndex((option) => option.key === open.optionKey);
  const option = comparison.result.options[index];
  if (!option) return null;
  const working: Working = query.isError
    ? { state: "failed", error: query.error, retry: () => void query.refetch() }
    : query.data
      ? { state: "ready", option: query.data.option, caution: query.data.caution }
      : { state: "loading" };
  return (
    <WorkingPanel
      option={option}
      letter={columnLetter(index)}
      opening={open.opening}
      choice={choice}
      limit={comparison.result.node.target.utilisation}
      working={working}
      onClose={onClose}
    />
  );
}

interface OpenNumber {
  readonly optionKey: string;
  readonly opening: Opening;
}

function useDrawings(comparison: Comparison) {
  const catalog = useQuery(catalogOptions());
  const drawings = useMemo(
    () => (catalog.data ? drawOptions(comparison.result, catalog.data) : null),
    [catalog.data, comparison.result],
  );
  return function drawing(option: OptionDocument) {
    const drawn = drawings?.byKey.get(option.key);
    if (drawn && drawings)
      return <NodeDrawing drawing={drawn} extent={drawings.extent} className="mx-auto max-w-[190px]" />;
    return (
      <span className="block min-h-[190px] text-note text-soft">
        {catalog.isPending ? "Drawing…" : "Not drawn: a part is not in the catalogue."}
      </span>
    );
  };
}

/** The comparison with its options in the order they are read in: columns, letters and charts all follow it. */
const inOrder = (stored: Comparison): Comparison => ({
  ...stored,
  result: { ...stored.result, options: inReadingOrder(stored.result.options) },
});

function Ready({ stored, projectId }: { readonly stored: Comparison; readonly projectId: string }) {
  const comparison = useMemo(() => inOrder(stored), [stored]);
  const { result, nodeId } = comparison;
  const queryClient = useQueryClient();
  const abilities = useQuery(nodeOptions(nodeId)).data?.abilities;
  const recalculate = useMutation(recalculateMutation(queryClient, nodeId));
  const exclusions = useMutation(setExclusionsMutation(queryClient, nodeId));
  const [choice, setChoice] = useState<LoadCaseChoice>({ kind: "envelope" });
  const [open, setOpen] = useState<OpenNumber | null>(null);
  const drawing = useDrawings(comparison);
  const verdict = useMemo(() => verdictSentence(result), [result]);
  const excluded = exclusions.isPending ? (exclusions.variables ?? comparison.excluded) : comparison.excluded;
  return (
    <>
      <div className="stays-in-view">
        <PageHead
          above={nodeFacts(result.node, comparison.nodeVersion)}
          title={`How to stiffen the panel at ${result.node.reference}`}
          tools={
            <ToolStrip label="Comparison">
              <LoadCaseSelect document={result.node} choice={choice} onChoose={setChoice} />
              <ButtonLink href={`/projects/${projectId}/nodes/${nodeId}`}>Node sheet</ButtonLink>
            </ToolStrip>
          }
        >
          <VerdictLine verdict={verdict} />
        </PageHead>
        <OutdatedNotice
          comparison={comparison}
          canRecalculate={abilities?.recalculate ?? false}
          differences={recalculate.data?.differences ?? null}
          isBusy={recalculate.isPending}
          error={recalculate.error}
          onRecalculate={() => recalculate.mutate()}
        />
        {exclusions.error ? <Failed title="The option was not set aside." error={exclusions.error} /> : null}
      </div>
      <ComparisonTable
        result={result}
        choice={choice}
        excluded={excluded}
        onSetExcluded={abilities?.editNodes ? (keys) => exclusions.mutate(keys) : null}
        onOpen={(optionKey, opening) => setOpen({ optionKey, opening })}
        drawing={drawing}
      />
      <div className="stays-in-view">
        <ComparisonFoot comparison={comparison} />
        <ComparisonCharts result={result} />
      </div>
      {open ? (
        <OpenPanel comparison={comparison} open={open} choice={choice} onClose={() => setOpen(null)} />
      ) : null}
    </>
  );
}

/** The comparison of one node: reads it, and draws loading, failure, or the sheet. */
export function ComparisonScreen({
  projectId,
  nodeId,
}: {
  readonly projectId: string;
  readonly nodeId: string;
}) {
  const comparison = useQuery(comparisonOptions(nodeId));
  useViewportWidth();
  return (
    <PageBody>
      {comparison.isPending ? (
        <div className="pt-6">
          <Loading what="the comparison" />
        </div>
      ) : comparison.isError ? (
        <div className="pt-6">
          <Failed
            title="The comparison could not be read."
            error={comparison.error}
            onRetry={() => void comparison.refetch()}
          />
        </div>
      ) : comparison.data.result.options.length === 0 ? (
        <p className="pt-6">There is no option to compare.</p>
      ) : (
        <Ready stored={comparison.data} projectId={projectId} />
      )}
    </PageBody>
  );
}
