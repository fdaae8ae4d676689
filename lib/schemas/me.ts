import { z } from "zod";
import { ROLES } from "@/lib/policies/roles";

export const PersonName = z.object({ id: z.uuid(), name: z.string() });

/** Who is signed in and what they may do anywhere; what they may do in a project comes with the project. */
export const Me = z.object({
  person: PersonName.extend({ email: z.string(), role: z.enum(ROLES) }),
  organisation: z.object({ id: z.uuid(), name: z.string() }),
  abilities: z.object({
    createProject: z.boolean(),
    editStockPlates: z.boolean(),
    editRates: z.boolean(),
    managePeople: z.boolean(),
  }),
});

export type PersonName = z.infer<typeof PersonName>;
export type Me = z.infer<typeof Me>;
