import type { MeasureCase } from "@/lib/calc";
import { beamFlangeSpacingMm, clearDepthMm } from "./column-piece";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";
import { weldEdges } from "./stiffener-welds";

type Measure = Extract<MeasureCase, { kind: "diagonal-stiffeners" }>;

/** Plates on one side of the web: how many, and how long each is. */
function platesOnOneSide(
  arrangement: Measure["arrangement"],
  clearMm: number,
  spacingMm: number,
): readonly (readonly [number, number])[] {
  const whole = Math.hypot(clearMm, spacingMm);
  // Where two diagonals cross, one runs through and the other is cut in two; in a K both meet at mid-height of one flange.
  if (arrangement === "cross")
    return [
      [1, whole],
      [2, whole / 2],
    ];
  if (arrangement === "k") return [[2, Math.hypot(clearMm, spacingMm / 2)]];
  return [[1, whole]];
}

/** Diagonals on both sides of the web between the beam flange levels; the ends clear the root radius. */
export function takeDiagonalStiffeners(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  const { column, joints } = context;
  const clearMm = clearDepthMm(column);
  for (const [count, lengthMm] of platesOnOneSide(
    measure.arrangement,
    clearMm,
    beamFlangeSpacingMm(joints),
  )) {
    const parts = 2 * count;
    takePlates(take, context.pieceMassKg, {
      partType: "diagonal-stiffener",
      parts,
      grade: measure.steel.grade,
      thicknessMm: measure.thicknessMm,
      lengthMm,
      widthMm: measure.widthMm,
      corners: 2,
      clipMm: column.rootMm,
      overlapMm2: 0,
    });
    weldEdges(take, {
      weld: measure.weld,
      plateThicknessMm: measure.thicknessMm,
      clearGapMm: clearMm,
      edges: parts,
      edgeLengthMm: lengthMm - 2 * column.rootMm,
      againstMm: column.webThicknessMm,
      on: "web",
      gunAngle: "free",
    });
    // The acute side of a diagonal's end leaves little room for the gun.
    weldEdges(take, {
      weld: measure.weld,
      plateThicknessMm: measure.thicknessMm,
      clearGapMm: clearMm,
      edges: 2 * parts,
      edgeLengthMm: measure.widthMm - column.rootMm,
      againstMm: column.flangeThicknessMm,
      on: "flange",
      gunAngle: "restricted",
    });
  }
  take.facesWelded = 2;
}
