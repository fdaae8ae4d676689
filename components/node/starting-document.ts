import type { NodeDocument } from "@/lib/schemas/node-document";

/**
 * What a new node starts from: an ordinary interior node that is complete, so that the drawing and the
 * result are there from the first keystroke. Every figure is the designer's to change.
 */
export const STARTING_DOCUMENT: NodeDocument = {
  reference: "New node",
  basis: "EN 1993-1-8:2005",
  partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  column: { section: "HE 300 A", steel: "S355", storeyHeight: 3600 },
  left: {
    beam: { section: "IPE 450", steel: "S355", span: 7500 },
    connection: {
      kind: "end-plate",
      plate: { steel: "S355", thickness: 20, width: 200, extensionTop: 90, extensionBottom: 30 },
      bolts: { size: "M24", grade: "10.9", gauge: 120, rows: [-45, 65, 385] },
      welds: { topFlange: 8, bottomFlange: 6, web: 5 },
    },
  },
  loadCases: [
    {
      name: "ULS 1",
      left: { moment: 150, axialForce: 0, shear: 100 },
      column: { axialForce: 800, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 },
    },
  ],
  frame: { bracing: "unbraced" },
  target: { utilisation: 1, stiffness: "any" },
  quantity: 1,
};
