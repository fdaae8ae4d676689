import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { describe, expect, it } from "vitest";
import { Button } from "@/components/ui/button";
import { ConfirmDialog, Dialog } from "@/components/ui/dialog";
import "@/tests/support/dialog-in-jsdom";

function Page() {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setIsOpen(true)}>Open the working</Button>
      {isOpen ? (
        <Dialog title="Panel shear" onClose={() => setIsOpen(false)}>
          <a href="#clause">Clause</a>
        </Dialog>
      ) : null}
    </>
  );
}

describe("a dialog", () => {
  it("is named by its title, takes the focus, and gives it back to what opened it on Escape", async () => {
    const user = userEvent.setup();
    render(<Page />);
    const opener = screen.getByRole("button", { name: "Open the working" });
    await user.click(opener);
    expect(screen.getByRole("dialog", { name: "Panel shear" })).toContainElement(
      document.activeElement as HTMLElement,
    );
    await user.keyboard("{Escape}");
    expect(screen.queryByRole("dialog")).toBeNull();
    expect(opener).toHaveFocus();
  });

  it("keeps Tab inside, both ways", async () => {
    const user = userEvent.setup();
    render(<Page />);
    await user.click(screen.getByRole("button", { name: "Open the working" }));
    const close = screen.getByRole("button", { name: "Close" });
    const clause = screen.getByRole("link", { name: "Clause" });
    expect(close).toHaveFocus();
    await user.tab({ shift: true });
    expect(clause).toHaveFocus();
    await user.tab();
    expect(close).toHaveFocus();
  });
});

describe("a question before something final", () => {
  it("does nothing until it is confirmed, and stays with the reason when it fails", async () => {
    const user = userEvent.setup();
    const answers: string[] = [];
    const question = (error?: string) => (
      <ConfirmDialog
        title="Delete node C4?"
        confirmLabel="Delete the node"
        error={error}
        onConfirm={() => answers.push("yes")}
        onClose={() => answers.push("no")}
      >
        <p>It leaves the register.</p>
      </ConfirmDialog>
    );
    const { rerender } = render(question());
    await user.click(screen.getByRole("button", { name: "Keep it" }));
    await user.click(screen.getByRole("button", { name: "Delete the node" }));
    expect(answers).toEqual(["no", "yes"]);
    rerender(question("Someone saved this node after you opened it."));
    expect(screen.getByRole("alert")).toHaveTextContent("Someone saved this node");
  });
});
