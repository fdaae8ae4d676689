/** Guards the estimate of an option: the difference from the bare node, exact to the cent, from the figures and nothing else. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import {
  CarbonFactorMissing,
  estimateOption,
  type EstimateLine,
  priceOfOption,
  RateMissing,
  RuleFailed,
  type ShopPrices,
} from "@/lib/cost";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import {
  backingPlates,
  buildFabrication,
  buildNode,
  diagonals,
  EVERY_MEASURE,
  fillet,
  heavierColumn,
  HE_300_A,
  HE_300_B,
  pricesWithFormula,
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
  if (found === undefined)
    throw new Error(`No line ${operation} among ${lines.map((other) => other.operation).join(", ")}`);
  return found;
};

/** Random options of any kinds, sizes and welds. */
const weld = fc.oneof(fc.integer({ min: 3, max: 12 }).map(fillet), fc.constant({ kind: "butt" as const }));
const levels = fc.constantFrom<("top" | "bottom")[]>(["top"], ["bottom"], ["top", "bottom"]);
const thicknessMm = fc.integer({ min: 6, max: 40 });
const measure: fc.Arbitrary<MeasureCase> = fc.oneof(
  fc
    .record({
      levels,
      thicknessMm,
      widthMm: fc.integer({ min: 60, max: 145 }),
      length: fc.oneof(fc.constant("full" as const), fc.integer({ min: 100, max: 250 })),
      clipMm: fc.integer({ min: 0, max: 30 }),
      flangeWeld: weld,
      webWeld: weld,
    })
    .map(stiffeners),
  fc
    .record({
      arrangement: fc.constantFrom("single" as const, "cross" as const, "k" as const),
      thicknessMm,
      weld,
    })
    .map(diagonals),
  fc
    .record({
      sides: fc.constantFrom(1 as const, 2 as const),
      thicknessMm,
      widthMm: fc.integer({ min: 150, max: 208 }),
      heightMm: fc.integer({ min: 500, max: 900 }),
      weld,
    })
    .map(webPlates),
  fc.record({ levels, thicknessMm }).map(backingPlates),
  fc.record({ levels, innerNuts: fc.boolean() }).map(throughBars),
  fc.constant(heavierColumn()),
);
const request = fc
  .record({
    measures: fc.array(measure, { maxLength: 4 }),
    isOneSided: fc.boolean(),
    fabrication: fc.record({
      quantity: fc.integer({ min: 1, max: 500 }),
      liftLengthMm: fc.integer({ min: 3000, max: 15_000 }),
      nodesPerLift: fc.integer({ min: 1, max: 5 }),
      executionClass: fc.constantFrom(1 as const, 2 as const, 3 as const, 4 as const),
      coating: fc.constantFrom("none" as const, "paint" as const, "galvanised" as const),
    }),
  })
  .map(({ isOneSided, ...rest }) => ({
    ...rest,
    node: buildNode(isOneSided ? ["left"] : ["left", "right"]),
    prices,
  }));

describe("the bare node", () => {
  it("costs nothing, takes no time and has no lines", () => {
    const bare = estimate([]);
    expect(bare.lines).toEqual([]);
    const {
      costMinor,
      costForQuantityMinor,
      touchMinutes,
      crewMinutes,
      shopMinutes,
      siteMinutes,
      massKg,
      carbonKg,
    } = bare;
    expect([
      costMinor,
      costForQuantityMinor,
      touchMinutes,
      crewMinutes,
      shopMinutes,
      siteMinutes,
      massKg,
      carbonKg,
    ]).toEqual(Array(8).fill(0));
    expect(Object.values(bare.costByCategoryMinor).every((cost) => cost === 0)).toBe(true);
    expect(bare.minutesByTrade).toEqual({});
  });

  it("is also what a column of its own size answers", () => {
    expect(estimate([heavierColumn(HE_300_A)]).lines).toEqual([]);
  });
});

describe("every kind of measure", () => {
  it.each(EVERY_MEASURE.map((one) => [one.kind, one] as const))("%s is priced", (_, one) => {
    const priced = estimate([one]);
    expect(priced.costMinor).toBeGreaterThan(0);
    expect(priced.lines.every((each) => each.source.trim() !== "")).toBe(true);
  });

  it("costs as much with others as alone, apart from shared set-ups and turns", () => {
    const [a, b] = [estimate([stiffeners()]).costMinor, estimate([throughBars()]).costMinor];
    // Plates and bars share no set-up but the drawing's, which counts each detail.
    expect(Math.abs(estimate([stiffeners(), throughBars()]).costMinor - a - b)).toBeLessThanOrEqual(2);
  });
});

