/** Guards how a time table is made ready: checked whole, compiled once, names kept apart. */
import { describe, expect, it } from "vitest";
import { compileTimeTable, RuleRefused, type TimeRule, type TimeTable } from "@/lib/cost";
import { DRIVER_NAMES, DRIVERS } from "@/lib/cost/drivers";
import { compiledTimeTable, slotsOf } from "@/lib/cost/time-table";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { buildFabrication } from "@/tests/factories/build-cost-case";

const seed = loadSeedPrices().timeTable;

function withRule(key: string, changes: Partial<TimeRule>): TimeTable {
  const rules = seed.rules.map((rule) => (rule.key === key ? { ...rule, ...changes } : rule));
  return { ...seed, rules };
}
const formula = (expression: string) => ({ key: "own", label: "Test", expression, source: "Test" });

describe("a time table", () => {
  it("has a rule for every driver that geometry delivers", () => {
    const { rulesByDriver } = compileTimeTable(seed);
    expect([...rulesByDriver.keys()].sort()).toEqual([...DRIVER_NAMES].sort());
  });

  it("is compiled once for as long as it lives", () => {
    expect(compiledTimeTable(seed)).toBe(compiledTimeTable(seed));
    expect(compiledTimeTable({ ...seed })).not.toBe(compiledTimeTable(seed));
  });

  it("refuses a name that belongs to another driver", () => {
    expect(() =>
      compileTimeTable(withRule("turn", { runMinutes: { chosen: "own", formulas: [formula("throatMm")] } })),
    ).toThrow(/throatMm/);
  });

  it("checks the formulas that are not in use as well", () => {
    const formulas = [formula("turns"), { ...formula("turns(1)"), key: "other" }];
    expect(() => compileTimeTable(withRule("turn", { runMinutes: { chosen: "own", formulas } }))).toThrow(
      RuleRefused,
    );
  });

  it("refuses a choice that is not there", () => {
    expect(() =>
      compileTimeTable(withRule("turn", { runMinutes: { chosen: "none", formulas: [formula("turns")] } })),
    ).toThrow(/no formula/);
  });

  it("lets no constant or table take the name of a quantity or function", () => {
    const constant = { value: 1, label: "Test", unit: "1", source: "Test" };
    expect(() =>
      compileTimeTable({ ...seed, constants: { ...seed.constants, thicknessMm: constant } }),
    ).toThrow(RuleRefused);
    expect(() => compileTimeTable({ ...seed, constants: { ...seed.constants, sqrt: constant } })).toThrow(
      RuleRefused,
    );
  });

  it("lets a rule give no name that is taken", () => {
    expect(() => compileTimeTable(withRule("turn", { gives: "turns" }))).toThrow(/taken/);
  });

  it("fills an item's braces with words only", () => {
    const use = {
      item: "nut-{bars}",
      label: "Nuts",
      category: "material" as const,
      unit: "kg" as const,
      quantity: formula("1"),
    };
    expect(() => compileTimeTable(withRule("bar-stock", { uses: [use] }))).toThrow(/no word/);
  });

  it("puts every value of a record where its rules look for it", () => {
    const values = Object.fromEntries(Object.keys(DRIVERS.turn).map((name, index) => [name, index + 1])) as {
      turns: number;
      pieceMassKg: number;
    };
    const fabrication = buildFabrication();
    expect(slotsOf({ driver: "turn", group: "", values }, fabrication)).toEqual([
      fabrication.quantity,
      fabrication.nodesPerLift,
      fabrication.executionClass,
      fabrication.coating,
      1,
      2,
    ]);
  });
});

describe("every seeded figure", () => {
  it("says where it comes from or that the shop is to confirm it", () => {
    const { timeTable, rateBook, carbon } = loadSeedPrices();
    const sources = [
      ...timeTable.rules.flatMap((rule) => [
        ...(rule.runMinutes?.formulas ?? []),
        rule.setUpMinutes,
        rule.machineMinutes,
        ...rule.uses.map((use) => use.quantity),
      ]),
      ...Object.values(timeTable.constants),
      ...Object.values(timeTable.lookUps).flatMap<{ source: string }>((table) => [...table.entries]),
      ...Object.values(carbon.factors),
    ].flatMap((figure) => (figure === null ? [] : [figure.source]));
    expect(sources.length).toBeGreaterThan(80);
    expect(sources.filter((source) => source.trim().length < 4)).toEqual([]);
    expect(
      Object.values(rateBook.lines).filter((line) => !line.source.includes("Invented for the demonstration")),
    ).toEqual([]);
  });
});
