import type { DrawingView, Extent, Hatch, Point, Shape } from "./drawing";
import { DIMENSION_PAINT, LAYERS, PAINTS, type Ink, type Paint } from "./paint";

/**
 * The view as SVG elements, still data: the screen makes JSX of them and the file writer makes text,
 * so both show the same drawing. Attributes only: the content security policy allows no style attributes.
 */
export interface SvgElement {
  readonly tag: "g" | "rect" | "polygon" | "polyline" | "text" | "pattern" | "path" | "defs";
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly (SvgElement | string)[];
}

export interface SvgOptions {
  /** Makes pattern ids unique on a page with several drawings. */
  readonly idPrefix: string;
  readonly mmPerPixel: number;
  /** Turns a colour's name into what is written: `var(--ink)` by default. */
  readonly colour?: (ink: Ink) => string;
}

const element = (
  tag: SvgElement["tag"],
  attributes: SvgElement["attributes"],
  children: SvgElement["children"] = [],
): SvgElement => ({ tag, attributes, children });

/** Coordinates to a hundredth of a millimetre: finer cannot be seen, and the text stays short. */
export const coordinate = (value: number): number => {
  const rounded = Math.round(value * 100) / 100;
  return rounded === 0 ? 0 : rounded;
};

const pointList = (points: readonly Point[]): string =>
  points.map(({ x, y }) => `${coordinate(x)},${coordinate(y)}`).join(" ");

const cssColour = (ink: Ink): string => `var(--${ink})`;
const hatchId = (idPrefix: string, hatch: Hatch): string => `${idPrefix}-${hatch}`;

/** `x y width height` of an extent. */
export const viewBoxOf = ({ minX, minY, maxX, maxY }: Extent): string =>
  [minX, minY, maxX - minX, maxY - minY].map(coordinate).join(" ");

function strokeAttributes(paint: Paint, options: SvgOptions): Record<string, string | number> {
  const colour = options.colour ?? cssColour;
  if (paint.stroke === null) return {};
  return {
    stroke: colour(paint.stroke),
    "stroke-width": coordinate(paint.strokeWidth * options.mmPerPixel),
    ...(paint.dash
      ? { "stroke-dasharray": paint.dash.map((length) => coordinate(length * options.mmPerPixel)).join(" ") }
      : {}),
  };
}

function fillOf(paint: Paint, options: SvgOptions): string {
  if (paint.hatch) return `url(#${hatchId(options.idPrefix, paint.hatch)})`;
  return paint.fill === null ? "none" : (options.colour ?? cssColour)(paint.fill);
}

/** One shape of the node. `data-part`, `data-kind` tell writers and tests what it is. */
export function shapeElement(shape: Shape, options: SvgOptions): SvgElement {
  const paint = PAINTS[shape.kind];
  const attributes: Record<string, string | number> = {
    "data-part": shape.part,
    "data-kind": shape.kind,
    fill: shape.shape === "line" ? "none" : fillOf(paint, options),
    ...strokeAttributes(paint, options),
  };
  switch (shape.shape) {
    case "rect":
      return element("rect", {
        ...attributes,
        x: coordinate(shape.x),
        y: coordinate(shape.y),
        width: coordinate(shape.width),
        height: coordinate(shape.height),
      });
    case "polygon":
      return element("polygon", { ...attributes, points: pointList(shape.points) });
    case "line":
      return element("polyline", { ...attributes, points: pointList(shape.points) });
  }
}

/** The two hatches, sized in pixels of paper so that they look alike at every scale. */
export function hatchElements(options: SvgOptions): SvgElement {
  const colour = options.colour ?? cssColour;
  const size = (pixels: number): number => coordinate(pixels * options.mmPerPixel);
  const pattern = (hatch: Hatch, pixels: number, turned: boolean, path: string, width: number): SvgElement =>
    element(
      "pattern",
      {
        id: hatchId(options.idPrefix, hatch),
        width: size(pixels),
        height: size(pixels),
        patternUnits: "userSpaceOnUse",
        ...(turned ? { patternTransform: "rotate(45)" } : {}),
      },
      [
        element("rect", { width: size(pixels), height: size(pixels), fill: colour("sheet") }),
        element("path", { d: path, fill: "none", stroke: colour("added"), "stroke-width": size(width) }),
      ],
    );
  return element("defs", {}, [
    pattern("diagonal", 5, true, `M${size(1.3)} 0V${size(5)}`, 2.2),
    pattern(
      "dashes",
      7,
      false,
      `M${size(1)} ${size(1.5)}h${size(2.6)}M${size(4.5)} ${size(5)}h${size(2.4)}`,
      1.2,
    ),
  ]);
}

/** Shapes in the order they are laid on each other. */
export const layered = (shapes: readonly Shape[]): Shape[] =>
  [...shapes].sort((a, b) => LAYERS.indexOf(a.kind) - LAYERS.indexOf(b.kind));

/** The lines of one dimension. */
export const dimensionLines = (view: DrawingView, index: number, options: SvgOptions): SvgElement[] =>
  (view.dimensions[index]?.lines ?? []).map((points) =>
    element("polyline", {
      fill: "none",
      points: pointList(points),
      ...strokeAttributes(DIMENSION_PAINT, options),
    }),
  );

/** The text of one dimension. */
export function dimensionTextElement(
  view: DrawingView,
  index: number,
  options: SvgOptions,
): SvgElement | null {
  const dimension = view.dimensions[index];
  if (!dimension) return null;
  const { x, y } = { x: coordinate(dimension.textAt.x), y: coordinate(dimension.textAt.y) };
  return element(
    "text",
    {
      x,
      y,
      fill: (options.colour ?? cssColour)("ink"),
      "font-size": coordinate(view.textHeightMm),
      "text-anchor": dimension.anchor,
      ...(dimension.rotation === 0 ? {} : { transform: `rotate(${dimension.rotation} ${x} ${y})` }),
    },
    [dimension.text],
  );
}
