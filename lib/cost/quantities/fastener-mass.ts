import type { FastenerSize } from "@/lib/calc";
import { steelMassKg } from "../products";

const circleMm2 = (diameterMm: number): number => (Math.PI * diameterMm * diameterMm) / 4;
const hexagonMm2 = (acrossFlatsMm: number): number => (Math.sqrt(3) / 2) * acrossFlatsMm * acrossFlatsMm;

/** Thread shown beyond a nut, mm: one pitch at least (EN 1090-2:2018 8.2.2, from memory); the coarsest ISO pitch is 0.17 d. */
export const threadBeyondNutMm = ({ diameterMm }: FastenerSize): number => 0.17 * diameterMm;

export const nutMassKg = (size: FastenerSize): number =>
  steelMassKg((hexagonMm2(size.acrossFlatsMm) - circleMm2(size.diameterMm)) * size.nutHeightMm);

export const washerMassKg = (size: FastenerSize): number =>
  steelMassKg((circleMm2(size.washerDiameterMm) - circleMm2(size.diameterMm)) * size.washerThicknessMm);

/** Threaded bar, its thread cut away to the stress area. */
export const barMassKg = (size: FastenerSize, lengthMm: number): number =>
  steelMassKg(size.stressAreaMm2 * lengthMm);

/** Bolt with head and shank through the grip, two washers and its nut, kg without nut and washers. */
export function boltMassKg(size: FastenerSize, gripMm: number): number {
  const shankMm = gripMm + 2 * size.washerThicknessMm + size.nutHeightMm + threadBeyondNutMm(size);
  return steelMassKg(
    circleMm2(size.diameterMm) * shankMm + hexagonMm2(size.acrossFlatsMm) * size.headHeightMm,
  );
}
