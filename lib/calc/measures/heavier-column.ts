import type { MeasureCase } from "../node";
import type { ApplyMeasure } from "./panel-design";

/** A heavier column in place of the node's own. */
export const applyHeavierColumn: ApplyMeasure<Extract<MeasureCase, { kind: "heavier-column" }>> = (
  design,
  measure,
) => ({
  ...design,
  column: { section: measure.section, steel: measure.steel },
});
