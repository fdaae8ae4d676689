import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { SignInForm } from "@/app/(auth)/sign-in/sign-in-form";

const signIn = vi.hoisted(() => vi.fn());
vi.mock("next-auth/react", () => ({ signIn }));
beforeEach(() => {
  signIn.mockReset();
});

async function fill(email: string, password: string) {
  const user = userEvent.setup();
  render(<SignInForm callbackPath="/projects" />);
  if (email) await user.type(screen.getByRole("textbox", { name: "E-mail" }), email);
  if (password) await user.type(screen.getByLabelText("Password"), password);
  await user.click(screen.getByRole("button", { name: "Sign in" }));
}

describe("signing in", () => {
  it("says beside each field what is missing, and asks nobody", async () => {
    await fill("", "");
    expect(screen.getByRole("textbox", { name: "E-mail" })).toHaveAccessibleDescription(
      "Write your e-mail address.",
    );
    expect(screen.getByLabelText("Password")).toHaveAccessibleDescription("Write your password.");
    expect(signIn).not.toHaveBeenCalled();
  });

  it("keeps what was typed when refused, without telling whether the address is known", async () => {
    signIn.mockResolvedValue({ ok: false, error: "CredentialsSignin" });
    await fill(" marlowe@tarnbeck.example ", "a wrong one");
    expect(signIn).toHaveBeenCalledWith("credentials", {
      email: "marlowe@tarnbeck.example",
      password: "a wrong one",
      redirect: false,
    });
    expect(await screen.findByRole("alert")).toHaveTextContent(
      "That e-mail and password do not belong together.",
    );
    expect(screen.getByLabelText("Password")).toHaveValue("a wrong one");
  });

  it("says how long to wait after too many tries", async () => {
    signIn.mockResolvedValue({ ok: false, error: "too-many-tries" });
    await fill("marlowe@tarnbeck.example", "x");
    expect(await screen.findByRole("alert")).toHaveTextContent("Wait a quarter of an hour");
  });

  it("says so when the server does not answer", async () => {
    signIn.mockRejectedValue(new TypeError("fetch failed"));
    await fill("marlowe@tarnbeck.example", "x");
    expect(await screen.findByRole("alert")).toHaveTextContent("Signing in did not work just now.");
  });
});
