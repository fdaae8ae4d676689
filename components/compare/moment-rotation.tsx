"use client";
import dynamic from "next/dynamic";
import { momentRotationCurve } from "@/lib/calc";
import type { JointDocument } from "@/lib/schemas/result-document";
import { formatNumber } from "@/components/ui/format-number";
import { Loading } from "@/components/ui/states";
import { Table, Td, Th } from "@/components/ui/table";

const Chart = dynamic(() => import("./moment-rotation-chart"), {
  ssr: false,
  loading: () => <Loading what="the chart" />,
});

/** One point in the units of the sheet. */
export interface CurvePoint {
  readonly momentKnm: number;
  readonly milliradians: number;
}

/** The moment that the load case asks for, from the joint's own check; null where it is above the resistance. */
function pointNow(joint: JointDocument, momentKnm: number | undefined): CurvePoint | null {
  if (momentKnm === undefined || joint.secantStiffness === null) return null;
  return { momentKnm, milliradians: (1000 * momentKnm) / joint.secantStiffness };
}

export interface MomentRotationProps {
  readonly joint: JointDocument;
  /** M_Ed of the load case, kNm. */
  readonly momentKnm: number | undefined;
}

/** How a joint turns under its moment, up to its resistance, as a chart and as a table. Nothing for results of older engines. */
export function MomentRotation({ joint, momentKnm }: MomentRotationProps) {
  if (joint.stiffnessExponent === undefined) return null;
  const points = momentRotationCurve(
    joint.momentResistance,
    joint.initialStiffness,
    joint.stiffnessExponent,
  ).map(({ momentNmm, rotationRad }) => ({ momentKnm: momentNmm, milliradians: 1000 * rotationRad }));
  return (
    <section aria-label="Moment and rotation" className="my-3 grid gap-2">
      <Chart points={points} now={pointNow(joint, momentKnm)} />
      <Table label="Moment and rotation, in figures" className="text-note">
        <thead>
          <tr>
            <Th>M, kNm</Th>
            {points.slice(1).map((point) => (
              <Td key={point.momentKnm} className="border-t-0 bg-paper text-right">
                {formatNumber(point.momentKnm)}
              </Td>
            ))}
          </tr>
        </thead>
        <tbody>
          <tr>
            <Th scope="row">Rotation, mrad</Th>
            {points.slice(1).map((point) => (
              <Td key={point.momentKnm} className="text-right">
                {formatNumber(point.milliradians, 1)}
              </Td>
            ))}
          </tr>
        </tbody>
      </Table>
    </section>
  );
}
