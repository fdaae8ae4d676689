"use client";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import type { Catalog } from "@/lib/catalog/catalog";
import { catalogOptions } from "@/lib/client/queries";
import { PageBody, PageHead } from "@/components/layout/page-head";
import { Failed, Loading } from "@/components/ui/states";
import { Tabs, type TabItem } from "@/components/ui/tabs";
import { AngleTable, FastenerTable, SteelTable } from "./catalog-tables";
import { SectionTable } from "./section-table";
import { StockPlates } from "./stock-plates";

type Part = "sections" | "angles" | "steels" | "fasteners" | "plates";

const PARTS: readonly TabItem<Part>[] = [
  { key: "sections", label: "Sections" },
  { key: "angles", label: "Angles" },
  { key: "steels", label: "Steels" },
  { key: "fasteners", label: "Bolts and bars" },
  { key: "plates", label: "Stock plates" },
];

function PartOf({ part, catalog }: { readonly part: Part; readonly catalog: Catalog }) {
  switch (part) {
    case "sections":
      return <SectionTable sections={catalog.sections} />;
    case "angles":
      return <AngleTable angles={catalog.angles} />;
    case "steels":
      return <SteelTable steels={catalog.steels} />;
    case "fasteners":
      return <FastenerTable fasteners={catalog.fasteners} grades={catalog.fastenerGrades} />;
    case "plates":
      return <StockPlates plates={catalog.stockPlates} />;
  }
}

/** The catalogue by kind, in its states. */
export function CatalogScreen() {
  const catalog = useQuery(catalogOptions());
  const [part, setPart] = useState<Part>("sections");
  return (
    <PageBody>
      <PageHead title="Catalogue">
        <p>Dimensions and strengths that nodes are calculated with, each row with its source.</p>
      </PageHead>
      {catalog.isPending ? (
        <Loading what="the catalogue" />
      ) : catalog.isError ? (
        <Failed
          title="The catalogue could not be read."
          error={catalog.error}
          onRetry={() => void catalog.refetch()}
        />
      ) : (
        <Tabs label="Parts of the catalogue" items={PARTS} selected={part} onSelect={setPart}>
          <PartOf part={part} catalog={catalog.data} />
        </Tabs>
      )}
    </PageBody>
  );
}
