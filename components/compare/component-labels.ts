import type { ComponentId } from "@/lib/calc/result";
import { componentWords } from "@/lib/ranking/component-words";

/** Where a component stands among the rows of the comparison. */
export type RowGroupKey = "panel" | "added" | "connection";

const PANEL: readonly ComponentId[] = [
  "joint-moment",
  "column-web-shear",
  "column-web-compression",
  "column-web-tension",
  "column-flange-bending",
  "far-flange",
];
const ADDED: readonly ComponentId[] = [
  "transverse-stiffener",
  "diagonal-stiffener",
  "stiffener-weld",
  "web-plate",
  "web-plate-weld",
  "backing-plate",
  "bar-tension",
  "bar-compression",
  "detailing",
];
const CONNECTION: readonly ComponentId[] = [
  "end-plate-bending",
  "flange-cleat-bending",
  "beam-flange-compression",
  "beam-web-tension",
  "bolt-tension",
  "bolt-shear",
  "connection-weld",
];

/** The components in the order of their rows, by group. */
export const COMPONENT_ROWS: Readonly<Record<RowGroupKey, readonly ComponentId[]>> = {
  panel: PANEL,
  added: ADDED,
  connection: CONNECTION,
};

/** A component as the head of a row: no article. */
export const componentLabel = (component: ComponentId): string =>
  component === "joint-moment" ? "joint moment" : componentWords(component).replace(/^the /, "");

/** A label at the start of a line. */
export const sentenceCase = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** Load case of a check that no load case changes, such as a rule of detailing: it holds in each of them. */
export const EVERY_CASE = "all";

/** A load case in words, after a comma. */
export const caseWords = (loadCase: string): string => (loadCase === EVERY_CASE ? "every case" : loadCase);
