import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import { cleatShapes } from "./cleat-shapes";
import { describeNode } from "./describe-node";
import { TEXT_PX } from "./dimension-lines";
import type { Dimension, DrawingOptions, DrawingView, Extent, NodeDrawing, Point, Shape } from "./drawing";
import { elevationDimensions } from "./elevation-dimensions";
import { fastenerShapes } from "./fastener-shapes";
import { frameOf } from "./frame";
import { measureShapes } from "./measure-shapes";
import { beamShapes, columnShapes } from "./member-shapes";
import { sectionDimensions, sectionShapes } from "./section-view";
import { cornersOf, extentOf } from "./shapes";

/** 0.6 pixels to the millimetre: a usual node fills a half-width sheet. */
const DEFAULT_MM_PER_PIXEL = 1.6;
const ZIGZAG_PX = 3.4;

/** The room a dimension's text takes, from the usual width of a figure. */
function textCorners({ text, textAt, anchor, rotation }: Dimension, heightMm: number): Point[] {
  const widthMm = text.length * heightMm * 0.6;
  const before = anchor === "start" ? 0 : anchor === "end" ? widthMm : widthMm / 2;
  if (rotation === -90) {
    return [
      { x: textAt.x - heightMm, y: textAt.y - widthMm / 2 },
      { x: textAt.x, y: textAt.y + widthMm / 2 },
    ];
  }
  return [
    { x: textAt.x - before, y: textAt.y - heightMm },
    { x: textAt.x - before + widthMm, y: textAt.y + 0.2 * heightMm },
  ];
}

function extentOfView(shapes: readonly Shape[], dimensions: readonly Dimension[], pixel: number): Extent {
  const points = [
    ...shapes.flatMap(cornersOf),
    ...dimensions.flatMap((dimension) => [
      ...dimension.lines.flat(),
      ...textCorners(dimension, TEXT_PX * pixel),
    ]),
  ];
  const { minX, minY, maxX, maxY } = extentOf(points);
  const margin = 3 * pixel;
  return { minX: minX - margin, minY: minY - margin, maxX: maxX + margin, maxY: maxY + margin };
}

/**
 * Draws a node with the measures of one option, to scale, in mm.
 *
 * Several drawings share a scale when they are made with the same `mmPerPixel` and shown in the
 * common extent of all of them (`commonExtent`).
 */
export function drawNode(
  node: NodeCase,
  measures: readonly MeasureCase[],
  options: DrawingOptions = {},
): NodeDrawing {
  const pixel = options.mmPerPixel ?? DEFAULT_MM_PER_PIXEL;
  const zigzagMm = ZIGZAG_PX * pixel;
  const frame = frameOf(node, measures);
  const level = options.sectionLevel ?? "top";
  const view = (
    name: DrawingView["name"],
    title: string,
    shapes: Shape[],
    dimensions: Dimension[],
  ): DrawingView => ({
    name,
    title,
    shapes,
    dimensions,
    extent: extentOfView(shapes, dimensions, pixel),
    textHeightMm: TEXT_PX * pixel,
  });
  const elevation = [
    ...columnShapes(frame, zigzagMm),
    ...frame.joints.flatMap((placed) => beamShapes(frame, placed, zigzagMm)),
    ...cleatShapes(frame),
    ...measureShapes(frame, measures),
    ...fastenerShapes(frame, measures),
  ];
  return {
    title: options.reference === undefined ? "The node, to scale" : `Node ${options.reference}, to scale`,
    description: describeNode(node, measures),
    mmPerPixel: pixel,
    elevation: view("elevation", "Elevation", elevation, elevationDimensions(node, frame, options, pixel)),
    section: view(
      "section",
      `Section at the beams' ${level} flange`,
      sectionShapes(frame, measures, level, zigzagMm),
      sectionDimensions(frame, options, pixel),
    ),
  };
}