describe("money", () => {
  it("is to the cent the sum of its lines, by category and in total, for any option", () => {
    fc.assert(
      fc.property(request, (any) => {
        const { lines, costMinor, costByCategoryMinor, costForQuantityMinor, crewMinutes, minutesByTrade } =
          estimateOption(any);
        expect(
          lines.every(
            (each) =>
              Number.isSafeInteger(each.costMinor) &&
              Number.isFinite(each.minutes) &&
              Number.isFinite(each.quantity),
          ),
        ).toBe(true);
        expect(lines.reduce((sum, each) => sum + each.costMinor, 0)).toBe(costMinor);
        expect(Object.values(costByCategoryMinor).reduce((sum, cost) => sum + cost, 0)).toBe(costMinor);
        expect(costForQuantityMinor).toBe(costMinor * any.fabrication.quantity);
        expect(Object.values(minutesByTrade).reduce((sum, minutes) => sum + minutes, 0)).toBeCloseTo(
          crewMinutes,
          6,
        );
        expect(priceOfOption(any)).toBe(costMinor);
      }),
      { numRuns: 400 },
    );
  });

  it("of each line is its amount at its rate, to the half cent", () => {
    const rules = new Set(prices.timeTable.rules.map((rule) => rule.key));
    fc.assert(
      fc.property(request, (any) => {
        for (const { costMinor, rateItem, rateAmount, rateUnit, rate, ruleKey } of estimateOption(any)
          .lines) {
          expect(Math.abs(costMinor - rateAmount * rate * 100)).toBeLessThanOrEqual(0.501);
          expect([rateUnit, rate]).toEqual([
            prices.rateBook.lines[rateItem]?.unit,
            prices.rateBook.lines[rateItem]?.likely,
          ]);
          expect(rules.has(ruleKey)).toBe(true);
        }
      }),
      { numRuns: 100 },
    );
  });

  it("of a labour line is its minutes at the rate of its trade", () => {
    const weldLine = line(estimate([stiffeners()]).lines, "Weld fillets");
    const rate = prices.rateBook.lines["labour:welder"]?.likely ?? Number.NaN;
    expect(weldLine.costMinor).toBe(Math.round((weldLine.minutes / 60) * rate * 100));
  });

  it("doubles where every rate doubles, but for the rounding of each line", () => {
    const double = pricesWithRates((_, likely) => 2 * likely);
    const [once, twice] = [estimate(EVERY_MEASURE), estimate(EVERY_MEASURE, { prices: double })];
    expect(Math.abs(twice.costMinor - 2 * once.costMinor)).toBeLessThanOrEqual(1.5 * once.lines.length);
  });

  it("never goes on without a rate, and names the item", () => {
    const { "labour:welder": _, ...lines } = prices.rateBook.lines;
    const lame: ShopPrices = { ...prices, rateBook: { ...prices.rateBook, lines } };
    expect(() => estimate([stiffeners()], { prices: lame })).toThrow(RateMissing);
    expect(() => estimate([stiffeners()], { prices: lame })).toThrow(/labour:welder/);
    expect(() => priceOfOption({ node, measures: [stiffeners()], fabrication, prices: lame })).toThrow(
      RateMissing,
    );
    // An item that the option does not need is not missed.
    expect(estimate([backingPlates()], { prices: lame }).costMinor).toBeGreaterThan(0);
  });

  it("prices bars of each property class at that class, and stops at one the book does not know", () => {
    const ofGrade = (name: string) =>
      throughBars({ grade: { name, yieldMpa: 640, ultimateMpa: 800, alphaV: 0.6 } });
    expect(estimate([ofGrade("8.8")]).costMinor).toBeLessThan(estimate([ofGrade("10.9")]).costMinor);
    expect(() => estimate([ofGrade("99.9")])).toThrow(/threaded-bar-99\.9/);
  });

  it("never goes on without a carbon factor", () => {
    const { plate: _, ...factors } = prices.carbon.factors;
    expect(() =>
      estimate([stiffeners()], { prices: { ...prices, carbon: { ...prices.carbon, factors } } }),
    ).toThrow(CarbonFactorMissing);
  });

  it("never comes from a rule that gives no number", () => {
    const rules = prices.timeTable.rules.map((rule) =>
      rule.key === "clip-corners"
        ? {
            ...rule,
            runMinutes: {
              chosen: "own",
              formulas: [
                { key: "own", label: "Test", expression: "corners / (parts - parts)", source: "Test" },
              ],
            },
          }
        : rule,
    );
    expect(() =>
      estimate([stiffeners()], { prices: { ...prices, timeTable: { ...prices.timeTable, rules } } }),
    ).toThrow(RuleFailed);
  });
});

