import { pairsOfMeasure, type StiffenerPair } from "@/lib/calc";
import type { Level, MeasureCase, Side, Weld } from "@/lib/calc/node";
import type { Point, Shape } from "./drawing";
import { flangeHeightsMm, levelOfRow, type Frame } from "./frame";
import { legMm } from "./member-shapes";
import { polygon, rectBetween } from "./shapes";

type Of<K extends MeasureCase["kind"]> = Extract<MeasureCase, { kind: K }>;

/** Fillets between the end of a plate and the column flange, as triangles above and below the plate. */
function endFillets(weld: Weld, faceMm: number, yMm: number, thicknessMm: number, level: Level): Shape[] {
  if (weld.kind === "butt") return [];
  const leg = legMm(weld.throatMm);
  const inward = -Math.sign(faceMm);
  return [-1, 1].map((down) => {
    const y = yMm + (down * thicknessMm) / 2;
    return polygon(
      "weld",
      "added-weld",
      [
        { x: faceMm, y },
        { x: faceMm + inward * leg, y },
        { x: faceMm, y: y + down * leg },
      ],
      { level },
    );
  });
}

/** A plate's two ends, left before right, and which of them stand on a flange. */
interface StiffenerSpan {
  readonly from: Point;
  readonly to: Point;
  readonly welded: readonly Point[];
}

/** Middle of a joint's flange at the pair's level, on the sheet. */
function flangeHeightMm(frame: Frame, side: Side, level: Level): number | undefined {
  const placed = frame.joints.find((candidate) => candidate.side === side);
  if (!placed) return undefined;
  const half = placed.joint.beam.section.flangeThicknessMm / 2;
  return level === "top" ? placed.topMm + half : placed.bottomMm - half;
}

/** Spans between the column flanges: the whole width, sloping from beam to beam, or a length from each flange served. */
function stiffenerSpans(frame: Frame, pair: StiffenerPair): StiffenerSpan[] {
  const inner = frame.innerFaceMm;
  const { length } = pair.stiffener;
  const heights = pair.sides.map((side) => flangeHeightMm(frame, side, pair.level) ?? 0);
  const [first = 0, second = first] = heights;
  if (length === "full") {
    const isLevel = pair.slopeCosine === 1;
    const [left, right] = pair.sides[0] === "left" ? [first, second] : [second, first];
    const from = { x: -inner, y: isLevel ? first : left };
    const to = { x: inner, y: isLevel ? first : right };
    return [{ from, to, welded: [from, to] }];
  }
  return pair.sides.map((side, index) => {
    const sign = side === "left" ? -1 : 1;
    const y = heights[index] ?? 0;
    const onFlange = { x: sign * inner, y };
    const free = { x: sign * (inner - length), y };
    return sign < 0
      ? { from: onFlange, to: free, welded: [onFlange] }
      : { from: free, to: onFlange, welded: [onFlange] };
  });
}

function transverse(frame: Frame, measure: Of<"transverse-stiffeners">): Shape[] {
  const half = measure.thicknessMm / 2;
  const joints = frame.joints.map(({ joint }) => joint);
  return pairsOfMeasure(frame.column, joints, measure).flatMap((pair) => {
    const { level } = pair;
    return stiffenerSpans(frame, pair).flatMap(({ from, to, welded }) => [
      from.y === to.y
        ? rectBetween(
            "stiffener",
            "stiffener",
            { x: from.x, y: from.y - half },
            { x: to.x, y: to.y + half },
            { level },
          )
        : strip("stiffener", from, to, measure.thicknessMm, { level }),
      ...welded.flatMap(({ x, y }) => endFillets(measure.flangeWeld, x, y, measure.thicknessMm, level)),
    ]);
  });
}

