import { isLargeAxialForce } from "./components/axial-force";
import { pryingLengthMm } from "./clauses/en1993-1-8-2005/t-stub";
import { isBolted, type JointModel } from "./joint-model";
import { isOnePanel } from "./mechanics/panel-levels";
import { fullPairAt } from "./measures/diagonal-stiffeners";
import { hasBars, type PanelDesign } from "./measures/panel-design";
import type { StiffenerPair } from "./measures/stiffener-pairs";
import type { LoadCase, NodeCase } from "./node";

const GENERAL = [
  "This supports a competent engineer's judgement and does not replace it: national annexes, the project specification and the licensed engineer's decision come first.",
  "Moments act at the column face and enter beta unchanged. Sway of the column flange under the compression force has to be prevented by restraint (EN 1993-1-8, 6.2.6.2(3)).",
  "Fatigue, seismic detailing, fire and the column's own member checks are not covered.",
] as const;

const BARS = [
  "Threaded bars with inner nuts are outside the clauses of EN 1993-1-8: the model is mechanics with bounds from linear-elastic finite elements; nothing outside those bounds is answered.",
  "The bars work only with every inner nut tight on its flange: state the tightening order and its inspection, and nuts and bars to EN 1090-2. Outer nuts with washers on both flanges. Bar resistances are taken at 0.85 for cut threads.",
] as const;

const FOUR_BOLTS =
  "Rows of four bolts are taken as rows of two: EN 1993-1-8 has no T-stub with four bolts a row, so the outer ones are not counted on, on the safe side.";
const RIBS =
  "The ribs on the end plate are not counted on: its extensions are taken as unstiffened, on the safe side.";
const CLEATS =
  "Flange cleats: bolts along the beam slip in their clearance before the stiffness holds; the beam's shear is given to the angle it bears on, its leg and its bolts to the column. Check the beam's web over that leg to EN 1993-1-5, section 6, and the beam's net section at the bolts.";
const WEB_CLEATS =
  "The web angles are counted on neither for the moment nor for the shear; they may be given a share of the shear in a design of their own.";
const STIFFENED_CLEATS =
  "The plates that stiffen the angles are not counted on: the angles are taken as plain ones, on the safe side.";
const UNEQUAL =
  "The beams differ in depth or level: the panel is cut into zones at their flanges, each with its own shear by equilibrium, and a joint's beta is that of the worst zone it shears.";

const BACKING =
  "Backing plates lie evenly about the bolt rows of their level, fit snugly to flange and root, and are parted by a stiffener there; the bolts are longer by their thickness.";

/** Shares of eta: the mean of the study, and what relief is taken at. */
const BEST_ESTIMATE = 0.83;
const CAUTIOUS = 0.55;

const DIAGONALS =
  "Diagonal stiffeners follow a guide rule (SCI/BCSA P398, step 6D), as EN 1993-1-8 gives none: the web works up to its resistance and the diagonals take the rest. Their welds are for the whole shear of the panel, at most what a diagonal carries; where a plate meets the flange at less than 60 degrees one run of two counts. A K's diagonals meet at mid-height, where their level parts cancel.";

const ON_PLATE =
  "The web plate is one piece and goes on first; stiffeners sit on it and are cut narrower by its thickness, counted so on both sides of the web.";

const BARS_BESIDE_PLATE =
  "The bar model was studied on plain webs: beside a web plate the relief is taken for a web as thick as web and plates together, the bars' force for the plain web.";

const TOLERANCE = 0.1;

/** Load cases whose forces on the node do not balance by more than a tenth of the largest term. */
export function unbalancedCases(node: NodeCase): readonly string[] {
  const depth = node.column.section.depthMm;
  return node.loadCases
    .filter((loadCase) => !isBalanced(loadCase, depth, leverOf(node)))
    .map((loadCase) => loadCase.name);
}

const leverOf = (node: NodeCase): number => {
  const section = node.joints[0]?.beam.section;
  return section ? section.depthMm - section.flangeThicknessMm : 0;
};

