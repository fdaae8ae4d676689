"use client";
import dynamic from "next/dynamic";
import { useId } from "react";
import { Table, Td, Th } from "@/components/ui/table";
import { Loading } from "@/components/ui/states";
import type { StackedShares } from "./stacked-shares";

/* Loaded when a figure is first drawn, and only in the browser: the chart library is large and sets its sizes there. */
const Chart = dynamic(() => import("./stacked-chart"), {
  ssr: false,
  loading: () => <Loading what="the chart" />,
});
const Swatch = dynamic(() => import("./stacked-chart").then((module) => module.Swatch), { ssr: false });

export interface StackedFigureProps {
  readonly title: string;
  readonly note: string;
  readonly shares: StackedShares;
  readonly format: (value: number) => string;
  readonly label: (part: string) => string;
}

/** A chart of stacked bars and, beside it, the table it is drawn from. */
export function StackedFigure({ title, note, shares, format, label }: StackedFigureProps) {
  const id = useId().replace(/[^A-Za-z0-9]/g, "");
  if (shares.parts.length === 0) return null;
  return (
    <section aria-labelledby={`${id}t`} className="min-w-0">
      <h2 id={`${id}t`}>{title}</h2>
      <p className="mb-3 text-note text-soft">{note}</p>
      <div className="grid items-start gap-4">
        <Chart shares={shares} id={id} format={format} label={label} />
        <Table label={`${title}, in figures`} className="text-note">
          <thead>
            <tr>
              <Th>Part</Th>
              {shares.bars.map((bar) => (
                <Th key={bar.letter} className="text-right" title={bar.name}>
                  <abbr title={bar.name} className="no-underline">
                    {bar.letter}
                  </abbr>
                </Th>
              ))}
            </tr>
          </thead>
          <tbody>
            {shares.parts.map((part, index) => (
              <tr key={part}>
                <th
                  scope="row"
                  className="border-t border-rule px-3 py-1 text-left font-normal whitespace-nowrap"
                >
                  <Swatch index={index} id={id} />
                  {label(part)}
                </th>
                {shares.bars.map((bar) => (
                  <Td key={bar.letter} className="text-right whitespace-nowrap">
                    {format(bar.parts[part] ?? 0)}
                  </Td>
                ))}
              </tr>
            ))}
            <tr className="font-semibold">
              <th scope="row" className="border-t border-ink px-3 py-1 text-left">
                Sum
              </th>
              {shares.bars.map((bar) => (
                <Td key={bar.letter} className="border-t-ink text-right whitespace-nowrap">
                  {format(bar.total)}
                </Td>
              ))}
            </tr>
          </tbody>
        </Table>
      </div>
    </section>
  );
}
