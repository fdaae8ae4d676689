"use client";

import { useMemo, useState } from "react";
import type { Level, NodeCase } from "@/lib/calc/node";
import { drawNode } from "@/lib/drawing/draw-node";
import type { Extent } from "@/lib/drawing/drawing";
import { openChoice } from "./faults-list";
import { isDraftObject, textAt, valueAt, type DraftObject } from "./node-draft";
import { NodeDrawing } from "./node-drawing";

export interface SheetDrawingProps {
  readonly node: NodeCase | null;
  readonly draft: DraftObject;
  /** True when the drawing shows an earlier state of the form. */
  readonly isBehind: boolean;
  readonly activePath: string | null;
  readonly onEdit: ((path: string, text: string) => void) | null;
}

/** Millimetres of steel for a pixel: a usual node then fills half a laptop's screen with text at its proper size. */
const SHEET_MM_PER_PIXEL = 1.9;
const WIDTH = "mx-auto max-w-[33rem] wide:max-w-[46rem]";

/** The drawing follows the node alone, and the flags of sections that have no name. */
function useDrawing(node: NodeCase | null, draft: DraftObject, sectionLevel: Level) {
  const reference = textAt(draft, "reference");
  const isCustom = (path: string): boolean => isDraftObject(valueAt(draft, path));
  const [column, left, right] = [
    isCustom("column.section"),
    isCustom("left.beam.section"),
    isCustom("right.beam.section"),
  ];
  return useMemo(
    () =>
      node
        ? drawNode(node, [], {
            reference,
            sectionLevel,
            mmPerPixel: SHEET_MM_PER_PIXEL,
            customSections: { column, left, right },
          })
        : null,
    [node, reference, sectionLevel, column, left, right],
  );
}

/** The window is as wide to both sides of the column: a node with one beam keeps the scale of one with two. */
function evenly({ minX, maxX, minY, maxY }: Extent): Extent {
  const half = Math.max(-minX, maxX);
  return { minX: -half, maxX: half, minY, maxY };
}

const editing = (onEdit: SheetDrawingProps["onEdit"]) =>
  onEdit ? { interactive: true, onEdit, onChooseSection: openChoice } : {};

/** The live elevation of the node sheet. */
export function SheetElevation({ node, draft, isBehind, activePath, onEdit }: SheetDrawingProps) {
  const drawing = useDrawing(node, draft, "top");
  if (drawing === null)
    return (
      <p className="border border-dashed border-rule2 px-4 py-10 text-soft">
        The drawing appears when the sizes are in order.
      </p>
    );
  return (
    <>
      <NodeDrawing
        drawing={drawing}
        extent={evenly(drawing.elevation.extent)}
        activePath={activePath}
        {...editing(onEdit)}
        className={WIDTH}
      />
      <p className="mt-1 flex flex-wrap items-baseline justify-between gap-x-4 text-note text-soft">
        <span>
          {onEdit
            ? "To scale, mm. Press a dimension to change it; that of a catalogue section opens the choice of sections."
            : "To scale, mm."}
        </span>
        {isBehind ? (
          <span className="font-semibold text-tight">◆ Drawn as the sizes last were in order.</span>
        ) : null}
      </p>
    </>
  );
}

/** The live section through the column, at the flange level chosen. */
export function SheetSection({ node, draft, activePath, onEdit }: SheetDrawingProps) {
  const [level, setLevel] = useState<Level>("top");
  const drawing = useDrawing(node, draft, level);
  if (drawing === null) return null;
  return (
    <>
      <div role="group" aria-label="Level of the section" className="flex flex-wrap gap-x-3 text-note">
        <span className="font-[650]">Section at the beams’</span>
        {(["top", "bottom"] as const).map((name) => (
          <button
            key={name}
            type="button"
            aria-pressed={level === name}
            onClick={() => setLevel(name)}
            className={
              level === name ? "border-b-2 border-petrol font-semibold" : "text-soft hover:underline"
            }
          >
            {name} flange
          </button>
        ))}
      </div>
      <NodeDrawing
        drawing={drawing}
        view="section"
        extent={evenly(drawing.section.extent)}
        activePath={activePath}
        {...editing(onEdit)}
        className={`mt-2 ${WIDTH}`}
      />
    </>
  );
}
