/** One point of a joint's moment-rotation curve. */
export interface CurvePoint {
  readonly momentNmm: number;
  readonly rotationRad: number;
}

/** Moments at which the curve is drawn beyond its straight part, as shares of M_j,Rd. */
const SHARES = [2 / 3, 0.75, 0.8, 0.85, 0.9, 0.95, 1];

/**
 * A joint's moment against its rotation up to M_j,Rd: M / S_j, where S_j = S_j,ini up to two thirds of M_j,Rd and
 * S_j,ini / (1.5 M / M_j,Rd)^ψ beyond. EN 1993-1-8:2005, 6.3.1(6), Table 6.8.
 *
 * @param psi - 2.7 welded and end plates, 3.1 flange cleats.
 * @returns points in the order of the moments, the origin first.
 */
export function momentRotationCurve(
  resistanceNmm: number,
  initialNmmPerRad: number,
  psi: number,
): readonly CurvePoint[] {
  return [
    { momentNmm: 0, rotationRad: 0 },
    ...SHARES.map((share) => {
      const mu = share <= 2 / 3 ? 1 : (1.5 * share) ** psi;
      const momentNmm = share * resistanceNmm;
      return { momentNmm, rotationRad: (momentNmm * mu) / initialNmmPerRad };
    }),
  ];
}
