/** Guards that an index tells proportions and nothing else. */
import { describe, expect, it } from "vitest";
import { costIndexer } from "@/lib/presenters/cost-index";

describe("the cost index", () => {
  it("is 100 for the cheapest that costs anything, and in proportion for the others", () => {
    const toIndex = costIndexer([0, 250, 500, 125]);
    expect([0, 125, 250, 500].map(toIndex)).toEqual([0, 100, 200, 400]);
  });

  it("is the same in any currency", () => {
    const [once, sevenfold] = [costIndexer([10, 30]), costIndexer([70, 210])];
    expect(once(30)).toBe(sevenfold(210));
  });

  it("keeps a saving below nothing, and is nothing where nothing costs", () => {
    expect(costIndexer([-20, 40])(-20)).toBe(-50);
    expect(costIndexer([0, -5])(-5)).toBe(0);
  });
});
