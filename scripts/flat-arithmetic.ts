import { sectionProperties, type NodeCase } from "@/lib/calc";

/**
 * The bare arithmetic of one joint of the benchmark's node, written flat: an end plate with one row outside and one
 * inside the tension flange, bare column, positive moments. Same formulas as lib/calc, no working, no objects between
 * them. Only the benchmark uses it, to see what the evaluator costs beyond its arithmetic.
 */
export interface FlatJoint {
  readonly momentResistanceNmm: number;
  readonly initialStiffnessNmmPerRad: number;
  readonly worst: number;
}

const FILLET = Math.SQRT2;

/** The numbers of the benchmark's node under short names. */
export function flatInputOf(node: NodeCase) {
  const joint = node.joints[0];
  if (!joint || joint.connection.kind !== "end-plate")
    throw new Error("The benchmark's node has end plates.");
  const { plate, bolts, welds } = joint.connection;
  if (
    welds.topFlange.kind !== "fillet" ||
    welds.bottomFlange.kind !== "fillet" ||
    welds.web.kind !== "fillet"
  ) {
    throw new Error("The benchmark's node has fillet welds.");
  }
  const column = node.column.section;
  const beam = joint.beam.section;
  return {
    hc: column.depthMm,
    bc: column.widthMm,
    twc: column.webThicknessMm,
    tfc: column.flangeThicknessMm,
    rc: column.rootMm,
    columnArea: sectionProperties(column).areaMm2,
    columnInertia: sectionProperties(column).inertiaMm4,
    fyc: node.column.steel.yieldMpa,
    fuc: node.column.steel.ultimateMpa,
    hb: beam.depthMm,
    bb: beam.widthMm,
    twb: beam.webThicknessMm,
    tfb: beam.flangeThicknessMm,
    rb: beam.rootMm,
    beamPlastic: sectionProperties(beam).plasticModulusMm3,
    fyb: joint.beam.steel.yieldMpa,
    tp: plate.thicknessMm,
    bp: plate.widthMm,
    extTop: plate.extensionTopMm,
    extBottom: plate.extensionBottomMm,
    fyp: plate.steel.yieldMpa,
    fup: plate.steel.ultimateMpa,
    legTop: welds.topFlange.throatMm * FILLET,
    legBottom: welds.bottomFlange.throatMm * FILLET,
    legWeb: welds.web.throatMm * FILLET,
    gauge: bolts.gaugeMm,
    y1: bolts.rowsMm[0] ?? NaN,
    y2: bolts.rowsMm[1] ?? NaN,
    y3: bolts.rowsMm[2] ?? NaN,
    d: bolts.size.diameterMm,
    d0: bolts.size.holeMm,
    As: bolts.size.stressAreaMm2,
    fub: bolts.grade.ultimateMpa,
    alphaV: bolts.grade.alphaV,
    across: bolts.size.acrossPointsMm,
    dm: (bolts.size.acrossFlatsMm + bolts.size.acrossPointsMm) / 2,
    head: bolts.size.headHeightMm,
    nut: bolts.size.nutHeightMm,
    washer: bolts.size.washerThicknessMm,
    g0: node.partialFactors.gammaM0,
    g1: node.partialFactors.gammaM1,
    g2: node.partialFactors.gammaM2,
    cases: node.loadCases.map((loadCase) => ({
      left: loadCase.left?.momentNmm ?? 0,
      right: loadCase.right?.momentNmm ?? 0,
      leftShear: loadCase.left?.shearN ?? 0,
      rightShear: loadCase.right?.shearN ?? 0,
      axial: loadCase.column.axialForceN,
      columnMoment: Math.abs(loadCase.column.momentBelowNmm),
      columnShear: loadCase.column.shearAboveN - loadCase.column.shearBelowN,
    })),
  };
}

export type BenchInput = ReturnType<typeof flatInputOf>;

