import { describe, expect, it } from "vitest";
import type { MeasureCase, NodeCase } from "@/lib/calc";
import { alphaOf } from "@/lib/calc/clauses/en1993-1-8-2005/alpha";
import {
  S355,
  buildEndPlate,
  buildJoint,
  buildJoints,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
  withColumn,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand, stepIn } from "@/tests/support/evaluated-case";

/**
 * Guards stiffeners 100 x 12 in an HE 300 A, S275, behind an IPE 400: what they carry, resist and change.
 * Flush rows 60 mm from the flange faces unless a test says otherwise, so that a row's force is M / z.
 */
const m = (140 - 8.5) / 2 - 0.8 * 27;
const z = 400 - 13.5 / 2 - 60;
const epsilon = Math.sqrt(235 / 275);
const b_c = 13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27) + 2 * 20;
const netArea = 2 * (100 - 27) * 12;
/** Simplified method, Eq. (4.4), S275. */
const f_vwd = 410 / (Math.sqrt(3) * 0.85 * 1.25);

const under = (left: number, right: number | null, node: NodeCase = buildNodeCase()): NodeCase => ({
  ...node,
  loadCases: [buildLoadCase(left, right)],
});
const rowsAt = (...rowsMm: number[]): NodeCase =>
  buildNodeCase({ joints: buildJoints(buildEndPlate({ bolts: { rowsMm } })) });
const bottom = buildStiffeners({ levels: ["bottom"] });

describe("a pair at the tension flange", () => {
  /** m_2 of a row: to the stiffener's face, less 0.8 of its weld's leg. */
  const m2 = (fromFace: number): number => Math.abs(fromFace - 13.5 / 2) - 12 / 2 - 0.8 * 5 * Math.SQRT2;
  const yields = netArea * 275;

  it("takes its share of one row's force by the distances to web and stiffener", () => {
    const check = checkLike(evaluatedCase(buildNodeCase(), [buildStiffeners()]), "transverse-stiffener");
    expectHand(check.demand, ((m / (m + m2(60))) * 50e6) / z);
    expectHand(check.resistance, yields);
  });

  it("takes the larger of both rules from the rows on either side of it", () => {
    const forced = (momentKnm: number) => {
      const option = evaluatedCase(under(momentKnm, momentKnm, rowsAt(-45, 60, 340)), [buildStiffeners()]);
      const joint = option.joints[0];
      const [first = 0, second = 0] =
        joint?.rows.map((row) => (row.forceN * momentKnm * 1e6) / joint.momentResistanceNmm) ?? [];
      return { first, second, demand: checkLike(option, "transverse-stiffener").demand };
    };
    // Web reached: 0.87 w beyond either row, half the distance of 105 mm towards each other.
    const web = 2 * (0.87 * 140 + 105 / 2) * 8.5 * 275;
    const small = forced(100);
    const shared = (of: typeof small) => (m / (m + m2(-45))) * of.first + (m / (m + m2(60))) * of.second;
    expect(shared(small)).toBeGreaterThan(small.first + small.second - web);
    expectHand(small.demand, shared(small));
    const large = forced(1500);
    expect(large.first + large.second - web).toBeGreaterThan(shared(large));
    expectHand(large.demand, large.first + large.second - web);
  });

  it("lengthens the pattern of the row beside it to alpha m", () => {
    const flange = checkLike(evaluatedCase(buildNodeCase(), [buildStiffeners()]), "column-flange-bending", {
      row: 1,
    });
    const alpha = alphaOf(null, { lambda1: m / (m + 80), lambda2: m2(60) / (m + 80) });
    expect(alpha * m).toBeGreaterThan(4 * m + 1.25 * 80);
    const moment = 0.25 * alpha * m * 14 ** 2 * 275;
    const bolts = (2 * 0.9 * 1000 * 245) / 1.25;
    expectHand(stepIn(flange, "6.2.4/F_T,Rd").inputs.twoN, (2 * moment + 40 * bolts) / (m + 40));
  });

  it("parts the rows of the column flange when 2 b_sg + t_wc reaches 1.33 w, and not below", () => {
    // (1.33 · 140 - 8.5) / 2 = 88.85 mm.
    const groupsAt = (widthMm: number) =>
      checksOf(evaluatedCase(rowsAt(-45, 60, 340), [buildStiffeners({ widthMm })]), "column-flange-bending", {
        side: "left",
      }).filter((check) => check.rows);
    expect(groupsAt(88.86)).toEqual([]);
    expect(groupsAt(88.84).map((check) => check.rows)).toEqual([[1, 2]]);
  });

  it("does not count for the flange when it is too narrow, and says so", () => {
    const narrow = evaluatedCase(buildNodeCase(), [buildStiffeners({ widthMm: 88.84 })]);
    const flange = (option: typeof narrow) =>
      checkLike(option, "column-flange-bending", { row: 1 }).resistance;
    expect(flange(narrow)).toBe(flange(evaluatedCase(buildNodeCase())));
    expect(narrow.cautions.join()).toMatch(/too narrow to hold the column flange/);
    expect(evaluatedCase(buildNodeCase(), [buildStiffeners()]).cautions.join()).not.toMatch(/too narrow/);
  });

  it("spares the web in tension within 0.87 w of its middle, and not beyond", () => {
    const webAt = (fromMiddle: number) =>
      checksOf(evaluatedCase(rowsAt(13.5 / 2 + fromMiddle, 340), [buildStiffeners()]), "column-web-tension");
    expect(webAt(0.87 * 140 - 0.1)).toEqual([]);
    expect(webAt(0.87 * 140 + 0.1)).toHaveLength(2);
  });
});

