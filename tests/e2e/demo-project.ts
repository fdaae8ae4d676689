import type { Page } from "playwright-core";

/** Node of the demo project where bars and a stiffener win. */
export const BEST_NODE = "C4 / level 2";

/** How long the first comparison of a node may take on a machine that is busy with other things, ms. */
export const COMPARING_MS = 90_000;

interface Listed {
  readonly id: string;
  readonly reference: string;
}

/** An answer of the API, asked by the page itself, so that session and origin are those of a person at work. */
export function ask<T>(
  page: Page,
  path: string,
  init: { readonly method?: string; readonly body?: unknown } = {},
): Promise<{ readonly status: number; readonly body: T }> {
  return page.evaluate(
    async ({ path, method, body }) => {
      const reply = await fetch(path, {
        method,
        ...(body === undefined
          ? {}
          : { body: JSON.stringify(body), headers: { "Content-Type": "application/json" } }),
      });
      return { status: reply.status, body: (await reply.json()) as never };
    },
    { path, method: init.method ?? "GET", body: init.body },
  );
}

/** Address of the register of the demo project, for whoever is signed in on the page. */
export async function registerPath(page: Page): Promise<string> {
  const { body } = await ask<{ projects: readonly { id: string }[] }>(page, "/api/projects");
  const [project] = body.projects;
  if (project === undefined) throw new Error("nobody has a project here");
  return `/projects/${project.id}`;
}

/** Address of a node's sheet, by its reference. */
export async function nodePath(page: Page, reference: string): Promise<string> {
  const register = await registerPath(page);
  const { body } = await ask<{ nodes: readonly Listed[] }>(page, `/api${register}/nodes`);
  const node = body.nodes.find((candidate) => candidate.reference === reference);
  if (node === undefined) throw new Error(`the register has no node ${reference}`);
  return `${register}/nodes/${node.id}`;
}

/** The part of a node sheet's address that the API knows it by. */
export const apiOfNode = (sheet: string): string => `/api/nodes/${sheet.split("/").at(-1) ?? ""}`;

/** Opens a sheet and waits for the result of the bare column. */
export async function openSheet(page: Page, sheet: string): Promise<void> {
  await page.goto(sheet);
  await page
    .getByTestId("bare-result")
    .filter({ hasText: /bare column/i })
    .waitFor();
}

/** Opens the comparison of a sheet's node and waits for its table. */
export async function openComparison(page: Page, sheet: string): Promise<void> {
  await page.goto(`${sheet}/comparison`);
  await page.getByRole("rowheader", { name: "Verdict" }).waitFor({ timeout: COMPARING_MS });
}
