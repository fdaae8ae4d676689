import { z } from "zod";
import { ROLES } from "@/lib/policies/roles";

/** Somebody who signs in already, of whichever organisation, by the e-mail they sign in with. */
export const AddMember = z.strictObject({
  email: z.string().trim().toLowerCase().max(254).pipe(z.email("Write an e-mail address.")),
});

export const Member = z.object({
  personId: z.uuid(),
  name: z.string(),
  role: z.enum(ROLES),
  organisationName: z.string(),
});

export const MembersReply = z.object({ members: z.array(Member), canManage: z.boolean() });

export type AddMember = z.infer<typeof AddMember>;
export type Member = z.infer<typeof Member>;
export type Members = z.infer<typeof MembersReply>;
