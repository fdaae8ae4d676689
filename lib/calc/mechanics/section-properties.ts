import type { ISection } from "../node";

export interface SectionProperties {
  readonly areaMm2: number;
  /** Major axis. */
  readonly inertiaMm4: number;
  readonly elasticModulusMm3: number;
  readonly plasticModulusMm3: number;
  /** Clear straight depth of the web between root toes. */
  readonly webDepthMm: number;
}

/** Area of one root fillet of radius r, mm2: the square less the quarter circle. */
const filletArea = (radius: number): number => (1 - Math.PI / 4) * radius * radius;
/** Centroid of that fillet from either straight edge, as a share of r. */
const FILLET_CENTROID = (10 - 3 * Math.PI) / (12 - 3 * Math.PI);
/** Second moment of that fillet about its own centroid, as a share of r^4. */
const FILLET_INERTIA = 1 / 3 - Math.PI / 16 - 1 / (9 * (4 - Math.PI));

/**
 * Gross properties of a doubly symmetric I-section about its major axis, from its dimensions.
 * Rolled sections count four circular root fillets; welded ones do not count their welds.
 */
export function sectionProperties(section: ISection): SectionProperties {
  const { depthMm: h, widthMm: b, webThicknessMm: tw, flangeThicknessMm: tf } = section;
  const r = section.make === "rolled" ? section.rootMm : 0;
  const webHeight = h - 2 * tf;
  const fillet = filletArea(r);
  const filletArm = webHeight / 2 - FILLET_CENTROID * r;
  const inertia =
    (b * h ** 3 - (b - tw) * webHeight ** 3) / 12 + 4 * (FILLET_INERTIA * r ** 4 + fillet * filletArm ** 2);
  return {
    areaMm2: 2 * b * tf + webHeight * tw + 4 * fillet,
    inertiaMm4: inertia,
    elasticModulusMm3: inertia / (h / 2),
    plasticModulusMm3: b * tf * (h - tf) + (tw * webHeight ** 2) / 4 + 4 * fillet * filletArm,
    webDepthMm: webHeight - 2 * section.rootMm,
  };
}
