import { describe, expect, it } from "vitest";
import { momentRotationCurve, type NodeCase } from "@/lib/calc";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";
import { checkLike, checksOf, evaluatedCase, expectHand, refusalOf } from "@/tests/support/evaluated-case";

const catalog = buildCatalog();
type Joint = ReturnType<typeof buildSide>;
type EndPlate = Extract<Joint["connection"], { kind: "end-plate" }>;
const still = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };

const plated = (change: (connection: EndPlate) => EndPlate, section = "IPE 450", steel = "S355"): Joint => {
  const side = buildSide();
  if (side.connection.kind !== "end-plate") throw new Error("an end plate");
  return { beam: { section, steel, span: 7500 }, connection: change(side.connection) };
};
const welded = (): Joint => ({
  beam: { section: "IPE 450", steel: "S355", span: 7500 },
  connection: { kind: "welded", welds: { topFlange: 8, bottomFlange: 6, web: 5 } },
});

function nodeOf(
  left: Joint,
  actions: { moment?: number; axialForce?: number; right?: number } = {},
  change: Partial<NodeDocument> = {},
): NodeCase {
  const { moment = 100, axialForce = 0, right } = actions;
  const resolved = resolveNodeCase(
    buildNodeDocument({
      column: { section: "HE 300 A", steel: "S355", storeyHeight: 3600 },
      left,
      ...(right === undefined ? {} : { right: left }),
      loadCases: [
        {
          name: "one",
          left: { moment, axialForce, shear: 50 },
          ...(right === undefined ? {} : { right: { moment: right, axialForce: 0, shear: 50 } }),
          column: still,
        },
      ],
      ...change,
    }),
    catalog,
  );
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

const AXIAL = { what: "with the beam's axial force" } as const;
/** IPE 450 by its own dimensions, r 21: N_pl,Rd in S355, N. */
const N_pl = (2 * 190 * 14.6 + (450 - 29.2) * 9.4 + (4 - Math.PI) * 21 ** 2) * 355;

describe("axial force in a beam, 6.2.7.1", () => {
  it("is passed over up to 5 % of the beam's plastic resistance", () => {
    const below = evaluatedCase(nodeOf(buildSide(), { axialForce: (0.0499 * N_pl) / 1e3 }));
    const beyond = evaluatedCase(nodeOf(buildSide(), { axialForce: (0.0501 * N_pl) / 1e3 }));
    expect(checksOf(below, "joint-moment", AXIAL)).toEqual([]);
    expect(checksOf(beyond, "joint-moment", AXIAL)).toHaveLength(1);
    expect(below.cautions.join(" ")).not.toMatch(/exceeds 5 %/);
    expect(beyond.cautions.join(" ")).toMatch(/exceeds 5 % of its plastic resistance in one/);
  });

  it("in compression adds its share of twice the weaker flange's zone", () => {
    // Welded: the zones differ by their weld alone, the weaker one behind the lesser throat.
    const pushed = nodeOf(welded(), { moment: 100, axialForce: 400 });
    const option = evaluatedCase(pushed);
    const top = evaluatedCase(nodeOf(welded(), { moment: -100 }));
    const zone = (of: typeof option): number =>
      Math.min(
        checkLike(of, "column-web-compression").resistance,
        checkLike(of, "beam-flange-compression").resistance,
      );
    const N_j = 2 * Math.min(zone(option), zone(top));
    const byHand = 100e6 / (option.joints[0]?.momentResistanceNmm ?? NaN) + 400e3 / N_j;
    expectHand(checkLike(option, "joint-moment", AXIAL).demand, byHand);
    expectHand(checkLike(option, "joint-moment", AXIAL).utilisation, byHand);
  });

  it("in tension adds its share of a welded beam's flanges, and is outside scope at bolts", () => {
    const pulled = evaluatedCase(nodeOf(welded(), { moment: 60, axialForce: -400 }));
    const turned = evaluatedCase(nodeOf(welded(), { moment: -60 }));
    const zone = (of: typeof pulled): number =>
      Math.min(
        checkLike(of, "column-web-tension").resistance,
        checkLike(of, "column-flange-bending").resistance,
      );
    const byHand =
      60e6 / (pulled.joints[0]?.momentResistanceNmm ?? NaN) +
      400e3 / (2 * Math.min(zone(pulled), zone(turned)));
    expectHand(checkLike(pulled, "joint-moment", AXIAL).demand, byHand);
    expect(refusalOf(nodeOf(buildSide(), { moment: 60, axialForce: -400 }))).toMatch(/pulls at its bolts/);
  });

  it("fails an option that the moment alone would not", () => {
    const option = evaluatedCase(nodeOf(welded(), { moment: 20, axialForce: 1500 }));
    expect(checkLike(option, "joint-moment", AXIAL).utilisation).toBeGreaterThan(1);
    expect(option.passes).toBe(false);
  });
});

describe("rotation capacity, 6.4", () => {
  const capacity = (node: NodeCase) => evaluatedCase(node).joints[0]?.rotationCapacity;
  const light = { column: { section: "HE 200 A", steel: "S235", storeyHeight: 3600 } };

  it("is enough where the panel's shear governs", () => {
    // Moments turning the same way, beta = 2, on a light panel.
    const node = nodeOf(
      plated((connection) => connection, "IPE 450", "S235"),
      { moment: 50, right: -50 },
      light,
    );
    const option = evaluatedCase(node);
    const total = (option.joints[0]?.rows ?? []).reduce((sum, { forceN }) => sum + forceN, 0);
    expectHand(total, checkLike(option, "column-web-shear").resistance / 2);
    expect(option.joints[0]?.rotationCapacity).toBe("enough");
  });

  it("is enough where a thin end plate bends before its bolts break", () => {
    // 0.36 x 24 x sqrt(1000/355) = 14.5 mm.
    const thin = (thickness: number): Joint =>
      plated((connection) => ({ ...connection, plate: { ...connection.plate, thickness } }));
    const heavy = { column: { section: "HE 400 M", steel: "S355", storeyHeight: 3600 } };
    expect(capacity(nodeOf(thin(12), { right: 100 }, heavy))).toBe("enough");
    expect(capacity(nodeOf(thin(15), { right: 100 }, heavy))).toBe("not-shown");
  });

  it("is not shown for stronger steels nor beyond 5 % of axial force", () => {
    const heavy = { column: { section: "HE 400 M", steel: "S460", storeyHeight: 3600 } };
    const thin = plated((connection) => ({ ...connection, plate: { ...connection.plate, thickness: 12 } }));
    expect(capacity(nodeOf(thin, { right: 100 }, heavy))).toBe("not-shown");
    const strongPlate = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, thickness: 12, steel: "S460M" },
    }));
    expect(
      capacity(
        nodeOf(
          strongPlate,
          { right: 100 },
          { column: { section: "HE 400 M", steel: "S355", storeyHeight: 3600 } },
        ),
      ),
    ).toBe("not-shown");
    const usual = { column: { section: "HE 400 M", steel: "S355", storeyHeight: 3600 } };
    expect(capacity(nodeOf(thin, { right: 100, axialForce: 300 }, usual))).toBe("not-shown");
  });

  it("of a welded joint is 0.015 rad, or 0.025 h_c/h_b with the compression zone stiffened alone", () => {
    const node = nodeOf(welded(), { moment: 50, right: 50 });
    expect(capacity(node)).toEqual({ atLeastRad: 0.015 });
    const pair = (levels: readonly ("top" | "bottom")[]) =>
      ({
        kind: "transverse-stiffeners",
        levels,
        thicknessMm: 15,
        widthMm: 120,
        length: "full",
        clipMm: 30,
        steel: node.column.steel,
        flangeWeld: { kind: "fillet", throatMm: 8 },
        webWeld: { kind: "fillet", throatMm: 6 },
      }) as const;
    expect(evaluatedCase(node, [pair(["bottom"])]).joints[0]?.rotationCapacity).toEqual({
      atLeastRad: (0.025 * 290) / 450,
    });
    expect(evaluatedCase(node, [pair(["top", "bottom"])]).joints[0]?.rotationCapacity).toBe("not-shown");
  });
});

