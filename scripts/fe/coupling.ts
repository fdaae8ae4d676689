/**
 * Bars of any size on a column whose answer to unit loads is known: superposition, which linear elasticity makes exact.
 * Forces and displacements outward positive.
 */
export const LOADINGS = { symmetric: [1, 1], "one-sided": [1, 0], antisymmetric: [1, -1] } as const;
export type Loading = keyof typeof LOADINGS;

/** Displacement of the nuts under 1 N of the row on both sides: outward on both, or outward and inward. mm/N. */
export interface UnitAnswers {
  readonly symmetricMmPerN: number;
  readonly antisymmetricMmPerN: number;
}

export interface Coupled {
  readonly barsN: number;
  /** Of the more loaded and of the other side, mm. */
  readonly withoutBarsMm: readonly [number, number];
  readonly withBarsMm: readonly [number, number];
}

/** Forces left and right on a column with a row of bars of the given stiffness between its nuts. */
export function coupleBars(
  unit: UnitAnswers,
  barsNPerMm: number,
  forcesN: readonly [number, number],
): Coupled {
  const mean = (forcesN[0] + forcesN[1]) / 2;
  const difference = (forcesN[0] - forcesN[1]) / 2;
  // The bars stretch by both nuts' movement: N = K_b 2 u_s (mean - N).
  const stretch = 2 * unit.symmetricMmPerN * barsNPerMm;
  const barsN = (mean * stretch) / (1 + stretch);
  const movement = (symmetricN: number): readonly [number, number] => {
    const [both, apart] = [symmetricN * unit.symmetricMmPerN, difference * unit.antisymmetricMmPerN];
    return [both + apart, both - apart];
  };
  return { barsN, withoutBarsMm: movement(mean), withBarsMm: movement(mean - barsN) };
}