function flatAlpha(lambda1: number, lambda2: number): number {
  const on = (alpha: number): number => {
    const one = 1.25 / (alpha - 2.75);
    const two = (alpha * one) / 2;
    return lambda2 >= two ? one : one + (1 - one) * ((two - lambda2) / two) ** (0.185 * alpha ** 1.785);
  };
  if (on(4.45) <= lambda1) return 4.45;
  if (on(8) >= lambda1) return 8;
  let low = 4.45;
  let high = 8;
  while (high - low > 1e-12) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (on(middle) > lambda1) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const omega = (beta: number, strip: number, area: number): number => {
  if (beta <= 0.5) return 1;
  const ratio = (strip / area) ** 2;
  const one = 1 / Math.sqrt(1 + 1.3 * ratio);
  return beta <= 1
    ? one + 2 * (1 - beta) * (1 - one)
    : one + (beta - 1) * (1 / Math.sqrt(1 + 5.2 * ratio) - one);
};

/** Both joints in every load case, in the order of the evaluator's results. */
export function flatBareResistances(n: BenchInput): FlatJoint[] {
  const joints: FlatJoint[] = [];
  for (const load of n.cases) {
    for (const isLeft of [true, false]) {
      const own = isLeft ? load.left : load.right;
      const other = isLeft ? load.right : load.left;
      const beta = own === 0 ? 2 : Math.min(Math.abs(1 - other / own), 2);
      joints.push(
        flatJoint(
          n,
          beta,
          own,
          isLeft ? load.leftShear : load.rightShear,
          load.axial,
          load.columnMoment,
          load,
        ),
      );
    }
  }
  return joints;
}

function flatJoint(
  n: BenchInput,
  beta: number,
  moment: number,
  shear: number,
  axial: number,
  columnMoment: number,
  load: BenchInput["cases"][number],
): FlatJoint {
  const dc = n.hc - 2 * (n.tfc + n.rc);
  const avc = Math.max(
    n.columnArea - 2 * n.bc * n.tfc + (n.twc + 2 * n.rc) * n.tfc,
    (n.hc - 2 * n.tfc) * n.twc,
  );
  const vwp = (0.9 * n.fyc * avc) / (Math.sqrt(3) * n.g0);
  const ft = (0.9 * n.fub * n.As) / n.g2;
  const ew = n.across / 4;
  const h1 = n.hb - n.tfb / 2 - n.y1;
  const h2 = n.hb - n.tfb / 2 - n.y2;
  const p = h1 - h2;
  // Column flange.
  const m = (n.gauge - n.twc) / 2 - 0.8 * n.rc;
  const e = (n.bc - n.gauge) / 2;
  const ep = (n.bp - n.gauge) / 2;
  const nn = Math.min(e, ep, 1.25 * m);
  const cp = 2 * Math.PI * m;
  const nc = 4 * m + 1.25 * e;
  const gcp = Math.PI * m + p;
  const gnc = 2 * m + 0.625 * e + 0.5 * p;
  const punchC = 2 * Math.min(ft, (0.6 * Math.PI * n.dm * n.tfc * n.fuc) / n.g2);
  const canYield = 2 * m * nn - ew * (m + nn) > 0;
  const mode1 = (length: number): number =>
    canYield
      ? ((8 * nn - 2 * ew) * ((0.25 * length * n.tfc * n.tfc * n.fyc) / n.g0)) / (2 * m * nn - ew * (m + nn))
      : Infinity;
  const mode2 = (length: number, bolts: number): number =>
    ((2 * 0.25 * length * n.tfc * n.tfc * n.fyc) / n.g0 + nn * bolts) / (m + nn);
  const f1 = mode1(Math.min(cp, nc));
  const f2 = mode2(nc, 2 * ft);
  const flange = Math.min(f1, f2, punchC);
  const flangeLength = flange === f1 ? Math.min(cp, nc) : nc;
  const g1 = mode1(Math.min(2 * gcp, 2 * gnc));
  const g2 = mode2(2 * gnc, 4 * ft);
  const flangeGroup = Math.min(g1, g2, 2 * punchC);
  const groupLength = flangeGroup === g1 ? Math.min(2 * gcp, 2 * gnc) : 2 * gnc;
  const web = (length: number): number => (omega(beta, length * n.twc, avc) * length * n.twc * n.fyc) / n.g0;
  // End plate.
  const mx = -n.y1 - 0.8 * n.legTop;
  const ex = n.extTop + n.y1;
  const nx = Math.min(ex, 1.25 * mx);
  const xcp = Math.min(2 * Math.PI * mx, Math.PI * mx + n.gauge, Math.PI * mx + 2 * ep);
  const xnc = Math.min(
    4 * mx + 1.25 * ex,
    ep + 2 * mx + 0.625 * ex,
    0.5 * n.bp,
    0.5 * n.gauge + 2 * mx + 0.625 * ex,
  );
  const punchP = 2 * Math.min(ft, (0.6 * Math.PI * n.dm * n.tp * n.fup) / n.g2);
  const plateMode = (l1: number, l2: number, mm: number, edge: number): { value: number; length: number } => {
    const one =
      2 * mm * edge - ew * (mm + edge) > 0
        ? ((8 * edge - 2 * ew) * ((0.25 * l1 * n.tp * n.tp * n.fyp) / n.g0)) /
          (2 * mm * edge - ew * (mm + edge))
        : Infinity;
    const two = ((2 * 0.25 * l2 * n.tp * n.tp * n.fyp) / n.g0 + edge * 2 * ft) / (mm + edge);
    const value = Math.min(one, two, punchP);
    return { value, length: value === one ? l1 : l2 };
  };
  const outer = plateMode(Math.min(xcp, xnc), xnc, mx, nx);
  const mp = (n.gauge - n.twb) / 2 - 0.8 * n.legWeb;
  const m2 = n.y2 - n.tfb - 0.8 * n.legTop;
  const alpha = flatAlpha(mp / (mp + ep), m2 / (mp + ep));
  const inc = Math.max(alpha * mp, 4 * mp + 1.25 * ep);
  const inner = plateMode(Math.min(2 * Math.PI * mp, inc), inc, mp, Math.min(ep, e, 1.25 * mp));
  const beamWeb = (inner.length * n.twb * n.fyb) / n.g0;
  // Compression.
  const spread = n.tp + Math.min(n.tp, Math.max(n.extBottom - n.legBottom, 0));
  const breadth = n.tfb + 2 * n.legBottom + 5 * (n.tfc + n.rc) + spread;
  const lambda = 0.932 * Math.sqrt((breadth * dc * n.fyc) / (210_000 * n.twc * n.twc));
  const rho = lambda <= 0.72 ? 1 : (lambda - 0.2) / (lambda * lambda);
  const stress = axial / n.columnArea + (columnMoment * dc) / (2 * n.columnInertia);
  const kwc = stress <= 0.7 * n.fyc ? 1 : 1.7 - stress / n.fyc;
  const strip = omega(beta, breadth * n.twc, avc) * kwc * breadth * n.twc * n.fyc;
  const compression = Math.min(strip / n.g0, (strip * rho) / n.g1);
  const beamFlange = (n.beamPlastic * n.fyb) / n.g0 / (n.hb - n.tfb);
  const limit = Math.min(compression, beamFlange, beta > 0 ? vwp / beta : Infinity);
  // Rows.
  const row1 = Math.min(flange, web(flangeLength), outer.value);
  let row2 = Math.min(
    flange,
    web(flangeLength),
    inner.value,
    beamWeb,
    flangeGroup - row1,
    web(groupLength) - row1,
  );
  if (row1 > 1.9 * ft) row2 = Math.min(row2, (row1 * h2) / h1);
  row2 = Math.max(0, row2);
  const a = Math.max(0, Math.min(row1, limit));
  const b = Math.max(0, Math.min(row2, limit - a));
  const resistance = h1 * a + h2 * b;
  // Stiffness.
  const lf = Math.min(cp, nc, gcp, gnc);
  const k3 = (0.7 * lf * n.twc) / dc;
  const k4 = (0.9 * lf * n.tfc ** 3) / m ** 3;
  const k51 = (0.9 * Math.min(xcp, xnc) * n.tp ** 3) / mx ** 3;
  const k52 = (0.9 * Math.min(2 * Math.PI * mp, inc) * n.tp ** 3) / mp ** 3;
  const k10 = (1.6 * n.As) / (n.tp + n.tfc + 2 * n.washer + (n.head + n.nut) / 2);
  const s1 = 1 / (1 / k3 + 1 / k4 + 1 / k51 + 1 / k10);
  const s2 = 1 / (1 / k3 + 1 / k4 + 1 / k52 + 1 / k10);
  const first = s1 * h1 + s2 * h2;
  const second = s1 * h1 * h1 + s2 * h2 * h2;
  const z = second / first;
  const k2 = (0.7 * breadth * n.twc) / dc;
  const flexibility = (beta > 0 ? (beta * z) / (0.38 * avc) : 0) + 1 / k2 + second / (first * first);
  // Shear of bolts, welds, panel: what the evaluator checks besides.
  const bearing = (end: number, pitch: number, edge: number, t: number, fu: number): number =>
    (Math.min((2.8 * edge) / n.d0 - 1.7, (1.4 * n.gauge) / n.d0 - 1.7, 2.5) *
      Math.min(end / (3 * n.d0), pitch / (3 * n.d0) - 0.25, n.fub / fu, 1) *
      fu *
      n.d *
      t) /
    n.g2;
  const fv = (n.alphaV * n.fub * n.As) / n.g2;
  let bolts = 0;
  for (const [y, pitch, share] of [
    [n.y1, n.y2 - n.y1, 0.4 / 1.4],
    [n.y2, n.y2 - n.y1, 0.4 / 1.4],
    [n.y3, n.y3 - n.y2, 1],
  ] as const) {
    const end = Math.min(y + n.extTop, n.hb + n.extBottom - y);
    bolts +=
      2 * Math.min(share * fv, bearing(end, pitch, ep, n.tp, n.fup), bearing(1e5, pitch, e, n.tfc, n.fuc));
  }
  const ratio = moment / resistance;
  const panel = Math.abs(load.left / z - load.right / z - load.columnShear / 2) / vwp;
  const worst = Math.max(
    ratio,
    (a * ratio) / flange,
    (b * ratio) / inner.value,
    ((a + b) * ratio) / compression,
    shear / bolts,
    panel,
  );
  return {
    momentResistanceNmm: resistance,
    initialStiffnessNmmPerRad: (210_000 * z * z) / flexibility,
    worst,
  };
}
