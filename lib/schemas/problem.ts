import { z } from "zod";

/** The one shape of every refusal, whatever the route. */

export const PROBLEM_CODES = [
  "sign_in_needed",
  "other_origin",
  "forbidden",
  "not_found",
  "invalid",
  "conflict",
  "too_large",
  "unexpected",
] as const;
export type ProblemCode = (typeof PROBLEM_CODES)[number];

/** One bad field: `path` in dots and numbers (`loadCases.0.left.moment`), empty for the whole body. */
export const FieldError = z.object({ path: z.string(), message: z.string() });

export const Problem = z.object({
  error: z.object({
    code: z.enum(PROBLEM_CODES),
    message: z.string(),
    fields: z.array(FieldError),
    requestId: z.string(),
    /** Of a conflict: what stands in the database now. The route says its shape. */
    current: z.unknown().optional(),
  }),
});

export type FieldError = z.infer<typeof FieldError>;
export type Problem = z.infer<typeof Problem>;
