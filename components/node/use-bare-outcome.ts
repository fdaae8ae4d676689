"use client";

import { useEffect, useState } from "react";
import { evaluateOption } from "@/lib/calc/index";
import type { NodeCase } from "@/lib/calc/node";
import type { OptionOutcome } from "@/lib/calc/result";

/** The bare column's result and the node it belongs to. */
export interface BareOutcome {
  readonly node: NodeCase;
  readonly outcome: OptionOutcome | { readonly kind: "fault"; readonly message: string };
}

/** A pause in typing, ms, after which the node is calculated: short enough to feel like at once. */
const PAUSE_MS = 120;

function calculated(node: NodeCase): BareOutcome["outcome"] {
  try {
    return evaluateOption(node, [], { steps: false });
  } catch (error) {
    return { kind: "fault", message: error instanceof Error ? error.message : "The calculation stopped." };
  }
}

/**
 * Calculates the bare column in the browser, with the same core that the server uses, at once for the
 * first node and then after each pause in typing. The last result stays while a field is not in order.
 */
export function useBareOutcome(node: NodeCase | null): BareOutcome | null {
  const [bare, setBare] = useState<BareOutcome | null>(() =>
    node ? { node, outcome: calculated(node) } : null,
  );
  useEffect(() => {
    if (node === null || bare?.node === node) return;
    const timer = setTimeout(() => setBare({ node, outcome: calculated(node) }), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [node, bare]);
  return bare;
}
