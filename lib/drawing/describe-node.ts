import type { JointCase, MeasureCase, NodeCase } from "@/lib/calc/node";
import { columnInForce } from "./frame";

const round = (value: number): string => String(Math.round(value * 10) / 10);
const levelWords = (levels: readonly string[]): string =>
  levels.length === 2 ? "top and bottom" : (levels[0] ?? "");

function connectionWords({ connection }: JointCase): string {
  if (connection.kind === "welded") return "welded";
  if (connection.kind === "flange-cleats") {
    const { cleat, beamBolts, webCleats } = connection;
    const legs = `${round(cleat.beamLegMm)} by ${round(cleat.columnLegMm)} by ${round(cleat.thicknessMm)}`;
    return `flange cleats ${legs}, ${round(cleat.lengthMm)} long, ${beamBolts.size.name} at ${beamBolts.rowsMm.map(round).join(", ")} mm from the heel${webCleats ? ", with web cleats" : ""}`;
  }
  const { plate, bolts } = connection;
  return `end plate ${round(plate.thicknessMm)} by ${round(plate.widthMm)}, ${bolts.rowsMm.length} rows of ${bolts.perRow} ${bolts.size.name} ${bolts.grade.name} at ${bolts.rowsMm.map(round).join(", ")} mm below the top of the beam`;
}

/** What one measure adds, in words. */
export function measureWords(measure: MeasureCase): string {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return `a pair of ${measure.length === "full" ? "full-depth" : `${round(measure.length)} mm long`} stiffeners ${round(measure.widthMm)} by ${round(measure.thicknessMm)} at ${levelWords(measure.levels)}`;
    case "diagonal-stiffeners":
      return `diagonal stiffeners ${round(measure.widthMm)} by ${round(measure.thicknessMm)}, ${measure.arrangement}`;
    case "web-plates":
      return `a web plate ${round(measure.widthMm)} by ${round(measure.heightMm)} by ${round(measure.thicknessMm)} on ${measure.sides === 2 ? "both sides" : "one side"}`;
    case "backing-plates":
      return `backing plates ${round(measure.lengthMm)} by ${round(measure.widthMm)} by ${round(measure.thicknessMm)} at ${levelWords(measure.levels)}`;
    case "through-bars":
      return `${measure.size.name} ${measure.grade.name} threaded bars through both flanges at ${levelWords(measure.levels)}, ${measure.innerNuts ? "with" : "without"} inner nuts`;
    case "heavier-column":
      return `the column changed to ${measure.section.designation}`;
  }
}

/** The drawing in words: column, beams, connections, what is added. Lengths in mm. */
export function describeNode(node: NodeCase, measures: readonly MeasureCase[]): string {
  const column = columnInForce(node, measures);
  const beams = node.joints.map(
    (joint) => `on the ${joint.side} ${joint.beam.section.designation}, ${connectionWords(joint)}`,
  );
  const added =
    measures.length === 0
      ? "Nothing is added to the column."
      : `Added: ${measures.map(measureWords).join("; ")}.`;
  return `Elevation of the column ${column.designation}, ${round(column.depthMm)} mm deep; ${beams.join("; ")}. ${added}`;
}
