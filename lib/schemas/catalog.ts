import { z } from "zod";
import { type Catalog, SECTION_FAMILIES } from "@/lib/catalog/catalog";

/** The catalogue as the API gives it; lengths mm, areas mm2, strengths N/mm2, kg/m. */

const figure = z.number().finite();
const source = z.string();

const Section = z.object({
  designation: z.string(),
  family: z.enum(SECTION_FAMILIES),
  depthMm: figure,
  widthMm: figure,
  webThicknessMm: figure,
  flangeThicknessMm: figure,
  rootRadiusMm: figure,
  massKgPerM: figure,
  source,
});

const Angle = z.object({
  designation: z.string(),
  legAMm: figure,
  legBMm: figure,
  thicknessMm: figure,
  rootRadiusMm: figure,
  toeRadiusMm: figure,
  source,
});

const Steel = z.object({
  standard: z.string(),
  grade: z.string(),
  table: z.enum(["product-standard", "en1993-1-1-table-3.1"]),
  overMm: figure,
  upToMm: figure,
  yieldMpa: figure,
  ultimateMpa: figure,
  source,
});

const Fastener = z.object({
  size: z.string(),
  diameterMm: figure,
  pitchMm: figure,
  stressAreaMm2: figure,
  holeMm: figure,
  acrossFlatsMm: figure,
  acrossPointsMm: figure,
  headHeightMm: figure,
  nutHeightMm: figure,
  washerDiameterMm: figure,
  washerThicknessMm: figure,
  preloaded: z
    .object({
      acrossFlatsMm: figure,
      acrossPointsMm: figure,
      nutHeightMm: figure,
      nutHeightHvMm: figure.nullable(),
      washerDiameterMm: figure,
      washerThicknessMm: figure,
    })
    .nullable(),
  source,
});

const FastenerGrade = z.object({
  name: z.string(),
  yieldMpa: figure,
  ultimateMpa: figure,
  alphaV: figure,
  source,
});

export const StockPlate = z.object({ thicknessMm: figure, source });

export const CatalogReply: z.ZodType<Catalog> = z.object({
  sections: z.array(Section),
  angles: z.array(Angle),
  steels: z.array(Steel),
  fasteners: z.array(Fastener),
  fastenerGrades: z.array(FastenerGrade),
  stockPlates: z.array(StockPlate),
});

/** The thicknesses that the shop keeps, mm; replaces the whole list. */
export const SetStockPlates = z.strictObject({
  thicknesses: z
    .array(z.number().finite().min(3, "At least 3 mm.").max(150, "At most 150 mm."))
    .min(1, "Keep at least one thickness.")
    .max(60, "At most 60 thicknesses.")
    .refine((list) => new Set(list).size === list.length, { message: "Name each thickness once." }),
});
export const StockPlatesReply = z.object({ stockPlates: z.array(StockPlate) });

export type SetStockPlates = z.infer<typeof SetStockPlates>;
export type StockPlate = z.infer<typeof StockPlate>;
