import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { TokenList } from "@/app/(work)/tokens/token-list";
import { answerRequests } from "@/tests/support/answer-requests";
import "@/tests/support/dialog-in-jsdom";
import { WithQueries } from "@/tests/support/with-queries";

afterEach(() => vi.unstubAllGlobals());

const token = {
  id: "0d6f0c0e-7d43-4a56-9d0e-000000000001",
  name: "Nightly run",
  hint: "pw_abcde",
  createdAt: "2026-12-01T08:00:00.000Z",
  lastUsedAt: null,
  expiresAt: "2027-03-01T08:00:00.000Z",
};
const show = () =>
  render(
    <WithQueries>
      <TokenList />
    </WithQueries>,
  );

describe("access tokens", () => {
  it("are made, shown once and listed without their key", async () => {
    const sent = answerRequests({
      "GET /api/tokens": { body: { tokens: [] } },
      "POST /api/tokens": { status: 201, body: { key: "pw_the-whole-key", tokens: [token] } },
    });
    show();
    const user = userEvent.setup();
    await user.click((await screen.findAllByRole("button", { name: "New token" }))[0] as HTMLElement);
    await user.type(screen.getByLabelText("What it is for"), "Nightly run");
    await user.selectOptions(screen.getByLabelText("Ends after"), "365");
    await user.click(screen.getByRole("button", { name: "Make the token" }));
    expect(await screen.findByDisplayValue("pw_the-whole-key")).toHaveAttribute("readonly");
    expect(sent.at(-1)).toEqual({
      method: "POST",
      path: "/api/tokens",
      body: { name: "Nightly run", days: 365 },
    });
    await user.click(screen.getByRole("button", { name: "I have kept it" }));
    expect(screen.queryByDisplayValue("pw_the-whole-key")).toBeNull();
    expect(screen.getByRole("rowheader", { name: "Nightly run" })).toBeVisible();
  });

  it("keep what was typed and say beside the field what is wrong with it", async () => {
    answerRequests({
      "GET /api/tokens": { body: { tokens: [token] } },
      "POST /api/tokens": {
        status: 422,
        body: {
          error: {
            code: "invalid",
            message: "Some of this cannot be taken as it stands.",
            fields: [{ path: "name", message: "At most 80 characters." }],
            requestId: "5a3c7f62-2f0f-4d6f-9a0e-000000000001",
          },
        },
      },
    });
    show();
    const user = userEvent.setup();
    await user.click(await screen.findByRole("button", { name: "New token" }));
    await user.type(screen.getByLabelText("What it is for"), "Too long");
    await user.click(screen.getByRole("button", { name: "Make the token" }));
    expect(await screen.findByRole("alert")).toHaveTextContent("At most 80 characters.");
    expect(screen.getByLabelText("What it is for")).toHaveValue("Too long");
  });

  it("are revoked after a question", async () => {
    const sent = answerRequests({
      "GET /api/tokens": { body: { tokens: [token] } },
      [`DELETE /api/tokens/${token.id}`]: { body: { tokens: [] } },
    });
    show();
    const user = userEvent.setup();
    await user.click(await screen.findByRole("button", { name: "Revoke Nightly run" }));
    expect(sent).toHaveLength(1);
    await user.click(within(screen.getByRole("dialog")).getByRole("button", { name: "Revoke the token" }));
    expect(await screen.findByText("No tokens")).toBeVisible();
    expect(sent.at(-1)?.method).toBe("DELETE");
  });
});
