import { describe, expect, it } from "vitest";
import { unbalancedCases } from "@/lib/calc/cautions";
import type { ComponentCheck, JointResult, NodeCase } from "@/lib/calc";
import { governingOf, reachesStiffness } from "@/lib/calc/verdict";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";
import { evaluatedCase } from "@/tests/support/evaluated-case";

const nodeOf = (document: NodeDocument): NodeCase => {
  const resolved = resolveNodeCase(document, buildCatalog());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
};
const node = nodeOf(buildNodeDocument());
const check = (component: ComponentCheck["component"], utilisation: number): ComponentCheck => ({
  component,
  side: "left",
  level: undefined,
  row: undefined,
  rows: undefined,
  loadCase: "one",
  clause: "",
  what: undefined,
  unit: "N",
  demand: utilisation,
  resistance: 1,
  utilisation,
  stiffnessCoefficientMm: undefined,
  steps: undefined,
});

describe("what governs", () => {
  it("is the check used most", () => {
    expect(
      governingOf(
        [check("bolt-shear", 0.5), check("column-web-shear", 0.9), check("bolt-tension", 0.7)],
        node,
      ),
    ).toEqual({ component: "column-web-shear", side: "left", loadCase: "one", utilisation: 0.9 });
  });

  it("names, of checks used alike, the one that stops the joint rather than the joint itself", () => {
    const named = (...checks: ComponentCheck[]): string => governingOf(checks, node).component;
    expect(named(check("joint-moment", 0.9), check("end-plate-bending", 0.9))).toBe("end-plate-bending");
    expect(named(check("end-plate-bending", 0.9), check("joint-moment", 0.9))).toBe("end-plate-bending");
    expect(named(check("column-flange-bending", 0.9), check("column-web-compression", 0.9))).toBe(
      "column-web-compression",
    );
    // Beyond the last digits they are not alike.
    expect(named(check("column-web-compression", 0.9), check("joint-moment", 0.90001))).toBe("joint-moment");
  });

  it("passes over a rule of detailing that is kept, and names one that is broken", () => {
    expect(governingOf([check("detailing", 1), check("bolt-shear", 0.2)], node).component).toBe("bolt-shear");
    expect(governingOf([check("detailing", 1.1), check("bolt-shear", 0.2)], node).component).toBe(
      "detailing",
    );
  });

  it("is the joint, unused, where there is nothing to check", () => {
    expect(governingOf([], node)).toEqual({
      component: "joint-moment",
      side: "left",
      loadCase: "all",
      utilisation: 0,
    });
  });
});

describe("stiffness asked for", () => {
  const joint = (stiffness: number, stiffnessClass: JointResult["stiffnessClass"]): JointResult =>
    ({ initialStiffnessNmmPerRad: stiffness, stiffnessClass }) as JointResult;
  const asked = (stiffness: NodeCase["target"]["stiffness"]): NodeCase => ({
    ...node,
    target: { utilisation: 1, stiffness },
  });

  it("is reached when every joint reaches it", () => {
    const joints = [joint(5e10, "rigid"), joint(3e10, "semi-rigid")];
    expect(reachesStiffness(asked("any"), joints)).toBe(true);
    expect(reachesStiffness(asked("rigid"), joints)).toBe(false);
    expect(reachesStiffness(asked("rigid"), [joint(5e10, "rigid")])).toBe(true);
    expect(reachesStiffness(asked({ nmmPerRad: 3e10 }), joints)).toBe(true);
    expect(reachesStiffness(asked({ nmmPerRad: 3.1e10 }), joints)).toBe(false);
  });

  it("fails an option that is strong enough but too soft", () => {
    const option = evaluatedCase(
      nodeOf(
        buildNodeDocument({
          target: { utilisation: 1, stiffness: "rigid" },
          loadCases: [
            {
              name: "one",
              left: { moment: 20, axialForce: 0, shear: 10 },
              column: { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 },
            },
          ],
        }),
      ),
    );
    expect(option.utilisation).toBeLessThan(1);
    expect(option.stiffnessReached).toBe(false);
    expect(option.passes).toBe(false);
  });
});

describe("what fails on the connection's own side", () => {
  const withMoment = (moment: number, shear = 10): string | null =>
    evaluatedCase(
      nodeOf(
        buildNodeDocument({
          column: { section: "HE 400 M", steel: "S355", storeyHeight: 3600 },
          loadCases: [
            {
              name: "Wind",
              left: { moment, axialForce: 0, shear },
              column: { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 },
            },
          ],
        }),
      ),
    ).connectionFailure;

  it("is told in words with both moments", () => {
    expect(withMoment(900)).toMatch(
      /^End plate, bolts and beam on the left could carry \d+ kNm on any column; Wind asks for 900 kNm\.$/,
    );
  });

  it("names bolts or a weld that shear fails", () => {
    expect(withMoment(50, 1500)).toMatch(/^The connection's .* on the left is used to \d+\.\d\d in Wind\.$/);
  });

  it("is nothing where the connection does", () => expect(withMoment(100)).toBeNull());
});

describe("balance of a load case", () => {
  const still = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };
  const cases = (document: Partial<NodeDocument>): readonly string[] =>
    unbalancedCases(nodeOf(buildNodeDocument(document)));
  const beam = (moment: number, shear = 0, axialForce = 0) => ({ moment, shear, axialForce });

  it("is told where the joint moments have nothing to go into", () => {
    const loadCases = [{ name: "left alone", left: beam(100), column: still }];
    expect(cases({ loadCases })).toEqual(["left alone"]);
  });

  it("is kept by equal moments, and by column moments that take the difference", () => {
    const two = { left: buildSide(), right: buildSide() };
    expect(
      cases({ ...two, loadCases: [{ name: "a", left: beam(100), right: beam(100), column: still }] }),
    ).toEqual([]);
    const taken = { ...still, momentAbove: 20, momentBelow: -20 };
    expect(
      cases({ ...two, loadCases: [{ name: "b", left: beam(100), right: beam(60), column: taken }] }),
    ).toEqual([]);
    const wrongWay = { ...still, momentAbove: -20, momentBelow: 20 };
    expect(
      cases({ ...two, loadCases: [{ name: "c", left: beam(100), right: beam(60), column: wrongWay }] }),
    ).toEqual(["c"]);
  });

  it("counts the arm of the beam's shear and the couple of the column's shears", () => {
    // HE 300 A: 0.29 / 2 x 200 kN = 29 kNm; IPE 450 in a column sheared 10 kN both ways: 20 x 0.4354 / 2 = 4.354 kNm.
    const column = { ...still, momentAbove: 25 - 4.354 / 2, momentBelow: -(25 - 4.354 / 2) };
    const sheared = { ...column, shearAbove: 10, shearBelow: -10 };
    expect(cases({ loadCases: [{ name: "d", left: beam(21, 200), column: sheared }] })).toEqual([]);
    expect(cases({ loadCases: [{ name: "e", left: beam(21, -200), column: sheared }] })).toEqual(["e"]);
  });

  it("asks for forces along the beams to be taken by the column's shears", () => {
    const taken = { ...still, momentAbove: 10, momentBelow: -10, shearAbove: -15, shearBelow: -15 };
    expect(cases({ loadCases: [{ name: "f", left: beam(20, 0, 30), column: taken }] })).toEqual([]);
    expect(cases({ loadCases: [{ name: "g", left: beam(20, 0, -30), column: taken }] })).toEqual(["g"]);
  });
});
