import { render, screen } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { standingOf, UtilisationBar, UtilisationFigure } from "@/components/compare/utilisation-bar";

describe("a utilisation against its limit", () => {
  it.each([
    [0.94, 1, "within"],
    [0.95, 1, "tight"],
    [1, 1, "tight"],
    [1.0001, 1, "over"],
    [0.91, 0.9, "over"],
    [0.87, 0.9, "tight"],
  ] as const)("%f of %f is %s", (value, limit, standing) => {
    expect(standingOf(value, limit)).toBe(standing);
  });

  it("tells by mark and word, not by colour alone", () => {
    render(<UtilisationFigure value={1.31} limit={1} />);
    expect(screen.getByText("▲")).toHaveAttribute("aria-hidden", "true");
    expect(screen.getByText("over the limit")).toBeInTheDocument();
  });

  it("draws without a style attribute, which the content policy would drop", () => {
    const { container } = render(<UtilisationBar value={0.7} limit={1} />);
    expect(container.querySelector("[style]")).toBeNull();
    // 0.7 of a bar that ends at 1.4 of the limit.
    expect(container.querySelectorAll("rect")[1]).toHaveAttribute("width", "50.0%");
  });
});
