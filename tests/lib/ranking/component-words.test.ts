import { expect, it } from "vitest";
import { COMPONENT_IDS } from "@/lib/calc/result";
import { componentOnSide, componentWords } from "@/lib/ranking/component-words";

it("has words of its own for every component", () => {
  const words = COMPONENT_IDS.map(componentWords);
  expect(new Set(words).size).toBe(COMPONENT_IDS.length);
  expect(words.every((word) => /^[a-z]/.test(word))).toBe(true);
});

it("names the side", () => {
  expect(componentOnSide("column-web-compression", "right")).toBe("web compression on the right");
});
