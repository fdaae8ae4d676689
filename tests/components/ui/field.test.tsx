import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/field";

describe("a field", () => {
  it("ties label, hint and error to the control", () => {
    render(<TextField label="Storey height" hint="mm" error="Give a number above 0." defaultValue="" />);
    const input = screen.getByRole("textbox", { name: "Storey height" });
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription("mm Give a number above 0.");
    expect(screen.getByRole("alert")).toHaveTextContent("Give a number above 0.");
  });

  it("is not marked invalid without an error", () => {
    render(<TextField label="Storey height" defaultValue="4200" />);
    expect(screen.getByRole("textbox", { name: "Storey height" })).toBeValid();
    expect(screen.queryByRole("alert")).toBeNull();
  });
});

describe("a busy button", () => {
  it("keeps its focus and takes no second press", async () => {
    const user = userEvent.setup();
    const press = vi.fn();
    const { rerender } = render(<Button onClick={press}>Recalculate</Button>);
    await user.click(screen.getByRole("button", { name: "Recalculate" }));
    rerender(
      <Button onClick={press} isBusy busyLabel="Recalculating">
        Recalculate
      </Button>,
    );
    const busy = screen.getByRole("button", { name: "Recalculating" });
    await user.click(busy);
    expect(busy).toHaveFocus();
    expect(press).toHaveBeenCalledTimes(1);
  });
});
