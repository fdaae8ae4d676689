import { findRevision } from "@/lib/db/repositories/nodes";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { ENGINE } from "@/lib/evaluation/engine";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import { notFound } from "@/lib/http/app-error";
import type { Actor } from "@/lib/policies/roles";
import type { NodeDocument } from "@/lib/schemas/node-document";
import type { OptionDocument } from "@/lib/schemas/result-document";
import { comparisonOf } from "./compare-node";
import { loadShop, type Shop } from "./shop";

export interface OptionWorking {
  readonly comparisonId: string;
  readonly engine: string;
  readonly caution: string | null;
  readonly option: OptionDocument;
}

/** The stored option calculated again as it was sized, with every step. */
function withSteps(
  document: NodeDocument,
  { key, name, measures }: OptionDocument,
  shop: Shop,
): OptionDocument {
  const evaluated = evaluateDocument({ ...document, options: [{ key, name, measures }] }, shop, {
    steps: "all",
  });
  const option = evaluated.ok ? evaluated.result.options[0] : undefined;
  if (option === undefined) throw new Error(`The stored option ${key} cannot be calculated any more.`);
  return option;
}

/** Strengths and steps are the new ones; rank and money stand as they were stored, with their neighbours. */
function asStored(fresh: OptionDocument, stored: OptionDocument): OptionDocument {
  if ("outsideScope" in fresh || "outsideScope" in stored)
    return { ...fresh, rank: null, notRanked: stored.notRanked ?? "" };
  const { rank, notRanked, estimate, sizing } = stored;
  return { ...fresh, rank, notRanked, estimate, sizing };
}

/**
 * One option of the stored comparison with its whole working, rebuilt from the comparison's own inputs.
 * Where the engine has moved on since, `caution` says that the numbers may differ.
 */
export async function workingOf(
  actor: Actor,
  project: ProjectRow,
  nodeId: string,
  optionKey: string,
): Promise<OptionWorking> {
  // Calculates the comparison where nobody has opened it yet, and shows money only to who may see it.
  const shown = await comparisonOf(actor, project, nodeId);
  const stored = shown.result.options.find((option) => option.key === optionKey);
  if (stored === undefined) throw notFound("option");
  const [revision, shop] = await Promise.all([
    findRevision(nodeId, shown.nodeVersion),
    loadShop(project.organisationId),
  ]);
  if (revision === null) throw notFound("revision");
  const option = asStored(withSteps(revision.document, stored, shop), stored);
  const caution =
    shown.engine === ENGINE
      ? null
      : `The stored figures were made by ${shown.engine}; this working is by ${ENGINE} and may differ. Recalculate to bring them together.`;
  return { comparisonId: shown.id, engine: ENGINE, caution, option };
}
