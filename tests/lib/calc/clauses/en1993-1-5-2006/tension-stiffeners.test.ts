import { describe, expect, it } from "vitest";
import {
  tensionStiffenerPlainN,
  tensionStiffenerSharedN,
} from "@/lib/calc/clauses/en1993-1-5-2006/tension-stiffeners";
import { expectHand } from "@/tests/support/evaluated-case";

/** Guards the two rules of SCI/BCSA P398 for the force in a tension stiffener. */
const rows = { firstN: 300_000, secondN: 250_000 };
const plainN = (webLengthMm: number): number =>
  tensionStiffenerPlainN(null, { ...rows, webLengthMm, webThicknessMm: 8.5, yieldMpa: 275 });
const force = (plain: number): number =>
  tensionStiffenerSharedN(null, {
    ...rows,
    plainN: plain,
    mMm: 44.15,
    firstMm: 40,
    secondMm: 47,
  });

describe("a tension stiffener", () => {
  it("takes what the web between the rows' spread cannot", () =>
    expectHand(plainN(200), 300_000 + 250_000 - 200 * 8.5 * 275));

  it("takes nothing by that rule where the web holds both rows", () => expect(plainN(400)).toBe(0));

  it("takes at least its share by the distances to web and stiffener", () => {
    const shared = (44.15 / (44.15 + 40)) * 300_000 + (44.15 / (44.15 + 47)) * 250_000;
    expectHand(force(0), shared);
    expectHand(force(shared - 1), shared);
  });

  it("takes the first rule's force where that is larger", () => expect(force(400_000)).toBe(400_000));
});
