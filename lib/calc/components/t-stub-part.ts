import { groupLengthMm } from "../clauses/en1993-1-8-2005/assembly";
import { punchingN } from "../clauses/en1993-1-8-2005/fasteners";
import {
  backingMomentNmm,
  modeOneBackedN,
  modeOneBackedSimpleN,
  modeOneN,
  modeOneSimpleN,
  modeThreeN,
  modeTwoN,
  tStubMomentNmm,
  tStubN,
  tStubWithoutModeOneN,
} from "../clauses/en1993-1-8-2005/t-stub";
import {
  backedFromStiffenerMm,
  backedLengthMm,
  modeOneWithPlateN,
} from "../mechanics/backing-plate-formulas";
import { relievedModeTwoN, relievedN } from "../mechanics/through-bar-formulas";
import { defineFormula } from "../trace/define-formula";
import { defineSeries, sumText } from "../trace/define-series";
import type { NodeCase, Steel } from "../node";
import type { Step, Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import type { BackingPiece } from "./backing-pieces";
import type { BoltRow } from "./connection-view";

/** The two families of yield patterns of one row: circular and other. */
export interface PatternLengths {
  readonly circular: Traced;
  readonly other: Traced;
}

/** One equivalent T-stub: a row alone or a group of neighbouring rows of one flange or plate. */
export interface TStubPart {
  readonly rows: readonly BoltRow[];
  /** The rows as the document numbers them, ascending. */
  readonly rowNumbers: readonly number[];
  /** l_eff,1 = min(cp, nc); l_eff,2 = nc. */
  readonly lengthOneMm: Traced;
  readonly lengthTwoMm: Traced;
  /** Each row's own share of the shorter pattern, for the stiffness of that row. */
  readonly shortestByRowMm: readonly number[];
  readonly mMm: number;
  readonly nMm: number;
  readonly momentTwoNmm: number;
  readonly boltsN: number;
  readonly resistance: Traced;
  /** Mode 3 alone: bolts in tension or punching through. */
  readonly modeThree: Traced;
  /** 1, 2 or 3: which mode gives the resistance. */
  readonly mode: 1 | 2 | 3;
  /** Effective length of that mode (that of mode 2 where the bolts fail). */
  readonly modeLengthMm: number;
  /** The same part with the column relieved by bars; 0 gives the part itself. */
  readonly relieved: (relief: number) => Pick<TStubPart, "resistance" | "mode" | "modeLengthMm">;
}

const document = { document: "EN 1993-1-8", edition: "2005" } as const;

const shorterMm = defineFormula({
  id: "en1993-1-8:2005/6.2.4/l_eff,1",
  source: { ...document, ref: "6.2.4.1, Tables 6.4 to 6.6: mode 1 takes the shorter pattern" },
  symbols: { circularMm: ["l_eff,cp", "mm"], otherMm: ["l_eff,nc", "mm"] },
  result: ["l_eff,1", "mm"],
  expression: "min(circularMm, otherMm)",
  evaluate: (g) => Math.min(g.circularMm, g.otherMm),
  example: { given: { circularMm: 200, otherMm: 180 }, gives: 180, relTol: 1e-12 },
});

const sumOfRowsN = defineSeries({
  terms: ["rowN"],
  exampleCount: 2,
  evaluate: ({ rowN }) => rowN.reduce((sum, value) => sum + value, 0),
  build: (count) => ({
    id: "en1993-1-8:2005/6.2.4/mode 3 of a group",
    source: { ...document, ref: "Table 6.2, mode 3, all bolts of the group" },
    symbols: Object.fromEntries(
      Array.from({ length: count }, (_, index) => [`rowN${index + 1}`, [`F_T,3,${index + 1}`, "N"] as const]),
    ),
    result: ["F_T,3,Rd", "N"],
    expression: sumText(count, (n) => `rowN${n}`),
  }),
  example: { given: { rowN: [400_000, 350_000] }, gives: 750_000, relTol: 1e-12 },
});

export interface TStubSetting {
  readonly node: NodeCase;
  readonly thicknessMm: number;
  readonly steel: Steel;
  readonly mMm: number;
  readonly nMm: number;
  /** Plates behind the flange; none behind an end plate. */
  readonly backing: readonly BackingPiece[];
  readonly steps: boolean;
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

function rowModeThree(trace: Trace | null, row: BoltRow, setting: TStubSetting): number {
  const mark = trace?.mark();
  const { size } = row.fastener;
  trace?.include(row.fastener.tension.step);
  const punching = punchingN(trace, {
    meanDiameterMm: (size.acrossFlatsMm + size.acrossPointsMm) / 2,
    thicknessMm: setting.thicknessMm,
    ultimateMpa: setting.steel.ultimateMpa,
    gammaM2: setting.node.partialFactors.gammaM2,
  });
  return modeThreeN(trace, { count: 2, tensionN: row.fastener.tension.value, punchingN: punching }, mark);
}

interface Modes {
  readonly oneNOrNull: Traced | null;
  readonly two: Traced;
  readonly three: Traced;
  readonly momentTwoNmm: number;
  readonly boltsN: number;
}

/** Length of the pattern that one piece of plate stands behind, mm. Rows in order from the tension flange. */
function backedOf(
  trace: Trace | null,
  rows: readonly BoltRow[],
  lengthMm: number,
  piece: BackingPiece,
): number {
  const first = rows[0];
  const last = rows[rows.length - 1];
  if (!first || !last) throw new RangeError("A T-stub without rows");
  if (piece.heldRow === first.row || piece.heldRow === last.row) {
    return backedFromStiffenerMm(trace, { lengthMm, pieceMm: piece.toMm - piece.fromMm });
  }
  return backedLengthMm(trace, {
    lengthMm,
    spanMm: last.fromFaceMm - first.fromFaceMm,
    beforeMm: first.fromFaceMm - piece.fromMm,
    afterMm: piece.toMm - last.fromFaceMm,
  });
}

interface ModeOneGiven {
  readonly momentNmm: number;
  readonly mMm: number;
  readonly nMm: number;
  readonly headMm: number;
}

/** Mode 1 by the chosen method; where one plate stands behind all the rows, the larger of without and with it. */
function modeOneOf(
  trace: Trace | null,
  rows: readonly BoltRow[],
  one: Traced,
  setting: TStubSetting,
  given: ModeOneGiven,
): number {
  const isSimple = setting.node.tStubModeOne === "method-1";
  const { mMm, nMm, headMm } = given;
  const plainN = isSimple
    ? modeOneSimpleN(trace, { momentNmm: given.momentNmm, mMm }, 0)
    : modeOneN(trace, { momentNmm: given.momentNmm, mMm, nMm, headMm }, 0);
  if (setting.backing.length === 0) return plainN;
  const piece = setting.backing.find((candidate) =>
    rows.every((row) => row.fromFaceMm > candidate.fromMm && row.fromFaceMm < candidate.toMm),
  );
  if (!piece) return plainN;
  const mark = trace?.mark();
  const { gammaM0 } = setting.node.partialFactors;
  const lengthMm = backedOf(trace, rows, one.value, piece);
  const momentNmm = tStubMomentNmm(trace, {
    lengthMm,
    thicknessMm: setting.thicknessMm,
    yieldMpa: setting.steel.yieldMpa,
    gammaM0,
  });
  const backingNmm = backingMomentNmm(trace, {
    lengthMm,
    thicknessMm: piece.thicknessMm,
    yieldMpa: piece.yieldMpa,
    gammaM0,
  });
  const backedN = isSimple
    ? modeOneBackedSimpleN(trace, { momentNmm, mMm, backingNmm }, mark)
    : modeOneBackedN(trace, { momentNmm, mMm, backingNmm, nMm, headMm }, mark);
  return modeOneWithPlateN(trace, { plainN, backedN }, 0);
}

function modesOf(rows: readonly BoltRow[], one: Traced, two: Traced, setting: TStubSetting): Modes {
  const { node, thicknessMm, steel, mMm, nMm, steps } = setting;
  const plastic = (length: Traced) =>
    traced(steps, (trace) => {
      trace?.include(length.step);
      return tStubMomentNmm(
        trace,
        {
          lengthMm: length.value,
          thicknessMm,
          yieldMpa: steel.yieldMpa,
          gammaM0: node.partialFactors.gammaM0,
        },
        0,
      );
    });
  const headMm = Math.min(...rows.map((row) => row.fastener.size.acrossPointsMm)) / 4;
  const simple = node.tStubModeOne === "method-1";
  const momentOne = plastic(one);
  const oneNOrNull =
    !simple && 2 * mMm * nMm - headMm * (mMm + nMm) <= 0
      ? null
      : traced(steps, (trace) => {
          trace?.include(momentOne.step);
          return modeOneOf(trace, rows, one, setting, { momentNmm: momentOne.value, mMm, nMm, headMm });
        });
  const momentTwo = plastic(two);
  const boltsN = 2 * sum(rows.map((row) => row.fastener.tension.value));
  return {
    oneNOrNull,
    two: traced(steps, (trace) => {
      trace?.include(momentTwo.step);
      trace?.include(rows[0]?.fastener.tension.step);
      return modeTwoN(trace, { momentNmm: momentTwo.value, mMm, nMm, boltsN }, 0);
    }),
    three: traced(steps, (trace) => {
      const rowN = rows.map((row) => rowModeThree(trace, row, setting));
      return rowN.length === 1 && rowN[0] !== undefined ? rowN[0] : sumOfRowsN(trace, { rowN }, 0);
    }),
    momentTwoNmm: momentTwo.value,
    boltsN,
  };
}

function least(
  one: Traced | null,
  two: Traced,
  three: Traced,
  steps: boolean,
): { resistance: Traced; mode: 1 | 2 | 3 } {
  const children: readonly (Step | undefined)[] = [one?.step, two.step, three.step];
  const resistance = traced(steps, (trace) => {
    children.forEach((step) => trace?.include(step));
    return one
      ? tStubN(trace, { oneN: one.value, twoN: two.value, threeN: three.value }, 0)
      : tStubWithoutModeOneN(trace, { twoN: two.value, threeN: three.value }, 0);
  });
  const mode = one && resistance.value === one.value ? 1 : resistance.value === two.value ? 2 : 3;
  return { resistance, mode };
}

/**
 * The T-stub of one row (one pair of lengths) or of a group (a pair for each row), with its three modes.
 * EN 1993-1-8:2005, 6.2.4, Table 6.2.
 */
export function tStubPartOf(
  rows: readonly BoltRow[],
  lengths: readonly PatternLengths[],
  setting: TStubSetting,
): TStubPart {
  const { steps, mMm, nMm } = setting;
  const total = (pick: (pair: PatternLengths) => Traced): Traced => {
    const first = lengths[0];
    if (lengths.length === 1 && first) return pick(first);
    return traced(steps, (trace) => {
      lengths.forEach((pair) => trace?.include(pick(pair).step));
      return groupLengthMm(trace, { partMm: lengths.map((pair) => pick(pair).value) }, 0);
    });
  };
  const circular = total((pair) => pair.circular);
  const lengthTwoMm = total((pair) => pair.other);
  const lengthOneMm = traced(steps, (trace) => {
    trace?.include(circular.step);
    trace?.include(lengthTwoMm.step);
    return shorterMm(trace, { circularMm: circular.value, otherMm: lengthTwoMm.value }, 0);
  });
  const modes = modesOf(rows, lengthOneMm, lengthTwoMm, setting);
  const lengthOf = (mode: 1 | 2 | 3): number => (mode === 1 ? lengthOneMm.value : lengthTwoMm.value);
  const plain = least(modes.oneNOrNull, modes.two, modes.three, steps);
  const own = { resistance: plain.resistance, mode: plain.mode, modeLengthMm: lengthOf(plain.mode) };
  const relieved = (relief: number): Pick<TStubPart, "resistance" | "mode" | "modeLengthMm"> => {
    if (relief === 0) return own;
    const one = modes.oneNOrNull;
    const raisedOne = one
      ? traced(steps, (trace) => {
          trace?.include(one.step);
          return relievedN(trace, { resistanceN: one.value, relief }, 0);
        })
      : null;
    const raisedTwo = traced(steps, (trace) =>
      relievedModeTwoN(trace, { momentNmm: modes.momentTwoNmm, mMm, nMm, boltsN: modes.boltsN, relief }),
    );
    const raised = least(raisedOne, raisedTwo, modes.three, steps);
    return { resistance: raised.resistance, mode: raised.mode, modeLengthMm: lengthOf(raised.mode) };
  };
  return {
    rows,
    rowNumbers: rows.map((row) => row.row).sort((a, b) => a - b),
    lengthOneMm,
    lengthTwoMm,
    shortestByRowMm: lengths.map((pair) => Math.min(pair.circular.value, pair.other.value)),
    mMm,
    nMm,
    momentTwoNmm: modes.momentTwoNmm,
    boltsN: modes.boltsN,
    resistance: own.resistance,
    modeThree: modes.three,
    mode: own.mode,
    modeLengthMm: own.modeLengthMm,
    relieved,
  };
}
