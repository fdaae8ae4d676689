import type {
  BeamActions,
  ConnectionCase,
  ConnectionWelds,
  EndPlateConnection,
  JointCase,
  LoadCase,
  NodeCase,
  Side,
} from "@/lib/calc/node";
import type { Catalog } from "@/lib/catalog/catalog";
import type { Connection, LoadCaseInput, NodeDocument } from "@/lib/schemas/node-document";
import { checkGeometry } from "./check-geometry";
import { resolveCleats } from "./resolve-cleats";
import { Problems, type DocumentError } from "./resolve-errors";
import { resolveMeasures } from "./resolve-measures";
import {
  resolveFastenerGrade,
  resolveFastenerSize,
  resolveSection,
  resolveSteel,
  resolveWeld,
  strengthTableOf,
  type Assembly,
  type Resolving,
} from "./resolve-parts";

const N_PER_KN = 1e3;
const NMM_PER_KNM = 1e6;

export type ResolvedNode =
  | { readonly ok: true; readonly node: NodeCase }
  | { readonly ok: false; readonly errors: readonly DocumentError[] };

type EndPlateInput = Extract<Connection, { kind: "end-plate" }>;

const weldsOf = (welds: EndPlateInput["welds"]): ConnectionWelds => ({
  topFlange: resolveWeld(welds.topFlange),
  bottomFlange: resolveWeld(welds.bottomFlange),
  web: resolveWeld(welds.web),
});

/** A preloaded bolt of unnamed make is taken as an HR assembly; any other as plain hexagon bolts. */
const assemblyOf = (bolts: EndPlateInput["bolts"]): Assembly =>
  bolts.assembly ?? (bolts.preloaded === true ? "HR" : "plain");

function endPlateOf(context: Resolving, input: EndPlateInput, path: string): EndPlateConnection | null {
  const { plate, bolts } = input;
  const steel = resolveSteel(context, plate.steel, plate.thickness, `${path}.plate.steel`);
  const size = resolveFastenerSize(context, bolts.size, `${path}.bolts.size`, assemblyOf(bolts));
  const grade = resolveFastenerGrade(context, bolts.grade, `${path}.bolts.grade`);
  if (!steel || !size || !grade) return null;
  return {
    kind: "end-plate",
    plate: {
      thicknessMm: plate.thickness,
      widthMm: plate.width,
      extensionTopMm: plate.extensionTop,
      extensionBottomMm: plate.extensionBottom,
      steel,
      hasStiffenedExtension: plate.stiffener?.top !== undefined || plate.stiffener?.bottom !== undefined,
    },
    bolts: {
      size,
      grade,
      gaugeMm: bolts.gauge,
      rowsMm: bolts.rows,
      perRow: bolts.perRow ?? 2,
      ...(bolts.outerGauge === undefined ? {} : { outerGaugeMm: bolts.outerGauge }),
      preloaded: bolts.preloaded ?? false,
    },
    welds: weldsOf(input.welds),
  };
}

function connectionOf(context: Resolving, input: Connection, path: string): ConnectionCase | null {
  switch (input.kind) {
    case "end-plate":
      return endPlateOf(context, input, path);
    case "welded":
      return { kind: "welded", welds: weldsOf(input.welds) };
    case "flange-cleats":
      return resolveCleats(context, input, path);
  }
}

function jointOf(context: Resolving, document: NodeDocument, side: Side): JointCase | null {
  const input = document[side];
  if (!input) return null;
  const section = resolveSection(context, input.beam.section, `${side}.beam.section`);
  const steel =
    section && resolveSteel(context, input.beam.steel, section.flangeThicknessMm, `${side}.beam.steel`);
  const connection = connectionOf(context, input.connection, `${side}.connection`);
  if (!section || !steel || !connection) return null;
  return {
    side,
    beam: { section, steel, spanMm: input.beam.span },
    levelOffsetMm: side === "right" ? (document.right?.levelOffset ?? 0) : 0,
    connection,
  };
}

function columnOf(context: Resolving, { column }: NodeDocument): NodeCase["column"] | null {
  const section = resolveSection(context, column.section, "column.section");
  if (!section) return null;
  const steel = resolveSteel(context, column.steel, section.flangeThicknessMm, "column.steel");
  return (
    steel && {
      section,
      steel,
      endDistanceAboveMm: column.endDistanceAbove ?? null,
      endDistanceBelowMm: column.endDistanceBelow ?? null,
      storeyHeightMm: column.storeyHeight,
    }
  );
}

const beamActions = (actions: LoadCaseInput["left"]): BeamActions | null =>
  actions
    ? {
        momentNmm: actions.moment * NMM_PER_KNM,
        axialForceN: actions.axialForce * N_PER_KN,
        shearN: actions.shear * N_PER_KN,
      }
    : null;

const loadCaseOf = (input: LoadCaseInput): LoadCase => ({
  name: input.name,
  left: beamActions(input.left),
  right: beamActions(input.right),
  column: {
    axialForceN: input.column.axialForce * N_PER_KN,
    momentAboveNmm: input.column.momentAbove * NMM_PER_KNM,
    momentBelowNmm: input.column.momentBelow * NMM_PER_KNM,
    shearAboveN: input.column.shearAbove * N_PER_KN,
    shearBelowN: input.column.shearBelow * N_PER_KN,
  },
});

const targetOf = ({ target }: NodeDocument): NodeCase["target"] => ({
  utilisation: target.utilisation,
  stiffness:
    typeof target.stiffness === "number" ? { nmmPerRad: target.stiffness * NMM_PER_KNM } : target.stiffness,
});

/**
 * The node of a document with every name looked up and every unit converted: mm and kN and kNm in, N and mm and Nmm out.
 * A document that names unknown parts or cannot be built is refused with all its faults, those of its options included.
 */
export function resolveNodeCase(document: NodeDocument, catalog: Catalog): ResolvedNode {
  const problems = new Problems();
  const context = { catalog, table: strengthTableOf(document), problems };
  const column = columnOf(context, document);
  const joints = (["left", "right"] as const)
    .map((side) => jointOf(context, document, side))
    .filter((joint) => joint !== null);
  checkGeometry(document, column, joints, problems);
  document.options?.forEach((option, index) => {
    const resolved = resolveMeasures(option.measures, document, catalog, `options.${index}.measures`);
    if (!resolved.ok) resolved.errors.forEach((error) => problems.add(error.path, error.message));
  });
  if (!column || !problems.isEmpty) return { ok: false, errors: problems.list() };
  const node: NodeCase = {
    partialFactors: document.partialFactors,
    column,
    joints,
    loadCases: document.loadCases.map(loadCaseOf),
    bracing: document.frame.bracing,
    target: targetOf(document),
    tStubModeOne: document.choices?.tStubModeOne ?? "method-2",
    triangularLimit: document.choices?.triangularLimit ?? "always",
    flangeWelds: document.choices?.flangeWelds ?? "directional",
  };
  return { ok: true, node };
}
