import { areFacing } from "@/lib/calc";
import type { Level, MeasureCase, MeasureSides, NodeCase } from "@/lib/calc/node";
import type { Shape } from "./design-space";
import type { Stock, StockPlate } from "./stock";

/** Flats are cut to whole steps of 5 mm (common practice, no source). */
const CUT_STEP_MM = 5;
const roundUp = (value: number): number => Math.ceil(value / CUT_STEP_MM - 1e-9) * CUT_STEP_MM;
const roundDown = (value: number): number => Math.floor(value / CUT_STEP_MM + 1e-9) * CUT_STEP_MM;

/** EN 1993-1-8:2005, 4.5.2(2): throat of a fillet weld not below 3 mm. */
const LEAST_THROAT_MM = 3;
/** EN 1993-1-5:2006, 9.2.1(8), as section 0 of the method has it: outstand at most 14 epsilon t. */
const OUTSTAND_LIMIT = 14;
/** SCI P398: a stiffener helps the flange in bending only if 2 b + t_wc is at least this share of the gauge. */
const GAUGE_SHARE = 1.33;

const epsilon = (yieldMpa: number): number => Math.sqrt(235 / yieldMpa);

/** Widths worth trying, mm: what the beam's flange and the bolts ask for, and the column's full outstand. */
export function stiffenerWidthsMm(node: NodeCase): readonly number[] {
  const { section } = node.column;
  const outstand = roundDown((section.widthMm - section.webThicknessMm) / 2);
  const wanted = node.joints.map(({ beam, connection }) => {
    const reach = (beam.section.widthMm - section.webThicknessMm) / 2;
    const gauge = connection.kind === "end-plate" ? connection.bolts.gaugeMm : 0;
    return Math.max(reach, (GAUGE_SHARE * gauge - section.webThicknessMm) / 2);
  });
  const least = Math.min(outstand, roundUp(Math.max(...wanted)));
  return least < outstand ? [least, outstand] : [outstand];
}

/**
 * Plates matched to the beam flange (guidance of section 0): from the stock size at or just below
 * the thickest flange upwards to twice its thickness.
 */
function stiffenerPlates(node: NodeCase, stock: Stock): readonly StockPlate[] {
  const flange = Math.max(...node.joints.map(({ beam }) => beam.section.flangeThicknessMm));
  const below = stock.plates.filter(({ thicknessMm }) => thicknessMm <= flange).at(-1);
  const least = below?.thicknessMm ?? 0;
  const above = stock.plates.filter(({ thicknessMm }) => thicknessMm >= least);
  const within = above.filter(({ thicknessMm }) => thicknessMm <= 2 * flange);
  return within.length > 0 ? within : above.slice(0, 1);
}

/** Lengths of a partial-depth stiffener worth trying: half and three quarters of the clear depth, mm. */
export function partialLengthsMm(node: NodeCase): readonly number[] {
  const { depthMm, flangeThicknessMm } = node.column.section;
  const clear = depthMm - 2 * flangeThicknessMm;
  return [roundUp(clear / 2), roundUp((3 * clear) / 4)];
}

/** Where the beams' flanges differ in level, one of them may do with a pair of its own. */
function sidesWorthTrying(
  node: NodeCase,
  levels: readonly Level[],
): readonly { readonly at?: MeasureSides }[] {
  const [first, second] = node.joints;
  const isApart = first && second && levels.some((level) => !areFacing(first, second, level));
  return isApart ? [{ at: "left" }, { at: "right" }, {}] : [{}];
}

/** Every stock shape of a pair of transverse stiffeners at the given levels, alike at each level. */
export function stiffenerSpace(
  node: NodeCase,
  stock: Stock,
  levels: readonly Level[],
  lengths: readonly ("full" | number)[],
): readonly Shape[] {
  const throats = stock.throatsMm.filter((throat) => throat >= LEAST_THROAT_MM);
  if (throats.length === 0) return [];
  const clipMm = roundUp(node.column.section.rootMm);
  const shapes = lengths.flatMap((length) =>
    stiffenerPlates(node, stock).flatMap(({ thicknessMm, steel }) =>
      stiffenerWidthsMm(node)
        .filter(
          (widthMm) => widthMm > clipMm && widthMm <= OUTSTAND_LIMIT * epsilon(steel.yieldMpa) * thicknessMm,
        )
        .map((widthMm) => ({ length, thicknessMm, steel, widthMm })),
    ),
  );
  return sidesWorthTrying(node, levels)
    .flatMap((at) => shapes.map((shape) => ({ ...at, ...shape })))
    .map((shape) => ({
      ladders: [throats.length, throats.length],
      build: ([flange, web]: readonly number[]): readonly MeasureCase[] => [
        {
          kind: "transverse-stiffeners",
          levels,
          ...shape,
          clipMm,
          flangeWeld: { kind: "fillet", throatMm: throats[flange ?? 0] ?? LEAST_THROAT_MM },
          webWeld: { kind: "fillet", throatMm: throats[web ?? 0] ?? LEAST_THROAT_MM },
        },
      ],
    }));
}
