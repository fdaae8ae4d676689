import { describe, expect, it } from "vitest";
import { pathWords } from "@/components/node/path-words";

describe("paths in words", () => {
  it("counts from one and leaves out what goes without saying", () => {
    expect(pathWords("left.connection.bolts.rows.0")).toBe("left bolts rows 1");
    expect(pathWords("loadCases.2.column.momentAbove")).toBe("load case 3 column moment above");
    expect(pathWords("left.connection")).toBe("left connection");
    expect(pathWords("")).toBe("the node");
    expect(pathWords("unheardOf")).toBe("unheardOf");
  });
});
