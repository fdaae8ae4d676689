"use client";
import { useState } from "react";
import { sectionProperties } from "@/lib/calc/mechanics/section-properties";
import { SECTION_FAMILIES, type SectionFamily, type SectionRow } from "@/lib/catalog/catalog";
import { sectionKey } from "@/lib/catalog/find-section";
import { sectionToCase } from "@/lib/evaluation/resolve-parts";
import { SelectField, TextField } from "@/components/ui/field";
import { formatFigures } from "@/components/ui/format-number";
import { Empty } from "@/components/ui/states";
import { Table, Td, Th } from "@/components/ui/table";
import { SourceNotes, sourcesOf } from "./source-notes";

const HEADS = [
  ["h", "mm"],
  ["b", "mm"],
  ["tw", "mm"],
  ["tf", "mm"],
  ["r", "mm"],
  ["mass", "kg/m"],
  ["A", "cm²"],
  ["Iy", "cm⁴"],
  ["Wel,y", "cm³"],
  ["Wpl,y", "cm³"],
] as const;

/** Figures of one row in the order of the heads; properties from the dimensions, four figures as handbooks print them. */
function figuresOf(row: SectionRow): readonly string[] {
  const { areaMm2, inertiaMm4, elasticModulusMm3, plasticModulusMm3 } = sectionProperties(sectionToCase(row));
  return [
    ...[row.depthMm, row.widthMm, row.webThicknessMm, row.flangeThicknessMm, row.rootRadiusMm].map(String),
    row.massKgPerM.toFixed(1),
    ...[areaMm2 / 1e2, inertiaMm4 / 1e4, elasticModulusMm3 / 1e3, plasticModulusMm3 / 1e3].map((value) =>
      formatFigures(Number(value.toPrecision(4)), 4),
    ),
  ];
}

function Rows({ sections }: { readonly sections: readonly SectionRow[] }) {
  const sources = sourcesOf(sections);
  return (
    <div>
      <Table label="Sections" className="whitespace-nowrap">
        <thead>
          <tr>
            <Th>Section</Th>
            {HEADS.map(([symbol, unit]) => (
              <Th key={symbol} className="text-right">
                {symbol}
                <span className="block font-normal text-soft">{unit}</span>
              </Th>
            ))}
            <Th className="text-right">Source</Th>
          </tr>
        </thead>
        <tbody>
          {sections.map((row) => (
            <tr key={row.designation} className="hover:bg-petrolwash">
              <th scope="row" className="border-t border-rule px-3 py-1.5 text-left align-top font-semibold">
                {row.designation}
              </th>
              {figuresOf(row).map((figure, index) => (
                <Td key={HEADS[index]?.[0]} className="text-right">
                  {figure}
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

/** The sections of one family with what follows from their dimensions; a few letters find a section in any family. */
export function SectionTable({ sections }: { readonly sections: readonly SectionRow[] }) {
  const [family, setFamily] = useState<SectionFamily>("HE A");
  const [wanted, setWanted] = useState("");
  const families = SECTION_FAMILIES.filter((name) => sections.some((row) => row.family === name));
  const key = sectionKey(wanted);
  const shown = sections.filter((row) =>
    key === "" ? row.family === family : sectionKey(row.designation).includes(key),
  );
  return (
    <div className="grid gap-4">
      <div className="flex flex-wrap items-end gap-4">
        <SelectField
          label="Family"
          value={family}
          onChange={(event) => setFamily(event.target.value as SectionFamily)}
          disabled={key !== ""}
          fieldClassName="w-40"
        >
          {families.map((name) => (
            <option key={name}>{name}</option>
          ))}
        </SelectField>
        <TextField
          label="Find in every family"
          placeholder="HEA 300"
          value={wanted}
          onChange={(event) => setWanted(event.target.value)}
          fieldClassName="w-56"
        />
        <p role="status" className="pb-2 text-soft">
          {shown.length === 1 ? "1 section" : `${shown.length} sections`}
        </p>
      </div>
      {shown.length === 0 ? (
        <Empty title="No such section">
          <p>A node may also state a section by its dimensions.</p>
        </Empty>
      ) : (
        <Rows sections={shown} />
      )}
    </div>
  );
}
