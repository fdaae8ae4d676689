import {
  filletShearStrengthMpa,
  filletTransverseStrengthMpa,
  weldForceN,
} from "../clauses/en1993-1-8-2005/welds";
import type { ConnectionWelds, JointCase, NodeCase, Steel, Weld } from "../node";
import { traced, type Traced } from "../trace/traced";

/** Welds of the beam to its end plate or to the column. Butt welds are as strong as the plate and are not listed. */
export interface ConnectionWeldLimits {
  /** Pair of fillets along the tension flange, pulled square to their length, N. */
  readonly tensionFlange: Traced | null;
  /** Pair of fillets along the web in the part that is left for shear, N. */
  readonly webShear: Traced | null;
  /** Yield force of the tension flange: the most it can bring, N. */
  readonly flangeYieldN: number;
}

const weaker = (a: Steel, b: Steel): Steel => (a.ultimateMpa / a.betaW <= b.ultimateMpa / b.betaW ? a : b);

/** A beam that is bolted by its flanges has no welds. */
export const noWelds = (node: NodeCase, { beam: { section, steel } }: JointCase): ConnectionWeldLimits => ({
  tensionFlange: null,
  webShear: null,
  flangeYieldN: (section.widthMm * section.flangeThicknessMm * steel.yieldMpa) / node.partialFactors.gammaM0,
});

/**
 * EN 1993-1-8:2005, 4.5.3.2 or, where the node asks for it, 4.5.3.3 for the flange; 4.5.3.3 for the web.
 *
 * @param other - the part the beam is welded to: end plate or column flange.
 * @param shearDepthMm - depth of web left for shear.
 */
export function connectionWeldLimits(
  node: NodeCase,
  joint: JointCase,
  welds: ConnectionWelds,
  tensionWeld: Weld,
  other: Steel,
  shearDepthMm: number,
  steps: boolean,
): ConnectionWeldLimits {
  const { section, steel } = joint.beam;
  const weak = weaker(steel, other);
  const strength = { ultimateMpa: weak.ultimateMpa, betaW: weak.betaW, gammaM2: node.partialFactors.gammaM2 };
  const inner = section.widthMm - section.webThicknessMm - 2 * section.rootMm;
  const webWeld = welds.web;
  return {
    tensionFlange:
      tensionWeld.kind === "butt"
        ? null
        : traced(steps, (trace) =>
            weldForceN(
              trace,
              {
                strengthMpa:
                  node.flangeWelds === "directional"
                    ? filletTransverseStrengthMpa(trace, strength)
                    : filletShearStrengthMpa(trace, strength),
                throatMm: tensionWeld.throatMm,
                lengthMm: section.widthMm + Math.max(inner, 0),
              },
              0,
            ),
          ),
    webShear:
      webWeld.kind === "butt"
        ? null
        : traced(steps, (trace) =>
            weldForceN(
              trace,
              {
                strengthMpa: filletShearStrengthMpa(trace, strength),
                throatMm: webWeld.throatMm,
                lengthMm: 2 * shearDepthMm,
              },
              0,
            ),
          ),
    flangeYieldN:
      (section.widthMm * section.flangeThicknessMm * steel.yieldMpa) / node.partialFactors.gammaM0,
  };
}
