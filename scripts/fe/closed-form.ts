import * as through from "@/lib/calc/mechanics/through-bar-formulas";
import { ELASTIC_MPA } from "./input-file";
import type { StudyCase } from "./cases";

/** The program's own two-spring model of a case, from the formulas that it computes with. Stiffnesses in N/mm. */
export interface ClosedForm {
  readonly columnNPerMm: number;
  /** The row's two bars. */
  readonly barsNPerMm: number;
  readonly share: number;
}

/** One row of two bars without a plate. */
export function closedForm({ section, gaugeMm, bar }: StudyCase): ClosedForm {
  const columnNPerMm = through.barColumnStiffnessNPerMm(null, {
    share: 1,
    elasticMpa: ELASTIC_MPA,
    flangeSpringMm: through.barFlangeSpringMm(null, {
      flangeMm: section.flangeMm,
      mMm: (gaugeMm - section.webMm) / 2 - 0.8 * section.rootMm,
    }),
    webSpringMm: through.barWebSpringMm(null, {
      webMm: section.webMm,
      flangeMm: section.flangeMm,
      rootMm: section.rootMm,
      depthMm: section.depthMm,
      webDepthMm: section.depthMm - 2 * section.flangeMm - 2 * section.rootMm,
    }),
  });
  const barsNPerMm = through.barStiffnessNPerMm(null, {
    count: 2,
    elasticMpa: ELASTIC_MPA,
    stressAreaMm2: bar.stressAreaMm2,
    lengthMm: section.depthMm - 2 * section.flangeMm - bar.nutHeightMm,
  });
  return {
    columnNPerMm,
    barsNPerMm,
    share: through.barShareTension(null, { barNPerMm: barsNPerMm, columnNPerMm }),
  };
}
