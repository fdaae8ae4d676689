import { describe, expect, it } from "vitest";
import type { NodeCase, Side } from "@/lib/calc";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";
import { checkLike, checksOf, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

/**
 * Parts of one joint worked out by hand: HE 300 A (290 x 300 x 8.5/14, r 27) in S355, IPE 450 (450 x 190 x 9.4/14.6,
 * r 21), plate 200 x 20, M24 10.9 (A_s 353) at gauge 120 in rows -45, 65 and 385.
 */
const catalog = buildCatalog();

function nodeOf(document: NodeDocument): NodeCase {
  const resolved = resolveNodeCase(document, catalog);
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

type Joint = ReturnType<typeof buildSide>;
type EndPlate = Extract<Joint["connection"], { kind: "end-plate" }>;

const plated = (change: (connection: EndPlate) => EndPlate, beam: Partial<Joint["beam"]> = {}): Joint => {
  const side = buildSide();
  if (side.connection.kind !== "end-plate") throw new Error("an end plate");
  return { beam: { ...side.beam, ...beam }, connection: change(side.connection) };
};
const noForces = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };

const oneSided = (left: Joint, moment = 200, change: Partial<NodeDocument> = {}, shear = 140): NodeDocument =>
  buildNodeDocument({
    column: { section: "HE 300 A", steel: "S355", storeyHeight: 3600 },
    left,
    loadCases: [{ name: "one", left: { moment, axialForce: 0, shear }, column: noForces }],
    ...change,
  });

const M24 = { area: 353, hole: 26, d: 24 };

describe("bolts in shear, 6.2.2(2) and Table 3.4", () => {
  const shearOf = (document: NodeDocument): number =>
    checkLike(evaluatedCase(nodeOf(document)), "bolt-shear").resistance;
  // alpha_v of 10.9 is 0.5.
  const F_v = (0.5 * 1000 * M24.area) / 1.25;

  it("keep 0.4/1.4 of it in tension rows and all of it in the others", () => {
    // Bearing on 20 mm of plate and 14 mm of flange, f_u 470, is far above in every row.
    expectHand(shearOf(oneSided(buildSide())), 2 * (2 * (0.4 / 1.4) * F_v + F_v));
  });

  it("turn with the moment: the row near the compression flange is the one that keeps all", () => {
    // Reversed: rows 385 and 65 + ... only 385 and 65 stand more than a quarter of 450 from the top flange's middle.
    const levers = [-45, 65, 385].map((row) => row - 14.6 / 2);
    const inTension = levers.filter((lever) => lever >= 450 / 4).length;
    expect(inTension).toBe(1);
    expectHand(shearOf(oneSided(buildSide(), -200)), 2 * ((0.4 / 1.4) * F_v + 2 * F_v));
  });

  it("give way to bearing where the plate is thin", () => {
    const thin = plated((connection) => ({ ...connection, plate: { ...connection.plate, thickness: 6 } }));
    // k_1 = min(2.8 x 40/26 - 1.7, 1.4 x 120/26 - 1.7, 2.5); alpha_b of row 3: end 450 + 30 - 385 = 95, pitch 320.
    const k_1 = Math.min((2.8 * 40) / 26 - 1.7, (1.4 * 120) / 26 - 1.7, 2.5);
    const bearing = (end: number, pitch: number): number =>
      (k_1 * Math.min(end / 78, pitch / 78 - 0.25, 1000 / 470, 1) * 470 * 24 * 6) / 1.25;
    const tension = (end: number, pitch: number): number => Math.min((0.4 / 1.4) * F_v, bearing(end, pitch));
    const byHand = 2 * (tension(45, 110) + tension(155, 110) + Math.min(F_v, bearing(95, 320)));
    expectHand(shearOf(oneSided(thin)), byHand);
  });

  it("are short of column flange where the column ends", () => {
    const near = oneSided(buildSide(), -200, {
      column: { section: "HE 300 A", steel: "S355", endDistanceAbove: 75, storeyHeight: 3600 },
    });
    // Row 1 is 75 - 45 = 30 mm from the column's end and carries all its shear: alpha_b = 30/78.
    const k_1 = 2.5;
    const atEnd = (k_1 * (30 / 78) * 470 * 24 * 14) / 1.25;
    expect(atEnd).toBeLessThan(F_v);
    expectHand(shearOf(near), 2 * ((0.4 / 1.4) * F_v + F_v + atEnd));
  });

  it("are used by the shear whichever way it acts", () => {
    const used = (shear: number): number =>
      checkLike(evaluatedCase(nodeOf(oneSided(buildSide(), 200, {}, shear))), "bolt-shear").demand;
    expect(used(90)).toBe(90_000);
    expect(used(-90)).toBe(90_000);
  });
});

describe("bolts in tension, Table 3.4", () => {
  const pulled = (thickness: number): number =>
    checkLike(
      evaluatedCase(
        nodeOf(
          oneSided(plated((connection) => ({ ...connection, plate: { ...connection.plate, thickness } }))),
        ),
      ),
      "bolt-tension",
      { row: 1 },
    ).resistance;
  const F_t = (0.9 * 1000 * M24.area) / 1.25;

  it("are pulled apart behind thick parts and punch through thin ones", () => {
    // d_m of M24: (36 + 39.55) / 2; B_p of 14 mm of flange is above F_t, of a 6 mm plate below.
    const B_p = (t: number): number => (0.6 * Math.PI * ((36 + 39.55) / 2) * t * 470) / 1.25;
    expect(B_p(14)).toBeGreaterThan(F_t);
    expectHand(pulled(20), 2 * F_t);
    expectHand(pulled(6), 2 * B_p(6));
  });
});

describe("welds of the beam", () => {
  it("of the tension flange resist square to their length, by the directional method", () => {
    const weld = checkLike(evaluatedCase(nodeOf(oneSided(buildSide()))), "connection-weld", {
      what: "tension flange weld",
    });
    // f_u / (sqrt2 beta_w gamma_M2) with S355: 470, 0.9; throat 8; 190 outside and 190 - 9.4 - 2 x 21 inside.
    expectHand(weld.resistance, (470 / (Math.SQRT2 * 0.9 * 1.25)) * 8 * (190 + 190 - 9.4 - 42));
  });

  it("of the web resist along their length over half the straight web, by the simplified method", () => {
    const weld = checkLike(evaluatedCase(nodeOf(oneSided(buildSide()))), "connection-weld", {
      what: "web weld in shear",
    });
    const straight = 450 - 2 * 14.6 - 2 * 21;
    expectHand(weld.resistance, (470 / (Math.sqrt(3) * 0.9 * 1.25)) * 5 * 2 * (straight / 2));
    expect(weld.demand).toBe(140_000);
  });

  it("take the weld of the flange that is in tension", () => {
    const reversed = checkLike(evaluatedCase(nodeOf(oneSided(buildSide(), -200))), "connection-weld", {
      what: "tension flange weld",
    });
    expectHand(reversed.resistance, (470 / (Math.SQRT2 * 0.9 * 1.25)) * 6 * (190 + 190 - 9.4 - 42));
  });

  it("are as strong as the plate where they are butt welds", () => {
    const butt = plated((connection) => ({
      ...connection,
      welds: { topFlange: "butt", bottomFlange: 6, web: "butt" },
    }));
    expect(checksOf(evaluatedCase(nodeOf(oneSided(butt))), "connection-weld")).toEqual([]);
  });

  it("are asked for no more than the flange can bring", () => {
    const strong = plated(
      (connection) => ({
        ...connection,
        plate: { ...connection.plate, thickness: 40 },
        bolts: { ...connection.bolts, size: "M30" },
      }),
      { section: "IPE 300" },
    );
    const rows = {
      ...strong,
      connection: {
        ...strong.connection,
        bolts: { ...(strong.connection as EndPlate).bolts, rows: [-45, 65, 235] },
      },
    } as Joint;
    const weld = checkLike(evaluatedCase(nodeOf(oneSided(rows, 900))), "connection-weld", {
      what: "tension flange weld",
    });
    // IPE 300: 150 x 10.7, S355.
    expectHand(weld.demand, 150 * 10.7 * 355);
  });
});

describe("beam", () => {
  it("in compression gives M_c,Rd over the distance of its flanges", () => {
    const check = checkLike(evaluatedCase(nodeOf(oneSided(buildSide()))), "beam-flange-compression");
    // W_pl of IPE 450 by the section's own arithmetic, 1702 cm3 to four figures in handbooks.
    const W = (check.resistance * (450 - 14.6)) / 355;
    expect(Math.abs(W / 1e3 - 1702)).toBeLessThanOrEqual(0.5);
    expect(check.level).toBe("bottom");
  });

  it("deeper than 600 mm gives at most b t_f f_y / 0.8", () => {
    const deep = plated(
      (connection) => ({ ...connection, bolts: { ...connection.bolts, rows: [-45, 85, 520] } }),
      { section: { h: 620, b: 200, tw: 12, tf: 15, r: 20 } },
    );
    const check = checkLike(evaluatedCase(nodeOf(oneSided(deep))), "beam-flange-compression");
    const plastic = (W: number): number => (W * 355) / (620 - 15);
    expect(check.resistance).toBeLessThanOrEqual((200 * 15 * 355) / 0.8 + 1e-6);
    expect(check.resistance).toBeLessThan(plastic(3e6));
  });

  it("of class 4 is outside scope with the reason", () => {
    const thin = plated((connection) => connection, { section: { h: 450, b: 300, tw: 9, tf: 6, r: 10 } });
    expect(refusalOf(nodeOf(oneSided(thin)))).toMatch(/left beam is a class 4 section/);
  });

  it("web in tension counts rows inside the flanges only", () => {
    const checks = checksOf(evaluatedCase(nodeOf(oneSided(buildSide()))), "beam-web-tension");
    expect(checks.map(({ row, rows }) => row ?? rows)).toEqual([2]);
  });
});

describe("rows of the plate", () => {
  it("stand where none can take tension: outside scope", () => {
    const low = plated((connection) => ({ ...connection, bolts: { ...connection.bolts, rows: [385] } }));
    expect(refusalOf(nodeOf(oneSided(low)))).toMatch(/no bolt row stands far enough/);
  });

  it("beyond the tension flange are one at most", () => {
    const two = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, extensionTop: 180 },
      bolts: { ...connection.bolts, rows: [-130, -45, 65, 385] },
    }));
    expect(refusalOf(nodeOf(oneSided(two)))).toMatch(/more than one bolt row stands outside/);
  });

  it("take tension from a quarter of the beam's depth on", () => {
    // From the middle of the compression flange: 450 - 7.3 - y >= 112.5, so y up to 330.2.
    const rowsUpTo = (y: number): Joint =>
      plated((connection) => ({ ...connection, bolts: { ...connection.bolts, rows: [-45, 65, y] } }));
    const count = (y: number): number =>
      evaluatedCase(nodeOf(oneSided(rowsUpTo(y)))).joints[0]?.rows.length ?? 0;
    expect(count(330.2)).toBe(3);
    expect(count(330.3)).toBe(2);
  });
});

