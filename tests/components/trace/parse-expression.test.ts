import { definedFormulas } from "@/lib/calc";
import { describe, expect, it } from "vitest";
import { parseExpression, type Expression } from "@/components/trace/parse-expression";

/** Evaluates the tree by hand, so that a wrong precedence shows as a wrong number. */
function valueOf(node: Expression, names: Readonly<Record<string, number>>): number {
  switch (node.kind) {
    case "number":
      return Number(node.text);
    case "name":
      return node.name === "pi" ? Math.PI : (names[node.name] ?? NaN);
    case "negative":
      return -valueOf(node.of, names);
    case "group":
      return valueOf(node.of, names);
    case "choice":
      return valueOf(node.condition, names) === 1
        ? valueOf(node.then, names)
        : valueOf(node.otherwise, names);
    case "call": {
      const given = node.given.map((item) => valueOf(item, names));
      const functions: Record<string, (...values: number[]) => number> = {
        sqrt: Math.sqrt,
        abs: Math.abs,
        min: Math.min,
        max: Math.max,
        sin: Math.sin,
        cos: Math.cos,
        tan: Math.tan,
        atan: Math.atan,
        exp: Math.exp,
        log: Math.log,
      };
      const run = functions[node.name];
      if (!run) throw new Error(`The test does not know ${node.name}`);
      return run(...given);
    }
    case "operation": {
      const [left, right] = [valueOf(node.left, names), valueOf(node.right, names)];
      const operations: Record<string, number> = {
        "+": left + right,
        "-": left - right,
        "*": left * right,
        "/": left / right,
        "^": left ** right,
        "<": Number(left < right),
        ">": Number(left > right),
        "<=": Number(left <= right),
        ">=": Number(left >= right),
        "==": Number(left === right),
        or: Number(left === 1 || right === 1),
        and: Number(left === 1 && right === 1),
      };
      return operations[node.operator] ?? NaN;
    }
  }
}

describe("reading the arithmetic of a step", () => {
  it.each([
    ["1 + 2 * 3", 7],
    ["(1 + 2) * 3", 9],
    ["2 ^ 3 ^ 2", 512],
    ["-2 ^ 2", -4],
    ["12 / 2 / 3", 2],
    ["10 - 4 - 3", 3],
    ["1 <= 2 ? 5 : 6", 5],
    ["max(1, min(4, 3))", 3],
    ["2 * -3", -6],
    ["1 > 2 or 3 >= 3 ? 5 : 6", 5],
    ["1 > 2 or 3 > 2 and 2 > 3 ? 5 : 6", 6],
  ])("%s is %d", (text, value) => {
    const tree = parseExpression(text);
    expect(tree && valueOf(tree, {})).toBe(value);
  });

  it("answers null where it does not understand, instead of half a formula", () => {
    for (const text of ["a +", "a b", "2 # 3", "f(1", ""]) expect(parseExpression(text)).toBeNull();
  });

  it("understands every formula of the program and gives the value of its example", () => {
    const formulas = definedFormulas();
    expect(formulas.length).toBeGreaterThan(20);
    for (const { id, expression, example } of formulas) {
      const tree = parseExpression(expression);
      expect(tree, id).not.toBeNull();
      if (!tree) continue;
      const value = valueOf(tree, example.given);
      expect(Math.abs(value - example.gives), id).toBeLessThanOrEqual(
        Math.max(Math.abs(example.gives) * example.relTol, 1e-9),
      );
    }
  });
});
