import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { chromium, type BrowserContext, type BrowserContextOptions, type Page } from "playwright-core";
import { inject } from "vitest";
import type { DemoPerson } from "./server-setup";

/** What a browser test must not see: errors on the page, and requests to anywhere but the server under test. */
export interface Complaints {
  readonly errors: string[];
  readonly outsideRequests: string[];
}

export interface TestBrowser {
  readonly context: BrowserContext;
  readonly page: Page;
  readonly complaints: Complaints;
  /** A further page of the same session: a second tab. */
  openTab(): Promise<Page>;
  close(): Promise<void>;
}

const FLAGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

function watch(page: Page, complaints: Complaints): void {
  page.on("pageerror", (error) => complaints.errors.push(error.message));
  page.on("console", (message) => {
    // A refused request is logged by the browser too; a test that expects one looks at the answer itself.
    if (message.type() === "error" && !message.text().startsWith("Failed to load resource")) {
      complaints.errors.push(message.text());
    }
  });
  page.on("request", (request) => {
    const url = request.url();
    if (/^https?:/.test(url) && !url.startsWith(inject("serverUrl"))) complaints.outsideRequests.push(url);
  });
}

/**
 * Chromium of its own, with an empty profile, nobody signed in; relative addresses are those of the server.
 * Close it in afterAll.
 */
export async function openBrowser(options: BrowserContextOptions = {}): Promise<TestBrowser> {
  const profile = mkdtempSync(path.join(tmpdir(), "panelwright-browser-"));
  const context = await chromium.launchPersistentContext(profile, {
    executablePath: "/usr/bin/chromium",
    headless: true,
    args: FLAGS,
    viewport: { width: 1280, height: 900 },
    baseURL: inject("serverUrl"),
    ...options,
  });
  context.setDefaultTimeout(30_000);
  const complaints: Complaints = { errors: [], outsideRequests: [] };
  const openTab = async (): Promise<Page> => {
    const page = await context.newPage();
    watch(page, complaints);
    return page;
  };
  return {
    context,
    page: await openTab(),
    complaints,
    openTab,
    async close() {
      await context.close();
      rmSync(profile, { recursive: true, force: true });
    },
  };
}

/** The demo person of a role, with the password of this test run. */
export function demoPerson(role: string): DemoPerson {
  const person = inject("demoPeople").find((candidate) => candidate.role === role);
  if (person === undefined) throw new Error(`The demo organisation has nobody in the role ${role}.`);
  return person;
}

/** Signs in through the sign-in page, as a person would. */
export async function signIn(page: Page, role: string): Promise<void> {
  const person = demoPerson(role);
  await page.goto("/sign-in");
  await page.getByLabel(/e-?mail/i).fill(person.email);
  await page.getByLabel(/password/i).fill(person.password);
  await page.getByRole("button", { name: /sign in/i }).click();
  await page.waitForURL((url) => !url.pathname.startsWith("/sign-in"));
}

/** Keeps a picture for whoever looks into a failure. */
export async function keepPicture(page: Page, name: string): Promise<void> {
  await page.screenshot({ path: path.join("tests", "e2e", "output", `${name}.png`), fullPage: true });
}
