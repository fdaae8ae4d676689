/** The quarter cross-section of a rolled I-section in quadrilaterals: half the web, half of one flange, the root fillet as an arc. */

export interface ColumnSection {
  readonly name: string;
  readonly depthMm: number;
  readonly widthMm: number;
  readonly webMm: number;
  readonly flangeMm: number;
  readonly rootMm: number;
}

export type Point = readonly [number, number];

/** Numbers of the four points, counter-clockwise. */
export type Quad = readonly [number, number, number, number];

/** x across the flange from the middle of the web, y along the depth from mid-depth. */
export interface SectionMesh {
  readonly points: readonly Point[];
  readonly quads: readonly Quad[];
}

/** How fine: elements through the flange and half the web, along half the fillet, and their size elsewhere. */
export interface Fineness {
  readonly throughFlange: number;
  readonly throughHalfWeb: number;
  readonly alongHalfFillet: number;
  readonly sizeMm: number;
}

/** Tilt of the two cuts at the middle of the fillet: makes its three angles 60 degrees each. */
const CUT_TILT = Math.tan(Math.PI / 12);

type Curve = (t: number) => Point;

const straight =
  (from: Point, to: Point): Curve =>
  (t) => [from[0] + (to[0] - from[0]) * t, from[1] + (to[1] - from[1]) * t];

/** Collects blocks of quadrilaterals and joins them where their points coincide. */
class Patchwork implements SectionMesh {
  readonly points: Point[] = [];
  readonly quads: Quad[] = [];
  private readonly known = new Map<string, number>();

  private indexOf(point: Point): number {
    const key = `${point[0].toFixed(5)} ${point[1].toFixed(5)}`;
    const found = this.known.get(key);
    if (found !== undefined) return found;
    this.points.push(point);
    this.known.set(key, this.points.length - 1);
    return this.points.length - 1;
  }

  /** A block between a start and an end curve, straight from one to the other. `along` and `across` run from 0 to 1. */
  add(start: Curve, end: Curve, along: readonly number[], across: readonly number[]): void {
    const rows = across.map((s) =>
      along.map((t) => {
        const [a, b] = [start(t), end(t)];
        return this.indexOf([a[0] + (b[0] - a[0]) * s, a[1] + (b[1] - a[1]) * s]);
      }),
    );
    for (let j = 0; j + 1 < across.length; j += 1) {
      for (let i = 0; i + 1 < along.length; i += 1) {
        this.quads.push([rows[j]![i]!, rows[j]![i + 1]!, rows[j + 1]![i + 1]!, rows[j + 1]![i]!]);
      }
    }
  }
}

/** 0 to 1 in equal parts. */
export const equalParts = (count: number): number[] => Array.from({ length: count + 1 }, (_, i) => i / count);

/** The quarter section. Every block is given counter-clockwise: along x, across y. */
export function meshSection(section: ColumnSection, fineness: Fineness): SectionMesh {
  const { rootMm: root } = section;
  const halfWeb = section.webMm / 2;
  const top = section.depthMm / 2;
  const inner = top - section.flangeMm;
  const toe = inner - root;
  const fillet =
    (fromDegrees: number, toDegrees: number): Curve =>
    (t) => {
      const angle = ((fromDegrees + (toDegrees - fromDegrees) * t) * Math.PI) / 180;
      return [halfWeb + root - root * Math.cos(angle), toe + root * Math.sin(angle)];
    };
  const middle = fillet(0, 45)(1);
  const onWeb: Point = [0, middle[1] + middle[0] * CUT_TILT];
  const onFace: Point = [middle[0] - (top - middle[1]) * CUT_TILT, top];
  const ofWeb = equalParts(fineness.throughHalfWeb);
  const ofFlange = equalParts(fineness.throughFlange);
  const ofFillet = equalParts(fineness.alongHalfFillet);
  const parts = (lengthMm: number): number[] =>
    equalParts(Math.max(2, Math.round(lengthMm / fineness.sizeMm)));

  const mesh = new Patchwork();
  mesh.add(straight([0, 0], [halfWeb, 0]), straight([0, toe], [halfWeb, toe]), ofWeb, parts(toe));
  // From the web to the node: the right edge follows the fillet, so each level has its own width.
  for (let j = 0; j < fineness.alongHalfFillet; j += 1) {
    const level = (t: number): Curve => straight(straight([0, toe], onWeb)(t), fillet(0, 45)(t));
    mesh.add(level(ofFillet[j]!), level(ofFillet[j + 1]!), ofWeb, [0, 1]);
  }
  mesh.add(straight(onWeb, middle), straight([0, top], onFace), ofWeb, ofFlange);
  mesh.add(fillet(45, 90), straight(onFace, [halfWeb + root, top]), ofFillet, ofFlange);
  const edge = section.widthMm / 2;
  mesh.add(
    straight([halfWeb + root, inner], [edge, inner]),
    straight([halfWeb + root, top], [edge, top]),
    parts(edge - halfWeb - root),
    ofFlange,
  );
  return mesh;
}
