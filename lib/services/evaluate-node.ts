import type { CalculationKeys } from "@/lib/db/repositories/comparisons";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import { AppError } from "@/lib/http/app-error";
import { logger } from "@/lib/log/logger";
import type { ComparisonSummary } from "@/lib/schemas/comparison";
import type { NodeDocument } from "@/lib/schemas/node-document";
import type { FieldError } from "@/lib/schemas/problem";
import type { ResultDocument } from "@/lib/schemas/result-document";
import type { Shop } from "./shop";
import { summarise } from "./summarise-result";

export interface Calculated extends CalculationKeys {
  readonly summary: ComparisonSummary;
  readonly result: ResultDocument;
}

const refused = (errors: readonly FieldError[]): AppError =>
  new AppError("invalid", "The node cannot be taken as it stands.", {
    fields: errors.map(({ path, message }) => ({
      path: path === "" ? "document" : `document.${path}`,
      message,
    })),
  });

/**
 * Evaluates a node document with everything that a stored comparison keeps.
 *
 * @throws AppError invalid with every fault of the document, each path under `document`.
 */
export function calculate(document: unknown, shop: Shop): Calculated {
  const evaluated = evaluateDocument(document, shop, { steps: "none" });
  if (!evaluated.ok) throw refused(evaluated.errors);
  const { result } = evaluated;
  return {
    result,
    summary: summarise(result),
    engine: result.engine,
    pricesKey: shop.pricesKey,
    catalogKey: shop.catalogKey,
  };
}

export interface Checked {
  readonly document: NodeDocument;
  /** Null when the calculation broke down: the work of the one who saves is kept all the same. */
  readonly calculated: Calculated | null;
}

/**
 * Checks a document that somebody wants to save, and calculates it on the way.
 *
 * @throws AppError invalid with every fault of the document.
 */
export function checkDocument(input: unknown, shop: Shop): Checked {
  const parsed = parseNodeDocument(input);
  if (!parsed.ok) throw refused(parsed.errors);
  try {
    return { document: parsed.document, calculated: calculate(parsed.document, shop) };
  } catch (error) {
    if (error instanceof AppError) throw error;
    logger.error(
      { err: error, reference: parsed.document.reference },
      "a node could not be calculated; it is saved without",
    );
    return { document: parsed.document, calculated: null };
  }
}
