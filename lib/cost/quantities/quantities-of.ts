import type { MeasureCase, NodeCase } from "@/lib/calc";
import type { FabricationCase } from "../estimate";
import { takeBackingPlates } from "./backing-plates";
import { sectionMassKgPerM } from "./column-piece";
import { takeDiagonalStiffeners } from "./diagonal-stiffeners";
import { takeHeavierColumn } from "./heavier-column";
import type { MeasureContext } from "./measure-context";
import { type Quantities, QuantityTake } from "./quantities";
import { takeThroughBars } from "./through-bars";
import { takeTransverseStiffeners } from "./transverse-stiffeners";
import { takeWebPlates } from "./web-plates";

function takeMeasure(take: QuantityTake, context: MeasureContext, measure: MeasureCase): void {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return takeTransverseStiffeners(take, context, measure);
    case "diagonal-stiffeners":
      return takeDiagonalStiffeners(take, context, measure);
    case "web-plates":
      return takeWebPlates(take, context, measure);
    case "backing-plates":
      return takeBackingPlates(take, context, measure);
    case "through-bars":
      return takeThroughBars(take, context, measure);
    case "heavier-column":
      return;
  }
}

/**
 * Everything the measures of an option add to the bare node, from geometry alone, per node.
 * Bolts that bars replace are negative; a heavier column is its share of the lift.
 */
export function quantitiesOf(
  node: NodeCase,
  measures: readonly MeasureCase[],
  fabrication: FabricationCase,
): Quantities {
  const take = new QuantityTake();
  const bare = node.column.section;
  const column = measures.reduce(
    (section, measure) => (measure.kind === "heavier-column" ? measure.section : section),
    bare,
  );
  const pieceMassKg = (sectionMassKgPerM(column) * fabrication.liftLengthMm) / 1000;
  const context: MeasureContext = { column, joints: node.joints, measures, pieceMassKg };
  for (const measure of measures) takeMeasure(take, context, measure);
  if (column !== bare) takeHeavierColumn(take, bare, column, fabrication);
  // A heavier column alone changes a size on a drawing and needs no detail of its own.
  const details = measures.filter((measure) => measure.kind !== "heavier-column").length;
  if (details > 0) take.records.push({ driver: "detail", group: "", values: { details } });
  return {
    records: take.records,
    weldRuns: take.weldRuns,
    facesWelded: take.facesWelded,
    masses: take.masses,
    pieceMassKg,
  };
}
