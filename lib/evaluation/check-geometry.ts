import type { EndPlateConnection, ISection, JointCase, MeasureCase, NodeCase } from "@/lib/calc/node";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { shownMm, type Problems } from "./resolve-errors";
import { weldLegMm } from "./resolve-parts";

/**
 * What cannot be built. Only the impossible is refused here: material where a hole is, parts that pass through each
 * other or hang in the air. Distances that are merely poor are the business of the detailing checks.
 */

/**
 * Why bolts of this gauge cannot pass a column's flange, or null. A hole must stay on the flange and clear of the web and of
 * the part of the root that holds the flange (0.8 of it, as in the T-stub), or no strip of flange is left to bend.
 */
export function columnHoleFault(column: ISection, connection: EndPlateConnection): string | null {
  const { gaugeMm, size } = connection.bolts;
  if (gaugeMm + size.holeMm >= column.widthMm) {
    return `With a gauge of ${shownMm(gaugeMm)} mm the holes pass the edge of the column flange (${shownMm(column.widthMm)} mm wide).`;
  }
  const core = column.webThicknessMm + 1.6 * column.rootMm;
  if (gaugeMm - size.holeMm <= core) {
    return `With a gauge of ${shownMm(gaugeMm)} mm the holes run into the column web or its root: more than ${shownMm(core + size.holeMm)} mm is needed.`;
  }
  return null;
}

function checkGauge(
  joint: JointCase,
  connection: EndPlateConnection,
  column: ISection | null,
  path: string,
  problems: Problems,
): void {
  const { bolts, plate, welds } = connection;
  const { section } = joint.beam;
  if (bolts.gaugeMm + bolts.size.holeMm >= plate.widthMm) {
    problems.add(
      `${path}.bolts.gauge`,
      `With a gauge of ${shownMm(bolts.gaugeMm)} mm the holes pass the edge of the plate (${shownMm(plate.widthMm)} mm wide).`,
    );
  }
  const webAndWelds = section.webThicknessMm + 2 * weldLegMm(welds.web);
  const isRowBesideWeb = bolts.rowsMm.some((row) => row > 0 && row < section.depthMm);
  if (isRowBesideWeb && bolts.gaugeMm - bolts.size.holeMm <= webAndWelds) {
    problems.add(
      `${path}.bolts.gauge`,
      `With a gauge of ${shownMm(bolts.gaugeMm)} mm the holes run into the beam web or its welds: more than ${shownMm(webAndWelds + bolts.size.holeMm)} mm is needed.`,
    );
  }
  const fault = column && columnHoleFault(column, connection);
  if (fault) problems.add(`${path}.bolts.gauge`, fault);
}

type BoltsInput = Extract<NonNullable<NodeDocument["left"]>["connection"], { kind: "end-plate" }>["bolts"];

function checkOuterGauge(
  input: BoltsInput,
  connection: EndPlateConnection,
  column: ISection | null,
  path: string,
  problems: Problems,
): void {
  if (input.perRow !== 4) return;
  const { holeMm } = connection.bolts.size;
  if (input.outerGauge === undefined) {
    problems.add(
      `${path}.bolts.outerGauge`,
      "Rows of four bolts need the distance between the two outer ones.",
    );
  } else if (input.outerGauge - input.gauge <= 2 * holeMm) {
    problems.add(`${path}.bolts.outerGauge`, "The outer holes run into the inner ones.");
  } else if (input.outerGauge + holeMm >= Math.min(connection.plate.widthMm, column?.widthMm ?? Infinity)) {
    problems.add(
      `${path}.bolts.outerGauge`,
      "The outer holes pass the edge of the plate or of the column flange.",
    );
  }
}

/** Why a hole of this row cannot be there, or null. Levels run down from the outer face of the beam's top flange. */
function rowFault(joint: JointCase, connection: EndPlateConnection, rowMm: number): string | null {
  const { plate, bolts, welds } = connection;
  const { section } = joint.beam;
  const top = rowMm - bolts.size.holeMm / 2;
  const bottom = rowMm + bolts.size.holeMm / 2;
  if (top <= -plate.extensionTopMm) return "its hole passes the top of the plate.";
  if (bottom >= section.depthMm + plate.extensionBottomMm) return "its hole passes the bottom of the plate.";
  const meets = (from: number, to: number): boolean => bottom > from && top < to;
  const topLeg = weldLegMm(welds.topFlange);
  if (meets(-topLeg, section.flangeThicknessMm + topLeg))
    return "its hole runs into the beam's top flange or its weld.";
  const bottomLeg = weldLegMm(welds.bottomFlange);
  if (meets(section.depthMm - section.flangeThicknessMm - bottomLeg, section.depthMm + bottomLeg)) {
    return "its hole runs into the beam's bottom flange or its weld.";
  }
  return null;
}

function checkRows(joint: JointCase, connection: EndPlateConnection, path: string, problems: Problems): void {
  const { rowsMm, size } = connection.bolts;
  rowsMm.forEach((row, index) => {
    const fault = rowFault(joint, connection, row);
    if (fault)
      problems.add(`${path}.bolts.rows.${index}`, `Row ${index + 1} at ${shownMm(row)} mm: ${fault}`);
    const above = rowsMm[index - 1];
    if (above !== undefined && row - above <= size.holeMm) {
      problems.add(
        `${path}.bolts.rows.${index}`,
        `Row ${index + 1} is ${shownMm(row - above)} mm below row ${index}: holes of ${shownMm(size.holeMm)} mm run into each other.`,
      );
    }
  });
}

