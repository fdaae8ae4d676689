import { ELASTIC_MODULUS_MPA } from "../clauses/en1993-1-1-2005/members";
import {
  bearingAlongFactor,
  bearingEdgeFactor,
  bearingN,
  boltShearN,
} from "../clauses/en1993-1-8-2005/fasteners";
import * as rules from "../clauses/en1993-1-8-2005/flange-cleat";
import type { NodeCase, Steel } from "../node";
import { OutsideScope } from "../outcome";
import { defineFormula } from "../trace/define-formula";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import { resistancesOf, type OwnLimits } from "./bolted-joint";
import type { CleatView } from "./cleat-view";
import type { EndPlate } from "./end-plate";
import { rowFamilyOf } from "./row-groups";

/** The leg on the column's flange in bending. EN 1993-1-8:2005, 6.2.6.6. @throws OutsideScope where the bolts stand on the root. */
export function cleatLegOf(node: NodeCase, view: CleatView, steps: boolean): EndPlate {
  const { cleat, bolts, gapMm } = view.connection;
  const lever = traced(steps, (trace) =>
    rules.cleatLeverMm(trace, {
      distanceMm: bolts.distanceMm,
      thicknessMm: cleat.thicknessMm,
      rootMm: cleat.rootMm,
      gapMm,
    }),
  );
  const edgeMm = cleat.columnLegMm - bolts.distanceMm;
  if (lever.value <= 0) throw new OutsideScope("the bolts stand on the root of the angle");
  if (edgeMm <= 0) throw new OutsideScope("the bolts stand outside the angle's leg");
  const length = traced(steps, (trace) => {
    trace?.include(lever.step);
    return rules.cleatLengthMm(trace, { lengthMm: cleat.lengthMm }, 0);
  });
  const setting = {
    node,
    thicknessMm: cleat.thicknessMm,
    steel: cleat.steel,
    mMm: lever.value,
    nMm: Math.min(edgeMm, 1.25 * lever.value),
    backing: [],
    steps,
  };
  const lengths = { circular: length, other: length };
  return {
    family: rowFamilyOf(
      view.tensionRows,
      [],
      () => setting,
      () => lengths,
      () => lengths,
    ),
    isInside: [false],
    leverByRowMm: [lever.value],
  };
}

const ONE_ROW_MM = 100_000;

/** Bolts and parts along the beam: rows of two in the leg on the beam's flange. */
interface LegBolts {
  readonly rows: number;
  /** From the toe of the leg, and from the end of the beam, to the nearest bolts. */
  readonly toeMm: number;
  readonly beamEndMm: number;
  /** Between rows; a very large number for one row. */
  readonly pitchMm: number;
}

function legBoltsOf({ connection: { beamBolts, cleat, gapMm } }: CleatView): LegBolts {
  const rows = [...beamBolts.rowsMm].sort((a, b) => a - b);
  const first = rows[0] ?? 0;
  const last = rows[rows.length - 1] ?? 0;
  const pitches = rows.slice(1).map((row, index) => row - (rows[index] ?? 0));
  return {
    rows: rows.length,
    toeMm: cleat.beamLegMm - last,
    beamEndMm: first - gapMm,
    pitchMm: Math.min(ONE_ROW_MM, ...pitches),
  };
}

const legBoltsN = defineFormula({
  id: "en1993-1-8:2005/table-3.4/bolts of a leg",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "3.7(1) and Table 3.4: every bolt at the least of shear and bearing on leg and beam flange",
  },
  symbols: {
    count: ["n", "1"],
    shearN: ["F_v,Rd", "N"],
    legN: ["F_b,Rd leg", "N"],
    flangeN: ["F_b,Rd beam flange", "N"],
  },
  result: ["F_Rd", "N"],
  expression: "count * min(shearN, legN, flangeN)",
  evaluate: (g) => g.count * Math.min(g.shearN, g.legN, g.flangeN),
  example: { given: { count: 4, shearN: 100, legN: 90, flangeN: 120 }, gives: 360, relTol: 1e-12 },
});

