import type { MeasureCase } from "@/lib/calc";
import { clearDepthMm } from "./column-piece";
import type { MeasureContext } from "./measure-context";
import { takeBevels, takePlates } from "./plate-parts";
import type { QuantityTake } from "./quantities";

type Measure = Extract<MeasureCase, { kind: "web-plates" }>;

/**
 * A plate flat on the web, welded all round. With `butt` the two long edges beside the roots are
 * bevelled and welded through; the ends then carry fillets with a leg of the plate's thickness.
 */
export function takeWebPlates(take: QuantityTake, context: MeasureContext, measure: Measure): void {
  const { column } = context;
  const { sides, thicknessMm, widthMm, heightMm } = measure;
  takePlates(take, context.pieceMassKg, {
    partType: "web-plate",
    parts: sides,
    grade: measure.steel.grade,
    thicknessMm,
    lengthMm: heightMm,
    widthMm,
    corners: 0,
    clipMm: 0,
    overlapMm2: widthMm * heightMm,
  });
  const runs = 2 * sides;
  const thickestMm = Math.max(thicknessMm, column.webThicknessMm);
  const clearGapMm = clearDepthMm(column);
  const isButt = measure.weld.kind === "butt";
  const throatMm = measure.weld.kind === "fillet" ? measure.weld.throatMm : thicknessMm / Math.SQRT2;
  if (isButt) takeBevels(take, runs, heightMm, thicknessMm);
  take.weld({
    type: isButt ? "butt" : "fillet",
    sizeMm: isButt ? thicknessMm : throatMm,
    lengthM: (runs * heightMm) / 1000,
    runs,
    on: "web",
    thickestMm,
    clearGapMm,
    // Beside the root the flange is in the way of the gun.
    gunAngle: "restricted",
  });
  take.weld({
    type: "fillet",
    sizeMm: throatMm,
    lengthM: (runs * widthMm) / 1000,
    runs,
    on: "web",
    thickestMm,
    clearGapMm,
    gunAngle: "free",
  });
  take.facesWelded = Math.max(take.facesWelded, sides);
}
