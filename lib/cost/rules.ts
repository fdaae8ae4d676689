/**
 * Time rules are data that the shop edits, so their expressions are never run as code: mathjs only
 * parses them, and the walk below turns a closed list of node types into closures.
 */
import { create, type MathNode, parseDependencies } from "mathjs";
import type { NameKind } from "./drivers";
import type { LookUpTable, TimeConstant } from "./prices";

/** The parser alone: nothing of mathjs that evaluates is even loaded. */
const { parse } = create(parseDependencies ?? {});

/** The expression uses something outside the closed list, or does not parse. */
export class RuleRefused extends Error {
  override readonly name = "RuleRefused";
  constructor(
    readonly expression: string,
    readonly reason: string,
  ) {
    super(`The rule "${expression.slice(0, 120)}" is refused: ${reason}.`);
  }
}

/** A rule gave no finite number for the quantities it was applied to. */
export class RuleFailed extends Error {
  override readonly name = "RuleFailed";
  constructor(
    readonly where: string,
    readonly reason: string,
  ) {
    super(`The rule "${where}" gives no number: ${reason}.`);
  }
}

/** Values of one record, each in the slot that its name was given when the rule was compiled. */
export type Scope = readonly (number | string)[];
export type NumberOf = (scope: Scope) => number;
type TextOf = (scope: Scope) => string;

type Compiled =
  | { readonly kind: "number"; readonly of: NumberOf; readonly constant: boolean }
  | { readonly kind: "text"; readonly of: TextOf; readonly constant: boolean }
  | { readonly kind: "condition"; readonly of: (scope: Scope) => boolean; readonly constant: boolean };

export interface NameSlot {
  readonly kind: NameKind;
  readonly slot: number;
}

/** What an expression may refer to. Names not listed here do not exist for it. */
export interface RuleWorld {
  readonly names: ReadonlyMap<string, NameSlot>;
  readonly constants: Readonly<Record<string, TimeConstant>>;
  readonly lookUps: Readonly<Record<string, LookUpTable>>;
}

export const MAX_NODES = 200;
const MAX_CHARACTERS = 2000;

const ARITHMETIC: ReadonlySet<string> = new Set(["add", "subtract", "multiply", "divide", "pow"]);
const COMPARISON: ReadonlyMap<string, (a: number, b: number) => boolean> = new Map([
  ["smaller", (a, b) => a < b],
  ["smallerEq", (a, b) => a <= b],
  ["larger", (a, b) => a > b],
  ["largerEq", (a, b) => a >= b],
  ["equal", (a, b) => a === b],
  ["unequal", (a, b) => a !== b],
]);
const ONE_ARGUMENT: ReadonlyMap<string, (a: number) => number> = new Map([
  ["sqrt", Math.sqrt],
  ["ceil", Math.ceil],
  ["abs", Math.abs],
]);
const EXTREMES: ReadonlyMap<string, (a: number, b: number) => number> = new Map([
  ["min", (a, b) => (a < b ? a : b)],
  ["max", (a, b) => (a > b ? a : b)],
]);

/** Names an expression's own functions take, so that no quantity or table may shadow them. */
export const RESERVED_NAMES: readonly string[] = [...ONE_ARGUMENT.keys(), ...EXTREMES.keys()];

/** mathjs nodes read as plain data: only the fields of the closed list are ever touched. */
interface ReadNode {
  readonly type: string;
  readonly value?: unknown;
  readonly name?: unknown;
  readonly fn?: unknown;
  readonly implicit?: boolean;
  readonly isPercentage?: boolean;
  readonly content?: ReadNode;
  readonly condition?: ReadNode;
  readonly trueExpr?: ReadNode;
  readonly falseExpr?: ReadNode;
  readonly args?: readonly ReadNode[];
}

class Compiler {
  private nodes = 0;
  constructor(
    private readonly expression: string,
    private readonly world: RuleWorld,
  ) {}

  refuse(reason: string): never {
    throw new RuleRefused(this.expression, reason);
  }

  compile(node: ReadNode | undefined): Compiled {
    this.nodes += 1;
    if (this.nodes > MAX_NODES) this.refuse(`it has more than ${MAX_NODES} parts`);
    switch (node?.type) {
      case "ConstantNode":
        return this.constant(node);
      case "SymbolNode":
        return this.name(node);
      case "ParenthesisNode":
        return this.compile(node.content);
      case "OperatorNode":
        return this.operator(node);
      case "ConditionalNode":
        return this.conditional(node);
      case "FunctionNode":
        return this.call(node);
      default:
        return this.refuse(`${node?.type ?? "an empty part"} is not allowed`);
    }
  }

