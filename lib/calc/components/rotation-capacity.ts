import { defineFormula } from "../trace/define-formula";
import type { NodeCase } from "../node";
import type { RotationCapacity } from "../result";
import { isBoltedCase, type BoltedSideCase, type SideCase, type WeldedSideCase } from "../side-case";
import { isLargeAxialForce } from "./axial-force";
import type { ColumnPanel } from "./column-panel";

const from = (ref: string) => ({ document: "EN 1993-1-8", edition: "2005", ref }) as const;

/** Thickest flange or plate that bends before its bolts break, mm. 6.4.2(2). */
const ductileThicknessMm = defineFormula({
  id: "en1993-1-8:2005/6.4.2/t",
  source: from("6.4.2(2), from memory"),
  symbols: {
    diameterMm: ["d", "mm"],
    boltUltimateMpa: ["f_ub", "N/mm2"],
    yieldMpa: ["f_y", "N/mm2"],
  },
  result: ["t", "mm"],
  expression: "0.36 * diameterMm * sqrt(boltUltimateMpa / yieldMpa)",
  evaluate: (g) => 0.36 * g.diameterMm * Math.sqrt(g.boltUltimateMpa / g.yieldMpa),
  example: { given: { diameterMm: 20, boltUltimateMpa: 900, yieldMpa: 225 }, gives: 14.4, relTol: 1e-12 },
});

/** Rotation that a welded joint reaches with its compression zone stiffened and its tension zone not, rad. 6.4.3(2). */
const weldedRotationRad = defineFormula({
  id: "en1993-1-8:2005/6.4.3/phi_Cd",
  source: from("6.4.3(2), from memory"),
  symbols: { columnMm: ["h_c", "mm"], beamMm: ["h_b", "mm"] },
  result: ["φ_Cd", "rad"],
  expression: "0.025 * columnMm / beamMm",
  evaluate: (g) => (0.025 * g.columnMm) / g.beamMm,
  example: { given: { columnMm: 300, beamMm: 500 }, gives: 0.015, relTol: 1e-12 },
});

/** Of an unstiffened welded joint, rad. 6.4.3(3), from memory. */
const UNSTIFFENED_RAD = 0.015;
/** Steels up to S355: 6.4.1(2), from memory. */
const STRONGEST_MPA = 355;
const SAME = 1 - 1e-9;

/** Whether the flange or plate that bends first is thin enough against its bolts. */
function isDuctileRow(side: BoltedSideCase, panel: ColumnPanel): boolean {
  const { joint } = side.model;
  const [row] = joint.view.tensionRows;
  const [force] = side.rowForces;
  if (!row || !force) return false;
  const flange = side.column.flange.alone[0];
  const leg = joint.own.find(({ hasSpring }) => hasSpring)?.limits.alone[0];
  const parts = [
    {
      limit: flange,
      mode: joint.flange.family.alone[0]?.mode,
      thicknessMm: panel.section.flangeThicknessMm,
      yieldMpa: panel.steel.yieldMpa,
    },
    {
      limit: leg,
      mode: joint.plate.family.alone[0]?.mode,
      thicknessMm: joint.view.attachment.thicknessMm,
      yieldMpa: joint.view.attachment.yieldMpa,
    },
  ];
  return parts.some(
    ({ limit, mode, thicknessMm, yieldMpa }) =>
      limit !== null &&
      limit !== undefined &&
      force.value >= limit.value * SAME &&
      mode !== 3 &&
      thicknessMm <=
        ductileThicknessMm(null, {
          diameterMm: row.fastener.size.diameterMm,
          boltUltimateMpa: row.fastener.grade.ultimateMpa,
          yieldMpa,
        }),
  );
}

function weldedCapacity({ model }: WeldedSideCase, panel: ColumnPanel): RotationCapacity {
  const { view } = model.joint;
  if (view.tensionStiffener) return "not-shown";
  return {
    atLeastRad: view.compressionStiffener
      ? weldedRotationRad(null, {
          columnMm: panel.section.depthMm,
          beamMm: view.joint.beam.section.depthMm,
        })
      : UNSTIFFENED_RAD,
  };
}

/** What EN 1993-1-8:2005, 6.4 says of the joint's rotation where plastic analysis asks for one. */
export function rotationCapacityOf(node: NodeCase, panel: ColumnPanel, side: SideCase): RotationCapacity {
  const { joint } = side.model.joint.view;
  const isCovered =
    panel.steel.yieldMpa <= STRONGEST_MPA &&
    joint.beam.steel.yieldMpa <= STRONGEST_MPA &&
    (!isBoltedCase(side) || side.model.joint.view.attachment.yieldMpa <= STRONGEST_MPA) &&
    !isLargeAxialForce(node, joint, side.actions.axialForceN);
  if (!isCovered) return "not-shown";
  const totalN = isBoltedCase(side)
    ? side.rowForces.reduce((sum, row) => sum + row.value, 0)
    : side.resistance.value / side.model.joint.leverMm;
  // The panel is within d / t_w = 69 ε, or the option is outside scope.
  if (side.beta > 0 && totalN >= (panel.shear[joint.side].value / side.beta) * SAME) return "enough";
  if (totalN >= Math.min(side.compression.value, side.model.joint.beamFlange.value) * SAME)
    return isBoltedCase(side) ? "not-shown" : weldedCapacity(side, panel);
  if (!isBoltedCase(side)) return weldedCapacity(side, panel);
  return isDuctileRow(side, panel) ? "enough" : "not-shown";
}
