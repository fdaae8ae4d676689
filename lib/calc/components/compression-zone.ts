import {
  ELASTIC_MODULUS_MPA,
  curveCReduction,
  epsilonOf,
  strutSlenderness,
} from "../clauses/en1993-1-1-2005/members";
import * as stiffenerRules from "../clauses/en1993-1-5-2006/stiffeners";
import { cleatBreadthMm } from "../clauses/en1993-1-8-2005/flange-cleat";
import * as web from "../clauses/en1993-1-8-2005/column-web";
import { webCompressionSpringMm } from "../clauses/en1993-1-8-2005/stiffness";
import { alongSlopeN } from "../mechanics/sloped-plates";
import { relievedN } from "../mechanics/through-bar-formulas";
import { weldLegMm, type TransverseStiffeners } from "../measures/panel-design";
import type { NodeCase } from "../node";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import type { ColumnPanel } from "./column-panel";
import type { EndPlateView, JointView } from "./connection-view";

/** The column web behind the compression flange: what no load case changes. */
export interface CompressionZone {
  readonly breadth: Traced;
  readonly rho: Traced;
  readonly stiffener: StiffenedZone | null;
  /** k_2, mm; Infinity behind a full-depth stiffener. */
  readonly spring: Traced;
}

export interface StiffenedZone {
  readonly stiffener: TransverseStiffeners;
  readonly crushing: Traced;
  /** Null for a partial-depth pair, which does not hold the web against buckling. */
  readonly buckling: Traced | null;
  /** Part of the flange force that the plates take, the rest going straight into the web. */
  readonly plateShare: number;
}

function breadthOf(panel: ColumnPanel, view: JointView | EndPlateView, steps: boolean): Traced {
  const { connection } = view.joint;
  if (connection.kind === "flange-cleats") {
    const { thicknessMm, rootMm } = connection.cleat;
    const column = { columnFlangeMm: panel.section.flangeThicknessMm, rootMm: panel.section.rootMm };
    return traced(steps, (trace) =>
      cutAtColumnEnd(
        trace,
        cleatBreadthMm(trace, { legMm: thicknessMm, angleRootMm: rootMm, ...column }, 0),
        view,
      ),
    );
  }
  const weldLeg = weldLegMm(view.compressionWeld);
  const common = {
    beamFlangeMm: view.joint.beam.section.flangeThicknessMm,
    weldLegMm: weldLeg,
    columnFlangeMm: panel.section.flangeThicknessMm,
    rootMm: panel.section.rootMm,
  };
  return traced(steps, (trace) => {
    const full =
      "connection" in view
        ? web.endPlateBreadthMm(
            trace,
            {
              ...common,
              plateSpreadMm: web.plateSpreadMm(trace, {
                thicknessMm: view.connection.plate.thicknessMm,
                extensionMm: view.extensionCompressionMm,
                weldLegMm: weldLeg,
              }),
            },
            0,
          )
        : web.weldedBreadthMm(trace, common, 0);
    return cutAtColumnEnd(trace, full, view);
  });
}

/** The web that is really there beside the compression flange. */
function cutAtColumnEnd(trace: Trace | null, full: number, view: JointView): number {
  const near = view.columnBeyondCompressionMm;
  if (near >= full / 2) return full;
  return web.truncatedBreadthMm(
    trace,
    { fullMm: full, aboveMm: near, belowMm: view.joint.beam.section.depthMm },
    0,
  );
}

/** Full-depth: buckling of the cruciform over the whole web height. EN 1993-1-5:2006, 9.1, 9.4; length 1.0 h_w. */
function cruciformBuckling(
  trace: Trace | null,
  node: NodeCase,
  panel: ColumnPanel,
  stiffener: TransverseStiffeners,
  view: JointView,
): number {
  const columnBeyondMm = view.columnBeyondCompressionMm;
  const slopeCosine = view.compressionSlopeCosine;
  const yieldMpa = Math.min(stiffener.steel.yieldMpa, panel.steel.yieldMpa);
  const { webThicknessMm, depthMm, flangeThicknessMm } = panel.section;
  const epsilon = epsilonOf(trace, { yieldMpa });
  const full = stiffenerRules.cruciformWebMm(trace, { epsilon, webThicknessMm });
  const webLengthMm =
    columnBeyondMm >= full / 2
      ? full
      : web.truncatedBreadthMm(trace, { fullMm: full, aboveMm: columnBeyondMm, belowMm: full });
  const { widthMm, thicknessMm } = stiffener;
  const areaMm2 = stiffenerRules.cruciformAreaMm2(trace, {
    widthMm,
    thicknessMm,
    webThicknessMm: panel.compressionWebMm,
    webLengthMm,
  });
  // A web plate under the stiffeners is part of the cross.
  const inertiaMm4 = stiffenerRules.cruciformInertiaMm4(trace, {
    widthMm: widthMm + panel.webPlateMm,
    thicknessMm,
    webThicknessMm,
    webLengthMm,
  });
  const slenderness = strutSlenderness(trace, {
    bucklingLengthMm: (depthMm - 2 * flangeThicknessMm) / slopeCosine,
    gyrationMm: Math.sqrt(inertiaMm4 / areaMm2),
    epsilon,
  });
  const reduction = curveCReduction(trace, { slenderness });
  const strutN = stiffenerRules.cruciformBucklingN(
    trace,
    { reduction, areaMm2, yieldMpa, gammaM1: node.partialFactors.gammaM1 },
    0,
  );
  return alongSlopeN(trace, strutN, slopeCosine);
}

