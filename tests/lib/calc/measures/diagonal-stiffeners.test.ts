import { describe, expect, it } from "vitest";
import type { MeasureCase, NodeCase } from "@/lib/calc";
import {
  IPE_400,
  buildBackingPlates,
  buildBars,
  buildDiagonals,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
  buildWebPlates,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/**
 * Diagonal stiffeners by SCI/BCSA P398 (2013), step 6D (rule from memory): A_sg >= (V_wp,Ed - V_wp,Rd) / (f_y cos θ). Worked out by
 * hand: HE 300 A of S275, 262 mm between its flanges; IPE 400, 386.5 mm between the middles of its flanges.
 */
const welded = { kind: "welded", welds: buildEndPlate().welds } as const;
const node = (left = 150, overrides: Partial<NodeCase> = {}): NodeCase =>
  buildNodeCase({
    joints: [buildJoint("left", welded)],
    loadCases: [buildLoadCase(left, null)],
    ...overrides,
  });
const pairs = buildStiffeners({ levels: ["top", "bottom"] });

const area = 2 * 300 * 14 + 262 * 8.5 + (4 - Math.PI) * 27 ** 2;
const A_vc = area - 2 * 300 * 14 + (8.5 + 2 * 27) * 14;
const V_wp = (0.9 * 275 * A_vc) / Math.sqrt(3);
const z = 400 - 13.5;
const shear = 150e6 / z;

const length = Math.hypot(262, z);
const cosine = 262 / length;
const net = 2 * (100 - 27) * 12 * 275;
const i = (2 * 100 + 8.5) / Math.sqrt(12);
const lambda1 = 93.9 * Math.sqrt(235 / 275);
const f_vw = 410 / (Math.sqrt(3) * 0.85 * 1.25);

const panelOf = (...measures: MeasureCase[]): number =>
  checkLike(evaluatedCase(node(), measures), "column-web-shear").resistance;
const weldOf = (what: string, ...measures: MeasureCase[]) =>
  checkLike(evaluatedCase(node(), measures), "stiffener-weld", { what });

describe("a diagonal adds to the panel", () => {
  it("A_s f_y cos θ, past its clips at the roots", () => {
    // Slenderness below 0.2: no reduction.
    expect(length / i / lambda1).toBeLessThan(0.2);
    expectHand(panelOf(buildDiagonals()), V_wp + net * cosine);
  });

  it("no more than it carries in buckling out of the web's plane, curve c over its whole length", () => {
    const narrow = buildDiagonals({ widthMm: 29, thicknessMm: 60 });
    const slenderness = length / ((2 * 29 + 8.5) / Math.sqrt(12)) / lambda1;
    const phi = 0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness ** 2);
    const chi = 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
    const yielding = 2 * (29 - 27) * 60 * 275;
    const buckling = chi * 2 * 29 * 60 * 275;
    expectHand(panelOf(narrow), V_wp + Math.min(yielding, buckling) * cosine);
    const check = (towards: "left" | "right") =>
      checkLike(evaluatedCase(node(), [{ ...narrow, towards }]), "diagonal-stiffener", {
        what: towards === "left" ? "diagonal in tension" : "diagonal in compression",
      });
    expectHand(check("left").resistance, yielding);
    expectHand(check("right").resistance, Math.min(yielding, buckling));
  });

  it("twice as much where two cross, each held by the other", () => {
    expectHand(panelOf(buildDiagonals({ arrangement: "cross" })), V_wp + 2 * net * cosine);
  });

  it("with the flatter slope of a K", () => {
    expectHand(panelOf(buildDiagonals({ arrangement: "k" })), V_wp + (net * 262) / Math.hypot(262, z / 2));
  });

  it("instead of the frame's share, never less than that", () => {
    expectHand(panelOf(buildDiagonals(), pairs), V_wp + net * cosine);
    const faint = buildDiagonals({ widthMm: 27.1, thicknessMm: 3 });
    expectHand(panelOf(faint, pairs), panelOf(pairs));
  });

  it("and lifts the limit that the panel sets to the joint", () => {
    const one = (measures: MeasureCase[]): number =>
      evaluatedCase(node(), measures).joints[0]?.momentResistanceNmm ?? NaN;
    expect(one([pairs])).toBeLessThan((V_wp + 60e3) * z);
    expect(one([pairs, buildDiagonals()])).toBeGreaterThan(one([pairs]) * 1.1);
  });

  it("and makes k_1 infinite", () => {
    const stiffness = (measures: MeasureCase[]): number =>
      evaluatedCase(node(), measures).joints[0]?.initialStiffnessNmmPerRad ?? NaN;
    expect(
      checkLike(evaluatedCase(node(), [buildDiagonals()]), "column-web-shear").stiffnessCoefficientMm,
    ).toBe(undefined);
    expect(stiffness([buildDiagonals()])).toBeGreaterThan(stiffness([]));
  });
});

describe("the force in a diagonal", () => {
  it("is what the web leaves, over cos θ; in tension or compression by the way the panel is sheared", () => {
    const force = (moment: number, towards: "left" | "right", what: string) =>
      checkLike(evaluatedCase(node(moment), [buildDiagonals({ towards })]), "diagonal-stiffener", { what });
    expectHand(force(250, "right", "diagonal in compression").demand, (250e6 / z - V_wp) / cosine);
    expectHand(force(250, "left", "diagonal in tension").demand, (250e6 / z - V_wp) / cosine);
    expectHand(force(-250, "right", "diagonal in tension").demand, (250e6 / z - V_wp) / cosine);
    expect(force(20, "right", "diagonal in compression").demand).toBe(0);
  });

  it("is halved where two cross", () => {
    const option = evaluatedCase(node(250), [buildDiagonals({ arrangement: "cross" })]);
    expectHand(
      checkLike(option, "diagonal-stiffener", { what: "diagonal in compression" }).demand,
      (250e6 / z - V_wp) / (2 * cosine),
    );
  });
});

