import { mutationOptions, type QueryClient } from "@tanstack/react-query";
import {
  AccessTokensReply,
  type CreateAccessToken,
  CreatedAccessTokenReply,
} from "@/lib/schemas/access-token";
import { type SetStockPlates, StockPlatesReply } from "@/lib/schemas/catalog";
import { ExclusionsReply, RecalculationReply } from "@/lib/schemas/comparison";
import { type AddMember, MembersReply } from "@/lib/schemas/members";
import { DeletedReply, type Node, NodeReply, SavedDocument } from "@/lib/schemas/node";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { type CreateProject, type Project, ProjectReply, type UpdateProject } from "@/lib/schemas/project";
import { ApiProblem } from "./api-problem";
import { catalogKey, comparisonKeys, nodeKeys, projectKeys, tokensKey } from "./keys";
import { request } from "./request";

/** A save either went through, or somebody else's came first: then theirs is here and nothing was written. */
export type SaveNodeResult =
  | { readonly kind: "saved"; readonly node: Node }
  | { readonly kind: "conflict"; readonly message: string; readonly current: SavedDocument };

export interface SaveNodeInput {
  readonly document: NodeDocument;
  readonly expectedVersion: number;
}

/** @throws ApiProblem for every refusal but a conflict. */
export async function saveNode(nodeId: string, input: SaveNodeInput): Promise<SaveNodeResult> {
  try {
    const { node } = await request(NodeReply, `/api/nodes/${nodeId}`, { method: "PUT", body: input });
    return { kind: "saved", node };
  } catch (error) {
    if (!(error instanceof ApiProblem) || error.code !== "conflict") throw error;
    const current = SavedDocument.safeParse(error.current);
    if (!current.success) throw error;
    return { kind: "conflict", message: error.message, current: current.data };
  }
}

/** Saves a node. The cache takes the saved one; its comparison and the register are read again. */
export const saveNodeMutation = (queryClient: QueryClient, nodeId: string) =>
  mutationOptions({
    mutationFn: (input: SaveNodeInput) => saveNode(nodeId, input),
    onSuccess: async (result) => {
      if (result.kind === "conflict") return;
      queryClient.setQueryData(nodeKeys.one(nodeId), result.node);
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: nodeKeys.revisions(nodeId) }),
        queryClient.invalidateQueries({ queryKey: comparisonKeys.ofNode(nodeId) }),
        queryClient.invalidateQueries({ queryKey: projectKeys.nodes(result.node.projectId) }),
      ]);
    },
  });

export const createNodeMutation = (queryClient: QueryClient, projectId: string) =>
  mutationOptions({
    mutationFn: async (document: NodeDocument): Promise<Node> =>
      (await request(NodeReply, `/api/projects/${projectId}/nodes`, { method: "POST", body: { document } }))
        .node,
    onSuccess: async (node) => {
      queryClient.setQueryData(nodeKeys.one(node.id), node);
      await queryClient.invalidateQueries({ queryKey: projectKeys.all });
    },
  });

/** Takes a node off the register; its revisions stay in the database. */
export const deleteNodeMutation = (queryClient: QueryClient, nodeId: string) =>
  mutationOptions({
    mutationFn: ({ expectedVersion }: { readonly expectedVersion: number }) =>
      request(DeletedReply, `/api/nodes/${nodeId}?expectedVersion=${expectedVersion}`, { method: "DELETE" }),
    onSuccess: async () => {
      queryClient.removeQueries({ queryKey: nodeKeys.one(nodeId) });
      await queryClient.invalidateQueries({ queryKey: projectKeys.all });
    },
  });

/** Calculates the comparison anew from what the catalogue and the rates say now. */
export const recalculateMutation = (queryClient: QueryClient, nodeId: string) =>
  mutationOptions({
    mutationFn: () => request(RecalculationReply, `/api/nodes/${nodeId}/comparison`, { method: "POST" }),
    onSuccess: async ({ comparison }) => {
      queryClient.setQueryData(comparisonKeys.ofNode(nodeId), comparison);
      await queryClient.invalidateQueries({ queryKey: projectKeys.all });
    },
  });

/** Sets aside exactly these options; the comparison comes back ranked without them. */
export const setExclusionsMutation = (queryClient: QueryClient, nodeId: string) =>
  mutationOptions({
    mutationFn: async (optionKeys: readonly string[]): Promise<readonly string[]> =>
      (
        await request(ExclusionsReply, `/api/nodes/${nodeId}/exclusions`, {
          method: "PUT",
          body: { optionKeys },
        })
      ).excluded,
    onSuccess: async () => {
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: comparisonKeys.ofNode(nodeId), exact: true }),
        queryClient.invalidateQueries({ queryKey: nodeKeys.one(nodeId), exact: true }),
        queryClient.invalidateQueries({ queryKey: projectKeys.all }),
      ]);
    },
  });

export const createProjectMutation = (queryClient: QueryClient) =>
  mutationOptions({
    mutationFn: async (input: CreateProject): Promise<Project> =>
      (await request(ProjectReply, "/api/projects", { method: "POST", body: input })).project,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: projectKeys.all }),
  });

export const updateProjectMutation = (queryClient: QueryClient, projectId: string) =>
  mutationOptions({
    mutationFn: async (input: UpdateProject): Promise<Project> =>
      (await request(ProjectReply, `/api/projects/${projectId}`, { method: "PATCH", body: input })).project,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: projectKeys.all }),
  });

export const addMemberMutation = (queryClient: QueryClient, projectId: string) =>
  mutationOptions({
    mutationFn: (input: AddMember) =>
      request(MembersReply, `/api/projects/${projectId}/members`, { method: "POST", body: input }),
    onSuccess: (reply) => queryClient.setQueryData(projectKeys.members(projectId), reply),
  });

export const removeMemberMutation = (queryClient: QueryClient, projectId: string) =>
  mutationOptions({
    mutationFn: ({ personId }: { readonly personId: string }) =>
      request(MembersReply, `/api/projects/${projectId}/members/${personId}`, { method: "DELETE" }),
    onSuccess: (reply) => queryClient.setQueryData(projectKeys.members(projectId), reply),
  });

/** The reply holds the key, this once; the cache keeps only what the list shows. */
export const createTokenMutation = (queryClient: QueryClient) =>
  mutationOptions({
    mutationFn: (input: CreateAccessToken) =>
      request(CreatedAccessTokenReply, "/api/tokens", { method: "POST", body: input }),
    onSuccess: ({ tokens }) => queryClient.setQueryData(tokensKey, tokens),
  });

export const revokeTokenMutation = (queryClient: QueryClient) =>
  mutationOptions({
    mutationFn: async ({ tokenId }: { readonly tokenId: string }) =>
      (await request(AccessTokensReply, `/api/tokens/${tokenId}`, { method: "DELETE" })).tokens,
    onSuccess: (tokens) => queryClient.setQueryData(tokensKey, tokens),
  });

export const setStockPlatesMutation = (queryClient: QueryClient) =>
  mutationOptions({
    mutationFn: async (input: SetStockPlates) =>
      (await request(StockPlatesReply, "/api/catalog/stock-plates", { method: "PUT", body: input }))
        .stockPlates,
    onSuccess: async () => {
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: catalogKey }),
        queryClient.invalidateQueries({ queryKey: comparisonKeys.all }),
        queryClient.invalidateQueries({ queryKey: projectKeys.all }),
      ]);
    },
  });
