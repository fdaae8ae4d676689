import { fireEvent, render, screen } from "@testing-library/react";
import { describe, expect, it, vi } from "vitest";
import { JsonDialog } from "@/components/node/json-dialog";
import "@/tests/support/dialog-in-jsdom";
import { buildNodeDocument } from "@/tests/factories/build-node-document";

const show = (readOnly = false) => {
  const onImport = vi.fn();
  render(
    <JsonDialog
      document={buildNodeDocument()}
      fileName="node.json"
      readOnly={readOnly}
      onImport={onImport}
      onClose={vi.fn()}
    />,
  );
  return onImport;
};
const box = () => screen.getByRole("textbox", { name: "Node document" });

describe("the node as JSON", () => {
  it("shows the document and takes another one into the form, in order or not", () => {
    const onImport = show();
    expect(JSON.parse((box() as HTMLTextAreaElement).value)).toEqual(buildNodeDocument());
    fireEvent.change(box(), { target: { value: '{ "reference": "D1", "quantity": "many" }' } });
    fireEvent.click(screen.getByRole("button", { name: "Put this text into the form" }));
    expect(onImport).toHaveBeenCalledWith({ reference: "D1", quantity: "many" });
  });
  it("takes the node out of a result document", () => {
    const onImport = show();
    fireEvent.change(box(), { target: { value: '{ "engine": "1", "node": { "reference": "D2" } }' } });
    fireEvent.click(screen.getByRole("button", { name: "Put this text into the form" }));
    expect(onImport).toHaveBeenCalledWith({ reference: "D2" });
  });
  it("says what is wrong and keeps the text", () => {
    const onImport = show();
    fireEvent.change(box(), { target: { value: "{ oops" } });
    fireEvent.click(screen.getByRole("button", { name: "Put this text into the form" }));
    expect(screen.getByRole("alert")).toHaveTextContent("This is not JSON yet");
    expect(box()).toHaveValue("{ oops");
    fireEvent.change(box(), { target: { value: "[1]" } });
    fireEvent.click(screen.getByRole("button", { name: "Put this text into the form" }));
    expect(screen.getByRole("alert")).toHaveTextContent("This is no node");
    expect(onImport).not.toHaveBeenCalled();
  });
  it("offers no way in to those who may only look", () => {
    show(true);
    expect(screen.queryByRole("button", { name: "Put this text into the form" })).toBeNull();
    expect(box()).toHaveAttribute("readonly");
  });
});
