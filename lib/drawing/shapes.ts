import type { Level, Side } from "@/lib/calc/node";
import type { Extent, Part, Point, Shape, ShapeKind } from "./drawing";

interface Marks {
  readonly side?: Side;
  readonly level?: Level;
  readonly row?: number;
}

/** A rectangle between two corners given in any order, mm. */
export const rectBetween = (
  part: Part,
  kind: ShapeKind,
  from: Point,
  to: Point,
  marks: Marks = {},
): Shape => ({
  shape: "rect",
  part,
  kind,
  ...marks,
  x: Math.min(from.x, to.x),
  y: Math.min(from.y, to.y),
  width: Math.abs(to.x - from.x),
  height: Math.abs(to.y - from.y),
});

/** A closed outline through the points, mm. */
export const polygon = (part: Part, kind: ShapeKind, points: readonly Point[], marks: Marks = {}): Shape => ({
  shape: "polygon",
  part,
  kind,
  ...marks,
  points,
});

/** An open line through the points, mm. */
export const line = (part: Part, kind: ShapeKind, points: readonly Point[], marks: Marks = {}): Shape => ({
  shape: "line",
  part,
  kind,
  ...marks,
  points,
});

/** The points that bound a shape. */
export const cornersOf = (shape: Shape): readonly Point[] =>
  shape.shape === "rect"
    ? [
        { x: shape.x, y: shape.y },
        { x: shape.x + shape.width, y: shape.y + shape.height },
      ]
    : shape.points;

/** The smallest extent that holds all points. With no points: nothing at the origin. */
export function extentOf(points: readonly Point[]): Extent {
  if (points.length === 0) return { minX: 0, minY: 0, maxX: 0, maxY: 0 };
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { x, y } of points) {
    minX = Math.min(minX, x);
    minY = Math.min(minY, y);
    maxX = Math.max(maxX, x);
    maxY = Math.max(maxY, y);
  }
  return { minX, minY, maxX, maxY };
}

/** The extent that holds all of several drawings: give it to each of them and they share one scale. */
export const commonExtent = (extents: readonly Extent[]): Extent =>
  extentOf(
    extents.flatMap((extent) => [
      { x: extent.minX, y: extent.minY },
      { x: extent.maxX, y: extent.maxY },
    ]),
  );

/**
 * A break line across a piece that goes on: straight with one zigzag in the middle.
 *
 * @param zigzagMm - half height of the zigzag, mm of steel.
 */
export function breakLine(from: Point, to: Point, zigzagMm: number): Shape {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const across = { x: -along.y, y: along.x };
  const place = (distance: number, offset: number): Point => ({
    x: from.x + along.x * distance + across.x * offset,
    y: from.y + along.y * distance + across.y * offset,
  });
  const middle = length / 2;
  return line("break-line", "break", [
    from,
    place(middle - 1.5 * zigzagMm, 0),
    place(middle - 0.75 * zigzagMm, zigzagMm),
    place(middle + 0.75 * zigzagMm, -zigzagMm),
    place(middle + 1.5 * zigzagMm, 0),
    to,
  ]);
}
