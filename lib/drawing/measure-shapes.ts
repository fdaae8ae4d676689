import type { Level, MeasureCase, Side, Weld } from "@/lib/calc/node";
import type { Point, Shape } from "./drawing";
import { flangeHeightsMm, type Frame } from "./frame";
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

/** Spans between the column flanges: the whole width, or a length from each flange that a beam is on. */
function stiffenerSpans(
  frame: Frame,
  length: "full" | number,
): { from: number; to: number; welded: number[] }[] {
  const inner = frame.innerFaceMm;
  if (length === "full") return [{ from: -inner, to: inner, welded: [-inner, inner] }];
  return frame.joints.map(({ sign }) => ({
    from: sign * inner,
    to: sign * (inner - length),
    welded: [sign * inner],
  }));
}

function transverse(frame: Frame, measure: Of<"transverse-stiffeners">): Shape[] {
  const half = measure.thicknessMm / 2;
  return measure.levels.flatMap((level) =>
    flangeHeightsMm(frame, level).flatMap((yMm) =>
      stiffenerSpans(frame, measure.length).flatMap(({ from, to, welded }) => [
        rectBetween(
          "stiffener",
          "stiffener",
          { x: from, y: yMm - half },
          { x: to, y: yMm + half },
          { level },
        ),
        ...welded.flatMap((faceMm) =>
          endFillets(measure.flangeWeld, faceMm, yMm, measure.thicknessMm, level),
        ),
      ]),
    ),
  );
}

/** A strip of plate of the given thickness along a line, cut off at both flange faces by vertical lines. */
function strip(from: Point, to: Point, thicknessMm: number): Shape {
  const rise = (thicknessMm / 2) * Math.hypot(1, (to.y - from.y) / (to.x - from.x));
  return polygon("diagonal", "stiffener", [
    { x: from.x, y: from.y - rise },
    { x: to.x, y: to.y - rise },
    { x: to.x, y: to.y + rise },
    { x: from.x, y: from.y + rise },
  ]);
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
  if (measure.arrangement === "single") return [strip(...ends(measure.towards), measure.thicknessMm)];
  if (measure.arrangement === "cross") {
    return [strip(...ends(measure.towards), measure.thicknessMm), strip(...ends(other), measure.thicknessMm)];
  }
  const sign = measure.towards === "left" ? -1 : 1;
  const meeting = { x: -sign * inner, y: (top + bottom) / 2 };
  return [
    strip({ x: sign * inner, y: top }, meeting, measure.thicknessMm),
    strip({ x: sign * inner, y: bottom }, meeting, measure.thicknessMm),
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
    frame.joints.flatMap(({ sign, side, joint, topMm, bottomMm }) => {
      const tf = joint.beam.section.flangeThicknessMm;
      const yMm = level === "top" ? topMm + tf / 2 : bottomMm - tf / 2;
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
