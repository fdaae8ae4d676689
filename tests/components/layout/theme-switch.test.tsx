import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it } from "vitest";
import { themeFrom } from "@/components/layout/theme";
import { ThemeSwitch } from "@/components/layout/theme-switch";

afterEach(() => {
  delete document.documentElement.dataset.theme;
});

describe("the choice of sheet", () => {
  it("takes effect at once and is kept in the browser", async () => {
    const user = userEvent.setup();
    render(<ThemeSwitch initial="system" />);
    const choice = screen.getByRole("combobox", { name: "Sheet" });
    await user.selectOptions(choice, "Dark");
    expect(document.documentElement.dataset.theme).toBe("dark");
    expect(document.cookie).toContain("panelwright-theme=dark");
    await user.selectOptions(choice, "As the system");
    expect(document.documentElement.dataset.theme).toBeUndefined();
    expect(document.cookie).toContain("panelwright-theme=system");
  });

  it("reads anything unknown as the system's choice", () => {
    expect([themeFrom("dark"), themeFrom("light"), themeFrom("pink"), themeFrom(undefined)]).toEqual([
      "dark",
      "light",
      "system",
      "system",
    ]);
  });
});
