import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { AppHeader } from "@/components/layout/app-header";
import { answerRequests } from "@/tests/support/answer-requests";
import { WithQueries } from "@/tests/support/with-queries";

const place = vi.hoisted((): { pathname: string; params: { projectId?: string } } => ({
  pathname: "/projects",
  params: {},
}));
const signOut = vi.hoisted(() => vi.fn());
vi.mock("next/navigation", () => ({ usePathname: () => place.pathname, useParams: () => place.params }));
vi.mock("next-auth/react", () => ({ signOut }));
afterEach(() => {
  vi.unstubAllGlobals();
  Object.assign(place, { pathname: "/projects", params: {} });
});

const show = () =>
  render(
    <WithQueries>
      <AppHeader person={{ name: "Maren Oake", role: "designer" }} theme="system" />
    </WithQueries>,
  );

describe("the head of the signed-in pages", () => {
  it("says who is signed in and as what, and lets them out", async () => {
    const user = userEvent.setup();
    show();
    const head = screen.getByRole("banner");
    expect(head).toHaveTextContent("Maren Oake, designer");
    await user.click(within(head).getByRole("button", { name: "Sign out" }));
    expect(signOut).toHaveBeenCalledWith({ callbackUrl: "/sign-in" });
  });

  it("marks where you are", () => {
    show();
    const main = screen.getByRole("navigation", { name: "Main" });
    expect(within(main).getByRole("link", { name: "Projects" })).toHaveAttribute("aria-current", "page");
    expect(within(main).getByRole("link", { name: "Method" })).not.toHaveAttribute("aria-current");
  });

  it("names the project that is open", async () => {
    const projectId = "0d6f0c0e-7d43-4a56-9d0e-000000000001";
    Object.assign(place, { pathname: `/projects/${projectId}`, params: { projectId } });
    answerRequests({
      [`GET /api/projects/${projectId}`]: {
        body: {
          project: {
            id: projectId,
            name: "Tannery Wharf, block 2",
            description: "",
            organisation: { id: projectId, name: "Tarnbeck" },
            version: 1,
            isLocked: false,
            nodeCount: 8,
            updatedAt: "2026-12-01T05:00:00.000Z",
            abilities: { edit: true, editNodes: true, recalculate: true, seeMoney: true },
          },
        },
      },
    });
    show();
    expect(await screen.findByRole("link", { name: "Tannery Wharf, block 2" })).toHaveAttribute(
      "href",
      `/projects/${projectId}`,
    );
    expect(screen.getByRole("link", { name: "Projects" })).not.toHaveAttribute("aria-current");
  });
});
