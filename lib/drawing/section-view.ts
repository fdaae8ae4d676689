import type { EndPlateConnection, Level, MeasureCase } from "@/lib/calc/node";
import { cleatPlanDimensions } from "./cleat-dimensions";
import { cleatPlan } from "./cleat-shapes";
import { acrossDimension, sectionEdit, upDimension } from "./dimension-lines";
import type { Dimension, DrawingOptions, Point, Shape } from "./drawing";
import { backingMm, barShapes, boltShapes } from "./fastener-shapes";
import { levelOfRow, type Frame, type PlacedJoint } from "./frame";
import { legMm } from "./member-shapes";
import { breakLine, line, polygon, rectBetween } from "./shapes";

/** Points of the quarter circle of one root, in the corner between web and flange. */
function rootFillet(inner: number, halfWeb: number, radius: number, signX: number, signY: number): Point[] {
  const steps = [0, 1, 2, 3, 4, 5, 6].map((step) => (step * Math.PI) / 12);
  const arc = steps.map((angle) => ({
    x: signX * (inner - radius + radius * Math.sin(angle)),
    y: signY * (halfWeb + radius - radius * Math.cos(angle)),
  }));
  return [...arc, { x: signX * inner, y: signY * halfWeb }];
}

function columnCut(frame: Frame): Shape[] {
  const { column, halfDepthMm: half, innerFaceMm: inner } = frame;
  const halfWeb = column.webThicknessMm / 2;
  const halfWidth = column.widthMm / 2;
  return [
    rectBetween("column", "cut", { x: -inner, y: -halfWeb }, { x: inner, y: halfWeb }),
    ...([-1, 1] as const).map((sign) =>
      rectBetween(
        "column",
        "cut",
        { x: sign * half, y: -halfWidth },
        { x: sign * inner, y: halfWidth },
        { side: sign < 0 ? "left" : "right" },
      ),
    ),
    ...(column.make === "rolled" && column.rootMm > 0
      ? [-1, 1].flatMap((signX) =>
          [-1, 1].map((signY) =>
            polygon("column", "cut", rootFillet(inner, halfWeb, column.rootMm, signX, signY)),
          ),
        )
      : []),
  ];
}

function beamCut(frame: Frame, placed: PlacedJoint, zigzagMm: number): Shape[] {
  const { joint, side, sign, beamStartMm: start } = placed;
  const { widthMm, webThicknessMm } = joint.beam.section;
  const end = sign < 0 ? frame.leftMm : frame.rightMm;
  const { connection } = joint;
  return [
    rectBetween(`beam-${side}`, "beam", { x: start, y: -widthMm / 2 }, { x: end, y: widthMm / 2 }, { side }),
    rectBetween(
      `beam-${side}`,
      "beam-flange",
      { x: start, y: -webThicknessMm / 2 },
      { x: end, y: webThicknessMm / 2 },
      { side },
    ),
    breakLine(
      { x: end, y: -widthMm / 2 - 2.4 * zigzagMm },
      { x: end, y: widthMm / 2 + 2.4 * zigzagMm },
      zigzagMm,
    ),
    ...(connection.kind === "end-plate"
      ? [
          rectBetween(
            `plate-${side}`,
            "plate",
            { x: placed.columnFaceMm, y: -connection.plate.widthMm / 2 },
            { x: start, y: connection.plate.widthMm / 2 },
            { side },
          ),
        ]
      : []),
  ];
}

/** A stiffener seen from above: a plate beside the web with its inner corners clipped past the roots. */
function stiffenerPlan(
  frame: Frame,
  measure: Extract<MeasureCase, { kind: "transverse-stiffeners" }>,
  level: Level,
  plates: Extract<MeasureCase, { kind: "web-plates" }> | undefined,
): Shape[] {
  const inner = frame.innerFaceMm;
  const half = frame.column.webThicknessMm / 2;
  const outer = half + measure.widthMm;
  const spans =
    measure.length === "full"
      ? [{ from: -inner, to: inner, clipTo: true }]
      : frame.joints.map(({ sign }) => ({
          from: sign * inner,
          to: sign * (inner - Number(measure.length)),
          clipTo: false,
        }));
  return spans.flatMap(({ from, to, clipTo }) => {
    const inward = Math.sign(to - from);
    const clip = Math.min(measure.clipMm, measure.widthMm);
    const farClip = clipTo ? clip : 0;
    return [-1, 1].map((signY) => {
      // Where a web plate lies on this side, the stiffener sits on it.
      const near = half + (plates && (plates.sides === 2 || signY < 0) ? plates.thicknessMm : 0);
      return polygon(
        "stiffener",
        "stiffener",
        [
          { x: from + inward * clip, y: signY * near },
          { x: to - inward * farClip, y: signY * near },
          { x: to, y: signY * (near + farClip) },
          { x: to, y: signY * outer },
          { x: from, y: signY * outer },
          { x: from, y: signY * (near + clip) },
        ],
        { level },
      );
    });
  });
}

