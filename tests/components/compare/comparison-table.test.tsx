import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { ComparisonTable, type ComparisonTableProps } from "@/components/compare/comparison-table";
import type { ResultDocument } from "@/lib/schemas/result-document";
import { buildOutsideScopeOption, buildResultDocument } from "@/tests/factories/build-result-document";

function show(changes: Partial<ComparisonTableProps> = {}) {
  const onOpen = vi.fn();
  const onSetExcluded = vi.fn();
  render(
    <ComparisonTable
      result={buildResultDocument()}
      choice={{ kind: "envelope" }}
      excluded={[]}
      onSetExcluded={onSetExcluded}
      onOpen={onOpen}
      drawing={(option) => <span>{`drawing of ${option.name}`}</span>}
      {...changes}
    />,
  );
  return { onOpen, onSetExcluded };
}

const rowOf = (label: string) => screen.getByRole("rowheader", { name: label }).closest("tr") as HTMLElement;
/** Cells of a row without its head. */
const cellsOf = (label: string) => within(rowOf(label)).getAllByRole("gridcell");

describe("the comparison", () => {
  it("is a grid with a column head for each option and its rank in it", () => {
    show();
    const heads = screen.getAllByRole("columnheader").map((head) => head.textContent);
    expect(heads).toHaveLength(7);
    expect(heads[1]).toMatch(/^A Bare column.*not ranked: fails/);
    expect(heads[3]).toMatch(/^C Bars at top, stiffeners at bottom.*Rank 1 cheapest/);
    expect(heads[4]).toMatch(/Rank 2 \+84 EUR/);
    expect(heads[5]).toMatch(/not ranked: outside scope/);
    expect(heads[6]).toMatch(/Rank 3 \+300 EUR/);
  });

  it("reads from verdict to cautions", () => {
    show();
    const heads = screen.getAllByRole("rowheader").map((head) => head.textContent?.replace(/^[+−]/, ""));
    const order = [
      "Verdict",
      "Utilisation",
      "panel shear",
      "Stiffness",
      "Hours added",
      "Cost added",
      "Steel added",
      "Cautions",
    ];
    const places = order.map((title) => heads.indexOf(title));
    expect(places.every((place) => place >= 0)).toBe(true);
    expect([...places].sort((a, b) => a - b)).toEqual(places);
  });

  it("says tight and over in words beside the mark", () => {
    show();
    expect(
      screen.getByRole("button", {
        name: /^web compression, Bare column: 1\.31 over the limit, right, ULS 3, governs/,
      }),
    ).toBeVisible();
    expect(
      screen.getByRole("button", { name: /^web compression, Stiffeners top and bottom: 0\.98 tight/ }),
    ).toBeVisible();
    expect(screen.getByRole("button", { name: /^panel shear, Heavier column: 0\.60, right/ })).toBeVisible();
  });

  it("never shows a number for an option outside scope, and says why it is outside", () => {
    show();
    const rows = within(screen.getByRole("grid")).getAllByRole("row").slice(2);
    const figures = rows
      .flatMap((row) => within(row).queryAllByRole("gridcell").slice(4, 5))
      .map((cell) => cell.textContent ?? "");
    expect(figures.length).toBeGreaterThan(15);
    expect(figures[0]).toContain("outside scope");
    expect(figures[0]).toContain("d_c / t_wc is above 69 ε");
    for (const text of figures.slice(1)) expect(text).not.toMatch(/\d/);
  });

  it("says nothing added for the bare column instead of a cost of zero", () => {
    show();
    expect(cellsOf("shop, a node")[0]).toHaveTextContent("nothing added");
    expect(cellsOf("shop, a node")[2]).toHaveTextContent("1 h 46");
    expect(cellsOf("all 12 nodes")[2]).toHaveTextContent("3816 EUR");
  });

  it("shows one load case alone when it is chosen", () => {
    show({ choice: { kind: "one", name: "ULS 1" } });
    // 1.31 is reached in ULS 3 on the right; in ULS 1 the left has 0.8 of it.
    expect(
      screen.getByRole("button", { name: /^web compression, Bare column: 1\.05 over the limit, left/ }),
    ).toBeVisible();
    expect(screen.queryByRole("rowheader", { name: "panel shear" })).toBeNull();
  });
});

