import { z } from "zod";
import { BareSummary, MoneyShown, RankedSummary } from "./comparison";
import { PersonName } from "./me";
import { NodeDocument } from "./node-document";
import { ProjectAbilities } from "./project";

export const CreateNode = z.strictObject({ document: NodeDocument });

export const SaveNode = z.strictObject({
  document: NodeDocument,
  /** The version that was open when the change was made. */
  expectedVersion: z.number().int().positive(),
});

/**
 * What the routes check first: the document inside is checked by the evaluator, whose faults also cover
 * sections, steels and bolts that the catalogue does not know.
 */
export const CreateNodeEnvelope = CreateNode.extend({ document: z.unknown() });
export const SaveNodeEnvelope = SaveNode.extend({ document: z.unknown() });

/** Query of a DELETE. */
export const DeleteNodeQuery = z.strictObject({ expectedVersion: z.coerce.number().int().positive() });

/** A document as it was saved, with the one who saved it. */
export const SavedDocument = z.object({
  document: NodeDocument,
  version: z.number().int(),
  savedBy: PersonName,
  savedAt: z.iso.datetime(),
});

export const Node = SavedDocument.extend({
  id: z.uuid(),
  projectId: z.uuid(),
  projectName: z.string(),
  excluded: z.array(z.string()),
  abilities: ProjectAbilities,
});

/**
 * Where a node stands: `bare-passes` nothing to do; `solved` an option ranks first; `nothing-passes`
 * no option does; `outside-scope` the method does not cover it; `not-compared` no result yet.
 */
export const NODE_STATES = [
  "bare-passes",
  "solved",
  "nothing-passes",
  "outside-scope",
  "not-compared",
] as const;

export const NodeRow = z.object({
  id: z.uuid(),
  reference: z.string(),
  /** Section in words: the designation, or dimensions of a section of one's own. */
  column: z.string(),
  beams: z.object({ left: z.string().nullable(), right: z.string().nullable() }),
  quantity: z.number().int(),
  version: z.number().int(),
  updatedAt: z.iso.datetime(),
  updatedBy: PersonName,
  bare: BareSummary.nullable(),
  leading: RankedSummary.nullable(),
  state: z.enum(NODE_STATES),
  /** Reasons why the figures of the row would change if calculated again. */
  outdated: z.array(z.string()),
});

export const NodeReply = z.object({ node: Node });
export const NodeListReply = z.object({ nodes: z.array(NodeRow), money: MoneyShown });

export const NodeRevision = z.object({
  version: z.number().int(),
  savedBy: PersonName,
  savedAt: z.iso.datetime(),
});
export const NodeRevisionListReply = z.object({ revisions: z.array(NodeRevision) });
export const NodeRevisionReply = z.object({ revision: SavedDocument });

export const DeletedReply = z.object({ deleted: z.literal(true) });

export type CreateNode = z.infer<typeof CreateNode>;
export type SaveNode = z.infer<typeof SaveNode>;
export type SavedDocument = z.infer<typeof SavedDocument>;
export type Node = z.infer<typeof Node>;
export type NodeState = (typeof NODE_STATES)[number];
export type NodeRow = z.infer<typeof NodeRow>;
export type NodeRevision = z.infer<typeof NodeRevision>;
