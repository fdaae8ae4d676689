import { z } from "zod";
import { COMPONENT_IDS } from "@/lib/calc/result";
import { PersonName } from "./me";
import { OptionDocument, ResultDocument } from "./result-document";

/** Utilisation and governing component of the column as it stands, or why there is no number. */
export const BareSummary = z.union([
  z.object({
    passes: z.boolean(),
    utilisation: z.number(),
    component: z.enum(COMPONENT_IDS),
    side: z.enum(["left", "right"]),
    loadCase: z.string(),
  }),
  z.object({ outsideScope: z.string() }),
]);

/** One ranked option in a line: money per node in the currency, shop minutes per node. */
export const RankedSummary = z.object({
  key: z.string(),
  name: z.string(),
  rank: z.number().int(),
  utilisation: z.number(),
  cost: z.number(),
  currency: z.string(),
  shopMinutes: z.number(),
});

/** What the register shows of a comparison. `bare` is null where the options given hold no bare column. */
export const ComparisonSummary = z.object({ bare: BareSummary.nullable(), ranked: z.array(RankedSummary) });

/**
 * How money stands in a reply: in the rate book's currency, or, for a member the owner of the rates
 * does not show money to, as an index with the cheapest option that costs anything = 100
 * (currency "XXX", the ISO 4217 code for none; no lines, no categories).
 */
export const MoneyShown = z.enum(["currency", "index"]);

export const Comparison = z.object({
  id: z.uuid(),
  nodeId: z.uuid(),
  nodeVersion: z.number().int(),
  engine: z.string(),
  /** Names the rate book version and the time table that priced it. */
  pricedBy: z.string(),
  createdAt: z.iso.datetime(),
  createdBy: PersonName,
  /** Why a recalculation would not read the same inputs any more; empty = up to date. */
  outdated: z.array(z.string()),
  money: MoneyShown,
  /** Keys of the options set aside on this node: shown, not ranked. */
  excluded: z.array(z.string()),
  result: ResultDocument,
});

const OptionFigures = z.object({
  passes: z.boolean(),
  /** Null = outside scope. */
  utilisation: z.number().nullable(),
  cost: z.number().nullable(),
  rank: z.number().int().nullable(),
});

/** What a recalculation changed: an option that came, went, or whose figures moved. */
export const ComparisonDifference = z.object({
  key: z.string(),
  name: z.string(),
  before: OptionFigures.nullable(),
  after: OptionFigures.nullable(),
});

export const ComparisonReply = z.object({ comparison: Comparison });
export const RecalculationReply = z.object({
  comparison: Comparison,
  differences: z.array(ComparisonDifference),
});

/** One option of a stored comparison, calculated again from its own inputs with every step of the working. */
export const WorkingQuery = z.object({ option: z.string().min(1, "Say which option.").max(60) });
export const WorkingReply = z.object({
  comparisonId: z.uuid(),
  engine: z.string(),
  /** Set when the engine that shows the working is not the one that made the stored numbers. */
  caution: z.string().nullable(),
  option: OptionDocument,
});

export const SetExclusions = z.strictObject({
  optionKeys: z
    .array(z.string().trim().min(1).max(60))
    .max(40)
    .refine((keys) => new Set(keys).size === keys.length, { message: "Name each option once." }),
});
export const ExclusionsReply = z.object({ excluded: z.array(z.string()) });

export type BareSummary = z.infer<typeof BareSummary>;
export type RankedSummary = z.infer<typeof RankedSummary>;
export type ComparisonSummary = z.infer<typeof ComparisonSummary>;
export type MoneyShown = z.infer<typeof MoneyShown>;
export type Comparison = z.infer<typeof Comparison>;
export type ComparisonDifference = z.infer<typeof ComparisonDifference>;
export type OptionFigures = z.infer<typeof OptionFigures>;
export type SetExclusions = z.infer<typeof SetExclusions>;
