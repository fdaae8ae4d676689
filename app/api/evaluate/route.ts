import { z } from "zod";
import { jsonReply } from "@/lib/http/reply";
import { route } from "@/lib/http/route";
import { EvaluateQuery } from "@/lib/schemas/evaluate";
import type { DocumentErrors } from "@/lib/schemas/result-document";
import type { FieldError } from "@/lib/schemas/problem";
import { evaluateLoose } from "@/lib/services/evaluate-loose";

const refused = (errors: readonly FieldError[]): Response => {
  const body: DocumentErrors = { errors: errors.map(({ path, message }) => ({ path, message })) };
  return jsonReply(body, 422);
};

/** A node document in, its result document out, priced at the rates of one's own organisation; nothing is kept. */
export const POST = route({
  access: "signed-in",
  acceptsToken: true,
  query: EvaluateQuery,
  body: z.unknown(),
  invalidReply: refused,
  run: async ({ actor, query, body }) => {
    const evaluated = await evaluateLoose(actor, body, query.steps);
    return evaluated.ok ? evaluated.result : refused(evaluated.errors);
  },
});