function isBalanced(loadCase: LoadCase, depthMm: number, leverMm: number): boolean {
  const { left, right, column } = loadCase;
  const moments = [
    left?.momentNmm ?? 0,
    -(right?.momentNmm ?? 0),
    (((left?.shearN ?? 0) - (right?.shearN ?? 0)) * depthMm) / 2,
    -column.momentAboveNmm,
    column.momentBelowNmm,
    (-(column.shearAboveN - column.shearBelowN) * leverMm) / 2,
  ];
  const forces = [left?.axialForceN ?? 0, -(right?.axialForceN ?? 0), column.shearAboveN, column.shearBelowN];
  return [moments, forces].every((terms) => {
    const largest = Math.max(...terms.map(Math.abs));
    return Math.abs(terms.reduce((sum, term) => sum + term, 0)) <= TOLERANCE * largest + 1e-6;
  });
}

/** A two-sided node whose cases never leave one beam unloaded: bars then look better than they may be. */
function lacksOneSidedCase(node: NodeCase): boolean {
  return (
    node.joints.length === 2 &&
    !node.loadCases.some(({ left, right }) => {
      const a = Math.abs(left?.momentNmm ?? 0);
      const b = Math.abs(right?.momentNmm ?? 0);
      return Math.min(a, b) <= 0.05 * Math.max(a, b) && Math.max(a, b) > 0;
    })
  );
}

/** What a reader has to know beside the numbers of one option. */
export function cautionsOf(
  node: NodeCase,
  design: PanelDesign,
  models: readonly JointModel[],
): readonly string[] {
  const cautions: string[] = [...GENERAL];
  const unbalanced = unbalancedCases(node);
  if (unbalanced.length > 0) {
    cautions.push(
      `Joint moments and column forces do not balance in ${unbalanced.length === node.loadCases.length ? "any load case" : unbalanced.join(", ")}: check the column's moments and shears.`,
    );
  }
  if (hasBars(design)) {
    cautions.push(...BARS, ...barEstimates(models));
    if (lacksOneSidedCase(node)) {
      cautions.push("No load case leaves one beam unloaded; the relief by bars halves there, so add one.");
    }
  }
  if (node.joints.some(({ side }) => design.backing[side].top ?? design.backing[side].bottom)) {
    cautions.push(BACKING);
  }
  for (const pair of design.pairs) cautions.push(...pairCautions(design, pair, models));
  if (design.diagonals) cautions.push(DIAGONALS, ...freeEndCautions(design));
  if (design.webPlates && design.pairs.length > 0) cautions.push(ON_PLATE);
  if (design.webPlates && hasBars(design)) cautions.push(BARS_BESIDE_PLATE);
  if (!isOnePanel(node.joints)) cautions.push(UNEQUAL);
  cautions.push(...pryingCautions(design, models));
  cautions.push(...cleatCautions(node), ...endPlateCautions(node));
  const pulled = axialForceCases(node);
  if (pulled.length > 0) {
    cautions.push(
      `A beam's axial force exceeds 5 % of its plastic resistance in ${pulled.join(", ")}: moment and force are checked together (6.2.7.1(3)), and the stiffness and its class do not hold there (6.3.1(4)).`,
    );
  }
  return cautions;
}

/** Best estimate of a finite-element study beside the cautious value that the design counts on. */
function barEstimates(models: readonly JointModel[]): readonly string[] {
  const words = models.flatMap((model) => {
    const shares = isBolted(model) ? model.barShares.filter((share) => share !== null) : [];
    if (shares.length === 0) return [];
    const mean = shares.reduce((sum, share) => sum + share.value, 0) / shares.length;
    const { tensionLevel } = model.joint.view;
    return [
      `For information: under equal forces on both sides the bars at the ${tensionLevel} are expected to carry about ${(100 * BEST_ESTIMATE * mean).toFixed(0)} % of a row's force past the column; the design counts on ${(100 * CAUTIOUS * mean).toFixed(0)} %.`,
    ];
  });
  return [...new Set(words)];
}

/** Levels at which a diagonal ends without a pair in line. */
const freeEndCautions = (design: PanelDesign): readonly string[] =>
  (["top", "bottom"] as const)
    .filter((level) => fullPairAt(design, level) === null)
    .map(
      (level) =>
        `No full-depth stiffeners at the ${level}: as guidance, put a pair in line with every end of a diagonal; without one, only the web beside the end brings its force in.`,
    );

/** Load cases in which a beam's axial force is more than the joint may pass over. */
const axialForceCases = (node: NodeCase): readonly string[] =>
  node.loadCases
    .filter((loadCase) =>
      node.joints.some((joint) => isLargeAxialForce(node, joint, loadCase[joint.side]?.axialForceN ?? 0)),
    )
    .map(({ name }) => name);

