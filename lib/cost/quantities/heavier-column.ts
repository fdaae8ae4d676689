import type { ISection } from "@/lib/calc";
import type { FabricationCase } from "../estimate";
import { sectionMassKgPerM, sectionPerimeterMm } from "./column-piece";
import type { QuantityTake } from "./quantities";

/** A column is changed from splice to splice, so each node carries its share of the whole lift. */
export function takeHeavierColumn(
  take: QuantityTake,
  bare: ISection,
  heavier: ISection,
  fabrication: FabricationCase,
): void {
  const lengthM = fabrication.liftLengthMm / 1000 / fabrication.nodesPerLift;
  const massKg = (sectionMassKgPerM(heavier) - sectionMassKgPerM(bare)) * lengthM;
  if (massKg === 0) return;
  const areaM2 = ((sectionPerimeterMm(heavier) - sectionPerimeterMm(bare)) * lengthM) / 1000;
  take.records.push({ driver: "column", group: heavier.designation, values: { massKg, lengthM, areaM2 } });
  take.addMass("section", massKg);
}
