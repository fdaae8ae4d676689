import type { Dimension, Point } from "./drawing";

/** A measured distance before it is laid on the sheet. */
export interface Measured {
  readonly id: string;
  readonly edits: string | null;
  readonly chooses?: string;
  readonly name: string;
  readonly valueMm: number;
}

/** How a size of a section is changed: a section by its dimensions at its own field, one of the catalogue by another section. */
export const sectionEdit = (
  sectionPath: string,
  field: "h" | "tf",
  isCustom: boolean | undefined,
): Pick<Measured, "edits" | "chooses"> =>
  isCustom ? { edits: `${sectionPath}.${field}` } : { edits: null, chooses: sectionPath };

/** A number as it stands on a drawing: at most one decimal, a true minus sign. */
export const dimensionText = (valueMm: number): string => {
  const rounded = Math.round(valueMm * 10) / 10;
  return (rounded < 0 ? "\u2212" : "") + String(Math.abs(rounded));
};

/** Sizes of annotation in pixels of paper. */
export const TEXT_PX = 11;
const TICK_PX = 3.2;
const OVERRUN_PX = 5;
const TEXT_GAP_PX = 5;

/** The oblique stroke of a dimension line where it meets an extension line. */
const tick = ({ x, y }: Point, pixel: number): Point[] => [
  { x: x - TICK_PX * pixel, y: y + TICK_PX * pixel },
  { x: x + TICK_PX * pixel, y: y - TICK_PX * pixel },
];

type Laid = Omit<Dimension, keyof Measured | "text">;

/** Joins what is measured with where it is laid. */
export const dimension = (measured: Measured, laid: Laid): Dimension => ({
  ...measured,
  text: dimensionText(measured.valueMm),
  ...laid,
});

export interface AcrossOptions {
  readonly fromX: number;
  readonly toX: number;
  readonly atY: number;
  /** Heights the extension lines start from. */
  readonly extendFromY: number;
  /** Where the text stands: above the middle, or beyond one end when the distance is short. */
  readonly text: "middle" | "beyond-left" | "beyond-right";
}

/** A horizontal dimension. */
export function acrossDimension(measured: Measured, options: AcrossOptions, pixel: number): Dimension {
  const { fromX, toX, atY, extendFromY, text } = options;
  const over = OVERRUN_PX * pixel;
  const beyond = text === "middle" ? over : 10 * pixel;
  const past = atY < extendFromY ? -over : over;
  const lines = [
    [
      { x: fromX - beyond, y: atY },
      { x: toX + beyond, y: atY },
    ],
    [
      { x: fromX, y: extendFromY },
      { x: fromX, y: atY + past },
    ],
    [
      { x: toX, y: extendFromY },
      { x: toX, y: atY + past },
    ],
    tick({ x: fromX, y: atY }, pixel),
    tick({ x: toX, y: atY }, pixel),
  ];
  const gap = TEXT_GAP_PX * pixel;
  const drop = 0.36 * TEXT_PX * pixel;
  if (text === "beyond-left") {
    return dimension(measured, {
      lines,
      textAt: { x: fromX - beyond - gap, y: atY + drop },
      anchor: "end",
      rotation: 0,
    });
  }
  if (text === "beyond-right") {
    return dimension(measured, {
      lines,
      textAt: { x: toX + beyond + gap, y: atY + drop },
      anchor: "start",
      rotation: 0,
    });
  }
  return dimension(measured, {
    lines,
    textAt: { x: (fromX + toX) / 2, y: atY - 3.5 * pixel },
    anchor: "middle",
    rotation: 0,
  });
}

export interface UpOptions {
  readonly fromY: number;
  readonly toY: number;
  readonly atX: number;
  readonly extendFromX: number;
  /** `along`: turned, beside the line; `above`, `below`: level, past that end; `outside`: level, on the side away from the steel. */
  readonly text: "along" | "above" | "below" | "outside";
}

/** A vertical dimension. */
export function upDimension(measured: Measured, options: UpOptions, pixel: number): Dimension {
  const { fromY, toY, atX, extendFromX, text } = options;
  const over = OVERRUN_PX * pixel;
  const away = atX < extendFromX ? -1 : 1;
  const lines = [
    [
      { x: atX, y: fromY - over },
      { x: atX, y: toY + over },
    ],
    [
      { x: extendFromX, y: fromY },
      { x: atX + away * over, y: fromY },
    ],
    [
      { x: extendFromX, y: toY },
      { x: atX + away * over, y: toY },
    ],
    tick({ x: atX, y: fromY }, pixel),
    tick({ x: atX, y: toY }, pixel),
  ];
  const middle = (fromY + toY) / 2;
  const size = TEXT_PX * pixel;
  switch (text) {
    case "along":
      return dimension(measured, {
        lines,
        textAt: { x: atX - 3.5 * pixel, y: middle },
        anchor: "middle",
        rotation: -90,
      });
    case "above":
      return dimension(measured, {
        lines,
        textAt: { x: atX, y: fromY - over - 3 * pixel },
        anchor: "middle",
        rotation: 0,
      });
    case "below":
      return dimension(measured, {
        lines,
        textAt: { x: atX, y: toY + over + size },
        anchor: "middle",
        rotation: 0,
      });
    case "outside":
      return dimension(measured, {
        lines,
        textAt: { x: atX + away * TEXT_GAP_PX * pixel, y: middle + 0.36 * size },
        anchor: away < 0 ? "end" : "start",
        rotation: 0,
      });
  }
}

/**
 * Heights at which level labels can stand without touching, each as near as can be to where it belongs.
 *
 * @param wantedY - in rising order, mm. @param leastMm - least distance between two labels.
 */
export function spreadLabels(wantedY: readonly number[], leastMm: number): number[] {
  const placed = [...wantedY];
  for (let pass = 0; pass < 40; pass += 1) {
    let moved = false;
    for (let index = 1; index < placed.length; index += 1) {
      const above = placed[index - 1] ?? 0;
      const here = placed[index] ?? 0;
      const lacking = leastMm - (here - above);
      if (lacking > 1e-6) {
        placed[index - 1] = above - lacking / 2;
        placed[index] = here + lacking / 2;
        moved = true;
      }
    }
    if (!moved) break;
  }
  return placed;
}
