import type { ISection, MeasureCase } from "@/lib/calc/node";
import type { Catalog } from "@/lib/catalog/catalog";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import { checkMeasures } from "./check-geometry";
import { Problems, type DocumentError } from "./resolve-errors";
import {
  describeSection,
  describeSteel,
  describeWeld,
  resolveFastenerGrade,
  resolveFastenerSize,
  resolveSection,
  resolveSteel,
  resolveWeld,
  strengthTableOf,
  type Resolving,
} from "./resolve-parts";

export type ResolvedMeasures =
  | { readonly ok: true; readonly measures: readonly MeasureCase[] }
  | { readonly ok: false; readonly errors: readonly DocumentError[] };

type Input<K extends MeasureInput["kind"]> = Extract<MeasureInput, { kind: K }>;
type Case<K extends MeasureCase["kind"]> = Extract<MeasureCase, { kind: K }>;

function transverseStiffeners(
  context: Resolving,
  input: Input<"transverse-stiffeners">,
  path: string,
): Case<"transverse-stiffeners"> | null {
  const steel = resolveSteel(context, input.steel, input.thickness, `${path}.steel`);
  if (!steel) return null;
  return {
    kind: input.kind,
    levels: input.levels,
    ...(input.at === undefined ? {} : { at: input.at }),
    thicknessMm: input.thickness,
    widthMm: input.width,
    length: input.length,
    clipMm: input.clip,
    steel,
    flangeWeld: resolveWeld(input.flangeWeld),
    webWeld: resolveWeld(input.webWeld),
  };
}

function diagonalStiffeners(
  context: Resolving,
  input: Input<"diagonal-stiffeners">,
  path: string,
): Case<"diagonal-stiffeners"> | null {
  const steel = resolveSteel(context, input.steel, input.thickness, `${path}.steel`);
  if (!steel) return null;
  const { kind, arrangement, towards } = input;
  const weld = resolveWeld(input.weld);
  return { kind, arrangement, towards, thicknessMm: input.thickness, widthMm: input.width, steel, weld };
}

function webPlates(context: Resolving, input: Input<"web-plates">, path: string): Case<"web-plates"> | null {
  const steel = resolveSteel(context, input.steel, input.thickness, `${path}.steel`);
  if (!steel) return null;
  return {
    kind: input.kind,
    sides: input.sides,
    thicknessMm: input.thickness,
    widthMm: input.width,
    heightMm: input.height,
    steel,
    weld: resolveWeld(input.weld),
  };
}

function backingPlates(
  context: Resolving,
  input: Input<"backing-plates">,
  path: string,
): Case<"backing-plates"> | null {
  const steel = resolveSteel(context, input.steel, input.thickness, `${path}.steel`);
  if (!steel) return null;
  const { kind, levels, at, thickness: thicknessMm, width: widthMm, length: lengthMm } = input;
  return { kind, levels, ...(at === undefined ? {} : { at }), thicknessMm, widthMm, lengthMm, steel };
}

/** Heights of the rows that bars are to replace, numbered on the joint that the measure stands at, else the first one. */
function barRows(
  { problems }: Resolving,
  numbers: readonly number[],
  at: Input<"through-bars">["at"],
  document: NodeDocument,
  path: string,
): NonNullable<Case<"through-bars">["rows"]> {
  const side = at === "right" || !document.left ? "right" : "left";
  const connection = document[side]?.connection;
  const rows = connection?.kind === "end-plate" ? connection.bolts.rows : [];
  const offset = side === "right" ? (document.right?.levelOffset ?? 0) : 0;
  const heightsMm = numbers.flatMap((number, index) => {
    const row = rows[number - 1];
    if (row !== undefined) return [offset + row];
    problems.add(
      `${path}.rows.${index}`,
      rows.length === 0
        ? `The connection on the ${side} has no bolt rows for bars to replace.`
        : `There is no bolt row ${number} on the ${side}: its rows are 1 to ${rows.length}.`,
    );
    return [];
  });
  return { numbers, heightsMm };
}

function throughBars(
  context: Resolving,
  input: Input<"through-bars">,
  document: NodeDocument,
  path: string,
): Case<"through-bars"> | null {
  const rows = input.rows && barRows(context, input.rows, input.at, document, path);
  const size = resolveFastenerSize(context, input.size, `${path}.size`);
  const grade = resolveFastenerGrade(context, input.grade, `${path}.grade`);
  if (!size || !grade) return null;
  const { kind, levels, at, innerNuts } = input;
  return {
    kind,
    levels,
    ...(at === undefined ? {} : { at }),
    ...(rows ? { rows } : {}),
    size,
    grade,
    innerNuts,
  };
}

