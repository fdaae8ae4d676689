import { writeAudit } from "@/lib/db/repositories/audit";
import { insertComparison } from "@/lib/db/repositories/comparisons";
import {
  findNode,
  insertNode,
  isReferenceTaken,
  lockNode,
  markDeleted,
  type NodeRecord,
  replaceDocument,
  replaceExclusions,
} from "@/lib/db/repositories/nodes";
import { lockProject, type ProjectRow } from "@/lib/db/repositories/projects";
import { inTransaction, type Transaction } from "@/lib/db/transaction";
import { AppError, notFound } from "@/lib/http/app-error";
import { canEditNode } from "@/lib/policies/node";
import type { Actor } from "@/lib/policies/roles";
import { presentSaved } from "@/lib/presenters/present-saved";
import { type Calculated, checkDocument } from "./evaluate-node";
import { loadShop } from "./shop";

function mustEdit(actor: Actor, project: ProjectRow): void {
  if (project.isLocked)
    throw new AppError("forbidden", "This project is issued and locked; nobody changes it.");
  if (!canEditNode(actor, project))
    throw new AppError("forbidden", "You may look at this node but not change it.");
}

async function lockForEdit(
  tx: Transaction,
  actor: Actor,
  projectId: string,
  nodeId: string,
): Promise<NodeRecord> {
  const project = await lockProject(tx, projectId);
  const node = await lockNode(tx, projectId, nodeId);
  if (project === null || node === null) throw notFound("node");
  mustEdit(actor, project);
  return node;
}

function mustBeCurrent(node: NodeRecord, expectedVersion: number): void {
  if (node.version === expectedVersion) return;
  const message = `${node.savedBy.name} saved this node after you opened it. Nothing of yours was written; both versions are here.`;
  throw new AppError("conflict", message, { current: presentSaved(node) });
}

async function mustHaveFreeReference(
  tx: Transaction,
  projectId: string,
  reference: string,
  nodeId: string | null,
): Promise<void> {
  if (!(await isReferenceTaken(tx, projectId, reference, nodeId))) return;
  const message = "Another node of this project has that mark already.";
  throw new AppError("invalid", message, { fields: [{ path: "document.reference", message }] });
}

async function mustFind(tx: Transaction, projectId: string, nodeId: string): Promise<NodeRecord> {
  const node = await findNode(projectId, nodeId, tx);
  if (node === null) throw notFound("node");
  return node;
}

async function keepComparison(
  tx: Transaction,
  actor: Actor,
  node: NodeRecord,
  calculated: Calculated | null,
): Promise<void> {
  if (calculated === null) return;
  await insertComparison(tx, {
    ...calculated,
    nodeId: node.id,
    nodeVersion: node.version,
    createdBy: actor.personId,
  });
}

/** @throws AppError forbidden, invalid (every fault of the document, or a mark that is taken). */
export async function createNode(actor: Actor, project: ProjectRow, input: unknown): Promise<NodeRecord> {
  mustEdit(actor, project);
  const { document, calculated } = checkDocument(input, await loadShop(project.organisationId));
  return inTransaction(async (tx) => {
    const { id: projectId, organisationId } = project;
    const locked = await lockProject(tx, projectId);
    if (locked === null) throw notFound("project");
    mustEdit(actor, locked);
    await mustHaveFreeReference(tx, projectId, document.reference, null);
    const nodeId = await insertNode(tx, projectId, {
      document,
      savedBy: actor.personId,
      savedAt: new Date(),
    });
    const node = await mustFind(tx, projectId, nodeId);
    await keepComparison(tx, actor, node, calculated);
    const detail = { reference: document.reference };
    await writeAudit(tx, {
      actorId: actor.personId,
      organisationId,
      projectId,
      action: "node.created",
      subjectId: nodeId,
      detail,
    });
    return node;
  });
}

/**
 * Saves the next version of a node over the one that the sender had open.
 *
 * @throws AppError forbidden, invalid, conflict (with the document that stands, who saved it and when).
 */
export async function saveNode(
  actor: Actor,
  project: ProjectRow,
  nodeId: string,
  input: { readonly document: unknown; readonly expectedVersion: number },
): Promise<NodeRecord> {
  mustEdit(actor, project);
  const { document, calculated } = checkDocument(input.document, await loadShop(project.organisationId));
  return inTransaction(async (tx) => {
    const { id: projectId, organisationId } = project;
    const node = await lockForEdit(tx, actor, projectId, nodeId);
    mustBeCurrent(node, input.expectedVersion);
    await mustHaveFreeReference(tx, projectId, document.reference, nodeId);
    const version = await replaceDocument(tx, node, {
      document,
      savedBy: actor.personId,
      savedAt: new Date(),
    });
    const saved = await mustFind(tx, projectId, nodeId);
    await keepComparison(tx, actor, saved, calculated);
    const detail = { version };
    await writeAudit(tx, {
      actorId: actor.personId,
      organisationId,
      projectId,
      action: "node.saved",
      subjectId: nodeId,
      detail,
    });
    return saved;
  });
}

/** Takes a node off the register; its revisions and comparisons stay. @throws AppError forbidden, conflict. */
export async function deleteNode(
  actor: Actor,
  project: ProjectRow,
  nodeId: string,
  expectedVersion: number,
): Promise<void> {
  await inTransaction(async (tx) => {
    const { id: projectId, organisationId } = project;
    const node = await lockForEdit(tx, actor, projectId, nodeId);
    mustBeCurrent(node, expectedVersion);
    await markDeleted(tx, nodeId, new Date());
    const detail = { reference: node.reference, version: node.version };
    await writeAudit(tx, {
      actorId: actor.personId,
      organisationId,
      projectId,
      action: "node.deleted",
      subjectId: nodeId,
      detail,
    });
  });
}

/** Sets aside exactly these options. @throws AppError forbidden. */
export async function setExclusions(
  actor: Actor,
  project: ProjectRow,
  nodeId: string,
  optionKeys: readonly string[],
): Promise<readonly string[]> {
  return inTransaction(async (tx) => {
    const { id: projectId, organisationId } = project;
    await lockForEdit(tx, actor, projectId, nodeId);
    await replaceExclusions(tx, nodeId, optionKeys, actor.personId);
    const line = { action: "node.exclusions-set", subjectId: nodeId, detail: { optionKeys } } as const;
    await writeAudit(tx, { actorId: actor.personId, organisationId, projectId, ...line });
    return (await mustFind(tx, projectId, nodeId)).excluded;
  });
}
