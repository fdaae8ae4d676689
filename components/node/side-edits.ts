import {
  isDraftList,
  isDraftObject,
  numberTyped,
  textAt,
  withValue,
  type DraftObject,
  type DraftValue,
} from "./node-draft";

type SideName = "left" | "right";
const NO_ACTIONS: DraftObject = { moment: 0, axialForce: 0, shear: 0 };
const otherOf = (side: SideName): SideName => (side === "left" ? "right" : "left");

const loadCasesOf = (draft: DraftObject): readonly DraftValue[] =>
  isDraftList(draft.loadCases) ? draft.loadCases : [];

const eachCase = (draft: DraftObject, change: (loadCase: DraftObject) => DraftObject): DraftObject => ({
  ...draft,
  loadCases: loadCasesOf(draft).map((loadCase) => (isDraftObject(loadCase) ? change(loadCase) : loadCase)),
});

/**
 * Gives a side the beam and connection of the other side. Where the side had no beam before, its load
 * cases start with the other side's actions: equal moments are the usual interior node.
 */
export function withSideCopied(draft: DraftObject, to: SideName): DraftObject {
  const from = draft[otherOf(to)];
  if (!isDraftObject(from)) return draft;
  const { levelOffset: _offset, ...beamAndConnection } = from;
  const kept = isDraftObject(draft[to]) ? draft[to].levelOffset : undefined;
  const side =
    to === "right" && kept !== undefined ? { ...beamAndConnection, levelOffset: kept } : beamAndConnection;
  return eachCase({ ...draft, [to]: side }, (loadCase) =>
    loadCase[to] === undefined ? { ...loadCase, [to]: loadCase[otherOf(to)] ?? NO_ACTIONS } : loadCase,
  );
}

/** Takes a side away with its actions in every load case. */
export const withoutSide = (draft: DraftObject, side: SideName): DraftObject =>
  eachCase(withValue(draft, side, undefined), (loadCase) => withValue(loadCase, side, undefined));

const START_WELDS: DraftObject = { topFlange: 6, bottomFlange: 6, web: 4 };

export type ConnectionKind = "end-plate" | "welded" | "flange-cleats";

/** Angles to start from: as long as the beam is wide, with one row of bolts in each leg. */
const startCleats = (steel: DraftValue, beamWidthMm: number): DraftObject => {
  const gauge = Math.round(beamWidthMm / 20) * 10;
  const bolts = { size: "M20", grade: "8.8", gauge };
  return {
    kind: "flange-cleats",
    cleat: { section: "L 150x90x12", steel, length: Math.round(beamWidthMm) },
    bolts: { ...bolts, distance: 55 },
    beamBolts: { ...bolts, rows: [60] },
    gap: 10,
  };
};

/** Web cleats to start from; half as long as the beam is deep. */
export const startWebCleats = (steel: DraftValue, beamDepthMm: number): DraftObject => ({
  section: "L 90x90x8",
  steel,
  length: Math.round(beamDepthMm / 20) * 10,
  bolts: { size: "M20", grade: "8.8", rows: [50] },
  beamBolts: { size: "M20", grade: "8.8", rows: [50] },
});

/** Changes the kind of a connection; welds are kept, an end plate or cleats start from the beam's own sizes where there were none. */
export function withConnectionKind(
  draft: DraftObject,
  side: SideName,
  kind: ConnectionKind,
  beamDepthMm: number,
  beamWidthMm: number,
): DraftObject {
  const holder = draft[side];
  const before = isDraftObject(holder) && isDraftObject(holder.connection) ? holder.connection : {};
  const welds = isDraftObject(before.welds) ? before.welds : START_WELDS;
  if (kind === "welded") return withValue(draft, `${side}.connection`, { kind, welds });
  const steel = isDraftObject(holder) && isDraftObject(holder.beam) ? (holder.beam.steel ?? "S355") : "S355";
  if (kind === "flange-cleats")
    return withValue(draft, `${side}.connection`, startCleats(steel, beamWidthMm));
  const rows = [-45, 65, Math.round(beamDepthMm - 65)];
  return withValue(draft, `${side}.connection`, {
    kind,
    plate: {
      steel,
      thickness: 20,
      width: Math.round(beamWidthMm + 10),
      extensionTop: 90,
      extensionBottom: 30,
    },
    bolts: { size: "M24", grade: "10.9", gauge: 120, rows },
    welds,
  });
}

/** Two bolts a row, or four with an outer gauge to start from: as far outside the inner bolts as those are apart. */
export function withBoltsPerRow(draft: DraftObject, side: SideName, perRow: "2" | "4"): DraftObject {
  const bolts = `${side}.connection.bolts`;
  if (perRow === "2")
    return withValue(withValue(draft, `${bolts}.perRow`, undefined), `${bolts}.outerGauge`, undefined);
  const gauge = numberTyped(textAt(draft, `${bolts}.gauge`));
  const four = withValue(draft, `${bolts}.perRow`, perRow);
  return gauge === null ? four : withValue(four, `${bolts}.outerGauge`, String(gauge * 2));
}

/** A load case more: a copy of the last one under a name of its own, or the first of all. */
export function withLoadCase(draft: DraftObject, copyOf?: number): DraftObject {
  const cases = loadCasesOf(draft);
  const pattern = cases[copyOf ?? cases.length - 1];
  const names = new Set(cases.map((loadCase) => (isDraftObject(loadCase) ? loadCase.name : "")));
  let number = cases.length + 1;
  while (names.has(`ULS ${number}`)) number += 1;
  const sides = (["left", "right"] as const).filter((side) => draft[side] !== undefined);
  const empty: DraftObject = {
    ...Object.fromEntries(sides.map((side) => [side, NO_ACTIONS])),
    column: { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 },
  };
  const made = { ...(isDraftObject(pattern) ? pattern : empty), name: `ULS ${number}` };
  const at = copyOf === undefined ? cases.length : copyOf + 1;
  return { ...draft, loadCases: [...cases.slice(0, at), made, ...cases.slice(at)] };
}

/** Fields of a load case in the order of the grid's columns. */
export const loadCaseColumns = (draft: DraftObject): string[] => [
  "name",
  ...(["left", "right"] as const).flatMap((side) =>
    draft[side] === undefined ? [] : [`${side}.moment`, `${side}.axialForce`, `${side}.shear`],
  ),
  "column.axialForce",
  "column.momentAbove",
  "column.momentBelow",
  "column.shearAbove",
  "column.shearBelow",
];

/** Rows copied from a sheet, laid into the grid from one cell on; rows that do not exist yet are added. */
export function withPastedRows(
  draft: DraftObject,
  text: string,
  fromRow: number,
  fromColumn: string,
): DraftObject {
  const columns = loadCaseColumns(draft);
  const start = Math.max(0, columns.indexOf(fromColumn));
  const rows = text
    .replace(/\r/g, "")
    .replace(/\n+$/, "")
    .split("\n")
    .map((row) => row.split("\t"));
  return rows.reduce((changed, cells, down) => {
    const row = fromRow + down;
    const grown = row < loadCasesOf(changed).length ? changed : withLoadCase(changed);
    return cells.reduce((filled, cell, right) => {
      const column = columns[start + right];
      return column === undefined ? filled : withValue(filled, `loadCases.${row}.${column}`, cell.trim());
    }, grown);
  }, draft);
}
