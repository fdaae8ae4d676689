import type { FastenerGrade, FastenerSize, ISection, Steel } from "@/lib/calc/node";

/** What proposals may be made of: the plates, throats, bars and columns at hand. Lengths mm. */
export interface Stock {
  /** Ascending thickness; each with its strength at that thickness. */
  readonly plates: readonly { readonly thicknessMm: number; readonly steel: Steel }[];
  /** Fillet throats, ascending. */
  readonly throatsMm: readonly number[];
  readonly bars: readonly { readonly size: FastenerSize; readonly grade: FastenerGrade }[];
  /** Heavier ones of the column's own family, ascending mass. */
  readonly columns: readonly {
    readonly section: ISection;
    readonly steel: Steel;
    readonly massKgPerM: number;
  }[];
}

export type StockPlate = Stock["plates"][number];
export type StockBar = Stock["bars"][number];
