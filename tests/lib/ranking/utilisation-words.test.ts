import { expect, it } from "vitest";
import { utilisationWords } from "@/lib/ranking/utilisation-words";

it.each([
  [0.914, "0.91"],
  [1, "1.00"],
  [1.314, "1.31"],
  [0.9996, "1.00"],
  [1.0032, "1.003"],
  [1.0006, "1.001"],
  [1.0001, "just over 1.00"],
])("writes %d as %s", (value, words) => {
  expect(utilisationWords(value)).toBe(words);
});
