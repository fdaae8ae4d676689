/** Guards that no secret reaches the log, whatever a caller hands over by mistake. */
import { expect, it } from "vitest";
import { createLogger } from "@/lib/log/logger";

function logged(entry: Record<string, unknown>): string {
  const lines: string[] = [];
  createLogger("info", { write: (line: string) => void lines.push(line) }).info(entry, "something happened");
  return lines.join("");
}

it("writes what happened, with the time and what belongs to it", () => {
  const line = JSON.parse(logged({ requestId: "r-1", nodeId: "n-1" })) as Record<string, unknown>;
  expect(line).toMatchObject({ msg: "something happened", requestId: "r-1", nodeId: "n-1" });
  expect(Date.parse(String(line.time))).not.toBeNaN();
});

it("strikes out passwords, tokens, cookies and bodies, nested ones too", () => {
  const text = logged({
    password: "hunter-1",
    person: { email: "a@b.example", passwordHash: "hunter-2" },
    request: { headers: { cookie: "hunter-3", authorization: "hunter-4" }, body: "hunter-5" },
    token: "hunter-6",
  });
  expect(text).not.toContain("hunter");
  expect(text).toContain("a@b.example");
});

it("writes the error with its stack, for whoever has to find the cause", () => {
  expect(logged({ err: new Error("the cause") })).toContain("the cause");
});
