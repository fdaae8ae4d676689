import { z } from "zod";
import {
  COST_CATEGORIES,
  compileTimeTable,
  DRIVER_NAMES,
  PRODUCTS,
  RATE_UNITS,
  RuleRefused,
  type ShopPrices,
} from "@/lib/cost";

// The shapes of the rows, for the models that keep them.
export type {
  LookUpTable,
  ProductName,
  RateUnit,
  RuleFormula,
  RuleFormulas,
  RuleUse,
  TimeRule,
} from "@/lib/cost";

/** The shop's three tables as files, uploads and the database carry them. Unknown keys and units are errors; every figure names its source. */

z.config({ jitless: true });

const text = z.string().trim().min(1).max(400);
const key = z.string().regex(/^[a-z][a-z0-9-]*$/, "Write a key in small letters, digits and hyphens.");
const name = z.string().regex(/^[a-z][A-Za-z0-9]*$/, "Write a name in letters and digits, starting small.");
const expression = z.string().trim().min(1).max(2000);
const source = z.string().trim().min(1, "Say where the figure comes from.").max(600);
const isoDate = z.iso.date();

/** numeric(14,6): what the database holds exactly. */
const rate = z
  .number()
  .min(0)
  .lt(1e8)
  .refine(
    (value) => Math.abs(value * 1e6 - Math.round(value * 1e6)) < 1e-3,
    "A rate has at most six decimals.",
  );

const Formula = z.strictObject({ key, label: text, expression, source });
const Formulas = z
  .strictObject({ chosen: key, formulas: z.array(Formula).min(1).max(20) })
  .refine(({ chosen, formulas }) => formulas.some((formula) => formula.key === chosen), {
    path: ["chosen"],
    message: "The chosen formula is not among them.",
  })
  .refine(({ formulas }) => new Set(formulas.map((formula) => formula.key)).size === formulas.length, {
    path: ["formulas"],
    message: "Give each formula a key of its own.",
  });

const Use = z.strictObject({
  item: z.string().regex(/^[a-z][a-z0-9.{}:-]*$/i),
  label: text,
  category: z.enum(COST_CATEGORIES),
  unit: z.enum(RATE_UNITS),
  quantity: Formula,
});

export const TimeRuleSchema = z
  .strictObject({
    key,
    operation: text,
    driver: z.enum(DRIVER_NAMES),
    category: z.enum(COST_CATEGORIES),
    trade: key.nullable(),
    workCentre: key.nullable(),
    where: z.enum(["shop", "site", "office"]),
    crew: z.number().positive().max(20),
    quantity: z.strictObject({ expression, unit: text }),
    runMinutes: Formulas.nullable(),
    setUpMinutes: Formula.nullable(),
    machineMinutes: Formula.nullable(),
    gives: name.nullable(),
    uses: z.array(Use).max(12),
  })
  .refine((rule) => (rule.runMinutes === null) === (rule.trade === null), {
    path: ["trade"],
    message: "Minutes need a trade, and a trade needs minutes.",
  })
  .refine((rule) => rule.machineMinutes === null || rule.workCentre !== null, {
    path: ["workCentre"],
    message: "Machine minutes need a work centre.",
  })
  .refine((rule) => rule.setUpMinutes === null || rule.runMinutes !== null, {
    path: ["setUpMinutes"],
    message: "A set-up needs an operation that takes minutes.",
  });

const NamedEntry = z.strictObject({ name: text, value: z.number(), source });
const NumberEntry = z.strictObject({ upTo: z.number(), value: z.number(), source });

export const LookUpTableSchema = z.discriminatedUnion("kind", [
  z
    .strictObject({
      kind: z.literal("named"),
      label: text,
      unit: text,
      entries: z.array(NamedEntry).min(1).max(200),
    })
    .refine(({ entries }) => new Set(entries.map((entry) => entry.name)).size === entries.length, {
      path: ["entries"],
      message: "Name each entry once.",
    }),
  z
    .strictObject({
      kind: z.enum(["steps", "linear"]),
      label: text,
      unit: text,
      entries: z.array(NumberEntry).min(1).max(200),
    })
    .refine(
      ({ entries }) =>
        entries.every((entry, index) => index === 0 || entry.upTo > (entries[index - 1]?.upTo ?? entry.upTo)),
      {
        path: ["entries"],
        message: "List the entries from the lowest limit up.",
      },
    ),
]);

export const TimeConstantSchema = z.strictObject({
  value: z.union([z.number(), text]),
  label: text,
  unit: text,
  source,
});

const TimeTableSchema = z
  .strictObject({
    id: text,
    label: text,
    rules: z.array(TimeRuleSchema).min(1).max(200),
    lookUps: z.record(name, LookUpTableSchema),
    constants: z.record(name, TimeConstantSchema),
  })
  .refine(({ rules }) => new Set(rules.map((rule) => rule.key)).size === rules.length, {
    path: ["rules"],
    message: "Give each rule a key of its own.",
  });

export const RateLineSchema = z
  .strictObject({ low: rate, likely: rate, high: rate, unit: z.enum(RATE_UNITS), source })
  .refine(({ low, likely, high }) => low <= likely && likely <= high, {
    path: ["likely"],
    message: "The likely rate lies between low and high.",
  });

const RateBookSchema = z.strictObject({
  id: text,
  label: text,
  currency: z.string().regex(/^[A-Z]{3}$/, "Write an ISO 4217 code such as EUR."),
  minorDigits: z.number().int().min(0).max(3),
  validFrom: isoDate,
  lines: z.record(z.string().min(1).max(120), RateLineSchema),
});

const CarbonTableSchema = z.strictObject({
  id: text,
  label: text,
  factors: z.partialRecord(
    z.enum(PRODUCTS),
    z.strictObject({ kgCo2ePerKg: z.number().min(0).max(100), source }),
  ),
});

/** The items of a rate book that a rule's item may stand for, with its braces filled. */
const itemsOf = (pattern: string): RegExp =>
  new RegExp(`^${pattern.replace(/[.]/g, "\\.").replace(/\{\w+\}/g, ".+")}$`);

export const ShopPricesSchema = z
  .strictObject({ timeTable: TimeTableSchema, rateBook: RateBookSchema, carbon: CarbonTableSchema })
  .superRefine(({ timeTable, rateBook }, context) => {
    try {
      compileTimeTable(timeTable);
    } catch (error) {
      if (!(error instanceof RuleRefused)) throw error;
      context.addIssue({ code: "custom", path: ["timeTable", "rules"], message: error.message });
    }
    const refuseUnit = (pattern: string, unit: string): void => {
      for (const [item, line] of Object.entries(rateBook.lines)) {
        if (line.unit === unit || !itemsOf(pattern).test(item)) continue;
        const message = `The time table counts ${item} in ${unit}, the rate book prices it per ${line.unit}.`;
        context.addIssue({ code: "custom", path: ["rateBook", "lines", item, "unit"], message });
      }
    };
    for (const rule of timeTable.rules) {
      if (rule.trade !== null) refuseUnit(`labour:${rule.trade}`, "h");
      if (rule.machineMinutes !== null && rule.workCentre !== null)
        refuseUnit(`machine:${rule.workCentre}`, "h");
      for (const use of rule.uses) refuseUnit(use.item, use.unit);
    }
  });

/**
 * Reads a shop's tables from a file, an upload or database rows.
 *
 * @throws ZodError naming every unknown key, unknown unit, figure without a source and expression outside the sandbox.
 */
export function parseShopPrices(json: unknown): ShopPrices {
  return ShopPricesSchema.parse(json);
}
