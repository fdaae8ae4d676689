import { writeAudit } from "@/lib/db/repositories/audit";
import {
  type CalculationKeys,
  type ComparisonRecord,
  findLatestComparison,
  insertComparison,
} from "@/lib/db/repositories/comparisons";
import { findNode, lockNode, type NodeRecord } from "@/lib/db/repositories/nodes";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { inTransaction } from "@/lib/db/transaction";
import { ENGINE } from "@/lib/evaluation/engine";
import { AppError, notFound } from "@/lib/http/app-error";
import { canRecalculate } from "@/lib/policies/node";
import { canSeeMoney } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import { differencesBetween, presentComparison } from "@/lib/presenters/present-comparison";
import type { Comparison, ComparisonDifference } from "@/lib/schemas/comparison";
import { calculate } from "./evaluate-node";
import { outdatedReasons } from "./outdated";
import { loadShop, type Shop } from "./shop";

/** What a calculation made now would name as its inputs. */
export const keysNow = (shop: Shop): CalculationKeys => ({
  engine: ENGINE,
  pricesKey: shop.pricesKey,
  catalogKey: shop.catalogKey,
});

/**
 * Calculates one version of a node and keeps the result. A save that comes in between is no harm: the
 * result names the version it was made from.
 */
export async function calculateAndKeep(
  actor: Actor,
  project: ProjectRow,
  node: NodeRecord,
  shop: Shop,
): Promise<ComparisonRecord> {
  const calculated = calculate(node.document, shop);
  return inTransaction(async (tx) => {
    await lockNode(tx, project.id, node.id);
    const { id: nodeId, version: nodeVersion } = node;
    const id = await insertComparison(tx, { ...calculated, nodeId, nodeVersion, createdBy: actor.personId });
    const line = { action: "comparison.calculated", subjectId: id, detail: { nodeId, nodeVersion } } as const;
    const { organisationId, id: projectId } = project;
    await writeAudit(tx, { actorId: actor.personId, organisationId, projectId, ...line });
    const kept = await findLatestComparison(nodeId, nodeVersion, tx);
    if (kept === null) throw new Error("The comparison that was just kept is not there.");
    return kept;
  });
}

async function mustFind(project: ProjectRow, nodeId: string): Promise<NodeRecord> {
  const node = await findNode(project.id, nodeId);
  if (node === null) throw notFound("node");
  return node;
}

/** The stored comparison of the current version as it was made; calculated only where there is none yet. */
export async function comparisonOf(actor: Actor, project: ProjectRow, nodeId: string): Promise<Comparison> {
  const [node, shop] = await Promise.all([mustFind(project, nodeId), loadShop(project.organisationId)]);
  const stored =
    (await findLatestComparison(nodeId, node.version)) ??
    (await calculateAndKeep(actor, project, node, shop));
  return presentComparison(stored, {
    excluded: node.excluded,
    seesMoney: canSeeMoney(actor, project),
    outdated: outdatedReasons(stored, keysNow(shop)),
  });
}

export interface Recalculated {
  readonly comparison: Comparison;
  readonly differences: ComparisonDifference[];
}

/** Makes a new comparison from what the catalogue and the rates say now. @throws AppError forbidden. */
export async function recalculate(actor: Actor, project: ProjectRow, nodeId: string): Promise<Recalculated> {
  if (!canRecalculate(actor, project)) {
    throw new AppError("forbidden", "You may read this comparison but not have it calculated anew.");
  }
  const [node, shop] = await Promise.all([mustFind(project, nodeId), loadShop(project.organisationId)]);
  const before = await findLatestComparison(nodeId, node.version);
  const after = await calculateAndKeep(actor, project, node, shop);
  const view = { excluded: node.excluded, seesMoney: canSeeMoney(actor, project), outdated: [] };
  return {
    comparison: presentComparison(after, view),
    differences: differencesBetween(before?.result ?? null, after.result, view),
  };
}