describe("detailing of the bolts, Table 3.3", () => {
  const detail = (what: string, side: Joint) =>
    checkLike(evaluatedCase(nodeOf(oneSided(side))), "detailing", { what });

  it.each([
    ["edge distance of the bolts, 1.2 d_0", 1.2 * 26, (200 - 120) / 2],
    ["end distance in the plate, 1.2 d_0", 1.2 * 26, 90 - 45],
    ["gauge, 2.4 d_0", 2.4 * 26, 120],
    ["distance between bolt rows, 2.2 d_0", 2.2 * 26, 110],
  ])("%s", (what, needed, actual) => {
    const check = detail(what, buildSide());
    expectHand(check.demand, needed);
    expectHand(check.resistance, actual);
    expectHand(check.utilisation, needed / actual);
  });

  it("keeps washers off the column's root and off the beam's welds", () => {
    const option = evaluatedCase(nodeOf(oneSided(buildSide())));
    // ISO 7089: 44 mm for M24. Beside the root (120 - 8.5)/2 - 27; row 1 above the flange 45 - 8 sqrt2.
    const root = checkLike(option, "detailing", { what: "washer flat on the column's flange" });
    expectHand(root.demand, 22);
    expectHand(root.resistance, (120 - 8.5) / 2 - 27);
    const welds = checkLike(option, "detailing", { what: "washer clear of the beam and its welds" });
    const byHand = Math.min(
      45 - 8 * Math.SQRT2,
      65 - 14.6 - 8 * Math.SQRT2,
      450 - 14.6 - 385 - 6 * Math.SQRT2,
      (120 - 9.4) / 2 - 5 * Math.SQRT2,
    );
    expectHand(welds.resistance, byHand);
  });

  it("counts to the column's end in its flange, where it ends", () => {
    const what = "end distance in the column's flange, 1.2 d_0";
    const ending = evaluatedCase(
      nodeOf(
        oneSided(buildSide(), 200, {
          column: { section: "HE 300 A", steel: "S355", endDistanceAbove: 75, storeyHeight: 3600 },
        }),
      ),
    );
    const end = checkLike(ending, "detailing", { what });
    expectHand(end.demand, 1.2 * 26);
    expectHand(end.resistance, 75 - 45);
    expect(ending.passes).toBe(false);
    expect(checksOf(evaluatedCase(nodeOf(oneSided(buildSide()))), "detailing", { what })).toEqual([]);
  });

  it("fails the option where a distance is short", () => {
    const close = plated((connection) => ({
      ...connection,
      bolts: { ...connection.bolts, rows: [-45, 65, 115, 385] },
    }));
    const option = evaluatedCase(nodeOf(oneSided(close, 20)));
    expect(
      checkLike(option, "detailing", { what: "distance between bolt rows, 2.2 d_0" }).utilisation,
    ).toBeCloseTo((2.2 * 26) / 50, 12);
    expect(option.passes).toBe(false);
    expect(option.governing.component).toBe("detailing");
  });
});

