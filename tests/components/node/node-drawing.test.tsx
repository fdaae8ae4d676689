import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { NodeDrawing } from "@/components/node/node-drawing";
import { drawNode } from "@/lib/drawing/draw-node";
import { toSvg } from "@/lib/drawing/to-svg";
import { BARS, buildDrawingCase, STIFFENERS } from "@/tests/lib/drawing/drawing-case";

const drawing = drawNode(buildDrawingCase(), [], { reference: "C4" });
const thickness = /left end plate thickness, 20 mm/;

describe("NodeDrawing", () => {
  it("has a title and a description in words", () => {
    render(<NodeDrawing drawing={drawNode(buildDrawingCase(), [STIFFENERS], { reference: "C4" })} />);
    const image = screen.getByRole("img", { name: /Node C4, to scale. Elevation/ });
    expect(image).toHaveAccessibleDescription(/HE 300 A.*stiffeners 120 by 12/);
  });

  it("draws the same shapes as the file, without a style attribute", () => {
    const { container } = render(<NodeDrawing drawing={drawing} />);
    const file = new DOMParser().parseFromString(toSvg(drawing), "application/xml");
    expect(file.querySelector("parsererror")).toBeNull();
    const shapes = (root: ParentNode) =>
      [...root.querySelectorAll("[data-part]")].map((node) =>
        ["data-part", "data-kind", "x", "y", "width", "height", "points"].map((name) =>
          node.getAttribute(name),
        ),
      );
    expect(shapes(container)).toEqual(shapes(file));
    expect(container.querySelector("[style]")).toBeNull();
  });

  it("gives two drawings on one page hatches of their own", () => {
    const stiffened = drawNode(buildDrawingCase(), [STIFFENERS, BARS]);
    const { container } = render(
      <>
        <NodeDrawing drawing={stiffened} />
        <NodeDrawing drawing={stiffened} />
      </>,
    );
    const ids = [...container.querySelectorAll("pattern")].map((pattern) => pattern.id);
    expect(new Set(ids).size).toBe(4);
    for (const id of ids) expect(id).toMatch(/^[A-Za-z][\w-]*$/);
  });

  it("opens a dimension by mouse, keeps the value on Enter and gives the focus back", async () => {
    const onEdit = vi.fn();
    render(<NodeDrawing drawing={drawing} interactive onEdit={onEdit} />);
    await userEvent.click(screen.getByRole("button", { name: thickness }));
    const input = screen.getByRole("textbox", { name: "left end plate thickness (mm)" });
    expect(input).toHaveFocus();
    expect(input).toHaveValue("20");
    await userEvent.keyboard("25{Enter}");
    expect(onEdit).toHaveBeenCalledExactlyOnceWith("left.connection.plate.thickness", "25");
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(screen.getByRole("button", { name: thickness })).toHaveFocus();
  });

  it("opens a dimension by keyboard, drops the value on Escape and gives the focus back", async () => {
    const onEdit = vi.fn();
    render(<NodeDrawing drawing={drawing} interactive onEdit={onEdit} />);
    const button = screen.getByRole("button", { name: /left bolt row 1/ });
    button.focus();
    await userEvent.keyboard("{Enter}");
    expect(screen.getByRole("textbox")).toHaveValue("-45");
    await userEvent.keyboard("-60{Escape}");
    expect(onEdit).not.toHaveBeenCalled();
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(button).toHaveFocus();
  });

  it("hands on what was typed when the focus moves elsewhere, even if it is no number", async () => {
    const onEdit = vi.fn();
    render(<NodeDrawing drawing={drawing} interactive onEdit={onEdit} />);
    await userEvent.click(screen.getByRole("button", { name: thickness }));
    await userEvent.keyboard("twenty");
    await userEvent.tab();
    expect(onEdit).toHaveBeenCalledExactlyOnceWith("left.connection.plate.thickness", "twenty");
  });

  it("has no buttons without a way to edit, and none for a depth that the catalogue gives", () => {
    const { unmount } = render(<NodeDrawing drawing={drawing} />);
    expect(screen.queryAllByRole("button")).toEqual([]);
    unmount();
    render(<NodeDrawing drawing={drawing} interactive onEdit={vi.fn()} />);
    const group = screen.getByRole("group", { name: /Elevation/ });
    expect(within(group).queryByRole("button", { name: /column depth/ })).toBeNull();
    expect(within(group).getAllByRole("button")).toHaveLength(12);
  });
});
