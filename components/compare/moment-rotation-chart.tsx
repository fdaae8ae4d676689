"use client";
import { CartesianGrid, Line, LineChart, ReferenceDot, XAxis, YAxis } from "recharts";
import { formatNumber } from "@/components/ui/format-number";
import type { CurvePoint } from "./moment-rotation";

export interface MomentRotationChartProps {
  readonly points: readonly CurvePoint[];
  /** Where the load case stands on the curve; null above the resistance. */
  readonly now: CurvePoint | null;
}

const WIDTH = 420;
const HEIGHT = 200;

/** The curve itself; the table beside it says the same in figures. */
export default function MomentRotationChart({ points, now }: MomentRotationChartProps) {
  return (
    <div aria-hidden="true" className="max-w-full overflow-hidden">
      <LineChart
        width={WIDTH}
        height={HEIGHT}
        data={[...points]}
        margin={{ top: 8, right: 16, bottom: 18, left: 8 }}
      >
        <CartesianGrid stroke="var(--rule)" />
        <XAxis
          dataKey="milliradians"
          type="number"
          domain={[0, "dataMax"]}
          tickFormatter={(value: number) => formatNumber(value, 1)}
          tick={{ fill: "var(--soft)", fontSize: 12 }}
          label={{
            value: "mrad",
            position: "insideBottomRight",
            offset: -8,
            fill: "var(--soft)",
            fontSize: 12,
          }}
        />
        <YAxis
          dataKey="momentKnm"
          type="number"
          tickFormatter={(value: number) => formatNumber(value)}
          tick={{ fill: "var(--soft)", fontSize: 12 }}
          label={{ value: "kNm", position: "insideTopLeft", offset: -2, fill: "var(--soft)", fontSize: 12 }}
        />
        <Line
          type="linear"
          dataKey="momentKnm"
          stroke="var(--petrol)"
          strokeWidth={2}
          dot={false}
          isAnimationActive={false}
        />
        {now ? (
          <ReferenceDot
            x={now.milliradians}
            y={now.momentKnm}
            r={4}
            fill="var(--ink)"
            stroke="var(--sheet)"
          />
        ) : null}
      </LineChart>
    </div>
  );
}
