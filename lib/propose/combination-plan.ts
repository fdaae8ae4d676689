import type { Level, NodeCase } from "@/lib/calc/node";
import type { OptionOutcome } from "@/lib/calc/result";
import { backingPlateSpace } from "./backing-plate-space";
import { fixedShape, joinShapes, listSpace, type DesignSpace, type Shape } from "./design-space";
import { diagonalSpace } from "./diagonal-space";
import { forceLevels } from "./force-levels";
import {
  BACKING_PARTS,
  BOTH,
  COLUMN_PARTS,
  WEB_PLATE_PARTS,
  barParts,
  barSpace,
  canTakeBars,
  isEmpty,
  levelWords,
  stiffenerParts,
  type PlannedOption,
} from "./option-plan";
import { stiffenerSpace } from "./stiffener-space";
import type { Stock } from "./stock";
import { webPlateSpace } from "./web-plate-space";

/** One thing that combinations are made of. */
interface Ingredient {
  readonly key: string;
  readonly words: string;
  readonly parts: readonly string[];
  /** Made when first asked for: most combinations are not. */
  readonly shapes: () => readonly Shape[];
}

const once = (make: () => readonly Shape[]): (() => readonly Shape[]) => {
  let made: readonly Shape[] | null = null;
  return () => (made ??= make());
};

/** A combination whose shapes are worked out only where no part of it does already. */
export interface PlannedCombination extends Omit<PlannedOption, "space"> {
  readonly space: () => DesignSpace;
}

class Ingredients {
  readonly webPlates = ([1, 2] as const).map((sides) => ({
    key: sides === 1 ? "web-plate" : "web-plates",
    words: sides === 1 ? "web plate" : "web plates",
    parts: WEB_PLATE_PARTS[sides],
    shapes: once(() => webPlateSpace(this.node, this.stock, sides)),
  }));
  readonly backing: Ingredient = {
    key: "backing",
    words: "backing plates",
    parts: BACKING_PARTS,
    shapes: once(() => backingPlateSpace(this.node, this.stock)),
  };
  readonly diagonals: Ingredient = {
    key: "diagonals",
    words: "diagonals",
    parts: ["diagonals"],
    shapes: once(() => diagonalSpace(this.node, this.stock)),
  };

  constructor(
    private readonly node: NodeCase,
    private readonly stock: Stock,
  ) {}

  readonly stiffeners = (levels: readonly Level[]): Ingredient => ({
    key: `stiffeners-${levels.length === 2 ? "both" : (levels[0] ?? "")}`,
    words: `stiffeners ${levelWords(levels)}`,
    parts: stiffenerParts(levels),
    shapes: once(() => stiffenerSpace(this.node, this.stock, levels, ["full"])),
  });

  readonly bars = (levels: readonly Level[]): Ingredient => ({
    key: `bars-${levels.length === 2 ? "both" : (levels[0] ?? "")}`,
    words: `bars ${levelWords(levels)}`,
    parts: barParts(levels),
    shapes: once(() => (canTakeBars(this.node) ? barSpace(this.node, this.stock, levels) : [])),
  });
}

/**
 * Sizes of one ingredient tried in a combination of three, and of bars with web plates, which is the dearest of pairs: more
 * would be a search for its own sake.
 */
const FEW_SIZES = 4;

/** Few shapes in place of many, the extremes among them. */
export function thinned(shapes: readonly Shape[]): readonly Shape[] {
  const last = shapes.length - 1;
  if (last < FEW_SIZES) return shapes;
  const kept = Array.from({ length: FEW_SIZES }, (_, step) => Math.round((step * last) / (FEW_SIZES - 1)));
  return shapes.filter((_, index) => kept.includes(index));
}

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

const isBars = ({ parts }: Ingredient): boolean => parts.some((part) => part.startsWith("bars"));
const isWebPlate = ({ parts }: Ingredient): boolean => parts.includes("web plate");

function combine(...all: readonly Ingredient[]): PlannedCombination {
  const isCoarse = all.length > 2 || (all.some(isBars) && all.some(isWebPlate));
  return {
    key: all.map(({ key }) => key).join("-"),
    name: capital(all.map(({ words }) => words).join(", ")),
    parts: all.flatMap(({ parts }) => parts),
    space: () => {
      const lists = all.map(({ shapes }) => (isCoarse ? thinned(shapes()) : shapes()));
      const [lead = [], second = [], ...more] = lists;
      const rest = more.reduce((a, b) => a.flatMap((one) => b.map((two) => joinShapes(one, two))), second);
      return { kind: "product", first: lead, second: rest };
    },
  };
}

