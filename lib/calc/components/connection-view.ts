import { boltTensionN } from "../clauses/en1993-1-8-2005/fasteners";
import { columnBeyondMm } from "../mechanics/panel-levels";
import {
  isBarRow,
  type BackingPlates,
  type PanelDesign,
  type ThroughBars,
  type TransverseStiffeners,
} from "../measures/panel-design";
import type {
  EndPlateConnection,
  FastenerGrade,
  FastenerSize,
  JointCase,
  Level,
  NodeCase,
  Weld,
} from "../node";
import { OutsideScope } from "../outcome";
import { traced, type Traced } from "../trace/traced";

/**
 * A joint seen with its tension flange first: a reversed moment turns the same joint upside down,
 * and every component reads it the same way round.
 */
export interface JointView {
  readonly joint: JointCase;
  readonly tensionLevel: Level;
  readonly compressionLevel: Level;
  readonly tensionWeld: Weld;
  readonly compressionWeld: Weld;
  /** From the middle of the tension flange to the column's end beyond it; Infinity where it is continuous. */
  readonly columnBeyondTensionMm: number;
  readonly columnBeyondCompressionMm: number;
  /** The stiffener pair in line with each flange. */
  readonly tensionStiffener: TransverseStiffeners | null;
  readonly compressionStiffener: TransverseStiffeners | null;
  /** Cosine of the slope of the pair in line with each flange; 1 where it is level. */
  readonly tensionSlopeCosine: number;
  readonly compressionSlopeCosine: number;
  /** Plates behind this joint's column flange. */
  readonly backing: Readonly<Record<Level, BackingPlates | null>>;
}

/** What holds one bolt row together: its bolts, or the threaded bars that replace them. */
export interface RowFastener {
  readonly size: FastenerSize;
  readonly grade: FastenerGrade;
  /** 0.85 for threads not known to be to EN 1090, 3.6.1(3). */
  readonly reduction: number;
  /** What stands at the column flange's inside: a nut; and at the plate: a head, or a second nut on a bar. */
  readonly headHeightMm: number;
  readonly tension: Traced;
  readonly bars: ThroughBars | null;
}

export interface BoltRow {
  /** 1 = first in `bolts.rows`. */
  readonly row: number;
  /** Below the outer face of the beam's top flange. */
  readonly belowTopMm: number;
  /** From the outer face of the tension flange towards the compression flange; negative outside it. */
  readonly fromFaceMm: number;
  /** To the centre of compression. */
  readonly leverMm: number;
  readonly level: Level;
  readonly fastener: RowFastener;
  readonly isTension: boolean;
}

/** A joint bolted to the column's flange. */
export interface BoltedView extends JointView {
  readonly gaugeMm: number;
  /** What lies on the column's flange: the end plate, or the leg of an angle. */
  readonly attachment: {
    readonly thicknessMm: number;
    readonly widthMm: number;
    readonly yieldMpa: number;
    readonly isPreloaded: boolean;
  };
  /** Every row, furthest from the centre of compression first. */
  readonly rows: readonly BoltRow[];
  /** Those that take tension. */
  readonly tensionRows: readonly BoltRow[];
}

export interface EndPlateView extends BoltedView {
  readonly connection: EndPlateConnection;
  readonly extensionTensionMm: number;
  readonly extensionCompressionMm: number;
}

/** Cut threads not known to be to EN 1090. EN 1993-1-8:2005, 3.6.1(3). */
export const CUT_THREAD_REDUCTION = 0.85;
/** Rows nearer the centre of compression than this share of the beam's depth carry shear. Common practice, no source. */
const SHEAR_ROW_SHARE = 0.25;

const other = (level: Level): Level => (level === "top" ? "bottom" : "top");
/** Angles are bolted to the beam: no weld of theirs has a leg, as a butt weld has none. */
const NO_WELD: Weld = { kind: "butt" };
const flangeWeld = ({ connection }: JointCase, level: Level): Weld => {
  if (connection.kind === "flange-cleats") return NO_WELD;
  return level === "top" ? connection.welds.topFlange : connection.welds.bottomFlange;
};

/** The joint with its tension flange at `tensionLevel`. */
export function jointViewOf(
  node: NodeCase,
  design: PanelDesign,
  joint: JointCase,
  tensionLevel: Level,
): JointView {
  const half = joint.beam.section.flangeThicknessMm / 2;
  const beyond = columnBeyondMm(node, joint);
  const compressionLevel = other(tensionLevel);
  const slopeAt = (at: Level): number =>
    design.pairs.find(({ level, sides }) => level === at && sides.includes(joint.side))?.slopeCosine ?? 1;
  return {
    joint,
    tensionLevel,
    compressionLevel,
    tensionWeld: flangeWeld(joint, tensionLevel),
    compressionWeld: flangeWeld(joint, compressionLevel),
    columnBeyondTensionMm: beyond[tensionLevel] + half,
    columnBeyondCompressionMm: beyond[compressionLevel] + half,
    tensionStiffener: design.stiffeners[joint.side][tensionLevel],
    compressionStiffener: design.stiffeners[joint.side][compressionLevel],
    tensionSlopeCosine: slopeAt(tensionLevel),
    compressionSlopeCosine: slopeAt(compressionLevel),
    backing: design.backing[joint.side],
  };
}

