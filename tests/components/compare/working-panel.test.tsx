import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { describe, expect, it, vi } from "vitest";
import { WorkingPanel, type Working, type WorkingPanelProps } from "@/components/compare/working-panel";
import {
  buildCheck,
  buildOption,
  buildOutsideScopeOption,
  buildStep,
  stiffeners,
} from "@/tests/factories/build-result-document";
import "@/tests/support/dialog-in-jsdom";

const worked = buildOption({
  key: "stiffeners",
  name: "Stiffeners top and bottom",
  measures: [stiffeners],
  cost: 402,
  rank: 2,
  checks: [
    buildCheck("column-web-shear", 0.61, { side: "left", loadCase: "ULS 1" }),
    buildCheck("column-web-shear", 0.87, {
      loadCase: "ULS 2",
      steps: [buildStep({ children: [buildStep({ id: "area", symbol: "A_vc", value: 3728, unit: "mm2" })] })],
    }),
  ],
});
const ready: Working = { state: "ready", option: worked, caution: null };

function Page(changes: Partial<WorkingPanelProps>) {
  const [isOpen, setIsOpen] = useState(false);
  const props: WorkingPanelProps = {
    option: worked,
    letter: "D",
    opening: { about: "component", component: "column-web-shear" },
    choice: { kind: "envelope" },
    limit: 1,
    working: ready,
    onClose: () => setIsOpen(false),
    ...changes,
  };
  return (
    <>
      <button type="button" onClick={() => setIsOpen(true)}>
        0.87
      </button>
      {isOpen ? <WorkingPanel {...props} /> : null}
    </>
  );
}

async function open(changes: Partial<WorkingPanelProps> = {}) {
  const user = userEvent.setup();
  render(<Page {...changes} />);
  await user.click(screen.getByRole("button", { name: "0.87" }));
  return { user, panel: screen.getByRole("dialog") };
}

describe("the working of a number", () => {
  it("names the option and the component, and gives the focus back on Escape", async () => {
    const { user, panel } = await open();
    expect(panel).toHaveAccessibleName("D Stiffeners top and bottom Panel shear");
    await user.keyboard("{Escape}");
    expect(screen.queryByRole("dialog")).toBeNull();
    expect(screen.getByRole("button", { name: "0.87" })).toHaveFocus();
  });

  it("lists the checks worst first, each with demand, resistance and clause", async () => {
    const { panel } = await open();
    const text = panel.textContent ?? "";
    expect(text.indexOf("Right, ULS 2")).toBeGreaterThan(0);
    expect(text.indexOf("Left, ULS 1")).toBeGreaterThan(text.indexOf("Right, ULS 2"));
    expect(text).toContain("435.0 / 500.0 kN");
    expect(text).toContain("EN 1993-1-8:2005, 6.2.6");
  });

  it("shows symbol, numbers put in, result with unit, and source of each step, the earlier step inside the later", async () => {
    const { panel } = await open();
    expect(within(panel).getAllByText("EN 1993-1-8:2005, 6.2.6.1(2), Eq. (6.7)")).toHaveLength(2);
    expect(panel.textContent).toContain("= 687.7 kN");
    const inputs = within(panel).getAllByRole("list", { name: "Numbers put in" })[0];
    expect(inputs?.textContent).toContain("fy,wc = 355 N/mm²");
    const outer = panel.querySelectorAll("details details")[0];
    expect(outer?.querySelector("details")?.textContent).toContain("3728 mm²");
  });

  it("draws a joint's moment against its rotation, in figures too, and tells its classes' bounds", async () => {
    const { panel } = await open({ opening: { about: "joint" } });
    const table = within(panel).getAllByRole("table", { name: "Moment and rotation, in figures" })[0];
    // The softest joint is open: M_j,Rd over S_j,ini, softened 1.5^2.7 times at the resistance.
    const [softest] = [...worked.joints].sort((a, b) => a.initialStiffness - b.initialStiffness);
    const { momentResistance, initialStiffness } = softest ?? {
      momentResistance: NaN,
      initialStiffness: NaN,
    };
    const last = ((momentResistance / initialStiffness) * 1000 * 1.5 ** 2.7).toFixed(1);
    expect(within(table as HTMLElement).getByText(last)).toBeVisible();
    expect(panel.textContent).toMatch(/rigid from 120.000 kNm\/rad/);
    expect(panel.textContent).toContain("rotation capacity enough for plastic analysis (6.4)");
  });

  it("says that it loads, and offers another try when that failed", async () => {
    await open({ working: { state: "loading" } });
    expect(screen.getByRole("status")).toHaveTextContent("Loading the working");
  });

  it("offers another try when the working could not be read", async () => {
    const retry = vi.fn();
    const { user } = await open({
      working: { state: "failed", error: new Error("The server did not answer."), retry },
    });
    expect(screen.getByRole("alert")).toHaveTextContent("The server did not answer.");
    await user.click(screen.getByRole("button", { name: "Try again" }));
    expect(retry).toHaveBeenCalledOnce();
  });
});

describe("what else opens", () => {
  it("opens a cost into its operations: quantity, minutes, trade, cost, source, and their sum", async () => {
    await open({ opening: { about: "cost" } });
    const bill = screen.getByRole("table", { name: "Bill of operations" });
    const welding = within(bill).getByRole("row", { name: /weld stiffeners/ });
    expect(welding).toHaveTextContent("labour, welder");
    expect(welding).toHaveTextContent("1.84 m");
    expect(welding).toHaveTextContent("67.0");
    expect(welding).toHaveTextContent("241.20");
    expect(welding).toHaveTextContent("shop to confirm");
    // 0.6 and 0.4 of 402.
    expect(within(bill).getByRole("row", { name: /^Sum/ })).toHaveTextContent("402.00");
  });

  it("shows one trade only when its hours are opened", async () => {
    await open({ opening: { about: "hours", trade: "welder" } });
    const bill = screen.getByRole("table", { name: "Bill of operations" });
    expect(within(bill).queryByRole("row", { name: /stiffener plates/ })).toBeNull();
  });

  it("says that rates are not shown where there are no lines", async () => {
    await open({
      option: { ...worked, estimate: { ...worked.estimate, lines: [] } },
      opening: { about: "cost" },
    });
    expect(screen.getByText(/rates behind this comparison are not shown/)).toBeVisible();
  });

  it("opens an option into its parts", async () => {
    const { panel } = await open({ opening: { about: "option" } });
    expect(within(panel).getByRole("heading", { name: "Transverse stiffeners" })).toBeVisible();
    expect(panel).toHaveTextContent("120 × 12 mm, S355");
  });

  it("answers an option outside scope with its reason, whatever was asked", async () => {
    const { panel } = await open({ option: buildOutsideScopeOption(), opening: { about: "cost" } });
    expect(panel).toHaveTextContent("d_c / t_wc is above 69 ε");
    expect(within(panel).queryByRole("table")).toBeNull();
  });
});
