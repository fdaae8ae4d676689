import type { ComponentCheck, ComponentId, Governing, JointResult } from "./result";
import type { NodeCase } from "./node";
import type { SideCase } from "./side-case";

/**
 * When several checks are used as far as the joint itself, the one named is the one that stops the joint:
 * first what limits all rows together, then the rows.
 */
const NAMED_FIRST: readonly ComponentId[] = [
  "column-web-compression",
  "column-web-shear",
  "beam-flange-compression",
  "column-flange-bending",
  "column-web-tension",
  "end-plate-bending",
  "beam-web-tension",
];
const SAME = 1e-6;

const precedence = (component: ComponentId): number => {
  const index = NAMED_FIRST.indexOf(component);
  return component === "joint-moment" ? 1000 : index < 0 ? 100 : index;
};

/** The check that governs the option, named by component, side and load case. */
export function governingOf(checks: readonly ComponentCheck[], node: NodeCase): Governing {
  let best: ComponentCheck | null = null;
  for (const check of checks) {
    // A rule of detailing that is kept says nothing about how hard the joint works.
    if (check.component === "detailing" && check.utilisation <= 1) continue;
    if (!best) {
      best = check;
      continue;
    }
    const difference = check.utilisation - best.utilisation;
    const isTie = Math.abs(difference) <= SAME * Math.max(best.utilisation, SAME);
    if (isTie ? precedence(check.component) < precedence(best.component) : difference > 0) best = check;
  }
  return best
    ? { component: best.component, side: best.side, loadCase: best.loadCase, utilisation: best.utilisation }
    : { component: "joint-moment", side: node.joints[0]?.side ?? "left", loadCase: "all", utilisation: 0 };
}

/** Whether every joint in every load case is as stiff as asked for. */
export function reachesStiffness(node: NodeCase, joints: readonly JointResult[]): boolean {
  const { stiffness } = node.target;
  if (stiffness === "any") return true;
  return joints.every((joint) =>
    stiffness === "rigid"
      ? joint.stiffnessClass === "rigid"
      : joint.initialStiffnessNmmPerRad >= stiffness.nmmPerRad,
  );
}

const OWN_CHECKS: readonly ComponentId[] = ["bolt-shear", "connection-weld"];
const OWN_WORDS: Partial<Record<ComponentId, string>> = {
  "bolt-shear": "bolts in shear",
  "connection-weld": "weld",
};

/** What fails on the connection's own side, that no stiffening of the column cures; null if nothing does. */
export function connectionFailureOf(
  sides: readonly SideCase[],
  checks: readonly ComponentCheck[],
  target: number,
): string | null {
  for (const side of sides) {
    const { joint } = side.model;
    const utilisation = side.momentNmm / joint.connectionMomentNmm;
    if (utilisation > target) {
      const what = joint.kind === "bolted" ? "End plate, bolts and beam" : "The beam";
      return `${what} on the ${joint.view.joint.side} could carry ${(joint.connectionMomentNmm / 1e6).toFixed(0)} kNm on any column; ${side.loadCase.name} asks for ${(side.momentNmm / 1e6).toFixed(0)} kNm.`;
    }
  }
  const worst = checks
    .filter((check) => OWN_CHECKS.includes(check.component) && check.utilisation > target)
    .sort((a, b) => b.utilisation - a.utilisation)[0];
  return worst
    ? `The connection's ${worst.what ?? OWN_WORDS[worst.component] ?? worst.component} on the ${worst.side} is used to ${worst.utilisation.toFixed(2)} in ${worst.loadCase}.`
    : null;
}
