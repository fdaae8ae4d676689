import type { JointCase, MeasureCase, NodeCase, Weld } from "@/lib/calc/node";
import type { Shape } from "./design-space";
import type { Stock, StockPlate } from "./stock";

/** Plates are cut to whole steps of 10 mm in height (common practice, no source). */
const HEIGHT_STEP_MM = 10;
/** EN 1993-1-8:2005, 6.2.6.1: b_s below 40 epsilon t_s. */
const SLENDERNESS_LIMIT = 40;

const throatOf = (weld: Weld): number => (weld.kind === "fillet" ? weld.throatMm : 0);

/**
 * How far above and below the beam the plate must reach on one side, mm, so that it covers the web
 * that works in tension and in compression at both levels (each level may be either).
 */
function reachBeyondFlangeMm(node: NodeCase, joint: JointCase): number {
  const { section } = node.column;
  const root = section.rootMm;
  const spread = 5 * (section.flangeThicknessMm + root);
  if (joint.connection.kind === "flange-cleats") return spread;
  const { welds } = joint.connection;
  const weld = Math.SQRT2 * Math.max(throatOf(welds.topFlange), throatOf(welds.bottomFlange));
  if (joint.connection.kind === "welded") return spread / 2 + weld;
  const { plate, bolts } = joint.connection;
  const compression = spread / 2 + weld + plate.thicknessMm;
  const m = (bolts.gaugeMm - section.webThicknessMm) / 2 - 0.8 * root;
  const e = (section.widthMm - bolts.gaugeMm) / 2;
  const first = bolts.rowsMm[0] ?? 0;
  const last = bolts.rowsMm.at(-1) ?? 0;
  const beyond = Math.max(-first, last - joint.beam.section.depthMm);
  // Table 6.4: half of the longer of the two patterns of a row by itself.
  const tension = beyond + Math.max(2 * Math.PI * m, 4 * m + 1.25 * e) / 2;
  return Math.max(compression, tension);
}

/**
 * Heights worth trying, mm, in whole steps: from the beam's depth to what certainly covers both levels of every
 * joint. How much is needed in between, the check of the plate says.
 */
export function webPlateHeightsMm(node: NodeCase): readonly number[] {
  const steps = (heights: readonly number[]): number => Math.ceil(Math.max(...heights) / HEIGHT_STEP_MM);
  const depths = node.joints.map(({ beam }) => beam.section.depthMm);
  const least = steps(depths);
  const most = steps(
    node.joints.map((joint, index) => (depths[index] ?? 0) + 2 * reachBeyondFlangeMm(node, joint)),
  );
  return Array.from({ length: most - least + 1 }, (_, step) => (least + step) * HEIGHT_STEP_MM);
}

/** Fillets count in tension from t / sqrt 2 on (6.2.6.3(7)); a butt weld is the strongest and the dearest. */
function weldsOf(stock: Stock, thicknessMm: number): readonly Weld[] {
  const fillets = stock.throatsMm.filter((throat) => throat >= thicknessMm / Math.SQRT2);
  return [...fillets.map((throatMm) => ({ kind: "fillet" as const, throatMm })), { kind: "butt" }];
}

/** Every stock shape of a supplementary web plate on one or both sides, between the root toes. */
export function webPlateSpace(node: NodeCase, stock: Stock, sides: 1 | 2): readonly Shape[] {
  const { depthMm, flangeThicknessMm, rootMm, webThicknessMm } = node.column.section;
  const widthMm = Math.floor(depthMm - 2 * flangeThicknessMm - 2 * rootMm);
  const heights = webPlateHeightsMm(node);
  const isWithinLimits = ({ thicknessMm, steel }: StockPlate): boolean =>
    widthMm > 0 &&
    thicknessMm >= webThicknessMm &&
    widthMm < SLENDERNESS_LIMIT * Math.sqrt(235 / steel.yieldMpa) * thicknessMm;
  return stock.plates.filter(isWithinLimits).map(({ thicknessMm, steel }) => {
    const welds = weldsOf(stock, thicknessMm);
    return {
      ladders: [welds.length, heights.length],
      build: ([weldStep, heightStep]: readonly number[]): readonly MeasureCase[] => [
        {
          kind: "web-plates",
          sides,
          thicknessMm,
          widthMm,
          heightMm: heights[heightStep ?? 0] ?? 0,
          steel,
          weld: welds[weldStep ?? 0] ?? { kind: "butt" },
        },
      ],
    };
  });
}