describe("moment and rotation, 6.3.1(6)", () => {
  const curve = momentRotationCurve(300, 30_000, 2.7);

  it("is straight to two thirds of the resistance and softens to mu = 1.5^psi at the resistance", () => {
    expect(curve[0]).toEqual({ momentNmm: 0, rotationRad: 0 });
    expectHand(curve[1]?.rotationRad, 200 / 30_000);
    const last = curve[curve.length - 1];
    expect(last?.momentNmm).toBe(300);
    expectHand(last?.rotationRad, (300 * 1.5 ** 2.7) / 30_000);
  });

  it("never turns back", () => {
    curve.slice(1).forEach((point, index) => {
      expect(point.momentNmm).toBeGreaterThan(curve[index]?.momentNmm ?? NaN);
      expect(point.rotationRad).toBeGreaterThan(curve[index]?.rotationRad ?? NaN);
    });
  });
});

describe("choices of the node", () => {
  it("takes the tension flange's weld by either method", () => {
    const weldOf = (flangeWelds: "directional" | "simplified"): number =>
      checkLike(evaluatedCase(nodeOf(buildSide(), {}, { choices: { flangeWelds } })), "connection-weld", {
        what: "tension flange weld",
      }).resistance;
    expectHand(weldOf("directional"), (470 / (Math.SQRT2 * 0.9 * 1.25)) * 8 * (190 + 190 - 9.4 - 42));
    expectHand(weldOf("simplified"), (470 / (Math.sqrt(3) * 0.9 * 1.25)) * 8 * (190 + 190 - 9.4 - 42));
  });

  it("lifts the straight line of rows where plate or flange is thin against the bolts, as the United Kingdom has it", () => {
    // HE 300 A: t_fc 14 mm; M20 8.8: 20/1.9 sqrt(800/355) = 15.8 mm. HE 400 M: 40 mm, as thick as the plate.
    const joint = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, thickness: 40 },
      bolts: { ...connection.bolts, size: "M20", grade: "8.8", gauge: 100, rows: [-45, 65, 165, 385] },
    }));
    const moment = (column: string, triangularLimit: "always" | "united-kingdom"): number =>
      evaluatedCase(
        nodeOf(
          joint,
          { right: 100 },
          { column: { section: column, steel: "S355", storeyHeight: 3600 }, choices: { triangularLimit } },
        ),
      ).joints[0]?.momentResistanceNmm ?? NaN;
    expect(moment("HE 300 A", "united-kingdom")).toBeGreaterThan(moment("HE 300 A", "always") * 1.005);
    expect(moment("HE 400 M", "united-kingdom")).toBe(moment("HE 400 M", "always"));
  });
});

