import { stiffenerNetAreaMm2 } from "../clauses/en1993-1-5-2006/stiffeners";
import { weldedFlangeBendingN } from "../clauses/en1993-1-8-2005/beam";
import {
  omegaOf,
  truncatedBreadthMm,
  webTensionN,
  weldedBreadthMm,
} from "../clauses/en1993-1-8-2005/column-web";
import { webTensionSpringMm } from "../clauses/en1993-1-8-2005/stiffness";
import { leastFlangeBreadthMm, weldedFlangeBreadthMm } from "../clauses/en1993-1-8-2005/welds";
import { alongSlopeN } from "../mechanics/sloped-plates";
import { weldLegMm, type TransverseStiffeners } from "../measures/panel-design";
import type { NodeCase, WeldedConnection } from "../node";
import { defineFormula } from "../trace/define-formula";
import { traced, type Traced } from "../trace/traced";
import { beamCompression } from "./bolted-joint";
import type { ColumnPanel } from "./column-panel";
import type { CompressionZone } from "./compression-zone";
import type { JointView } from "./connection-view";

/** A welded joint with its tension flange at one level: all that no load case changes. */
export interface WeldedJoint {
  readonly kind: "welded";
  readonly view: JointView;
  readonly connection: WeldedConnection;
  readonly leverMm: number;
  readonly compression: CompressionZone;
  readonly beamFlange: Traced;
  readonly tensionBreadth: Traced;
  /** Null where a tension stiffener carries the flange. */
  readonly flangeBending: Traced | null;
  /** Effective breadth of the column flange and the least that 4.10(3) asks for without a stiffener. */
  readonly flangeBreadthMm: number;
  readonly leastBreadthMm: number;
  readonly stiffener: TransverseStiffeners | null;
  readonly stiffenedTension: Traced | null;
  /** Part of the tension that the stiffener plates take. */
  readonly plateShare: number;
  /** k_3, mm; Infinity in line with a full-depth stiffener. */
  readonly spring: Traced;
  readonly connectionMomentNmm: number;
}

