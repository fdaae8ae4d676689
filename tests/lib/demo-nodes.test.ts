import { beforeAll, describe, expect, it } from "vitest";
import type { EvaluatedOption, NodeCase } from "@/lib/calc";
import { priceOfOption } from "@/lib/cost";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { stockOf } from "@/lib/evaluation/resolve-stock";
import { proposeOptions, type ProposedOption } from "@/lib/propose/propose-options";
import { rankOptions } from "@/lib/ranking/rank-options";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import demo from "@/seeders/data/demo-nodes.json";

/**
 * The demo project shows one node of each kind. Each is held to what its purpose says, with the catalogue,
 * rates and time table that a new organisation starts from.
 */

interface Shown {
  readonly document: NodeDocument;
  readonly node: NodeCase;
  readonly options: readonly ProposedOption[];
  /** Keys of the ranked options, cheapest first. */
  readonly ranked: readonly string[];
}

const CATALOG = loadSeedCatalog();
const PRICES = loadSeedPrices();

function show(input: unknown): Shown {
  const parsed = parseNodeDocument(input);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
  const { document } = parsed;
  const resolved = resolveNodeCase(document, CATALOG);
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  const { node } = resolved;
  const { fabrication: making, quantity } = document;
  if (!making) throw new Error("a demo node states how it is made");
  const { liftLength: liftLengthMm, nodesPerLift, executionClass, coating } = making;
  const fabrication = { quantity, liftLengthMm, nodesPerLift, executionClass, coating };
  const priceOf = (measures: ProposedOption["measures"]): number =>
    priceOfOption({ node, measures, fabrication, prices: PRICES });
  const options = proposeOptions(node, stockOf(document, node, CATALOG), priceOf);
  const ranks = rankOptions(
    options.map(({ key, measures, outcome }) => ({
      key,
      passes: outcome.kind === "evaluated" && outcome.passes,
      outsideScope: outcome.kind === "outside-scope",
      costMinor: priceOf(measures),
      shopMinutes: 0,
    })),
  );
  const ranked = ranks
    .flatMap(({ key, rank }) => (rank === null ? [] : [{ key, rank }]))
    .sort((a, b) => a.rank - b.rank)
    .map(({ key }) => key);
  return { document, node, options, ranked };
}

const optionOf = (shown: Shown, key: string): ProposedOption => {
  const option = shown.options.find((one) => one.key === key);
  if (!option) throw new Error(`no option ${key}`);
  return option;
};

function evaluatedOf(shown: Shown, key: string): EvaluatedOption {
  const { outcome } = optionOf(shown, key);
  if (outcome.kind !== "evaluated") throw new Error(`${key} is outside scope: ${outcome.reason}`);
  return outcome;
}

const momentsOf = ({ node }: Shown, side: "left" | "right"): readonly number[] =>
  node.loadCases.map((loadCase) => loadCase[side]?.momentNmm ?? 0);

function expectBareToFailIn(shown: Shown, component: EvaluatedOption["governing"]["component"]): void {
  const bare = evaluatedOf(shown, "bare");
  expect(bare.passes).toBe(false);
  expect(bare.connectionFailure).toBeNull();
  expect(bare.governing.component).toBe(component);
}

