import type { FormulaSource } from "../../trace/trace";

/** A place in EN 1993-1-8:2005 with AC:2009. */
export const from = (ref: string): FormulaSource => ({ document: "EN 1993-1-8", edition: "2005", ref });
export const id = (tail: string): string => `en1993-1-8:2005/${tail}`;