  number(node: ReadNode | undefined): Compiled & { kind: "number" } {
    const compiled = this.compile(node);
    return compiled.kind === "number"
      ? compiled
      : this.refuse("a number is needed where it gives something else");
  }

  private constant({ value }: ReadNode): Compiled {
    if (typeof value === "string") return { kind: "text", of: () => value, constant: true };
    if (typeof value !== "number" || !Number.isFinite(value))
      return this.refuse("only finite numbers and words are allowed");
    return { kind: "number", of: () => value, constant: true };
  }

  private name({ name }: ReadNode): Compiled {
    if (typeof name !== "string") return this.refuse("a name is needed");
    if (Object.hasOwn(this.world.constants, name))
      return this.constant({ type: "ConstantNode", value: this.world.constants[name]?.value });
    const known = this.world.names.get(name);
    if (known === undefined) return this.refuse(`it does not know the name ${name}`);
    const { kind, slot } = known;
    if (kind === "number") return { kind, of: (scope) => scope[slot] as number, constant: false };
    return { kind, of: (scope) => scope[slot] as string, constant: false };
  }

  private operator(node: ReadNode): Compiled {
    if (node.implicit === true) this.refuse("write every multiplication with *");
    if (node.isPercentage === true) this.refuse("write a percentage as a fraction");
    const fn = typeof node.fn === "string" ? node.fn : this.refuse("an operator is needed");
    const [first, second, third] = node.args ?? [];
    if (third !== undefined) return this.refuse("an operator takes two sides");
    if (second === undefined) return this.unary(fn, first);
    if (fn === "equal" || fn === "unequal") return this.equality(fn, first, second);
    const compare = COMPARISON.get(fn);
    if (!compare && !ARITHMETIC.has(fn)) return this.refuse(`the operator ${fn} is not allowed`);
    const a = this.number(first);
    const b = this.number(second);
    const constant = a.constant && b.constant;
    if (compare) return { kind: "condition", of: (scope) => compare(a.of(scope), b.of(scope)), constant };
    return this.folded({ kind: "number", of: arithmetic(fn, a, b), constant });
  }

  private unary(fn: string, argument: ReadNode | undefined): Compiled {
    if (fn !== "unaryMinus" && fn !== "unaryPlus") return this.refuse(`the operator ${fn} is not allowed`);
    const a = this.number(argument);
    return fn === "unaryPlus"
      ? a
      : this.folded({ kind: "number", of: (scope) => -a.of(scope), constant: a.constant });
  }

  private equality(fn: string, first: ReadNode | undefined, second: ReadNode): Compiled {
    const a = this.compile(first);
    const b = this.compile(second);
    if (a.kind !== b.kind || a.kind === "condition")
      return this.refuse("a comparison needs two numbers or two words");
    const [left, right]: [(scope: Scope) => unknown, (scope: Scope) => unknown] = [a.of, b.of];
    const wanted = fn === "equal";
    return {
      kind: "condition",
      of: (scope) => (left(scope) === right(scope)) === wanted,
      constant: a.constant && b.constant,
    };
  }

  private conditional(node: ReadNode): Compiled {
    const test = this.compile(node.condition);
    if (test.kind !== "condition") return this.refuse("a choice needs a comparison before the question mark");
    const yes = this.number(node.trueExpr);
    const no = this.number(node.falseExpr);
    const constant = test.constant && yes.constant && no.constant;
    return this.folded({
      kind: "number",
      of: (scope) => (test.of(scope) ? yes.of(scope) : no.of(scope)),
      constant,
    });
  }

  private call(node: ReadNode): Compiled {
    const target = node.fn as ReadNode | undefined;
    const name =
      target?.type === "SymbolNode" && typeof target.name === "string"
        ? target.name
        : this.refuse("only named functions may be called");
    const args = node.args ?? [];
    const one = ONE_ARGUMENT.get(name);
    const extreme = EXTREMES.get(name);
    if (one) {
      const a = args.length === 1 ? this.number(args[0]) : this.refuse(`${name} takes one number`);
      return this.folded({ kind: "number", of: (scope) => one(a.of(scope)), constant: a.constant });
    }
    if (extreme) return this.extreme(name, extreme, args);
    const table = Object.hasOwn(this.world.lookUps, name) ? this.world.lookUps[name] : undefined;
    if (!table) return this.refuse(`it does not know the function ${name}`);
    return args.length === 1
      ? this.lookUp(name, table, args[0])
      : this.refuse(`the table ${name} takes one value`);
  }

