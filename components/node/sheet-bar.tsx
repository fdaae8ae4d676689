"use client";

import { Button, ButtonLink } from "@/components/ui/button";
import { Sentence } from "./bare-result";
import { bareSummary } from "./bare-result-words";
import type { BareOutcome } from "./use-bare-outcome";

export interface SheetBarProps {
  readonly bare: BareOutcome | null;
  readonly limit: number;
  readonly faultCount: number;
  readonly isChanged: boolean;
  readonly canEdit: boolean;
  readonly isSaving: boolean;
  readonly saveLabel: string;
  /** Null for a node that is not saved yet. */
  readonly comparisonHref: string | null;
  readonly onSave: () => void;
  readonly onDrop: () => void;
  readonly onUndo: (() => void) | null;
  readonly onFirstFault: () => void;
  readonly onJson: () => void;
}

function standWords({
  faultCount,
  isChanged,
  canEdit,
  comparisonHref,
}: Pick<SheetBarProps, "faultCount" | "isChanged" | "canEdit" | "comparisonHref">): string {
  if (!canEdit) return "";
  if (faultCount > 0)
    return faultCount === 1 ? "one field not in order" : `${faultCount} fields not in order`;
  if (comparisonHref === null) return "not saved yet";
  return isChanged ? "changed, not saved" : "saved";
}

/** The line that stays in sight: the verdict in a few words, whether all is saved, and what to do next. */
export function SheetBar(props: SheetBarProps) {
  const { bare, limit, isChanged, canEdit, isSaving, comparisonHref } = props;
  const stand = standWords(props);
  return (
    <div className="no-print sticky top-0 z-20 -mx-5 flex flex-wrap items-center justify-between gap-x-6 gap-y-1.5 border-y border-ink bg-paper px-5 py-1.5 desk:-mx-9 desk:px-9">
      <p className="min-w-0 flex-1">
        {bare === null || bare.outcome.kind === "fault" ? (
          <span className="text-soft">no result yet</span>
        ) : (
          <Sentence parts={bareSummary(bare.outcome, limit)} />
        )}
        {props.faultCount > 0 && canEdit ? (
          <button
            type="button"
            onClick={props.onFirstFault}
            className="ml-3 text-note font-semibold text-fail hover:underline"
          >
            <span aria-hidden="true">▲ </span>
            {stand}
          </button>
        ) : (
          <span className="ml-3 text-note text-soft">{stand}</span>
        )}
      </p>
      <div
        role="group"
        aria-label="Node"
        className="flex flex-wrap *:-ml-px *:focus-visible:z-10 [&>*]:relative"
      >
        <Button onClick={props.onJson}>JSON</Button>
        {canEdit && props.onUndo ? <Button onClick={props.onUndo}>Undo</Button> : null}
        {canEdit && isChanged ? <Button onClick={props.onDrop}>Drop changes</Button> : null}
        {comparisonHref ? (
          <ButtonLink href={comparisonHref} kind={canEdit && isChanged ? "plain" : "primary"}>
            {isChanged && canEdit ? "Compare as saved" : "Compare options"}
          </ButtonLink>
        ) : null}
        {canEdit ? (
          <Button
            kind={isChanged || comparisonHref === null ? "primary" : "plain"}
            isBusy={isSaving}
            busyLabel="Saving"
            onClick={props.onSave}
          >
            {props.saveLabel}
          </Button>
        ) : null}
      </div>
    </div>
  );
}
