import type { NodeCase } from "@/lib/calc/node";
import { cleatDimensions } from "./cleat-dimensions";
import {
  acrossDimension,
  dimension,
  sectionEdit,
  spreadLabels,
  TEXT_PX,
  upDimension,
} from "./dimension-lines";
import type { Dimension, DrawingOptions } from "./drawing";
import type { Frame, PlacedJoint } from "./frame";

/** Depth of the column, below it. */
function columnDepth(frame: Frame, options: DrawingOptions, pixel: number): Dimension {
  return acrossDimension(
    {
      id: "column.depth",
      ...sectionEdit("column.section", "h", options.customSections?.column),
      name: "column depth",
      valueMm: frame.column.depthMm,
    },
    {
      fromX: -frame.halfDepthMm,
      toX: frame.halfDepthMm,
      atY: frame.bottomMm + 22 * pixel,
      extendFromY: frame.bottomMm + 9 * pixel,
      text: "middle",
    },
    pixel,
  );
}

/** Depth of a beam, outside the piece of it that is shown. */
function beamDepth(
  frame: Frame,
  placed: PlacedJoint,
  options: DrawingOptions,
  outMm: number,
  pixel: number,
): Dimension {
  const edge = placed.sign < 0 ? frame.leftMm : frame.rightMm;
  return upDimension(
    {
      id: `${placed.side}.beam.depth`,
      ...sectionEdit(`${placed.side}.beam.section`, "h", options.customSections?.[placed.side]),
      name: `${placed.side} beam depth`,
      valueMm: placed.joint.beam.section.depthMm,
    },
    {
      fromY: placed.topMm,
      toY: placed.bottomMm,
      atX: edge + placed.sign * outMm,
      extendFromX: edge + placed.sign * 6 * pixel,
      text: "along",
    },
    pixel,
  );
}

/** Each bolt row's distance from the top of the beam, as a level written at the edge of the sheet. */
function rowLevels(frame: Frame, placed: PlacedJoint, pixel: number): Dimension[] {
  const { connection } = placed.joint;
  if (connection.kind !== "end-plate") return [];
  const { sign, side } = placed;
  const edge = sign < 0 ? frame.leftMm : frame.rightMm;
  const labels = spreadLabels(placed.rowsMm, (TEXT_PX + 3) * pixel);
  const start = placed.beamStartMm + sign * (connection.bolts.size.headHeightMm * 1.8 + 2 * pixel);
  return placed.rowsMm.map((rowMm, index) => {
    const labelMm = labels[index] ?? rowMm;
    const out = (distance: number): number => edge + sign * distance * pixel;
    return dimension(
      {
        id: `${side}.row.${index + 1}`,
        edits: `${side}.connection.bolts.rows.${index}`,
        name: `${side} bolt row ${index + 1}, below the top of the beam`,
        valueMm: connection.bolts.rowsMm[index] ?? 0,
      },
      {
        lines: [
          [
            { x: start, y: rowMm },
            { x: out(6), y: rowMm },
            { x: out(13), y: labelMm },
            { x: out(17), y: labelMm },
          ],
        ],
        textAt: { x: out(20), y: labelMm + 0.36 * TEXT_PX * pixel },
        anchor: sign < 0 ? "end" : "start",
        rotation: 0,
      },
    );
  });
}

/** Thickness of the end plate and how far it passes the beam above and below. */
function plateDimensions(placed: PlacedJoint, pixel: number): Dimension[] {
  const { joint, plate, sign, side } = placed;
  if (joint.connection.kind !== "end-plate" || plate === null) return [];
  const path = `${side}.connection.plate`;
  const [fromX, toX] =
    sign < 0 ? [placed.beamStartMm, placed.columnFaceMm] : [placed.columnFaceMm, placed.beamStartMm];
  const atX = placed.beamStartMm + sign * 26 * pixel;
  const extendFromX = placed.beamStartMm + sign * 2 * pixel;
  const { thicknessMm, extensionTopMm, extensionBottomMm } = joint.connection.plate;
  return [
    acrossDimension(
      {
        id: `${side}.plate.thickness`,
        edits: `${path}.thickness`,
        name: `${side} end plate thickness`,
        valueMm: thicknessMm,
      },
      {
        fromX,
        toX,
        atY: plate.topMm - 34 * pixel,
        extendFromY: plate.topMm - 2 * pixel,
        text: sign < 0 ? "beyond-left" : "beyond-right",
      },
      pixel,
    ),
    upDimension(
      {
        id: `${side}.plate.extensionTop`,
        edits: `${path}.extensionTop`,
        name: `${side} end plate, past the beam's top`,
        valueMm: extensionTopMm,
      },
      { fromY: plate.topMm, toY: placed.topMm, atX, extendFromX, text: "above" },
      pixel,
    ),
    upDimension(
      {
        id: `${side}.plate.extensionBottom`,
        edits: `${path}.extensionBottom`,
        name: `${side} end plate, past the beam's bottom`,
        valueMm: extensionBottomMm,
      },
      { fromY: placed.bottomMm, toY: plate.bottomMm, atX, extendFromX, text: "below" },
      pixel,
    ),
  ];
}

