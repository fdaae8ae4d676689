import {
  findNode,
  findRevision,
  listRevisions,
  type NodeRecord,
  type RevisionRecord,
} from "@/lib/db/repositories/nodes";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { notFound } from "@/lib/http/app-error";

/** The node as last saved. The caller has seen to it that the actor may see the project. */
export async function readNode(project: ProjectRow, nodeId: string): Promise<NodeRecord> {
  const node = await findNode(project.id, nodeId);
  if (node === null) throw notFound("node");
  return node;
}

/** Every save, newest first, without the documents. */
export async function readRevisions(
  project: ProjectRow,
  nodeId: string,
): Promise<Omit<RevisionRecord, "document">[]> {
  const node = await readNode(project, nodeId);
  return listRevisions(node.id);
}

export async function readRevision(
  project: ProjectRow,
  nodeId: string,
  version: number,
): Promise<RevisionRecord> {
  const node = await readNode(project, nodeId);
  const revision = await findRevision(node.id, version);
  if (revision === null) throw notFound("revision");
  return revision;
}
