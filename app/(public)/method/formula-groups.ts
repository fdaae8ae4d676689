import { sourceText } from "@/components/trace/symbol-text";

/** What the method page reads of a formula. */
export interface ListedFormula {
  readonly id: string;
  readonly source: { readonly document: string; readonly edition: string; readonly ref: string };
  readonly symbols: Readonly<Record<string, readonly [symbol: string, unit: string]>>;
  readonly result: readonly [symbol: string, unit: string];
  readonly expression: string;
}

export interface FormulaGroup {
  readonly title: string;
  readonly anchor: string;
  readonly formulas: readonly ListedFormula[];
}

const byNumbers = new Intl.Collator("en", { numeric: true });

/** Formulas by document and edition, each group in the order of its clauses. */
export function formulaGroups(formulas: readonly ListedFormula[]): readonly FormulaGroup[] {
  const titles = [...new Set(formulas.map(({ source }) => sourceText(source)))].sort(byNumbers.compare);
  return titles.map((title) => ({
    title,
    anchor: title.toLowerCase().replace(/[^a-z0-9]+/g, "-"),
    formulas: formulas
      .filter(({ source }) => sourceText(source) === title)
      .sort((a, b) => byNumbers.compare(a.source.ref, b.source.ref) || byNumbers.compare(a.id, b.id)),
  }));
}
