import type { AngleRow, Catalog, SectionRow } from "./catalog";

/** Capitals, no blanks, one sign for "by" and for the decimal point: how designations are compared. */
const squeezed = (name: string): string =>
  name
    .toUpperCase()
    .replace(/[\s_-]+/g, "")
    .replace(/[×*]/g, "X")
    .replace(/,/g, ".");

/**
 * The one spelling under which a rolled I-section is filed: "HEA300", "HE 300A" and "he a 300" are one section, so are
 * "UC 254x254x107", "254x254x107 UC" and "UKC254x254x107". Size triples without letters keep no family.
 */
export function sectionKey(name: string): string {
  const text = squeezed(name);
  const wide = /^HE([ABM])(\d+)$/.exec(text) ?? /^HE(\d+)([ABM])$/.exec(text);
  if (wide) {
    const letter = /[ABM]/.test(wide[1] ?? "") ? wide[1] : wide[2];
    const size = letter === wide[1] ? wide[2] : wide[1];
    return `HE${size}${letter}`;
  }
  const narrow = /^IPE([AO]?)(\d+)([AO]?)$/.exec(text);
  if (narrow) return `IPE${narrow[1] ?? ""}${narrow[3] ?? ""}${narrow[2] ?? ""}`;
  const british = /^(UK?[BC])?([\d.]+X[\d.]+X[\d.]+)(UK?[BC])?$/.exec(text);
  if (british) return `${(british[1] ?? british[3] ?? "").replace("K", "")}${british[2] ?? ""}`;
  return text;
}

/** Filing an angle: "L 100x100x10", "100x100x10 L" and "L100x10" are one. */
export function angleKey(name: string): string {
  const text = squeezed(name).replace(/^(RSA|L)|(RSA|L)$/g, "");
  const [first, second, third] = text.split("X");
  return third === undefined
    ? `L${first ?? ""}X${first ?? ""}X${second ?? ""}`
    : `L${first ?? ""}X${second ?? ""}X${third}`;
}

interface SectionIndex {
  readonly byKey: ReadonlyMap<string, SectionRow>;
  /** Null where two families share the sizes. */
  readonly bySizes: ReadonlyMap<string, SectionRow | null>;
}

// Filing 350 names for every look-up would cost more than the look-up; the rows of a catalogue never change.
const filed = new WeakMap<Catalog["sections"], SectionIndex>();

function indexOf(sections: Catalog["sections"]): SectionIndex {
  const known = filed.get(sections);
  if (known) return known;
  const byKey = new Map<string, SectionRow>();
  const bySizes = new Map<string, SectionRow | null>();
  for (const row of sections) {
    const key = sectionKey(row.designation);
    byKey.set(key, row);
    const sizes = key.replace(/^U[BC]/, "");
    if (sizes !== key) bySizes.set(sizes, bySizes.has(sizes) ? null : row);
  }
  const index = { byKey, bySizes };
  filed.set(sections, index);
  return index;
}

/** The row of a designation in any usual spelling; null if the catalogue has none, or if it could mean two. */
export function findSection(catalog: Catalog, name: string): SectionRow | null {
  const index = indexOf(catalog.sections);
  const key = sectionKey(name);
  return index.byKey.get(key) ?? index.bySizes.get(key) ?? null;
}

/** The row of an angle in any usual spelling; null if the catalogue has none. */
export function findAngle(catalog: Catalog, name: string): AngleRow | null {
  const key = angleKey(name);
  const turned = key.replace(/^L([\d.]+)X([\d.]+)X/, "L$2X$1X");
  return (
    catalog.angles.find((row) => angleKey(row.designation) === key || angleKey(row.designation) === turned) ??
    null
  );
}
