"use client";

import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { PageBody } from "@/components/layout/page-head";
import { ConflictDialog, momentWords } from "@/components/node/conflict-dialog";
import { onTop } from "@/components/node/draft-differences";
import { draftOf, isDraftObject, type DraftObject } from "@/components/node/node-draft";
import { NodeSheetForm } from "@/components/node/node-sheet-form";
import { SheetCrumbs } from "@/components/node/sheet-crumbs";
import { useNodeDraft } from "@/components/node/use-node-draft";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Failed, Loading } from "@/components/ui/states";
import type { Catalog } from "@/lib/catalog/catalog";
import { ApiProblem } from "@/lib/client/api-problem";
import { saveNodeMutation } from "@/lib/client/mutations";
import { catalogOptions, nodeOptions } from "@/lib/client/queries";
import type { Node, SavedDocument } from "@/lib/schemas/node";
import type { NodeDocument } from "@/lib/schemas/node-document";

/** A save that somebody else's came before. */
interface Conflict {
  readonly message: string;
  readonly theirs: SavedDocument;
}

interface NoticesProps {
  readonly node: Node;
  readonly isRestored: boolean;
  readonly setAside: DraftObject | null;
  readonly error: Error | null;
  readonly onDrop: () => void;
  readonly onBringBack: () => void;
}

function Notices({ node, isRestored, setAside, error, onDrop, onBringBack }: NoticesProps) {
  return (
    <>
      {node.abilities.editNodes ? null : (
        <Notice title="You may look at this node, not change it.">
          <p>
            Nodes are changed by the designers of the project. You can read every field, the drawing and the
            result, and open the comparison.
          </p>
        </Notice>
      )}
      {isRestored ? (
        <Notice
          tone="tight"
          role="status"
          title="What you typed before is back."
          actions={<Button onClick={onDrop}>Drop it</Button>}
        >
          <p>It was not saved. Save it, or drop it for the node as it is on record.</p>
        </Notice>
      ) : null}
      {setAside ? (
        <Notice
          role="status"
          title="Your own version is set aside, not lost."
          actions={<Button onClick={onBringBack}>Bring it back</Button>}
        />
      ) : null}
      {error ? (
        <Notice tone="fail" role="alert" title="The node was not saved.">
          <p>{error.message}</p>
        </Notice>
      ) : null}
    </>
  );
}

function Ready({ node, catalog }: { readonly node: Node; readonly catalog: Catalog }) {
  const canEdit = node.abilities.editNodes;
  const nodeDraft = useNodeDraft(
    node.id,
    { version: node.version, draft: draftOf(node.document) },
    catalog,
    canEdit,
  );
  const save = useMutation(saveNodeMutation(useQueryClient(), node.id));
  const [conflict, setConflict] = useState<Conflict | null>(null);
  const [setAside, putAside] = useState<DraftObject | null>(null);
  const { opened, draft } = nodeDraft;

  /** What was typed while the save was on its way stays, as a change on top of it. */
  const takeSaved = (saved: SavedDocument, sent: DraftObject) => {
    const savedDraft = draftOf(saved.document);
    nodeDraft.open({ version: saved.version, draft: savedDraft }, (now) => (now === sent ? savedDraft : now));
  };
  const onSave = (document: NodeDocument) =>
    save.mutate(
      { document, expectedVersion: opened.version },
      {
        onSuccess: (result) => {
          if (result.kind === "conflict") setConflict({ message: result.message, theirs: result.current });
          else takeSaved(result.node, draft);
        },
        onError: (error) => {
          if (error instanceof ApiProblem) nodeDraft.refuse(error.documentFields());
        },
      },
    );
  const takeUp = (theirs: SavedDocument, mine?: DraftObject) => {
    nodeDraft.open(
      { version: theirs.version, draft: draftOf(theirs.document) },
      mine ? () => mine : undefined,
    );
    setConflict(null);
  };
  const merged = (theirs: SavedDocument): DraftObject => {
    const laid = onTop(opened.draft, draft, draftOf(theirs.document));
    return isDraftObject(laid) ? laid : draft;
  };
  return (
    <>
      <NodeSheetForm
        nodeDraft={nodeDraft}
        catalog={catalog}
        canEdit={canEdit}
        above={
          <SheetCrumbs projectId={node.projectId} projectName={node.projectName}>
            {`version ${node.version}, saved by ${node.savedBy.name}, ${momentWords(node.savedAt)}`}
          </SheetCrumbs>
        }
        notices={
          <Notices
            node={node}
            isRestored={nodeDraft.isRestored}
            setAside={setAside}
            error={save.error}
            onDrop={() => nodeDraft.open({ version: node.version, draft: draftOf(node.document) })}
            onBringBack={() => {
              if (setAside) nodeDraft.edit(() => setAside);
              putAside(null);
            }}
          />
        }
        isSaving={save.isPending}
        saveLabel="Save"
        comparisonHref={`/projects/${node.projectId}/nodes/${node.id}/comparison`}
        onSave={onSave}
      />
      {conflict ? (
        <ConflictDialog
          message={conflict.message}
          opened={opened.draft}
          mine={draft}
          theirs={conflict.theirs}
          onKeepMine={() => takeUp(conflict.theirs, merged(conflict.theirs))}
          onTakeTheirs={() => {
            putAside(draft);
            takeUp(conflict.theirs);
          }}
          onClose={() => setConflict(null)}
        />
      ) : null}
    </>
  );
}

/** The node sheet in its states: loading, failed, ready. */
export function NodeSheet({ projectId, nodeId }: { readonly projectId: string; readonly nodeId: string }) {
  const node = useQuery(nodeOptions(nodeId));
  const catalog = useQuery(catalogOptions());
  if (node.data && catalog.data && node.data.projectId === projectId)
    return <Ready node={node.data} catalog={catalog.data} />;
  const error =
    node.error ??
    catalog.error ??
    (node.data && node.data.projectId !== projectId
      ? new Error("This node belongs to another project.")
      : null);
  return (
    <PageBody>
      <div className="pt-6">
        {error ? (
          <Failed
            title="The node could not be read."
            error={error}
            onRetry={() => void Promise.all([node.refetch(), catalog.refetch()])}
          />
        ) : (
          <Loading what="the node" />
        )}
      </div>
    </PageBody>
  );
}