/** A heavier column with stiffeners fitted to it, each column with its own. */
function columnWithStiffeners(node: NodeCase, stock: Stock, levels: readonly Level[]): PlannedCombination {
  return {
    key: `heavier-column-stiffeners-${levels.length === 2 ? "both" : (levels[0] ?? "")}`,
    name: `Heavier column, stiffeners ${levelWords(levels)}`,
    parts: [...COLUMN_PARTS, ...stiffenerParts(levels)],
    space: () =>
      listSpace(
        stock.columns.flatMap(({ section, steel }) => {
          const column = fixedShape([{ kind: "heavier-column", section, steel }]);
          const heavier = { ...node, column: { ...node.column, section, steel } };
          return stiffenerSpace(heavier, stock, levels, ["full"]).map((shape) => joinShapes(column, shape));
        }),
      ),
  };
}

/** Whether the panel's shear or a stiffness not reached asks for diagonals. */
export const asksForDiagonals = (bare: OptionOutcome, targetUtilisation: number): boolean =>
  bare.kind === "evaluated" &&
  (!bare.stiffnessReached ||
    bare.checks.some(
      ({ component, utilisation }) => component === "column-web-shear" && utilisation > targetUtilisation,
    ));

/**
 * Every combination that makes sense on this node, those of fewer parts first. Stiffeners go where the column is pushed,
 * bars and backing plates where it is pulled, web plates and diagonals where the panel is sheared.
 *
 * @param wantsDiagonals - only a panel short of shear resistance or stiffness is braced.
 */
export function planCombinations(
  node: NodeCase,
  stock: Stock,
  wantsDiagonals: boolean,
): readonly PlannedCombination[] {
  const of = new Ingredients(node, stock);
  const { compression } = forceLevels(node);
  const pushed = compression.length > 0 ? compression : BOTH;
  const stiffenedLevels: readonly (readonly Level[])[] = pushed.length === 2 ? [BOTH] : [pushed, BOTH];
  const stiffened = stiffenedLevels.map(of.stiffeners);
  const [webPlate, webPlates] = of.webPlates;
  const barred = [["top"] as const, ["bottom"] as const, BOTH].map((levels) => of.bars(levels));
  const mixed = BOTH.map((level): PlannedCombination => {
    const other: Level = level === "top" ? "bottom" : "top";
    const { parts, space } = combine(of.bars([level]), of.stiffeners([other]));
    return {
      key: `bars-${level}-stiffeners-${other}`,
      name: `Bars at ${level}, stiffeners at ${other}`,
      parts,
      space,
    };
  });
  const plated = of.webPlates.flatMap((plate) => [
    ...stiffened.map((pair) => combine(plate, pair)),
    combine(plate, of.backing),
    ...barred.map((bars) => combine(plate, bars)),
  ]);
  const triples = [webPlate, webPlates].flatMap((plate) =>
    plate
      ? stiffened.flatMap((pair) => [
          combine(plate, pair, of.backing),
          ...barred
            .filter((bars) => bars.parts.length === 1 && !overlaps(bars, pair))
            .map((bars) => combine(plate, pair, bars)),
        ])
      : [],
  );
  const braced = wantsDiagonals
    ? [single(of.diagonals), ...stiffened.map((pair) => combine(pair, of.diagonals))]
    : [];
  return [
    ...mixed,
    ...stiffened.map((pair) => combine(pair, of.backing)),
    ...braced,
    ...plated,
    ...stiffenedLevels.map((levels) => columnWithStiffeners(node, stock, levels)),
    ...triples,
  ];
}

/** Bars and stiffeners that would stand at one level. */
const overlaps = (bars: Ingredient, pair: Ingredient): boolean =>
  bars.parts.some((part) => pair.parts.includes(part.replace("bars", "stiffeners")));

const single = (one: Ingredient): PlannedCombination => ({
  key: one.key,
  name: capital(one.words),
  parts: one.parts,
  space: () => listSpace(one.shapes()),
});

/** The shapes of a combination, or null where stock has none. */
export function spaceOf({ space }: PlannedCombination): DesignSpace | null {
  const made = space();
  return isEmpty(made) ? null : made;
}
