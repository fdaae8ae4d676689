import { listSummaries, type SummaryRecord } from "@/lib/db/repositories/comparisons";
import { listNodes, type NodeRecord } from "@/lib/db/repositories/nodes";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { logger } from "@/lib/log/logger";
import { canSeeMoney } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import { presentNodeRow } from "@/lib/presenters/present-node";
import type { MoneyShown } from "@/lib/schemas/comparison";
import type { NodeRow } from "@/lib/schemas/node";
import { calculateAndKeep, keysNow } from "./compare-node";
import { outdatedReasons } from "./outdated";
import { loadShop, type Shop } from "./shop";

/** How many nodes without a result one reading of the register calculates; the others wait for the next. */
const CALCULATED_AT_ONCE = 12;

/** Nodes that came in without being saved here (a seeded project) get their result when somebody looks. */
async function calculateMissing(
  actor: Actor,
  project: ProjectRow,
  nodes: readonly NodeRecord[],
  known: ReadonlySet<string>,
  shop: Shop,
): Promise<boolean> {
  const missing = nodes.filter((node) => !known.has(node.id)).slice(0, CALCULATED_AT_ONCE);
  for (const node of missing) {
    await calculateAndKeep(actor, project, node, shop).catch((error: unknown) => {
      logger.error({ err: error, nodeId: node.id }, "a node of the register could not be calculated");
    });
  }
  return missing.length > 0;
}

export interface Register {
  readonly nodes: NodeRow[];
  readonly money: MoneyShown;
}

/** The rows of a project's register, by mark. */
export async function registerOf(actor: Actor, project: ProjectRow): Promise<Register> {
  const [nodes, shop] = await Promise.all([listNodes(project.id), loadShop(project.organisationId)]);
  let summaries = await listSummaries(project.id);
  const known = new Set(summaries.map((summary) => summary.nodeId));
  if (await calculateMissing(actor, project, nodes, known, shop)) summaries = await listSummaries(project.id);
  const byNode = new Map<string, SummaryRecord>(summaries.map((summary) => [summary.nodeId, summary]));
  const rows = nodes.map((node) => {
    const stored = byNode.get(node.id);
    const outdated = stored === undefined ? [] : outdatedReasons(stored, keysNow(shop));
    return presentNodeRow(actor, project, node, stored, outdated);
  });
  return { nodes: rows, money: canSeeMoney(actor, project) ? "currency" : "index" };
}
