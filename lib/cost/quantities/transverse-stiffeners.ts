import { pairsOfMeasure, type MeasureCase } from "@/lib/calc";
import { clearDepthMm } from "./column-piece";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";
import { weldEdges } from "./stiffener-welds";

type Measure = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;

/**
 * The measure's pairs of plates. A full-depth pair reaches from flange to flange and may serve both beams, sloping
 * where their flanges are a little apart; partial ones start at the flange of each joint.
 */
export function takeTransverseStiffeners(
  take: QuantityTake,
  context: MeasureContext,
  measure: Measure,
): void {
  const { column, joints } = context;
  const clearMm = clearDepthMm(column);
  const isFull = measure.length === "full" || measure.length >= clearMm;
  const pairs = pairsOfMeasure(column, joints, isFull ? { ...measure, length: "full" } : measure);
  const slopedMm = pairs.reduce((sum, { slopeCosine }) => sum + clearMm / slopeCosine, 0);
  const lengthMm = isFull ? slopedMm / pairs.length : Math.min(Number(measure.length), clearMm);
  const parts = 2 * pairs.length;
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
