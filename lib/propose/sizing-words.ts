import type { NodeCase } from "@/lib/calc/node";
import type { OptionOutcome } from "@/lib/calc/result";
import { componentOnSide } from "@/lib/ranking/component-words";
import { utilisationWords } from "@/lib/ranking/utilisation-words";

const NMM_PER_KNM = 1e6;

/**
 * One plain sentence on why the best that stock can do is not enough, naming what stays over.
 *
 * @returns null where the outcome passes, or where it is outside scope and says itself why.
 */
export function sizingWords(node: NodeCase, outcome: OptionOutcome): string | null {
  if (outcome.kind === "outside-scope" || outcome.passes) return null;
  const { governing, utilisation } = outcome;
  if (utilisation > node.target.utilisation) {
    const words = `No stock size does: ${componentOnSide(governing.component, governing.side)} stays at ${utilisationWords(utilisation)} in ${governing.loadCase}`;
    return outcome.connectionFailure === null
      ? `${words}.`
      : `${words}, and the connection itself fails, which no stiffening of the column cures.`;
  }
  if (!outcome.stiffnessReached) {
    const softest = outcome.joints.reduce((a, b) =>
      b.initialStiffnessNmmPerRad < a.initialStiffnessNmmPerRad ? b : a,
    );
    const reached = Math.round(softest.initialStiffnessNmmPerRad / NMM_PER_KNM);
    return `No stock size is stiff enough: the ${softest.side} joint stays at ${reached} kNm/rad in ${softest.loadCase}.`;
  }
  return `No stock size does: ${componentOnSide(governing.component, governing.side)} is not in order in ${governing.loadCase}.`;
}