describe("a pair at the compression flange", () => {
  const option = evaluatedCase(buildNodeCase(), [bottom]);
  const check = checkLike(option, "transverse-stiffener");
  const parts = stepIn(check, "6.2.6.2/F_c,wc,Rd").inputs;
  const webPart = b_c * 8.5 * 275;
  const crushing = netArea * 275 + webPart;

  it("crushes over the plates behind their clips and the web that the force spreads into", () =>
    expectHand(parts.yieldingN, crushing));

  it("buckles over the whole web height as a cruciform by curve c", () => {
    // Deep and slender enough for a slenderness above 0.2: h = 590, plates 50 x 10, d_c = 508.
    const deep = withColumn({ depthMm: 590 });
    const slim = { ...bottom, widthMm: 50, thicknessMm: 10 };
    const area = 2 * 50 * 10 + (30 * epsilon * 8.5 + 10) * 8.5;
    const inertia = (10 * (2 * 50 + 8.5) ** 3) / 12 + (30 * epsilon * 8.5 * 8.5 ** 3) / 12;
    const slenderness = (590 - 2 * 14) / (Math.sqrt(inertia / area) * 93.9 * epsilon);
    expect(slenderness).toBeGreaterThan(0.2);
    const phi = 0.5 * (1 + 0.49 * (slenderness - 0.2) + slenderness ** 2);
    const chi = 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
    const found = stepIn(checkLike(evaluatedCase(deep, [slim]), "transverse-stiffener"), "F_c,wc,Rd").inputs;
    expectHand(found.bucklingN, chi * area * 275);
  });

  it("only has its cross-section where the slenderness stays below 0.2", () => {
    const area = 2 * 100 * 12 + (30 * epsilon * 8.5 + 12) * 8.5;
    expectHand(parts.bucklingN, area * 275);
  });

  it("has the lesser of both, whichever that is", () => {
    expectHand(check.resistance, crushing);
    const area = 2 * 100 * 12 + (30 * epsilon * 8.5 + 12) * 8.5;
    const partialFactors = { gammaM0: 1, gammaM1: 1.3, gammaM2: 1.25 };
    const buckling = (area * 275) / 1.3;
    expect(buckling).toBeLessThan(crushing);
    expectHand(
      checkLike(evaluatedCase(buildNodeCase({ partialFactors }), [bottom]), "transverse-stiffener")
        .resistance,
      buckling,
    );
  });

  it("is no stronger in a better steel than the column's", () => {
    const better = checkLike(
      evaluatedCase(buildNodeCase(), [{ ...bottom, steel: S355 }]),
      "transverse-stiffener",
    );
    expect(better.resistance).toBe(check.resistance);
  });

  it("carries the whole flange force in the check, its own part of it in its welds", () => {
    const force = 50e6 / z;
    expectHand(check.demand, force);
    const weld = checkLike(option, "stiffener-weld", { what: "stiffener to flange" });
    expectHand(weld.demand, (force * netArea * 275) / crushing);
    expectHand(weld.resistance, f_vwd * 5 * 4 * (100 - 27));
  });
});

