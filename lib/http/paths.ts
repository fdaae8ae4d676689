import { z } from "zod";

/** The parts of the API's paths; a part that does not fit is an address that does not exist. */
export const ProjectPath = z.object({ projectId: z.uuid() });
export const MemberPath = z.object({ projectId: z.uuid(), personId: z.uuid() });
export const NodePath = z.object({ nodeId: z.uuid() });
export const RevisionPath = z.object({
  nodeId: z.uuid(),
  version: z.coerce.number().int().positive().max(2_147_483_647),
});
