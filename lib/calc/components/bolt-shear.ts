import {
  bearingAlongFactor,
  bearingEdgeFactor,
  bearingN,
  boltShearN,
} from "../clauses/en1993-1-8-2005/fasteners";
import type { NodeCase } from "../node";
import { defineFormula } from "../trace/define-formula";
import { defineSeries, sumText } from "../trace/define-series";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import { rowEnds } from "./column-flange";
import type { ColumnPanel } from "./column-panel";
import type { CleatView } from "./cleat-view";
import type { BoltRow, BoltedView, EndPlateView } from "./connection-view";

/** Share of its shear resistance that a bolt in full tension keeps. EN 1993-1-8:2005, 6.2.2(2). */
const TENSION_ROW_SHARE = 0.4 / 1.4;

const boltsOfRowN = defineFormula({
  id: "en1993-1-8:2005/6.2.2/row in shear",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "6.2.2(2), Table 3.4: two bolts, in shear (0.4/1.4 of it in a tension row) and in bearing on plate and flange",
  },
  symbols: {
    share: ["share", "1"],
    shearN: ["F_v,Rd", "N"],
    plateN: ["F_b,Rd plate", "N"],
    flangeN: ["F_b,Rd flange", "N"],
  },
  result: ["V_r,Rd", "N"],
  expression: "2 * min(share * shearN, plateN, flangeN)",
  evaluate: (g) => 2 * Math.min(g.share * g.shearN, g.plateN, g.flangeN),
  example: {
    given: { share: 0.5, shearN: 100_000, plateN: 80_000, flangeN: 90_000 },
    gives: 100_000,
    relTol: 1e-12,
  },
});

const shearOfRowsN = defineSeries({
  terms: ["rowN"],
  exampleCount: 2,
  evaluate: ({ rowN }) => rowN.reduce((sum, row) => sum + row, 0),
  build: (count) => ({
    id: "en1993-1-8:2005/6.2.2/bolts in shear",
    source: { document: "EN 1993-1-8", edition: "2005", ref: "6.2.2(2)" },
    symbols: Object.fromEntries(
      Array.from({ length: count }, (_, index) => [`rowN${index + 1}`, [`V_${index + 1},Rd`, "N"] as const]),
    ),
    result: ["V_Rd", "N"],
    expression: sumText(count, (n) => `rowN${n}`),
  }),
  example: { given: { rowN: [200_000, 60_000] }, gives: 260_000, relTol: 1e-12 },
});

/** Bearing of one bolt on plate or flange, N, for shear along the column. */
function bearing(
  trace: Trace | null,
  node: NodeCase,
  row: BoltRow,
  part: {
    readonly endMm: number;
    readonly pitchMm: number;
    readonly edgeMm: number;
    readonly gaugeMm: number;
    readonly thicknessMm: number;
    readonly ultimateMpa: number;
  },
): number {
  const { size, grade } = row.fastener;
  const mark = trace?.mark();
  const edgeFactor = bearingEdgeFactor(trace, {
    edgeMm: part.edgeMm,
    acrossMm: part.gaugeMm,
    holeMm: size.holeMm,
  });
  const bearingFactor = bearingAlongFactor(trace, {
    endMm: part.endMm,
    pitchMm: part.pitchMm,
    holeMm: size.holeMm,
    boltUltimateMpa: grade.ultimateMpa,
    ultimateMpa: part.ultimateMpa,
  });
  return bearingN(
    trace,
    {
      edgeFactor,
      bearingFactor,
      ultimateMpa: part.ultimateMpa,
      diameterMm: size.diameterMm,
      thicknessMm: part.thicknessMm,
      gammaM2: node.partialFactors.gammaM2,
    },
    mark,
  );
}

/** Stands for "no end in reach" in the bearing factors: far beyond any end distance that could govern. */
const NO_END_MM = 100_000;

/** What one row's bolts bear on beside the column's flange: distances in the direction of the shear and across it. */
export interface BearingPart {
  readonly endMm: number;
  readonly edgeMm: number;
  readonly thicknessMm: number;
  readonly ultimateMpa: number;
}

/** An end plate, under a shear along the column. */
export function plateBearing(view: EndPlateView, row: BoltRow): BearingPart {
  const { plate } = view.connection;
  const below = view.joint.beam.section.depthMm + plate.extensionBottomMm - row.belowTopMm;
  return {
    endMm: Math.min(row.belowTopMm + plate.extensionTopMm, below),
    edgeMm: (plate.widthMm - view.gaugeMm) / 2,
    thicknessMm: plate.thicknessMm,
    ultimateMpa: plate.steel.ultimateMpa,
  };
}

/** The leg of an angle, under a shear along the column. */
export function legBearing(view: CleatView): BearingPart {
  const { cleat, bolts } = view.connection;
  return {
    endMm: cleat.columnLegMm - bolts.distanceMm,
    edgeMm: (cleat.lengthMm - view.gaugeMm) / 2,
    thicknessMm: cleat.thicknessMm,
    ultimateMpa: cleat.steel.ultimateMpa,
  };
}

function rowShear(
  trace: Trace | null,
  node: NodeCase,
  panel: ColumnPanel,
  view: BoltedView,
  row: BoltRow,
  part: BearingPart,
  pitchMm: number,
): number {
  const { size, grade, reduction } = row.fastener;
  const ends = rowEnds(view, row);
  const mark = trace?.mark();
  const shearN = boltShearN(trace, {
    alphaV: grade.alphaV,
    ultimateMpa: grade.ultimateMpa,
    stressAreaMm2: size.stressAreaMm2,
    reduction,
    gammaM2: node.partialFactors.gammaM2,
  });
  const plateN = bearing(trace, node, row, {
    pitchMm,
    gaugeMm: view.gaugeMm,
    endMm: part.endMm,
    edgeMm: part.edgeMm,
    thicknessMm: part.thicknessMm,
    ultimateMpa: part.ultimateMpa,
  });
  const flangeN = bearing(trace, node, row, {
    pitchMm,
    gaugeMm: view.gaugeMm,
    endMm: Math.min(ends.outwardMm, ends.inwardMm, NO_END_MM),
    edgeMm: (panel.section.widthMm - view.gaugeMm) / 2,
    thicknessMm: panel.section.flangeThicknessMm,
    ultimateMpa: panel.steel.ultimateMpa,
  });
  return boltsOfRowN(trace, { share: row.isTension ? TENSION_ROW_SHARE : 1, shearN, plateN, flangeN }, mark);
}

/** Vertical shear that rows of bolts of a joint carry beside the moment, N. 6.2.2, Table 3.4. `partOf` = what a row bears on. */
export function boltShearResistance(
  node: NodeCase,
  panel: ColumnPanel,
  view: BoltedView,
  rows: readonly BoltRow[],
  partOf: (row: BoltRow) => BearingPart,
  steps: boolean,
): Traced {
  const byHeight = [...rows].sort((a, b) => a.belowTopMm - b.belowTopMm);
  const toNeighbour = (row: BoltRow, other: BoltRow | undefined): number =>
    other ? Math.abs(other.belowTopMm - row.belowTopMm) : NO_END_MM;
  return traced(steps, (trace) => {
    const rowN = byHeight.map((row, index) => {
      const pitchMm = Math.min(toNeighbour(row, byHeight[index - 1]), toNeighbour(row, byHeight[index + 1]));
      return rowShear(trace, node, panel, view, row, partOf(row), pitchMm);
    });
    return shearOfRowsN(trace, { rowN }, 0);
  });
}
