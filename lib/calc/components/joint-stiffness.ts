import { ELASTIC_MODULUS_MPA } from "../clauses/en1993-1-1-2005/members";
import {
  equivalentLeverMm,
  equivalentSpringMm,
  rowSpringMm,
  springFlexibilityPerMm,
} from "../clauses/en1993-1-8-2005/assembly";
import * as rules from "../clauses/en1993-1-8-2005/stiffness";
import { barColumnSpringMm } from "../mechanics/through-bar-formulas";
import { sectionProperties } from "../mechanics/section-properties";
import { cleatSpringMm } from "../clauses/en1993-1-8-2005/flange-cleat";
import type { ConnectionCase, JointCase, NodeCase } from "../node";
import type { StiffnessClass, StrengthClass } from "../result";
import { defineFormula } from "../trace/define-formula";
import { traced, type Traced } from "../trace/traced";
import type { BoltedJoint } from "./bolted-joint";
import type { ColumnPanel } from "./column-panel";
import { shortestLengthMm } from "./row-groups";

/** Springs of one tension row, mm. */
export interface RowSprings {
  readonly webTension: Traced;
  readonly flange: Traced;
  readonly plate: Traced;
  readonly bolts: Traced;
}

/** How much of the column's springs in each row the bars take over; null where the row has none. */
export interface RowBarShare {
  readonly share: number;
  readonly symmetric: number;
}

/** Springs of each tension row, the same in every load case. Table 6.11. */
export function rowSpringsOf(panel: ColumnPanel, joint: BoltedJoint, steps: boolean): readonly RowSprings[] {
  const { flange, plate, view } = joint;
  const attachmentSpringMm =
    view.joint.connection.kind === "flange-cleats" ? cleatSpringMm : rules.endPlateSpringMm;
  return view.tensionRows.map((row, index) => {
    const flangeLength = shortestLengthMm(flange.family, index);
    const { size, headHeightMm } = row.fastener;
    return {
      webTension: traced(steps, (trace) =>
        rules.webTensionSpringMm(trace, {
          breadthMm: flangeLength,
          thicknessMm: panel.tensionWebMm,
          webDepthMm: panel.properties.webDepthMm,
        }),
      ),
      flange: traced(steps, (trace) =>
        rules.flangeSpringMm(trace, {
          lengthMm: flangeLength,
          thicknessMm: panel.section.flangeThicknessMm,
          mMm: flange.mMm,
        }),
      ),
      plate: traced(steps, (trace) =>
        attachmentSpringMm(trace, {
          lengthMm: shortestLengthMm(plate.family, index),
          thicknessMm: view.attachment.thicknessMm,
          mMm: plate.leverByRowMm[index] ?? flange.mMm,
        }),
      ),
      bolts: traced(steps, (trace) => {
        const lengthMm = rules.boltLengthMm(trace, {
          plateMm: view.attachment.thicknessMm,
          flangeMm: panel.section.flangeThicknessMm,
          washerMm: size.washerThicknessMm,
          headMm: headHeightMm,
          nutMm: size.nutHeightMm,
        });
        return rules.boltSpringMm(trace, { stressAreaMm2: size.stressAreaMm2, lengthMm }, 0);
      }),
    };
  });
}

/** Tension side of a bolted joint as one spring at one lever arm. */
export interface TensionSpring {
  readonly leverMm: Traced;
  readonly spring: Traced;
}

/** Rows in series with one another's springs, then together. 6.3.3.1; one row by 6.3.2 gives the same. */
export function tensionSpringOf(
  joint: BoltedJoint,
  springs: readonly RowSprings[],
  bars: readonly (RowBarShare | null)[],
  steps: boolean,
): TensionSpring {
  const effective = springs.map((own, index) =>
    traced(steps, (trace) => {
      trace?.include(own.webTension.step);
      trace?.include(own.flange.step);
      const bar = bars[index];
      const column = bar
        ? [
            barColumnSpringMm(
              trace,
              {
                webSpringMm: own.webTension.value,
                flangeSpringMm: own.flange.value,
                share: bar.share,
                symmetric: bar.symmetric,
              },
              0,
            ),
          ]
        : [own.webTension.value, own.flange.value];
      trace?.include(own.plate.step);
      trace?.include(own.bolts.step);
      return rowSpringMm(trace, { springMm: [...column, own.plate.value, own.bolts.value] }, 0);
    }),
  );
  const terms = {
    springMm: effective.map((spring) => spring.value),
    leverMm: joint.view.tensionRows.map((row) => row.leverMm),
  };
  const build = (series: typeof equivalentLeverMm): Traced =>
    traced(steps, (trace) => {
      effective.forEach((spring) => trace?.include(spring.step));
      return series(trace, terms, 0);
    });
  return { leverMm: build(equivalentLeverMm), spring: build(equivalentSpringMm) };
}

/** Stands for "no part of the joint deforms": far stiffer than any joint with a part that does. */
const NO_FLEXIBILITY_NMM_PER_RAD = 1e15;

