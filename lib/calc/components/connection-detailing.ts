import { weldLegMm } from "../measures/panel-design";
import type { EndPlateConnection } from "../node";
import type { ComponentCheck } from "../result";
import { isBoltedCase, type SideCase } from "../side-case";
import { detailAtLeast } from "./check";
import { cleatDetailing } from "./cleat-seat";
import { isCleatView } from "./cleat-view";
import { rowEnds } from "./column-flange";
import type { ColumnPanel } from "./column-panel";
import type { BoltedView } from "./connection-view";
import type { WeldedJoint } from "./welded-joint";

/** How much of the column's flange works behind a welded beam flange without a stiffener. 4.10(3). */
const breadthDetail = (joint: WeldedJoint): ComponentCheck =>
  detailAtLeast(
    {
      side: joint.view.joint.side,
      level: joint.view.tensionLevel,
      clause: "EN 1993-1-8, 4.10(3)",
      what: "breadth of column flange that works without a stiffener",
    },
    joint.leastBreadthMm,
    joint.flangeBreadthMm,
  );

/** Distances of the bolts of an end plate from edges, ends and one another. Table 3.3. */
function spacingDetails(
  view: BoltedView,
  { plate, bolts }: EndPlateConnection,
  columnFlangeWidthMm: number,
): ComponentCheck[] {
  const { side, beam } = view.joint;
  const holeMm = Math.max(...view.rows.map((row) => row.fastener.size.holeMm));
  const heights = view.rows.map((row) => row.belowTopMm).sort((a, b) => a - b);
  const pitches = heights.slice(1).map((height, index) => height - (heights[index] ?? 0));
  const above = (heights[0] ?? 0) + plate.extensionTopMm;
  const below = beam.section.depthMm + plate.extensionBottomMm - (heights[heights.length - 1] ?? 0);
  const outerMm = bolts.outerGaugeMm ?? view.gaugeMm;
  const edge = (Math.min(plate.widthMm, columnFlangeWidthMm) - outerMm) / 2;
  const least = (what: string, holes: number, actual: number): ComponentCheck =>
    detailAtLeast({ side, clause: "EN 1993-1-8, Table 3.3", what }, holes * holeMm, actual);
  const checks = [
    least("edge distance of the bolts, 1.2 d_0", 1.2, edge),
    least("end distance in the plate, 1.2 d_0", 1.2, Math.min(above, below)),
    least("gauge, 2.4 d_0", 2.4, view.gaugeMm),
  ];
  if (outerMm > view.gaugeMm)
    checks.push(least("inner to outer bolts, 2.4 d_0", 2.4, (outerMm - view.gaugeMm) / 2));
  const toColumnEnd = Math.min(
    ...view.rows.map((row) => {
      const { outwardMm, inwardMm } = rowEnds(view, row);
      return Math.min(outwardMm, inwardMm);
    }),
  );
  if (Number.isFinite(toColumnEnd))
    checks.push(least("end distance in the column's flange, 1.2 d_0", 1.2, toColumnEnd));
  if (pitches.length > 0)
    checks.push(least("distance between bolt rows, 2.2 d_0", 2.2, Math.min(...pitches)));
  return checks;
}

/** Washers that lie flat: clear of the column's root inside, and of the beam's welds on the plate. */
function washerDetails(
  view: BoltedView,
  connection: EndPlateConnection,
  panel: ColumnPanel,
): ComponentCheck[] {
  const { side, beam } = view.joint;
  const { section } = beam;
  const half = Math.max(...view.rows.map((row) => row.fastener.size.washerDiameterMm)) / 2;
  const besideRoot = (view.gaugeMm - panel.section.webThicknessMm) / 2 - panel.section.rootMm;
  const top = weldLegMm(connection.welds.topFlange);
  const bottom = weldLegMm(connection.welds.bottomFlange);
  const { flangeThicknessMm, depthMm } = section;
  const clearances = view.rows.map(({ belowTopMm }) =>
    Math.min(
      Math.max(-belowTopMm, belowTopMm - flangeThicknessMm) - top,
      Math.max(belowTopMm - depthMm, depthMm - flangeThicknessMm - belowTopMm) - bottom,
    ),
  );
  const isBesideWeb = view.rows.some(({ belowTopMm }) => belowTopMm > 0 && belowTopMm < depthMm);
  const besideWeb = isBesideWeb
    ? (view.gaugeMm - section.webThicknessMm) / 2 - weldLegMm(connection.welds.web)
    : Infinity;
  const clear = (what: string, actual: number): ComponentCheck =>
    detailAtLeast({ side, clause: "geometry", what }, half, Math.max(actual, 0));
  return [
    clear("washer flat on the column's flange", besideRoot),
    clear("washer clear of the beam and its welds", Math.min(besideWeb, ...clearances)),
  ];
}

/** Rules of bolts and of welded flanges that no load case changes. */
export function connectionDetailing(side: SideCase, panel: ColumnPanel): ComponentCheck[] {
  if (!isBoltedCase(side)) {
    const { joint } = side.model;
    return joint.stiffener ? [] : [breadthDetail(joint)];
  }
  const { view } = side.model.joint;
  const { connection } = view.joint;
  if (isCleatView(view)) return cleatDetailing(view, panel.section.widthMm);
  return connection.kind === "end-plate"
    ? [...spacingDetails(view, connection, panel.section.widthMm), ...washerDetails(view, connection, panel)]
    : [];
}
