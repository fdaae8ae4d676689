import { type ISection, type JointCase, sectionProperties } from "@/lib/calc";
import { steelMassKg } from "../products";

/** Mass of a column section, kg/m, from its own dimensions. */
export const sectionMassKgPerM = (section: ISection): number =>
  steelMassKg(sectionProperties(section).areaMm2 * 1000);

/**
 * Surface of an I-section to be painted, mm2 per mm: the outline, each root fillet replacing two
 * straight lengths r by a quarter circle.
 */
export function sectionPerimeterMm({ depthMm, widthMm, webThicknessMm, rootMm, make }: ISection): number {
  const outline = 2 * depthMm + 4 * widthMm - 2 * webThicknessMm;
  return make === "rolled" ? outline - 4 * (2 - Math.PI / 2) * rootMm : outline;
}

/** Clear distance between the column's flanges, mm. */
export const clearDepthMm = (section: ISection): number => section.depthMm - 2 * section.flangeThicknessMm;

/** Distance between the middles of a joint's beam flanges, mm; the deepest beam of the node decides. */
export function beamFlangeSpacingMm(joints: readonly JointCase[]): number {
  return joints.reduce(
    (most, { beam }) => Math.max(most, beam.section.depthMm - beam.section.flangeThicknessMm),
    0,
  );
}
