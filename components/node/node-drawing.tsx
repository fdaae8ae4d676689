"use client";

import { useId, useMemo, useRef, useState, type KeyboardEvent } from "react";
import type { Dimension, DrawingView, Extent, NodeDrawing as NodeDrawingModel } from "@/lib/drawing/drawing";
import {
  dimensionLines,
  dimensionTextElement,
  hatchElements,
  layered,
  shapeElement,
  viewBoxOf,
  type SvgOptions,
} from "@/lib/drawing/svg-elements";
import { extentOf } from "@/lib/drawing/shapes";
import { DimensionEditor } from "./dimension-editor";
import { SvgNode } from "./svg-node";

export interface NodeDrawingProps {
  readonly drawing: NodeDrawingModel;
  readonly view?: "elevation" | "section";
  /** The window to show. Give drawings that stand side by side one common extent and they share a scale. */
  readonly extent?: Extent;
  /** Dimensions become buttons that open an input at their place. */
  readonly interactive?: boolean;
  /** Called with the path in the node document and the text as typed. */
  readonly onEdit?: (path: string, text: string) => void;
  /** Called with the path of a catalogue section whose dimension was pressed: it changes with another section only. */
  readonly onChooseSection?: (path: string) => void;
  /** The path whose field has the focus: its dimension is drawn in the accent. */
  readonly activePath?: string | null;
  readonly className?: string;
}

interface PartsProps {
  readonly view: DrawingView;
  readonly options: SvgOptions;
}

/** The steel itself: nothing in it depends on focus, so typing in a dimension does not redraw it. */
function Shapes({ view, options }: PartsProps) {
  return (
    <>
      <SvgNode element={hatchElements(options)} />
      {layered(view.shapes).map((shape, index) => (
        <SvgNode key={index} element={shapeElement(shape, options)} />
      ))}
    </>
  );
}

interface DimensionMarkProps extends PartsProps {
  readonly index: number;
  readonly dimension: Dimension;
  readonly active: boolean;
  readonly onOpen: ((index: number) => void) | null;
  readonly onChooseSection: ((path: string) => void) | null;
}

const BUTTON_TONE =
  "cursor-pointer outline-none [&_text]:fill-petrol [&_text]:font-semibold hover:[&_text]:underline hover:[&_polyline]:stroke-petrol focus-visible:[&_rect:last-of-type]:stroke-petrol focus-visible:[&_rect:last-of-type]:[stroke-width:4]";

/** Room around the text to point at, mm; wide enough for a finger at the sheet's usual scale. */
function hitBox({ text, textAt, anchor, rotation }: Dimension, heightMm: number) {
  const along = Math.max(text.length * heightMm * 0.62, heightMm * 1.4) + heightMm * 0.6;
  const across = heightMm * 1.7;
  const before = anchor === "start" ? heightMm * 0.3 : anchor === "end" ? along - heightMm * 0.3 : along / 2;
  return rotation === 0
    ? { x: textAt.x - before, y: textAt.y - heightMm * 1.2, width: along, height: across }
    : { x: textAt.x - heightMm * 1.2, y: textAt.y - along / 2, width: across, height: along };
}

/** The lines of a dimension as an area to point at: a hair line cannot be hit. */
function linesBox({ lines }: Dimension, marginMm: number) {
  const { minX, minY, maxX, maxY } = extentOf(lines.flat());
  return {
    x: minX - marginMm,
    y: minY - marginMm,
    width: maxX - minX + 2 * marginMm,
    height: maxY - minY + 2 * marginMm,
  };
}

/** What a press on a dimension does, and how that is said; null where it changes nothing. */
function pressOf({ index, dimension, onOpen, onChooseSection }: DimensionMarkProps) {
  const { edits, chooses } = dimension;
  if (edits !== null && onOpen) return { words: "change", press: () => onOpen(index) };
  if (chooses !== undefined && onChooseSection)
    return { words: "of the catalogue; choose another section", press: () => onChooseSection(chooses) };
  return null;
}

