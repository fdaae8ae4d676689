import { z } from "zod";

/** Whether the program can work, for a monitor. Holds no secret and no setting. */
export const Health = z.object({
  ok: z.boolean(),
  database: z.enum(["reachable", "unreachable"]),
  version: z.string(),
  engine: z.string(),
});
export type Health = z.infer<typeof Health>;
