/** Guards the door that figures come in by: unknown keys, unknown units and figures without a source stay out. */
import { describe, expect, it } from "vitest";
import { ZodError } from "zod";
import { parseShopPrices } from "@/lib/schemas/shop-prices";
import { loadSeedPrices } from "@/seeders/data/load-prices";

type Json = { [key: string]: Json } & Json[] & string & number;

/** The default figures as plain JSON, with one change made. */
function changed(change: (json: Json) => void): unknown {
  const json = structuredClone(loadSeedPrices()) as unknown as Json;
  change(json);
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
const set = (at: Json | undefined, key: string, value: unknown): void => {
  if (at === undefined) throw new Error(`There is nothing to set ${key} on.`);
  (at as unknown as Record<string, unknown>)[key] = value;
};

describe("a shop's figures", () => {
  it("come through as they are", () => {
    expect(parseShopPrices(structuredClone(loadSeedPrices()))).toEqual(loadSeedPrices());
  });

  it.each<[string, (json: Json) => void, RegExp]>([
    ["an unknown key", (json) => set(json.rateBook, "colour", "red"), /rateBook/],
    [
      "an unknown key in a rate",
      (json) => set(json.rateBook?.lines?.plate, "vat", 20),
      /rateBook\.lines\.plate/,
    ],
    [
      "an unknown unit",
      (json) => set(json.rateBook?.lines?.plate, "unit", "stone"),
      /rateBook\.lines\.plate\.unit/,
    ],
    [
      "a rate without a source",
      (json) => set(json.rateBook?.lines?.plate, "source", " "),
      /where the figure comes from/,
    ],
    [
      "a rate with seven decimals",
      (json) => set(json.rateBook?.lines?.power, "low", 0.1234567),
      /six decimals/,
    ],
    [
      "a rate below nothing",
      (json) => set(json.rateBook?.lines?.plate, "low", -1),
      /rateBook\.lines\.plate\.low/,
    ],
    [
      "a likely rate above the high one",
      (json) => set(json.rateBook?.lines?.plate, "likely", 99),
      /between low and high/,
    ],
    ["a currency in words", (json) => set(json.rateBook, "currency", "euro"), /ISO 4217/],
    ["a date in words", (json) => set(json.rateBook, "validFrom", "last May"), /rateBook\.validFrom/],
    [
      "a unit that the time table does not count in",
      (json) => set(json.rateBook?.lines?.plate, "unit", "m2"),
      /counts plate in kg/,
    ],
    [
      "an expression outside the sandbox",
      (json) => set(json.timeTable?.rules?.[1]?.quantity, "expression", "process.exit()"),
      /refused/,
    ],
    [
      "a rule for an unknown driver",
      (json) => set(json.timeTable?.rules?.[0], "driver", "magic"),
      /timeTable\.rules\.0\.driver/,
    ],
    ["two rules of one key", (json) => set(json.timeTable?.rules?.[0], "key", "turn"), /key of its own/],
    ["minutes without a trade", (json) => set(json.timeTable?.rules?.[1], "trade", null), /need a trade/],
    [
      "a formula without a source",
      (json) => set(json.timeTable?.rules?.[1]?.runMinutes?.formulas?.[0], "source", ""),
      /where the figure comes from/,
    ],
    [
      "a choice among formulas that is not there",
      (json) => set(json.timeTable?.rules?.[1]?.runMinutes, "chosen", "none"),
      /not among them/,
    ],
    [
      "a constant without a source",
      (json) => set(json.timeTable?.constants?.overweld, "source", ""),
      /where the figure comes from/,
    ],
    [
      "limits out of order",
      (json) => set(json.timeTable?.lookUps?.spannerSwingMm?.entries?.[0], "upTo", 999),
      /lowest limit up/,
    ],
    [
      "a word twice in a table",
      (json) => set(json.timeTable?.lookUps?.positionFactor?.entries?.[0], "name", "PB"),
      /once/,
    ],
    [
      "an unknown product",
      (json) => set(json.carbon?.factors, "gold", { kgCo2ePerKg: 1, source: "Test" }),
      /carbon\.factors/,
    ],
    ["no tables at all", (json) => Reflect.deleteProperty(json, "timeTable"), /timeTable/],
  ])("are refused with %s", (_, change, fault) => {
    expect(faultsOf(changed(change))).toMatch(fault);
  });

  it("may lack a rate that no option needs yet: the estimate will say so", () => {
    expect(faultsOf(changed((json) => Reflect.deleteProperty(json.rateBook?.lines as object, "plate")))).toBe(
      "",
    );
  });
});
