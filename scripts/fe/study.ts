import { writeFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { studyCases, type StudyCase } from "./cases";
import { closedForm } from "./closed-form";
import { LOADINGS, coupleBars, type Loading, type UnitAnswers } from "./coupling";
import { reportLines } from "./report";
import type { Fineness } from "./section-mesh";
import { solve, solverVersion } from "./solve";
import { meshStub } from "./stub-mesh";
import type { CaseResult, DirectRun, HoleCheck, MeshCheck, StudyResults } from "./study-results";

/** `npm run verify:fe`: column stubs in finite elements beside the closed form of the through-bar model; writes results.json. */
const FORCE_N = 100_000;
const FINENESS: Fineness = { throughFlange: 3, throughHalfWeb: 2, alongHalfFillet: 3, sizeMm: 6 };
const COARSE: Fineness = { throughFlange: 2, throughHalfWeb: 1, alongHalfFillet: 2, sizeMm: 8 };
const FINE: Fineness = { throughFlange: 4, throughHalfWeb: 2, alongHalfFillet: 4, sizeMm: 4 };
interface MeshPlan {
  readonly fineness: Fineness;
  readonly isHoleCut: boolean;
}

const MESHES: readonly MeshPlan[] = [
  { fineness: COARSE, isHoleCut: false },
  { fineness: FINENESS, isHoleCut: false },
  { fineness: FINE, isHoleCut: false },
  { fineness: FINE, isHoleCut: true },
];
/** The case that the mesh check and every kind of direct run use. */
const REFERENCE = { section: "HE 300 A", gaugeMm: 140, bar: "M20" };
const DIRECT_BAR = "M20";
const RESULTS = path.join(path.dirname(fileURLToPath(import.meta.url)), "results.json");

const isReference = ({ section, gaugeMm, bar }: StudyCase): boolean =>
  section.name === REFERENCE.section && gaugeMm === REFERENCE.gaugeMm && bar.name === REFERENCE.bar;

function unitAnswers(study: StudyCase): UnitAnswers {
  const mesh = meshStub({ ...study, depth: "half", isHoleCut: false }, FINENESS);
  const movement = (midDepth: "symmetric" | "antisymmetric"): number =>
    solve({ mesh, midDepth, rowForcesN: [FORCE_N], barNPerMm: null }).nutsMm[0]! / FORCE_N;
  return { symmetricMmPerN: movement("symmetric"), antisymmetricMmPerN: movement("antisymmetric") };
}

const forcesOf = (loading: Loading): readonly [number, number] => [
  LOADINGS[loading][0] * FORCE_N,
  LOADINGS[loading][1] * FORCE_N,
];

function coupledCase(study: StudyCase, unit: UnitAnswers): CaseResult {
  const closed = closedForm(study);
  const rows = (Object.keys(LOADINGS) as Loading[]).map((loading) => {
    const [left, right] = forcesOf(loading);
    const { barsN, ...movements } = coupleBars(unit, closed.barsNPerMm, [left, right]);
    const share = barsN / FORCE_N;
    const closedFormShare = (closed.share * (left + right)) / (2 * FORCE_N);
    return {
      loading,
      share,
      closedFormShare,
      ratio: closedFormShare === 0 ? null : share / closedFormShare,
      ...movements,
    };
  });
  return {
    ...study,
    barsNPerMm: closed.barsNPerMm,
    columnNPerMm: { finiteElements: 1 / unit.symmetricMmPerN, closedForm: closed.columnNPerMm },
    rows,
  };
}

function directRun(study: StudyCase, unit: UnitAnswers, loading: Loading): DirectRun {
  const { section, gaugeMm, bar } = study;
  const { barsNPerMm } = closedForm(study);
  const depth = loading === "symmetric" ? "half" : "full";
  const stub = {
    mesh: meshStub({ ...study, depth, isHoleCut: false }, FINENESS),
    midDepth: loading === "symmetric" ? ("symmetric" as const) : ("none" as const),
    rowForcesN: loading === "symmetric" ? [FORCE_N] : forcesOf(loading),
  };
  const held = solve({ ...stub, barNPerMm: barsNPerMm / 2 });
  const bare = loading === "symmetric" ? solve({ ...stub, barNPerMm: null }) : null;
  const stretchMm = held.nutsMm[0]! + (held.nutsMm[1] ?? held.nutsMm[0]!);
  return {
    section: section.name,
    gaugeMm,
    bar: bar.name,
    loading,
    depth,
    share: (barsNPerMm * stretchMm) / FORCE_N,
    shareByWebForce: held.midDepthN === null ? null : 1 - held.midDepthN / FORCE_N,
    shareByCoupling: coupleBars(unit, barsNPerMm, forcesOf(loading)).barsN / FORCE_N,
    webRelief: bare === null ? null : 1 - held.webPeakMpa / bare.webPeakMpa,
  };
}

function meshRun(study: StudyCase, { fineness, isHoleCut }: MeshPlan): MeshCheck {
  const { barsNPerMm } = closedForm(study);
  const mesh = meshStub({ ...study, depth: "half", isHoleCut }, fineness);
  const answer = solve({ mesh, midDepth: "symmetric", rowForcesN: [FORCE_N], barNPerMm: null });
  const symmetricMmPerN = answer.nutsMm[0]! / FORCE_N;
  const unit = { symmetricMmPerN, antisymmetricMmPerN: 0 };
  return {
    fineness,
    isHoleCut,
    bricks: mesh.bricks.length,
    columnNPerMm: 1 / symmetricMmPerN,
    share: coupleBars(unit, barsNPerMm, [FORCE_N, FORCE_N]).barsN / FORCE_N,
    seconds: answer.seconds,
  };
}

/** What the hole changes, with the thickest and the thinnest bar of each section at its widest gauge. */
function holeChecks(studies: readonly StudyCase[]): HoleCheck[] {
  return [...new Set(studies.map((study) => study.section))].flatMap((section) => {
    const own = studies.filter((study) => study.section === section);
    const widest = Math.max(...own.map((study) => study.gaugeMm));
    const there = own.filter((study) => study.gaugeMm === widest);
    return [there[0]!, there.at(-1)!].map((study) => {
      process.stdout.write(`hole: ${section.name}, gauge ${widest}, ${study.bar.name}\n`);
      const share = (isHoleCut: boolean): number => meshRun(study, { fineness: FINE, isHoleCut }).share;
      return {
        section: section.name,
        gaugeMm: widest,
        bar: study.bar.name,
        share: share(false),
        shareWithHole: share(true),
        closedFormShare: closedForm(study).share,
      };
    });
  });
}

/** Both kinds of run for the reference; symmetric and one-sided for one case of each other section. */
function directLoadings(study: StudyCase, done: readonly DirectRun[]): readonly Loading[] {
  if (isReference(study)) return ["symmetric", "one-sided", "antisymmetric"];
  const isSectionDone = done.some((run) => run.section === study.section.name);
  const isOther = study.section.name !== REFERENCE.section && study.bar.name === DIRECT_BAR;
  return isOther && !isSectionDone ? ["symmetric", "one-sided"] : [];
}

/** Six digits say more than the mesh does. */
const shortened = (_: string, value: unknown): unknown =>
  typeof value === "number" ? Number(value.toPrecision(6)) : value;

function runStudy(): StudyResults {
  const solver = `CalculiX ${solverVersion()}`;
  const studies = studyCases();
  const reference = studies.find(isReference);
  if (!reference)
    throw new Error("The study lacks its reference case: see REFERENCE in scripts/fe/study.ts.");
  const meshes = MESHES.map((plan) => meshRun(reference, plan));
  const cases: CaseResult[] = [];
  const direct: DirectRun[] = [];
  for (const study of studies) {
    process.stdout.write(`${study.section.name}, gauge ${study.gaugeMm}, ${study.bar.name}\n`);
    const unit = unitAnswers(study);
    cases.push(coupledCase(study, unit));
    direct.push(...directLoadings(study, direct).map((loading) => directRun(study, unit, loading)));
  }
  return {
    about:
      "Column stubs in linear-elastic C3D8I bricks, one row of two bars, no plate, no hole but where it is said. Forces as nut pressure on the annulus between hole and across flats; bars as springs between the mean displacements of these. Written by npm run verify:fe.",
    solver,
    date: new Date().toISOString().slice(0, 10),
    forceN: FORCE_N,
    fineness: FINENESS,
    meshCheck: { ...REFERENCE, meshes },
    holeChecks: holeChecks(studies),
    cases,
    direct,
  };
}

const results = runStudy();
writeFileSync(RESULTS, `${JSON.stringify(results, shortened, 2)}\n`);
process.stdout.write(`${reportLines(results).join("\n")}\n`);
