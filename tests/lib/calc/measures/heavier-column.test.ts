import { describe, expect, it } from "vitest";
import type { ISection, MeasureCase, NodeCase } from "@/lib/calc";
import {
  S355,
  buildBars,
  buildLoadCase,
  buildNodeCase,
  buildStiffeners,
} from "@/tests/factories/build-node-case";
import { evaluatedCase } from "@/tests/support/evaluated-case";

/** Guards that a heavier column as a measure is the bare node on that column, and nothing else. */
const HE_300_B: ISection = {
  designation: "HE 300 B",
  make: "rolled",
  depthMm: 300,
  widthMm: 300,
  webThicknessMm: 11,
  flangeThicknessMm: 19,
  rootMm: 27,
};
const heavier: MeasureCase = { kind: "heavier-column", section: HE_300_B, steel: S355 };
const node = buildNodeCase({
  loadCases: [
    {
      ...buildLoadCase(90, -30),
      column: {
        axialForceN: 900_000,
        momentAboveNmm: 60e6,
        momentBelowNmm: -60e6,
        shearAboveN: 20_000,
        shearBelowN: -20_000,
      },
    },
  ],
});
const onHeavier: NodeCase = { ...node, column: { ...node.column, section: HE_300_B, steel: S355 } };

describe("a heavier column", () => {
  it("equals the bare node with that column, number by number", () => {
    const measured = evaluatedCase(node, [heavier]);
    const bare = evaluatedCase(onHeavier);
    expect(measured.checks.length).toBeGreaterThan(20);
    expect({ ...measured, measures: [] }).toEqual(bare);
  });

  it("is another column than the node's own", () =>
    expect(evaluatedCase(node, [heavier]).utilisation).toBeLessThan(evaluatedCase(node).utilisation));

  it.each<[string, MeasureCase]>([
    ["stiffeners", buildStiffeners()],
    ["bars", buildBars()],
  ])("carries %s named before or after it as its own", (_, other) => {
    const bare = evaluatedCase(onHeavier, [other]).checks;
    expect(evaluatedCase(node, [heavier, other]).checks).toEqual(bare);
    expect(evaluatedCase(node, [other, heavier]).checks).toEqual(bare);
  });
});