/** Level of the flange that a row stands nearer to. */
export const levelOfRow = (belowTopMm: number, beamDepthMm: number): Level =>
  belowTopMm < beamDepthMm / 2 ? "top" : "bottom";

/** Bolts, or the bars in their place. */
export function fastenerOf(
  node: NodeCase,
  bolts: { readonly size: FastenerSize; readonly grade: FastenerGrade },
  bars: ThroughBars | null,
  steps: boolean,
): RowFastener {
  const { size, grade } = bars ?? bolts;
  const reduction = bars ? CUT_THREAD_REDUCTION : 1;
  return {
    size,
    grade,
    reduction,
    headHeightMm: bars ? size.nutHeightMm : size.headHeightMm,
    tension: traced(steps, (trace) =>
      boltTensionN(trace, {
        ultimateMpa: grade.ultimateMpa,
        stressAreaMm2: size.stressAreaMm2,
        reduction,
        gammaM2: node.partialFactors.gammaM2,
      }),
    ),
    bars,
  };
}

const barsInRow = (fastener: RowFastener | null, heightMm: number): RowFastener | null =>
  fastener?.bars && isBarRow(fastener.bars, heightMm) ? fastener : null;

/** A bolted end plate with its tension flange at `tensionLevel`. @throws OutsideScope where no row can take tension. */
export function endPlateViewOf(
  node: NodeCase,
  design: PanelDesign,
  joint: JointCase,
  connection: EndPlateConnection,
  tensionLevel: Level,
  steps: boolean,
): EndPlateView {
  const view = jointViewOf(node, design, joint, tensionLevel);
  const { depthMm, flangeThicknessMm } = joint.beam.section;
  const { top, bottom } = design.bars[joint.side];
  const fasteners = {
    bolts: fastenerOf(node, connection.bolts, null, steps),
    top: top ? fastenerOf(node, connection.bolts, top, steps) : null,
    bottom: bottom ? fastenerOf(node, connection.bolts, bottom, steps) : null,
  };
  const rows = connection.bolts.rowsMm
    .map((belowTopMm, index): BoltRow => {
      const fromFaceMm = tensionLevel === "top" ? belowTopMm : depthMm - belowTopMm;
      const leverMm = depthMm - flangeThicknessMm / 2 - fromFaceMm;
      const level = levelOfRow(belowTopMm, depthMm);
      return {
        row: index + 1,
        belowTopMm,
        fromFaceMm,
        leverMm,
        level,
        fastener: barsInRow(fasteners[level], joint.levelOffsetMm + belowTopMm) ?? fasteners.bolts,
        isTension: leverMm >= SHEAR_ROW_SHARE * depthMm,
      };
    })
    .sort((a, b) => b.leverMm - a.leverMm);
  const tensionRows = rows.filter((row) => row.isTension);
  if (tensionRows.length === 0) {
    throw new OutsideScope("no bolt row stands far enough from the compression flange to take tension");
  }
  if (tensionRows.filter((row) => row.fromFaceMm < 0).length > 1) {
    throw new OutsideScope("more than one bolt row stands outside the tension flange (Table 6.6 covers one)");
  }
  const { extensionTopMm, extensionBottomMm } = connection.plate;
  return {
    joint,
    tensionLevel,
    compressionLevel: view.compressionLevel,
    tensionWeld: view.tensionWeld,
    compressionWeld: view.compressionWeld,
    columnBeyondTensionMm: view.columnBeyondTensionMm,
    columnBeyondCompressionMm: view.columnBeyondCompressionMm,
    tensionStiffener: view.tensionStiffener,
    compressionStiffener: view.compressionStiffener,
    tensionSlopeCosine: view.tensionSlopeCosine,
    compressionSlopeCosine: view.compressionSlopeCosine,
    backing: view.backing,
    connection,
    gaugeMm: connection.bolts.gaugeMm,
    attachment: {
      thicknessMm: connection.plate.thicknessMm,
      widthMm: connection.plate.widthMm,
      yieldMpa: connection.plate.steel.yieldMpa,
      isPreloaded: connection.bolts.preloaded,
    },
    extensionTensionMm: tensionLevel === "top" ? extensionTopMm : extensionBottomMm,
    extensionCompressionMm: tensionLevel === "top" ? extensionBottomMm : extensionTopMm,
    rows,
    tensionRows,
  };
}
