import { describe, expect, it } from "vitest";
import { closedForm } from "@/scripts/fe/closed-form";
import { coupleBars } from "@/scripts/fe/coupling";
import results from "@/scripts/fe/results.json";
import { meshSection } from "@/scripts/fe/section-mesh";
import { meshStub } from "@/scripts/fe/stub-mesh";

/**
 * Holds the two-spring model of the through-bars against finite elements that know nothing of it: the committed
 * results of `npm run verify:fe`. The bounds are this study's own for a row without a plate: finite-element share over
 * η from 0.98 to 1.08. The model was fitted to 0.99 to 1.05; on finer meshes the two worst cases (M16 at wide gauges)
 * come to 1.07, so its upper bound does not hold without a plate. Behind end plates, which the program asks for, the
 * share is smaller.
 */
const LOWEST = 0.98;
const HIGHEST = 1.08;
const MESH_ERROR = 0.02;

const cases = results.cases.map((each) => ({
  ...each,
  name: `${each.section.name}, gauge ${each.gaugeMm}, ${each.bar.name}`,
}));
const direct = results.direct.map((run) => ({
  ...run,
  name: `${run.section}, gauge ${run.gaugeMm}, ${run.bar}, ${run.loading}`,
}));
const caseOf = (run: (typeof direct)[number]): (typeof cases)[number] => {
  const found = cases.find((each) => run.name.startsWith(`${each.name},`));
  if (!found) throw new Error(`no case for ${run.name}`);
  return found;
};

/** Mean outward force of both sides over that of the more loaded one. */
const symmetricParts: Readonly<Record<string, number>> = {
  symmetric: (1 + 1) / 2,
  "one-sided": (1 + 0) / 2,
  antisymmetric: (1 - 1) / 2,
};

describe("the finite-element study of the through-bars", () => {
  it("covers five columns, four bars and three loadings", () => {
    expect(new Set(cases.map((each) => each.section.name))).toEqual(
      new Set(["HE 200 B", "HE 300 A", "HE 300 B", "HE 400 B", "IPE 400"]),
    );
    expect(new Set(cases.map((each) => each.bar.name))).toEqual(new Set(["M16", "M20", "M24", "M30"]));
    for (const each of cases)
      expect(each.rows.map((row) => row.loading)).toEqual(["symmetric", "one-sided", "antisymmetric"]);
  });

  it("has meshes that agree within the error it allows itself", () => {
    const [, used, fine] = results.meshCheck.meshes;
    expect(used!.fineness).toEqual(results.fineness);
    expect(fine!.isHoleCut).toBe(false);
    expect(fine!.bricks).toBeGreaterThan(2 * used!.bricks);
    expect(Math.abs(used!.share / fine!.share - 1)).toBeLessThan(MESH_ERROR);
  });

  it.each(cases)("bears out N = η (F_L + F_R) / 2: $name", (each) => {
    const { share } = closedForm(each);
    for (const row of each.rows) {
      const expected = share * symmetricParts[row.loading]!;
      expect(row.share).toBeGreaterThanOrEqual(LOWEST * expected);
      expect(row.share).toBeLessThanOrEqual(HIGHEST * expected);
    }
  });

  // This study's own measured bounds: 0.88 to 1.09 on its mesh, 0.86 on the finest.
  it.each(cases)("comes near the column's stiffness K_c, and has the bar's K_b: $name", (each) => {
    const { columnNPerMm, barsNPerMm } = closedForm(each);
    expect(each.columnNPerMm.finiteElements / columnNPerMm).toBeGreaterThan(0.86);
    expect(each.columnNPerMm.finiteElements / columnNPerMm).toBeLessThan(1.1);
    expect(Math.abs(each.barsNPerMm / barsNPerMm - 1)).toBeLessThan(1e-3);
  });

  // Beyond the model's 1.05: this study's own measured bound, 1.00 to 1.11 on the finest mesh, with the bolt hole cut out of a flange without a plate.
  it.each(results.holeChecks)("carries at most a tenth more with the hole: $section, $bar", (check) => {
    const ratio = check.shareWithHole / check.closedFormShare;
    expect(check.shareWithHole).toBeGreaterThan(check.share);
    expect(ratio).toBeGreaterThan(1 - MESH_ERROR);
    expect(ratio).toBeLessThan(1.1 + MESH_ERROR);
  });

  it.each(direct)("gives by coupling what a bar in the mesh gives: $name", (run) => {
    expect(Math.abs(run.share - run.shareByCoupling)).toBeLessThan(0.002);
  });

  it.each(direct.filter((run) => run.loading === "symmetric"))(
    "relieves the web by the bars' share: $name",
    (run) => {
      const { share } = closedForm(caseOf(run));
      expect(run.shareByWebForce).toBeGreaterThan(LOWEST * share);
      expect(run.webRelief).toBeGreaterThan(LOWEST * share);
    },
  );
});