/** Rows whose bolts are too long for prying to develop for certain: it is assumed all the same, as the standard allows here. */
function pryingCautions(design: PanelDesign, models: readonly JointModel[]): readonly string[] {
  const words = models.flatMap((model) => {
    if (!isBolted(model)) return [];
    const { view, flange, plate } = model.joint;
    const rows = view.tensionRows.flatMap((row, index) => {
      const spring = model.springs[index];
      const { stressAreaMm2 } = row.fastener.size;
      if (!spring || row.fastener.bars) return [];
      // Table 6.11: k_10 = 1.6 A_s / L_b.
      const boltMm = (1.6 * stressAreaMm2) / spring.bolts.value;
      const sides = [
        { part: flange.family.alone[index], thicknessMm: design.column.section.flangeThicknessMm },
        { part: plate.family.alone[index], thicknessMm: view.attachment.thicknessMm },
      ];
      const isLong = sides.some(
        ({ part, thicknessMm }) =>
          part &&
          boltMm >
            pryingLengthMm(null, {
              mMm: part.mMm,
              stressAreaMm2,
              rows: 1,
              lengthMm: part.lengthOneMm.value,
              thicknessMm,
            }),
      );
      return isLong ? [row.row] : [];
    });
    if (rows.length === 0) return [];
    return [
      `Bolts of ${rows.length === 1 ? "row" : "rows"} ${rows.join(", ")} on the ${view.joint.side} are longer than L_b* of Table 6.2, so prying need not develop; it is assumed, as the standard allows for beam-to-column joints.`,
    ];
  });
  return [...new Set(words)];
}

/** Parts of an end plate that no resistance counts on. */
function endPlateCautions(node: NodeCase): readonly string[] {
  const plates = node.joints.flatMap(({ connection }) =>
    connection.kind === "end-plate" ? [connection] : [],
  );
  return [
    ...(plates.some(({ bolts }) => bolts.perRow === 4) ? [FOUR_BOLTS] : []),
    ...(plates.some(({ plate }) => plate.hasStiffenedExtension) ? [RIBS] : []),
  ];
}

/** What no resistance of a joint of angles counts on. */
function cleatCautions(node: NodeCase): readonly string[] {
  const cleats = node.joints.flatMap(({ connection }) =>
    connection.kind === "flange-cleats" ? [connection] : [],
  );
  return [
    ...(cleats.length > 0 ? [CLEATS] : []),
    ...(cleats.some(({ webCleats }) => webCleats !== null) ? [WEB_CLEATS] : []),
    ...(cleats.some(({ isStiffened }) => isStiffened) ? [STIFFENED_CLEATS] : []),
  ];
}

/** What a pair of stiffeners does not do as guidance would have it. */
function pairCautions(
  design: PanelDesign,
  { stiffener, level, sides, slopeCosine }: StiffenerPair,
  models: readonly JointModel[],
): readonly string[] {
  const cautions: string[] = [];
  const served = models.filter((model) => sides.includes(model.joint.view.joint.side));
  const flanges = served.map((model) => model.joint.view.joint.beam.section);
  const thickest = Math.max(...flanges.map(({ flangeThicknessMm }) => flangeThicknessMm));
  const widest = Math.max(...flanges.map(({ widthMm }) => widthMm));
  const onPlateMm = design.webPlates?.thicknessMm ?? 0;
  const breadthMm = 2 * (stiffener.widthMm + onPlateMm) + design.column.section.webThicknessMm;
  if (stiffener.thicknessMm < thickest) {
    cautions.push(
      `Stiffeners at the ${level} are thinner than the beam flange (${stiffener.thicknessMm} against ${thickest} mm); as guidance, match it.`,
    );
  }
  if (breadthMm < widest) {
    cautions.push(
      `Stiffeners at the ${level} do not reach as far as the beam flange; as guidance, match it.`,
    );
  }
  const isNarrow = served.some(
    (model) =>
      isBolted(model) &&
      model.joint.view.tensionLevel === level &&
      breadthMm < 1.33 * model.joint.view.gaugeMm,
  );
  if (isNarrow) {
    cautions.push(
      `Stiffeners at the ${level} are too narrow to hold the column flange (2 b_sg + t_wc under 1.33 gauge) and do not count for it.`,
    );
  }
  if (slopeCosine < 1) {
    cautions.push(
      `The stiffeners at the ${level} slope from one beam's flange to the other's: two pairs so near each other leave no room to weld.`,
    );
  }
  return cautions;
}
