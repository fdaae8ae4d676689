import { isDraftList, isDraftObject, sameDraft, type DraftObject, type DraftValue } from "./node-draft";

/** One field that is not the same in two versions of a node. */
export interface FieldDifference {
  readonly path: string;
  readonly opened: DraftValue | undefined;
  readonly mine: DraftValue | undefined;
  readonly theirs: DraftValue | undefined;
}

const fieldOf = (path: string): string => path.split(".").findLast((key) => !/^\d+$/.test(key)) ?? "";
const keysOf = (...values: (DraftValue | undefined)[]): string[] => [
  ...new Set(
    values.flatMap((value) =>
      isDraftList(value)
        ? value.map((_, index) => String(index))
        : isDraftObject(value)
          ? Object.keys(value)
          : [],
    ),
  ),
];
const child = (value: DraftValue | undefined, key: string): DraftValue | undefined =>
  isDraftList(value) ? value[Number(key)] : isDraftObject(value) ? value[key] : undefined;
/** Lists of numbers read as one value; lists of groups are compared group by group. */
const isBranch = (value: DraftValue | undefined): boolean =>
  isDraftObject(value) || (isDraftList(value) && value.some((item) => isDraftObject(item)));

/** Every field in which my version or theirs differs from what was opened. */
export function differencesOf(
  opened: DraftValue | undefined,
  mine: DraftValue | undefined,
  theirs: DraftValue | undefined,
  path = "",
): FieldDifference[] {
  const field = fieldOf(path);
  if (sameDraft(opened, mine, field) && sameDraft(opened, theirs, field)) return [];
  const values = [opened, mine, theirs];
  if (
    values.every((value) => value === undefined || isBranch(value)) &&
    values.filter((value) => value !== undefined).length > 1
  ) {
    return keysOf(...values).flatMap((key) =>
      differencesOf(
        child(opened, key),
        child(mine, key),
        child(theirs, key),
        path === "" ? key : `${path}.${key}`,
      ),
    );
  }
  return [{ path, opened, mine, theirs }];
}

function mergedObject(
  opened: DraftValue | undefined,
  mine: DraftObject,
  theirs: DraftObject,
  path: string,
): DraftObject {
  const entries = keysOf(theirs, mine).flatMap((key) => {
    const value = onTop(child(opened, key), mine[key], theirs[key], path === "" ? key : `${path}.${key}`);
    return value === undefined ? [] : [[key, value] as const];
  });
  return Object.fromEntries(entries);
}

/**
 * My changes laid on top of theirs: a field that I left as opened takes their value, one that I changed
 * keeps mine. Lists whose length did not change are merged item by item; otherwise my list stands.
 */
export function onTop(
  opened: DraftValue | undefined,
  mine: DraftValue | undefined,
  theirs: DraftValue | undefined,
  path = "",
): DraftValue | undefined {
  const field = fieldOf(path);
  if (sameDraft(opened, mine, field)) return theirs;
  if (sameDraft(opened, theirs, field) || mine === undefined || theirs === undefined) return mine;
  if (isDraftObject(mine) && isDraftObject(theirs)) return mergedObject(opened, mine, theirs, path);
  if (
    isDraftList(mine) &&
    isDraftList(theirs) &&
    isDraftList(opened) &&
    isBranch(mine) &&
    mine.length === theirs.length &&
    mine.length === opened.length
  ) {
    return mine.map((item, index) => onTop(opened[index], item, theirs[index], `${path}.${index}`) ?? item);
  }
  return mine;
}
