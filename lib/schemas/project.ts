import { z } from "zod";

const name = z.string().trim().min(1, "Give the project a name.").max(120, "At most 120 characters.");
const description = z.string().trim().max(2000, "At most 2000 characters.");

export const CreateProject = z.strictObject({ name, description: description.optional() });

export const UpdateProject = z.strictObject({
  name: name.optional(),
  description: description.optional(),
  /** The version that was open when the change was made. */
  expectedVersion: z.number().int().positive(),
});

/** Yes or no for the one who asks, so that button and server agree. */
export const ProjectAbilities = z.object({
  edit: z.boolean(),
  editNodes: z.boolean(),
  recalculate: z.boolean(),
  seeMoney: z.boolean(),
});

export const Project = z.object({
  id: z.uuid(),
  name: z.string(),
  description: z.string(),
  organisation: z.object({ id: z.uuid(), name: z.string() }),
  version: z.number().int(),
  isLocked: z.boolean(),
  nodeCount: z.number().int(),
  updatedAt: z.iso.datetime(),
  abilities: ProjectAbilities,
});

export const ProjectReply = z.object({ project: Project });
export const ProjectListReply = z.object({ projects: z.array(Project) });

export type CreateProject = z.infer<typeof CreateProject>;
export type UpdateProject = z.infer<typeof UpdateProject>;
export type ProjectAbilities = z.infer<typeof ProjectAbilities>;
export type Project = z.infer<typeof Project>;
