import { render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { NodeRegister } from "@/app/(work)/projects/[projectId]/node-register";
import type { NodeRow } from "@/lib/schemas/node";
import { answerRequests, problem } from "@/tests/support/answer-requests";
import "@/tests/support/dialog-in-jsdom";
import { WithQueries } from "@/tests/support/with-queries";

afterEach(() => vi.unstubAllGlobals());

const projectId = "0d6f0c0e-7d43-4a56-9d0e-000000000001";
const nodeId = (number: number) => `0d6f0c0e-7d43-4a56-9d0e-${String(number).padStart(12, "0")}`;
const person = { id: "0d6f0c0e-7d43-4a56-9d0e-000000000009", name: "I. Marlowe" };

const buildRow = (number: number, changes: Partial<NodeRow> = {}): NodeRow => ({
  id: nodeId(number),
  reference: `C${number}`,
  column: "HE 300 A",
  beams: { left: "IPE 450", right: "IPE 450" },
  quantity: 12,
  version: 3,
  updatedAt: "2026-11-30T09:00:00.000Z",
  updatedBy: person,
  bare: {
    passes: false,
    utilisation: 1.31,
    component: "column-web-compression",
    side: "right",
    loadCase: "ULS 3",
  },
  leading: {
    key: "bars",
    name: "Bars at top",
    rank: 1,
    utilisation: 0.91,
    cost: 318,
    currency: "EUR",
    shopMinutes: 98,
  },
  state: "solved",
  outdated: [],
  ...changes,
});
const rows = [
  buildRow(10, { bare: { outsideScope: "unequal beam depths" }, leading: null, state: "outside-scope" }),
  buildRow(2),
  buildRow(1, {
    column: "HE 400 B",
    beams: { left: "IPE 400", right: null },
    bare: { passes: true, utilisation: 0.82, component: "column-web-shear", side: "left", loadCase: "ULS 1" },
    leading: {
      key: "bare",
      name: "Bare column",
      rank: 1,
      utilisation: 0.82,
      cost: 0,
      currency: "EUR",
      shopMinutes: 0,
    },
    state: "bare-passes",
    outdated: ["The rate book was changed."],
  }),
];

const projectReply = (canEdit: boolean) => ({
  body: {
    project: {
      id: projectId,
      name: "Tannery Wharf, block 2",
      description: "Five storeys.",
      organisation: { id: person.id, name: "Tarnbeck" },
      version: 1,
      isLocked: false,
      nodeCount: 3,
      updatedAt: "2026-11-30T09:00:00.000Z",
      abilities: { edit: canEdit, editNodes: canEdit, recalculate: canEdit, seeMoney: true },
    },
  },
});
const nodesPath = `GET /api/projects/${projectId}/nodes`;

function show({ canEdit = true, nodes = rows }: { canEdit?: boolean; nodes?: readonly NodeRow[] } = {}) {
  let current = nodes;
  const sent = answerRequests({
    [`GET /api/projects/${projectId}`]: projectReply(canEdit),
    [nodesPath]: () => ({ body: { nodes: current, money: "currency" } }),
    [`DELETE /api/nodes/${nodeId(2)}?expectedVersion=3`]: () => {
      current = current.filter((row) => row.id !== nodeId(2));
      return { body: { deleted: true } };
    },
  });
  render(
    <WithQueries>
      <NodeRegister projectId={projectId} />
    </WithQueries>,
  );
  return sent;
}

const marks = () =>
  within(screen.getByRole("table", { name: "Register of nodes" }))
    .getAllByRole("rowheader")
    .map((head) => within(head).getByRole("link").textContent);

describe("the register of nodes", () => {
  it("says that it loads, then lists marks in the order people count in", async () => {
    show();
    expect(screen.getByRole("status")).toHaveTextContent("Loading the register");
    await screen.findByRole("heading", { name: "Tannery Wharf, block 2" });
    expect(marks()).toEqual(["C1", "C2", "C10"]);
  });

  it("tells each bare column by word and mark, and never a number outside scope", async () => {
    show();
    const failing = await screen.findByRole("row", { name: /^C2/ });
    expect(failing).toHaveTextContent("fails ▲ 1.31 over the limit web compression, right");
    expect(failing).toHaveTextContent("Bars at top");
    expect(failing).toHaveTextContent("1 h 38");
    const outside = screen.getByRole("row", { name: /^C10/ });
    expect(outside).toHaveTextContent("outside scope unequal beam depths");
    const sound = screen.getByRole("row", { name: /^C1 / });
    expect(sound).toHaveTextContent("passes 0.82");
    expect(sound).toHaveTextContent("out of date");
  });

  it("leads to the node sheet and to the comparison", async () => {
    show();
    const href = `/projects/${projectId}/nodes/${nodeId(2)}`;
    expect(await screen.findByRole("link", { name: "C2" })).toHaveAttribute("href", href);
    expect(screen.getByRole("link", { name: "Compare the options for C2" })).toHaveAttribute(
      "href",
      `${href}/comparison`,
    );
    expect(screen.getByRole("link", { name: "New node" })).toHaveAttribute(
      "href",
      `/projects/${projectId}/nodes/new`,
    );
  });

  it("sorts by a figure both ways, what has none last", async () => {
    const user = userEvent.setup();
    show();
    await user.click(await screen.findByRole("button", { name: "Bare column" }));
    expect(marks()).toEqual(["C1", "C2", "C10"]);
    expect(screen.getByRole("columnheader", { name: "Bare column" })).toHaveAttribute(
      "aria-sort",
      "ascending",
    );
    await user.click(screen.getByRole("button", { name: "Bare column" }));
    expect(marks()).toEqual(["C2", "C1", "C10"]);
  });

  it("filters by words and by state, and finds its way back", async () => {
    const user = userEvent.setup();
    show();
    await user.type(await screen.findByRole("searchbox", { name: "Find" }), "400 left");
    expect(marks()).toEqual(["C1"]);
    expect(screen.getByRole("status")).toHaveTextContent("1 of 3 nodes");
    await user.selectOptions(screen.getByRole("combobox", { name: "State" }), "outside scope");
    await user.click(screen.getByRole("button", { name: "Show all" }));
    expect(marks()).toHaveLength(3);
  });

  it("asks before it deletes, sends the version that was seen, and drops the row", async () => {
    const user = userEvent.setup();
    const sent = show();
    await user.click(await screen.findByRole("button", { name: "Delete C2" }));
    expect(sent.some(({ method }) => method === "DELETE")).toBe(false);
    await user.click(screen.getByRole("button", { name: "Delete the node" }));
    await waitFor(() => expect(marks()).toEqual(["C1", "C10"]));
    expect(screen.queryByRole("dialog")).toBeNull();
  });

  it("offers nothing that the person may not do", async () => {
    show({ canEdit: false });
    await screen.findByRole("link", { name: "C2" });
    expect(screen.queryByRole("button", { name: /Delete/ })).toBeNull();
    expect(screen.queryByRole("link", { name: "New node" })).toBeNull();
  });

  it("says what to do when it is empty", async () => {
    show({ nodes: [] });
    expect(await screen.findByRole("heading", { name: "No nodes yet" })).toBeVisible();
    expect(screen.getAllByRole("link", { name: "New node" }).length).toBeGreaterThan(0);
  });

  it("says why it failed and tries again", async () => {
    const user = userEvent.setup();
    let isDown = true;
    answerRequests({
      [`GET /api/projects/${projectId}`]: projectReply(true),
      [nodesPath]: () =>
        isDown
          ? problem("unexpected", "Something went wrong here.", 500)
          : { body: { nodes: rows, money: "currency" } },
    });
    render(
      <WithQueries>
        <NodeRegister projectId={projectId} />
      </WithQueries>,
    );
    expect(await screen.findByRole("alert")).toHaveTextContent("Something went wrong here.");
    isDown = false;
    await user.click(screen.getByRole("button", { name: "Try again" }));
    expect(await screen.findByRole("link", { name: "C2" })).toBeVisible();
  });
});
