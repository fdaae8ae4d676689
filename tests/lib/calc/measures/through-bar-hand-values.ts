/**
 * Bars M20 through an HE 300 A at gauge 140, one flush row 60 mm from the faces of an IPE 400's flanges, worked
 * out by hand from the model's own statement: springs of flange, web and bar, T-stub by Table 6.2.
 */
const E = 210_000;

/** m = (w - t_w)/2 - 0.8 r. */
export const m = (140 - 8.5) / 2 - 0.8 * 27;
export const d_c = 290 - 2 * 14 - 2 * 27;

const k_f = (1.37 * 14 ** 3) / (m ** 2 + 1.4 * 14 ** 2);
const k_w = (8.5 * (2.2 * (14 + 27) + 0.43 * (290 / 2 - 14))) / (d_c / 2);
/** Column at one flange, one row, N/mm. */
export const K_c = E / (1 / k_f + 1 / k_w);
/** L_in = h - 2 t_f - nut height. */
export const L_in = 290 - 2 * 14 - 18;
export const K_b = (2 * E * 245) / L_in;
export const eta = (2 * K_b) / (K_c + 2 * K_b);
/** Balanced forces, r = 1. */
export const R_t = 0.55 * eta;

/** T-stub of the column flange: e = 80 mm, n bounded by the plate's own edge. */
export const l_1 = Math.min(2 * Math.PI * m, 4 * m + 1.25 * 80);
export const l_2 = 4 * m + 1.25 * 80;
export const n = Math.min(80, (220 - 140) / 2, 1.25 * m);
export const M_1 = 0.25 * l_1 * 14 ** 2 * 275;
export const M_2 = 0.25 * l_2 * 14 ** 2 * 275;
/** A quarter of the nut's width across points. */
const e_w = 32.95 / 4;
/** Two bars of 10.9 with cut threads (x 0.85). */
export const sumF_t = (2 * 0.85 * 0.9 * 1000 * 245) / 1.25;
export const F_1 = ((8 * n - 2 * e_w) * M_1) / (2 * m * n - e_w * (m + n));
export const F_2 = (2 * M_2 + n * sumF_t) / (m + n);

/** From the row to the middle of the compression flange. */
export const z = 400 - 13.5 / 2 - 60;

/** b_eff,c,wc of Eq. (6.11): weld leg 6 sqrt 2; the plate projects far enough for s_p = 2 t_p. */
export const b_c = 13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27) + 2 * 20;
export const k_2 = (0.7 * b_c * 8.5) / d_c;
/** Springs of one row alone, Table 6.11. */
export const k_3 = (0.7 * l_1 * 8.5) / d_c;
export const k_4 = (0.9 * l_1 * 14 ** 3) / m ** 3;
const K_cEN = E / (1 / k_4 + 1 / (2 * k_3));

/** x = s / (b_eff / 2) of a row at s from the middle of the compressed flange. */
export const xOf = (s: number): number => s / (b_c / 2);
/** Share in compression of one row. */
export const etaCOf = (x: number): number =>
  (Math.max(0, 1 - 0.8 * x) * ((2 * K_b) / (2 * E * k_2))) / (1 + (2 * K_b) / K_cEN);
