import { describe, expect, it } from "vitest";
import {
  buildBars,
  buildJoint,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
  buildWebPlates,
} from "@/tests/factories/build-node-case";
import { checkLike, checksOf, evaluatedCase, expectHand } from "@/tests/support/evaluated-case";
import { K_b, b_c, l_1, m } from "./through-bar-hand-values";

/**
 * Web plates 188 x 10 beside stiffeners and bars, worked out by hand on the plain node: HE 300 A of S275, t_w 8.5,
 * t_f 14, r 27; fillets with a throat of t_s / √2.
 */
const E = 210_000;
const plates = buildWebPlates();
const both = buildStiffeners({ levels: ["top", "bottom"] });
const oneSided = buildNodeCase({ joints: [buildJoint("left")], loadCases: [buildLoadCase(50, null)] });
const area = 2 * 300 * 14 + 262 * 8.5 + (4 - Math.PI) * 27 ** 2;
const A_vc = area - 2 * 300 * 14 + (8.5 + 2 * 27) * 14;

describe("stiffeners on a web plate", () => {
  it("are counted with what is left of their width: tension", () =>
    expectHand(
      checkLike(evaluatedCase(oneSided, [plates, both]), "transverse-stiffener", { level: "top" }).resistance,
      2 * (100 - 10 - 27) * 12 * 275,
    ));

  it("crush with the web as thick as 6.2.6.2(6) has it", () => {
    const net = 2 * (100 - 10 - 27) * 12 * 275;
    const crushing = net + b_c * 1.5 * 8.5 * 275;
    const web = 30 * Math.sqrt(235 / 275) * 8.5;
    const cross = 2 * 90 * 12 + (web + 12) * 1.5 * 8.5;
    const inertia = (12 * (2 * 100 + 8.5) ** 3) / 12 + (web * 8.5 ** 3) / 12;
    // 262 / (sqrt(I / A)) / 93.9 ε is below 0.2: no reduction.
    expect(262 / Math.sqrt(inertia / cross) / (93.9 * Math.sqrt(235 / 275))).toBeLessThan(0.2);
    expectHand(
      checkLike(evaluatedCase(oneSided, [plates, both]), "column-web-compression").resistance,
      Math.min(crushing, cross * 275),
    );
  });

  it("add their frame to the panel that the plate enlarges", () => {
    const flange = 0.25 * 300 * 14 ** 2 * 275;
    const pair = 0.25 * 2 * 90 * 12 ** 2 * 275;
    const frame = Math.min(4 * flange, 2 * flange + 2 * pair) / (400 - 13.5);
    expectHand(
      checkLike(evaluatedCase(oneSided, [plates, both]), "column-web-shear").resistance,
      (0.9 * 275 * (A_vc + 188 * 8.5)) / Math.sqrt(3) + frame,
    );
  });

  it("hold the flange by how far they reach, plate and all", () => {
    // 2 · 92 + 8.5 = 192.5 mm reach past 1.33 · 140 = 186.2; their own 82 mm would not.
    const reaching = evaluatedCase(oneSided, [plates, { ...both, widthMm: 92 }]);
    expect(reaching.cautions.some((text) => text.includes("too narrow"))).toBe(false);
    expect(checksOf(reaching, "column-web-tension", { row: 1 })).toEqual([]);
  });

  it("bring half of what they leave to the web into the plate and its weld, if that is more", () => {
    const option = evaluatedCase(oneSided, [plates, both]);
    const intoWeb = checksOf(option, "stiffener-weld", { what: "stiffener to web" }).map(
      (check) => check.demand,
    );
    const share = (checkLike(option, "column-web-shear").demand * 188 * 8.5) / (A_vc + 188 * 8.5);
    const demand = Math.max(share, ...intoWeb.map((force) => force / 2));
    expectHand(checkLike(option, "web-plate").demand, demand);
    expectHand(checkLike(option, "web-plate-weld").demand, demand);
    const weak = evaluatedCase(oneSided, [{ ...plates, weld: { kind: "fillet", throatMm: 0.5 } }, both]);
    expect(checkLike(weak, "web-plate-weld").utilisation).toBeGreaterThan(1);
  });

  it("are the same whichever is named first", () =>
    expect(evaluatedCase(oneSided, [both, plates]).checks).toEqual(
      evaluatedCase(oneSided, [plates, both]).checks,
    ));

  it("leave room for the nuts beside the plate", () => {
    const room = checksOf(evaluatedCase(oneSided, [plates]), "detailing", {
      what: "nut beside the web plate",
    })[0];
    expectHand(room?.demand, 32.95 / 2);
    expectHand(room?.resistance, (140 - 8.5) / 2 - 10);
  });
});

describe("bars beside a web plate", () => {
  const k_f = (1.37 * 14 ** 3) / (m ** 2 + 1.4 * 14 ** 2);
  const etaOf = (web: number): number => {
    const k_w = (web * (2.2 * (14 + 27) + 0.43 * (290 / 2 - 14))) / ((290 - 28 - 54) / 2);
    const K_c = E / (1 / k_f + 1 / k_w);
    return (2 * K_b) / (K_c + 2 * K_b);
  };
  const option = evaluatedCase(buildNodeCase(), [plates, buildBars()]);

  it("relieve the column as though web and plate were one, the web in tension as thick as 6.2.6.3(7) has it", () =>
    expectHand(
      checkLike(option, "column-web-tension", { row: 1 }).resistance,
      (l_1 * 1.4 * 8.5 * 275) / (1 - 0.55 * etaOf(8.5 + 10)),
    ));

  it("carry what they would through the plain web", () => {
    const force = checkLike(option, "column-flange-bending", { row: 1 }).demand;
    expectHand(checkLike(option, "bar-tension", { row: 1 }).demand, 1.05 * etaOf(8.5) * force);
  });

  it("count two plates as two", () => {
    const two = evaluatedCase(buildNodeCase(), [buildWebPlates({ sides: 2 }), buildBars()]);
    expectHand(
      checkLike(two, "column-web-tension", { row: 1 }).resistance,
      (l_1 * 1.4 * 8.5 * 275) / (1 - 0.55 * etaOf(8.5 + 20)),
    );
  });

  it("press less on the plated web than the plate is stronger: no weaker than the plate alone", () => {
    const bottom = evaluatedCase(buildNodeCase(), [plates, buildBars({ levels: ["bottom"] })]);
    const alone = checkLike(evaluatedCase(buildNodeCase(), [plates]), "column-web-compression").resistance;
    expect(checkLike(bottom, "column-web-compression").resistance).toBeGreaterThan(alone);
    // The bars' own force is that of the bars in the plain column or more.
    const plain = evaluatedCase(buildNodeCase(), [buildBars({ levels: ["bottom"] })]);
    expect(checkLike(bottom, "bar-compression").demand).toBeGreaterThanOrEqual(
      checkLike(plain, "bar-compression").demand,
    );
  });
});
