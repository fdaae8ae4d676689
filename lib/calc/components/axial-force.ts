import { sectionProperties } from "../mechanics/section-properties";
import type { JointCase, NodeCase } from "../node";
import type { ComponentCheck } from "../result";
import { OutsideScope } from "../outcome";
import { isBoltedCase, type SideCase } from "../side-case";
import { defineFormula } from "../trace/define-formula";
import { traced } from "../trace/traced";
import { checkOf } from "./check";

/** Axial force of a beam up to which the joint's moment resistance is not affected. EN 1993-1-8:2005, 6.2.7.1(2). */
const SMALL_AXIAL_SHARE = 0.05;

/** Whether an axial force of a beam is more than the moment resistance may pass over. EN 1993-1-8:2005, 6.2.7.1(2). */
export function isLargeAxialForce(node: NodeCase, { beam }: JointCase, axialForceN: number): boolean {
  if (axialForceN === 0) return false;
  const plasticN =
    (sectionProperties(beam.section).areaMm2 * beam.steel.yieldMpa) / node.partialFactors.gammaM0;
  return Math.abs(axialForceN) > SMALL_AXIAL_SHARE * plasticN;
}

const twoFlangesN = defineFormula({
  id: "axial-force/N_j,Rd",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "6.2.7.1(3): N_j,Rd by equilibrium, half of the force through each flange's zone, the weaker one twice",
  },
  symbols: { firstN: ["F_Rd of one flange", "N"], secondN: ["F_Rd of the other", "N"] },
  result: ["N_j,Rd", "N"],
  expression: "2 * min(firstN, secondN)",
  evaluate: (g) => 2 * Math.min(g.firstN, g.secondN),
  example: { given: { firstN: 400_000, secondN: 300_000 }, gives: 600_000, relTol: 1e-12 },
});

const togetherRatio = defineFormula({
  id: "en1993-1-8:2005/6.2.7.1/M with N",
  source: { document: "EN 1993-1-8", edition: "2005", ref: "6.2.7.1(3), Eq. (6.24)" },
  symbols: {
    momentNmm: ["M_j,Ed", "Nmm"],
    resistanceNmm: ["M_j,Rd", "Nmm"],
    forceN: ["|N_j,Ed|", "N"],
    resistanceN: ["N_j,Rd", "N"],
  },
  result: ["M_j,Ed / M_j,Rd + N_j,Ed / N_j,Rd", "1"],
  expression: "momentNmm / resistanceNmm + forceN / resistanceN",
  evaluate: (g) => g.momentNmm / g.resistanceNmm + g.forceN / g.resistanceN,
  example: {
    given: { momentNmm: 100, resistanceNmm: 200, forceN: 30, resistanceN: 100 },
    gives: 0.8,
    relTol: 1e-12,
  },
});

/**
 * What one flange's zone of a welded beam carries when the beam pulls, N.
 *
 * @throws OutsideScope behind bolts: rows and welds under a pull along the axis are not evaluated.
 */
function pulledN(side: SideCase): number {
  if (!isBoltedCase(side))
    return Math.min(side.webTension.value, side.model.joint.flangeBending?.value ?? Infinity);
  throw new OutsideScope(
    `the ${side.model.joint.view.joint.side} beam pulls at its bolts with more than 5 % of its plastic resistance in ${side.loadCase.name}, which is not evaluated`,
  );
}

const compressionN = (side: SideCase): number => {
  const own = Math.min(side.compression.value, side.model.joint.beamFlange.value);
  return isBoltedCase(side) ? Math.min(own, side.model.joint.seat?.value ?? Infinity) : own;
};

/**
 * Moment and axial force together. EN 1993-1-8:2005, 6.2.7.1(3), Eq. (6.24).
 *
 * @param turned - the same side with its tension flange at the other level.
 * @throws OutsideScope for a pull at bolts.
 */
export function axialCheck(side: SideCase, turned: SideCase, steps: boolean): ComponentCheck {
  const { axialForceN } = side.actions;
  const ratio = traced(steps, (trace) => {
    trace?.include(side.resistance.step);
    const zone = axialForceN > 0 ? compressionN : pulledN;
    const resistanceN = twoFlangesN(trace, { firstN: zone(side), secondN: zone(turned) });
    return togetherRatio(
      trace,
      {
        momentNmm: side.momentNmm,
        resistanceNmm: side.resistance.value,
        forceN: Math.abs(axialForceN),
        resistanceN,
      },
      0,
    );
  });
  return checkOf(
    {
      component: "joint-moment",
      side: side.model.joint.view.joint.side,
      loadCase: side.loadCase.name,
      clause: "EN 1993-1-8, 6.2.7.1(3)",
      what: "with the beam's axial force",
      unit: "ratio",
    },
    ratio.value,
    { value: 1, step: ratio.step },
  );
}
