import type { NodeCase } from "@/lib/calc/node";
import type { Catalog } from "@/lib/catalog/catalog";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { documentTyped, type DraftObject } from "./node-draft";

/** What the form knows of its own draft. */
export interface DraftReading {
  /** The document, when every field is in order. */
  readonly document: NodeDocument | null;
  /** The node to calculate, when every field is in order. */
  readonly node: NodeCase | null;
  /** The node to draw: also while fields that the drawing does not show are not in order. */
  readonly drawable: NodeCase | null;
  /** Messages by path in the node document. */
  readonly errors: ReadonlyMap<string, string>;
}

type Found = readonly { readonly path: string; readonly message: string }[];

/** First message of each path: one at a time is enough to act on. */
const byPath = (errors: Found): ReadonlyMap<string, string> =>
  new Map([...errors].reverse().map(({ path, message }) => [path, message]));

const NO_ACTIONS = { moment: 0, axialForce: 0, shear: 0 };
const NO_COLUMN = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };

/** The draft with all that the drawing does not show put in order, so that steel can be drawn while loads are being typed. */
function steelOnly(typed: Record<string, unknown>): unknown {
  const { options: _options, fabrication: _fabrication, choices: _choices, ...rest } = typed;
  const sides = (["left", "right"] as const).filter((side) => rest[side] !== undefined);
  const column =
    typeof rest.column === "object" && rest.column !== null
      ? { ...rest.column, storeyHeight: 3000 }
      : rest.column;
  return {
    ...rest,
    column,
    reference: "drawing",
    partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
    loadCases: [
      { name: "none", column: NO_COLUMN, ...Object.fromEntries(sides.map((side) => [side, NO_ACTIONS])) },
    ],
    frame: { bracing: "unbraced" },
    target: { utilisation: 1, stiffness: "any" },
    quantity: 1,
  };
}

function drawableOf(typed: unknown, catalog: Catalog): NodeCase | null {
  if (typeof typed !== "object" || typed === null) return null;
  const parsed = parseNodeDocument(steelOnly(typed as Record<string, unknown>));
  if (!parsed.ok) return null;
  const resolved = resolveNodeCase(parsed.document, catalog);
  return resolved.ok ? resolved.node : null;
}

/** Reads the draft: document, node and every fault with its path. */
export function readDraft(draft: DraftObject, catalog: Catalog): DraftReading {
  const typed = documentTyped(draft);
  const parsed = parseNodeDocument(typed);
  if (!parsed.ok)
    return {
      document: null,
      node: null,
      drawable: drawableOf(typed, catalog),
      errors: byPath(parsed.errors),
    };
  const resolved = resolveNodeCase(parsed.document, catalog);
  if (!resolved.ok)
    return {
      document: null,
      node: null,
      drawable: drawableOf(typed, catalog),
      errors: byPath(resolved.errors),
    };
  return { document: parsed.document, node: resolved.node, drawable: resolved.node, errors: new Map() };
}
