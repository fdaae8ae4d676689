import { describe, expect, it } from "vitest";
import { evaluateOption, pairsOfMeasure, type EvaluatedOption, type NodeCase, type Side } from "@/lib/calc";
import { resolveMeasures } from "@/lib/evaluation/resolve-measures";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { MeasureInput, NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const catalog = buildCatalog();
const columnForces = { axialForce: 0, momentAbove: 0, momentBelow: 0, shearAbove: 0, shearBelow: 0 };
const welds = { topFlange: 6, bottomFlange: 6, web: 4 };
const depthOf = { "IPE 300": 300, "IPE 360": 360, "IPE 450": 450 } as const;
type Beam = keyof typeof depthOf;

const welded = (section: Beam) => ({
  beam: { section, steel: "S355", span: 7000 },
  connection: { kind: "welded" as const, welds },
});
const bolted = (section: Beam) => ({
  beam: { section, steel: "S355", span: 7000 },
  connection: {
    kind: "end-plate" as const,
    plate: { steel: "S355", thickness: 20, width: 190, extensionTop: 90, extensionBottom: 90 },
    bolts: {
      size: "M20",
      grade: "10.9",
      gauge: 120,
      rows: [-45, 65, depthOf[section] - 65, depthOf[section] + 45],
    },
    welds,
  },
});

type Built = ReturnType<typeof welded> | ReturnType<typeof bolted>;

function documentOf(
  left: Built,
  right: Built | null,
  offset: number,
  moments: [number, number],
): NodeDocument {
  return buildNodeDocument({
    column: { section: "HE 300 B", steel: "S355", storeyHeight: 3600 },
    left,
    ...(right ? { right: { ...right, levelOffset: offset } } : {}),
    loadCases: [
      {
        name: "one",
        left: { moment: moments[0], axialForce: 0, shear: 50 },
        ...(right ? { right: { moment: moments[1], axialForce: 0, shear: 50 } } : {}),
        column: columnForces,
      },
    ],
  });
}

function nodeOf(document: NodeDocument): NodeCase {
  const resolved = resolveNodeCase(document, catalog);
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  return resolved.node;
}

function evaluated(document: NodeDocument, inputs: MeasureInput[] = []): EvaluatedOption {
  const resolved = resolveMeasures(inputs, document, catalog, "options.0.measures");
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
  const outcome = evaluateOption(nodeOf(document), resolved.measures);
  if (outcome.kind !== "evaluated") throw new Error(outcome.reason);
  return outcome;
}

const joint = (option: EvaluatedOption, side: Side) => {
  const found = option.joints.find((one) => one.side === side);
  if (!found) throw new Error(`no joint on the ${side}`);
  return found;
};
const checkOn = (option: EvaluatedOption, component: string, side: Side) => {
  const found = option.checks.find((check) => check.component === component && check.side === side);
  if (!found) throw new Error(`no ${component} on the ${side}`);
  return found;
};

const stiffeners = (levels: ("top" | "bottom")[], more: Partial<MeasureInput> = {}): MeasureInput =>
  ({
    kind: "transverse-stiffeners",
    levels,
    thickness: 15,
    width: 120,
    length: "full",
    clip: 30,
    steel: "S355",
    flangeWeld: 8,
    webWeld: 6,
    ...more,
  }) as MeasureInput;

describe("panel shear between flange levels", () => {
  // Welded: z = h - t_fb, so IPE 450: 450 - 14.6; IPE 300: 300 - 10.7. Tops in line.
  const left = 450 - 14.6;
  const right = 300 - 10.7;

  it("is that of the worst zone each beam shears", () => {
    const option = evaluated(documentOf(welded("IPE 450"), welded("IPE 300"), 0, [150, 60]));
    const both = 150e6 / left - 60e6 / right;
    expect(checkOn(option, "column-web-shear", "left").demand).toBeCloseTo(150e6 / left, 3);
    expect(checkOn(option, "column-web-shear", "right").demand).toBeCloseTo(Math.abs(both), 3);
  });

  it("adds up where the moments turn the same way", () => {
    const option = evaluated(documentOf(welded("IPE 450"), welded("IPE 300"), 0, [150, -60]));
    const both = 150e6 / left + 60e6 / right;
    expect(checkOn(option, "column-web-shear", "left").demand).toBeCloseTo(both, 3);
    expect(checkOn(option, "column-web-shear", "right").demand).toBeCloseTo(both, 3);
  });

  it("gives beta for the spring k_1: 0.38 A_vc / (beta z)", () => {
    const option = evaluated(documentOf(welded("IPE 450"), welded("IPE 300"), 0, [150, 60]));
    // HE 300 B, t_f 19 mm, so f_y 345: V_wp,Rd = 0.9 * 345 * A_vc / sqrt(3).
    const shear = checkOn(option, "column-web-shear", "left");
    const area = (shear.resistance * Math.sqrt(3)) / (0.9 * 345);
    expect(shear.stiffnessCoefficientMm).toBeCloseTo((0.38 * area) / (1 * left), 6);
    const beta = Math.abs(1 - ((150e6 / left) * right) / 60e6);
    expect(checkOn(option, "column-web-shear", "right").stiffnessCoefficientMm).toBeCloseTo(
      (0.38 * area) / (beta * right),
      6,
    );
  });
});

describe("beams that do not reach one another", () => {
  it.each([
    ["welded", welded("IPE 450"), welded("IPE 300")],
    ["bolted", bolted("IPE 450"), bolted("IPE 300")],
  ])("are each as strong and stiff as alone: %s", (_, left, right) => {
    const apart = evaluated(documentOf(left, right, 1200, [150, -80]));
    const alone = evaluated(documentOf(left, null, 0, [150, 0]));
    const other = evaluated(documentOf(right, null, 0, [-80, 0]));
    for (const [two, one] of [
      [joint(apart, "left"), joint(alone, "left")],
      [joint(apart, "right"), joint(other, "left")],
    ] as const) {
      expect(two.momentResistanceNmm).toBeCloseTo(one.momentResistanceNmm, 3);
      expect(two.initialStiffnessNmmPerRad).toBeCloseTo(one.initialStiffnessNmmPerRad, -3);
    }
  });
});

describe("stiffeners between unequal beams", () => {
  const document = documentOf(welded("IPE 450"), welded("IPE 300"), 0, [220, 60]);
  const pairs = (from: NodeDocument, measure: MeasureInput) => {
    const resolved = resolveMeasures([measure], from, catalog, "options.0.measures");
    const [own] = resolved.ok ? resolved.measures : [];
    if (own?.kind !== "transverse-stiffeners") throw new Error("stiffeners");
    const node = nodeOf(from);
    return pairsOfMeasure(node.column.section, node.joints, own).map(({ level, sides, slopeCosine }) => ({
      level,
      sides: sides.join("+"),
      slopeCosine,
    }));
  };

  it("are one pair where the flanges are in line, one for each beam where they are not", () => {
    expect(pairs(document, stiffeners(["top", "bottom"]))).toEqual([
      { level: "top", sides: "left+right", slopeCosine: 1 },
      { level: "bottom", sides: "left", slopeCosine: 1 },
      { level: "bottom", sides: "right", slopeCosine: 1 },
    ]);
  });

  it("help the beam they are named for", () => {
    const bare = evaluated(document);
    const one = evaluated(document, [stiffeners(["bottom"], { at: "left" })]);
    expect(checkOn(one, "column-web-compression", "left").resistance).toBeGreaterThan(
      1.2 * checkOn(bare, "column-web-compression", "left").resistance,
    );
    expect(checkOn(one, "column-web-compression", "right").resistance).toBe(
      checkOn(bare, "column-web-compression", "right").resistance,
    );
  });

  it("serve both beams whichever is named where the flanges are in line", () => {
    expect(pairs(document, stiffeners(["top"], { at: "right" }))).toEqual([
      { level: "top", sides: "left+right", slopeCosine: 1 },
    ]);
  });

  it("slope from flange to flange where two pairs would leave no room, and lose by the slope", () => {
    const stepped = documentOf(welded("IPE 450"), welded("IPE 450"), 60, [220, 220]);
    const level = documentOf(welded("IPE 450"), welded("IPE 450"), 0, [220, 220]);
    // HE 300 B: clear depth 300 - 2 * 19 = 262 mm; rise 60 mm.
    const cosine = 262 / Math.hypot(262, 60);
    const sloped = pairs(stepped, stiffeners(["bottom"]));
    expect(sloped).toEqual([{ level: "bottom", sides: "left+right", slopeCosine: cosine }]);
    const [inclined, straight] = [stepped, level].map((each) =>
      checkOn(evaluated(each, [stiffeners(["bottom"])]), "column-web-compression", "left"),
    );
    expect(inclined?.resistance).toBeLessThanOrEqual((straight?.resistance ?? NaN) * cosine + 1e-6);
    expect(inclined?.resistance).toBeGreaterThan((straight?.resistance ?? NaN) * cosine * 0.98);
    expect(evaluated(stepped, [stiffeners(["bottom"])]).cautions.join(" ")).toMatch(
      /slope from one beam's flange/,
    );
  });

  it("pass the other beam's nuts with room to spare or are told to move", () => {
    // Left pair at the level of the right beam's bolt row: 450 - 7.3 = 442.7 against 377.7 + 65 = 442.7 mm.
    const clash = documentOf(bolted("IPE 450"), bolted("IPE 450"), 377.7, [150, 150]);
    const detail = evaluated(clash, [stiffeners(["bottom"], { at: "left" })]).checks.find(
      (check) => check.component === "detailing" && check.what === "nut beside the stiffener",
    );
    expect(detail?.utilisation).toBeGreaterThan(1);
  });
});

describe("bars between unequal beams", () => {
  const bars = (levels: ("top" | "bottom")[], at?: Side): MeasureInput => ({
    kind: "through-bars",
    levels,
    size: "M20",
    grade: "10.9",
    innerNuts: true,
    ...(at ? { at } : {}),
  });
  const outcomeOf = (document: NodeDocument, inputs: MeasureInput[]) => {
    const resolved = resolveMeasures(inputs, document, catalog, "options.0.measures");
    if (!resolved.ok) throw new Error(JSON.stringify(resolved.errors));
    return evaluateOption(nodeOf(document), resolved.measures);
  };
  // HE 300 A, gauge 120: m / t_f = ((120 - 8.5) / 2 - 0.8 * 27) / 14 = 2.4.
  const onLighter = (document: NodeDocument): NodeDocument => ({
    ...document,
    column: { ...document.column, section: "HE 300 A" },
  });
  const topsInLine = onLighter(documentOf(bolted("IPE 450"), bolted("IPE 300"), 0, [150, 150]));

  it("relieve both sides where the tops are in line and the rows meet", () => {
    const bare = evaluated(topsInLine);
    const barred = evaluated(topsInLine, [bars(["top"])]);
    for (const side of ["left", "right"] as const) {
      const of = (option: EvaluatedOption) => checkOn(option, "column-web-tension", side).resistance;
      expect(of(barred)).toBeGreaterThan(of(bare));
    }
  });

  it("are refused where the other beam's plate is in their way", () => {
    // IPE 300's plate ends 300 + 90 = 390 mm below the tops; IPE 450's row at 385 mm would come out on it.
    const outcome = outcomeOf(topsInLine, [bars(["bottom"], "left")]);
    expect(outcome.kind === "outside-scope" && outcome.reason).toMatch(/same rows and gauge left and right/);
  });

  it("stand alone where the far flange is free, with half the relief at most", () => {
    const apart = onLighter(documentOf(bolted("IPE 450"), bolted("IPE 300"), 1200, [150, 150]));
    const alone = onLighter(documentOf(bolted("IPE 450"), null, 0, [150, 0]));
    const own = (document: NodeDocument, measure: MeasureInput) =>
      joint(evaluated(document, [measure]), "left").momentResistanceNmm;
    expect(own(apart, bars(["top"], "left"))).toBeCloseTo(own(alone, bars(["top"])), 3);
  });
});
