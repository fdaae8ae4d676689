import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import { randomNodeDocument } from "@/tests/factories/random-node-document";
import { SEED, isInScope, optionsOf, resistancesOf } from "@/tests/support/random-options";

/** Laws of the measures, tried on random nodes: more steel is never weaker. */
describe("random nodes", () => {
  it("never lose resistance to a thicker plate", () => {
    // A thicker web plate narrows the stiffeners on it and is taken to leave less to bars beside it: by itself only.
    const isByItself = (measures: readonly MeasureInput[]): boolean =>
      !measures.some(({ kind }) => kind === "transverse-stiffeners" || kind === "through-bars");
    const thicker = (measure: MeasureInput, _: number, measures: readonly MeasureInput[]): MeasureInput => {
      switch (measure.kind) {
        case "transverse-stiffeners":
        case "backing-plates":
        case "diagonal-stiffeners":
          return { ...measure, thickness: measure.thickness + 5 };
        case "web-plates": {
          if (!isByItself(measures)) return measure;
          const weld = measure.weld === "butt" ? "butt" : measure.weld + 5;
          return { ...measure, thickness: measure.thickness + 5, weld };
        }
        default:
          return measure;
      }
    };
    fc.assert(
      fc.property(randomNodeDocument, (document) => {
        const before = optionsOf(document);
        const after = optionsOf({
          ...document,
          options: document.options?.map((option) => ({ ...option, measures: option.measures.map(thicker) })),
        });
        before.forEach((option, index) => {
          for (const component of [
            "column-web-compression",
            "column-web-shear",
            "column-flange-bending",
            "transverse-stiffener",
            "diagonal-stiffener",
          ]) {
            const more = resistancesOf(after[index], component);
            resistancesOf(option, component).forEach((value, place) => {
              const raised = more[place] ?? NaN;
              if (!(raised >= value * (1 - 1e-9)))
                throw new Error(`${component}: ${value} fell to ${raised}`);
            });
          }
        });
      }),
      { numRuns: 400, seed: SEED },
    );
  }, 120_000);

  it("never lose bending of the column flange to a backing plate, nor shear of the panel to a diagonal", () => {
    let raised = 0;
    const compareWith = (document: NodeDocument, measure: MeasureInput, component: string): void => {
      const before = optionsOf(document);
      const after = optionsOf({
        ...document,
        options: document.options?.map((option) => ({ ...option, measures: [...option.measures, measure] })),
      });
      before.forEach((option, index) => {
        const more = after[index];
        if (!more || !isInScope(more)) return;
        const twins = resistancesOf(more, component);
        resistancesOf(option, component).forEach((value, place) => {
          const twin = twins[place] ?? NaN;
          if (!(twin >= value * (1 - 1e-9))) throw new Error(`${component}: ${value} fell to ${twin}`);
          if (twin > value * (1 + 1e-6)) raised += 1;
        });
      });
    };
    fc.assert(
      fc.property(randomNodeDocument, (document) => {
        const steel = document.column.steel;
        compareWith(
          document,
          { kind: "backing-plates", levels: ["top", "bottom"], thickness: 10, width: 75, length: 300, steel },
          "column-flange-bending",
        );
        compareWith(
          document,
          {
            kind: "diagonal-stiffeners",
            arrangement: "single",
            towards: "left",
            thickness: 12,
            width: 60,
            steel,
            weld: 8,
          },
          "column-web-shear",
        );
      }),
      { numRuns: 300, seed: SEED },
    );
    expect(raised).toBeGreaterThan(100);
  }, 120_000);
});
