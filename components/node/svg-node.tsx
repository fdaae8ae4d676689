import type { ReactElement } from "react";
import { createElement } from "react";
import type { SvgElement } from "@/lib/drawing/svg-elements";

/** `stroke-width` as React spells it; data and aria attributes stay as they are. */
const reactName = (name: string): string =>
  name.startsWith("data-") || name.startsWith("aria-")
    ? name
    : name.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase());

/** Turns an element of the drawing model into JSX, attributes unchanged. */
export function SvgNode({ element }: { readonly element: SvgElement }): ReactElement {
  const attributes = Object.fromEntries(
    Object.entries(element.attributes).map(([name, value]) => [reactName(name), value]),
  );
  const children = element.children.map((child, index) =>
    typeof child === "string" ? child : <SvgNode key={index} element={child} />,
  );
  return createElement(element.tag, attributes, ...children);
}
