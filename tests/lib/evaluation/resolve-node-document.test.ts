import { describe, expect, it } from "vitest";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import { buildNodeDocument } from "../../factories/build-node-document";

type Json = Record<string, unknown>;

/** The sample document with one value put at a dotted path; `undefined` takes the field away. */
function documentWith(path: string, value: unknown): unknown {
  const document: unknown = structuredClone(buildNodeDocument());
  const keys = path.split(".");
  const last = keys.pop() ?? "";
  let place = document as Json;
  for (const key of keys) place = place[key] as Json;
  if (value === undefined) delete place[last];
  else place[last] = value;
  return document;
}

const errorsOf = (input: unknown): readonly { path: string; message: string }[] => {
  const parsed = parseNodeDocument(input);
  return parsed.ok ? [] : parsed.errors;
};

const WEB_PLATE = {
  kind: "web-plates",
  sides: 1,
  thickness: 10,
  width: 208,
  height: 600,
  steel: "S355",
  weld: 6,
};
const option = (measure: Json): unknown => [{ key: "a", name: "A", measures: [measure] }];

describe("parseNodeDocument", () => {
  it("reads the sample document unchanged", () => {
    const document = buildNodeDocument({ options: [{ key: "bare", name: "Bare column", measures: [] }] });
    expect(parseNodeDocument(document)).toEqual({ ok: true, document });
  });

  it.each([
    ["quantity", undefined, "quantity", "This field is missing."],
    ["quantity", 1.5, "quantity", "Give a whole number."],
    ["quantity", 0, "quantity", "Give a number above 0."],
    ["reference", "  ", "reference", "Write something here."],
    ["reference", "x".repeat(121), "reference", "Write at most 120 characters."],
    ["basis", "EN 1993-1-8:2024", "basis", 'Write "EN 1993-1-8:2005".'],
    ["frame.bracing", "stiff", "frame.bracing", 'Write one of "braced", "unbraced".'],
    ["frame.bracing", undefined, "frame.bracing", "This field is missing."],
    ["loadCases.0.left.moment", "210", "loadCases.0.left.moment", "Give a number."],
    ["loadCases.0.left.moment", Infinity, "loadCases.0.left.moment", "Give a finite number."],
    [
      "loadCases.0.left",
      undefined,
      "loadCases.0.left",
      "Give the left beam's moment, axial force and shear.",
    ],
    ["loadCases", [], "loadCases", "Give at least one load case."],
    ["target.utilisation", 2.5, "target.utilisation", "Give a number of at most 2."],
    ["target.stiffness", "stiff", "target.stiffness", 'Write "any", "rigid" or a stiffness above 0.'],
    ["column.endDistanceAbove", -1, "column.endDistanceAbove", "Give a number of at least 0."],
    [
      "column.section",
      300,
      "column.section",
      "Write a catalogue designation, or { h, b, tw, tf, r } rolled, or { h, b, tw, tf, weld } welded.",
    ],
    ["column.section", undefined, "column.section", "This field is missing."],
    ["column.section", { h: 300, b: 0, tw: 10, tf: 15, r: 20 }, "column.section.b", "Give a number above 0."],
    [
      "column.section",
      { h: 300, b: 300, tw: 10, tf: 15, weld: 0 },
      "column.section.weld",
      "Give a number above 0.",
    ],
    [
      "column.section",
      { h: 300, b: 300, tw: 10, tf: 15, r: 20, k: 1 },
      "column.section.k",
      "This field is not known.",
    ],
    ["column.steel", 355, "column.steel", "Write a grade such as S355, or { fy, fu }."],
    ["column.steel", { fy: 355 }, "column.steel.fu", "This field is missing."],
    ["left.connection.kind", "glued", "left.connection.kind", "This kind is not known."],
    ["left.connection.bolts.size", "24", "left.connection.bolts.size", "Write a bolt size such as M24."],
    ["left.connection.bolts.perRow", 3, "left.connection.bolts.perRow", "Write 2 or 4."],
    ["left.connection.bolts.preloaded", "no", "left.connection.bolts.preloaded", "Give true or false."],
    [
      "left.connection.bolts.rows.1",
      -60,
      "left.connection.bolts.rows",
      "List the rows from the top down, each further below the top flange than the one before.",
    ],
    ["left.connection.welds.web", "tack", "left.connection.welds.web", 'Write a throat above 0, or "butt".'],
    ["left.colour", "red", "left.colour", "This field is not known."],
    ["options", option({ ...WEB_PLATE, sides: 3 }), "options.0.measures.0.sides", "Write 1 or 2."],
    [
      "options",
      option({ ...WEB_PLATE, kind: "haunch" }),
      "options.0.measures.0.kind",
      "This kind is not known.",
    ],
    ["options", option({ ...WEB_PLATE, weld: 0 }), "options.0.measures.0.weld", "Give a number above 0."],
  ])("%s = %j is refused at %s", (path, value, at, message) => {
    expect(errorsOf(documentWith(path, value))).toContainEqual({ path: at, message });
  });

  it("tells every fault at once", () => {
    const document = documentWith("quantity", -1) as Json;
    document.storeys = 4;
    (document.frame as Json).bracing = 1;
    expect(
      errorsOf(document)
        .map((error) => error.path)
        .sort(),
    ).toEqual(["frame.bracing", "quantity", "storeys"]);
  });

  it.each([[null], [undefined], ["text"], [[]]])("refuses %j as a whole", (input) => {
    const errors = errorsOf(input);
    expect(errors).toHaveLength(1);
    expect(errors[0]?.path).toBe("");
  });
});
