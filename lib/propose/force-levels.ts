import type { Level, NodeCase } from "@/lib/calc/node";

export interface ForceLevels {
  readonly tension: readonly Level[];
  readonly compression: readonly Level[];
}

const inOrder = (levels: ReadonlySet<Level>): readonly Level[] =>
  (["top", "bottom"] as const).filter((level) => levels.has(level));

/**
 * At which beam flange levels the column is pulled and at which it is pushed, over all joints and
 * load cases. A moment with the beam's top flange in tension pulls at the top; a reversed one swaps
 * the levels, so one level may be both. A joint without moment does neither.
 */
export function forceLevels(node: NodeCase): ForceLevels {
  const tension = new Set<Level>();
  const compression = new Set<Level>();
  for (const loadCase of node.loadCases) {
    for (const { side } of node.joints) {
      const moment = loadCase[side]?.momentNmm ?? 0;
      if (moment === 0) continue;
      tension.add(moment > 0 ? "top" : "bottom");
      compression.add(moment > 0 ? "bottom" : "top");
    }
  }
  return { tension: inOrder(tension), compression: inOrder(compression) };
}
