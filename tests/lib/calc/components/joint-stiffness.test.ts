import { describe, expect, it } from "vitest";
import {
  classBoundsOf,
  initialStiffness,
  secantStiffness,
  stiffnessClassOf,
  strengthClassOf,
} from "@/lib/calc/components/joint-stiffness";
import { columnPanelOf } from "@/lib/calc/components/column-panel";
import { designOf } from "@/lib/calc/measures/apply-measures";
import { sectionProperties, type NodeCase } from "@/lib/calc";
import type { Traced } from "@/lib/calc/trace/traced";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";
import { expectHand } from "@/tests/support/evaluated-case";

const of = (value: number): Traced => ({ value, step: undefined });
const E = 210_000;

function boundsOf(change: Partial<NodeDocument>) {
  const resolved = resolveNodeCase(buildNodeDocument(change), buildCatalog());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  const node: NodeCase = resolved.node;
  const [joint] = node.joints;
  if (!joint) throw new Error("a joint");
  const panel = columnPanelOf(node, designOf(node, []), false);
  return { bounds: classBoundsOf(node, panel, joint, false), node, joint };
}

describe("initial stiffness, 6.3.1(4)", () => {
  it("is E z^2 over the sum of flexibilities, leaving out what does not deform", () => {
    const stiffness = initialStiffness(of(400), [of(4), null, of(6), of(Infinity)], false);
    expectHand(stiffness.value, (E * 400 ** 2) / (1 / 4 + 1 / 6));
  });

  it("is very large where nothing deforms", () => {
    expect(initialStiffness(of(400), [of(Infinity), null], false).value).toBe(1e15);
  });
});

describe("secant stiffness, 6.3.1(6)", () => {
  const secant = (moment: number): number | undefined =>
    secantStiffness(moment, 300, of(9e10), "end-plate", false)?.value;

  it("is the initial one up to two thirds of the resistance", () => {
    expect(secant(0)).toBe(9e10);
    expect(secant(200)).toBe(9e10);
  });

  it("falls with mu = (1.5 M / M_j,Rd)^2.7 beyond, and is not given above the resistance", () => {
    expectHand(secant(250), 9e10 / ((1.5 * 250) / 300) ** 2.7);
    expectHand(secant(300), 9e10 / 1.5 ** 2.7);
    expect(secant(301)).toBeUndefined();
  });

  it("falls faster with flange cleats, by 3.1", () => {
    expectHand(secantStiffness(250, 300, of(9e10), "flange-cleats", false)?.value, 9e10 / 1.25 ** 3.1);
  });
});

describe("classes, 5.2.2.5 and 5.2.3", () => {
  it("are bounded by 8 or 25 and by half of E I / L", () => {
    const { bounds, joint } = boundsOf({ frame: { bracing: "braced" } });
    const rate = (E * sectionProperties(joint.beam.section).inertiaMm4) / 7500;
    expectHand(bounds.rigid?.value, 8 * rate);
    expectHand(bounds.pinned.value, 0.5 * rate);
    expectHand(boundsOf({ frame: { bracing: "unbraced" } }).bounds.rigid?.value, 25 * rate);
    expect(stiffnessClassOf(8 * rate * 1.000001, bounds)).toBe("rigid");
    expect(stiffnessClassOf(8 * rate * 0.999999, bounds)).toBe("semi-rigid");
    expect(stiffnessClassOf(0.5 * rate * 0.999999, bounds)).toBe("pinned");
  });

  it("know no rigid joint where an unbraced frame's beam is below a tenth of the column", () => {
    // K_b/K_c = (I_b/L_b)/(I_c/L_c): HE 400 M over 3 m against IPE 450 over 30 m.
    const long = boundsOf({
      column: { section: "HE 400 M", steel: "S355", storeyHeight: 3000 },
      left: { ...buildNodeDocument().left!, beam: { section: "IPE 450", steel: "S355", span: 30_000 } },
    });
    const I = (section: Parameters<typeof sectionProperties>[0]): number =>
      sectionProperties(section).inertiaMm4;
    expect(I(long.joint.beam.section) / 30_000 / (I(long.node.column.section) / 3000)).toBeLessThan(0.1);
    expect(long.bounds.rigid).toBeNull();
    expect(stiffnessClassOf(1e20, long.bounds)).toBe("semi-rigid");
  });

  it("call full strength the lesser of beam and columns: two within the height, one at the top", () => {
    const plastic = (section: Parameters<typeof sectionProperties>[0], yieldMpa: number): number =>
      sectionProperties(section).plasticModulusMm3 * yieldMpa;
    const small = { section: "HE 200 A", steel: "S355", storeyHeight: 3600 };
    const within = boundsOf({ column: small });
    expectHand(within.bounds.fullStrengthNmm, 2 * plastic(within.node.column.section, 355));
    const top = boundsOf({ column: { ...small, endDistanceAbove: 100 } });
    expectHand(top.bounds.fullStrengthNmm, plastic(top.node.column.section, 355));
    const heavy = boundsOf({ column: { ...small, section: "HE 400 B" } });
    expectHand(heavy.bounds.fullStrengthNmm, plastic(heavy.joint.beam.section, 355));
    const { fullStrengthNmm } = heavy.bounds;
    expect(strengthClassOf(fullStrengthNmm, heavy.bounds)).toBe("full-strength");
    expect(strengthClassOf(0.99 * fullStrengthNmm, heavy.bounds)).toBe("partial-strength");
    expect(strengthClassOf(0.25 * fullStrengthNmm, heavy.bounds)).toBe("pinned");
  });
});
