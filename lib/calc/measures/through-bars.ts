import {
  ELASTIC_MODULUS_MPA,
  curveCReduction,
  epsilonOf,
  strutSlenderness,
} from "../clauses/en1993-1-1-2005/members";
import { circularMm, patternMm } from "../clauses/en1993-1-8-2005/yield-lines";
import {
  flangeSpringMm,
  webCompressionSpringMm,
  webTensionSpringMm,
} from "../clauses/en1993-1-8-2005/stiffness";
import type { BoltedJoint } from "../components/bolted-joint";
import type { ColumnPanel } from "../components/column-panel";
import { levelOfRow, type BoltRow } from "../components/connection-view";
import { areFacing, columnBeyondMm } from "../mechanics/panel-levels";
import * as bar from "../mechanics/through-bar-formulas";
import type { EndPlateConnection, JointCase, Level, NodeCase } from "../node";
import { OutsideScope } from "../outcome";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import {
  SAME_HEIGHT_MM,
  isBarRow,
  placedAt,
  type ApplyMeasure,
  type PanelDesign,
  type ThroughBars,
} from "./panel-design";

/** Threaded bars in place of the bolts at the named levels. @throws OutsideScope without inner nuts. */
export const applyThroughBars: ApplyMeasure<ThroughBars> = (design, measure) => {
  if (!measure.innerNuts) {
    throw new OutsideScope(
      "bars without inner nuts are shown for information only and never proposed: they take the whole force of the tension zone past the column (under equal moments the web's tension vanishes), but the compression zone gets no help, the joint is softer by the bars' free length, and under a moment on one side the whole force pushes on the far flange",
    );
  }
  return { ...design, bars: placedAt(design.bars, measure.at ?? "both", measure.levels, measure) };
};

const refuse = (bound: string): never => {
  throw new OutsideScope(`outside the bounds of the through-bar model: ${bound}`);
};

/** Length between the middles of the inner nuts, mm. */
const innerLengthMm = (panel: ColumnPanel, bars: ThroughBars): number =>
  panel.section.depthMm - 2 * panel.section.flangeThicknessMm - bars.size.nutHeightMm;

function refuseOutsideColumnBounds(panel: ColumnPanel, gaugeMm: number, bars: ThroughBars): void {
  const { section } = panel;
  if (section.make !== "rolled") refuse("hot-rolled columns only");
  if (section.depthMm < 200 || section.depthMm > 400)
    refuse(`column depth 200 to 400 mm (${section.depthMm} mm)`);
  const ratio = ((gaugeMm - section.webThicknessMm) / 2 - 0.8 * section.rootMm) / section.flangeThicknessMm;
  if (ratio < 2 || ratio > 4.6) refuse(`m / t_f 2 to 4.6 (${ratio.toFixed(2)})`);
  if (bars.size.diameterMm < 16 || bars.size.diameterMm > 30) refuse(`bars M16 to M30 (${bars.size.name})`);
  if (gaugeMm < 100 || gaugeMm > 180) refuse(`gauge 100 to 180 mm (${gaugeMm} mm)`);
  const room = (gaugeMm - section.webThicknessMm) / 2 - section.rootMm;
  if (room < bars.size.acrossPointsMm / 2) refuse("the inner nut rides on the root radius");
}

function endPlateOfJoint(joint: JointCase): EndPlateConnection {
  const { connection } = joint;
  return connection.kind === "end-plate" ? connection : refuse("bolted end plates only");
}

/** Heights of a joint's rows of bars at one of its levels, mm below the top of the left beam. */
const rowHeightsMm = (
  joint: JointCase,
  connection: EndPlateConnection,
  level: Level,
  bars: ThroughBars,
): readonly number[] =>
  connection.bolts.rowsMm
    .filter((row) => levelOfRow(row, joint.beam.section.depthMm) === level)
    .map((row) => joint.levelOffsetMm + row)
    .filter((heightMm) => isBarRow(bars, heightMm));

function refuseOutsideRowBounds(
  node: NodeCase,
  panel: ColumnPanel,
  connection: EndPlateConnection,
  joint: JointCase,
  level: Level,
  bars: ThroughBars,
): void {
  const { perRow } = connection.bolts;
  if (perRow !== 2) refuse(`two bars a row (${perRow})`);
  const { thicknessMm } = connection.plate;
  if (thicknessMm < 12 || thicknessMm > 30) refuse(`end plate 12 to 30 mm (${thicknessMm} mm)`);
  const bottom = joint.levelOffsetMm + joint.beam.section.depthMm;
  const rows = rowHeightsMm(joint, connection, level, bars);
  if (rows.length === 0)
    throw new OutsideScope(`there is no bolt row at the ${level} level for bars to replace`);
  const needed = 1.6 * panel.section.depthMm;
  const beyond = columnBeyondMm(node, joint);
  for (const row of rows) {
    if (beyond.top + row - joint.levelOffsetMm < needed || beyond.bottom + bottom - row < needed) {
      refuse("rows at least 1.6 column depths from the column's end");
    }
  }
}

