import type { Weld } from "@/lib/calc";
import { takeBevels } from "./plate-parts";
import type { QuantityTake, RunOn } from "./quantities";

export interface PlateEdge {
  readonly weld: Weld;
  /** Edges of this kind in the node, each of this length. */
  readonly edges: number;
  readonly edgeLengthMm: number;
  readonly plateThicknessMm: number;
  /** The thickest joined part. */
  readonly againstMm: number;
  readonly on: RunOn;
  readonly clearGapMm: number;
  readonly gunAngle: "free" | "restricted";
}

/** Welds plate edges standing on the column: two fillets an edge, or one bevel through the whole thickness. */
export function weldEdges(take: QuantityTake, edge: PlateEdge): void {
  if (edge.edges === 0 || edge.edgeLengthMm <= 0) return;
  const runs = edge.weld.kind === "fillet" ? 2 * edge.edges : edge.edges;
  if (edge.weld.kind === "butt") takeBevels(take, edge.edges, edge.edgeLengthMm, edge.plateThicknessMm);
  take.weld({
    type: edge.weld.kind,
    sizeMm: edge.weld.kind === "fillet" ? edge.weld.throatMm : edge.plateThicknessMm,
    lengthM: (runs * edge.edgeLengthMm) / 1000,
    runs,
    on: edge.on,
    thickestMm: Math.max(edge.plateThicknessMm, edge.againstMm),
    clearGapMm: edge.clearGapMm,
    gunAngle: edge.gunAngle,
  });
}
