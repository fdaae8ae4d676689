import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { Actor } from "@/lib/policies/roles";
import { loadShop } from "./shop";

/** Evaluates a document that belongs to no project at the rates of one's own organisation; keeps nothing. */
export async function evaluateLoose(
  actor: Actor,
  document: unknown,
  steps: "none" | "governing" | "all",
): Promise<ReturnType<typeof evaluateDocument>> {
  return evaluateDocument(document, await loadShop(actor.organisationId), { steps });
}
