import { evaluateOption } from "@/lib/calc";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import { parseNodeDocument } from "@/lib/evaluation/resolve-node-document";
import { resolveNodeCase } from "@/lib/evaluation/resolve-node-case";
import type { NodeDocument } from "@/lib/schemas/node-document";
import demo from "@/seeders/data/demo-nodes.json";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";
import { flatBareResistances, flatInputOf } from "./flat-arithmetic";

/**
 * `npm run bench`: speed of the calculation on this machine, each figure a median of one run, ratios within that run.
 * Fails (exit 1) where a stated limit is not met.
 */
const CASES = 10;
const catalog = loadSeedCatalog();
const prices = loadSeedPrices();

const side = {
  beam: { section: "IPE 450", steel: "S355", span: 7500 },
  connection: {
    kind: "end-plate" as const,
    plate: { steel: "S355", thickness: 20, width: 200, extensionTop: 90, extensionBottom: 30 },
    bolts: { size: "M24", grade: "10.9", gauge: 120, rows: [-45, 65, 385] },
    welds: { topFlange: 8, bottomFlange: 6, web: 5 },
  },
};

const twoSided: NodeDocument = {
  reference: "bench",
  basis: "EN 1993-1-8:2005",
  partialFactors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  column: { section: "HE 300 A", steel: "S355", storeyHeight: 3600 },
  left: side,
  right: side,
  loadCases: Array.from({ length: CASES }, (_, index) => ({
    name: `Case ${index + 1}`,
    left: { moment: 150 + 8 * index, axialForce: 0, shear: 120 },
    right: { moment: index === 0 ? 0 : 225 - 12 * index, axialForce: 0, shear: 110 },
    column: { axialForce: 900, momentAbove: 20, momentBelow: -20, shearAbove: 8, shearBelow: -8 },
  })),
  frame: { bracing: "unbraced" },
  target: { utilisation: 1, stiffness: "any" },
  quantity: 12,
};

/** The demo node that only a combination saves, two-sided, under as many load cases: every combination is looked at. */
function combined(): NodeDocument {
  const parsed = parseNodeDocument(demo.nodes[0]?.document);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
  const { loadCases } = parsed.document;
  const scaled = (actions: NonNullable<NodeDocument["loadCases"][number]["left"]>, factor: number) => ({
    ...actions,
    moment: actions.moment * factor,
  });
  return {
    ...parsed.document,
    loadCases: Array.from({ length: CASES }, (_, index) => {
      const own = loadCases[index % loadCases.length];
      if (!own?.left || !own.right) throw new Error("the demo node is two-sided");
      const factor = 1 - 0.01 * index;
      return {
        ...own,
        name: `Case ${index + 1}`,
        left: scaled(own.left, factor),
        right: scaled(own.right, factor),
      };
    }),
  };
}

function resolved(document: NodeDocument) {
  const node = resolveNodeCase(document, catalog);
  if (!node.ok) throw new Error(JSON.stringify(node.errors));
  return node.node;
}

function medianMs(rounds: number, perRound: number, work: () => void): number {
  const times: number[] = [];
  for (let round = 0; round < rounds; round += 1) {
    const began = performance.now();
    for (let turn = 0; turn < perRound; turn += 1) work();
    times.push((performance.now() - began) / perRound);
  }
  return times.sort((a, b) => a - b)[Math.floor(rounds / 2)] ?? NaN;
}

const failures: string[] = [];

function report(what: string, value: number, unit: string, limit?: number): void {
  const isMet = limit === undefined || value <= limit;
  const verdict =
    limit === undefined
      ? ""
      : isMet
        ? `  (limit ${limit} ${unit}: met)`
        : `  (limit ${limit} ${unit}: NOT MET)`;
  process.stdout.write(`${what.padEnd(66)} ${value.toPrecision(4).padStart(9)} ${unit}${verdict}\n`);
  if (!isMet) failures.push(what);
}

/** The evaluator and the flat arithmetic have to agree before their times may be compared. */
function checkAgreement(node: ReturnType<typeof resolved>): void {
  const outcome = evaluateOption(node, []);
  if (outcome.kind !== "evaluated") throw new Error(outcome.reason);
  const flat = flatBareResistances(flatInputOf(node));
  outcome.joints.forEach((joint, index) => {
    for (const [name, own, other] of [
      ["M_j,Rd", joint.momentResistanceNmm, flat[index]?.momentResistanceNmm ?? NaN],
      ["S_j,ini", joint.initialStiffnessNmmPerRad, flat[index]?.initialStiffnessNmmPerRad ?? NaN],
    ] as const) {
      if (!(Math.abs(own - other) <= 1e-9 * Math.abs(own))) {
        throw new Error(`${name} differs from the flat arithmetic in joint ${index}: ${own} and ${other}`);
      }
    }
  });
}

/** Memory after each thousand of ten thousand nodes; flat = the last no more than a tenth above the second. */
function memoryOverNodes(node: ReturnType<typeof resolved>): {
  readonly earlyMb: number;
  readonly lateMb: number;
} {
  const collect = (globalThis as { gc?: () => void }).gc;
  const readings: number[] = [];
  for (let thousand = 0; thousand < 10; thousand += 1) {
    for (let turn = 0; turn < 1000; turn += 1) {
      const factor = 1 + turn / 10_000;
      evaluateOption({ ...node, target: { ...node.target, utilisation: factor } }, []);
    }
    collect?.();
    readings.push(process.memoryUsage().heapUsed / 2 ** 20);
  }
  return { earlyMb: readings[1] ?? NaN, lateMb: readings[9] ?? NaN };
}

const node = resolved(twoSided);
checkAgreement(node);
const input = flatInputOf(node);
for (let turn = 0; turn < 500; turn += 1) {
  evaluateOption(node, []);
  flatBareResistances(input);
}
const flatMs = medianMs(41, 20, () => void flatBareResistances(input));
const optionMs = medianMs(41, 10, () => void evaluateOption(node, []));
report("flat arithmetic of the same formulas, 10 load cases", flatMs, "ms");
report("one option, 10 load cases, no working", optionMs, "ms", 1.5);
report("ratio of the two", optionMs / flatMs, "times", 5);
const shop = { catalog, prices };
for (const [what, document, limitMs] of [
  ["proposal where no combination is needed, two sides, 10 load cases", twoSided, 150],
  ["full proposal with combinations, two sides, 10 load cases", combined(), 300],
] as const) {
  for (let turn = 0; turn < 5; turn += 1) evaluateDocument(document, shop, { steps: "none" });
  report(
    what,
    medianMs(21, 1, () => void evaluateDocument(document, shop, { steps: "none" })),
    "ms",
    limitMs,
  );
}
report(
  "one option with all its working",
  medianMs(11, 5, () => void evaluateOption(node, [], { steps: true })),
  "ms",
);
const memory = memoryOverNodes(node);
report("heap after 2,000 nodes", memory.earlyMb, "MB");
report("heap after 10,000 nodes, against after 2,000", memory.lateMb / memory.earlyMb, "times", 1.1);
if (failures.length > 0) {
  process.stdout.write(`Not met: ${failures.join("; ")}\n`);
  process.exitCode = 1;
}
