import { z } from "zod";

/**
 * The node document: one beam-to-column node as the form, uploads, API, command line and database
 * all carry it. Lengths mm, forces kN, moments kNm, stresses N/mm2. Unknown fields are errors.
 */

z.config({ jitless: true });

const positive = z.number().finite().positive();
const nonNegative = z.number().finite().nonnegative();
const finite = z.number().finite();
const shortText = z.string().trim().min(1).max(120);

/** A catalogue designation or a section by its dimensions, mm. `r` marks a rolled, `weld` (throat) a welded one. */
export const SectionInput = z.union([
  shortText,
  z.strictObject({ h: positive, b: positive, tw: positive, tf: positive, r: nonNegative }),
  z.strictObject({ h: positive, b: positive, tw: positive, tf: positive, weld: positive }),
]);

/** A grade name (strength by thickness) or strengths in N/mm2. */
export const SteelInput = z.union([
  shortText,
  z.strictObject({ fy: positive, fu: positive, betaW: positive.optional() }),
]);

/** Throat in mm, or a full-penetration butt weld. */
export const WeldInput = z.union([positive, z.literal("butt")]);

export const BoltSizeName = z.string().regex(/^M\d{1,2}$/, "Write a bolt size such as M24.");
export const BoltGradeName = z.string().regex(/^\d{1,2}\.\d$/, "Write a property class such as 8.8 or 10.9.");

const ConnectionWelds = z.strictObject({ topFlange: WeldInput, bottomFlange: WeldInput, web: WeldInput });

export const EndPlateConnection = z.strictObject({
  kind: z.literal("end-plate"),
  plate: z.strictObject({
    steel: SteelInput,
    thickness: positive,
    width: positive,
    extensionTop: nonNegative,
    extensionBottom: nonNegative,
    stiffener: z
      .strictObject({
        top: z.strictObject({ thickness: positive, length: positive }).optional(),
        bottom: z.strictObject({ thickness: positive, length: positive }).optional(),
      })
      .optional(),
  }),
  bolts: z
    .strictObject({
      size: BoltSizeName,
      grade: BoltGradeName,
      gauge: positive,
      rows: z.array(finite).min(1, "Give at least one bolt row.").max(40),
      perRow: z.union([z.literal(2), z.literal(4)]).optional(),
      outerGauge: positive.optional(),
      preloaded: z.boolean().optional(),
      assembly: z.enum(["HR", "HV", "plain"]).optional(),
    })
    .refine(
      (bolts) => bolts.rows.every((row, index) => index === 0 || row > (bolts.rows[index - 1] ?? row)),
      {
        path: ["rows"],
        message: "List the rows from the top down, each further below the top flange than the one before.",
      },
    ),
  welds: ConnectionWelds,
});

export const WeldedConnection = z.strictObject({ kind: z.literal("welded"), welds: ConnectionWelds });

const CleatBolts = { size: BoltSizeName, grade: BoltGradeName };

export const FlangeCleatConnection = z.strictObject({
  kind: z.literal("flange-cleats"),
  cleat: z.strictObject({ section: shortText, steel: SteelInput, length: positive }),
  stiffened: z.strictObject({ thickness: positive }).optional(),
  bolts: z.strictObject({ ...CleatBolts, gauge: positive, distance: positive }),
  beamBolts: z.strictObject({ ...CleatBolts, rows: z.array(positive).min(1).max(20), gauge: positive }),
  gap: nonNegative,
  webCleats: z
    .strictObject({
      section: shortText,
      steel: SteelInput,
      length: positive,
      bolts: z.strictObject({ ...CleatBolts, rows: z.array(positive).min(1).max(20) }),
      beamBolts: z.strictObject({ ...CleatBolts, rows: z.array(positive).min(1).max(20) }),
    })
    .optional(),
});

export const Connection = z.discriminatedUnion("kind", [
  EndPlateConnection,
  WeldedConnection,
  FlangeCleatConnection,
]);

const sideFields = {
  beam: z.strictObject({ section: SectionInput, steel: SteelInput, span: positive }),
  connection: Connection,
};
export const LeftSide = z.strictObject(sideFields);
export const RightSide = z.strictObject({ ...sideFields, levelOffset: finite.optional() });

const BeamActions = z.strictObject({ moment: finite, axialForce: finite, shear: finite });

export const LoadCaseInput = z.strictObject({
  name: shortText,
  left: BeamActions.optional(),
  right: BeamActions.optional(),
  column: z.strictObject({
    axialForce: finite,
    momentAbove: finite,
    momentBelow: finite,
    shearAbove: finite,
    shearBelow: finite,
  }),
});

const Level = z.enum(["top", "bottom"]);
const Levels = z
  .array(Level)
  .min(1)
  .max(2)
  .refine((levels) => new Set(levels).size === levels.length, { message: "Name each level once." });
const at = z.enum(["left", "right", "both"]).optional();

