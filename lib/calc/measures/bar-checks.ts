import { modeThreeN, tStubMomentNmm } from "../clauses/en1993-1-8-2005/t-stub";
import { punchingN } from "../clauses/en1993-1-8-2005/fasteners";
import { checkOf } from "../components/check";
import type { ColumnPanel } from "../components/column-panel";
import type { BoltRow } from "../components/connection-view";
import { areFacing } from "../mechanics/panel-levels";
import * as bar from "../mechanics/through-bar-formulas";
import { defineFormula } from "../trace/define-formula";
import type { NodeCase, Side } from "../node";
import type { ComponentCheck } from "../result";
import { isBoltedCase, type BoltedSideCase, type SideCase } from "../side-case";
import { SAME_HEIGHT_MM } from "./panel-design";
import { traced, type Traced } from "../trace/traced";

const CLAUSE = "through-bars: mechanics, no clause";
const opposite = (side: Side): Side => (side === "left" ? "right" : "left");

const farSideN = defineFormula({
  id: "through-bars/far side",
  source: {
    document: "Mechanics of through-bars",
    edition: "this project's finite-element study",
    ref: "far flange without prying, far web over the row's length",
  },
  symbols: {
    flangeN: ["2 M_pl,1 / m", "N"],
    lengthMm: ["l_eff", "mm"],
    webMm: ["t_wc", "mm"],
    yieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_far,Rd", "N"],
  expression: "min(flangeN, lengthMm * webMm * yieldMpa / gammaM0)",
  evaluate: (g) => Math.min(g.flangeN, (g.lengthMm * g.webMm * g.yieldMpa) / g.gammaM0),
  example: {
    given: { flangeN: 300_000, lengthMm: 200, webMm: 10, yieldMpa: 275, gammaM0: 1 },
    gives: 300_000,
    relTol: 1e-12,
  },
});

/** Force from one side's flange at the other side's tension row: outward positive. */
interface FarSide {
  readonly forceN: number;
  /** The other side pushes here: moments turning the same way. */
  readonly isCompression: boolean;
}

function farSideOf(own: BoltedSideCase, index: number, far: SideCase | undefined): FarSide {
  const nothing = { forceN: 0, isCompression: false };
  if (!far || !isBoltedCase(far)) return nothing;
  const { joint, tensionLevel, tensionRows } = own.model.joint.view;
  const farView = far.model.joint.view;
  if (!areFacing(joint, farView.joint, tensionLevel)) return nothing;
  if (farView.tensionLevel !== tensionLevel) {
    return { forceN: -Math.max(far.compressionDemandN, 0), isCompression: far.compressionDemandN > 0 };
  }
  const heightMm = joint.levelOffsetMm + (tensionRows[index]?.belowTopMm ?? NaN);
  const place = farView.tensionRows.findIndex(
    (row) => Math.abs(farView.joint.levelOffsetMm + row.belowTopMm - heightMm) < SAME_HEIGHT_MM,
  );
  return { forceN: place < 0 ? 0 : (far.rowDemandsN[place] ?? 0), isCompression: false };
}

interface RowBar {
  readonly row: BoltRow;
  readonly share: Traced;
  readonly demandN: number;
  readonly far: FarSide;
  /** Force in the bars of the row, N. */
  readonly force: Traced;
  /** Part of it that presses on the far flange's compression zone under opposite forces, N. */
  readonly pressN: number;
}

function rowBar(
  own: BoltedSideCase,
  index: number,
  share: Traced,
  row: BoltRow,
  farCase: SideCase | undefined,
  steps: boolean,
): RowBar {
  const part = own.model.joint.flange.family.alone[index];
  const demandN = own.rowDemandsN[index] ?? 0;
  const far = farSideOf(own, index, farCase);
  if (!part) throw new RangeError(`No flange part at tension row ${index}`);
  const { symmetric } = own;
  const reliefShare = own.model.barShares[index]?.value ?? 0;
  const relief = bar.reliefTension(null, { share: reliefShare, symmetric: symmetric.tension });
  const pressShare =
    farCase && isBoltedCase(farCase) ? (farCase.model.barCompression?.forceShare.value ?? 0) : 0;
  const rows = own.model.barShares.filter((candidate) => candidate !== null).length;
  const pressN = far.isCompression
    ? Math.max(0, (share.value * demandN + (pressShare * far.forceN) / rows) / 2)
    : 0;
  const force = traced(steps, (trace) => {
    trace?.include(share.step);
    const prying = bar.pryingN(trace, {
      forceN: demandN,
      relief,
      mMm: part.mMm,
      nMm: part.nMm,
      momentNmm: part.momentTwoNmm,
    });
    const isYielded = part.mode !== 3 && demandN > part.resistance.value;
    if (isYielded) return bar.barForceYieldedN(trace, { forceN: demandN, pryingN: prying }, 0);
    const meanN = far.isCompression
      ? pressN / Math.max(share.value, 1e-9)
      : (demandN + Math.max(far.forceN, 0)) / 2;
    return bar.barForceElasticN(trace, { share: share.value, meanN, forceN: demandN, pryingN: prying }, 0);
  });
  return { row, share, demandN, far, force, pressN };
}

function rowBars(own: BoltedSideCase, farCase: SideCase | undefined, steps: boolean): RowBar[] {
  return own.model.joint.view.tensionRows.flatMap((row, index) => {
    const share = own.model.barForceShares[index];
    return share ? [rowBar(own, index, share, row, farCase, steps)] : [];
  });
}

/** How much the bars add to the compression on the far side's web, N: moments turning the same way. */
export function barPressN(own: SideCase, far: SideCase | undefined): number {
  if (!isBoltedCase(own) || !far) return 0;
  return rowBars(own, far, false).reduce((sum, { pressN }) => sum + pressN, 0);
}

function tensionCheck(
  node: NodeCase,
  panel: ColumnPanel,
  own: BoltedSideCase,
  entry: RowBar,
  steps: boolean,
): ComponentCheck {
  const { row } = entry;
  const { size, tension } = row.fastener;
  const limit = traced(steps, (trace) => {
    trace?.include(tension.step);
    const punching = punchingN(trace, {
      meanDiameterMm: (size.acrossFlatsMm + size.acrossPointsMm) / 2,
      thicknessMm: panel.section.flangeThicknessMm,
      ultimateMpa: panel.steel.ultimateMpa,
      gammaM2: node.partialFactors.gammaM2,
    });
    return modeThreeN(trace, { count: 2, tensionN: tension.value, punchingN: punching }, 0);
  });
  return checkOf(
    {
      component: "bar-tension",
      side: own.model.joint.view.joint.side,
      level: own.model.joint.view.tensionLevel,
      row: row.row,
      loadCase: own.loadCase.name,
      clause: CLAUSE,
    },
    entry.force.value,
    limit,
    { demandStep: entry.force.step },
  );
}

function farFlangeCheck(
  node: NodeCase,
  panel: ColumnPanel,
  own: BoltedSideCase,
  entry: RowBar,
  steps: boolean,
): ComponentCheck | null {
  const inwardN = entry.force.value - Math.max(entry.far.forceN, 0);
  if (entry.far.isCompression || inwardN <= 0) return null;
  const { family, mMm } = own.model.joint.flange;
  const place = own.model.joint.view.tensionRows.indexOf(entry.row);
  const lengthMm = family.alone[place]?.lengthOneMm.value ?? 0;
  const limit = traced(steps, (trace) => {
    const momentNmm = tStubMomentNmm(trace, {
      lengthMm,
      thicknessMm: panel.section.flangeThicknessMm,
      yieldMpa: panel.steel.yieldMpa,
      gammaM0: node.partialFactors.gammaM0,
    });
    const flangeN = bar.farFlangeN(trace, { momentNmm, mMm }, 0);
    return farSideN(
      trace,
      {
        flangeN,
        lengthMm,
        webMm: panel.section.webThicknessMm,
        yieldMpa: panel.steel.yieldMpa,
        gammaM0: node.partialFactors.gammaM0,
      },
      0,
    );
  });
  return checkOf(
    {
      component: "far-flange",
      side: opposite(own.model.joint.view.joint.side),
      level: own.model.joint.view.tensionLevel,
      row: entry.row.row,
      loadCase: own.loadCase.name,
      clause: CLAUSE,
      what: "far flange and web under the bar's pull",
    },
    inwardN,
    limit,
  );
}

/** Bars, nuts, punching, far side and bar buckling of one side in one load case. */
export function barChecks(
  node: NodeCase,
  panel: ColumnPanel,
  own: SideCase,
  far: SideCase | undefined,
  steps: boolean,
): ComponentCheck[] {
  if (!isBoltedCase(own)) return [];
  const { view } = own.model.joint;
  const checks = rowBars(own, far, steps).flatMap((entry) => {
    const farCheck = farFlangeCheck(node, panel, own, entry, steps);
    return [tensionCheck(node, panel, own, entry, steps), ...(farCheck ? [farCheck] : [])];
  });
  const compression = own.model.barCompression;
  if (compression) {
    const force = traced(steps, (trace) => {
      trace?.include(compression.forceShare.step);
      return bar.barCompressionForceN(
        trace,
        { share: compression.forceShare.value, forceN: Math.max(own.compressionDemandN, 0) },
        0,
      );
    });
    checks.push(
      checkOf(
        {
          component: "bar-compression",
          side: view.joint.side,
          level: view.compressionLevel,
          loadCase: own.loadCase.name,
          clause: CLAUSE,
        },
        force.value,
        compression.buckling,
        { demandStep: force.step },
      ),
    );
  }
  return checks;
}
