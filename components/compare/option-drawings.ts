import type { MeasureCase, NodeCase } from "@/lib/calc/node";
import type { Catalog } from "@/lib/catalog/catalog";
import { drawNode } from "@/lib/drawing/draw-node";
import type { Extent, NodeDrawing } from "@/lib/drawing/drawing";
import { commonExtent } from "@/lib/drawing/shapes";
import { resolveMeasures } from "@/lib/evaluation/resolve-measures";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { ResultDocument } from "@/lib/schemas/result-document";

export interface OptionDrawings {
  readonly byKey: ReadonlyMap<string, NodeDrawing>;
  /** The window that all of them are shown in, so that they share one scale. */
  readonly extent: Extent;
}

/** Millimetres of steel for a pixel of a column's head. */
const HEAD_MM_PER_PIXEL = 4;

/**
 * Draws every option of a comparison to one scale. The first carries the overall dimensions for all.
 *
 * @returns null where the node's parts are no longer in the catalogue: there is nothing true to draw.
 */
export function drawOptions(result: ResultDocument, catalog: Catalog): OptionDrawings | null {
  const resolved = resolveNodeCase(result.node, catalog);
  if (!resolved.ok) return null;
  const drawn = result.options.flatMap((option, index): [string, NodeDrawing][] => {
    const measures = resolveMeasures(option.measures, result.node, catalog, `options.${index}.measures`);
    return measures.ok
      ? [
          [
            option.key,
            draw(resolved.node, measures.measures, index === 0, `${result.node.reference}, ${option.name}`),
          ],
        ]
      : [];
  });
  if (drawn.length === 0) return null;
  return {
    byKey: new Map(drawn),
    extent: commonExtent(drawn.map(([, drawing]) => drawing.elevation.extent)),
  };
}

const draw = (
  node: NodeCase,
  measures: readonly MeasureCase[],
  isDimensioned: boolean,
  reference: string,
): NodeDrawing =>
  drawNode(node, measures, {
    mmPerPixel: HEAD_MM_PER_PIXEL,
    dimensions: isDimensioned ? "overall" : "none",
    reference,
  });
