import type { StudyResults } from "./study-results";

const range = (values: readonly number[]): string => {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return `mean ${mean.toFixed(3)}, ${Math.min(...values).toFixed(3)} to ${Math.max(...values).toFixed(3)}`;
};

/** What the study says, for the terminal. */
export function reportLines(results: StudyResults): string[] {
  const ratios = results.cases.flatMap((each) =>
    each.rows.flatMap(({ ratio }) => (ratio === null ? [] : [ratio])),
  );
  const stiffness = results.cases.map(
    (each) => each.columnNPerMm.finiteElements / each.columnNPerMm.closedForm,
  );
  return [
    `${results.solver}, ${results.cases.length} cases`,
    ...results.meshCheck.meshes.map(
      (mesh) =>
        `mesh of ${mesh.bricks} bricks${mesh.isHoleCut ? ", hole cut" : ""}: K_c ${(mesh.columnNPerMm / 1000).toFixed(1)} kN/mm, share ${mesh.share.toFixed(4)}, ${mesh.seconds.toFixed(1)} s`,
    ),
    ...results.holeChecks.map(
      (check) =>
        `hole, ${check.section}, ${check.gaugeMm}, ${check.bar}: share over closed form ${(check.share / check.closedFormShare).toFixed(3)}, with hole ${(check.shareWithHole / check.closedFormShare).toFixed(3)}`,
    ),
    `share over closed form: ${range(ratios)}`,
    `column stiffness over closed form: ${range(stiffness)}`,
    ...results.direct.map((run) =>
      [
        `${run.section}, ${run.gaugeMm}, ${run.bar}, ${run.loading}, ${run.depth} depth: share ${run.share.toFixed(4)}`,
        `by coupling ${run.shareByCoupling.toFixed(4)}`,
        ...(run.shareByWebForce === null ? [] : [`by web force ${run.shareByWebForce.toFixed(4)}`]),
        ...(run.webRelief === null ? [] : [`web relief ${run.webRelief.toFixed(4)}`]),
      ].join(", "),
    ),
  ];
}