const stiffenedTensionN = defineFormula({
  id: "en1993-1-8:2005/6.2.6.3/stiffened tension zone",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "6.2.6.3 with the stiffener's net area added, by equilibrium",
  },
  symbols: {
    netAreaMm2: ["A_s,net", "mm2"],
    stiffenerYieldMpa: ["f_y,s", "N/mm2"],
    breadthMm: ["b_eff,t,wc", "mm"],
    webThicknessMm: ["t_wc", "mm"],
    webYieldMpa: ["f_y,wc", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["F_t,Rd", "N"],
  expression: "(netAreaMm2 * stiffenerYieldMpa + breadthMm * webThicknessMm * webYieldMpa) / gammaM0",
  evaluate: (g) =>
    (g.netAreaMm2 * g.stiffenerYieldMpa + g.breadthMm * g.webThicknessMm * g.webYieldMpa) / g.gammaM0,
  example: {
    given: {
      netAreaMm2: 2000,
      stiffenerYieldMpa: 275,
      breadthMm: 200,
      webThicknessMm: 10,
      webYieldMpa: 265,
      gammaM0: 1,
    },
    gives: 550_000 + 530_000,
    relTol: 1e-12,
  },
});

function tensionBreadthOf(panel: ColumnPanel, view: JointView, steps: boolean): Traced {
  return traced(steps, (trace) => {
    const full = weldedBreadthMm(trace, {
      beamFlangeMm: view.joint.beam.section.flangeThicknessMm,
      weldLegMm: weldLegMm(view.tensionWeld),
      columnFlangeMm: panel.section.flangeThicknessMm,
      rootMm: panel.section.rootMm,
    });
    const near = view.columnBeyondTensionMm;
    return near >= full / 2
      ? full
      : truncatedBreadthMm(
          trace,
          { fullMm: full, aboveMm: near, belowMm: view.joint.beam.section.depthMm },
          0,
        );
  });
}

/** Everything about a welded joint that does not depend on the load case. */
export function weldedJointOf(
  node: NodeCase,
  panel: ColumnPanel,
  view: JointView,
  connection: WeldedConnection,
  compression: CompressionZone,
  steps: boolean,
): WeldedJoint {
  const { section, steel } = view.joint.beam;
  const tensionBreadth = tensionBreadthOf(panel, view, steps);
  const breadthGiven = {
    webThicknessMm: panel.section.webThicknessMm,
    rootMm: panel.section.rootMm,
    flangeThicknessMm: panel.section.flangeThicknessMm,
    plateThicknessMm: section.flangeThicknessMm,
    flangeYieldMpa: panel.steel.yieldMpa,
    plateYieldMpa: steel.yieldMpa,
  };
  const flangeBreadthMm = Math.min(weldedFlangeBreadthMm(null, breadthGiven), section.widthMm);
  const stiffener = view.tensionStiffener;
  const { gammaM0 } = node.partialFactors;
  const flangeBending = stiffener
    ? null
    : traced(steps, (trace) => {
        weldedFlangeBreadthMm(trace, breadthGiven);
        return weldedFlangeBendingN(
          trace,
          {
            breadthMm: flangeBreadthMm,
            beamFlangeMm: section.flangeThicknessMm,
            yieldMpa: steel.yieldMpa,
            gammaM0,
          },
          0,
        );
      });
  const netAreaMm2 = stiffener
    ? stiffenerNetAreaMm2(null, {
        widthMm: stiffener.widthMm,
        clipMm: stiffener.clipMm,
        thicknessMm: stiffener.thicknessMm,
      })
    : 0;
  const stiffenerYieldMpa = Math.min(stiffener?.steel.yieldMpa ?? Infinity, panel.steel.yieldMpa);
  const webPart = tensionBreadth.value * panel.section.webThicknessMm * panel.steel.yieldMpa;
  const beamFlange = beamCompression(node, view.joint, steps);
  const leverMm = section.depthMm - section.flangeThicknessMm;
  return {
    kind: "welded",
    view,
    connection,
    leverMm,
    compression,
    beamFlange,
    tensionBreadth,
    flangeBending,
    flangeBreadthMm,
    leastBreadthMm: leastFlangeBreadthMm(null, {
      plateYieldMpa: steel.yieldMpa,
      plateUltimateMpa: steel.ultimateMpa,
      plateWidthMm: section.widthMm,
    }),
    stiffener,
    stiffenedTension: stiffener
      ? traced(steps, (trace) => {
          trace?.include(tensionBreadth.step);
          const straightN = stiffenedTensionN(
            trace,
            {
              netAreaMm2,
              stiffenerYieldMpa,
              breadthMm: tensionBreadth.value,
              webThicknessMm: panel.tensionWebMm,
              webYieldMpa: panel.steel.yieldMpa,
              gammaM0,
            },
            0,
          );
          return alongSlopeN(trace, straightN, view.tensionSlopeCosine);
        })
      : null,
    plateShare: stiffener ? (netAreaMm2 * stiffenerYieldMpa) / (netAreaMm2 * stiffenerYieldMpa + webPart) : 0,
    spring:
      stiffener?.length === "full"
        ? { value: Infinity, step: undefined }
        : traced(steps, (trace) =>
            webTensionSpringMm(trace, {
              breadthMm: tensionBreadth.value,
              thicknessMm: panel.tensionWebMm,
              webDepthMm: panel.properties.webDepthMm,
            }),
          ),
    connectionMomentNmm: leverMm * beamFlange.value,
  };
}

/** Column web in tension in one load case, N, as the option leaves it. */
export function weldedTension(
  node: NodeCase,
  panel: ColumnPanel,
  joint: WeldedJoint,
  beta: number,
  steps: boolean,
): Traced {
  if (joint.stiffenedTension) return joint.stiffenedTension;
  return traced(steps, (trace) => {
    trace?.include(joint.tensionBreadth.step);
    const omega = omegaOf(trace, {
      beta,
      stripMm2: joint.tensionBreadth.value * panel.section.webThicknessMm,
      shearAreaMm2: panel.shearArea.value,
    });
    return webTensionN(
      trace,
      {
        omega,
        breadthMm: joint.tensionBreadth.value,
        thicknessMm: panel.tensionWebMm,
        yieldMpa: panel.steel.yieldMpa,
        gammaM0: node.partialFactors.gammaM0,
      },
      0,
    );
  });
}
