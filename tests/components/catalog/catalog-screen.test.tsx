import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { CatalogScreen } from "@/app/(work)/catalog/catalog-screen";
import type { StockPlateRow } from "@/lib/catalog/catalog";
import { buildCatalog } from "../../factories/build-node-document";

/** Few enough rows that looking through them by role stays quick. */
const SOME = {
  ...buildCatalog(),
  sections: buildCatalog().sections.filter((row) => /^HE 3\d\d A|^UC 254/.test(row.designation)),
  angles: buildCatalog().angles.filter((row) => row.legAMm === 100),
  steels: buildCatalog().steels.filter((row) => row.grade === "S460M"),
};

const json = (body: unknown, status = 200): Response =>
  new Response(JSON.stringify(body), { status, headers: { "content-type": "application/json" } });

const me = (editStockPlates: boolean) => ({
  person: {
    id: "7f0b9a0e-3f3a-4d3e-8a51-0f6d1a2b3c4d",
    name: "Ines Calloway",
    email: "ines@firm.example",
    role: "fabricator",
  },
  organisation: { id: "1b671a64-40d5-491e-99b0-da01ff1f3341", name: "A firm" },
  abilities: { createProject: false, editStockPlates, editRates: false, managePeople: false },
});

/** A server that keeps a list of plates; `sent` is every list it was sent. */
function openScreen({ canEdit = true, isDown = false, refusal = "" } = {}): { readonly sent: number[][] } {
  let plates: readonly StockPlateRow[] = [
    { thicknessMm: 10, source: "Test" },
    { thicknessMm: 12, source: "Test" },
  ];
  const sent: number[][] = [];
  const answer = (input: string, init: { method?: string; body?: string }): Response => {
    if (input.startsWith("/api/me")) return json(me(canEdit));
    if (isDown)
      return json(
        { error: { code: "unexpected", message: "Out of order.", fields: [], requestId: "1" } },
        500,
      );
    if (init.method !== "PUT") return json({ ...SOME, stockPlates: plates });
    const { thicknesses } = JSON.parse(init.body ?? "") as { thicknesses: number[] };
    sent.push(thicknesses);
    if (refusal !== "")
      return json({ error: { code: "forbidden", message: refusal, fields: [], requestId: "1" } }, 403);
    plates = thicknesses.map((thicknessMm) => ({ thicknessMm, source: "Own" }));
    return json({ stockPlates: plates });
  };
  vi.stubGlobal("fetch", (input: string, init = {}) => Promise.resolve(answer(input, init)));
  const queryClient = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  render(
    <QueryClientProvider client={queryClient}>
      <CatalogScreen />
    </QueryClientProvider>,
  );
  return { sent };
}

const openPlates = async (): Promise<void> =>
  userEvent.click(await screen.findByRole("tab", { name: "Stock plates" }));

afterEach(() => vi.unstubAllGlobals());

describe("the catalogue screen", () => {
  it("shows a family with what follows from its dimensions, and the source of each row", async () => {
    openScreen();
    const table = await screen.findByRole("table", { name: "Sections" });
    const row = within(table).getByRole("row", { name: /^HE 300 A / });
    // Handbook: A 112.5 cm2, I 18 260 cm4.
    expect(row.textContent).toMatch(/112\.5/);
    expect(row.textContent?.replace(/\s/g, "")).toMatch(/18260/);
    const number = Number(within(row).getAllByRole("cell").at(-1)?.textContent);
    const notes = within(screen.getByRole("list", { name: "Sources" })).getAllByRole("listitem");
    expect(notes[number - 1]?.textContent).toMatch(/^EN 10365/);
    expect(within(table).getAllByRole("row")).toHaveLength(5);
  });

  it("finds a section of any family in any spelling", async () => {
    openScreen();
    await userEvent.type(await screen.findByLabelText("Find in every family"), "254 x 254 x 107");
    expect(screen.getByRole("status").textContent).toBe("1 section");
    expect(screen.getByRole("rowheader", { name: "UC 254x254x107" })).toBeTruthy();
    await userEvent.type(screen.getByLabelText("Find in every family"), "9");
    expect(screen.getByRole("heading", { name: "No such section" })).toBeTruthy();
  });

  it.each([
    ["Angles", "L 100x100x10"],
    ["Steels", "S460M EN 10025-4"],
    ["Bolts and bars", "M24"],
  ])("lists %s", async (tab, name) => {
    openScreen();
    await userEvent.click(await screen.findByRole("tab", { name: tab }));
    expect(screen.getAllByRole("rowheader", { name }).length).toBeGreaterThan(0);
  });

  it("says that it cannot be read, and tries again", async () => {
    openScreen({ isDown: true });
    expect((await screen.findByRole("alert")).textContent).toMatch(/could not be read/);
    expect(screen.getByRole("button", { name: "Try again" })).toBeTruthy();
  });
});

describe("stock plates", () => {
  it("are added by thickness and taken off", async () => {
    const { sent } = openScreen();
    await openPlates();
    await userEvent.type(screen.getByLabelText("Add a thickness, mm"), "16,5{Enter}");
    expect(await screen.findByRole("rowheader", { name: "16.5" })).toBeTruthy();
    expect(screen.getByText("16.5 mm is on the list.")).toBeTruthy();
    await userEvent.click(screen.getByRole("button", { name: "Take 10 mm off the list" }));
    expect(await screen.findByText("10 mm is off the list.")).toBeTruthy();
    expect(sent).toEqual([
      [10, 12, 16.5],
      [12, 16.5],
    ]);
  });

  it.each([
    ["a word", "thick", /Give a thickness in mm/],
    ["a thickness twice", "12", /Name each thickness once/],
    ["a foil", "1", /At least 3 mm/],
  ])("refuse %s beside the field, and keep what was typed", async (_, typed, message) => {
    const { sent } = openScreen();
    await openPlates();
    const field = screen.getByLabelText<HTMLInputElement>("Add a thickness, mm");
    await userEvent.type(field, `${typed}{Enter}`);
    expect(screen.getByRole("alert").textContent).toMatch(message);
    expect(field.getAttribute("aria-invalid")).toBe("true");
    expect(field.value).toBe(typed);
    expect(sent).toEqual([]);
  });

  it("tell the server's refusal and keep what was typed", async () => {
    openScreen({ refusal: "You may look at the plates but not change them." });
    await openPlates();
    const field = screen.getByLabelText<HTMLInputElement>("Add a thickness, mm");
    await userEvent.type(field, "14{Enter}");
    expect((await screen.findByRole("alert")).textContent).toMatch(/may look/);
    expect(field.value).toBe("14");
  });

  it("are only read by who may not change them", async () => {
    openScreen({ canEdit: false });
    await openPlates();
    expect(screen.getByRole("rowheader", { name: "12" })).toBeTruthy();
    expect(screen.queryByLabelText("Add a thickness, mm")).toBeNull();
    expect(screen.queryByRole("button", { name: /off the list/ })).toBeNull();
  });
});