/** Bars of one beam that reach the column's other flange must meet rows of their own there, or nothing at all. */
function refuseBlockedFarSide(
  own: JointCase,
  ownPlate: EndPlateConnection,
  far: JointCase,
  level: Level,
  bars: ThroughBars,
): void {
  const farPlate = endPlateOfJoint(far);
  const rows = rowHeightsMm(own, ownPlate, level, bars);
  const farRows = farPlate.bolts.rowsMm.map((row) => far.levelOffsetMm + row);
  const top = far.levelOffsetMm - farPlate.plate.extensionTopMm;
  const bottom = far.levelOffsetMm + far.beam.section.depthMm + farPlate.plate.extensionBottomMm;
  const half = bars.size.washerDiameterMm / 2;
  const isFree = rows.every((row) => row + half <= top || row - half >= bottom);
  if (isFree && !areFacing(own, far, level)) return;
  const facing = rowHeightsMm(far, farPlate, level, bars);
  const isSame =
    areFacing(own, far, level) &&
    ownPlate.bolts.gaugeMm === farPlate.bolts.gaugeMm &&
    rows.length === facing.length &&
    rows.every((row) => farRows.some((other) => Math.abs(row - other) < SAME_HEIGHT_MM));
  if (!isSame) refuse("the same rows and gauge left and right");
}

/** @throws OutsideScope naming the bound that a level of bars breaks. */
export function refuseOutsideBarBounds(node: NodeCase, design: PanelDesign, panel: ColumnPanel): void {
  for (const joint of node.joints) {
    for (const level of ["top", "bottom"] as const) {
      const bars = design.bars[joint.side][level];
      if (!bars) continue;
      if (design.stiffeners[joint.side][level]) refuse("no bars at the level of a stiffener");
      const connection = endPlateOfJoint(joint);
      refuseOutsideColumnBounds(panel, connection.bolts.gaugeMm, bars);
      refuseOutsideRowBounds(node, panel, connection, joint, level, bars);
      for (const far of node.joints)
        if (far !== joint) refuseBlockedFarSide(joint, connection, far, level, bars);
    }
  }
}

/** q of one row: its length in the group of bar rows over its length alone. */
function groupShare(joint: BoltedJoint, index: number): number {
  const alone = joint.flange.family.alone[index]?.shortestByRowMm[0];
  const rows = joint.view.tensionRows;
  let best: { count: number; length: number } | null = null;
  for (const ending of joint.flange.family.groupsEndingAt) {
    for (const { first, part } of ending) {
      const inside = index >= first && index < first + part.rows.length;
      const allBars = rows.slice(first, first + part.rows.length).every((row) => row.fastener.bars !== null);
      const length = part.shortestByRowMm[index - first];
      if (inside && allBars && length !== undefined && (!best || part.rows.length > best.count)) {
        best = { count: part.rows.length, length };
      }
    }
  }
  return best && alone ? Math.min(1, best.length / alone) : 1;
}

/**
 * Share eta of each tension row that bars hold; null for a row of bolts.
 *
 * @param webMm - the web's thickness: the stiffest it may be for the relief, the plain one for the bars' force.
 */
export function barTensionShares(
  panel: ColumnPanel,
  joint: BoltedJoint,
  webMm: number,
  steps: boolean,
): readonly (Traced | null)[] {
  const { section, properties } = panel;
  return joint.view.tensionRows.map((row, index) => {
    const bars = row.fastener.bars;
    if (!bars) return null;
    return traced(steps, (trace) => {
      const flangeSpring = bar.barFlangeSpringMm(trace, {
        flangeMm: section.flangeThicknessMm,
        mMm: joint.flange.mMm,
      });
      const webSpring = bar.barWebSpringMm(trace, {
        webMm,
        flangeMm: section.flangeThicknessMm,
        rootMm: section.rootMm,
        depthMm: section.depthMm,
        webDepthMm: properties.webDepthMm,
      });
      const columnNPerMm = bar.barColumnStiffnessNPerMm(
        trace,
        {
          share: groupShare(joint, index),
          elasticMpa: ELASTIC_MODULUS_MPA,
          flangeSpringMm: flangeSpring,
          webSpringMm: webSpring,
        },
        0,
      );
      const barNPerMm = barStiffness(trace, panel, bars);
      return bar.barShareTension(trace, { barNPerMm, columnNPerMm }, 0);
    });
  });
}

const barStiffness = (trace: Trace | null, panel: ColumnPanel, bars: ThroughBars): number =>
  bar.barStiffnessNPerMm(trace, {
    count: 2,
    elasticMpa: ELASTIC_MODULUS_MPA,
    stressAreaMm2: bars.size.stressAreaMm2,
    lengthMm: innerLengthMm(panel, bars),
  });

