import { describe, expect, it } from "vitest";
import { draftOf, withValue } from "@/components/node/node-draft";
import { readDraft } from "@/components/node/read-draft";
import { STARTING_DOCUMENT } from "@/components/node/starting-document";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const draft = draftOf(buildNodeDocument());
const read = (changed = draft) => readDraft(changed, buildCatalog());

describe("reading a draft", () => {
  it("gives document and node when every field is in order", () => {
    const reading = read();
    expect(reading.errors.size).toBe(0);
    expect(reading.document).toEqual(buildNodeDocument());
    expect(reading.node?.joints[0]?.beam.section.depthMm).toBe(450);
    expect(reading.drawable).toBe(reading.node);
  });
  it("names the path of a text that is no number", () => {
    const reading = read(withValue(draft, "left.connection.plate.thickness", "twenty"));
    expect([...reading.errors]).toEqual([["left.connection.plate.thickness", "Give a number."]]);
    expect(reading.node).toBeNull();
    expect(reading.drawable).toBeNull();
  });
  it("names the path of a part that the catalogue does not have", () => {
    expect([...read(withValue(draft, "column.section", "HE 301 A")).errors.keys()]).toEqual([
      "column.section",
    ]);
  });
  it("still draws while loads, target or options are not in order", () => {
    for (const [path, text] of [
      ["loadCases.0.left.moment", "2x"],
      ["target.utilisation", ""],
      ["quantity", "0"],
      ["reference", ""],
    ] as const) {
      const reading = read(withValue(draft, path, text));
      expect([...reading.errors.keys()]).toEqual([path]);
      expect(reading.node).toBeNull();
      expect(reading.drawable?.column.section.designation).toBe("HE 300 A");
    }
  });
  it("follows the sizes in the drawing while a load is being typed", () => {
    const both = withValue(
      withValue(draft, "loadCases.0.left.moment", "-"),
      "left.connection.plate.thickness",
      "25",
    );
    const [joint] = read(both).drawable?.joints ?? [];
    expect(joint?.connection).toMatchObject({ plate: { thicknessMm: 25 } });
  });
  it("starts a new node from a document that is in order", () => {
    expect(read(draftOf(STARTING_DOCUMENT)).errors.size).toBe(0);
  });
});
