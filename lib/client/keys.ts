/** Every query key, made in one place: a mutation invalidates by the same factory that a query reads by. */
export const meKey = ["me"] as const;
export const tokensKey = ["tokens"] as const;
export const catalogKey = ["catalog"] as const;
export const pricesKey = ["prices"] as const;

export const projectKeys = {
  all: ["projects"] as const,
  one: (projectId: string) => [...projectKeys.all, projectId] as const,
  nodes: (projectId: string) => [...projectKeys.all, projectId, "nodes"] as const,
  members: (projectId: string) => [...projectKeys.all, projectId, "members"] as const,
};

export const nodeKeys = {
  all: ["nodes"] as const,
  one: (nodeId: string) => [...nodeKeys.all, nodeId] as const,
  revisions: (nodeId: string) => [...nodeKeys.all, nodeId, "revisions"] as const,
  revision: (nodeId: string, version: number) => [...nodeKeys.revisions(nodeId), version] as const,
};

export const comparisonKeys = {
  all: ["comparison"] as const,
  ofNode: (nodeId: string) => [...comparisonKeys.all, nodeId] as const,
  working: (nodeId: string, comparisonId: string, optionKey: string) =>
    [...comparisonKeys.all, nodeId, "working", comparisonId, optionKey] as const,
};
