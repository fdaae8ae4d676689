/** Guards the way in, in a real browser on the production build: nobody sees work signed out, and a demo person gets to theirs. */
import { afterEach, expect, inject, it } from "vitest";
import { openBrowser, demoPerson, keepPicture, signIn, type TestBrowser } from "../support/browser";

let browser: TestBrowser;

afterEach(async ({ task }) => {
  if (task.result?.state === "fail") await keepPicture(browser.page, task.name.replace(/\W+/g, "-"));
  await browser.close();
});

it("sends whoever is signed out to the sign-in page, and answers the API with 401", async () => {
  browser = await openBrowser();
  await browser.page.goto("/projects");
  expect(new URL(browser.page.url()).pathname).toBe("/sign-in");
  const reply = await browser.context.request.get("/api/projects");
  expect(reply.status()).toBe(401);
});

it("refuses a wrong password in words, and stays where it is", async () => {
  browser = await openBrowser();
  const { page } = browser;
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(demoPerson("designer").email);
  await page.getByLabel("Password").fill("not the password");
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.getByRole("alert").filter({ hasText: /\w/ }).first().waitFor();
  expect(new URL(page.url()).pathname).toBe("/sign-in");
});

it("takes a designer to the projects, without an error and without asking any other host", async () => {
  browser = await openBrowser();
  const { page, complaints } = browser;
  await signIn(page, "designer");
  expect(new URL(page.url()).pathname).toBe("/projects");
  await page.getByRole("heading", { level: 1 }).waitFor();
  expect(complaints).toEqual({ errors: [], outsideRequests: [] });
});

it("tells a browser to load nothing from elsewhere, and says nothing of its make", async () => {
  browser = await openBrowser();
  const reply = await browser.context.request.get(`${inject("serverUrl")}/sign-in`);
  expect(reply.headers()["content-security-policy"]).toContain("default-src 'self'");
  expect(reply.headers()["x-powered-by"]).toBeUndefined();
});
