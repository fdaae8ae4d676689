import type { SummaryRecord } from "@/lib/db/repositories/comparisons";
import type { NodeRecord } from "@/lib/db/repositories/nodes";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import { canSeeMoney } from "@/lib/policies/project";
import type { Actor } from "@/lib/policies/roles";
import type { ComparisonSummary, RankedSummary } from "@/lib/schemas/comparison";
import type { Node, NodeRow, NodeState } from "@/lib/schemas/node";
import type { SectionInput } from "@/lib/schemas/node-document";
import { costIndexer, NO_CURRENCY } from "./cost-index";
import { projectAbilities } from "./present-project";
import { presentSaved } from "./present-saved";

export const presentNode = (actor: Actor, project: ProjectRow, node: NodeRecord): Node => ({
  ...presentSaved(node),
  id: node.id,
  projectId: project.id,
  projectName: project.name,
  excluded: [...node.excluded],
  abilities: projectAbilities(actor, project),
});

/** A designation as it stands, or the dimensions of a section of one's own in mm. */
export function sectionInWords(section: SectionInput): string {
  if (typeof section === "string") return section;
  const kind = "weld" in section ? "welded" : "rolled";
  return `${kind} ${section.h} × ${section.b} × ${section.tw} / ${section.tf}`;
}

function stateOf(summary: ComparisonSummary | undefined, leading: RankedSummary | null): NodeState {
  if (summary === undefined) return "not-compared";
  const { bare } = summary;
  if (bare !== null && "passes" in bare && bare.passes) return "bare-passes";
  if (leading !== null) return "solved";
  return bare !== null && "outsideScope" in bare ? "outside-scope" : "nothing-passes";
}

/** Left out: the document, and money where the rates are another organisation's business. */
export function presentNodeRow(
  actor: Actor,
  project: ProjectRow,
  node: NodeRecord,
  stored: SummaryRecord | undefined,
  outdated: readonly string[],
): NodeRow {
  const { document } = node;
  const summary = stored?.summary;
  const leading = summary?.ranked.find((option) => !node.excluded.includes(option.key)) ?? null;
  const toIndex = costIndexer(summary?.ranked.map((option) => option.cost) ?? []);
  const shown =
    leading === null || canSeeMoney(actor, project)
      ? leading
      : { ...leading, cost: toIndex(leading.cost), currency: NO_CURRENCY };
  return {
    id: node.id,
    reference: node.reference,
    column: sectionInWords(document.column.section),
    beams: {
      left: document.left === undefined ? null : sectionInWords(document.left.beam.section),
      right: document.right === undefined ? null : sectionInWords(document.right.beam.section),
    },
    quantity: document.quantity,
    version: node.version,
    updatedAt: node.savedAt.toISOString(),
    updatedBy: node.savedBy,
    bare: summary?.bare ?? null,
    leading: shown,
    state: stateOf(summary, leading),
    outdated: [...outdated],
  };
}
