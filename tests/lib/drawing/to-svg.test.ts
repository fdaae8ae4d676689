import { describe, expect, it } from "vitest";
import { drawNode } from "@/lib/drawing/draw-node";
import { toSvg } from "@/lib/drawing/to-svg";
import { BARS, buildDrawingCase, STIFFENERS, WEB_PLATE } from "./drawing-case";

/** Reads tags and checks that each is closed in its turn, attributes quoted, text escaped. */
function openTags(svg: string): string[] {
  const open: string[] = [];
  for (const [, closing, name, attributes, selfClosing] of svg.matchAll(
    /<(\/?)([a-zA-Z]+)((?:\s+[\w:-]+="[^"<]*")*)\s*(\/?)>/g,
  )) {
    if (closing) expect(open.pop()).toBe(name);
    else if (!selfClosing) open.push(name ?? "");
    expect(attributes ?? "").not.toMatch(/&(?!amp;|lt;|gt;|quot;)/);
  }
  expect(svg.replace(/<\/?[a-zA-Z]+(?:\s+[\w:-]+="[^"<]*")*\s*\/?>/g, "")).not.toMatch(/[<>]/);
  return open;
}

describe("the SVG file", () => {
  it("is well formed in both views, whatever is added and whatever the node is called", () => {
    const drawing = drawNode(buildDrawingCase(), [BARS, STIFFENERS, WEB_PLATE], { reference: `A<1> & "2"` });
    for (const view of ["elevation", "section"] as const)
      expect(openTags(toSvg(drawing, { view }))).toEqual([]);
    expect(toSvg(drawing)).toContain("<title>Node A&lt;1&gt; &amp; &quot;2&quot;, to scale</title>");
  });
  it("is in millimetres and as large on paper as its scale says", () => {
    const drawing = drawNode(buildDrawingCase(), [], { mmPerPixel: 2 });
    const [, , , width = NaN] = /viewBox="(\S+) (\S+) (\S+) (\S+)"/.exec(toSvg(drawing))?.map(Number) ?? [];
    const onPaper = Number(/ width="([\d.]+)" height/.exec(toSvg(drawing))?.[1]);
    expect(onPaper).toBeCloseTo(width / 2, 1);
  });
  it("stands alone: colours are written out, and can be given", () => {
    const drawing = drawNode(buildDrawingCase(), [BARS]);
    expect(toSvg(drawing)).not.toContain("var(");
    const black = Object.fromEntries(
      [
        "paper",
        "sheet",
        "ink",
        "soft",
        "faint",
        "added",
        "steel",
        "steel2",
        "web",
        "beam",
        "plate",
        "petrol",
      ].map((ink) => [ink, "#000"]),
    ) as never;
    expect(new Set(toSvg(drawing, { colours: black }).match(/#[0-9a-f]{3,6}(?=")/g))).toEqual(
      new Set(["#000"]),
    );
  });
  it("shows the window it is given, so that drawings stand side by side at one scale", () => {
    const extent = { minX: -500, minY: -300, maxX: 500, maxY: 900 };
    expect(toSvg(drawNode(buildDrawingCase(), []), { extent })).toContain('viewBox="-500 -300 1000 1200"');
  });
});