export const MeasureInput = z.discriminatedUnion("kind", [
  z.strictObject({
    kind: z.literal("transverse-stiffeners"),
    levels: Levels,
    at,
    thickness: positive,
    width: positive,
    length: z.union([z.literal("full"), positive]),
    clip: nonNegative,
    steel: SteelInput,
    flangeWeld: WeldInput,
    webWeld: WeldInput,
  }),
  z.strictObject({
    kind: z.literal("diagonal-stiffeners"),
    at,
    arrangement: z.enum(["single", "cross", "k"]),
    towards: z.enum(["left", "right"]),
    thickness: positive,
    width: positive,
    steel: SteelInput,
    weld: WeldInput,
  }),
  z.strictObject({
    kind: z.literal("web-plates"),
    sides: z.union([z.literal(1), z.literal(2)]),
    thickness: positive,
    width: positive,
    height: positive,
    steel: SteelInput,
    weld: WeldInput,
  }),
  z.strictObject({
    kind: z.literal("backing-plates"),
    levels: Levels,
    at,
    thickness: positive,
    width: positive,
    length: positive,
    steel: SteelInput,
  }),
  z.strictObject({
    kind: z.literal("through-bars"),
    levels: Levels,
    at,
    /** Which bolt rows bars replace, by their number on the joint the measure stands at; left out = every row of the levels. */
    rows: z.array(z.number().int().positive()).min(1).max(40).optional(),
    size: BoltSizeName,
    grade: BoltGradeName,
    innerNuts: z.boolean(),
  }),
  z.strictObject({ kind: z.literal("heavier-column"), section: SectionInput }),
]);

export const OptionInput = z.strictObject({
  key: z.string().trim().min(1).max(60),
  name: shortText,
  measures: z.array(MeasureInput).max(8),
});

export const NodeDocument = z
  .strictObject({
    reference: shortText,
    basis: z.literal("EN 1993-1-8:2005"),
    partialFactors: z.strictObject({ gammaM0: positive, gammaM1: positive, gammaM2: positive }),
    column: z.strictObject({
      section: SectionInput,
      steel: SteelInput,
      endDistanceAbove: nonNegative.optional(),
      endDistanceBelow: nonNegative.optional(),
      storeyHeight: positive,
    }),
    left: LeftSide.optional(),
    right: RightSide.optional(),
    loadCases: z.array(LoadCaseInput).min(1, "Give at least one load case.").max(200),
    frame: z.strictObject({ bracing: z.enum(["braced", "unbraced"]) }),
    target: z.strictObject({
      utilisation: positive.max(2),
      stiffness: z.union([z.literal("any"), z.literal("rigid"), positive]),
    }),
    quantity: z.number().int().positive().max(100_000),
    fabrication: z
      .strictObject({
        liftLength: positive,
        nodesPerLift: z.number().int().positive(),
        executionClass: z.union([z.literal(1), z.literal(2), z.literal(3), z.literal(4)]),
        coating: z.enum(["none", "paint", "galvanised"]),
      })
      .optional(),
    /** Which reading of the basis to use where it leaves a choice; left out = this project's defaults. */
    choices: z
      .strictObject({
        strengths: z.enum(["product-standard", "en1993-1-1-table-3.1"]).optional(),
        tStubModeOne: z.enum(["method-1", "method-2"]).optional(),
        triangularLimit: z.enum(["always", "united-kingdom"]).optional(),
        flangeWelds: z.enum(["directional", "simplified"]).optional(),
      })
      .optional(),
    options: z
      .array(OptionInput)
      .max(40)
      .refine((options) => new Set(options.map((option) => option.key)).size === options.length, {
        message: "Give each option a key of its own.",
      })
      .optional(),
  })
  .superRefine((node, context) => {
    if (!node.left && !node.right) {
      context.addIssue({
        code: "custom",
        path: ["left"],
        message: "Give a beam on the left, on the right or on both sides.",
      });
    }
    node.loadCases.forEach((loadCase, index) => {
      for (const side of ["left", "right"] as const) {
        if (node[side] && !loadCase[side]) {
          context.addIssue({
            code: "custom",
            path: ["loadCases", index, side],
            message: `Give the ${side} beam's moment, axial force and shear.`,
          });
        }
        if (!node[side] && loadCase[side]) {
          context.addIssue({
            code: "custom",
            path: ["loadCases", index, side],
            message: `There is no beam on the ${side}.`,
          });
        }
      }
      if (node.loadCases.findIndex((other) => other.name === loadCase.name) !== index) {
        context.addIssue({
          code: "custom",
          path: ["loadCases", index, "name"],
          message: "Give each load case a name of its own.",
        });
      }
    });
  });

export type NodeDocument = z.infer<typeof NodeDocument>;
export type SectionInput = z.infer<typeof SectionInput>;
export type SteelInput = z.infer<typeof SteelInput>;
export type WeldInput = z.infer<typeof WeldInput>;
export type MeasureInput = z.infer<typeof MeasureInput>;
export type OptionInput = z.infer<typeof OptionInput>;
export type Connection = z.infer<typeof Connection>;
export type LoadCaseInput = z.infer<typeof LoadCaseInput>;