const CLAIMS: Readonly<Record<string, (shown: Shown) => void>> = {
  "bars-and-stiffener-win": (shown) => {
    expectBareToFailIn(shown, "column-web-compression");
    expect(shown.ranked[0]).toBe("bars-top-stiffeners-bottom");
    // Neither does by itself, and a beam without load is among the cases, as the bar model asks.
    for (const key of [
      "bars-top",
      "bars-both",
      "stiffeners-compression",
      "stiffeners-tension",
      "stiffeners-both",
    ]) {
      expect(shown.ranked).not.toContain(key);
    }
    expect(Math.min(...momentsOf(shown, "right"))).toBeLessThan(
      0.05 * Math.max(...momentsOf(shown, "right")),
    );
  },
  "interior-gravity": (shown) => {
    expectBareToFailIn(shown, "column-web-compression");
    expect(shown.node.joints).toHaveLength(2);
    expect([...momentsOf(shown, "left"), ...momentsOf(shown, "right")].every((moment) => moment > 0)).toBe(
      true,
    );
    expect(shown.ranked[0]).toBe("stiffeners-compression");
  },
  "edge-one-sided": (shown) => {
    expectBareToFailIn(shown, "column-web-compression");
    expect(shown.node.joints.map(({ side }) => side)).toEqual(["left"]);
    expect(shown.ranked.length).toBeGreaterThanOrEqual(3);
  },
  "top-storey": (shown) => {
    expectBareToFailIn(shown, "column-flange-bending");
    expect(shown.node.column.endDistanceAboveMm).toBeLessThan(shown.node.column.section.depthMm);
    const { outcome } = optionOf(shown, "bars-top");
    expect(outcome.kind === "outside-scope" && outcome.reason).toMatch(/column's end/);
    expect(shown.ranked[0]).toBe("stiffeners-tension");
  },
  "reversed-wind": (shown) => {
    expectBareToFailIn(shown, "column-web-compression");
    for (const side of ["left", "right"] as const) {
      expect(Math.min(...momentsOf(shown, side))).toBeLessThan(0);
      expect(Math.max(...momentsOf(shown, side))).toBeGreaterThan(0);
    }
    expect(shown.ranked.length).toBeGreaterThanOrEqual(2);
  },
  "stiffness-missing": (shown) => {
    const bare = evaluatedOf(shown, "bare");
    expect([bare.passes, bare.stiffnessReached]).toEqual([false, false]);
    expect(bare.utilisation).toBeLessThanOrEqual(shown.node.target.utilisation);
    expect(shown.node.column.section.depthMm).toBeLessThanOrEqual(200);
    expect(evaluatedOf(shown, shown.ranked[0] ?? "").stiffnessReached).toBe(true);
  },
  "none-needed": (shown) => {
    expect(shown.ranked[0]).toBe("bare");
  },
  "only-heavier-column": (shown) => {
    expectBareToFailIn(shown, "column-web-compression");
    expect(shown.ranked).toEqual(["heavier-column"]);
  },
  welded: (shown) => {
    expect(shown.node.joints.every(({ connection }) => connection.kind === "welded")).toBe(true);
    expectBareToFailIn(shown, "column-web-compression");
    expect(shown.ranked).toContain("stiffeners-both");
  },
  "connection-fails": (shown) => {
    expect(shown.ranked).toEqual([]);
    for (const { outcome } of shown.options) {
      expect(outcome.kind === "outside-scope" || outcome.connectionFailure !== null).toBe(true);
    }
  },
};

describe("the demo project", () => {
  it("shows each kind of node once, the one that bars and stiffener win first", () => {
    expect(demo.nodes.map(({ claim }) => claim).toSorted()).toEqual(Object.keys(CLAIMS).toSorted());
    expect(demo.nodes[0]?.claim).toBe("bars-and-stiffener-win");
    expect(new Set(demo.nodes.map(({ document }) => document.reference)).size).toBe(demo.nodes.length);
  });

  describe.each(demo.nodes)("$claim: $document.reference", ({ claim, document }) => {
    let shown: Shown;
    beforeAll(() => {
      shown = show(document);
    });

    it("is what it claims to be", () => {
      CLAIMS[claim]?.(shown);
    });

    it("tells why each option that fails is the best that stock can do", () => {
      for (const { outcome, sizing } of shown.options) {
        expect(sizing !== null).toBe(outcome.kind === "evaluated" && !outcome.passes);
      }
    });

    it("has more than one load case", () => {
      expect(shown.node.loadCases.length).toBeGreaterThan(1);
    });
  });
});
