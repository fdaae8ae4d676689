import { describe, expect, it } from "vitest";
import type { EvaluatedOption, NodeCase } from "@/lib/calc";
import {
  GRADE_10_9,
  M20,
  buildBars,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  withColumn,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand } from "@/tests/support/evaluated-case";
import * as hand from "./through-bar-hand-values";

/** Guards what bars, nuts and the far side have to withstand. One flush row, so its force is M / z. */
const bars = [buildBars()];
const bothLevels = [buildBars({ levels: ["top", "bottom"] })];
const underMoments = (left: number, right: number | null, node: NodeCase = buildNodeCase()): NodeCase => ({
  ...node,
  loadCases: [buildLoadCase(left, right)],
});
const barsUnder = (left: number, right: number): EvaluatedOption =>
  evaluatedCase(underMoments(left, right), bars);
const forceOf = (momentKnm: number): number => (momentKnm * 1e6) / hand.z;
const demandOf = (option: EvaluatedOption, side: "left" | "right" = "left"): number =>
  checkLike(option, "bar-tension", { side }).demand;

describe("the force in the bars", () => {
  it("is 1.05 eta times the mean of both sides while the column flange is elastic", () => {
    expectHand(demandOf(barsUnder(50, 50)), 1.05 * hand.eta * forceOf(50));
    expectHand(demandOf(barsUnder(50, 20)), (1.05 * hand.eta * (forceOf(50) + forceOf(20))) / 2);
    expectHand(demandOf(barsUnder(50, 0)), (1.05 * hand.eta * forceOf(50)) / 2);
  });

  it("is the same bar seen from the side with the smaller force, at most that side's own F + Q", () => {
    expectHand(demandOf(barsUnder(50, 40), "right"), (1.05 * hand.eta * (forceOf(50) + forceOf(40))) / 2);
    expectHand(demandOf(barsUnder(50, 5), "right"), forceOf(5));
  });

  it("is the whole F once F exceeds the column flange's own resistance, here without prying", () => {
    const yields = (hand.F_2 * hand.z) / 1e6;
    expectHand(demandOf(barsUnder(yields * 0.999, yields * 0.999)), 1.05 * hand.eta * hand.F_2 * 0.999);
    // Balanced: (1 - R) F m stays below 2 M_pl,2, so no hinge and no prying.
    expect((1 - hand.R_t) * hand.F_2 * 1.001 * hand.m).toBeLessThan(2 * hand.M_2);
    expectHand(demandOf(barsUnder(yields * 1.001, yields * 1.001)), hand.F_2 * 1.001);
  });

  it("has the prying force added where the flange's hinge has formed: Q = ((1 - R) F m - 2 M_pl,2) / n", () => {
    const force = forceOf(90);
    const relief = hand.R_t * 0.5;
    const prying = ((1 - relief) * force * hand.m - 2 * hand.M_2) / hand.n;
    expect(prying).toBeGreaterThan(0);
    expectHand(demandOf(barsUnder(90, 0)), force + prying);
  });

  it("is held by two bars with cut threads, or by punching of the column flange where that is less", () => {
    expectHand(checkLike(barsUnder(50, 50), "bar-tension").resistance, hand.sumF_t);
    // M30 through a flange of 10 mm: B_p,Rd = 0.6 pi d_m t_f f_u / gamma_M2 (Table 3.4).
    const size = {
      ...M20,
      name: "M30",
      diameterMm: 30,
      stressAreaMm2: 561,
      acrossFlatsMm: 46,
      acrossPointsMm: 50.85,
    };
    const punching = (0.6 * Math.PI * ((46 + 50.85) / 2) * 10 * 410) / 1.25;
    expect(punching).toBeLessThan((0.85 * 0.9 * 1000 * 561) / 1.25);
    const thin = evaluatedCase(withColumn({ flangeThicknessMm: 10 }), [buildBars({ size })]);
    expectHand(checkLike(thin, "bar-tension").resistance, 2 * punching);
  });
});

describe("the far side", () => {
  const limit = Math.min((2 * hand.M_1) / hand.m, hand.l_1 * 8.5 * 275);

  it("is pulled inward by the whole bar under one moment: flange without prying, web over l_eff", () => {
    const far = checkLike(barsUnder(50, 0), "far-flange", { side: "right" });
    expectHand(far.demand, (1.05 * hand.eta * forceOf(50)) / 2);
    expectHand(far.resistance, limit);
    expect(far.level).toBe("top");
  });

  it("is pulled in the same way where there is no beam opposite", () => {
    const alone = underMoments(50, null, buildNodeCase({ joints: [buildJoint("left")] }));
    const far = checkLike(evaluatedCase(alone, bars), "far-flange", { side: "right" });
    expectHand(far.demand, (1.05 * hand.eta * forceOf(50)) / 2);
  });

  it("yields in the web first under a thick flange on a thin web", () => {
    // 2 M_pl,1 / m = 0.5 l t_f^2 f_y / m against l t_w f_y: 22.9^2 / (2 · 45.9) = 5.7 mm of web, and 5 are there.
    const section = { webThicknessMm: 5, flangeThicknessMm: 22.9 };
    const m = (140 - 5) / 2 - 0.8 * 27;
    const length = Math.min(2 * Math.PI * m, 4 * m + 1.25 * 80);
    expect(22.9 ** 2 / (2 * m)).toBeGreaterThan(5);
    const option = evaluatedCase(withColumn(section, underMoments(50, 0)), bars);
    expectHand(checkLike(option, "far-flange", { side: "right" }).resistance, length * 5 * 275);
  });

  it("keeps the difference where its own force is less than the bar's", () => {
    const far = checkLike(barsUnder(50, 10), "far-flange", { side: "right" });
    expectHand(far.demand, (1.05 * hand.eta * (forceOf(50) + forceOf(10))) / 2 - forceOf(10));
  });

  it("is not pressed at all where both forces exceed the bar's", () => {
    expect(checksOf(barsUnder(50, 50), "far-flange")).toEqual([]);
  });
});

