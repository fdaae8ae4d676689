import { fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { DimensionEditor } from "@/components/node/dimension-editor";
import type { Dimension } from "@/lib/drawing/drawing";

const dimension = {
  id: "column.h",
  edits: "column.section.h",
  name: "column depth",
  valueMm: 290,
  textAt: { x: 10, y: 10 },
} as Dimension;
const extent = { minX: 0, minY: 0, maxX: 100, maxY: 100 };

describe("a dimension edited on the drawing", () => {
  it("keeps what was typed when the drawing is made anew in between", async () => {
    const onCommit = vi.fn();
    const { rerender } = render(
      <DimensionEditor dimension={dimension} extent={extent} onCommit={onCommit} onCancel={vi.fn()} />,
    );
    const input = screen.getByLabelText("column depth (mm)");
    expect(input).toHaveFocus();
    await userEvent.keyboard("32");
    rerender(
      <DimensionEditor
        dimension={{ ...dimension }}
        extent={{ ...extent }}
        onCommit={onCommit}
        onCancel={vi.fn()}
      />,
    );
    await userEvent.keyboard("0{Enter}");
    expect(onCommit).toHaveBeenCalledWith("column.section.h", "320", true);
  });

  it("changes nothing on Escape, nor when what stands there is left as it is", () => {
    const onCommit = vi.fn();
    const onCancel = vi.fn();
    render(<DimensionEditor dimension={dimension} extent={extent} onCommit={onCommit} onCancel={onCancel} />);
    fireEvent.blur(screen.getByLabelText("column depth (mm)"));
    expect(onCancel).toHaveBeenCalledOnce();
    expect(onCommit).not.toHaveBeenCalled();
  });
});
