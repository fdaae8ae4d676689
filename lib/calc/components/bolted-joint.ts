import { bendingClass, bendingResistanceNmm, epsilonOf } from "../clauses/en1993-1-1-2005/members";
import { boltedMomentNmm } from "../clauses/en1993-1-8-2005/assembly";
import {
  beamFlangeCompressionN,
  beamWebTensionN,
  deepBeamCompressionN,
} from "../clauses/en1993-1-8-2005/beam";
import { omegaOf, webTensionN } from "../clauses/en1993-1-8-2005/column-web";
import { relievedN } from "../mechanics/through-bar-formulas";
import { sectionProperties } from "../mechanics/section-properties";
import type { JointCase, NodeCase } from "../node";
import type { ComponentId } from "../result";
import { OutsideScope } from "../outcome";
import { defineFormula } from "../trace/define-formula";
import { traced, type Traced } from "../trace/traced";
import type { ColumnFlange } from "./column-flange";
import type { ColumnPanel } from "./column-panel";
import type { CompressionZone } from "./compression-zone";
import type { BoltedView } from "./connection-view";
import type { EndPlate } from "./end-plate";
import { assembleRows } from "./row-assembly";
import type { RowFamily, RowFamilyLimits } from "./row-groups";
import type { TStubPart } from "./t-stub-part";

/** A bolted joint with its tension flange at one level: all that no load case changes. */
export interface BoltedJoint {
  readonly kind: "bolted";
  readonly view: BoltedView;
  readonly flange: ColumnFlange;
  /** End plate, or the leg of the angle. */
  readonly plate: EndPlate;
  /** What the connection's own side limits, row by row and group by group. */
  readonly own: readonly OwnLimits[];
  /** Of these, the limits alone. */
  readonly ownLimits: readonly RowFamilyLimits[];
  /** Whether a row close to the failure of its bolts bounds the rows below it. 6.2.7.2(9). */
  readonly hasTriangularLimit: boolean;
  /** The column flange's resistances where no bars relieve it. */
  readonly flangeLimits: RowFamilyLimits;
  readonly compression: CompressionZone;
  readonly beamFlange: Traced;
  /** Bolts between the beam's compression flange and its angle; null without one. */
  readonly seat: Traced | null;
  /** What the connection's own side could carry on a column that never gives way, Nmm. */
  readonly connectionMomentNmm: number;
}

/** One component of the connection's own side over the tension rows. */
export interface OwnLimits {
  readonly component: ComponentId;
  readonly clause: string;
  readonly what?: string;
  readonly limits: RowFamilyLimits;
  /** Whether the attachment's spring, k_5 or k_6, is this component's. */
  readonly hasSpring: boolean;
}

const deepBeamMm = 600;

/** Beam flange and web in compression. @throws OutsideScope for a class 4 beam. */
export function beamCompression(node: NodeCase, joint: JointCase, steps: boolean): Traced {
  const { section, steel } = joint.beam;
  const properties = sectionProperties(section);
  const epsilon = epsilonOf(null, { yieldMpa: steel.yieldMpa });
  const beamClass = bendingClass({
    outstandMm: (section.widthMm - section.webThicknessMm) / 2 - section.rootMm,
    flangeThicknessMm: section.flangeThicknessMm,
    webDepthMm: properties.webDepthMm,
    webThicknessMm: section.webThicknessMm,
    epsilon,
  });
  if (beamClass === 4)
    throw new OutsideScope(`the ${joint.side} beam is a class 4 section (EN 1993-1-1, Table 5.2)`);
  return traced(steps, (trace) => {
    const momentNmm = bendingResistanceNmm(trace, {
      modulusMm3: beamClass === 2 ? properties.plasticModulusMm3 : properties.elasticModulusMm3,
      yieldMpa: steel.yieldMpa,
      gammaM0: node.partialFactors.gammaM0,
    });
    const { depthMm, flangeThicknessMm } = section;
    return depthMm > deepBeamMm
      ? deepBeamCompressionN(
          trace,
          {
            momentNmm,
            depthMm,
            flangeThicknessMm,
            widthMm: section.widthMm,
            yieldMpa: steel.yieldMpa,
            gammaM0: node.partialFactors.gammaM0,
          },
          0,
        )
      : beamFlangeCompressionN(trace, { momentNmm, depthMm, flangeThicknessMm }, 0);
  });
}

