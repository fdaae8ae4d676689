import { defineSolve } from "../../trace/define-solve";

/** Range of the curves that the figure prints. */
const SMALLEST = 4.45;
const LARGEST = 8;

const limitOne = (alpha: number): number => 1.25 / (alpha - 2.75);

/** lambda1 on the curve of one alpha at a given lambda2. */
function lambdaOneOn(alpha: number, lambda2: number): number {
  const one = limitOne(alpha);
  const two = (alpha * one) / 2;
  return lambda2 >= two ? one : one + (1 - one) * ((two - lambda2) / two) ** (0.185 * alpha ** 1.785);
}

function search({ lambda1, lambda2 }: { readonly lambda1: number; readonly lambda2: number }): number {
  if (lambdaOneOn(SMALLEST, lambda2) <= lambda1) return SMALLEST;
  if (lambdaOneOn(LARGEST, lambda2) >= lambda1) return LARGEST;
  let low = SMALLEST;
  let high = LARGEST;
  while (high - low > 1e-12) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (lambdaOneOn(middle, lambda2) > lambda1) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Yield-line factor alpha beside a stiffener or a beam flange, by the closed form of the figure's curves,
 * solved by bisection (lambda1 falls strictly with alpha) and kept within 4.45 to 8, the range the figure prints.
 *
 * EN 1993-1-8:2005, Figure 6.11; closed form of P398 (2013), Appendix G.
 */
export const alphaOf = defineSolve({
  search,
  residual: {
    id: "en1993-1-8:2005/figure-6.11/alpha",
    source: {
      document: "EN 1993-1-8",
      edition: "2005",
      ref: "Figure 6.11, closed form of SCI/BCSA P398 (2013), Appendix G",
    },
    symbols: { lambda1: ["λ_1", "1"], lambda2: ["λ_2", "1"], solution: ["α", "1"] },
    result: ["α", "1"],
    // The solution itself where it is at an end of the figure's range; else the point of its curve at λ_2 has to be λ_1.
    expression:
      "(solution <= 4.45 or solution >= 8) ? solution : solution + (1.25 / (solution - 2.75) + (lambda2 >= 0.625 * solution / (solution - 2.75) ? 0 : (1 - 1.25 / (solution - 2.75)) * (1 - lambda2 * (solution - 2.75) / (0.625 * solution))^(0.185 * solution^1.785)) - lambda1)",
    evaluate: ({ lambda1, lambda2, solution }) =>
      solution <= SMALLEST || solution >= LARGEST
        ? solution
        : solution + (lambdaOneOn(solution, lambda2) - lambda1),
    // P398 (2013), example C.1, reads 7.5 off the figure at (0.34, 0.31).
    example: { given: { lambda1: 0.34, lambda2: 0.31, solution: 7.36 }, gives: 7.36, relTol: 5e-3 },
  },
});
