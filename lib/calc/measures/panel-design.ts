import type { ISection, Level, MeasureCase, MeasureSides, Side, Steel } from "../node";
import type { StiffenerPair } from "./stiffener-pairs";

export type TransverseStiffeners = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;
export type DiagonalStiffeners = Extract<MeasureCase, { kind: "diagonal-stiffeners" }>;
export type WebPlates = Extract<MeasureCase, { kind: "web-plates" }>;
export type BackingPlates = Extract<MeasureCase, { kind: "backing-plates" }>;
export type ThroughBars = Extract<MeasureCase, { kind: "through-bars" }>;

/** Something at each flange of each beam, or nothing there. */
export type BySideAndLevel<T> = Readonly<Record<Side, Readonly<Record<Level, T | null>>>>;

/** The column panel as an option leaves it: what every component reads. */
export interface PanelDesign {
  readonly column: { readonly section: ISection; readonly steel: Steel };
  readonly stiffeners: BySideAndLevel<TransverseStiffeners>;
  /** The same as pieces: one pair may serve both beams. */
  readonly pairs: readonly StiffenerPair[];
  readonly diagonals: DiagonalStiffeners | null;
  readonly webPlates: WebPlates | null;
  readonly backing: BySideAndLevel<BackingPlates>;
  readonly bars: BySideAndLevel<ThroughBars>;
}

/** Whether bars stand anywhere in the column. */
export const hasBars = ({ bars: { left, right } }: PanelDesign): boolean =>
  (left.top ?? left.bottom ?? right.top ?? right.bottom) !== null;

/** Holes drilled through both flanges at once are at one height, to this tolerance. */
export const SAME_HEIGHT_MM = 0.5;

/** Whether the bars of a level stand in the row at this height, mm below the top of the left beam. */
export const isBarRow = ({ rows }: ThroughBars, heightMm: number): boolean =>
  rows === undefined || rows.heightsMm.some((bar) => Math.abs(bar - heightMm) < SAME_HEIGHT_MM);

/** Nothing at any flange of any beam. */
export const nowhere = <T>(): BySideAndLevel<T> => ({
  left: { top: null, bottom: null },
  right: { top: null, bottom: null },
});

/** The same with one thing put at the named levels of the named sides. */
export function placedAt<T>(
  placed: BySideAndLevel<T>,
  at: MeasureSides,
  levels: readonly Level[],
  thing: T,
): BySideAndLevel<T> {
  const on = (side: Side): Readonly<Record<Level, T | null>> => {
    if (at !== "both" && at !== side) return placed[side];
    return {
      top: levels.includes("top") ? thing : placed[side].top,
      bottom: levels.includes("bottom") ? thing : placed[side].bottom,
    };
  };
  return { left: on("left"), right: on("right") };
}

/** How one kind of measure changes the panel; throws OutsideScope where it may not. */
export type ApplyMeasure<M extends MeasureCase> = (design: PanelDesign, measure: M) => PanelDesign;

/** Throat x sqrt 2; a butt weld has no leg. */
export const weldLegMm = (
  weld: { readonly kind: "butt" } | { readonly kind: "fillet"; readonly throatMm: number },
): number => (weld.kind === "fillet" ? weld.throatMm * Math.SQRT2 : 0);
