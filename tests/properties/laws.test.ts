import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import type { EvaluatedOptionDocument, OptionDocument } from "@/lib/schemas/result-document";
import { randomNodeDocument } from "@/tests/factories/random-node-document";
import { SEED, isInScope, optionsOf, resistancesOf, shop } from "@/tests/support/random-options";

/** Laws that hold on every node, tried on random ones. */

/** Every number of a document, wherever it stands. */
function* numbersOf(value: unknown): Generator<number> {
  if (typeof value === "number") yield value;
  else if (value !== null && typeof value === "object")
    for (const part of Object.values(value)) yield* numbersOf(part);
}

const expectFinite = (options: readonly OptionDocument[]): void => {
  for (const number of numbersOf(options))
    if (!Number.isFinite(number)) throw new Error("a number is not finite");
};

const otherSide = { left: "right", right: "left", both: "both" } as const;

const mirroredMeasure = (measure: MeasureInput): MeasureInput =>
  measure.kind === "diagonal-stiffeners"
    ? { ...measure, towards: otherSide[measure.towards] }
    : "at" in measure && measure.at !== undefined
      ? { ...measure, at: otherSide[measure.at] }
      : measure;

const mirrored = (document: NodeDocument): NodeDocument => {
  const { left, right, ...rest } = document;
  const levelOffset = -(right?.levelOffset ?? 0);
  return {
    ...rest,
    ...(right ? { left: { beam: right.beam, connection: right.connection } } : {}),
    ...(left ? { right: { ...left, levelOffset } } : {}),
    options: document.options?.map((option) => ({
      ...option,
      measures: option.measures.map(mirroredMeasure),
    })),
    loadCases: document.loadCases.map(({ name, left: a, right: b, column }) => ({
      name,
      ...(b ? { left: b } : {}),
      ...(a ? { right: a } : {}),
      column: {
        ...column,
        momentAbove: -column.momentAbove,
        momentBelow: -column.momentBelow,
        shearAbove: -column.shearAbove,
        shearBelow: -column.shearBelow,
      },
    })),
  };
};

const otherLevel = { top: "bottom", bottom: "top" } as const;

/** A single diagonal turned upside down leans the other way; a K keeps its sides. */
const turnedMeasure = (measure: MeasureInput): MeasureInput =>
  measure.kind === "diagonal-stiffeners" && measure.arrangement === "single"
    ? { ...measure, towards: otherSide[measure.towards] }
    : "levels" in measure
      ? { ...measure, levels: measure.levels.map((level) => otherLevel[level]) }
      : measure;

const turnedSide = <S extends NonNullable<NodeDocument["left"]>>(side: S): S => {
  const { connection } = side;
  if (connection.kind === "flange-cleats") return side;
  const welds = {
    ...connection.welds,
    topFlange: connection.welds.bottomFlange,
    bottomFlange: connection.welds.topFlange,
  };
  if (connection.kind === "welded") return { ...side, connection: { ...connection, welds } };
  const depth = depthOfBeam(side.beam.section);
  const { plate, bolts } = connection;
  return {
    ...side,
    connection: {
      ...connection,
      welds,
      plate: { ...plate, extensionTop: plate.extensionBottom, extensionBottom: plate.extensionTop },
      bolts: { ...bolts, rows: bolts.rows.map((row) => depth - row).reverse() },
    },
  };
};

/** How far the right beam's bottom stands above the left one's: its step once both are upside down. */
const turnedOffset = ({ left, right }: NodeDocument): number =>
  left && right
    ? depthOfBeam(left.beam.section) - depthOfBeam(right.beam.section) - (right.levelOffset ?? 0)
    : 0;

const depthOfBeam = (section: unknown): number => {
  const row = shop.catalog.sections.find((candidate) => candidate.designation === section);
  if (!row) throw new Error("the random nodes name beams of the catalogue");
  return row.depthMm;
};

/** The same node seen upside down: levels swap, moments change their sign. */
const upsideDown = (document: NodeDocument): NodeDocument => {
  const { endDistanceAbove, endDistanceBelow, ...column } = document.column;
  const turnedActions = (actions: { moment: number; axialForce: number; shear: number }) => ({
    ...actions,
    moment: -actions.moment,
    shear: -actions.shear,
  });
  return {
    ...document,
    column: {
      ...column,
      ...(endDistanceBelow === undefined ? {} : { endDistanceAbove: endDistanceBelow }),
      ...(endDistanceAbove === undefined ? {} : { endDistanceBelow: endDistanceAbove }),
    },
    ...(document.left ? { left: turnedSide(document.left) } : {}),
    ...(document.right
      ? { right: { ...turnedSide(document.right), levelOffset: turnedOffset(document) } }
      : {}),
    loadCases: document.loadCases.map(({ name, left, right, column: forces }) => ({
      name,
      ...(left ? { left: turnedActions(left) } : {}),
      ...(right ? { right: turnedActions(right) } : {}),
      column: {
        axialForce: forces.axialForce,
        momentAbove: forces.momentBelow,
        momentBelow: forces.momentAbove,
        shearAbove: forces.shearBelow,
        shearBelow: forces.shearAbove,
      },
    })),
    options: document.options?.map((option) => ({ ...option, measures: option.measures.map(turnedMeasure) })),
  };
};

