import { detailAtLeast, detailAtMost } from "../components/check";
import type { ColumnPanel } from "../components/column-panel";
import { levelOfRow } from "../components/connection-view";
import { isBolted, type BoltedModel, type JointModel } from "../joint-model";
import { columnBeyondMm } from "../mechanics/panel-levels";
import type { JointCase, Level, NodeCase, Side } from "../node";
import { OutsideScope } from "../outcome";
import type { ComponentCheck } from "../result";
import { placedAt, type ApplyMeasure, type BackingPlates, type PanelDesign } from "./panel-design";

const SIDES: readonly Side[] = ["left", "right"];
const LEVELS: readonly Level[] = ["top", "bottom"];

/** Loose plates behind the column flange, one on each side of the web. EN 1993-1-8:2005, 6.2.4.3. */
export const applyBackingPlates: ApplyMeasure<BackingPlates> = (design, measure) => ({
  ...design,
  backing: placedAt(design.backing, measure.at ?? "both", measure.levels, measure),
});

const rowsAt = (joint: JointCase, level: Level): readonly number[] => {
  const { connection, beam } = joint;
  if (connection.kind !== "end-plate") {
    throw new OutsideScope("backing plates are evaluated behind bolted end plates only (6.2.4.3)");
  }
  return connection.bolts.rowsMm.filter((row) => levelOfRow(row, beam.section.depthMm) === level);
};

/** @throws OutsideScope where a plate has no bolts to hold it, or bars whose nuts the bar model wants on the bare flange. */
export function refuseUnheldBacking(node: NodeCase, design: PanelDesign): void {
  for (const side of SIDES) {
    for (const level of LEVELS) {
      const plate = design.backing[side][level];
      if (!plate) continue;
      const joint = node.joints.find((candidate) => candidate.side === side);
      if (!joint) {
        if (plate.at !== side) continue;
        throw new OutsideScope(
          `there is no beam on the ${side} whose flange a backing plate could stand behind`,
        );
      }
      if (rowsAt(joint, level).length === 0) {
        throw new OutsideScope(`there is no bolt row at the ${level} level to hold a backing plate`);
      }
      if (design.bars[side][level]) {
        throw new OutsideScope(
          `the bar model knows inner nuts on the bare column flange only: no backing plate under them at the ${level}`,
        );
      }
    }
  }
}

/** Outer rows of a level and ends of the plate behind them, below the outer face of the beam's top flange. */
export interface BackingReach {
  readonly firstRowMm: number;
  readonly lastRowMm: number;
  readonly fromMm: number;
  readonly toMm: number;
}

/** The plate lies evenly about the rows of its level. */
export function backingReach(joint: JointCase, plate: BackingPlates, level: Level): BackingReach {
  const rows = rowsAt(joint, level);
  const firstRowMm = Math.min(...rows);
  const lastRowMm = Math.max(...rows);
  const middle = (firstRowMm + lastRowMm) / 2;
  return {
    firstRowMm,
    lastRowMm,
    fromMm: middle - plate.lengthMm / 2,
    toMm: middle + plate.lengthMm / 2,
  };
}

function detailingAt(
  node: NodeCase,
  panel: ColumnPanel,
  model: BoltedModel,
  plate: BackingPlates,
  level: Level,
): ComponentCheck[] {
  const { view } = model.joint;
  const { section } = panel;
  const { joint } = view;
  const head = { side: joint.side, level };
  const toToe = (section.widthMm - section.webThicknessMm) / 2 - section.rootMm;
  const reach = backingReach(joint, plate, level);
  const diameter = Math.max(
    ...view.rows.filter((row) => row.level === level).map((row) => row.fastener.size.diameterMm),
  );
  const column = columnBeyondMm(node, joint);
  const beyond = [
    { out: -reach.fromMm, end: column.top },
    { out: reach.toMm - joint.beam.section.depthMm, end: column.bottom },
  ];
  return [
    detailAtMost(
      { ...head, clause: "EN 1993-1-8, 6.2.4.3(2)", what: "gap from backing plate to root toe, 3 mm" },
      Math.max(0, toToe - plate.widthMm),
      LARGEST_GAP_MM,
    ),
    detailAtMost(
      { ...head, clause: "geometry", what: "backing plate clear of the root" },
      plate.widthMm,
      toToe,
    ),
    detailAtLeast(
      { ...head, clause: "EN 1993-1-8, 6.2.4.3(3)", what: "backing plate beyond the outer rows, 2 d" },
      2 * diameter,
      Math.max(0, reach.firstRowMm - reach.fromMm),
    ),
    ...beyond.flatMap(({ out, end }) =>
      !Number.isFinite(end) || out <= 0
        ? []
        : [
            detailAtMost(
              { ...head, clause: "geometry", what: "backing plate within the column's end" },
              out,
              end,
            ),
          ],
    ),
  ];
}

/** EN 1993-1-8:2005, 6.2.4.3(2): how far the plate may end from the toe of root radius or weld. */
const LARGEST_GAP_MM = 3;

/** Detailing of every backing plate. EN 1993-1-8:2005, 6.2.4.3. */
export function backingDetailing(
  node: NodeCase,
  design: PanelDesign,
  panel: ColumnPanel,
  models: readonly JointModel[],
): ComponentCheck[] {
  return SIDES.flatMap((side) => {
    const model = models.find((candidate) => candidate.joint.view.joint.side === side);
    if (!model || !isBolted(model)) return [];
    return LEVELS.flatMap((level) => {
      const plate = design.backing[side][level];
      return plate ? detailingAt(node, panel, model, plate, level) : [];
    });
  });
}
