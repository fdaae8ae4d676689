import type { ComponentCheck } from "../result";
import { isBoltedCase, type BoltedSideCase, type SideCase, type WeldedSideCase } from "../side-case";
import type { Traced } from "../trace/traced";
import { checkOf, detailAtLeast, type CheckHead } from "./check";
import type { RowFamilyLimits } from "./row-groups";

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

/** Checks of one family (flange, web, plate, beam web): each row alone and each group, tightest group per set of rows. */
function familyChecks(
  side: BoltedSideCase,
  head: Omit<CheckHead, "side" | "loadCase">,
  limits: RowFamilyLimits,
  coefficient: (index: number) => number | undefined,
): ComponentCheck[] {
  const common = {
    ...head,
    side: side.model.joint.view.joint.side,
    level: side.model.joint.view.tensionLevel,
    loadCase: side.loadCase.name,
  };
  const rows = side.model.joint.view.tensionRows;
  const checks: ComponentCheck[] = [];
  limits.alone.forEach((limit, index) => {
    const row = rows[index];
    if (!limit || !row) return;
    checks.push(
      checkOf({ ...common, row: row.row }, side.rowDemandsN[index] ?? 0, limit, {
        stiffnessCoefficientMm: coefficient(index),
      }),
    );
  });
  for (const ending of limits.groupsEndingAt) {
    for (const { first, part, limit } of ending) {
      const members = part.rows.map((row) => row.row).sort((a, b) => a - b);
      checks.push(
        checkOf(
          { ...common, rows: members },
          sum(side.rowDemandsN.slice(first, first + part.rows.length)),
          limit,
        ),
      );
    }
  }
  return checks;
}

/** Rows that the tension flange's own weld serves: the extension row and the two below it (SCI/BCSA P398). */
const FLANGE_WELD_ROWS = { extended: 3, flush: 2 } as const;

function weldChecks(side: SideCase): ComponentCheck[] {
  const { welds, joint } = side.model;
  const head = {
    component: "connection-weld",
    side: joint.view.joint.side,
    loadCase: side.loadCase.name,
  } as const;
  const checks: ComponentCheck[] = [];
  if (welds.tensionFlange) {
    const served = isBoltedCase(side)
      ? sum(
          side.rowDemandsN.slice(
            0,
            side.model.joint.plate.isInside[0] === false ? FLANGE_WELD_ROWS.extended : FLANGE_WELD_ROWS.flush,
          ),
        )
      : side.tensionDemandN;
    checks.push(
      checkOf(
        {
          ...head,
          level: joint.view.tensionLevel,
          clause: "EN 1993-1-8, 4.5.3.2",
          what: "tension flange weld",
        },
        Math.min(served, welds.flangeYieldN),
        welds.tensionFlange,
      ),
    );
  }
  if (welds.webShear) {
    checks.push(
      checkOf(
        { ...head, clause: "EN 1993-1-8, 4.5.3.3", what: "web weld in shear" },
        Math.abs(side.actions.shearN),
        welds.webShear,
      ),
    );
  }
  return checks;
}

function commonChecks(side: SideCase): ComponentCheck[] {
  const { view, compression, beamFlange } = side.model.joint;
  const head = { side: view.joint.side, loadCase: side.loadCase.name };
  return [
    checkOf(
      { ...head, component: "joint-moment", clause: "EN 1993-1-8, 6.2.7", unit: "Nmm" },
      side.momentNmm,
      side.resistance,
    ),
    checkOf(
      {
        ...head,
        component: "column-web-compression",
        level: view.compressionLevel,
        clause: "EN 1993-1-8, 6.2.6.2",
      },
      side.compressionDemandN,
      side.compression,
      { stiffnessCoefficientMm: compression.spring.value },
    ),
    checkOf(
      {
        ...head,
        component: "beam-flange-compression",
        level: view.compressionLevel,
        clause: "EN 1993-1-8, 6.2.6.7",
      },
      side.compressionDemandN,
      beamFlange,
    ),
  ];
}

