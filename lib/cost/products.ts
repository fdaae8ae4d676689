/** The products a measure adds to or takes from the node, for mass and embodied carbon. */
export const PRODUCTS = ["plate", "section", "threaded-bar", "bolt", "nut", "washer", "weld-metal"] as const;
export type ProductName = (typeof PRODUCTS)[number];

/** Mass by product, kg per node; negative where something is saved. */
export type ProductMasses = Readonly<Record<ProductName, number>>;

/** Density of steel, EN 1991-1-1:2002 Table A.4 prints 77.0 to 78.5 kN/m3; 7850 kg/m3 is the trade's figure. */
const STEEL_KG_PER_MM3 = 7850e-9;

/** Mass of a volume of steel, kg, from mm3. */
export const steelMassKg = (volumeMm3: number): number => STEEL_KG_PER_MM3 * volumeMm3;
