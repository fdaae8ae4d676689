import { applyBackingPlates } from "./backing-plates";
import type { MeasureCase, NodeCase } from "../node";
import { OutsideScope } from "../outcome";
import { applyDiagonalStiffeners } from "./diagonal-stiffeners";
import { applyHeavierColumn } from "./heavier-column";
import { nowhere, type PanelDesign } from "./panel-design";
import { sharedWhereFacing, stiffenerPairsOf } from "./stiffener-pairs";
import { applyThroughBars } from "./through-bars";
import { applyTransverseStiffeners } from "./transverse-stiffeners";
import { applyWebPlates } from "./web-plates";

function apply(design: PanelDesign, measure: MeasureCase): PanelDesign {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return applyTransverseStiffeners(design, measure);
    case "web-plates":
      return applyWebPlates(design, measure);
    case "through-bars":
      return applyThroughBars(design, measure);
    case "heavier-column":
      return applyHeavierColumn(design, measure);
    case "diagonal-stiffeners":
      return applyDiagonalStiffeners(design, measure);
    case "backing-plates":
      return applyBackingPlates(design, measure);
  }
}

function refuseRepeats(measures: readonly MeasureCase[]): void {
  const named = new Set<string>();
  for (const measure of measures) {
    const levels = "levels" in measure ? measure.levels : ["panel"];
    const at = "at" in measure ? (measure.at ?? "both") : "both";
    for (const level of levels) {
      for (const side of at === "both" ? ["left", "right"] : [at]) {
        const key = `${measure.kind} ${level} ${side}`;
        if (named.has(key)) throw new OutsideScope("the same measure is given twice at one level");
        named.add(key);
      }
    }
  }
}

/** Stiffeners as they are cut where a web plate lies under them: narrower by its thickness on either side of the web. */
function fitted(measures: readonly MeasureCase[]): readonly MeasureCase[] {
  const plate = measures.find((measure) => measure.kind === "web-plates");
  if (!plate) return measures;
  return measures.map((measure) =>
    measure.kind === "transverse-stiffeners"
      ? { ...measure, widthMm: measure.widthMm - plate.thicknessMm }
      : measure,
  );
}

/** The column panel as an option leaves it. @throws OutsideScope for a measure or combination not evaluated. */
export function designOf(node: NodeCase, measures: readonly MeasureCase[]): PanelDesign {
  refuseRepeats(measures);
  const bare: PanelDesign = {
    column: node.column,
    stiffeners: nowhere(),
    pairs: [],
    diagonals: null,
    webPlates: null,
    backing: nowhere(),
    bars: nowhere(),
  };
  const applied = fitted(measures).reduce(apply, bare);
  const stiffeners = sharedWhereFacing(node.joints, applied.stiffeners);
  const pairs = stiffenerPairsOf(applied.column.section, node.joints, stiffeners);
  return { ...applied, stiffeners, pairs, bars: sharedWhereFacing(node.joints, applied.bars) };
}
