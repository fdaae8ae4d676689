/** Guards the work of a day in a real browser: enter, compare, read the working; two people at once; wrong input; no mouse. */
import { afterEach, describe, expect, it } from "vitest";
import type { Page } from "playwright-core";
import { demoPerson, keepPicture, openBrowser, signIn, type TestBrowser } from "../support/browser";
import { apiOfNode, ask, BEST_NODE, COMPARING_MS, nodePath, openSheet } from "./demo-project";

let browser: TestBrowser;

afterEach(async ({ task }) => {
  if (task.result?.state === "fail")
    await keepPicture(browser.page, `failed-${task.name.replace(/\W+/g, "-")}`);
  await browser.close();
});

const columnSection = (page: Page) => page.getByRole("combobox", { name: "Column section", exact: true });
const bareResult = (page: Page) => page.getByTestId("bare-result");
const save = (page: Page) => page.getByRole("button", { name: "Save", exact: true });

/** Saves and waits until the sheet says so. */
async function saveAndWait(page: Page): Promise<void> {
  await save(page).click();
  await page.getByText("saved", { exact: true }).waitFor();
}

/** A cell of the comparison whose number opens the working of a component. */
const workingOpener = (page: Page) =>
  page.getByRole("button", { name: /^panel shear.*Open the working$/i }).first();

async function expectWorkingInPanel(page: Page): Promise<void> {
  const panel = page.getByRole("dialog");
  await panel.locator("math").first().waitFor();
  expect(await panel.getByRole("list", { name: "Numbers put in" }).first().innerText()).toMatch(/=\s*[\d ]+/);
  expect(await panel.getByText(/EN 1993-1-8.*6\.2\.6\.1/).count()).toBeGreaterThan(0);
}

describe("a designer", () => {
  it("changes the column, sees the result follow, saves, compares, opens a number's working and comes back to it", async () => {
    browser = await openBrowser();
    const { page, complaints } = browser;
    await signIn(page, "designer");
    await openSheet(page, await nodePath(page, BEST_NODE));
    const before = await bareResult(page).innerText();

    await columnSection(page).selectOption("HE 320 A");
    await expect.poll(() => bareResult(page).innerText()).not.toBe(before);
    await columnSection(page).selectOption("HE 300 A");
    await expect.poll(() => bareResult(page).innerText()).toBe(before);
    await columnSection(page).selectOption("HE 320 A");
    await saveAndWait(page);

    await page.getByRole("link", { name: "Compare options" }).click();
    await page.getByRole("rowheader", { name: "Verdict" }).waitFor({ timeout: COMPARING_MS });
    expect(await page.getByText(/HE 320 A S355/).count()).toBeGreaterThan(0);

    const opener = workingOpener(page);
    await opener.click();
    await expectWorkingInPanel(page);
    await page.keyboard.press("Escape");
    await expect.poll(() => page.getByRole("dialog").count()).toBe(0);
    expect(await opener.evaluate((element) => element === document.activeElement)).toBe(true);

    await openSheet(page, await nodePath(page, BEST_NODE));
    await columnSection(page).selectOption("HE 300 A");
    await saveAndWait(page);
    expect(complaints).toEqual({ errors: [], outsideRequests: [] });
  });

  it("is told beside the field what is wrong with it, and keeps what was typed", async () => {
    browser = await openBrowser();
    const { page } = browser;
    await signIn(page, "designer");
    await openSheet(page, await nodePath(page, BEST_NODE));
    const height = page.getByRole("textbox", { name: "Storey height (mm)" });
    await height.fill("three metres");
    await expect.poll(() => height.getAttribute("aria-invalid")).toBe("true");
    const described = (await height.getAttribute("aria-describedby")) ?? "";
    const error = page.locator(`[id="${described.split(" ").at(-1) ?? ""}"]`);
    expect(await error.innerText()).toMatch(/number/i);
    const [field, words] = [await height.boundingBox(), await error.boundingBox()];
    expect(Math.abs((words?.y ?? 0) - (field?.y ?? Infinity) - (field?.height ?? 0))).toBeLessThan(20);

    await save(page).click();
    expect(await height.inputValue()).toBe("three metres");
    expect(await height.evaluate((element) => element === document.activeElement)).toBe(true);
    await page.reload();
    await expect.poll(() => height.inputValue()).toBe("three metres");
  });

  it("who saves second sees both versions and loses neither", async () => {
    browser = await openBrowser();
    const { page: first } = browser;
    await signIn(first, "designer");
    const sheet = await nodePath(first, BEST_NODE);
    await openSheet(first, sheet);
    const second = await browser.openTab();
    await openSheet(second, sheet);

    await first.getByRole("textbox", { name: "Storey height (mm)" }).fill("3700");
    await saveAndWait(first);
    await second.getByRole("textbox", { name: "Number of nodes" }).fill("17");
    await second.getByRole("textbox", { name: "Storey height (mm)" }).fill("3800");
    await save(second).click();

    const dialog = second.getByRole("dialog");
    const row = dialog.getByRole("row", { name: /storey height/i });
    expect(await row.innerText()).toMatch(/3600\s+3800\s+3700/);
    await keepPicture(second, "conflict");
    await dialog.getByRole("button", { name: "Lay my changes on top of theirs" }).click();
    expect(await second.getByRole("textbox", { name: "Storey height (mm)" }).inputValue()).toBe("3800");
    await saveAndWait(second);
    const { body } = await ask<{
      node: { document: { quantity: number; column: { storeyHeight: number } } };
    }>(second, apiOfNode(sheet));
    expect(body.node.document.quantity).toBe(17);
    expect(body.node.document.column.storeyHeight).toBe(3800);
  });
});

