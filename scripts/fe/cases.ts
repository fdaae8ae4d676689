import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import type { ColumnSection } from "./section-mesh";
import type { BarSize } from "./stub-mesh";

export interface StudyCase {
  readonly section: ColumnSection;
  readonly gaugeMm: number;
  readonly bar: BarSize;
}

const SECTIONS = ["HE 200 B", "HE 300 A", "HE 300 B", "HE 400 B", "IPE 400"];
const BARS = ["M16", "M20", "M24", "M30"];
/** The first two of a section's gauges that the bounds allow with a bar. */
const GAUGES_MM = [100, 120, 140, 160, 180];
const GAUGES_A_BAR = 2;
/** Least edge distance in hole diameters: EN 1993-1-8 Table 3.3. */
const EDGE_HOLES = 1.2;

/** The bounds of the through-bar model that section, gauge and bar can break, and room for the hole beside the edge. */
function isWithinBounds({ section, gaugeMm, bar }: StudyCase): boolean {
  const clear = (gaugeMm - section.webMm) / 2;
  const ratio = (clear - 0.8 * section.rootMm) / section.flangeMm;
  const edge = (section.widthMm - gaugeMm) / 2;
  return (
    ratio >= 2 &&
    ratio <= 4.6 &&
    clear - section.rootMm >= bar.acrossPointsMm / 2 &&
    edge >= EDGE_HOLES * bar.holeMm
  );
}

/** Every section with every bar at two gauges, as far as the bounds allow. @throws where the catalogue lacks one of them. */
export function studyCases(): StudyCase[] {
  const catalog = loadSeedCatalog();
  const sections = SECTIONS.map((name): ColumnSection => {
    const row = catalog.sections.find((each) => each.designation === name);
    if (!row) throw new Error(`The catalogue lacks ${name}: add it to seeders/data/catalog.`);
    return {
      name,
      depthMm: row.depthMm,
      widthMm: row.widthMm,
      webMm: row.webThicknessMm,
      flangeMm: row.flangeThicknessMm,
      rootMm: row.rootRadiusMm,
    };
  });
  const bars = BARS.map((name): BarSize => {
    const row = catalog.fasteners.find((each) => each.size === name);
    if (!row) throw new Error(`The catalogue lacks ${name}: add it to seeders/data/catalog.`);
    return {
      name,
      stressAreaMm2: row.stressAreaMm2,
      holeMm: row.holeMm,
      acrossFlatsMm: row.acrossFlatsMm,
      acrossPointsMm: row.acrossPointsMm,
      nutHeightMm: row.nutHeightMm,
    };
  });
  return sections.flatMap((section) =>
    bars.flatMap((bar) =>
      GAUGES_MM.map((gaugeMm) => ({ section, gaugeMm, bar }))
        .filter(isWithinBounds)
        .slice(0, GAUGES_A_BAR),
    ),
  );
}