function stiffenedZoneOf(
  node: NodeCase,
  panel: ColumnPanel,
  view: JointView,
  breadth: Traced,
  steps: boolean,
): StiffenedZone | null {
  const stiffener = view.compressionStiffener;
  if (!stiffener) return null;
  const yieldMpa = Math.min(stiffener.steel.yieldMpa, panel.steel.yieldMpa);
  const { thicknessMm, widthMm, clipMm } = stiffener;
  const netAreaMm2 = stiffenerRules.stiffenerNetAreaMm2(null, { widthMm, clipMm, thicknessMm });
  const webPart = breadth.value * panel.section.webThicknessMm * panel.steel.yieldMpa;
  return {
    stiffener,
    crushing: traced(steps, (trace) => {
      trace?.include(breadth.step);
      const straightN = stiffenerRules.stiffenerCrushingN(
        trace,
        {
          netAreaMm2: stiffenerRules.stiffenerNetAreaMm2(trace, { widthMm, clipMm, thicknessMm }),
          stiffenerYieldMpa: yieldMpa,
          breadthMm: breadth.value,
          webThicknessMm: panel.compressionWebMm,
          webYieldMpa: panel.steel.yieldMpa,
          gammaM0: node.partialFactors.gammaM0,
        },
        0,
      );
      return alongSlopeN(trace, straightN, view.compressionSlopeCosine);
    }),
    buckling:
      stiffener.length === "full"
        ? traced(steps, (trace) => cruciformBuckling(trace, node, panel, stiffener, view))
        : null,
    plateShare: (netAreaMm2 * yieldMpa) / (netAreaMm2 * yieldMpa + webPart),
  };
}

/** The compression zone of one joint. */
export function compressionZoneOf(
  node: NodeCase,
  panel: ColumnPanel,
  view: JointView | EndPlateView,
  steps: boolean,
): CompressionZone {
  const breadth = breadthOf(panel, view, steps);
  const rho = traced(steps, (trace) => {
    const slenderness = web.webPlateSlenderness(trace, {
      breadthMm: breadth.value,
      webDepthMm: panel.properties.webDepthMm,
      yieldMpa: panel.steel.yieldMpa,
      elasticMpa: ELASTIC_MODULUS_MPA,
      webThicknessMm: panel.section.webThicknessMm,
    });
    return web.rhoOf(trace, { slenderness }, 0);
  });
  const stiffener = stiffenedZoneOf(node, panel, view, breadth, steps);
  const spring =
    stiffener !== null && stiffener.buckling !== null
      ? { value: Infinity, step: undefined }
      : traced(steps, (trace) =>
          webCompressionSpringMm(trace, {
            breadthMm: breadth.value,
            thicknessMm: panel.compressionWebMm,
            webDepthMm: panel.properties.webDepthMm,
          }),
        );
  return { breadth, rho, stiffener, spring };
}

export interface CompressionCase {
  readonly beta: number;
  readonly kWc: Traced;
  readonly reliefCrushing: number;
  readonly reliefBuckling: number;
}

/** Resistance of the compression zone in one load case, N, as the option leaves it. */
export function compressionResistance(
  node: NodeCase,
  panel: ColumnPanel,
  zone: CompressionZone,
  load: CompressionCase,
  steps: boolean,
): Traced {
  const stiffener = zone.stiffener;
  if (stiffener?.buckling) {
    const buckling = stiffener.buckling;
    return traced(steps, (trace) => {
      trace?.include(stiffener.crushing.step);
      trace?.include(buckling.step);
      return web.webCompressionN(
        trace,
        { yieldingN: stiffener.crushing.value, bucklingN: buckling.value },
        0,
      );
    });
  }
  return traced(steps, (trace) => {
    const thicknessMm = panel.compressionWebMm;
    trace?.include(zone.breadth.step);
    const omega = web.omegaOf(trace, {
      beta: load.beta,
      stripMm2: zone.breadth.value * panel.section.webThicknessMm,
      shearAreaMm2: panel.shearArea.value,
    });
    trace?.include(load.kWc.step);
    const kWc = load.kWc.value;
    const breadthMm = zone.breadth.value;
    const { yieldMpa } = panel.steel;
    const relieve = (value: number, relief: number, mark: number | undefined): number =>
      relief > 0 ? relievedN(trace, { resistanceN: value, relief }, mark) : value;
    let mark = trace?.mark();
    const { gammaM0, gammaM1 } = node.partialFactors;
    let yieldingN = stiffener?.crushing.value;
    if (stiffener) trace?.include(stiffener.crushing.step);
    yieldingN ??= relieve(
      web.webCrushingN(trace, { omega, kWc, breadthMm, thicknessMm, yieldMpa, gammaM0 }),
      load.reliefCrushing,
      mark,
    );
    if (stiffener && zone.rho.value >= 1) return yieldingN;
    mark = trace?.mark();
    trace?.include(zone.rho.step);
    const bucklingN = relieve(
      web.webBucklingN(
        trace,
        { omega, kWc, rho: zone.rho.value, breadthMm, thicknessMm, yieldMpa, gammaM1 },
        mark,
      ),
      load.reliefBuckling,
      mark,
    );
    return web.webCompressionN(trace, { yieldingN, bucklingN }, 0);
  });
}
