import { render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ComparisonScreen } from "@/components/compare/comparison-screen";
import type { Comparison } from "@/lib/schemas/comparison";
import { buildResultDocument, buildStep } from "@/tests/factories/build-result-document";
import { answerRequests, problem } from "@/tests/support/answer-requests";
import "@/tests/support/dialog-in-jsdom";
import { WithQueries } from "@/tests/support/with-queries";

afterEach(() => vi.unstubAllGlobals());
/* The chart library measures its frame, which jsdom cannot; the tables beside the charts hold the figures. */
beforeEach(() =>
  vi.stubGlobal(
    "ResizeObserver",
    class {
      observe() {}
      unobserve() {}
      disconnect() {}
    },
  ),
);

const nodeId = "0d6f0c0e-7d43-4a56-9d0e-000000000002";
const projectId = "0d6f0c0e-7d43-4a56-9d0e-000000000001";
const person = { id: "0d6f0c0e-7d43-4a56-9d0e-000000000009", name: "I. Marlowe" };
const result = buildResultDocument();

const buildComparison = (changes: Partial<Comparison> = {}): Comparison => ({
  id: "0d6f0c0e-7d43-4a56-9d0e-000000000003",
  nodeId,
  nodeVersion: 3,
  engine: "0.1.0",
  pricedBy: "Rate book 2026-11",
  createdAt: "2026-12-01T05:00:00.000Z",
  createdBy: person,
  outdated: [],
  money: "currency",
  excluded: [],
  result,
  ...changes,
});

function nodeReply(canEdit: boolean) {
  const abilities = { edit: canEdit, editNodes: canEdit, recalculate: canEdit, seeMoney: true };
  const saved = { document: result.node, version: 3, savedBy: person, savedAt: "2026-12-01T05:00:00.000Z" };
  return {
    body: {
      node: { ...saved, id: nodeId, projectId, projectName: "Tannery Wharf", excluded: [], abilities },
    },
  };
}

function workedOption() {
  const bare = structuredClone(result.options[0]);
  if (!bare || !("components" in bare)) throw new Error("the first option is evaluated");
  for (const check of bare.components) check.steps = [buildStep()];
  return bare;
}

function show(first: Comparison, more: Parameters<typeof answerRequests>[0] = {}, canEdit = true) {
  const sent = answerRequests({
    [`GET /api/nodes/${nodeId}/comparison`]: { body: { comparison: first } },
    [`GET /api/nodes/${nodeId}`]: nodeReply(canEdit),
    "GET /api/catalog": {
      body: { sections: [], angles: [], steels: [], fasteners: [], fastenerGrades: [], stockPlates: [] },
    },
    ...more,
  });
  render(
    <WithQueries>
      <ComparisonScreen projectId={projectId} nodeId={nodeId} />
    </WithQueries>,
  );
  return sent;
}

describe("the comparison page", () => {
  it("opens with the verdict in a plain sentence", async () => {
    show(buildComparison());
    const verdict = await screen.findByTestId("verdict");
    expect(verdict).toHaveTextContent(
      /The bare column fails: web compression on the right reaches 1\.31 in ULS 3\./,
    );
    expect(verdict).toHaveTextContent(/bars at top, stiffeners at bottom.*318\sEUR/);
    expect(screen.getByRole("heading", { level: 1 })).toHaveTextContent(
      "How to stiffen the panel at C4 / level 2",
    );
  });

  it("stands the bare column first, then the options as they rank, then what fails or is outside scope", async () => {
    show(buildComparison());
    await screen.findByTestId("verdict");
    const heads = within(screen.getByRole("grid"))
      .getAllByRole("columnheader")
      .map((head) => head.textContent);
    const order = [
      /^A Bare column/,
      /^B Bars at top, stiffeners at bottom.*Rank 1/,
      /^C Stiffeners top and bottom.*Rank 2/,
      /^D Heavier column.*Rank 3/,
      /^E Bars at top.*not ranked: fails/,
      /^F Web plate, one side.*not ranked: outside scope/,
    ];
    expect(heads).toHaveLength(1 + order.length);
    order.forEach((words, index) => expect(heads[index + 1]).toMatch(words));
  });

  it("reads the working of one option only when a number asks for it, and gives the focus back", async () => {
    const user = userEvent.setup();
    const path = `/api/nodes/${nodeId}/working?option=bare`;
    const sent = show(buildComparison(), {
      [`GET ${path}`]: {
        body: { comparisonId: buildComparison().id, engine: "0.1.0", caution: null, option: workedOption() },
      },
    });
    const number = await screen.findByRole("button", { name: /^panel shear, Bare column:/ });
    expect(sent.some((request) => request.path === path)).toBe(false);
    await user.click(number);
    expect(
      await within(screen.getByRole("dialog")).findByText("EN 1993-1-8:2005, 6.2.6.1(2), Eq. (6.7)"),
    ).toBeVisible();
    await user.keyboard("{Escape}");
    expect(number).toHaveFocus();
  });

  it("keeps an option set aside on the server", async () => {
    const user = userEvent.setup();
    const sent = show(buildComparison(), {
      [`PUT /api/nodes/${nodeId}/exclusions`]: { body: { excluded: ["stiffeners"] } },
    });
    await user.click(await screen.findByRole("button", { name: /Set aside.*option C/ }));
    await waitFor(() =>
      expect(sent.find(({ method }) => method === "PUT")?.body).toEqual({ optionKeys: ["stiffeners"] }),
    );
  });

  it("says why its figures are out of date, recalculates on demand, and tells what changed", async () => {
    const user = userEvent.setup();
    const figures = { passes: true, utilisation: 0.91, rank: 1 };
    show(buildComparison({ outdated: ["The rate book was changed."] }), {
      [`POST /api/nodes/${nodeId}/comparison`]: {
        body: {
          comparison: buildComparison(),
          differences: [
            {
              key: "bars-stiffeners",
              name: "Bars at top, stiffeners at bottom",
              before: { ...figures, cost: 300 },
              after: { ...figures, cost: 318 },
            },
          ],
        },
      },
    });
    expect(await screen.findByText("The rate book was changed.")).toBeVisible();
    await user.click(await screen.findByRole("button", { name: "Recalculate" }));
    expect(await screen.findByText("Bars at top, stiffeners at bottom: cost 300 to 318")).toBeVisible();
    expect(screen.queryByText("The rate book was changed.")).toBeNull();
  });

  it("lets someone who may not change anything look", async () => {
    show(buildComparison({ outdated: ["The rate book was changed."] }), {}, false);
    await screen.findByTestId("verdict");
    expect(screen.queryByRole("button", { name: "Recalculate" })).toBeNull();
    expect(screen.queryByRole("button", { name: /Set aside/ })).toBeNull();
  });

  it("carries its cautions at the foot", async () => {
    show(buildComparison());
    expect(await screen.findByText(/Fatigue, seismic detailing and fire are not covered/)).toBeVisible();
    expect(screen.getByText(/licensed engineer’s decision come first/)).toBeVisible();
  });

  it("says why it could not be read", async () => {
    answerRequests({
      [`GET /api/nodes/${nodeId}/comparison`]: problem("not_found", "That node does not exist.", 404),
    });
    render(
      <WithQueries>
        <ComparisonScreen projectId={projectId} nodeId={nodeId} />
      </WithQueries>,
    );
    expect(await screen.findByRole("alert")).toHaveTextContent("That node does not exist.");
  });
});
