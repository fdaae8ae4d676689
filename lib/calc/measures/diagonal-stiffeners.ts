import { epsilonOf } from "../clauses/en1993-1-1-2005/members";
import {
  outstandLimitMm,
  stiffenerNetAreaMm2,
  twoShearPlanesN,
  yieldForceN,
} from "../clauses/en1993-1-5-2006/stiffeners";
import { filletShearStrengthMpa, weldForceN } from "../clauses/en1993-1-8-2005/welds";
import { checkOf, detailAtLeast, detailAtMost } from "../components/check";
import type { ColumnPanel } from "../components/column-panel";
import type { PanelDiagonals } from "../components/panel-diagonals";
import { isBolted, type JointModel } from "../joint-model";
import { diagonalForceN, diagonalWeldForceN } from "../mechanics/diagonal-formulas";
import type { Level, NodeCase, Side, Steel } from "../node";
import { OutsideScope } from "../outcome";
import type { ComponentCheck } from "../result";
import { traced, type Traced } from "../trace/traced";
import {
  hasBars,
  type ApplyMeasure,
  type DiagonalStiffeners,
  type PanelDesign,
  type TransverseStiffeners,
} from "./panel-design";

/** Plates on both sides of the web from flange level to flange level. SCI/BCSA P398, step 6D. */
export const applyDiagonalStiffeners: ApplyMeasure<DiagonalStiffeners> = (design, measure) => ({
  ...design,
  diagonals: measure,
});

const LEVELS: readonly Level[] = ["top", "bottom"];
const opposite = (side: Side): Side => (side === "left" ? "right" : "left");

/** A corner of the panel that a diagonal ends in. */
interface Corner {
  readonly side: Side;
  readonly level: Level;
}

function cornersOf({ arrangement, towards }: DiagonalStiffeners): readonly Corner[] {
  const far = opposite(towards);
  if (arrangement === "cross") {
    return LEVELS.flatMap((level) => [
      { side: towards, level },
      { side: far, level },
    ]);
  }
  return [
    { side: towards, level: "top" },
    { side: arrangement === "k" ? towards : far, level: "bottom" },
  ];
}

/** @throws OutsideScope where something else stands in the way of a diagonal. */
export function refuseBesideDiagonals(design: PanelDesign): void {
  const { diagonals } = design;
  if (!diagonals) return;
  if (design.webPlates) {
    throw new OutsideScope(
      "diagonal stiffeners on a web plate would bring their force in through its edge welds: one of the two at a time",
    );
  }
  if (hasBars(design)) throw new OutsideScope("bars from flange to flange run into the diagonal stiffeners");
  for (const { side, level } of cornersOf(diagonals)) {
    if (design.backing[side][level]) {
      throw new OutsideScope(
        `a diagonal ends where the backing plate at the ${level} on the ${side} would stand`,
      );
    }
  }
}

/** Fillets between a plate and the column, of the strength of the weaker of the two, N. */
function weldLimit(
  node: NodeCase,
  panel: ColumnPanel,
  steel: Steel,
  run: { readonly throatMm: number; readonly lengthMm: number },
  steps: boolean,
): Traced {
  return traced(steps, (trace) => {
    const strengthMpa = filletShearStrengthMpa(trace, {
      ultimateMpa: Math.min(steel.ultimateMpa, panel.steel.ultimateMpa),
      betaW: Math.max(steel.betaW, panel.steel.betaW),
      gammaM2: node.partialFactors.gammaM2,
    });
    return weldForceN(trace, { strengthMpa, throatMm: run.throatMm, lengthMm: run.lengthMm }, 0);
  });
}

/** Sharpest angle that a fillet weld counts at as such, cosine. EN 1993-1-8:2005, 4.3.2.1(1): 60 to 120 degrees. */
const SHARPEST_COSINE = 0.5;

/**
 * Runs of fillet that count at the end of one plate: both, or the one in the sharp corner as a partial penetration butt
 * weld, the other lying beyond 120 degrees. EN 1993-1-8:2005, 4.3.2.1(2) and (3), from memory.
 */
const endRuns = ({ cosine }: PanelDiagonals): 1 | 2 =>
  // Against the flange the plate stands at 90 degrees less its slope: the cosine of that is the slope's sine.
  Math.sqrt(1 - cosine.value ** 2) > SHARPEST_COSINE ? 1 : 2;

/** Length of a diagonal that is welded to the web, mm: its corners clear the roots. */
const alongWebMm = (panel: ColumnPanel, diagonals: PanelDiagonals): number =>
  diagonals.lengthMm - 2 * panel.section.rootMm;

/** The part of that near one end from which the web can bring the force in by its spread of 2.5 (t_f + r), mm. */
function spreadAlongMm(panel: ColumnPanel, diagonals: PanelDiagonals): number {
  const { flangeThicknessMm, rootMm } = panel.section;
  const sine = Math.sqrt(1 - diagonals.cosine.value ** 2);
  return Math.min(alongWebMm(panel, diagonals), (2.5 * (flangeThicknessMm + rootMm)) / sine);
}