describe("a fabricator", () => {
  it("reads the node without a way to change it, is told why, and is refused when asking the server directly", async () => {
    browser = await openBrowser();
    const { page } = browser;
    await signIn(page, "fabricator");
    const sheet = await nodePath(page, BEST_NODE);
    await openSheet(page, sheet);
    expect(await page.getByText("You may look at this node, not change it.").count()).toBe(1);
    expect(await page.locator("main").getByRole("textbox").count()).toBe(0);
    expect(await page.locator("main").getByRole("combobox").count()).toBe(0);
    expect(await save(page).count()).toBe(0);

    const node = await ask<{ node: { document: unknown; version: number } }>(page, apiOfNode(sheet));
    const put = await ask<{ error: { code: string } }>(page, apiOfNode(sheet), {
      method: "PUT",
      body: { document: node.body.node.document, expectedVersion: node.body.node.version },
    });
    expect(put.status).toBe(403);
    const after = await ask<{ node: { version: number } }>(page, apiOfNode(sheet));
    expect(after.body.node.version).toBe(node.body.node.version);
  });
});

/** Presses Tab until the element in focus has the words, as somebody without a mouse does. */
async function tabTo(page: Page, words: RegExp): Promise<void> {
  for (let presses = 0; presses < 80; presses += 1) {
    await page.keyboard.press("Tab");
    const name = await page.evaluate(() => {
      const element = document.activeElement;
      // A frame that scrolls takes the focus too, and holds the words of all that is in it.
      if (!element?.matches("a, button, input")) return "";
      const label = element instanceof HTMLInputElement ? (element.labels?.[0]?.textContent ?? "") : "";
      return `${label} ${element.getAttribute("aria-label") ?? ""} ${element.textContent}`;
    });
    if (words.test(name)) return;
  }
  throw new Error(`Tab never comes to ${String(words)}`);
}

describe("without a mouse", () => {
  it("leads from signing in to the working of a number and back", async () => {
    browser = await openBrowser();
    const { page } = browser;
    const designer = demoPerson("designer");
    await page.goto("/sign-in");
    await page.getByRole("button", { name: "Sign in" }).waitFor();
    await tabTo(page, /e-?mail/i);
    await page.keyboard.type(designer.email);
    await page.keyboard.press("Tab");
    await page.keyboard.type(designer.password);
    await page.keyboard.press("Enter");
    await page
      .getByRole("link", { name: /Tannery Wharf/ })
      .first()
      .waitFor();
    await tabTo(page, /Tannery Wharf/);
    await page.keyboard.press("Enter");
    await page.getByRole("link", { name: /Compare.*C4 \/ level 2/ }).waitFor();
    await tabTo(page, /Compare.*C4 \/ level 2/);
    await page.keyboard.press("Enter");
    await page.getByRole("rowheader", { name: "Verdict" }).waitFor({ timeout: COMPARING_MS });

    await page.locator("main table [data-stop][tabindex='0']").first().waitFor();
    await tabTo(page, /Open its parts/);
    const focusedWords = () => page.evaluate(() => document.activeElement?.textContent ?? "");
    for (
      let presses = 0;
      presses < 30 && !/^panel shear.*Open the working/is.test(await focusedWords());
      presses += 1
    )
      await page.keyboard.press("ArrowDown");
    expect(await focusedWords()).toMatch(/^panel shear.*Open the working/is);
    const opener = await focusedWords();
    await page.keyboard.press("Enter");
    await expectWorkingInPanel(page);
    await page.keyboard.press("Escape");
    await expect.poll(() => page.getByRole("dialog").count()).toBe(0);
    expect(await focusedWords()).toBe(opener);
  });
});