/** One bolt bearing on one part, N. */
function bearingOn(
  trace: Trace | null,
  node: NodeCase,
  view: CleatView,
  part: {
    readonly steel: Steel;
    readonly thicknessMm: number;
    readonly endMm: number;
    readonly edgeMm: number;
    readonly pitchMm: number;
  },
): number {
  const { size, grade, gaugeMm } = view.connection.beamBolts;
  const mark = trace?.mark();
  const edgeFactor = bearingEdgeFactor(trace, {
    edgeMm: part.edgeMm,
    acrossMm: gaugeMm,
    holeMm: size.holeMm,
  });
  const bearingFactor = bearingAlongFactor(trace, {
    endMm: part.endMm,
    pitchMm: part.pitchMm,
    holeMm: size.holeMm,
    boltUltimateMpa: grade.ultimateMpa,
    ultimateMpa: part.steel.ultimateMpa,
  });
  return bearingN(
    trace,
    {
      edgeFactor,
      bearingFactor,
      ultimateMpa: part.steel.ultimateMpa,
      diameterMm: size.diameterMm,
      thicknessMm: part.thicknessMm,
      gammaM2: node.partialFactors.gammaM2,
    },
    mark,
  );
}

/**
 * Bolts between an angle and the beam's flange, N. Pulled, they bear towards the leg's toe and the beam's end; pushed,
 * towards neither, and the same distances are kept on the safe side.
 */
export function legBoltResistance(node: NodeCase, view: CleatView, steps: boolean): Traced {
  const { cleat, beamBolts } = view.connection;
  const { section, steel } = view.joint.beam;
  const bolts = legBoltsOf(view);
  const { size, grade } = beamBolts;
  const resistance = traced(steps, (trace) => {
    const shearN = boltShearN(trace, {
      alphaV: grade.alphaV,
      ultimateMpa: grade.ultimateMpa,
      stressAreaMm2: size.stressAreaMm2,
      reduction: 1,
      gammaM2: node.partialFactors.gammaM2,
    });
    const legN = bearingOn(trace, node, view, {
      steel: cleat.steel,
      thicknessMm: cleat.thicknessMm,
      endMm: bolts.toeMm,
      edgeMm: (cleat.lengthMm - beamBolts.gaugeMm) / 2,
      pitchMm: bolts.pitchMm,
    });
    const flangeN = bearingOn(trace, node, view, {
      steel,
      thicknessMm: section.flangeThicknessMm,
      endMm: bolts.beamEndMm,
      edgeMm: (section.widthMm - beamBolts.gaugeMm) / 2,
      pitchMm: bolts.pitchMm,
    });
    return legBoltsN(trace, { count: 2 * bolts.rows, shearN, legN, flangeN }, 0);
  });
  if (resistance.value <= 0)
    throw new OutsideScope("the bolts along the beam stand too close to an edge to bear on anything");
  return resistance;
}

/** Block torn out of a part of a width by the bolts along the beam: between the two lines of bolts, or the two strips beside them. */
function tornBlockN(
  trace: Trace | null,
  node: NodeCase,
  view: CleatView,
  part: {
    readonly steel: Steel;
    readonly widthMm: number;
    readonly thicknessMm: number;
    /** From the edge that the bolts push towards to the row furthest from it. */
    readonly alongMm: number;
  },
): number {
  const { size, gaugeMm, rowsMm } = view.connection.beamBolts;
  const { holeMm } = size;
  const acrossMm = Math.min(gaugeMm, part.widthMm - gaugeMm) - holeMm;
  const shearMm = part.alongMm - (rowsMm.length - 0.5) * holeMm;
  if (acrossMm <= 0 || shearMm <= 0) throw new OutsideScope("bolt holes along the beam run into one another");
  return rules.blockTearingN(trace, {
    tensionAreaMm2: acrossMm * part.thicknessMm,
    shearAreaMm2: 2 * shearMm * part.thicknessMm,
    yieldMpa: part.steel.yieldMpa,
    ultimateMpa: part.steel.ultimateMpa,
    gammaM0: node.partialFactors.gammaM0,
    gammaM2: node.partialFactors.gammaM2,
  });
}

/** Blocks of the beam's flange between the bolts and the beam's end, N. */
function flangeTearing(node: NodeCase, view: CleatView, steps: boolean): Traced {
  const { section, steel } = view.joint.beam;
  const { beamBolts, gapMm } = view.connection;
  return traced(steps, (trace) =>
    tornBlockN(trace, node, view, {
      steel,
      widthMm: section.widthMm,
      thicknessMm: section.flangeThicknessMm,
      alongMm: Math.max(...beamBolts.rowsMm) - gapMm,
    }),
  );
}

