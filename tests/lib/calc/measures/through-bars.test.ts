import { describe, expect, it } from "vitest";
import type { NodeCase } from "@/lib/calc";
import {
  M20,
  buildBars,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand, stepIn } from "@/tests/support/evaluated-case";
import * as hand from "./through-bar-hand-values";

/**
 * Guards what bars are credited with: shares from the two springs, relief by mode, and the bounds of the relief.
 * The model is this project's own; HE 300 A, M20, gauge 140 is its printed example.
 */
const withMoments = (left: number, right: number | null, node: NodeCase = buildNodeCase()): NodeCase => ({
  ...node,
  loadCases: [buildLoadCase(left, right)],
});
const bars = [buildBars()];
const bothLevels = [buildBars({ levels: ["top", "bottom"] })];
const rowsAt = (rowsMm: number[], bolts = {}): NodeCase =>
  buildNodeCase({ joints: buildJoints(buildEndPlate({ bolts: { rowsMm, ...bolts } })) });

const reliefOfWeb = (node: NodeCase): number | undefined =>
  stepIn(checkLike(evaluatedCase(node, bars), "column-web-tension", { row: 1 }), "F over 1 - R").inputs
    .relief;

describe("the share that bars take in tension", () => {
  const demand = checkLike(evaluatedCase(buildNodeCase(), bars), "bar-tension");

  it("has the printed stiffnesses and shares: 311 and 422 kN/mm, 0.73 and 0.40", () => {
    expect(Math.abs(stepIn(demand, "K_c").value / 1000 - 311)).toBeLessThanOrEqual(0.5);
    expect(Math.abs(stepIn(demand, "K_b").value / 1000 - 422)).toBeLessThanOrEqual(0.5);
    expect(Math.abs(stepIn(demand, "through-bars/eta").value - 0.73)).toBeLessThanOrEqual(0.005);
    expect(Math.abs((reliefOfWeb(buildNodeCase()) ?? NaN) - 0.4)).toBeLessThanOrEqual(0.005);
  });

  it("has the hand values to the last digit", () => {
    expectHand(stepIn(demand, "K_c").value, hand.K_c);
    expectHand(stepIn(demand, "K_b").value, hand.K_b);
    expectHand(stepIn(demand, "through-bars/eta").value, hand.eta);
    expectHand(reliefOfWeb(buildNodeCase()), hand.R_t);
  });

  it("takes the nut's own height off the free length of a larger bar", () => {
    const size = { ...M20, name: "M24", diameterMm: 24, stressAreaMm2: 353, nutHeightMm: 21.5 };
    const larger = checkLike(evaluatedCase(buildNodeCase(), [buildBars({ size })]), "bar-tension");
    expectHand(stepIn(larger, "K_b").value, (2 * 210_000 * 353) / (290 - 2 * 14 - 21.5));
  });

  it("lets each row of a group work with its own part of the column only", () => {
    // Three rows 60 apart. Outer: 2m + 0.625e + 0.5p is shorter than pi m + p; inner: p is shorter than 2p.
    const option = evaluatedCase(rowsAt([60, 120, 180, 340]), bars);
    const outer = 2 * hand.m + 0.625 * 80 + 0.5 * 60;
    const shareOf = (row: number) => stepIn(checkLike(option, "bar-tension", { row }), "K_c").inputs.share;
    expectHand(shareOf(1), outer / hand.l_1);
    expectHand(shareOf(2), 60 / hand.l_1);
    expectHand(shareOf(3), outer / hand.l_1);
  });

  it("counts no bolts into the group of the bars", () => {
    // The row at 250 stands nearer the bottom flange and keeps its bolts; the bars are the group of -45 and 60.
    const option = evaluatedCase(rowsAt([-45, 60, 250, 340]), bars);
    const end = 2 * hand.m + 0.625 * 80 + 0.5 * 105;
    expect(option.joints[0]?.rows.map(({ row }) => row)).toEqual([1, 2, 3]);
    for (const row of [1, 2])
      expectHand(stepIn(checkLike(option, "bar-tension", { row }), "K_c").inputs.share, end / hand.l_1);
    expect(checksOf(option, "bar-tension", { row: 3 })).toEqual([]);
  });

  it("finds the group of the bars where it does not begin with the first row", () => {
    // Bars below the middle only: 210 and 260 take tension from the top as a group of two, 50 apart.
    const option = evaluatedCase(rowsAt([60, 210, 260, 340]), [buildBars({ levels: ["bottom"] })]);
    const end = 2 * hand.m + 0.625 * 80 + 0.5 * 50;
    for (const row of [2, 3])
      expectHand(stepIn(checkLike(option, "bar-tension", { row }), "K_c").inputs.share, end / hand.l_1);
  });
});