describe("the web welds of a pair", () => {
  const along = 290 - 2 * 14 - 2 * 27;
  const inPlates = (netArea * 275) / (netArea * 275 + b_c * 8.5 * 275);
  const m2 = 60 - 13.5 / 2 - 12 / 2 - 0.8 * 5 * Math.SQRT2;
  const webWeld = (left: number, right: number | null, measures: MeasureCase[]) => {
    const joints = right === null ? [buildJoint("left")] : buildNodeCase().joints;
    return checksOf(
      evaluatedCase(under(left, right, buildNodeCase({ joints })), measures),
      "stiffener-weld",
      {
        what: "stiffener to web",
      },
    )[0];
  };

  it("carry the force of one side alone", () => {
    const weld = webWeld(50, null, [bottom]);
    expectHand(weld?.demand, (inPlates * 50e6) / z);
    expectHand(weld?.resistance, f_vwd * 4 * 4 * along);
  });

  it("carry nothing of two equal forces that meet in the plates", () =>
    expect(webWeld(50, 50, [bottom])?.demand).toBeLessThan(1e-6));

  it("carry the difference of unequal forces that meet", () =>
    expectHand(webWeld(50, 20, [bottom])?.demand, (inPlates * 30e6) / z));

  it("carry the tension of one side and the compression of the other together in sway", () =>
    expectHand(
      webWeld(50, -50, [buildStiffeners()])?.demand,
      (m / (m + m2)) * (50e6 / z) + (inPlates * 50e6) / z,
    ));

  it("are not checked where they are butt welds", () =>
    expect(webWeld(50, null, [{ ...bottom, webWeld: { kind: "butt" } }])).toBeUndefined());
});

describe("a pair of partial depth", () => {
  const short = { ...bottom, length: 150 };
  const plane = "column web in shear along a partial-depth stiffener";

  it("shears the web in two planes along its weld, less a clip at either end", () => {
    const option = evaluatedCase(buildNodeCase(), [short]);
    const check = checksOf(option, "transverse-stiffener", { what: plane })[0];
    expectHand(check?.resistance, (2 * (150 - 2 * 27) * 8.5 * 275) / Math.sqrt(3));
    // Equal forces meet: the web still has to take one side's force out of plates that do not reach across.
    expectHand(check?.demand, ((netArea * 275) / (netArea * 275 + b_c * 8.5 * 275)) * (50e6 / z));
  });

  it("leaves the web its buckling and its spring", () => {
    const bare = checkLike(evaluatedCase(buildNodeCase()), "column-web-compression");
    const part = checkLike(evaluatedCase(buildNodeCase(), [short]), "column-web-compression");
    expect(part.resistance).toBe(bare.resistance);
    expect(part.stiffnessCoefficientMm).toBe(bare.stiffnessCoefficientMm);
    const full = checkLike(evaluatedCase(buildNodeCase(), [bottom]), "column-web-compression");
    expect(full.stiffnessCoefficientMm).toBeUndefined();
  });

  it("has no such planes at full depth", () =>
    expect(
      checksOf(evaluatedCase(buildNodeCase(), [bottom]), "transverse-stiffener", { what: plane }),
    ).toEqual([]));
});

