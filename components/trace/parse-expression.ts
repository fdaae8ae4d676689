/**
 * Reads the arithmetic of a step into a tree, so that it can be set as mathematics: a fraction is drawn
 * as a fraction. It understands what the formulas of lib/calc are written in; anything else answers
 * null, and the reader is shown the line as it is written.
 */
export type Expression =
  | { readonly kind: "number"; readonly text: string }
  | { readonly kind: "name"; readonly name: string }
  | { readonly kind: "negative"; readonly of: Expression }
  | { readonly kind: "group"; readonly of: Expression }
  | {
      readonly kind: "operation";
      readonly operator: string;
      readonly left: Expression;
      readonly right: Expression;
    }
  | { readonly kind: "call"; readonly name: string; readonly given: readonly Expression[] }
  | {
      readonly kind: "choice";
      readonly condition: Expression;
      readonly then: Expression;
      readonly otherwise: Expression;
    };

class NotUnderstood extends Error {}

const TOKEN = /\s*(?:(\d+(?:\.\d+)?(?:e[+-]?\d+)?)|([A-Za-z_][A-Za-z0-9_]*)|(<=|>=|==|!=|[-+*/^()<>?:,]))/y;

function tokens(text: string): readonly string[] {
  const found: string[] = [];
  const scan = new RegExp(TOKEN);
  const trimmed = text.trimEnd();
  while (scan.lastIndex < trimmed.length) {
    const match = scan.exec(trimmed);
    const token = match?.[1] ?? match?.[2] ?? match?.[3];
    if (token === undefined) throw new NotUnderstood();
    found.push(token);
  }
  return found;
}

/** How tightly an operator binds; a power binds from the right. */
const BINDING: Readonly<Record<string, number>> = {
  or: 1,
  and: 2,
  "<": 3,
  ">": 3,
  "<=": 3,
  ">=": 3,
  "==": 3,
  "!=": 3,
  "+": 4,
  "-": 4,
  "*": 5,
  "/": 5,
  "^": 7,
};
const NEGATIVE_BINDING = 6;

class Reader {
  private at = 0;
  constructor(private readonly list: readonly string[]) {}

  whole(): Expression {
    const read = this.choice();
    if (this.at < this.list.length) throw new NotUnderstood();
    return read;
  }

  private take(expected?: string): string {
    const token = this.list[this.at];
    if (token === undefined || (expected !== undefined && token !== expected)) throw new NotUnderstood();
    this.at += 1;
    return token;
  }

  private choice(): Expression {
    const condition = this.binary(1);
    if (this.list[this.at] !== "?") return condition;
    this.take("?");
    const then = this.choice();
    this.take(":");
    return { kind: "choice", condition, then, otherwise: this.choice() };
  }

  private binary(least: number): Expression {
    let left = this.single();
    for (;;) {
      const operator = this.list[this.at] ?? "";
      const binding = BINDING[operator];
      if (binding === undefined || binding < least) return left;
      this.take();
      const right = this.binary(operator === "^" ? binding : binding + 1);
      left = { kind: "operation", operator, left, right };
    }
  }

  private single(): Expression {
    const token = this.take();
    if (token === "-") return { kind: "negative", of: this.binary(NEGATIVE_BINDING) };
    if (token === "(") {
      const of = this.choice();
      this.take(")");
      return { kind: "group", of };
    }
    if (/^\d/.test(token)) return { kind: "number", text: token };
    if (!/^[A-Za-z_]/.test(token) || token in BINDING) throw new NotUnderstood();
    return this.list[this.at] === "(" ? this.call(token) : { kind: "name", name: token };
  }

  private call(name: string): Expression {
    this.take("(");
    const given: Expression[] = [];
    while (this.list[this.at] !== ")") {
      given.push(this.choice());
      if (this.list[this.at] === ",") this.take();
    }
    this.take(")");
    return { kind: "call", name, given };
  }
}

/**
 * @param text - mathjs syntax as a step carries it.
 * @returns the tree, or null where the line uses something else.
 */
export function parseExpression(text: string): Expression | null {
  try {
    return new Reader(tokens(text)).whole();
  } catch (error) {
    if (error instanceof NotUnderstood) return null;
    throw error;
  }
}
