import { describe, expect, it } from "vitest";
import type { ISection } from "@/lib/calc/node";
import { checkSection } from "@/lib/evaluation/check-section";
import { Problems } from "@/lib/evaluation/resolve-errors";

const SOUND: ISection = {
  designation: "rolled 300x300x10x15",
  make: "rolled",
  depthMm: 300,
  widthMm: 300,
  webThicknessMm: 10,
  flangeThicknessMm: 15,
  rootMm: 20,
};

function faults(change: Partial<ISection>): readonly string[] {
  const problems = new Problems();
  const isSound = checkSection({ ...SOUND, ...change }, "column.section", problems);
  expect(isSound).toBe(problems.isEmpty);
  return problems.list().map((problem) => problem.path);
}

describe("checkSection", () => {
  it("accepts a section with room between its flanges", () => expect(faults({})).toEqual([]));

  it.each<[Partial<ISection>, readonly string[]]>([
    [{ flangeThicknessMm: 150 }, ["column.section.tf"]],
    [{ rootMm: 135 }, ["column.section.r"]],
    [{ make: "welded", rootMm: 135 }, ["column.section.weld"]],
    [{ webThicknessMm: 300 }, ["column.section.tw"]],
    [{ widthMm: 50 }, ["column.section.r"]],
    [{ flangeThicknessMm: 150, webThicknessMm: 300 }, ["column.section.tf", "column.section.tw"]],
  ])("finds the fault in %j", (change, paths) => expect(faults(change)).toEqual(paths));
});
