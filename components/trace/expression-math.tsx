import { createElement, type ReactNode } from "react";
import { formatFigures } from "@/components/ui/format-number";
import { parseExpression, type Expression } from "./parse-expression";
import { factorsOf, isLetter, splitSymbol, unitText } from "./symbol-text";

/* MathML: drawn by the browser itself, read aloud by screen readers, and free of style attributes. */
const tag = (name: string, props: object | null, ...children: readonly ReactNode[]) =>
  createElement(name, props, ...children);
const operator = (text: string, props: object = {}) => tag("mo", props, text);
const row = (...children: readonly ReactNode[]) => tag("mrow", null, ...children);

const OPERATORS: Readonly<Record<string, string>> = {
  "*": "·",
  "-": "−",
  "<=": "≤",
  ">=": "≥",
  "==": "=",
  "!=": "≠",
  "+": "+",
  "<": "<",
  ">": ">",
};

/** How a name of the formula is set: by its symbol, or by the number put in for it. */
type NameSetter = (name: string) => ReactNode;

function symbolMath(symbol: string): ReactNode {
  const factors = factorsOf(symbol);
  return factors.length === 1 ? factorMath(symbol) : row(...factors.map(factorMath));
}

function factorMath(symbol: string): ReactNode {
  const { base, below } = splitSymbol(symbol);
  const letter = isLetter(base)
    ? tag("mi", { mathvariant: "normal", className: "italic" }, base)
    : tag("mtext", null, base);
  return below === null ? letter : tag("msub", null, letter, tag("mtext", null, below));
}

function numberMath(value: number): ReactNode {
  const [mantissa = "", exponent] = formatFigures(value, 5).split(" × 10^");
  const plain = tag("mn", null, mantissa);
  const number =
    exponent === undefined
      ? plain
      : row(plain, operator("×"), tag("msup", null, tag("mn", null, "10"), tag("mn", null, exponent)));
  return value < 0 ? row(operator("("), number, operator(")")) : number;
}

const withoutGroup = (expression: Expression): Expression =>
  expression.kind === "group" ? withoutGroup(expression.of) : expression;

/**
 * A root under a drawn bar. A browser stretches the sign of `msqrt` only with a mathematical font at
 * hand; without one its bar ends up where it can be misread.
 */
const rootMath = (radicand: ReactNode): ReactNode =>
  row(operator("√", { stretchy: "false", rspace: "0" }), tag("mrow", { className: "radicand" }, radicand));

function callMath(name: string, given: readonly Expression[], set: NameSetter): ReactNode {
  const [first] = given;
  if (name === "sqrt" && first) return rootMath(math(withoutGroup(first), set));
  if (name === "abs" && first) return row(operator("|"), math(first, set), operator("|"));
  const list = given.flatMap((item, index) =>
    index === 0 ? [math(item, set)] : [operator(";"), math(item, set)],
  );
  return row(tag("mi", { mathvariant: "normal" }, name), operator("("), ...list, operator(")"));
}

type Choice = Extract<Expression, { kind: "choice" }>;

/** A choice inside the last branch of a choice is one case more of the same list, as a standard prints it. */
function casesOf(choice: Choice): readonly (readonly [value: Expression, condition: Expression | null])[] {
  const last = withoutGroup(choice.otherwise);
  return [
    [choice.then, choice.condition],
    ...(last.kind === "choice" ? casesOf(last) : ([[last, null]] as const)),
  ];
}

const choiceMath = (choice: Choice, set: NameSetter): ReactNode =>
  tag(
    "mtable",
    { className: "cases", displaystyle: "true" },
    ...casesOf(choice).map(([value, condition]) =>
      tag(
        "mtr",
        null,
        tag("mtd", null, math(value, set)),
        tag(
          "mtd",
          null,
          condition === null
            ? tag("mtext", null, "otherwise")
            : row(tag("mtext", null, "where\u00a0"), math(condition, set)),
        ),
      ),
    ),
  );

/** A product of fractions reads as one fraction: `a * b / c` arrives as (a * b) / c. */
function operationMath(
  { operator: sign, left, right }: Extract<Expression, { kind: "operation" }>,
  set: NameSetter,
): ReactNode {
  if (sign === "/") return tag("mfrac", null, math(withoutGroup(left), set), math(withoutGroup(right), set));
  if (sign === "^") return tag("msup", null, math(left, set), math(withoutGroup(right), set));
  if (sign === "or" || sign === "and")
    return row(math(left, set), tag("mtext", null, `\u00a0${sign}\u00a0`), math(right, set));
  return row(math(left, set), operator(OPERATORS[sign] ?? sign), math(right, set));
}

function math(expression: Expression, set: NameSetter): ReactNode {
  switch (expression.kind) {
    case "number":
      return tag("mn", null, expression.text);
    case "name":
      return expression.name === "pi" ? tag("mi", null, "π") : set(expression.name);
    case "negative":
      return row(operator("−"), math(expression.of, set));
    case "group":
      return row(operator("("), math(expression.of, set), operator(")"));
    case "call":
      return callMath(expression.name, expression.given, set);
    case "choice":
      return choiceMath(expression, set);
    case "operation":
      return operationMath(expression, set);
  }
}

export interface ExpressionMathProps {
  /** mathjs syntax, as a step carries it. */
  readonly expression: string;
  readonly symbols: Readonly<Record<string, readonly [symbol: string, unit: string]>>;
  /** Given: each name is replaced by its number. Left out: by its symbol. */
  readonly inputs?: Readonly<Record<string, number>>;
  /** Stands before an equals sign. */
  readonly symbol?: string;
  /** Stands after a last equals sign: the result with its unit. */
  readonly result?: { readonly value: number; readonly unit: string };
}

/** One line of a calculation set as mathematics; the line as it is written where it cannot be. */
export function ExpressionMath({ expression, symbols, inputs, symbol, result }: ExpressionMathProps) {
  const parsed = parseExpression(expression);
  if (!parsed)
    return <code className="break-words">{symbol ? `${symbol} = ${expression}` : expression}</code>;
  const set: NameSetter = (name) => {
    const value = inputs?.[name];
    return value === undefined ? symbolMath(symbols[name]?.[0] ?? name) : numberMath(value);
  };
  const head = symbol ? row(symbolMath(symbol), operator("=")) : operator("=");
  const tail = result
    ? row(operator("="), numberMath(result.value), tag("mtext", null, `\u00a0${unitText(result.unit)}`))
    : null;
  return (
    <div className="py-1">
      {tag("math", { displaystyle: "true", className: "working-math" }, row(head, math(parsed, set), tail))}
    </div>
  );
}