const noFlexibilityNmmPerRad = defineFormula({
  id: "en1993-1-8:2005/table-6.9/no component deforms",
  source: {
    document: "EN 1993-1-8",
    edition: "2005",
    ref: "Table 6.9: every stiffness coefficient that applies is infinite; a very large value stands for it",
  },
  symbols: { stiffnessNmmPerRad: ["S_large", "Nmm/rad"] },
  result: ["S_j,ini", "Nmm/rad"],
  expression: "stiffnessNmmPerRad",
  evaluate: (g) => g.stiffnessNmmPerRad,
  example: { given: { stiffnessNmmPerRad: 1e15 }, gives: 1e15, relTol: 1e-12 },
});

/** S_j,ini from the springs that count; infinite ones are left out. 6.3.1(4), Tables 6.9 and 6.10. */
export function initialStiffness(
  leverMm: Traced,
  springs: readonly (Traced | null)[],
  steps: boolean,
): Traced {
  const finite = springs.filter(
    (spring): spring is Traced => spring !== null && Number.isFinite(spring.value),
  );
  if (finite.length === 0) {
    return traced(steps, (trace) =>
      noFlexibilityNmmPerRad(trace, { stiffnessNmmPerRad: NO_FLEXIBILITY_NMM_PER_RAD }),
    );
  }
  return traced(steps, (trace) => {
    trace?.include(leverMm.step);
    const mark = trace?.mark();
    finite.forEach((spring) => trace?.include(spring.step));
    const flexibilityPerMm = springFlexibilityPerMm(
      trace,
      { springMm: finite.map((spring) => spring.value) },
      mark,
    );
    return rules.initialStiffnessNmmPerRad(
      trace,
      { elasticMpa: ELASTIC_MODULUS_MPA, leverMm: leverMm.value, flexibilityPerMm },
      0,
    );
  });
}

/** ψ of end-plate and welded joints, and of joints with flange cleats. Table 6.8. */
const PSI = 2.7;
const PSI_CLEATS = 3.1;

/** How fast the joint softens beyond two thirds of its resistance. Table 6.8. */
export const psiOf = (connection: ConnectionCase["kind"]): number =>
  connection === "flange-cleats" ? PSI_CLEATS : PSI;

/** S_j at the load case's moment, Nmm/rad; null above the resistance. 6.3.1(6). */
export function secantStiffness(
  momentNmm: number,
  resistanceNmm: number,
  initial: Traced,
  connection: ConnectionCase["kind"],
  steps: boolean,
): Traced | null {
  if (momentNmm > resistanceNmm) return null;
  const psi = psiOf(connection);
  return traced(steps, (trace) => {
    const mu = rules.stiffnessRatioMu(trace, { momentNmm, resistanceNmm, psi });
    trace?.include(initial.step);
    return rules.secantStiffnessNmmPerRad(trace, { initialNmmPerRad: initial.value, mu }, 0);
  });
}

/** Boundaries that classify the joint of one beam. 5.2.2.5 and 5.2.3. */
export interface ClassBounds {
  /** Null where an unbraced frame's beam is too slender against the column for any joint to count as rigid. */
  readonly rigid: Traced | null;
  readonly pinned: Traced;
  readonly fullStrengthNmm: number;
}

const SWAY_BEAM_SHARE = 0.1;

/** Class boundaries for one beam on this column. */
export function classBoundsOf(
  node: NodeCase,
  panel: ColumnPanel,
  joint: JointCase,
  steps: boolean,
): ClassBounds {
  const beam = sectionProperties(joint.beam.section);
  const boundary = (factor: number): Traced =>
    traced(steps, (trace) =>
      rules.rigidStiffnessNmmPerRad(trace, {
        factor,
        elasticMpa: ELASTIC_MODULUS_MPA,
        inertiaMm4: beam.inertiaMm4,
        spanMm: joint.beam.spanMm,
      }),
    );
  const beamRate = beam.inertiaMm4 / joint.beam.spanMm;
  const columnRate = panel.properties.inertiaMm4 / node.column.storeyHeightMm;
  const canBeRigid = node.bracing === "braced" || beamRate / columnRate >= SWAY_BEAM_SHARE;
  const columnPlastic = panel.properties.plasticModulusMm3 * panel.steel.yieldMpa;
  const isTop = node.column.endDistanceAboveMm !== null;
  return {
    rigid: canBeRigid ? boundary(node.bracing === "braced" ? 8 : 25) : null,
    pinned: boundary(0.5),
    fullStrengthNmm:
      Math.min(beam.plasticModulusMm3 * joint.beam.steel.yieldMpa, (isTop ? 1 : 2) * columnPlastic) /
      node.partialFactors.gammaM0,
  };
}

/** 5.2.2.5. */
export const stiffnessClassOf = (initialNmmPerRad: number, bounds: ClassBounds): StiffnessClass =>
  bounds.rigid && initialNmmPerRad >= bounds.rigid.value
    ? "rigid"
    : initialNmmPerRad <= bounds.pinned.value
      ? "pinned"
      : "semi-rigid";

/** 5.2.3. */
export const strengthClassOf = (resistanceNmm: number, bounds: ClassBounds): StrengthClass =>
  resistanceNmm >= bounds.fullStrengthNmm
    ? "full-strength"
    : resistanceNmm <= 0.25 * bounds.fullStrengthNmm
      ? "pinned"
      : "partial-strength";
