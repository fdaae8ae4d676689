import type { ISection, Level, MeasureCase, Steel } from "../node";

export type TransverseStiffeners = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;
export type WebPlates = Extract<MeasureCase, { kind: "web-plates" }>;
export type ThroughBars = Extract<MeasureCase, { kind: "through-bars" }>;

/** The column panel as an option leaves it: what every component reads. */
export interface PanelDesign {
  readonly column: { readonly section: ISection; readonly steel: Steel };
  readonly stiffeners: Readonly<Record<Level, TransverseStiffeners | null>>;
  readonly webPlates: WebPlates | null;
  readonly bars: Readonly<Record<Level, ThroughBars | null>>;
}

/** How one kind of measure changes the panel; throws OutsideScope where it may not. */
export type ApplyMeasure<M extends MeasureCase> = (design: PanelDesign, measure: M) => PanelDesign;

/** Throat x sqrt 2; a butt weld has no leg. */
export const weldLegMm = (
  weld: { readonly kind: "butt" } | { readonly kind: "fillet"; readonly throatMm: number },
): number => (weld.kind === "fillet" ? weld.throatMm * Math.SQRT2 : 0);