/** Beam web in tension behind each row inside the flanges and each group of them. */
function beamWebLimits(node: NodeCase, joint: JointCase, plate: EndPlate, steps: boolean): RowFamilyLimits {
  const limitOf = (part: TStubPart): Traced =>
    traced(steps, (trace) =>
      beamWebTensionN(trace, {
        breadthMm: part.modeLengthMm,
        thicknessMm: joint.beam.section.webThicknessMm,
        yieldMpa: joint.beam.steel.yieldMpa,
        gammaM0: node.partialFactors.gammaM0,
      }),
    );
  return {
    alone: plate.family.alone.map((part, index) => (plate.isInside[index] ? limitOf(part) : null)),
    groupsEndingAt: plate.family.groupsEndingAt.map((groups) =>
      groups.map(({ first, part }) => ({ first, part, limit: limitOf(part) })),
    ),
  };
}

/** What the parts of a family resist. */
export const resistancesOf = (family: RowFamily): RowFamilyLimits => ({
  alone: family.alone.map((part) => part.resistance),
  groupsEndingAt: family.groupsEndingAt.map((groups) =>
    groups.map(({ first, part }) => ({ first, part, limit: part.resistance })),
  ),
});

/** End plate in bending and beam web in tension. EN 1993-1-8:2005, 6.2.6.5, 6.2.6.8. */
export const endPlateLimits = (
  node: NodeCase,
  joint: JointCase,
  plate: EndPlate,
  steps: boolean,
): readonly OwnLimits[] => [
  {
    component: "end-plate-bending",
    clause: "EN 1993-1-8, 6.2.6.5",
    limits: resistancesOf(plate.family),
    hasSpring: true,
  },
  {
    component: "beam-web-tension",
    clause: "EN 1993-1-8, 6.2.6.8",
    limits: beamWebLimits(node, joint, plate, steps),
    hasSpring: false,
  },
];

/** Thickest plate or flange that bends before its bolts break, by the United Kingdom's annex, mm. */
const bendsFirstMm = defineFormula({
  id: "en1993-1-8:2005/6.2.7.2/t of the annex",
  source: {
    document: "National Annex to BS EN 1993-1-8",
    edition: "2008",
    ref: "to 6.2.7.2(9), as SCI/BCSA P398 (2013) prints it",
  },
  symbols: {
    diameterMm: ["d", "mm"],
    boltUltimateMpa: ["f_ub", "N/mm2"],
    yieldMpa: ["f_y", "N/mm2"],
  },
  result: ["t", "mm"],
  expression: "diameterMm / 1.9 * sqrt(boltUltimateMpa / yieldMpa)",
  evaluate: (g) => (g.diameterMm / 1.9) * Math.sqrt(g.boltUltimateMpa / g.yieldMpa),
  example: { given: { diameterMm: 19, boltUltimateMpa: 900, yieldMpa: 225 }, gives: 20, relTol: 1e-12 },
});

/** Whether rows follow a straight line below one close to the failure of its bolts. 6.2.7.2(9). */
function isTriangular(node: NodeCase, panel: ColumnPanel, view: BoltedView): boolean {
  const fastener = view.tensionRows[0]?.fastener;
  if (node.triangularLimit === "always" || !fastener) return true;
  const mostMm = (yieldMpa: number): number =>
    bendsFirstMm(null, {
      diameterMm: fastener.size.diameterMm,
      boltUltimateMpa: fastener.grade.ultimateMpa,
      yieldMpa,
    });
  const { attachment } = view;
  return (
    attachment.thicknessMm > mostMm(attachment.yieldMpa) &&
    panel.section.flangeThicknessMm > mostMm(panel.steel.yieldMpa)
  );
}

/** What a bolted joint is made of. */
export interface BoltedParts {
  readonly flange: ColumnFlange;
  readonly plate: EndPlate;
  readonly own: readonly OwnLimits[];
  readonly compression: CompressionZone;
  readonly seat: Traced | null;
}

