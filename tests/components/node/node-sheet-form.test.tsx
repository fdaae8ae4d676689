import { fireEvent, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { draftOf } from "@/components/node/node-draft";
import { NodeSheetForm } from "@/components/node/node-sheet-form";
import { useNodeDraft } from "@/components/node/use-node-draft";
import type { NodeDocument } from "@/lib/schemas/node-document";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

interface SheetProps {
  readonly document?: NodeDocument;
  readonly canEdit?: boolean;
  readonly onSave?: (document: NodeDocument) => void;
}

function Sheet({ document = buildNodeDocument(), canEdit = true, onSave = vi.fn() }: SheetProps) {
  const nodeDraft = useNodeDraft("node-1", { version: 3, draft: draftOf(document) }, buildCatalog(), canEdit);
  return (
    <NodeSheetForm
      nodeDraft={nodeDraft}
      catalog={buildCatalog()}
      canEdit={canEdit}
      above="here"
      notices={nodeDraft.isRestored ? <p>restored</p> : null}
      isSaving={false}
      saveLabel="Save"
      comparisonHref="/comparison"
      onSave={onSave}
    />
  );
}

/** By label: looking by role through a sheet of a hundred fields takes seconds. */
const field = (name: string) => screen.getByLabelText(name);
const type = (name: string, text: string) => fireEvent.change(field(name), { target: { value: text } });
const THICKNESS = "Left end plate thickness (mm)";

// A whole sheet of fields in jsdom is slow on a busy machine; none of it waits for anything.
vi.setConfig({ testTimeout: 60_000 });

beforeEach(() => window.sessionStorage.clear());

describe("the node sheet", () => {
  it("keeps what was typed and says beside the field what is wrong with it", () => {
    render(<Sheet />);
    type(THICKNESS, "twenty");
    expect(field(THICKNESS)).toHaveValue("twenty");
    expect(field(THICKNESS)).toBeInvalid();
    expect(field(THICKNESS)).toHaveAccessibleDescription(/Give a number/);
    const faults = screen.getByTestId("faults");
    expect(faults).toHaveTextContent("left end plate thickness: Give a number.");
    type(THICKNESS, "25");
    expect(screen.queryByTestId("faults")).toBeNull();
  });

  it("leads from the list of faults to the field", async () => {
    render(<Sheet />);
    type("Load case ULS 1, left moment (kNm)", "2x");
    await userEvent.click(within(screen.getByTestId("faults")).getByRole("button", { name: /left moment/ }));
    expect(field("Load case ULS 1, left moment (kNm)")).toHaveFocus();
  });

  it("lets the drawing follow each keystroke of the form", () => {
    render(<Sheet />);
    type(THICKNESS, "25");
    expect(screen.getByRole("button", { name: /left end plate thickness, 25 mm/ })).toBeInTheDocument();
    type("Left bolts, row 1 (mm)", "-50");
    expect(screen.getByRole("button", { name: /left bolt row 1.*\u221250 mm/ })).toBeInTheDocument();
  });

  it("lets the form follow a dimension changed on the drawing", async () => {
    render(<Sheet />);
    await userEvent.click(screen.getByRole("button", { name: /left end plate, past the beam's top, 90 mm/ }));
    await userEvent.keyboard("100{Enter}");
    expect(field("Left end plate past the beam's top (mm)")).toHaveValue("100");
    expect(screen.getByRole("button", { name: /past the beam's top, 100 mm/ })).toHaveFocus();
    await userEvent.click(screen.getByRole("button", { name: /left bolt gauge/ }));
    await userEvent.keyboard("wide{Enter}");
    expect(field("Left bolt gauge (mm)")).toHaveValue("wide");
    expect(field("Left bolt gauge (mm)")).toBeInvalid();
  });

  it("leads from the depth of a catalogue section to the choice of sections, and edits a depth of its own in place", async () => {
    render(<Sheet />);
    await userEvent.click(
      screen.getByRole("button", { name: /column depth, 290 mm: of the catalogue; choose another section/ }),
    );
    expect(field("Column section")).toHaveFocus();
    fireEvent.change(field("Column section, family"), { target: { value: "welded, by dimensions" } });
    await userEvent.click(screen.getByRole("button", { name: /column depth, 290 mm: change/ }));
    await userEvent.keyboard("320{Enter}");
    expect(field("Column section, depth (mm)")).toHaveValue("320");
  });

  it("answers for the bare column at once, and anew after a change of the column", async () => {
    render(<Sheet />);
    const sentence = () => screen.getByTestId("bare-result").textContent;
    expect(sentence()).toMatch(/^The bare column (fails|is good enough): .+ on the left .+ in ULS 1\./);
    const before = sentence();
    fireEvent.change(screen.getByRole("combobox", { name: "Column section" }), {
      target: { value: "HE 450 A" },
    });
    await waitFor(() => expect(sentence()).not.toBe(before), { timeout: 3000 });
    expect(screen.getByRole("group", { name: /Elevation/ })).toHaveAccessibleDescription(/HE 450 A/);
  });

  it("says that result and drawing are of the last node that was in order", () => {
    render(<Sheet />);
    type("Left bolt gauge (mm)", "");
    expect(screen.getByTestId("bare-result")).toHaveTextContent("Of the last node that was in order");
    expect(screen.getByText(/Drawn as the sizes last were in order/)).toBeInTheDocument();
  });

  it("saves the document, numbers as numbers; with a fault it goes to the fault instead", async () => {
    const onSave = vi.fn();
    render(<Sheet onSave={onSave} />);
    type("Number of nodes", "0");
    await userEvent.click(screen.getByRole("button", { name: "Save" }));
    expect(onSave).not.toHaveBeenCalled();
    expect(field("Number of nodes")).toHaveFocus();
    type("Number of nodes", "14");
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect(onSave).toHaveBeenCalledExactlyOnceWith(buildNodeDocument({ quantity: 14 }));
  });

  it("brings unsaved typing back after a reload, faults included", () => {
    const { unmount } = render(<Sheet />);
    type(THICKNESS, "22,");
    unmount();
    render(<Sheet />);
    expect(screen.getByText("restored")).toBeInTheDocument();
    expect(field(THICKNESS)).toHaveValue("22,");
  });

  it("adds the other side as a copy and takes it away again", async () => {
    render(<Sheet />);
    await userEvent.click(screen.getByRole("button", { name: "Add, as on the left" }));
    expect(field("Right end plate thickness (mm)")).toHaveValue("20");
    expect(field("Load case ULS 1, right moment (kNm)")).toHaveValue("210");
    await userEvent.click(screen.getByRole("button", { name: "Remove the right beam" }));
    expect(screen.queryByRole("textbox", { name: "Right end plate thickness (mm)" })).toBeNull();
  });

  it("takes changes back one field at a time, and dropped changes too", () => {
    render(<Sheet />);
    type(THICKNESS, "2");
    type(THICKNESS, "25");
    type("Number of nodes", "14");
    fireEvent.click(screen.getByText("Drop changes"));
    expect(field(THICKNESS)).toHaveValue("20");
    fireEvent.click(screen.getByText("Undo"));
    expect(field(THICKNESS)).toHaveValue("25");
    fireEvent.click(screen.getByText("Undo"));
    expect(field("Number of nodes")).toHaveValue("12");
    fireEvent.click(screen.getByText("Undo"));
    expect(field(THICKNESS)).toHaveValue("20");
    expect(screen.queryByText("Undo")).toBeNull();
  });

  it("takes rows pasted from a spreadsheet", () => {
    render(<Sheet />);
    fireEvent.paste(field("Load case ULS 1, name"), {
      clipboardData: { getData: () => "A\t100\t0\t50\nB\t-80\t0\t40" },
    });
    expect(field("Load case A, left moment (kNm)")).toHaveValue("100");
    expect(field("Load case B, left moment (kNm)")).toHaveValue("-80");
  });

  it("asks for ribs past the beam when they are wanted, and leaves them out again when emptied", () => {
    const onSave = vi.fn();
    render(<Sheet onSave={onSave} />);
    expect(screen.queryByLabelText("Left rib above the beam, thickness (mm)")).toBeNull();
    fireEvent.click(screen.getByText("+ ribs on the plate past the beam"));
    type("Left rib above the beam, thickness (mm)", "12");
    expect(field("Left rib above the beam, length (mm)")).toBeInvalid();
    expect(field("Left rib above the beam, length (mm)")).toHaveAccessibleDescription(
      /This field is missing/,
    );
    type("Left rib above the beam, length (mm)", "150");
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    const saved = () => (onSave.mock.lastCall as [NodeDocument])[0].left?.connection;
    expect(saved()).toMatchObject({ plate: { stiffener: { top: { thickness: 12, length: 150 } } } });
    type("Left rib above the beam, thickness (mm)", "");
    type("Left rib above the beam, length (mm)", "");
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect(saved()).toEqual(buildNodeDocument().left?.connection);
  });

  it("takes four bolts a row with an outer gauge to start from, and goes back to two", () => {
    render(<Sheet />);
    fireEvent.change(field("Left bolts a row"), { target: { value: "4" } });
    // As far outside the inner bolts as those are apart: 2 x 120.
    expect(field("Left outer bolt gauge (mm)")).toHaveValue("240");
    fireEvent.change(field("Left bolts a row"), { target: { value: "2" } });
    expect(screen.queryByLabelText("Left outer bolt gauge (mm)")).toBeNull();
    expect(screen.queryByTestId("faults")).toBeNull();
  });

  it("takes flange cleats with web cleats, draws them, and says beside the field what is wrong", () => {
    const onSave = vi.fn();
    render(<Sheet onSave={onSave} />);
    fireEvent.change(field("Left connection"), { target: { value: "flange-cleats" } });
    expect(screen.queryByTestId("faults")).toBeNull();
    expect(screen.getByRole("group", { name: /Elevation/ })).toHaveAccessibleDescription(
      /flange cleats 150 by 90/,
    );
    type("Left cleat bolts in the column, from the heel (mm)", "200");
    expect(field("Left cleat bolts in the column, from the heel (mm)")).toHaveAccessibleDescription(
      /passes the end of the 150 mm leg/,
    );
    type("Left cleat bolts in the column, from the heel (mm)", "60");
    type("Left rib of the cleats, thickness (mm)", "10");
    fireEvent.click(screen.getByLabelText("Add the left web cleats"));
    type("Left web cleat length (mm)", "240");
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect((onSave.mock.lastCall as [NodeDocument])[0].left?.connection).toMatchObject({
      kind: "flange-cleats",
      bolts: { size: "M20", distance: 60 },
      stiffened: { thickness: 10 },
      webCleats: { length: 240, bolts: { rows: [50] } },
    });
  });

  it("fills the partial factors from a set, and says when they are of none", () => {
    const onSave = vi.fn();
    render(<Sheet onSave={onSave} />);
    expect(field("Set of partial factors")).toHaveValue("recommended");
    fireEvent.change(field("Set of partial factors"), { target: { value: "germany" } });
    expect(field("Partial factor gamma M1")).toHaveValue("1.1");
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect(onSave).toHaveBeenLastCalledWith(
      buildNodeDocument({ partialFactors: { gammaM0: 1, gammaM1: 1.1, gammaM2: 1.25 } }),
    );
    type("Partial factor gamma M2", "1.3");
    expect(field("Set of partial factors")).toHaveValue("own");
  });

  it("writes a reading of the standard down only where it is not the usual one", () => {
    const onSave = vi.fn();
    render(<Sheet onSave={onSave} />);
    fireEvent.change(field("T-stub method in mode 1"), { target: { value: "method-1" } });
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect(onSave).toHaveBeenLastCalledWith(buildNodeDocument({ choices: { tStubModeOne: "method-1" } }));
    fireEvent.change(field("T-stub method in mode 1"), { target: { value: "" } });
    fireEvent.keyDown(window, { key: "s", ctrlKey: true });
    expect(onSave).toHaveBeenLastCalledWith(buildNodeDocument());
  });

  it("shows everything and changes nothing for those who may only look", () => {
    render(<Sheet canEdit={false} />);
    expect(screen.queryAllByRole("textbox")).toEqual([]);
    expect(screen.queryAllByRole("combobox")).toEqual([]);
    expect(screen.queryByRole("button", { name: "Save" })).toBeNull();
    expect(screen.getByRole("img", { name: /Elevation/ })).toBeInTheDocument();
    expect(screen.getByText("Left end plate thickness (mm):")).toBeInTheDocument();
    expect(screen.getByTestId("bare-result")).toHaveTextContent("The bare column");
  });
});
