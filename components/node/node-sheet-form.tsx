"use client";

import { useCallback, useMemo, useState, type ReactNode } from "react";
import { PageBody, PageHead } from "@/components/layout/page-head";
import type { Catalog } from "@/lib/catalog/catalog";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { BareResult } from "./bare-result";
import { DraftFormProvider, type DraftForm } from "./draft-form";
import { FaultsList, focusField } from "./faults-list";
import { JsonDialog } from "./json-dialog";
import { LoadCaseGrid } from "./load-case-grid";
import { documentTyped, numberTyped, textAt } from "./node-draft";
import { ColumnFields, FabricationFields, FactorFields, NodeFacts, TargetFields } from "./node-fields";
import { SheetBar } from "./sheet-bar";
import { SheetElevation, SheetSection } from "./sheet-drawing";
import { SideFields } from "./side-fields";
import { useBareOutcome } from "./use-bare-outcome";
import type { NodeDraft } from "./use-node-draft";
import { useSaveKey } from "./use-save-key";

export interface NodeSheetFormProps {
  readonly nodeDraft: NodeDraft;
  readonly catalog: Catalog;
  readonly canEdit: boolean;
  /** Breadcrumbs and facts over the title. */
  readonly above: ReactNode;
  /** What stands between the head and the form: a conflict set aside, a refusal, a restored draft. */
  readonly notices: ReactNode;
  readonly isSaving: boolean;
  readonly saveLabel: string;
  readonly comparisonHref: string | null;
  readonly onSave: (document: NodeDocument) => void;
}

/** The node sheet: form and drawing side by side, each following the other, and the bare column's result at once. */
export function NodeSheetForm(props: NodeSheetFormProps) {
  const { nodeDraft, catalog, canEdit } = props;
  const { draft, reading, refused, set, edit } = nodeDraft;
  const [activePath, setActivePath] = useState<string | null>(null);
  const [showsJson, setShowsJson] = useState(false);
  const bare = useBareOutcome(reading.node);
  const errors = useMemo(() => new Map([...refused, ...reading.errors]), [refused, reading.errors]);

  const form = useMemo<DraftForm>(
    () => ({
      draft,
      catalog,
      readOnly: !canEdit,
      set,
      edit,
      errorAt: (path) => errors.get(path),
      onFocus: setActivePath,
    }),
    [draft, catalog, canEdit, set, edit, errors],
  );
  const goToFault = useCallback(() => {
    const [first] = reading.errors.keys();
    if (first !== undefined) focusField(first);
  }, [reading]);
  const { onSave, isSaving } = props;
  const save = useCallback(() => {
    if (isSaving) return;
    if (reading.document) onSave(reading.document);
    else goToFault();
  }, [reading, onSave, isSaving, goToFault]);
  useSaveKey(canEdit ? save : null);

  const limit = numberTyped(textAt(draft, "target.utilisation")) || 1;
  const reference = textAt(draft, "reference").trim();
  return (
    <DraftFormProvider value={form}>
      <PageBody>
        <PageHead above={props.above} title={reference === "" ? "Node without a reference" : reference} />
        <SheetBar
          bare={bare}
          limit={limit}
          faultCount={reading.errors.size}
          isChanged={nodeDraft.isChanged}
          canEdit={canEdit}
          isSaving={isSaving}
          saveLabel={props.saveLabel}
          comparisonHref={props.comparisonHref}
          onSave={save}
          onDrop={() => edit(() => nodeDraft.opened.draft)}
          onUndo={nodeDraft.undo}
          onFirstFault={goToFault}
          onJson={() => setShowsJson(true)}
        />
        <div className="mt-3 grid gap-2 empty:hidden">
          {props.notices}
          <FaultsList errors={errors} />
        </div>
        <Sheet nodeDraft={nodeDraft} activePath={activePath} canEdit={canEdit}>
          <BareResult bare={bare} limit={limit} isStale={reading.node === null} />
        </Sheet>
        <LoadCaseGrid errors={errors} />
        <div className="grid gap-x-8 desk:grid-cols-2 wide:grid-cols-3">
          <TargetFields />
          <FactorFields />
          <FabricationFields />
        </div>
      </PageBody>
      {showsJson ? (
        <JsonDialog
          document={documentTyped(draft)}
          fileName={`${reference.replace(/[^A-Za-z0-9]+/g, "-") || "node"}.json`}
          readOnly={!canEdit}
          onClose={() => setShowsJson(false)}
          onImport={(imported) => {
            edit(() => imported);
            setShowsJson(false);
          }}
        />
      ) : null}
    </DraftFormProvider>
  );
}

interface SheetProps {
  readonly nodeDraft: NodeDraft;
  readonly activePath: string | null;
  readonly canEdit: boolean;
  readonly children: ReactNode;
}

/** Form on the left, drawing and result on the right; the right side stays in sight while the form is long. */
function Sheet({ nodeDraft, activePath, canEdit, children }: SheetProps) {
  const { draft, reading, drawn, set } = nodeDraft;
  const drawing = {
    node: drawn,
    draft,
    isBehind: reading.drawable === null,
    activePath,
    onEdit: canEdit ? set : null,
  };
  return (
    <div className="mt-4 grid gap-x-8 gap-y-4 desk:grid-cols-[minmax(0,31rem)_minmax(0,1fr)] wide:grid-cols-[minmax(0,33rem)_minmax(0,1fr)]">
      <div className="order-2 min-w-0 desk:order-1">
        <NodeFacts />
        <ColumnFields />
        <SideFields />
      </div>
      <div className="order-1 min-w-0 desk:sticky desk:top-14 desk:order-2 desk:max-h-[calc(100dvh-4rem)] desk:self-start desk:overflow-y-auto desk:pb-2">
        <div className="grid gap-x-8 gap-y-3 wide:grid-cols-[minmax(0,1fr)_minmax(0,27rem)]">
          <section aria-label="Drawing" className="border-t border-ink pt-2">
            <SheetElevation {...drawing} />
          </section>
          <div className="wide:row-span-2">{children}</div>
          <section aria-label="Section" className="border-t border-ink pt-2">
            <SheetSection {...drawing} />
          </section>
        </div>
      </div>
    </div>
  );
}