describe("folding and setting aside", () => {
  it("starts with the connection folded to its worst figure, and unfolds it", async () => {
    const user = userEvent.setup();
    show();
    const group = screen.getByRole("button", { name: "of the connection" });
    expect(group).toHaveAttribute("aria-expanded", "false");
    expect(screen.queryByRole("rowheader", { name: "bolt tension" })).toBeNull();
    expect(screen.getByRole("button", { name: /^of the connection, Bare column: 0\.61/ })).toBeVisible();
    await user.click(group);
    expect(screen.getByRole("rowheader", { name: "bolt tension" })).toBeVisible();
  });

  it("folds a column to its letter and back", async () => {
    const user = userEvent.setup();
    show();
    await user.click(screen.getByRole("button", { name: "Fold option B" }));
    expect(screen.queryByText("drawing of Bars at top")).toBeNull();
    await user.click(screen.getByRole("button", { name: /^B Bars at top, folded/ }));
    expect(screen.getByText("drawing of Bars at top")).toBeVisible();
  });

  it("asks for the whole new list of options set aside", async () => {
    const user = userEvent.setup();
    const { onSetExcluded } = show({ excluded: ["heavier"] });
    await user.click(screen.getByRole("button", { name: /Set aside.*option D/ }));
    expect(onSetExcluded).toHaveBeenLastCalledWith(["heavier", "stiffeners"]);
    await user.click(screen.getByRole("button", { name: /Rank again.*option F/ }));
    expect(onSetExcluded).toHaveBeenLastCalledWith([]);
  });

  it("offers no setting aside to someone who may not", () => {
    show({ onSetExcluded: null });
    expect(screen.queryByRole("button", { name: /Set aside/ })).toBeNull();
  });
});

/** Eight options, three of them outside scope. */
function buildManyOptions(): ResultDocument {
  const result = buildResultDocument();
  const outside = ["one", "two"].map((key) => buildOutsideScopeOption({ key, name: `Bars ${key}` }));
  return { ...result, options: [...result.options, ...outside] };
}

describe("with more columns than a laptop shows", () => {
  it("starts with what is outside scope folded, and says in the head what is folded and why", () => {
    show({ result: buildManyOptions() });
    expect(screen.getByRole("status")).toHaveTextContent(
      "8 options: 3 ranked, 2 fail, 3 outside scope. 3 folded",
    );
    expect(
      screen.getByRole("button", { name: "G Bars one, folded, not ranked: outside scope. Unfold it" }),
    ).toBeVisible();
    expect(screen.getByText("drawing of Bars at top")).toBeVisible();
    expect(screen.queryByText("drawing of Bars one")).toBeNull();
  });

  it("folds all that is not ranked at once, the bare column excepted, and unfolds all", async () => {
    const user = userEvent.setup();
    show({ result: buildManyOptions() });
    await user.click(screen.getByRole("button", { name: "Fold what is not ranked" }));
    expect(screen.queryByText("drawing of Bars at top")).toBeNull();
    expect(screen.getByText("drawing of Bare column")).toBeVisible();
    expect(screen.getByText("drawing of Heavier column")).toBeVisible();
    expect(screen.queryByRole("button", { name: "Fold what is not ranked" })).toBeNull();
    await user.click(screen.getByRole("button", { name: "Unfold all" }));
    expect(screen.getByText("drawing of Bars one")).toBeVisible();
  });

  it("leaves a sheet that fits as it is", () => {
    show();
    expect(screen.queryByRole("status")).toBeNull();
    expect(screen.getByText("drawing of Web plate, one side")).toBeVisible();
  });
});

describe("by keyboard", () => {
  it("is one Tab stop; arrows move, Home and End go to the ends, Enter opens", async () => {
    const user = userEvent.setup();
    const { onOpen } = show();
    await user.tab();
    expect(screen.getByRole("button", { name: /^A Bare column/ })).toHaveFocus();
    screen.getByRole("button", { name: /^panel shear, Bare column/ }).focus();
    await user.keyboard("{ArrowRight}{ArrowDown}");
    expect(screen.getByRole("button", { name: /^web compression, Bars at top:/ })).toHaveFocus();
    await user.keyboard("{Enter}");
    expect(onOpen).toHaveBeenCalledWith("bars-top", {
      about: "component",
      component: "column-web-compression",
    });
    await user.keyboard("{End}");
    expect(screen.getByRole("button", { name: /^web compression, Heavier column:/ })).toHaveFocus();
    await user.keyboard("{Home}{ArrowLeft}");
    expect(screen.getByRole("button", { name: /^web compression, Bare column:/ })).toHaveFocus();
    await user.tab();
    expect(document.body).toHaveFocus();
  });

  it("keeps the focus in the head of a column that is folded and unfolded", async () => {
    const user = userEvent.setup();
    show();
    screen.getByRole("button", { name: "Fold option B" }).focus();
    await user.keyboard("{Enter}");
    expect(screen.getByRole("button", { name: /^B Bars at top, folded/ })).toHaveFocus();
    await user.keyboard("{Enter}");
    expect(screen.getByRole("button", { name: "Fold option B" })).toHaveFocus();
  });

  it("stays reachable by Tab when the focused column folds away", async () => {
    const user = userEvent.setup();
    show();
    screen.getByRole("button", { name: "Fold option A" }).focus();
    await user.keyboard("{Enter}");
    const reachable = within(screen.getByRole("grid"))
      .getAllByRole("button")
      .filter((button) => button.tabIndex === 0);
    expect(reachable).toHaveLength(1);
  });
});
