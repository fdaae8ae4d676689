import type { MeasureCase, NodeCase, Side, Weld } from "@/lib/calc/node";
import type { Shape } from "./design-space";
import type { Stock } from "./stock";

/** Flats are cut to whole steps of 5 mm (common practice, no source). */
const CUT_STEP_MM = 5;
/** EN 1993-1-5:2006, 9.2.1(8), as section 0 of the method has it. */
const OUTSTAND_LIMIT = 14;
/** Part of a plate's width beyond the root that is worth welding to a flange (common practice, no source). */
const LEAST_BEYOND_ROOT_MM = 20;
/** A diagonal thicker than this many column webs is a different column (common practice, no source). */
const THICKEST_WEBS = 2.5;

const roundDown = (value: number): number => Math.floor(value / CUT_STEP_MM + 1e-9) * CUT_STEP_MM;

/** Widths worth trying, mm: the whole flange, and what ends before the nuts. */
function widthsMm(node: NodeCase): readonly number[] {
  const { section } = node.column;
  const half = (section.widthMm - section.webThicknessMm) / 2;
  const besideNuts = node.joints.map(({ connection }) =>
    connection.kind === "end-plate"
      ? (connection.bolts.gaugeMm - section.webThicknessMm - connection.bolts.size.acrossPointsMm) / 2
      : half,
  );
  const widths = [Math.min(half, ...besideNuts), half].map(roundDown);
  return [...new Set(widths)].filter((width) => width >= section.rootMm + LEAST_BEYOND_ROOT_MM);
}

/** Every stock shape of diagonal stiffeners, single or in a K, leaning either way. */
export function diagonalSpace(node: NodeCase, stock: Stock): readonly Shape[] {
  const { webThicknessMm } = node.column.section;
  const own: Side = node.joints[0]?.side ?? "left";
  // First the one whose top end keeps away from a lone beam's tension bolts.
  const sides: readonly Side[] = own === "left" ? ["right", "left"] : ["left", "right"];
  const welds: readonly Weld[] = [
    ...stock.throatsMm
      .filter((throat) => throat >= 3)
      .map((throatMm) => ({ kind: "fillet" as const, throatMm })),
    { kind: "butt" },
  ];
  return stock.plates
    .filter(({ thicknessMm }) => thicknessMm >= 8 && thicknessMm <= THICKEST_WEBS * webThicknessMm)
    .flatMap(({ thicknessMm, steel }) =>
      widthsMm(node)
        .filter((width) => width <= OUTSTAND_LIMIT * Math.sqrt(235 / steel.yieldMpa) * thicknessMm)
        .flatMap((widthMm) =>
          (["single", "k"] as const).flatMap((arrangement) =>
            sides.map((towards) => ({
              ladders: [welds.length],
              build: ([step]: readonly number[]): readonly MeasureCase[] => [
                {
                  kind: "diagonal-stiffeners" as const,
                  arrangement,
                  towards,
                  thicknessMm,
                  widthMm,
                  steel,
                  weld: welds[step ?? 0] ?? { kind: "butt" as const },
                },
              ],
            })),
          ),
        ),
    );
}