function checkExtensionStiffeners(
  document: NodeDocument,
  joint: JointCase,
  path: string,
  problems: Problems,
): void {
  const connection = document[joint.side]?.connection;
  if (connection?.kind !== "end-plate") return;
  const { plate } = connection;
  if (plate.stiffener?.top && plate.extensionTop === 0) {
    problems.add(`${path}.plate.stiffener.top`, "The plate has no extension at the top to stiffen.");
  }
  if (plate.stiffener?.bottom && plate.extensionBottom === 0) {
    problems.add(`${path}.plate.stiffener.bottom`, "The plate has no extension at the bottom to stiffen.");
  }
}

function checkJoint(
  document: NodeDocument,
  joint: JointCase,
  column: ISection | null,
  problems: Problems,
): void {
  const path = `${joint.side}.connection`;
  if (column && joint.beam.spanMm <= column.depthMm) {
    problems.add(
      `${joint.side}.beam.span`,
      `A span of ${shownMm(joint.beam.spanMm)} mm ends inside the column (${shownMm(column.depthMm)} mm deep).`,
    );
  }
  const { connection } = joint;
  const input = document[joint.side]?.connection;
  if (connection.kind !== "end-plate" || input?.kind !== "end-plate") return;
  checkGauge(joint, connection, column, path, problems);
  checkOuterGauge(input.bolts, connection, column, path, problems);
  checkRows(joint, connection, path, problems);
  checkExtensionStiffeners(document, joint, path, problems);
}

/** Levels run down from the top of the left beam (of the right one where it stands alone, whose offset then moves both). */
function checkColumnEnds(column: NodeCase["column"], joints: readonly JointCase[], problems: Problems): void {
  const highest = Math.min(...joints.map((joint) => joint.levelOffsetMm));
  const lowest = Math.max(...joints.map((joint) => joint.levelOffsetMm + joint.beam.section.depthMm));
  if (column.storeyHeightMm <= lowest - highest) {
    problems.add(
      "column.storeyHeight",
      `A storey of ${shownMm(column.storeyHeightMm)} mm has no room for beams that take ${shownMm(lowest - highest)} mm.`,
    );
  }
  const columnTop = highest - (column.endDistanceAboveMm ?? Infinity);
  const columnBottom = lowest + (column.endDistanceBelowMm ?? Infinity);
  for (const joint of joints) {
    const { connection } = joint;
    if (connection.kind !== "end-plate") continue;
    connection.bolts.rowsMm.forEach((row, index) => {
      const level = joint.levelOffsetMm + row;
      const path = `${joint.side}.connection.bolts.rows.${index}`;
      const radius = connection.bolts.size.holeMm / 2;
      if (level - radius <= columnTop)
        problems.add(path, `Row ${index + 1} lies above the column's upper end.`);
      if (level + radius >= columnBottom)
        problems.add(path, `Row ${index + 1} lies below the column's lower end.`);
    });
  }
}

/**
 * Refuses a node that cannot be built, with every fault at once. Parts whose names were not found are left out.
 *
 * @param column - null where its section or steel is unknown.
 * @param joints - those whose parts are all known.
 */
export function checkGeometry(
  document: NodeDocument,
  column: NodeCase["column"] | null,
  joints: readonly JointCase[],
  problems: Problems,
): void {
  for (const joint of joints) checkJoint(document, joint, column?.section ?? null, problems);
  // The nearest beam to a column's end is only known when every beam is.
  const isEveryBeamKnown = joints.length === Number(Boolean(document.left)) + Number(Boolean(document.right));
  if (column && isEveryBeamKnown) checkColumnEnds(column, joints, problems);
}

function checkMeasure(measure: MeasureCase, column: ISection, path: string, problems: Problems): void {
  const clearDepth = column.depthMm - 2 * column.flangeThicknessMm;
  const outstand = (column.widthMm - column.webThicknessMm) / 2;
  switch (measure.kind) {
    case "transverse-stiffeners":
      if (measure.clipMm >= measure.widthMm)
        problems.add(`${path}.clip`, "The clipped corner takes the whole width of the stiffener.");
      if (measure.length === "full") return;
      if (measure.length > clearDepth)
        problems.add(
          `${path}.length`,
          `The stiffener is longer than the ${shownMm(clearDepth)} mm between the column flanges: write "full".`,
        );
      if (measure.length <= measure.clipMm)
        problems.add(`${path}.length`, "The clipped corner takes the whole length of the stiffener.");
      return;
    case "web-plates":
      if (measure.widthMm > clearDepth)
        problems.add(
          `${path}.width`,
          `The plate is wider than the ${shownMm(clearDepth)} mm between the column flanges.`,
        );
      return;
    case "backing-plates":
      if (measure.widthMm > outstand)
        problems.add(
          `${path}.width`,
          `The plate is wider than the ${shownMm(outstand)} mm beside the column web.`,
        );
      return;
    case "diagonal-stiffeners":
    case "through-bars":
    case "heavier-column":
  }
}

/**
 * Refuses measures that cannot be built into a column.
 *
 * @param measures - in the order of the document; null where a name was not found.
 * @param path - where the list of measures stands in the document.
 */
export function checkMeasures(
  measures: readonly (MeasureCase | null)[],
  column: ISection,
  path: string,
  problems: Problems,
): void {
  measures.forEach((measure, index) => {
    if (measure) checkMeasure(measure, column, `${path}.${index}`, problems);
  });
}
