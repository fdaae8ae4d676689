import { defineFormula } from "../../trace/define-formula";
import { from, id } from "./source";

const betaText = ["β", "1"] as const;

/** Plastic shear resistance of the column web panel, N. 6.2.6.1(2), Eq. (6.7). */
export const panelShearN = defineFormula({
  id: id("6.2.6.1/V_wp,Rd"),
  source: from("6.2.6.1(2), Eq. (6.7)"),
  symbols: {
    shearAreaMm2: ["A_vc", "mm2"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    webDepthMm: ["d_c", "mm"],
    webThicknessMm: ["t_wc", "mm"],
    epsilon: ["ε", "1"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["V_wp,Rd", "N"],
  expression: "0.9 * yieldMpa * shearAreaMm2 / (sqrt(3) * gammaM0)",
  limitBroken: (g) =>
    g.webDepthMm / g.webThicknessMm > 69 * g.epsilon
      ? "the column web is more slender than d_c / t_wc = 69 ε (6.2.6.1(1))"
      : null,
  evaluate: (g) => (0.9 * g.yieldMpa * g.shearAreaMm2) / (Math.sqrt(3) * g.gammaM0),
  // P398 (2013), example F.1, gives 779 kN for UB 533x210x82 S275 (A_vc = 5450 mm2 to 3 figures).
  example: {
    given: {
      shearAreaMm2: 5452,
      yieldMpa: 275,
      webDepthMm: 476.5,
      webThicknessMm: 9.6,
      epsilon: 0.924,
      gammaM0: 1,
    },
    gives: 779_000,
    relTol: 1e-3,
  },
});

/** Shear area with a supplementary web plate, mm2: b_s t_wc once, whatever the plate's thickness and number. 6.2.6.1(6). */
export const enlargedShearAreaMm2 = defineFormula({
  id: id("6.2.6.1/A_vc with web plate"),
  source: from("6.2.6.1(6)"),
  symbols: { shearAreaMm2: ["A_vc", "mm2"], plateWidthMm: ["b_s", "mm"], webThicknessMm: ["t_wc", "mm"] },
  result: ["A_vc", "mm2"],
  expression: "shearAreaMm2 + plateWidthMm * webThicknessMm",
  evaluate: (g) => g.shearAreaMm2 + g.plateWidthMm * g.webThicknessMm,
  example: {
    given: { shearAreaMm2: 3000, plateWidthMm: 200, webThicknessMm: 10 },
    gives: 5000,
    relTol: 1e-12,
  },
});

/** What a frame of column flanges and stiffeners adds to the panel's shear resistance, N. 6.2.6.1(4), Eq. (6.8). */
export const panelFrameShearN = defineFormula({
  id: id("6.2.6.1/V_wp,add,Rd"),
  source: from("6.2.6.1(4), Eq. (6.8)"),
  symbols: {
    flangeMomentNmm: ["M_pl,fc,Rd", "Nmm"],
    stiffenerMomentNmm: ["M_pl,st,Rd", "Nmm"],
    spacingMm: ["d_s", "mm"],
  },
  result: ["V_wp,add,Rd", "N"],
  expression:
    "min(4 * flangeMomentNmm / spacingMm, (2 * flangeMomentNmm + 2 * stiffenerMomentNmm) / spacingMm)",
  evaluate: (g) =>
    Math.min(
      (4 * g.flangeMomentNmm) / g.spacingMm,
      (2 * g.flangeMomentNmm + 2 * g.stiffenerMomentNmm) / g.spacingMm,
    ),
  example: {
    given: { flangeMomentNmm: 4_000_000, stiffenerMomentNmm: 1_000_000, spacingMm: 400 },
    gives: 25_000,
    relTol: 1e-12,
  },
});

/** Shear resistance of panel and frame together, N. 6.2.6.1(4). */
export const stiffenedPanelShearN = defineFormula({
  id: id("6.2.6.1/V_wp,Rd + V_wp,add,Rd"),
  source: from("6.2.6.1(4)"),
  symbols: { panelN: ["V_wp,Rd", "N"], frameN: ["V_wp,add,Rd", "N"] },
  result: ["V_wp,Rd", "N"],
  expression: "panelN + frameN",
  evaluate: (g) => g.panelN + g.frameN,
  example: { given: { panelN: 500_000, frameN: 40_000 }, gives: 540_000, relTol: 1e-12 },
});

/** Reduction of a web strip for shear in the panel. Table 6.3. `stripMm2` = b_eff t_wc. */
export const omegaOf = defineFormula({
  id: id("table-6.3/omega"),
  source: from("Table 6.3"),
  symbols: { beta: betaText, stripMm2: ["b_eff t_wc", "mm2"], shearAreaMm2: ["A_vc", "mm2"] },
  result: ["ω", "1"],
  expression:
    "beta <= 0.5 ? 1 : beta <= 1 ? 1 / sqrt(1 + 1.3 * (stripMm2 / shearAreaMm2)^2) + 2 * (1 - beta) * (1 - 1 / sqrt(1 + 1.3 * (stripMm2 / shearAreaMm2)^2)) : 1 / sqrt(1 + 1.3 * (stripMm2 / shearAreaMm2)^2) + (beta - 1) * (1 / sqrt(1 + 5.2 * (stripMm2 / shearAreaMm2)^2) - 1 / sqrt(1 + 1.3 * (stripMm2 / shearAreaMm2)^2))",
  evaluate: ({ beta, stripMm2, shearAreaMm2 }) => {
    if (beta <= 0.5) return 1;
    const ratio = (stripMm2 / shearAreaMm2) ** 2;
    const one = 1 / Math.sqrt(1 + 1.3 * ratio);
    if (beta <= 1) return one + 2 * (1 - beta) * (1 - one);
    return one + (beta - 1) * (1 / Math.sqrt(1 + 5.2 * ratio) - one);
  },
  example: {
    given: { beta: 2, stripMm2: 1000, shearAreaMm2: 2000 },
    gives: 1 / Math.sqrt(2.3),
    relTol: 1e-12,
  },
});

/** Slenderness of the web strip as a plate. 6.2.6.2(1). */
export const webPlateSlenderness = defineFormula({
  id: id("6.2.6.2/lambda_p"),
  source: from("6.2.6.2(1)"),
  symbols: {
    breadthMm: ["b_eff,c,wc", "mm"],
    webDepthMm: ["d_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    elasticMpa: ["E", "N/mm2"],
    webThicknessMm: ["t_wc", "mm"],
  },
  result: ["λ̄_p", "1"],
  expression: "0.932 * sqrt(breadthMm * webDepthMm * yieldMpa / (elasticMpa * webThicknessMm^2))",
  evaluate: (g) =>
    0.932 *
    Math.sqrt(
      (g.breadthMm * g.webDepthMm * g.yieldMpa) / (g.elasticMpa * g.webThicknessMm * g.webThicknessMm),
    ),
  example: {
    given: { breadthMm: 210, webDepthMm: 100, yieldMpa: 400, elasticMpa: 210_000, webThicknessMm: 2 },
    gives: 0.932 * Math.sqrt(10),
    relTol: 1e-12,
  },
});

/** Reduction for plate buckling of the web. 6.2.6.2(1). */
export const rhoOf = defineFormula({
  id: id("6.2.6.2/rho"),
  source: from("6.2.6.2(1)"),
  symbols: { slenderness: ["λ̄_p", "1"] },
  result: ["ρ", "1"],
  expression: "slenderness <= 0.72 ? 1 : (slenderness - 0.2) / slenderness^2",
  evaluate: ({ slenderness }) =>
    slenderness <= 0.72 ? 1 : (slenderness - 0.2) / (slenderness * slenderness),
  example: { given: { slenderness: 1 }, gives: 0.8, relTol: 1e-12 },
});

/** Largest longitudinal compression in the web at the root, N/mm2, from axial force and moment. 6.2.6.2(2). */
export const webStressMpa = defineFormula({
  id: id("6.2.6.2/sigma_com,Ed"),
  source: from("6.2.6.2(2)"),
  symbols: {
    axialForceN: ["N_Ed", "N"],
    areaMm2: ["A", "mm2"],
    momentNmm: ["|M_Ed|", "Nmm"],
    inertiaMm4: ["I_y", "mm4"],
    webDepthMm: ["d_c", "mm"],
  },
  result: ["σ_com,Ed", "N/mm2"],
  expression: "axialForceN / areaMm2 + momentNmm * webDepthMm / (2 * inertiaMm4)",
  evaluate: (g) => g.axialForceN / g.areaMm2 + (g.momentNmm * g.webDepthMm) / (2 * g.inertiaMm4),
  example: {
    given: { axialForceN: 1_000_000, areaMm2: 10_000, momentNmm: 1e8, inertiaMm4: 2e8, webDepthMm: 200 },
    gives: 150,
    relTol: 1e-12,
  },
});

/** Reduction for longitudinal compression in the column web. 6.2.6.2(2), Eq. (6.14). */
export const kWcOf = defineFormula({
  id: id("6.2.6.2/k_wc"),
  source: from("6.2.6.2(2), Eq. (6.14)"),
  symbols: { stressMpa: ["σ_com,Ed", "N/mm2"], yieldMpa: ["f_y,wc", "N/mm2"] },
  result: ["k_wc", "1"],
  expression: "stressMpa <= 0.7 * yieldMpa ? 1 : 1.7 - stressMpa / yieldMpa",
  limitBroken: (g) =>
    g.stressMpa > g.yieldMpa ? "the column web yields under the column's own axial force and moment" : null,
  evaluate: (g) => (g.stressMpa <= 0.7 * g.yieldMpa ? 1 : 1.7 - g.stressMpa / g.yieldMpa),
  example: { given: { stressMpa: 225, yieldMpa: 250 }, gives: 0.8, relTol: 1e-12 },
});

/** Length of column web under a flange welded to the column, compression or tension, mm. Eq. (6.10) and (6.16). */
export const weldedBreadthMm = defineFormula({
  id: id("6.2.6.2/b_eff welded"),
  source: from("6.2.6.2(1), Eq. (6.10); 6.2.6.3(2), Eq. (6.16)"),
  symbols: {
    beamFlangeMm: ["t_fb", "mm"],
    weldLegMm: ["√2 a_b", "mm"],
    columnFlangeMm: ["t_fc", "mm"],
    rootMm: ["s", "mm"],
  },
  result: ["b_eff", "mm"],
  expression: "beamFlangeMm + 2 * weldLegMm + 5 * (columnFlangeMm + rootMm)",
  evaluate: (g) => g.beamFlangeMm + 2 * g.weldLegMm + 5 * (g.columnFlangeMm + g.rootMm),
  example: {
    given: { beamFlangeMm: 11.8, weldLegMm: 10, columnFlangeMm: 13.2, rootMm: 12.7 },
    gives: 161.3,
    relTol: 1e-9,
  },
});

/** Length of column web in compression behind an end plate, mm. Eq. (6.11). */
export const endPlateBreadthMm = defineFormula({
  id: id("6.2.6.2/b_eff end plate"),
  source: from("6.2.6.2(1), Eq. (6.11)"),
  symbols: {
    beamFlangeMm: ["t_fb", "mm"],
    weldLegMm: ["√2 a_p", "mm"],
    columnFlangeMm: ["t_fc", "mm"],
    rootMm: ["s", "mm"],
    plateSpreadMm: ["s_p", "mm"],
  },
  result: ["b_eff,c,wc", "mm"],
  expression: "beamFlangeMm + 2 * weldLegMm + 5 * (columnFlangeMm + rootMm) + plateSpreadMm",
  evaluate: (g) => g.beamFlangeMm + 2 * g.weldLegMm + 5 * (g.columnFlangeMm + g.rootMm) + g.plateSpreadMm,
  // P398 (2013), example C.1, gives 248 mm.
  example: {
    given: { beamFlangeMm: 15.6, weldLegMm: 8, columnFlangeMm: 20.5, rootMm: 12.7, plateSpreadMm: 50 },
    gives: 248,
    relTol: 2.1e-3,
  },
});

/** Spread through an end plate at 45 degrees on both sides, mm, never less than one thickness. 6.2.6.2(1). */
export const plateSpreadMm = defineFormula({
  id: id("6.2.6.2/s_p"),
  source: from("6.2.6.2(1)"),
  symbols: {
    thicknessMm: ["t_p", "mm"],
    extensionMm: ["plate beyond flange", "mm"],
    weldLegMm: ["√2 a_p", "mm"],
  },
  result: ["s_p", "mm"],
  expression: "thicknessMm + min(thicknessMm, max(extensionMm - weldLegMm, 0))",
  evaluate: (g) => g.thicknessMm + Math.min(g.thicknessMm, Math.max(g.extensionMm - g.weldLegMm, 0)),
  example: { given: { thicknessMm: 20, extensionMm: 18, weldLegMm: 8 }, gives: 30, relTol: 1e-12 },
});

/** Length of web that is there at all where the column ends, mm: half the spread on either side of the flange, cut at the end. */
export const truncatedBreadthMm = defineFormula({
  id: id("6.2.6.2/b_eff at column end"),
  source: from("6.2.6.2(1), cut at the column's end by geometry"),
  symbols: {
    fullMm: ["b_eff", "mm"],
    aboveMm: ["column above flange", "mm"],
    belowMm: ["column below flange", "mm"],
  },
  result: ["b_eff", "mm"],
  expression: "min(fullMm / 2, aboveMm) + min(fullMm / 2, belowMm)",
  evaluate: (g) => Math.min(g.fullMm / 2, g.aboveMm) + Math.min(g.fullMm / 2, g.belowMm),
  example: { given: { fullMm: 200, aboveMm: 60, belowMm: 1000 }, gives: 160, relTol: 1e-12 },
});

/** Column web in transverse compression, yielding, N. Eq. (6.9), first part. */
export const webCrushingN = defineFormula({
  id: id("6.2.6.2/F_c,wc,Rd yielding"),
  source: from("6.2.6.2(1), Eq. (6.9)"),
  symbols: {
    omega: ["ω", "1"],
    kWc: ["k_wc", "1"],
    breadthMm: ["b_eff,c,wc", "mm"],
    thicknessMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_c,wc,Rd", "N"],
  expression: "omega * kWc * breadthMm * thicknessMm * yieldMpa / gammaM0",
  evaluate: (g) => (g.omega * g.kWc * g.breadthMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
  // P398 (2013), example C.1, gives 841 kN.
  example: {
    given: { omega: 1, kWc: 1, breadthMm: 248, thicknessMm: 12.8, yieldMpa: 265, gammaM0: 1 },
    gives: 841_000,
    relTol: 6e-4,
  },
});

/** Column web in transverse compression, buckling, N. Eq. (6.9), second part. */
export const webBucklingN = defineFormula({
  id: id("6.2.6.2/F_c,wc,Rd buckling"),
  source: from("6.2.6.2(1), Eq. (6.9)"),
  symbols: {
    omega: ["ω", "1"],
    kWc: ["k_wc", "1"],
    rho: ["ρ", "1"],
    breadthMm: ["b_eff,c,wc", "mm"],
    thicknessMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    gammaM1: ["γ_M1", "1"],
  },
  result: ["F_c,wc,Rd", "N"],
  expression: "omega * kWc * rho * breadthMm * thicknessMm * yieldMpa / gammaM1",
  evaluate: (g) => (g.omega * g.kWc * g.rho * g.breadthMm * g.thicknessMm * g.yieldMpa) / g.gammaM1,
  example: {
    given: { omega: 1, kWc: 1, rho: 0.5, breadthMm: 200, thicknessMm: 10, yieldMpa: 275, gammaM1: 1.1 },
    gives: 250_000,
    relTol: 1e-12,
  },
});

/** The lesser of yielding and buckling, N. Eq. (6.9). */
export const webCompressionN = defineFormula({
  id: id("6.2.6.2/F_c,wc,Rd"),
  source: from("6.2.6.2(1), Eq. (6.9)"),
  symbols: { yieldingN: ["F_c,wc,Rd yielding", "N"], bucklingN: ["F_c,wc,Rd buckling", "N"] },
  result: ["F_c,wc,Rd", "N"],
  expression: "min(yieldingN, bucklingN)",
  evaluate: (g) => Math.min(g.yieldingN, g.bucklingN),
  example: { given: { yieldingN: 5, bucklingN: 4 }, gives: 4, relTol: 1e-12 },
});

/** Column web in transverse tension, N. Eq. (6.15). */
export const webTensionN = defineFormula({
  id: id("6.2.6.3/F_t,wc,Rd"),
  source: from("6.2.6.3(1), Eq. (6.15)"),
  symbols: {
    omega: ["ω", "1"],
    breadthMm: ["b_eff,t,wc", "mm"],
    thicknessMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_t,wc,Rd", "N"],
  expression: "omega * breadthMm * thicknessMm * yieldMpa / gammaM0",
  evaluate: (g) => (g.omega * g.breadthMm * g.thicknessMm * g.yieldMpa) / g.gammaM0,
  example: {
    given: { omega: 0.9, breadthMm: 200, thicknessMm: 10, yieldMpa: 235, gammaM0: 1 },
    gives: 423_000,
    relTol: 1e-12,
  },
});
