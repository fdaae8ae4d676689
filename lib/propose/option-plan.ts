import type { Level, MeasureCase, NodeCase } from "@/lib/calc/node";
import { backingPlateSpace } from "./backing-plate-space";
import { fixedShape, listSpace, type DesignSpace, type Shape } from "./design-space";
import { forceLevels } from "./force-levels";
import { partialLengthsMm, stiffenerSpace } from "./stiffener-space";
import type { Stock } from "./stock";
import { webPlateSpace } from "./web-plate-space";

/** One way to stiffen the node, not yet sized. */
export interface PlannedOption {
  /** Stays the same as long as the kind of stiffening does. */
  readonly key: string;
  readonly name: string;
  /** What it is made of: an option that holds all parts of another holds the other. */
  readonly parts: readonly string[];
  readonly space: DesignSpace;
}

export const BOTH: readonly Level[] = ["top", "bottom"];
export const levelWords = (levels: readonly Level[]): string =>
  levels.length === 2 ? "top and bottom" : `at ${levels[0] ?? ""}`;

export const stiffenerParts = (levels: readonly Level[]): readonly string[] =>
  levels.map((level) => `stiffeners ${level}`);
export const barParts = (levels: readonly Level[]): readonly string[] =>
  levels.map((level) => `bars ${level}`);
export const WEB_PLATE_PARTS = { 1: ["web plate"], 2: ["web plate", "second web plate"] } as const;

export const BACKING_PARTS = ["backing plates"] as const;
export const COLUMN_PARTS = ["column"] as const;

/** Single levels by what the loads do there; where they do both, by where they are. */
export function singleLevels(node: NodeCase): readonly { readonly key: string; readonly level: Level }[] {
  const { tension, compression } = forceLevels(node);
  const [pulled] = tension;
  const [pushed] = compression;
  if (tension.length === 1 && compression.length === 1 && pulled !== undefined && pushed !== undefined) {
    return [
      { key: "compression", level: pushed },
      { key: "tension", level: pulled },
    ];
  }
  return BOTH.map((level) => ({ key: level, level }));
}

function stiffenerOptions(node: NodeCase, stock: Stock): readonly PlannedOption[] {
  const space = (levels: readonly Level[]): DesignSpace =>
    listSpace(stiffenerSpace(node, stock, levels, ["full"]));
  const single = singleLevels(node);
  const full = single.map(({ key, level }) => ({
    key: `stiffeners-${key}`,
    name: `Stiffeners ${levelWords([level])}`,
    parts: stiffenerParts([level]),
    space: space([level]),
  }));
  const both = {
    key: "stiffeners-both",
    name: `Stiffeners ${levelWords(BOTH)}`,
    parts: stiffenerParts(BOTH),
    space: space(BOTH),
  };
  // With a beam on both sides each flange needs its own short pair: more parts than one of full depth.
  const isOneSided = node.joints.length === 1;
  const partial = !isOneSided
    ? []
    : single.map(({ key, level }) => ({
        key: `stiffeners-${key}-partial`,
        name: `Partial-depth stiffeners ${levelWords([level])}`,
        parts: [`partial stiffeners ${level}`],
        space: listSpace(stiffenerSpace(node, stock, [level], partialLengthsMm(node))),
      }));
  return [...full, both, ...partial];
}

function webPlateOptions(node: NodeCase, stock: Stock): readonly PlannedOption[] {
  return [
    {
      key: "web-plate-one-side",
      name: "Web plate, one side",
      parts: WEB_PLATE_PARTS[1],
      space: listSpace(webPlateSpace(node, stock, 1)),
    },
    {
      key: "web-plate-both-sides",
      name: "Web plates, both sides",
      parts: WEB_PLATE_PARTS[2],
      space: listSpace(webPlateSpace(node, stock, 2)),
    },
  ];
}

/**
 * Sizes within the bounds of the bar model that are commonly kept; M18, M22 are rarely (common practice, no
 * source), and all others would be outside scope.
 */
const BAR_SIZES: ReadonlySet<string> = new Set(["M16", "M20", "M24", "M27", "M30"]);

/** Every row of the levels, or at one level a single row of several: fewer bars where they do. */
function rowsWorthTrying(node: NodeCase, levels: readonly Level[]): readonly BarRows[] {
  const [lead] = node.joints;
  const [level] = levels;
  if (levels.length > 1 || lead?.connection.kind !== "end-plate") return [{}];
  const middle = lead.beam.section.depthMm / 2;
  const rows = lead.connection.bolts.rowsMm
    .map((row, index) => ({ row, number: index + 1 }))
    .filter(({ row }) => (row < middle ? "top" : "bottom") === level);
  const single = rows.map(({ row, number }) => ({
    rows: { numbers: [number], heightsMm: [lead.levelOffsetMm + row] },
  }));
  return rows.length > 1 ? [...single, {}] : [{}];
}

type BarRows = Pick<Extract<MeasureCase, { kind: "through-bars" }>, "rows">;

export function barSpace(node: NodeCase, stock: Stock, levels: readonly Level[]): readonly Shape[] {
  const bars = stock.bars.filter(({ size }) => BAR_SIZES.has(size.name));
  return rowsWorthTrying(node, levels).flatMap((rows) =>
    bars.map(({ size, grade }) =>
      fixedShape([{ kind: "through-bars", levels, ...rows, size, grade, innerNuts: true }]),
    ),
  );
}

/** Bars replace the bolts of every joint. */
export const canTakeBars = (node: NodeCase): boolean =>
  node.joints.every(({ connection }) => connection.kind === "end-plate");

function barOptions(node: NodeCase, stock: Stock): readonly PlannedOption[] {
  if (!canTakeBars(node)) return [];
  return [["top"] as const, ["bottom"] as const, BOTH].map((levels) => ({
    key: levels.length === 2 ? "bars-both" : `bars-${levels[0]}`,
    name: `Bars ${levelWords(levels)}`,
    parts: barParts(levels),
    space: listSpace(barSpace(node, stock, levels)),
  }));
}

export const isEmpty = (space: DesignSpace): boolean =>
  space.kind === "list" ? space.shapes.length === 0 : space.first.length * space.second.length === 0;

/** Every single kind of option that makes sense on this node, the bare column first. */
export function planOptions(node: NodeCase, stock: Stock): readonly PlannedOption[] {
  const heavier = stock.columns.map(({ section, steel }) =>
    fixedShape([{ kind: "heavier-column", section, steel }]),
  );
  return [
    { key: "bare", name: "Bare column", parts: [], space: listSpace([fixedShape([])]) },
    ...stiffenerOptions(node, stock),
    ...webPlateOptions(node, stock),
    {
      key: "backing-plates",
      name: "Backing plates",
      parts: BACKING_PARTS,
      space: listSpace(backingPlateSpace(node, stock)),
    },
    ...barOptions(node, stock),
    { key: "heavier-column", name: "Heavier column", parts: COLUMN_PARTS, space: listSpace(heavier) },
  ].filter(({ space }) => !isEmpty(space));
}
