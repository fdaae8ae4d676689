import type { ComponentId } from "@/lib/calc/result";

/** The trade's plain words for each component, as they read inside a sentence (lower case, no article). */
const COMPONENT_WORDS: Readonly<Record<ComponentId, string>> = {
  "joint-moment": "the joint's moment resistance",
  "column-web-shear": "panel shear",
  "column-web-compression": "web compression",
  "column-web-tension": "web tension",
  "column-flange-bending": "flange bending",
  "end-plate-bending": "end-plate bending",
  "flange-cleat-bending": "cleat bending",
  "beam-flange-compression": "compression in the beam flange",
  "beam-web-tension": "tension in the beam web",
  "bolt-tension": "bolt tension",
  "bolt-shear": "bolt shear",
  "connection-weld": "the beam's weld",
  "transverse-stiffener": "the stiffener",
  "diagonal-stiffener": "the diagonal stiffener",
  "stiffener-weld": "the stiffener's weld",
  "web-plate": "the web plate",
  "web-plate-weld": "the web plate's weld",
  "backing-plate": "the backing plate",
  "bar-tension": "tension in the bars",
  "bar-compression": "compression in the bars",
  "far-flange": "the far flange",
  detailing: "detailing",
};

/**
 * Says which component is meant in words a reader of drawings knows.
 *
 * @param component - id of the result document.
 */
export const componentWords = (component: ComponentId): string => COMPONENT_WORDS[component];

/** The same with the side of the node, as "web compression on the right". */
export const componentOnSide = (component: ComponentId, side: "left" | "right"): string =>
  `${componentWords(component)} on the ${side}`;
