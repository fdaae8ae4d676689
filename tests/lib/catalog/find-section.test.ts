import { describe, expect, it } from "vitest";
import { angleKey, findAngle, findSection, sectionKey } from "@/lib/catalog/find-section";
import { buildCatalog } from "../../factories/build-node-document";

describe("findSection", () => {
  it.each([
    ["HE 300 A", "HE 300 A"],
    ["HEA 300", "HE 300 A"],
    ["HEA300", "HE 300 A"],
    ["he300a", "HE 300 A"],
    [" HE 300A ", "HE 300 A"],
    ["HEM 240", "HE 240 M"],
    ["ipe450", "IPE 450"],
    ["IPE A 300", "IPE A 300"],
    ["IPEA300", "IPE A 300"],
    ["IPE 300 A", "IPE A 300"],
    ["IPE-O 400", "IPE O 400"],
    ["UC 254x254x107", "UC 254x254x107"],
    ["254x254x107 UC", "UC 254x254x107"],
    ["254 × 254 × 107", "UC 254x254x107"],
    ["UKB 533x210x92", "UB 533x210x92"],
    ["533X210X92UB", "UB 533x210x92"],
  ])("finds %s as %s", (written, designation) => {
    expect(findSection(buildCatalog(), written)?.designation).toBe(designation);
  });

  it.each(["HE 310 A", "IPE 45O", "UB 254x254x107", "W14x90", "", "300"])(
    "does not guess at %j",
    (written) => {
      expect(findSection(buildCatalog(), written)).toBeNull();
    },
  );

  it("does not choose between two families of the same sizes", () => {
    const catalog = buildCatalog();
    const column = catalog.sections.find((row) => row.designation === "UC 254x254x107");
    if (!column) throw new Error("The seeded catalogue has lost a section.");
    const twin = { ...column, designation: "UB 254x254x107", family: "UB" as const };
    const doubled = { ...catalog, sections: [column, twin] };
    expect(findSection(doubled, "254x254x107")).toBeNull();
    expect(findSection(doubled, "UB 254x254x107")).toEqual(twin);
  });

  it("files every section of the catalogue under a key of its own", () => {
    const keys = buildCatalog().sections.map((row) => sectionKey(row.designation));
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.length).toBeGreaterThan(200);
  });
});

describe("findAngle", () => {
  it.each([
    ["L 100x100x10", "L 100x100x10"],
    ["L100x10", "L 100x100x10"],
    ["100 x 100 x 10 L", "L 100x100x10"],
    ["RSA 150x90x10", "L 150x90x10"],
    ["90x150x10", "L 150x90x10"],
  ])("finds %s as %s", (written, designation) => {
    expect(findAngle(buildCatalog(), written)?.designation).toBe(designation);
  });

  it("does not guess", () => {
    expect(findAngle(buildCatalog(), "L 100x100x11")).toBeNull();
    expect(findAngle(buildCatalog(), "angle")).toBeNull();
  });

  it("files every angle under a key of its own", () => {
    const keys = buildCatalog().angles.map((row) => angleKey(row.designation));
    expect(new Set(keys).size).toBe(keys.length);
  });
});
