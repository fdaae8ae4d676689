import { describe, expect, it } from "vitest";
import { alphaOf } from "@/lib/calc/clauses/en1993-1-8-2005/alpha";

/** The curves of Figure 6.11 read back from their closed form (P398 (2013), Appendix G), printed to two decimals. */
const LAMBDA_1 = [0.25, 0.3, 0.35, 0.4, 0.45, 0.5, 0.55, 0.6, 0.65, 0.7, 0.8];
const TABLE: readonly (readonly [lambda2: number, ...alpha: number[]])[] = [
  [0.1, 8.0, 8.0, 8.0, 8.0, 8.0, 8.0, 8.0, 7.69, 7.25, 6.81, 5.94],
  [0.2, 8.0, 8.0, 8.0, 7.69, 7.29, 6.92, 6.58, 6.27, 5.97, 5.68, 5.12],
  [0.3, 8.0, 7.78, 7.29, 6.88, 6.54, 6.23, 5.96, 5.7, 5.47, 5.24, 4.82],
  [0.4, 8.0, 7.32, 6.84, 6.45, 6.14, 5.86, 5.62, 5.4, 5.2, 5.01, 4.65],
  [0.5, 7.82, 7.09, 6.58, 6.2, 5.89, 5.64, 5.41, 5.21, 5.03, 4.86, 4.55],
  [0.6, 7.76, 6.97, 6.44, 6.05, 5.74, 5.49, 5.28, 5.09, 4.92, 4.76, 4.49],
  [0.8, 7.75, 6.92, 6.33, 5.9, 5.58, 5.33, 5.12, 4.94, 4.79, 4.65, 4.45],
  [1.0, 7.75, 6.92, 6.32, 5.88, 5.53, 5.26, 5.05, 4.87, 4.72, 4.58, 4.45],
  [1.4, 7.75, 6.92, 6.32, 5.88, 5.53, 5.25, 5.02, 4.83, 4.67, 4.54, 4.45],
];

describe("alpha", () => {
  it.each(TABLE)("along lambda_2 = %f", (lambda2, ...printed) => {
    LAMBDA_1.forEach((lambda1, index) => {
      const alpha = alphaOf(null, { lambda1, lambda2 });
      expect(Math.abs(alpha - (printed[index] ?? NaN)), `lambda_1 = ${lambda1}`).toBeLessThanOrEqual(
        0.005 + 1e-9,
      );
    });
  });

  it("stays within the range that the figure prints", () => {
    expect(alphaOf(null, { lambda1: 0.95, lambda2: 1.2 })).toBe(4.45);
    expect(alphaOf(null, { lambda1: 0.1, lambda2: 0.1 })).toBe(8);
  });

  it("falls as either lambda grows", () => {
    const along = [0.3, 0.4, 0.5, 0.6, 0.7].map((lambda1) => alphaOf(null, { lambda1, lambda2: 0.45 }));
    expect(along).toEqual([...along].sort((a, b) => b - a));
    const across = [0.25, 0.35, 0.45, 0.55].map((lambda2) => alphaOf(null, { lambda1: 0.45, lambda2 }));
    expect(across).toEqual([...across].sort((a, b) => b - a));
  });

  it("is exactly (4m + 1.25e)/m on the straight part of its curve", () => {
    // lambda_1 = 0.5: m = e, so 4 + 1.25 = 5.25; lambda_2 beyond alpha lambda_1 / 2 = 1.3125.
    expect(alphaOf(null, { lambda1: 0.5, lambda2: 1.35 })).toBeCloseTo(5.25, 9);
  });
});
