import { describe, expect, it } from "vitest";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument, buildSide } from "../../factories/build-node-document";

/**
 * Guards that no broken document gets through, field by field: every value of a full document is taken away or spoilt in
 * turn, and each time the refusal must point at the spoilt field, something in it, or what it stands in.
 */

type Path = readonly (string | number)[];

function fullDocument(): NodeDocument {
  const [loadCase] = buildNodeDocument().loadCases;
  if (!loadCase) throw new Error("The sample has a load case.");
  const plate = { thickness: 12, width: 140, steel: "S355" };
  return buildNodeDocument({
    column: {
      section: { h: 300, b: 300, tw: 11, tf: 19, r: 27 },
      steel: { fy: 345, fu: 470 },
      storeyHeight: 3600,
    },
    right: {
      ...buildSide({ connection: { kind: "welded", welds: { topFlange: 8, bottomFlange: 8, web: 5 } } }),
      levelOffset: 0,
    },
    loadCases: [{ ...loadCase, right: { moment: -80, axialForce: 0, shear: 90 } }],
    options: [
      { key: "bare", name: "Bare column", measures: [] },
      {
        key: "all",
        name: "All measures",
        measures: [
          {
            kind: "transverse-stiffeners",
            levels: ["top"],
            ...plate,
            length: 150,
            clip: 30,
            flangeWeld: 6,
            webWeld: 5,
          },
          { kind: "diagonal-stiffeners", arrangement: "single", towards: "left", ...plate, weld: 6 },
          { kind: "web-plates", sides: 1, ...plate, height: 600, weld: 6 },
          { kind: "backing-plates", levels: ["bottom"], ...plate, length: 200 },
          { kind: "through-bars", levels: ["top"], size: "M24", grade: "8.8", innerNuts: true },
          { kind: "heavier-column", section: "HE 300 M" },
        ],
      },
    ],
  });
}

/** Paths of every value that is not itself an object or a list. */
function leavesOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== "object" || value === null) return [path];
  return Object.entries(value).flatMap(([key, inner]) =>
    leavesOf(inner, [...path, Array.isArray(value) ? Number(key) : key]),
  );
}

function spoilt(path: Path, value: unknown): unknown {
  const document: unknown = structuredClone(fullDocument());
  const last = path.at(-1);
  let place = document as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) place = place[key] as Record<string | number, unknown>;
  if (last === undefined) throw new Error("A document is not a leaf.");
  if (value === undefined) delete place[last];
  else place[last] = value;
  return document;
}

function refusalPaths(document: unknown): readonly string[] {
  const parsed = parseNodeDocument(document);
  if (!parsed.ok) return parsed.errors.map((error) => error.path);
  const resolved = resolveNodeCase(parsed.document, buildCatalog());
  return resolved.ok ? [] : resolved.errors.map((error) => error.path);
}

const LEAVES = leavesOf(fullDocument());
const OPTIONAL = ["right.levelOffset"];

const isAt = (found: string, path: string): boolean =>
  found === path || found.startsWith(`${path}.`) || path.startsWith(`${found}.`);

function expectRefused(path: Path, value: unknown): void {
  const found = refusalPaths(spoilt(path, value));
  expect(found.length, `${path.join(".")} = ${String(value)}`).toBeGreaterThan(0);
  expect(
    found.some((at) => at !== "" && isAt(at, path.join("."))),
    `${path.join(".")}: ${found.join(", ")}`,
  ).toBe(true);
}

describe("a document with one spoilt field", () => {
  it("starts from a document that is taken", () => {
    expect(refusalPaths(fullDocument())).toEqual([]);
    expect(LEAVES.length).toBeGreaterThan(80);
  });

  it("is refused at the field, whatever stands there that does not belong", () => {
    for (const path of LEAVES)
      for (const value of [null, [], { a: 1 }, Number.NaN]) expectRefused(path, value);
  });

  it("is refused where a field is missing", () => {
    const needed = LEAVES.filter(
      (path) => typeof path.at(-1) === "string" && !OPTIONAL.includes(path.join(".")),
    );
    for (const path of needed) expectRefused(path, undefined);
  });

  it("is refused at a name that nobody knows", () => {
    const names = LEAVES.filter((path) =>
      /section|steel|size|grade|kind|basis|bracing$/.test(String(path.at(-1))),
    );
    expect(names.length).toBeGreaterThan(10);
    for (const path of names) expectRefused(path, "nothing of the kind");
  });

  it("is refused at a length, a thickness or a strength that is not above nought", () => {
    const lengths = LEAVES.filter((path) =>
      /^(h|b|tw|tf|fy|fu|thickness|width|height|length|gauge|span|storeyHeight|weld|quantity)$/.test(
        String(path.at(-1)),
      ),
    );
    expect(lengths.length).toBeGreaterThan(20);
    for (const path of lengths) for (const value of [0, -5]) expectRefused(path, value);
  });

  it("is refused at a field that is not known", () => {
    const objects = new Set(
      LEAVES.filter((path) => typeof path.at(-1) === "string").map((path) => path.slice(0, -1).join(".")),
    );
    for (const at of objects) {
      const path = [...(at === "" ? [] : at.split(".")), "colour"].map((key) =>
        /^\d+$/.test(key) ? Number(key) : key,
      );
      expect(refusalPaths(spoilt(path, "red"))).toContain(path.join("."));
    }
  });
});
