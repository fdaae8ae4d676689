/** Guards the door that figures come in by: unknown keys, unknown units and figures without a source stay out. */
import { describe, expect, it } from "vitest";
import { ZodError } from "zod";
import { parseShopPrices } from "@/lib/schemas/shop-prices";
import { loadSeedPrices } from "@/seeders/data/load-prices";

/** The default figures as plain JSON with the value at one path changed, or taken away where it is undefined. */
function changed(path: string, value: unknown): unknown {
  const json: unknown = structuredClone(loadSeedPrices());
  const keys = path.split("/");
  const last = keys.pop() ?? "";
  const holder = keys.reduce<unknown>((at, key) => (at as Record<string, unknown>)[key], json) as Record<
    string,
    unknown
  >;
  if (value === undefined) Reflect.deleteProperty(holder, last);
  else holder[last] = value;
  return json;
}
function faultsOf(json: unknown): string {
  try {
    parseShopPrices(json);
  } catch (error) {
    if (error instanceof ZodError)
      return error.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`).join("\n");
    throw error;
  }
  return "";
}
describe("a shop's figures", () => {
  it("come through as they are", () => {
    expect(parseShopPrices(structuredClone(loadSeedPrices()))).toEqual(loadSeedPrices());
  });

  it.each<[string, string, unknown, RegExp]>([
    ["an unknown key", "rateBook/colour", "red", /rateBook/],
    ["an unknown key in a rate", "rateBook/lines/plate/vat", 20, /rateBook\.lines\.plate/],
    ["an unknown unit", "rateBook/lines/plate/unit", "stone", /rateBook\.lines\.plate\.unit/],
    ["a rate without a source", "rateBook/lines/plate/source", " ", /where the figure comes from/],
    ["a rate with seven decimals", "rateBook/lines/power/low", 0.1234567, /six decimals/],
    ["a rate below nothing", "rateBook/lines/plate/low", -1, /rateBook\.lines\.plate\.low/],
    ["a likely rate above the high one", "rateBook/lines/plate/likely", 99, /between low and high/],
    ["a currency in words", "rateBook/currency", "euro", /ISO 4217/],
    ["a date in words", "rateBook/validFrom", "last May", /rateBook\.validFrom/],
    ["a unit that the time table does not count in", "rateBook/lines/plate/unit", "m2", /counts plate in kg/],
    [
      "a bar priced by the piece",
      "rateBook/lines/threaded-bar-8.8/unit",
      "piece",
      /counts threaded-bar-8\.8 in kg/,
    ],
    [
      "an expression outside the sandbox",
      "timeTable/rules/1/quantity/expression",
      "process.exit()",
      /refused/,
    ],
    ["a rule for an unknown driver", "timeTable/rules/0/driver", "magic", /timeTable\.rules\.0\.driver/],
    ["two rules of one key", "timeTable/rules/0/key", "turn", /key of its own/],
    ["minutes without a trade", "timeTable/rules/1/trade", null, /need a trade/],
    [
      "a formula without a source",
      "timeTable/rules/1/runMinutes/formulas/0/source",
      "",
      /where the figure comes from/,
    ],
    [
      "a choice among formulas that is not there",
      "timeTable/rules/1/runMinutes/chosen",
      "none",
      /not among them/,
    ],
    ["a constant without a source", "timeTable/constants/overweld/source", "", /where the figure comes from/],
    ["limits out of order", "timeTable/lookUps/spannerSwingMm/entries/0/upTo", 999, /lowest limit up/],
    ["a word twice in a table", "timeTable/lookUps/positionFactor/entries/0/name", "PB", /once/],
    ["an unknown product", "carbon/factors/gold", { kgCo2ePerKg: 1, source: "Test" }, /carbon\.factors/],
    ["no time table", "timeTable", undefined, /timeTable/],
  ])("are refused with %s", (_, path, value, fault) => {
    expect(faultsOf(changed(path, value))).toMatch(fault);
  });

  it("may lack a rate that no option needs yet: the estimate will say so", () => {
    expect(faultsOf(changed("rateBook/lines/plate", undefined))).toBe("");
  });
});
