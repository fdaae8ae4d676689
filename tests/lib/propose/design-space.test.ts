import { expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { fixedShape, shapesOf } from "@/lib/propose/design-space";
import { HE_300_A, S355 } from "./sample-node";

const column = (designation: string): MeasureCase => ({
  kind: "heavier-column",
  section: { ...HE_300_A, designation },
  steel: S355,
});
const named = (measures: readonly MeasureCase[]): readonly string[] =>
  measures.map((measure) => (measure.kind === "heavier-column" ? measure.section.designation : ""));

it("has no open sizes in a fixed shape", () => {
  const shape = fixedShape([column("A")]);
  expect(shape.ladders).toEqual([]);
  expect(named(shape.build([]))).toEqual(["A"]);
});

it("combines every shape with every other and hands each its own steps", () => {
  const open = (name: string) => ({
    ladders: [2, 3],
    build: (steps: readonly number[]) => [column(`${name}${steps.join("")}`)],
  });
  const both = shapesOf({
    kind: "product",
    first: [fixedShape([column("A")]), open("B")],
    second: [open("C")],
  });
  expect(both.map(({ ladders }) => ladders)).toEqual([
    [2, 3],
    [2, 3, 2, 3],
  ]);
  expect(named(both[0]?.build([1, 2]) ?? [])).toEqual(["A", "C12"]);
  expect(named(both[1]?.build([0, 1, 1, 2]) ?? [])).toEqual(["B01", "C12"]);
});
