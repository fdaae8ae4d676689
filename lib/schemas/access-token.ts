import { z } from "zod";

/** How long a token may last, days. */
export const TOKEN_DAYS = [30, 90, 365] as const;

export const CreateAccessToken = z.strictObject({
  name: z
    .string()
    .trim()
    .min(1, "Say what the token is for, so that it can be told from others later.")
    .max(80, "At most 80 characters."),
  days: z.union(TOKEN_DAYS.map((days) => z.literal(days))),
});

export const AccessToken = z.object({
  id: z.uuid(),
  name: z.string(),
  hint: z.string(),
  createdAt: z.iso.datetime(),
  lastUsedAt: z.iso.datetime().nullable(),
  expiresAt: z.iso.datetime(),
});

export const AccessTokensReply = z.object({ tokens: z.array(AccessToken) });

/** The key is in this reply and in no other. */
export const CreatedAccessTokenReply = AccessTokensReply.extend({ key: z.string() });

export type CreateAccessToken = z.infer<typeof CreateAccessToken>;
export type AccessToken = z.infer<typeof AccessToken>;
