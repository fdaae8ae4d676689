import { route } from "@/lib/http/route";
import { readPrices } from "@/lib/services/read-prices";

/** What prices the nodes of one's own organisation. */
export const GET = route({
  access: "signed-in",
  run: async ({ actor }) => ({ prices: await readPrices(actor, actor.organisationId) }),
});