describe("minutes", () => {
  it("fall with the number of identical nodes and never below the run time", () => {
    const minutesAt = (quantity: number) =>
      estimate(EVERY_MEASURE, { fabrication: buildFabrication({ quantity }) });
    const batches = [1, 2, 5, 10, 100, 10_000].map(minutesAt);
    batches.forEach((batch, index) => {
      const before = batches[index - 1];
      if (before === undefined) return;
      expect(batch.crewMinutes).toBeLessThan(before.crewMinutes);
      expect(batch.costMinor).toBeLessThanOrEqual(before.costMinor);
      expect(batch.touchMinutes).toBeCloseTo(before.touchMinutes, 9);
      expect(batch.crewMinutes).toBeGreaterThan(batch.touchMinutes);
    });
  });

  it("share one nest set-up among plates of one thickness", () => {
    const cut = (measures: readonly MeasureCase[]) =>
      line(estimate(measures, { fabrication: buildFabrication({ quantity: 1 }) }).lines, "Cut plate").minutes;
    const [backing, web12, web10] = [
      cut([backingPlates()]),
      cut([webPlates({ thicknessMm: 12 })]),
      cut([webPlates()]),
    ];
    const nest = 3;
    expect(cut([backingPlates(), webPlates({ thicknessMm: 12 })])).toBeCloseTo(backing + web12 - nest, 9);
    expect(cut([backingPlates(), webPlates()])).toBeCloseTo(backing + web10, 9);
  });

  it("of a detail are 45 for the first node and 5 for each further one", () => {
    const draw = (quantity: number) =>
      line(
        estimate([stiffeners()], { fabrication: buildFabrication({ quantity }) }).lines,
        "Draw and check the detail",
      ).minutes;
    expect(draw(1)).toBeCloseTo(45, 9);
    expect(draw(10)).toBeCloseTo((45 + 9 * 5) / 10, 9);
  });

  it("keep shop, site and drawing office apart", () => {
    const { lines, shopMinutes, siteMinutes, crewMinutes } = estimate([stiffeners(), throughBars()], {
      node: buildNode(["left"]),
    });
    const crewAt = (where: string) =>
      lines.filter((each) => each.where === where).reduce((sum, each) => sum + each.minutes, 0);
    expect(siteMinutes).toBeCloseTo(crewAt("site"), 9);
    expect(crewAt("shop") + crewAt("site") + crewAt("office")).toBeCloseTo(crewMinutes, 9);
    // Two people turn the column: their clock runs once.
    const turning = line(lines, "Turn the column").minutes;
    expect(shopMinutes).toBeCloseTo(crewAt("shop") - turning / 2, 9);
  });

  it("of placing are those of the formula the shop has chosen", () => {
    const place = (measures: readonly MeasureCase[], shop: ShopPrices) =>
      line(estimate(measures, { prices: shop }).lines, "Mark, place and tack").minutes;
    const [own, bench, assembly] = [
      prices,
      pricesWithFormula("place-parts", "bench"),
      pricesWithFormula("place-parts", "assembly"),
    ].map((shop) => place([stiffeners()], shop));
    expect(own).toBeCloseTo(4 * 6, 9);
    expect(bench).toBeCloseTo(4 * 1.6, 9);
    // The published laws are said to bound the shop's own minutes.
    expect(assembly).toBeGreaterThan(own ?? Number.NaN);
  });
});

describe("what the order asks for", () => {
  it("inspects more in a higher execution class", () => {
    const inspection = (executionClass: 1 | 2 | 3 | 4, measures: readonly MeasureCase[]) =>
      estimate(measures, { fabrication: buildFabrication({ executionClass }) }).costByCategoryMinor
        .inspection;
    const fillets = ([1, 2, 3, 4] as const).map((executionClass) =>
      inspection(executionClass, [stiffeners()]),
    );
    const butts = ([1, 2, 3, 4] as const).map((executionClass) =>
      inspection(executionClass, [stiffeners({ flangeWeld: { kind: "butt" } })]),
    );
    expect(fillets[0]).toBe(0);
    expect(fillets[1]).toBe(0);
    expect(fillets[3]).toBeGreaterThan(fillets[2] ?? Number.NaN);
    expect(butts[1]).toBeGreaterThan(0);
    expect(butts[3]).toBeGreaterThan(butts[1] ?? Number.NaN);
  });

  it("paints or galvanises, and vents a closed web plate before dipping", () => {
    const operations = (coating: "none" | "paint" | "galvanised", one: MeasureCase) =>
      estimate([one], { fabrication: buildFabrication({ coating }) }).lines.map((each) => each.operation);
    expect(operations("none", webPlates()).some((operation) => /paint|galvanise|vent/i.test(operation))).toBe(
      false,
    );
    expect(operations("paint", webPlates())).toContain("Touch-up paint");
    expect(operations("galvanised", webPlates())).toEqual(
      expect.arrayContaining(["Galvanise plates", "Vent holes before dipping"]),
    );
    expect(operations("galvanised", stiffeners())).not.toContain("Vent holes before dipping");
  });
});

describe("mass and carbon", () => {
  it("of a heavier column are its share of the lift", () => {
    const share = (nodesPerLift: number) =>
      estimate([heavierColumn()], { fabrication: buildFabrication({ nodesPerLift }) });
    expect(share(1).massKg).toBeCloseTo(3 * share(3).massKg, 9);
    expect(share(3).carbonKg).toBeCloseTo(
      share(3).massKg * (prices.carbon.factors.section?.kgCo2ePerKg ?? Number.NaN),
      9,
    );
    expect(share(3).costByCategoryMinor.column).toBe(share(3).costMinor);
  });

  it("of stiffeners in a heavier column fit that column", () => {
    const together = estimate([heavierColumn(HE_300_B), stiffeners()]);
    const inHeavier = estimate([stiffeners()], {
      node: { ...node, column: { ...node.column, section: HE_300_B } },
    });
    expect(together.massKg).toBeCloseTo(estimate([heavierColumn(HE_300_B)]).massKg + inHeavier.massKg, 9);
  });
});
