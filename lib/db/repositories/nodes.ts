import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { Node } from "@/models/node";
import { NodeExclusion } from "@/models/node-exclusion";
import { NodeRevision } from "@/models/node-revision";

export interface NodeRecord {
  readonly id: string;
  readonly projectId: string;
  readonly reference: string;
  readonly document: NodeDocument;
  readonly version: number;
  readonly savedBy: { readonly id: string; readonly name: string };
  readonly savedAt: Date;
  readonly excluded: readonly string[];
}

export type RevisionRecord = Pick<NodeRecord, "document" | "version" | "savedBy" | "savedAt">;

interface RawNode {
  readonly id: string;
  readonly project_id: string;
  readonly reference: string;
  readonly document: NodeDocument;
  readonly version: number;
  readonly saved_by: string;
  readonly saved_by_name: string;
  readonly saved_at: Date;
  readonly excluded: string[];
}

const SELECT = `
  SELECT n.id, n.project_id, n.reference, n.document, n.version, n.saved_by, p.name AS saved_by_name, n.saved_at,
         ARRAY(SELECT e.option_key FROM node_exclusions e WHERE e.node_id = n.id ORDER BY e.option_key) AS excluded
    FROM nodes n JOIN people p ON p.id = n.saved_by
   WHERE n.deleted_at IS NULL`;

function asRecord(raw: RawNode): NodeRecord {
  return {
    id: raw.id,
    projectId: raw.project_id,
    reference: raw.reference,
    document: raw.document,
    version: raw.version,
    savedBy: { id: raw.saved_by, name: raw.saved_by_name },
    savedAt: raw.saved_at,
    excluded: raw.excluded,
  };
}

/** The project a node belongs to, so that membership can be asked before anything of the node is read. */
export async function findProjectIdOfNode(nodeId: string): Promise<string | null> {
  database();
  const node = await Node.findOne({ where: { id: nodeId, deletedAt: null }, attributes: ["projectId"] });
  return node?.projectId ?? null;
}

/** The nodes on the register of one project, by mark. */
export async function listNodes(projectId: string): Promise<NodeRecord[]> {
  const rows = await database().query<RawNode>(
    `${SELECT} AND n.project_id = :projectId ORDER BY n.reference`,
    {
      replacements: { projectId },
      type: QueryTypes.SELECT,
    },
  );
  return rows.map(asRecord);
}

/** A node through its project: a node of another project is not found. */
export async function findNode(
  projectId: string,
  nodeId: string,
  tx: Transaction | null = null,
): Promise<NodeRecord | null> {
  const rows = await database().query<RawNode>(`${SELECT} AND n.project_id = :projectId AND n.id = :nodeId`, {
    replacements: { projectId, nodeId },
    type: QueryTypes.SELECT,
    transaction: tx,
  });
  return rows[0] === undefined ? null : asRecord(rows[0]);
}

/** The same, held against every other save until the transaction ends. */
export async function lockNode(
  tx: Transaction,
  projectId: string,
  nodeId: string,
): Promise<NodeRecord | null> {
  await Node.findOne({
    where: { id: nodeId, projectId },
    attributes: ["id"],
    transaction: tx,
    lock: tx.LOCK.UPDATE,
  });
  return findNode(projectId, nodeId, tx);
}

export async function isReferenceTaken(
  tx: Transaction,
  projectId: string,
  reference: string,
  exceptNodeId: string | null,
): Promise<boolean> {
  const other = await Node.findOne({
    where: { projectId, reference, deletedAt: null },
    attributes: ["id"],
    transaction: tx,
  });
  return other !== null && other.id !== exceptNodeId;
}

export interface NodeSave {
  readonly document: NodeDocument;
  readonly savedBy: string;
  readonly savedAt: Date;
}

async function keepRevision(tx: Transaction, nodeId: string, version: number, save: NodeSave): Promise<void> {
  await NodeRevision.create({ nodeId, version, ...save }, { transaction: tx });
}

export async function insertNode(tx: Transaction, projectId: string, save: NodeSave): Promise<string> {
  const { id } = await Node.create(
    { projectId, reference: save.document.reference, version: 1, ...save },
    { transaction: tx },
  );
  await keepRevision(tx, id, 1, save);
  return id;
}

/** Writes the next version over a locked node and keeps it as a revision. */
export async function replaceDocument(tx: Transaction, node: NodeRecord, save: NodeSave): Promise<number> {
  const version = node.version + 1;
  await Node.update(
    { reference: save.document.reference, version, ...save },
    { where: { id: node.id }, transaction: tx },
  );
  await keepRevision(tx, node.id, version, save);
  return version;
}

export async function markDeleted(tx: Transaction, nodeId: string, now: Date): Promise<void> {
  await Node.update({ deletedAt: now }, { where: { id: nodeId }, transaction: tx });
}

export async function replaceExclusions(
  tx: Transaction,
  nodeId: string,
  optionKeys: readonly string[],
  excludedBy: string,
): Promise<void> {
  await NodeExclusion.destroy({ where: { nodeId }, transaction: tx });
  await NodeExclusion.bulkCreate(
    optionKeys.map((optionKey) => ({ nodeId, optionKey, excludedBy })),
    { transaction: tx },
  );
}

/** Every save of a node, newest first; `document` is heavy and read one at a time. */
export async function listRevisions(nodeId: string): Promise<Omit<RevisionRecord, "document">[]> {
  const rows = await database().query<Omit<RawNode, "document">>(
    `SELECT r.version, r.saved_by, p.name AS saved_by_name, r.saved_at
       FROM node_revisions r JOIN people p ON p.id = r.saved_by WHERE r.node_id = :nodeId ORDER BY r.version DESC`,
    { replacements: { nodeId }, type: QueryTypes.SELECT },
  );
  return rows.map((row) => ({
    version: row.version,
    savedBy: { id: row.saved_by, name: row.saved_by_name },
    savedAt: row.saved_at,
  }));
}

export async function findRevision(nodeId: string, version: number): Promise<RevisionRecord | null> {
  const rows = await database().query<RawNode>(
    `SELECT r.version, r.document, r.saved_by, p.name AS saved_by_name, r.saved_at
       FROM node_revisions r JOIN people p ON p.id = r.saved_by WHERE r.node_id = :nodeId AND r.version = :version`,
    { replacements: { nodeId, version }, type: QueryTypes.SELECT },
  );
  const raw = rows[0];
  if (raw === undefined) return null;
  const { document, saved_at: savedAt, saved_by: id, saved_by_name: name } = raw;
  return { version, document, savedAt, savedBy: { id, name } };
}
