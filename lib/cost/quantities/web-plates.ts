import type { MeasureCase } from "@/lib/calc/node";
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
  const run = { on: "web" as const, thickestMm: Math.max(thicknessMm, column.webThicknessMm), clearGapMm: clearDepthMm(column) };
  const long = { ...run, lengthM: (2 * sides * heightMm) / 1000, runs: 2 * sides, gunAngle: "restricted" as const };
  const endThroatMm = measure.weld.kind === "fillet" ? measure.weld.throatMm : thicknessMm / Math.SQRT2;
  if (measure.weld.kind === "fillet") {
    take.weld({ ...long, type: "fillet", sizeMm: measure.weld.throatMm });
  } else {
    takeBevels(take, 2 * sides, heightMm, thicknessMm);
    take.weld({ ...long, type: "butt", sizeMm: thicknessMm });
  }
  take.weld({ ...run, type: "fillet", sizeMm: endThroatMm, lengthM: (2 * sides * widthMm) / 1000, runs: 2 * sides, gunAngle: "free" });
  take.facesWelded = Math.max(take.facesWelded, sides);
}
