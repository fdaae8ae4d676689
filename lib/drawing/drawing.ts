import type { Level, Side } from "@/lib/calc/node";

/**
 * The drawing of a node as data: shapes and dimensions in millimetres of steel, x to the right from
 * the column's axis, y downwards from the top of the uppermost beam. Every writer (screen, SVG, and
 * the sheet formats beside it) reads this one model, so no two of them can disagree about the node.
 */

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Extent {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

/** Which piece of the node a shape belongs to. */
export type Part =
  | "column"
  | "beam-left"
  | "beam-right"
  | "plate-left"
  | "plate-right"
  | "cleat"
  | "bolt"
  | "weld"
  | "stiffener"
  | "diagonal"
  | "web-plate"
  | "backing-plate"
  | "bar"
  | "nut"
  | "centre-line"
  | "break-line";

/** How a shape is painted; a piece added by an option has a kind of its own, told apart by hatch. */
export type ShapeKind =
  | "web"
  | "cut"
  | "beam"
  | "beam-flange"
  | "plate"
  | "fastener"
  | "shank"
  | "weld"
  | "weld-run"
  | "root"
  | "end"
  | "break"
  | "centre"
  | "stiffener"
  | "added-plate"
  | "added-weld"
  | "bar"
  | "bar-nut";

/** Hatches that tell added pieces apart without colour. */
export type Hatch = "diagonal" | "dashes";

interface ShapeHead {
  readonly part: Part;
  readonly kind: ShapeKind;
  readonly side?: Side;
  readonly level?: Level;
  /** 1 = first in `bolts.rows`. */
  readonly row?: number;
}

export type Shape =
  | (ShapeHead & {
      readonly shape: "rect";
      readonly x: number;
      readonly y: number;
      readonly width: number;
      readonly height: number;
    })
  | (ShapeHead & { readonly shape: "polygon"; readonly points: readonly Point[] })
  | (ShapeHead & { readonly shape: "line"; readonly points: readonly Point[] });

/** A dimension: its lines, its text, and the place in the node document that its value is kept in. */
export interface Dimension {
  readonly id: string;
  /** Path into the node document, such as `left.connection.bolts.rows.0`; null where the drawing cannot change it. */
  readonly edits: string | null;
  /** Path of the catalogue section that gives this dimension: it changes with another section only. */
  readonly chooses?: string;
  /** What is measured, in words. */
  readonly name: string;
  readonly valueMm: number;
  readonly text: string;
  readonly textAt: Point;
  readonly anchor: "start" | "middle" | "end";
  /** Degrees, 0 or -90. */
  readonly rotation: 0 | -90;
  readonly lines: readonly (readonly Point[])[];
}

export interface DrawingView {
  readonly name: "elevation" | "section";
  readonly title: string;
  readonly shapes: readonly Shape[];
  readonly dimensions: readonly Dimension[];
  readonly extent: Extent;
  /** Height of the dimension text, mm of steel. */
  readonly textHeightMm: number;
}

export interface NodeDrawing {
  readonly title: string;
  /** The node and what is added to it, in words, for those who do not see the drawing. */
  readonly description: string;
  /** Model millimetres for one unit of paper (a pixel on the screen): sets sizes of text, ticks and break lines only. */
  readonly mmPerPixel: number;
  readonly elevation: DrawingView;
  readonly section: DrawingView;
}

export interface DrawingOptions {
  /** Millimetres of steel for one pixel; annotations keep their size on paper. */
  readonly mmPerPixel?: number;
  /** `full` for a sheet, `overall` for column and beam depth only, `none`. */
  readonly dimensions?: "full" | "overall" | "none";
  /** The beam flange level at which the section is cut. */
  readonly sectionLevel?: Level;
  /** Sections given by their dimensions: their depth and width can be edited on the drawing. */
  readonly customSections?: { readonly column?: boolean; readonly left?: boolean; readonly right?: boolean };
  /** The node's name on its drawing. */
  readonly reference?: string;
}
