import { describe, expect, it } from "vitest";
import type { NodeCase } from "@/lib/calc";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";
import { checkLike, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/**
 * Top and seat angles L 150x90x12 (r 12), 180 long, S275, on an HE 300 A (r 27) in S275, IPE 360 (360 x 170 x 8/12.7)
 * in S275; bolts M20 8.8 (A_s 245) in both legs. No published example of the whole joint is known to the writer:
 * every part is worked out by hand from its clause, and the joint by equilibrium.
 */
const catalog = buildCatalog();
type Connection = Extract<NonNullable<NodeDocument["left"]>["connection"], { kind: "flange-cleats" }>;

const cleats: Connection = {
  kind: "flange-cleats",
  cleat: { section: "L 150x90x12", steel: "S275", length: 180 },
  bolts: { size: "M20", grade: "8.8", gauge: 110, distance: 50 },
  beamBolts: { size: "M20", grade: "8.8", rows: [55, 115], gauge: 90 },
  gap: 10,
};

function nodeOf(change: Partial<Connection> = {}, moments: readonly number[] = [60], shear = 80): NodeCase {
  const side = {
    beam: { section: "IPE 360", steel: "S275", span: 6000 },
    connection: { ...cleats, ...change },
  };
  const [left = 0, right] = moments;
  const resolved = resolveNodeCase(
    buildNodeDocument({
      column: { section: "HE 300 A", steel: "S275", storeyHeight: 3600 },
      left: side,
      ...(right === undefined ? {} : { right: side }),
      loadCases: [
        {
          name: "one",
          left: { moment: left, axialForce: 0, shear },
          ...(right === undefined ? {} : { right: { moment: right, axialForce: 0, shear } }),
          column: { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 },
        },
      ],
    }),
    catalog,
  );
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

const balanced = (change: Partial<Connection> = {}, shear = 80) =>
  evaluatedCase(nodeOf(change, [60, 60], shear));

const F_t = (0.9 * 800 * 245) / 1.25;
const e_w = 32.95 / 4;
/** Modes 1 and 2 of Table 6.2, method 2, for equal lengths, and mode 3. */
function tStub(length: number, t: number, f_y: number, m: number, n: number, f_u: number): number {
  const M = 0.25 * length * t ** 2 * f_y;
  const one =
    2 * m * n - e_w * (m + n) > 0 ? ((8 * n - 2 * e_w) * M) / (2 * m * n - e_w * (m + n)) : Infinity;
  const two = (2 * M + 2 * n * F_t) / (m + n);
  const d_m = (30 + 32.95) / 2;
  const three = 2 * Math.min(F_t, (0.6 * Math.PI * d_m * t * f_u) / 1.25);
  return Math.min(one, two, three);
}

describe("leg on the column's flange, 6.2.6.6", () => {
  // g = 10 > 0.4 x 12: the yield line stands at half of the leg's thickness. e_min = 90 - 50.
  const m = 50 - 6;
  const n = Math.min(40, 1.25 * m);

  it("is a T-stub of half its length", () => {
    expectHand(
      checkLike(balanced(), "flange-cleat-bending", { row: 1, what: undefined }).resistance,
      tStub(0.5 * 180, 12, 275, m, n, 410),
    );
  });

  it("is bent closer to the heel where the beam stands close", () => {
    const close = 50 - 12 - 0.8 * 12;
    const check = (gap: number): number =>
      checkLike(balanced({ gap }), "flange-cleat-bending", { row: 1, what: undefined }).resistance;
    // 0.4 x 12 = 4.8 mm.
    expectHand(check(4.8), tStub(90, 12, 275, close, Math.min(40, 1.25 * close), 410));
    expectHand(check(4.9), tStub(90, 12, 275, m, n, 410));
  });

  it("is refused where the bolts stand on its root", () => {
    expect(refusalOf(nodeOf({ gap: 2, bolts: { ...cleats.bolts, size: "M12", distance: 21.5 } }))).toMatch(
      /root of the angle/,
    );
  });
});

describe("the parts along the beam", () => {
  it("are pulled across their holes or torn out in a block", () => {
    const check = checkLike(balanced(), "flange-cleat-bending", { what: "leg on the beam in tension" });
    const across = Math.min(180 * 12 * 275, (0.9 * (180 - 2 * 22) * 12 * 410) / 1.25);
    // From the first row to the toe: 150 - 55, less one and a half holes.
    const block = (410 * (90 - 22) * 12) / 1.25 + (275 * 2 * (95 - 1.5 * 22) * 12) / Math.sqrt(3);
    expectHand(check.resistance, Math.min(across, block));
  });

  it("are torn out beside the bolts where these stand far apart", () => {
    const wide = balanced({ beamBolts: { ...cleats.beamBolts, gauge: 120 } });
    // Two strips of (180 - 120)/2 less half a hole each: weaker than the 120 - 22 between the bolts. 3.10.2(2), Figure 3.8.
    expectHand(
      checkLike(wide, "flange-cleat-bending", { what: "leg on the beam in tension" }).resistance,
      (410 * (180 - 120 - 22) * 12) / 1.25 + (275 * 2 * (95 - 1.5 * 22) * 12) / Math.sqrt(3),
    );
  });

  it("tear the beam's flange out of its end", () => {
    // Beside the bolts 170 - 90 - 22 against 90 - 22 between; from the last row to the beam's end 115 - 10.
    expectHand(
      checkLike(balanced(), "bolt-shear", { what: "beam flange torn out between bolts and end" }).resistance,
      (410 * (170 - 90 - 22) * 12.7) / 1.25 + (275 * 2 * (105 - 1.5 * 22) * 12.7) / Math.sqrt(3),
    );
  });

  it("are refused where a bolt has nothing to bear on", () => {
    expect(refusalOf(nodeOf({ beamBolts: { ...cleats.beamBolts, gauge: 155 } }))).toMatch(/close to an edge/);
    expect(refusalOf(nodeOf({ beamBolts: { ...cleats.beamBolts, rows: [55, 70, 85, 100, 115] } }))).toMatch(
      /close to an edge|run into one another/,
    );
  });

  it("carry by two rows of two bolts in shear or bearing, on either flange", () => {
    // alpha_v of 8.8 is 0.6; leg: toe 150 - 115 = 35, edge (180 - 90)/2; flange: beam end 55 - 10 = 45, edge (170 - 90)/2.
    const F_v = (0.6 * 800 * 245) / 1.25;
    const bearing = (e_1: number, e_2: number, t: number): number =>
      (Math.min((2.8 * e_2) / 22 - 1.7, (1.4 * 90) / 22 - 1.7, 2.5) *
        Math.min(e_1 / 66, 60 / 66 - 0.25, 800 / 410, 1) *
        410 *
        20 *
        t) /
      1.25;
    const byHand = 4 * Math.min(F_v, bearing(35, 45, 12), bearing(45, 40, 12.7));
    const option = balanced();
    expectHand(
      checkLike(option, "bolt-shear", { what: "bolts to the beam's tension flange" }).resistance,
      byHand,
    );
    const pushed = checkLike(option, "bolt-shear", { what: "bolts to the beam's compression flange" });
    expectHand(pushed.resistance, byHand);
    expect(pushed.level).toBe("bottom");
  });

  it("give the seat the beam's reaction to bend under", () => {
    const check = checkLike(balanced({}, 300), "flange-cleat-bending", {
      what: "seat under the beam's reaction",
    });
    expectHand(check.demand, 300e3 * (10 + 300e3 / (2 * 8 * 275) - 12 - 0.8 * 12));
    expectHand(check.resistance, 0.25 * 180 * 144 * 275);
    expect(
      checkLike(balanced({}, 50), "flange-cleat-bending", { what: "seat under the beam's reaction" }).demand,
    ).toBe(0);
  });
});

describe("the joint", () => {
  const d_c = 290 - 28 - 54;
  const m_c = (110 - 8.5) / 2 - 0.8 * 27;
  const e_c = (300 - 110) / 2;
  const l_c = Math.min(2 * Math.PI * m_c, 4 * m_c + 1.25 * e_c);
  const z = 360 + 6 + 50;

  it("has the column's flange before the row and its web by hand", () => {
    const option = balanced();
    const n = Math.min(e_c, (180 - 110) / 2, 1.25 * m_c);
    const nc = 4 * m_c + 1.25 * e_c;
    const M_1 = 0.25 * l_c * 196 * 275;
    const M_2 = 0.25 * nc * 196 * 275;
    const one = ((8 * n - 2 * e_w) * M_1) / (2 * m_c * n - e_w * (m_c + n));
    const two = (2 * M_2 + 2 * n * F_t) / (m_c + n);
    const three = 2 * F_t;
    const flange = Math.min(one, two, three);
    expectHand(checkLike(option, "column-flange-bending", { row: 1 }).resistance, flange);
    // Balanced: omega = 1, over the length of the mode that governs.
    const length = flange === one ? l_c : nc;
    expectHand(checkLike(option, "column-web-tension", { row: 1 }).resistance, length * 8.5 * 275);
  });

  it("has its web in compression behind the seat's leg, Eq. (6.12)", () => {
    const b = 2 * 12 + 0.6 * 12 + 5 * (14 + 27);
    const slenderness = 0.932 * Math.sqrt((b * d_c * 275) / (210_000 * 8.5 ** 2));
    const rho = slenderness <= 0.72 ? 1 : (slenderness - 0.2) / slenderness ** 2;
    expectHand(checkLike(balanced(), "column-web-compression").resistance, Math.min(1, rho) * b * 8.5 * 275);
  });

  it("resists the weakest part's force at the lever from the row to the middle of the seat's leg", () => {
    const option = balanced();
    const forces = option.checks
      .filter((check) => check.side === "left" && check.row === 1)
      .map((check) => check.resistance);
    const compression = checkLike(option, "column-web-compression").resistance;
    const seat = checkLike(option, "bolt-shear", {
      what: "bolts to the beam's compression flange",
    }).resistance;
    const beam = checkLike(option, "beam-flange-compression").resistance;
    const weakest = Math.min(...forces, compression, seat, beam);
    expectHand(option.joints[0]?.momentResistanceNmm, z * weakest);
    expectHand(option.joints[0]?.leverArmMm, z);
  });

  it("has the stiffness of k_2, k_3, k_4, k_6, k_10, two k_11 and four k_12", () => {
    const b = 2 * 12 + 0.6 * 12 + 5 * (14 + 27);
    const k_2 = (0.7 * b * 8.5) / d_c;
    const k_3 = (0.7 * l_c * 8.5) / d_c;
    const k_4 = (0.9 * l_c * 14 ** 3) / m_c ** 3;
    const k_6 = (0.9 * 90 * 12 ** 3) / 44 ** 3;
    // Washers 3, head 12.5, nut 18 of an M20 (ISO 7089, 4014, 4032).
    const k_10 = (1.6 * 245) / (12 + 14 + 2 * 3 + (12.5 + 18) / 2);
    const k_11 = (16 * 2 * 400 * 800) / (210_000 * 16);
    const k_12 = (e_b: number, t: number): number =>
      (24 *
        2 *
        Math.min((0.25 * e_b) / 20 + 0.5, (0.25 * 60) / 20 + 0.375, 1.25) *
        Math.min((1.5 * t) / 16, 2.5) *
        20 *
        410) /
      210_000;
    const flexibility =
      1 / k_2 + 1 / k_3 + 1 / k_4 + 1 / k_6 + 1 / k_10 + 2 / k_11 + 2 / k_12(35, 12) + 2 / k_12(45, 12.7);
    expectHand(balanced().joints[0]?.initialStiffnessNmmPerRad, (210_000 * z ** 2) / flexibility);
  });

  it("carries shear by the bolts of the angle that the beam bears on, at 0.4/1.4 where that one is pulled", () => {
    const F_v = (0.6 * 800 * 245) / 1.25;
    // Bearing on the leg: end 90 - 50 = 40, edge (180 - 110)/2 = 35; on 14 mm of flange, edge 95, no end in reach.
    const leg =
      (Math.min((2.8 * 35) / 22 - 1.7, (1.4 * 110) / 22 - 1.7, 2.5) * Math.min(40 / 66, 1) * 410 * 20 * 12) /
      1.25;
    const pushed = checkLike(balanced(), "bolt-shear", { what: undefined, row: undefined });
    expectHand(pushed.resistance, 2 * Math.min(F_v, leg));
    expect(pushed.level).toBe("bottom");
    const uplift = checkLike(balanced({}, -80), "bolt-shear", { what: undefined, row: undefined });
    expectHand(uplift.resistance, 2 * Math.min((0.4 / 1.4) * F_v, leg));
    expectHand(uplift.demand, 80e3);
    expect(uplift.level).toBe("top");
  });

  it("takes shear by an angle only over a gap up to its thickness, 6.2.2", () => {
    const detail = (gap: number) =>
      checkLike(balanced({ gap }), "detailing", { what: "leg as thick as the gap, to take the shear" });
    expectHand(detail(12).utilisation, 1);
    expect(detail(13).utilisation).toBeGreaterThan(1);
  });

  it("swaps its angles' parts when the moment turns", () => {
    const straight = evaluatedCase(nodeOf({}, [60]));
    const reversed = evaluatedCase(nodeOf({}, [-60]));
    expectHand(reversed.joints[0]?.momentResistanceNmm, straight.joints[0]?.momentResistanceNmm ?? NaN);
    expect(reversed.joints[0]?.rows.map(({ row }) => row)).toEqual([2]);
    expect(straight.joints[0]?.rows.map(({ row }) => row)).toEqual([1]);
  });

  it("is never weaker with a thicker angle, nor stronger with a wider gap", () => {
    const of = (change: Partial<Connection>): number =>
      balanced(change).joints[0]?.momentResistanceNmm ?? NaN;
    const thick = ["L 150x90x10", "L 150x90x12", "L 150x90x15"].map((section) =>
      of({ cleat: { ...cleats.cleat, section } }),
    );
    expect(thick).toEqual([...thick].sort((a, b) => a - b));
    const wide = [2, 6, 12, 20].map((gap) => of({ gap }));
    expect(wide).toEqual([...wide].sort((a, b) => b - a));
  });

  it("names a distance of the bolts that is short", () => {
    const near = balanced({ beamBolts: { ...cleats.beamBolts, rows: [30, 115] } });
    const detail = checkLike(near, "detailing", { what: "end distance in the beam's flange, 1.2 d_0" });
    expectHand(detail.demand, 1.2 * 22);
    expectHand(detail.resistance, 30 - 10);
    expect(near.passes).toBe(false);
  });

  it("says what it does not count on", () => {
    const option = balanced({
      stiffened: { thickness: 10 },
      webCleats: {
        section: "L 90x90x8",
        steel: "S275",
        length: 200,
        bolts: { size: "M16", grade: "8.8", rows: [50] },
        beamBolts: { size: "M16", grade: "8.8", rows: [50] },
      },
    });
    const words = option.cautions.join(" ");
    expect(words).toMatch(/web angles are counted on neither/);
    expect(words).toMatch(/taken as plain ones/);
    expect(option.joints[0]?.momentResistanceNmm).toBe(balanced().joints[0]?.momentResistanceNmm);
  });
});
