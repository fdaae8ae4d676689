import { describe, expect, it } from "vitest";
import { sectionProperties } from "@/lib/calc/mechanics/section-properties";
import type { ISection } from "@/lib/calc/node";

/** Hand values and integration; published tables of rolled sections are in tests/published/section-handbook. */
const WELDED: ISection = {
  designation: "welded 400x200x10x20",
  make: "welded",
  depthMm: 400,
  widthMm: 200,
  webThicknessMm: 10,
  flangeThicknessMm: 20,
  rootMm: 6 * Math.SQRT2,
};
const ROLLED: ISection = { ...WELDED, designation: "rolled 400x200x10x20", make: "rolled", rootMm: 24 };

/** Half the width of a rolled section's material at a height above its middle, mm. */
function halfWidth(
  { widthMm, webThicknessMm, depthMm, flangeThicknessMm, rootMm }: ISection,
  height: number,
): number {
  const underFlange = depthMm / 2 - flangeThicknessMm;
  if (height > underFlange) return widthMm / 2;
  const aboveToe = Math.max(0, height - (underFlange - rootMm));
  return webThicknessMm / 2 + rootMm - Math.sqrt(rootMm ** 2 - aboveToe ** 2);
}

/** Sum over thin strips of one half, doubled: area, inertia and plastic modulus. */
function integrate(section: ISection): { area: number; inertia: number; plastic: number } {
  const strips = 200_000;
  const thickness = section.depthMm / 2 / strips;
  let [area, inertia, plastic] = [0, 0, 0];
  for (let strip = 0; strip < strips; strip += 1) {
    const height = (strip + 0.5) * thickness;
    const piece = 2 * halfWidth(section, height) * thickness;
    area += 2 * piece;
    inertia += 2 * piece * height ** 2;
    plastic += 2 * piece * height;
  }
  return { area, inertia, plastic };
}

describe("sectionProperties", () => {
  it("has the hand values of a welded section, whose welds do not count", () => {
    const computed = sectionProperties(WELDED);
    const inertia = (200 * 400 ** 3 - 190 * 360 ** 3) / 12;
    expect(computed.areaMm2).toBeCloseTo(2 * 200 * 20 + 360 * 10, 6);
    expect(computed.inertiaMm4).toBeCloseTo(inertia, 2);
    expect(computed.elasticModulusMm3).toBeCloseTo(inertia / 200, 4);
    expect(computed.plasticModulusMm3).toBeCloseTo(200 * 20 * 380 + (10 * 360 ** 2) / 4, 4);
    expect(computed.webDepthMm).toBeCloseTo(360 - 2 * 6 * Math.SQRT2, 10);
  });

  it("has the hand values of a rolled section: four fillets of (1 - pi / 4) r^2, 0.2234 r from their edges", () => {
    const computed = sectionProperties(ROLLED);
    const fillet = (1 - Math.PI / 4) * 24 ** 2;
    // First moment of a fillet about its edge: that of the square less that of the quarter circle, whose centroid is 4r / 3 pi from its own centre.
    const quarter = (Math.PI / 4) * 24 ** 2;
    const fromEdge = (24 ** 2 * 12 - quarter * (24 - (4 * 24) / (3 * Math.PI))) / fillet;
    expect(Math.abs(fromEdge / 24 - 0.2234)).toBeLessThan(0.00005);
    expect(computed.areaMm2).toBeCloseTo(2 * 200 * 20 + 360 * 10 + 4 * fillet, 6);
    expect(computed.plasticModulusMm3).toBeCloseTo(
      200 * 20 * 380 + (10 * 360 ** 2) / 4 + 4 * fillet * (180 - fromEdge),
      3,
    );
    expect(computed.elasticModulusMm3).toBeCloseTo(computed.inertiaMm4 / 200, 6);
  });

  it("counts the root fillets of a rolled section as integration over its outline does", () => {
    const computed = sectionProperties(ROLLED);
    const { area, inertia, plastic } = integrate(ROLLED);
    expect(Math.abs(computed.areaMm2 / area - 1)).toBeLessThan(1e-6);
    expect(Math.abs(computed.inertiaMm4 / inertia - 1)).toBeLessThan(1e-6);
    expect(Math.abs(computed.plasticModulusMm3 / plastic - 1)).toBeLessThan(1e-6);
    expect(computed.webDepthMm).toBe(360 - 2 * 24);
  });
});
