"use client";

import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { PageBody } from "@/components/layout/page-head";
import { forgetDraft } from "@/components/node/draft-store";
import { draftOf } from "@/components/node/node-draft";
import { NodeSheetForm } from "@/components/node/node-sheet-form";
import { SheetCrumbs } from "@/components/node/sheet-crumbs";
import { STARTING_DOCUMENT } from "@/components/node/starting-document";
import { useNodeDraft } from "@/components/node/use-node-draft";
import { Notice } from "@/components/ui/notice";
import { Failed, Loading } from "@/components/ui/states";
import type { Catalog } from "@/lib/catalog/catalog";
import { ApiProblem } from "@/lib/client/api-problem";
import { createNodeMutation } from "@/lib/client/mutations";
import { catalogOptions, projectOptions } from "@/lib/client/queries";
import type { NodeDocument } from "@/lib/schemas/node-document";
import type { Project } from "@/lib/schemas/project";

const STARTING = { version: 0, draft: draftOf(STARTING_DOCUMENT) };

function Ready({ project, catalog }: { readonly project: Project; readonly catalog: Catalog }) {
  const storeKey = `new-in-${project.id}`;
  const router = useRouter();
  const nodeDraft = useNodeDraft(storeKey, STARTING, catalog, project.abilities.editNodes);
  const create = useMutation(createNodeMutation(useQueryClient(), project.id));
  const onSave = (document: NodeDocument) =>
    create.mutate(document, {
      onSuccess: (node) => {
        forgetDraft(storeKey);
        router.replace(`/projects/${project.id}/nodes/${node.id}`);
      },
      onError: (error) => {
        if (error instanceof ApiProblem) nodeDraft.refuse(error.documentFields());
      },
    });
  return (
    <NodeSheetForm
      nodeDraft={nodeDraft}
      catalog={catalog}
      canEdit={project.abilities.editNodes}
      above={
        <SheetCrumbs projectId={project.id} projectName={project.name}>
          new, not saved yet
        </SheetCrumbs>
      }
      notices={
        <>
          {project.abilities.editNodes ? null : (
            <Notice title="You may look at this project, not add nodes to it." />
          )}
          {nodeDraft.isRestored ? (
            <Notice tone="tight" role="status" title="What you typed before is back. It was not saved." />
          ) : null}
          {create.error ? (
            <Notice tone="fail" role="alert" title="The node was not saved.">
              <p>{create.error.message}</p>
            </Notice>
          ) : null}
        </>
      }
      isSaving={create.isPending || create.isSuccess}
      saveLabel="Save node"
      comparisonHref={null}
      onSave={onSave}
    />
  );
}

/** The sheet of a new node in its states: loading, failed, ready. */
export function NewNodeSheet({ projectId }: { readonly projectId: string }) {
  const project = useQuery(projectOptions(projectId));
  const catalog = useQuery(catalogOptions());
  if (project.data && catalog.data) return <Ready project={project.data} catalog={catalog.data} />;
  const error = project.error ?? catalog.error;
  return (
    <PageBody>
      <div className="pt-6">
        {error ? (
          <Failed
            title="The project could not be read."
            error={error}
            onRetry={() => void Promise.all([project.refetch(), catalog.refetch()])}
          />
        ) : (
          <Loading what="the project" />
        )}
      </div>
    </PageBody>
  );
}
