import { jsonReply } from "@/lib/http/reply";
import { route } from "@/lib/http/route";
import { readCatalog } from "@/lib/services/read-catalog";

/** Asked for again at each visit, sent again only when it has changed. */
export const GET = route({
  access: "signed-in",
  run: async ({ actor, request }) => {
    const { catalog, key } = await readCatalog(actor.organisationId);
    const etag = `"${key}"`;
    const headers = { etag, "cache-control": "private, no-cache" };
    const isKnown = request.headers.get("if-none-match")?.split(/,\s*/).includes(etag) === true;
    return isKnown ? new Response(null, { status: 304, headers }) : jsonReply(catalog, 200, headers);
  },
});
