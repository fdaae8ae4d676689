import type { NodeDocument } from "@/lib/schemas/node-document";

/**
 * The node as it is being typed: the shape of the node document, with numbers kept as the text that
 * was typed, so that nothing is lost while it is no number yet.
 */
export type DraftValue = string | number | boolean | null | readonly DraftValue[] | DraftObject;
export interface DraftObject {
  readonly [key: string]: DraftValue | undefined;
}

export const isDraftObject = (value: DraftValue | undefined): value is DraftObject =>
  typeof value === "object" && value !== null && !Array.isArray(value);
export const isDraftList = (value: DraftValue | undefined): value is readonly DraftValue[] =>
  Array.isArray(value);

/** A saved document as the form takes it up. */
export const draftOf = (document: NodeDocument): DraftObject => document;

/** The value at a dotted path, or undefined. */
export function valueAt(draft: DraftValue | undefined, path: string): DraftValue | undefined {
  let value: DraftValue | undefined = draft;
  for (const key of path === "" ? [] : path.split(".")) {
    if (isDraftList(value)) value = value[Number(key)];
    else if (isDraftObject(value)) value = value[key];
    else return undefined;
  }
  return value;
}

/** What a field shows of a value: the words or the number as typed; nothing of a group. */
export const shownText = (value: DraftValue | undefined): string =>
  typeof value === "string" || typeof value === "number" || typeof value === "boolean" ? String(value) : "";

/** The text at a dotted path. */
export const textAt = (draft: DraftValue | undefined, path: string): string =>
  shownText(valueAt(draft, path));

function withKey(holder: DraftValue | undefined, key: string, value: DraftValue | undefined): DraftValue {
  if (isDraftList(holder)) {
    const index = Number(key);
    if (value === undefined) return holder.filter((_, at) => at !== index);
    return index < holder.length
      ? holder.map((item, at) => (at === index ? value : item))
      : [...holder, value];
  }
  const object = isDraftObject(holder) ? holder : {};
  if (value !== undefined) return { ...object, [key]: value };
  return Object.fromEntries(Object.entries(object).filter(([name]) => name !== key));
}

function setIn(
  holder: DraftValue | undefined,
  keys: readonly string[],
  value: DraftValue | undefined,
): DraftValue | undefined {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  const inner = isDraftList(holder) ? holder[Number(key)] : isDraftObject(holder) ? holder[key] : undefined;
  return withKey(holder, key, setIn(inner, rest, value));
}

/** The draft with another value at a path; `undefined` takes the field, or the item of a list, away. */
export function withValue(draft: DraftObject, path: string, value: DraftValue | undefined): DraftObject {
  const changed = setIn(draft, path.split("."), value);
  return isDraftObject(changed) ? changed : draft;
}

/** Fields that hold words; the text of every other field is a number, or a word such as "butt". */
const WORD_FIELDS = new Set([
  "reference",
  "basis",
  "section",
  "steel",
  "name",
  "size",
  "grade",
  "kind",
  "bracing",
  "coating",
  "assembly",
  "key",
  "arrangement",
  "towards",
  "levels",
  "at",
  "strengths",
  "tStubModeOne",
  "triangularLimit",
  "flangeWelds",
]);
/** Groups that may be left out as a whole: emptied field by field, they go. */
const OPTIONAL_GROUPS = new Set(["stiffener", "top", "bottom", "stiffened", "fabrication", "choices"]);
/** Words that may be left out: chosen to be not stated, they go. */
const OPTIONAL_WORDS = new Set(["assembly", "strengths", "tStubModeOne", "triangularLimit", "flangeWelds"]);

/**
 * The number that a text means: decimal point or comma, true minus sign and blanks between thousands
 * are understood. Null where it is no number.
 */
export function numberTyped(text: string): number | null {
  const plain = text
    .trim()
    .replace(/\u2212/g, "-")
    .replace(/(?<=\d)[\s\u00a0\u202f](?=\d{3}(\D|$))/g, "");
  const pointed = /^[^.,]*,[^.,]*$/.test(plain) ? plain.replace(",", ".") : plain;
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(pointed) ? Number(pointed) : null;
}

function readValue(value: DraftValue, field: string, inList: boolean): unknown {
  if (typeof value === "string") {
    if (WORD_FIELDS.has(field)) return value === "" && OPTIONAL_WORDS.has(field) ? undefined : value;
    if (value.trim() === "" && !inList) return undefined;
    return numberTyped(value) ?? value;
  }
  if (isDraftList(value)) return value.map((item) => readValue(item, field, true));
  if (!isDraftObject(value)) return value;
  const entries = Object.entries(value).flatMap(([key, inner]) => {
    const read = inner === undefined ? undefined : readValue(inner, key, false);
    return read === undefined ? [] : [[key, read] as const];
  });
  return entries.length === 0 && OPTIONAL_GROUPS.has(field) ? undefined : Object.fromEntries(entries);
}

/** The draft as a node document would be written: texts that are numbers become numbers, empty fields are left out. */
export const documentTyped = (draft: DraftObject): unknown => readValue(draft, "", false);

/** Whether two drafts say the same, however the numbers are spelled. */
export const sameDraft = (a: DraftValue | undefined, b: DraftValue | undefined, field = ""): boolean =>
  spelled(a, field) === spelled(b, field);

const spelled = (value: DraftValue | undefined, field: string): string =>
  value === undefined ? "" : JSON.stringify(sorted(readValue(value, field, false)) ?? null);

/** Fields in one order, so that documents compare by what they say. */
function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .map(([key, inner]) => [key, sorted(inner)] as const)
      .sort(([a], [b]) => a.localeCompare(b)),
  );
}
