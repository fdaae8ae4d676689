import { steelMassKg } from "../products";
import type { QuantityTake } from "./quantities";

export interface PlateParts {
  readonly partType: "transverse-stiffener" | "diagonal-stiffener" | "web-plate" | "backing-plate";
  readonly parts: number;
  readonly grade: string;
  readonly thicknessMm: number;
  readonly lengthMm: number;
  readonly widthMm: number;
  /** Clipped corners of one part, and the leg of the clip. */
  readonly corners: number;
  readonly clipMm: number;
  /** Face of one part closed against the column, mm2; 0 where it stands free. */
  readonly overlapMm2: number;
}

/** Takes equal rectangular plates: edges cut on all four sides, mass and surface less the clips. */
export function takePlates(take: QuantityTake, pieceMassKg: number, plate: PlateParts): void {
  const { parts, thicknessMm, lengthMm, widthMm } = plate;
  if (parts === 0) return;
  const faceMm2 = lengthMm * widthMm - (plate.corners * plate.clipMm ** 2) / 2;
  const massKg = parts * steelMassKg(faceMm2 * thicknessMm);
  // The outside of a closed plate is painted in place of the column behind it: its own weld zone is new.
  const shownMm2 = 2 * faceMm2 - plate.overlapMm2;
  take.records.push({
    driver: "plate",
    group: `${plate.grade} ${thicknessMm}`,
    values: {
      partType: plate.partType,
      parts,
      thicknessMm,
      cutM: (parts * 2 * (lengthMm + widthMm)) / 1000,
      corners: plate.clipMm > 0 ? parts * plate.corners : 0,
      massKg,
      areaM2: (parts * shownMm2) / 1e6,
      overlapCm2: plate.overlapMm2 / 100,
      partsBefore: take.partsPlaced,
      pieceMassKg,
    },
  });
  take.partsPlaced += parts;
  take.addMass("plate", massKg);
}

/** Takes bevelled edges of full-penetration welds, prepared to the whole plate thickness. */
export function takeBevels(
  take: QuantityTake,
  edges: number,
  edgeLengthMm: number,
  thicknessMm: number,
): void {
  take.records.push({
    driver: "bevel-edge",
    group: `${thicknessMm}`,
    values: { edges, lengthM: (edges * edgeLengthMm) / 1000, depthMm: thicknessMm, thicknessMm },
  });
}