/** The pulled leg on the beam's flange: across its holes, and the block between bolts and toe, N. */
function legTension(node: NodeCase, view: CleatView, steps: boolean): Traced {
  const { cleat, beamBolts } = view.connection;
  const { gammaM0, gammaM2 } = node.partialFactors;
  const { holeMm } = beamBolts.size;
  const { yieldMpa, ultimateMpa } = cleat.steel;
  return traced(steps, (trace) => {
    const acrossN = rules.partInTensionN(trace, {
      widthMm: cleat.lengthMm,
      thicknessMm: cleat.thicknessMm,
      holesMm: 2 * holeMm,
      yieldMpa,
      ultimateMpa,
      gammaM0,
      gammaM2,
    });
    const blockN = tornBlockN(trace, node, view, {
      steel: cleat.steel,
      widthMm: cleat.lengthMm,
      thicknessMm: cleat.thicknessMm,
      alongMm: cleat.beamLegMm - Math.min(...beamBolts.rowsMm),
    });
    return lesserN(trace, { acrossN, blockN }, 0);
  });
}

const lesserN = defineFormula({
  id: "en1993-1-8:2005/3.10.2/leg in tension",
  source: { document: "EN 1993-1-8", edition: "2005", ref: "3.10.2 beside EN 1993-1-1, 6.2.3" },
  symbols: { acrossN: ["N_t,Rd", "N"], blockN: ["V_eff,1,Rd", "N"] },
  result: ["F_leg,Rd", "N"],
  expression: "min(acrossN, blockN)",
  evaluate: (g) => Math.min(g.acrossN, g.blockN),
  example: { given: { acrossN: 360, blockN: 340 }, gives: 340, relTol: 1e-12 },
});

/** What the angle in tension limits: its leg on the column in bending, its leg on the beam, the bolts between. */
export function cleatLimits(
  node: NodeCase,
  view: CleatView,
  leg: EndPlate,
  legBolts: Traced,
  steps: boolean,
): readonly OwnLimits[] {
  const alone = (limit: Traced) => ({ alone: [limit], groupsEndingAt: [[]] });
  return [
    {
      component: "flange-cleat-bending",
      clause: "EN 1993-1-8, 6.2.6.6",
      limits: resistancesOf(leg.family),
      hasSpring: true,
    },
    {
      component: "flange-cleat-bending",
      clause: "EN 1993-1-1, 6.2.3 and EN 1993-1-8, 3.10.2",
      what: "leg on the beam in tension",
      limits: alone(legTension(node, view, steps)),
      hasSpring: false,
    },
    {
      component: "bolt-shear",
      clause: "EN 1993-1-8, 3.10.2",
      what: "beam flange torn out between bolts and end",
      limits: alone(flangeTearing(node, view, steps)),
      hasSpring: false,
    },
    {
      component: "bolt-shear",
      clause: "EN 1993-1-8, 3.7 and Table 3.4",
      what: "bolts to the beam's tension flange",
      limits: alone(legBolts),
      hasSpring: false,
    },
  ];
}

/** Slip of the bolts along the beam: k_11 for each flange, k_12 for each flange and each angle. Table 6.11. */
export function legSprings(view: CleatView, steps: boolean): readonly Traced[] {
  const { cleat, beamBolts } = view.connection;
  const { section, steel } = view.joint.beam;
  const { rows, toeMm, beamEndMm, pitchMm } = legBoltsOf(view);
  const { size, grade } = beamBolts;
  const common = { rows, diameterMm: size.diameterMm, elasticMpa: ELASTIC_MODULUS_MPA };
  const shear = traced(steps, (trace) =>
    rules.boltShearSpringMm(trace, { ...common, ultimateMpa: grade.ultimateMpa }),
  );
  const bearing = (edgeMm: number, thicknessMm: number, ultimateMpa: number): Traced =>
    traced(steps, (trace) =>
      rules.boltBearingSpringMm(trace, { ...common, edgeMm, pitchMm, thicknessMm, ultimateMpa }),
    );
  const onLeg = bearing(toeMm, cleat.thicknessMm, cleat.steel.ultimateMpa);
  const onFlange = bearing(beamEndMm, section.flangeThicknessMm, steel.ultimateMpa);
  return [shear, shear, onLeg, onLeg, onFlange, onFlange];
}