/** The heavier column is of the column's own grade, with the strength of its own flange thickness. */
function heavierColumn(
  context: Resolving,
  input: Input<"heavier-column">,
  document: NodeDocument,
  path: string,
): Case<"heavier-column"> | null {
  const section = resolveSection(context, input.section, `${path}.section`);
  if (!section) return null;
  const steel = resolveSteel(context, document.column.steel, section.flangeThicknessMm, `${path}.section`);
  return steel && { kind: input.kind, section, steel };
}

function resolveMeasure(
  context: Resolving,
  input: MeasureInput,
  document: NodeDocument,
  path: string,
): MeasureCase | null {
  switch (input.kind) {
    case "transverse-stiffeners":
      return transverseStiffeners(context, input, path);
    case "diagonal-stiffeners":
      return diagonalStiffeners(context, input, path);
    case "web-plates":
      return webPlates(context, input, path);
    case "backing-plates":
      return backingPlates(context, input, path);
    case "through-bars":
      return throughBars(context, input, document, path);
    case "heavier-column":
      return heavierColumn(context, input, document, path);
  }
}

/** The column that the measures are built into: the heavier one where the option has one. Null if its name is unknown. */
function columnOf(
  document: NodeDocument,
  catalog: Catalog,
  measures: readonly (MeasureCase | null)[],
): ISection | null {
  const heavier = measures.find((measure) => measure?.kind === "heavier-column");
  if (heavier?.kind === "heavier-column") return heavier.section;
  // An unknown column is a fault of `column.section`, told by resolveNodeCase.
  const unheard = new Problems();
  return resolveSection(
    { catalog, table: strengthTableOf(document), problems: unheard },
    document.column.section,
    "column.section",
  );
}

/**
 * Measures of one option with every name looked up, in mm and N/mm2.
 *
 * @param path - where the measures stand in the document, such as `options.0.measures`; it leads the paths of errors.
 */
export function resolveMeasures(
  measures: readonly MeasureInput[],
  document: NodeDocument,
  catalog: Catalog,
  path: string,
): ResolvedMeasures {
  const problems = new Problems();
  const context = { catalog, table: strengthTableOf(document), problems };
  const cases = measures.map((input, index) => resolveMeasure(context, input, document, `${path}.${index}`));
  const column = columnOf(document, catalog, cases);
  if (column) checkMeasures(cases, column, path, problems);
  if (!problems.isEmpty) return { ok: false, errors: problems.list() };
  return { ok: true, measures: cases.filter((measure) => measure !== null) };
}

function describeMeasure(measure: MeasureCase): MeasureInput {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return {
        kind: measure.kind,
        levels: [...measure.levels],
        ...(measure.at === undefined ? {} : { at: measure.at }),
        thickness: measure.thicknessMm,
        width: measure.widthMm,
        length: measure.length,
        clip: measure.clipMm,
        steel: describeSteel(measure.steel),
        flangeWeld: describeWeld(measure.flangeWeld),
        webWeld: describeWeld(measure.webWeld),
      };
    case "diagonal-stiffeners":
      return {
        kind: measure.kind,
        arrangement: measure.arrangement,
        towards: measure.towards,
        thickness: measure.thicknessMm,
        width: measure.widthMm,
        steel: describeSteel(measure.steel),
        weld: describeWeld(measure.weld),
      };
    case "web-plates":
      return {
        kind: measure.kind,
        sides: measure.sides,
        thickness: measure.thicknessMm,
        width: measure.widthMm,
        height: measure.heightMm,
        steel: describeSteel(measure.steel),
        weld: describeWeld(measure.weld),
      };
    case "backing-plates":
      return {
        kind: measure.kind,
        levels: [...measure.levels],
        ...(measure.at === undefined ? {} : { at: measure.at }),
        thickness: measure.thicknessMm,
        width: measure.widthMm,
        length: measure.lengthMm,
        steel: describeSteel(measure.steel),
      };
    case "through-bars":
      return {
        kind: measure.kind,
        levels: [...measure.levels],
        ...(measure.at === undefined ? {} : { at: measure.at }),
        ...(measure.rows === undefined ? {} : { rows: [...measure.rows.numbers] }),
        size: measure.size.name,
        grade: measure.grade.name,
        innerNuts: measure.innerNuts,
      };
    case "heavier-column":
      return { kind: measure.kind, section: describeSection(measure.section) };
  }
}

/** Measures as a document states them: what `resolveMeasures` reads back to the same measures. */
export const describeMeasures = (measures: readonly MeasureCase[]): MeasureInput[] =>
  measures.map(describeMeasure);
