import type { Level } from "../node";
import type { ComponentCheck } from "../result";
import { isBoltedCase, type BoltedSideCase, type SideCase, type WeldedSideCase } from "../side-case";
import { checkOf, type CheckHead } from "./check";
import { bearingLevelOf, isCleatView } from "./cleat-view";
import type { RowFamilyLimits } from "./row-groups";

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

/** Adds the checks of one family (flange, web, plate, beam web): each row alone and each group. */
function familyChecks(
  checks: ComponentCheck[],
  sideCase: BoltedSideCase,
  head: Pick<CheckHead, "component" | "clause" | "what">,
  limits: RowFamilyLimits,
  coefficient: (index: number) => number | undefined,
): void {
  const { component, clause, what } = head;
  const side = sideCase.model.joint.view.joint.side;
  const level = sideCase.model.joint.view.tensionLevel;
  const loadCase = sideCase.loadCase.name;
  const { rowDemandsN } = sideCase;
  const rows = sideCase.model.joint.view.tensionRows;
  limits.alone.forEach((limit, index) => {
    const row = rows[index];
    if (!limit || !row) return;
    checks.push(
      checkOf(
        { component, clause, what, side, level, loadCase, row: row.row },
        rowDemandsN[index] ?? 0,
        limit,
        {
          stiffnessCoefficientMm: coefficient(index),
        },
      ),
    );
  });
  for (const ending of limits.groupsEndingAt) {
    for (const { first, part, limit } of ending) {
      let demandN = 0;
      for (let index = first; index < first + part.rows.length; index += 1)
        demandN += rowDemandsN[index] ?? 0;
      checks.push(
        checkOf({ component, clause, what, side, level, loadCase, rows: part.rowNumbers }, demandN, limit),
      );
    }
  }
}

/** Rows that the tension flange's own weld serves: the extension row and the two below it (SCI/BCSA P398). */
const FLANGE_WELD_ROWS = { extended: 3, flush: 2 } as const;

function weldChecks(checks: ComponentCheck[], side: SideCase): void {
  const { welds, joint } = side.model;
  const component = "connection-weld";
  const ofSide = joint.view.joint.side;
  const loadCase = side.loadCase.name;
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
          component,
          side: ofSide,
          loadCase,
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
        { component, side: ofSide, loadCase, clause: "EN 1993-1-8, 4.5.3.3", what: "web weld in shear" },
        Math.abs(side.actions.shearN),
        welds.webShear,
      ),
    );
  }
}

function commonChecks(checks: ComponentCheck[], side: SideCase): void {
  const { view, compression, beamFlange } = side.model.joint;
  const ofSide = view.joint.side;
  const loadCase = side.loadCase.name;
  checks.push(
    checkOf(
      { side: ofSide, loadCase, component: "joint-moment", clause: "EN 1993-1-8, 6.2.7", unit: "Nmm" },
      side.momentNmm,
      side.resistance,
    ),
    checkOf(
      {
        side: ofSide,
        loadCase,
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
        side: ofSide,
        loadCase,
        component: "beam-flange-compression",
        level: view.compressionLevel,
        clause: "EN 1993-1-8, 6.2.6.7",
      },
      side.compressionDemandN,
      beamFlange,
    ),
  );
}

function shearHeadOf({ model, loadCase }: BoltedSideCase, bearsOn: Level): CheckHead {
  const { view } = model.joint;
  const component = "bolt-shear";
  const { side } = view.joint;
  const clause = "EN 1993-1-8, 6.2.2 and Table 3.4";
  return isCleatView(view)
    ? { component, side, level: bearsOn, loadCase: loadCase.name, clause }
    : { component, side, loadCase: loadCase.name, clause };
}

function boltedChecks(checks: ComponentCheck[], sideCase: BoltedSideCase): void {
  const { joint, springs, shear } = sideCase.model;
  const { view } = joint;
  familyChecks(
    checks,
    sideCase,
    { component: "column-flange-bending", clause: "EN 1993-1-8, 6.2.6.4" },
    sideCase.column.flange,
    (index) => springs[index]?.flange.value,
  );
  familyChecks(
    checks,
    sideCase,
    { component: "column-web-tension", clause: "EN 1993-1-8, 6.2.6.3" },
    sideCase.column.web,
    (index) => springs[index]?.webTension.value,
  );
  for (const own of joint.own) {
    familyChecks(checks, sideCase, own, own.limits, (index) =>
      own.hasSpring ? springs[index]?.plate.value : undefined,
    );
  }
  const { side } = view.joint;
  const loadCase = sideCase.loadCase.name;
  const bearsOn = bearingLevelOf(sideCase.actions.shearN);
  view.tensionRows.forEach((row, index) => {
    // Pulled apart, or punched through the flange or the plate, whichever comes first.
    const inFlange = joint.flange.family.alone[index]?.modeThree;
    const inPlate = joint.plate.family.alone[index]?.modeThree;
    if (!inFlange || !inPlate) return;
    const pair = inPlate.value < inFlange.value ? inPlate : inFlange;
    checks.push(
      checkOf(
        {
          component: "bolt-tension",
          side,
          level: view.tensionLevel,
          row: row.row,
          loadCase,
          clause: "EN 1993-1-8, Table 3.4",
        },
        sideCase.rowDemandsN[index] ?? 0,
        pair,
        { stiffnessCoefficientMm: springs[index]?.bolts.value },
      ),
    );
  });
  checks.push(checkOf(shearHeadOf(sideCase, bearsOn), Math.abs(sideCase.actions.shearN), shear[bearsOn]));
  if (joint.seat) {
    checks.push(
      checkOf(
        {
          component: "bolt-shear",
          side,
          level: view.compressionLevel,
          loadCase,
          clause: "EN 1993-1-8, 3.7 and Table 3.4",
          what: "bolts to the beam's compression flange",
        },
        sideCase.compressionDemandN,
        joint.seat,
      ),
    );
  }
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

/** Adds every check of one side in one load case but the panel's and the measures' own. */
export function sideChecks(checks: ComponentCheck[], side: SideCase): void {
  commonChecks(checks, side);
  if (isBoltedCase(side)) boltedChecks(checks, side);
  else checks.push(...weldedChecks(side));
  weldChecks(checks, side);
}