interface Head {
  readonly side: Side;
  readonly loadCase: string;
}

function weldChecks(
  node: NodeCase,
  panel: ColumnPanel,
  diagonals: PanelDiagonals,
  force: Traced,
  head: Head,
  steps: boolean,
): ComponentCheck[] {
  const { weld, widthMm, steel } = diagonals.measure;
  if (weld.kind !== "fillet") return [];
  const of = (what: string, lengthMm: number): ComponentCheck =>
    checkOf(
      { ...head, component: "stiffener-weld", clause: "EN 1993-1-8, 4.5.3.3", what },
      force.value,
      weldLimit(node, panel, steel, { throatMm: weld.throatMm, lengthMm }, steps),
      { demandStep: force.step },
    );
  return [
    of("diagonal to flange", 2 * endRuns(diagonals) * (widthMm - panel.section.rootMm)),
    of("diagonal to web", 4 * alongWebMm(panel, diagonals)),
  ];
}

/** A level without a full-depth pair: the end's force comes out of the web beside it. */
function freeEndChecks(
  node: NodeCase,
  panel: ColumnPanel,
  diagonals: PanelDiagonals,
  level: Level,
  force: Traced,
  head: Head,
  steps: boolean,
): ComponentCheck[] {
  const lengthMm = spreadAlongMm(panel, diagonals);
  const { weld, steel } = diagonals.measure;
  const web = checkOf(
    {
      ...head,
      level,
      component: "diagonal-stiffener",
      clause: "EN 1993-1-1, 6.2.6",
      what: "column web in shear beside the diagonal's end",
    },
    force.value,
    traced(steps, (trace) =>
      twoShearPlanesN(trace, {
        lengthMm,
        thicknessMm: panel.section.webThicknessMm,
        yieldMpa: panel.steel.yieldMpa,
        gammaM0: node.partialFactors.gammaM0,
      }),
    ),
    { demandStep: force.step },
  );
  if (weld.kind !== "fillet") return [web];
  return [
    web,
    checkOf(
      {
        ...head,
        level,
        component: "stiffener-weld",
        clause: "EN 1993-1-8, 4.5.3.3",
        what: "diagonal to web beside its end",
      },
      force.value,
      weldLimit(node, panel, steel, { throatMm: weld.throatMm, lengthMm: 4 * lengthMm }, steps),
      { demandStep: force.step },
    ),
  ];
}

/** A full-depth pair at a diagonal's end brings the level part of its force across the column. */
function pairChecks(
  node: NodeCase,
  panel: ColumnPanel,
  pair: TransverseStiffeners,
  level: Level,
  levelPartN: number,
  head: Head,
  steps: boolean,
): ComponentCheck[] {
  const { widthMm, clipMm, thicknessMm, steel, flangeWeld } = pair;
  const plates = checkOf(
    {
      ...head,
      level,
      component: "transverse-stiffener",
      clause: "EN 1993-1-1, 6.2.3",
      what: "level part of the diagonal's force",
    },
    levelPartN,
    traced(steps, (trace) => {
      const areaMm2 = stiffenerNetAreaMm2(trace, { widthMm, clipMm, thicknessMm });
      return yieldForceN(
        trace,
        { areaMm2, yieldMpa: steel.yieldMpa, gammaM0: node.partialFactors.gammaM0 },
        0,
      );
    }),
  );
  if (flangeWeld.kind !== "fillet") return [plates];
  return [
    plates,
    checkOf(
      {
        ...head,
        level,
        component: "stiffener-weld",
        clause: "EN 1993-1-8, 4.5.3.3",
        what: "stiffener to flange at the diagonal's end",
      },
      levelPartN,
      weldLimit(
        node,
        panel,
        steel,
        { throatMm: flangeWeld.throatMm, lengthMm: 4 * (widthMm - clipMm) },
        steps,
      ),
    ),
  ];
}

/** The full-depth pair at a level; at one side it serves the other too, where the flanges face each other. */
export const fullPairAt = (design: PanelDesign, level: Level): TransverseStiffeners | null =>
  [design.stiffeners.left[level], design.stiffeners.right[level]].find((pair) => pair?.length === "full") ??
  null;

/**
 * Diagonals, their welds and what stands at their ends in one load case.
 *
 * @param shearN - of the panel; positive where it stretches the diagonal whose top end points to the left.
 */
