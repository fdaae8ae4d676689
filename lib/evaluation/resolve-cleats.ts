import type { FastenerGrade, FastenerSize, FlangeCleatConnection, Steel } from "@/lib/calc/node";
import type { Connection } from "@/lib/schemas/node-document";
import { shownMm } from "./resolve-errors";
import {
  resolveAngle,
  resolveFastenerGrade,
  resolveFastenerSize,
  resolveSteel,
  type Resolving,
} from "./resolve-parts";

type CleatInput = Extract<Connection, { kind: "flange-cleats" }>;
type WebCleatInput = NonNullable<CleatInput["webCleats"]>;

interface Leg {
  /** The leg of an unequal angle that points this way is not stated, so the longer one is allowed. */
  readonly longestMm: number;
  readonly shortestMm: number;
  readonly innerFaceMm: number;
  readonly rootMm: number;
  readonly steel: Steel;
}

function checkAngle(
  context: Resolving,
  cleat: { readonly section: string; readonly steel: CleatInput["cleat"]["steel"] },
  path: string,
): Leg | null {
  const angle = resolveAngle(context, cleat.section, `${path}.section`);
  const steel = angle && resolveSteel(context, cleat.steel, angle.thicknessMm, `${path}.steel`);
  return (
    steel && {
      longestMm: Math.max(angle.legAMm, angle.legBMm),
      shortestMm: Math.min(angle.legAMm, angle.legBMm),
      innerFaceMm: angle.thicknessMm,
      rootMm: angle.rootRadiusMm,
      steel,
    }
  );
}

/** Each hole must lie on the leg: beyond the other leg's inner face and short of the leg's toe. */
function checkHolesOnLeg(
  context: Resolving,
  leg: Leg | null,
  holeMm: number | null,
  rows: readonly number[],
  pathOf: (index: number) => string,
): void {
  if (!leg || holeMm === null) return;
  rows.forEach((fromHeelMm, index) => {
    if (fromHeelMm + holeMm / 2 >= leg.longestMm) {
      context.problems.add(
        pathOf(index),
        `The hole at ${shownMm(fromHeelMm)} mm from the heel passes the end of the ${shownMm(leg.longestMm)} mm leg.`,
      );
    }
    if (fromHeelMm - holeMm / 2 <= leg.innerFaceMm) {
      context.problems.add(
        pathOf(index),
        `The hole at ${shownMm(fromHeelMm)} mm from the heel meets the other leg.`,
      );
    }
  });
}

interface BoltKind {
  readonly size: FastenerSize;
  readonly grade: FastenerGrade;
}

function boltsOf(
  context: Resolving,
  bolts: { readonly size: string; readonly grade: string },
  path: string,
): BoltKind | null {
  const grade = resolveFastenerGrade(context, bolts.grade, `${path}.grade`);
  const size = resolveFastenerSize(context, bolts.size, `${path}.size`);
  return size && grade && { size, grade };
}

function webCleatsOf(
  context: Resolving,
  input: WebCleatInput,
  path: string,
): FlangeCleatConnection["webCleats"] {
  boltsOf(context, input.bolts, `${path}.bolts`);
  boltsOf(context, input.beamBolts, `${path}.beamBolts`);
  const leg = checkAngle(context, input, path);
  return leg && { legMm: leg.longestMm, thicknessMm: leg.innerFaceMm, lengthMm: input.length };
}

/** The legs of an unequal angle as they must lie for their holes: the longer one where a hole is farther from the heel. */
function legsOf(leg: Leg, { bolts, beamBolts }: CleatInput): { columnLegMm: number; beamLegMm: number } {
  const isLongOnBeam = Math.max(...beamBolts.rows) >= bolts.distance;
  return isLongOnBeam
    ? { columnLegMm: leg.shortestMm, beamLegMm: leg.longestMm }
    : { columnLegMm: leg.longestMm, beamLegMm: leg.shortestMm };
}

/** Looks every name of a cleat connection up and refuses holes off the angle. */
export function resolveCleats(
  context: Resolving,
  input: CleatInput,
  path: string,
): FlangeCleatConnection | null {
  const leg = checkAngle(context, input.cleat, `${path}.cleat`);
  const bolts = boltsOf(context, input.bolts, `${path}.bolts`);
  const beamBolts = boltsOf(context, input.beamBolts, `${path}.beamBolts`);
  const hole = bolts?.size.holeMm ?? null;
  const beamHole = beamBolts?.size.holeMm ?? null;
  checkHolesOnLeg(context, leg, hole, [input.bolts.distance], () => `${path}.bolts.distance`);
  checkHolesOnLeg(context, leg, beamHole, input.beamBolts.rows, (index) => `${path}.beamBolts.rows.${index}`);
  for (const [which, holeMm] of [
    ["bolts", hole],
    ["beamBolts", beamHole],
  ] as const) {
    if (holeMm !== null && input[which].gauge + holeMm >= input.cleat.length) {
      context.problems.add(
        `${path}.${which}.gauge`,
        `The holes pass the end of the ${shownMm(input.cleat.length)} mm long cleat.`,
      );
    }
  }
  const webCleats = input.webCleats ? webCleatsOf(context, input.webCleats, `${path}.webCleats`) : null;
  if (!leg || !bolts || !beamBolts) return null;
  return {
    kind: "flange-cleats",
    cleat: {
      ...legsOf(leg, input),
      thicknessMm: leg.innerFaceMm,
      rootMm: leg.rootMm,
      lengthMm: input.cleat.length,
      steel: leg.steel,
    },
    isStiffened: input.stiffened !== undefined,
    bolts: { ...bolts, gaugeMm: input.bolts.gauge, distanceMm: input.bolts.distance },
    beamBolts: { ...beamBolts, gaugeMm: input.beamBolts.gauge, rowsMm: input.beamBolts.rows },
    gapMm: input.gap,
    webCleats,
  };
}