describe("moments turning the same way", () => {
  const node = underMoments(50, -50);
  const option = evaluatedCase(node, bothLevels);
  const x = hand.xOf(60 - 13.5 / 2);
  /** N = (eta F_t - eta_c F_c) / 2; both forces are M / z. */
  const press = ((hand.eta - hand.etaCOf(x)) * forceOf(50)) / 2;
  const pressed = (of: EvaluatedOption, side: "left" | "right") =>
    checkLike(of, "column-web-compression", { side, what: "with the bars' push from the other side" });

  it.each(["left", "right"] as const)("add N to the compression that the bars face on the %s", (side) => {
    const check = pressed(option, side);
    expectHand(check.demand, forceOf(50) + press);
    expect(check.level).toBe(side === "left" ? "bottom" : "top");
    expect(check.resistance).toBe(
      checkLike(option, "column-web-compression", { side, what: undefined }).resistance,
    );
  });

  it("load the bars with 1.05 of that", () => expectHand(demandOf(option), 1.05 * press));

  it("relieve nothing and pull no far flange", () => {
    expectHand(checkLike(option, "column-flange-bending", { row: 1 }).resistance, hand.F_2);
    expect(checksOf(option, "far-flange")).toEqual([]);
  });

  it("add the sum of both rows' bars where two rows face the flange", () => {
    // Rows 105 mm apart share the column: q = (2m + 0.625e + 0.5p) / l_eff alone; in compression 1.86 eta_c.
    const joints = buildJoints(buildEndPlate({ bolts: { rowsMm: [-45, 60, 340, 445] } }));
    const two = evaluatedCase({ ...node, joints }, bothLevels);
    const q = (2 * hand.m + 0.625 * 80 + 0.5 * 105) / hand.l_1;
    const eta = (2 * hand.K_b) / (q * hand.K_c + 2 * hand.K_b);
    const right = two.joints.find((joint) => joint.side === "right");
    const forces = right?.rows.map((row) => (row.forceN * 50e6) / right.momentResistanceNmm) ?? [];
    const inward = forces.reduce((sum, force) => sum + force, 0);
    expect(forces).toHaveLength(2);
    const inBars = forces.map((force) => (eta * force - (1.86 * hand.etaCOf(x) * inward) / 2) / 2);
    expectHand(pressed(two, "left").demand, inward + inBars.reduce((sum, force) => sum + force, 0));
  });

  it("press nothing where they turn opposite ways or no bars are there", () => {
    for (const other of [evaluatedCase(underMoments(50, 50), bothLevels), evaluatedCase(node)])
      expect(checksOf(other, "column-web-compression").map((check) => check.what)).toEqual([
        undefined,
        undefined,
      ]);
  });
});

describe("bars beside the compressed flange", () => {
  const bottom = [buildBars({ levels: ["bottom"] })];
  const x = hand.xOf(60 - 13.5 / 2);

  it("carry twice their share of the flange's force, to be safe for the bar", () => {
    const check = checkLike(evaluatedCase(buildNodeCase(), bottom), "bar-compression");
    expectHand(check.demand, 2 * hand.etaCOf(x) * forceOf(50));
    expect(check.level).toBe("bottom");
  });

  it.each([640, 900])("buckle over 0.7 L_in by curve c: f_yb = %i", (yieldMpa) => {
    const grade = { ...GRADE_10_9, yieldMpa };
    const option = evaluatedCase(buildNodeCase(), [buildBars({ levels: ["bottom"], grade })]);
    const gyration = Math.sqrt((4 * 245) / Math.PI) / 4;
    const slenderness = (0.7 * hand.L_in) / (gyration * 93.9 * Math.sqrt(235 / yieldMpa));
    const phi = 0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness ** 2);
    const chi = 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
    expect(chi).toBeLessThan(0.9);
    expectHand(checkLike(option, "bar-compression").resistance, 2 * chi * 245 * yieldMpa);
  });

  it("carry nothing where the beam's own tension leaves no compression", () => {
    const pulled = underMoments(1, 1);
    const [loadCase] = pulled.loadCases;
    if (!loadCase?.left) throw new Error("the case loads both beams");
    const left = { ...loadCase.left, axialForceN: -20_000 };
    const option = evaluatedCase({ ...pulled, loadCases: [{ ...loadCase, left }] }, bottom);
    expect(checkLike(option, "bar-compression").demand).toBe(0);
  });

  it("are not judged in compression at a level without bars", () =>
    expect(checksOf(evaluatedCase(buildNodeCase(), bars), "bar-compression")).toEqual([]));
});
