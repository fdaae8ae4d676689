import { defineFormula } from "../trace/define-formula";

const guide = (ref: string) => ({ document: "SCI/BCSA P398", edition: "2013", ref }) as const;
const mechanics = (ref: string) =>
  ({ document: "Mechanics of the column panel", edition: "this project", ref }) as const;
const run = ["h_c - 2 t_fc", "mm"] as const;
const rise = ["rise of a diagonal", "mm"] as const;
const cosine = ["cos θ", "1"] as const;
const count = ["diagonals cut by a level", "1"] as const;

/** Length of a diagonal between the column's flanges, mm. */
export const diagonalLengthMm = defineFormula({
  id: "diagonals/length",
  source: mechanics("from the middle of one beam flange to that of the other; half way in a K"),
  symbols: { runMm: run, riseMm: rise },
  result: ["L_d", "mm"],
  expression: "sqrt(runMm^2 + riseMm^2)",
  evaluate: (g) => Math.hypot(g.runMm, g.riseMm),
  example: { given: { runMm: 300, riseMm: 400 }, gives: 500, relTol: 1e-12 },
});

/** Cosine of a diagonal's slope against the level. */
export const diagonalCosine = defineFormula({
  id: "diagonals/cos theta",
  source: mechanics("slope of the diagonal against the level"),
  symbols: { runMm: run, lengthMm: ["L_d", "mm"] },
  result: cosine,
  expression: "runMm / lengthMm",
  evaluate: (g) => g.runMm / g.lengthMm,
  example: { given: { runMm: 300, lengthMm: 500 }, gives: 0.6, relTol: 1e-12 },
});

/** Buckling resistance of a pair of plates out of the web's plane, N. EN 1993-1-1:2005, 6.3.1.1(3), Eq. (6.47). */
export const pairBucklingN = defineFormula({
  id: "en1993-1-1:2005/6.3.1.1/N_b,Rd",
  source: { document: "EN 1993-1-1", edition: "2005", ref: "6.3.1.1(3), Eq. (6.47), of the plates alone" },
  symbols: {
    reduction: ["χ", "1"],
    widthMm: ["b_sg", "mm"],
    thicknessMm: ["t_s", "mm"],
    yieldMpa: ["f_y", "N/mm2"],
    gammaM1: ["γ_M1", "1"],
  },
  result: ["N_b,Rd", "N"],
  expression: "reduction * 2 * widthMm * thicknessMm * yieldMpa / gammaM1",
  evaluate: (g) => (g.reduction * 2 * g.widthMm * g.thicknessMm * g.yieldMpa) / g.gammaM1,
  example: {
    given: { reduction: 0.9, widthMm: 100, thicknessMm: 10, yieldMpa: 275, gammaM1: 1.1 },
    gives: 450_000,
    relTol: 1e-12,
  },
});

/** What a diagonal carries whichever way the panel is sheared, N. */
export const diagonalN = defineFormula({
  id: "diagonals/N_Rd",
  source: mechanics(
    "the lesser of yielding past the corner clips and buckling, tension or compression alike",
  ),
  symbols: { yieldN: ["N_pl,Rd", "N"], bucklingN: ["N_b,Rd", "N"] },
  result: ["N_d,Rd", "N"],
  expression: "min(yieldN, bucklingN)",
  evaluate: (g) => Math.min(g.yieldN, g.bucklingN),
  example: { given: { yieldN: 500_000, bucklingN: 450_000 }, gives: 450_000, relTol: 1e-12 },
});

/**
 * Shear resistance of a panel with diagonals, N: A_sg >= (V_wp,Ed - V_wp,Rd) / (f_y cos theta) turned round. A frame that
 * diagonals hold cannot sway, so of frame and diagonals only the larger counts.
 */
export const bracedPanelShearN = defineFormula({
  id: "p398:2013/step 6D/V_wp,Rd with diagonals",
  source: guide(
    "step 6D, diagonal stiffeners; EN 1993-1-8 6.2.6.1 gives no rule. Frame or diagonals: the larger",
  ),
  symbols: {
    panelN: ["V_wp,Rd", "N"],
    frameN: ["V_wp,add,Rd", "N"],
    count,
    diagonalN: ["N_d,Rd", "N"],
    cosine,
  },
  result: ["V_wp,Rd", "N"],
  expression: "panelN + max(frameN, count * diagonalN * cosine)",
  evaluate: (g) => g.panelN + Math.max(g.frameN, g.count * g.diagonalN * g.cosine),
  example: {
    given: { panelN: 400_000, frameN: 30_000, count: 1, diagonalN: 500_000, cosine: 0.6 },
    gives: 700_000,
    relTol: 1e-12,
  },
});

/** Force in each diagonal once the web has taken what it can, N. */
export const diagonalForceN = defineFormula({
  id: "p398:2013/step 6D/diagonal force",
  source: guide("step 6D, diagonal stiffeners"),
  symbols: { shearN: ["V_wp,Ed", "N"], panelN: ["V_wp,Rd", "N"], count, cosine },
  result: ["N_d,Ed", "N"],
  expression: "max(0, shearN - panelN) / (count * cosine)",
  evaluate: (g) => Math.max(0, g.shearN - g.panelN) / (g.count * g.cosine),
  example: {
    given: { shearN: 700_000, panelN: 400_000, count: 2, cosine: 0.6 },
    gives: 250_000,
    relTol: 1e-12,
  },
});

/** Force for the welds of a diagonal, N: stiff as it is, it may take the whole shear before the web yields. */
export const diagonalWeldForceN = defineFormula({
  id: "diagonals/weld force",
  source: mechanics("the whole panel shear, at most what the diagonal carries"),
  symbols: { shearN: ["V_wp,Ed", "N"], diagonalN: ["N_d,Rd", "N"], count, cosine },
  result: ["F_w,Ed", "N"],
  expression: "min(diagonalN, shearN / (count * cosine))",
  evaluate: (g) => Math.min(g.diagonalN, g.shearN / (g.count * g.cosine)),
  example: {
    given: { shearN: 600_000, diagonalN: 450_000, count: 2, cosine: 0.6 },
    gives: 450_000,
    relTol: 1e-12,
  },
});
