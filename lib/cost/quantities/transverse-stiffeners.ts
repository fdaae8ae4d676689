import { pairsOfMeasure, type MeasureCase } from "@/lib/calc";
import { clearDepthMm } from "./column-piece";
import type { MeasureContext } from "./measure-context";
import { takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";
import { weldEdges } from "./stiffener-welds";

type Measure = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;

/**
 * The measure's pairs of plates. A full-depth pair reaches from flange to flange and may serve both beams, sloping
 * where their flanges are a little apart; partial ones start at the flange of each joint. On a web plate each is narrower by
 * its thickness.
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
  const ends = isFull ? 2 : 1;
  const plates = context.measures.find((other) => other.kind === "web-plates");
  const onPlate = plates ? plates.sides * pairs.length : 0;
  const pieces = [
    { parts: 2 * pairs.length - onPlate, widthMm: measure.widthMm },
    { parts: onPlate, widthMm: measure.widthMm - (plates?.thicknessMm ?? 0) },
  ];
  for (const { parts, widthMm } of pieces) {
    if (parts > 0) takePieces(take, context, measure, { parts, widthMm, lengthMm, ends });
  }
  take.facesWelded = 2;
}

interface Pieces {
  readonly parts: number;
  readonly widthMm: number;
  readonly lengthMm: number;
  /** Ends of a piece that meet a flange. */
  readonly ends: number;
}

function takePieces(
  take: QuantityTake,
  { column, pieceMassKg }: MeasureContext,
  measure: Measure,
  { parts, widthMm, lengthMm, ends }: Pieces,
): void {
  const clearMm = clearDepthMm(column);
  takePlates(take, pieceMassKg, {
    partType: "transverse-stiffener",
    parts,
    grade: measure.steel.grade,
    thicknessMm: measure.thicknessMm,
    lengthMm,
    widthMm,
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
    edgeLengthMm: widthMm - measure.clipMm,
    againstMm: column.flangeThicknessMm,
    on: "flange",
  });
}
