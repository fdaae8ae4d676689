import { z } from "zod";
import { route } from "@/lib/http/route";
import { presentAccessToken } from "@/lib/presenters/present-access-token";
import { endAccessToken } from "@/lib/services/access-tokens";

export const DELETE = route({
  access: "signed-in",
  params: z.object({ tokenId: z.uuid() }),
  run: async ({ actor, params }) => ({
    tokens: (await endAccessToken(actor, params.tokenId)).map(presentAccessToken),
  }),
});