function addedPlan(frame: Frame, measures: readonly MeasureCase[], level: Level): Shape[] {
  const near = frame.column.webThicknessMm / 2;
  const plates = measures.find((measure) => measure.kind === "web-plates");
  return measures.flatMap((measure) => {
    if (measure.kind === "transverse-stiffeners" && measure.levels.includes(level))
      return stiffenerPlan(frame, measure, level, plates);
    if (measure.kind === "web-plates") {
      const leg = measure.weld.kind === "fillet" ? legMm(measure.weld.throatMm) : 0;
      return (measure.sides === 2 ? [-1, 1] : [-1]).flatMap((signY) => [
        rectBetween(
          "web-plate",
          "added-plate",
          { x: -measure.widthMm / 2, y: signY * near },
          { x: measure.widthMm / 2, y: signY * (near + measure.thicknessMm) },
        ),
        ...[-1, 1].map((signX) => {
          const edge = (signX * measure.widthMm) / 2;
          return polygon("weld", "added-weld", [
            { x: edge, y: signY * near },
            { x: edge + signX * leg, y: signY * near },
            { x: edge, y: signY * (near + Math.min(leg, measure.thicknessMm)) },
          ]);
        }),
      ]);
    }
    if (measure.kind === "backing-plates" && measure.levels.includes(level)) {
      const from = frame.column.widthMm / 2 - measure.widthMm;
      const { at = "both" } = measure;
      const backed = frame.joints.filter(({ side }) => at === "both" || at === side);
      return backed.flatMap(({ sign, side }) =>
        [-1, 1].map((signY) =>
          rectBetween(
            "backing-plate",
            "added-plate",
            { x: sign * frame.innerFaceMm, y: signY * from },
            { x: sign * (frame.innerFaceMm - measure.thicknessMm), y: signY * (frame.column.widthMm / 2) },
            { side, level },
          ),
        ),
      );
    }
    return [];
  });
}

const endPlateOf = (placed: PlacedJoint): EndPlateConnection | null =>
  placed.joint.connection.kind === "end-plate" ? placed.joint.connection : null;

/** Bolts or bars of the row nearest to the level, at their gauge. */
function fastenersPlan(frame: Frame, measures: readonly MeasureCase[], level: Level): Shape[] {
  const innerMm = frame.innerFaceMm - backingMm(measures, level);
  const bars = measures.find((measure) => measure.kind === "through-bars" && measure.levels.includes(level));
  const withRows = frame.joints.filter((placed) =>
    placed.rowsMm.some((rowMm) => levelOfRow(placed, rowMm) === level),
  );
  const gauge = withRows.map((placed) => endPlateOf(placed)?.bolts.gaugeMm ?? 0)[0];
  if (bars?.kind === "through-bars" && gauge !== undefined) {
    const face = (sign: -1 | 1): number =>
      frame.joints.find((placed) => placed.sign === sign && placed.plate)?.beamStartMm ??
      sign * frame.halfDepthMm;
    return [-1, 1].flatMap((signY) =>
      barShapes(bars, { leftOuterMm: face(-1), rightOuterMm: face(1), innerMm }, (signY * gauge) / 2, 1),
    );
  }
  return withRows.flatMap((placed) => {
    const connection = endPlateOf(placed);
    if (!connection) return [];
    return [-1, 1].flatMap((signY) =>
      boltShapes(connection.bolts.size, {
        sign: placed.sign,
        outerMm: placed.beamStartMm,
        innerMm: placed.sign * innerMm,
        yMm: (signY * connection.bolts.gaugeMm) / 2,
        row: 1,
      }),
    );
  });
}

/** The plan through the column at a beam flange level, x as in the elevation, y across the column. */
export function sectionShapes(
  frame: Frame,
  measures: readonly MeasureCase[],
  level: Level,
  zigzagMm: number,
): Shape[] {
  return [
    ...frame.joints.flatMap((placed) => beamCut(frame, placed, zigzagMm)),
    ...cleatPlan(frame),
    ...addedPlan(frame, measures, level),
    ...columnCut(frame),
    ...fastenersPlan(frame, measures, level),
    line("centre-line", "centre", [
      { x: frame.leftMm, y: 0 },
      { x: frame.rightMm, y: 0 },
    ]),
  ];
}

/** Gauge and width of each end plate or cleat, and the thickness of the column's flange. */
export function sectionDimensions(frame: Frame, options: DrawingOptions, pixel: number): Dimension[] {
  if ((options.dimensions ?? "full") !== "full") return [];
  const plates = frame.joints.flatMap((placed) => {
    const connection = endPlateOf(placed);
    if (!connection) return cleatPlanDimensions(frame, placed, pixel);
    const { sign, side } = placed;
    const edge = sign < 0 ? frame.leftMm : frame.rightMm;
    const half = (distance: number) => ({ fromY: -distance / 2, toY: distance / 2 });
    const { gaugeMm, size } = connection.bolts;
    return [
      upDimension(
        {
          id: `${side}.gauge`,
          edits: `${side}.connection.bolts.gauge`,
          name: `${side} bolt gauge`,
          valueMm: gaugeMm,
        },
        {
          ...half(gaugeMm),
          atX: edge + sign * 16 * pixel,
          extendFromX: placed.beamStartMm + sign * (size.headHeightMm * 1.8 + 2 * pixel),
          text: "along",
        },
        pixel,
      ),
      upDimension(
        {
          id: `${side}.plate.width`,
          edits: `${side}.connection.plate.width`,
          name: `${side} end plate width`,
          valueMm: connection.plate.widthMm,
        },
        {
          ...half(connection.plate.widthMm),
          atX: edge + sign * 38 * pixel,
          extendFromX: placed.beamStartMm + sign * 2 * pixel,
          text: "along",
        },
        pixel,
      ),
    ];
  });
  const column = acrossDimension(
    {
      id: "column.flangeThickness",
      ...sectionEdit("column.section", "tf", options.customSections?.column),
      name: "column flange thickness",
      valueMm: frame.column.flangeThicknessMm,
    },
    {
      fromX: frame.innerFaceMm,
      toX: frame.halfDepthMm,
      atY: frame.column.widthMm / 2 + 20 * pixel,
      extendFromY: frame.column.widthMm / 2 + 2 * pixel,
      text: "beyond-right",
    },
    pixel,
  );
  return [...plates, column];
}