/** A strip of plate of the given thickness along a line, cut off at both flange faces by vertical lines. */
function strip(
  kind: "stiffener" | "diagonal",
  from: Point,
  to: Point,
  thicknessMm: number,
  about: { readonly level?: Level } = {},
): Shape {
  const rise = (thicknessMm / 2) * Math.hypot(1, (to.y - from.y) / (to.x - from.x));
  return polygon(
    kind,
    "stiffener",
    [
      { x: from.x, y: from.y - rise },
      { x: to.x, y: to.y - rise },
      { x: to.x, y: to.y + rise },
      { x: from.x, y: from.y + rise },
    ],
    about,
  );
}

function diagonals(frame: Frame, measure: Of<"diagonal-stiffeners">): Shape[] {
  const inner = frame.innerFaceMm;
  const [top = 0] = flangeHeightsMm(frame, "top");
  const [bottom = 0] = flangeHeightsMm(frame, "bottom");
  const ends = (towards: Side): [Point, Point] => {
    const sign = towards === "left" ? -1 : 1;
    return [
      { x: sign * inner, y: top },
      { x: -sign * inner, y: bottom },
    ];
  };
  const other: Side = measure.towards === "left" ? "right" : "left";
  if (measure.arrangement === "single")
    return [strip("diagonal", ...ends(measure.towards), measure.thicknessMm)];
  if (measure.arrangement === "cross") {
    return [
      strip("diagonal", ...ends(measure.towards), measure.thicknessMm),
      strip("diagonal", ...ends(other), measure.thicknessMm),
    ];
  }
  const sign = measure.towards === "left" ? -1 : 1;
  const meeting = { x: -sign * inner, y: (top + bottom) / 2 };
  return [
    strip("diagonal", { x: sign * inner, y: top }, meeting, measure.thicknessMm),
    strip("diagonal", { x: sign * inner, y: bottom }, meeting, measure.thicknessMm),
  ];
}

function webPlate(frame: Frame, measure: Of<"web-plates">): Shape[] {
  const middle =
    (Math.min(...frame.joints.map((joint) => joint.topMm)) +
      Math.max(...frame.joints.map((joint) => joint.bottomMm))) /
    2;
  const from = { x: -measure.widthMm / 2, y: middle - measure.heightMm / 2 };
  const to = { x: measure.widthMm / 2, y: middle + measure.heightMm / 2 };
  const leg = measure.weld.kind === "fillet" ? legMm(measure.weld.throatMm) : 0;
  const around = { x: from.x - leg, y: from.y - leg };
  return [
    ...(leg > 0 ? [rectBetween("weld", "added-weld", around, { x: to.x + leg, y: to.y + leg })] : []),
    rectBetween("web-plate", "added-plate", from, to),
  ];
}

function backing(frame: Frame, measure: Of<"backing-plates">): Shape[] {
  return measure.levels.flatMap((level) =>
    frame.joints.flatMap((placed) => {
      const rows = placed.rowsMm.filter((row) => levelOfRow(placed, row) === level);
      const { sign, side } = placed;
      if (rows.length === 0 || !(measure.at === undefined || measure.at === "both" || measure.at === side))
        return [];
      // As the calculation takes it: evenly about the rows of its level.
      const yMm = (Math.min(...rows) + Math.max(...rows)) / 2;
      const face = sign * frame.innerFaceMm;
      return rectBetween(
        "backing-plate",
        "added-plate",
        { x: face, y: yMm - measure.lengthMm / 2 },
        { x: face - sign * measure.thicknessMm, y: yMm + measure.lengthMm / 2 },
        { side, level },
      );
    }),
  );
}

/** The pieces an option adds, in elevation. Bars come with the bolts they replace; a heavier column is the frame itself. */
export function measureShapes(frame: Frame, measures: readonly MeasureCase[]): Shape[] {
  return measures.flatMap((measure) => {
    switch (measure.kind) {
      case "transverse-stiffeners":
        return transverse(frame, measure);
      case "diagonal-stiffeners":
        return diagonals(frame, measure);
      case "web-plates":
        return webPlate(frame, measure);
      case "backing-plates":
        return backing(frame, measure);
      case "through-bars":
      case "heavier-column":
        return [];
    }
  });
}
