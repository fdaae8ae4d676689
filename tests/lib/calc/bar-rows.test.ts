import { describe, expect, it } from "vitest";
import { evaluateOption, type EvaluatedOption } from "@/lib/calc";
import { priceOfOption } from "@/lib/cost";
import { resolveMeasures } from "@/lib/evaluation/resolve-measures";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { buildCatalog, buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";

/** Bars in chosen rows: rows -45 and 65 at the top of an IPE 450, 385 at the bottom. */
const catalog = buildCatalog();
const columnForces = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };
const beam = { moment: 200, axialForce: 0, shear: 50 };
const document: NodeDocument = buildNodeDocument({
  left: buildSide(),
  right: buildSide(),
  loadCases: [{ name: "one", left: beam, right: beam, column: columnForces }],
});
const bars = (rows?: number[]): MeasureInput => ({
  kind: "through-bars",
  levels: ["top"],
  size: "M24",
  grade: "10.9",
  innerNuts: true,
  ...(rows ? { rows } : {}),
});

function given(measure: MeasureInput | null) {
  const node = resolveNodeCase(document, catalog);
  const measures = resolveMeasures(measure ? [measure] : [], document, catalog, "options.0.measures");
  if (!node.ok || !measures.ok) throw new Error("a node of the catalogue");
  return { node: node.node, measures: measures.measures };
}

function evaluated(measure: MeasureInput | null): EvaluatedOption {
  const { node, measures } = given(measure);
  const outcome = evaluateOption(node, measures);
  if (outcome.kind !== "evaluated") throw new Error(outcome.reason);
  return outcome;
}

const flangeOf = (option: EvaluatedOption, row: number): number =>
  option.checks.find(
    (check) => check.component === "column-flange-bending" && check.side === "left" && check.row === row,
  )?.resistance ?? NaN;

describe("bars in chosen rows", () => {
  it("relieve their own row and leave the other to its bolts", () => {
    const bare = evaluated(null);
    const first = evaluated(bars([1]));
    expect(flangeOf(first, 2)).toBe(flangeOf(bare, 2));
    expect(
      first.checks.filter((check) => check.component === "bar-tension").map((check) => check.row),
    ).toEqual([1, 1]);
  });

  it("are the same as the whole level when every row of it is named", () => {
    expect(evaluated(bars([1, 2])).joints).toEqual(evaluated(bars()).joints);
  });

  it("cost half for one of two rows but for the work that does not count rows", () => {
    const costOf = (measure: MeasureInput): number => {
      const { node, measures } = given(measure);
      const fabrication = {
        quantity: 12,
        liftLengthMm: 3600,
        nodesPerLift: 1,
        executionClass: 2,
        coating: "none",
      } as const;
      return priceOfOption({ node, measures, fabrication, prices: loadSeedPrices() });
    };
    expect(costOf(bars([1]))).toBeLessThan(costOf(bars()));
    expect(costOf(bars([1]))).toBeGreaterThanOrEqual(costOf(bars()) / 2 - 1);
  });

  it("are refused with a path where there is no such row", () => {
    const resolved = resolveMeasures([bars([1, 9])], document, catalog, "options.0.measures");
    expect(resolved.ok ? [] : resolved.errors).toEqual([
      {
        path: "options.0.measures.0.rows.1",
        message: "There is no bolt row 9 on the left: its rows are 1 to 3.",
      },
    ]);
  });

  it("are told beside the share that they are expected to carry", () => {
    const words = evaluated(bars()).cautions.find((caution) => caution.startsWith("For information"));
    expect(words).toMatch(/expected to carry about \d+ % .* counts on \d+ %/);
    const [expected = NaN, counted = NaN] = [...(words ?? "").matchAll(/(\d+) %/g)].map(([, share]) =>
      Number(share),
    );
    // 0.83 eta and 0.55 eta, each printed to a whole per cent.
    expect(Math.abs(expected / counted - 0.83 / 0.55)).toBeLessThan(0.05);
  });
});
