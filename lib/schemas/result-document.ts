import { z } from "zod";
import { COMPONENT_IDS } from "@/lib/calc/result";
import type { Step } from "@/lib/calc/trace/trace";
import { MeasureInput, NodeDocument } from "./node-document";

/** The result document: what the evaluator, the API and the command line answer. kN, kNm, mm, kNm/rad, kg. */

const Side = z.enum(["left", "right"]);
const Level = z.enum(["top", "bottom"]);

export const StepDocument: z.ZodType<Step> = z.lazy(() =>
  z.object({
    id: z.string(),
    symbol: z.string(),
    expression: z.string(),
    inputs: z.record(z.string(), z.number()),
    symbols: z.record(z.string(), z.tuple([z.string(), z.string()])),
    value: z.number(),
    unit: z.string(),
    source: z.object({ document: z.string(), edition: z.string(), ref: z.string() }),
    children: z.array(StepDocument).optional(),
  }),
) as z.ZodType<Step>;

export const ComponentDocument = z.object({
  component: z.enum(COMPONENT_IDS),
  side: Side,
  level: Level.optional(),
  row: z.number().int().optional(),
  rows: z.array(z.number().int()).optional(),
  loadCase: z.string(),
  clause: z.string(),
  /** Which of several rules of the component this is. */
  what: z.string().optional(),
  /** kN, kNm (joint-moment), mm or ratio (detailing). */
  unit: z.enum(["kN", "kNm", "mm", "ratio"]),
  demand: z.number(),
  resistance: z.number(),
  utilisation: z.number(),
  stiffnessCoefficient: z.number().optional(),
  steps: z.array(StepDocument).optional(),
});

export const JointDocument = z.object({
  side: Side,
  loadCase: z.string(),
  momentResistance: z.number(),
  initialStiffness: z.number(),
  secantStiffness: z.number().nullable(),
  leverArm: z.number(),
  stiffnessClass: z.enum(["pinned", "semi-rigid", "rigid"]),
  strengthClass: z.enum(["pinned", "partial-strength", "full-strength"]),
  /** S_j,ini from which the joint is rigid, kNm/rad; null where no joint can be. Left out of results of older engines. */
  rigidFrom: z.number().nullable().optional(),
  /** Of 6.4: enough for plastic analysis, not shown, or the least rotation in rad. Left out of results of older engines. */
  rotationCapacity: z.union([z.enum(["enough", "not-shown"]), z.object({ atLeast: z.number() })]).optional(),
  /** ψ of Table 6.8. Left out of results of older engines. */
  stiffnessExponent: z.number().optional(),
  rows: z.array(z.object({ row: z.number().int(), force: z.number() })),
  steps: z.array(StepDocument).optional(),
});

export const EstimateLineDocument = z.object({
  operation: z.string(),
  category: z.string(),
  trade: z.string().nullable(),
  quantity: z.number(),
  quantityUnit: z.string(),
  minutes: z.number(),
  cost: z.number(),
  source: z.string(),
});

export const EstimateDocument = z.object({
  /** Per node, the difference from the bare node. */
  cost: z.number(),
  currency: z.string(),
  minutesByTrade: z.record(z.string(), z.number()),
  /** Elapsed shop time per node. */
  shopMinutes: z.number(),
  siteMinutes: z.number(),
  mass: z.number(),
  carbon: z.number(),
  /** For `node.quantity` nodes. */
  costForQuantity: z.number(),
  costByCategory: z.record(z.string(), z.number()),
  lines: z.array(EstimateLineDocument),
});

const optionHead = { key: z.string(), name: z.string(), measures: z.array(MeasureInput) };

export const EvaluatedOptionDocument = z.object({
  ...optionHead,
  passes: z.boolean(),
  governing: z.object({
    component: z.enum(COMPONENT_IDS),
    side: Side,
    loadCase: z.string(),
    utilisation: z.number(),
  }),
  stiffnessReached: z.boolean(),
  /** What fails on the connection's own side, which no column stiffening cures. */
  connectionFailure: z.string().nullable(),
  /** Proposed options: why this is the best that stock can do, where it fails. */
  sizing: z.string().nullable(),
  cautions: z.array(z.string()),
  joints: z.array(JointDocument),
  components: z.array(ComponentDocument),
  estimate: EstimateDocument,
  rank: z.number().int().nullable(),
  notRanked: z.string().nullable(),
});

export const OutsideScopeOptionDocument = z.object({
  ...optionHead,
  outsideScope: z.object({ reason: z.string() }),
  rank: z.null(),
  notRanked: z.string(),
});

export const OptionDocument = z.union([EvaluatedOptionDocument, OutsideScopeOptionDocument]);

export const ResultDocument = z.object({
  node: NodeDocument,
  basis: z.string(),
  engine: z.string(),
  options: z.array(OptionDocument),
});

export const DocumentErrors = z.object({
  errors: z.array(z.object({ path: z.string(), message: z.string() })),
});

export type ResultDocument = z.infer<typeof ResultDocument>;
export type OptionDocument = z.infer<typeof OptionDocument>;
export type EvaluatedOptionDocument = z.infer<typeof EvaluatedOptionDocument>;
export type OutsideScopeOptionDocument = z.infer<typeof OutsideScopeOptionDocument>;
export type ComponentDocument = z.infer<typeof ComponentDocument>;
export type JointDocument = z.infer<typeof JointDocument>;
export type EstimateDocument = z.infer<typeof EstimateDocument>;
export type DocumentErrors = z.infer<typeof DocumentErrors>;
