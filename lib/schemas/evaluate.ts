import { z } from "zod";

/** Query of POST /api/evaluate: how much of the working comes along, as on the command line. */
export const EvaluateQuery = z.strictObject({
  steps: z.enum(["none", "governing", "all"]).default("governing"),
});
