import { readFileSync } from "node:fs";
import { compile, type EvalFunction } from "mathjs";
import { describe, expect, it } from "vitest";
import type { Step } from "@/lib/calc";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";

/** Guards every printed step of every demo comparison: mathjs with the inputs shown gives the value shown. */
const demo = JSON.parse(readFileSync("seeders/data/demo-nodes.json", "utf8")) as {
  readonly nodes: readonly { readonly document: { readonly reference: string } }[];
};
const shop = { catalog: loadSeedCatalog(), prices: loadSeedPrices() };
const compiled = new Map<string, EvalFunction>();

function valueOf(step: Step): number {
  let code = compiled.get(step.expression);
  if (!code) {
    code = compile(step.expression);
    compiled.set(step.expression, code);
  }
  return Number(code.evaluate({ ...step.inputs }));
}

function faultsIn(steps: readonly Step[], seen: Set<Step>): string[] {
  return steps.flatMap((step) => {
    if (seen.has(step)) return [];
    seen.add(step);
    const value = valueOf(step);
    const isRight =
      Math.abs(value - step.value) <= 1e-9 * Math.max(Math.abs(value), Math.abs(step.value), 1e-12);
    return [
      ...(isRight ? [] : [`${step.id}: ${value} and ${step.value}`]),
      ...faultsIn(step.children ?? [], seen),
    ];
  });
}

describe("the working of the demo comparisons", () => {
  it.each(demo.nodes.map((node) => [node.document.reference, node.document] as const))(
    "%s evaluates to what is shown, step by step",
    (_, document) => {
      const evaluated = evaluateDocument(document, shop, { steps: "all" });
      if (!evaluated.ok) throw new Error(JSON.stringify(evaluated.errors));
      const seen = new Set<Step>();
      for (const option of evaluated.result.options) {
        if ("outsideScope" in option) continue;
        const steps = [...option.components, ...option.joints].flatMap((entry) => entry.steps ?? []);
        expect(steps.length).toBeGreaterThan(0);
        expect(faultsIn(steps, seen)).toEqual([]);
      }
      expect(seen.size).toBeGreaterThan(50);
    },
    120_000,
  );
});
