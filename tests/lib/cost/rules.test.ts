/** Guards the sandbox of the time rules: what may be written gives the number of the same formula by hand, and nothing else is ever run. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { LookUpTable, TimeConstant } from "@/lib/cost";
import { compileExpression, MAX_NODES, RuleFailed, RuleRefused, type RuleWorld } from "@/lib/cost/rules";

const entry = (upTo: number, value: number) => ({ upTo, value, source: "Test" });
const lookUps: Record<string, LookUpTable> = {
  factor: {
    kind: "named",
    label: "By word",
    unit: "1",
    entries: [
      { name: "PF", value: 1.6, source: "Test" },
      { name: "PB", value: 1, source: "Test" },
    ],
  },
  band: { kind: "steps", label: "By band", unit: "1", entries: [entry(10, 1), entry(20, 2)] },
  slope: { kind: "linear", label: "Between", unit: "1", entries: [entry(0, 0), entry(10, 5), entry(20, 25)] },
};
const constant = (value: number | string): TimeConstant => ({
  value,
  label: "Test",
  unit: "1",
  source: "Test",
});
const world: RuleWorld = {
  names: new Map([
    ["a", { kind: "number", slot: 0 }],
    ["b", { kind: "number", slot: 1 }],
    ["position", { kind: "text", slot: 2 }],
  ]),
  constants: { twice: constant(2), process: constant("PF") },
  lookUps,
};
const valueOf = (expression: string, a = 3, b = 4, position = "PB"): number =>
  compileExpression(expression, world)([a, b, position]);

describe("a time rule", () => {
  it.each<[string, number]>([
    ["1.5", 1.5],
    ["a + b * 2", 11],
    ["(a + b) * 2", 14],
    ["a - b - 1", -2],
    ["a / b", 0.75],
    ["a ^ 2", 9],
    ["2 ^ a", 8],
    ["-a ^ 2", -9],
    ["+a", 3],
    ["10 - a", 7],
    ["10 / b", 2.5],
    ["a - 1", 2],
    ["b / 2", 2],
    ["a < b ? 1 : 2", 1],
    ["a > b ? 1 : 2", 2],
    ["a <= 3 ? 1 : 2", 1],
    ["a >= 4 ? 1 : 2", 2],
    ["a == 3 ? 1 : 2", 1],
    ["a != 3 ? 1 : 2", 2],
    ["min(a, b, 2)", 2],
    ["max(a, b, 2)", 4],
    ["sqrt(a + 1)", 2],
    ["ceil(a / 2)", 2],
    ["abs(a - b)", 1],
    ["twice * a", 6],
    ["factor(position)", 1],
    ["factor(process)", 1.6],
    ['factor("PF")', 1.6],
    ['position == "PB" ? 1 : 2', 1],
    ['position != "PB" ? 1 : 2', 2],
    ["band(10)", 1],
    ["band(a * 5)", 2],
    ["slope(5)", 2.5],
    ["slope(15)", 15],
    ["slope(0)", 0],
    ["a < b ? (b < a ? 1 : 2) : 3", 2],
  ])("%s with a = 3, b = 4 is %d", (expression, expected) => {
    expect(valueOf(expression)).toBeCloseTo(expected, 12);
  });

  it("is arithmetic of JavaScript for any numbers", () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(number, number, (a, b) => {
        expect(valueOf("a * b + a / (b * b + 1) - min(a, b) * 3", a, b)).toBe(
          a * b + a / (b * b + 1) - Math.min(a, b) * 3,
        );
        expect(valueOf("sqrt(abs(a)) > 100 ? ceil(b) : max(a, b, 0)", a, b)).toBe(
          Math.sqrt(Math.abs(a)) > 100 ? Math.ceil(b) : Math.max(a, b, 0),
        );
      }),
    );
  });

  it("fails where a table has no entry, and says which", () => {
    expect(() => valueOf("band(a * 10)")).toThrow(RuleFailed);
    expect(() => valueOf("factor(position)", 1, 1, "PX")).toThrow(/factor.*PX/);
    expect(() => valueOf("factor(position)", 1, 1, "constructor")).toThrow(RuleFailed);
    expect(() => valueOf('factor("toString")')).toThrow(RuleFailed);
  });
});

describe("a hostile rule", () => {
  it.each([
    "import('fs')",
    "process.exit()",
    "a.constructor",
    'a["constructor"]',
    "constructor",
    "__proto__",
    "toString",
    "hasOwnProperty",
    "constructor(1)",
    "__proto__(1)",
    "toString()",
    "factor.constructor(1)",
    "sqrt.constructor(1)",
    'evaluate("1")',
    'parse("1")',
    'compile("1")',
    "createUnit(1)",
    'simplify("a")',
    "x = 1",
    "f(x) = x",
    "a = 5; a",
    "1; 2",
    "1\n2",
    "[1, 2]",
    "[a, b][1]",
    "{ a: 1 }",
    "1:10",
    "range(1, 1e9)",
    "ones(10000, 10000)",
    "a'",
    "a!",
    "5!",
    "a %",
    "10%",
    "a + 10%",
    "a mod b",
    "a .* b",
    "a and b",
    "not a",
    "a or b",
    "xor(a, b)",
    "a | b",
    "a << 2",
    "5 cm",
    "2 a",
    "2(a)",
    "a to b",
    "random()",
    "pi",
    "e",
    "i",
    "true",
    "null",
    "undefined",
    "NaN",
    "Infinity",
    "1e999",
    "a < b",
    "a < b < 5",
    '"text"',
    "position",
    "position + 1",
    "factor(1)",
    "band(position)",
    "band()",
    "band(1, 2)",
    "sqrt()",
    "sqrt(1, 2)",
    "min(1)",
    "min()",
    "a ? 1 : 2",
    '1 < 2 ? "x" : 1',
    "position == 1 ? 1 : 2",
    "unknownName",
    "unknown(1)",
    "",
    "   ",
    "(",
    ")",
    "a +",
    "# comment",
    "a..b",
    "a ?? b",
    "a?.b",
    "`a`",
    "0x",
    'factor("PF"',
    "sin(1)",
    "exp(1)",
    "log(1)",
    "map(a, f)",
  ])("%j is refused", (expression) => {
    expect(() => compileExpression(expression, world)).toThrow(RuleRefused);
  });

  it("of any letters at all either compiles to a number or is refused, and nothing else happens", () => {
    const words = [
      "a",
      "b",
      "position",
      "twice",
      "factor",
      "band",
      "sqrt",
      "min",
      "constructor",
      "__proto__",
      "prototype",
      "(",
      ")",
      "[",
      "]",
      ".",
      ",",
      "+",
      "*",
      "^",
      "?",
      ":",
      "<",
      "=",
      "'",
      '"',
      ";",
      "1",
      "2.5",
      " ",
      "\\",
      "\n",
    ];
    const before = Object.getOwnPropertyNames(Object.prototype).length;
    fc.assert(
      fc.property(
        fc.oneof(
          fc.array(fc.constantFrom(...words), { maxLength: 25 }).map((parts) => parts.join("")),
          fc.string({ maxLength: 60 }),
        ),
        (expression) => {
          try {
            expect(typeof compileExpression(expression, world)([1, 2, "PB"])).toBe("number");
          } catch (error) {
            expect(error instanceof RuleRefused || error instanceof RuleFailed).toBe(true);
          }
        },
      ),
      { numRuns: 3000 },
    );
    expect(Object.getOwnPropertyNames(Object.prototype)).toHaveLength(before);
  });

  it("may have 200 parts and not one more", () => {
    // Each "+1" is two parts: the sum and its number.
    const withParts = (count: number): string => `a${"+1".repeat((count - 1) / 2)}`;
    expect(MAX_NODES).toBe(200);
    expect(valueOf(withParts(199))).toBe(3 + 99);
    expect(() => valueOf(withParts(201))).toThrow(/200 parts/);
  });

  it("neither exhausts the stack nor the clock", () => {
    expect(() => valueOf("(".repeat(900) + "a" + ")".repeat(900))).toThrow(RuleRefused);
    expect(() => valueOf("-".repeat(1500) + "a")).toThrow(RuleRefused);
    expect(() => valueOf("a+".repeat(50_000) + "a")).toThrow(/longer/);
    expect(() => valueOf("2^".repeat(900) + "2")).toThrow(RuleRefused);
  });

  it("cannot reach values beyond its own names", () => {
    const narrow: RuleWorld = { ...world, names: new Map([["a", { kind: "number", slot: 0 }]]) };
    expect(() => compileExpression("a + b", narrow)).toThrow(/does not know the name b/);
  });
});
