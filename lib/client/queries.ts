import { queryOptions } from "@tanstack/react-query";
import { AccessTokensReply } from "@/lib/schemas/access-token";
import { CatalogReply } from "@/lib/schemas/catalog";
import { ComparisonReply, WorkingReply } from "@/lib/schemas/comparison";
import { Me } from "@/lib/schemas/me";
import { MembersReply } from "@/lib/schemas/members";
import { NodeListReply, NodeReply, NodeRevisionListReply, NodeRevisionReply } from "@/lib/schemas/node";
import { PricesReply } from "@/lib/schemas/prices";
import { ProjectListReply, ProjectReply } from "@/lib/schemas/project";
import { catalogKey, comparisonKeys, meKey, nodeKeys, pricesKey, projectKeys, tokensKey } from "./keys";
import { request } from "./request";

const MINUTE_MS = 60_000;

/** Who is signed in and what they may do. */
export const meOptions = () =>
  queryOptions({
    queryKey: meKey,
    queryFn: ({ signal }) => request(Me, "/api/me", { signal }),
    staleTime: 5 * MINUTE_MS,
  });

/** Every project that the signed-in person may see. */
export const projectsOptions = () =>
  queryOptions({
    queryKey: projectKeys.all,
    queryFn: async ({ signal }) => (await request(ProjectListReply, "/api/projects", { signal })).projects,
  });

export const projectOptions = (projectId: string) =>
  queryOptions({
    queryKey: projectKeys.one(projectId),
    queryFn: async ({ signal }) =>
      (await request(ProjectReply, `/api/projects/${projectId}`, { signal })).project,
  });

/** Who is in the project, and whether the signed-in person may change that. */
export const membersOptions = (projectId: string) =>
  queryOptions({
    queryKey: projectKeys.members(projectId),
    queryFn: ({ signal }) => request(MembersReply, `/api/projects/${projectId}/members`, { signal }),
  });

/** The register: one row a node, and how money stands in it. */
export const projectNodesOptions = (projectId: string) =>
  queryOptions({
    queryKey: projectKeys.nodes(projectId),
    queryFn: ({ signal }) => request(NodeListReply, `/api/projects/${projectId}/nodes`, { signal }),
  });

/** The node as last saved. Not refetched behind the form's back: a save finds out about other saves. */
export const nodeOptions = (nodeId: string) =>
  queryOptions({
    queryKey: nodeKeys.one(nodeId),
    queryFn: async ({ signal }) => (await request(NodeReply, `/api/nodes/${nodeId}`, { signal })).node,
    refetchOnWindowFocus: false,
  });

export const revisionsOptions = (nodeId: string) =>
  queryOptions({
    queryKey: nodeKeys.revisions(nodeId),
    queryFn: async ({ signal }) =>
      (await request(NodeRevisionListReply, `/api/nodes/${nodeId}/revisions`, { signal })).revisions,
  });

/** One saved document; it never changes. */
export const revisionOptions = (nodeId: string, version: number) =>
  queryOptions({
    queryKey: nodeKeys.revision(nodeId, version),
    queryFn: async ({ signal }) =>
      (await request(NodeRevisionReply, `/api/nodes/${nodeId}/revisions/${version}`, { signal })).revision,
    staleTime: Infinity,
  });

/** The stored comparison of the node's current version; the first reading calculates it. */
export const comparisonOptions = (nodeId: string) =>
  queryOptions({
    queryKey: comparisonKeys.ofNode(nodeId),
    queryFn: async ({ signal }) =>
      (await request(ComparisonReply, `/api/nodes/${nodeId}/comparison`, { signal })).comparison,
    staleTime: MINUTE_MS,
  });

/** One option of that comparison with every step of its working; the same comparison always gives the same. */
export const workingOptions = (nodeId: string, comparisonId: string, optionKey: string) =>
  queryOptions({
    queryKey: comparisonKeys.working(nodeId, comparisonId, optionKey),
    queryFn: ({ signal }) =>
      request(WorkingReply, `/api/nodes/${nodeId}/working?option=${encodeURIComponent(optionKey)}`, {
        signal,
      }),
    staleTime: Infinity,
  });

/** One's own access tokens, without their keys. */
export const tokensOptions = () =>
  queryOptions({
    queryKey: tokensKey,
    queryFn: async ({ signal }) => (await request(AccessTokensReply, "/api/tokens", { signal })).tokens,
  });

/** Sections, angles, steels, fasteners, stock plates: changes rarely, so one copy serves the visit. */
export const catalogOptions = () =>
  queryOptions({
    queryKey: catalogKey,
    queryFn: ({ signal }) => request(CatalogReply, "/api/catalog", { signal }),
    staleTime: 60 * MINUTE_MS,
  });

/** The current rate book and time table of one's own organisation. */
export const pricesOptions = () =>
  queryOptions({
    queryKey: pricesKey,
    queryFn: async ({ signal }) => (await request(PricesReply, "/api/prices", { signal })).prices,
    staleTime: 5 * MINUTE_MS,
  });
