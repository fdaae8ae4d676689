import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import type { EvaluatedOptionDocument } from "@/lib/schemas/result-document";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";

/**
 * Worked examples of SCI/BCSA P398, Joints in Steel Construction: Moment-Resisting Joints to Eurocode 3 (2013),
 * as node documents. P398 states welds by their leg; documents carry throats.
 */
const throat = (legMm: number): number => legMm / Math.SQRT2;
const noForces = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };
const shop = { catalog: loadSeedCatalog(), prices: loadSeedPrices() };

const base = {
  basis: "EN 1993-1-8:2005",
  partialFactors: { gammaM0: 1.0, gammaM1: 1.0, gammaM2: 1.25 },
  frame: { bracing: "unbraced" },
  target: { utilisation: 1, stiffness: "any" },
  quantity: 1,
} as const;

const sideC1 = {
  beam: { section: "UB 533x210x92", steel: "S275", span: 8000 },
  connection: {
    kind: "end-plate" as const,
    plate: { steel: "S275", thickness: 25, width: 250, extensionTop: 90, extensionBottom: 670 - 90 - 533.1 },
    bolts: { size: "M24", grade: "8.8", gauge: 100, rows: [-40, 60, 150] },
    welds: { topFlange: throat(12), bottomFlange: throat(8), web: throat(8) },
  },
};
const beamForces = (moment: number) => ({ moment, axialForce: 0, shear: 100 });

/** Examples C.1 and C.2: UC 254x254x107 with UB 533x210x92 on both sides under equal moments. */
export const nodeC1 = (measures: MeasureInput[] = []): NodeDocument => ({
  ...base,
  reference: "P398 C.1",
  column: { section: "UC 254x254x107", steel: "S275", storeyHeight: 4000 },
  left: sideC1,
  right: sideC1,
  loadCases: [{ name: "equal", left: beamForces(300), right: beamForces(300), column: noForces }],
  options: [{ key: "given", name: "As printed", measures }],
});

/** Example F.1: UB 533x210x82 column with a welded UB 305x165x46 beam on one side. */
export const nodeF1 = (measures: MeasureInput[] = []): NodeDocument => ({
  ...base,
  reference: "P398 F.1",
  column: { section: "UB 533x210x82", steel: "S275", storeyHeight: 4000 },
  left: {
    beam: { section: "UB 305x165x46", steel: "S275", span: 6000 },
    connection: {
      kind: "welded",
      welds: { topFlange: throat(10), bottomFlange: throat(10), web: throat(6) },
    },
  },
  loadCases: [{ name: "one side", left: beamForces(170), column: noForces }],
  options: [{ key: "given", name: "As printed", measures }],
});

/** The one option of a document, which has to be in scope. */
export function evaluatedOption(document: NodeDocument): EvaluatedOptionDocument {
  const evaluated = evaluateDocument(document, shop, { steps: "all" });
  if (!evaluated.ok) throw new Error(JSON.stringify(evaluated.errors));
  const option = evaluated.result.options[0];
  if (!option || "outsideScope" in option) throw new Error(option ? option.outsideScope.reason : "no option");
  return option;
}
