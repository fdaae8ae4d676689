import { sectionProperties } from "../mechanics/section-properties";
import type { JointCase, NodeCase } from "../node";
import type { ComponentCheck } from "../result";
import { OutsideScope } from "../outcome";
import { isBoltedCase, type BoltedSideCase, type SideCase } from "../side-case";
import { defineFormula } from "../trace/define-formula";
import type { Trace } from "../trace/trace";
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

const lesserPatternN = defineFormula({
  id: "axial-force/N_j,Rd of shared rows",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "6.2.7.1(3): N_j,Rd by equilibrium; rows that serve both flanges are counted once, as a mix of the two patterns of row forces",
  },
  symbols: { firstN: ["ΣF_tr,Rd, one flange pulled", "N"], secondN: ["ΣF_tr,Rd, the other", "N"] },
  result: ["N_j,Rd", "N"],
  expression: "min(firstN, secondN)",
  evaluate: (g) => Math.min(g.firstN, g.secondN),
  example: { given: { firstN: 400_000, secondN: 300_000 }, gives: 300_000, relTol: 1e-12 },
});

/** Sum of the row forces at the moment resistance, and where it acts below the beam's top, N and mm. */
function rowsTogether(side: BoltedSideCase): { readonly totalN: number; readonly belowTopMm: number } {
  let totalN = 0;
  let momentNmm = 0;
  side.model.joint.view.tensionRows.forEach((row, index) => {
    const forceN = side.rowForces[index]?.value ?? 0;
    totalN += forceN;
    momentNmm += forceN * row.belowTopMm;
  });
  return { totalN, belowTopMm: momentNmm / totalN };
}

/** Whether a bolt row takes tension whichever flange is pulled. */
function hasSharedRow(side: BoltedSideCase, turned: BoltedSideCase): boolean {
  const own = new Set(side.model.joint.view.tensionRows.map(({ row }) => row));
  return turned.model.joint.view.tensionRows.some(({ row }) => own.has(row));
}

/**
 * What the joint carries when the beam pulls along its axis, N.
 *
 * @throws OutsideScope where no mix of the two patterns of row forces has its resultant on the axis.
 */
function pulledN(trace: Trace | null, side: SideCase, turned: SideCase): number {
  if (!isBoltedCase(side) || !isBoltedCase(turned)) {
    const zone = (of: SideCase): number =>
      isBoltedCase(of)
        ? rowsTogether(of).totalN
        : Math.min(of.webTension.value, of.model.joint.flangeBending?.value ?? Infinity);
    return twoFlangesN(trace, { firstN: zone(side), secondN: zone(turned) });
  }
  const own = rowsTogether(side);
  const other = rowsTogether(turned);
  const given = { firstN: own.totalN, secondN: other.totalN };
  if (!hasSharedRow(side, turned)) return twoFlangesN(trace, given);
  const axisMm = side.model.joint.view.joint.beam.section.depthMm / 2;
  if ((own.belowTopMm - axisMm) * (other.belowTopMm - axisMm) > 0) {
    throw new OutsideScope(
      `the bolt rows on the ${side.model.joint.view.joint.side} all act on one side of the beam's axis: its pull in ${side.loadCase.name} cannot be taken along the axis`,
    );
  }
  return lesserPatternN(trace, given);
}

const compressionN = (side: SideCase): number => {
  const own = Math.min(side.compression.value, side.model.joint.beamFlange.value);
  return isBoltedCase(side) ? Math.min(own, side.model.joint.seat?.value ?? Infinity) : own;
};

/**
 * Moment and axial force together. EN 1993-1-8:2005, 6.2.7.1(3), Eq. (6.24).
 *
 * @param turned - the same side with its tension flange at the other level.
 * @throws OutsideScope where the rows cannot take a pull along the beam's axis.
 */
export function axialCheck(side: SideCase, turned: SideCase, steps: boolean): ComponentCheck {
  const { axialForceN } = side.actions;
  const ratio = traced(steps, (trace) => {
    trace?.include(side.resistance.step);
    const resistanceN =
      axialForceN > 0
        ? twoFlangesN(trace, { firstN: compressionN(side), secondN: compressionN(turned) })
        : pulledN(trace, side, turned);
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