describe("a pair behind a welded flange", () => {
  const welds = buildEndPlate().welds;
  const joints = buildJoints({ kind: "welded", welds });
  const option = evaluatedCase(buildNodeCase({ joints }), [buildStiffeners()]);
  const breadth = 13.5 + 2 * 6 * Math.SQRT2 + 5 * (14 + 27);
  const whole = netArea * 275 + breadth * 8.5 * 275;

  it("adds its net area to the web that the tension spreads into", () =>
    expectHand(checkLike(option, "column-web-tension").resistance, whole));

  it("takes its part of the flange's force, M / (h - t_fb) by area", () =>
    expectHand(
      checkLike(option, "transverse-stiffener").demand,
      ((netArea * 275) / whole) * (50e6 / (400 - 13.5)),
    ));

  it("carries the flange, with no nut to pass", () => {
    expect(checksOf(option, "column-flange-bending")).toEqual([]);
    const rules = checksOf(option, "detailing").map((check) => check.what);
    expect(rules).toContain("corner clip clears the root radius");
    expect(rules).not.toContain("nut beside the stiffener");
  });
});

describe("the detailing of a pair", () => {
  const rule = (what: RegExp, overrides: Parameters<typeof buildStiffeners>[0], node = buildNodeCase()) =>
    checksOf(evaluatedCase(node, [buildStiffeners(overrides)]), "detailing", { level: "top" }).find((check) =>
      what.test(check.what ?? ""),
    );

  it("holds the outstand to 14 eps t_s of the stiffener's own steel", () => {
    const outstand = (widthMm: number) =>
      rule(/outstand/, { widthMm, thicknessMm: 8, steel: S355 })?.utilisation ?? NaN;
    const limit = 14 * Math.sqrt(235 / 355) * 8;
    expect(outstand(limit - 0.1)).toBeLessThan(1);
    expectHand(outstand(limit + 0.1), (limit + 0.1) / limit);
  });

  it("holds the clip to the root radius", () => {
    expect(rule(/corner clip/, { clipMm: 27 })?.utilisation).toBe(1);
    expectHand(rule(/corner clip/, { clipMm: 26 })?.utilisation, 27 / 26);
  });

  it("holds the plates within the column flange: (300 - 8.5) / 2 = 145.75 mm", () => {
    expect(rule(/within the column flange/, { widthMm: 145.75 })?.utilisation).toBe(1);
    expectHand(rule(/within the column flange/, { widthMm: 146 })?.utilisation, 146 / 145.75);
  });

  it("holds the plates between the flanges: 290 - 28 = 262 mm", () => {
    expect(rule(/between the column flanges/, { length: 262 })?.utilisation).toBe(1);
    expectHand(rule(/between the column flanges/, { length: 263 })?.utilisation, 263 / 262);
  });

  it("holds every fillet to a throat of 3 mm (4.5.2(2)), and says nothing of butt welds", () => {
    const butt = { kind: "butt" } as const;
    const fillet = (throatMm: number) => ({ kind: "fillet", throatMm }) as const;
    expect(rule(/throat/, { webWeld: fillet(3) })?.utilisation).toBe(1);
    expectHand(rule(/throat/, { webWeld: fillet(2.5) })?.utilisation, 3 / 2.5);
    expectHand(rule(/throat/, { flangeWeld: fillet(2.5) })?.utilisation, 3 / 2.5);
    expect(rule(/throat/, { flangeWeld: butt, webWeld: butt })).toBeUndefined();
  });

  it("leaves room for the nut of the nearest row", () => {
    // Row 60 - 6.75 = 53.25 mm from the middle of the plate; half a nut is 32.95 / 2 mm.
    const room = (thicknessMm: number) => rule(/nut beside/, { thicknessMm })?.utilisation;
    expectHand(room(12), 32.95 / 2 / (53.25 - 6));
    expectHand(room(80), 32.95 / 2 / (53.25 - 40));
  });

  it("fails the option where a rule is broken", () => {
    const node = under(1, 1);
    expect(evaluatedCase(node, [buildStiffeners()]).passes).toBe(true);
    expect(evaluatedCase(node, [buildStiffeners({ clipMm: 26 })]).passes).toBe(false);
  });
});