  private extreme(name: string, of: (a: number, b: number) => number, args: readonly ReadNode[]): Compiled {
    if (args.length < 2) return this.refuse(`${name} takes two numbers or more`);
    const parts = args.map((argument) => this.number(argument));
    const joined = parts.reduce((a, b) => ({
      kind: "number",
      of: (scope) => of(a.of(scope), b.of(scope)),
      constant: a.constant && b.constant,
    }));
    return this.folded(joined);
  }

  private lookUp(name: string, table: LookUpTable, argument: ReadNode | undefined): Compiled {
    if (table.kind === "named") {
      const a = this.compile(argument);
      if (a.kind !== "text") return this.refuse(`the table ${name} is read by a word`);
      const entries = new Map(table.entries.map((entry) => [entry.name, entry.value]));
      return this.folded({
        kind: "number",
        of: (scope) => entries.get(a.of(scope)) ?? missing(name, a.of(scope)),
        constant: a.constant,
      });
    }
    const a = this.number(argument);
    const read = readByNumber(name, table);
    return this.folded({ kind: "number", of: (scope) => read(a.of(scope)), constant: a.constant });
  }

  /** What depends on nothing is worked out once. */
  private folded(compiled: Compiled & { kind: "number" }): Compiled & { kind: "number" } {
    if (!compiled.constant) return compiled;
    const value = compiled.of([]);
    return { kind: "number", of: () => value, constant: true };
  }
}

type CompiledNumber = Compiled & { readonly kind: "number" };

/** Each operator its own closure, a constant side held in it: the innermost step is plain arithmetic. */
function arithmetic(fn: string, first: CompiledNumber, second: CompiledNumber): NumberOf {
  const [a, b] = [first.of, second.of];
  if (first.constant && !second.constant) return constantFirst(fn, a([]), b);
  if (second.constant && !first.constant) return constantSecond(fn, a, b([]));
  switch (fn) {
    case "add":
      return (scope) => a(scope) + b(scope);
    case "subtract":
      return (scope) => a(scope) - b(scope);
    case "multiply":
      return (scope) => a(scope) * b(scope);
    case "divide":
      return (scope) => a(scope) / b(scope);
    default:
      return (scope) => a(scope) ** b(scope);
  }
}

function constantFirst(fn: string, a: number, b: NumberOf): NumberOf {
  switch (fn) {
    case "add":
      return (scope) => a + b(scope);
    case "subtract":
      return (scope) => a - b(scope);
    case "multiply":
      return (scope) => a * b(scope);
    case "divide":
      return (scope) => a / b(scope);
    default:
      return (scope) => a ** b(scope);
  }
}

function constantSecond(fn: string, a: NumberOf, b: number): NumberOf {
  switch (fn) {
    case "add":
      return (scope) => a(scope) + b;
    case "subtract":
      return (scope) => a(scope) - b;
    case "multiply":
      return (scope) => a(scope) * b;
    case "divide":
      return (scope) => a(scope) / b;
    default:
      return (scope) => a(scope) ** b;
  }
}

function missing(table: string, value: number | string): never {
  throw new RuleFailed(table, `the table has no entry for ${value}`);
}

function readByNumber(
  name: string,
  table: LookUpTable & { kind: "steps" | "linear" },
): (value: number) => number {
  const limits = table.entries.map((entry) => entry.upTo);
  const values = table.entries.map((entry) => entry.value);
  const linear = table.kind === "linear";
  return (value) => {
    const at = limits.findIndex((limit) => value <= limit);
    const upper = values[at];
    if (upper === undefined) return missing(name, value);
    const lower = values[at - 1];
    const from = limits[at - 1];
    const to = limits[at];
    if (!linear || lower === undefined || from === undefined || to === undefined) return upper;
    return lower + ((upper - lower) * (value - from)) / (to - from);
  };
}

function read(expression: string): MathNode {
  if (expression.length > MAX_CHARACTERS)
    throw new RuleRefused(expression, `it is longer than ${MAX_CHARACTERS} characters`);
  try {
    return parse(expression);
  } catch (error) {
    throw new RuleRefused(
      expression,
      `it cannot be read (${error instanceof Error ? error.message : "unknown"})`,
    );
  }
}

/**
 * Compiles one expression into a closure over named quantities.
 *
 * Allowed: numbers, words in quotes, names of the world, + - * / ^, comparisons, `a ? b : c`,
 * min, max, sqrt, ceil, abs and the look-up tables; at most 200 parts. Nothing else is ever run.
 *
 * @throws RuleRefused for anything outside that list; the closure throws RuleFailed where a table has no entry.
 */
export function compileExpression(expression: string, world: RuleWorld): NumberOf {
  const compiler = new Compiler(expression, world);
  return compiler.number(read(expression)).of;
}