function DimensionMark(props: DimensionMarkProps) {
  const { view, options, index, dimension, active } = props;
  const text = dimensionTextElement(view, index, options);
  const drawn = (
    <>
      {dimensionLines(view, index, options).map((line, at) => (
        <SvgNode key={at} element={line} />
      ))}
      {text ? <SvgNode element={text} /> : null}
    </>
  );
  const tone = active ? "[&_text]:fill-petrol [&_text]:font-bold [&_polyline]:stroke-petrol" : "";
  const action = pressOf(props);
  if (action === null) return <g className={tone}>{drawn}</g>;
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== "Enter" && event.key !== " ") return;
    event.preventDefault();
    action.press();
  };
  return (
    <g
      role="button"
      tabIndex={0}
      aria-label={`${dimension.name}, ${dimension.text} mm: ${action.words}`}
      data-edits={dimension.edits ?? undefined}
      className={`${tone} ${BUTTON_TONE}`}
      onClick={action.press}
      onKeyDown={onKeyDown}
    >
      <rect {...linesBox(dimension, view.textHeightMm * 0.25)} fill="var(--paper)" fillOpacity={0} />
      <rect {...hitBox(dimension, view.textHeightMm)} fill="var(--paper)" fillOpacity={0} />
      <g pointerEvents="none">{drawn}</g>
    </g>
  );
}

/**
 * The node drawn to scale: an SVG with a title and a description in words. With `interactive`, each
 * dimension that belongs to a field is a button; Enter keeps the new value, Escape drops it, and the
 * focus goes back to the dimension. A size of a catalogue section leads to the choice of that section.
 */
export function NodeDrawing(props: NodeDrawingProps) {
  const { drawing, interactive = false, onEdit, onChooseSection, activePath = null, className } = props;
  const id = useId().replace(/[^A-Za-z0-9]/g, "");
  const view = drawing[props.view ?? "elevation"];
  const extent = props.extent ?? view.extent;
  const [open, setOpen] = useState<number | null>(null);
  const svgRef = useRef<SVGSVGElement>(null);
  const options = useMemo<SvgOptions>(
    () => ({ idPrefix: `d${id}`, mmPerPixel: drawing.mmPerPixel }),
    [id, drawing.mmPerPixel],
  );
  const opened = open === null ? undefined : view.dimensions[open];

  const close = (path: string | null) => {
    setOpen(null);
    if (path !== null) svgRef.current?.querySelector<SVGGElement>(`[data-edits="${path}"]`)?.focus();
  };
  const canEdit = interactive && onEdit !== undefined;
  const labelling = { "aria-labelledby": `${id}t`, "aria-describedby": `${id}d` };
  return (
    <div className={`relative ${className ?? ""}`}>
      <svg
        ref={svgRef}
        viewBox={viewBoxOf(extent)}
        className="block h-auto w-full select-none"
        role={canEdit ? "group" : "img"}
        {...labelling}
      >
        <title id={`${id}t`}>{`${drawing.title}. ${view.title}`}</title>
        <desc id={`${id}d`}>{drawing.description}</desc>
        <Shapes view={view} options={options} />
        {view.dimensions.map((dimension, index) => (
          <DimensionMark
            key={dimension.id}
            view={view}
            options={options}
            index={index}
            dimension={dimension}
            active={activePath !== null && (dimension.edits ?? dimension.chooses) === activePath}
            onOpen={canEdit ? setOpen : null}
            onChooseSection={(interactive && onChooseSection) || null}
          />
        ))}
      </svg>
      {canEdit && opened && opened.edits !== null ? (
        <DimensionEditor
          key={opened.id}
          dimension={opened}
          extent={extent}
          onCommit={(path, text, refocus) => {
            onEdit(path, text);
            close(refocus ? path : null);
          }}
          onCancel={() => close(opened.edits)}
        />
      ) : null}
    </div>
  );
}