/** Everything about a bolted joint that does not depend on the load case. */
export function boltedJointOf(
  node: NodeCase,
  panel: ColumnPanel,
  view: BoltedView,
  parts: BoltedParts,
  steps: boolean,
): BoltedJoint {
  const beamFlange = beamCompression(node, view.joint, steps);
  const hasTriangularLimit = isTriangular(node, panel, view);
  const ownLimits = parts.own.map(({ limits }) => limits);
  const alone = assembleRows(
    view.tensionRows,
    ownLimits,
    Math.min(beamFlange.value, parts.seat?.value ?? Infinity),
    hasTriangularLimit,
    false,
  );
  const connectionMomentNmm = boltedMomentNmm(null, {
    leverMm: view.tensionRows.map((row) => row.leverMm),
    forceN: alone.forces.map((force) => force.value),
  });
  return {
    kind: "bolted",
    view,
    flange: parts.flange,
    plate: parts.plate,
    own: parts.own,
    ownLimits,
    hasTriangularLimit,
    compression: parts.compression,
    flangeLimits: resistancesOf(parts.flange.family),
    beamFlange,
    seat: parts.seat,
    connectionMomentNmm,
  };
}

/** How bars relieve the column in one load case: 0 where they do not. By position among the tension rows. */
export interface TensionRelief {
  readonly flange: readonly number[];
  readonly web: readonly number[];
}

/** Relief of a group: the mean of its rows, of which the outer two only may count. */
function groupRelief(relief: readonly number[], first: number, count: number): number {
  const outer = (relief[first] ?? 0) + (relief[first + count - 1] ?? 0);
  return outer / count;
}

/** Column flange and column web on the tension side, in one load case. */
export interface ColumnTension {
  readonly flange: RowFamilyLimits;
  readonly web: RowFamilyLimits;
}

/** Column-side limits of each row and group for one beta and one set of reliefs. */
export function columnTension(
  node: NodeCase,
  panel: ColumnPanel,
  joint: BoltedJoint,
  beta: number,
  relief: TensionRelief,
  steps: boolean,
): ColumnTension {
  const { family, isWebHeld } = joint.flange;
  const webOf = (lengthMm: number, share: number): Traced =>
    traced(steps, (trace) => {
      const omega = omegaOf(trace, {
        beta,
        stripMm2: lengthMm * panel.section.webThicknessMm,
        shearAreaMm2: panel.shearArea.value,
      });
      const plain = webTensionN(
        trace,
        {
          omega,
          breadthMm: lengthMm,
          thicknessMm: panel.tensionWebMm,
          yieldMpa: panel.steel.yieldMpa,
          gammaM0: node.partialFactors.gammaM0,
        },
        0,
      );
      return share > 0 ? relievedN(trace, { resistanceN: plain, relief: share }, 0) : plain;
    });
  const isRelieved = relief.web.some((share) => share > 0);
  const alone = isRelieved
    ? family.alone.map((part, index) => part.relieved(relief.flange[index] ?? 0))
    : family.alone;
  const groups = isRelieved
    ? family.groupsEndingAt.map((ending) =>
        ending.map(({ first, part }) => ({
          first,
          part,
          relieved: part.relieved(groupRelief(relief.flange, first, part.rows.length)),
        })),
      )
    : family.groupsEndingAt.map((ending) =>
        ending.map(({ first, part }) => ({ first, part, relieved: part })),
      );
  const isGroupHeld = (first: number, count: number): boolean =>
    isWebHeld.slice(first, first + count).every((isHeld) => isHeld);
  return {
    flange: isRelieved
      ? {
          alone: alone.map((part) => part.resistance),
          groupsEndingAt: groups.map((ending) =>
            ending.map(({ first, part, relieved }) => ({ first, part, limit: relieved.resistance })),
          ),
        }
      : joint.flangeLimits,
    web: {
      alone: alone.map((part, index) =>
        isWebHeld[index] ? null : webOf(part.modeLengthMm, relief.web[index] ?? 0),
      ),
      groupsEndingAt: groups.map((ending) =>
        ending
          .filter(({ first, part }) => !isGroupHeld(first, part.rows.length))
          .map(({ first, part, relieved }) => ({
            first,
            part,
            limit: webOf(relieved.modeLengthMm, groupRelief(relief.web, first, part.rows.length)),
          })),
      ),
    },
  };
}
