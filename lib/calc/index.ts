/** Front door of the calculation: what everything outside lib/calc may use. */
export { evaluateOption, type EvaluateSettings } from "./evaluate";
export { definedFormulas, type FormulaSpec } from "./trace/define-formula";
export type { FormulaSource, Step } from "./trace/trace";
export type * from "./node";
export * from "./result";
export { sectionProperties, type SectionProperties } from "./mechanics/section-properties";
export { ELASTIC_MODULUS_MPA } from "./clauses/en1993-1-1-2005/members";
export { momentRotationCurve, type CurvePoint } from "./mechanics/moment-rotation";
export { areFacing } from "./mechanics/panel-levels";
export { isBarRow } from "./measures/panel-design";
export { pairsOfMeasure, type StiffenerPair } from "./measures/stiffener-pairs";
export { CUT_THREAD_REDUCTION } from "./components/connection-view";