describe("the mode factor", () => {
  it("is 1 under balanced moments", () => expectHand(reliefOfWeb(withMoments(50, 50)), 0.55 * hand.eta));

  it("is a half under one moment, with a beam opposite or without", () => {
    expectHand(reliefOfWeb(withMoments(50, 0)), 0.55 * hand.eta * 0.5);
    const alone = buildNodeCase({ joints: [buildJoint("left")] });
    expectHand(reliefOfWeb(withMoments(50, null, alone)), 0.55 * hand.eta * 0.5);
  });

  it("is the symmetric part between", () =>
    expectHand(reliefOfWeb(withMoments(50, 20)), (0.55 * hand.eta * (50 + 20)) / (2 * 50)));

  it("is the same for both sides, of the larger force", () => {
    const right = checkLike(evaluatedCase(withMoments(20, 50), bars), "column-web-tension", {
      side: "right",
      row: 1,
    });
    expectHand(stepIn(right, "F over 1 - R").inputs.relief, (0.55 * hand.eta * (50 + 20)) / (2 * 50));
  });

  it("is nothing under moments turning the same way: flange and web keep their own resistance", () => {
    const option = evaluatedCase(withMoments(50, -50), bars);
    expectHand(checkLike(option, "column-flange-bending", { row: 1 }).resistance, hand.F_2);
    // beta = 2: omega_2 of Table 6.3; A_vc of the rolled section with its fillets.
    const area = 2 * 300 * 14 + 262 * 8.5 + (4 - Math.PI) * 27 ** 2;
    const shearArea = area - 2 * 300 * 14 + (8.5 + 2 * 27) * 14;
    const omega = 1 / Math.sqrt(1 + 5.2 * ((hand.l_2 * 8.5) / shearArea) ** 2);
    expectHand(checkLike(option, "column-web-tension", { row: 1 }).resistance, omega * hand.l_2 * 8.5 * 275);
  });
});

describe("the relief of the column's tension side", () => {
  const flange = checkLike(evaluatedCase(buildNodeCase(), bars), "column-flange-bending", { row: 1 });
  const modes = stepIn(flange, "6.2.4/F_T,Rd").inputs;

  it("raises mode 1 to F_1 / (1 - R)", () => expectHand(modes.oneN, hand.F_1 / (1 - hand.R_t)));

  it("raises mode 2 to (2 M_pl,2 + n sum F_t) / (n + (1 - R) m), which governs here", () => {
    const relieved = (2 * hand.M_2 + hand.n * hand.sumF_t) / (hand.n + (1 - hand.R_t) * hand.m);
    expectHand(modes.twoN, relieved);
    expectHand(flange.resistance, relieved);
    expect(relieved).toBeGreaterThan(hand.F_2);
  });

  it("leaves mode 3 alone", () => expectHand(modes.threeN, hand.sumF_t));

  it("raises the web in tension to l_eff t_w f_y / (1 - R); omega is 1 under balanced moments", () =>
    expectHand(
      checkLike(evaluatedCase(buildNodeCase(), bars), "column-web-tension", { row: 1 }).resistance,
      (hand.l_2 * 8.5 * 275) / (1 - hand.R_t),
    ));

  it("spares flange bending nothing under a single preloaded row, the web as before", () => {
    const option = evaluatedCase(rowsAt([60, 340], { preloaded: true }), bars);
    expectHand(checkLike(option, "column-flange-bending", { row: 1 }).resistance, hand.F_2);
    expectHand(
      checkLike(option, "column-web-tension", { row: 1 }).resistance,
      (hand.l_2 * 8.5 * 275) / (1 - hand.R_t),
    );
  });

  it("relieves flange bending under two preloaded rows", () => {
    const preloaded = evaluatedCase(rowsAt([-45, 60, 340], { preloaded: true }), bars);
    const snug = evaluatedCase(rowsAt([-45, 60, 340]), bars);
    for (const row of [1, 2])
      expect(checkLike(preloaded, "column-flange-bending", { row }).resistance).toBe(
        checkLike(snug, "column-flange-bending", { row }).resistance,
      );
  });

  it("counts the outer two of three rows in the relief of their group", () => {
    const option = evaluatedCase(rowsAt([60, 120, 180, 340]), bars);
    const web = checksOf(option, "column-web-tension", { side: "left" });
    const reliefOf = (rows: string): number =>
      stepIn(
        web.find((check) => (check.rows ?? [check.row]).join() === rows),
        "F over 1 - R",
      ).inputs.relief ?? NaN;
    expectHand(reliefOf("1,2"), (reliefOf("1") + reliefOf("2")) / 2);
    expectHand(reliefOf("1,2,3"), (reliefOf("1") + reliefOf("3")) / 3);
  });

  it("never touches the panel's shear", () => {
    for (const right of [50, 0, -50]) {
      const node = withMoments(50, right);
      expect(checkLike(evaluatedCase(node, bothLevels), "column-web-shear").resistance).toBe(
        checkLike(evaluatedCase(node), "column-web-shear").resistance,
      );
    }
  });
});