export function diagonalChecks(
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  shearN: number,
  head: Head,
  steps: boolean,
): ComponentCheck[] {
  const { diagonals } = panel;
  if (!diagonals) return [];
  const { measure, count, resistance } = diagonals;
  const cosine = diagonals.cosine.value;
  const sizeN = Math.abs(shearN);
  const force = traced(steps, (trace) =>
    diagonalForceN(trace, { shearN: sizeN, panelN: panel.plainShear.value, count, cosine }),
  );
  const weldForce = traced(steps, (trace) =>
    diagonalWeldForceN(trace, { shearN: sizeN, diagonalN: resistance.value, count, cosine }),
  );
  const isStretched = measure.arrangement === "single" && shearN > 0 === (measure.towards === "left");
  const checks = [
    checkOf(
      {
        ...head,
        component: "diagonal-stiffener",
        clause: "SCI/BCSA P398, step 6D",
        what: isStretched ? "diagonal in tension" : "diagonal in compression",
      },
      force.value,
      isStretched ? diagonals.yielding : resistance,
      { demandStep: force.step },
    ),
    ...weldChecks(node, panel, diagonals, weldForce, head, steps),
  ];
  for (const level of LEVELS) {
    const pair = fullPairAt(design, level);
    checks.push(
      ...(pair
        ? pairChecks(node, panel, pair, level, weldForce.value * cosine, head, steps)
        : freeEndChecks(node, panel, diagonals, level, weldForce, head, steps)),
    );
  }
  return checks;
}

interface NutRoom {
  readonly neededMm: number;
  readonly actualMm: number;
}

/** Room for the nuts of a joint beside a diagonal that ends at `atMm` below the beam's top, sloping inwards. */
function nutRooms(
  panel: ColumnPanel,
  diagonals: PanelDiagonals,
  model: JointModel,
  atMm: number,
  inwards: readonly (1 | -1)[],
): NutRoom[] {
  if (!isBolted(model)) return [];
  const { thicknessMm, widthMm } = diagonals.measure;
  const cosine = diagonals.cosine.value;
  const tangent = Math.sqrt(1 - cosine ** 2) / cosine;
  const halfPlate = thicknessMm / 2 / cosine;
  return model.joint.view.rows.flatMap((row) => {
    const { size } = row.fastener;
    const halfNut = size.acrossPointsMm / 2;
    // A nut beyond the plate's edge is not beside it.
    if ((model.joint.view.gaugeMm - panel.section.webThicknessMm) / 2 - halfNut >= widthMm) return [];
    const away = row.belowTopMm - atMm;
    const isOnSlope = inwards.some((down) => away * down > 0);
    const climbed = isOnSlope ? (size.nutHeightMm + size.washerThicknessMm) * tangent : 0;
    return [{ neededMm: climbed + halfPlate + halfNut, actualMm: Math.abs(away) }];
  });
}

/** The nut with least to spare at any end of any diagonal; null where there are none. */
function tightestNut(
  panel: ColumnPanel,
  diagonals: PanelDiagonals,
  models: readonly JointModel[],
): NutRoom | null {
  const { arrangement, towards } = diagonals.measure;
  const corners = cornersOf(diagonals.measure);
  const rooms = models.flatMap((model) => {
    const { side, beam } = model.joint.view.joint;
    const { depthMm, flangeThicknessMm } = beam.section;
    const ends = corners
      .filter((corner) => corner.side === side)
      .flatMap(({ level }) =>
        level === "top"
          ? nutRooms(panel, diagonals, model, flangeThicknessMm / 2, [1])
          : nutRooms(panel, diagonals, model, depthMm - flangeThicknessMm / 2, [-1]),
      );
    const isMeeting = arrangement === "k" && side !== towards;
    return isMeeting ? [...ends, ...nutRooms(panel, diagonals, model, depthMm / 2, [1, -1])] : ends;
  });
  return rooms.sort((a, b) => a.actualMm - a.neededMm - (b.actualMm - b.neededMm))[0] ?? null;
}

/** Detailing of diagonal stiffeners. */
export function diagonalDetailing(panel: ColumnPanel, models: readonly JointModel[]): ComponentCheck[] {
  const { diagonals, section } = panel;
  if (!diagonals) return [];
  const { measure } = diagonals;
  const head = { side: measure.towards };
  const epsilon = epsilonOf(null, { yieldMpa: measure.steel.yieldMpa });
  const tightest = tightestNut(panel, diagonals, models);
  return [
    detailAtMost(
      { ...head, clause: "EN 1993-1-5, 9.2.1(8)", what: "diagonal's outstand, at most 14 ε t_s" },
      measure.widthMm,
      outstandLimitMm(null, { thicknessMm: measure.thicknessMm, epsilon }),
    ),
    detailAtMost(
      { ...head, clause: "geometry", what: "diagonal within the column flange" },
      measure.widthMm,
      (section.widthMm - section.webThicknessMm) / 2,
    ),
    ...(measure.weld.kind === "fillet"
      ? [
          detailAtLeast(
            { ...head, clause: "EN 1993-1-8, 4.5.2(2)", what: "throat of the diagonal's welds, 3 mm" },
            3,
            measure.weld.throatMm,
          ),
        ]
      : []),
    ...(tightest
      ? [
          detailAtLeast(
            { ...head, clause: "geometry", what: "nut beside the diagonal" },
            tightest.neededMm,
            tightest.actualMm,
          ),
        ]
      : []),
  ];
}