/** A moment of nothing has no sense to turn: its tension level is a choice, not a result. */
const hasZeroMoment = (document: NodeDocument): boolean =>
  document.loadCases.some(({ left, right }) => left?.moment === 0 || right?.moment === 0);

const close = (a: number, b: number): boolean =>
  Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b), 1e-9);

/** The same node with nothing in the column and every other load so many times as large: k_wc stays 1. */
const scaled = (document: NodeDocument, factor: number): NodeDocument => {
  const timesFactor = <T extends Record<string, number>>(forces: T): T =>
    Object.fromEntries(Object.entries(forces).map(([key, value]) => [key, value * factor])) as T;
  return {
    ...document,
    loadCases: document.loadCases.map(({ name, left, right, column }) => ({
      name,
      ...(left ? { left: timesFactor(left) } : {}),
      ...(right ? { right: timesFactor(right) } : {}),
      column: { ...timesFactor(column), axialForce: 0, momentAbove: 0, momentBelow: 0 },
    })),
  };
};

type Check = EvaluatedOptionDocument["components"][number];

/**
 * Demands with a kink: a bar once the flange yields and the far side that it pulls, a tension stiffener once the web
 * has taken its part, the web plate under it and welds behind it, a diagonal once the web yields, the weld of a tension
 * flange that never has to exceed the flange, and a seat once the beam's reaction stands beyond its root.
 */
const hasKink = ({ component, clause, what = "" }: Check): boolean =>
  ["detailing", "bar-tension", "far-flange", "stiffener-weld", "diagonal-stiffener"].includes(component) ||
  clause === "SCI/BCSA P398, tension stiffeners" ||
  what === "column web in shear along a partial-depth stiffener" ||
  what === "level part of the diagonal's force" ||
  what.endsWith("or from the stiffeners on it") ||
  what === "tension flange weld" ||
  what === "seat under the beam's reaction";

const straightChecks = (option: OptionDocument | undefined): Check[] =>
  option && isInScope(option) ? option.components.filter((check) => !hasKink(check)) : [];

/** Fewer in every run of the tests; `npm run laws` tries 100,000 and 2,000. */
const DOCUMENTS = Number(process.env["LAWS_DOCUMENTS"] ?? 10_000);
const PROPOSALS = Number(process.env["LAWS_PROPOSALS"] ?? 500);

