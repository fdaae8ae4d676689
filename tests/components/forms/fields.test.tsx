import { fireEvent, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { GradePicker } from "@/components/forms/grade-picker";
import { QuantityField } from "@/components/forms/quantity-field";
import { RowsField } from "@/components/forms/rows-field";
import { SectionPicker } from "@/components/forms/section-picker";
import { WeldField } from "@/components/forms/weld-field";
import { buildCatalog } from "@/tests/factories/build-node-document";

const none = () => undefined;

describe("QuantityField", () => {
  it("is named with its unit, opens the number keys, and tells its error", () => {
    render(
      <QuantityField
        label="Thickness"
        unit="mm"
        path="t"
        value="2x"
        onChange={vi.fn()}
        error="Give a number."
      />,
    );
    const input = screen.getByRole("textbox", { name: "Thickness (mm)" });
    expect(input).toHaveAttribute("inputmode", "decimal");
    expect(input).toHaveAccessibleDescription(/Give a number/);
    expect(screen.getByRole("alert")).toHaveTextContent("Give a number.");
  });
  it("shows value and unit alone when it may only be read", () => {
    render(<QuantityField label="Thickness" unit="mm" path="t" value="20" onChange={vi.fn()} readOnly />);
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(screen.getByText(/Thickness/).parentElement).toHaveTextContent("Thickness (mm): 20 mm");
  });
});

describe("SectionPicker", () => {
  const picker = (value: string | Record<string, string>, onChange = vi.fn()) => {
    render(
      <SectionPicker
        label="Column section"
        path="s"
        value={value}
        catalog={buildCatalog()}
        onChange={onChange}
        errorAt={none}
      />,
    );
    return onChange;
  };
  it("finds the family of a designation in any spelling and offers its members", () => {
    picker("hea 300");
    expect(screen.getByRole("combobox", { name: "Column section, family" })).toHaveValue("HE A");
    expect(screen.getByRole("combobox", { name: "Column section" })).toHaveValue("HE 300 A");
  });
  it("keeps the size of the node when the family changes", () => {
    const onChange = picker("HE 300 A");
    fireEvent.change(screen.getByRole("combobox", { name: "Column section, family" }), {
      target: { value: "HE B" },
    });
    const chosen = buildCatalog().sections.find((row) => row.designation === onChange.mock.calls[0]?.[0]);
    const nearest = Math.min(
      ...buildCatalog()
        .sections.filter((row) => row.family === "HE B")
        .map((row) => Math.abs(row.depthMm - 290)),
    );
    expect(chosen?.family).toBe("HE B");
    expect(Math.abs((chosen?.depthMm ?? 0) - 290)).toBe(nearest);
  });
  it("starts dimensions of one's own from the section there was", () => {
    const onChange = picker("HE 300 A");
    fireEvent.change(screen.getByRole("combobox", { name: "Column section, family" }), {
      target: { value: "welded, by dimensions" },
    });
    expect(onChange).toHaveBeenCalledWith({ h: "290", b: "300", tw: "8.5", tf: "14", weld: "5" });
  });
  it("shows dimensions as fields, and keeps a designation that the catalogue does not have", () => {
    picker({ h: "300", b: "200", tw: "10", tf: "15", r: "18" });
    expect(screen.getByRole("textbox", { name: "Column section, root radius (mm)" })).toHaveValue("18");
  });
  it("keeps an unknown designation in sight", () => {
    picker("XY 1");
    expect(screen.getByRole("combobox", { name: "Column section" })).toHaveDisplayValue(
      "XY 1 (not in the list)",
    );
  });
});

describe("GradePicker", () => {
  it("offers the grades of the catalogue and strengths of one's own", () => {
    const onChange = vi.fn();
    render(
      <GradePicker
        label="Steel"
        path="g"
        value="S355"
        catalog={buildCatalog()}
        onChange={onChange}
        errorAt={none}
      />,
    );
    const select = screen.getByRole("combobox", { name: "Steel" });
    expect(select).toHaveValue("S355");
    fireEvent.change(select, { target: { value: "S275" } });
    expect(onChange).toHaveBeenLastCalledWith("S275");
    fireEvent.change(select, { target: { value: "by strength" } });
    expect(onChange).toHaveBeenLastCalledWith({ fy: "355", fu: "490" });
  });
  it("shows strengths as fields", () => {
    const onChange = vi.fn();
    render(
      <GradePicker
        label="Steel"
        path="g"
        value={{ fy: "300", fu: "450" }}
        catalog={buildCatalog()}
        onChange={onChange}
        errorAt={none}
      />,
    );
    fireEvent.change(screen.getByRole("textbox", { name: "Steel, yield strength (N/mm²)" }), {
      target: { value: "310" },
    });
    expect(onChange).toHaveBeenCalledWith({ fy: "310", fu: "450" });
  });
});

describe("WeldField", () => {
  it("changes between a throat and a butt weld", () => {
    const onChange = vi.fn();
    const { rerender } = render(<WeldField label="Web" path="w" value="6" onChange={onChange} />);
    expect(screen.getByRole("textbox", { name: "Web, throat (mm)" })).toHaveValue("6");
    fireEvent.change(screen.getByRole("combobox", { name: "Web, kind of weld" }), {
      target: { value: "butt" },
    });
    expect(onChange).toHaveBeenLastCalledWith("butt");
    rerender(<WeldField label="Web" path="w" value="butt" onChange={onChange} />);
    expect(screen.queryByRole("textbox")).toBeNull();
    fireEvent.change(screen.getByRole("combobox", { name: "Web, kind of weld" }), {
      target: { value: "fillet" },
    });
    expect(onChange).toHaveBeenLastCalledWith("5");
  });
});

describe("RowsField", () => {
  it("adds a row below, changes one, removes one, and never the last", async () => {
    const onChange = vi.fn();
    const { rerender } = render(
      <RowsField label="Bolts" path="rows" rows={["-45", "65"]} onChange={onChange} errorAt={none} />,
    );
    await userEvent.click(screen.getByRole("button", { name: "Add a row, Bolts" }));
    expect(onChange).toHaveBeenLastCalledWith(["-45", "65", "135"]);
    fireEvent.change(screen.getByRole("textbox", { name: "Bolts, row 2 (mm)" }), { target: { value: "7" } });
    expect(onChange).toHaveBeenLastCalledWith(["-45", "7"]);
    await userEvent.click(screen.getByRole("button", { name: "Remove row 1, Bolts" }));
    expect(onChange).toHaveBeenLastCalledWith(["65"]);
    rerender(<RowsField label="Bolts" path="rows" rows={["65"]} onChange={onChange} errorAt={none} />);
    expect(screen.getByRole("button", { name: "Remove row 1, Bolts" })).toBeDisabled();
  });
  it("tells an error of the list and one of a row", () => {
    const errors: Record<string, string> = { rows: "From the top down.", "rows.1": "Give a number." };
    render(
      <RowsField
        label="Bolts"
        path="rows"
        rows={["65", "x"]}
        onChange={vi.fn()}
        errorAt={(path) => errors[path]}
      />,
    );
    expect(screen.getAllByRole("alert").map((alert) => alert.textContent)).toEqual([
      expect.stringContaining("Give a number."),
      expect.stringContaining("From the top down."),
    ]);
  });
});
