import {
  meshSection,
  type ColumnSection,
  type Fineness,
  type Point,
  type Quad,
  type SectionMesh,
} from "./section-mesh";

/** Size of a bar: what it presses on and how stiff it is. */
export interface BarSize {
  readonly name: string;
  readonly stressAreaMm2: number;
  readonly holeMm: number;
  readonly acrossFlatsMm: number;
  readonly acrossPointsMm: number;
  readonly nutHeightMm: number;
}

/** A brick's eight nodes, numbered from 1. */
export type Brick = readonly number[];

/** Part of a nut's pressure that comes on one node; the parts of a nut add up to 1. */
export interface NodeShare {
  readonly node: number;
  readonly share: number;
}

export interface StubMesh {
  /** x, y, z of node 1, 2, ... */
  readonly nodes: readonly (readonly [number, number, number])[];
  readonly bricks: readonly Brick[];
  /** Numbers of the bricks of the web at the toe of the fillet next to the row, at the upper flange. */
  readonly webRoot: readonly number[];
  /** The nut on the inside of the upper flange (y > 0), and of the lower one in a full depth. */
  readonly nuts: readonly (readonly NodeShare[])[];
}

/** Half the length of the stub in column depths: more than the 1.6 the model asks for. */
const HALF_LENGTH_DEPTHS = 2.5;
const FINE_TO_MM = 60;
const GROWTH = 1.25;
const COARSEST_MM = 30;

/** Heights above the row, mm: equal steps beside the nut, then growing ones. */
export function heightsMm(depthMm: number, sizeMm: number): number[] {
  const steps = Math.round(FINE_TO_MM / sizeMm);
  const heights = Array.from({ length: steps + 1 }, (_, i) => (FINE_TO_MM * i) / steps);
  const end = HALF_LENGTH_DEPTHS * depthMm;
  let step = sizeMm;
  for (let z = FINE_TO_MM; z < end - COARSEST_MM / 2;) {
    step = Math.min(COARSEST_MM, step * GROWTH);
    z = Math.min(end, z + step);
    heights.push(z);
  }
  return heights;
}

/** Points a side of a face at which it is asked whether the nut presses there. */
const SAMPLES = 24;

interface Face {
  readonly nodes: readonly [number, number, number, number];
  readonly x: readonly [number, number];
  readonly z: readonly [number, number];
}

/** What the annulus between hole and nut edge brings to the nodes of a rectangular face, mm2. */
function addPressure(onto: Map<number, number>, face: Face, gaugeMm: number, bar: BarSize): void {
  const [x0, x1] = face.x;
  const [z0, z1] = face.z;
  const cell = ((x1 - x0) * (z1 - z0)) / SAMPLES ** 2;
  for (let i = 0; i < SAMPLES; i += 1) {
    for (let j = 0; j < SAMPLES; j += 1) {
      const [s, t] = [(i + 0.5) / SAMPLES, (j + 0.5) / SAMPLES];
      const radius = Math.hypot(x0 + (x1 - x0) * s - gaugeMm / 2, z0 + (z1 - z0) * t);
      if (radius < bar.holeMm / 2 || radius > bar.acrossFlatsMm / 2) continue;
      const shape = [(1 - s) * (1 - t), s * (1 - t), s * t, (1 - s) * t];
      shape.forEach((part, n) => onto.set(face.nodes[n]!, (onto.get(face.nodes[n]!) ?? 0) + part * cell));
    }
  }
}

function nutShares(faces: readonly Face[], gaugeMm: number, bar: BarSize): NodeShare[] {
  const areas = new Map<number, number>();
  for (const face of faces) addPressure(areas, face, gaugeMm, bar);
  const total = [...areas.values()].reduce((sum, area) => sum + area, 0);
  return [...areas].map(([node, area]) => ({ node, share: area / total }));
}

/** What is meshed: half the depth from mid-depth to one face, or both flanges; with or without the bolt hole. */
export interface StubPlan {
  readonly section: ColumnSection;
  readonly gaugeMm: number;
  readonly bar: BarSize;
  readonly depth: "half" | "full";
  /** Bricks whose middle lies in the hole are left out, so its edge is stepped. */
  readonly isHoleCut: boolean;
}

