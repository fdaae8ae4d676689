import type { StubMesh } from "./stub-mesh";

/** How the half model is held at mid-depth, or that nothing is (full depth). */
export type MidDepth = "symmetric" | "antisymmetric" | "none";

export interface LoadedStub {
  readonly mesh: StubMesh;
  readonly midDepth: MidDepth;
  /** Outward force of one row of two bars at each nut of the mesh, N. */
  readonly rowForcesN: readonly number[];
  /** Stiffness of one bar between the middles of its nuts, N/mm; null: no bar. */
  readonly barNPerMm: number | null;
}

export const ELASTIC_MPA = 210_000;
const POISSON = 0.3;
/** Of the row's two bars the model holds one, and half of it: web middle and row height are planes of symmetry. */
const MODEL_PART = 4;

const inLines = (numbers: readonly number[]): string =>
  Array.from({ length: Math.ceil(numbers.length / 12) }, (_, i) =>
    numbers.slice(i * 12, i * 12 + 12).join(", "),
  ).join("\n");

/** Node of the nut: its displacement is the nut's mean, its force the nut's pressure. */
export const nutNode = (mesh: StubMesh, nut: number): number => mesh.nodes.length + 1 + nut;

function equations(mesh: StubMesh): string {
  return mesh.nuts
    .map((shares, nut) => {
      const terms = [
        `${nutNode(mesh, nut)}, 2, -1.0`,
        ...shares.map((s) => `${s.node}, 2, ${s.share.toExponential(9)}`),
      ];
      return ["*EQUATION", String(terms.length), ...terms].join("\n");
    })
    .join("\n");
}

/** A bar pulls its nut towards mid-depth in half a stub, and the two nuts together in a whole one. */
function barElement(stub: LoadedStub): string[] {
  if (stub.barNPerMm === null || stub.midDepth === "antisymmetric") return [];
  const { mesh } = stub;
  const number = mesh.bricks.length + 1;
  if (stub.midDepth === "symmetric") {
    // Half the bar's area over half its length: the stiffness of the whole.
    return [
      "*ELEMENT, TYPE=SPRING1, ELSET=BAR",
      `${number}, ${nutNode(mesh, 0)}`,
      "*SPRING, ELSET=BAR",
      "2",
      String(stub.barNPerMm),
    ];
  }
  return [
    "*ELEMENT, TYPE=SPRING2, ELSET=BAR",
    `${number}, ${nutNode(mesh, 0)}, ${nutNode(mesh, 1)}`,
    "*SPRING, ELSET=BAR",
    "2, 2",
    String(stub.barNPerMm / 2),
  ];
}

function nodeSets(mesh: StubMesh, midDepth: MidDepth): string[] {
  const where = (test: (x: number, y: number, z: number) => boolean): number[] =>
    mesh.nodes.flatMap(([x, y, z], i) => (test(x, y, z) ? [i + 1] : []));
  const end = Math.max(...mesh.nodes.map((node) => node[2]));
  const isMid = (y: number): boolean => midDepth !== "none" && Math.abs(y) < 1e-6;
  const set = (name: string, members: readonly number[]): string[] => [
    `*NSET, NSET=${name}`,
    inLines(members),
  ];
  return [
    ...set(
      "WEBPLANE",
      where((x) => x < 1e-6),
    ),
    ...set(
      "ROWPLANE",
      where((_, __, z) => z < 1e-6),
    ),
    // The web's middle line at the stub's end carries what the two sides do not balance.
    ...set(
      "SUPPORT",
      where((x, y, z) => x < 1e-6 && z > end - 1e-6 && !isMid(y)),
    ),
    ...(midDepth === "none"
      ? []
      : set(
          "MIDDEPTH",
          where((_, y) => isMid(y)),
        )),
    ...set(
      "NUTS",
      mesh.nuts.map((_, nut) => nutNode(mesh, nut)),
    ),
  ];
}

/** Input of CalculiX for one stub: C3D8I bricks, one linear static step. */
export function inputFile(stub: LoadedStub): string {
  const { mesh, midDepth } = stub;
  const nuts = mesh.nuts.map((_, nut) => `${nutNode(mesh, nut)}, 0.0, ${nut === 0 ? 1 : -1}, 0.0`);
  const loads = stub.rowForcesN.map(
    (force, nut) => `${nutNode(mesh, nut)}, 2, ${((nut === 0 ? 1 : -1) * force) / MODEL_PART}`,
  );
  const held = { symmetric: ["MIDDEPTH, 2"], antisymmetric: ["MIDDEPTH, 1", "MIDDEPTH, 3"], none: [] };
  return [
    "*NODE, NSET=ALL",
    ...mesh.nodes.map((node, i) => `${i + 1}, ${node.map((at) => at.toFixed(6)).join(", ")}`),
    ...nuts,
    "*ELEMENT, TYPE=C3D8I, ELSET=COLUMN",
    ...mesh.bricks.map((brick, i) => `${i + 1}, ${brick.join(", ")}`),
    "*ELSET, ELSET=WEBROOT",
    inLines(mesh.webRoot),
    ...nodeSets(mesh, midDepth),
    equations(mesh),
    "*MATERIAL, NAME=STEEL",
    "*ELASTIC",
    `${ELASTIC_MPA}, ${POISSON}`,
    "*SOLID SECTION, ELSET=COLUMN, MATERIAL=STEEL",
    ...barElement(stub),
    "*BOUNDARY",
    "WEBPLANE, 1",
    "ROWPLANE, 3",
    "SUPPORT, 2",
    "NUTS, 1",
    "NUTS, 3",
    ...held[midDepth],
    "*STEP",
    "*STATIC",
    "*CLOAD",
    ...loads,
    "*NODE PRINT, NSET=NUTS",
    "U",
    "*NODE PRINT, NSET=SUPPORT, TOTALS=ONLY",
    "RF",
    ...(midDepth === "none" ? [] : ["*NODE PRINT, NSET=MIDDEPTH, TOTALS=ONLY", "RF"]),
    "*EL PRINT, ELSET=WEBROOT",
    "S",
    "*END STEP",
    "",
  ].join("\n");
}
