import type { MeasureInput, SectionInput, SteelInput, WeldInput } from "@/lib/schemas/node-document";

const levelsWords = (levels: readonly string[]): string =>
  levels.length === 2 ? "top and bottom" : `at ${levels[0] ?? ""}`;
const sideWords = (at: "left" | "right" | "both" | undefined): string =>
  at === "left" || at === "right" ? `, ${at} only` : "";
const weldWords = (weld: WeldInput): string => (weld === "butt" ? "butt weld" : `throat ${weld} mm`);
const steelWords = (steel: SteelInput): string => (typeof steel === "string" ? steel : `f_y ${steel.fy}`);

const rowWords = (rows: readonly number[] | undefined): string =>
  rows === undefined ? "" : `, ${rows.length === 1 ? "row" : "rows"} ${rows.join(" and ")}`;

/** A section by its name, or by its dimensions where it has none. */
export const sectionWords = (section: SectionInput): string =>
  typeof section === "string"
    ? section
    : `${"weld" in section ? "welded" : "rolled"} ${section.h} × ${section.b} × ${section.tw}/${section.tf}`;

/** One measure in a few words, for the head of a column: what it is made of and its sizes in mm. */
export function measureSummary(measure: MeasureInput): string {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return `pair ${measure.width} × ${measure.thickness} ${levelsWords(measure.levels)}`;
    case "diagonal-stiffeners":
      return `${measure.arrangement === "single" ? "diagonal" : measure.arrangement === "cross" ? "crossed diagonals" : "K"} ${measure.width} × ${measure.thickness}`;
    case "web-plates":
      return `web plate ${measure.width} × ${measure.height} × ${measure.thickness}, ${measure.sides === 1 ? "one side" : "both sides"}`;
    case "backing-plates":
      return `backing ${measure.width} × ${measure.length} × ${measure.thickness} ${levelsWords(measure.levels)}${sideWords(measure.at)}`;
    case "through-bars":
      return `bars ${measure.size} ${measure.grade} ${levelsWords(measure.levels)}${rowWords(measure.rows)}${measure.innerNuts ? ", inner nuts" : ""}`;
    case "heavier-column":
      return `${sectionWords(measure.section)} over the lift`;
  }
}

/** All sizes of an option in one line; the bare column says so. */
export const optionSummary = (measures: readonly MeasureInput[]): string =>
  measures.length === 0 ? "nothing added" : measures.map(measureSummary).join(" + ");

/** A measure in full, one fact a line, for the panel that opens from the head of a column. */
export function measureFacts(measure: MeasureInput): readonly (readonly [label: string, value: string])[] {
  switch (measure.kind) {
    case "transverse-stiffeners":
      return [
        ["Levels", levelsWords(measure.levels)],
        ["Each plate", `${measure.width} × ${measure.thickness} mm, ${steelWords(measure.steel)}`],
        ["Length", measure.length === "full" ? "full depth" : `${measure.length} mm`],
        ["Corner clip", `${measure.clip} mm`],
        ["Weld to flange", weldWords(measure.flangeWeld)],
        ["Weld to web", weldWords(measure.webWeld)],
      ];
    case "diagonal-stiffeners":
      return [
        ["Arrangement", `${measure.arrangement}, top end to the ${measure.towards}`],
        ["Each plate", `${measure.width} × ${measure.thickness} mm, ${steelWords(measure.steel)}`],
        ["Weld", weldWords(measure.weld)],
      ];
    case "web-plates":
      return [
        ["Sides of the web", String(measure.sides)],
        [
          "Plate",
          `${measure.width} × ${measure.height} × ${measure.thickness} mm, ${steelWords(measure.steel)}`,
        ],
        ["Weld all round", weldWords(measure.weld)],
      ];
    case "backing-plates":
      return [
        ["Levels", `${levelsWords(measure.levels)}${sideWords(measure.at)}`],
        [
          "Plate",
          `${measure.width} × ${measure.length} × ${measure.thickness} mm, ${steelWords(measure.steel)}`,
        ],
      ];
    case "through-bars":
      return [
        ["Levels", levelsWords(measure.levels)],
        ["Rows", measure.rows?.join(", ") ?? "all of these levels"],
        ["Bars", `${measure.size} ${measure.grade}`],
        ["Inner nuts", measure.innerNuts ? "yes" : "no"],
      ];
    case "heavier-column":
      return [["Column", sectionWords(measure.section)]];
  }
}

const KIND_WORDS: Readonly<Record<MeasureInput["kind"], string>> = {
  "transverse-stiffeners": "Transverse stiffeners",
  "diagonal-stiffeners": "Diagonal stiffeners",
  "web-plates": "Supplementary web plate",
  "backing-plates": "Flange backing plates",
  "through-bars": "Through-bolted bars",
  "heavier-column": "Heavier column",
};

/** The name of a kind of measure. */
export const measureName = (measure: MeasureInput): string => KIND_WORDS[measure.kind];
