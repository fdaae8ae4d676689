import type { BoltedSideCase } from "../side-case";
import type { NodeCase } from "../node";
import type { ComponentCheck } from "../result";
import { defineFormula } from "../trace/define-formula";
import { traced } from "../trace/traced";
import { checkOf, detailAtLeast } from "./check";
import { bearingLevelOf, type CleatView } from "./cleat-view";

const seatMomentNmm = defineFormula({
  id: "flange-cleats/seat moment",
  source: {
    document: "Mechanics of a seat angle",
    edition: "this project",
    ref: "the beam's reaction over the web length that it needs from the beam's end, about the root of the seat's leg",
  },
  symbols: {
    reactionN: ["V_Ed", "N"],
    gapMm: ["g", "mm"],
    webMm: ["t_wb", "mm"],
    yieldMpa: ["f_y,wb", "N/mm2"],
    legMm: ["t_a", "mm"],
    rootMm: ["r_a", "mm"],
  },
  result: ["M_seat,Ed", "Nmm"],
  expression: "reactionN * max(0, gapMm + reactionN / (2 * webMm * yieldMpa) - legMm - 0.8 * rootMm)",
  evaluate: (g) =>
    g.reactionN * Math.max(0, g.gapMm + g.reactionN / (2 * g.webMm * g.yieldMpa) - g.legMm - 0.8 * g.rootMm),
  example: {
    given: { reactionN: 200_000, gapMm: 10, webMm: 10, yieldMpa: 250, legMm: 12, rootMm: 10 },
    gives: 200_000 * (10 + 40 - 12 - 8),
    relTol: 1e-12,
  },
});

const legMomentNmm = defineFormula({
  id: "flange-cleats/seat resistance",
  source: { document: "EN 1993-1-1", edition: "2005", ref: "6.2.5(2), Eq. (6.13), of the leg's plate" },
  symbols: {
    lengthMm: ["b_a", "mm"],
    thicknessMm: ["t_a", "mm"],
    yieldMpa: ["f_y", "N/mm2"],
    gammaM0: ["γ_M0", "1"],
  },
  result: ["M_seat,Rd", "Nmm"],
  expression: "0.25 * lengthMm * thicknessMm^2 * yieldMpa / gammaM0",
  evaluate: (g) => (0.25 * g.lengthMm * g.thicknessMm ** 2 * g.yieldMpa) / g.gammaM0,
  example: {
    given: { lengthMm: 200, thicknessMm: 10, yieldMpa: 300, gammaM0: 1 },
    gives: 1_500_000,
    relTol: 1e-12,
  },
});

/** The leg that the beam bears on, bent by the beam's reaction: the lower angle's, or the upper one's under uplift. */
export function seatCheck(
  node: NodeCase,
  side: BoltedSideCase,
  view: CleatView,
  steps: boolean,
): ComponentCheck {
  const { cleat, gapMm } = view.connection;
  const { section, steel } = view.joint.beam;
  const moment = traced(steps, (trace) =>
    seatMomentNmm(trace, {
      reactionN: Math.abs(side.actions.shearN),
      gapMm,
      webMm: section.webThicknessMm,
      yieldMpa: steel.yieldMpa,
      legMm: cleat.thicknessMm,
      rootMm: cleat.rootMm,
    }),
  );
  const resistance = traced(steps, (trace) =>
    legMomentNmm(trace, {
      lengthMm: cleat.lengthMm,
      thicknessMm: cleat.thicknessMm,
      yieldMpa: cleat.steel.yieldMpa,
      gammaM0: node.partialFactors.gammaM0,
    }),
  );
  return checkOf(
    {
      component: "flange-cleat-bending",
      side: view.joint.side,
      level: bearingLevelOf(side.actions.shearN),
      loadCase: side.loadCase.name,
      clause: "equilibrium of the seat's leg",
      what: "seat under the beam's reaction",
      unit: "Nmm",
    },
    moment.value,
    resistance,
    { demandStep: moment.step },
  );
}

/** Bolt spacing of both legs. EN 1993-1-8:2005, Table 3.3. */
export function cleatDetailing(view: CleatView, columnFlangeWidthMm: number): ComponentCheck[] {
  const { cleat, bolts, beamBolts, gapMm } = view.connection;
  const head = { side: view.joint.side, clause: "EN 1993-1-8, Table 3.3" };
  const hole = bolts.size.holeMm;
  const beamHole = beamBolts.size.holeMm;
  const rows = [...beamBolts.rowsMm].sort((a, b) => a - b);
  const first = rows[0] ?? 0;
  const last = rows[rows.length - 1] ?? 0;
  const pitches = rows.slice(1).map((row, index) => row - (rows[index] ?? 0));
  const beamWidth = view.joint.beam.section.widthMm;
  const least = (what: string, needed: number, actual: number): ComponentCheck =>
    detailAtLeast({ side: head.side, clause: head.clause, what }, needed, actual);
  const checks = [
    least(
      "edge distance of the bolts, 1.2 d_0",
      1.2 * hole,
      (Math.min(cleat.lengthMm, columnFlangeWidthMm) - bolts.gaugeMm) / 2,
    ),
    least("end distance in the leg on the column, 1.2 d_0", 1.2 * hole, cleat.columnLegMm - bolts.distanceMm),
    least("gauge, 2.4 d_0", 2.4 * hole, bolts.gaugeMm),
    least(
      "edge distance of the bolts in the beam's flange, 1.2 d_0",
      1.2 * beamHole,
      (Math.min(cleat.lengthMm, beamWidth) - beamBolts.gaugeMm) / 2,
    ),
    least("end distance in the leg on the beam, 1.2 d_0", 1.2 * beamHole, cleat.beamLegMm - last),
    least("end distance in the beam's flange, 1.2 d_0", 1.2 * beamHole, first - gapMm),
    least("gauge in the beam's flange, 2.4 d_0", 2.4 * beamHole, beamBolts.gaugeMm),
    detailAtLeast(
      { side: head.side, clause: "EN 1993-1-8, 6.2.2", what: "leg as thick as the gap, to take the shear" },
      gapMm,
      cleat.thicknessMm,
    ),
  ];
  if (pitches.length > 0)
    checks.push(least("distance between bolt rows, 2.2 d_0", 2.2 * beamHole, Math.min(...pitches)));
  return checks;
}
