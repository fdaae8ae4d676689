import type { Catalog } from "@/lib/catalog/catalog";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";

type Joint = NonNullable<NodeDocument["left"]>;

/** An IPE 450 with an extended end plate and three rows of M24. */
export function buildSide(overrides: Partial<Joint> = {}): Joint {
  return {
    beam: { section: "IPE 450", steel: "S355", span: 7500 },
    connection: {
      kind: "end-plate",
      plate: { steel: "S355", thickness: 20, width: 200, extensionTop: 90, extensionBottom: 30 },
      bolts: { size: "M24", grade: "10.9", gauge: 120, rows: [-45, 65, 385] },
      welds: { topFlange: 8, bottomFlange: 6, web: 5 },
    },
    ...overrides,
  };
}

/** A one-sided node within the scope of the method: HE 300 A column, beam on the left, one load case. */
export function buildNodeDocument(overrides: Partial<NodeDocument> = {}): NodeDocument {
  return {
    reference: "C4 / level 2",
    basis: "EN 1993-1-8:2005",
    partialFactors: { gammaM0: 1.0, gammaM1: 1.0, gammaM2: 1.25 },
    column: { section: "HE 300 A", steel: "S355", endDistanceAbove: 3000, storeyHeight: 3600 },
    left: buildSide(),
    loadCases: [
      {
        name: "ULS 1",
        left: { moment: 210, axialForce: 0, shear: 140 },
        column: { axialForce: 1100, momentAbove: 40, momentBelow: -38, shearAbove: 12, shearBelow: -12 },
      },
    ],
    frame: { bracing: "unbraced" },
    target: { utilisation: 1.0, stiffness: "any" },
    quantity: 12,
    ...overrides,
  };
}

let seeded: Catalog | undefined;

/** The catalogue of the seed files, read once. */
export function buildCatalog(): Catalog {
  seeded ??= loadSeedCatalog();
  return seeded;
}
