import { betaOf, panelShearForceN } from "../clauses/en1993-1-8-2005/panel";
import { isOnePanel, panelZonesOf, zoneBeta, type PanelZone } from "../mechanics/panel-levels";
import type { LoadCase, NodeCase, Side } from "../node";
import type { ComponentCheck } from "../result";
import type { SideCase } from "../side-case";
import { traced, type Traced } from "../trace/traced";
import { checkOf } from "./check";
import type { ColumnPanel } from "./column-panel";

/** The panel's zones and what they need of each joint; the same in every load case. */
export interface PanelGeometry {
  readonly zones: readonly PanelZone[];
  readonly isOnePanel: boolean;
}

export const panelGeometryOf = (node: NodeCase): PanelGeometry => ({
  zones: panelZonesOf(node.joints),
  isOnePanel: isOnePanel(node.joints),
});

/** Moment and lever arm z of one joint. */
export interface JointShear {
  readonly momentNmm: number;
  readonly leverMm: number;
}

/**
 * beta of one joint: 1 alone; exact by 5.3(9) where the beams share one panel; else that of the worst zone the joint
 * shears; 2, the most there is, where its own moment is nothing.
 */
export function betaOfSide(
  geometry: PanelGeometry,
  side: Side,
  own: JointShear,
  other: JointShear | null,
): number {
  if (!other) return 1;
  if (own.momentNmm === 0) return 2;
  if (geometry.isOnePanel) return betaOf(null, { ownNmm: own.momentNmm, otherNmm: other.momentNmm });
  let worst = 0;
  for (const { sides } of geometry.zones) {
    if (!sides.includes(side)) continue;
    const beta =
      sides.length === 1
        ? 1
        : zoneBeta(null, {
            ownNmm: own.momentNmm,
            ownLeverMm: own.leverMm,
            otherNmm: other.momentNmm,
            otherLeverMm: other.leverMm,
          });
    worst = Math.max(worst, beta);
  }
  return worst;
}

/** Shear of one zone, N: the forces of the beams that span it and of the column. 5.3(3), Eq. (5.3). */
function zoneShear(zone: PanelZone, loadCase: LoadCase, sides: readonly SideCase[], steps: boolean): Traced {
  const of = (side: Side): SideCase | undefined =>
    zone.sides.includes(side)
      ? sides.find((candidate) => candidate.model.joint.view.joint.side === side)
      : undefined;
  const left = of("left");
  const right = of("right");
  return traced(steps, (trace) =>
    panelShearForceN(trace, {
      leftNmm: left?.actions.momentNmm ?? 0,
      leftLeverMm: left?.lever.value ?? right?.lever.value ?? 1,
      rightNmm: right?.actions.momentNmm ?? 0,
      rightLeverMm: right?.lever.value ?? left?.lever.value ?? 1,
      aboveN: loadCase.column.shearAboveN,
      belowN: loadCase.column.shearBelowN,
    }),
  );
}

/** Adds the panel's check for each side, in the zone it shears most, and returns the largest shear with its sign, N. */
export function panelChecks(
  checks: ComponentCheck[],
  panel: ColumnPanel,
  geometry: PanelGeometry,
  loadCase: LoadCase,
  sides: readonly SideCase[],
  steps: boolean,
): number {
  const forces = geometry.zones.map((zone) => zoneShear(zone, loadCase, sides, steps));
  let largestN = 0;
  for (const sideCase of sides) {
    const { side } = sideCase.model.joint.view.joint;
    let worst: Traced | null = null;
    geometry.zones.forEach((zone, index) => {
      const force = forces[index];
      if (!force || !zone.sides.includes(side)) return;
      if (!worst || Math.abs(force.value) > Math.abs(worst.value)) worst = force;
    });
    const { value, step } = (worst as Traced | null) ?? { value: 0, step: undefined };
    if (Math.abs(value) > Math.abs(largestN)) largestN = value;
    checks.push(
      checkOf(
        {
          component: "column-web-shear",
          side,
          loadCase: loadCase.name,
          clause: "EN 1993-1-8, 6.2.6.1 and 5.3",
        },
        Math.abs(value),
        panel.shear[side],
        { stiffnessCoefficientMm: sideCase.panelSpring?.value, demandStep: step },
      ),
    );
  }
  return largestN;
}
