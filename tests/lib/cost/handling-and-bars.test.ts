/** Guards how the column is handled for welding, and what through bars add and save. */
import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { estimateOption, type EstimateLine } from "@/lib/cost";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import {
  buildFabrication,
  buildJoint,
  buildNode,
  fillet,
  pricesWithRates,
  stiffeners,
  throughBars,
  webPlates,
} from "@/tests/factories/build-cost-case";

const node = buildNode();
const fabrication = buildFabrication();
const prices = loadSeedPrices();
const estimate = (
  measures: readonly MeasureCase[],
  changes: Partial<Parameters<typeof estimateOption>[0]> = {},
) => estimateOption({ node, measures, fabrication, prices, ...changes });
const line = (lines: readonly EstimateLine[], operation: string): EstimateLine => {
  const found = lines.find((other) => other.operation === operation);
  if (found === undefined) throw new Error(`No line ${operation}`);
  return found;
};

describe("welding upright or turning the column", () => {
  const turns = (lines: readonly EstimateLine[]) =>
    lines.find((each) => each.operation === "Turn the column")?.quantity ?? 0;

  it("turns where crews are cheap against welding time, and welds upright where turning is dear", () => {
    const oneNode = { fabrication: buildFabrication({ nodesPerLift: 1 }) };
    const cheapTurns = pricesWithRates((item, likely) =>
      item === "labour:handler" || item === "machine:turning" ? 0.01 : likely,
    );
    const dearTurns = pricesWithRates((item, likely) =>
      item === "labour:handler" || item === "machine:turning" ? 500 : likely,
    );
    expect(turns(estimate([stiffeners()], { ...oneNode, prices: cheapTurns }).lines)).toBe(3);
    expect(turns(estimate([stiffeners()], { ...oneNode, prices: dearTurns }).lines)).toBe(1);
  });

  it("is never dearer than either way by itself", () => {
    const dear = (factor: number) =>
      pricesWithRates((item, likely) => (item === "labour:handler" ? likely * factor : likely));
    const costs = [0.1, 0.3, 1, 3, 10, 30].map(
      (factor) => estimate([stiffeners()], { prices: dear(factor) }).costMinor,
    );
    costs.forEach((cost, index) => expect(cost).toBeGreaterThanOrEqual(costs[index - 1] ?? 0));
  });

  it("shares the turns of a lift among its nodes", () => {
    const quantity = (nodesPerLift: number) =>
      turns(estimate([webPlates({ sides: 2 })], { fabrication: buildFabrication({ nodesPerLift }) }).lines);
    expect(quantity(1)).toBe(1);
    expect(quantity(4)).toBe(0.25);
  });

  it("needs no turn for one plate on one face", () => {
    expect(turns(estimate([webPlates({ sides: 1 })]).lines)).toBe(0);
  });
});

describe("bars", () => {
  it("save the bolts they replace, with their tightening", () => {
    const { lines } = estimate([throughBars()]);
    const saved = line(lines, "Bolts replaced by bars");
    expect(saved.quantity).toBeLessThan(0);
    expect(saved.costMinor).toBeLessThan(0);
    expect(line(lines, "Tightening saved").quantity).toBe(-8);
    expect(line(lines, "Tighten outer nuts").quantity).toBe(8);
    expect(line(lines, "Tighten inner nuts").quantity).toBe(8);
  });

  it("of a one-sided node need holes in the far flange", () => {
    expect(line(estimate([throughBars()], { node: buildNode(["left"]) }).lines, "Drill holes").quantity).toBe(
      4,
    );
    expect(estimate([throughBars()]).lines.some((each) => each.operation === "Drill holes")).toBe(false);
  });

  it("take twice as long to fit where there is no room to swing a spanner", () => {
    const tight = buildJoint("left");
    if (tight.connection.kind !== "end-plate") throw new Error("An end plate was built.");
    const connection = { ...tight.connection, bolts: { ...tight.connection.bolts, gaugeMm: 100 } };
    const wide = { ...tight.connection, bolts: { ...tight.connection.bolts, gaugeMm: 150 } };
    const innerMinutes = (joint: typeof connection) =>
      line(
        estimate([throughBars()], { node: { ...node, joints: [buildJoint("left", joint)] } }).lines,
        "Tighten inner nuts",
      ).minutes;
    expect(innerMinutes(connection)).toBeCloseTo(2 * innerMinutes(wide), 9);
  });

  it("are nothing at a welded joint", () => {
    const welded = buildJoint("left", {
      kind: "welded",
      welds: { topFlange: fillet(8), bottomFlange: fillet(8), web: fillet(5) },
    });
    const { lines } = estimate([throughBars()], { node: { ...node, joints: [welded] } });
    expect(lines.every((each) => each.category === "drawing")).toBe(true);
  });
});