function boltedChecks(side: BoltedSideCase): ComponentCheck[] {
  const { joint, springs, shear } = side.model;
  const { view } = joint;
  const none = (): undefined => undefined;
  const plate: RowFamilyLimits = {
    alone: joint.plate.family.alone.map((part) => part.resistance),
    groupsEndingAt: joint.plate.family.groupsEndingAt.map((ending) =>
      ending.map(({ first, part }) => ({ first, part, limit: part.resistance })),
    ),
  };
  const head = { side: view.joint.side, loadCase: side.loadCase.name };
  const boltTension = view.tensionRows.map((row, index): ComponentCheck => {
    const { value, step } = row.fastener.tension;
    const pair: Traced = { value: 2 * value, step };
    return checkOf(
      {
        ...head,
        component: "bolt-tension",
        level: view.tensionLevel,
        row: row.row,
        clause: "EN 1993-1-8, Table 3.4",
      },
      side.rowDemandsN[index] ?? 0,
      pair,
      { stiffnessCoefficientMm: springs[index]?.bolts.value },
    );
  });
  return [
    ...familyChecks(
      side,
      { component: "column-flange-bending", clause: "EN 1993-1-8, 6.2.6.4" },
      side.column.flange,
      (index) => springs[index]?.flange.value,
    ),
    ...familyChecks(
      side,
      { component: "column-web-tension", clause: "EN 1993-1-8, 6.2.6.3" },
      side.column.web,
      (index) => springs[index]?.webTension.value,
    ),
    ...familyChecks(
      side,
      { component: "end-plate-bending", clause: "EN 1993-1-8, 6.2.6.5" },
      plate,
      (index) => springs[index]?.plate.value,
    ),
    ...familyChecks(
      side,
      { component: "beam-web-tension", clause: "EN 1993-1-8, 6.2.6.8" },
      joint.beamWeb,
      none,
    ),
    ...boltTension,
    checkOf(
      { ...head, component: "bolt-shear", clause: "EN 1993-1-8, 6.2.2 and Table 3.4" },
      Math.abs(side.actions.shearN),
      shear,
    ),
  ];
}

function weldedChecks(side: WeldedSideCase): ComponentCheck[] {
  const { joint } = side.model;
  const { view } = joint;
  const head = { side: view.joint.side, loadCase: side.loadCase.name, level: view.tensionLevel };
  const checks = [
    checkOf(
      { ...head, component: "column-web-tension", clause: "EN 1993-1-8, 6.2.6.3" },
      side.tensionDemandN,
      side.webTension,
      { stiffnessCoefficientMm: joint.spring.value },
    ),
  ];
  if (joint.flangeBending) {
    checks.push(
      checkOf(
        { ...head, component: "column-flange-bending", clause: "EN 1993-1-8, 6.2.6.4.3" },
        side.tensionDemandN,
        joint.flangeBending,
      ),
    );
  }
  return checks;
}

/** Every check of one side in one load case but the panel's and the measures' own. */
export const sideChecks = (side: SideCase): ComponentCheck[] => [
  ...commonChecks(side),
  ...(isBoltedCase(side) ? boltedChecks(side) : weldedChecks(side)),
  ...weldChecks(side),
];

/** Rules of bolt spacing and of welded flanges that no load case changes. */
export function connectionDetailing(side: SideCase, columnFlangeWidthMm: number): ComponentCheck[] {
  const { view } = side.model.joint;
  const head = { side: view.joint.side };
  if (!isBoltedCase(side)) {
    const { joint } = side.model;
    return joint.stiffener
      ? []
      : [
          detailAtLeast(
            {
              ...head,
              level: view.tensionLevel,
              clause: "EN 1993-1-8, 4.10(3)",
              what: "breadth of column flange that works without a stiffener",
            },
            joint.leastBreadthMm,
            joint.flangeBreadthMm,
          ),
        ];
  }
  const { connection, gaugeMm, rows } = side.model.joint.view;
  const holeMm = Math.max(...rows.map((row) => row.fastener.size.holeMm));
  const heights = rows.map((row) => row.belowTopMm).sort((a, b) => a - b);
  const pitches = heights.slice(1).map((height, index) => height - (heights[index] ?? 0));
  const { depthMm } = view.joint.beam.section;
  const ends = [
    (heights[0] ?? 0) + connection.plate.extensionTopMm,
    depthMm + connection.plate.extensionBottomMm - (heights[heights.length - 1] ?? 0),
  ];
  const edge = Math.min((connection.plate.widthMm - gaugeMm) / 2, (columnFlangeWidthMm - gaugeMm) / 2);
  const clause = "EN 1993-1-8, Table 3.3";
  return [
    detailAtLeast({ ...head, clause, what: "edge distance of the bolts, 1.2 d_0" }, 1.2 * holeMm, edge),
    detailAtLeast(
      { ...head, clause, what: "end distance in the plate, 1.2 d_0" },
      1.2 * holeMm,
      Math.min(...ends),
    ),
    detailAtLeast({ ...head, clause, what: "gauge, 2.4 d_0" }, 2.4 * holeMm, gaugeMm),
    ...(pitches.length > 0
      ? [
          detailAtLeast(
            { ...head, clause, what: "distance between bolt rows, 2.2 d_0" },
            2.2 * holeMm,
            Math.min(...pitches),
          ),
        ]
      : []),
  ];
}
