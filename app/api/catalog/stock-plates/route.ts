import { route } from "@/lib/http/route";
import { SetStockPlates } from "@/lib/schemas/catalog";
import { setStockPlates } from "@/lib/services/set-stock-plates";

export const PUT = route({
  access: "signed-in",
  body: SetStockPlates,
  run: async ({ actor, body }) => ({ stockPlates: await setStockPlates(actor, body.thicknesses) }),
});
