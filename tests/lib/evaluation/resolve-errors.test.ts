import { describe, expect, it } from "vitest";
import { Problems, shownMm } from "@/lib/evaluation/resolve-errors";

describe("Problems", () => {
  it("keeps every fault in order", () => {
    const problems = new Problems();
    expect(problems.isEmpty).toBe(true);
    expect(problems.refuse("a", "first")).toBeNull();
    problems.add("b.0", "second");
    expect(problems.isEmpty).toBe(false);
    expect(problems.list()).toEqual([
      { path: "a", message: "first" },
      { path: "b.0", message: "second" },
    ]);
  });
});

describe("shownMm", () => {
  it("shows one decimal at most", () => expect([12, 12.34, 0.04].map(shownMm)).toEqual(["12", "12.3", "0"]));
});