describe("the welds of a diagonal", () => {
  it("are for the whole shear, at most what it carries", () => {
    expect(shear / cosine).toBeGreaterThan(net);
    expectHand(weldOf("diagonal to web", buildDiagonals()).demand, net);
    const option = evaluatedCase(node(100), [buildDiagonals()]);
    expectHand(checkLike(option, "stiffener-weld", { what: "diagonal to web" }).demand, 100e6 / z / cosine);
  });

  it("count along the web between the clips, and at the flange by one run a plate in the sharp corner", () => {
    expectHand(weldOf("diagonal to web", buildDiagonals()).resistance, f_vw * 8 * 4 * (length - 2 * 27));
    // The plate meets the flange at 90° less its slope of 56°: below 60°.
    expect((Math.acos(cosine) * 180) / Math.PI).toBeGreaterThan(30);
    expectHand(weldOf("diagonal to flange", buildDiagonals()).resistance, f_vw * 8 * 2 * (100 - 27));
  });

  it("need none where they are full-penetration butt welds", () => {
    const option = evaluatedCase(node(), [buildDiagonals({ weld: { kind: "butt" } })]);
    expect(checksOf(option, "stiffener-weld")).toEqual([]);
  });
});

describe("the ends of a diagonal", () => {
  it("without a full-depth pair take their force out of the web over its spread, and say so", () => {
    const option = evaluatedCase(node(), [buildDiagonals()]);
    const spread = (2.5 * (14 + 27)) / Math.sqrt(1 - cosine ** 2);
    for (const level of ["top", "bottom"] as const) {
      const web = checkLike(option, "diagonal-stiffener", {
        level,
        what: "column web in shear beside the diagonal's end",
      });
      expectHand(web.resistance, (2 * spread * 8.5 * 275) / Math.sqrt(3));
      expectHand(web.demand, net);
      expectHand(
        checkLike(option, "stiffener-weld", { level, what: "diagonal to web beside its end" }).resistance,
        f_vw * 8 * 4 * spread,
      );
    }
    expect(option.cautions.filter((text) => text.startsWith("No full-depth stiffeners"))).toHaveLength(2);
  });

  it("with a pair bring the level part of it across through the pair and its welds", () => {
    const option = evaluatedCase(node(), [buildDiagonals(), pairs]);
    for (const level of ["top", "bottom"] as const) {
      const plates = checkLike(option, "transverse-stiffener", {
        level,
        what: "level part of the diagonal's force",
      });
      expectHand(plates.demand, net * cosine);
      expectHand(plates.resistance, 2 * (100 - 27) * 12 * 275);
      expectHand(
        checkLike(option, "stiffener-weld", { level, what: "stiffener to flange at the diagonal's end" })
          .resistance,
        f_vw * 5 * 4 * (100 - 27),
      );
    }
    expect(option.cautions.some((text) => text.startsWith("No full-depth stiffeners"))).toBe(false);
  });

  it("leave room for nuts: beside the plate's half thickness, and on its slope beyond nut and washer", () => {
    const bolted = buildNodeCase({ joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] });
    const room = (measure: MeasureCase) =>
      checksOf(evaluatedCase(bolted, [measure]), "detailing", { what: "nut beside the diagonal" })[0];
    // Top end to the right: the left beam's nuts meet its lower end, row 340 above the flange's middle at 393.25.
    const tangent = z / 262;
    expectHand(room(buildDiagonals())?.demand, (18 + 3) * tangent + 6 / cosine + 32.95 / 2);
    expectHand(room(buildDiagonals())?.resistance, 393.25 - 340);
    // A plate that ends before the nut has room: (140 - 8.5)/2 - 32.95/2 = 49.3.
    expect(room(buildDiagonals({ widthMm: 49 }))).toBeUndefined();
    // A K whose meeting point is on the left: row 60 stands 140 from mid-height.
    expectHand(room(buildDiagonals({ arrangement: "k" }))?.resistance, 140);
  });
});

describe("diagonals outside scope", () => {
  const two = buildNodeCase({ joints: buildJoints(buildEndPlate()) });

  it("say why", () => {
    expect(refusalOf(two, [buildDiagonals(), buildWebPlates()])).toMatch(/web plate/);
    expect(refusalOf(two, [buildDiagonals(), buildBars()])).toMatch(/bars .* run into/);
    expect(refusalOf(two, [buildDiagonals({ towards: "left" }), buildBackingPlates({ at: "left" })])).toMatch(
      /backing plate at the top on the left/,
    );
    const away = [buildDiagonals({ towards: "right" }), buildBackingPlates({ at: "left" })];
    expect(() => evaluatedCase(two, away)).not.toThrow();
    const lower = { ...buildJoint("right"), levelOffsetMm: 60 };
    expect(refusalOf(buildNodeCase({ joints: [buildJoint("left"), lower] }), [buildDiagonals()])).toMatch(
      /one depth at one level/,
    );
    expect(IPE_400.depthMm - IPE_400.flangeThicknessMm).toBe(z);
  });
});
