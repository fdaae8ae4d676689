import type { Weld } from "@/lib/calc/node";
import type { Part, Shape } from "./drawing";
import type { Frame, PlacedJoint } from "./frame";
import { breakLine, line, polygon, rectBetween } from "./shapes";

/** Leg of an equal-leg fillet weld, mm: throat times root two. */
export const legMm = (throatMm: number): number => throatMm * Math.SQRT2;

/** The column in elevation: web, both flanges, root lines, its ends or break lines, its axis. */
export function columnShapes(frame: Frame, zigzagMm: number): Shape[] {
  const { halfDepthMm: half, innerFaceMm: inner, topMm, bottomMm, column } = frame;
  const rootMm = inner - column.rootMm;
  const edge = (heightMm: number, isEnd: boolean): Shape =>
    isEnd
      ? line("column", "end", [
          { x: -half, y: heightMm },
          { x: half, y: heightMm },
        ])
      : breakLine(
          { x: -half - 2.4 * zigzagMm, y: heightMm },
          { x: half + 2.4 * zigzagMm, y: heightMm },
          zigzagMm,
        );
  return [
    rectBetween("column", "web", { x: -inner, y: topMm }, { x: inner, y: bottomMm }),
    ...([-1, 1] as const).flatMap((sign) => [
      rectBetween(
        "column",
        "cut",
        { x: sign * half, y: topMm },
        { x: sign * inner, y: bottomMm },
        { side: sign < 0 ? "left" : "right" },
      ),
      line("column", "root", [
        { x: sign * rootMm, y: topMm },
        { x: sign * rootMm, y: bottomMm },
      ]),
    ]),
    edge(topMm, frame.endsAtTop),
    edge(bottomMm, frame.endsAtBottom),
    line("centre-line", "centre", [
      { x: 0, y: topMm - 3 * zigzagMm },
      { x: 0, y: bottomMm + 3 * zigzagMm },
    ]),
  ];
}

/** A fillet as the triangle that it is, or a butt weld as the bevel it fills; `down` = on the lower face of the flange. */
function flangeWeld(
  placed: PlacedJoint,
  weld: Weld,
  outerMm: number,
  thicknessMm: number,
  down: 1 | -1,
): Shape[] {
  const { beamStartMm: x, sign, side } = placed;
  if (weld.kind === "butt") {
    return [
      polygon(
        "weld",
        "weld",
        [
          { x, y: outerMm },
          { x: x + sign * thicknessMm, y: outerMm },
          { x, y: outerMm + down * thicknessMm },
        ],
        { side },
      ),
    ];
  }
  const leg = legMm(weld.throatMm);
  const fillet = (faceMm: number, away: number): Shape =>
    polygon(
      "weld",
      "weld",
      [
        { x, y: faceMm },
        { x: x + sign * leg, y: faceMm },
        { x, y: faceMm + away * leg },
      ],
      { side },
    );
  return [fillet(outerMm, -down), fillet(outerMm + down * thicknessMm, down)];
}

function beamWelds(placed: PlacedJoint): Shape[] {
  const { joint, topMm, bottomMm, beamStartMm: x, sign, side } = placed;
  if (joint.connection.kind === "flange-cleats") return [];
  const { welds } = joint.connection;
  const tf = joint.beam.section.flangeThicknessMm;
  const webLeg =
    welds.web.kind === "fillet" ? legMm(welds.web.throatMm) : joint.beam.section.webThicknessMm / 2;
  return [
    rectBetween(
      "weld",
      "weld-run",
      { x, y: topMm + tf + webLeg },
      { x: x + sign * webLeg, y: bottomMm - tf - webLeg },
      { side },
    ),
    ...flangeWeld(placed, welds.topFlange, topMm, tf, 1),
    ...flangeWeld(placed, welds.bottomFlange, bottomMm, tf, -1),
  ];
}

/** A beam in elevation with its end plate and welds, broken off at the edge of the sheet. */
export function beamShapes(frame: Frame, placed: PlacedJoint, zigzagMm: number): Shape[] {
  const { joint, side, sign, topMm, bottomMm, beamStartMm: start } = placed;
  const part: Part = `beam-${side}`;
  const tf = joint.beam.section.flangeThicknessMm;
  const end = sign < 0 ? frame.leftMm : frame.rightMm;
  return [
    rectBetween(part, "beam", { x: start, y: topMm }, { x: end, y: bottomMm }, { side }),
    rectBetween(
      part,
      "beam-flange",
      { x: start, y: topMm },
      { x: end, y: topMm + tf },
      { side, level: "top" },
    ),
    rectBetween(
      part,
      "beam-flange",
      { x: start, y: bottomMm - tf },
      { x: end, y: bottomMm },
      { side, level: "bottom" },
    ),
    breakLine({ x: end, y: topMm - 2.4 * zigzagMm }, { x: end, y: bottomMm + 2.4 * zigzagMm }, zigzagMm),
    ...(placed.plate
      ? [
          rectBetween(
            `plate-${side}`,
            "plate",
            { x: placed.columnFaceMm, y: placed.plate.topMm },
            { x: start, y: placed.plate.bottomMm },
            { side },
          ),
        ]
      : []),
    ...beamWelds(placed),
  ];
}
