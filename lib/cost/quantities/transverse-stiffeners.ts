import type { MeasureCase } from "@/lib/calc";
import { clearDepthMm } from "./column-piece";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";
import { weldEdges } from "./stiffener-welds";

type Measure = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;

/**
 * A pair of plates at each level. Full-depth plates reach from flange to flange; partial ones start
 * at the flange of each joint, so a two-sided node has two pairs a level.
 */
export function takeTransverseStiffeners(
  take: QuantityTake,
  context: MeasureContext,
  measure: Measure,
): void {
  const { column, joints } = context;
  const clearMm = clearDepthMm(column);
  const isFull = measure.length === "full" || measure.length >= clearMm;
  const lengthMm = measure.length === "full" ? clearMm : Math.min(measure.length, clearMm);
  const parts = 2 * measure.levels.length * (isFull ? 1 : joints.length);
  const ends = isFull ? 2 : 1;
  takePlates(take, context.pieceMassKg, {
    partType: "transverse-stiffener",
    parts,
    grade: measure.steel.grade,
    thicknessMm: measure.thicknessMm,
    lengthMm,
    widthMm: measure.widthMm,
    corners: ends,
    clipMm: measure.clipMm,
    overlapMm2: 0,
  });
  weldEdges(take, {
    plateThicknessMm: measure.thicknessMm,
    clearGapMm: clearMm,
    gunAngle: "free",
    weld: measure.webWeld,
    edges: parts,
    edgeLengthMm: lengthMm - ends * measure.clipMm,
    againstMm: column.webThicknessMm,
    on: "web",
  });
  weldEdges(take, {
    plateThicknessMm: measure.thicknessMm,
    clearGapMm: clearMm,
    gunAngle: "free",
    weld: measure.flangeWeld,
    edges: parts * ends,
    edgeLengthMm: measure.widthMm - measure.clipMm,
    againstMm: column.flangeThicknessMm,
    on: "flange",
  });
  take.facesWelded = 2;
}
