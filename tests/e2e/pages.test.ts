/** Guards every page as it is drawn: no accessibility violation, nothing refused by the content policy, no sideways scroll; keeps a picture of each. */
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { AxeResults, RunOptions } from "axe-core";
import { keepPicture, openBrowser, signIn, type TestBrowser } from "../support/browser";
import { BEST_NODE, COMPARING_MS, nodePath, openComparison, openSheet, registerPath } from "./demo-project";

const AXE = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");
const RULES: RunOptions = {
  resultTypes: ["violations"],
  runOnly: { type: "tag", values: ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"] },
};

interface Shown {
  readonly name: string;

  /** True for the comparison, whose columns go on beyond a small window. */
  readonly scrollsSideways?: true;
  /** Address of the page, once the register and the node of the demo are known. */
  readonly path: (places: { readonly register: string; readonly sheet: string }) => string;
  /** Words that are there once the page has its data. */
  readonly ready: string;
}

const PAGES: readonly Shown[] = [
  { name: "sign-in", path: () => "/sign-in", ready: "button:has-text('Sign in')" },
  { name: "method", path: () => "/method", ready: "main math" },
  { name: "projects", path: () => "/projects", ready: "main a:has-text('Tannery Wharf')" },
  { name: "register", path: ({ register }) => register, ready: "main tbody tr" },
  { name: "node-sheet", path: ({ sheet }) => sheet, ready: "[data-testid='bare-result'] b" },
  {
    name: "comparison",
    scrollsSideways: true,
    path: ({ sheet }) => `${sheet}/comparison`,
    ready: "main th:has-text('Verdict')",
  },
  { name: "catalogue", path: () => "/catalog", ready: "main tbody tr" },
  { name: "tokens", path: () => "/tokens", ready: "main h2:has-text('No tokens')" },
];
const WIDTHS = [1280, 1920, 820] as const;
const SCHEMES = ["light", "dark"] as const;

let browser: TestBrowser;
let places: { register: string; sheet: string };
const refused: string[] = [];

beforeAll(async () => {
  browser = await openBrowser();
  browser.page.on("console", (message) => {
    if (/content security policy/i.test(message.text())) refused.push(message.text());
  });
  await signIn(browser.page, "designer");
  places = { register: await registerPath(browser.page), sheet: await nodePath(browser.page, BEST_NODE) };
});
afterAll(async () => {
  await browser.close();
});

/** Each violation with the elements it is on, so that a failure tells where to look. */
async function violations(): Promise<string[]> {
  await browser.page.evaluate(AXE);
  const { violations: found } = await browser.page.evaluate(
    (rules) => (globalThis as unknown as { axe: { run(o: RunOptions): Promise<AxeResults> } }).axe.run(rules),
    RULES,
  );
  return found.map(
    ({ id, nodes }) =>
      `${id}: ${nodes
        .slice(0, 4)
        .map((node) => `${node.target.join(" ")} ${node.failureSummary ?? ""}`)
        .join(" | ")}`,
  );
}

/** By how many pixels the page is wider than the window. */
const overhang = (): Promise<number> =>
  browser.page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

describe.each(PAGES)("$name", (shown) => {
  it.each(WIDTHS.flatMap((width) => SCHEMES.map((scheme) => ({ width, scheme }))))(
    "is in order at $width px, $scheme",
    async ({ width, scheme }) => {
      const { page, complaints } = browser;
      await page.setViewportSize({ width, height: 900 });
      await page.emulateMedia({ colorScheme: scheme, reducedMotion: "reduce" });
      await page.goto(shown.path(places));
      await page.locator(shown.ready).first().waitFor({ timeout: COMPARING_MS });
      await page.evaluate(() => document.fonts.ready);
      await keepPicture(page, `${shown.name}-${width}-${scheme}`);
      // The widest window lays the page out as the middle one does, with more room; only its picture is kept.
      if (width !== 1920) expect(await violations()).toEqual([]);
      expect(refused).toEqual([]);
      expect(complaints).toEqual({ errors: [], outsideRequests: [] });
      if (shown.scrollsSideways !== true) expect(await overhang()).toBe(0);
    },
  );
});

/** The right edge of the first element that a selector finds, and the width of the window, px. */
const rightEdge = (selector: string): Promise<{ edge: number; window: number }> =>
  browser.page
    .locator(selector)
    .first()
    .evaluate((element) => ({
      edge: element.getBoundingClientRect().right,
      window: document.documentElement.clientWidth,
    }));

it.each(WIDTHS)("has what can be done with a node in the window of its register at %i px", async (width) => {
  const { page } = browser;
  await page.setViewportSize({ width, height: 900 });
  await page.goto(places.register);
  const { edge, window } = await rightEdge("main tbody tr button:has-text('Delete')");
  expect(edge).toBeLessThanOrEqual(window);
});

it.each(WIDTHS)(
  "has the winner among twelve options in the window of the comparison at %i px",
  async (width) => {
    const { page } = browser;
    await page.setViewportSize({ width, height: 900 });
    await openComparison(page, places.sheet);
    expect(await page.getByText(/^1[2-4] options: /).count()).toBe(1);
    const { edge, window } = await rightEdge("main thead th.best-edge");
    expect(edge).toBeLessThanOrEqual(window);
  },
);

it("leads from the depth of a catalogue section to the choice of sections", async () => {
  const { page } = browser;
  await page.setViewportSize({ width: 1280, height: 900 });
  await openSheet(page, places.sheet);
  await page.getByRole("button", { name: /column depth.*choose another section/ }).press("Enter");
  const focused = await page.evaluate(() => document.activeElement?.getAttribute("aria-label"));
  expect(focused).toBe("Column section");
});
