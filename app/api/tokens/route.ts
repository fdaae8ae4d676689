import { route } from "@/lib/http/route";
import { presentAccessToken } from "@/lib/presenters/present-access-token";
import { CreateAccessToken } from "@/lib/schemas/access-token";
import { issueAccessToken, readAccessTokens } from "@/lib/services/access-tokens";

export const GET = route({
  access: "signed-in",
  run: async ({ actor }) => ({ tokens: (await readAccessTokens(actor)).map(presentAccessToken) }),
});

export const POST = route({
  access: "signed-in",
  body: CreateAccessToken,
  status: 201,
  run: async ({ actor, body }) => {
    const { key, tokens } = await issueAccessToken(actor, body);
    return { key, tokens: tokens.map(presentAccessToken) };
  },
});
