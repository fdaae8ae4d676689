import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/**
 * Guards the tokens of both sheets: every colour that words are set in against every ground they
 * stand on, by the contrast formula of WCAG 2.2 (4.5:1 for text, 3:1 for marks and edges of controls).
 */
const css = readFileSync("app/globals.css", "utf8");

function tokensOf(block: string): ReadonlyMap<string, string> {
  return new Map(
    [...block.matchAll(/--([a-z0-9]+):\s*(#[0-9a-f]{6});/g)].map((match) => [match[1] ?? "", match[2] ?? ""]),
  );
}
function blockAfter(selector: string): string {
  const start = css.indexOf(`${selector} {`);
  if (start < 0) throw new Error(`${selector} is not in the stylesheet`);
  return css.slice(start, css.indexOf("}", start));
}
const light = tokensOf(blockAfter(":root"));
const darkBySystem = tokensOf(blockAfter(':root:not([data-theme="light"])'));
const darkByChoice = tokensOf(blockAfter(':root[data-theme="dark"]'));

function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}
function contrast(tokens: ReadonlyMap<string, string>, over: string, under: string): number {
  const [a, b] = [tokens.get(over), tokens.get(under)];
  if (!a || !b) throw new Error(`No token ${over} or ${under}`);
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

const WORDS = ["ink", "soft", "petrol", "added", "pass", "tight", "fail"];
const GROUNDS = ["paper", "sheet", "petrolwash"];
const sheets = { light, darkBySystem, darkByChoice };

describe.each(Object.entries(sheets))("the %s sheet", (_name, tokens) => {
  it.each(WORDS.flatMap((word) => GROUNDS.map((ground) => [word, ground] as const)))(
    "sets %s on %s at 4.5:1 or more",
    (word, ground) => {
      expect(contrast(tokens, word, ground)).toBeGreaterThanOrEqual(4.5);
    },
  );

  it("sets words on the accent and on the wash of failure at 4.5:1 or more", () => {
    expect(contrast(tokens, "onpetrol", "petrol")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(tokens, "fail", "failwash")).toBeGreaterThanOrEqual(4.5);
    expect(contrast(tokens, "paper", "ink")).toBeGreaterThanOrEqual(4.5);
  });

  it("draws bars and edges of controls at 3:1 or more", () => {
    expect(contrast(tokens, "steel", "sheet")).toBeGreaterThanOrEqual(3);
    expect(contrast(tokens, "steel", "petrolwash")).toBeGreaterThanOrEqual(3);
    expect(contrast(tokens, "steel2", "sheet")).toBeGreaterThanOrEqual(3);
  });
});

it("the dark sheet is the same whether the system or the reader chose it", () => {
  expect(darkByChoice).toEqual(darkBySystem);
  expect([...darkByChoice.keys()].sort()).toEqual([...light.keys()].sort());
});