/** Grows a stub brick by brick; a node exists once a brick asks for it. */
class StubBuilder {
  readonly nodes: (readonly [number, number, number])[] = [];
  readonly bricks: Brick[] = [];
  readonly webRoot: number[] = [];
  private readonly numbers = new Map<string, number>();
  private readonly heights: readonly number[];
  private readonly flat: SectionMesh;
  private readonly innerMm: number;

  constructor(
    private readonly plan: StubPlan,
    fineness: Fineness,
  ) {
    this.flat = meshSection(plan.section, fineness);
    this.heights = heightsMm(plan.section.depthMm, fineness.sizeMm);
    this.innerMm = plan.section.depthMm / 2 - plan.section.flangeMm;
  }

  private numberOf(point: number, layer: number, sign: number): number {
    const [x, y] = this.flat.points[point]!;
    const key = `${point} ${layer} ${y < 1e-6 ? 0 : sign}`;
    const known = this.numbers.get(key);
    if (known !== undefined) return known;
    this.nodes.push([x, sign * y, this.heights[layer]!]);
    this.numbers.set(key, this.nodes.length);
    return this.nodes.length;
  }

  private isInHole(corners: readonly Point[], layer: number): boolean {
    const mean = (axis: 0 | 1): number => corners.reduce((sum, corner) => sum + corner[axis], 0) / 4;
    const z = (this.heights[layer]! + this.heights[layer + 1]!) / 2;
    const radius = Math.hypot(mean(0) - this.plan.gaugeMm / 2, z);
    return this.plan.isHoleCut && mean(1) > this.innerMm && radius < this.plan.bar.holeMm / 2;
  }

  /** The face of a brick on the inside of the flange; null where it has none. */
  private innerFace(quad: Quad, layer: number, sign: number): Face | null {
    const [left, right] = [this.flat.points[quad[0]]!, this.flat.points[quad[1]]!];
    const isInside = [left, right].every((corner) => Math.abs(corner[1] - this.innerMm) < 1e-6);
    if (!isInside) return null;
    return {
      nodes: [
        this.numberOf(quad[0], layer, sign),
        this.numberOf(quad[1], layer, sign),
        this.numberOf(quad[1], layer + 1, sign),
        this.numberOf(quad[0], layer + 1, sign),
      ],
      x: [left[0], right[0]],
      z: [this.heights[layer]!, this.heights[layer + 1]!],
    };
  }

  /** The half on one side of mid-depth. Returns what its nut brings to the nodes. */
  addHalf(sign: 1 | -1): NodeShare[] {
    const toe = this.innerMm - this.plan.section.rootMm;
    const faces: Face[] = [];
    for (let layer = 0; layer + 1 < this.heights.length; layer += 1) {
      for (const quad of this.flat.quads) {
        const corners = quad.map((point) => this.flat.points[point]!);
        if (this.isInHole(corners, layer)) continue;
        const ordered = sign === 1 ? quad : quad.toReversed();
        this.bricks.push(
          [layer, layer + 1].flatMap((at) => ordered.map((point) => this.numberOf(point, at, sign))),
        );
        const isAtToe = sign === 1 && layer === 0 && Math.abs(corners[2]![1] - toe) < 1e-6;
        if (isAtToe) this.webRoot.push(this.bricks.length);
        const face = this.innerFace(quad, layer, sign);
        if (face) faces.push(face);
      }
    }
    return nutShares(faces, this.plan.gaugeMm, this.plan.bar);
  }
}

/** One side of the web, above the row, in bricks. */
export function meshStub(plan: StubPlan, fineness: Fineness): StubMesh {
  const builder = new StubBuilder(plan, fineness);
  const sides = plan.depth === "half" ? ([1] as const) : ([1, -1] as const);
  const nuts = sides.map((sign) => builder.addHalf(sign));
  return { nodes: builder.nodes, bricks: builder.bricks, webRoot: builder.webRoot, nuts };
}