/** Distance from the beams to the column's end; to the break line where the end lies off the sheet. */
function endDistances(node: NodeCase, frame: Frame, pixel: number): Dimension[] {
  const sign = frame.joints.some((joint) => joint.sign < 0) ? -1 : 1;
  const atX = sign * (frame.halfDepthMm + 74 * pixel);
  const extendFromX = sign * (frame.halfDepthMm + 8 * pixel);
  const { endDistanceAboveMm: above, endDistanceBelowMm: below } = node.column;
  const highest = Math.min(...frame.joints.map((joint) => joint.topMm));
  const lowest = Math.max(...frame.joints.map((joint) => joint.bottomMm));
  const laid = (fromY: number, toY: number) => ({ fromY, toY, atX, extendFromX, text: "outside" }) as const;
  return [
    ...(above === null
      ? []
      : [
          upDimension(
            {
              id: "column.endAbove",
              edits: "column.endDistanceAbove",
              name: "from the beam's top to the column's upper end",
              valueMm: above,
            },
            laid(frame.topMm, highest),
            pixel,
          ),
        ]),
    ...(below === null
      ? []
      : [
          upDimension(
            {
              id: "column.endBelow",
              edits: "column.endDistanceBelow",
              name: "from the beam's bottom to the column's lower end",
              valueMm: below,
            },
            laid(lowest, frame.bottomMm),
            pixel,
          ),
        ]),
  ];
}

/** How far the right beam lies below the left one; nothing where they are level. */
function levelOffset(frame: Frame, pixel: number): Dimension[] {
  const right = frame.joints.find((joint) => joint.side === "right");
  if (!right || Math.abs(right.topMm) < 0.5 || frame.joints.length < 2) return [];
  const [fromY, toY] = [Math.min(0, right.topMm), Math.max(0, right.topMm)];
  return [
    upDimension(
      {
        id: "right.levelOffset",
        edits: "right.levelOffset",
        name: "right beam below the left beam",
        valueMm: right.topMm,
      },
      {
        fromY,
        toY,
        atX: frame.halfDepthMm + 112 * pixel,
        extendFromX: frame.halfDepthMm + 40 * pixel,
        text: "outside",
      },
      pixel,
    ),
  ];
}

/** All dimensions of the elevation. Those of a compact drawing are the two depths only. */
export function elevationDimensions(
  node: NodeCase,
  frame: Frame,
  options: DrawingOptions,
  pixel: number,
): Dimension[] {
  const wanted = options.dimensions ?? "full";
  if (wanted === "none") return [];
  if (wanted === "overall") {
    const first = frame.joints[0];
    return [
      columnDepth(frame, options, pixel),
      ...(first ? [beamDepth(frame, first, options, 12 * pixel, pixel)] : []),
    ];
  }
  return [
    ...endDistances(node, frame, pixel),
    ...levelOffset(frame, pixel),
    ...frame.joints.flatMap((placed) => [
      // Rows first: where a leader crosses a dimension of the plate, the dimension is the one to point at.
      ...rowLevels(frame, placed, pixel),
      ...plateDimensions(placed, pixel),
      ...cleatDimensions(placed, pixel),
      beamDepth(frame, placed, options, (placed.rowsMm.length > 0 ? 58 : 20) * pixel, pixel),
    ]),
    columnDepth(frame, options, pixel),
  ];
}
