import type { Extent, NodeDrawing } from "./drawing";
import type { Ink } from "./paint";
import {
  coordinate,
  dimensionLines,
  dimensionTextElement,
  hatchElements,
  layered,
  shapeElement,
  viewBoxOf,
  type SvgElement,
} from "./svg-elements";

export interface SvgFileOptions {
  readonly view?: "elevation" | "section";
  /** The window to show; the drawing's own by default. */
  readonly extent?: Extent;
  readonly idPrefix?: string;
  /** Colours written into the file; the day colours of the sheet by default, so that the file stands alone. */
  readonly colours?: Readonly<Record<Ink, string>>;
}

/** The sheet by day, as in the screen's own tokens. */
export const DAY_COLOURS: Readonly<Record<Ink, string>> = {
  paper: "#faf8f2",
  sheet: "#fffdf8",
  ink: "#17212b",
  soft: "#55606b",
  faint: "#a9a493",
  added: "#7a3b12",
  steel: "#5b6670",
  steel2: "#848e96",
  web: "#e3e1d8",
  beam: "#efede5",
  plate: "#c9cdcd",
  petrol: "#0d5563",
};

const ESCAPES: Readonly<Record<string, string>> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };
const escaped = (text: string): string =>
  text.replace(/[&<>"]/g, (character) => ESCAPES[character] ?? character);

function written(element: SvgElement | string): string {
  if (typeof element === "string") return escaped(element);
  const attributes = Object.entries(element.attributes)
    .map(([name, value]) => ` ${name}="${escaped(String(value))}"`)
    .join("");
  const inside = element.children.map(written).join("");
  return inside === ""
    ? `<${element.tag}${attributes}/>`
    : `<${element.tag}${attributes}>${inside}</${element.tag}>`;
}

/** Writes one view as a complete SVG file, `viewBox` in mm, with title and description. */
export function toSvg(drawing: NodeDrawing, options: SvgFileOptions = {}): string {
  const view = drawing[options.view ?? "elevation"];
  const extent = options.extent ?? view.extent;
  const colours = options.colours ?? DAY_COLOURS;
  const svg = {
    idPrefix: options.idPrefix ?? "node",
    mmPerPixel: drawing.mmPerPixel,
    colour: (ink: Ink) => colours[ink],
  };
  const body = [
    hatchElements(svg),
    ...layered(view.shapes).map((shape) => shapeElement(shape, svg)),
    ...view.dimensions.flatMap((_, index) => {
      const text = dimensionTextElement(view, index, svg);
      return [...dimensionLines(view, index, svg), ...(text ? [text] : [])];
    }),
  ];
  const width = coordinate((extent.maxX - extent.minX) / drawing.mmPerPixel);
  const height = coordinate((extent.maxY - extent.minY) / drawing.mmPerPixel);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="${viewBoxOf(extent)}" width="${width}" height="${height}" font-family="Archivo, sans-serif" role="img">`,
    `<title>${escaped(drawing.title)}</title><desc>${escaped(drawing.description)}</desc>`,
    ...body.map(written),
    "</svg>",
  ].join("\n");
}
