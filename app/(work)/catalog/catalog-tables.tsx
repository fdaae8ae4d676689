import type { ReactNode } from "react";
import type { AngleRow, FastenerGradeRow, FastenerRow, SteelRow } from "@/lib/catalog/catalog";
import { Table, Td, Th } from "@/components/ui/table";
import { SourceNotes, sourcesOf } from "./source-notes";

interface FigureTableProps {
  readonly label: string;
  /** Name and unit of each column of figures; the name of a row stands before them, the number of its source behind. */
  readonly heads: readonly (readonly [name: string, unit: string])[];
  readonly rows: readonly {
    readonly key: string;
    readonly name: ReactNode;
    readonly figures: readonly (number | string | null)[];
    readonly source: string;
  }[];
}

/** Rows of figures, each with its name and its source. */
function FigureTable({ label, heads, rows }: FigureTableProps) {
  const sources = sourcesOf(rows);
  return (
    <div>
      <Table label={label} className="whitespace-nowrap">
        <thead>
          <tr>
            <Th>{label}</Th>
            {heads.map(([name, unit]) => (
              <Th key={name} className="text-right">
                {name}
                <span className="block font-normal text-soft">{unit}</span>
              </Th>
            ))}
            <Th className="text-right">Source</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.key} className="hover:bg-petrolwash">
              <th scope="row" className="border-t border-rule px-3 py-1.5 text-left align-top font-semibold">
                {row.name}
              </th>
              {row.figures.map((figure, index) => (
                <Td key={heads[index]?.[0]} className="text-right">
                  {figure ?? <span aria-label="none">–</span>}
                </Td>
              ))}
              <Td className="text-right text-soft">{sources.indexOf(row.source) + 1}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
      <SourceNotes sources={sources} />
    </div>
  );
}

/** Angles that cleats are cut from. */
export function AngleTable({ angles }: { readonly angles: readonly AngleRow[] }) {
  return (
    <FigureTable
      label="Angle"
      heads={[
        ["leg", "mm"],
        ["other leg", "mm"],
        ["thickness", "mm"],
        ["root radius", "mm"],
        ["toe radius", "mm"],
      ]}
      rows={angles.map((row) => ({
        key: row.designation,
        name: row.designation,
        figures: [row.legAMm, row.legBMm, row.thicknessMm, row.rootRadiusMm, row.toeRadiusMm],
        source: row.source,
      }))}
    />
  );
}

const TABLES = [
  ["product-standard", "Strengths of the product standards"],
  ["en1993-1-1-table-3.1", "Strengths of EN 1993-1-1, Table 3.1"],
] as const;

/** Strengths by thickness, one table for each set that a node may choose. */
export function SteelTable({ steels }: { readonly steels: readonly SteelRow[] }) {
  return (
    <div className="grid gap-6">
      {TABLES.map(([table, title]) => (
        <section key={table} className="grid gap-3">
          <h2>{title}</h2>
          <FigureTable
            label={table === "product-standard" ? "Grade" : "Grade (Table 3.1)"}
            heads={[
              ["over", "mm"],
              ["up to", "mm"],
              ["fy", "N/mm²"],
              ["fu", "N/mm²"],
            ]}
            rows={steels
              .filter((row) => row.table === table)
              .map((row) => ({
                key: `${row.grade} ${row.overMm}`,
                name: (
                  <>
                    {row.grade} <span className="font-normal text-soft">{row.standard}</span>
                  </>
                ),
                figures: [row.overMm, row.upToMm, row.yieldMpa, row.ultimateMpa],
                source: row.source,
              }))}
          />
        </section>
      ))}
    </div>
  );
}

const FASTENER_HEADS = [
  ["pitch", "mm"],
  ["stress area", "mm²"],
  ["hole", "mm"],
  ["across flats", "mm"],
  ["across points", "mm"],
  ["head", "mm"],
  ["nut", "mm"],
  ["washer", "mm"],
  ["HR, HV flats", "mm"],
  ["HR nut", "mm"],
  ["HV nut", "mm"],
  ["HR, HV washer", "mm"],
] as const;

/** Sizes of bolts and threaded bars with their nuts and washers, and the property classes. */
export function FastenerTable({
  fasteners,
  grades,
}: {
  readonly fasteners: readonly FastenerRow[];
  readonly grades: readonly FastenerGradeRow[];
}) {
  return (
    <div className="grid gap-6">
      <FigureTable
        label="Size"
        heads={FASTENER_HEADS}
        rows={fasteners.map((row) => ({
          key: row.size,
          name: row.size,
          figures: [
            row.pitchMm,
            row.stressAreaMm2,
            row.holeMm,
            row.acrossFlatsMm,
            row.acrossPointsMm,
            row.headHeightMm,
            row.nutHeightMm,
            `${row.washerDiameterMm} × ${row.washerThicknessMm}`,
            row.preloaded?.acrossFlatsMm ?? null,
            row.preloaded?.nutHeightMm ?? null,
            row.preloaded?.nutHeightHvMm ?? null,
            row.preloaded ? `${row.preloaded.washerDiameterMm} × ${row.preloaded.washerThicknessMm}` : null,
          ],
          source: row.source,
        }))}
      />
      <FigureTable
        label="Property class"
        heads={[
          ["fyb", "N/mm²"],
          ["fub", "N/mm²"],
          ["αv", "thread in shear"],
        ]}
        rows={grades.map((row) => ({
          key: row.name,
          name: row.name,
          figures: [row.yieldMpa, row.ultimateMpa, row.alphaV],
          source: row.source,
        }))}
      />
    </div>
  );
}
