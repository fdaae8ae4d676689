import { describe, expect, it } from "vitest";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { flatBareResistances, flatInputOf } from "@/scripts/flat-arithmetic";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";
import { evaluatedCase } from "@/tests/support/evaluated-case";

/**
 * The joint built of its parts against the same formulas written flat, one after the other, in scripts/flat-arithmetic.ts:
 * whoever wires a part to the wrong neighbour, or to the wrong dimension, parts the two.
 */
interface Variant {
  readonly column: string;
  readonly beam: readonly [section: string, depthMm: number];
  readonly thickness: number;
  readonly size: string;
  readonly grade: string;
  readonly gauge: number;
  readonly extensionBottom: number;
  readonly steel: string;
}

const VARIANTS: readonly Variant[] = [
  {
    column: "HE 300 A",
    beam: ["IPE 450", 450],
    thickness: 20,
    size: "M24",
    grade: "10.9",
    gauge: 120,
    extensionBottom: 30,
    steel: "S355",
  },
  {
    column: "HE 300 A",
    beam: ["IPE 450", 450],
    thickness: 12,
    size: "M20",
    grade: "8.8",
    gauge: 120,
    extensionBottom: 15,
    steel: "S275",
  },
  {
    column: "HE 240 B",
    beam: ["IPE 360", 360],
    thickness: 15,
    size: "M20",
    grade: "10.9",
    gauge: 110,
    extensionBottom: 20,
    steel: "S235",
  },
  {
    column: "HE 400 B",
    beam: ["IPE 500", 500],
    thickness: 30,
    size: "M16",
    grade: "8.8",
    gauge: 110,
    extensionBottom: 60,
    steel: "S355",
  },
  {
    column: "IPE 400",
    beam: ["IPE 300", 300],
    thickness: 25,
    size: "M16",
    grade: "10.9",
    gauge: 90,
    extensionBottom: 25,
    steel: "S275",
  },
  {
    column: "HE 500 A",
    beam: ["IPE 550", 550],
    thickness: 10,
    size: "M27",
    grade: "8.8",
    gauge: 140,
    extensionBottom: 40,
    steel: "S460",
  },
];

const MOMENTS: readonly (readonly [left: number, right: number])[] = [
  [150, 150],
  [200, 60],
  [90, 180],
];

function nodeOf(variant: Variant, tStubModeOne: "method-1" | "method-2") {
  const [section, depth] = variant.beam;
  const { steel } = variant;
  const side = {
    beam: { section, steel, span: 7000 },
    connection: {
      kind: "end-plate" as const,
      plate: {
        steel,
        thickness: variant.thickness,
        width: 190,
        extensionTop: 90,
        extensionBottom: variant.extensionBottom,
      },
      bolts: { size: variant.size, grade: variant.grade, gauge: variant.gauge, rows: [-45, 65, depth - 65] },
      welds: { topFlange: 7, bottomFlange: 6, web: 4 },
    },
  };
  const actions = (moment: number) => ({ moment, axialForce: 0, shear: 70 });
  const document: NodeDocument = buildNodeDocument({
    partialFactors: { gammaM0: 1.05, gammaM1: 1.1, gammaM2: 1.3 },
    column: { section: variant.column, steel, storeyHeight: 3600 },
    left: side,
    right: side,
    loadCases: MOMENTS.map(([left, right], index) => ({
      name: `Case ${index + 1}`,
      left: actions(left),
      right: actions(right),
      column: { axialForce: 700, momentAbove: 10, momentBelow: -35, shearAbove: 6, shearBelow: -9 },
    })),
    choices: { tStubModeOne },
  });
  const resolved = resolveNodeCase(document, buildCatalog());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

describe.each(VARIANTS)("$column, $beam.0, plate $thickness, $size $grade, $steel", (variant) => {
  it("has the resistance, stiffness and row forces of the flat arithmetic", () => {
    const node = nodeOf(variant, "method-2");
    const option = evaluatedCase(node);
    const flat = flatBareResistances(flatInputOf(node));
    expect(option.joints).toHaveLength(2 * MOMENTS.length);
    option.joints.forEach((joint, index) => {
      const byHand = flat[index];
      expect(joint.momentResistanceNmm / (byHand?.momentResistanceNmm ?? NaN)).toBeCloseTo(1, 9);
      expect(joint.initialStiffnessNmmPerRad / (byHand?.initialStiffnessNmmPerRad ?? NaN)).toBeCloseTo(1, 9);
    });
  });

  it("is used as much as its worst part in the flat arithmetic, or more by a part that it leaves out", () => {
    const node = nodeOf(variant, "method-2");
    const worst = Math.max(...flatBareResistances(flatInputOf(node)).map((joint) => joint.worst));
    expect(evaluatedCase(node).utilisation).toBeGreaterThanOrEqual(worst * (1 - 1e-9));
  });

  it("is not stronger by the plainer method of mode 1", () => {
    const plain = evaluatedCase(nodeOf(variant, "method-1")).joints;
    const finer = evaluatedCase(nodeOf(variant, "method-2")).joints;
    plain.forEach((joint, index) => {
      expect(joint.momentResistanceNmm).toBeLessThanOrEqual(
        (finer[index]?.momentResistanceNmm ?? NaN) * (1 + 1e-12),
      );
    });
  });
});
