import type { ISection, JointCase } from "@/lib/calc";

/** What every measure's quantities are taken from; `column` is the heavier one where the option has it. */
export interface MeasureContext {
  readonly column: ISection;
  readonly joints: readonly JointCase[];
  /** Mass of the column piece as it is handled, kg. */
  readonly pieceMassKg: number;
}