describe("the stiffness of the column's tension side", () => {
  it.each([
    ["balanced", 50, 1],
    ["halved, with a beam opposite that carries nothing", 0, 0.5],
  ])("has k3 and k4 in series over 1 - 0.75 eta r: %s", (_, right, r) => {
    const option = evaluatedCase(withMoments(50, right), bars);
    const stiffness = option.joints.find((joint) => joint.side === "left")?.initialStiffnessNmmPerRad ?? NaN;
    const spring = (component: "end-plate-bending" | "bolt-tension" | "column-web-shear") =>
      checkLike(option, component, component === "column-web-shear" ? {} : { row: 1 })
        .stiffnessCoefficientMm ?? Infinity;
    const others =
      1 / hand.k_2 +
      1 / spring("end-plate-bending") +
      1 / spring("bolt-tension") +
      1 / spring("column-web-shear");
    const column = (1 - 0.75 * hand.eta * r) * (1 / hand.k_3 + 1 / hand.k_4);
    expectHand((210_000 * hand.z ** 2) / stiffness, column + others);
  });
});

describe("the relief of the column's compression side", () => {
  const bottom = [buildBars({ levels: ["bottom"] })];
  const strip = hand.b_c * 8.5 * 275;
  const slenderness = 0.932 * Math.sqrt((hand.b_c * hand.d_c * 275) / (210_000 * 8.5 ** 2));
  const rho = (slenderness - 0.2) / slenderness ** 2;
  const partsOf = (node: NodeCase) =>
    stepIn(checkLike(evaluatedCase(node, bottom), "column-web-compression"), "6.2.6.2/F_c,wc,Rd").inputs;

  it("fades with the distance from the flange: psi, (1 - 0.9 x) for crushing, (1 - 0.4 x) for buckling", () => {
    const x = hand.xOf(60 - 13.5 / 2);
    const share = hand.etaCOf(x);
    const parts = partsOf(buildNodeCase());
    expectHand(parts.yieldingN, strip / (1 - (1 - 0.9 * x) * share));
    expectHand(parts.bucklingN, (rho * strip) / (1 - (1 - 0.4 * x) * share));
    // The model prints 5 to 10 % as the order of size for one row.
    for (const relief of [(1 - 0.9 * x) * share, (1 - 0.4 * x) * share]) {
      expect(relief).toBeGreaterThan(0.05);
      expect(relief).toBeLessThan(0.1);
    }
  });

  it("is multiplied by the mode factor", () => {
    const x = hand.xOf(60 - 13.5 / 2);
    const web = checkLike(evaluatedCase(withMoments(50, 20), bottom), "column-web-compression");
    const relief = stepIn(web, "F over 1 - R").inputs.relief;
    expectHand(relief, (1 - 0.9 * x) * hand.etaCOf(x) * 0.7);
  });

  it("is 1.86 times that with rows on both sides of the flange, at the further one's distance", () => {
    // 445 stands 45 mm outside the beam: 51.75 mm from the flange's middle; 340 inside: 53.25 mm.
    const x = hand.xOf(53.25);
    const parts = partsOf(rowsAt([60, 340, 445]));
    expectHand(parts.yieldingN, strip / (1 - (1 - 0.9 * x) * 1.86 * hand.etaCOf(x)));
  });

  it("counts rows on both sides only where both stand within half the effective width", () => {
    // 540: 146.75 mm from the middle of the flange, beyond b_eff / 2.
    const x = hand.xOf(53.25);
    expect(146.75).toBeGreaterThan(hand.b_c / 2);
    const joints = buildJoints(
      buildEndPlate({ plate: { extensionBottomMm: 190 }, bolts: { rowsMm: [60, 340, 540] } }),
    );
    expectHand(partsOf(buildNodeCase({ joints })).yieldingN, strip / (1 - (1 - 0.9 * x) * hand.etaCOf(x)));
  });

  it("ends where the row stands half the effective width away", () => {
    const reach = hand.b_c / 2;
    const inside = 400 - 13.5 / 2 - reach;
    const near = hand.xOf(reach - 0.01);
    expectHand(
      partsOf(rowsAt([60, inside + 0.01])).yieldingN,
      strip / (1 - (1 - 0.9 * near) * hand.etaCOf(near)),
    );
    expectHand(partsOf(rowsAt([60, inside - 0.01])).yieldingN, strip);
    expectHand(partsOf(rowsAt([60, inside - 0.01])).bucklingN, rho * strip);
  });
});
