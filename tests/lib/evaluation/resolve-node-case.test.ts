import { describe, expect, it } from "vitest";
import type { NodeCase } from "@/lib/calc/node";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "../../factories/build-node-document";

function nodeOf(overrides: Partial<NodeDocument> = {}): NodeCase {
  const resolved = resolveNodeCase(buildNodeDocument(overrides), buildCatalog());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

const errorsOf = (overrides: Partial<NodeDocument>): readonly { path: string; message: string }[] => {
  const resolved = resolveNodeCase(buildNodeDocument(overrides), buildCatalog());
  return resolved.ok ? [] : resolved.errors;
};

type EndPlate = Extract<ReturnType<typeof buildSide>["connection"], { kind: "end-plate" }>;
function buildEndPlate(
  bolts: Partial<EndPlate["bolts"]> = {},
  plate: Partial<EndPlate["plate"]> = {},
): EndPlate {
  const { connection } = buildSide();
  if (connection.kind !== "end-plate") throw new Error("The sample has an end plate.");
  return {
    ...connection,
    bolts: { ...connection.bolts, ...bolts },
    plate: { ...connection.plate, ...plate },
  };
}
const boltsOf = (bolts: Partial<EndPlate["bolts"]>) => {
  const { connection } = nodeOf({ left: buildSide({ connection: buildEndPlate(bolts) }) }).joints[0] ?? {};
  if (connection?.kind !== "end-plate") throw new Error("The sample has an end plate.");
  return connection.bolts;
};

describe("resolveNodeCase", () => {
  it("takes the strength of a rolled section from its flange, of a plate from itself", () => {
    const node = nodeOf({ column: { ...buildNodeDocument().column, section: "HE 300 M" } });
    const [joint] = node.joints;
    expect(node.column.steel.yieldMpa).toBe(345); // flange 39 mm, web 21 mm
    expect(joint?.beam.steel.yieldMpa).toBe(355); // flange 14.6 mm
    expect(joint?.connection.kind === "end-plate" && joint.connection.plate.steel.yieldMpa).toBe(345); // 20 mm
  });

  it("takes Table 3.1 of EN 1993-1-1 where the document asks for it", () => {
    const node = nodeOf({
      choices: { strengths: "en1993-1-1-table-3.1" },
      column: { ...buildNodeDocument().column, section: "HE 300 M" },
    });
    expect(node.column.steel).toMatchObject({ yieldMpa: 355, ultimateMpa: 490 });
  });

  it("converts kN and kNm into N and Nmm and keeps every sign", () => {
    const [loadCase] = nodeOf().loadCases;
    expect(loadCase?.left).toEqual({ momentNmm: 210e6, axialForceN: 0, shearN: 140e3 });
    expect(loadCase?.right).toBeNull();
    expect(loadCase?.column).toEqual({
      axialForceN: 1100e3,
      momentAboveNmm: 40e6,
      momentBelowNmm: -38e6,
      shearAboveN: 12e3,
      shearBelowN: -12e3,
    });
  });

  it("fills in what a document may leave out", () => {
    const node = nodeOf();
    expect(node.tStubModeOne).toBe("method-2");
    expect(node.column).toMatchObject({ endDistanceAboveMm: 3000, endDistanceBelowMm: null });
    expect(boltsOf({})).toMatchObject({ perRow: 2, preloaded: false });
    expect(node.joints.map((joint) => [joint.side, joint.levelOffsetMm])).toEqual([["left", 0]]);
  });

  it("resolves both sides, the right one at its own level", () => {
    const actions = { moment: 10, axialForce: 0, shear: 0 };
    const [loadCase] = buildNodeDocument().loadCases;
    if (!loadCase) throw new Error("The sample has a load case.");
    const node = nodeOf({
      right: { ...buildSide(), levelOffset: 50 },
      loadCases: [{ ...loadCase, right: actions }],
    });
    expect(node.joints.map((joint) => [joint.side, joint.levelOffsetMm])).toEqual([
      ["left", 0],
      ["right", 50],
    ]);
    expect(node.loadCases[0]?.right?.momentNmm).toBe(10e6);
  });

  it("reads a target stiffness in kNm/rad", () => {
    expect(nodeOf({ target: { utilisation: 0.9, stiffness: 80_000 } }).target).toEqual({
      utilisation: 0.9,
      stiffness: { nmmPerRad: 80e9 },
    });
    expect(nodeOf({ target: { utilisation: 1, stiffness: "rigid" } }).target.stiffness).toBe("rigid");
  });

  it("keeps the leg of a welded section's web weld, throat x sqrt 2", () => {
    const { section } = nodeOf({
      column: { ...buildNodeDocument().column, section: { h: 300, b: 300, tw: 12, tf: 20, weld: 5 } },
    }).column;
    expect(section).toMatchObject({ make: "welded", depthMm: 300 });
    expect(section.rootMm).toBeCloseTo(7.0711, 4);
  });

  it("takes steel by its strengths, and betaW by their band where it is left out", () => {
    const steel = (fy: number) =>
      nodeOf({ column: { ...buildNodeDocument().column, steel: { fy, fu: 500 } } }).column.steel;
    expect([235, 260, 300, 420].map((fy) => steel(fy).betaW)).toEqual([0.8, 0.85, 0.9, 1]);
    const given = { fy: 300, fu: 450, betaW: 0.87 };
    expect(nodeOf({ column: { ...buildNodeDocument().column, steel: given } }).column.steel).toMatchObject({
      yieldMpa: 300,
      ultimateMpa: 450,
      betaW: 0.87,
    });
  });

  /** M24: ISO 4032 s 36, m 21.5, ISO 7089 d 44; EN 14399-3 s 41, m 21.5; EN 14399-4 m 20. */
  it("takes heads and nuts of EN 14399 for HR and HV assemblies and for preloaded bolts", () => {
    expect(boltsOf({}).size).toMatchObject({ acrossFlatsMm: 36, nutHeightMm: 21.5 });
    expect(boltsOf({ assembly: "HR" }).size).toMatchObject({ acrossFlatsMm: 41, nutHeightMm: 21.5 });
    expect(boltsOf({ assembly: "HV" }).size).toMatchObject({ acrossFlatsMm: 41, nutHeightMm: 20 });
    expect(boltsOf({ preloaded: true }).size.acrossFlatsMm).toBe(41);
    expect(boltsOf({ preloaded: true, assembly: "plain" }).size.acrossFlatsMm).toBe(36);
  });

  it("knows a stiffened extension", () => {
    const stiffener = { top: { thickness: 12, length: 150 } };
    const { connection } =
      nodeOf({ left: buildSide({ connection: buildEndPlate({}, { stiffener }) }) }).joints[0] ?? {};
    expect(connection?.kind === "end-plate" && connection.plate.hasStiffenedExtension).toBe(true);
  });

  it("resolves a welded joint with butt welds", () => {
    const welds = { topFlange: "butt", bottomFlange: 8, web: 5 } as const;
    const [joint] = nodeOf({ left: buildSide({ connection: { kind: "welded", welds } }) }).joints;
    expect(joint?.connection).toEqual({
      kind: "welded",
      welds: {
        topFlange: { kind: "butt" },
        bottomFlange: { kind: "fillet", throatMm: 8 },
        web: { kind: "fillet", throatMm: 5 },
      },
    });
  });

  it("tells every unknown name at once, each at its path", () => {
    const errors = errorsOf({
      column: { ...buildNodeDocument().column, section: "HE 310 A" },
      left: buildSide({
        beam: { section: "IPE 450", steel: "S999", span: 7500 },
        connection: buildEndPlate({ size: "M10", grade: "12.9" }, { steel: { fy: 400, fu: 300 } }),
      }),
      options: [{ key: "a", name: "A", measures: [{ kind: "heavier-column", section: "HE 1 A" }] }],
    });
    expect(errors.map((error) => error.path).sort()).toEqual([
      "column.section",
      "left.beam.steel",
      "left.connection.bolts.grade",
      "left.connection.bolts.size",
      "left.connection.plate.steel.fu",
      "options.0.measures.0.section",
    ]);
    expect(errors.find((error) => error.path === "column.section")?.message).toMatch(/no section "HE 310 A"/);
    expect(errors.find((error) => error.path === "left.connection.bolts.size")?.message).toMatch(/M12, M14/);
    expect(errors.find((error) => error.path === "left.connection.bolts.grade")?.message).toMatch(
      /4\.6, 4\.8/,
    );
  });

  it("refuses a grade that has no strength at the thickness", () => {
    const choices = { strengths: "en1993-1-1-table-3.1" } as const;
    const left = buildSide({ connection: buildEndPlate({}, { thickness: 90 }) });
    expect(errorsOf({ choices, left })).toEqual([
      {
        path: "left.connection.plate.steel",
        message:
          "S355 has no strength at 90 mm: Table 3.1 of EN 1993-1-1 ends at 80 mm. Give fy and fu instead.",
      },
    ]);
  });
});