describe("what is not counted on", () => {
  const four = (outerGauge: number): Joint =>
    plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, width: 300 },
      bolts: { ...connection.bolts, gauge: 110, perRow: 4, outerGauge },
    }));
  const two = plated((connection) => ({
    ...connection,
    plate: { ...connection.plate, width: 300 },
    bolts: { ...connection.bolts, gauge: 110 },
  }));

  it("four bolts a row resist as two, and say so; the outer ones keep their distances", () => {
    const option = evaluatedCase(nodeOf(four(240)));
    expect(option.joints[0]?.momentResistanceNmm).toBe(
      evaluatedCase(nodeOf(two)).joints[0]?.momentResistanceNmm,
    );
    expect(option.cautions.join(" ")).toMatch(/Rows of four bolts are taken as rows of two/);
    expectHand(
      checkLike(option, "detailing", { what: "edge distance of the bolts, 1.2 d_0" }).resistance,
      (300 - 240) / 2,
    );
    expectHand(
      checkLike(option, "detailing", { what: "inner to outer bolts, 2.4 d_0" }).resistance,
      (240 - 110) / 2,
    );
  });

  it("ribs on the plate's extensions leave the resistance as it is, and say so", () => {
    const ribbed = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, stiffener: { top: { thickness: 10, length: 120 } } },
    }));
    const option = evaluatedCase(nodeOf(ribbed));
    expect(option.joints[0]?.momentResistanceNmm).toBe(
      evaluatedCase(nodeOf(buildSide())).joints[0]?.momentResistanceNmm,
    );
    expect(option.cautions.join(" ")).toMatch(/ribs on the end plate are not counted on/);
  });
});

describe("length of the bolts, Table 6.2", () => {
  it("is told where it lets prying be doubted: thick parts, short levers", () => {
    const thick = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, thickness: 40 },
    }));
    // Plate row 1: m_x = 45 - 0.8 x 8 sqrt2, t 40: L_b* is a few millimetres; L_b of an M24 through 54 mm some 80.
    expect(evaluatedCase(nodeOf(thick)).cautions.join(" ")).toMatch(
      /rows? .* on the left are longer than L_b\*/,
    );
    const slim = { column: { section: "HE 160 A", steel: "S355", storeyHeight: 3600 } };
    const gauge = plated((connection) => ({
      ...connection,
      plate: { ...connection.plate, thickness: 8 },
      bolts: { ...connection.bolts, size: "M16", gauge: 110 },
    }));
    expect(evaluatedCase(nodeOf(gauge, {}, slim)).cautions.join(" ")).not.toMatch(/L_b\*/);
  });
});