describe("welded joint", () => {
  const welds = { topFlange: 8, bottomFlange: 6, web: 5 };
  const welded = (change: Partial<Joint["beam"]> = {}): Joint => ({
    beam: { section: "IPE 450", steel: "S355", span: 7500, ...change },
    connection: { kind: "welded", welds },
  });
  const two = (left: number, right: number, steel = "S355"): NodeDocument =>
    buildNodeDocument({
      column: { section: "HE 300 A", steel, storeyHeight: 3600 },
      left: welded(),
      right: welded(),
      loadCases: [
        {
          name: "one",
          left: { moment: left, axialForce: 0, shear: 100 },
          right: { moment: right, axialForce: 0, shear: 100 },
          column: noForces,
        },
      ],
    });

  // Eq. (6.10) and (6.16): t_fb + 2 sqrt2 a + 5 (t_fc + r); beta = 0 where the moments balance, so omega = 1.
  const breadth = (throat: number): number => 14.6 + 2 * Math.SQRT2 * throat + 5 * (14 + 27);
  const d_c = 290 - 28 - 54;
  const rho = (b: number): number => {
    const slenderness = 0.932 * Math.sqrt((b * d_c * 355) / (210_000 * 8.5 ** 2));
    return slenderness <= 0.72 ? 1 : (slenderness - 0.2) / slenderness ** 2;
  };
  const F_t = breadth(8) * 8.5 * 355;
  const F_c = Math.min(1, rho(breadth(6))) * breadth(6) * 8.5 * 355;
  // Eq. (6.20) and (4.6a): t_w + 2 s + 7 k t_f, k = (t_f/t_p)(f_yf/f_yp) = 14/14.6.
  const b_fc = Math.min(8.5 + 2 * 27 + 7 * (14 / 14.6) * 14, 190);
  const F_fc = b_fc * 14.6 * 355;
  const z = 450 - 14.6;

  it("has web in tension, web in compression and flange in bending by hand", () => {
    const option = evaluatedCase(nodeOf(two(150, 150)));
    expectHand(checkLike(option, "column-web-tension").resistance, F_t);
    expectHand(checkLike(option, "column-web-compression").resistance, F_c);
    expectHand(checkLike(option, "column-flange-bending").resistance, F_fc);
    expectHand(option.joints[0]?.momentResistanceNmm, z * Math.min(F_t, F_c, F_fc));
    expectHand(checkLike(option, "column-web-tension").demand, 150e6 / z);
  });

  it("has the stiffness of k_2 and k_3 where the moments balance, and of k_1 besides where they do not", () => {
    const k_2 = (0.7 * breadth(6) * 8.5) / d_c;
    const k_3 = (0.7 * breadth(8) * 8.5) / d_c;
    expectHand(
      evaluatedCase(nodeOf(two(150, 150))).joints[0]?.initialStiffnessNmmPerRad,
      (210_000 * z ** 2) / (1 / k_2 + 1 / k_3),
    );
    const A_vc = (side: Side): number =>
      (checkLike(evaluatedCase(nodeOf(two(150, 75))), "column-web-shear", { side }).resistance *
        Math.sqrt(3)) /
      (0.9 * 355);
    const k_1 = (0.38 * A_vc("left")) / (0.5 * z);
    expectHand(
      evaluatedCase(nodeOf(two(150, 75))).joints[0]?.initialStiffnessNmmPerRad,
      (210_000 * z ** 2) / (1 / k_1 + 1 / k_2 + 1 / k_3),
    );
  });

  it("is weaker by omega of beta = 2 where the moments turn the same way", () => {
    const option = evaluatedCase(nodeOf(two(100, -100)));
    const A_vc = (checkLike(option, "column-web-shear").resistance * Math.sqrt(3)) / (0.9 * 355);
    const omega = 1 / Math.sqrt(1 + 5.2 * ((breadth(8) * 8.5) / A_vc) ** 2);
    expectHand(checkLike(option, "column-web-tension").resistance, omega * F_t);
  });

  it("asks for a stiffener where the flange works over too little of its breadth, 4.10(3)", () => {
    const detail = checkLike(evaluatedCase(nodeOf(two(150, 150))), "detailing", {
      what: "breadth of column flange that works without a stiffener",
    });
    expectHand(detail.demand, (355 / 470) * 190);
    expectHand(detail.resistance, b_fc);
  });
});