describe("random nodes", () => {
  it(`give finite numbers on ${DOCUMENTS} documents, at least 60 % in scope, every kind among them`, () => {
    let inScope = 0;
    let all = 0;
    const kinds = new Set<string>();
    fc.assert(
      fc.property(randomNodeDocument, (document) => {
        const options = optionsOf(document);
        expectFinite(options);
        for (const option of options) {
          all += 1;
          if (!isInScope(option)) continue;
          inScope += 1;
          kinds.add(document.left?.connection.kind ?? "");
          kinds.add(option.measures.map((measure) => measure.kind).join(" + "));
        }
      }),
      { numRuns: DOCUMENTS, seed: SEED },
    );
    expect(inScope / all).toBeGreaterThanOrEqual(0.6);
    for (const kind of [
      "",
      "end-plate",
      "welded",
      "flange-cleats",
      "transverse-stiffeners",
      "web-plates",
      "through-bars",
      "heavier-column",
      "backing-plates",
      "diagonal-stiffeners",
      "through-bars + transverse-stiffeners",
      "web-plates + transverse-stiffeners",
      "web-plates + through-bars",
      "transverse-stiffeners + backing-plates",
      "web-plates + backing-plates",
      "transverse-stiffeners + diagonal-stiffeners",
      "web-plates + transverse-stiffeners + through-bars",
    ]) {
      expect([...kinds]).toContain(kind);
    }
  }, 2_400_000);

  it(`give finite numbers in ${PROPOSALS} full proposals`, () => {
    fc.assert(
      fc.property(randomNodeDocument, ({ options: _given, ...document }) =>
        expectFinite(optionsOf(document)),
      ),
      { numRuns: PROPOSALS, seed: SEED },
    );
  }, 2_400_000);

  it("give mirrored nodes mirrored results", () => {
    fc.assert(
      fc.property(randomNodeDocument, (document) => {
        const straight = optionsOf(document);
        const turned = optionsOf(mirrored(document));
        straight.forEach((option, index) => {
          const other = turned[index];
          if (!other || isInScope(option) !== isInScope(other)) throw new Error("scope differs");
          if (!isInScope(option) || !isInScope(other)) return;
          expect(close(option.governing.utilisation, other.governing.utilisation)).toBe(true);
          for (const joint of option.joints) {
            const twin = other.joints.find(
              (candidate) => candidate.side !== joint.side && candidate.loadCase === joint.loadCase,
            );
            expect(close(joint.momentResistance, twin?.momentResistance ?? NaN)).toBe(true);
            expect(close(joint.initialStiffness, twin?.initialStiffness ?? NaN)).toBe(true);
          }
        });
      }),
      { numRuns: 300, seed: SEED },
    );
  }, 120_000);

  it("swap their levels when turned upside down with their moments", () => {
    fc.assert(
      fc.property(
        randomNodeDocument.filter((document) => !hasZeroMoment(document)),
        (document) => {
          const straight = optionsOf(document);
          const turned = optionsOf(upsideDown(document));
          straight.forEach((option, index) => {
            const other = turned[index];
            if (!other || isInScope(option) !== isInScope(other)) throw new Error("scope differs");
            if (!isInScope(option) || !isInScope(other)) return;
            option.joints.forEach((joint, place) => {
              expect(close(joint.momentResistance, other.joints[place]?.momentResistance ?? NaN)).toBe(true);
              expect(close(joint.initialStiffness, other.joints[place]?.initialStiffness ?? NaN)).toBe(true);
            });
            const compression = (of: EvaluatedOptionDocument) =>
              of.components.filter((check) => check.component === "column-web-compression");
            const twins = compression(other);
            compression(option).forEach((check, place) => {
              expect(check.level && otherLevel[check.level]).toBe(twins[place]?.level);
              expect(close(check.resistance, twins[place]?.resistance ?? NaN)).toBe(true);
            });
          });
        },
      ),
      { numRuns: 300, seed: SEED },
    );
  }, 120_000);

  it("have demands in proportion to their loads and the same resistances, where the column carries nothing", () => {
    let compared = 0;
    fc.assert(
      fc.property(randomNodeDocument, fc.constantFrom(0.3, 1.7, 3), (document, factor) => {
        const once = optionsOf(scaled(document, 1));
        const more = optionsOf(scaled(document, factor));
        once.forEach((option, index) => {
          const checks = straightChecks(option);
          const twins = straightChecks(more[index]);
          if (checks.length !== twins.length)
            throw new Error(`${checks.length} became ${twins.length} checks`);
          checks.forEach((check, place) => {
            const twin = twins[place];
            compared += 1;
            // A demand that cancels to nothing is as exact as its terms, which are hundreds of kN.
            if (!(Math.abs((twin?.demand ?? NaN) - factor * check.demand) <= 1e-9 * (check.demand + 100)))
              throw new Error(
                `${check.component}: ${check.demand} became ${twin?.demand} at ${factor} times`,
              );
            if (!close(twin?.resistance ?? NaN, check.resistance))
              throw new Error(`${check.component}: resistance ${check.resistance} to ${twin?.resistance}`);
          });
        });
      }),
      { numRuns: 300, seed: SEED },
    );
    expect(compared).toBeGreaterThan(10_000);
  }, 120_000);

  it("never lose end-plate bending to a thicker end plate", () => {
    const thicker = <S extends NonNullable<NodeDocument["left"]>>(side: S): S => {
      const { connection } = side;
      if (connection.kind !== "end-plate") return side;
      const plate = { ...connection.plate, thickness: connection.plate.thickness + 5 };
      return { ...side, connection: { ...connection, plate } };
    };
    let compared = 0;
    fc.assert(
      fc.property(randomNodeDocument, (document) => {
        const { left, right } = document;
        const after = optionsOf({
          ...document,
          ...(left ? { left: thicker(left) } : {}),
          ...(right ? { right: thicker(right) } : {}),
        });
        optionsOf(document).forEach((option, index) => {
          const more = resistancesOf(after[index], "end-plate-bending");
          resistancesOf(option, "end-plate-bending").forEach((value, place) => {
            compared += 1;
            const raised = more[place] ?? NaN;
            if (!(raised >= value * (1 - 1e-9))) throw new Error(`end plate: ${value} fell to ${raised}`);
          });
        });
      }),
      { numRuns: 400, seed: SEED },
    );
    expect(compared).toBeGreaterThan(1_000);
  }, 120_000);

  it("are refused with a path when a field is spoilt", () => {
    fc.assert(
      fc.property(
        randomNodeDocument,
        fc.constantFrom("column", "loadCases", "frame", "target", "quantity", "partialFactors"),
        (document, field) => {
          const evaluated = evaluateDocument({ ...document, [field]: "spoilt" }, shop, { steps: "none" });
          expect(evaluated.ok).toBe(false);
          if (!evaluated.ok)
            expect(evaluated.errors.some((error) => error.path.startsWith(field))).toBe(true);
        },
      ),
      { numRuns: 100, seed: SEED },
    );
  });
});
