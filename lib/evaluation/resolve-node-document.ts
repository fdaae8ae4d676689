import type { z } from "zod";
import { NodeDocument } from "@/lib/schemas/node-document";
import type { DocumentError } from "./resolve-errors";

export type ParsedDocument =
  | { readonly ok: true; readonly document: NodeDocument }
  | { readonly ok: false; readonly errors: readonly DocumentError[] };

type Issue = z.core.$ZodIssue;

const dotted = (path: readonly PropertyKey[]): string => path.map(String).join(".");

function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  let value = input;
  for (const key of path) {
    if (typeof value !== "object" || value === null) return undefined;
    value = (value as Record<PropertyKey, unknown>)[key];
  }
  return value;
}

const NOUNS: Readonly<Record<string, string>> = {
  number: "a number",
  string: "a text",
  boolean: "true or false",
  array: "a list",
  object: "an object",
  int: "a whole number",
};

const oneOf = (values: readonly unknown[]): string => {
  const names = values.map((value) => (typeof value === "string" ? `"${value}"` : String(value)));
  return names.length === 1 ? `Write ${names[0] ?? ""}.` : `Write one of ${names.join(", ")}.`;
};

/** A bound that zod states, in the words of the form. */
function boundMessage(issue: Extract<Issue, { code: "too_small" | "too_big" }>): string {
  const isLow = issue.code === "too_small";
  const bound = String(isLow ? issue.minimum : issue.maximum);
  if (issue.origin === "string")
    return isLow ? "Write something here." : `Write at most ${bound} characters.`;
  if (issue.origin === "array") return isLow ? `Give at least ${bound}.` : `Give at most ${bound}.`;
  if (isLow) return issue.inclusive ? `Give a number of at least ${bound}.` : `Give a number above ${bound}.`;
  return issue.inclusive ? `Give a number of at most ${bound}.` : `Give a number below ${bound}.`;
}

/** zod's own words ("Invalid input: expected …") are for programmers; messages stated in the schema stay as they are. */
function messageOf(issue: Issue, input: unknown): string {
  const isStatedInSchema = !/^(Invalid|Too (small|big)|Unrecognized)/.test(issue.message);
  if (isStatedInSchema) return issue.message;
  switch (issue.code) {
    case "invalid_type":
      if (input === undefined) return "This field is missing.";
      if (issue.expected === "number" && typeof input === "number") return "Give a finite number.";
      return `Give ${NOUNS[issue.expected] ?? issue.expected}.`;
    case "too_small":
    case "too_big":
      return boundMessage(issue);
    case "invalid_value":
      return input === undefined ? "This field is missing." : oneOf(issue.values);
    default:
      return issue.message;
  }
}

/** What to say where a value fits none of the shapes a field may have. */
function unionMessage(path: readonly PropertyKey[], input: unknown): string {
  if (input === undefined) return "This field is missing.";
  switch (path.at(-1)) {
    case "section":
      return "Write a catalogue designation, or { h, b, tw, tf, r } rolled, or { h, b, tw, tf, weld } welded.";
    case "steel":
      return "Write a grade such as S355, or { fy, fu }.";
    case "stiffness":
      return 'Write "any", "rigid" or a stiffness above 0.';
    case "length":
      return 'Write "full" or a length above 0.';
    case "perRow":
    case "sides":
      return path.at(-1) === "sides" ? "Write 1 or 2." : "Write 2 or 4.";
    case "executionClass":
      return "Write 1, 2, 3 or 4.";
    case "kind":
      return "This kind is not known.";
    default:
      return 'Write a throat above 0, or "butt".';
  }
}

/**
 * Of the branches of a union, the one the writer meant: an object belongs to the object shape with the fewest faults
 * inside it; anything else to none, and the union's own words are given.
 */
function unionErrors(
  issue: Extract<Issue, { code: "invalid_union" }>,
  path: readonly PropertyKey[],
  root: unknown,
): DocumentError[] {
  const input = valueAt(root, path);
  const branches = issue.errors
    .filter(
      (branch) =>
        branch.length > 0 &&
        branch.some((inner) => inner.path.length > 0 || inner.code === "unrecognized_keys"),
    )
    .toSorted((a, b) => faultsOf(a) - faultsOf(b));
  const meant = branches[0];
  if (!meant || typeof input !== "object" || input === null)
    return [{ path: dotted(path), message: unionMessage(path, input) }];
  return meant.flatMap((inner) => errorsOf(inner, path, root));
}

/** Every unknown field counts, so that a welded section is not read as a rolled one with a stray field. */
const faultsOf = (branch: readonly Issue[]): number =>
  branch.reduce((sum, inner) => sum + (inner.code === "unrecognized_keys" ? inner.keys.length : 1), 0);

function errorsOf(issue: Issue, above: readonly PropertyKey[], root: unknown): DocumentError[] {
  const path = [...above, ...issue.path];
  if (issue.code === "unrecognized_keys") {
    return issue.keys.map((key) => ({ path: dotted([...path, key]), message: "This field is not known." }));
  }
  if (issue.code === "invalid_union") return unionErrors(issue, path, root);
  return [{ path: dotted(path), message: messageOf(issue, valueAt(root, path)) }];
}

/**
 * Reads a node document of any origin. Every fault is told with the dotted path of its field.
 *
 * @param input - parsed JSON, or whatever a form or file gave.
 */
export function parseNodeDocument(input: unknown): ParsedDocument {
  const parsed = NodeDocument.safeParse(input);
  if (parsed.success) return { ok: true, document: parsed.data };
  return { ok: false, errors: parsed.error.issues.flatMap((issue) => errorsOf(issue, [], input)) };
}
