import { QueryTypes, type Transaction } from "sequelize";
import { database } from "@/lib/db/transaction";
import type { ComparisonSummary } from "@/lib/schemas/comparison";
import type { ResultDocument } from "@/lib/schemas/result-document";
import { Comparison } from "@/models/comparison";

/** What a comparison was calculated from, besides the node's version. */
export interface CalculationKeys {
  readonly engine: string;
  readonly pricesKey: string;
  readonly catalogKey: string;
}

export interface NewComparison extends CalculationKeys {
  readonly nodeId: string;
  readonly nodeVersion: number;
  readonly summary: ComparisonSummary;
  readonly result: ResultDocument;
  readonly createdBy: string;
}

export interface ComparisonRecord extends CalculationKeys {
  readonly id: string;
  readonly nodeId: string;
  readonly nodeVersion: number;
  readonly result: ResultDocument;
  readonly createdBy: { readonly id: string; readonly name: string };
  readonly createdAt: Date;
}

export interface SummaryRecord extends CalculationKeys {
  readonly nodeId: string;
  readonly summary: ComparisonSummary;
}

export async function insertComparison(tx: Transaction, comparison: NewComparison): Promise<string> {
  return (await Comparison.create({ ...comparison }, { transaction: tx })).id;
}

/** The newest comparison of one version of a node. */
export async function findLatestComparison(
  nodeId: string,
  nodeVersion: number,
  tx: Transaction | null = null,
): Promise<ComparisonRecord | null> {
  const rows = await database().query<
    Omit<ComparisonRecord, "createdBy"> & { createdBy: string; createdByName: string }
  >(
    `SELECT c.id, c.node_id AS "nodeId", c.node_version AS "nodeVersion", c.engine, c.prices_key AS "pricesKey",
            c.catalog_key AS "catalogKey", c.result, c.created_by AS "createdBy", p.name AS "createdByName",
            c.created_at AS "createdAt"
       FROM comparisons c JOIN people p ON p.id = c.created_by
      WHERE c.node_id = :nodeId AND c.node_version = :nodeVersion
      ORDER BY c.created_at DESC, c.id DESC LIMIT 1`,
    { replacements: { nodeId, nodeVersion }, type: QueryTypes.SELECT, transaction: tx },
  );
  const row = rows[0];
  if (row === undefined) return null;
  const { createdBy, createdByName, ...rest } = row;
  return { ...rest, createdBy: { id: createdBy, name: createdByName } };
}

/** For the register: the newest summary of the current version of every node of a project. */
export async function listSummaries(projectId: string): Promise<SummaryRecord[]> {
  return database().query<SummaryRecord>(
    `SELECT DISTINCT ON (n.id) n.id AS "nodeId", c.engine, c.prices_key AS "pricesKey", c.catalog_key AS "catalogKey", c.summary
       FROM nodes n JOIN comparisons c ON c.node_id = n.id AND c.node_version = n.version
      WHERE n.project_id = :projectId AND n.deleted_at IS NULL
      ORDER BY n.id, c.created_at DESC, c.id DESC`,
    { replacements: { projectId }, type: QueryTypes.SELECT },
  );
}
