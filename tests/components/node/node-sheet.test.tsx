import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { fireEvent, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { NodeSheet } from "@/app/(work)/projects/[projectId]/nodes/[nodeId]/node-sheet";
import type { NodeDocument } from "@/lib/schemas/node-document";
import "@/tests/support/dialog-in-jsdom";
import { buildCatalog, buildNodeDocument } from "@/tests/factories/build-node-document";

const PROJECT = "5b1f7d5e-3a52-4d0e-9b0c-0d6f5f0c1a01";
const NODE = "5b1f7d5e-3a52-4d0e-9b0c-0d6f5f0c1a02";
const person = (name: string) => ({ id: "5b1f7d5e-3a52-4d0e-9b0c-0d6f5f0c1a03", name });

const saved = (document: NodeDocument, version: number, name: string) => ({
  document,
  version,
  savedBy: person(name),
  savedAt: "2026-11-02T09:30:00.000Z",
});
const nodeReply = (document: NodeDocument, version: number, editNodes = true) => ({
  node: {
    ...saved(document, version, "I. Marlowe"),
    id: NODE,
    projectId: PROJECT,
    projectName: "Tannery Wharf",
    excluded: [],
    abilities: { edit: editNodes, editNodes, recalculate: editNodes, seeMoney: true },
  },
});

/** Answers the two reads; a PUT gets what the test gives. */
function answer(
  editNodes: boolean,
  put: (body: { document: NodeDocument; expectedVersion: number }) => [number, unknown],
) {
  vi.stubGlobal("fetch", (input: string | URL | Request, init?: RequestInit) => {
    const address = input instanceof Request ? input.url : String(input);
    const reply = (status: number, body: unknown) =>
      Promise.resolve(
        new Response(JSON.stringify(body), { status, headers: { "content-type": "application/json" } }),
      );
    if (address.endsWith("/api/catalog")) return reply(200, buildCatalog());
    if (init?.method === "PUT") return reply(...put(JSON.parse(init.body as string) as never));
    return reply(200, nodeReply(buildNodeDocument(), 3, editNodes));
  });
}

const open = async () => {
  render(
    <QueryClientProvider client={new QueryClient({ defaultOptions: { queries: { retry: false } } })}>
      <NodeSheet projectId={PROJECT} nodeId={NODE} />
    </QueryClientProvider>,
  );
  await screen.findByRole("heading", { name: "C4 / level 2" });
};
const type = (name: string, value: string) =>
  fireEvent.change(screen.getByLabelText(name), { target: { value } });
const valueOf = (name: string) => screen.getByLabelText<HTMLInputElement>(name).value;
const save = () => userEvent.click(screen.getByText("Save"));

const THEIRS = saved(buildNodeDocument({ quantity: 30 }), 4, "R. Vance");
const conflict = {
  error: {
    code: "conflict",
    message: "Someone saved this node after you opened it.",
    fields: [],
    requestId: "r1",
    current: THEIRS,
  },
};

// A whole sheet of fields in jsdom is slow on a busy machine; none of it waits for anything.
vi.setConfig({ testTimeout: 60_000 });

beforeEach(() => window.sessionStorage.clear());
afterEach(() => vi.unstubAllGlobals());

describe("saving the node sheet", () => {
  it("sends the version that was open and takes up the saved one", async () => {
    const put = vi.fn((body: { document: NodeDocument }): [number, unknown] => [
      200,
      nodeReply(body.document, 4),
    ]);
    answer(true, put);
    await open();
    type("Number of nodes", "14");
    await save();
    await screen.findByText(/version 4, saved by I. Marlowe/);
    expect(put).toHaveBeenCalledWith({ document: buildNodeDocument({ quantity: 14 }), expectedVersion: 3 });
    await waitFor(() => expect(window.sessionStorage).toHaveLength(0));
  });

  it("shows both versions when somebody saved first, and lays my changes on theirs", async () => {
    const versions: number[] = [];
    answer(true, ({ document, expectedVersion }) => {
      versions.push(expectedVersion);
      return expectedVersion === 3 ? [409, conflict] : [200, nodeReply(document, 5)];
    });
    await open();
    type("Left end plate thickness (mm)", "25");
    await save();
    const dialog = await screen.findByRole("dialog", {
      name: "Somebody saved this node first",
      hidden: true,
    });
    expect(dialog).toHaveTextContent("R. Vance saved version 4 on 2 Nov");
    const rows = [...dialog.querySelectorAll("tr")].map((row) => row.textContent);
    expect(rows).toEqual([
      expect.stringContaining("R. Vance"),
      "left end plate thickness202520",
      "number of nodes121230",
    ]);
    await userEvent.click(within(dialog).getByText("Lay my changes on top of theirs"));
    expect(valueOf("Number of nodes")).toBe("30");
    expect(valueOf("Left end plate thickness (mm)")).toBe("25");
    await save();
    await screen.findByText(/version 5/);
    expect(versions).toEqual([3, 4]);
  });

  it("takes theirs and brings mine back when asked", async () => {
    answer(true, () => [409, conflict]);
    await open();
    type("Left end plate thickness (mm)", "25");
    await save();
    const dialog = await screen.findByRole("dialog", { hidden: true });
    await userEvent.click(within(dialog).getByText("Take theirs, set mine aside"));
    expect(valueOf("Number of nodes")).toBe("30");
    expect(valueOf("Left end plate thickness (mm)")).toBe("20");
    await userEvent.click(screen.getByRole("button", { name: "Bring it back" }));
    expect(valueOf("Left end plate thickness (mm)")).toBe("25");
  });

  it("stands a refusal of the server beside its field and keeps what was typed", async () => {
    const fields = [{ path: "document.column.section", message: "This section was withdrawn." }];
    answer(true, () => [
      422,
      { error: { code: "invalid", message: "One field is not in order.", fields, requestId: "r2" } },
    ]);
    await open();
    type("Number of nodes", "14");
    await save();
    expect(await screen.findByText("The node was not saved.")).toBeInTheDocument();
    expect(screen.getByRole("combobox", { name: "Column section" })).toHaveAccessibleDescription(
      /This section was withdrawn/,
    );
    expect(valueOf("Number of nodes")).toBe("14");
  });

  it("tells those who may only look why they cannot change anything", async () => {
    answer(false, () => [403, {}]);
    await open();
    expect(screen.getByText("You may look at this node, not change it.")).toBeInTheDocument();
    expect(screen.queryByRole("button", { name: "Save" })).toBeNull();
    expect(screen.getByRole("link", { name: "Compare options" })).toHaveAttribute(
      "href",
      `/projects/${PROJECT}/nodes/${NODE}/comparison`,
    );
  });
});