describe("what the method page says of an HE 300 A with M20 bars at gauge 140", () => {
  const each = cases.find(({ name }) => name === "HE 300 A, gauge 140, M20")!;

  it("is a relative displacement of the nuts cut by 73 %", () => {
    const row = each.rows.find(({ loading }) => loading === "symmetric")!;
    const relative = (sides: readonly number[]): number => sides[0]! + sides[1]!;
    expect(1 - relative(row.withBarsMm) / relative(row.withoutBarsMm)).toBeCloseTo(0.73, 2);
  });

  it("is a cautious design value of 40 %", () => expect(0.55 * closedForm(each).share).toBeCloseTo(0.4, 2));
});

describe("the stub that the finite elements are run on", () => {
  const { section, gaugeMm, bar } = cases.find((each) => each.section.name === "HE 300 A")!;

  it("has the area of the section, its fillets as circles", () => {
    const mesh = meshSection(section, results.fineness);
    const corner = (quad: readonly number[], n: number): readonly [number, number] =>
      mesh.points[quad[n % 4]!]!;
    const cross = (quad: readonly number[], n: number): number => {
      const [[x, y], [nextX, nextY]] = [corner(quad, n), corner(quad, n + 1)];
      return (x * nextY - nextX * y) / 2;
    };
    const area = mesh.quads.reduce(
      (sum, quad) => sum + [0, 1, 2, 3].reduce((s, n) => s + cross(quad, n), 0),
      0,
    );
    const quarter = (2 * 300 * 14 + (290 - 2 * 14) * 8.5 + (4 - Math.PI) * 27 ** 2) / 4;
    // Chords of the fillet's arc leave out a little of the notch.
    expect(Math.abs(area / quarter - 1)).toBeLessThan(0.005);
  });

  it("is pressed by the whole nut, in the middle of the bar", () => {
    const mesh = meshStub({ section, gaugeMm, bar, depth: "full", isHoleCut: false }, results.fineness);
    expect(mesh.nuts).toHaveLength(2);
    mesh.nuts.forEach((nut, side) => {
      const inner = (side === 0 ? 1 : -1) * (290 / 2 - 14);
      expect(nut.reduce((sum, each) => sum + each.share, 0)).toBeCloseTo(1, 12);
      expect(nut.reduce((sum, each) => sum + each.share * mesh.nodes[each.node - 1]![0], 0)).toBeCloseTo(
        gaugeMm / 2,
        1,
      );
      for (const each of nut) expect(mesh.nodes[each.node - 1]![1]).toBeCloseTo(inner, 9);
    });
  });

  it("shares forces with bars by equal stretch", () => {
    // Nuts of 1/200 mm/N; bars of 50 N/mm: stretch of both nuts 2 (F - N) / 200 = N / 50, so N = F / 3.
    const unit = { symmetricMmPerN: 1 / 200, antisymmetricMmPerN: 1 / 100 };
    const coupled = coupleBars(unit, 50, [300, 0]);
    expect(coupled.barsN).toBeCloseTo(150 / 3, 9);
    // Symmetric part 150 N, antisymmetric part 150 N; the bars leave 100 N of the first.
    expect(coupled.withoutBarsMm[0]).toBeCloseTo(150 / 200 + 150 / 100, 9);
    expect(coupled.withBarsMm[1]).toBeCloseTo(100 / 200 - 150 / 100, 9);
  });
});
