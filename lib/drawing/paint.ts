import type { Hatch, ShapeKind } from "./drawing";

/** Names of the sheet's colours: CSS variables on the screen, looked up in a table elsewhere. */
export type Ink =
  | "paper"
  | "sheet"
  | "ink"
  | "soft"
  | "faint"
  | "added"
  | "steel"
  | "steel2"
  | "web"
  | "beam"
  | "plate"
  | "petrol";

export interface Paint {
  readonly fill: Ink | null;
  readonly hatch: Hatch | null;
  readonly stroke: Ink | null;
  /** Pixels of paper. */
  readonly strokeWidth: number;
  /** Pixels of paper. */
  readonly dash: readonly number[] | null;
}

const paint = (
  fill: Ink | null,
  stroke: Ink | null,
  strokeWidth = 0.6,
  more: Partial<Paint> = {},
): Paint => ({
  fill,
  hatch: null,
  stroke,
  strokeWidth,
  dash: null,
  ...more,
});

/** One paint for each kind of shape. Added pieces differ by hatch as well as by colour: bar solid, stiffener diagonal, plate dashed. */
export const PAINTS: Readonly<Record<ShapeKind, Paint>> = {
  web: paint("web", null),
  cut: paint("steel", null),
  beam: paint("beam", "steel2"),
  "beam-flange": paint("steel2", null),
  plate: paint("plate", "ink", 0.6),
  fastener: paint("paper", "ink", 0.6),
  shank: paint("paper", "ink", 0.4),
  weld: paint("ink", null),
  "weld-run": paint("steel2", null),
  root: paint(null, "faint", 0.5),
  end: paint(null, "ink", 1.2),
  break: paint(null, "ink", 0.7),
  centre: paint(null, "faint", 0.6, { dash: [9, 2, 2, 2] }),
  stiffener: paint("sheet", "added", 0.9, { hatch: "diagonal" }),
  "added-plate": paint("sheet", "added", 0.9, { hatch: "dashes" }),
  "added-weld": paint("added", null),
  bar: paint("added", null),
  "bar-nut": paint("paper", "added", 0.9),
};

/** Lines of dimensions and their text. */
export const DIMENSION_PAINT: Paint = paint(null, "soft", 0.6);

/** Order in which kinds are laid on each other, lowest first: an axis never hides a piece, a nut is never hidden by a bar. */
export const LAYERS: readonly ShapeKind[] = [
  "web",
  "beam",
  "beam-flange",
  "root",
  "centre",
  "added-weld",
  "added-plate",
  "stiffener",
  "cut",
  "plate",
  "weld-run",
  "weld",
  "shank",
  "fastener",
  "bar",
  "bar-nut",
  "end",
  "break",
];
