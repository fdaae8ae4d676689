"use client";
import {
  Bar,
  BarChart,
  CartesianGrid,
  ReferenceLine,
  ResponsiveContainer,
  Tooltip,
  XAxis,
  YAxis,
} from "recharts";
import type { StackedShares } from "./stacked-shares";

/** Fills told apart by tone and by hatch, in the order of the parts. */
const FILLS = [
  { tone: "var(--petrol)", isHatched: false },
  { tone: "var(--added)", isHatched: true },
  { tone: "var(--steel2)", isHatched: false },
  { tone: "var(--petrol)", isHatched: true },
  { tone: "var(--added)", isHatched: false },
  { tone: "var(--steel)", isHatched: true },
  { tone: "var(--tight)", isHatched: false },
  { tone: "var(--ink)", isHatched: true },
] as const;

const fillOf = (index: number, id: string): string => {
  const fill = FILLS[index % FILLS.length];
  return fill?.isHatched ? `url(#${id}${index % FILLS.length})` : (fill?.tone ?? "var(--steel)");
};

function Hatches({ id }: { readonly id: string }) {
  return (
    <defs>
      {FILLS.map((fill, index) =>
        fill.isHatched ? (
          <pattern
            key={index}
            id={`${id}${index}`}
            width="5"
            height="5"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <rect width="5" height="5" fill="var(--sheet)" />
            <rect width="2.4" height="5" fill={fill.tone} />
          </pattern>
        ) : null,
      )}
    </defs>
  );
}

/** A sample of a part's fill, for the key in the table beside the chart. */
export function Swatch({ index, id }: { readonly index: number; readonly id: string }) {
  return (
    <svg aria-hidden="true" width="14" height="10" className="mr-1.5 inline-block">
      <Hatches id={`${id}s${index}`} />
      <rect
        width="14"
        height="10"
        fill={fillOf(index, `${id}s${index}`)}
        stroke="var(--ink)"
        strokeWidth="0.7"
      />
    </svg>
  );
}

export interface StackedChartProps {
  readonly shares: StackedShares;
  readonly id: string;
  readonly format: (value: number) => string;
  readonly label: (part: string) => string;
}

const TICK = { fill: "var(--soft)", fontSize: 12 };

/** One bar an option, its parts stacked; the table beside it says the same in figures. Hidden from screen readers for that reason. */
export default function StackedChart({ shares, id, format, label }: StackedChartProps) {
  const rows = shares.bars.map((bar) => ({
    letter: bar.letter,
    ...Object.fromEntries(shares.parts.map((part) => [part, bar.parts[part] ?? 0])),
  }));
  return (
    <div aria-hidden="true" style={{ height: 40 + 30 * rows.length }}>
      <ResponsiveContainer width="100%" height="100%">
        <BarChart
          data={rows}
          layout="vertical"
          stackOffset="sign"
          barCategoryGap={6}
          margin={{ top: 0, right: 12, bottom: 0, left: 0 }}
          accessibilityLayer={false}
        >
          <Hatches id={id} />
          <CartesianGrid horizontal={false} stroke="var(--rule)" />
          <XAxis type="number" tickFormatter={format} tick={TICK} stroke="var(--rule2)" />
          <YAxis
            type="category"
            dataKey="letter"
            width={28}
            tick={{ fill: "var(--ink)", fontSize: 13, fontWeight: 600 }}
            stroke="var(--ink)"
            tickLine={false}
            interval={0}
          />
          <ReferenceLine x={0} stroke="var(--ink)" />
          <Tooltip
            formatter={(value, part) => [format(Number(value)), label(String(part))]}
            cursor={{ fill: "var(--petrolwash)" }}
            contentStyle={{
              background: "var(--sheet)",
              border: "1px solid var(--ink)",
              borderRadius: 0,
              color: "var(--ink)",
            }}
            itemStyle={{ color: "var(--ink)" }}
            isAnimationActive={false}
          />
          {shares.parts.map((part, index) => (
            <Bar
              key={part}
              dataKey={part}
              stackId="all"
              fill={fillOf(index, id)}
              stroke="var(--sheet)"
              strokeWidth={0.8}
              isAnimationActive={false}
            />
          ))}
        </BarChart>
      </ResponsiveContainer>
    </div>
  );
}
