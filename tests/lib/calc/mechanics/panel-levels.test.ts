import { describe, expect, it } from "vitest";
import {
  areFacing,
  columnBeyondMm,
  isOnePanel,
  panelZonesOf,
  zoneBeta,
} from "@/lib/calc/mechanics/panel-levels";
import type { JointCase, NodeCase } from "@/lib/calc";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { buildCatalog, buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";

const actions = { moment: 100, axialForce: 0, shear: 50 };
const columnForces = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };

/** IPE 450 (t_f 14.6) on the left; the named beam on the right, so far below it. */
function nodeWith(section: string, levelOffset: number): NodeCase {
  const side = buildSide();
  const resolved = resolveNodeCase(
    buildNodeDocument({
      column: {
        section: "HE 300 A",
        steel: "S355",
        endDistanceAbove: 500,
        endDistanceBelow: 700,
        storeyHeight: 3600,
      },
      right: {
        beam: { ...side.beam, section },
        connection: { kind: "welded", welds: { topFlange: 6, bottomFlange: 6, web: 4 } },
        levelOffset,
      },
      loadCases: [{ name: "one", left: actions, right: actions, column: columnForces }],
    }),
    buildCatalog(),
  );
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

const pairOf = (node: NodeCase): readonly [JointCase, JointCase] => {
  const [left, right] = node.joints;
  if (!left || !right) throw new Error("two beams");
  return [left, right];
};

describe("levels of two beams", () => {
  it("face each other while their flanges overlap", () => {
    // Half the difference of IPE 450's 14.6 and IPE 360's 12.7 apart: tops in line.
    expect(areFacing(...pairOf(nodeWith("IPE 360", 0)), "top")).toBe(true);
    expect(areFacing(...pairOf(nodeWith("IPE 360", 0)), "bottom")).toBe(false);
    expect(areFacing(...pairOf(nodeWith("IPE 450", 14)), "top")).toBe(true);
    expect(areFacing(...pairOf(nodeWith("IPE 450", 15)), "top")).toBe(false);
    expect(isOnePanel(nodeWith("IPE 450", 14).joints)).toBe(true);
    expect(isOnePanel(nodeWith("IPE 360", 0).joints)).toBe(false);
  });

  it("cut the panel into zones, each with the beams that span it", () => {
    const zones = (section: string, offset: number) =>
      panelZonesOf(nodeWith(section, offset).joints).map(({ sides }) => sides.join("+"));
    expect(zones("IPE 450", 0)).toEqual(["left+right"]);
    expect(zones("IPE 360", 0)).toEqual(["left+right", "left"]);
    expect(zones("IPE 360", 90)).toEqual(["left", "left+right"]);
    expect(zones("IPE 300", 80)).toEqual(["left", "left+right", "left"]);
    expect(zones("IPE 450", 200)).toEqual(["left", "left+right", "right"]);
    // A whole beam further down: the column between them belongs to no zone.
    expect(zones("IPE 450", 900)).toEqual(["left", "right"]);
  });

  it("tell how far the column goes on beyond each beam", () => {
    const node = nodeWith("IPE 360", 150);
    const [left, right] = pairOf(node);
    expect(columnBeyondMm(node, left)).toEqual({ top: 500, bottom: 700 + (150 + 360 - 450) });
    expect(columnBeyondMm(node, right)).toEqual({ top: 500 + 150, bottom: 700 });
  });
});

describe("beta of a zone", () => {
  it("is the zone's shear over the joint's own flange force", () => {
    // V = 200/0.4 - 90/0.3 = 500 - 300 = 200 kN; over 200/0.4 = 500 kN.
    const given = { ownNmm: 200e6, ownLeverMm: 400, otherNmm: 90e6, otherLeverMm: 300 };
    expect(zoneBeta(null, given)).toBeCloseTo(200 / 500, 12);
  });

  it("is at most 2", () => {
    const given = { ownNmm: 100e6, ownLeverMm: 400, otherNmm: -300e6, otherLeverMm: 400 };
    expect(zoneBeta(null, given)).toBe(2);
  });
});