/** Bars beside the compression flange: what they take and what they withstand. */
export interface BarCompression {
  /** For the column's relief: the least it may be. */
  readonly share: Traced;
  /** For the bars' own force: the most it may be. The same without a web plate. */
  readonly forceShare: Traced;
  /** x of the further row. */
  readonly distanceRatio: number;
  readonly buckling: Traced;
}

/** Thickness of web where the beam flange presses, and where the bars' row stands. */
interface BarWebs {
  readonly pressedMm: number;
  readonly besideMm: number;
}

function compressionShare(
  trace: Trace | null,
  panel: ColumnPanel,
  joint: BoltedJoint,
  bars: ThroughBars,
  distanceRatio: number,
  webs: BarWebs,
): number {
  const { section, properties } = panel;
  const { mMm } = joint.flange;
  const eMm = (section.widthMm - joint.view.gaugeMm) / 2;
  const mark = trace?.mark();
  const lengthMm = Math.min(circularMm(null, { mMm }), patternMm(null, { mMm, eMm }));
  const flangeSpring = flangeSpringMm(trace, { lengthMm, thicknessMm: section.flangeThicknessMm, mMm });
  const webSpring = webTensionSpringMm(trace, {
    breadthMm: lengthMm,
    thicknessMm: webs.besideMm,
    webDepthMm: properties.webDepthMm,
  });
  const columnNPerMm = bar.barColumnCompressionNPerMm(
    trace,
    { elasticMpa: ELASTIC_MODULUS_MPA, flangeSpringMm: flangeSpring, webSpringMm: webSpring },
    mark,
  );
  const compressionSpringMm = webCompressionSpringMm(trace, {
    breadthMm: joint.compression.breadth.value,
    thicknessMm: webs.pressedMm,
    webDepthMm: properties.webDepthMm,
  });
  const barNPerMm = barStiffness(trace, panel, bars);
  return bar.barShareCompression(
    trace,
    {
      distanceRatio,
      barNPerMm,
      elasticMpa: ELASTIC_MODULUS_MPA,
      compressionSpringMm,
      columnNPerMm,
    },
    mark,
  );
}

function barBuckling(trace: Trace | null, node: NodeCase, panel: ColumnPanel, bars: ThroughBars): number {
  const diameterMm = Math.sqrt((4 * bars.size.stressAreaMm2) / Math.PI);
  const slenderness = strutSlenderness(trace, {
    bucklingLengthMm: 0.7 * innerLengthMm(panel, bars),
    gyrationMm: diameterMm / 4,
    epsilon: epsilonOf(null, { yieldMpa: bars.grade.yieldMpa }),
  });
  return bar.barBucklingN(
    trace,
    {
      count: 2,
      reduction: curveCReduction(trace, { slenderness }),
      stressAreaMm2: bars.size.stressAreaMm2,
      yieldMpa: bars.grade.yieldMpa,
      gammaM1: node.partialFactors.gammaM1,
    },
    0,
  );
}

/** Bars at the joint's compression level; null where there are none or a stiffener takes the force. */
export function barCompressionOf(
  node: NodeCase,
  panel: ColumnPanel,
  joint: BoltedJoint,
  steps: boolean,
): BarCompression | null {
  const { view, compression } = joint;
  const near = view.rows.filter((row) => row.level === view.compressionLevel && row.fastener.bars);
  const bars = near[0]?.fastener.bars;
  if (!bars || !Number.isFinite(compression.spring.value)) return null;
  const { depthMm, flangeThicknessMm } = view.joint.beam.section;
  const middle = depthMm - flangeThicknessMm / 2;
  const nearest = (rows: readonly BoltRow[]): number =>
    Math.min(...rows.map((row) => Math.abs(row.fromFaceMm - middle)), Infinity);
  const inner = nearest(near.filter((row) => row.fromFaceMm < middle));
  const outer = nearest(near.filter((row) => row.fromFaceMm >= middle));
  const half = compression.breadth.value / 2;
  const isBothSides = Number.isFinite(inner) && Number.isFinite(outer) && Math.max(inner, outer) / half <= 1;
  const distanceRatio = (isBothSides ? Math.max(inner, outer) : Math.min(inner, outer)) / half;
  const shareOf = (webs: BarWebs): Traced =>
    traced(steps, (trace) => {
      trace?.include(compression.breadth.step);
      const one = compressionShare(trace, panel, joint, bars, distanceRatio, webs);
      return isBothSides ? bar.barShareBothSides(trace, { share: one }, 0) : one;
    });
  const plainMm = panel.section.webThicknessMm;
  const { stiffestWebMm } = panel;
  const share = shareOf({ pressedMm: stiffestWebMm, besideMm: plainMm });
  return {
    share,
    forceShare: stiffestWebMm === plainMm ? share : shareOf({ pressedMm: plainMm, besideMm: stiffestWebMm }),
    distanceRatio,
    buckling: traced(steps, (trace) => barBuckling(trace, node, panel, bars)),
  };
}
