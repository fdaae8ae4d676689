import type { ISection, JointCase, MeasureCase } from "@/lib/calc";

/** What every measure's quantities are taken from; `column` is the heavier one where the option has it. */
export interface MeasureContext {
  readonly column: ISection;
  readonly joints: readonly JointCase[];
  /** All measures of the option: some pieces are shaped by others. */
  readonly measures: readonly MeasureCase[];
  /** Mass of the column piece as it is handled, kg. */
  readonly pieceMassKg: number;
}
